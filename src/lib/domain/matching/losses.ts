import type { MatchBudget, MatchRequest } from './request';
import { matchBill } from './project';
import { Purse } from './purse';
import { shelve } from './shelf';
import { isWorse } from './slot-lines';
import type { Plan, Verdict } from './verdict';

/** A planned project that a cut would set back: it loses the other face of a sheet, or the last sheet. */
export interface Loss {
	readonly project: string;
	readonly supply: string;
	readonly loses: 'other-face' | 'last-sheet';
	readonly from: Verdict;
	readonly to: Verdict;
}

/** What carrying out `plan` for `project` costs the other projects of the request, each with the whole stash. */
export function whatACutCosts(
	request: MatchRequest,
	project: string,
	plan: Plan,
	budget: MatchBudget
): Loss[] {
	const { bills, supplies, copies, on, options } = request;
	const opened = new Map<string, number>();
	for (const { supply } of plan.sheets) opened.set(supply, (opened.get(supply) ?? 0) + 1);
	const after = supplies.map((supply) =>
		supply.group === 'sheet'
			? { ...supply, sheets: Math.max(0, supply.sheets - (opened.get(supply.key) ?? 0)) }
			: supply
	);
	const [whole, rest] = [shelve(supplies, options.kerf), shelve(after, options.kerf)];
	return bills.flatMap((bill): Loss[] => {
		if (bill.key === project) return [];
		const task = { bill, copies: copies[bill.key] ?? 1, on, beside: [] };
		const bench = () => ({ options, purse: Purse.of(budget, 2 * bills.length), goal: 'least' as const });
		const before = matchBill(task, whole, bench());
		const used = before.layouts
			.flatMap(({ layout }) => layout.sheets)
			.filter(({ sheet }) => opened.has(sheet.supply.key));
		const [first] = used;
		if (!first || before.verdict === 'short') return [];
		const { verdict } = matchBill(task, rest, bench());
		if (!isWorse(verdict, before.verdict)) return [];
		const supply = first.sheet.supply.key;
		const cut = plan.sheets
			.filter((sheet) => sheet.supply === supply)
			.flatMap(({ placements }) => placements);
		const shown = new Set(cut.map(({ face }) => face));
		const otherFace = first.placements.some(({ print }) => !shown.has(print.face));
		return [
			{
				project: bill.key,
				supply,
				loses: otherFace ? 'other-face' : 'last-sheet',
				from: before.verdict,
				to: verdict
			}
		];
	});
}
