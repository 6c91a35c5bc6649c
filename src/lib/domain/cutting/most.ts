/**
 * What can already be cut where not everything can: piece kind by piece kind in the given order, each as many as
 * possible without losing one of an earlier kind. Counts that fit stay fitting when lowered, so each kind's
 * number is found by halving between what is known to fit and what isn't; "isn't" is proof only where the
 * planner proved it.
 */
import { planAny, planCuts } from './plan';
import type { CutAnswer, CutBudget, CutPlan, CutProblem } from './problem';

export interface MostCut {
	/** For each piece of the problem, how many the plan cuts. */
	readonly counts: readonly number[];
	readonly plan: CutPlan;
	/** Whether it is proved that no earlier kind's count could be higher. */
	readonly proved: boolean;
}

/** The lexicographically largest counts in `order`, on a plan of least cost as far as the budget goes. */
export function cutMost(problem: CutProblem, order: readonly number[], budget: CutBudget): MostCut {
	const counts = problem.pieces.map(() => 0);
	let proved = true;
	for (const piece of order) {
		let fits = 0;
		let fails = roomFor(problem, counts, piece) + 1;
		let tried = fails - 1;
		while (fails - fits > 1) {
			counts[piece] = tried;
			const answer = planAny(holding(problem, counts), shareOf(budget, order.length * 4));
			if (answer.status === 'planned') fits = tried;
			else {
				fails = tried;
				if (answer.status === 'unknown') proved = false;
			}
			tried = Math.floor((fits + fails) / 2);
		}
		counts[piece] = fits;
	}
	const answer: CutAnswer = planCuts(holding(problem, counts), shareOf(budget, 4));
	const plan = answer.status === 'planned' ? answer.plan : { sheets: [], cost: [0, 0] as const };
	return { counts, plan, proved };
}

/** No more than the area allows beside what is already laid out. */
function roomFor(problem: CutProblem, counts: readonly number[], piece: number): number {
	const { w, h, qty } = problem.pieces[piece] as CutProblem['pieces'][number];
	const used = problem.pieces.reduce((sum, other, p) => sum + other.w * other.h * (counts[p] ?? 0), 0);
	const stock = problem.sheets.reduce(
		(sum, sheet) => sum + (sheet.count === 0 ? 0 : sheet.w * sheet.h * sheet.count),
		0
	);
	return Math.min(qty, Math.floor((stock - used) / (w * h)));
}

function holding(problem: CutProblem, counts: readonly number[]): CutProblem {
	return { ...problem, pieces: problem.pieces.map((piece, p) => ({ ...piece, qty: counts[p] ?? 0 })) };
}

function shareOf(budget: CutBudget, parts: number): CutBudget {
	return { ...budget, work: budget.work / parts };
}
