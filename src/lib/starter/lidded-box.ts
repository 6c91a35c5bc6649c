import type { Starter } from './starter';

/** A tray of 3¾ × 3¾ × 2 in; the lid is ⅛ in wider, 1 in deep, and carries a mat ⅛ in short of its rim. */
export const liddedBox: Starter = {
	key: 'lidded-box',
	says: 'A tray and a lid from cardstock, with a mat on the lid.',
	bill: {
		key: 'lidded-box',
		name: 'Lidded gift box',
		units: 'in',
		measures: { side: '3 3/4 in', deep: '2 in', lid: '1 in', ease: '1/8 in' },
		slots: [
			{ key: 'box', name: 'Tray and lid', material: { kind: 'cardstock' } },
			{ key: 'mat', name: 'Lid mat', material: { kind: 'patterned-paper' }, swaps: [{ kind: 'cardstock' }] }
		],
		pieces: [
			{
				key: 'tray',
				slot: 'box',
				name: 'Tray',
				w: '=side + 2 * deep',
				h: '=side + 2 * deep',
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
				w: '=side + ease + 2 * lid',
				h: '=side + ease + 2 * lid',
				scores: [
					{ from: 'left', at: '=lid', fold: 'valley' },
					{ from: 'right', at: '=lid', fold: 'valley' },
					{ from: 'top', at: '=lid', fold: 'valley' },
					{ from: 'bottom', at: '=lid', fold: 'valley' }
				]
			},
			{ key: 'mat', slot: 'mat', name: 'Lid mat', w: '=side - ease', h: '=side - ease', up: 'h' }
		],
		adhesives: [{ key: 'flaps', name: 'Corner flaps', kind: 'glue-dots', need: 16 }],
		tools: [
			{ key: 'trim', name: 'Trimmer', kind: 'trimmer', reach: '8 in' },
			{ key: 'score', name: 'Scoring board', kind: 'scoring-board', reach: '7 3/4 in' },
			{ key: 'snip', name: 'Scissors', kind: 'scissors' }
		],
		steps: [
			{
				text: 'Cut tray, lid and mat; score tray and lid along all four sides.',
				tools: ['trim', 'score'],
				pieces: ['tray', 'lid', 'mat']
			},
			{
				text: 'Snip each corner square along one score, fold the sides up and fix the flaps inside.',
				tools: ['snip'],
				pieces: ['tray', 'lid']
			},
			{ text: 'Lay the mat on the lid.', pieces: ['mat'] }
		]
	},
	kit: [
		{ key: 'dots', kind: 'glue-dots', name: 'Glue dots', left: 200 },
		{ key: 'trimmer', kind: 'trimmer', name: 'Desk trimmer', reach: '12 in', cuts: ['paper'] },
		{ key: 'scoring-board', kind: 'scoring-board', name: 'Scoring board', reach: '12 in', grooves: '1/8 in' },
		{ key: 'scissors', kind: 'scissors', name: 'Scissors' }
	]
};
