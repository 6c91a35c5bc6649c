import type { Bill } from '../bill/bill';
import { matchBill, type Matched } from './project';
import { Purse } from './purse';
import type { MatchBudget, MatchRequest } from './request';
import type { Shelf } from './shelf';
import { isOutOfTime } from './slot-lines';

/** Every bill against the whole stash. */
export function matchEach(
	{ bills, copies, on, options }: MatchRequest,
	shelf: Shelf,
	budget: MatchBudget
): Matched[] {
	const purse = new Purse(budget.work, budget.shouldStop);
	const match = (bill: Bill, within: Purse) =>
		matchBill({ bill, copies: copies[bill.key] ?? 1, on, beside: [] }, shelf, {
			options,
			purse: within,
			goal: 'least'
		});
	const first = inShares(bills, purse.within(FIRST), match);
	const hard = first.filter(isOutOfTime).map(({ bill }) => bill);
	const again = new Map(inShares(hard, purse, match).map((matched) => [matched.bill, matched]));
	return first.map((once) => again.get(once.bill) ?? once);
}

/** Part of the work goes to a first pass over all projects, the rest to those that it left open. */
const FIRST = 1 / 2;

/** Each has an even share of what those before it left, so that a hard one cannot starve the others. */
export function inShares<T>(
	bills: readonly Bill[],
	purse: Purse,
	match: (bill: Bill, within: Purse) => T
): T[] {
	return bills.map((bill, i) => match(bill, purse.within(1 / (bills.length - i))));
}
