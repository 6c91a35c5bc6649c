import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { rim, rollLeft, sheetGrams, sheetsInPile, tapeForPiece } from './bench';
import { INCH, METRE, MILLIMETRE } from './length';
import type { Edge } from './stash';

const side = fc.integer({ min: 1, max: METRE });
const edges = fc.uniqueArray(fc.constantFrom<Edge>('top', 'bottom', 'left', 'right'));

describe('a roll', () => {
	const rolls = fc
		.tuple(fc.nat(50_000), fc.integer({ min: 1, max: 50_000 }), fc.integer({ min: 1, max: 10_000 * METRE }))
		.map(([core, more, full]) => ({ core, fullOuter: core + more, full }));
	const left = (roll: Parameters<typeof rollLeft>[0]) => {
		const read = rollLeft(roll);
		if (!read.ok) throw new Error(read.reason);
		return read.left;
	};

	it('is whole when it is as wide as a full one and empty at its core', () => {
		fc.assert(
			fc.property(rolls, (roll) => {
				expect(left({ ...roll, outer: roll.fullOuter })).toBe(roll.full);
				expect(left({ ...roll, outer: roll.core })).toBe(0);
			})
		);
	});

	it('never grows as it gets thinner, and is never credited with more than the ring holds', () => {
		fc.assert(
			fc.property(rolls, fc.nat(100), fc.nat(100), (roll, a, b) => {
				const at = (percent: number) =>
					roll.core + Math.floor(((roll.fullOuter - roll.core) * percent) / 100);
				const [thin, thick] = [at(Math.min(a, b)), at(Math.max(a, b))];
				expect(left({ ...roll, outer: thin })).toBeLessThanOrEqual(left({ ...roll, outer: thick }));
				const ring = (outer: number) => BigInt(outer) ** 2n - BigInt(roll.core) ** 2n;
				const held = BigInt(left({ ...roll, outer: thin })) * ring(roll.fullOuter);
				expect(held <= BigInt(roll.full) * ring(thin)).toBe(true);
			})
		);
	});

	it('has a quarter of its tape at half the ring’s area of a coreless roll', () => {
		const roll = { full: 40 * METRE, fullOuter: 100 * MILLIMETRE, core: 0, outer: 50 * MILLIMETRE };
		expect(rollLeft(roll)).toEqual({ ok: true, left: 10 * METRE });
	});

	it.each([
		[{ core: 10, fullOuter: 10, outer: 10 }, 'A full roll is wider than its core. Measure both again.'],
		[{ core: 10, fullOuter: 20, outer: 9 }, 'A roll can’t be narrower than its core. Measure it again.'],
		[{ core: 10, fullOuter: 20, outer: 21 }, 'That is wider than the full roll. Measure it again.']
	])('refuses %o', (measured, reason) => {
		expect(rollLeft({ full: METRE, ...measured })).toEqual({ ok: false, reason });
	});
});

describe('a pile', () => {
	it('is counted within what the scale can say, whatever its step', () => {
		const steps = fc.constantFrom(0.01, 0.1, 0.5, 1, 2, 5);
		fc.assert(
			fc.property(fc.nat(500), steps, fc.integer({ min: 60, max: 400 }), (sheets, step, gsm) => {
				const paper = { w: 12 * INCH, h: 12 * INCH, gsm };
				const grams = Math.round((sheets * sheetGrams(paper.w, paper.h, gsm)) / step) * step;
				const { least, likely, most } = sheetsInPile({ ...paper, grams, step });
				expect(least).toBeLessThanOrEqual(sheets);
				expect(most).toBeGreaterThanOrEqual(sheets);
				expect(least).toBeLessThanOrEqual(likely);
				expect(likely).toBeLessThanOrEqual(most);
			})
		);
	});

	it('is settled by a fine scale and left open by a coarse one', () => {
		const paper = { w: 210 * MILLIMETRE, h: 297 * MILLIMETRE, gsm: 80 };
		expect(sheetsInPile({ ...paper, grams: 99.8, step: 0.1 })).toEqual({ likely: 20, least: 20, most: 20 });
		expect(sheetsInPile({ ...paper, grams: 100, step: 20 })).toEqual({ likely: 20, least: 19, most: 22 });
	});
});

describe('tape', () => {
	it('for all four edges is the rim', () => {
		fc.assert(
			fc.property(side, side, (w, h) => {
				expect(tapeForPiece({ w, h }, ['top', 'right', 'bottom', 'left'], 1)).toBe(rim({ w, h }));
			})
		);
	});

	it('grows with the pieces, and adds up over the edges', () => {
		fc.assert(
			fc.property(side, side, edges, fc.nat(100), (w, h, along, qty) => {
				const one = tapeForPiece({ w, h }, along, 1);
				expect(tapeForPiece({ w, h }, along, qty)).toBe(qty * one);
				expect(one).toBe(along.reduce((sum, edge) => sum + tapeForPiece({ w, h }, [edge], 1), 0));
			})
		);
	});

	it('of a pocket 4 × 6 in glued on three sides, six times', () => {
		expect(tapeForPiece({ w: 4 * INCH, h: 6 * INCH }, ['left', 'bottom', 'right'], 6)).toBe(96 * INCH);
	});
});
