import type { BillDocument } from './bill-schema';
import type { Reading } from './reading';

/** What a bill's lines say of each other by key: everything named is there, and nothing goes round in a circle. */
export function checkReferences(bill: BillDocument, reading: Reading): void {
	slotReferences(bill, reading);
	pieceReferences(bill, reading);
}

function slotReferences({ slots }: BillDocument, reading: Reading): void {
	const sameAs = new Map(slots.map((slot) => [slot.key, slot.sameAs]));
	slots.forEach((slot, index) => {
		const here = reading.at('slots', index);
		if (slot.sameAs !== undefined && !sameAs.has(slot.sameAs))
			here.fail('sameAs', missing('slot', slot.sameAs));
		else if (circles(slot.key, sameAs))
			here.fail('sameAs', 'These slots take their paper from each other. Let one of them stand alone.');
		slot.differentFrom?.forEach((other, nth) => {
			if (!sameAs.has(other)) here.fail(`differentFrom.${nth}`, missing('slot', other));
			if (other === slot.key) here.fail(`differentFrom.${nth}`, 'A slot can’t differ from itself.');
		});
	});
}

function pieceReferences({ slots, pieces, tools }: BillDocument, reading: Reading): void {
	const slotKeys = new Set(slots.map(({ key }) => key));
	const toolKeys = new Set(tools?.map(({ key }) => key));
	const mounts = new Map(pieces.map(({ key, mount }) => [key, mount?.on]));
	pieces.forEach((piece, index) => {
		const here = reading.at('pieces', index);
		if (!slotKeys.has(piece.slot)) here.fail('slot', missing('slot', piece.slot));
		for (const marks of ['corners', 'edges'] as const) {
			piece[marks]?.forEach(({ tool }, nth) => {
				if (!toolKeys.has(tool)) here.fail(`${marks}.${nth}.tool`, missing('tool', tool));
			});
		}
		if (piece.mount && !mounts.has(piece.mount.on)) here.fail('mount.on', missing('piece', piece.mount.on));
		else if (circles(piece.key, mounts))
			here.fail(
				'mount.on',
				'These pieces are mounted on each other in a circle. One of them must lie at the bottom.'
			);
		piece.wraps?.boards.forEach((board, nth) => {
			if (!mounts.has(board)) here.fail(`wraps.boards.${nth}`, missing('piece', board));
			if (board === piece.key) here.fail(`wraps.boards.${nth}`, 'A wrap can’t be its own board.');
		});
	});
}

function circles(key: string, next: ReadonlyMap<string, string | undefined>): boolean {
	const seen = new Set<string>();
	for (let at = next.get(key); at !== undefined && !seen.has(at); at = next.get(at)) {
		if (at === key) return true;
		seen.add(at);
	}
	return false;
}

const missing = (what: string, key: string) => `This bill has no ${what} with the key “${key}”.`;
