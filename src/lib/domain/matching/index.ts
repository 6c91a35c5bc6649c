import type { MatchBudget, MatchRequest } from './request';
import { answerOf } from './answer';
import { inShares, matchEach } from './each';
import { Purse } from './purse';
import { emptyQueue, takeTurn, type Turn } from './queue';
import { shelve } from './shelf';
import type { MatchResponse, ProjectResult } from './verdict';

export { createMatcher, type Matcher } from './keeping';
export { mostAtOnce, type AtOnce } from './most';
export { whatACutCosts, type Loss } from './losses';
export { DEFAULT_OPTIONS, type MatchBudget, type MatchMode, type MatchRequest } from './request';
export { unlocks, type Unlock } from './unlocks';

/** Says for every project whether it can be made from the stash, what is missing, and how to cut it. */
export function matchProjects(request: MatchRequest, budget: MatchBudget): MatchResponse {
	const results = request.mode === 'queue' ? matchInTurn(request, budget) : matchAll(request, budget);
	return { unit: '1/320 mm', results };
}

function matchAll(request: MatchRequest, budget: MatchBudget): ProjectResult[] {
	const shelf = shelve(request.supplies, request.options.kerf);
	return matchEach(request, shelf, budget).map((matched) =>
		answerOf(matched, matched.layouts, shelf.tools, request.options, false)
	);
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
	return turns.map(({ matched, nowIfFirst, queue: atItsTurn }) => {
		const layouts = matched.verdict === 'short' ? [...atItsTurn.layouts, ...matched.layouts] : queue.layouts;
		return answerOf(matched, layouts, tools, options, nowIfFirst);
	});
}
