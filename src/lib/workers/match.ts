import { readMatchRequest, Unreadable, type Issue } from '../domain/exchange';
import { matchProjects, unlocks, whatACutCosts, type Loss, type Unlock } from '../domain/matching';
import type { MatchResponse, Plan } from '../domain/matching/verdict';
import { readStash } from '../domain/stash-row';

/**
 * What a host is sent: a match request as JSON decodes it, and the day it is asked on (YYYY-MM-DD). A room's own
 * supplies come as the text of their rows, in place of the request's.
 */
export interface MatchQuestion {
	readonly request: unknown;
	readonly today: string;
	readonly stash?: string;
	/** Also asks which purchases would turn projects to *now*; takes as long again. */
	readonly unlocks?: boolean;
	/** Asks only what carrying out this plan, for the project of that key, costs the request's other projects. */
	readonly cut?: { readonly project: string; readonly plan: Plan };
}

export type MatchReply =
	| {
			readonly ok: true;
			readonly response: MatchResponse;
			readonly unlocks?: readonly Unlock[];
			readonly losses?: readonly Loss[];
	  }
	| { readonly ok: false; readonly issues: readonly Issue[] };

/** About what a millisecond of an ordinary processor does; only the clock ends a slower one sooner. */
const WORK_PER_MS = 10_000;

/** The one entry point of every host. `stopAfter` starts a clock and says when so many milliseconds are over. */
export function answerMatch(question: MatchQuestion, stopAfter: (ms: number) => () => boolean): MatchReply {
	try {
		const { budgetMs, ...read } = readMatchRequest(question.request, question.today);
		const supplies = question.stash === undefined ? read.supplies : readStash(question.stash);
		const request = { ...read, supplies };
		const budget = () => ({ work: budgetMs * WORK_PER_MS, shouldStop: stopAfter(budgetMs) });
		if (question.cut) {
			const losses = whatACutCosts(request, question.cut.project, question.cut.plan, budget());
			return { ok: true, response: { unit: '1/320 mm', results: [] }, losses };
		}
		const response = matchProjects(request, budget());
		if (!question.unlocks) return { ok: true, response };
		return { ok: true, response, unlocks: unlocks(request, response, budget()) };
	} catch (error) {
		if (error instanceof Unreadable) return { ok: false, issues: error.issues };
		throw error;
	}
}

export function stopByClock(ms: number): () => boolean {
	const end = performance.now() + ms;
	return () => performance.now() >= end;
}
