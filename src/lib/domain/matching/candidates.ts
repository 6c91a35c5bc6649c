import { colourDistance } from './colour-wish';
import type { Cost, CostOf, Offer } from './layout';
import { isBelow, leastCost } from './least-cost';
import type { Part } from './parts';
import type { Sheet } from './shelf';
import type { Extent, Offers } from './uses';

/** Slots that show one design together. */
export interface Group {
	readonly key: string;
	/** Numbers of its parts among those that are planned together. */
	readonly seats: readonly number[];
	readonly differs: ReadonlySet<string>;
}

/** A design that could serve a whole group by itself. */
export interface Candidate {
	readonly design: string;
	/** By place in the group. */
	readonly offers: readonly (readonly Offer[])[];
	readonly sheets: ReadonlySet<Sheet>;
	/** What the group alone would cost at least. */
	readonly least: Cost;
	/** The group's pieces would fill most of its paper: likelier than not too much for it. */
	readonly tight: boolean;
}

const ROOMY = 0.7;

/** The designs open to one group. Those of a class are alike in every way that counts, up to their names. */
export class Candidates {
	/** By class, the designs in the stash's order, or in that of the colour wishes. */
	private readonly classes: readonly (readonly string[])[];
	private readonly parts: readonly Part[];
	private readonly offers: readonly Offers[];
	private readonly known = new Map<string, Candidate | null>();
	private readonly area: number;
	/** By part, the least extent that a design must have. */
	private readonly needs: readonly Extent[];
	private ranked: readonly { readonly designs: readonly string[]; readonly first: Candidate }[] | null = null;

	/**
	 * `depth`: how many steps over rows' other faces a class looks. `chosen`: names that some slot asks for; such
	 * a design is a class of its own.
	 */
	constructor(
		group: Group,
		parts: readonly Part[],
		offers: readonly Offers[],
		private readonly costOf: CostOf,
		depth: number,
		chosen: ReadonlySet<string>
	) {
		this.parts = group.seats.flatMap((seat) => parts[seat] ?? []);
		this.offers = group.seats.flatMap((seat) => offers[seat] ?? []);
		this.needs = this.parts.map(({ pieces }) => ({
			area: pieces.reduce((all, { w, h, qty }) => all + w * h * qty, 0),
			short: Math.max(0, ...pieces.map(({ w, h }) => Math.min(w, h))),
			long: Math.max(0, ...pieces.map(({ w, h }) => Math.max(w, h)))
		}));
		this.area = this.needs.reduce((sum, { area }) => sum + area, 0);
		const classes = this.offers[0]?.classes(depth) ?? [];
		const named = chosen.size === 0 ? classes : classes.flatMap((designs) => this.apart(designs, chosen));
		const wished = this.parts.some(({ slot }) => slot.colour !== null);
		this.classes = wished
			? named.map((designs) => [...designs].sort((a, b) => this.colourOf(a) - this.colourOf(b)))
			: named;
	}

	private apart(designs: readonly string[], chosen: ReadonlySet<string>): string[][] {
		const isChosen = (design: string) =>
			chosen.has(this.offers[0]?.designs.get(design)?.[0]?.prints[0]?.name ?? '');
		const others = designs.filter((design) => !isChosen(design));
		return [...designs.filter(isChosen).map((design) => [design]), ...(others.length > 0 ? [others] : [])];
	}

	of(design: string): Candidate | null {
		if (!this.hasRoom(design)) return null;
		const known = this.known.get(design);
		if (known !== undefined) return known;
		const offers = this.offers.map(({ designs }) => designs.get(design) ?? []);
		const sorts = offers.map((list) => list.map((offer) => [offer]));
		const least = leastCost(this.parts, sorts, this.costOf);
		const sheets = new Set(offers.flat().map(({ sheet }) => sheet));
		const candidate = least && { design, offers, sheets, least, tight: this.area > ROOMY * paperOf(sheets) };
		this.known.set(design, candidate);
		return candidate;
	}

	private hasRoom(design: string): boolean {
		return this.needs.every((need, i) => {
			const extent = this.offers[i]?.extentOf(design);
			return extent && extent.area >= need.area && extent.short >= need.short && extent.long >= need.long;
		});
	}

	/**
	 * The first of each class of which `isOpen` holds: least bound first, the roomy before the tight, then by
	 * colour wish, then by the stash's order.
	 */
	firsts(isOpen: (design: string) => boolean): Candidate[] {
		this.ranked ??= this.classes
			.flatMap((designs) => {
				const first = this.of(designs[0] ?? '');
				return first ? [{ designs, first, colour: this.colourOf(first.design), order: orderOf(first) }] : [];
			})
			.sort((a, b) => compare(a.first, b.first) || a.colour - b.colour || a.order - b.order);
		return this.ranked.flatMap(({ designs, first }) => {
			if (isOpen(first.design)) return [first];
			const design = designs.find(isOpen);
			return (design === undefined ? null : this.of(design)) ?? [];
		});
	}

	private colourOf(design: string): number {
		return this.parts.reduce((sum, { slot }, i) => {
			const rows = slot.colour === null ? [] : (this.offers[i]?.designs.get(design) ?? []);
			return (
				sum +
				(rows.length > 0
					? Math.min(...rows.map(({ sheet }) => colourDistance(slot.colour, sheet.supply)))
					: 0)
			);
		}, 0);
	}
}

function compare(a: Candidate, b: Candidate): number {
	return isBelow(a.least, b.least) ? -1 : isBelow(b.least, a.least) ? 1 : Number(a.tight) - Number(b.tight);
}

function paperOf(sheets: ReadonlySet<Sheet>): number {
	return [...sheets].reduce((sum, { w, h, count }) => sum + w * h * count, 0);
}

function orderOf({ sheets }: Candidate): number {
	return Math.min(...[...sheets].map(({ order }) => order));
}

export function touches(a: Candidate, b: Candidate): boolean {
	if (a.design === b.design) return true;
	for (const sheet of b.sheets) {
		if (a.sheets.has(sheet)) return true;
	}
	return false;
}
