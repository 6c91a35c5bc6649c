import type { BillDocument } from '../../src/lib/domain/exchange/bill-schema';

/** Kraft bags 120 × 180 × 60 mm: round the bag 2 × (120 + 60) and a 15 mm tab; a 30 mm hem above, 45 mm base below. */
export const marketBags: BillDocument = {
	key: 'market-bags',
	name: 'Three market bags',
	measures: { wide: '120 mm', tall: '180 mm', deep: '60 mm', tab: '15 mm', hem: '30 mm', base: '45 mm' },
	slots: [
		{ key: 'bag', name: 'Bag', material: { kind: 'kraft-paper', weight: { min: '80 gsm', max: '100 gsm' } } },
		{
			key: 'label',
			name: 'Label',
			material: { kind: 'patterned-paper' },
			design: 'Bone Terrazzo',
			collection: 'Kiln Shelf'
		}
	],
	pieces: [
		{
			key: 'bag',
			slot: 'bag',
			name: 'Bag',
			w: '=2 * (wide + deep) + tab',
			h: '=hem + tall + base',
			qty: 3,
			scores: [
				{ from: 'left', at: '=wide', fold: 'valley' },
				{ from: 'left', at: '=wide + deep / 2', fold: 'mountain' },
				{ from: 'left', at: '=wide + deep', fold: 'valley' },
				{ from: 'left', at: '=2 * wide + deep', fold: 'valley' },
				{ from: 'left', at: '=2 * wide + deep * 3 / 2', fold: 'mountain' },
				{ from: 'left', at: '=2 * (wide + deep)', fold: 'valley' },
				{ from: 'top', at: '=hem', fold: 'valley' },
				{ from: 'bottom', at: '=base', fold: 'valley' }
			]
		},
		{
			key: 'label',
			slot: 'label',
			name: 'Label',
			w: '80 mm',
			h: '100 mm',
			qty: 3,
			up: 'h',
			mount: { on: 'bag' },
			corners: [{ at: ['top-left', 'top-right', 'bottom-left', 'bottom-right'], tool: 'corner' }]
		}
	],
	adhesives: [
		{
			key: 'seams',
			name: 'Side seam and base',
			kind: 'tape',
			width: '6 mm',
			need: '1.4 m',
			swaps: [{ kind: 'tape', width: '1/4 in', times: 1 }]
		},
		{ key: 'labels', name: 'Labels', kind: 'glue-stick', need: 1 }
	],
	tools: [
		{ key: 'knife', name: 'Knife', kind: 'craft-knife' },
		{ key: 'rule', name: 'Steel rule', kind: 'ruler', reach: '375 mm' },
		{ key: 'mat', name: 'Cutting mat', kind: 'cutting-mat' },
		{ key: 'score', name: 'Scoring tool', kind: 'scoring-tool' },
		{ key: 'corner', name: 'Corner punch', kind: 'corner-punch' },
		{ key: 'hole', name: 'Hole punch', kind: 'hole-punch' }
	],
	extras: [{ key: 'handles', name: 'Twine handles', kind: 'twine', need: '2.4 m' }],
	steps: [
		{
			text: 'Cut the bags with knife and rule; score the folds, the hem and the base.',
			tools: ['knife', 'rule', 'mat', 'score'],
			pieces: ['bag']
		},
		{ text: 'Fold the hem down, tape the side seam, then fold and tape the base.', pieces: ['bag'] },
		{
			text: 'Round the labels’ corners and glue one to each front; punch the hem and tie the handles.',
			tools: ['corner', 'hole'],
			pieces: ['label']
		}
	]
};
