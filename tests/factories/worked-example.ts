/** A tag book and a small stash, as the exchange form is documented by: made on 10 May 2027 it can be made now. */
export function exampleRequest() {
	return {
		on: '2027-05-10',
		supplies: [
			{
				...{ key: 'fern', kind: 'patterned-paper', name: 'Fern Lattice', collection: 'Hedge School' },
				...{ size: '12 x 12 in', sheets: 2, count: 'counted' },
				faces: [
					{ design: 'Fern Lattice', direction: 'one-way' },
					{ design: 'Oat', direction: 'none' }
				],
				...{ weight: '180 gsm', colours: ['#6d8a5f'], price: { amount: 95, currency: 'USD' } },
				...{ barcode: '9520000000110', bin: 'Tray 3' }
			},
			{ key: 'oc1', kind: 'cardstock', name: 'Oat offcut', size: '4 1/4 x 11 in', sheets: 1, offcut: true },
			{
				...{ key: 'strip', kind: 'patterned-paper', name: 'Kite Row', size: '12 x 12 1/4 in', sheets: 1 },
				brandingStrip: { edge: 'bottom', depth: '1/4 in' }
			},
			{ key: 'qt', kind: 'tape', name: 'Quarter-inch tape', width: '1/4 in', left: '98 in', full: '27 yd' },
			{ key: 'rn', kind: 'runner', name: 'Tape runner', left: '8 m' },
			{ key: 'tr', kind: 'trimmer', name: 'Desk trimmer', reach: '12 in', cuts: ['paper'] },
			{ key: 'sb', kind: 'scoring-board', name: 'Scoring board', reach: '12 in', grooves: '1/8 in' },
			{ key: 'cp', kind: 'corner-punch', name: 'Wave corner', shape: 'wave', borrowedUntil: '2027-05-10' },
			{
				key: 'kn',
				kind: 'craft-knife',
				name: 'Board knife',
				lentUntil: '2027-05-12',
				cuts: ['paper', 'board']
			},
			{
				key: 'kr',
				kind: 'cardstock',
				name: 'Kraft',
				size: '8 1/2 x 11 in',
				sheets: 25,
				arrives: '2027-05-20'
			}
		],
		projects: [
			{
				key: 'tagbook',
				name: 'Tag book',
				measures: { tagW: '2 3/8 in' },
				slots: [
					{ key: 'cover', material: { kind: 'patterned-paper' }, designs: 'one', design: 'Fern Lattice' },
					{
						key: 'tags',
						material: { kind: 'patterned-paper', weight: { min: '120 gsm' } },
						...{ designs: 'one', sameAs: 'cover', swaps: [{ kind: 'cardstock' }] }
					}
				],
				pieces: [
					{
						...{ key: 'c', slot: 'cover', w: '11 in', h: '7 in', qty: 1, up: 'h' },
						scores: [{ from: 'left', at: '5 1/2 in', fold: 'valley' }]
					},
					{
						...{ key: 't', slot: 'tags', w: '=tagW', h: '4 in', qty: 6, up: 'h', allowance: '1/16 in' },
						corners: [{ at: ['top-left', 'top-right'], tool: 'punch' }]
					}
				],
				adhesives: [
					{
						...{ key: 'rim', kind: 'tape', width: '1/4 in', need: '93 in' },
						swaps: [{ kind: 'tape', width: '1/8 in', times: 2 }]
					}
				],
				tools: [
					{ key: 'punch', kind: 'corner-punch', shape: 'wave', swaps: [{ kind: 'corner-punch' }] },
					{ key: 'trim', kind: 'trimmer', reach: '11 in' }
				]
			}
		]
	};
}
