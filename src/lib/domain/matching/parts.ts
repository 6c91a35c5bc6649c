import type { Bill, Piece, Slot } from '../bill/bill';
import type { Length } from '../length';

/** What may be used for a slot. `level`: 0 as the bill says, 1 with allowances, 2 + i with swaps up to the i-th too. */
export interface Terms {
	readonly on: string;
	readonly level: number;
	/** Unsure counts and properties that a row doesn't state are taken to hold. */
	readonly unsure: boolean;
	/** A tool that cuts board is to hand; without one, board serves only at a piece's exact size. */
	readonly cutsBoard: boolean;
}

/** A piece as it is to be cut: `w` and `h` may fall short of the bill's by its allowance. */
export interface Cuttable {
	readonly piece: Piece;
	readonly qty: number;
	readonly w: Length;
	readonly h: Length;
}

/** A slot of one project with its pieces, over all copies, and the terms on which paper is sought for it. */
export interface Part {
	readonly project: string;
	readonly slot: Slot;
	/** Slots that are the same as each other share a group; `single`: it shows one design. */
	readonly group: string;
	readonly single: boolean;
	/** Groups whose design, or designs, this one may not show. */
	readonly differs: ReadonlySet<string>;
	readonly pieces: readonly Cuttable[];
	readonly terms: Terms;
	/** Promised already in a queue: laid out again beside others, but on its own terms only. */
	readonly promised: boolean;
}

export function partsOf(bill: Bill, copies: number, on: string): Part[] {
	const groups = groupsOf(bill);
	return bill.slots.flatMap((slot) => {
		const group = groups.get(slot.key);
		const pieces = bill.pieces
			.filter((piece) => piece.slot === slot.key && piece.qty > 0)
			.map((piece) => ({ piece, qty: piece.qty * copies, w: piece.w, h: piece.h }));
		if (!group || pieces.length === 0) return [];
		const chosen = group.slots.find((kin) => kin.design !== null);
		return [
			{
				project: bill.key,
				slot:
					slot.design === null && chosen
						? { ...slot, design: chosen.design, collection: chosen.collection }
						: slot,
				group: group.key,
				single: group.slots.length > 1 || slot.designs === 'one',
				differs: group.differs,
				pieces,
				terms: { on, level: 0, unsure: false, cutsBoard: true },
				promised: false
			}
		];
	});
}

/** The highest level that adds anything for this slot. */
export function highestLevel(part: Part): number {
	if (part.slot.swaps.length > 0) return 1 + part.slot.swaps.length;
	return part.pieces.some(({ piece }) => piece.allowance > 0) ? 1 : 0;
}

/** The part on other terms; from level 1 on its pieces are as small as their allowance lets them be. */
export function onTerms(part: Part, terms: Terms): Part {
	const pieces = part.pieces.map(({ piece, qty }) => ({ piece, qty, ...cutSize(piece, terms.level > 0) }));
	return { ...part, pieces, terms };
}

function cutSize({ w, h, allowance }: Piece, smaller: boolean): { w: Length; h: Length } {
	if (!smaller) return { w, h };
	return { w: Math.max(1, w - allowance), h: Math.max(1, h - allowance) };
}

interface Group {
	readonly key: string;
	readonly slots: Slot[];
	readonly differs: Set<string>;
}

function groupsOf(bill: Bill): Map<string, Group> {
	const groups = new Map<string, Group>();
	for (const slot of bill.slots) {
		if (groups.has(slot.key)) continue;
		const group: Group = {
			key: JSON.stringify([bill.key, slot.key]),
			slots: kinOf(bill.slots, slot),
			differs: new Set()
		};
		for (const kin of group.slots) groups.set(kin.key, group);
	}
	for (const slot of bill.slots) {
		for (const other of slot.differentFrom) {
			const [mine, theirs] = [groups.get(slot.key), groups.get(other)];
			if (!mine || !theirs) continue;
			mine.differs.add(theirs.key);
			theirs.differs.add(mine.key);
		}
	}
	return groups;
}

/** Every slot that must show the same design, over any number of steps. */
function kinOf(slots: readonly Slot[], slot: Slot): Slot[] {
	const kin = new Set([slot]);
	for (const known of kin) {
		for (const other of slots) {
			if (known.sameAs === other.key || other.sameAs === known.key) kin.add(other);
		}
	}
	return slots.filter((other) => kin.has(other));
}
