/**
 * Plans published and everyday instances and reports how near each plan comes to the best known:
 *     npm run bench:cutting -- DIR --budget-ms 200 [--only craft|2bp|knapsack] [--match TEXT] [--clock cpu]
 * DIR holds 2bp.json, craft.json and knapsack.json. One JSON line per instance, then one per family. On a machine
 * that others use too, `--clock cpu` counts this process's own time instead of the wall clock's.
 */
import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { performance } from 'node:perf_hooks';
import { parseArgs } from 'node:util';
import {
	bestOfSheet,
	checkPlan,
	countCuts,
	fenceSettings,
	largestLeftover,
	planCuts
} from '../../src/lib/domain/cutting';
import type { CutPlan, CutProblem, Lie, PieceKind, SheetKind } from '../../src/lib/domain/cutting/problem';

interface Instance {
	readonly name: string;
	readonly family: string;
	readonly problem: CutProblem;
	readonly bestKnown: number;
	readonly proven: boolean;
	/** For knapsack instances, the worth of each piece: then `bestKnown` and `cost` are values. */
	readonly values?: readonly number[];
}

interface Item {
	readonly w: number;
	readonly h: number;
	readonly qty: number;
	readonly rot?: boolean;
}

interface Packing {
	readonly name: string;
	readonly class: number;
	readonly n: number;
	readonly bin: { readonly w: number; readonly h: number };
	readonly items: readonly Item[];
	readonly bestKnown: Readonly<Record<string, number>>;
	readonly provenOptimal: Readonly<Record<string, boolean>>;
}

interface Craft {
	readonly name: string;
	readonly materials: readonly {
		readonly sheets: readonly {
			readonly w: number;
			readonly h: number;
			readonly count: number;
			readonly cost: number;
		}[];
		readonly items: readonly Item[];
		readonly bestKnown: { readonly cost: number; readonly provenOptimal: boolean };
	}[];
}

const { values, positionals } = parseArgs({
	allowPositionals: true,
	options: {
		'budget-ms': { type: 'string', default: '200' },
		only: { type: 'string', default: '' },
		match: { type: 'string', default: '' },
		clock: { type: 'string', default: 'wall' }
	}
});
const [directory] = positionals;
if (!directory) throw new Error('name the directory that holds 2bp.json, craft.json and knapsack.json');
const budgetMs = Number(values['budget-ms']);

function now(): number {
	if (values.clock !== 'cpu') return performance.now();
	const { user, system } = process.cpuUsage();
	return (user + system) / 1000;
}

const read = <T>(file: string): T => JSON.parse(readFileSync(join(directory, file), 'utf8')) as T;

function piecesOf(
	items: readonly Item[],
	sheets: readonly SheetKind[],
	lie: (item: Item) => Lie
): PieceKind[] {
	return items.map((item) => ({ w: item.w, h: item.h, qty: item.qty, lies: sheets.map(() => lie(item)) }));
}

function packings(): Instance[] {
	return read<Packing[]>('2bp.json').flatMap((packing) =>
		(['R', 'O'] as const).map((variant): Instance => {
			const sheets: SheetKind[] = [{ ...packing.bin, count: Infinity, cost: [1, 0] }];
			return {
				name: `${packing.name}/${variant}`,
				family: `2bp ${variant === 'R' ? 'turnable' : 'oriented'}`,
				problem: {
					sheets,
					pieces: piecesOf(packing.items, sheets, () => (variant === 'R' ? 3 : 1)),
					kerf: 0
				},
				bestKnown: packing.bestKnown[`2BP|${variant}|G`] ?? NaN,
				proven: packing.provenOptimal[`2BP|${variant}|G`] ?? false
			};
		})
	);
}

function crafts(): Instance[] {
	return read<Craft[]>('craft.json').flatMap(({ name, materials }) =>
		materials.map((material, nth): Instance => {
			const sheets = material.sheets.map(({ w, h, count, cost }): SheetKind => ({
				w,
				h,
				count,
				cost: [cost, 0]
			}));
			return {
				name: `${name}/${nth}`,
				family: 'craft',
				problem: { sheets, pieces: piecesOf(material.items, sheets, ({ rot }) => (rot ? 3 : 1)), kerf: 0 },
				bestKnown: material.bestKnown.cost,
				proven: material.bestKnown.provenOptimal
			};
		})
	);
}

interface Knapsack {
	readonly name: string;
	readonly bin: { readonly w: number; readonly h: number };
	readonly items: readonly (Item & { readonly value: number })[];
	readonly bestKnown: Readonly<Record<string, number>>;
}

