import type { Seat } from './components';
import { chooseDesigns } from './designs';
import type { Bench, CostOf } from './layout';
import type { Terms } from './parts';
import { seatOn } from './papers';

/** How many of each piece, by seat and piece. */
export type Counts = readonly (readonly number[])[];

/**
 * What can be cut on these terms where not everything can: slot by slot in the bill's order and piece by piece
 * within a slot, each as many as possible without losing an earlier one.
 */
export function countMost(seats: readonly Seat[], terms: Terms, costOf: CostOf, bench: Bench): Counts {
	const counts = seats.map(({ part }) => part.pieces.map(() => 0));
	const works = (): boolean => {
		const at = withCounts(seats, counts).map((seat) => seatOn(seat, terms));
		return at.length === 0 || chooseDesigns(at, costOf, { ...bench, goal: 'any' }).status === 'planned';
	};
	seats.forEach(({ part }, s) =>
		part.pieces.forEach(({ qty }, p) => {
			const row = counts[s] ?? [];
			let [least, most] = [0, qty];
			while (least < most) {
				const tried = most === qty ? qty : Math.ceil((least + most) / 2);
				row[p] = tried;
				if (works()) least = tried;
				else most = tried - 1;
			}
			row[p] = least;
		})
	);
	return counts;
}

/** The seats with so many of each piece; seats that are left with none are left out. */
export function withCounts(seats: readonly Seat[], counts: Counts): Seat[] {
	return seats.flatMap((seat, s) => {
		const pieces = seat.part.pieces.flatMap((cut, p) => {
			const qty = counts[s]?.[p] ?? 0;
			return qty > 0 ? [{ ...cut, qty }] : [];
		});
		return pieces.length > 0 ? [{ ...seat, part: { ...seat.part, pieces } }] : [];
	});
}
