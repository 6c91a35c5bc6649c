import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { writeExact, type LengthUnit } from '../length';
import { SHEET_KINDS, TOOL_KINDS } from '../stash';
import { readSupply } from './read-supply';
import { writeSupply } from './write-supply';

const unit = fc.constantFrom<LengthUnit>('in', 'mm', 'cm');
const longUnit = fc.constantFrom<LengthUnit>('in', 'mm', 'cm', 'm', 'yd');
const length = fc.tuple(fc.integer({ min: 1, max: 10_000_000 }), unit).map(([n, u]) => writeExact(n, u));
const longLength = fc
	.tuple(fc.integer({ min: 1, max: 300_000_000 }), longUnit)
	.map(([n, u]) => writeExact(n, u));
const name = fc
	.string({ unit: 'grapheme', minLength: 1, maxLength: 20 })
	.filter((text) => /^(?=.*\S)\P{Cc}+$/u.test(text));
const day = fc
	.date({ min: new Date('2020-01-01'), max: new Date('2040-01-01'), noInvalidDate: true })
	.map((d) => d.toISOString().slice(0, 10));
const colour = fc.integer({ min: 0, max: 0xffffff }).map((n) => `#${n.toString(16).padStart(6, '0')}`);
const count = fc.constantFrom('counted', 'unsure');
const owned = {
	key: fc.stringMatching(/^[a-z][a-z0-9_-]{0,20}$/),
	name,
	collection: name,
	bin: name,
	barcode: fc.constantFrom('9520000000110', '9520000000127'),
	price: fc.record({ amount: fc.nat({ max: 100_000 }), currency: fc.constantFrom('USD', 'EUR') }),
	arrives: day
};
const optional = (required: string[]) => ({ requiredKeys: required as never[] });

const sheet = fc.record(
	{
		...owned,
		kind: fc.constantFrom(...SHEET_KINDS),
		size: fc
			.tuple(fc.integer({ min: 100_000, max: 1_000_000 }), fc.integer({ min: 100_000, max: 1_000_000 }), unit)
			.map(([w, h, u]) => `${writeExact(w, u)} x ${writeExact(h, u)}`),
		sheets: fc.nat({ max: 1000 }),
		count,
		faces: fc.array(fc.record({ design: name, direction: fc.constantFrom('none', 'one-way', 'two-way') }), {
			minLength: 1,
			maxLength: 2
		}),
		weight: fc.constantFrom('180 gsm', '65 lb cover', '110 lb index', '20 lb bond'),
		caliper: fc.constantFrom('20 pt', '0.5 mm', '1/16 in', '12.3 pt'),
		colours: fc.array(colour, { maxLength: 4 }),
		offcut: fc.boolean(),
		brandingStrip: fc.record({
			edge: fc.constantFrom('top', 'left', 'right', 'bottom'),
			depth: fc.tuple(fc.integer({ min: 1, max: 99_999 }), unit).map(([n, u]) => writeExact(n, u))
		})
	},
	optional(['key', 'name', 'kind', 'size', 'sheets'])
);
const roll = fc.record(
	{
		...owned,
		kind: fc.constantFrom('tape', 'runner', 'ribbon'),
		width: length,
		left: longLength,
		full: longLength,
		count
	},
	optional(['key', 'name', 'kind', 'left'])
);
const volume = fc
	.tuple(fc.integer({ min: 1, max: 500 }), fc.constantFrom('ml', 'fl oz', 'l'))
	.map(([n, u]) => `${n} ${u}`);
const liquid = fc.record(
	{ ...owned, kind: fc.constantFrom('glue', 'ink'), left: volume, full: volume, count },
	optional(['key', 'name', 'kind', 'left'])
);
const counted = fc.record(
	{
		...owned,
		kind: fc.constantFrom('magnets', 'brads'),
		left: fc.nat({ max: 500 }),
		full: fc.integer({ min: 1, max: 500 }),
		count
	},
	optional(['key', 'name', 'kind', 'left'])
);
const tool = fc.record(
	{
		...owned,
		kind: fc.constantFrom(...TOOL_KINDS),
		reach: length,
		grooves: length,
		shape: name,
		size: length,
		cuts: fc.uniqueArray(fc.constantFrom('paper', 'board')),
		lentUntil: day,
		borrowedUntil: day
	},
	optional(['key', 'name', 'kind'])
);
const supply = fc.oneof(sheet, roll, liquid, counted, tool);

describe('a supply', () => {
	it('comes back the same from what is written of it, whatever the reader’s own unit', () => {
		fc.assert(
			fc.property(supply, unit, unit, (document, first, second) => {
				const read = readSupply(document, first as 'in');
				expect(readSupply(JSON.parse(JSON.stringify(writeSupply(read))), second as 'in')).toEqual(read);
			}),
			{ numRuns: 500 }
		);
	});

	it('is written in the units that it was entered in', () => {
		const tape = {
			key: 'qt',
			kind: 'tape',
			name: 'Quarter-inch tape',
			width: '1/4 in',
			left: '98 in',
			full: '27 yd'
		};
		expect(writeSupply(readSupply(tape, 'cm'))).toEqual(tape);
		const paper = {
			key: 'k',
			kind: 'cardstock',
			name: 'Kite',
			size: '12 x 12 1/4 in',
			sheets: 1,
			brandingStrip: { edge: 'bottom', depth: '6 mm' }
		};
		expect(writeSupply(readSupply(paper, 'cm'))).toEqual(paper);
		const trimmer = { key: 'tr', kind: 'trimmer', name: 'Desk trimmer', reach: '30.5 cm', cuts: ['paper'] };
		expect(writeSupply(readSupply(trimmer, 'in'))).toEqual(trimmer);
		const bare = { key: 'g', kind: 'cardstock', name: 'Grey', size: '21 x 29,7', sheets: 3 };
		expect(writeSupply(readSupply(bare, 'cm'))).toMatchObject({ size: '21 x 29.7 cm' });
	});

	it('is written in what the ruler shows where nobody noted a unit', () => {
		const read = readSupply(
			{ key: 'p', kind: 'corner-punch', name: 'Wave', size: '1/2 in', reach: '3.2 mm' },
			'in'
		);
		expect(writeSupply({ ...read, entered: undefined })).toMatchObject({ size: '1/2 in', reach: '3.2 mm' });
	});

	it('keeps what is left of a roll exactly, where a cut leaves no whole unit', () => {
		const roll = readSupply({ key: 'r', kind: 'tape', name: 'Tape', left: '27 yd' }, 'in');
		const cut = { ...roll, left: 27 * 36 * 8128 - 93 * 8128 - 1 };
		expect(readSupply(writeSupply(cut as typeof roll), 'mm')).toEqual(cut);
	});
});
