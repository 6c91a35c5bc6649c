import type { Bill } from '../bill/bill';
import { componentsOf, type Seat } from './components';
import { costsOf, dearestOf } from './costs';
import { drawConsumables } from './consumables';
import type { Bench, CostOf, Layout } from './layout';
import { isCutAlready } from './lies';
import { nearMisses } from './near';
import { partsOf, type Part, type Terms } from './parts';
import { findPapers } from './papers';
import { shelfUntil, type Shelf } from './shelf';
import { lackOf } from './shortage';
import { isWorse, lineOf, OUT_OF_TIME, slotLine, worst } from './slot-lines';
import { toolLine, toolLineOn } from './tool-lines';
import { BOARD_CUT, cutsOf, demandsOf, toolDates, type Demand } from './tools';
import type { LineResult, NearMiss, Shortage, Verdict } from './verdict';

/** A project against a stash: everything that its answer and a queue need to know. */
export interface Matched {
	readonly bill: Bill;
	readonly copies: number;
	readonly verdict: Verdict;
	readonly after: string | null;
	readonly lines: readonly LineResult[];
	readonly short: readonly Shortage[];
	readonly near: readonly NearMiss[];
	readonly layouts: readonly PricedLayout[];
	/** The slots with paper, on the terms on which they found it. */
	readonly parts: readonly Part[];
	/** What each row of consumables gives, by its key. */
	readonly drawn: ReadonlyMap<string, number>;
}

export interface PricedLayout {
	readonly layout: Layout;
	/** Cost of the dearest sheet that could have been opened: turns a bound on costs into one on sheets. */
	readonly dearest: number;
}

/** What is to be matched. `beside`: slots of other projects that keep what they have, wherever it is laid. */
export interface Task {
	readonly bill: Bill;
	readonly copies: number;
	readonly on: string;
	readonly beside: readonly Part[];
}

/** Matches one bill. `until`: nothing that comes later than this day counts; null where any wait will do. */
export function matchBill(task: Task, shelf: Shelf, bench: Bench, until: string | null = null): Matched {
	const { bill, copies, on, beside } = task;
	const stock = until === null ? shelf : shelfUntil(shelf, until);
	const all = componentsOf([...beside, ...partsOf(bill, copies, on)], stock);
	const seats = all.filter((component) => component.some(({ part }) => !part.promised));
	const demands = demandsOf(bill);
	const board = boardLine(demands, stock, on, until);
	const found = seats.map((component) => findComponent(component, on, board.line, bench));
	const needsBoardCut = !board.listed && found.some(({ cutsBoard }) => cutsBoard);
	const asked = needsBoardCut ? [...demands, BOARD_CUT] : demands;
	const consumables = drawConsumables(bill, copies, stock.consumables, on);
	const lines = inBillsOrder(bill, [
		...found.flatMap((papers) => papers.lines),
		...consumables.lines,
		...asked.map((demand) => toolLine(demand, stock.tools, on, until))
	]);
	const matched = {
		bill,
		copies,
		verdict: worst(lines.map(({ verdict }) => verdict)),
		after: null,
		lines,
		short: [...found.flatMap(({ short }) => short), ...consumables.short, ...toolShortages(lines, asked)],
		near: found.flatMap(({ near }) => near),
		layouts: found.flatMap(({ layout }) => layout ?? []),
		parts: found.flatMap(({ parts }) => parts),
		drawn: consumables.drawn
	};
	return matched.verdict === 'short' ? matched : onOneDay(matched, asked, task, shelf, bench, until);
}

/** The earliest day on which every line holds; a project without one is short, unless a look today could spare the wait. */
function onOneDay(
	matched: Matched,
	demands: readonly Demand[],
	task: Task,
	shelf: Shelf,
	bench: Bench,
	until: string | null
): Matched {
	const { on } = task;
	const waits = matched.lines.flatMap(({ after }) => after ?? []).sort();
	const earliest = waits.at(-1);
	if (earliest === undefined) return matched;
	const days = [
		earliest,
		...toolDates(shelf.tools, earliest).filter((day) => until === null || day <= until)
	];
	for (const day of days) {
		const lines = linesOn(matched.lines, demands, shelf, day, on);
		const verdict = worst(lines.map((line) => line.verdict));
		if (verdict !== 'short') return { ...matched, lines, verdict, after: verdict === 'after' ? day : null };
	}
	if (until === null) {
		for (const sooner of [on, ...waits.filter((day) => day < earliest)]) {
			const instead = matchBill(task, shelf, bench, sooner);
			if (instead.verdict !== 'short') return instead;
		}
	}
	const lines = linesOn(matched.lines, demands, shelf, earliest, on);
	return { ...matched, lines, verdict: 'short', short: [...matched.short, ...toolShortages(lines, demands)] };
}

