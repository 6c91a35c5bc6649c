import type { Bill, Material, Piece, Slot } from '../../domain/bill/bill';
import { partsOf, type Part } from '../../domain/matching/parts';
import type { SheetSupply } from '../../domain/stash';
import type { ShownSheet } from '../../schemas/cutting';

export interface OwnedSheet {
	readonly id: string;
	readonly picture: string | null;
	readonly supply: SheetSupply;
}

export interface Cuttable {
	readonly bill: Bill;
	readonly copies: number;
}

type Placed = ShownSheet['placements'][number];

/**
 * What no longer holds of the plan, as a sentence; null where the stash and the bills still bear it.
 * @param on the day it is cut, YYYY-MM-DD
 */
export function checkStanding(
	sheets: readonly ShownSheet[],
	owned: ReadonlyMap<string, OwnedSheet>,
	bills: ReadonlyMap<string, Cuttable>,
	on: string
): string | null {
	const parts = [...bills.values()].flatMap(({ bill, copies }) => partsOf(bill, copies, on));
	const opened = new Set<string>();
	const shown = new Map<string, Set<string>>();
	const cut = new Map<string, number>();
	for (const sheet of sheets) {
		const supply = owned.get(sheet.supply)?.supply;
		if (!supply || supply.w !== sheet.w || supply.h !== sheet.h) return STASH;
		if (supply.arrives !== null && supply.arrives > on) return COMING;
		const named = `${sheet.supply} ${sheet.nth}`;
		if (sheet.nth > supply.sheets || opened.has(named)) return STASH;
		opened.add(named);
		for (const placed of sheet.placements) {
			const part = parts.find((one) => one.project === placed.project && cuttableOf(one, placed));
			const { piece, qty } = (part && cuttableOf(part, placed)) ?? {};
			if (!part || !piece || qty === undefined) return BILL;
			const which = JSON.stringify([placed.project, piece.key]);
			cut.set(which, (cut.get(which) ?? 0) + 1);
			if (cut.get(which)! > qty || !isCutTo(piece, placed)) return BILL;
			if (!mayServe(part.slot, supply)) return BILL;
			const print = printOn(supply, placed.face);
			if (!print || !standsRight(piece, placed, print.direction !== 'none')) return STASH;
			if (!isChosen(part.slot, supply, print.design)) return BILL;
			const designs = shown.get(part.group) ?? new Set();
			shown.set(part.group, designs.add(`${supply.collection ?? ''}\n${print.design}`));
		}
	}
	return parts.every((part) => isRelated(part, shown)) ? null : BILL;
}

const STASH = 'The stash has changed since this plan was drawn.';
const BILL = 'The bill has changed since this plan was drawn.';
const COMING = 'Some of this paper is still on order.';

function cuttableOf({ pieces }: Part, placed: Placed) {
	return pieces.find(({ piece }) => piece.key === placed.piece);
}

/** The design that was chosen for the slot, where one was. */
function isChosen({ design, collection }: Slot, supply: SheetSupply, shown: string): boolean {
	return design === null || (design === shown && (collection === null || collection === supply.collection));
}

/** One design where the bill wants one, over all slots that are to be the same; none that another is to differ from. */
function isRelated(
	{ group, single, differs }: Part,
	shown: ReadonlyMap<string, ReadonlySet<string>>
): boolean {
	const mine = shown.get(group) ?? new Set();
	if (single && mine.size > 1) return false;
	return [...differs].every((other) => [...mine].every((design) => !shown.get(other)?.has(design)));
}

/** As large as the bill has it, or smaller by no more than its allowance. */
function isCutTo(piece: Piece, { w, h, turned }: Placed): boolean {
	const [across, down] = turned ? [h, w] : [w, h];
	const within = (cut: number, full: number) => cut <= full && cut >= full - piece.allowance;
	return within(across, piece.w) && within(down, piece.h);
}

function standsRight(piece: Piece, { turned }: Placed, bound: boolean): boolean {
	if (!bound || piece.up === 'none' || piece.w === piece.h) return true;
	return turned === (piece.up === 'w');
}

/** A row without faces shows its own name on both; a B-side that nobody described can't be used. */
function printOn(supply: SheetSupply, face: 'A' | 'B') {
	if (supply.faces.length === 0) return { design: supply.name, direction: 'none' };
	return supply.faces[face === 'A' ? 0 : 1];
}

/** Of the slot's material or one of its swaps; what the row doesn't state is for the maker to judge. */
function mayServe(slot: Slot, supply: SheetSupply): boolean {
	const within = (
		value: number | null | undefined,
		min: number | undefined | null,
		max: number | undefined | null
	) => value === null || value === undefined || (value >= (min ?? 0) && value <= (max ?? Infinity));
	return [slot.material, ...slot.swaps].some(
		({ kind, weight, caliper }: Material) =>
			kind === supply.kind &&
			within(supply.weight?.gsm, weight?.min?.gsm, weight?.max?.gsm) &&
			within(supply.caliper, caliper?.min, caliper?.max)
	);
}
