import type { Seat } from './components';
import type { Choice } from './designs';
import { layOut, type Bench, type CostOf, type Layout } from './layout';
import { isBelow } from './least-cost';
import type { Cuttable, Part } from './parts';

type Planned = Extract<Choice, { status: 'planned' }>;

/** Gives pieces that were made as small as allowed their size back, one after the other, as far as there is room. */
export function restoreSizes(
	seats: readonly Seat[],
	choice: Planned,
	costOf: CostOf,
	bench: Bench
): { seats: readonly Seat[]; layout: Layout } {
	let found = { parts: seats.map(({ part }) => part) as readonly Part[], layout: choice.layout };
	const attempt = (parts: readonly Part[]): boolean => {
		const outcome = layOut(parts, choice.sorts, costOf, { ...bench, goal: 'any' });
		if (outcome.status === 'planned') found = { parts, layout: outcome.layout };
		return outcome.status === 'planned';
	};
	const smaller = shortened(found.parts);
	if (
		smaller.length > 0 &&
		!attempt(smaller.reduce((parts, one) => resized(parts, one, one.full), found.parts))
	) {
		for (const one of smaller) {
			let [least, most] = [one.cut[one.side], one.full];
			while (least < most) {
				const size = most === one.full ? most : Math.ceil((least + most) / 2);
				if (attempt(resized(found.parts, one, size))) least = size;
				else most = size - 1;
			}
		}
	}
	return {
		seats: seats.map((seat, i) => ({ ...seat, part: found.parts[i] ?? seat.part })),
		layout: polished(found.parts, found.layout, choice, costOf, bench)
	};
}

/** The same choice planned once more with the cuts in mind; what was proved of it stands. */
function polished(
	parts: readonly Part[],
	layout: Layout,
	choice: Planned,
	costOf: CostOf,
	bench: Bench
): Layout {
	const again = layOut(parts, choice.sorts, costOf, { ...bench, goal: 'shown' });
	if (again.status !== 'planned' || isBelow(layout.cost, again.layout.cost)) return layout;
	if (layout !== choice.layout || isBelow(again.layout.cost, layout.cost)) return again.layout;
	return { ...again.layout, bound: layout.bound, minimum: layout.minimum };
}

interface Shortened {
	readonly part: number;
	readonly piece: number;
	readonly side: 'w' | 'h';
	readonly cut: Cuttable;
	readonly full: number;
}

function shortened(parts: readonly Part[]): Shortened[] {
	return parts.flatMap(({ pieces }, part) =>
		pieces.flatMap((cut, piece) =>
			(['h', 'w'] as const)
				.filter((side) => cut[side] < cut.piece[side])
				.map((side) => ({ part, piece, side, cut, full: cut.piece[side] }))
		)
	);
}

function resized(parts: readonly Part[], { part, piece, side }: Shortened, size: number): readonly Part[] {
	return parts.map((one, p) =>
		p === part
			? { ...one, pieces: one.pieces.map((cut, c) => (c === piece ? { ...cut, [side]: size } : cut)) }
			: one
	);
}
