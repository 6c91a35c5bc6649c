import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { checkPlan, planCuts } from '.';
import { cutProblems } from '../../../../tests/factories/cut-problems';
import type { CutPlan, CutProblem, CutSheet, Placement } from './problem';

const planned = cutProblems()
	.map((problem) => ({ problem, answer: planCuts(problem, { work: 500_000, polish: 1_000 }) }))
	.filter(({ answer }) => answer.status === 'planned')
	.map(({ problem, answer }) => ({ problem, plan: (answer as { plan: CutPlan }).plan }));

function withSheet(plan: CutPlan, change: (sheet: CutSheet) => CutSheet): CutPlan {
	return { ...plan, sheets: plan.sheets.map((sheet, i) => (i === 0 ? change(sheet) : sheet)) };
}

function withPlacement(plan: CutPlan, change: (placement: Placement) => Placement): CutPlan {
	return withSheet(plan, (sheet) => ({
		...sheet,
		placements: sheet.placements.map((placement, i) => (i === 0 ? change(placement) : placement))
	}));
}

/** Each makes a sound plan unsound, whatever the plan. */
const FAULTS: Record<string, (plan: CutPlan, problem: CutProblem) => CutPlan> = {
	'a piece moved': (plan) => withPlacement(plan, (placement) => ({ ...placement, x: placement.x + 1 })),
	'a piece outside': (plan) => withPlacement(plan, (placement) => ({ ...placement, y: -1 })),
	'a piece made smaller': (plan) =>
		withPlacement(plan, (placement) => ({ ...placement, w: placement.w - 1 })),
	'a piece missing': (plan) =>
		withSheet(plan, (sheet) => ({ ...sheet, placements: sheet.placements.slice(1) })),
	'a piece twice': (plan) =>
		withSheet(plan, (sheet) => ({
			...sheet,
			placements: [...sheet.placements, ...sheet.placements.slice(0, 1)]
		})),
	'a piece off the unit': (plan) =>
		withPlacement(plan, (placement) => ({ ...placement, x: placement.x + 0.5 })),
	'a sheet that there is not': (plan) => withSheet(plan, (sheet) => ({ ...sheet, sheet: 99 })),
	'a cut made up': (plan) =>
		withSheet(plan, (sheet) => ({
			...sheet,
			cuts: [...sheet.cuts, { axis: 'down', at: 1, of: { x: 0, y: 0, w: 999, h: 999 } }]
		})),
	'an offcut made up': (plan) =>
		withSheet(plan, (sheet) => ({ ...sheet, offcuts: [...sheet.offcuts, { x: 0, y: 0, w: 1, h: 1 }] })),
	'a wrong cost': (plan) => ({ ...plan, cost: [plan.cost[0], plan.cost[1] + 1] })
};

describe('the checker', () => {
	it.each(Object.entries(FAULTS))('finds %s', (_, spoil) => {
		fc.assert(
			fc.property(planned, ({ problem, plan }) => {
				fc.pre(plan.sheets.length > 0);
				expect(checkPlan(problem, spoil(plan, problem))).not.toEqual([]);
			}),
			{ numRuns: 60 }
		);
	});

	it('finds a cut left out, where there is one', () => {
		fc.assert(
			fc.property(planned, ({ problem, plan }) => {
				fc.pre((plan.sheets[0]?.cuts.length ?? 0) > 0);
				expect(
					checkPlan(
						problem,
						withSheet(plan, (sheet) => ({ ...sheet, cuts: sheet.cuts.slice(1) }))
					)
				).not.toEqual([]);
			}),
			{ numRuns: 60 }
		);
	});

	it('finds a leftover that is not listed', () => {
		fc.assert(
			fc.property(planned, ({ problem, plan }) => {
				fc.pre((plan.sheets[0]?.offcuts.length ?? 0) > 0);
				expect(
					checkPlan(
						problem,
						withSheet(plan, (sheet) => ({ ...sheet, offcuts: [] }))
					)
				).not.toEqual([]);
			}),
			{ numRuns: 60 }
		);
	});

	it('finds more sheets opened than there are', () => {
		fc.assert(
			fc.property(planned, ({ problem, plan }) => {
				fc.pre(plan.sheets.length > 0);
				const none = { ...problem, sheets: problem.sheets.map((sheet) => ({ ...sheet, count: 0 })) };
				expect(checkPlan(none, plan)).not.toEqual([]);
			}),
			{ numRuns: 60 }
		);
	});

	it('finds a piece that lies as it may not', () => {
		fc.assert(
			fc.property(planned, ({ problem, plan }) => {
				fc.pre(plan.sheets.length > 0);
				const pieces = problem.pieces.map((piece) => ({ ...piece, lies: piece.lies.map(() => 0 as const) }));
				expect(checkPlan({ ...problem, pieces }, plan)).not.toEqual([]);
			}),
			{ numRuns: 60 }
		);
	});

	it('counts the kerf: what fits edge to edge does not fit with a saw between', () => {
		const problem = {
			sheets: [{ w: 20, h: 5, count: 1, cost: [1, 0] as const }],
			pieces: [{ w: 10, h: 5, qty: 2, lies: [1 as const] }],
			kerf: 0
		};
		const answer = planCuts(problem, { work: 1000 });
		const plan = answer.status === 'planned' ? answer.plan : null;
		expect(plan && checkPlan(problem, plan)).toEqual([]);
		expect(plan && checkPlan({ ...problem, kerf: 1 }, plan)).not.toEqual([]);
	});

	const pinwheel: CutProblem = {
		sheets: [{ w: 5, h: 5, count: 1, cost: [1, 0] }],
		pieces: [
			{ w: 3, h: 2, qty: 4, lies: [3] },
			{ w: 1, h: 1, qty: 1, lies: [3] }
		],
		kerf: 0
	};
	const blades: Placement[] = [
		{ piece: 0, x: 0, y: 0, w: 3, h: 2, turned: false },
		{ piece: 0, x: 3, y: 0, w: 2, h: 3, turned: true },
		{ piece: 0, x: 2, y: 3, w: 3, h: 2, turned: false },
		{ piece: 0, x: 0, y: 2, w: 2, h: 3, turned: true },
		{ piece: 1, x: 2, y: 2, w: 1, h: 1, turned: false }
	];
	const wheel: CutPlan = { sheets: [{ sheet: 0, placements: blades, cuts: [], offcuts: [] }], cost: [1, 0] };

	it('refuses a pinwheel, which no edge-to-edge cut enters', () => {
		expect(checkPlan(pinwheel, wheel)).toContain('sheet 0: does not come apart by edge-to-edge cuts');
	});

	it('takes the pinwheel where the knife may be used, and still no overlap', () => {
		expect(checkPlan({ ...pinwheel, interlocked: true }, wheel)).toEqual([]);
		const overlapping = withPlacement(wheel, (placement) => ({ ...placement, x: 1 }));
		expect(checkPlan({ ...pinwheel, interlocked: true }, overlapping)).not.toEqual([]);
	});
});
