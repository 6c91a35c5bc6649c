/** `npm run bench:match`: ranks 500 bills against a stash of 5,000 rows, cold, in one process. */
import { matchProjects } from '../../src/lib/domain/matching';
import { VERDICTS, type MatchResponse } from '../../src/lib/domain/matching/verdict';
import { aRequest } from '../factories/stash';
import { billsOf, stashOf } from './match-case';

const supplies = stashOf(5_000, 1);
const bills = billsOf(500, 2);
const work = 500 * 20_000;

const start = performance.now();
const response = matchProjects(aRequest({ bills, supplies }), { work });
report('cold', performance.now() - start, response);

function report(name: string, ms: number, { results }: MatchResponse): void {
	const verdicts = Object.fromEntries(
		VERDICTS.map((verdict) => [verdict, results.filter((one) => one.verdict === verdict).length])
	);
	const plans = results.flatMap(({ plan }) => plan ?? []);
	const proved = plans.filter(({ proof }) => proof === 'minimum').length;
	console.log(JSON.stringify({ run: name, ms: Math.round(ms), ...verdicts, plans: plans.length, proved }));
}
