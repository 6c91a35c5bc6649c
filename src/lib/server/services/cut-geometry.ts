import { checkPlan } from '../../domain/cutting';
import { LIES, type Cut, type CutProblem, type PieceKind, type Rect } from '../../domain/cutting/problem';
import type { SheetSupply } from '../../domain/stash';
import type { ShownSheet } from '../../schemas/cutting';
import type { OwnedSheet } from './cut-check';

/**
 * Puts the plan to the planner's independent checker, each sheet with what is really owned. A branding strip is
 * a piece like any other there: it has to lie along its edge and come off by the cuts that are listed. A plan
 * lists the offcuts worth keeping only: what the cuts leave besides is worked out from them.
 */
export function checkGeometry(
	sheets: readonly ShownSheet[],
	owned: ReadonlyMap<string, OwnedSheet>
): string[] {
	const keys = [...new Set(sheets.map(({ supply }) => supply))];
	const kinds = keys.map((key) => owned.get(key)!.supply);
	const pieces = new Map<string, { number: number; kind: PieceKind }>();
	const pieceOf = ({ w, h }: Rect) => {
		const known = pieces.get(`${w} ${h}`);
		const number = known?.number ?? pieces.size;
		const kind = { w, h, qty: (known?.kind.qty ?? 0) + 1, lies: kinds.map(() => LIES.upright) };
		pieces.set(`${w} ${h}`, { number, kind });
		return number;
	};
	const laid = sheets.map((shown) => {
		const { supply } = owned.get(shown.supply)!;
		const free = [...shown.placements, ...stripOf(supply)];
		return {
			sheet: keys.indexOf(shown.supply),
			placements: free.map((rect) => ({ ...boundsOf(rect), piece: pieceOf(rect), turned: false })),
			cuts: shown.cuts,
			offcuts: without(regionsOf(supply, shown.cuts), free)
		};
	});
	const problem: CutProblem = {
		sheets: kinds.map(({ w, h, sheets: count }) => ({ w, h, count, cost: [1, 0] })),
		pieces: [...pieces.values()].map(({ kind }) => kind),
		kerf: 0
	};
	const faults = checkPlan(problem, { sheets: laid, cost: [laid.length, 0] });
	const strangers = sheets.flatMap(({ offcuts }, nth) => without(offcuts, laid[nth]!.offcuts));
	return [...faults, ...strangers.map(({ w, h }) => `no cut leaves an offcut of ${w} x ${h} there`)];
}

/** What lies apart once the cuts are made one after the other. A cut of a region that isn't there makes none. */
function regionsOf({ w, h }: SheetSupply, cuts: readonly Cut[]): Rect[] {
	let regions: Rect[] = [{ x: 0, y: 0, w, h }];
	for (const { axis, at, of } of cuts) {
		const region = regions.find((one) => sameRect(one, of));
		if (!region) continue;
		const halves =
			axis === 'down'
				? [
						{ ...region, w: at - region.x },
						{ ...region, x: at, w: region.x + region.w - at }
					]
				: [
						{ ...region, h: at - region.y },
						{ ...region, y: at, h: region.y + region.h - at }
					];
		regions = [...regions.filter((one) => one !== region), ...halves];
	}
	return regions;
}

/** Each of `taken` takes one that is the same away. */
function without(rects: readonly Rect[], taken: readonly Rect[]): Rect[] {
	const left = [...rects];
	for (const gone of taken) {
		const at = left.findIndex((rect) => sameRect(rect, gone));
		if (at >= 0) left.splice(at, 1);
	}
	return left;
}

/** The branding strip as it lies on the whole sheet, where there is one. */
function stripOf({ w, h, strip }: SheetSupply): Rect[] {
	if (!strip) return [];
	const { edge, depth } = strip;
	if (edge === 'top' || edge === 'bottom') return [{ x: 0, y: edge === 'top' ? 0 : h - depth, w, h: depth }];
	return [{ x: edge === 'left' ? 0 : w - depth, y: 0, w: depth, h }];
}

function boundsOf({ x, y, w, h }: Rect): Rect {
	return { x, y, w, h };
}

function sameRect(a: Rect, b: Rect): boolean {
	return a.x === b.x && a.y === b.y && a.w === b.w && a.h === b.h;
}
