import { plannedSheet, reachOf } from './assembly';
import type { Matched } from './project';
import type { Shelf } from './shelf';
import type { MatchOptions, Plan, ProjectResult } from './verdict';

export function answerOf(
	matched: Matched,
	shelf: Shelf,
	options: MatchOptions,
	nowIfFirst = false
): ProjectResult {
	const { bill, copies, verdict, after, lines, short, near } = matched;
	return {
		project: bill.key,
		copies,
		verdict,
		after,
		nowIfFirst,
		lines,
		short,
		near,
		plan: planOf(matched, shelf, options)
	};
}

function planOf({ layouts }: Matched, shelf: Shelf, options: MatchOptions): Plan | null {
	const laid = layouts.flatMap(({ layout }) => layout.sheets);
	if (laid.length === 0) return null;
	const reach = reachOf(shelf.tools, options);
	const sheets = [...laid]
		.sort((a, b) => a.sheet.order - b.sheet.order || a.nth - b.nth)
		.map((sheet) => plannedSheet(sheet, reach, options));
	return { proof: proofOf(layouts), sheets };
}

/** Whole sheets that any plan opens, from the bounds on their cost. */
function proofOf(layouts: Matched['layouts']): Plan['proof'] {
	if (layouts.every(({ layout }) => layout.minimum)) return 'minimum';
	const atLeast = layouts.reduce((sum, { layout, dearest }) => sum + Math.ceil(layout.bound[0] / dearest), 0);
	return { atLeast };
}
