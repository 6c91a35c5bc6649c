/**
 * The largest unit in which every length of a problem is whole. The search works in it, so that inches and their
 * exact millimetres, or any other scale, are one and the same problem to it, to the last rounding of a ratio.
 */
import type { CutPlan, CutProblem, Rect } from './problem';

export function largestUnit({ sheets, pieces, kerf }: CutProblem): number {
	return [...sheets, ...pieces].flatMap(({ w, h }) => [w, h]).reduce(commonDivisor, kerf) || 1;
}

function commonDivisor(a: number, b: number): number {
	return b === 0 ? a : commonDivisor(b, a % b);
}

export function measuredIn(problem: CutProblem, unit: number): CutProblem {
	return {
		...problem,
		kerf: problem.kerf / unit,
		sheets: problem.sheets.map((sheet) => ({ ...sheet, w: sheet.w / unit, h: sheet.h / unit })),
		pieces: problem.pieces.map((piece) => ({ ...piece, w: piece.w / unit, h: piece.h / unit }))
	};
}

export function measuredBack(plan: CutPlan, unit: number): CutPlan {
	const back = <R extends Rect>(rect: R): R => ({
		...rect,
		x: rect.x * unit,
		y: rect.y * unit,
		w: rect.w * unit,
		h: rect.h * unit
	});
	return {
		...plan,
		sheets: plan.sheets.map((sheet) => ({
			...sheet,
			placements: sheet.placements.map(back),
			cuts: sheet.cuts.map((cut) => ({ ...cut, at: cut.at * unit, of: back(cut.of) })),
			offcuts: sheet.offcuts.map(back)
		}))
	};
}
