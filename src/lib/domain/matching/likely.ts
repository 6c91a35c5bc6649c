import { LIES } from '../cutting/problem';
import type { CostOf, Offer } from './layout';
import type { Sorts } from './least-cost';
import { lieOn } from './lies';
import type { Part } from './parts';

const FEW = 16;

/**
 * The sorts that a first search needs to look at, the same object where there are few: of whole sheets and of
 * offcuts the largest, until there is paper to spare. The fewest sheets are nearly always the largest ones; where
 * they are not, the answer is only not proved by this.
 */
export function likelySorts(part: Part, sorts: Sorts, costOf: CostOf): Sorts {
	if (sorts.length <= FEW) return sorts;
	const wanted = part.pieces.reduce((sum, { w, h, qty }) => sum + w * h * qty, 0);
	const serving = sorts.flatMap((offers) => {
		const [first] = offers;
		const fits = first
			? part.pieces.map((cut) => lieOn(cut, first.sheet, first.prints, part.terms) !== LIES.never)
			: [];
		return first && fits.includes(true) ? [{ offers, fits, first, size: first.sheet.w * first.sheet.h }] : [];
	});
	const chosen = new Set<readonly Offer[]>();
	for (const whole of [true, false]) {
		const bySize = serving
			.filter(({ first }) => costOf(first.sheet)[0] > 0 === whole)
			.sort((a, b) => b.size - a.size);
		let area = 0;
		for (const [i, { offers, size }] of bySize.entries()) {
			if (i >= FEW / 4 && area >= 2 * wanted) break;
			chosen.add(offers);
			area += size * offers.reduce((sum, { sheet }) => sum + sheet.count, 0);
		}
	}
	for (const c of part.pieces.keys()) {
		const fitting = serving.filter(({ fits }) => fits[c]);
		if (fitting[0] && !fitting.some(({ offers }) => chosen.has(offers))) chosen.add(fitting[0].offers);
	}
	const total = part.pieces.reduce((sum, { qty }) => sum + qty, 0);
	return sorts.flatMap((offers) => {
		if (!chosen.has(offers)) return [];
		return [part.slot.colour === null ? enough(offers, total) : offers];
	});
}

/** The first rows of a sort that make up so many sheets. */
function enough(offers: readonly Offer[], sheets: number): readonly Offer[] {
	let open = sheets;
	return offers.filter(({ sheet }) => {
		const taken = open > 0;
		open -= sheet.count;
		return taken;
	});
}
