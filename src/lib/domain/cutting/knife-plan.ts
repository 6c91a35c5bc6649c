/**
 * Plans for a user who cuts by knife. The trimmer's plan comes first and stays unless fewer or cheaper sheets are
 * found by letting pieces interlock: only the combinations of sheets that cost less are searched. What is proved
 * for edge-to-edge cuts is not proved here, so the bound is that of the inequalities alone, which hold for any
 * layout, and of the combinations that were searched to the end.
 */
import { inequalitiesOf } from './bounds';
import { Combinations } from './combinations';
import { interlock, type KnifeSheet } from './interlocked';
import { drawer } from './layout';
import type { Meter } from './meter';
import { splitCost, type Model } from './model';
import type { CutFound, CutPlan, CutProblem, CutSheet, Rect } from './problem';

/** Betters `byTrimmer`, the best edge-to-edge answer, where the knife can. */
export function planByKnife(problem: CutProblem, model: Model, byTrimmer: CutFound, meter: Meter): CutFound {
	const combinations = new Combinations(model, inequalitiesOf(model, false), meter);
	const known =
		byTrimmer.status === 'planned' ? byTrimmer.plan.cost[0] * model.scale + byTrimmer.plan.cost[1] : Infinity;
	let bound = combinations.bound;
	let proving = true;
	while (meter.open && bound < known) {
		const combination = combinations.next(() => meter.open);
		if (!combination || combination.cost >= known) {
			if (combination !== undefined && proving) bound = Math.min(known, combination?.cost ?? Infinity);
			break;
		}
		if (proving) bound = combination.cost;
		const sheets = interlock(model, combination, (units) => meter.spend(units));
		if (sheets) {
			const plan = knifePlan(problem, model, sheets, combination.cost);
			return { status: 'planned', plan, minimum: bound >= combination.cost, bound: splitCost(model, bound) };
		}
		if (sheets === undefined) proving = false;
		else if (proving) bound = Math.min(combinations.bound, known);
	}
	if (byTrimmer.status === 'planned') {
		return { ...byTrimmer, minimum: bound >= known, bound: splitCost(model, Math.min(bound, known)) };
	}
	if (bound === Infinity) return { status: 'impossible', bound: [0, 0] };
	return { status: 'unknown', bound: splitCost(model, bound) };
}

function knifePlan(problem: CutProblem, model: Model, sheets: readonly KnifeSheet[], cost: number): CutPlan {
	const draw = drawer(problem, model);
	return {
		cost: splitCost(model, cost),
		sheets: sheets.map(({ kind, placements }): CutSheet => {
			const laid = placements.map(({ x, y, w, h, piece, turned }) => ({
				...draw({ piece, turned }, kind),
				x,
				y,
				w: w - model.kerf,
				h: h - model.kerf
			}));
			const whole = { x: 0, y: 0, w: problem.sheets[kind]?.w ?? 0, h: problem.sheets[kind]?.h ?? 0 };
			return { sheet: kind, placements: laid, cuts: [], offcuts: leftovers(whole, placements, model.kerf) };
		})
	};
}

/** The largest free rectangle, then the largest of what is left, and so on. */
function leftovers(whole: Rect, taken: readonly Rect[], kerf: number): Rect[] {
	const found: Rect[] = [];
	for (;;) {
		const used = [...taken, ...found.map((rect) => ({ ...rect, w: rect.w + kerf, h: rect.h + kerf }))];
		const largest = largestFree(whole, used);
		if (!largest) return found;
		found.push(largest);
	}
}

function largestFree(whole: Rect, used: readonly Rect[]): Rect | null {
	const edges = (size: number, of: (rect: Rect) => number[]) =>
		[...new Set([0, size, ...used.flatMap(of)])].filter((edge) => edge <= size).sort((a, b) => a - b);
	const xs = edges(whole.w, ({ x, w }) => [x, x + w]);
	const ys = edges(whole.h, ({ y, h }) => [y, y + h]);
	let largest: Rect | null = null;
	for (const [i, x] of xs.entries()) {
		for (const [j, y] of ys.entries()) {
			for (const right of xs.slice(i + 1)) {
				for (const bottom of ys.slice(j + 1)) {
					const rect = { x, y, w: right - x, h: bottom - y };
					if (largest && rect.w * rect.h <= largest.w * largest.h) continue;
					if (!used.some((other) => meet(other, rect))) largest = rect;
				}
			}
		}
	}
	return largest;
}

function meet(a: Rect, b: Rect): boolean {
	return a.x < b.x + b.w && b.x < a.x + a.w && a.y < b.y + b.h && b.y < a.y + a.h;
}
