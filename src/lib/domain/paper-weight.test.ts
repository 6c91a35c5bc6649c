import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { formatWeight, GRADES, gsmOfPounds, parseWeight, poundsOfGsm } from './paper-weight';

const grades = fc.constantFrom(...GRADES);

describe('laws', () => {
	it('goes from pounds to grams and back', () => {
		fc.assert(
			fc.property(fc.integer({ min: 1, max: 400 }), grades, (pounds, grade) => {
				expect(poundsOfGsm(gsmOfPounds(pounds, grade), grade)).toBeCloseTo(pounds, 10);
			})
		);
	});

	it('reads back its own text', () => {
		fc.assert(
			fc.property(fc.integer({ min: 1, max: 4000 }), fc.option(grades), (tenths, grade) => {
				const read = parseWeight(`${tenths / 10} ${grade === null ? 'gsm' : `lb ${grade}`}`);
				expect(read.ok && parseWeight(read.value.text)).toEqual(read);
			})
		);
	});

	it('says that more pounds of a grade are more grams', () => {
		fc.assert(
			fc.property(fc.integer({ min: 1, max: 400 }), grades, (pounds, grade) => {
				expect(gsmOfPounds(pounds + 1, grade)).toBeGreaterThan(gsmOfPounds(pounds, grade));
			})
		);
	});

	it('never throws, whatever is typed', () => {
		fc.assert(
			fc.property(fc.string({ unit: 'binary', maxLength: 80 }), (text) => {
				const read = parseWeight(text);
				expect(read.ok ? read.value.gsm > 0 : read.reason.length > 10).toBe(true);
			})
		);
	});
});

describe('entry', () => {
	it.each([
		['180 gsm', '180 gsm', 180],
		['180gsm', '180 gsm', 180],
		['120 g/m²', '120 gsm', 120],
		['120 g/m2', '120 gsm', 120],
		['103,6 g', '103.6 gsm', 103.6],
		['65 lb cover', '65 lb cover', 175.767],
		['65lb. Cover stock', '65 lb cover', 175.767],
		['110# index', '110 lb index', 198.875],
		['70 lbs offset', '70 lb text', 103.61],
		['20 pound bond', '20 lb bond', 75.195]
	])('reads %s', (typed, text, gsm) => {
		const read = parseWeight(typed);
		expect(read.ok && read.value.text).toBe(text);
		expect(read.ok && read.value.gsm).toBeCloseTo(gsm, 3);
	});

	it.each([
		['65 lb', 'Pounds need their grade: type 65 lb cover, text, bond, index, tag or bristol.'],
		['65 lb cardstock', 'Pounds need their grade: type 65 lb cover, text, bond, index, tag or bristol.'],
		['180', 'Type gsm after the number, or pounds with their grade, like 180 gsm or 65 lb cover.'],
		['heavy', 'Type a weight like 180 gsm or 65 lb cover.'],
		['0 gsm', 'A weight has to be more than zero.'],
		['9000 gsm', 'That is heavier than 5000 gsm. Check the number and its unit.'],
		[`180 gsm${' '.repeat(60)}x`, 'Type a weight like 180 gsm or 65 lb cover.']
	])('refuses %s with a reason', (typed, reason) => {
		expect(parseWeight(typed)).toEqual({ ok: false, reason });
	});
});

it('shows what the label says, and grams beside pounds', () => {
	expect(formatWeight({ text: '65 lb cover', gsm: 175.767 })).toBe('65 lb cover (≈ 176 gsm)');
	expect(formatWeight({ text: '180 gsm', gsm: 180 })).toBe('180 gsm');
});
