import type { BillDocument } from '../../src/lib/domain/exchange/bill-schema';

/** Two boards and a spine wrapped in one sheet: 4½ + ¼ + ¾ + ¼ + 4½ and two turn-ins of ¾ make 11¾ in. */
export const pocketBook: BillDocument = {
	key: 'pocket-book',
	name: 'Satchel pocket book',
	measures: { boardW: '4 1/2 in', boardH: '8 1/2 in', spine: '3/4 in', gap: '1/4 in', turnIn: '3/4 in' },
	slots: [
		{
			key: 'boards',
			name: 'Boards',
			material: { kind: 'chipboard', caliper: { min: '1.8 mm', max: '2.2 mm' } }
		},
		{
			key: 'wrap',
			name: 'Case wrap',
			material: { kind: 'patterned-paper', weight: { min: '120 gsm', max: '200 gsm' } },
			design: 'Satchel Plaid',
			collection: 'Hedge School',
			swaps: [{ kind: 'book-cloth' }]
		},
		{
			key: 'liner',
			name: 'Liner',
			material: { kind: 'patterned-paper' },
			differentFrom: ['wrap'],
			colour: '#9db08a'
		},
		{ key: 'pockets', name: 'Pockets', material: { kind: 'cardstock' }, colour: '#7b3f55' }
	],
	pieces: [
		{ key: 'board', slot: 'boards', name: 'Cover board', w: '=boardW', h: '=boardH', qty: 2 },
		{ key: 'spine', slot: 'boards', name: 'Spine board', w: '=spine', h: '=boardH', qty: 1 },
		{
			key: 'wrap',
			slot: 'wrap',
			name: 'Case wrap',
			w: '=2 * boardW + spine + 2 * gap + 2 * turnIn',
			h: '=boardH + 2 * turnIn',
			qty: 1,
			up: 'h',
			wraps: { boards: ['board', 'spine', 'board'], gaps: ['=gap', '=gap'], turnIn: '=turnIn', along: 'w' }
		},
		{ key: 'liner', slot: 'liner', name: 'Liner', w: '9 3/4 in', h: '8 1/4 in', qty: 1, up: 'h' },
		{
			key: 'pocket',
			slot: 'pockets',
			name: 'Pocket',
			w: '5 1/4 in',
			h: '5 1/2 in',
			qty: 2,
			scores: [
				{ from: 'left', at: '1/2 in', fold: 'valley' },
				{ from: 'right', at: '1/2 in', fold: 'valley' },
				{ from: 'bottom', at: '1/2 in', fold: 'valley' }
			]
		}
	],
	adhesives: [
		{ key: 'case', name: 'Boards to wrap', kind: 'glue', need: '15 ml' },
		{
			key: 'pockets',
			name: 'Pocket flaps',
			kind: 'tape',
			width: '1/4 in',
			need: '32 in',
			swaps: [{ kind: 'tape', width: '1/8 in', times: 2 }]
		}
	],
	tools: [
		{ key: 'knife', name: 'Board knife', kind: 'craft-knife', cuts: ['board'], swaps: [] },
		{ key: 'rule', name: 'Steel rule', kind: 'ruler', reach: '9 in' },
		{ key: 'mat', name: 'Cutting mat', kind: 'cutting-mat' },
		{ key: 'trim', name: 'Trimmer', kind: 'trimmer', reach: '12 in' },
		{ key: 'score', name: 'Scoring board', kind: 'scoring-board', reach: '5 1/2 in' },
		{ key: 'fold', name: 'Bone folder', kind: 'bone-folder' },
		{ key: 'brush', name: 'Glue brush', kind: 'brush' }
	],
	extras: [{ key: 'elastic', name: 'Closing elastic', kind: 'elastic', width: '1/4 in', need: '18 in' }],
	steps: [
		{
			text: 'Cut the boards in several light passes against the rule, never one heavy one.',
			tools: ['knife', 'rule', 'mat'],
			pieces: ['board', 'spine']
		},
		{
			text: 'Cut wrap, liner and pockets; score the pockets half an inch in on three sides.',
			tools: ['trim', 'score'],
			pieces: ['wrap', 'liner', 'pocket']
		},
		{
			text: 'Glue the boards to the back of the wrap, spine in the middle and a quarter-inch hinge gap on each side of it.',
			tools: ['brush'],
			pieces: ['board', 'spine', 'wrap']
		},
		{
			text: 'Mitre the corners of the wrap, turn in the long edges, then the short ones, and burnish.',
			tools: ['fold'],
			pieces: ['wrap']
		},
		{
			text: 'Glue in the liner, working the gaps with the folder; fit a pocket inside each cover.',
			tools: ['fold'],
			pieces: ['liner', 'pocket']
		}
	]
};
