import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { CAUTION_DEFERENCE, cautionsFor } from './caution';
import { readBill } from './exchange';
import { SUPPLY_MEASURES, TOOL_KINDS } from './stash';

const bill = (more: object) =>
	readBill(
		{
			key: 'box',
			name: 'Gift box',
			slots: [{ key: 'paper', material: { kind: 'cardstock' } }],
			pieces: [{ key: 'lid', slot: 'paper', w: '4 in', h: '4 in' }],
			tools: [{ key: 'trim', kind: 'trimmer' }],
			...more
		},
		'in'
	);
const linesById = (more: object, byKnife = false) =>
	Object.fromEntries(cautionsFor(bill(more), { byKnife }).map(({ id, lines }) => [id, lines]));

const consumable = fc.constantFrom(...Object.entries(SUPPLY_MEASURES)).map(([kind, measure]) => ({
	kind,
	need: { length: '1 m', volume: '10 ml', count: 3 }[measure]
}));
const keyed = (lines: object[]) => lines.map((line, index) => ({ key: `k${index}`, ...line }));
const anyBill = fc
	.record({
		tools: fc
			.array(
				fc.constantFrom(...TOOL_KINDS).map((kind) => ({ kind })),
				{ maxLength: 6 }
			)
			.map(keyed),
		adhesives: fc.array(consumable, { maxLength: 4 }).map(keyed),
		extras: fc.array(consumable, { maxLength: 4 }).map(keyed),
		steps: fc.array(
			fc.record({
				text: fc.constantFrom('Fold it.', 'Spray the back.', 'Set it with the heat gun.', 'Add a magnet.'),
				tools: fc.constantFrom([], ['k0'])
			}),
			{
				maxLength: 3
			}
		)
	})
	.map(bill);

describe('cautions', () => {
	it('are said once each, name lines of the bill, and put the maker first', () => {
		fc.assert(
			fc.property(anyBill, (any) => {
				const cautions = cautionsFor(any);
				expect(new Set(cautions.map(({ id }) => id)).size).toBe(cautions.length);
				const lines = new Set([
					...any.pieces.map(({ key }) => `pieces/${key}`),
					...any.tools.map(({ key }) => `tools/${key}`),
					...any.adhesives.map(({ key }) => `adhesives/${key}`),
					...any.extras.map(({ key }) => `extras/${key}`),
					...any.steps.map((_, index) => `steps/${index + 1}`)
				]);
				for (const caution of cautions) {
					expect(caution.lines.length).toBeGreaterThan(0);
					for (const line of caution.lines) expect(lines).toContain(line);
					expect(caution.text).toMatch(/maker/);
				}
			})
		);
	});

	it('about a blade are never missing where something is cut', () => {
		fc.assert(
			fc.property(anyBill, (any) => {
				expect(cautionsFor(any).some(({ id }) => id === 'trimmer' || id === 'knife')).toBe(true);
			})
		);
	});

	it('only grow with what a bill uses', () => {
		fc.assert(
			fc.property(anyBill, (any) => {
				const fewer = { ...any, extras: any.extras.slice(1), adhesives: any.adhesives.slice(1) };
				const all = new Set(cautionsFor(any).map(({ id }) => id));
				for (const { id } of cautionsFor(fewer)) expect(all).toContain(id);
			})
		);
	});

	it('use no signal word, which would grade the danger', () => {
		const everything = cautionsFor(
			bill({
				tools: keyed(TOOL_KINDS.map((kind) => ({ kind }))),
				extras: keyed(['magnets', 'brads'].map((kind) => ({ kind, need: 2 }))),
				adhesives: keyed(['glue', 'spray-adhesive'].map((kind) => ({ kind, need: '10 ml' })))
			})
		);
		expect(everything).toHaveLength(11);
		for (const { title, text } of everything)
			expect(`${title} ${text}`).not.toMatch(/\b(?:danger|warning|caution|notice)\b/i);
		expect(CAUTION_DEFERENCE).toMatch(/maker’s label.*local codes.*licensed practice/);
	});

	it('follow a tool into the steps that use it, and a step’s own words', () => {
		const steps = [
			{ text: 'Cut the boards.', tools: ['kn'] },
			{ text: 'Fold.' },
			{ text: 'Hot-glue the lid.' }
		];
		expect(linesById({ tools: [{ key: 'kn', kind: 'craft-knife' }], steps })).toEqual({
			knife: ['tools/kn', 'steps/1'],
			'hot-glue': ['steps/3']
		});
	});

	it('join heat and vapour where a bill uses both', () => {
		const more = {
			tools: [
				{ key: 'heat', kind: 'heat-tool' },
				{ key: 'trim', kind: 'trimmer' }
			],
			adhesives: [{ key: 'spray', kind: 'spray-adhesive', need: '20 ml' }]
		};
		expect(linesById(more)['heat-and-vapour']).toEqual(['tools/heat', 'adhesives/spray']);
		expect(linesById({ ...more, adhesives: [] })).not.toHaveProperty('heat-and-vapour');
	});

	it('cover a cut that only a knife makes, a swap, and a bill that lists no cutter', () => {
		expect(linesById({}, true)).toEqual({ trimmer: ['tools/trim'], knife: ['plan'] });
		expect(
			linesById({ tools: [{ key: 't', kind: 'trimmer', swaps: [{ kind: 'craft-knife' }] }] })['knife']
		).toEqual(['tools/t']);
		expect(linesById({ tools: [] })).toEqual({ trimmer: ['pieces/lid'], knife: ['pieces/lid'] });
	});
});
