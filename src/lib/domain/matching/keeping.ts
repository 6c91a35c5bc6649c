import { answerOf } from './answer';
import { matchEach } from './each';
import type { Matched } from './project';
import type { MatchBudget, MatchRequest } from './request';
import { shelve } from './shelf';
import { isOutOfTime } from './slot-lines';
import { changesBetween, Touching } from './touching';
import type { MatchResponse, ProjectResult } from './verdict';

/** A matcher that remembers one room: what a change cannot touch keeps its answer. */
export interface Matcher {
	/**
	 * The answer in mode `each`. Verdicts, numbers of sheets and proofs are those of a matcher without a memory;
	 * of plans that cost the same, the one that is known stays.
	 */
	readonly match: (request: MatchRequest, budget: MatchBudget) => KeptResponse;
}

export interface KeptResponse extends MatchResponse {
	/** How many projects had to be matched anew. */
	readonly anew: number;
}

interface Kept {
	readonly matched: Matched;
	readonly result: ProjectResult;
	readonly text: string;
}

export function createMatcher(): Matcher {
	let last: { request: MatchRequest; kept: ReadonlyMap<string, Kept> } | null = null;

	const match: Matcher['match'] = (request, budget) => {
		const holds = last ? keptIn(last.request, last.kept, request) : () => null;
		const known = request.bills.map(holds);
		const stale = request.bills.filter((_, i) => !known[i]);
		const shelf = shelve(stale.length > 0 ? request.supplies : [], request.options.kerf);
		const work = Math.floor((budget.work * stale.length) / Math.max(1, request.bills.length));
		const fresh = matchEach({ ...request, bills: stale }, shelf, { ...budget, work }).map((matched): Kept => {
			const tools = request.supplies.flatMap((supply) => (supply.group === 'tool' ? [supply] : []));
			const result = answerOf(matched, matched.layouts, tools, request.options, false);
			return { matched, result, text: textOf(matched.bill, matched.copies) };
		});
		let next = 0;
		const all = known.flatMap((one) => one ?? fresh[next++] ?? []);
		last = { request, kept: new Map(all.map((one) => [one.matched.bill.key, one])) };
		return { unit: '1/320 mm', results: all.map(({ result }) => result), anew: stale.length };
	};
	return { match };
}

/** Says which earlier answers hold for the new request. */
function keptIn(
	before: MatchRequest,
	kept: ReadonlyMap<string, Kept>,
	after: MatchRequest
): (bill: MatchRequest['bills'][number]) => Kept | null {
	const same = before.on === after.on && JSON.stringify(before.options) === JSON.stringify(after.options);
	const changes = same ? changesBetween(before.supplies, after.supplies) : null;
	if (!changes) return () => null;
	const touching = new Touching(before.supplies, after.supplies, after.options);
	return (bill) => {
		const known = kept.get(bill.key);
		if (!known || isOutOfTime(known.matched)) return null;
		if (known.text !== textOf(bill, after.copies[bill.key] ?? 1)) return null;
		return changes.some((change) => touching.touches(known.matched, change)) ? null : known;
	};
}

function textOf(bill: MatchRequest['bills'][number], copies: number): string {
	return JSON.stringify([bill, copies]);
}
