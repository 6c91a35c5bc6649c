import { reachOf } from './assembly';
import type { LaidSheet } from './layout';
import type { Matched, PricedLayout } from './project';
import type { Shelf } from './shelf';
import type { MatchOptions, Plan, PlannedSheet, ProjectResult } from './verdict';
import { wholeSheets } from './whole-sheets';

/** `layouts`: all in which the project's pieces may lie; other projects' pieces may lie there too. */
export function answerOf(
	matched: Matched,
	layouts: readonly PricedLayout[],
	tools: Shelf['tools'],
	options: MatchOptions,
	nowIfFirst: boolean
): ProjectResult {
	const { bill, copies, verdict, after, lines, short, near } = matched;
	const plan = planOf(bill.key, layouts, tools, options);
	return { project: bill.key, copies, verdict, after, nowIfFirst, lines, short, near, plan };
}

function planOf(
	project: string,
	layouts: readonly PricedLayout[],
	tools: Shelf['tools'],
	options: MatchOptions
): Plan | null {
	const own = layouts.filter(({ layout }) => layout.sheets.some((sheet) => isIn(project, sheet)));
	if (own.length === 0) return null;
	const reach = reachOf(tools, options);
	const sheets = wholeSheets(layouts, reach, options)
		.filter(({ sheet }) => sheet.placements.some((placement) => placement.project === project))
		.sort((a, b) => a.order - b.order || a.sheet.nth - b.sheet.nth);
	return { proof: proofOf(own), sheets: sheets.map(({ sheet }) => keptOffcuts(sheet, options)) };
}

function isIn(project: string, { placements }: LaidSheet): boolean {
	return placements.some(({ part }) => part.project === project);
}

function keptOffcuts(sheet: PlannedSheet, { keepOffcut }: MatchOptions): PlannedSheet {
	return { ...sheet, offcuts: sheet.offcuts.filter(({ w, h }) => Math.min(w, h) >= (keepOffcut ?? 0)) };
}

/** Whole sheets that any plan opens, from the bounds on their cost. */
function proofOf(layouts: readonly PricedLayout[]): Plan['proof'] {
	if (layouts.every(({ layout }) => layout.minimum)) return 'minimum';
	const atLeast = layouts.reduce((sum, { layout, dearest }) => sum + Math.ceil(layout.bound[0] / dearest), 0);
	return { atLeast };
}
