import { checkPlan } from '../cutting';
import { LIES, type CutProblem } from '../cutting/problem';
import type { CostOf, Layout } from './layout';
import { lieOn } from './lies';
import type { Question, Row } from './question';
import type { MatchOptions } from './verdict';

/** The layout put to the checker as the rows and pieces that it names, not as the kinds that were planned. */
export function isSound(
	{ parts, cuts, kinds }: Question,
	layout: Layout,
	costOf: CostOf,
	options: MatchOptions
): boolean {
	const opened = new Set(layout.sheets.map(({ sheet }) => sheet));
	const rows: Row[] = kinds.flatMap((kind) => kind.rows.filter(({ sheet }) => opened.has(sheet)));
	const problem: CutProblem = {
		kerf: options.kerf,
		interlocked: options.knife,
		sheets: rows.map(({ sheet }) => ({ w: sheet.w, h: sheet.h, count: sheet.count, cost: costOf(sheet) })),
		pieces: cuts.map(({ part, cut }) => ({
			w: cut.w,
			h: cut.h,
			qty: cut.qty,
			lies: rows.map(({ sheet, offers }) => {
				const [offer, terms] = [offers[part], parts[part]?.terms];
				return offer && terms ? lieOn(cut, sheet, offer.prints, terms) : LIES.never;
			})
		}))
	};
	const sheets = layout.sheets.map(({ sheet, placements, cuts: made, offcuts }) => ({
		sheet: rows.findIndex((row) => row.sheet === sheet),
		cuts: made,
		offcuts,
		placements: placements.map(({ cut, x, y, w, h, turned }) => ({
			piece: cuts.findIndex((known) => known.cut === cut),
			x,
			y,
			w,
			h,
			turned
		}))
	}));
	return checkPlan(problem, { sheets, cost: layout.cost }).length === 0;
}
