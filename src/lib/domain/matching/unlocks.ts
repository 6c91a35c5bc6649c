import type { Bill, ConsumableNeed } from '../bill/bill';
import type { Length } from '../length';
import type { ConsumableSupply, SheetSupply, Supply, ToolSupply } from '../stash';
import { matchBill } from './project';
import { Purse } from './purse';
import type { MatchBudget, MatchRequest } from './request';
import { shelve } from './shelf';
import type { MatchResponse, ProjectResult, Shortage } from './verdict';

/** One purchase and the projects, by key, that it alone turns to *now*. */
export interface Unlock {
	/** What is bought, as it would stand in the stash. */
	readonly buy: Supply;
	readonly projects: readonly string[];
}

/**
 * For every single thing that a short project lacks: the projects that it would turn to *now*, most first.
 * `response` is the request's answer in mode `each`. The amount is what the neediest of those projects lacks.
 */
export function unlocks(request: MatchRequest, response: MatchResponse, budget: MatchBudget): Unlock[] {
	const short = request.bills.flatMap((bill) => {
		const result = response.results.find(({ project }) => project === bill.key);
		return result?.verdict === 'short' ? [{ bill, result }] : [];
	});
	const things = new Map<string, Supply>();
	for (const { bill, result } of short) {
		for (const shortage of result.short) {
			for (const thing of thingsFor(bill, result, shortage, request.supplies)) {
				const key = nameOf(thing);
				things.set(key, larger(things.get(key), thing));
			}
		}
	}
	const tries = [...things.values()].map((buy) => ({
		buy,
		helped: short.filter(({ bill, result }) => couldHelp(buy, bill, result))
	}));
	const total = tries.reduce((sum, { helped }) => sum + helped.length, 0);
	return tries
		.map(({ buy, helped }): Unlock => {
			const shelf = shelve([...request.supplies, buy], request.options.kerf);
			const projects = helped.flatMap(({ bill }) => {
				const task = { bill, copies: request.copies[bill.key] ?? 1, on: request.on, beside: [] };
				const bench = { options: request.options, purse: Purse.of(budget, total), goal: 'any' as const };
				return matchBill(task, shelf, bench).verdict === 'now' ? [bill.key] : [];
			});
			return { buy, projects };
		})
		.filter(({ projects }) => projects.length > 0)
		.sort((a, b) => b.projects.length - a.projects.length);
}

/** Every line that isn't met now asks for what is bought: otherwise this purchase alone can't be enough. */
function couldHelp(buy: Supply, bill: Bill, { lines }: ProjectResult): boolean {
	return lines
		.filter(({ verdict }) => verdict !== 'now')
		.every(({ line }) => {
			const [area, key] = [line.slice(0, line.indexOf('/')), line.slice(line.indexOf('/') + 1)];
			if (area === 'slots')
				return bill.slots.some((slot) => slot.key === key && slot.material.kind === buy.kind);
			if (area === 'tools') return buy.group === 'tool';
			return needOf(bill, line)?.kind === buy.kind;
		});
}

/** A slot of one design that has some of it wants more of the same; any other wants a sheet of that size. */
function thingsFor(
	bill: Bill,
	result: ProjectResult,
	shortage: Shortage,
	supplies: readonly Supply[]
): Supply[] {
	if ('sheets' in shortage) {
		const slot = bill.slots.find(({ key }) => `slots/${key}` === shortage.line);
		const used = result.lines.find(({ line }) => line === shortage.line)?.supplies ?? [];
		return shortage.sheets.flatMap(({ w, h, count }) => [
			...supplies.flatMap((supply) =>
				supply.group === 'sheet' && used.includes(supply.key) && supply.w === w && supply.h === h
					? [{ ...supply, ...MORE, sheets: count }]
					: []
			),
			...(slot ? [boughtSheets(slot, w, h, count)] : [])
		]);
	}
	if ('tool' in shortage) return boughtTools(bill, shortage.line, shortage.tool);
	const need = needOf(bill, shortage.line);
	return need ? [boughtConsumable(need, shortage.amount)] : [];
}

function needOf(bill: Bill, line: string): ConsumableNeed | undefined {
	return (
		bill.adhesives.find(({ key }) => `adhesives/${key}` === line) ??
		bill.extras.find(({ key }) => `extras/${key}` === line)
	);
}

const MORE = { key: '+', arrives: null, count: 'counted', offcut: false } as const;
const BOUGHT = { key: '+', collection: null, bin: null, barcode: null, price: null, arrives: null } as const;

function boughtSheets(
	{ material, design, collection }: Bill['slots'][number],
	w: Length,
	h: Length,
	sheets: number
): SheetSupply {
	return {
		...BOUGHT,
		group: 'sheet',
		kind: material.kind,
		name: design ?? '',
		collection,
		w,
		h,
		unit: 'in',
		sheets,
		count: 'counted',
		faces: [],
		weight: material.weight?.min ?? material.weight?.max ?? null,
		caliper: material.caliper?.min ?? material.caliper?.max ?? null,
		colours: [],
		offcut: false,
		strip: null
	};
}

function boughtConsumable({ kind, width }: ConsumableNeed, left: number): ConsumableSupply {
	return {
		...BOUGHT,
		group: 'consumable',
		kind,
		name: '',
		width,
		left,
		full: null,
		unit: 'in',
		count: 'counted'
	};
}

function boughtTools(bill: Bill, line: string, kind: string): ToolSupply[] {
	const need = bill.tools.find(({ key }) => `tools/${key}` === line);
	const able = need ?? {
		kind: kind as ToolSupply['kind'],
		shape: null,
		size: null,
		reach: null,
		grooves: null,
		cuts: ['board' as const]
	};
	const scored = bill.pieces.filter(({ scores }) => scores.length > 0).flatMap(({ w, h }) => [w, h]);
	const reach = Math.max(able.reach ?? 0, able.kind === 'scoring-board' ? Math.max(0, ...scored) : 0);
	const { shape, size, cuts } = able;
	const grooves = able.grooves ?? (able.kind === 'scoring-board' ? 1 : null);
	return [
		{
			...BOUGHT,
			group: 'tool',
			kind: able.kind,
			name: '',
			reach: reach > 0 ? reach : null,
			grooves,
			shape,
			size,
			cuts,
			lentUntil: null,
			borrowedUntil: null
		}
	];
}

/** What makes two purchases the same thing, whatever the amount. */
function nameOf(thing: Supply): string {
	if (thing.group === 'sheet') {
		const { kind, name, collection, w, h, weight, caliper } = thing;
		return JSON.stringify([kind, name, collection, w, h, weight?.gsm, caliper]);
	}
	if (thing.group === 'consumable') return JSON.stringify([thing.kind, thing.width]);
	const { kind, shape, size, cuts } = thing;
	return JSON.stringify([kind, shape, size, cuts]);
}

function larger(known: Supply | undefined, thing: Supply): Supply {
	if (!known) return thing;
	if (known.group === 'sheet' && thing.group === 'sheet')
		return { ...thing, sheets: Math.max(known.sheets, thing.sheets) };
	if (known.group === 'consumable' && thing.group === 'consumable')
		return { ...thing, left: Math.max(known.left, thing.left) };
	if (known.group === 'tool' && thing.group === 'tool')
		return { ...thing, reach: Math.max(known.reach ?? 0, thing.reach ?? 0) || null };
	return thing;
}
