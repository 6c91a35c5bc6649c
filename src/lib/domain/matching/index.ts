import type { Bill } from '../bill/bill';
import type { MatchBudget, MatchRequest } from './request';
import { answerOf } from './answer';
import { matchBill } from './project';
import { Purse } from './purse';
import { emptyQueue, takeTurn, type Turn } from './queue';
import { shelve } from './shelf';
import { isOutOfTime } from './slot-lines';
import type { MatchResponse, ProjectResult } from './verdict';

export { mostAtOnce, type AtOnce } from './most';
export { whatACutCosts, type Loss } from './losses';
export { DEFAULT_OPTIONS, type MatchBudget, type MatchMode, type MatchRequest } from './request';
export { unlocks, type Unlock } from './unlocks';

/** Says for every project whether it can be made from the stash, what is missing, and how to cut it. */
export function matchProjects(request: MatchRequest, budget: MatchBudget): MatchResponse {
	const results = request.mode === 'queue' ? matchInTurn(request, budget) : matchEach(request, budget);
	return { unit: '1/320 mm', results };
}

function matchEach(
	{ bills, supplies, copies, on, options }: MatchRequest,
	budget: MatchBudget
): ProjectResult[] {
	const shelf = shelve(supplies, options.kerf);
	const purse = new Purse(budget.work, budget.shouldStop);
	const match = (bill: Bill, within: Purse) =>
		matchBill({ bill, copies: copies[bill.key] ?? 1, on, beside: [] }, shelf, {
			options,
			purse: within,
			goal: 'least'
		});
	const first = inShares(bills, purse.within(FIRST), match);
	const hard = bills.filter((_, i) => first[i] && isOutOfTime(first[i]));
	const again = new Map(inShares(hard, purse, match).map((matched) => [matched.bill, matched]));
	return first.map((once) => {
		const matched = again.get(once.bill) ?? once;
		return answerOf(matched, matched.layouts, shelf.tools, options, false);
	});
}

function matchInTurn(
	{ bills, supplies, copies, on, options }: MatchRequest,
	budget: MatchBudget
): ProjectResult[] {
	let queue = emptyQueue(supplies, options.kerf);
	const turns = inShares(bills, new Purse(budget.work, budget.shouldStop), (bill, purse): Turn => {
		const task = { bill, copies: copies[bill.key] ?? 1, on };
		const turn = takeTurn(queue, task, { options, purse, goal: 'least' });
		queue = turn.queue;
		return turn;
	});
	const tools = supplies.flatMap((supply) => (supply.group === 'tool' ? [supply] : []));
	return turns.map(({ matched, nowIfFirst }) => {
		const layouts = matched.verdict === 'short' ? matched.layouts : queue.layouts;
		return answerOf(matched, layouts, tools, options, nowIfFirst);
	});
}

/** Part of the work goes to a first pass over all projects, the rest to those that it left open. */
const FIRST = 1 / 2;

/** Each has an even share of what those before it left, so that a hard one cannot starve the others. */
function inShares<T>(bills: readonly Bill[], purse: Purse, match: (bill: Bill, within: Purse) => T): T[] {
	return bills.map((bill, i) => match(bill, purse.within(1 / (bills.length - i))));
}
