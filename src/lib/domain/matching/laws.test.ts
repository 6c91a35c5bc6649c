import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { aBill, aPiece, aRequest, aSheet, aSlot, inches } from '../../../../tests/factories/stash';
import type { Bill } from '../bill/bill';
import type { SheetSupply } from '../stash';
import { matchProjects, type MatchRequest } from './index';
import { isWorse } from './slot-lines';
import type { ProjectResult } from './verdict';

const designs = fc.constantFrom('Fern', 'Oat', 'Kite');
const side = fc.integer({ min: 2, max: 12 });
const row = fc
	.record({
		w: side,
		h: side,
		sheets: fc.integer({ min: 1, max: 3 }),
		count: fc.constantFrom('counted', 'counted', 'unsure'),
		faces: fc.array(fc.record({ design: designs, direction: fc.constantFrom('none', 'one-way') }), {
			maxLength: 2
		}),
		name: designs,
		offcut: fc.boolean(),
		arrives: fc.constantFrom(null, null, '2027-06-01')
	})
	.map(({ w, h, ...some }) => aSheet('', { ...(some as Partial<SheetSupply>), w: inches(w), h: inches(h) }));
const stash = fc
	.array(row, { minLength: 1, maxLength: 4 })
	.map((rows) => rows.map((one, i) => ({ ...one, key: `row-${i}` })));
const bill = fc
	.record({
		second: fc.constantFrom<object>({}, { sameAs: 'a' }, { differentFrom: ['a'] }, { designs: 'mixed' }),
		pieces: fc.array(
			fc.record({
				slot: fc.constantFrom('a', 'b'),
				w: side,
				h: side,
				qty: fc.integer({ min: 1, max: 3 }),
				up: fc.constantFrom('h', 'w', 'none')
			}),
			{ minLength: 1, maxLength: 3 }
		)
	})
	.map(({ second, pieces }) =>
		aBill('project', {
			slots: [aSlot('a'), aSlot('b', second)],
			pieces: pieces.map(({ slot, w, h, qty, up }, i) => aPiece(`p${i}`, slot, w, h, { qty, up: up as 'h' }))
		})
	);

function match(
	one: Bill,
	supplies: MatchRequest['supplies'],
	some: Partial<MatchRequest> = {}
): ProjectResult {
	const { results } = matchProjects(aRequest({ bills: [one], supplies, ...some }), { work: 50_000_000 });
	return results[0] as ProjectResult;
}

const sheetsOf = ({ plan }: ProjectResult) => plan?.sheets.length ?? 0;
const countsOf = ({ verdict, plan }: ProjectResult) => [verdict, plan?.proof, plan?.sheets.length];
const runs = { numRuns: 60 };

