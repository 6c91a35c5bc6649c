import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { INCH } from '../length';
import { MILLILITRE } from '../volume';
import { readDocument, readMatchRequest } from './read-document';
import { Unreadable, type Issue } from './unreadable';

/** The document that the exchange form is described by, as its author wrote it. */
const DESCRIBED = String.raw`
{
  "format": "paperlarder", "version": 1,
  "supplies": [
    { "key": "fern", "kind": "patterned-paper", "name": "Fern Lattice", "collection": "Hedge School",
      "size": "12 x 12 in", "sheets": 2, "count": "counted",            // or "unsure"
      "faces": [{ "design": "Fern Lattice", "direction": "one-way" },   // none | one-way | two-way
                { "design": "Oat", "direction": "none" }],
      "weight": "180 gsm",                                              // or "65 lb cover"
      "colours": ["#6d8a5f"], "price": { "amount": 95, "currency": "USD" },
      "barcode": "9520000000110", "bin": "Tray 3" },
    { "key": "oc1", "kind": "cardstock", "name": "Oat offcut", "size": "4 1/4 x 11 in", "sheets": 1, "offcut": true },
    { "key": "strip", "kind": "patterned-paper", "name": "Kite Row", "size": "12 x 12 1/4 in", "sheets": 1,
      "brandingStrip": { "edge": "bottom", "depth": "1/4 in" } },
    { "key": "qt", "kind": "tape", "name": "Quarter-inch tape", "width": "1/4 in", "left": "98 in", "full": "27 yd" },
    { "key": "rn", "kind": "runner", "name": "Tape runner", "left": "8 m" },
    { "key": "tr", "kind": "trimmer", "name": "Desk trimmer", "reach": "12 in", "cuts": ["paper"] },
    { "key": "sb", "kind": "scoring-board", "name": "Scoring board", "reach": "12 in", "grooves": "1/8 in" },
    { "key": "cp", "kind": "corner-punch", "name": "Wave corner", "shape": "wave", "borrowedUntil": "2027-05-10" },
    { "key": "kn", "kind": "craft-knife", "name": "Board knife", "lentUntil": "2027-05-12", "cuts": ["paper", "board"] },
    { "key": "kr", "kind": "cardstock", "name": "Kraft", "size": "8 1/2 x 11 in", "sheets": 25, "arrives": "2027-05-20" }
  ],
  "projects": [
    { "key": "tagbook", "name": "Tag book",
      "measures": { "tagW": "2 3/8 in" },                               // optional; pieces may use them
      "slots": [
        { "key": "cover", "material": { "kind": "patterned-paper" }, "designs": "one",
          "design": "Fern Lattice" },                                   // optional: the paper chosen for this slot
        { "key": "tags", "material": { "kind": "patterned-paper", "weight": { "min": "120 gsm" } },
          "designs": "one", "sameAs": "cover",                          // or "differentFrom": ["cover"]
          "swaps": [{ "kind": "cardstock" }] } ],
      "pieces": [
        { "key": "c", "slot": "cover", "w": "11 in", "h": "7 in", "qty": 1, "up": "h",   // h | w | none
          "scores": [{ "from": "left", "at": "5 1/2 in", "fold": "valley" }] },
        { "key": "t", "slot": "tags", "w": "=tagW", "h": "4 in", "qty": 6, "up": "h", "allowance": "1/16 in",
          "corners": [{ "at": ["top-left", "top-right"], "tool": "punch" }] } ],
      "adhesives": [{ "key": "rim", "kind": "tape", "width": "1/4 in", "need": "93 in",
                      "swaps": [{ "kind": "tape", "width": "1/8 in", "times": 2 }] }],
      "tools": [{ "key": "punch", "kind": "corner-punch", "shape": "wave", "swaps": [{ "kind": "corner-punch" }] },
                { "key": "trim", "kind": "trimmer", "reach": "11 in" }] } ]
}
`;
const FULL_BILL = {
	key: 'case',
	name: 'Cased book',
	units: 'in',
	measures: { boardH: '6', turnIn: '5/8 in', wrapH: '=boardH + 2*turnIn', spare: '1 in' },
	slots: [
		{ key: 'board', name: 'Board', material: { kind: 'chipboard', caliper: { min: '59 pt' } } },
		{
			key: 'cloth',
			material: { kind: 'book-cloth' },
			designs: 'mixed',
			differentFrom: ['board'],
			colour: '#204040'
		}
	],
	pieces: [
		{ key: 'b', slot: 'board', w: '4 in', h: '=boardH', qty: 2 },
		{
			key: 'w',
			slot: 'cloth',
			w: '=2*4 in + 1/4 in + 2*turnIn',
			h: '=wrapH',
			scores: [{ from: 'left', at: '1 in' }],
			edges: [{ at: ['top'], tool: 'lace' }],
			diagonals: [{ from: { x: '0', y: '1/2 in' }, to: { x: '1/2 in', y: '0' } }],
			wraps: { boards: ['b', 'b'], gaps: ['1/4 in'], turnIn: '=turnIn' },
			tape: { line: 'rim', edges: ['top', 'bottom'] }
		},
		{ key: 'l', slot: 'cloth', w: '4', h: '6', mount: { on: 'b', border: '0' } }
	],
	adhesives: [{ key: 'pva', kind: 'glue', need: '20 ml' }],
	extras: [{ key: 'm', kind: 'magnets', need: 4 }],
	tools: [{ key: 'lace', kind: 'edge-punch' }],
	steps: [{ text: 'Cover the boards.', tools: ['lace'], pieces: ['w'] }]
};

