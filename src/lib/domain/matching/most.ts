import type { MatchBudget, MatchRequest } from './request';
import { Purse } from './purse';
import { emptyQueue, takeTurn, type Queue } from './queue';

/** The largest set of projects, by key, that can all be made; `proved` where no larger one can. */
export interface AtOnce {
	readonly projects: readonly string[];
	readonly proved: boolean;
}

/**
 * The most at once: of all sets of projects that the stash serves together, now or with a swap, a largest; among
 * equals the one whose projects stand first. Goes through taking and leaving each in turn, and gives up a branch
 * that cannot hold more than the best.
 */
export function mostAtOnce(request: MatchRequest, budget: MatchBudget): AtOnce {
	const { bills, supplies, copies, on, options } = request;
	const purse = new Purse(budget.work, budget.shouldStop);
	let best: readonly string[] = [];
	let proved = true;
	const visit = (place: number, queue: Queue, taken: readonly string[]): void => {
		if (taken.length > best.length) best = taken;
		const bill = bills[place];
		if (!bill || taken.length + bills.length - place <= best.length) return;
		if (purse.isSpent) {
			proved = false;
			return;
		}
		const bench = { options, purse: purse.within(1 / (bills.length - place + 1)), goal: 'least' as const };
		const turn = takeTurn(queue, { bill, copies: copies[bill.key] ?? 1, on }, bench);
		purse.spend(TURN);
		const { verdict } = turn.matched;
		if (verdict === 'now' || verdict === 'swap') visit(place + 1, turn.queue, [...taken, bill.key]);
		if (verdict === 'look') proved = false;
		visit(place + 1, queue, taken);
	};
	visit(0, emptyQueue(supplies, options.kerf), []);
	return { projects: best, proved };
}

/** What a turn costs besides the planner's work. */
const TURN = 1_000;
