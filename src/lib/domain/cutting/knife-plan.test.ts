import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { checkPlan, planCuts } from '.';
import { cutProblems } from '../../../../tests/factories/cut-problems';
import type { CutProblem } from './problem';

const budget = { work: 500_000, polish: 1_000 };

/** Four blades of 3 x 2 round a middle of 1 x 1 fill 5 x 5 exactly, and only as a pinwheel. */
const pinwheel: CutProblem = {
	sheets: [{ w: 5, h: 5, count: 2, cost: [1, 0] }],
	pieces: [
		{ w: 3, h: 2, qty: 4, lies: [3] },
		{ w: 1, h: 1, qty: 1, lies: [3] }
	],
	kerf: 0
};

describe('cutting by knife', () => {
	it('lays the pinwheel on one sheet, where a trimmer takes two', () => {
		const byTrimmer = planCuts(pinwheel, budget);
		expect(byTrimmer).toMatchObject({ status: 'planned', minimum: true, plan: { cost: [2, 0] } });
		const problem = { ...pinwheel, interlocked: true };
		const byKnife = planCuts(problem, budget);
		expect(byKnife).toMatchObject({ status: 'planned', minimum: true, plan: { cost: [1, 0] } });
		if (byKnife.status === 'planned') expect(checkPlan(problem, byKnife.plan)).toEqual([]);
	});

	it('counts the kerf between interlocked pieces', () => {
		const saw = { ...pinwheel, kerf: 1, interlocked: true };
		const on = (side: number) => {
			const problem = { ...saw, sheets: [{ w: side, h: side, count: 1, cost: [1, 0] as const }] };
			const answer = planCuts(problem, budget);
			if (answer.status === 'planned') expect(checkPlan(problem, answer.plan)).toEqual([]);
			return answer.status;
		};
		expect(on(7)).toBe('planned');
		expect(on(5)).toBe('impossible');
	});

	it('never costs more than the trimmer, and never bounds what the trimmer reaches', () => {
		fc.assert(
			fc.property(cutProblems({ pieces: 6 }), (given) => {
				const problem = { ...given, interlocked: true };
				const byTrimmer = planCuts(given, budget);
				const byKnife = planCuts(problem, budget);
				if (byKnife.status === 'planned') expect(checkPlan(problem, byKnife.plan)).toEqual([]);
				if (byTrimmer.status !== 'planned') return;
				const rank = ([first, second]: readonly [number, number]) => first * 1000 + second;
				expect(byKnife.status).toBe('planned');
				if (byKnife.status === 'planned')
					expect(rank(byKnife.plan.cost)).toBeLessThanOrEqual(rank(byTrimmer.plan.cost));
				expect(rank(byKnife.bound)).toBeLessThanOrEqual(rank(byTrimmer.plan.cost));
			}),
			{ numRuns: 150 }
		);
	});
});
