import type { Slot } from '../bill/bill';
import type { Offer } from './layout';
import type { Length } from '../length';
import type { Money } from '../money';
import type { Terms } from './parts';
import { usesFor, wayOn, type Use } from './serving';
import type { Sheet, Shelf } from './shelf';

/** Every row that could serve a slot on the most generous terms, and what of it each set of terms allows. */
export class Uses {
	private readonly offered = new Map<string, Offers>();
	private readonly kept = new Map<string, unknown>();

	constructor(readonly list: readonly Use[]) {}

	/** Terms that allow the same are answered by the same object. */
	on({ on, level, unsure }: Pick<Terms, 'on' | 'level' | 'unsure'>): Offers {
		const key = `${on} ${level} ${unsure}`;
		const known = this.offered.get(key);
		if (known) return known;
		const list = this.list.flatMap((use) => {
			const way = wayOn(use, { on, level, unsure });
			return way ? [{ sheet: use.sheet, prints: use.prints, way }] : [];
		});
		const same = [...this.offered.values()].find((other) => isSame(other.list, list));
		const offers = same ?? new Offers(this.offered.size, list);
		this.offered.set(key, offers);
		return offers;
	}

	/** Whether some row could serve both. */
	overlaps(other: Uses): boolean {
		if (other === this) return this.list.length > 0;
		return this.list.some(({ sheet }) => other.sheets.has(sheet));
	}

	/** In which the whole sheets are priced; null among them where one has no price. */
	get currencies(): ReadonlySet<string | null> {
		return this.keep('currencies', () => new Set(this.prices.map((price) => price?.currency ?? null)));
	}

	get dearest(): number {
		return this.keep('dearest', () => Math.max(1, ...this.prices.map((price) => price?.amount ?? 1)));
	}

	/** The days on which something of it arrives, in order. */
	get arrivals(): readonly string[] {
		return this.keep('arrivals', () =>
			[...new Set(this.list.flatMap(({ sheet }) => sheet.supply.arrives ?? []))].sort()
		);
	}

	private get prices(): readonly (Money | null)[] {
		const whole = this.list.filter(({ sheet }) => !sheet.left);
		return whole.map(({ sheet: { supply } }) =>
			supply.price && supply.price.amount > 0 ? supply.price : null
		);
	}

	private get sheets(): ReadonlySet<Sheet> {
		return this.keep('sheets', () => new Set(this.list.map(({ sheet }) => sheet)));
	}

	private keep<T>(name: string, make: () => T): T {
		if (!this.kept.has(name)) this.kept.set(name, make());
		return this.kept.get(name) as T;
	}
}

function isSame(a: readonly Offer[], b: readonly Offer[]): boolean {
	return (
		a.length === b.length && a.every((offer, i) => offer.sheet === b[i]?.sheet && offer.way === b[i]?.way)
	);
}

/** All the paper there is of something, and the longest short and long side of it. */
export interface Extent {
	readonly area: number;
	readonly short: Length;
	readonly long: Length;
}

/** What is offered to a slot on some terms: in the stash's order, by sort of row, by design, and by class of design. */
export class Offers {
	private sorted: readonly (readonly Offer[])[] | null = null;
	private designed: ReadonlyMap<string, readonly Offer[]> | null = null;
	private readonly extents = new Map<string, Extent>();
	private readonly classed = new Map<number, readonly (readonly string[])[]>();

	constructor(
		readonly number: number,
		readonly list: readonly Offer[]
	) {}

	/** The designs, those of a class together; `depth`: see `classifyDesigns`. */
	classes(depth: number): readonly (readonly string[])[] {
		const known = this.classed.get(depth);
		if (known) return known;
		const classes = new Map<number, string[]>();
		for (const [design, [offer]] of this.designs) {
			const number = offer?.prints[0]?.classes[depth] ?? -1;
			const alike = classes.get(number);
			if (alike) alike.push(design);
			else classes.set(number, [design]);
		}
		const made = [...classes.values()];
		this.classed.set(depth, made);
		return made;
	}

	/** What a design's rows come to: whatever doesn't fit this fits none of them. */
	extentOf(design: string): Extent {
		const known = this.extents.get(design);
		if (known) return known;
		let [area, short, long] = [0, 0, 0];
		for (const { sheet } of this.designs.get(design) ?? []) {
			area += sheet.w * sheet.h * sheet.count;
			short = Math.max(short, Math.min(sheet.w, sheet.h));
			long = Math.max(long, sheet.w, sheet.h);
		}
		const extent = { area, short, long };
		this.extents.set(design, extent);
		return extent;
	}

	/** Offers that are alike for every piece. */
	get sorts(): readonly (readonly Offer[])[] {
		this.sorted ??= bySort(this.list);
		return this.sorted;
	}

	/** By design, each offer with the faces that show it. */
	get designs(): ReadonlyMap<string, readonly Offer[]> {
		this.designed ??= byDesign(this.list);
		return this.designed;
	}
}

function bySort(offers: readonly Offer[]): Offer[][] {
	const sorts = new Map<string, Offer[]>();
	for (const offer of offers) {
		const sort = sortOf(offer);
		const known = sorts.get(sort);
		if (known) known.push(offer);
		else sorts.set(sort, [offer]);
	}
	return [...sorts.values()];
}

function sortOf({ sheet, prints, way }: Offer): string {
	return `${sheet.sort} ${prints.some(({ bound }) => bound)} ${prints.some(({ bound }) => !bound)} ${way.material} ${way.unsaid}`;
}

function byDesign(offers: readonly Offer[]): Map<string, Offer[]> {
	const designs = new Map<string, Offer[]>();
	for (const offer of offers) {
		for (const design of new Set(offer.prints.map((print) => print.design))) {
			const prints = offer.prints.filter((print) => print.design === design);
			const narrowed = prints.length === offer.prints.length ? offer : { ...offer, prints };
			const known = designs.get(design);
			if (known) known.push(narrowed);
			else designs.set(design, [narrowed]);
		}
	}
	return designs;
}

/** What the shelf has for a slot; slots that ask for the same share the answer. */
export function usesOn(shelf: Shelf, slot: Slot): Uses {
	const key = JSON.stringify([slot.material, slot.swaps, slot.design, slot.collection]);
	const known = shelf.found.get(key) ?? new Uses(usesFor(slot, shelf));
	shelf.found.set(key, known);
	return known;
}
