import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
	DISPLAY_STEP,
	formatLength,
	formatSize,
	INCH,
	lengthParts,
	LONGEST_SHEET,
	METRE,
	parseLength,
	parseSize,
	spokenLength,
	UNIT_LENGTH,
	writeExact,
	YARD,
	type LengthUnit
} from './length';

const inches = { unit: 'in' } as const;
const tape = { unit: 'in', long: true } as const;
const units = fc.constantFrom<LengthUnit>('in', 'mm', 'cm', 'm', 'yd');
const lengths = fc.integer({ min: 1, max: LONGEST_SHEET });

function value(text: string, entry: Parameters<typeof parseLength>[1] = inches): number {
	const read = parseLength(text, entry);
	if (!read.ok) throw new Error(`${text}: ${read.reason}`);
	return read.value;
}
function reason(text: string, entry: Parameters<typeof parseLength>[1] = inches): string {
	const read = parseLength(text, entry);
	return read.ok ? `read as ${read.value}` : read.reason;
}

describe('laws of entry', () => {
	it('keeps every 64th of an inch exactly, however its fraction is written', () => {
		fc.assert(
			fc.property(fc.nat(120), fc.integer({ min: 1, max: 63 }), (whole, k) => {
				const exact = whole * INCH + k * 127;
				const decimal = (whole + k / 64).toString();
				for (const text of [
					`${whole} ${k}/64`,
					`${whole}-${k}/64 in`,
					`${whole} ${k}⁄64"`,
					`${whole * 64 + k}/64 inch`,
					`${decimal} in`,
					`${decimal.replace('.', ',')}00 in`
				]) {
					expect(value(text)).toBe(exact);
				}
			})
		);
	});

	it('keeps every tenth of a millimetre exactly, in any metric unit and with either mark', () => {
		fc.assert(
			fc.property(fc.integer({ min: 1, max: 999_999 }), (tenths) => {
				const [mm, cm, m] = [1, 2, 4].map((places) => writePlaces(tenths, places));
				expect(value(`${mm} mm`)).toBe(tenths * 32);
				expect(value(`${cm} cm`)).toBe(tenths * 32);
				expect(value(`${m} m`, tape)).toBe(tenths * 32);
				expect(value(`${mm?.replace('.', ',')}mm`)).toBe(tenths * 32);
			})
		);
	});

	it('reads back what it writes for a document, whatever the length and unit', () => {
		fc.assert(
			fc.property(lengths, units, (length, unit) => {
				expect(parseLength(writeExact(length, unit), tape)).toEqual({ ok: true, value: length, unit });
			})
		);
	});

	it('reads back what it shows, wherever no ≈ stands', () => {
		fc.assert(
			fc.property(fc.integer({ min: 1, max: 20_000 }), units, (steps, unit) => {
				const length = steps * DISPLAY_STEP[unit];
				expect(formatLength(length, unit)).not.toContain('≈');
				expect(parseLength(formatLength(length, unit), tape)).toEqual({ ok: true, value: length, unit });
			})
		);
	});

	it('does not care about case, kinds of space, dashes, slashes or primes', () => {
		const space = fc.constantFrom(' ', '  ', '\u00a0', '\u202f', '\t', '\u2064');
		const slash = fc.constantFrom('/', '⁄', '∕', ' / ');
		const joint = fc.constantFrom(' ', '-', '‑', '–', ' - ');
		const unit = fc.constantFrom('"', '″', '”', "''", '′′', 'in', 'IN', 'in.', 'inch', 'Inches', '');
		fc.assert(
			fc.property(space, joint, slash, unit, (gap, between, over, mark) => {
				expect(value(`${gap}6${between}3${over}8${gap}${mark}${gap}`)).toBe(51_816);
			})
		);
	});

	it('refuses what no whole 1/320 mm holds, naming lengths on either side that read back exactly', () => {
		const entry = { unit: 'mm', long: true } as const;
		fc.assert(
			fc.property(
				fc.integer({ min: 1, max: 9_999 }),
				fc.integer({ min: 2, max: 999 }),
				units,
				(n, d, unit) => {
					const exact = (n * UNIT_LENGTH[unit]) / d;
					const read = parseLength(`${n}/${d} ${unit}`, entry);
					if (Number.isInteger(exact)) {
						expect(read).toEqual({ ok: true, value: exact, unit });
						return;
					}
					expect(read.ok).toBe(false);
					const named = read.ok ? [] : ((read.reason.split('”')[1] ?? '').match(NAMED) ?? []);
					const values = named.map((text) => value(text, entry));
					expect(values).toEqual(
						expect.arrayContaining([Math.floor(exact), Math.ceil(exact)].filter((v) => v > 0))
					);
					expect(Math.min(...values.filter((v) => v > exact)) - exact).toBeLessThan(1);
					expect(named.length).toBeGreaterThanOrEqual(2);
				}
			)
		);
	});

	it('refuses a zero denominator and never throws, whatever is typed', () => {
		fc.assert(
			fc.property(fc.nat(), (n) => {
				expect(reason(`${n}/0`)).toContain('below the line');
			})
		);
		fc.assert(
			fc.property(fc.string({ unit: 'binary', maxLength: 80 }), fc.boolean(), (text, long) => {
				const read = parseLength(text, { unit: 'in', long });
				expect(read.ok ? Number.isSafeInteger(read.value) && read.value > 0 : read.reason.length > 10).toBe(
					true
				);
				const size = parseSize(text, inches);
				expect(size.ok ? size.w > 0 && size.h > 0 : size.reason.length > 10).toBe(true);
			})
		);
	});
});

