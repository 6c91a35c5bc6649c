import { formatSize } from '../length';
import { sheetsToBuy, type MissingSheets } from './buying';
import type { Seat } from './components';
import { rungsOf } from './ladder';
import { countMost, withCounts, type Counts } from './laying';
import type { Bench, CostOf, Layout } from './layout';
import type { Terms } from './parts';
import { findPapers } from './papers';
import { lineOf, slotLine } from './slot-lines';
import type { LineResult, MatchOptions, Shortage } from './verdict';

/** What a component that is proved short lacks, and what of it can be cut today. */
export interface Lack {
	readonly lines: readonly LineResult[];
	readonly short: readonly Shortage[];
	readonly layout: Layout | null;
}

export function lackOf(seats: readonly Seat[], first: Terms, costOf: CostOf, bench: Bench): Lack {
	const widest = rungsOf(seats, first).at(-1) ?? first;
	const counts = countMost(seats, widest, costOf, bench);
	const laid = layCounts(seats, counts, first, costOf, bench);
	const lines = seats.map(({ part }, s): LineResult => {
		const known = laid ? slotLine(part, laid, first.on) : { line: lineOf(part), supplies: [], swap: null };
		const whole = part.pieces.every(({ qty }, p) => (counts[s]?.[p] ?? 0) >= qty);
		return whole && 'verdict' in known
			? known
			: { line: known.line, verdict: 'short', supplies: known.supplies, swap: known.swap };
	});
	const short = seats.flatMap(({ part }, s): Shortage[] => {
		if (lines[s]?.verdict !== 'short') return [];
		const full = seats.map((seat, i) =>
			i === s ? seat.part.pieces.map(({ qty }) => qty) : (counts[i] ?? [])
		);
		const sheets = sheetsToBuy(withCounts(seats, full), part, widest, bench);
		const missing = part.pieces.map(({ piece, qty }, p) => [piece.key, qty - (counts[s]?.[p] ?? 0)] as const);
		const pieces = Object.fromEntries(missing.filter(([, count]) => count > 0));
		const certificate = sheets && certificateOf(seats, s, counts, sheets, bench.options);
		return [{ line: lineOf(part), pieces, sheets: sheets ?? [], ...(certificate ? { certificate } : {}) }];
	});
	const today =
		widest.on === first.on ? laid : layToday(seats, { ...widest, on: first.on }, first, costOf, bench);
	return { lines, short, layout: today };
}

function layToday(
	seats: readonly Seat[],
	widest: Terms,
	first: Terms,
	costOf: CostOf,
	bench: Bench
): Layout | null {
	return layCounts(seats, countMost(seats, widest, costOf, bench), first, costOf, bench);
}

function layCounts(
	seats: readonly Seat[],
	counts: Counts,
	first: Terms,
	costOf: CostOf,
	bench: Bench
): Layout | null {
	const some = withCounts(seats, counts);
	return some.length > 0 ? findPapers(some, first, costOf, bench).layout : null;
}

/** Why, for the reader: what the stash holds of it, and what makes up the rest. */
function certificateOf(
	seats: readonly Seat[],
	short: number,
	counts: Counts,
	sheets: readonly MissingSheets[],
	options: MatchOptions
): string {
	const wanted = seats[short]?.part.pieces.reduce((sum, { qty }) => sum + qty, 0) ?? 0;
	const held = counts[short]?.reduce((sum, count) => sum + count, 0) ?? 0;
	const others = seats.some((_, s) => s !== short && counts[s]?.some((count) => count > 0));
	const bought = sheets
		.map(({ w, h, count }) => `${count} more ${formatSize(w, h, options.units)}`)
		.join(' and ');
	const made = `${bought} ${sheets.length === 1 && sheets[0]?.count === 1 ? 'makes' : 'make'} up the rest.`;
	if (held === 0) return `Nothing you have holds ${wanted === 1 ? 'this' : 'any of these'}; ${made}`;
	return `${others ? 'Beside the other pieces, what' : 'What'} you have holds ${held} of these ${wanted}; ${made}`;
}
