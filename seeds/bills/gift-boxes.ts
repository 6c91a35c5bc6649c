import type { BillDocument } from '../../src/lib/domain/exchange/bill-schema';

/** Three lidded boxes: a tray 2¾ in square and 2 in deep; a lid ⅛ in wider and 1 in deep. */
export const giftBoxes: BillDocument = {
	key: 'gift-boxes',
	name: 'Night-sky gift boxes',
	measures: { inside: '2 3/4 in', deep: '2 in', lid: '1 in', ease: '1/8 in' },
	slots: [
		{
			key: 'box',
			name: 'Box and lid',
			material: { kind: 'cardstock', weight: { min: '200 gsm' } },
			design: 'Night',
			collection: 'Quiet Bench'
		},
		{
			key: 'top',
			name: 'Lid panel',
			material: { kind: 'patterned-paper' },
			design: 'Star Drift',
			collection: 'Moth Atlas',
			swaps: [{ kind: 'metallic-paper' }]
		}
	],
	pieces: [
		{
			key: 'tray',
			slot: 'box',
			name: 'Tray',
			w: '=inside + 2 * deep',
			h: '=inside + 2 * deep',
			qty: 3,
			scores: [
				{ from: 'left', at: '=deep', fold: 'valley' },
				{ from: 'right', at: '=deep', fold: 'valley' },
				{ from: 'top', at: '=deep', fold: 'valley' },
				{ from: 'bottom', at: '=deep', fold: 'valley' }
			]
		},
		{
			key: 'lid',
			slot: 'box',
			name: 'Lid',
			w: '=inside + ease + 2 * lid',
			h: '=inside + ease + 2 * lid',
			qty: 3,
			scores: [
				{ from: 'left', at: '=lid', fold: 'valley' },
				{ from: 'right', at: '=lid', fold: 'valley' },
				{ from: 'top', at: '=lid', fold: 'valley' },
				{ from: 'bottom', at: '=lid', fold: 'valley' }
			]
		},
		{
			key: 'top',
			slot: 'top',
			name: 'Lid panel',
			w: '=inside - ease',
			h: '=inside - ease',
			qty: 3,
			up: 'h',
			mount: { on: 'lid' }
		}
	],
	adhesives: [
		{
			key: 'corners',
			name: 'Corner tabs and panels',
			kind: 'tape',
			width: '1/4 in',
			need: '66 in',
			swaps: [{ kind: 'tape', width: '1/8 in', times: 2 }]
		}
	],
	tools: [
		{ key: 'trim', name: 'Trimmer', kind: 'trimmer', reach: '12 in' },
		{ key: 'score', name: 'Scoring board', kind: 'scoring-board', reach: '6 3/4 in' },
		{ key: 'snip', name: 'Scissors', kind: 'scissors' },
		{ key: 'fold', name: 'Bone folder', kind: 'bone-folder' }
	],
	steps: [
		{
			text: 'Cut trays, lids and panels; score trays two inches and lids one inch in from every edge.',
			tools: ['trim', 'score'],
			pieces: ['tray', 'lid', 'top']
		},
		{
			text: 'Snip one score at each corner up to where the scores cross, to make the corner tabs.',
			tools: ['snip'],
			pieces: ['tray', 'lid']
		},
		{
			text: 'Fold all scores up, burnish, and tape the tabs inside the walls.',
			tools: ['fold'],
			pieces: ['tray', 'lid']
		},
		{ text: 'Stick a panel on each lid.', pieces: ['top'] }
	]
};
