import { describe, expect, it } from 'vitest';
import { sheetGrams } from '../../src/lib/domain/bench';
import { INCH, MILLIMETRE, parseLength } from '../../src/lib/domain/length';
import { PAPER_SIZES, paperSize, paperSizesOf } from '../../src/lib/domain/paper-size';

function sides(name: string): readonly [number, number] {
	const size = paperSize(name);
	if (!size) throw new Error(`no size ${name}`);
	return [size.w, size.h];
}
const mm = (value: number) => {
	const read = parseLength(`${value} mm`, { unit: 'mm' });
	return read.ok ? read.value : null;
};

// ISO 216 (A, B) and ISO 269 (C), via GNU Units 2.22 and an encyclopedia's tables; inches as printed there
const ISO: readonly (readonly [name: string, w: number, h: number, printed: string])[] = [
	['A0', 841, 1189, '33.1 x 46.8'],
	['A1', 594, 841, '23.4 x 33.1'],
	['A2', 420, 594, '16.5 x 23.4'],
	['A3', 297, 420, '11.7 x 16.5'],
	['A4', 210, 297, '8.3 x 11.7'],
	['A5', 148, 210, '5.8 x 8.3'],
	['A6', 105, 148, '4.1 x 5.8'],
	['A7', 74, 105, '2.9 x 4.1'],
	['A8', 52, 74, '2.0 x 2.9'],
	['A9', 37, 52, '1.5 x 2.0'],
	['A10', 26, 37, '1.0 x 1.5'],
	['B0', 1000, 1414, '39.4 x 55.7'],
	['B1', 707, 1000, '27.8 x 39.4'],
	['B2', 500, 707, '19.7 x 27.8'],
	['B3', 353, 500, '13.9 x 19.7'],
	['B4', 250, 353, '9.8 x 13.9'],
	['B5', 176, 250, '6.9 x 9.8'],
	['B6', 125, 176, '4.9 x 6.9'],
	['B7', 88, 125, '3.5 x 4.9'],
	['B8', 62, 88, '2.4 x 3.5'],
	['B9', 44, 62, '1.7 x 2.4'],
	['B10', 31, 44, '1.2 x 1.7'],
	['C0', 917, 1297, '36.1 x 51.1'],
	['C1', 648, 917, '25.5 x 36.1'],
	['C2', 458, 648, '18.0 x 25.5'],
	['C3', 324, 458, '12.8 x 18.0'],
	['C4', 229, 324, '9.0 x 12.8'],
	['C5', 162, 229, '6.4 x 9.0'],
	['C6', 114, 162, '4.5 x 6.4'],
	['C7', 81, 114, '3.2 x 4.5'],
	['C8', 57, 81, '2.2 x 3.2'],
	['C9', 40, 57, '1.6 x 2.2'],
	['C10', 28, 40, '1.1 x 1.6']
];

describe('ISO 216 and 269', () => {
	it.each(ISO)('%s is %i × %i mm', (name, w, h) => {
		expect(sides(name)).toEqual([w * MILLIMETRE, h * MILLIMETRE]);
	});

	it.each(ISO.filter(([, , , printed]) => printed !== ''))(
		'%s, %i × %i mm, prints as %s in',
		(name, _w, _h, printed) => {
			// one printed decimal, cut off or rounded
			const inches = printed.split(' x ').map(Number);
			sides(name).forEach((side, at) => {
				expect(Math.abs(side / INCH - (inches[at] ?? NaN))).toBeLessThan(0.1);
			});
		}
	);

	// ISO 216: halve the long side, down to the millimetre
	it.each(['A', 'B', 'C'])('derives %s from its larger neighbour', (letter) => {
		for (let n = 1; n <= 10; n += 1) {
			const [w, h] = sides(`${letter}${n - 1}`);
			expect(sides(`${letter}${n}`)).toEqual([Math.floor(h / MILLIMETRE / 2) * MILLIMETRE, w]);
		}
	});

	// ISO 216: B(n) is the geometric mean of A(n) and A(n-1), to the millimetre
	it('puts B between A(n) and A(n-1)', () => {
		for (let n = 1; n <= 10; n += 1) {
			const [narrow, wide] = [sides(`A${n}`)[1], sides(`A${n - 1}`)[1]];
			expect(Math.abs(sides(`B${n}`)[1] - Math.sqrt(narrow * wide))).toBeLessThan(2 * MILLIMETRE);
		}
	});
});

