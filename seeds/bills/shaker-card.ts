import type { BillDocument } from '../../src/lib/domain/exchange/bill-schema';

/** Two cards with a window that rattles: a well of foam tape between two layers. */
export const shakerCards: BillDocument = {
	key: 'shaker-cards',
	name: 'Bath-time shaker cards',
	measures: { cardW: '4 1/4 in', cardH: '5 1/2 in', border: '1/4 in' },
	slots: [
		{
			key: 'base',
			name: 'Card base',
			material: { kind: 'cardstock' },
			design: 'Rope',
			collection: 'Quiet Bench'
		},
		{
			key: 'frame',
			name: 'Frame',
			material: { kind: 'patterned-paper' },
			design: 'Still Bath',
			collection: 'Damson Hour'
		},
		{
			key: 'back',
			name: 'Well back',
			material: { kind: 'cardstock' },
			differentFrom: ['base'],
			colour: '#f0cfc4'
		},
		{ key: 'window', name: 'Window', material: { kind: 'acetate' } }
	],
	pieces: [
		{
			key: 'base',
			slot: 'base',
			name: 'Base',
			w: '=2 * cardW',
			h: '=cardH',
			qty: 2,
			scores: [{ from: 'left', at: '=cardW', fold: 'valley' }]
		},
		{
			key: 'frame',
			slot: 'frame',
			name: 'Frame',
			w: '=cardW - 2 * border',
			h: '=cardH - 2 * border',
			qty: 2,
			up: 'h'
		},
		{
			key: 'back',
			slot: 'back',
			name: 'Well back',
			w: '=cardW - 2 * border',
			h: '=cardH - 2 * border',
			qty: 2
		},
		{
			key: 'window',
			slot: 'window',
			name: 'Window',
			w: '3 1/2 in',
			h: '4 3/4 in',
			qty: 2,
			mount: { on: 'frame', border: '1/8 in' }
		}
	],
	adhesives: [
		{
			key: 'well',
			name: 'Well wall',
			kind: 'foam-tape',
			width: '1/4 in',
			need: '66 in'
		},
		{ key: 'window', name: 'Window rim', kind: 'tape', width: '1/8 in', need: '33 in' }
	],
	tools: [
		{ key: 'trim', name: 'Trimmer', kind: 'trimmer', reach: '8 1/2 in' },
		{
			key: 'score',
			name: 'Scoring board',
			kind: 'scoring-board',
			reach: '5 1/2 in',
			swaps: [{ kind: 'bone-folder' }]
		},
		{ key: 'crank', name: 'Die cutter', kind: 'die-cutter' },
		{ key: 'oval', name: 'Oval die', kind: 'die', shape: 'oval' }
	],
	extras: [{ key: 'pearls', name: 'Half pearls to rattle', kind: 'embellishments', need: 30 }],
	steps: [
		{
			text: 'Cut all layers and score the bases; die-cut an oval out of the middle of each frame.',
			tools: ['trim', 'score', 'crank', 'oval'],
			pieces: ['base', 'frame', 'back', 'window']
		},
		{
			text: 'Tape the window behind the frame; run foam tape round its edge twice, leaving no gap.',
			pieces: ['window', 'frame']
		},
		{
			text: 'Tip in fifteen half pearls, close with the well back, and mount on the base. Small parts: not for children under three.',
			pieces: ['back']
		}
	]
};
