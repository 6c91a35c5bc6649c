import type { Part } from './parts';
import { usesFor, type Use } from './serving';
import type { Sheet, Shelf } from './shelf';

/** A part and every row that could serve it on the most generous terms. */
export interface Seat {
	readonly part: Part;
	readonly uses: readonly Use[];
}

/** Seats that must be planned together: they share a row that could serve both, or their designs are related. */
export function componentsOf(parts: readonly Part[], shelf: Shelf): Seat[][] {
	const seats = parts.map((part) => ({ part, uses: usesFor(part.slot, shelf) }));
	const root = seats.map((_, i) => i);
	const find = (i: number): number => {
		const above = root[i] ?? i;
		return above === i ? i : (root[i] = find(above));
	};
	const join = (a: number, b: number) => {
		root[find(Math.max(a, b))] = find(Math.min(a, b));
	};
	const owner = new Map<Sheet, number>();
	seats.forEach(({ part, uses }, i) => {
		for (const { sheet } of uses) {
			const known = owner.get(sheet);
			if (known === undefined) owner.set(sheet, i);
			else join(known, i);
		}
		seats.slice(0, i).forEach((other, j) => {
			if (other.part.group === part.group || part.differs.has(other.part.group)) join(i, j);
		});
	});
	const components = new Map<number, Seat[]>();
	seats.forEach((seat, i) => components.set(find(i), [...(components.get(find(i)) ?? []), seat]));
	return [...components.values()];
}
