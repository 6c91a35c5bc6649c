import type { BillDocument } from '../../src/lib/domain/exchange/bill-schema';

/** Two strips of six 2 × 5 panels, joined by gluing one panel over another: eleven panels between wrapped covers. */
export const accordion: BillDocument = {
	key: 'accordion',
	name: 'Moth accordion',
	measures: {
		panelW: '2 in',
		panelH: '5 in',
		coverW: '2 1/4 in',
		coverH: '5 1/4 in',
		turnIn: '3/4 in',
		border: '1/8 in'
	},
	slots: [
		{
			key: 'strips',
			name: 'Folded strips',
			material: { kind: 'cardstock' },
			design: 'Night',
			collection: 'Quiet Bench'
		},
		{
			key: 'stiffener',
			name: 'Cover stiffeners',
			material: { kind: 'cardstock', weight: { min: '200 gsm' } },
			differentFrom: ['strips']
		},
		{
			key: 'wrap',
			name: 'Cover wraps',
			material: { kind: 'patterned-paper' },
			design: 'Night Moth',
			collection: 'Moth Atlas'
		},
		{
			key: 'faces',
			name: 'Panel faces',
			material: { kind: 'patterned-paper' },
			designs: 'mixed',
			differentFrom: ['wrap']
		}
	],
	pieces: [
		{
			key: 'strip',
			slot: 'strips',
			name: 'Strip',
			w: '=6 * panelW',
			h: '=panelH',
			qty: 2,
			scores: [
				{ from: 'left', at: '=panelW', fold: 'valley' },
				{ from: 'left', at: '=2 * panelW', fold: 'mountain' },
				{ from: 'left', at: '=3 * panelW', fold: 'valley' },
				{ from: 'left', at: '=4 * panelW', fold: 'mountain' },
				{ from: 'left', at: '=5 * panelW', fold: 'valley' }
			]
		},
		{ key: 'stiffener', slot: 'stiffener', name: 'Stiffener', w: '=coverW', h: '=coverH', qty: 2 },
		{
			key: 'wrap',
			slot: 'wrap',
			name: 'Cover wrap',
			w: '=coverW + 2 * turnIn',
			h: '=coverH + 2 * turnIn',
			qty: 2,
			up: 'h',
			wraps: { boards: ['stiffener'], turnIn: '=turnIn', along: 'w' }
		},
		{
			key: 'face',
			slot: 'faces',
			name: 'Panel face',
			w: '=panelW - 2 * border',
			h: '=panelH - 2 * border',
			qty: 9,
			up: 'h'
		}
	],
	adhesives: [
		{ key: 'wraps', name: 'Wraps and join', kind: 'glue', need: '6 ml' },
		{ key: 'faces', name: 'Panel faces', kind: 'runner', need: '2.5 m' }
	],
	tools: [
		{ key: 'trim', name: 'Trimmer', kind: 'trimmer', reach: '12 in' },
		{ key: 'score', name: 'Scoring board', kind: 'scoring-board', reach: '5 in' },
		{ key: 'fold', name: 'Bone folder', kind: 'bone-folder' }
	],
	extras: [{ key: 'tie', name: 'Ribbon tie', kind: 'ribbon', width: '1/4 in', need: '16 in' }],
	steps: [
		{
			text: 'Cut both strips and score them every two inches; fold valley and mountain by turns.',
			tools: ['trim', 'score', 'fold'],
			pieces: ['strip']
		},
		{ text: 'Glue the last panel of one strip over the first of the other.', pieces: ['strip'] },
		{
			text: 'Wrap the stiffeners: mitre the corners, turn in the long edges, then the short ones.',
			tools: ['fold'],
			pieces: ['stiffener', 'wrap']
		},
		{
			text: 'Face the nine panels between the covers, lay the ribbon across the back and glue a cover to each end.',
			pieces: ['face']
		}
	]
};