const ROOM = {
	bins: [{ key: 'tray-3', name: 'Tray 3' }],
	ledger: [
		{ key: 'm1', supply: 'fern', kind: 'bought', change: 2, at: '2027-05-01T10:00:00Z' },
		{
			key: 'm2',
			supply: 'qt',
			kind: 'cut',
			change: '-93 in',
			at: '2027-05-02T10:00:00.250Z',
			act: 'a1',
			by: 'Ines'
		},
		{ key: 'm3', supply: 'qt', kind: 'cut', change: '93 in', at: '2027-05-02T10:05:00Z', undoes: 'm2' }
	],
	order: [{ project: 'tagbook', copies: 3 }]
};

const described = () => JSON.parse(DESCRIBED.replace(/\s\/\/ ?.*$/gm, ''));

function issuesOf(read: () => unknown): readonly Issue[] {
	try {
		read();
	} catch (trouble) {
		if (trouble instanceof Unreadable) return trouble.issues;
		throw trouble;
	}
	return [];
}

describe('the exchange document', () => {
	it('reads as described', () => {
		const { supplies, bills } = readDocument(described(), 'in');
		expect(supplies.map(({ key }) => key).join(' ')).toBe('fern oc1 strip qt rn tr sb cp kn kr');
		expect(supplies[0]).toEqual({
			group: 'sheet',
			key: 'fern',
			kind: 'patterned-paper',
			name: 'Fern Lattice',
			collection: 'Hedge School',
			w: 97536,
			h: 97536,
			unit: 'in',
			sheets: 2,
			count: 'counted',
			faces: [
				{ design: 'Fern Lattice', direction: 'one-way' },
				{ design: 'Oat', direction: 'none' }
			],
			weight: { text: '180 gsm', gsm: 180 },
			caliper: null,
			colours: ['#6d8a5f'],
			offcut: false,
			strip: null,
			price: { amount: 95, currency: 'USD' },
			barcode: '9520000000110',
			bin: 'Tray 3',
			arrives: null
		});
		expect(supplies[3]).toMatchObject({
			group: 'consumable',
			width: 2032,
			left: 796544,
			full: 27 * 36 * INCH
		});
		expect(supplies[4]).toMatchObject({ left: 8 * 320_000, unit: 'm' });
		const [tagbook] = bills;
		expect(tagbook?.measures).toEqual({ tagW: 19304 });
		expect(tagbook?.unusedMeasures).toBeUndefined();
		expect(tagbook?.pieces[1]).toMatchObject({ w: 19304, h: 32512, qty: 6, up: 'h', allowance: 508 });
		expect(tagbook?.slots[0]).toMatchObject({ designs: 'one', design: 'Fern Lattice' });
		expect(tagbook?.adhesives[0]).toMatchObject({ need: 755904, swaps: [{ width: 1016, times: 2 }] });
	});

	it('reads from its text, and says where the text is no JSON', () => {
		expect(readDocument(JSON.stringify(described()), 'mm').bills).toHaveLength(1);
		expect(issuesOf(() => readDocument('{ "format":', 'in'))).toEqual([
			{ path: '', message: 'This isn’t JSON. An exchange document is exported as a .json file.' }
		]);
	});

	it('reads a bill with everything that one can say', () => {
		const [bill] = readDocument({ format: 'paperlarder', version: 1, projects: [FULL_BILL] }, 'in').bills;
		expect(bill).toMatchObject({
			measures: { boardH: 48768, turnIn: 5080, wrapH: 58928 },
			unusedMeasures: ['spare'],
			slots: [
				{ name: 'Board', material: { caliper: { min: 299720, max: null } }, colour: null },
				{ name: 'cloth', colour: '#204040', designs: 'mixed', differentFrom: ['board'] }
			],
			pieces: [
				{ qty: 2, up: 'none', allowance: 0, scores: [], mount: null, wraps: null, tape: null },
				{
					h: 58928,
					scores: [{ from: 'left', at: 8128, fold: 'none' }],
					edges: [{ at: ['top'], tool: 'lace' }],
					diagonals: [{ from: { x: 0, y: 4064 }, to: { x: 4064, y: 0 } }],
					wraps: { boards: ['b', 'b'], gaps: [2032], turnIn: 5080, along: 'w' },
					tape: { line: 'rim', edges: ['top', 'bottom'] }
				},
				{ mount: { on: 'b', border: 0 } }
			],
			adhesives: [{ need: 20 * MILLILITRE }],
			extras: [{ kind: 'magnets', need: 4 }],
			tools: [{ kind: 'edge-punch', name: 'lace' }],
			steps: [{ text: 'Cover the boards.', tools: ['lace'], pieces: ['w'] }]
		});
	});

	it('reads what a room’s export adds', () => {
		const read = readDocument({ ...described(), ...ROOM }, 'in');
		expect(read.bins).toEqual(ROOM.bins);
		expect(read.ledger).toMatchObject([
			{ change: 2 },
			{ change: -755904, act: 'a1', by: 'Ines' },
			{ change: 755904, undoes: 'm2' }
		]);
		expect(read.order).toEqual([{ project: 'tagbook', copies: 3 }]);
		expect(
			issuesOf(() =>
				readDocument(
					{
						...described(),
						ledger: [
							{
								key: 'm1',
								supply: 'gone',
								kind: 'cut',
								change: -1,
								at: '2027-05-01T10:00:00Z',
								undoes: 'm0'
							},
							{ key: 'm2', supply: 'fern', kind: 'cut', change: '-1 in', at: '2027-05-01T10:00:00Z' }
						],
						order: [{ project: 'tagbook' }, { project: 'tagbook' }, { project: 'gone' }]
					},
					'in'
				)
			).map(({ path }) => path)
		).toEqual([
			'ledger.0.undoes',
			'ledger.0.supply',
			'ledger.1.change',
			'order.1.project',
			'order.2.project'
		]);
	});
});

