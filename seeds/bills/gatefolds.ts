import type { BillDocument } from '../../src/lib/domain/exchange/bill-schema';

/** Two invitations 6 in square whose gates of 3 in meet in the middle: 3 + 6 + 3 make 12. */
export const gatefolds: BillDocument = {
	key: 'gatefolds',
	name: 'Harbour gatefolds',
	measures: { square: '6 in', border: '1/8 in' },
	slots: [
		{ key: 'base', name: 'Base', material: { kind: 'cardstock' }, design: 'Sea', collection: 'Quiet Bench' },
		{
			key: 'gates',
			name: 'Gate faces',
			material: { kind: 'patterned-paper' },
			design: 'Harbour Hand',
			collection: 'Salt Ledger'
		},
		{
			key: 'inside',
			name: 'Inside panel',
			material: { kind: 'patterned-paper' },
			design: 'Account Page',
			collection: 'Salt Ledger',
			swaps: [{ kind: 'cardstock' }]
		}
	],
	pieces: [
		{
			key: 'base',
			slot: 'base',
			name: 'Base',
			w: '=2 * square',
			h: '=square',
			qty: 2,
			scores: [
				{ from: 'left', at: '=square / 2', fold: 'valley' },
				{ from: 'right', at: '=square / 2', fold: 'valley' }
			]
		},
		{
			key: 'gate',
			slot: 'gates',
			name: 'Gate face',
			w: '=square / 2 - 2 * border',
			h: '=square - 2 * border',
			qty: 4,
			up: 'h',
			tape: { line: 'rims', edges: ['top', 'right', 'bottom', 'left'] }
		},
		{
			key: 'inside',
			slot: 'inside',
			name: 'Inside panel',
			w: '=square - 2 * border',
			h: '=square - 2 * border',
			qty: 2,
			up: 'h',
			tape: { line: 'rims', edges: ['top', 'right', 'bottom', 'left'] }
		}
	],
	adhesives: [{ key: 'rims', name: 'Rims', kind: 'tape', width: '1/8 in', need: '114 in' }],
	tools: [
		{ key: 'trim', name: 'Trimmer', kind: 'trimmer', reach: '12 in' },
		{ key: 'score', name: 'Scoring board', kind: 'scoring-board', reach: '6 in' },
		{ key: 'fold', name: 'Bone folder', kind: 'bone-folder' }
	],
	extras: [{ key: 'ties', name: 'Ribbon ties', kind: 'ribbon', width: '3/8 in', need: '40 in' }],
	steps: [
		{
			text: 'Cut the bases and score them three inches in from each end; fold the gates and burnish.',
			tools: ['trim', 'score', 'fold'],
			pieces: ['base']
		},
		{
			text: 'Tape a face to each gate and a panel inside; tie with twenty inches of ribbon.',
			tools: ['trim'],
			pieces: ['gate', 'inside']
		}
	]
};
