import { describe, expect, it } from 'vitest';
import { CALIPER_MILLIMETRE, parseCaliper } from '../../src/lib/domain/caliper';
import { GRADES, gsmOfPounds, parseWeight, poundsOfGsm, type Grade } from '../../src/lib/domain/paper-weight';

function gsm(typed: string): number {
	const read = parseWeight(typed);
	if (!read.ok) throw new Error(read.reason);
	return read.value.gsm;
}
function millimetres(typed: string): number {
	const read = parseCaliper(typed);
	if (!read.ok) throw new Error(read.reason);
	return read.value / CALIPER_MILLIMETRE;
}

// Basic sheets of 500: GNU Units 2.22, definitions.units, US paper weights; also a production printer's paper guide, p. 54
const BASIC_SHEETS: readonly (readonly [grade: Grade, a: number, b: number, factor: number])[] = [
	['bond', 17, 22, 3.75973],
	['text', 25, 38, 1.480146],
	['cover', 20, 26, 2.704114],
	['bristol', 22.5, 28.5, 2.19281],
	['index', 25.5, 30.5, 1.807958],
	['tag', 24, 36, 1.627476]
];

describe('the basic sheets', () => {
	it.each(BASIC_SHEETS)('a pound of %s, %d × %d in, is %d g/m²', (grade, _a, _b, factor) => {
		expect(gsmOfPounds(1, grade)).toBeCloseTo(factor, 5);
		expect(gsm(`1 lb ${grade}`)).toBe(gsmOfPounds(1, grade));
	});

	// Recomputed: 453.59237 g ÷ (500 × 0.0254²) = 1406.1392; the printed 1406.5 (paperspecs.com glossary) is not it
	it.each(BASIC_SHEETS)('%s × its %d × %d in is the constant', (grade, a, b) => {
		expect(gsmOfPounds(1, grade) * a * b).toBeCloseTo(1406.1392, 4);
		expect(Math.abs(gsmOfPounds(1, grade) * a * b - 1406.5)).toBeGreaterThan(0.3);
	});

	it('are those of every grade that pounds are taken for', () => {
		expect(BASIC_SHEETS.map(([grade]) => grade).sort()).toEqual([...GRADES].sort());
	});
});

// Printed multipliers: a production printer's paper guide, tables; printwiki.org/Grammage
describe('printed factors', () => {
	it.each<readonly [Grade, number]>([
		['bond', 3.76],
		['text', 1.48],
		['cover', 2.7],
		['index', 1.81],
		['tag', 1.63],
		['bristol', 2.19],
		['bond', 3.76],
		['cover', 2.704],
		['tag', 1.627],
		['text', 1.48],
		['text', 1.4802],
		['cover', 2.7042]
	])('of %s, %d, are within 0.2 %', (grade, printed) => {
		expect(Math.abs(gsmOfPounds(1, grade) / printed - 1)).toBeLessThan(0.002);
	});

	// printwiki.org/Grammage
	it.each<readonly [Grade, number]>([
		['bond', 0.266],
		['cover', 0.37],
		['tag', 0.614],
		['text', 0.675]
	])('pounds of %s per g/m², %d', (grade, printed) => {
		expect(Math.abs(poundsOfGsm(1, grade) - printed)).toBeLessThan(0.001);
	});

	// Recomputed from the basic sheets: 1.806 and 2.195 go round, and are not the factors
	it('of index and bristol that go round are off', () => {
		expect(gsmOfPounds(1, 'index')).toBeCloseTo(1.80796, 5);
		expect(gsmOfPounds(1, 'bristol')).toBeCloseTo(2.19281, 5);
		expect(gsmOfPounds(1, 'index')).not.toBeCloseTo(1.806, 3);
		expect(gsmOfPounds(1, 'bristol')).not.toBeCloseTo(2.195, 3);
	});
});

// A production printer's paper guide, p. 54; printwiki.org/Grammage (bond)
describe('worked examples', () => {
	it.each([
		['90 lb text', 133.218, 133.213],
		['100 lb cover', 270.42, 270.411],
		['20 lb bond', 75.2, 75.195]
	])('%s: printed %d, exact %d g/m²', (typed, printed, exact) => {
		expect(gsm(typed)).toBeCloseTo(exact, 3);
		expect(Math.abs(gsm(typed) - printed)).toBeLessThan(0.01);
	});

	// printwiki.org/Grammage prints 69.93 lb
	it('103.6 g/m² is 69.993 lb of text', () => {
		expect(poundsOfGsm(103.6, 'text')).toBeCloseTo(69.993, 3);
		expect(Math.abs(poundsOfGsm(103.6, 'text') - 69.93)).toBeLessThan(0.1);
	});
});

// Laser-printer user guide, table 1-23, weight equivalence
describe('trade weights', () => {
	it.each([
		['65 lb cover', 176, 175.77],
		['80 lb cover', 216, 216.33],
		['100 lb cover', 271, 270.41],
		['60 lb cover', 163, 162.25],
		['90 lb cover', 244, 243.37],
		['110 lb index', 199, 198.88],
		['90 lb index', 163, 162.72],
		['20 lb bond', 75, 75.19],
		['24 lb bond', 90, 90.23],
		['28 lb bond', 105, 105.27],
		['32 lb bond', 120, 120.31],
		['80 lb text', 120, 118.41],
		['100 lb text', 148, 148.01],
		['110 lb text', 163, 162.82],
		['67 lb bristol', 148, 146.92],
		['80 lb bristol', 176, 175.42],
		['100 lb tag', 163, 162.75],
		['125 lb tag', 203, 203.43],
		['150 lb tag', 244, 244.12]
	])('%s: printed %d, exact %d g/m²', (typed, printed, exact) => {
		expect(Math.abs(gsm(typed) - exact)).toBeLessThan(0.0051);
		expect(Math.abs(gsm(typed) - printed)).toBeLessThanOrEqual(2);
	});
});

