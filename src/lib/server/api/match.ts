import type { MatchResponse } from '../../domain/matching/verdict';
import { answered } from '../answered';
import { today } from '../clock';
import { matcher } from '../matcher';

/** A visitor's question may take no longer than this; a larger `budgetMs` counts as this. */
const LONGEST_MS = 10_000;
const USUAL_MS = 2000;

/** Answers a stateless match request off the event loop. @throws {Invalid} with every issue of the document */
export async function answerOf(sent: unknown): Promise<MatchResponse> {
	const request = atMost(sent);
	return answered(await matcher.ask({ request, today: today() }, budgetOf(request))).response;
}

function atMost(sent: unknown): unknown {
	const asked = budgetOf(sent);
	return asked > LONGEST_MS ? { ...(sent as object), budgetMs: LONGEST_MS } : sent;
}

function budgetOf(sent: unknown): number {
	const { budgetMs } = (sent ?? {}) as { budgetMs?: unknown };
	return typeof budgetMs === 'number' && Number.isFinite(budgetMs) ? budgetMs : USUAL_MS;
}
