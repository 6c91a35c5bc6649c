/**
 * The most valuable part of the pieces that one sheet can give. Boxes are built from the bottom up, the most
 * promising first: a box's promise is its own value plus the most that could ever be cut from what surrounds
 * it, and a box that promises no more than the best one found is never looked at. The surroundings are priced
 * with unlimited copies by Gilmore and Gomory's recursion ("The theory and computation of knapsack functions",
 * Operations Research 14, 1966), the search is that of Viswanathan & Bagchi ("Best-first search methods for
 * constrained two-dimensional cutting stock problems", Operations Research 41, 1993). Only sums of piece sides
 * matter as places for cuts (Herz 1972), and of those only the raster points (Scheithauer & Terno 1996).
 */
import { ACROSS, DOWN, along, leaf, type Box } from './box';
import { planOf } from './layout';
import { Meter } from './meter';
import { modelOf, refuseNonsense, type Model } from './model';
import type { CutBudget, CutPlan, CutProblem } from './problem';

export interface BestOfSheet {
	readonly value: number;
	/** How many of each piece are cut. */
	readonly counts: readonly number[];
	readonly plan: CutPlan;
	readonly proved: boolean;
}

interface Part {
	readonly w: number;
	readonly h: number;
	readonly value: number;
	readonly promise: number;
	readonly counts: readonly number[];
	readonly box: Box;
}

/** Cuts the pieces worth most, `values[i]` for each of piece `i`, from one sheet of the first kind. */
export function bestOfSheet(problem: CutProblem, values: readonly number[], budget: CutBudget): BestOfSheet {
	refuseNonsense(problem);
	const [sheet] = problem.sheets;
	if (!sheet) throw new RangeError('there is no sheet to cut from');
	const distinct = { ...problem, sheets: [{ ...sheet, count: 1 }] };
	const meter = new Meter(budget);
	const search = new ValueSearch(distinct, values, meter);
	const best = search.run();
	const counts = problem.pieces.map(() => 0);
	const cut = {
		...distinct,
		pieces: problem.pieces.map((piece, p) => ({ ...piece, qty: (counts[p] = best?.counts[p] ?? 0) }))
	};
	const opened = best ? [{ sheet: 0, box: best.box }] : [];
	return {
		value: best?.value ?? 0,
		counts,
		plan: planOf(cut, search.model, opened),
		proved: search.finished
	};
}

class ValueSearch {
	readonly model: Model;
	finished = false;
	private readonly xs: readonly number[];
	private readonly ys: readonly number[];
	private readonly around: Float64Array;
	private readonly pool: Part[] = [];
	private readonly heap: Part[] = [];
	private readonly known = new Map<string, Part[]>();
	private best: Part | null = null;

	constructor(
		problem: CutProblem,
		values: readonly number[],
		private readonly meter: Meter
	) {
		this.model = unmerged(problem);
		const { w, h } = this.sheet;
		this.xs = raster(this.sides(0), w);
		this.ys = raster(this.sides(1), h);
		this.around = this.surroundings(this.unlimited(values));
		this.model.pieces.forEach((piece, p) => {
			const counts = this.model.pieces.map((_, i) => (i === p ? 1 : 0));
			const lie = this.sheet.lies[p] ?? 0;
			for (const turned of [false, true]) {
				if ((lie & (turned ? 2 : 1)) !== 0 && piece.qty > 0)
					this.offer(values[p] ?? 0, counts, leaf(p, piece, turned));
			}
		});
	}

	private get sheet(): Model['sheets'][number] {
		return this.model.sheets[0] as Model['sheets'][number];
	}

	run(): Part | null {
		for (;;) {
			const part = this.pop();
			if (!part || (this.best && part.promise <= this.best.value)) {
				this.finished = true;
				return this.best;
			}
			if (!this.stillLeast(part)) continue;
			this.pool.push(part);
			for (const other of this.pool) this.join(part, other);
			if (!this.meter.spend(this.pool.length + 8)) return this.best;
		}
	}

