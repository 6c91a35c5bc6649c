/**
 * Lower bounds as inequalities. Each says: the sheets opened must give at least `need`, where a sheet of kind s
 * gives `give[s]`. A dual feasible function f that is superadditive turns lengths into other lengths without
 * making any set of pieces that fits along a side stop fitting; so the products f(w) g(h) are areas that must be
 * covered just as real ones must. The functions: identity (area), f0 (Fekete & Schepers 2001, which with its
 * products contains the bounds of Martello & Vigo 1998), u(k) (Lueker 1983) and the discrete f of Carlier,
 * Clautiaux & Moukrim 2007 (after Boschetti & Mingozzi 2003). A piece that may turn counts with the smaller of
 * its two products. Each inequality is stated for all pieces and for those that only some kinds can take.
 */
import type { Model } from './model';

export interface Inequality {
	readonly need: number;
	readonly give: readonly number[];
}

type Dual = (x: number) => number;
const same: Dual = (x) => x;

/** Real areas only: the quickest bound. */
export function areasOf(model: Model): Inequality[] {
	const all = model.sheets.map(() => true);
	const real = turnedBy(model, same);
	return [
		{ need: needOf(model, liesWithin(model, all), real, real), give: model.sheets.map(({ area }) => area) }
	];
}

export function inequalitiesOf(model: Model, thorough: boolean): Inequality[] {
	const w = Math.max(0, ...model.sheets.map((sheet) => sheet.w));
	const h = Math.max(0, ...model.sheets.map((sheet) => sheet.h));
	const sides = sidesOf(model);
	const across = dualsOf(w, sides, thorough).map((f) => turnedBy(model, f));
	const down = dualsOf(h, sides, thorough).map((g) => turnedBy(model, g));
	const groups = groupsOf(model).map((group) => ({ group, lies: liesWithin(model, group) }));
	const found = new Map<string, Inequality>();
	for (const f of across) {
		for (const g of down) {
			for (const { group, lies } of groups) {
				const need = needOf(model, lies, f, g);
				if (need === 0) continue;
				const give = group.map((open, s) => (open ? (f.sheetW[s] as number) * (g.sheetH[s] as number) : 0));
				const key = give.join();
				if (need > (found.get(key)?.need ?? 0)) found.set(key, { need, give });
			}
		}
	}
	return [...found.values()];
}

/** Every length of the model as a dual function turns it. */
interface Turned {
	readonly w: readonly number[];
	readonly h: readonly number[];
	readonly sheetW: readonly number[];
	readonly sheetH: readonly number[];
}

function turnedBy({ pieces, sheets }: Model, dual: Dual): Turned {
	return {
		w: pieces.map(({ w }) => dual(w)),
		h: pieces.map(({ h }) => dual(h)),
		sheetW: sheets.map(({ w }) => dual(w)),
		sheetH: sheets.map(({ h }) => dual(h))
	};
}

function sidesOf(model: Model): number[] {
	return [...new Set(model.pieces.flatMap(({ w, h }) => [w, h]))].sort((a, b) => a - b);
}

/** Sets of sheet kinds to which some pieces are confined; the set of all kinds is always one. */
function groupsOf(model: Model): boolean[][] {
	const groups = new Map<string, boolean[]>();
	const add = (group: boolean[]) => groups.set(group.join(), group);
	add(model.sheets.map(() => true));
	model.pieces.forEach((_, p) => {
		if (groups.size < 12) add(model.sheets.map((sheet) => sheet.lies[p] !== 0));
	});
	return [...groups.values()];
}

/** By piece, how it may lie on the sheets of a group; -1 where some other sheet takes it too. */
function liesWithin({ pieces, sheets }: Model, group: readonly boolean[]): number[] {
	return pieces.map((_, p) => {
		let lies = 0;
		for (let s = 0; s < group.length; s++) {
			const lie = sheets[s]?.lies[p] ?? 0;
			if (lie !== 0 && !group[s]) return -1;
			lies |= lie;
		}
		return lies;
	});
}

function needOf({ pieces }: Model, lies: readonly number[], f: Turned, g: Turned): number {
	let need = 0;
	for (let p = 0; p < pieces.length; p++) {
		const lie = lies[p] as number;
		if (lie < 0) continue;
		const upright = lie & 1 ? (f.w[p] as number) * (g.h[p] as number) : Infinity;
		const turned = lie & 2 ? (f.h[p] as number) * (g.w[p] as number) : Infinity;
		need += (pieces[p]?.qty ?? 0) * Math.min(upright, turned);
	}
	return need;
}

function dualsOf(size: number, sides: readonly number[], thorough: boolean): Dual[] {
	const duals: Dual[] = [same];
	const most = thorough ? 40 : 8;
	const halves = [...new Set(sides.flatMap((side) => [side, size - side]))].filter(
		(e) => e > 0 && 2 * e <= size
	);
	for (const e of spread(halves, most)) {
		duals.push((x) => (x < e ? 0 : x > size - e ? size : x));
		duals.push(carlier(size, e));
	}
	for (let k = 1; k <= (thorough ? 6 : 3); k++) {
		duals.push((x) => (((k + 1) * x) % size === 0 ? x * k : Math.floor(((k + 1) * x) / size) * size));
	}
	return duals;
}

function carlier(size: number, c: number): Dual {
	const top = Math.floor(size / c);
	return (x) => {
		if (2 * x > size) return 2 * (top - Math.floor((size - x) / c));
		return 2 * x === size ? top : 2 * Math.floor(x / c);
	};
}

function spread(values: readonly number[], most: number): number[] {
	if (values.length <= most) return [...values];
	return Array.from({ length: most }, (_, i) => values[Math.floor((i * values.length) / most)] as number);
}
