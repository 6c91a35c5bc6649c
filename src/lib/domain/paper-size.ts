import { plainTyping } from './length/typed';
import { CENTIMETRE, INCH, MILLIMETRE, type Length } from './length/units';

/** A size with a name, upright: `w` is never more than `h`. */
export interface PaperSize {
	readonly name: string;
	readonly family: 'craft' | 'iso' | 'north-american' | 'architectural' | 'jis' | 'envelope';
	readonly w: Length;
	readonly h: Length;
}

/** `a4`, `A4 paper`, `Letter`, `#10 envelope` or `12 x 12`; null where the name isn't known. */
export function paperSize(name: string): PaperSize | null {
	return BY_NAME.get(nameKey(name)) ?? null;
}

/** Every name for exactly this size, whichever way it lies. */
export function paperSizesOf(w: Length, h: Length): readonly PaperSize[] {
	const [short, long] = w <= h ? [w, h] : [h, w];
	return PAPER_SIZES.filter((size) => size.w === short && size.h === long);
}

function nameKey(name: string): string {
	return plainTyping(name)
		.replace(/\b(?:paper|sheet|size|us)\b/g, '')
		.replace(/[^a-z0-9#./]+/g, '');
}

function millimetres(
	family: PaperSize['family'],
	rows: readonly (readonly [string, number, number])[]
): PaperSize[] {
	return rows.map(([name, w, h]) => ({ name, family, w: w * MILLIMETRE, h: h * MILLIMETRE }));
}

function inches(
	family: PaperSize['family'],
	rows: readonly (readonly [string, number, number])[]
): PaperSize[] {
	return rows.map(([name, w, h]) => ({ name, family, w: w * INCH, h: h * INCH }));
}

function isoSeries(letter: string, sides: readonly number[]): PaperSize[] {
	const rows = sides.slice(0, -1).map((long, n) => [`${letter}${n}`, sides[n + 1] ?? 0, long] as const);
	return millimetres('iso', rows);
}

export const PAPER_SIZES: readonly PaperSize[] = [
	...inches('craft', [
		['12 × 12', 12, 12],
		['8 × 8', 8, 8],
		['6 × 6', 6, 6]
	]),
	{ name: '30 × 30 cm', family: 'craft', w: 30 * CENTIMETRE, h: 30 * CENTIMETRE },
	{ name: '30.5 × 30.5 cm', family: 'craft', w: 305 * MILLIMETRE, h: 305 * MILLIMETRE },
	...isoSeries('A', [1189, 841, 594, 420, 297, 210, 148, 105, 74, 52, 37, 26]),
	...isoSeries('B', [1414, 1000, 707, 500, 353, 250, 176, 125, 88, 62, 44, 31]),
	...isoSeries('C', [1297, 917, 648, 458, 324, 229, 162, 114, 81, 57, 40, 28]),
	...millimetres('iso', [
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
	]),
	...inches('north-american', [
		['Letter', 8.5, 11],
		['Half letter', 5.5, 8.5],
		['Legal', 8.5, 14],
		['Tabloid', 11, 17],
		['Executive', 7.25, 10.5],
		['ANSI A', 8.5, 11],
		['ANSI B', 11, 17],
		['ANSI C', 17, 22],
		['ANSI D', 22, 34],
		['ANSI E', 34, 44],
		['ANSI F', 28, 40]
	]),
	...inches('architectural', [
		['ARCH A', 9, 12],
		['ARCH B', 12, 18],
		['ARCH C', 18, 24],
		['ARCH D', 24, 36],
		['ARCH E', 36, 48]
	]),
	...millimetres('jis', [
		['JIS B4', 257, 364],
		['JIS B5', 182, 257],
		['JIS B6', 128, 182]
	]),
	...inches('envelope', [
		['A1 envelope', 3.625, 5.125],
		['A2 envelope', 4.375, 5.75],
		['A6 envelope', 4.75, 6.5],
		['A7 envelope', 5.25, 7.25],
		['A8 envelope', 5.5, 8.125],
		['A9 envelope', 5.75, 8.75],
		['A10 envelope', 6, 9.5],
		['#6 1/4 envelope', 3.5, 6],
		['#6 3/4 envelope', 3.625, 6.5],
		['#7 envelope', 3.75, 6.75],
		['#7 3/4 envelope', 3.875, 7.5],
		['#9 envelope', 3.875, 8.875],
		['#10 envelope', 4.125, 9.5],
		['#11 envelope', 4.5, 10.375],
		['#12 envelope', 4.75, 11],
		['#14 envelope', 5, 11.5]
	]),
	...millimetres('envelope', [['DL envelope', 110, 220]])
];

/** A name that two sizes could claim stays with the paper: `A7` is ISO's, `#10` and `DL` only an envelope's. */
const BY_NAME: ReadonlyMap<string, PaperSize> = new Map([
	...PAPER_SIZES.map((size) => [nameKey(size.name.replace(/ envelope$/, '')), size] as const).reverse(),
	...PAPER_SIZES.map((size) => [nameKey(size.name.replace(/^JIS (.*)$/, '$1 JIS')), size] as const),
	...PAPER_SIZES.map((size) => [nameKey(size.name), size] as const)
]);