	private join(a: Part, b: Part): void {
		const { w, h } = this.sheet;
		const beside = a.w + b.w <= w;
		const under = a.h + b.h <= h;
		if (!beside && !under) return;
		const value = a.value + b.value;
		const hopeful = (x: number, y: number) => value + this.promiseAround(x, y) > (this.best?.value ?? -1);
		const goDown = beside && hopeful(a.w + b.w, Math.max(a.h, b.h));
		const goAcross = under && hopeful(Math.max(a.w, b.w), a.h + b.h);
		if (!goDown && !goAcross) return;
		const counts = a.counts.map((count, p) => count + (b.counts[p] as number));
		if (counts.some((count, p) => count > (this.model.pieces[p]?.qty ?? 0))) return;
		if (goDown) this.offer(value, counts, along(DOWN, [a.box, b.box]));
		if (goAcross) this.offer(value, counts, along(ACROSS, [a.box, b.box]));
	}

	private offer(value: number, counts: readonly number[], box: Box): void {
		const part = {
			w: box.w,
			h: box.h,
			value,
			counts,
			box,
			promise: value + this.promiseAround(box.w, box.h)
		};
		if (this.best && part.promise <= this.best.value) return;
		const key = counts.join();
		const alike = this.known.get(key) ?? [];
		if (alike.some((other) => other.w <= part.w && other.h <= part.h)) return;
		this.known.set(key, [...alike.filter((other) => other.w < part.w || other.h < part.h), part]);
		if (!this.best || value > this.best.value) this.best = part;
		this.push(part);
	}

	private stillLeast(part: Part): boolean {
		return this.known.get(part.counts.join())?.includes(part) ?? false;
	}

	private promiseAround(w: number, h: number): number {
		const i = placeOf(this.xs, this.sheet.w - w);
		const j = placeOf(this.ys, this.sheet.h - h);
		return this.around[i * this.ys.length + j] as number;
	}

	/** Sides that pieces can have along x (0) or y (1). */
	private sides(axis: 0 | 1): number[] {
		return this.model.pieces.flatMap(({ w, h, qty }, p) => {
			const lie = this.sheet.lies[p] ?? 0;
			const upright = lie & 1 ? [axis === 0 ? w : h] : [];
			const turned = lie & 2 ? [axis === 0 ? h : w] : [];
			return qty > 0 ? [...upright, ...turned] : [];
		});
	}

	/** The most that a region is worth if every piece could be cut without limit, by place. */
	private unlimited(values: readonly number[]): Float64Array {
		const { xs, ys } = this;
		const worth = new Float64Array(xs.length * ys.length);
		this.model.pieces.forEach(({ w, h, qty }, p) => {
			const lie = qty > 0 ? (this.sheet.lies[p] ?? 0) : 0;
			xs.forEach((x, i) =>
				ys.forEach((y, j) => {
					const fits = ((lie & 1) !== 0 && w <= x && h <= y) || ((lie & 2) !== 0 && h <= x && w <= y);
					const place = i * ys.length + j;
					if (fits && (values[p] ?? 0) > (worth[place] as number)) worth[place] = values[p] ?? 0;
				})
			);
		});
		const restX = differences(xs);
		const restY = differences(ys);
		const rows = ys.length;
		for (let i = 0; i < xs.length; i++) {
			for (let j = 0; j < rows; j++) {
				let most = worth[i * rows + j] as number;
				if (i > 0) most = Math.max(most, worth[(i - 1) * rows + j] as number);
				if (j > 0) most = Math.max(most, worth[i * rows + j - 1] as number);
				for (let k = 1; 2 * (xs[k] as number) <= (xs[i] as number); k++) {
					const both =
						(worth[k * rows + j] as number) +
						(worth[(restX[i * xs.length + k] as number) * rows + j] as number);
					if (both > most) most = both;
				}
				for (let k = 1; 2 * (ys[k] as number) <= (ys[j] as number); k++) {
					const both =
						(worth[i * rows + k] as number) + (worth[i * rows + (restY[j * rows + k] as number)] as number);
					if (both > most) most = both;
				}
				worth[i * rows + j] = most;
			}
		}
		return worth;
	}

