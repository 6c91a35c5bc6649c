import { LIES } from '../cutting/problem';
import type { Cost, CostOf, Offer } from './layout';
import { lieOn } from './lies';
import type { Part } from './parts';
import type { Sheet } from './shelf';

/** Offers of one sort: alike for every piece, so that the first speaks for all. */
export type Sorts = readonly (readonly Offer[])[];

/**
 * A cost that no layout of these pieces on these rows can beat, by area and by what fits no offcut; null where a
 * piece fits nowhere or there is less paper than pieces, so that there is no layout at all.
 */
export function leastCost(parts: readonly Part[], sorts: readonly Sorts[], costOf: CostOf): Cost | null {
	const tally = new Tally(parts.length > 1 && sorts.some((own) => own !== sorts[0]) && rowsIn(sorts) <= MANY);
	for (let p = 0; p < parts.length; p++) {
		const part = parts[p];
		if (part && !tally.add(part, sorts[p] ?? [], costOf)) return null;
	}
	return tally.least();
}

/** Of so many rows those that are offered to several parts count for each: the bound is no less true for it. */
const MANY = 300;

function rowsIn(sorts: readonly Sorts[]): number {
	let rows = 0;
	for (const own of sorts) for (const offers of own) rows += offers.length;
	return rows;
}

class Tally {
	private area = 0;
	private left = 0;
	private whole = 0;
	private perArea = Infinity;
	private cheapest = Infinity;
	private needsWhole = false;
	private readonly lefts: { size: number; count: number }[] = [];
	private readonly piled = new Set<readonly Offer[]>();
	private readonly seen: Set<Sheet> | null;

	/** `mixed`: several parts draw on different sorts, which may hold the same rows. */
	constructor(mixed: boolean) {
		this.seen = mixed ? new Set() : null;
	}

	/** False where one of the part's pieces fits nowhere. */
	add({ pieces, terms }: Part, sorts: Sorts, costOf: CostOf): boolean {
		let [fits, fitsLeft] = [0, 0];
		const served = new Uint8Array(pieces.length);
		for (const offers of sorts) {
			const first = offers[0];
			if (!first) continue;
			const cost = costOf(first.sheet)[0];
			const mark = cost === 0 ? 3 : 1;
			let serves = false;
			for (let c = 0; c < pieces.length; c++) {
				const cut = pieces[c];
				if (!cut || lieOn(cut, first.sheet, first.prints, terms) === LIES.never) continue;
				serves = true;
				const known = served[c] ?? 0;
				if (known === 0) fits += 1;
				if ((known & 2) === 0 && mark === 3) fitsLeft += 1;
				served[c] = known | mark;
			}
			if (serves) this.pile(offers, cost);
		}
		for (const cut of pieces) this.area += cut.w * cut.h * cut.qty;
		if (fitsLeft < pieces.length) this.needsWhole = true;
		return fits === pieces.length;
	}

	private pile(offers: readonly Offer[], cost: number): void {
		if (this.piled.has(offers)) return;
		this.piled.add(offers);
		const size = (offers[0]?.sheet.w ?? 0) * (offers[0]?.sheet.h ?? 0);
		const count = this.countIn(offers);
		if (count === 0) return;
		if (cost === 0) {
			this.left += size * count;
			this.lefts.push({ size, count });
		} else {
			this.whole += size * count;
			this.perArea = Math.min(this.perArea, cost / size);
			this.cheapest = Math.min(this.cheapest, cost);
		}
	}

	private countIn(offers: readonly Offer[]): number {
		let count = 0;
		for (const { sheet } of offers) {
			if (this.seen?.has(sheet)) continue;
			this.seen?.add(sheet);
			count += sheet.count;
		}
		return count;
	}

	least(): Cost | null {
		const { area, left } = this;
		if (area > left + this.whole) return null;
		const byArea = area > left ? Math.ceil((area - left) * this.perArea - 1e-9) : 0;
		const first = Math.max(byArea, this.needsWhole ? this.cheapest : 0);
		return first > 0 ? [first, 0] : [0, this.fewestLefts()];
	}

	private fewestLefts(): number {
		let [open, number] = [this.area, 0];
		for (const { size, count } of this.lefts.sort((a, b) => b.size - a.size)) {
			if (open <= 0) break;
			const taken = Math.min(count, Math.ceil(open / size));
			number += taken;
			open -= taken * size;
		}
		return number;
	}
}

export function isBelow(a: Cost, b: Cost): boolean {
	return a[0] < b[0] || (a[0] === b[0] && a[1] < b[1]);
}
