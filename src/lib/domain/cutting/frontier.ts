/**
 * All guillotine patterns of a small problem, exactly. A state is a multiset of pieces (mixed-radix number of
 * its counts). For every state the least boxes that hold exactly it are kept: those of which no other is as low
 * and as narrow. They come from the boxes of every division into two, side by side and one under the other; to
 * meet each tree once, the part with the first piece must not itself be divided along the same axis. A state
 * fits a sheet if one of its least boxes does, so one table serves every sheet size on which the pieces may lie
 * the same way. Everyday problems have a few hundred states (median 150 on craft projects), where this beats
 * any search tree; big ones run out of their allowance and are left to local search. (Dynamic programming over
 * subsets with dominance, after Wang, "Two algorithms for constrained two-dimensional cutting stock problems",
 * Operations Research 31, 1983, and Clautiaux, Jouglet & Moukrim, INFORMS J. Computing 25, 2013.)
 */
import { ACROSS, DOWN, PIECE, along, leaf, type Box } from './box';
import type { Meter } from './meter';
import type { Model } from './model';

/** Mixed-radix numbering of multisets: `strides[i]` times the count of piece `i`, summed. */
export interface States {
	readonly size: number;
	readonly strides: readonly number[];
	readonly quantities: readonly number[];
}

export function statesOf(model: Model): States {
	const strides: number[] = [];
	let size = 1;
	for (const { qty } of model.pieces) {
		strides.push(size);
		size *= qty + 1;
	}
	return { size, strides, quantities: model.pieces.map(({ qty }) => qty) };
}

/** Least boxes of one state: w, h, axis of the first division, repeated; widths grow, heights fall. */
type Least = number[];
const STEP = 3;

export interface Frontier {
	readonly sheets: readonly number[];
	readonly least: readonly (Least | undefined)[];
}

/** One table for the sheet kinds `sheets`, on which pieces may lie alike; null where `go` ends first. */
export function frontierOf(
	model: Model,
	states: States,
	sheets: readonly number[],
	meter: Meter,
	go: () => boolean
): Frontier | null {
	const { strides, quantities, size } = states;
	const limits = outermost(sheets.map((s) => ({ w: model.sheets[s]?.w ?? 0, h: model.sheets[s]?.h ?? 0 })));
	const room = Math.max(...limits.map(({ w, h }) => w * h));
	const may = model.sheets[sheets[0] ?? 0]?.may ?? new Uint8Array();
	const least: (Least | undefined)[] = new Array<Least | undefined>(size).fill(undefined);
	const counts = quantities.map(() => 0);
	let area = 0;
	for (let state = 1; state < size; state++) {
		area += step(counts, quantities, model);
		if (area > room) continue;
		let possible = true;
		for (let i = 0; i < counts.length && possible; i++) {
			if ((counts[i] as number) > 0 && state !== strides[i])
				possible = least[state - (strides[i] as number)] !== undefined;
		}
		if (!possible) continue;
		const found =
			state === strides[strides.indexOf(state)] ? single(model, strides.indexOf(state), may, limits) : [];
		const pairs = divide(found, state, counts, strides, least, limits);
		if (found.length > 0) least[state] = found;
		meter.spend(pairs + 1);
		if (!go()) return null;
	}
	return { sheets, least };
}

/** Counts up by one in the mixed radix; answers by how much the area grew. */
function step(counts: number[], quantities: readonly number[], model: Model): number {
	let grown = 0;
	for (let i = 0; i < counts.length; i++) {
		const area = model.pieces[i]?.area ?? 0;
		const count = counts[i] as number;
		if (count < (quantities[i] as number)) {
			counts[i] = count + 1;
			return grown + area;
		}
		counts[i] = 0;
		grown -= count * area;
	}
	return grown;
}

interface Size {
	readonly w: number;
	readonly h: number;
}

function outermost(sizes: readonly Size[]): Size[] {
	return sizes.filter(
		(a, i) => !sizes.some((b, j) => b.w >= a.w && b.h >= a.h && (b.w > a.w || b.h > a.h || j < i))
	);
}

function within(limits: readonly Size[], w: number, h: number): boolean {
	for (const limit of limits) if (w <= limit.w && h <= limit.h) return true;
	return false;
}

function single(model: Model, piece: number, may: Uint8Array, limits: readonly Size[]): Least {
	const { w, h } = model.pieces[piece] as Size;
	const found: Least = [];
	const lie = may[piece] ?? 0;
	if (lie & 1 && within(limits, w, h)) keep(found, w, h, PIECE);
	if (lie & 2 && within(limits, h, w)) keep(found, h, w, PIECE);
	return found;
}

