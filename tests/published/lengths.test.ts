import { describe, expect, it } from 'vitest';
import {
	formatLength,
	INCH,
	METRE,
	MILLIMETRE,
	parseLength,
	writeExact,
	YARD
} from '../../src/lib/domain/length';

const entry = { unit: 'in', long: true } as const;
const read = (text: string) => parseLength(text, entry);
function value(text: string): number {
	const length = read(text);
	if (!length.ok) throw new Error(length.reason);
	return length.value;
}

// NBS Circular 572, addendum (22 January 1960): 1 yard = 0.9144 m exactly, so 1 in = 25.4 mm
describe('definitions', () => {
	it.each([
		['1 in', '25.4 mm'],
		['12 in', '304.8 mm'],
		['1 yd', '914.4 mm'],
		['1 yd', '0.9144 m'],
		['1 yd', '36 in']
	])('%s is %s', (left, right) => {
		expect(value(left)).toBe(value(right));
	});

	it('fixes the constants', () => {
		expect(INCH * 10).toBe(MILLIMETRE * 254);
		expect(YARD * 10_000).toBe(METRE * 9144);
	});
});

// Fraction to decimal chart, 1/64 in to 1 in (utilitiesbunker.com/kb/fraction-to-decimal-chart); exact mm recomputed
const SIXTY_FOURTHS: readonly (readonly [fraction: string, inch: string, mm: string, printed: string])[] = [
	['1/64', '0.015625', '0.396875', '0.3969'],
	['1/32', '0.031250', '0.79375', '0.7937'],
	['3/64', '0.046875', '1.190625', '1.1906'],
	['1/16', '0.062500', '1.5875', '1.5875'],
	['5/64', '0.078125', '1.984375', '1.9844'],
	['3/32', '0.093750', '2.38125', '2.3812'],
	['7/64', '0.109375', '2.778125', '2.7781'],
	['1/8', '0.125000', '3.175', '3.1750'],
	['9/64', '0.140625', '3.571875', '3.5719'],
	['5/32', '0.156250', '3.96875', '3.9688'],
	['11/64', '0.171875', '4.365625', '4.3656'],
	['3/16', '0.187500', '4.7625', '4.7625'],
	['13/64', '0.203125', '5.159375', '5.1594'],
	['7/32', '0.218750', '5.55625', '5.5562'],
	['15/64', '0.234375', '5.953125', '5.9531'],
	['1/4', '0.250000', '6.35', '6.3500'],
	['17/64', '0.265625', '6.746875', '6.7469'],
	['9/32', '0.281250', '7.14375', '7.1437'],
	['19/64', '0.296875', '7.540625', '7.5406'],
	['5/16', '0.312500', '7.9375', '7.9375'],
	['21/64', '0.328125', '8.334375', '8.3344'],
	['11/32', '0.343750', '8.73125', '8.7312'],
	['23/64', '0.359375', '9.128125', '9.1281'],
	['3/8', '0.375000', '9.525', '9.5250'],
	['25/64', '0.390625', '9.921875', '9.9219'],
	['13/32', '0.406250', '10.31875', '10.3187'],
	['27/64', '0.421875', '10.715625', '10.7156'],
	['7/16', '0.437500', '11.1125', '11.1125'],
	['29/64', '0.453125', '11.509375', '11.5094'],
	['15/32', '0.468750', '11.90625', '11.9062'],
	['31/64', '0.484375', '12.303125', '12.3031'],
	['1/2', '0.500000', '12.7', '12.7000'],
	['33/64', '0.515625', '13.096875', '13.0969'],
	['17/32', '0.531250', '13.49375', '13.4937'],
	['35/64', '0.546875', '13.890625', '13.8906'],
	['9/16', '0.562500', '14.2875', '14.2875'],
	['37/64', '0.578125', '14.684375', '14.6844'],
	['19/32', '0.593750', '15.08125', '15.0812'],
	['39/64', '0.609375', '15.478125', '15.4781'],
	['5/8', '0.625000', '15.875', '15.8750'],
	['41/64', '0.640625', '16.271875', '16.2719'],
	['21/32', '0.656250', '16.66875', '16.6687'],
	['43/64', '0.671875', '17.065625', '17.0656'],
	['11/16', '0.687500', '17.4625', '17.4625'],
	['45/64', '0.703125', '17.859375', '17.8594'],
	['23/32', '0.718750', '18.25625', '18.2562'],
	['47/64', '0.734375', '18.653125', '18.6531'],
	['3/4', '0.750000', '19.05', '19.0500'],
	['49/64', '0.765625', '19.446875', '19.4469'],
	['25/32', '0.781250', '19.84375', '19.8438'],
	['51/64', '0.796875', '20.240625', '20.2406'],
	['13/16', '0.812500', '20.6375', '20.6375'],
	['53/64', '0.828125', '21.034375', '21.0344'],
	['27/32', '0.843750', '21.43125', '21.4312'],
	['55/64', '0.859375', '21.828125', '21.8281'],
	['7/8', '0.875000', '22.225', '22.2250'],
	['57/64', '0.890625', '22.621875', '22.6219'],
	['29/32', '0.906250', '23.01875', '23.0187'],
	['59/64', '0.921875', '23.415625', '23.4156'],
	['15/16', '0.937500', '23.8125', '23.8125'],
	['61/64', '0.953125', '24.209375', '24.2094'],
	['31/32', '0.968750', '24.60625', '24.6062'],
	['63/64', '0.984375', '25.003125', '25.0031'],
	['1', '1.000000', '25.4', '25.4000']
];

