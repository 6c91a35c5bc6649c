/**
 * Which sheets to open: every multiset of sheet kinds that the inequalities allow, cheapest first. A best-first
 * search over multisets in one order of kinds; what is still needed is priced by the fractional relaxation of
 * each inequality. A kind is used only when every kind that is at least as good and no dearer is used up. The
 * price of the next combination is a proved lower bound on every plan not yet looked at.
 */
import type { Inequality } from './bounds';
import type { Meter } from './meter';
import type { Model } from './model';

export interface Combination {
	readonly counts: readonly number[];
	readonly cost: number;
}

interface Node extends Combination {
	/** Sheets are added in the order of kinds; this is the last one's place in it. */
	readonly last: number;
	readonly sheets: number;
	readonly bound: number;
	readonly enough: boolean;
	readonly nth: number;
}

const SHARPEST = 24;

export class Combinations {
	private readonly heap: Node[] = [];
	private readonly order: readonly number[];
	private readonly better: readonly (readonly number[])[];
	private readonly ratios: readonly (readonly number[])[];
	private readonly sharp: readonly Inequality[];
	/** From each place in the order on, the lowest cost of one sheet. */
	private readonly cheapest: readonly number[];
	private made = 0;

	constructor(
		private readonly model: Model,
		private readonly inequalities: readonly Inequality[],
		private readonly meter: Meter
	) {
		const { sheets } = model;
		this.order = sheets
			.map((_, s) => s)
			.filter((s) => (sheets[s]?.count ?? 0) > 0)
			.sort((a, b) => area(model, b) - area(model, a) || cost(model, a) - cost(model, b) || a - b);
		this.cheapest = this.order.map((_, at) => Math.min(...this.order.slice(at).map((s) => cost(model, s))));
		this.better = sheets.map((_, s) => this.order.filter((other) => dominates(model, other, s)));
		this.sharp = inequalities
			.map((inequality) => ({
				inequality,
				bound: this.price(
					inequality,
					inequality.need,
					0,
					sheets.map(() => 0),
					this.ratio(inequality)
				)
			}))
			.sort((a, b) => b.bound - a.bound)
			.slice(0, SHARPEST)
			.map(({ inequality }) => inequality);
		this.ratios = this.sharp.map((inequality) => this.ratio(inequality));
		this.push(
			sheets.map(() => 0),
			0,
			0,
			0
		);
	}

	/** No combination that has not been given out costs less; Infinity where there is none. */
	get bound(): number {
		return this.heap[0]?.bound ?? Infinity;
	}

	/** The cheapest combination not yet given out; null where there is none, undefined where `go` ends first. */
	next(go: () => boolean): Combination | null | undefined {
		for (let node = this.pop(); node; node = this.pop()) {
			this.expand(node);
			if (node.enough) return node;
			if (!go()) return undefined;
		}
		return null;
	}

	private expand(node: Node): void {
		if (node.sheets >= this.model.total) return;
		for (let at = node.last; at < this.order.length; at++) {
			const s = this.order[at] as number;
			const used = node.counts[s] as number;
			if (used >= (this.model.sheets[s]?.count ?? 0)) continue;
			if (
				(this.better[s] as number[]).some(
					(b) => (node.counts[b] as number) < (this.model.sheets[b]?.count ?? 0)
				)
			)
				continue;
			const counts = node.counts.slice();
			counts[s] = used + 1;
			this.push(counts, node.cost + cost(this.model, s), at, node.sheets + 1);
		}
	}

	private push(counts: readonly number[], spent: number, last: number, sheets: number): void {
		let more = 0;
		this.sharp.forEach((inequality, i) => {
			if (more === Infinity) return;
			const missing = inequality.need - given(inequality, counts);
			if (missing > 0)
				more = Math.max(more, this.price(inequality, missing, last, counts, this.ratios[i] as number[]));
		});
		this.meter.spend(this.sharp.length);
		if (more > 0) more = Math.max(more, this.cheapest[last] ?? Infinity);
		if (more === Infinity) return;
		const enough =
			more === 0 &&
			sheets > 0 &&
			this.inequalities.every((inequality) => given(inequality, counts) >= inequality.need);
		const exact = spent + more;
		const bound = Math.ceil(exact - Math.max(1e-6, exact * 1e-13));
		this.heap.push({ counts, cost: spent, last, sheets, bound, enough, nth: this.made++ });
		this.rise(this.heap.length - 1);
	}

	/** Kinds by price for what they give. */
	private ratio({ give }: Inequality): number[] {
		return this.order
			.map((_, at) => at)
			.filter((at) => (give[this.order[at] as number] as number) > 0)
			.sort((a, b) => this.perUnit(give, a) - this.perUnit(give, b) || a - b);
	}

	private perUnit(give: readonly number[], at: number): number {
		const s = this.order[at] as number;
		return cost(this.model, s) / (give[s] as number);
	}

	private price(
		{ give }: Inequality,
		missing: number,
		last: number,
		counts: readonly number[],
		ratio: readonly number[]
	): number {
		let price = 0;
		let left = missing;
		for (const at of ratio) {
			if (at < last) continue;
			const s = this.order[at] as number;
			const gives = give[s] as number;
			const most = ((this.model.sheets[s]?.count ?? 0) - (counts[s] as number)) * gives;
			if (most >= left) return price + (left / gives) * cost(this.model, s);
			price += (most / gives) * cost(this.model, s);
			left -= most;
		}
		return Infinity;
	}

	private before(a: Node, b: Node): boolean {
		return a.bound !== b.bound ? a.bound < b.bound : a.nth > b.nth;
	}

	private rise(at: number): void {
		const { heap } = this;
		const node = heap[at] as Node;
		while (at > 0) {
			const up = (at - 1) >> 1;
			if (!this.before(node, heap[up] as Node)) break;
			heap[at] = heap[up] as Node;
			at = up;
		}
		heap[at] = node;
	}

	private pop(): Node | undefined {
		const { heap } = this;
		const [top] = heap;
		const node = heap.pop();
		if (!node || heap.length === 0) return top;
		let at = 0;
		for (;;) {
			let down = 2 * at + 1;
			if (down >= heap.length) break;
			if (down + 1 < heap.length && this.before(heap[down + 1] as Node, heap[down] as Node)) down++;
			if (!this.before(heap[down] as Node, node)) break;
			heap[at] = heap[down] as Node;
			at = down;
		}
		heap[at] = node;
		return top;
	}
}

function given({ give }: Inequality, counts: readonly number[]): number {
	let sum = 0;
	for (let s = 0; s < counts.length; s++) sum += (counts[s] as number) * (give[s] as number);
	return sum;
}

function area(model: Model, s: number): number {
	return model.sheets[s]?.area ?? 0;
}

function cost(model: Model, s: number): number {
	return model.sheets[s]?.cost ?? 0;
}

/** Whether whatever is cut from `b` could be cut from `a` for no more; of equals the first dominates. */
function dominates(model: Model, a: number, b: number): boolean {
	const one = model.sheets[a];
	const other = model.sheets[b];
	if (!one || !other || a === b || one.cost > other.cost) return false;
	const equal = one.w === other.w && one.h === other.h && one.cost === other.cost;
	const upright =
		one.w >= other.w &&
		one.h >= other.h &&
		one.may.every((may, p) => (may & (other.may[p] as number)) === other.may[p]);
	return upright && (!equal || a < b);
}