// ISO 217, RA primary range via draftsperson.net; SRA supplementary range from memory
describe('ISO 217', () => {
	it.each([
		['RA0', 860, 1220],
		['RA1', 610, 860],
		['RA2', 430, 610],
		['RA3', 305, 430],
		['RA4', 215, 305],
		['SRA0', 900, 1280],
		['SRA1', 640, 900],
		['SRA2', 450, 640],
		['SRA3', 320, 450],
		['SRA4', 225, 320]
	])('%s is %i × %i mm', (name, w, h) => {
		expect(sides(name)).toEqual([w * MILLIMETRE, h * MILLIMETRE]);
	});
});

// JIS P 0138, from memory: not ISO's sizes of the same numbers
describe('JIS', () => {
	it.each([
		['B4', 257, 364],
		['B5', 182, 257],
		['B6', 128, 182]
	])('JIS %s is %i × %i mm', (name, w, h) => {
		expect(sides(`JIS ${name}`)).toEqual([w * MILLIMETRE, h * MILLIMETRE]);
		expect(sides(name)).not.toEqual(sides(`JIS ${name}`));
	});
});

// ANSI/ASME Y14.1 (ANSI A to F); GNU Units 2.22, "USA paper sizes" (Legal, Executive); ARCH from memory
describe('North American sizes', () => {
	it.each([
		['Letter', 8.5, 11, 215.9, 279.4],
		['ANSI A', 8.5, 11, 215.9, 279.4],
		['Legal', 8.5, 14, 215.9, 355.6],
		['Tabloid', 11, 17, 279.4, 431.8],
		['ANSI B', 11, 17, 279.4, 431.8],
		['ANSI C', 17, 22, 431.8, 558.8],
		['ANSI D', 22, 34, 558.8, 863.6],
		['ANSI E', 34, 44, 863.6, 1117.6],
		['ANSI F', 28, 40, 711.2, 1016],
		['Executive', 7.25, 10.5, 184.15, 266.7],
		['ARCH A', 9, 12, 228.6, 304.8],
		['ARCH B', 12, 18, 304.8, 457.2],
		['ARCH C', 18, 24, 457.2, 609.6],
		['ARCH D', 24, 36, 609.6, 914.4],
		['ARCH E', 36, 48, 914.4, 1219.2]
	])('%s is %d × %d in, %d × %d mm', (name, w, h, wMm, hMm) => {
		expect(sides(name)).toEqual([w * INCH, h * INCH]);
		expect(sides(name)).toEqual([mm(wMm), mm(hMm)]);
	});

	// ANSI/ASME Y14.1 prints whole millimetres, which are not the sheet
	it.each([
		['ANSI A', 216, 279],
		['ANSI B', 279, 432],
		['ANSI C', 432, 559],
		['ANSI D', 559, 864],
		['ANSI E', 864, 1118],
		['ANSI F', 711, 1016]
	])('%s prints as %i × %i mm, and is not that', (name, w, h) => {
		expect(sides(name).map((side) => Math.round(side / MILLIMETRE))).toEqual([w, h]);
		expect(paperSizesOf(w * MILLIMETRE, h * MILLIMETRE)).toEqual([]);
	});

	// pdf-lib 1.17.1, PageSizes, in points of 1/72 in
	it.each([
		['Letter', 612, 792],
		['Legal', 612, 1008],
		['Tabloid', 792, 1224]
	])('%s is %i × %i points', (name, w, h) => {
		expect(sides(name).map((side) => (side * 72) / INCH)).toEqual([w, h]);
	});

	// pdf-lib 1.17.1 prints 521.86 points for Executive: rounded, the nominal width is 7.25 in = 522
	it('Executive is 522 points wide', () => {
		expect((sides('Executive')[0] * 72) / INCH).toBe(522);
	});
});