describe('the 64ths of an inch', () => {
	it.each(SIXTY_FOURTHS)('%s in = %s in = %s mm', (fraction, inch, mm) => {
		expect(value(`${inch} in`)).toBe(value(`${fraction} in`));
		expect(value(`${mm} mm`)).toBe(value(`${fraction} in`));
		expect(formatLength(value(`${mm} mm`), 'in')).toBe(`${fraction.replace('/', '⁄')} in`);
	});

	it.each(SIXTY_FOURTHS.filter(([, , mm, printed]) => Number(mm) !== Number(printed)))(
		'%s in is not its printed four decimals',
		(fraction, _inch, _mm, printed) => {
			const rounded = read(`${printed} mm`);
			expect(rounded.ok && rounded.value === value(`${fraction} in`)).toBe(false);
		}
	);
});

// Converting measurements in inches (claredot.net)
describe('conversions', () => {
	it.each([
		['1 3/4 in', '44.45 mm'],
		['4 in', '101.6 mm'],
		['7/8 in', '22.225 mm']
	])('%s = %s', (inch, mm) => {
		expect(value(inch)).toBe(value(mm));
	});

	it('63/64 in prints as 25.003 mm', () => {
		expect(value('63/64 in')).toBe(value('25.003125 mm'));
		expect((value('63/64 in') / MILLIMETRE).toFixed(3)).toBe('25.003');
	});

	it('refuses the three decimals that it prints as', () => {
		expect(read('25.003 mm').ok).toBe(false);
	});
});

describe('the nearest 64th', () => {
	it.each([
		['22 mm', '≈ 55⁄64 in'], // claredot.net: 55/64 is 6.767 thousandths of an inch below 22 mm
		['300 mm', '≈ 11 13⁄16 in'], // recomputed from 1 in = 25.4 mm
		['105 mm', '≈ 4 9⁄64 in'] // recomputed from 1 in = 25.4 mm
	])('of %s is %s', (typed, shown) => {
		expect(formatLength(value(typed), 'in')).toBe(shown);
	});

	it.each([
		['0.4 in', '13/32 in'], // homemadetools.net: 25.6 sixty-fourths, rounded 26
		['0.123 in', '1/8 in'] // machinecalcs.com: 7.872 sixty-fourths, rounded 8
	])('of %s is offered when it is refused: %s', (typed, mark) => {
		const length = read(typed);
		expect(length.ok ? '' : length.reason).toContain(mark);
	});
});

// ISO 80000-1:2009 annex B, rule B: a tie goes up (values from memory, recomputed)
describe('the nearest tenth of a millimetre', () => {
	it.each([
		['12.25 mm', '≈ 12.3 mm'],
		['12.275 mm', '≈ 12.3 mm'],
		['12.35 mm', '≈ 12.4 mm']
	])('%s is shown as %s', (typed, shown) => {
		expect(formatLength(value(typed), 'mm')).toBe(shown);
	});
});

// Unicode Character Database, compatibility decompositions <fraction> of UnicodeData.txt
const VULGAR: readonly (readonly [character: string, fraction: string])[] = [
	['¼', '1/4'],
	['½', '1/2'],
	['¾', '3/4'],
	['⅐', '1/7'],
	['⅑', '1/9'],
	['⅒', '1/10'],
	['⅓', '1/3'],
	['⅔', '2/3'],
	['⅕', '1/5'],
	['⅖', '2/5'],
	['⅗', '3/5'],
	['⅘', '4/5'],
	['⅙', '1/6'],
	['⅚', '5/6'],
	['⅛', '1/8'],
	['⅜', '3/8'],
	['⅝', '5/8'],
	['⅞', '7/8']
];

describe('vulgar fractions', () => {
	it.each(VULGAR)('%s is %s, alone and after a whole number', (character, fraction) => {
		expect(read(`${character} in`)).toEqual(read(`${fraction} in`));
		expect(read(`2${character} in`)).toEqual(read(`2 ${fraction} in`));
		expect(read(`2 ${character} yd`)).toEqual(read(`2 ${fraction} yd`));
	});

	it.each(VULGAR.filter(([, fraction]) => /\/[248]$/.test(fraction)))(
		'%s in is exact',
		(character, fraction) => {
			expect(writeExact(value(`${character} in`), 'in')).toBe(`${fraction} in`);
		}
	);

	it('takes the numerator one (U+215F) with what it lacks, and zero thirds (U+2189) never', () => {
		expect(value('⅟16 in')).toBe(value('1/16 in'));
		expect(read('⅟ in').ok).toBe(false);
		expect(read('↉ in').ok).toBe(false);
		expect(read('6↉ in').ok).toBe(false);
	});
});

// Unicode code charts, General Punctuation, Latin-1 and Mathematical Operators (from memory)
describe('marks that a page is copied with', () => {
	it.each(['6 3\u20448\u2033', '6 3\u20448\u201d', '6\u00a03/8\u00a0in', '6\u202f3/8\u202fin'])(
		'%s',
		(typed) => {
			expect(value(typed)).toBe(value('6 3/8 in'));
		}
	);

	it.each(['\u22126 in', '6\u2032', '6\u2019'])('refuses %s: a minus, or feet', (typed) => {
		expect(read(typed).ok).toBe(false);
	});
});

// Label-printer CSV file information (RFC 4180): the field 4' 5" is in feet
it('refuses feet with inches', () => {
	expect(read('4\' 5"')).toEqual({ ok: false, reason: 'Feet aren’t used here. Type inches: 1 ft is 12 in.' });
});
