import { describe, expect, it } from 'vitest';
import { INCH, MILLIMETRE } from './length';
import { PAPER_SIZES, paperSize, paperSizesOf } from './paper-size';

describe('laws', () => {
	it.each(PAPER_SIZES)('$name is whole, upright, found by its name and by its size either way up', (size) => {
		expect(Number.isInteger(size.w) && Number.isInteger(size.h)).toBe(true);
		expect(size.w).toBeLessThanOrEqual(size.h);
		expect(paperSize(size.name)).toBe(size);
		expect(paperSizesOf(size.w, size.h)).toContain(size);
		expect(paperSizesOf(size.h, size.w)).toEqual(paperSizesOf(size.w, size.h));
	});

	it('gives no name twice', () => {
		expect(new Set(PAPER_SIZES.map((size) => size.name)).size).toBe(PAPER_SIZES.length);
	});
});

it.each([
	['a4', 'A4'],
	['A4 paper', 'A4'],
	['US Letter', 'Letter'],
	['12x12', '12 × 12'],
	['#10', '#10 envelope'],
	['dl', 'DL envelope'],
	['A7', 'A7'],
	['a7 envelope', 'A7 envelope'],
	['B5 JIS', 'JIS B5']
])('%s is %s', (typed, name) => {
	expect(paperSize(typed)?.name).toBe(name);
});

it.each(['', 'foolscap', 'A11', 'envelope'])('knows no “%s”', (typed) => {
	expect(paperSize(typed)).toBeNull();
});

it('tells a 12 in sheet from a 30 cm and a 30.5 cm one', () => {
	expect(paperSizesOf(12 * INCH, 12 * INCH).map((size) => size.name)).toEqual(['12 × 12']);
	expect(paperSizesOf(300 * MILLIMETRE, 300 * MILLIMETRE).map((size) => size.name)).toEqual(['30 × 30 cm']);
	expect(paperSizesOf(305 * MILLIMETRE, 305 * MILLIMETRE).map((size) => size.name)).toEqual([
		'30.5 × 30.5 cm'
	]);
	expect(paperSizesOf(301 * MILLIMETRE, 301 * MILLIMETRE)).toEqual([]);
});