describe('laws of display', () => {
	it('is never off by more than half a step, and is marked exactly when it is off', () => {
		fc.assert(
			fc.property(lengths, units, (length, unit) => {
				const { approx, whole, numerator, denominator, decimal } = lengthParts(length, unit);
				const shown =
					(decimal === null ? whole + numerator / denominator : Number(decimal)) * UNIT_LENGTH[unit];
				expect(Math.abs(shown - length)).toBeLessThanOrEqual(DISPLAY_STEP[unit] / 2 + 1e-6);
				expect(approx).toBe(length % DISPLAY_STEP[unit] !== 0);
				expect(formatLength(length, unit).startsWith('≈')).toBe(approx);
			})
		);
	});

	it('never shows the longer of two as the shorter', () => {
		const size = (length: number, unit: LengthUnit) => {
			const { whole, numerator, denominator, decimal } = lengthParts(length, unit);
			return decimal === null ? whole + numerator / denominator : Number(decimal);
		};
		fc.assert(
			fc.property(lengths, lengths, units, (a, b, unit) => {
				const [shorter, longer] = [Math.min(a, b), Math.max(a, b)];
				expect(size(shorter, unit)).toBeLessThanOrEqual(size(longer, unit));
			})
		);
	});

	it('reduces its fractions', () => {
		fc.assert(
			fc.property(lengths, (length) => {
				const { numerator, denominator } = lengthParts(length, 'in');
				if (numerator > 0) expect(numerator % 2).toBe(1);
				expect(64 % denominator).toBe(0);
				expect(numerator).toBeLessThan(denominator);
			})
		);
	});
});

describe('sizes', () => {
	it('reads two sides as it reads each alone', () => {
		const side = fc.integer({ min: 1, max: 64 * 100 });
		fc.assert(
			fc.property(side, side, fc.constantFrom('x', '×', ' x ', ' X ', '*', ' by '), (w, h, times) => {
				const [typedW, typedH] = [writeExact(w * 127, 'in'), writeExact(h * 127, 'in')];
				expect(parseSize(`${typedW}${times}${typedH}`, { unit: 'mm' })).toEqual({
					ok: true,
					w: w * 127,
					h: h * 127,
					unit: 'in'
				});
			})
		);
	});

	it.each([
		['5 1/4 x 7 3/4', 42_672, 62_992, 'in'],
		['5.25×7.75 in', 42_672, 62_992, 'in'],
		['5¼ × 7¾″', 42_672, 62_992, 'in'],
		['16,2 x 11,4 cm', 51_840, 36_480, 'cm'],
		['210x297mm', 67_200, 95_040, 'mm'],
		['12 in x 30 cm', 97_536, 96_000, 'in'],
		['12 in x 12', 97_536, 97_536, 'in'],
		['A4', 67_200, 95_040, 'mm'],
		['us letter', 69_088, 89_408, 'in']
	])('%s', (text, w, h, unit) => {
		expect(parseSize(text, inches)).toEqual({ ok: true, w, h, unit });
	});

	it.each(['12', 'A44', '12 x', 'x 12', '1 x 2 x 3', '0 x 4', "5' x 3'", '5 x 7..3', ''])(
		'refuses “%s”',
		(text) => {
			expect(parseSize(text, inches).ok).toBe(false);
		}
	);

	it('is shown with one unit and one ≈', () => {
		expect(formatSize(42_672, 62_992, 'in')).toBe('5 1⁄4 × 7 3⁄4 in');
		expect(formatSize(97_536, 33_600, 'in')).toBe('≈ 12 × 4 9⁄64 in');
	});
});

