import type { BillDocument } from '../../src/lib/domain/exchange/bill-schema';

/** Still being worked out: the mat is ⅛ in too wide for an even border, and the punch for the hole isn’t listed. */
export const parcelTags: BillDocument = {
	key: 'parcel-tags',
	name: 'Parcel tags (draft)',
	slots: [
		{ key: 'tag', name: 'Tag', material: { kind: 'cardstock' }, design: 'Chalk', collection: 'Quiet Bench' },
		{
			key: 'mat',
			name: 'Printed mat',
			material: { kind: 'patterned-paper' },
			design: 'Parcel Post',
			collection: 'Salt Ledger'
		},
		{ key: 'strip', name: 'Strip', material: { kind: 'metallic-paper' }, swaps: [{ kind: 'cardstock' }] }
	],
	pieces: [
		{ key: 'tag', slot: 'tag', name: 'Tag', w: '2 1/2 in', h: '4 1/2 in', qty: 6 },
		{
			key: 'mat',
			slot: 'mat',
			name: 'Mat',
			w: '2 3/8 in',
			h: '4 1/4 in',
			qty: 6,
			up: 'h',
			mount: { on: 'tag', border: '1/8 in' }
		},
		{
			key: 'strip',
			slot: 'strip',
			name: 'Strip',
			w: '2 in',
			h: '3/4 in',
			qty: 6,
			mount: { on: 'mat' },
			tape: { line: 'strips', edges: ['top', 'bottom'] }
		}
	],
	adhesives: [
		{ key: 'mats', name: 'Mats to tags', kind: 'runner', need: '78 in' },
		{ key: 'strips', name: 'Behind the strips', kind: 'tape', width: '1/8 in', need: '24 in' }
	],
	tools: [{ key: 'trim', name: 'Trimmer', kind: 'trimmer', reach: '12 in' }],
	extras: [{ key: 'ties', name: 'Twine ties', kind: 'twine', need: '60 in' }],
	steps: [
		{
			text: 'Cut and layer the tags, punch a hole at the top and tie on ten inches of twine.',
			tools: ['trim', 'hole'],
			pieces: ['tag', 'mat', 'strip']
		}
	]
};
