import type { BillDocument } from '../../src/lib/domain/exchange/bill-schema';

/** Envelopes for a 4¼ × 5½ card: a front of 5¾ × 4½ with a 2½ in flap above, a 4 in back below, ¾ in side flaps. */
export const envelopes: BillDocument = {
	key: 'envelopes',
	name: 'Lined kraft envelopes',
	measures: { frontW: '5 3/4 in', frontH: '4 1/2 in', flap: '2 1/2 in', back: '4 in', side: '3/4 in' },
	slots: [
		{
			key: 'envelope',
			name: 'Envelope',
			material: { kind: 'kraft-paper', weight: { min: '110 gsm', max: '140 gsm' } }
		},
		{
			key: 'liner',
			name: 'Liner',
			material: { kind: 'patterned-paper', weight: { max: '200 gsm' } },
			design: 'Damson Ditsy',
			collection: 'Damson Hour'
		}
	],
	pieces: [
		{
			key: 'envelope',
			slot: 'envelope',
			name: 'Envelope',
			w: '=frontW + 2 * side',
			h: '=flap + frontH + back',
			qty: 5,
			up: 'h',
			scores: [
				{ from: 'left', at: '=side', fold: 'valley' },
				{ from: 'right', at: '=side', fold: 'valley' },
				{ from: 'top', at: '=flap', fold: 'valley' },
				{ from: 'bottom', at: '=back', fold: 'valley' }
			],
			diagonals: [{ from: { x: '=side', y: '0.5 in' }, to: { x: '1 1/2 in', y: '1/64 in' } }]
		},
		{
			key: 'liner',
			slot: 'liner',
			name: 'Liner',
			w: '5 1/2 in',
			h: '6 1/2 in',
			qty: 5,
			up: 'h',
			tape: { line: 'liners', edges: ['top', 'left', 'right'] }
		}
	],
	adhesives: [
		{ key: 'liners', name: 'Behind the liners', kind: 'tape', width: '1/8 in', need: '92 1/2 in' },
		{
			key: 'sides',
			name: 'Side flaps',
			kind: 'glue-stick',
			need: 1,
			swaps: [{ kind: 'glue-dots', times: 20 }]
		}
	],
	tools: [
		{ key: 'trim', name: 'Trimmer', kind: 'trimmer', reach: '11 in' },
		{ key: 'score', name: 'Scoring board', kind: 'scoring-board', reach: '11 in' },
		{ key: 'snip', name: 'Scissors', kind: 'scissors' },
		{ key: 'fold', name: 'Bone folder', kind: 'bone-folder' }
	],
	steps: [
		{
			text: 'Cut the sheets; score ¾ in from both sides, 2½ in from the top and 4 in from the bottom.',
			tools: ['trim', 'score'],
			pieces: ['envelope']
		},
		{
			text: 'Snip away the four corner blocks so that only the front keeps its side flaps; slant the top flap.',
			tools: ['snip'],
			pieces: ['envelope']
		},
		{
			text: 'Tape the liner inside front and flap, fold the sides in and glue the back over them.',
			tools: ['fold'],
			pieces: ['liner']
		}
	]
};
