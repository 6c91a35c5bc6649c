import { describe, expect, it } from 'vitest';
import { INCH, MILLIMETRE } from '../../src/lib/domain/length';
import { FLUID_OUNCE, formatVolume, LITRE, MILLILITRE, parseVolume } from '../../src/lib/domain/volume';

function value(typed: string): number {
	const read = parseVolume(typed, { unit: 'ml' });
	if (!read.ok) throw new Error(read.reason);
	return read.value;
}

// NIST Handbook 44, appendix C (from memory): 1 US gallon = 231 cubic inches = 128 US fluid ounces
it('a fluid ounce is 231/128 cubic inches', () => {
	const cubicMillimetre = BigInt(MILLILITRE) / 1000n;
	const gallon = 231n * BigInt(INCH) ** 3n * cubicMillimetre;
	expect(128n * BigInt(FLUID_OUNCE) * BigInt(MILLIMETRE) ** 3n).toBe(gallon);
});

// NIST SP 811, table B.8 (from memory): 1 fl oz (US) = 29.57353 ml, as printed to seven figures
it('a fluid ounce prints as 29.57353 ml', () => {
	expect((value('1 fl oz') / MILLILITRE).toFixed(5)).toBe('29.57353');
	expect(value('1 fl oz')).toBe(value('29.5735295625 ml'));
});

// SI brochure, 9th edition, table 8 (from memory): 1 l = 1 dm³
it('a litre is a cubic decimetre, a thousand millilitres', () => {
	expect(value('1 l')).toBe(value('1000 ml'));
	expect(LITRE).toBe(1000 * MILLILITRE);
});

// Common practice, no source: what bottles of glue and ink say on both sides of the label, rounded there
describe('labels in two units', () => {
	it.each([
		['4 fl oz', 118],
		['8 fl oz', 237],
		['2 fl oz', 59],
		['1 fl oz', 30],
		['8.45 fl oz', 250],
		['16.9 fl oz', 500]
	])('%s is labelled %i ml', (ounces, millilitres) => {
		expect(Math.round(value(ounces) / MILLILITRE)).toBe(millilitres);
	});

	it('does not take the rounded label for the volume', () => {
		expect(value('8.45 fl oz')).not.toBe(value('250 ml'));
		expect(formatVolume(value('250 ml'), 'fl oz')).toBe('≈ 8.5 fl oz');
		expect(formatVolume(value('8.45 fl oz'), 'ml')).toBe('≈ 249.9 ml');
	});
});
