import type { BillDocument } from '../../src/lib/domain/exchange/bill-schema';

/** A soft cover 5¼ + ½ + 5¼ in wide round five tags, held by two rings. */
export const tagBook: BillDocument = {
	key: 'tag-book',
	name: 'Hedgerow tag book',
	measures: { cover: '5 1/4 in', spine: '1/2 in', tagW: '4 3/4 in', tagH: '6 in', border: '1/8 in' },
	slots: [
		{
			key: 'cover',
			name: 'Cover',
			material: { kind: 'patterned-paper', weight: { min: '160 gsm' } },
			design: 'Fern Lattice',
			collection: 'Hedge School'
		},
		{
			key: 'tags',
			name: 'Tags',
			material: { kind: 'cardstock', weight: { min: '200 gsm' } },
			colour: '#e6d8bc'
		},
		{
			key: 'faces',
			name: 'Tag faces',
			material: { kind: 'patterned-paper' },
			designs: 'mixed',
			differentFrom: ['cover']
		},
		{ key: 'band', name: 'Title band', material: { kind: 'patterned-paper' }, sameAs: 'cover' }
	],
	pieces: [
		{
			key: 'cover',
			slot: 'cover',
			name: 'Cover',
			w: '=2 * cover + spine',
			h: '6 1/2 in',
			qty: 1,
			up: 'h',
			scores: [
				{ from: 'left', at: '=cover', fold: 'valley' },
				{ from: 'left', at: '=cover + spine', fold: 'valley' }
			]
		},
		{
			key: 'tag',
			slot: 'tags',
			name: 'Tag',
			w: '=tagW',
			h: '=tagH',
			qty: 5,
			corners: [{ at: ['top-left', 'top-right'], tool: 'corner' }]
		},
		{
			key: 'face',
			slot: 'faces',
			name: 'Tag face',
			w: '=tagW - 2 * border',
			h: '=tagH - 2 * border',
			qty: 5,
			up: 'h',
			mount: { on: 'tag', border: '=border' },
			tape: { line: 'faces', edges: ['top', 'right', 'bottom', 'left'] }
		},
		{ key: 'band', slot: 'band', name: 'Title band', w: '11 in', h: '1 1/2 in', qty: 1, up: 'h' }
	],
	adhesives: [{ key: 'faces', name: 'Behind the faces', kind: 'tape', width: '1/8 in', need: '102 1/2 in' }],
	tools: [
		{ key: 'trim', name: 'Trimmer', kind: 'trimmer', reach: '11 in' },
		{ key: 'score', name: 'Scoring board', kind: 'scoring-board', reach: '6 1/2 in' },
		{
			key: 'corner',
			name: 'Round corner punch',
			kind: 'corner-punch',
			shape: 'round',
			swaps: [{ kind: 'corner-punch' }]
		},
		{ key: 'hole', name: 'Hole punch', kind: 'hole-punch' }
	],
	extras: [{ key: 'rings', name: 'Book rings', kind: 'rings', need: 2 }],
	steps: [
		{
			text: 'Cut the cover and score both sides of its half-inch spine.',
			tools: ['trim', 'score'],
			pieces: ['cover']
		},
		{
			text: 'Cut the tags and their faces; round the two top corners of each tag.',
			tools: ['trim', 'corner'],
			pieces: ['tag', 'face']
		},
		{
			text: 'Tape the faces to the tags, then punch two holes down the left of cover and tags together.',
			tools: ['hole'],
			pieces: ['face', 'tag']
		},
		{ text: 'Wrap the band round the front cover and close the book with the rings.', pieces: ['band'] }
	]
};
