/**
 * All guillotine patterns of a small problem, exactly. A state is a multiset of pieces (mixed-radix number of
 * its counts). For every state the least boxes that hold exactly it are kept: those of which no other is as low
 * and as narrow. They come from the boxes of every division into two, side by side and one under the other; to
 * meet each tree once, the part with the first piece must not itself be divided along the same axis. A state
 * fits a sheet if one of its least boxes does, so one table serves every sheet size on which the pieces may lie
 * the same way. Where it is known how much area may be lost in all, boxes that lose more are left out (Wang). Everyday problems have a few hundred states (median 150 on craft projects), where this beats
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

/**
 * One table for the sheet kinds `sheets`, on which pieces may lie alike, of boxes that lose at most `loss`;
 * pauses after each state.
 */
export function* frontierOf(
	model: Model,
	states: States,
	sheets: readonly number[],
	loss: number,
	meter: Meter
): Generator<undefined, Frontier> {
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
		if (loss === Infinity && !everyPartFits(state, counts, strides, least)) continue;
		const found =
			state === strides[strides.indexOf(state)] ? single(model, strides.indexOf(state), may, limits) : [];
		const pairs = divide(found, state, counts, strides, least, limits, area + loss);
		if (found.length > 0) least[state] = found;
		meter.spend(pairs + 1);
		yield;
	}
	return { sheets, least };
}

/** What fits also fits with one piece less. */
function everyPartFits(
	state: number,
	counts: readonly number[],
	strides: readonly number[],
	least: readonly (Least | undefined)[]
): boolean {
	for (let i = 0; i < counts.length; i++) {
		const stride = strides[i] as number;
		if ((counts[i] as number) > 0 && state !== stride && !least[state - stride]) return false;
	}
	return true;
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

/** Meets every division of a state into a part with its first piece and the others; answers the number of pairs. */
function divide(
	found: Least,
	state: number,
	counts: readonly number[],
	strides: readonly number[],
	least: readonly (Least | undefined)[],
	limits: readonly Size[],
	most: number
): number {
	let pairs = 0;
	const parts = new Parts(state, counts, strides);
	for (let part = parts.first; part !== state; part = parts.next()) {
		pairs++;
		const a = least[part];
		const b = a && least[state - part];
		if (a && b) pairs += joinDown(found, a, b, limits, most) + joinAcross(found, a, b, limits, most);
	}
	return pairs;
}

/** Counts through the proper sub-multisets that hold the first piece present, and ends with the whole. */
class Parts {
	readonly first: number;
	private readonly strides: number[] = [];
	private readonly limits: number[] = [];
	private readonly taken: number[] = [];
	private part: number;

	constructor(state: number, counts: readonly number[], strides: readonly number[]) {
		for (let i = 0; i < counts.length; i++) {
			const count = counts[i] as number;
			if (count === 0) continue;
			this.limits.push(this.strides.length === 0 ? count - 1 : count);
			this.strides.push(strides[i] as number);
			this.taken.push(0);
		}
		this.first = this.part = this.strides[0] ?? state;
	}

	next(): number {
		const { taken, limits, strides } = this;
		for (let j = 0; j < taken.length; j++) {
			const count = taken[j] as number;
			const stride = strides[j] as number;
			if (count < (limits[j] as number)) {
				taken[j] = count + 1;
				this.part += stride;
				return this.part;
			}
			taken[j] = 0;
			this.part -= count * stride;
		}
		return this.part;
	}
}

/**
 * Adds the boxes of two parts side by side. Only the narrowest pair for each height can be least, so the two
 * rows are walked down together like a merge; one under the other, it is the same from the other end.
 */
function joinDown(found: Least, a: Least, b: Least, limits: readonly Size[], most: number): number {
	let walked = 0;
	let i = 0;
	let j = 0;
	while (i < a.length && a[i + 2] === DOWN) i += STEP;
	while (i < a.length && j < b.length) {
		const ah = a[i + 1] as number;
		const bh = b[j + 1] as number;
		const w = (a[i] as number) + (b[j] as number);
		const h = ah > bh ? ah : bh;
		walked++;
		if (w * h <= most && within(limits, w, h)) keep(found, w, h, DOWN);
		if (bh === h) j += STEP;
		if (ah === h) {
			i += STEP;
			while (i < a.length && a[i + 2] === DOWN) i += STEP;
		}
	}
	return walked;
}

function joinAcross(found: Least, a: Least, b: Least, limits: readonly Size[], most: number): number {
	let walked = 0;
	let i = a.length - STEP;
	let j = b.length - STEP;
	while (i >= 0 && a[i + 2] === ACROSS) i -= STEP;
	while (i >= 0 && j >= 0) {
		const aw = a[i] as number;
		const bw = b[j] as number;
		const h = (a[i + 1] as number) + (b[j + 1] as number);
		const w = aw > bw ? aw : bw;
		walked++;
		if (w * h <= most && within(limits, w, h)) keep(found, w, h, ACROSS);
		if (bw === w) j -= STEP;
		if (aw === w) {
			i -= STEP;
			while (i >= 0 && a[i + 2] === ACROSS) i -= STEP;
		}
	}
	return walked;
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
	const parts = new Parts(state, countsOf(states, state), states.strides);
	for (let part = parts.first; part !== state; part = parts.next()) {
		const halves = halvesWithin(frontier.least[part], frontier.least[state - part], w, h);
		if (!halves) continue;
		const { axis, a, b } = halves;
		return along(axis, [
			boxOf(model, states, frontier, part, a.w, a.h),
			boxOf(model, states, frontier, state - part, b.w, b.h)
		]);
	}
	throw new Error('no division of a state that is known to fit');
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
