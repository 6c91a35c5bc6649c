import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { fenceSetting, fenceSettings, planCuts } from '.';
import { cutProblems } from '../../../../tests/factories/cut-problems';
import type { CutSheet, Rect } from './problem';

const sheets = cutProblems().map((problem) => {
	const answer = planCuts(problem, { work: 500_000, polish: 1_000 });
	return { problem, plan: answer.status === 'planned' ? answer.plan : { sheets: [], cost: [0, 0] as const } };
});

const inside = (part: Rect, whole: Rect) =>
	part.x >= whole.x &&
	part.y >= whole.y &&
	part.x + part.w <= whole.x + whole.w &&
	part.y + part.h <= whole.y + whole.h;

/** The earlier cuts whose region held this cut's region. */
function cutsBefore(sheet: CutSheet, nth: number) {
	const cut = sheet.cuts[nth];
	return sheet.cuts.slice(0, nth).filter((earlier) => cut && inside(cut.of, earlier.of));
}

describe('trimmer order', () => {
	it('never needs a piece of paper that is not cut free yet', () => {
		fc.assert(
			fc.property(sheets, ({ problem, plan }) => {
				for (const sheet of plan.sheets) {
					const { w, h } = problem.sheets[sheet.sheet] as { w: number; h: number };
					sheet.cuts.forEach((cut, nth) => {
						const free = cutsBefore(sheet, nth).reduce<Rect>(
							(region, { axis, at }) => {
								if (axis === 'down') {
									if (cut.of.x + cut.of.w <= at) return { ...region, w: at - region.x };
									const x = at + problem.kerf;
									return { ...region, x, w: region.x + region.w - x };
								}
								if (cut.of.y + cut.of.h <= at) return { ...region, h: at - region.y };
								const y = at + problem.kerf;
								return { ...region, y, h: region.y + region.h - y };
							},
							{ x: 0, y: 0, w, h }
						);
						expect(cut.of).toEqual(free);
					});
				}
			}),
			{ numRuns: 300 }
		);
	});

	it('takes cuts at the same setting together: three equal strips need the fence set once', () => {
		const answer = planCuts(
			{
				sheets: [{ w: 12, h: 8, count: 1, cost: [1, 0] }],
				pieces: [{ w: 3, h: 8, qty: 4, lies: [1] }],
				kerf: 0
			},
			{ work: 10_000 }
		);
		const plan = answer.status === 'planned' ? answer.plan : { sheets: [], cost: [0, 0] as const };
		expect(plan.sheets.flatMap(({ cuts }) => cuts.map(fenceSetting))).toEqual([3, 3, 3]);
		expect(fenceSettings(plan)).toBe(1);
	});

	it('sets the fence no more often than there are cuts, and at least once for each distance', () => {
		fc.assert(
			fc.property(sheets, ({ plan }) => {
				const settings = plan.sheets.flatMap(({ cuts }) => cuts.map(fenceSetting));
				expect(fenceSettings(plan)).toBeLessThanOrEqual(settings.length);
				expect(fenceSettings(plan)).toBeGreaterThanOrEqual(new Set(settings).size);
			}),
			{ numRuns: 100 }
		);
	});
});
