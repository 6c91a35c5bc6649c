import type { ConsumableSupply, Supply } from '../stash';
import type { Bench, LaidSheet } from './layout';
import type { Part } from './parts';
import { matchBill, type Matched, type PricedLayout, type Task } from './project';
import { shelfOf, shelve, stockOf, type Shelf, type Stock } from './shelf';
import { isWorse, OUT_OF_TIME, worst } from './slot-lines';
import type { LineResult } from './verdict';
import { areSoundTogether } from './whole-sheets';

/** What the projects so far have promised themselves, and how their sheets are laid out together. */
export interface Queue {
	readonly supplies: readonly Supply[];
	readonly kerf: number;
	readonly layouts: readonly PricedLayout[];
	readonly parts: readonly Part[];
	readonly drawn: ReadonlyMap<string, number>;
}

export interface Turn {
	readonly matched: Matched;
	/** Short only because of what stands before it. */
	readonly nowIfFirst: boolean;
	readonly queue: Queue;
}

export function emptyQueue(supplies: readonly Supply[], kerf: number): Queue {
	return { supplies, kerf, layouts: [], parts: [], drawn: new Map() };
}

/**
 * The next project: from what is left over, else in one layout with those before it, whose sheets may be laid
 * out anew on the terms that they have. What it can be made of it keeps, unless it is short.
 */
export function takeTurn(queue: Queue, task: Omit<Task, 'beside'>, bench: Bench): Turn {
	const left = matchBill({ ...task, beside: [] }, shelfLeft(queue), bench);
	if (left.verdict === 'now' && isSound(queue, left, bench))
		return { matched: left, nowIfFirst: false, queue: promise(queue, left) };
	const alone = matchBill({ ...task, beside: [] }, shelve(queue.supplies, queue.kerf), bench);
	if (!isWorse(left.verdict, alone.verdict)) return kept(queue, left, false, bench);
	const joint = matchBill({ ...task, beside: queue.parts }, shelfWithout(queue), bench);
	const free = relaid(queue, joint);
	if (!isWorse(left.verdict, joint.verdict) || !isSound(free, joint, bench))
		return kept(queue, left, alone.verdict === 'now', bench);
	return { matched: joint, nowIfFirst: false, queue: promise(free, joint) };
}

/** Whether the sheets come apart as the queue and this project cut them together. */
function isSound({ layouts }: Queue, matched: Matched, { options }: Bench): boolean {
	return areSoundTogether([...layouts, ...matched.layouts], matched.layouts, options);
}

function kept(queue: Queue, matched: Matched, nowIfFirst: boolean, bench: Bench): Turn {
	if (matched.verdict === 'short') return { matched, nowIfFirst, queue };
	if (!isSound(queue, matched, bench)) return { matched: unplanned(matched), nowIfFirst: false, queue };
	return { matched, nowIfFirst: false, queue: promise(queue, matched) };
}

/** Without a layout that the checker passes nothing is promised. */
function unplanned(matched: Matched): Matched {
	const lines = matched.lines.map((line): LineResult =>
		line.line.startsWith('slots/')
			? { line: line.line, verdict: 'look', supplies: [], swap: null, why: OUT_OF_TIME }
			: line
	);
	const verdict = worst(lines.map((line) => line.verdict));
	return { ...matched, lines, verdict, after: null, layouts: [], parts: [], drawn: new Map() };
}

function promise(queue: Queue, { layouts, parts, drawn }: Matched): Queue {
	const total = new Map(queue.drawn);
	for (const [key, amount] of drawn) total.set(key, (total.get(key) ?? 0) + amount);
	const known = new Set(queue.parts.map(nameOf));
	const added = parts.filter((part) => !known.has(nameOf(part))).map((part) => ({ ...part, promised: true }));
	return {
		...queue,
		layouts: [...queue.layouts, ...layouts],
		parts: [...queue.parts, ...added],
		drawn: total
	};
}

/** The queue without the layouts whose slots a joint layout took over. */
function relaid(queue: Queue, { parts }: Matched): Queue {
	const taken = new Set(parts.map(nameOf));
	const isTaken = ({ layout }: PricedLayout) =>
		layout.sheets.some(({ placements }) => placements.some(({ part }) => taken.has(nameOf(part))));
	return { ...queue, layouts: queue.layouts.filter((layout) => !isTaken(layout)) };
}

function nameOf({ project, slot }: Part): string {
	return JSON.stringify([project, slot.key]);
}

/** The whole stash, but for the adhesive and the like that is promised. */
function shelfWithout(queue: Queue): Shelf {
	const whole = shelve(queue.supplies, queue.kerf);
	return { ...whole, consumables: whole.consumables.map((supply) => lessened(supply, queue)) };
}

/** What is left over: untouched sheets, remnants of opened ones, and adhesive that nobody was promised. */
export function shelfLeft(queue: Queue): Shelf {
	const opened = sheetsOf(queue);
	const stock = queue.supplies.flatMap((supply, order) => {
		if (supply.group !== 'sheet') return [];
		const nths = new Set(opened.filter(({ sheet }) => sheet.supply.key === supply.key).map(({ nth }) => nth));
		const first = 1 + Math.max(0, ...nths);
		const row = stockOf(supply, order, queue.kerf);
		const gaps = Array.from({ length: first - 1 }, (_, i) => i + 1).filter((nth) => !nths.has(nth));
		return [
			{ ...row, count: row.count - (first - 1), first },
			...gaps.map((nth): Stock => ({ ...row, count: 1, first: nth }))
		];
	});
	const tools = queue.supplies.flatMap((supply) => (supply.group === 'tool' ? [supply] : []));
	const consumables = queue.supplies.flatMap((supply) =>
		supply.group === 'consumable' ? [lessened(supply, queue)] : []
	);
	return shelfOf([...stock, ...remnantsOf(opened)], consumables, tools);
}

function lessened(supply: ConsumableSupply, { drawn }: Queue): ConsumableSupply {
	return { ...supply, left: supply.left - (drawn.get(supply.key) ?? 0) };
}

/** The offcuts that the opened sheets leave, each once: one that was cut from again is replaced by its own. */
function remnantsOf(opened: readonly LaidSheet[]): Stock[] {
	const cutAgain = new Set(
		opened.filter(({ sheet }) => sheet.remnant).map(({ sheet, nth }) => placeOf(sheet, nth))
	);
	const remnants = opened.flatMap(({ sheet, nth, offcuts }) =>
		offcuts.map(({ x, y, w, h }): Stock => ({
			supply: sheet.supply,
			order: sheet.order,
			x: sheet.x + x,
			y: sheet.y + y,
			w,
			h,
			count: 1,
			first: nth,
			remnant: true
		}))
	);
	return remnants.filter((remnant) => !cutAgain.has(placeOf(remnant, remnant.first)));
}

function placeOf(
	{ supply, x, y, w, h }: Omit<Stock, 'count' | 'first' | 'remnant' | 'order'>,
	nth: number
): string {
	return JSON.stringify([supply.key, nth, x, y, w, h]);
}

export function sheetsOf({ layouts }: Queue): LaidSheet[] {
	return layouts.flatMap(({ layout }) => layout.sheets);
}
