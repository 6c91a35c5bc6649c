import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { anyBill, anyBills, anyRow, anyStash } from '../../../../tests/factories/any-room';
import { aRequest, aSheet, inches } from '../../../../tests/factories/stash';
import { createMatcher, matchProjects, type MatchRequest } from './index';
import type { MatchResponse } from './verdict';

const budget = { work: 40_000_000 };

type Edit = (request: MatchRequest) => MatchRequest;

const place = fc.nat({ max: 5 });
const editRow =
	(edit: (rows: MatchRequest['supplies']) => MatchRequest['supplies']): Edit =>
	(request) => ({
		...request,
		supplies: edit(request.supplies)
	});
const recounted = (at: number, by: number) =>
	editRow((rows) =>
		rows.map((row, i) =>
			i === at % rows.length && row.group === 'sheet' ? { ...row, sheets: Math.max(0, row.sheets + by) } : row
		)
	);
const anyEdit: fc.Arbitrary<Edit> = fc.oneof(
	fc.tuple(place, fc.constantFrom(-2, -1, 1, 2)).map(([at, by]) => recounted(at, by)),
	fc.tuple(anyRow, fc.uuid()).map(([row, key]) => editRow((rows) => [...rows, { ...row, key }])),
	place.map((at) =>
		editRow((rows) => (rows.length > 1 ? rows.filter((_, i) => i !== at % rows.length) : rows))
	),
	fc.tuple(anyBill, place).map(([bill, at]): Edit => (request) => ({
		...request,
		bills: request.bills.map((old, i) => (i === at % request.bills.length ? { ...bill, key: old.key } : old))
	}))
);

/** Enough for most bills, so that edits change what a plan costs and not only whether there is one. */
const plenty = [aSheet('large', { sheets: 9 }), aSheet('small', { w: inches(6), h: inches(6), sheets: 9 })];

/** Without prices the number of sheets is what a plan keeps down; two plans of one price may differ in it. */
const unpriced = ({ supplies, ...request }: MatchRequest): MatchRequest => ({
	...request,
	supplies: supplies.map((row) => ({ ...row, price: null }))
});

const told = ({ results }: MatchResponse) =>
	results.map(({ project, verdict, plan }) => [project, verdict, plan?.sheets.length, plan?.proof]);

describe('a matcher that remembers', () => {
	it('answers any sequence of edits as one that starts anew does', () => {
		fc.assert(
			fc.property(
				anyBills,
				anyStash,
				fc.array(anyEdit, { minLength: 1, maxLength: 5 }),
				(bills, rows, edits) => {
					const matcher = createMatcher();
					let request = unpriced(aRequest({ bills, supplies: [...rows, ...plenty] }));
					matcher.match(request, budget);
					for (const edit of edits) {
						request = unpriced(edit(request));
						expect(told(matcher.match(request, budget))).toEqual(told(matchProjects(request, budget)));
					}
				}
			),
			{ numRuns: 60 }
		);
	});

	it('keeps what a change cannot touch', () => {
		const supplies = [aSheet('fern', { sheets: 3 }), aSheet('card', { kind: 'cardstock', sheets: 5 })];
		const [one] = fc.sample(anyBill, { numRuns: 1, seed: 1 });
		const slots = one?.slots.map((slot) => ({ ...slot, sameAs: null, differentFrom: [] })) ?? [];
		const pieces = one?.pieces.slice(0, 1).map((piece) => ({ ...piece, w: inches(3), h: inches(3), qty: 1 }));
		const bills = one && pieces ? [{ ...one, slots, pieces }] : [];
		const matcher = createMatcher();
		const first = matcher.match(aRequest({ bills, supplies }), budget);
		expect(first).toMatchObject({ anew: 1, results: [{ verdict: 'now' }] });
		const fewer = (key: string) =>
			supplies.map((row) => (row.key === key ? { ...row, sheets: row.sheets - 1 } : row));
		expect(matcher.match(aRequest({ bills, supplies: fewer('card') }), budget).anew).toBe(0);
		expect(matcher.match(aRequest({ bills, supplies: fewer('fern') }), budget).anew).toBe(1);
	});
});
