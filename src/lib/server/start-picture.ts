import type { ProjectResult } from '../domain/matching/verdict';
import { STARTERS } from '../starter';
import { EXAMPLE_STASH } from '../starter/example';
import { answered } from './answered';
import { today } from './clock';
import { matcher } from './matcher';

/** Far more than it takes, so that a busy machine says the same as an idle one. */
const BUDGET_MS = 10_000;

let worked: Promise<readonly ProjectResult[]> | null = null;

/** What the start page's drawer makes of the starter projects: worked out once by the matcher, as for anybody. */
export function startPicture(): Promise<readonly ProjectResult[]> {
	worked ??= workOut().catch((error) => {
		worked = null;
		throw error;
	});
	return worked;
}

async function workOut(): Promise<readonly ProjectResult[]> {
	const request = {
		projects: STARTERS.map(({ bill }) => bill),
		supplies: EXAMPLE_STASH,
		budgetMs: BUDGET_MS
	};
	const reply = await matcher.ask({ request, today: today() }, BUDGET_MS, 'room');
	return answered(reply).response.results;
}
