import type { Part } from './parts';
import type { Shelf } from './shelf';
import { usesOn, type Uses } from './uses';

/** A part and every row that could serve it on the most generous terms. */
export interface Seat {
	readonly part: Part;
	readonly uses: Uses;
}

/** Seats that must be planned together: they share a row that could serve both, or their designs are related. */
export function componentsOf(parts: readonly Part[], shelf: Shelf): Seat[][] {
	const seats = parts.map((part) => ({ part, uses: usesOn(shelf, part.slot) }));
	const components: Seat[][] = [];
	for (const seat of seats) {
		const joined = components.filter((component) => component.some((other) => belongTogether(seat, other)));
		const [first] = joined;
		if (!first) components.push([seat]);
		else {
			for (const other of joined.slice(1)) {
				first.push(...other);
				components.splice(components.indexOf(other), 1);
			}
			first.push(seat);
			first.sort((a, b) => parts.indexOf(a.part) - parts.indexOf(b.part));
		}
	}
	return components;
}

function belongTogether(a: Seat, b: Seat): boolean {
	return a.part.group === b.part.group || a.part.differs.has(b.part.group) || a.uses.overlaps(b.uses);
}
