import type { BillDocument } from '../../src/lib/domain/exchange/bill-schema';

/** Two stapled A5 notebooks of A4 sheets folded once. */
export const notebooks: BillDocument = {
	key: 'notebooks',
	name: 'Two A5 notebooks',
	measures: { openW: '297 mm', openH: '210 mm' },
	slots: [
		{
			key: 'cover',
			name: 'Cover',
			material: { kind: 'cardstock', weight: { min: '200 gsm' } },
			design: 'Terracotta',
			collection: 'Quiet Bench'
		},
		{ key: 'pages', name: 'Pages', material: { kind: 'plain-paper' } },
		{
			key: 'label',
			name: 'Label',
			material: { kind: 'patterned-paper' },
			design: 'Glaze Tile',
			collection: 'Kiln Shelf'
		}
	],
	pieces: [
		{
			key: 'cover',
			slot: 'cover',
			name: 'Cover',
			w: '=openW',
			h: '=openH',
			qty: 2,
			scores: [{ from: 'left', at: '=openW / 2', fold: 'valley' }]
		},
		{
			key: 'page',
			slot: 'pages',
			name: 'Page',
			w: '=openW',
			h: '=openH',
			qty: 24,
			scores: [{ from: 'left', at: '=openW / 2', fold: 'valley' }]
		},
		{ key: 'label', slot: 'label', name: 'Label', w: '90 mm', h: '60 mm', qty: 2, up: 'h' }
	],
	adhesives: [{ key: 'labels', name: 'Labels', kind: 'glue-stick', need: 1 }],
	tools: [
		{ key: 'trim', name: 'Trimmer', kind: 'trimmer', reach: '210 mm' },
		{ key: 'fold', name: 'Bone folder', kind: 'bone-folder' },
		{ key: 'staple', name: 'Long-arm stapler', kind: 'stapler', reach: '148.5 mm' },
		{ key: 'score', name: 'Scoring tool', kind: 'scoring-tool' },
		{ key: 'rule', name: 'Ruler', kind: 'ruler' }
	],
	steps: [
		{
			text: 'Score the covers and pages across the middle and fold them; nest twelve pages in each cover.',
			tools: ['score', 'rule', 'fold'],
			pieces: ['cover', 'page']
		},
		{
			text: 'Staple twice on the fold, from the outside, and trim the fore-edge level if the pages creep.',
			tools: ['staple', 'trim']
		},
		{ text: 'Glue a label to each front.', pieces: ['label'] }
	]
};
