/**
 * `npm run bench:match`: ranks 500 bills against a stash of 5,000 rows in one process, cold, then after changes of
 * the kinds that a day at the bench brings. Milliseconds are of processor time, so other work on the machine
 * counts less; `open` is how many projects ran out of work before a plan or a proof that there is none.
 */
import { createMatcher } from '../../src/lib/domain/matching';
import { VERDICTS, type MatchResponse } from '../../src/lib/domain/matching/verdict';
import type { Supply } from '../../src/lib/domain/stash';
import { aRequest, aSheet, inches } from '../factories/stash';
import { billsOf, stashOf } from './match-case';

const supplies = stashOf(5_000, 1);
const bills = billsOf(500, 2);
const budget = { work: bills.length * 50_000 };
const matcher = createMatcher();

const cold = run('cold', supplies);
const used = cold.results.flatMap(({ plan }) => plan?.sheets[0]?.supply ?? [])[0];
const fewer = supplies.map((row) =>
	row.key === used && row.group === 'sheet' ? { ...row, sheets: row.sheets - 1 } : row
);
run('changed: a sheet used', fewer);
const offcut = aSheet('left', { w: inches(4), h: inches(3), offcut: true });
run('changed: an offcut put by', [...fewer, offcut]);
run('changed: a design bought', [...fewer, offcut, aSheet('bought', { sheets: 2 })]);

function run(name: string, rows: readonly Supply[]): MatchResponse {
	const start = process.cpuUsage();
	const response = matcher.match(aRequest({ bills, supplies: rows }), budget);
	const { user, system } = process.cpuUsage(start);
	const { results, anew } = response;
	const verdicts = Object.fromEntries(
		VERDICTS.map((verdict) => [verdict, results.filter((one) => one.verdict === verdict).length])
	);
	const plans = results.flatMap(({ plan }) => plan ?? []);
	const proved = plans.filter(({ proof }) => proof === 'minimum').length;
	const open = results.filter(({ lines }) => lines.some(({ why }) => why?.includes('time given'))).length;
	const ms = Math.round((user + system) / 1000);
	console.log(JSON.stringify({ run: name, ms, anew, ...verdicts, open, plans: plans.length, proved }));
	return response;
}
