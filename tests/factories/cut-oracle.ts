/**
 * The plain oracle: every set of sheets, every way to share the pieces out, every cut at every unit. It shares
 * nothing with the planner, not even the kerf's trick, and is only for problems of a few pieces.
 */
import type { CutProblem } from '../../src/lib/domain/cutting/problem';

/** The least cost, or null where the sheets can't hold the pieces. */
export function leastCost(problem: CutProblem): [number, number] | null {
	const pieces = problem.pieces.flatMap(({ qty }, p) => Array.from({ length: qty }, () => p));
	const all = (1 << pieces.length) - 1;
	const room = problem.sheets.map((_, s) => heldBy(problem, pieces, s));
	let states = new Map<number, [number, number]>([[0, [0, 0]]]);
	problem.sheets.forEach(({ count, cost }, s) => {
		for (let n = 0; n < Math.min(count, pieces.length); n++) {
			const next = new Map(states);
			for (const [held, [first, second]] of states) {
				const free = all & ~held;
				for (let part = free; part > 0; part = (part - 1) & free) {
					if (!room[s]?.has(part)) continue;
					const price: [number, number] = [first + cost[0], second + cost[1]];
					const known = next.get(held | part);
					if (!known || price[0] < known[0] || (price[0] === known[0] && price[1] < known[1]))
						next.set(held | part, price);
				}
			}
			states = next;
		}
	});
	return states.get(all) ?? null;
}

/** The sets of pieces that can be cut from one sheet of kind `s`. */
function heldBy(problem: CutProblem, pieces: readonly number[], s: number): Set<number> {
	const { w, h } = problem.sheets[s] as CutProblem['sheets'][number];
	const known = new Map<string, boolean>();
	const cuttable = (set: number, x: number, y: number): boolean => {
		if (set === 0) return true;
		if (x <= 0 || y <= 0) return false;
		const key = `${set} ${x} ${y}`;
		const answer = known.get(key);
		if (answer !== undefined) return answer;
		const found = alone(set, x, y) || divided(set, x, y);
		known.set(key, found);
		return found;
	};
	const alone = (set: number, x: number, y: number): boolean => {
		const index = Math.log2(set);
		if (!Number.isInteger(index)) return false;
		const piece = problem.pieces[pieces[index] as number];
		const lies = piece?.lies[s] ?? 0;
		if (!piece) return false;
		return (
			((lies & 1) === 1 && piece.w <= x && piece.h <= y) || ((lies & 2) === 2 && piece.h <= x && piece.w <= y)
		);
	};
	const divided = (set: number, x: number, y: number): boolean => {
		for (let part = (set - 1) & set; part > 0; part = (part - 1) & set) {
			for (let at = 1; at < x; at++)
				if (cuttable(part, at, y) && cuttable(set & ~part, x - at - problem.kerf, y)) return true;
			for (let at = 1; at < y; at++)
				if (cuttable(part, x, at) && cuttable(set & ~part, x, y - at - problem.kerf)) return true;
		}
		return false;
	};
	const held = new Set<number>();
	for (let set = 1; set < 1 << pieces.length; set++) if (cuttable(set, w, h)) held.add(set);
	return held;
}
