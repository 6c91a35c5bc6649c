// `npm run seeds:check`: shows what the matcher makes of the demonstration room, and fails where the room no longer
// shows all that it is there to show.
import { proofread } from '../src/lib/domain/bill/proofreader';
import { readDocument } from '../src/lib/domain/exchange';
import { readBarcode } from '../src/lib/domain/gtin';
import { INCH } from '../src/lib/domain/length';
import { DEFAULT_OPTIONS, matchProjects, type MatchMode } from '../src/lib/domain/matching';
import { VERDICTS, type ProjectResult } from '../src/lib/domain/matching/verdict';
import { SHEET_KINDS, SUPPLY_MEASURES, TOOL_KINDS } from '../src/lib/domain/stash';
import { bills as documents } from './bills';
import { stash } from './stash';

const today = new Date().toISOString().slice(0, 10);
const rows = stash(today).map(({ supply }) => supply);
const { supplies, bills } = readDocument(
	{ format: 'paperlarder', version: 1, supplies: rows, projects: documents },
	'in'
);

const each = match('each');
const queue = match('queue');
for (const [nth, { project, verdict, plan, short, lines }] of each.entries()) {
	const queued = queue[nth]?.verdict;
	const sheets = plan?.sheets.map(({ supply, nth }) => `${supply}#${nth}`).join(' ') ?? '';
	const proof = plan?.proof === 'minimum' ? 'minimum' : `at least ${plan?.proof.atLeast}`;
	const first = queue[nth]?.nowIfFirst ? ' (now, if moved first)' : '';
	console.log(`${project}: ${verdict}, in the queue ${queued}${first}; ${proof}: ${sheets}`);
	for (const line of lines)
		if (line.verdict !== 'now') console.log(`    ${line.line}: ${line.verdict} ${line.why ?? ''}`);
	for (const lack of short) console.log(`    short: ${JSON.stringify(lack)}`);
}

const findings = bills.flatMap((bill) => proofread(bill).map(({ rule }) => `${bill.key}: ${rule}`));
console.log(findings.join('\n'));

const kinds = new Set(supplies.map(({ kind }) => kind));
const shown: Record<string, boolean> = {
	'eighty supplies': supplies.length >= 80,
	'every kind': [...SHEET_KINDS, ...Object.keys(SUPPLY_MEASURES), ...TOOL_KINDS].every((kind) =>
		kinds.has(kind as never)
	),
	'barcodes kept for examples, with right check digits': rows.every(
		({ barcode }) => barcode === undefined || (barcode.startsWith('952') && readBarcode(barcode).ok)
	),
	'ten projects': bills.length >= 10,
	...Object.fromEntries(
		VERDICTS.map((verdict) => [`verdict ${verdict}`, each.some((one) => one.verdict === verdict)])
	),
	'a line met by a swap': each.some(({ lines }) => lines.some(({ swap }) => swap !== null)),
	'a proofreader’s finding, in the draft only':
		findings.length > 0 && findings.every((found) => found.startsWith('parcel-tags')),
	'a face that is lost': each.some(losesAFace),
	'a sheet that two projects share': sharesASheet(queue),
	'no two pieces in one place': ![...each, ...queue].some(overlaps),
	'a contention in the queue': queue.some(({ nowIfFirst }) => nowIfFirst)
};
const missing = Object.entries(shown).filter(([, there]) => !there);
console.log(
	missing.length === 0
		? 'The room shows all it should.'
		: `Not shown: ${missing.map(([what]) => what).join('; ')}.`
);
process.exitCode = missing.length === 0 ? 0 : 1;

function match(mode: MatchMode): readonly ProjectResult[] {
	const options = { ...DEFAULT_OPTIONS, reach: 12.25 * INCH, keepOffcut: INCH };
	return matchProjects({ bills, supplies, mode, copies: {}, on: today, options }, { work: 200_000_000 })
		.results;
}

function overlaps({ plan }: ProjectResult): boolean {
	return (plan?.sheets ?? []).some(({ placements }) =>
		placements.some((a, nth) =>
			placements
				.slice(nth + 1)
				.some((b) => a.x < b.x + b.w && b.x < a.x + a.w && a.y < b.y + b.h && b.y < a.y + a.h)
		)
	);
}

function losesAFace({ plan }: ProjectResult): boolean {
	const twoFaced = supplies.flatMap((supply) =>
		supply.group === 'sheet' && supply.faces.length === 2 ? supply.key : []
	);
	return plan?.sheets.some(({ supply }) => twoFaced.includes(supply)) ?? false;
}

function sharesASheet(results: readonly ProjectResult[]): boolean {
	return results.some(({ plan }) =>
		plan?.sheets.some(({ placements }) => new Set(placements.map(({ project }) => project)).size > 1)
	);
}
