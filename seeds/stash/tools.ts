import { daysAfter, dollars, type Row } from './row';

export const tools = (today: string): Row[] =>
	(
		[
			{
				key: 'trimmer',
				kind: 'trimmer',
				name: 'Desk trimmer',
				reach: '12 1/4 in',
				cuts: ['paper'],
				price: dollars(3200),
				bin: 'Bench'
			},
			{
				key: 'guillotine',
				kind: 'guillotine-cutter',
				name: 'Crop-night guillotine',
				reach: '18 in',
				cuts: ['paper', 'board'],
				borrowedUntil: daysAfter(today, 4),
				bin: 'Bench'
			},
			{ key: 'rotary', kind: 'rotary-cutter', name: 'Rotary cutter', cuts: ['paper'], bin: 'Tool rail' },
			{
				key: 'board-knife',
				kind: 'craft-knife',
				name: 'Board knife',
				cuts: ['paper', 'board'],
				lentUntil: daysAfter(today, 12),
				bin: 'Tool rail'
			},
			{ key: 'paper-knife', kind: 'craft-knife', name: 'Fine knife', cuts: ['paper'], bin: 'Tool rail' },
			{ key: 'scissors', kind: 'scissors', name: 'Fussy scissors', cuts: ['paper'], bin: 'Tool rail' },
			{ key: 'ruler', kind: 'ruler', name: 'Steel rule', reach: '18 in', bin: 'Tool rail' },
			{ key: 'mat', kind: 'cutting-mat', name: 'Cutting mat', reach: '18 in', bin: 'Bench' },
			{
				key: 'scoring-board',
				kind: 'scoring-board',
				name: 'Scoring board',
				reach: '12 in',
				grooves: '1/8 in',
				price: dollars(2100),
				bin: 'Bench'
			},
			{
				key: 'scoring-board-mm',
				kind: 'scoring-board',
				name: 'Metric scoring board',
				reach: '300 mm',
				grooves: '5 mm',
				lentUntil: daysAfter(today, 20),
				bin: 'Bench'
			},
			{ key: 'stylus', kind: 'scoring-tool', name: 'Scoring stylus', bin: 'Tool rail' },
			{ key: 'bone-folder', kind: 'bone-folder', name: 'Bone folder', bin: 'Tool rail' },
			{
				key: 'round-corner',
				kind: 'corner-punch',
				name: 'Quarter-inch round corner',
				shape: 'round',
				size: '1/4 in',
				bin: 'Punch drawer'
			},
			{
				key: 'wave-corner',
				kind: 'corner-punch',
				name: 'Wave corner',
				shape: 'wave',
				borrowedUntil: daysAfter(today, 16),
				bin: 'Punch drawer'
			},
			{
				key: 'scallop-edge',
				kind: 'edge-punch',
				name: 'Scallop edge',
				shape: 'scallop',
				bin: 'Punch drawer'
			},
			{
				key: 'circle-punch',
				kind: 'shape-punch',
				name: 'One-inch circle',
				shape: 'circle',
				size: '1 in',
				bin: 'Punch drawer'
			},
			{
				key: 'thumb-punch',
				kind: 'shape-punch',
				name: 'Thumb notch',
				shape: 'half-circle',
				size: '3/4 in',
				bin: 'Punch drawer'
			},
			{
				key: 'hole-punch',
				kind: 'hole-punch',
				name: 'Eighth-inch hole punch',
				size: '1/8 in',
				bin: 'Punch drawer'
			},
			{
				key: 'tab-punch',
				kind: 'tab-punch',
				name: 'File tab punch',
				shape: 'file tab',
				lentUntil: daysAfter(today, 5),
				bin: 'Punch drawer'
			},
			{
				key: 'die-cutter',
				kind: 'die-cutter',
				name: 'Hand-cranked die cutter',
				reach: '6 in',
				bin: 'Under the bench'
			},
			{
				key: 'oval-die',
				kind: 'die',
				name: 'Stitched oval die',
				shape: 'oval',
				size: '3 in',
				bin: 'Stamp box'
			},
			{
				key: 'brick-folder',
				kind: 'embossing-folder',
				name: 'Basket embossing folder',
				shape: 'basket',
				bin: 'Stamp box'
			},
			{ key: 'eyelet-setter', kind: 'eyelet-setter', name: 'Eyelet setter', bin: 'Tool rail' },
			{ key: 'heat-tool', kind: 'heat-tool', name: 'Heat tool', bin: 'Window sill' },
			{ key: 'glue-gun', kind: 'glue-gun', name: 'Low-heat glue gun', bin: 'Window sill' },
			{ key: 'stapler', kind: 'stapler', name: 'Long-arm stapler', reach: '12 in', bin: 'Tool rail' },
			{ key: 'awl', kind: 'awl', name: 'Bookbinding awl', bin: 'Tool rail' },
			{ key: 'brush', kind: 'brush', name: 'Flat glue brush', size: '1 in', bin: 'Tool rail' },
			{ key: 'hello-stamp', kind: 'stamp', name: 'Hello stamp', size: '2 in', bin: 'Stamp box' }
		] satisfies Row['supply'][]
	).map((supply) => ({ supply }));
