import type { BillDocument } from '../../src/lib/domain/exchange/bill-schema';

/** Eight folded cards, 4¼ × 5½ closed: two bases to a letter sheet, ⅛ in of border at every layer. */
export const notelets: BillDocument = {
	key: 'notelets',
	name: 'Leaf-fall notelets',
	measures: { border: '1/8 in', cardW: '4 1/4 in', cardH: '5 1/2 in' },
	slots: [
		{ key: 'base', name: 'Card base', material: { kind: 'cardstock', weight: { min: '100 lb cover' } } },
		{
			key: 'mat',
			name: 'Printed mat',
			material: { kind: 'patterned-paper' },
			design: 'Leaf Fall',
			collection: 'Hedge School'
		},
		{
			key: 'panel',
			name: 'Writing panel',
			material: { kind: 'cardstock' },
			colour: '#f6f3ea',
			sameAs: 'base'
		}
	],
	pieces: [
		{
			key: 'base',
			slot: 'base',
			name: 'Base',
			w: '=2 * cardW',
			h: '=cardH',
			qty: 8,
			scores: [{ from: 'left', at: '=cardW', fold: 'valley' }]
		},
		{
			key: 'mat',
			slot: 'mat',
			name: 'Mat',
			w: '=cardW - 2 * border',
			h: '=cardH - 2 * border',
			qty: 8,
			up: 'h',
			mount: { on: 'base' },
			tape: { line: 'rim', edges: ['top', 'right', 'bottom', 'left'] }
		},
		{
			key: 'panel',
			slot: 'panel',
			name: 'Panel',
			w: '=cardW - 4 * border',
			h: '=cardH - 4 * border',
			qty: 8,
			mount: { on: 'mat', border: '=border' }
		}
	],
	adhesives: [
		{
			key: 'rim',
			name: 'Behind the mats',
			kind: 'tape',
			width: '1/4 in',
			need: '148 in',
			swaps: [{ kind: 'tape', width: '1/8 in', times: 2 }]
		},
		{ key: 'panels', name: 'Behind the panels', kind: 'runner', need: '140 in' }
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
		{ key: 'fold', name: 'Bone folder', kind: 'bone-folder' },
		{ key: 'hello', name: 'Greeting stamp', kind: 'stamp' }
	],
	extras: [
		{ key: 'envelopes', name: 'Envelopes', kind: 'envelopes', need: 8 },
		{ key: 'ink', name: 'Black ink', kind: 'ink', need: '1 ml' }
	],
	steps: [
		{
			text: 'Cut the bases, mats and panels; score each base down its middle.',
			tools: ['trim', 'score'],
			pieces: ['base', 'mat', 'panel']
		},
		{ text: 'Fold every base on its score and burnish the fold flat.', tools: ['fold'], pieces: ['base'] },
		{ text: 'Stamp the greeting on the panels and let the ink dry.', tools: ['hello'], pieces: ['panel'] },
		{
			text: 'Stick each panel to its mat, then each mat to the front of a base, an eighth of an inch in all round.',
			pieces: ['panel', 'mat']
		}
	]
};
