import { LIES } from '../cutting/problem';
import type { Cost, CostOf, Offer } from './layout';
import { lieOn } from './lies';
import type { Part } from './parts';

/**
 * A cost that no layout of these pieces on these rows can beat, by area and by what fits no offcut; null where a
 * piece fits nowhere or there is less paper than pieces, so that there is no layout at all.
 */
export function leastCost(
	parts: readonly Part[],
	offers: readonly (readonly Offer[])[],
	costOf: CostOf
): Cost | null {
	let area = 0;
	let needsWhole = false;
	for (const [p, part] of parts.entries()) {
		for (const cut of part.pieces) {
			if (cut.qty === 0) continue;
			area += cut.w * cut.h * cut.qty;
			const fitting = (offers[p] ?? []).filter(
				({ sheet, prints }) => lieOn(cut, sheet, prints, part.terms) !== LIES.never
			);
			if (fitting.length === 0) return null;
			needsWhole ||= fitting.every(({ sheet }) => costOf(sheet)[0] > 0);
		}
	}
	if (area === 0) return [0, 0];
	const sheets = new Set(offers.flat().map(({ sheet }) => sheet));
	let [free, whole, perArea, cheapest] = [0, 0, Infinity, Infinity];
	for (const sheet of sheets) {
		const [cost] = costOf(sheet);
		const size = sheet.w * sheet.h;
		if (cost === 0) free += size * sheet.count;
		else {
			whole += size * sheet.count;
			perArea = Math.min(perArea, cost / size);
			cheapest = Math.min(cheapest, cost);
		}
	}
	if (area > free + whole) return null;
	const byArea = area > free ? Math.ceil((area - free) * perArea - 1e-9) : 0;
	const first = Math.max(byArea, needsWhole ? cheapest : 0);
	return first > 0 ? [first, 0] : [0, 1];
}

export function isBelow(a: Cost, b: Cost): boolean {
	return a[0] < b[0] || (a[0] === b[0] && a[1] < b[1]);
}