describe('a wrong document', () => {
	const wrong = (change: (document: ReturnType<typeof described>) => void) => {
		const document = described();
		change(document);
		return issuesOf(() => readDocument(document, 'in'));
	};

	it.each<[string, (document: ReturnType<typeof described>) => void, string]>([
		['a length that is none', (d) => (d.projects[0].pieces[1].w = '7..3'), 'projects.0.pieces.1.w'],
		['a length between lengths', (d) => (d.projects[0].pieces[0].h = '1/3 in'), 'projects.0.pieces.0.h'],
		['a formula over no measure', (d) => (d.projects[0].pieces[1].w = '=tagH'), 'projects.0.pieces.1.w'],
		['a formula where none is taken', (d) => (d.supplies[0].size = '=tagW'), 'supplies.0.size'],
		[
			'a measure used above it',
			(d) => (d.projects[0].measures = { a: '=b', b: '1 in', tagW: '1 in' }),
			'projects.0.measures.a'
		],
		['an unknown entry', (d) => (d.supplies[1].colour = 'oat'), 'supplies.1.colour'],
		['an entry of another kind', (d) => (d.supplies[4].sheets = 2), 'supplies.4.sheets'],
		['an unknown kind', (d) => (d.supplies[4].kind = 'unicorn'), 'supplies.4.kind'],
		['a key used twice', (d) => (d.supplies[4].key = 'fern'), 'supplies.4.key'],
		['a piece in no slot', (d) => (d.projects[0].pieces[0].slot = 'lid'), 'projects.0.pieces.0.slot'],
		[
			'a corner with no tool',
			(d) => (d.projects[0].pieces[1].corners[0].tool = 'lid'),
			'projects.0.pieces.1.corners.0.tool'
		],
		[
			'a mount on nothing',
			(d) => (d.projects[0].pieces[0].mount = { on: 'lid' }),
			'projects.0.pieces.0.mount.on'
		],
		[
			'a mount on itself',
			(d) => (d.projects[0].pieces[0].mount = { on: 'c' }),
			'projects.0.pieces.0.mount.on'
		],
		['a slot like nothing', (d) => (d.projects[0].slots[1].sameAs = 'lid'), 'projects.0.slots.1.sameAs'],
		[
			'a slot unlike nothing',
			(d) => (d.projects[0].slots[1].differentFrom = ['lid']),
			'projects.0.slots.1.differentFrom.0'
		],
		['a wrong check digit', (d) => (d.supplies[0].barcode = '9520000000111'), 'supplies.0.barcode'],
		['no name', (d) => delete d.supplies[2].name, 'supplies.2.name'],
		['half a sheet', (d) => (d.supplies[2].sheets = 0.5), 'supplies.2.sheets'],
		['a day that isn’t', (d) => (d.supplies[9].arrives = '2027-02-30'), 'supplies.9.arrives'],
		['another version', (d) => (d.version = 2), 'version'],
		['tape by the piece', (d) => (d.supplies[3].left = 3), 'supplies.3.left'],
		[
			'a strip as deep as its sheet',
			(d) => (d.supplies[2].brandingStrip.depth = '13 in'),
			'supplies.2.brandingStrip.depth'
		],
		[
			'swapping tape for a count',
			(d) => (d.projects[0].adhesives[0].swaps = [{ kind: 'brads' }]),
			'projects.0.adhesives.0.swaps.0.kind'
		],
		[
			'an allowance of the whole piece',
			(d) => (d.projects[0].pieces[0].allowance = '7 in'),
			'projects.0.pieces.0.allowance'
		],
		[
			'weights the wrong way round',
			(d) => (d.projects[0].slots[1].material.weight = { min: '200 gsm', max: '100 gsm' }),
			'projects.0.slots.1.material.weight'
		]
	])('%s is refused where it stands', (_, change, path) => {
		const issues = wrong(change);
		expect(issues.map((issue) => issue.path)).toEqual([path]);
		expect(issues[0]?.message).toMatch(/^[A-Z“].*\.$/);
		expect(issues[0]?.message).not.toMatch(/invalid|expected|undefined|zod/i);
	});

	it('names two slots that take their paper from each other', () => {
		const issues = wrong((d) => (d.projects[0].slots[0].sameAs = 'tags'));
		expect(issues.map(({ path }) => path)).toEqual([
			'projects.0.slots.0.sameAs',
			'projects.0.slots.1.sameAs'
		]);
	});

	it('says everything that is wrong at once, in one order', () => {
		const issues = wrong((d) => {
			d.projects[0].pieces[0].w = 'wide';
			d.supplies[3].width = '0 in';
			d.supplies[0].weight = 'heavy';
		});
		expect(issues.map(({ path }) => path)).toEqual([
			'supplies.0.weight',
			'supplies.3.width',
			'projects.0.pieces.0.w'
		]);
	});
});

