import type { BillDocument } from '../../src/lib/domain/exchange/bill-schema';

/** Eight bookmarks out of what is left over. */
export const bookmarks: BillDocument = {
	key: 'bookmarks',
	name: 'Offcut bookmarks',
	measures: { w: '2 in', h: '6 1/2 in', border: '1/8 in' },
	slots: [
		{ key: 'face', name: 'Faces', material: { kind: 'patterned-paper' }, designs: 'mixed' },
		{ key: 'back', name: 'Backs', material: { kind: 'cardstock' }, designs: 'mixed' }
	],
	pieces: [
		{ key: 'back', slot: 'back', name: 'Back', w: '=w + 2 * border', h: '=h + 2 * border', qty: 8 },
		{
			key: 'face',
			slot: 'face',
			name: 'Face',
			w: '=w',
			h: '=h',
			qty: 8,
			up: 'h',
			allowance: '1/8 in',
			mount: { on: 'back', border: '=border' }
		}
	],
	adhesives: [{ key: 'stick', name: 'Faces to backs', kind: 'runner', need: '136 in' }],
	tools: [
		{ key: 'trim', name: 'Trimmer', kind: 'trimmer' },
		{ key: 'hole', name: 'Hole punch', kind: 'hole-punch', size: '1/8 in' },
		{ key: 'set', name: 'Eyelet setter', kind: 'eyelet-setter' }
	],
	extras: [
		{ key: 'eyelets', name: 'Eyelets', kind: 'eyelets', need: 8 },
		{ key: 'tail', name: 'Twine tails', kind: 'twine', need: '64 in' }
	],
	steps: [
		{ text: 'Cut backs and faces and stick a face to each back.', tools: ['trim'], pieces: ['face', 'back'] },
		{
			text: 'Punch the top, set an eyelet and knot eight inches of twine through it.',
			tools: ['hole', 'set']
		}
	]
};
