import { expect, test } from 'vitest';
import { INCH } from '$lib/domain/length';
import { letterPieces, offcutKept, sheetWords } from './labels';
import type { Paper } from './paper';

const at = (piece: string, face: 'A' | 'B' = 'A') => ({
	project: 'p',
	piece,
	x: 0,
	y: 0,
	w: 2 * INCH,
	h: 3 * INCH,
	turned: false,
	face,
	noSlack: false
});
const fern: Paper = { name: 'Fern', kind: 'patterned-paper', colours: [], faces: [], picture: null };

test('a piece goes by one letter on every sheet, in the order in which they first lie', () => {
	const sheets = [{ placements: [at('cover'), at('tag')] }, { placements: [at('tag'), at('mat')] }];
	const names = letterPieces(sheets, (_, piece) => piece);
	expect(['cover', 'tag', 'mat'].map((piece) => names({ project: 'p', piece }).letter)).toEqual([
		'A',
		'B',
		'C'
	]);
});

test('after Z come AA and AB', () => {
	const placements = Array.from({ length: 28 }, (_, i) => at(String(i)));
	const names = letterPieces([{ placements }], (_, piece) => piece);
	expect(['25', '26', '27'].map((piece) => names({ project: 'p', piece }).letter)).toEqual(['Z', 'AA', 'AB']);
});

test('an offcut is kept by its shorter side', () => {
	expect(offcutKept({ x: 0, y: 0, w: 12 * INCH, h: INCH }, INCH)).toBe(true);
	expect(offcutKept({ x: 0, y: 0, w: 12 * INCH, h: INCH - 1 }, INCH)).toBe(false);
	expect(offcutKept({ x: 0, y: 0, w: 1, h: 1 }, null)).toBe(true);
});

test('a sheet is told in words, the lost face too', () => {
	const sheet = { w: 12 * INCH, h: 12 * INCH, placements: [at('tag')] };
	const names = letterPieces([sheet], () => 'Tag');
	expect(sheetWords(sheet, fern, names, 'A', 'in')).toBe(
		'Fern, 12 inches by 12 inches. On it: A, Tag, 2 inches by 3 inches.'
	);
	expect(sheetWords(sheet, fern, names, 'B', 'in')).toContain(
		'turned over to its B-side. On it: A, Tag, 2 inches by 3 inches, this face is lost.'
	);
});
