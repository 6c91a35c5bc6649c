import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
	FLUID_OUNCE,
	formatVolume,
	LITRE,
	MILLILITRE,
	parseVolume,
	writeVolume,
	type VolumeUnit
} from './volume';

const metric = { unit: 'ml' } as const;
const units = fc.constantFrom<VolumeUnit>('ml', 'l', 'fl oz');

describe('laws', () => {
	it('keeps thousandths of every unit exactly', () => {
		fc.assert(
			fc.property(fc.integer({ min: 1, max: 99_999 }), units, (n, unit) => {
				const whole = { ml: MILLILITRE, l: LITRE, 'fl oz': FLUID_OUNCE }[unit];
				expect(parseVolume(`${n / 1000} ${unit}`, metric)).toEqual({
					ok: true,
					value: (n * whole) / 1000,
					unit
				});
			})
		);
	});

	it('reads back what it writes', () => {
		fc.assert(
			fc.property(fc.integer({ min: 1, max: 500 * LITRE }), units, (value, unit) => {
				expect(parseVolume(writeVolume(value, unit), metric)).toEqual({ ok: true, value, unit });
			})
		);
	});

	it('shows within half a step, marked where it is off', () => {
		fc.assert(
			fc.property(fc.integer({ min: 1, max: 5 * LITRE }), (value) => {
				const shown = formatVolume(value, 'ml');
				const ml = Number(/[\d.]+/.exec(shown)?.[0]);
				expect(Math.abs(ml - value / MILLILITRE)).toBeLessThanOrEqual(0.05 + 1e-9);
				expect(shown.startsWith('≈')).toBe(value % (MILLILITRE / 10) !== 0);
			})
		);
	});
});

it.each([
	['250 ml', 250 * MILLILITRE, 'ml'],
	['60', 60 * MILLILITRE, 'ml'],
	['1,5 l', 1.5 * LITRE, 'l'],
	['4 fl oz', 4 * FLUID_OUNCE, 'fl oz'],
	['8.45 FL OZ', (845 * FLUID_OUNCE) / 100, 'fl oz'],
	['½ fl. oz.', FLUID_OUNCE / 2, 'fl oz'],
	['1 7/8 fl oz', (FLUID_OUNCE * 15) / 8, 'fl oz']
])('reads %s', (typed, value, unit) => {
	expect(parseVolume(typed, metric)).toEqual({ ok: true, value, unit });
});

it('takes zero only where nothing left is an answer', () => {
	expect(parseVolume('0 ml', { ...metric, zero: true })).toEqual({ ok: true, value: 0, unit: 'ml' });
	expect(parseVolume('0 ml', metric)).toEqual({ ok: false, reason: 'A volume has to be more than zero.' });
});

it.each([
	['4 oz', 'Ounces can be weight. Type fl oz, or ml.'],
	['some', 'Type a volume like 250 ml or 4 fl oz.'],
	['3 cups', 'Type ml, l or fl oz after the number, like 250 ml or 4 fl oz.'],
	['501 l', 'That is more than 500 l. Check the number and its unit.'],
	['1/7 ml', 'That can’t be kept exactly. Type up to three decimals, like 8.45 fl oz.'],
	['1/0 ml', 'Type a volume like 250 ml or 4 fl oz.']
])('refuses %s with a reason', (typed, reason) => {
	expect(parseVolume(typed, metric)).toEqual({ ok: false, reason });
});
