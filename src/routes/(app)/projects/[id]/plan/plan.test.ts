import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { layoutsOf } from '$lib/components/sheet/layouts';
import type { PlannedCut, PlannedSheet } from '$lib/domain/matching/verdict';
import { cutWords, fenceRuns } from './fence';
import { leftoversOf } from './leftovers';

const whole = { x: 0, y: 0, w: 100, h: 100 };
const cutAt = (at: number): PlannedCut => ({ axis: 'across', at, of: whole });
const sheet = (nth: number, set: Partial<PlannedSheet> = {}): PlannedSheet => ({
	...{ supply: 'oat', nth, w: 100, h: 100, placements: [], cuts: [], offcuts: [{ ...whole, h: 40 }] },
	...set
});

describe('fence runs', () => {
	it('keep every cut once, in order, and never move the fence within a run', () => {
		fc.assert(
			fc.property(fc.array(fc.integer({ min: 1, max: 4 })), (settings) => {
				const runs = fenceRuns(settings.map(cutAt));
				expect(runs.flatMap(({ cuts }) => cuts.map(({ number }) => number))).toEqual(
					settings.map((_, index) => index + 1)
				);
				for (const { setting, cuts } of runs) for (const { cut } of cuts) expect(cut.at).toBe(setting);
				runs.slice(1).forEach((run, index) => expect(run.setting).not.toBe(runs[index]!.setting));
			})
		);
	});

	it('measure from the edge that lies against the fence, and name their cuts', () => {
		const [run] = fenceRuns([cutAt(30), { axis: 'down', at: 80, of: { ...whole, x: 50, w: 50 } }, cutAt(30)]);
		expect(run?.setting).toBe(30);
		expect(cutWords(run!)).toBe('cuts 1, 2 and 3');
		expect(cutWords(fenceRuns([cutAt(5)])[0]!)).toBe('cut 1');
	});
});

describe('a plan’s sheets', () => {
	it('are drawn once where they are cut alike, and keep their places', () => {
		const other = sheet(2, { cuts: [cutAt(60)] });
		const layouts = layoutsOf([sheet(1), other, sheet(3)]);
		expect(layouts.map(({ places }) => places)).toEqual([[0, 2], [1]]);
	});

	it('leave offcuts known by sheet and number, the largest first', () => {
		const small = { ...whole, h: 5 };
		const left = leftoversOf([sheet(1, { offcuts: [small] }), sheet(2), sheet(3)]);
		expect(left).toMatchObject([
			{ h: 40, numbers: ['1.0', '2.0'] },
			{ h: 5, numbers: ['0.0'] }
		]);
	});
});
