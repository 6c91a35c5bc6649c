import { checkPlan } from '../cutting';
import { LIES, type CutProblem } from '../cutting/problem';
import type { MatchOptions } from './verdict';
import type { CostOf, Layout, Offer } from './layout';
import { lieOn } from './lies';
import type { Part } from './parts';

/** The named layout put to the checker once more, as rows and pieces instead of merged kinds. */
export function isSound(
	parts: readonly Part[],
	offers: readonly (readonly Offer[])[],
	layout: Layout,
	costOf: CostOf,
	options: MatchOptions
): boolean {
	const rows = [...new Set(layout.sheets.map(({ sheet }) => sheet))];
	const cuts = parts.flatMap((part, p) => part.pieces.map((cut) => ({ part, p, cut })));
	const problem: CutProblem = {
		kerf: options.kerf,
		interlocked: options.knife,
		sheets: rows.map((sheet) => ({ w: sheet.w, h: sheet.h, count: sheet.count, cost: costOf(sheet) })),
		pieces: cuts.map(({ part, p, cut }) => ({
			w: cut.w,
			h: cut.h,
			qty: cut.qty,
			lies: rows.map((sheet) => {
				const offer = offers[p]?.find((one) => one.sheet === sheet);
				return offer ? lieOn(cut, sheet, offer.prints, part.terms) : LIES.never;
			})
		}))
	};
	const sheets = layout.sheets.map((laid) => ({
		sheet: rows.indexOf(laid.sheet),
		cuts: laid.cuts,
		offcuts: laid.offcuts,
		placements: laid.placements.map(({ part, cut, x, y, w, h, turned }) => ({
			piece: cuts.findIndex((known) => known.part === part && known.cut === cut),
			x,
			y,
			w,
			h,
			turned
		}))
	}));
	return checkPlan(problem, { sheets, cost: layout.cost }).length === 0;
}
