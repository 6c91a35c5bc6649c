import { CENTIMETRE, INCH } from '../../length';
import type { Bill, Slot } from '../bill';
import { lineOf, type Finding, type Proof } from './finding';

/** Papers that nothing is cut from, relations that no paper can meet, pieces that no common sheet holds. */
export function slotFindings(proof: Proof): Finding[] {
	const { bill } = proof;
	return [...bill.slots.flatMap((slot) => findingsFor(slot, bill)), ...oversize(proof)];
}

function findingsFor(slot: Slot, bill: Bill): Finding[] {
	const findings: Finding[] = [];
	const line = `slots/${slot.key}`;
	const index = bill.slots.indexOf(slot);
	if (!bill.pieces.some((piece) => piece.slot === slot.key)) {
		findings.push({
			line,
			rule: 'slot-without-pieces',
			severity: 'mend',
			message: `Nothing is cut from “${slot.name}”.`,
			mend: { text: 'Give it a piece, or take the slot out.' }
		});
	}
	for (const other of slot.differentFrom.filter((key) => root(key, bill) === root(slot.key, bill))) {
		findings.push({
			line,
			rule: 'same-and-different',
			severity: 'mend',
			message: `“${slot.name}” has to be the same paper as “${other}” and a different one.`,
			mend: {
				text: 'Keep one of the two wishes.',
				change: {
					path: `slots.${index}.differentFrom`,
					value: slot.differentFrom.filter((key) => key !== other)
				}
			}
		});
	}
	const twin = bill.slots.find(({ key }) => key === slot.sameAs);
	if (twin && !kindsOf(slot).some((kind) => kindsOf(twin).includes(kind))) {
		findings.push({
			line,
			rule: 'same-paper-other-kind',
			severity: 'mend',
			message: `“${slot.name}” takes the paper of “${twin.name}”, but asks for ${words(slot.material.kind)} where that asks for ${words(twin.material.kind)}.`,
			mend: {
				text: `Ask for ${words(twin.material.kind)} here too.`,
				change: { path: `slots.${index}.material.kind`, value: twin.material.kind }
			}
		});
	}
	return findings;
}

/** The slot at the end of `same as`: two slots with one root share one paper. */
function root(key: string, { slots }: Bill): string {
	const next = new Map(slots.map((slot) => [slot.key, slot.sameAs]));
	const seen = new Set([key]);
	for (let at = next.get(key); at && !seen.has(at); at = next.get(at)) {
		seen.add(at);
		key = at;
	}
	return key;
}

/** The largest sheets that shops for makers commonly keep. Common practice, no source. */
const COMMON_LARGEST = [
	{ w: 50 * CENTIMETRE, h: 70 * CENTIMETRE },
	{ w: 20 * INCH, h: 26 * INCH }
];
/** Sold off a roll as well as by the sheet. */
const OFF_THE_ROLL = new Set([
	'book-cloth',
	'felt',
	'magnet-sheet',
	'adhesive-sheet',
	'acetate',
	'kraft-paper'
]);

function oversize(proof: Proof): Finding[] {
	const { bill } = proof;
	const kinds = new Map(bill.slots.map((slot) => [slot.key, slot.material.kind]));
	return bill.pieces
		.filter((piece) => !OFF_THE_ROLL.has(kinds.get(piece.slot) ?? ''))
		.filter(
			({ w, h }) => !COMMON_LARGEST.some((sheet) => Math.min(w, h) <= sheet.w && Math.max(w, h) <= sheet.h)
		)
		.map((piece) => ({
			line: lineOf(piece),
			rule: 'piece-oversize',
			severity: 'ask',
			message: `“${piece.name}” is ${proof.saySize(piece.w, piece.h)}. The largest sheets commonly sold are about 50 × 70 cm (20 × 26 in).`,
			mend: { text: 'Check the figures and their unit, or make it from two pieces that join.' }
		}));
}

const kindsOf = (slot: Slot) => [slot.material, ...slot.swaps].map(({ kind }) => kind);
const words = (kind: string) => kind.replaceAll('-', ' ');