describe('matching', () => {
	it('lays every piece once, inside, apart, the print’s way up, from sheets that are there', () => {
		fc.assert(
			fc.property(bill, stash, (one, rows) => {
				const result = match(one, rows);
				const placed = (result.plan?.sheets ?? []).flatMap((sheet) =>
					sheet.placements.map((at) => ({ sheet, at }))
				);
				for (const { sheet, at } of placed) {
					const [piece, supply] = [
						one.pieces.find(({ key }) => key === at.piece),
						rows.find(({ key }) => key === sheet.supply)
					];
					if (!piece || !supply) throw new Error('a placement names nothing');
					expect([at.w, at.h]).toEqual(at.turned ? [piece.h, piece.w] : [piece.w, piece.h]);
					expect(at.x + at.w <= supply.w && at.y + at.h <= supply.h && sheet.nth <= supply.sheets).toBe(true);
					const face = supply.faces[at.face === 'A' ? 0 : 1];
					expect(face !== undefined || supply.faces.length === 0).toBe(true);
					if (face && face.direction !== 'none' && piece.up !== 'none' && piece.w !== piece.h)
						expect(at.turned).toBe(piece.up === 'w');
					const others = sheet.placements.filter((other) => other !== at);
					expect(
						others.every(
							(b) => at.x + at.w <= b.x || b.x + b.w <= at.x || at.y + at.h <= b.y || b.y + b.h <= at.y
						)
					).toBe(true);
				}
				expect(new Set(result.plan?.sheets.map(({ supply, nth }) => `${supply} ${nth}`)).size).toBe(
					sheetsOf(result)
				);
				if (result.verdict === 'short') return;
				for (const { key, qty } of one.pieces)
					expect(placed.filter(({ at }) => at.piece === key)).toHaveLength(qty);
			}),
			runs
		);
	});

	it('never does worse with more in the stash, nor with fewer pieces', () => {
		fc.assert(
			fc.property(bill, stash, row, (one, rows, more) => {
				const { verdict } = match(one, rows);
				expect(isWorse(match(one, [...rows, { ...more, key: 'more' }]).verdict, verdict)).toBe(false);
				expect(isWorse(match({ ...one, pieces: one.pieces.slice(1) }, rows).verdict, verdict)).toBe(false);
			}),
			runs
		);
	});

	it('says short exactly where it lacks something', () => {
		fc.assert(
			fc.property(bill, stash, (one, rows) => {
				const { verdict, short } = match(one, rows);
				expect(verdict === 'short').toBe(short.length > 0);
				for (const lack of short)
					expect('sheets' in lack && lack.sheets.every(({ count }) => count > 0)).toBe(true);
			}),
			runs
		);
	});

	it('changes nothing but names where keys are renamed', () => {
		fc.assert(
			fc.property(bill, stash, (one, rows) => {
				const renamed = match(
					one,
					rows.map((supply) => ({ ...supply, key: `x${supply.key}` }))
				);
				const text = JSON.stringify(renamed).replaceAll('xrow-', 'row-');
				expect(JSON.parse(text)).toEqual(JSON.parse(JSON.stringify(match(one, rows))));
			}),
			runs
		);
	});

	it('keeps verdict, number of sheets and proof where pieces and rows stand in another order', () => {
		fc.assert(
			fc.property(bill, stash, (one, rows) => {
				const forward = match(one, rows);
				fc.pre(forward.verdict !== 'short');
				const backward = match({ ...one, pieces: [...one.pieces].reverse() }, [...rows].reverse());
				expect(countsOf(backward)).toEqual(countsOf(forward));
			}),
			runs
		);
	});

	it('plans the same for a user in inches and in millimetres', () => {
		fc.assert(
			fc.property(bill, stash, (one, rows) => {
				const metric = { units: 'mm' as const, kerf: 0, reach: null, knife: false, keepOffcut: null };
				expect(match(one, rows, { options: metric }).plan).toEqual(match(one, rows).plan);
			}),
			runs
		);
	});

	it('opens at least as many sheets for a copy more', () => {
		fc.assert(
			fc.property(bill, stash, fc.integer({ min: 1, max: 2 }), (one, rows, copies) => {
				const whole = rows.map((supply) => ({ ...supply, offcut: false, sheets: 4 }));
				const [fewer, more] = [copies, copies + 1].map((n) => match(one, whole, { copies: { project: n } }));
				if (!fewer || !more || more.verdict !== fewer.verdict || more.verdict === 'short') return;
				if (fewer.plan?.proof === 'minimum') expect(sheetsOf(more)).toBeGreaterThanOrEqual(sheetsOf(fewer));
			}),
			runs
		);
	});

	it('promises no sheet twice in a queue and is there as good for the first as alone', () => {
		fc.assert(
			fc.property(bill, bill, stash, (one, two, rows) => {
				const bills = [one, { ...two, key: 'second' }];
				const { results } = matchProjects(aRequest({ bills, supplies: rows, mode: 'queue' }), {
					work: 50_000_000
				});
				expect(results[0]?.verdict).toBe(match(one, rows).verdict);
				if (results.some(({ verdict }) => verdict === 'short')) return;
				const opened = new Map<string, string>();
				for (const sheet of results.flatMap(({ plan }) => plan?.sheets ?? [])) {
					const name = `${sheet.supply} ${sheet.nth}`;
					expect(opened.get(name) ?? JSON.stringify(sheet)).toBe(JSON.stringify(sheet));
					opened.set(name, JSON.stringify(sheet));
				}
				for (const { key, sheets } of rows)
					expect([...opened.keys()].filter((name) => name.startsWith(`${key} `)).length <= sheets).toBe(true);
			}),
			{ numRuns: 30 }
		);
	});
});
