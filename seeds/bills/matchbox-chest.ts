import type { BillDocument } from '../../src/lib/domain/exchange/bill-schema';

/** Four drawers 2 × 3 × 1 in with sleeves ⅛ in looser, stacked 4½ in high and covered over top and sides. */
export const matchboxChest: BillDocument = {
	key: 'matchbox-chest',
	name: 'Matchbox chest',
	measures: { w: '2 in', d: '3 in', h: '1 in', ease: '1/8 in', tab: '1/2 in' },
	slots: [
		{
			key: 'drawers',
			name: 'Drawers',
			material: { kind: 'cardstock', weight: { min: '200 gsm' } },
			design: 'Oat',
			collection: 'Quiet Bench'
		},
		{ key: 'sleeves', name: 'Sleeves', material: { kind: 'cardstock' }, differentFrom: ['drawers'] },
		{
			key: 'cover',
			name: 'Chest cover',
			material: { kind: 'patterned-paper' },
			design: 'Stile Bone',
			collection: 'Hedge School'
		},
		{
			key: 'fronts',
			name: 'Drawer fronts',
			material: { kind: 'patterned-paper' },
			design: 'Thistle',
			collection: 'Hedge School',
			swaps: [{ kind: 'cardstock' }]
		}
	],
	pieces: [
		{
			key: 'drawer',
			slot: 'drawers',
			name: 'Drawer',
			w: '=w + 2 * h',
			h: '=d + 2 * h',
			qty: 4,
			scores: [
				{ from: 'left', at: '=h', fold: 'valley' },
				{ from: 'right', at: '=h', fold: 'valley' },
				{ from: 'top', at: '=h', fold: 'valley' },
				{ from: 'bottom', at: '=h', fold: 'valley' }
			]
		},
		{
			key: 'sleeve',
			slot: 'sleeves',
			name: 'Sleeve',
			w: '=2 * (w + h + 2 * ease) + tab',
			h: '=d',
			qty: 4,
			scores: [
				{ from: 'left', at: '=w + ease', fold: 'valley' },
				{ from: 'left', at: '=w + h + 2 * ease', fold: 'valley' },
				{ from: 'left', at: '=2 * w + h + 3 * ease', fold: 'valley' },
				{ from: 'left', at: '=2 * (w + h + 2 * ease)', fold: 'valley' }
			]
		},
		{
			key: 'cover',
			slot: 'cover',
			name: 'Chest cover',
			w: '=8 * (h + ease) + w + ease',
			h: '=d',
			qty: 1,
			up: 'h',
			scores: [
				{ from: 'left', at: '=4 * (h + ease)', fold: 'valley' },
				{ from: 'right', at: '=4 * (h + ease)', fold: 'valley' }
			]
		},
		{
			key: 'front',
			slot: 'fronts',
			name: 'Drawer front',
			w: '=w',
			h: '=h',
			qty: 4,
			up: 'h',
			mount: { on: 'drawer' }
		}
	],
	adhesives: [
		{
			key: 'tabs',
			name: 'Corner tabs and sleeves',
			kind: 'tape',
			width: '1/4 in',
			need: '44 in',
			swaps: [{ kind: 'tape', width: '1/8 in', times: 2 }]
		},
		{ key: 'stack', name: 'Stack and cover', kind: 'glue', need: '5 ml' }
	],
	tools: [
		{ key: 'trim', name: 'Trimmer', kind: 'trimmer', reach: '12 in' },
		{ key: 'score', name: 'Scoring board', kind: 'scoring-board', reach: '5 in', grooves: '1/8 in' },
		{ key: 'snip', name: 'Scissors', kind: 'scissors' },
		{ key: 'hole', name: 'Hole punch', kind: 'hole-punch' }
	],
	extras: [{ key: 'pulls', name: 'Drawer pulls', kind: 'brads', need: 4 }],
	steps: [
		{
			text: 'Cut and score drawers and sleeves; snip the drawers’ corner tabs.',
			tools: ['trim', 'score', 'snip'],
			pieces: ['drawer', 'sleeve']
		},
		{
			text: 'Tape the drawers’ corners; face each front, punch its middle and fit a brad.',
			tools: ['hole'],
			pieces: ['drawer', 'front']
		},
		{
			text: 'Tape each sleeve round a drawer so that it slides, then glue the four sleeves in a stack.',
			pieces: ['sleeve']
		},
		{ text: 'Fold the cover over top and both sides of the stack and glue it down.', pieces: ['cover'] }
	]
};
