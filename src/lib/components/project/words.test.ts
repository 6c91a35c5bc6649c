import { afterAll, beforeAll, describe, expect, test, vi } from 'vitest';
import type { BillDocument } from '$lib/domain/exchange';
import { INCH } from '$lib/domain/length';
import type { ProjectResult } from '$lib/domain/matching/verdict';
import { edgeWords, kindWanted, lineName, lineNotes, missingPieces, nearWords, wantedWords } from './words';

/** A date says its year only where that isn’t this one. */
beforeAll(() => void vi.setSystemTime('2027-05-01'));
afterAll(() => void vi.useRealTimers());

const bill: BillDocument = {
	key: 'tag-book',
	name: 'Tag book',
	slots: [
		{ key: 'cover', name: 'Cover', material: { kind: 'patterned-paper' } },
		{ key: 'board', material: { kind: 'chipboard' } }
	],
	pieces: [
		{ key: 'c', slot: 'cover', name: 'Case wrap', w: '11 in', h: '7 in', qty: 2 },
		{ key: 'b', slot: 'board', w: '4 in', h: '6 in', qty: 4 }
	],
	adhesives: [{ key: 'rim', name: 'Rim', kind: 'tape', width: '1/4 in', need: '93 in' }],
	tools: [{ key: 'punch', kind: 'corner-punch' }]
};

const result = (over: Partial<ProjectResult>): ProjectResult => ({
	project: 'tag-book',
	copies: 1,
	verdict: 'now',
	after: null,
	nowIfFirst: false,
	lines: [],
	short: [],
	near: [],
	plan: null,
	...over
});

describe('a line is called', () => {
	test.each([
		['slots/cover', 'Cover'],
		['slots/board', 'Board'],
		['adhesives/rim', 'Rim'],
		['tools/punch', 'Corner punch'],
		['tools/board-cut', 'A tool that cuts board']
	])('%s: %s', (line, name) => expect(lineName(bill, line)).toBe(name));
});

describe('what would serve a line is of the kind', () => {
	test.each([
		['slots/board', 'chipboard'],
		['adhesives/rim', 'tape'],
		['tools/punch', 'corner-punch'],
		['tools/board-cut', undefined]
	])('%s: %s', (line, kind) => expect(kindWanted(bill, line)).toBe(kind));
});

describe('the edge of a flap says', () => {
	test('how many pieces come from how many sheets', () => {
		const sheet = { supply: 'fern', nth: 1, w: INCH, h: INCH, placements: [], cuts: [], offcuts: [] };
		expect(edgeWords(bill, result({ plan: { proof: 'minimum', sheets: [sheet] } }))).toBe(
			'6 pieces from 1 sheet'
		);
		expect(edgeWords(bill, result({ copies: 3 }))).toBe('3 copies: 18 pieces');
	});

	test('what it lacks, the first by name', () => {
		const short = [
			{ line: 'slots/cover', pieces: {}, sheets: [] },
			{ line: 'tools/punch', tool: 'corner-punch' },
			{ line: 'adhesives/rim', amount: INCH }
		];
		expect(edgeWords(bill, result({ verdict: 'short', short }))).toBe('Lacks Cover and 2 more');
	});

	test('that only the order stands in its way', () => {
		const short = [{ line: 'slots/cover', pieces: {}, sheets: [] }];
		expect(edgeWords(bill, result({ verdict: 'short', nowIfFirst: true, short }))).toMatch(
			/^Now, if moved first/
		);
	});

	test('why it must be looked at', () => {
		const lines = [{ line: 'slots/board', verdict: 'look' as const, swap: null, why: 'nobody counted them' }];
		expect(edgeWords(bill, result({ verdict: 'look', lines }))).toBe('Board: nobody counted them');
	});
});

describe('what is missing', () => {
	const sheets = {
		line: 'slots/cover',
		pieces: { c: 1 },
		sheets: [{ w: 12 * INCH, h: 12 * INCH, count: 1 }]
	};

	test('is said in sheets, in tools, and in lengths of a roll, in the room’s units', () => {
		expect(wantedWords(bill, sheets, 'in')).toBe('1 more sheet of 12 × 12 in');
		expect(
			wantedWords(bill, { ...sheets, sheets: [{ w: INCH, h: INCH, count: 2, custom: true }] }, 'mm')
		).toBe('2 more sheets of 25.4 × 25.4 mm, a size of its own');
		expect(wantedWords(bill, { line: 'tools/punch', tool: 'corner-punch' }, 'in')).toBe(
			'No corner punch that serves'
		);
		expect(wantedWords(bill, { line: 'adhesives/rim', amount: 53 * INCH }, 'in')).toBe('53 in more tape');
	});

	test('names the pieces that no sheet holds', () => {
		expect(missingPieces(bill, sheets)).toEqual(['1 × Case wrap']);
		expect(missingPieces(bill, { line: 'tools/punch', tool: 'corner-punch' })).toEqual([]);
	});

	test('says a near miss in both systems', () => {
		const near = { line: 'slots/cover', supply: 'fern', side: 'w', by: INCH / 16 } as const;
		expect(nearWords(bill, near, 'Fern Lattice')).toBe(
			'Cover: Fern Lattice misses its width by only 1⁄16 in (≈ 1.6 mm).'
		);
	});
});

test('notes are given for lines that are met, but not plainly', () => {
	const lines = [
		{ line: 'slots/cover', verdict: 'swap' as const, supplies: ['oat'], swap: 0 },
		{ line: 'tools/punch', verdict: 'after' as const, supplies: ['p'], swap: null, after: '2027-05-12' },
		{ line: 'adhesives/rim', verdict: 'now' as const, swap: null, tight: true },
		{ line: 'slots/board', verdict: 'now' as const, swap: null }
	];
	const names: Record<string, string> = { oat: 'Oat card', p: 'Corner punch' };
	expect(lineNotes(bill, result({ lines }), (key) => names[key] ?? key).map(({ text }) => text)).toEqual([
		'Cover: Oat card serves, a swap that the bill allows.',
		'Corner punch: from 12 May on.',
		'Rim is tight: hardly any will be left over.'
	]);
});
