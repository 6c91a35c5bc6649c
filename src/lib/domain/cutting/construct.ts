/** Plain constructions: every measure of size by which pieces can be taken in turn, with each favourite sheet. */
import { EMPTY, JUDGES, MEASURES, type Inserter, type Manner, type State } from './insert';

/** The cheapest construction, or the first that is `enough`; some pieces may be outside. */
export function construct(inserter: Inserter, enough: (state: State) => boolean): State {
	const pieces = inserter.model.pieces.flatMap(({ qty }, p) => Array.from({ length: qty }, () => p));
	let best: State | null = null;
	for (const opens of favourites(inserter)) {
		for (const measure of MEASURES) {
			const manner: Manner = { limit: Infinity, blink: 0, judge: JUDGES[0] as Manner['judge'], opens };
			const state = inserter.insert(EMPTY, inserter.sorted(pieces, measure, 0), manner);
			if (!best || less(inserter, state, best)) best = state;
			if (enough(best)) return best;
		}
	}
	return best as State;
}

/** The cheapest for its area, then each of the largest kinds: which to open first is anybody's guess. */
function favourites({ model }: Inserter): Manner['opens'][] {
	const kinds = model.sheets.map((_, s) => s).filter((s) => (model.sheets[s]?.count ?? 0) > 0);
	const area = (s: number) => model.sheets[s]?.area ?? 0;
	const largest = kinds.length > 1 ? kinds.sort((a, b) => area(b) - area(a) || a - b).slice(0, 6) : [];
	return ['cheapest', ...largest];
}

function less(inserter: Inserter, a: State, b: State): boolean {
	const outside = areaOutside(inserter, a) - areaOutside(inserter, b);
	return outside < 0 || (outside === 0 && a.cost < b.cost);
}

export function areaOutside(inserter: Inserter, { outside }: State): number {
	let area = 0;
	for (const p of outside) area += inserter.piece(p).area;
	return area;
}
