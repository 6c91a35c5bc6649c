import type { Seat } from './components';
import type { Cost, CostOf } from './layout';

const LEFT: Cost = [0, 1];
const ONE: Cost = [1, 0];

/** Whole sheets first, by price where every candidate has one in one currency; then offcuts and remnants. */
export function costsOf(seats: readonly Seat[]): CostOf {
	if (!arePriced(seats)) return (sheet) => (sheet.left ? LEFT : ONE);
	return (sheet) => (sheet.left ? LEFT : [sheet.supply.price?.amount ?? 1, 0]);
}

/** Cost of the dearest sheet that could be opened: turns a bound on costs into one on sheets. */
export function dearestOf(seats: readonly Seat[]): number {
	return arePriced(seats) ? Math.max(...seats.map(({ uses }) => uses.dearest)) : 1;
}

function arePriced(seats: readonly Seat[]): boolean {
	const currencies = new Set(seats.flatMap(({ uses }) => [...uses.currencies]));
	return currencies.size === 1 && !currencies.has(null);
}