/** Adds a box unless one as small is there, and drops those that it makes needless. */
function keep(found: Least, w: number, h: number, axis: number): void {
	let at = 0;
	while (at < found.length && (found[at] as number) < w) {
		if ((found[at + 1] as number) <= h) return;
		at += STEP;
	}
	if (at < found.length && found[at] === w && (found[at + 1] as number) <= h) return;
	let end = at;
	while (end < found.length && (found[end + 1] as number) >= h) end += STEP;
	if (end === at + STEP) {
		found[at] = w;
		found[at + 1] = h;
		found[at + 2] = axis;
	} else found.splice(at, end - at, w, h, axis);
}

/** Visits every division of a state into a part with its first piece and the others; answers the number of pairs. */
function divide(
	found: Least,
	state: number,
	counts: readonly number[],
	strides: readonly number[],
	least: readonly (Least | undefined)[],
	limits: readonly Size[]
): number {
	let pairs = 0;
	eachPart(state, counts, strides, (part) => {
		pairs++;
		const a = least[part];
		const b = least[state - part];
		if (a && b) pairs += join(found, a, b, limits);
		return false;
	});
	return pairs;
}

/** Calls `visit` with each proper sub-multiset that holds the first piece present, until it answers true. */
function eachPart(
	state: number,
	counts: readonly number[],
	strides: readonly number[],
	visit: (part: number) => boolean
): void {
	const present: number[] = [];
	for (let i = 0; i < counts.length; i++) if ((counts[i] as number) > 0) present.push(i);
	const taken = present.map(() => 0);
	taken[0] = 1;
	let part = strides[present[0] as number] as number;
	while (part !== state) {
		if (visit(part)) return;
		for (let j = 0; j < present.length; j++) {
			const i = present[j] as number;
			if ((taken[j] as number) < (counts[i] as number)) {
				taken[j] = (taken[j] as number) + 1;
				part += strides[i] as number;
				break;
			}
			const least = j === 0 ? 1 : 0;
			part -= ((taken[j] as number) - least) * (strides[i] as number);
			taken[j] = least;
		}
	}
}

function join(found: Least, a: Least, b: Least, limits: readonly Size[]): number {
	for (let i = 0; i < a.length; i += STEP) {
		const aw = a[i] as number;
		const ah = a[i + 1] as number;
		const axis = a[i + 2] as number;
		for (let j = 0; j < b.length; j += STEP) {
			const bw = b[j] as number;
			const bh = b[j + 1] as number;
			if (axis !== DOWN) {
				const h = ah > bh ? ah : bh;
				if (within(limits, aw + bw, h)) keep(found, aw + bw, h, DOWN);
			}
			if (axis !== ACROSS) {
				const w = aw > bw ? aw : bw;
				if (within(limits, w, ah + bh)) keep(found, w, ah + bh, ACROSS);
			}
		}
	}
	return (a.length * b.length) / (STEP * STEP);
}

/** Whether the state fits a `w` x `h` sheet of this table. */
export function fitsIn(frontier: Frontier, state: number, w: number, h: number): boolean {
	if (state === 0) return true;
	const least = frontier.least[state];
	if (!least) return false;
	for (let i = 0; i < least.length; i += STEP) {
		if ((least[i] as number) > w) return false;
		if ((least[i + 1] as number) <= h) return true;
	}
	return false;
}

/** A box tree of the state within `w` x `h`, which `fitsIn` has said there is. */
export function boxOf(
	model: Model,
	states: States,
	frontier: Frontier,
	state: number,
	w: number,
	h: number
): Box {
	const piece = states.strides.indexOf(state);
	if (piece >= 0) {
		const of = model.pieces[piece] as Model['pieces'][number];
		const may = model.sheets[frontier.sheets[0] ?? 0]?.may[piece] ?? 0;
		return leaf(piece, of, !(may & 1 && of.w <= w && of.h <= h));
	}
	let box: Box | null = null;
	eachPart(state, countsOf(states, state), states.strides, (part) => {
		const halves = halvesWithin(frontier.least[part], frontier.least[state - part], w, h);
		if (!halves) return false;
		const { axis, a, b } = halves;
		box = along(axis, [
			boxOf(model, states, frontier, part, a.w, a.h),
			boxOf(model, states, frontier, state - part, b.w, b.h)
		]);
		return true;
	});
	if (!box) throw new Error('no division of a state that is known to fit');
	return box;
}

function halvesWithin(a: Least | undefined, b: Least | undefined, w: number, h: number) {
	if (!a || !b) return null;
	for (let i = 0; i < a.length; i += STEP) {
		for (let j = 0; j < b.length; j += STEP) {
			const one = { w: a[i] as number, h: a[i + 1] as number };
			const other = { w: b[j] as number, h: b[j + 1] as number };
			if (one.w + other.w <= w && Math.max(one.h, other.h) <= h)
				return { axis: DOWN, a: one, b: other } as const;
			if (Math.max(one.w, other.w) <= w && one.h + other.h <= h)
				return { axis: ACROSS, a: one, b: other } as const;
		}
	}
	return null;
}

export function countsOf(states: States, state: number): number[] {
	return states.strides.map(
		(stride, i) => Math.floor(state / stride) % ((states.quantities[i] as number) + 1)
	);
}
