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
	return [
		inequalityOf(
			model,
			model.sheets.map(() => true),
			same,
			same,
			model.sheets.map(({ area }) => area)
		)
	];
}

export function inequalitiesOf(model: Model, thorough: boolean): Inequality[] {
	const w = Math.max(0, ...model.sheets.map((sheet) => sheet.w));
	const h = Math.max(0, ...model.sheets.map((sheet) => sheet.h));
	const sides = sidesOf(model);
	const across = dualsOf(w, sides, thorough);
	const down = dualsOf(h, sides, thorough);
	const groups = groupsOf(model);
	const found = new Map<string, Inequality>();
	for (const f of across) {
		for (const g of down) {
			const give = model.sheets.map((sheet) => f(sheet.w) * g(sheet.h));
			for (const group of groups) {
				const inequality = inequalityOf(model, group, f, g, give);
				const key = inequality.give.join();
				if (inequality.need > (found.get(key)?.need ?? 0)) found.set(key, inequality);
			}
		}
	}
	return [...found.values()];
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

function inequalityOf(
	model: Model,
	group: readonly boolean[],
	f: Dual,
	g: Dual,
	give: readonly number[]
): Inequality {
	let need = 0;
	model.pieces.forEach(({ w, h, qty }, p) => {
		let lies = 0;
		for (let s = 0; s < group.length; s++) {
			const lie = model.sheets[s]?.lies[p] ?? 0;
			if (lie !== 0 && !group[s]) return;
			lies |= lie;
		}
		const upright = lies & 1 ? f(w) * g(h) : Infinity;
		const turned = lies & 2 ? f(h) * g(w) : Infinity;
		need += qty * Math.min(upright, turned);
	});
	return { need, give: give.map((value, s) => (group[s] ? value : 0)) };
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
