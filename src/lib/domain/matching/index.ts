import type { MatchBudget, MatchRequest } from './request';
import { answerOf } from './answer';
import { matchBill } from './project';
import { Purse } from './purse';
import { shelve } from './shelf';
import type { MatchResponse } from './verdict';

export type { MatchBudget, MatchMode, MatchRequest } from './request';
export { DEFAULT_OPTIONS } from './request';

/** Says for every project whether it can be made from the stash, what is missing, and how to cut it. */
export function matchProjects(request: MatchRequest, budget: MatchBudget): MatchResponse {
	const { bills, supplies, copies, on, options } = request;
	const shelf = shelve(supplies, options.kerf);
	const results = bills.map((bill) => {
		const bench = { options, purse: Purse.of(budget, bills.length), goal: 'least' as const };
		return answerOf(matchBill(bill, copies[bill.key] ?? 1, shelf, on, bench), shelf, options);
	});
	return { unit: '1/320 mm', results };
}
