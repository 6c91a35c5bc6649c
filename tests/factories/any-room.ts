/** Small rooms for fast-check: stashes of a few rows and bills of a few pieces, in which much goes short or shares. */
import fc from 'fast-check';
import type { Bill } from '../../src/lib/domain/bill/bill';
import { DEFAULT_OPTIONS } from '../../src/lib/domain/matching';
import type { MatchOptions } from '../../src/lib/domain/matching/verdict';
import type { SheetSupply } from '../../src/lib/domain/stash';
import { aBill, aPiece, aSheet, aSlot, inches } from './stash';

const designs = fc.constantFrom('Fern', 'Oat', 'Kite');
const side = fc.integer({ min: 2, max: 12 });

export const anyRow: fc.Arbitrary<SheetSupply> = fc
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
		arrives: fc.constantFrom(null, null, '2027-06-01'),
		price: fc.constantFrom(null, { amount: 80, currency: 'USD' }, { amount: 120, currency: 'USD' }),
		strip: fc.constantFrom(
			null,
			null,
			null,
			{ edge: 'bottom', depth: inches(1 / 2) },
			{ edge: 'left', depth: inches(1 / 2) }
		)
	})
	.map(({ w, h, ...some }) => aSheet('', { ...(some as Partial<SheetSupply>), w: inches(w), h: inches(h) }));

export const anyStash: fc.Arbitrary<SheetSupply[]> = fc
	.array(anyRow, { minLength: 1, maxLength: 4 })
	.map((rows) => rows.map((one, i) => ({ ...one, key: `row-${i}` })));

export const anyBill: fc.Arbitrary<Bill> = fc
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

/** Two or three bills under keys of their own. */
export const anyBills: fc.Arbitrary<Bill[]> = fc
	.array(anyBill, { minLength: 2, maxLength: 3 })
	.map((bills) => bills.map((bill, i) => ({ ...bill, key: `project-${i}` })));

export const anyOptions: fc.Arbitrary<MatchOptions> = fc
	.record({
		kerf: fc.constantFrom(0, 0, 320, inches(1 / 8)),
		knife: fc.boolean(),
		reach: fc.constantFrom(null, inches(9)),
		keepOffcut: fc.constantFrom(null, inches(1))
	})
	.map((some) => ({ ...DEFAULT_OPTIONS, ...some }));
