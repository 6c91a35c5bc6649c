import type { Bill, Material, Piece, Slot } from '../../domain/bill/bill';
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

/** What no longer holds of the plan, as a sentence; null where the stash and the bills still bear it. */
export function checkStanding(
	sheets: readonly ShownSheet[],
	owned: ReadonlyMap<string, OwnedSheet>,
	bills: ReadonlyMap<string, Cuttable>
): string | null {
	const opened = new Set<string>();
	const designs = new Map<string, string>();
	const cut = new Map<string, number>();
	for (const sheet of sheets) {
		const supply = owned.get(sheet.supply)?.supply;
		if (!supply || supply.w !== sheet.w || supply.h !== sheet.h) return STASH;
		const named = `${sheet.supply} ${sheet.nth}`;
		if (sheet.nth > supply.sheets || opened.has(named)) return STASH;
		opened.add(named);
		for (const placed of sheet.placements) {
			const project = bills.get(placed.project);
			const piece = project?.bill.pieces.find(({ key }) => key === placed.piece);
			const slot = project?.bill.slots.find(({ key }) => key === piece?.slot);
			if (!project || !piece || !slot) return BILL;
			const which = JSON.stringify([placed.project, piece.key]);
			cut.set(which, (cut.get(which) ?? 0) + 1);
			if (cut.get(which)! > piece.qty * project.copies || !isCutTo(piece, placed)) return BILL;
			if (!mayServe(slot, supply)) return BILL;
			const print = printOn(supply, placed.face);
			if (!print || !standsRight(piece, placed, print.direction !== 'none')) return STASH;
			if (slot.design !== null && print.design !== slot.design) return BILL;
			const role = JSON.stringify([placed.project, slot.key]);
			const design = `${supply.collection ?? ''}\n${print.design}`;
			if (slot.designs === 'one' && (designs.get(role) ?? design) !== design) return BILL;
			designs.set(role, design);
		}
	}
	return null;
}

const STASH = 'The stash has changed since this plan was drawn.';
const BILL = 'The bill has changed since this plan was drawn.';

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