const COLUMNS = ['bond', 'text', 'cover', 'bristol', 'index', 'tag'] as const;
// Laser-printer user guide, table 1-23, weight equivalence: g/m², then pounds of each grade in COLUMNS
const EQUIVALENTS: readonly (readonly number[])[] = [
	[60, 16, 41, 22, 27, 33, 37],
	[64, 17, 43, 24, 29, 35, 39],
	[75, 20, 50, 28, 34, 42, 46],
	[80, 21, 54, 30, 36, 44, 49],
	[90, 24, 60, 33, 41, 50, 55],
	[100, 27, 68, 37, 45, 55, 61],
	[105, 28, 70, 39, 49, 58, 65],
	[110, 29, 74, 41, 50, 61, 68],
	[120, 32, 80, 44, 55, 67, 74],
	[135, 36, 90, 50, 62, 75, 83],
	[148, 39, 100, 55, 67, 82, 91],
	[150, 40, 101, 55, 68, 83, 92],
	[163, 43, 110, 60, 74, 90, 100],
	[170, 45, 115, 63, 77, 94, 104],
	[176, 47, 119, 65, 80, 97, 108],
	[190, 51, 128, 70, 86, 105, 117],
	[199, 53, 134, 74, 90, 110, 122],
	[203, 54, 137, 75, 93, 113, 125],
	[216, 58, 146, 80, 98, 120, 133],
	[244, 65, 165, 90, 111, 135, 150],
	[250, 66, 169, 92, 114, 138, 154],
	[253, 67, 171, 94, 115, 140, 155],
	[264, 70, 178, 98, 120, 146, 162],
	[271, 72, 183, 100, 123, 150, 166]
];
const CELLS = EQUIVALENTS.flatMap(([grams = NaN, ...pounds]) =>
	pounds.map((lb, column) => [lb, COLUMNS[column] ?? 'bond', grams] as const)
);
/** Cells of that table which no pound of the grade explains: misprints. */
const MISPRINTS = [
	[49, 'bristol', 105],
	[58, 'bond', 216]
] as const;
const isMisprint = ([lb, grade, grams]: readonly [number, Grade, number]) =>
	MISPRINTS.some((cell) => cell[0] === lb && cell[1] === grade && cell[2] === grams);

describe('the equivalence table', () => {
	it.each(CELLS.filter((cell) => !isMisprint(cell)))(
		'%d lb %s is within 2 of %d g/m²',
		(lb, grade, grams) => {
			expect(Math.abs(gsmOfPounds(lb, grade) - grams)).toBeLessThanOrEqual(2);
		}
	);

	it.each(MISPRINTS)('%d lb %s is not %d g/m²', (lb, grade, grams) => {
		expect(Math.abs(gsmOfPounds(lb, grade) - grams)).toBeGreaterThan(2);
	});
});

// timesprinters.com: 50 lb cover is 135 g/m², 50 lb text is 74 g/m²
it('tells 50 lb of cover from 50 lb of text, and refuses 50 lb of nothing', () => {
	expect(Math.round(gsm('50 lb cover'))).toBe(135);
	expect(Math.round(gsm('50 lb text'))).toBe(74);
	expect(parseWeight('50 lb').ok).toBe(false);
});

// A supplier's table with its headers swapped gives book paper a basis of 25 × 35 in; it is 25 × 38
it('weighs book paper by the sheet of text, not by 25 × 35 in', () => {
	expect(gsm('60 lb book')).toBe(gsm('60 lb text'));
	expect(gsm('60 lb book')).not.toBeCloseTo((60 * 1406.1392) / (25 * 35), 1);
});

// A paper test laboratory on TAPPI T 411: 1 pt = 0.001 in = 25.4 µm
describe('caliper', () => {
	it('a point is 0.001 in, 0.0254 mm, 25.4 µm', () => {
		expect(parseCaliper('1 pt')).toEqual(parseCaliper('0.001 in'));
		expect(parseCaliper('1 pt')).toEqual(parseCaliper('0.0254 mm'));
		expect(parseCaliper('1 pt')).toEqual(parseCaliper('25.4 µm'));
	});

	// Recomputed: 1 pt = 0.001 in and 1 in = 25.4 mm
	it.each([
		[8, 0.2032],
		[10, 0.254],
		[12, 0.3048],
		[14, 0.3556],
		[16, 0.4064],
		[20, 0.508],
		[22, 0.5588],
		[30, 0.762],
		[50, 1.27],
		[60, 1.524],
		[100, 2.54]
	])('%d pt is %d mm', (points, mm) => {
		expect(parseCaliper(`${points} pt`)).toEqual(parseCaliper(`${mm} mm`));
	});

	// Paper weights and conversion tables (a printer's guide): points beside mm as printed, cut or rounded to what it shows
	it.each([
		[3.2, 0.081],
		[3.6, 0.092],
		[3.8, 0.097],
		[4.8, 0.12],
		[5.8, 0.147],
		[6, 0.152],
		[6.1, 0.155],
		[6.2, 0.157]
	])('%d pt prints as %d mm', (points, printed) => {
		expect(Math.abs(millimetres(`${points} pt`) - printed)).toBeLessThan(0.002);
	});
});
