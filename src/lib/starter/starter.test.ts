import { describe, expect, test } from 'vitest';
import { proofread } from '../domain/bill/proofreader';
import { documentSchema, readBill, readDocument } from '../domain/exchange';
import { matchProjects, DEFAULT_OPTIONS } from '../domain/matching';
import { STARTERS } from '.';

const paper = (key: string, kind: string) => ({ key, kind, name: key, size: '12 x 12 in', sheets: 4 });

describe.each(STARTERS)('$bill.name', ({ key, bill, kit }) => {
	test('is an exchange document by the published form', () => {
		const document = { format: 'paperlarder', version: 1, supplies: kit, projects: [bill] };
		expect(documentSchema.safeParse(document).error).toBeUndefined();
		expect(bill.key).toBe(key);
	});

	test('adds up: the proofreader finds nothing', () => {
		expect(proofread(readBill(bill, 'in'))).toEqual([]);
	});

	test('is made now from eight sheets of patterned paper, four of cardstock and its kit, and is short of paper without', () => {
		const full = [
			paper('print', 'patterned-paper'),
			paper('print-2', 'patterned-paper'),
			paper('card', 'cardstock')
		];
		expect(verdictWith(full)).toBe('now');
		expect(verdictWith([])).toBe('short');
	});

	function verdictWith(papers: readonly ReturnType<typeof paper>[]) {
		const { supplies, bills } = readDocument(
			{ format: 'paperlarder', version: 1, supplies: [...papers, ...kit], projects: [bill] },
			'in'
		);
		const request = {
			bills,
			supplies,
			mode: 'each',
			copies: {},
			on: '2027-05-10',
			options: DEFAULT_OPTIONS
		} as const;
		return matchProjects(request, { work: 10_000_000 }).results[0]?.verdict;
	}
});
