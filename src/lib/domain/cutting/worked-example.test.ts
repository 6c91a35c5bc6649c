import { describe, expect, it } from 'vitest';
import { checkPlan, cutMost, planCuts } from '.';
import { INCH } from '../length';
import { LIES, type CutProblem, type Lie } from './problem';

/** A cover of 11 x 7 in and six tags of 2⅜ x 4 in from sheets of 12 x 12 in. */
function tagBook(count: number, lie: Lie): CutProblem {
	return {
		sheets: [{ w: 12 * INCH, h: 12 * INCH, count, cost: [1, 0] }],
		pieces: [
			{ w: 11 * INCH, h: 7 * INCH, qty: 1, lies: [lie] },
			{ w: 2.375 * INCH, h: 4 * INCH, qty: 6, lies: [lie] }
		],
		kerf: 0
	};
}

const budget = { work: 2_000_000 };

describe('a cover and six tags', () => {
	it('take two sheets where the print has a direction', () => {
		expect(planCuts(tagBook(2, LIES.upright), budget)).toMatchObject({
			status: 'planned',
			minimum: true,
			plan: { cost: [2, 0] }
		});
	});

	it('are impossible from one sheet, which holds the cover and five tags', () => {
		const problem = tagBook(1, LIES.upright);
		expect(planCuts(problem, budget).status).toBe('impossible');
		const most = cutMost(problem, [0, 1], budget);
		expect(most).toMatchObject({ counts: [1, 5], proved: true });
		const cut = problem.pieces.map((piece, p) => ({ ...piece, qty: most.counts[p] ?? 0 }));
		expect(checkPlan({ ...problem, pieces: cut }, most.plan)).toEqual([]);
	});

	it('take one sheet where the tags may turn', () => {
		const problem = tagBook(1, LIES.either);
		const answer = planCuts(problem, budget);
		expect(answer).toMatchObject({ status: 'planned', minimum: true, plan: { cost: [1, 0] } });
		if (answer.status === 'planned') expect(checkPlan(problem, answer.plan)).toEqual([]);
	});
});