describe('a hostile document', () => {
	it('can’t reach an object’s prototype', () => {
		const nested = JSON.parse('{"format":"paperlarder","version":1,"supplies":[{"__proto__":{"key":"x"}}]}');
		expect(issuesOf(() => readDocument(nested, 'in'))).toMatchObject([{ path: 'supplies.0.__proto__' }]);
		const measured = described();
		measured.projects[0].measures = JSON.parse('{"__proto__":"1 in","tagW":"2 in"}');
		expect(issuesOf(() => readDocument(measured, 'in'))).toMatchObject([
			{ path: 'projects.0.measures.__proto__' }
		]);
		for (const word of ['constructor', 'toString', 'hasOwnProperty']) {
			const keyed = described();
			keyed.projects[0].pieces[0].key = word;
			expect(issuesOf(() => readDocument(keyed, 'in'))).toMatchObject([{ path: 'projects.0.pieces.0.key' }]);
			const named = described();
			named.projects[0].measures = { [word]: '1 in', tagW: '2 in' };
			expect(issuesOf(() => readDocument(named, 'in'))).toMatchObject([
				{ path: `projects.0.measures.${word}` }
			]);
		}
		expect(({} as Record<string, unknown>)['key']).toBeUndefined();
	});

	it('is bounded in every string, list and number', () => {
		const supply = (change: object) => ({
			format: 'paperlarder',
			version: 1,
			supplies: [{ key: 'k', kind: 'cardstock', name: 'Kraft', size: '8 x 8 in', sheets: 1, ...change }]
		});
		const megabyte = 'x'.repeat(1_000_000);
		for (const change of [
			{ name: megabyte },
			{ key: megabyte },
			{ size: megabyte },
			{ [megabyte]: 1 },
			{ sheets: JSON.parse('1e309') },
			{ sheets: NaN },
			{ sheets: -1 },
			{ sheets: 2 ** 60 },
			{ price: { amount: 1e20, currency: 'USD' } },
			{ colours: Array.from({ length: 1000 }, () => '#000000') },
			{ size: `${'9'.repeat(40)} x 8 in` },
			{ name: 'Kraft\u0000' },
			{ name: '   ' }
		]) {
			const issues = issuesOf(() => readDocument(supply(change), 'in'));
			expect(issues.length).toBeGreaterThan(0);
			expect(JSON.stringify(issues).length).toBeLessThan(2000);
		}
		expect(issuesOf(() => readDocument(supply({}), 'in'))).toEqual([]);
	});

	it('is refused when it nests without end', () => {
		const deep = '['.repeat(100_000) + ']'.repeat(100_000);
		expect(
			issuesOf(() => readDocument(`{"format":"paperlarder","version":1,"supplies":${deep}}`, 'in'))
		).toHaveLength(1);
	});

	it('never throws anything but its issues', () => {
		fc.assert(
			fc.property(fc.json({ maxDepth: 6 }), (text) => {
				expect(issuesOf(() => readDocument(text, 'in')).length).toBeGreaterThan(0);
			})
		);
	});

	it('says no more than a hundred issues', () => {
		const supplies = Array.from({ length: 500 }, (_, n) => ({
			key: `k${n}`,
			kind: 'cardstock',
			name: 'Kraft',
			size: 'wide',
			sheets: 1
		}));
		expect(issuesOf(() => readDocument({ format: 'paperlarder', version: 1, supplies }, 'in'))).toHaveLength(
			100
		);
	});
});

