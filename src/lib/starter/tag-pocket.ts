import type { Starter } from './starter';

/** A pocket of 4½ × 6 in folded from one piece with ½ in tabs, holding three tags of 4 × 6½ in. */
export const tagPocket: Starter = {
	key: 'tag-pocket',
	says: 'A folded pocket with three writing tags; its print has an up.',
	bill: {
		key: 'tag-pocket',
		name: 'Pocket with three tags',
		units: 'in',
		measures: { pocketW: '4 1/2 in', pocketH: '6 in', tab: '1/2 in' },
		slots: [
			{ key: 'pocket', name: 'Pocket', material: { kind: 'patterned-paper' } },
			{
				key: 'tags',
				name: 'Tags',
				material: { kind: 'cardstock' },
				swaps: [{ kind: 'kraft-paper' }, { kind: 'watercolour-paper' }]
			},
			{
				key: 'bands',
				name: 'Bands',
				material: { kind: 'patterned-paper' },
				designs: 'mixed',
				differentFrom: ['pocket']
			}
		],
		pieces: [
			{
				key: 'pocket',
				slot: 'pocket',
				name: 'Pocket',
				w: '=2 * pocketW + tab',
				h: '=pocketH + tab',
				up: 'h',
				scores: [
					{ from: 'left', at: '=pocketW', fold: 'valley' },
					{ from: 'right', at: '=tab', fold: 'valley' },
					{ from: 'bottom', at: '=tab', fold: 'valley' }
				]
			},
			{
				key: 'tag',
				slot: 'tags',
				name: 'Tag',
				w: '4 in',
				h: '6 1/2 in',
				qty: 3,
				corners: [{ at: ['top-left', 'top-right'], tool: 'punch' }]
			},
			{
				key: 'band',
				slot: 'bands',
				name: 'Band',
				w: '4 in',
				h: '1 1/2 in',
				qty: 3,
				up: 'h',
				mount: { on: 'tag' }
			}
		],
		adhesives: [{ key: 'tabs', name: 'Tabs and bands', kind: 'runner', need: '45 in' }],
		tools: [
			{ key: 'trim', name: 'Trimmer', kind: 'trimmer', reach: '9 1/2 in' },
			{ key: 'score', name: 'Scoring board', kind: 'scoring-board', reach: '9 1/2 in' },
			{ key: 'punch', name: 'Corner punch', kind: 'corner-punch' }
		],
		steps: [
			{
				text: 'Cut everything; score the pocket, fold it and fix its tabs inside.',
				tools: ['trim', 'score'],
				pieces: ['pocket', 'tag', 'band']
			},
			{
				text: 'Punch the tags’ upper corners and lay a band on each.',
				tools: ['punch'],
				pieces: ['tag', 'band']
			}
		]
	},
	kit: [
		{ key: 'runner', kind: 'runner', name: 'Tape runner', left: '8 m' },
		{ key: 'trimmer', kind: 'trimmer', name: 'Desk trimmer', reach: '12 in', cuts: ['paper'] },
		{ key: 'scoring-board', kind: 'scoring-board', name: 'Scoring board', reach: '12 in', grooves: '1/8 in' },
		{ key: 'punch', kind: 'corner-punch', name: 'Corner punch', shape: 'round' }
	]
};