function knapsacks(): Instance[] {
	return read<Knapsack[]>('knapsack.json').flatMap(({ name, bin, items, bestKnown }) =>
		Object.entries(bestKnown).map(([variant, value]): Instance => {
			const sheets: SheetKind[] = [{ ...bin, count: 1, cost: [1, 0] }];
			const copies = ({ w, h, qty }: Item) =>
				variant.startsWith('constrained') ? qty : Math.floor((bin.w * bin.h) / (w * h));
			const wanted = items.map((item) => ({ ...item, qty: copies(item) }));
			return {
				name: `${name}/${variant}`,
				family: 'knapsack',
				problem: { sheets, pieces: piecesOf(wanted, sheets, () => (variant.endsWith('R') ? 3 : 1)), kerf: 0 },
				bestKnown: value,
				proven: true,
				values: items.map((item) => item.value)
			};
		})
	);
}

interface Line {
	readonly name: string;
	readonly sheets: number;
	readonly cost: number;
	readonly lowerBound: number;
	readonly proved: boolean;
	readonly ms: number;
	readonly valid: boolean;
	readonly cuts: number;
	readonly fences: number;
	readonly leftover: number;
}

function run({ name, problem, bestKnown, values: worth }: Instance): Line & { bestKnown: number } {
	const started = now();
	const shouldStop = () => now() - started >= budgetMs;
	if (worth) {
		const { value, counts, plan, proved } = bestOfSheet(problem, worth, { work: Infinity, shouldStop });
		const ms = Math.round((now() - started) * 10) / 10;
		const cut = { ...problem, pieces: problem.pieces.map((piece, p) => ({ ...piece, qty: counts[p] ?? 0 })) };
		const found = { name, sheets: 1, cost: value, lowerBound: value, proved, ms, bestKnown };
		return { ...found, valid: checkPlan(cut, plan).length === 0, ...shape(plan) };
	}
	const answer = planCuts(problem, { work: Infinity, shouldStop });
	const ms = Math.round((now() - started) * 10) / 10;
	if (answer.status !== 'planned') {
		const none = { sheets: 0, cost: NaN, proved: false, valid: false, cuts: 0, fences: 0, leftover: 0 };
		return { name, ...none, lowerBound: answer.bound[0], ms, bestKnown };
	}
	const { plan } = answer;
	return {
		name,
		sheets: plan.sheets.length,
		cost: plan.cost[0],
		lowerBound: answer.bound[0],
		proved: answer.minimum,
		ms,
		valid: checkPlan(problem, plan).length === 0,
		...shape(plan),
		bestKnown
	};
}

function shape(plan: CutPlan) {
	return { cuts: countCuts(plan), fences: fenceSettings(plan), leftover: largestLeftover(plan) };
}

function median(numbers: readonly number[]): number {
	const sorted = [...numbers].sort((a, b) => a - b);
	return sorted[Math.floor(sorted.length / 2)] ?? NaN;
}

function totals(family: string, instances: readonly Instance[], lines: readonly Line[]) {
	const sum = (of: (line: Line, instance: Instance) => number) =>
		lines.reduce((total, line, i) => total + of(line, instances[i] as Instance), 0);
	const bestKnown = sum((_, instance) => instance.bestKnown);
	const cost = sum((line) => line.cost);
	const small = lines.filter((_, i) => {
		const instance = instances[i] as Instance;
		return instance.proven && instance.problem.pieces.reduce((n, { qty }) => n + qty, 0) <= 30;
	});
	return {
		family,
		instances: lines.length,
		sheets: sum((line) => line.sheets),
		cost,
		bestKnown,
		overPercent: Math.round((cost / bestKnown - 1) * 100_000) / 1000,
		atBestKnown: sum((line, { bestKnown, values: worth }) =>
			(worth ? line.cost >= bestKnown : line.cost <= bestKnown) ? 1 : 0
		),
		lowerBound: sum((line) => line.lowerBound),
		proved: sum((line) => (line.proved ? 1 : 0)),
		provedUpTo30: `${small.filter((line) => line.proved).length} of ${small.length}`,
		medianMs: median(lines.map((line) => line.ms)),
		invalid: sum((line) => (line.valid ? 0 : 1)),
		cuts: sum((line) => line.cuts),
		fences: sum((line) => line.fences),
		leftover: sum((line) => line.leftover)
	};
}

const wanted = (family: string) => family.startsWith(values.only);
const all = [
	...(wanted('craft') ? crafts() : []),
	...(wanted('2bp') ? packings() : []),
	...(wanted('knapsack') ? knapsacks() : [])
].filter(({ name }) => name.includes(values.match));
const families = new Map<string, Instance[]>();
for (const instance of all)
	families.set(instance.family, [...(families.get(instance.family) ?? []), instance]);
const summaries = [...families].map(([family, instances]) => {
	const lines = instances.map((instance) => {
		const line = run(instance);
		console.log(JSON.stringify(line));
		return line;
	});
	return totals(family, instances, lines);
});
for (const summary of summaries) console.log(JSON.stringify(summary));