function linesOn(
	lines: readonly LineResult[],
	demands: readonly Demand[],
	shelf: Shelf,
	day: string,
	today: string
): LineResult[] {
	return lines.map((line) => {
		const demand = demands.find((one) => one.line === line.line);
		return demand ? toolLineOn(line, demand, shelf.tools, day, today) : line;
	});
}

function toolShortages(lines: readonly LineResult[], demands: readonly Demand[]): Shortage[] {
	return lines.flatMap(({ line, verdict }) => {
		const demand = demands.find((one) => one.line === line);
		return demand && verdict === 'short' ? [{ line, tool: demand.kind ?? 'craft-knife' }] : [];
	});
}

/** `listed`: a line of the bill's brings the tool that cuts board; otherwise `line` says how one is to be had. */
function boardLine(
	demands: readonly Demand[],
	shelf: Shelf,
	on: string,
	until: string | null
): { listed: boolean; line: LineResult } {
	const served = demands.map((demand) => ({ demand, alone: toolLine(demand, shelf.tools, on, until) }));
	const listing = served.find(({ demand }) => demand.options.every(({ cuts }) => cuts.includes('board')));
	const serving = served.find(({ alone }) =>
		shelf.tools.some((tool) => alone.supplies?.includes(tool.key) && cutsOf(tool).includes('board'))
	);
	const alone = toolLine(BOARD_CUT, shelf.tools, on, until);
	return { listed: (listing ?? serving) !== undefined, line: (listing ?? serving)?.alone ?? alone };
}

interface Found {
	readonly lines: readonly LineResult[];
	readonly short: readonly Shortage[];
	readonly near: readonly NearMiss[];
	readonly layout: PricedLayout | null;
	readonly parts: readonly Part[];
	/** Chipboard is cut, not only used as it is. */
	readonly cutsBoard: boolean;
}

/** Where no tool that cuts board is to hand, boards owned at their exact size may still do. */
function findComponent(seats: readonly Seat[], on: string, board: LineResult, bench: Bench): Found {
	const costOf = costsOf(seats);
	const first: Terms = { on, level: 0, unsure: false, cutsBoard: true };
	const cut = findWith(seats, first, costOf, bench);
	if (!cut.cutsBoard || board.verdict === 'now') return cut;
	const uncut = findWith(seats, { ...first, cutsBoard: false }, costOf, bench);
	const rank = (found: Found) => worst(found.lines.map(({ verdict }) => verdict));
	return isWorse(worst([rank(cut), board.verdict]), rank(uncut)) || rank(cut) === rank(uncut) ? uncut : cut;
}

function findWith(all: readonly Seat[], first: Terms, costOf: CostOf, bench: Bench): Found {
	const papers = findPapers(all, first, costOf, bench);
	const seats = all.filter(({ part }) => !part.promised);
	if (!papers.layout && papers.timedOut) {
		const lines = seats.map(({ part }): LineResult => ({
			line: lineOf(part),
			verdict: 'look',
			supplies: [],
			swap: null,
			why: OUT_OF_TIME
		}));
		return { lines, short: [], near: [], layout: null, parts: [], cutsBoard: false };
	}
	if (!papers.layout && seats.length < all.length) {
		const lines = seats.map(({ part }): LineResult => ({
			line: lineOf(part),
			verdict: 'short',
			supplies: [],
			swap: null
		}));
		return { lines, short: [], near: [], layout: null, parts: [], cutsBoard: false };
	}
	const lack = papers.layout ? null : lackOf(seats, first, costOf, bench);
	const layout = papers.layout ?? lack?.layout ?? null;
	const lines = lack?.lines ?? seats.map(({ part }) => slotLine(part, layout as Layout, first.on));
	const near = seats.flatMap((seat, s) =>
		lines[s]?.verdict === 'now' ? [] : nearMisses(seat, bench.options)
	);
	return {
		lines,
		short: lack?.short ?? [],
		near,
		layout: layout && { layout, dearest: dearestOf(all) },
		parts: papers.layout ? papers.seats.map(({ part }) => part) : [],
		cutsBoard: layout !== null && cutsChipboard(layout)
	};
}

function cutsChipboard(layout: Layout): boolean {
	return layout.sheets.some(
		({ sheet, placements }) =>
			sheet.supply.kind === 'chipboard' && placements.some(({ cut }) => !isCutAlready(cut, sheet))
	);
}

function inBillsOrder(bill: Bill, lines: readonly LineResult[]): LineResult[] {
	const order = [
		...bill.slots.map(({ key }) => `slots/${key}`),
		...bill.adhesives.map(({ key }) => `adhesives/${key}`),
		...bill.extras.map(({ key }) => `extras/${key}`),
		...bill.tools.map(({ key }) => `tools/${key}`),
		BOARD_CUT.line
	];
	const known = new Map(lines.map((line) => [line.line, line]));
	return order.flatMap((line): LineResult[] => {
		const found = known.get(line);
		if (found) return [found];
		return line === BOARD_CUT.line ? [] : [{ line, verdict: 'now', supplies: [], swap: null }];
	});
}