describe('entry', () => {
	it.each([
		['6 3/8', 51_816],
		['6-3/8', 51_816],
		['6⅜', 51_816],
		['6 ⅜', 51_816],
		['6³⁄₈', 51_816],
		['6 3⁄8"', 51_816],
		['6.375 in', 51_816],
		['16.2 cm', 51_840],
		['16,2 cm', 51_840],
		['162mm', 51_840],
		['9/8', 9144],
		['.5', 4064],
		['⅟16', 508],
		['6,375 in', 51_816],
		['１２', 97_536],
		['1/3 yd', 97_536]
	])('reads %s', (text, expected) => {
		expect(value(text, text.endsWith('yd') ? tape : inches)).toBe(expected);
	});

	it('takes a bare number in the user’s unit', () => {
		expect([value('12'), value('12', { unit: 'mm' }), value('12', { unit: 'cm' })]).toEqual([
			97_536, 3840, 38_400
		]);
	});

	it('takes metres and yards for tape only', () => {
		expect(value('27 yd', tape)).toBe(27 * YARD);
		expect(value('8 m', tape)).toBe(8 * METRE);
		expect(reason('27 yd')).toBe('Metres and yards are for tape. Type in, mm or cm here.');
	});

	it('takes zero only where nothing left is an answer', () => {
		expect(value('0', { ...inches, zero: true })).toBe(0);
		expect(reason('0 mm')).toBe('A length has to be more than zero.');
	});

	it.each([
		['-3', 'A length can’t be below zero. Leave out the minus.'],
		['−3 in', 'A length can’t be below zero. Leave out the minus.'],
		['4\' 5"', 'Feet aren’t used here. Type inches: 1 ft is 12 in.'],
		['2 ft', 'Feet aren’t used here. Type inches: 1 ft is 12 in.'],
		['1/0', 'A fraction can’t have 0 below the line. Check it and type it again.'],
		['7..3', '“7..3” doesn’t read as one length. Type it like 6 3/8 in or 162 mm.'],
		['6 3 8', '“6 3 8” doesn’t read as one length. Type it like 6 3/8 in or 162 mm.'],
		['6.', '“6.” doesn’t read as one length. Type it like 6 3/8 in or 162 mm.'],
		['', 'Type a length, like 6 3/8 in or 162 mm.'],
		['inches', '“inches” has no number. Type it like 6 3/8 in or 162 mm.'],
		['6 pt', '“6 pt” doesn’t end in a unit used here. Type in, mm or cm after the number.'],
		['1,500 mm', '“1,500” can be read two ways. Type 1500 or 1.500.'],
		['≈ 6 in', '≈ marks a rounded length. Type the exact one.'],
		['101 m', 'Metres and yards are for tape. Type in, mm or cm here.'],
		['100001 mm', 'That is longer than 100 m. Check the number and its unit.'],
		['9'.repeat(58), 'That is longer than 100 m. Check the number and its unit.'],
		['9'.repeat(61), 'That is too much for one length. Type it like 6 3/8 in or 162 mm.']
	])('refuses %s with a reason', (text, expected) => {
		expect(reason(text)).toBe(expected);
	});

	it('names the neighbours of a length that can’t be kept', () => {
		expect(reason('0.33 in')).toBe(
			'“0.33 in” can’t be measured out exactly. The nearest that can: 1341/4064 in or 2683/8128 in; ' +
				'by the ruler, 21/64 in or 11/32 in.'
		);
		expect(reason('1/3 in')).toContain('21/64 in or 11/32 in');
		expect(reason('3.33 mm')).toContain('3.328125 mm or 3.33125 mm; by the ruler, 3.3 mm or 3.4 mm');
		expect(reason('10001 m', tape)).toBe('That is longer than 10 km. Check the number and its unit.');
	});
});

it('takes a comma before three digits for thousands and for decimals alike only where both could be meant', () => {
	expect(reason('1,500 mm')).toContain('two ways');
	expect(reason('1,500 in', tape)).toContain('two ways');
	expect(value('1,500 in')).toBe(1.5 * INCH);
	expect(value('0,375 in', tape)).toBe(3048);
});

describe('reading out', () => {
	it.each([
		[51_816, 'in', '6 and 3 eighths inches'],
		[4064, 'in', 'half an inch'],
		[381, 'in', '3 sixty-fourths of an inch'],
		[508, 'in', '1 sixteenth of an inch'],
		[INCH, 'in', '1 inch'],
		[2 * INCH, 'in', '2 inches'],
		[51_840, 'cm', '16.2 centimetres'],
		[51_816, 'mm', 'about 161.9 millimetres'],
		[320, 'mm', '1 millimetre'],
		[YARD / 2, 'yd', 'half a yard'],
		[8 * METRE, 'm', '8 metres']
	] as const)('%i in %s: %s', (length, unit, expected) => {
		expect(spokenLength(length, unit)).toBe(expected);
	});
});

const NAMED = /(?:\d+ )?\d+(?:\.\d+)?(?:\/\d+)? (?:in|mm|cm|m|yd)\b/g;

function writePlaces(tenths: number, places: number): string {
	const digits = String(tenths).padStart(places + 1, '0');
	return `${digits.slice(0, -places)}.${digits.slice(-places)}`;
}
