import type { BillDocument } from '../../src/lib/domain/exchange/bill-schema';

/** A pair of cloth cases: 6 + ¼ + 1 + ¼ + 6 and two turn-ins of ¾ make 15 in, so each needs its own piece of cloth. */
export const guestBooks: BillDocument = {
	key: 'guest-books',
	name: 'Pair of guest books',
	measures: { boardW: '6 in', boardH: '9 in', spine: '1 in', gap: '1/4 in', turnIn: '3/4 in' },
	slots: [
		{ key: 'boards', name: 'Boards', material: { kind: 'chipboard' } },
		{ key: 'cloth', name: 'Case cloth', material: { kind: 'book-cloth' } },
		{
			key: 'ends',
			name: 'Endpapers',
			material: { kind: 'patterned-paper' },
			design: 'Seed Toss',
			collection: 'Hedge School'
		}
	],
	pieces: [
		{ key: 'board', slot: 'boards', name: 'Cover board', w: '=boardW', h: '=boardH', qty: 4 },
		{ key: 'spine', slot: 'boards', name: 'Spine board', w: '=spine', h: '=boardH', qty: 2 },
		{
			key: 'case',
			slot: 'cloth',
			name: 'Case cloth',
			w: '=2 * boardW + spine + 2 * gap + 2 * turnIn',
			h: '=boardH + 2 * turnIn',
			qty: 2,
			wraps: { boards: ['board', 'spine', 'board'], gaps: ['=gap', '=gap'], turnIn: '=turnIn', along: 'w' }
		},
		{
			key: 'end',
			slot: 'ends',
			name: 'Endpaper',
			w: '11 1/2 in',
			h: '8 3/4 in',
			qty: 2,
			up: 'h',
			scores: [{ from: 'left', at: '5 3/4 in', fold: 'valley' }]
		}
	],
	adhesives: [{ key: 'paste', name: 'Case glue', kind: 'glue', need: '60 ml' }],
	tools: [
		{ key: 'cutter', name: 'Guillotine', kind: 'guillotine-cutter', reach: '15 in', cuts: ['board'] },
		{ key: 'rule', name: 'Steel rule', kind: 'ruler', reach: '15 in' },
		{
			key: 'score',
			name: 'Scoring board',
			kind: 'scoring-board',
			reach: '8 3/4 in',
			swaps: [{ kind: 'bone-folder' }]
		},
		{ key: 'fold', name: 'Bone folder', kind: 'bone-folder' },
		{ key: 'brush', name: 'Glue brush', kind: 'brush' }
	],
	steps: [
		{
			text: 'Cut the boards one at a time in the guillotine, and the cloth with its grain along the spine.',
			tools: ['cutter', 'rule'],
			pieces: ['board', 'spine', 'case']
		},
		{
			text: 'Glue boards and spine to the cloth, mitre, turn in and burnish; leave under weights overnight.',
			tools: ['brush', 'fold'],
			pieces: ['board', 'spine', 'case']
		},
		{
			text: 'Score the endpapers down the middle and paste one into each case.',
			tools: ['score', 'brush'],
			pieces: ['end']
		}
	]
};
