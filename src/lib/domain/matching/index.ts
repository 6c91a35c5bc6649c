import type { MatchBudget, MatchRequest } from './request';
import { answerOf } from './answer';
import type { Bench } from './layout';
import { matchBill } from './project';
import { Purse } from './purse';
import { emptyQueue, takeTurn, type Turn } from './queue';
import { shelve } from './shelf';
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
	return bills.map((bill) => {
		const task = { bill, copies: copies[bill.key] ?? 1, on, beside: [] };
		const matched = matchBill(task, shelf, benchFor(options, budget, bills.length));
		return answerOf(matched, matched.layouts, shelf.tools, options, false);
	});
}

function matchInTurn(
	{ bills, supplies, copies, on, options }: MatchRequest,
	budget: MatchBudget
): ProjectResult[] {
	let queue = emptyQueue(supplies, options.kerf);
	const turns = bills.map((bill): Turn => {
		const task = { bill, copies: copies[bill.key] ?? 1, on };
		const turn = takeTurn(queue, task, benchFor(options, budget, bills.length));
		queue = turn.queue;
		return turn;
	});
	const tools = supplies.flatMap((supply) => (supply.group === 'tool' ? [supply] : []));
	return turns.map(({ matched, nowIfFirst }) => {
		const layouts = matched.verdict === 'short' ? matched.layouts : queue.layouts;
		return answerOf(matched, layouts, tools, options, nowIfFirst);
	});
}

function benchFor(options: MatchRequest['options'], budget: MatchBudget, projects: number): Bench {
	return { options, purse: Purse.of(budget, projects), goal: 'least' };
}
