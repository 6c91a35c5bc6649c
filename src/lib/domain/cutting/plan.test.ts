import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { checkPlan, cutMost, planAny, planCuts } from '.';
import { cutProblems, transposed, scaled } from '../../../../tests/factories/cut-problems';
import { leastCost } from '../../../../tests/factories/cut-oracle';
import type { CutAnswer, CutProblem } from './problem';

const work = 2_000_000;

const costOf = (answer: CutAnswer) => (answer.status === 'planned' ? answer.plan.cost : answer.status);
const least = (problem: CutProblem) => planCuts(problem, { work, polish: 1_000 });

describe('planCuts, on any small problem', () => {
	it('gives plans that the checker passes', () => {
		fc.assert(
			fc.property(cutProblems(), (problem) => {
				const answer = least(problem);
				expect(answer.status === 'planned' ? checkPlan(problem, answer.plan) : []).toEqual([]);
			}),
			{ numRuns: 300 }
		);
	});

	it('finds the minimum, or that there is no plan, as trying everything does', () => {
		fc.assert(
			fc.property(cutProblems({ pieces: 5 }), (problem) => {
				const answer = least(problem);
				expect(costOf(answer)).toEqual(leastCost(problem) ?? 'impossible');
				if (answer.status === 'planned') expect(answer.minimum).toBe(true);
			}),
			{ numRuns: 400 }
		);
	});

	it('answers a question of fit as trying everything does', () => {
		fc.assert(
			fc.property(cutProblems({ pieces: 5 }), (problem) => {
				const answer = planAny(problem, { work });
				expect(answer.status).toBe(leastCost(problem) ? 'planned' : 'impossible');
				if (answer.status === 'planned') expect(checkPlan(problem, answer.plan)).toEqual([]);
			}),
			{ numRuns: 200 }
		);
	});

	it('bounds the cost from below', () => {
		fc.assert(
			fc.property(cutProblems(), fc.integer({ min: 0, max: 20_000 }), (problem, units) => {
				const answer = planCuts(problem, { work: units });
				const finished = least(problem);
				if (finished.status !== 'planned') return;
				const [first, second] = finished.plan.cost;
				expect(answer.status).not.toBe('impossible');
				expect(answer.bound[0]).toBeLessThanOrEqual(first);
				if (answer.bound[0] === first) expect(answer.bound[1]).toBeLessThanOrEqual(second);
			}),
			{ numRuns: 150 }
		);
	});

	it('is not changed by the unit of length', () => {
		fc.assert(
			fc.property(cutProblems(), fc.integer({ min: 2, max: 8128 }), (problem, factor) => {
				const answer = least(problem);
				const larger = least(scaled(problem, factor));
				expect(larger.status).toBe(answer.status);
				if (answer.status !== 'planned' || larger.status !== 'planned') return;
				expect(larger.plan.cost).toEqual(answer.plan.cost);
				const lengths = (sheets: typeof answer.plan.sheets, by: number) =>
					sheets.map(({ placements }) => placements.map(({ piece, x, y }) => [piece, x * by, y * by]));
				expect(lengths(larger.plan.sheets, 1)).toEqual(lengths(answer.plan.sheets, factor));
			}),
			{ numRuns: 100 }
		);
	});

	it('costs the same on its side', () => {
		fc.assert(
			fc.property(cutProblems(), (problem) => {
				expect(costOf(least(transposed(problem)))).toEqual(costOf(least(problem)));
			}),
			{ numRuns: 150 }
		);
	});

	it('never costs more with one sheet more, nor with one piece less', () => {
		const rank = (answer: CutAnswer) =>
			answer.status === 'planned' ? answer.plan.cost[0] * 1e6 + answer.plan.cost[1] : Infinity;
		fc.assert(
			fc.property(cutProblems(), (problem) => {
				const [sheet, ...sheets] = problem.sheets;
				const [piece, ...pieces] = problem.pieces;
				if (!sheet || !piece) return;
				const cost = rank(least(problem));
				expect(
					rank(least({ ...problem, sheets: [{ ...sheet, count: sheet.count + 1 }, ...sheets] }))
				).toBeLessThanOrEqual(cost);
				expect(
					rank(least({ ...problem, pieces: [{ ...piece, qty: Math.max(0, piece.qty - 1) }, ...pieces] }))
				).toBeLessThanOrEqual(cost);
			}),
			{ numRuns: 150 }
		);
	});

	it('gives the same answer for the same work, and leaves the problem as it was', () => {
		fc.assert(
			fc.property(cutProblems(), fc.integer({ min: 0, max: 100_000 }), (problem, units) => {
				const before = structuredClone(problem);
				expect(planCuts(problem, { work: units })).toEqual(planCuts(problem, { work: units }));
				expect(problem).toEqual(before);
			}),
			{ numRuns: 100 }
		);
	});

	it('stops when it is told to and tells of its progress', () => {
		const pieces = Array.from({ length: 40 }, (_, i) => ({
			w: 30 + ((i * 37) % 50),
			h: 20 + ((i * 53) % 60),
			qty: 1,
			lies: [3] as const
		}));
		const reports: number[] = [];
		let asked = 0;
		const answer = planCuts(
			{ sheets: [{ w: 100, h: 100, count: Infinity, cost: [1, 0] }], pieces, kerf: 0 },
			{
				work: Infinity,
				shouldStop: () => ++asked > 20,
				onProgress: ({ best }) => best && reports.push(best[0])
			}
		);
		expect(answer.status).toBe('planned');
		expect(asked).toBe(21);
		expect(reports).toEqual([...reports].sort((a, b) => b - a));
	});

	it('refuses sizes that are not whole or not positive', () => {
		const sheets = [{ w: 10, h: 10, count: 1, cost: [1, 0] as const }];
		const ask = (w: number) => least({ sheets, pieces: [{ w, h: 1, qty: 1, lies: [3] }], kerf: 0 });
		expect(() => ask(0)).toThrow(RangeError);
		expect(() => ask(1.5)).toThrow(RangeError);
	});
});

describe('cutMost, on any small problem', () => {
	it('cuts as many of each piece as possible without losing an earlier one', () => {
		fc.assert(
			fc.property(cutProblems({ pieces: 5 }), (problem) => {
				const order = problem.pieces.map((_, p) => p).reverse();
				const most = cutMost(problem, order, { work: 20_000_000 });
				const holding = (counts: readonly number[]) => ({
					...problem,
					pieces: problem.pieces.map((piece, p) => ({ ...piece, qty: counts[p] ?? 0 }))
				});
				expect(most.proved).toBe(true);
				expect(checkPlan(holding(most.counts), most.plan)).toEqual([]);
				order.forEach((piece, i) => {
					if (most.counts[piece] === problem.pieces[piece]?.qty) return;
					const kept = new Set(order.slice(0, i + 1));
					const more = most.counts.map((count, p) => (p === piece ? count + 1 : kept.has(p) ? count : 0));
					expect(leastCost(holding(more))).toBeNull();
				});
			}),
			{ numRuns: 150 }
		);
	});
});
