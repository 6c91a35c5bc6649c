import type { Bill, Material, Piece, Slot } from '../../domain/bill/bill';
import { checkPlan } from '../../domain/cutting';
import { LIES, type CutPlan, type CutProblem, type PieceKind } from '../../domain/cutting/problem';
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

/**
 * Puts the plan to the planner's independent checker, each sheet with what is really owned. A branding strip is
 * a piece like any other there: it has to lie along its edge and come off by the cuts that are listed.
 */
export function checkGeometry(
	sheets: readonly ShownSheet[],
	owned: ReadonlyMap<string, OwnedSheet>
): string[] {
	const keys = [...new Set(sheets.map(({ supply }) => supply))];
	const kinds = keys.map((key) => owned.get(key)!.supply);
	const pieces = new Map<string, { number: number; kind: PieceKind }>();
	const pieceOf = (w: number, h: number) => {
		const known = pieces.get(`${w} ${h}`);
		const number = known?.number ?? pieces.size;
		const kind = { w, h, qty: (known?.kind.qty ?? 0) + 1, lies: kinds.map(() => LIES.upright) };
		pieces.set(`${w} ${h}`, { number, kind });
		return number;
	};
	const laid = sheets.map(({ supply, placements, cuts, offcuts }) => {
		const strip = stripOf(owned.get(supply)!.supply);
		const isStrip = (rect: Rectangle) => strip !== null && sameRect(rect, strip);
		const rects = [...placements, ...(strip ? [strip] : [])];
		return {
			sheet: keys.indexOf(supply),
			placements: rects.map(({ x, y, w, h }) => ({ ...{ x, y, w, h }, piece: pieceOf(w, h), turned: false })),
			cuts,
			offcuts: offcuts.filter((offcut) => !isStrip(offcut))
		};
	});
	const problem: CutProblem = {
		sheets: kinds.map(({ w, h, sheets: count }) => ({ w, h, count, cost: [1, 0] })),
		pieces: [...pieces.values()].map(({ kind }) => kind),
		kerf: 0
	};
	const plan: CutPlan = { sheets: laid, cost: [laid.length, 0] };
	return checkPlan(problem, plan);
}

const STASH = 'The stash has changed since this plan was drawn.';
const BILL = 'The bill has changed since this plan was drawn.';

interface Rectangle {
	readonly x: number;
	readonly y: number;
	readonly w: number;
	readonly h: number;
}

/** The branding strip as it lies on the whole sheet. */
function stripOf({ w, h, strip }: SheetSupply): Rectangle | null {
	if (!strip) return null;
	const { edge, depth } = strip;
	if (edge === 'top' || edge === 'bottom') return { x: 0, y: edge === 'top' ? 0 : h - depth, w, h: depth };
	return { x: edge === 'left' ? 0 : w - depth, y: 0, w: depth, h };
}

function sameRect(a: Rectangle, b: Rectangle): boolean {
	return a.x === b.x && a.y === b.y && a.w === b.w && a.h === b.h;
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
