import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { CALIPER_MILLIMETRE, formatCaliper, parseCaliper, POINT, writeCaliper } from './caliper';

describe('laws', () => {
	it('keeps tenths of a point and thousandths of a millimetre exactly', () => {
		fc.assert(
			fc.property(fc.integer({ min: 1, max: 9000 }), (n) => {
				expect(parseCaliper(`${n / 10} pt`)).toEqual({ ok: true, value: (n * POINT) / 10 });
				expect(parseCaliper(`${n / 1000} mm`)).toEqual({ ok: true, value: (n * CALIPER_MILLIMETRE) / 1000 });
				expect(parseCaliper(`${n} µm`)).toEqual(parseCaliper(`${n / 1000} mm`));
			})
		);
	});

	it('reads back what it writes', () => {
		fc.assert(
			fc.property(fc.integer({ min: 1, max: 25 * CALIPER_MILLIMETRE }), (value) => {
				expect(parseCaliper(writeCaliper(value))).toEqual({ ok: true, value });
			})
		);
	});

	it('compares points with millimetres as the inch is defined: a point is 0.0254 mm', () => {
		fc.assert(
			fc.property(fc.integer({ min: 1, max: 900 }), (points) => {
				expect(parseCaliper(`${points} pt`)).toEqual(parseCaliper(`${(points * 254) / 10_000} mm`));
			})
		);
	});
});

it.each([
	['20 pt', '20 pt (0.51 mm)'],
	['0.5 mm', '≈ 19.7 pt (0.5 mm)'],
	['1/16 in', '62.5 pt (1.59 mm)'],
	['0.020"', '20 pt (0.51 mm)']
])('shows %s in both units', (typed, shown) => {
	const read = parseCaliper(typed);
	expect(read.ok && formatCaliper(read.value)).toBe(shown);
});

it.each([
	['20', 'Say what the number is in: type pt or mm after it.'],
	['thick', 'Type a thickness like 20 pt or 0.5 mm.'],
	['0 pt', 'A thickness has to be more than zero.'],
	['30 mm', 'That is thicker than 25 mm. Check the number and its unit.'],
	['1/3 pt', 'That can’t be kept exactly. Type tenths of a point or thousandths of a mm.'],
	['1/0 pt', 'Type a thickness like 20 pt or 0.5 mm.'],
	['-2 pt', 'Type a thickness like 20 pt or 0.5 mm.']
])('refuses %s with a reason', (typed, reason) => {
	expect(parseCaliper(typed)).toEqual({ ok: false, reason });
});
