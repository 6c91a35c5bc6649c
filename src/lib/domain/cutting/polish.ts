/**
 * Of plans that cost the same the one with the fewest cuts is kept, then the fewest distinct fence settings, then
 * the largest single leftover. Each sheet is laid out anew by every measure and judgement, then pieces are moved
 * between sheets as in `recreate.ts` at the same price; both for a fixed small allowance, since no cost hangs on
 * it. (Every cut makes one region more, so the fewest cuts are the fewest offcuts.)
 */
import { eachPiece } from './box';
import { EMPTY, JUDGES, MEASURES, type FilledSheet, type Inserter, type State } from './insert';
import { fenceSetting, type CutTree } from './order';
import type { Rect } from './problem';
import { disturb } from './recreate';

/** Cuts, fence settings, largest leftover. */
type Merit = readonly [number, number, number];

/** How a sheet is carried out: the cuts in their dependence, and what they leave. */
export type Carve = (sheet: FilledSheet) => {
	readonly trees: readonly CutTree[];
	readonly offcuts: readonly Rect[];
};

export function polish(inserter: Inserter, start: State, carve: Carve, go: () => boolean): State {
	const judged = new Map<FilledSheet, Merit>();
	const meritOf = (sheet: FilledSheet) => {
		const known = judged.get(sheet) ?? meritOfOne(carve(sheet));
		judged.set(sheet, known);
		return known;
	};
	const total = ({ sheets }: State) => sheets.map(meritOf).reduce(sum, [0, 0, 0]);
	let best: State = { ...start, sheets: start.sheets.map((sheet) => relaid(inserter, sheet, meritOf, go)) };
	let merit = total(best);
	while (go()) {
		const next = disturb(inserter, best, best.cost);
		if (next.outside.length > 0 || next.cost > best.cost) continue;
		const nextMerit = total(next);
		if (worse(nextMerit, merit)) continue;
		best = next;
		merit = nextMerit;
	}
	return best;
}

function relaid(
	inserter: Inserter,
	sheet: FilledSheet,
	meritOf: (sheet: FilledSheet) => Merit,
	go: () => boolean
): FilledSheet {
	const pieces: number[] = [];
	eachPiece(sheet.box, ({ piece }) => pieces.push(piece));
	const limit = inserter.sheet(sheet.sheet).cost;
	let best = sheet;
	for (const judge of JUDGES) {
		for (const measure of MEASURES) {
			if (!go()) return best;
			const order = inserter.sorted(pieces, measure, 0);
			const again = inserter.insert(EMPTY, order, { limit, blink: 0, judge, opens: sheet.sheet });
			const [only, ...others] = again.sheets;
			const same = only?.sheet === sheet.sheet && others.length === 0 && again.outside.length === 0;
			if (only && same && !worse(meritOf(only), meritOf(best))) best = only;
		}
	}
	return best;
}

function meritOfOne({ trees, offcuts }: ReturnType<Carve>): Merit {
	const settings = new Set<number>();
	let cuts = 0;
	const visit = ({ cut, then }: CutTree) => {
		cuts++;
		settings.add(fenceSetting(cut));
		then.forEach(visit);
	};
	trees.forEach(visit);
	return [cuts, settings.size, Math.max(0, ...offcuts.map(({ w, h }) => w * h))];
}

function sum(a: Merit, b: Merit): Merit {
	return [a[0] + b[0], a[1] + b[1], Math.max(a[2], b[2])];
}

function worse(a: Merit, b: Merit): boolean {
	if (a[0] !== b[0]) return a[0] > b[0];
	return a[1] !== b[1] ? a[1] > b[1] : a[2] < b[2];
}