	/** The most that can be added to a box, by the room beside it and the room under it. */
	private surroundings(worth: Float64Array): Float64Array {
		const { xs, ys } = this;
		const { w, h } = this.sheet;
		const rows = ys.length;
		const around = new Float64Array(xs.length * rows);
		const restX = differences(xs);
		const restY = differences(ys);
		const heights = ys.map((y) => placeOf(ys, h - y));
		for (let i = 0; i < xs.length; i++) {
			const width = placeOf(xs, w - (xs[i] as number));
			for (let j = 0; j < rows; j++) {
				const height = heights[j] as number;
				let most = 0;
				for (let k = 0; k < i; k++) {
					const both =
						(worth[(restX[i * xs.length + k] as number) * rows + height] as number) +
						(around[k * rows + j] as number);
					if (both > most) most = both;
				}
				for (let k = 0; k < j; k++) {
					const both =
						(worth[width * rows + (restY[j * rows + k] as number)] as number) +
						(around[i * rows + k] as number);
					if (both > most) most = both;
				}
				around[i * rows + j] = most;
			}
		}
		return around;
	}

	private push(part: Part): void {
		const { heap } = this;
		let at = heap.push(part) - 1;
		while (at > 0) {
			const up = (at - 1) >> 1;
			if ((heap[up] as Part).promise >= part.promise) break;
			heap[at] = heap[up] as Part;
			at = up;
		}
		heap[at] = part;
	}

	private pop(): Part | undefined {
		const { heap } = this;
		const [top] = heap;
		const last = heap.pop();
		if (!last || heap.length === 0) return top;
		let at = 0;
		for (;;) {
			let down = 2 * at + 1;
			if (down >= heap.length) break;
			if (down + 1 < heap.length && (heap[down + 1] as Part).promise > (heap[down] as Part).promise) down++;
			if ((heap[down] as Part).promise <= last.promise) break;
			heap[at] = heap[down] as Part;
			at = down;
		}
		heap[at] = last;
		return top;
	}
}

/** Pieces keep their places here, since equal sizes may differ in value. */
function unmerged(problem: CutProblem): Model {
	const alone = problem.pieces.map((piece) =>
		modelOf({ ...problem, pieces: [{ ...piece, qty: Math.max(1, piece.qty) }] })
	);
	const whole = modelOf(problem);
	return {
		...whole,
		pieces: alone.map((model, index) => {
			const [piece] = model.pieces as [Model['pieces'][number]];
			const qty = problem.pieces[index]?.qty ?? 0;
			return { ...piece, qty, members: [{ piece: index, qty, flipped: piece.members[0]?.flipped ?? false }] };
		}),
		sheets: whole.sheets.map((sheet, s) => ({
			...sheet,
			lies: Uint8Array.from(alone, (model) => model.sheets[s]?.lies[0] ?? 0),
			may: Uint8Array.from(alone, (model) => model.sheets[s]?.may[0] ?? 0)
		}))
	};
}

/** Every sum of sides up to `limit`, from 0 on. */
function sums(sides: readonly number[], limit: number): number[] {
	const found = new Set([0]);
	for (const side of new Set(sides)) {
		for (const sum of [...found]) for (let more = sum + side; more <= limit; more += side) found.add(more);
	}
	return [...found].sort((a, b) => a - b);
}

/** The largest sums that fit beside another sum: no cut elsewhere gives more. */
function raster(sides: readonly number[], limit: number): number[] {
	const all = sums(sides, limit);
	const kept = new Set(all.map((sum) => all[placeOf(all, limit - sum)] as number));
	return [...kept].sort((a, b) => a - b);
}

/** The place of the largest sum that is not above `value`. */
function placeOf(sums: readonly number[], value: number): number {
	let low = 0;
	let high = sums.length - 1;
	while (low < high) {
		const middle = (low + high + 1) >> 1;
		if ((sums[middle] as number) <= value) low = middle;
		else high = middle - 1;
	}
	return low;
}

/** For each two places, whole first, the place of the largest sum within their difference. */
function differences(sums: readonly number[]): Uint32Array {
	const places = new Uint32Array(sums.length * sums.length);
	for (let whole = 0; whole < sums.length; whole++) {
		for (let part = 0; part <= whole; part++) {
			places[whole * sums.length + part] = placeOf(sums, (sums[whole] as number) - (sums[part] as number));
		}
	}
	return places;
}
