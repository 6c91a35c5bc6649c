import type { Seat } from './components';
import { highestLevel, type Terms } from './parts';

/**
 * The terms on which paper is sought, best verdict first: as the bill says, with swaps and allowances, then as
 * orders arrive, then with what nobody has counted or stated.
 */
export function rungsOf(seats: readonly Seat[], first: Terms): Terms[] {
	const highest = Math.max(0, ...seats.map(({ part }) => highestLevel(part)));
	const dates = arrivals(seats, first.on);
	return [
		...levels(first, highest),
		...dates.map((on) => ({ ...first, on, level: highest })),
		...[first.on, ...dates].map((on) => ({ ...first, on, level: highest, unsure: true }))
	];
}

/** The terms between the bill's own and those that were needed, best verdict first, those themselves last. */
export function milderThan(needed: Terms, first: Terms): Terms[] {
	const dated = needed.on === first.on ? [] : levels({ ...first, on: needed.on }, needed.level);
	const unsure = needed.unsure
		? [first.on, ...(needed.on === first.on ? [] : [needed.on])].flatMap((on) =>
				levels({ ...first, on, unsure: true }, needed.level)
			)
		: [];
	return [...levels(first, needed.level), ...dated, ...unsure];
}

function levels(terms: Terms, highest: number): Terms[] {
	return Array.from({ length: highest + 1 }, (_, level) => ({ ...terms, level }));
}

function arrivals(seats: readonly Seat[], on: string): string[] {
	return [...new Set(seats.flatMap(({ uses }) => uses.arrivals))].filter((date) => date > on).sort();
}