describe('a match request', () => {
	const asked = () => ({ projects: described().projects, supplies: described().supplies });

	it('may leave out all but projects and supplies', () => {
		const request = readMatchRequest(asked(), '2027-05-11');
		expect(request).toMatchObject({
			mode: 'each',
			copies: {},
			on: '2027-05-11',
			budgetMs: 2000,
			options: { units: 'in', kerf: 0, reach: null, knife: false, keepOffcut: null }
		});
		expect(request.bills).toHaveLength(1);
		expect(request.supplies).toHaveLength(10);
	});

	it('reads its options in its own units', () => {
		const { options, on } = readMatchRequest(
			{
				...asked(),
				on: '2027-05-12',
				options: { units: 'cm', kerf: '0.1', reach: '30', keepOffcut: '1 in', knife: true }
			},
			'2027-05-11'
		);
		expect(options).toEqual({ units: 'cm', kerf: 320, reach: 96000, keepOffcut: 8128, knife: true });
		expect(on).toBe('2027-05-12');
	});

	it.each([
		['copies.lid', { copies: { lid: 2 } }],
		['copies.tagbook', { copies: { tagbook: 0 } }],
		['mode', { mode: 'all' }],
		['on', { on: 'today' }],
		['budgetMs', { budgetMs: 1e9 }],
		['options.kerf', { options: { kerf: '-1 mm' } }],
		['options.colour', { options: { colour: 'red' } }],
		['stash', { stash: [] }]
	])('is refused at %s', (path, change) => {
		expect(
			issuesOf(() => readMatchRequest({ ...asked(), ...change }, '2027-05-11')).map((issue) => issue.path)
		).toEqual([path]);
	});
});
