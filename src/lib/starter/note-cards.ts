import type { Starter } from './starter';

/** Four cards of 4¼ × 5½ in: a base of 8½ × 5½ folded across, with a mat that shows ⅛ in of it all round. */
export const noteCards: Starter = {
	key: 'note-cards',
	says: 'Four folded cards, each with a mat of patterned paper.',
	bill: {
		key: 'note-cards',
		name: 'Four note cards',
		units: 'in',
		measures: { cardW: '4 1/4 in', cardH: '5 1/2 in', border: '1/8 in' },
		slots: [
			{
				key: 'base',
				name: 'Card base',
				material: { kind: 'cardstock' },
				swaps: [{ kind: 'watercolour-paper' }]
			},
			{ key: 'mat', name: 'Mat', material: { kind: 'patterned-paper' } }
		],
		pieces: [
			{
				key: 'base',
				slot: 'base',
				name: 'Card base',
				w: '=2 * cardW',
				h: '=cardH',
				qty: 4,
				scores: [{ from: 'left', at: '=cardW', fold: 'mountain' }]
			},
			{
				key: 'mat',
				slot: 'mat',
				name: 'Mat',
				w: '=cardW - 2 * border',
				h: '=cardH - 2 * border',
				qty: 4,
				up: 'h',
				mount: { on: 'base', border: '=border' },
				tape: { line: 'mats', edges: ['top', 'right', 'bottom', 'left'] }
			}
		],
		adhesives: [{ key: 'mats', name: 'Behind the mats', kind: 'tape', width: '1/4 in', need: '74 in' }],
		tools: [
			{ key: 'trim', name: 'Trimmer', kind: 'trimmer', reach: '8 1/2 in' },
			{ key: 'score', name: 'Scoring board', kind: 'scoring-board', reach: '5 1/2 in' },
			{ key: 'fold', name: 'Bone folder', kind: 'bone-folder' }
		],
		steps: [
			{ text: 'Cut the bases and the mats.', tools: ['trim'], pieces: ['base', 'mat'] },
			{
				text: 'Score each base in the middle, fold it and burnish.',
				tools: ['score', 'fold'],
				pieces: ['base']
			},
			{ text: 'Tape the mats and lay them on with an even border.', pieces: ['mat'] }
		]
	},
	kit: [
		{ key: 'tape', kind: 'tape', name: 'Quarter-inch tape', width: '1/4 in', left: '25 yd' },
		{ key: 'trimmer', kind: 'trimmer', name: 'Desk trimmer', reach: '12 in', cuts: ['paper'] },
		{ key: 'scoring-board', kind: 'scoring-board', name: 'Scoring board', reach: '12 in', grooves: '1/8 in' },
		{ key: 'bone-folder', kind: 'bone-folder', name: 'Bone folder' }
	]
};
