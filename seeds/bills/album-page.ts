import type { BillDocument } from '../../src/lib/domain/exchange/bill-schema';

/** A 12 × 12 page for two upright 4 × 6 photos, with a band, a title strip and a card to write on. */
export const albumPage: BillDocument = {
	key: 'album-page',
	name: 'Dinghy album page',
	measures: { photoW: '4 in', photoH: '6 in', border: '1/8 in' },
	slots: [
		{ key: 'page', name: 'Page', material: { kind: 'cardstock' }, design: 'Sea', collection: 'Quiet Bench' },
		{
			key: 'band',
			name: 'Band',
			material: { kind: 'patterned-paper' },
			design: 'Dinghy Fleet',
			collection: 'Salt Ledger'
		},
		{
			key: 'strip',
			name: 'Title strip',
			material: { kind: 'patterned-paper' },
			design: 'Long Swell',
			collection: 'Salt Ledger'
		},
		{
			key: 'mats',
			name: 'Photo mats',
			material: { kind: 'cardstock' },
			differentFrom: ['page'],
			colour: '#f6f3ea'
		}
	],
	pieces: [
		{ key: 'page', slot: 'page', name: 'Page', w: '12 in', h: '12 in', qty: 1 },
		{
			key: 'band',
			slot: 'band',
			name: 'Band',
			w: '12 in',
			h: '4 in',
			qty: 1,
			up: 'h',
			mount: { on: 'page' },
			tape: { line: 'wide', edges: ['top', 'bottom'] }
		},
		{
			key: 'strip',
			slot: 'strip',
			name: 'Title strip',
			w: '12 in',
			h: '1 1/2 in',
			qty: 1,
			up: 'h',
			mount: { on: 'page' },
			tape: { line: 'wide', edges: ['top', 'bottom'] }
		},
		{
			key: 'mat',
			slot: 'mats',
			name: 'Photo mat',
			w: '=photoW + 2 * border',
			h: '=photoH + 2 * border',
			qty: 2,
			mount: { on: 'page' },
			tape: { line: 'mats', edges: ['top', 'right', 'bottom', 'left'] }
		},
		{
			key: 'card',
			slot: 'mats',
			name: 'Writing card',
			w: '3 in',
			h: '4 in',
			qty: 1,
			mount: { on: 'page' },
			corners: [{ at: ['top-left', 'top-right', 'bottom-left', 'bottom-right'], tool: 'corner' }]
		}
	],
	adhesives: [
		{
			key: 'wide',
			name: 'Band and strip',
			kind: 'tape',
			width: '1/2 in',
			need: '48 in',
			swaps: [{ kind: 'tape', width: '1/4 in', times: 2 }]
		},
		{ key: 'mats', name: 'Photo mats', kind: 'tape', width: '1/8 in', need: '42 in' },
		{ key: 'photos', name: 'Photos and card', kind: 'runner', need: '56 in' }
	],
	tools: [
		{ key: 'trim', name: 'Trimmer', kind: 'trimmer', reach: '12 in' },
		{ key: 'corner', name: 'Round corner punch', kind: 'corner-punch', shape: 'round', size: '1/4 in' }
	],
	steps: [
		{
			text: 'Cut the band, strip, mats and card; round the card’s four corners.',
			tools: ['trim', 'corner'],
			pieces: ['band', 'strip', 'mat', 'card']
		},
		{
			text: 'Tape the band across the page two inches up from the bottom, and the strip along its top edge.',
			pieces: ['page', 'band', 'strip']
		},
		{ text: 'Mount the photos on their mats, then mats and card over the band.', pieces: ['mat', 'card'] }
	]
};