// GNU Units 2.22, definitions.units, "USA paper sizes"
describe('envelopes', () => {
	it.each([
		['A1 envelope', 3.625, 5.125, 92.075, 130.175],
		['A2 envelope', 4.375, 5.75, 111.125, 146.05],
		['A6 envelope', 4.75, 6.5, 120.65, 165.1],
		['A7 envelope', 5.25, 7.25, 133.35, 184.15],
		['A8 envelope', 5.5, 8.125, 139.7, 206.375],
		['A9 envelope', 5.75, 8.75, 146.05, 222.25],
		['A10 envelope', 6, 9.5, 152.4, 241.3],
		['#6 1/4 envelope', 3.5, 6, 88.9, 152.4],
		['#6 3/4 envelope', 3.625, 6.5, 92.075, 165.1],
		['#7 envelope', 3.75, 6.75, 95.25, 171.45],
		['#7 3/4 envelope', 3.875, 7.5, 98.425, 190.5],
		['#9 envelope', 3.875, 8.875, 98.425, 225.425],
		['#10 envelope', 4.125, 9.5, 104.775, 241.3],
		['#11 envelope', 4.5, 10.375, 114.3, 263.525],
		['#12 envelope', 4.75, 11, 120.65, 279.4],
		['#14 envelope', 5, 11.5, 127, 292.1]
	])('%s is %d × %d in, %d × %d mm', (name, w, h, wMm, hMm) => {
		expect(sides(name)).toEqual([w * INCH, h * INCH]);
		expect(sides(name)).toEqual([mm(wMm), mm(hMm)]);
	});

	// ISO 269 / DIN 678
	it('DL is 110 × 220 mm', () => {
		expect(sides('DL')).toEqual([110 * MILLIMETRE, 220 * MILLIMETRE]);
	});
});

// Common practice, no source: the square sheets and pads of the trade
describe('craft sheets', () => {
	it.each([
		['12 x 12', 304.8],
		['8 x 8', 203.2],
		['6 x 6', 152.4],
		['30 x 30 cm', 300],
		['30.5 x 30.5 cm', 305]
	])('%s is %d mm square', (name, side) => {
		expect(sides(name)).toEqual([mm(side), mm(side)]);
	});
});

// Misprints found in secondary tables (studiofrog.cz, draftsperson.net)
describe('known misprints', () => {
	it.each([
		['A6', 148, 210],
		['A5', 149, 210],
		['B4', 250, 253]
	])('%s is not %i × %i mm', (name, w, h) => {
		expect(sides(name)).not.toEqual([w * MILLIMETRE, h * MILLIMETRE]);
		expect(paperSizesOf(w * MILLIMETRE, h * MILLIMETRE).map((size) => size.name)).not.toContain(name);
	});

	// ebroadcast.com.au, kids.net.au: "B between A(n) and A(n+1)"
	it('B is larger than the A of its number, not smaller', () => {
		for (let n = 0; n <= 10; n += 1) expect(sides(`B${n}`)[1]).toBeGreaterThan(sides(`A${n}`)[1]);
	});
});

// Grammage (encyclopedia): an 80 g/m² sheet of 210 × 297 mm weighs 4.9896 g, not the 5 g of a sixteenth of a m²
it('weighs an A4 sheet', () => {
	expect(sheetGrams(...sides('A4'), 80)).toBeCloseTo(4.9896, 10);
});

it('knows as many sizes as are checked here, and Half letter', () => {
	expect(PAPER_SIZES).toHaveLength(84);
});
