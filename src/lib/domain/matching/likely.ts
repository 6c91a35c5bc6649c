import { LIES } from '../cutting/problem';
import type { Offer } from './layout';
import type { Sorts } from './least-cost';
import { lieOn } from './lies';
import type { Cuttable, Part } from './parts';

const FEW = 16;

/**
 * The sorts that a first search needs to look at, the same object where there are few: of whole sheets and of
 * offcuts the largest, until there is paper to spare. The fewest sheets are nearly always the largest ones; where
 * they are not, the answer is only not proved by this.
 */
export function likelySorts(part: Part, sorts: Sorts): Sorts {
	if (sorts.length <= FEW) return sorts;
	const wanted = part.pieces.reduce((sum, { w, h, qty }) => sum + w * h * qty, 0);
	const chosen = new Set<readonly Offer[]>();
	for (const bySize of Object.values(sizesOf(sorts))) {
		let area = 0;
		let number = 0;
		for (const offers of bySize) {
			if (number >= FEW / 4 && area >= 2 * wanted) break;
			if (!part.pieces.some((cut) => takes(offers, cut, part))) continue;
			chosen.add(offers);
			area += paperOf(offers);
			number += 1;
		}
	}
	for (const cut of part.pieces) {
		if ([...chosen].some((offers) => takes(offers, cut, part))) continue;
		const first = sorts.find((offers) => takes(offers, cut, part));
		if (first) chosen.add(first);
	}
	const total = part.pieces.reduce((sum, { qty }) => sum + qty, 0);
	const enough = part.slot.colour === null ? total : Infinity;
	return sorts.flatMap((offers) => (chosen.has(offers) ? [firstOf(offers, enough)] : []));
}

interface Sizes {
	readonly whole: Sorts;
	readonly left: Sorts;
}

const sized = new WeakMap<Sorts, Sizes>();

/** Largest first; known for sorts that are asked for again. */
function sizesOf(sorts: Sorts): Sizes {
	const known = sized.get(sorts);
	if (known) return known;
	const bySize = sorts
		.flatMap((offers) => (offers[0] ? [{ offers, left: offers[0].sheet.left, size: sizeOf(offers) }] : []))
		.sort((a, b) => b.size - a.size);
	const ofKind = (wanted: boolean) => bySize.flatMap(({ offers, left }) => (left === wanted ? [offers] : []));
	const sizes = { whole: ofKind(false), left: ofKind(true) };
	sized.set(sorts, sizes);
	return sizes;
}

function sizeOf([first]: readonly Offer[]): number {
	return first ? first.sheet.w * first.sheet.h : 0;
}

function paperOf(offers: readonly Offer[]): number {
	return sizeOf(offers) * offers.reduce((sum, { sheet }) => sum + sheet.count, 0);
}

function takes([first]: readonly Offer[], cut: Cuttable, { terms }: Part): boolean {
	return first !== undefined && lieOn(cut, first.sheet, first.prints, terms) !== LIES.never;
}

/** The first rows of a sort that make up so many sheets. */
function firstOf(offers: readonly Offer[], sheets: number): readonly Offer[] {
	let open = sheets;
	return offers.filter(({ sheet }) => {
		const taken = open > 0;
		open -= sheet.count;
		return taken;
	});
}
