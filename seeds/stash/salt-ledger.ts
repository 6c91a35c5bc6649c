import { boats, kites, postage, scales } from '../patterns/figures';
import { awning, ledger, script, swell } from '../patterns/lines';
import type { Print } from '../patterns/paint';
import { barcode, dollars, type Faces, type Row } from './row';

const CHALK = '#f5f3ec';
const MIST = '#d5e3e3';
const SEA = '#7fafb6';
const DEEP = '#2f5f73';
const INK = '#1f3a4a';
const ROPE = '#cdaf82';
const CORAL = '#e58a71';

type Design = [
	key: string,
	design: string,
	way: Faces[number]['direction'],
	left: number,
	print: Print,
	colours: string[]
];

/** Bought by the sheet: each carries a strip with its maker's line along the bottom, which is cut off first. */
const DESIGNS: Design[] = [
	[
		'long-swell',
		'Long Swell',
		'two-way',
		3,
		{ pattern: swell, palette: [CHALK, DEEP, SEA, ROPE] },
		[DEEP, SEA]
	],
	['harbour-hand', 'Harbour Hand', 'one-way', 1, { pattern: script, palette: [MIST, INK] }, [MIST, INK]],
	[
		'dinghy-fleet',
		'Dinghy Fleet',
		'one-way',
		2,
		{ pattern: boats, palette: [CHALK, DEEP, SEA, CORAL, ROPE] },
		[CHALK, CORAL, DEEP]
	],
	[
		'kite-row',
		'Kite Row',
		'one-way',
		1,
		{ pattern: kites, palette: ['#eef3f0', INK, SEA, CORAL, ROPE] },
		[MIST, CORAL]
	],
	['deck-awning', 'Deck Awning', 'two-way', 2, { pattern: awning, palette: [CHALK, SEA] }, [SEA, CHALK]],
	[
		'net-scale',
		'Net Scale',
		'one-way',
		2,
		{ pattern: scales, palette: [MIST, DEEP, SEA, MIST] },
		[DEEP, MIST]
	],
	[
		'account-page',
		'Account Page',
		'one-way',
		1,
		{ pattern: ledger, palette: [CHALK, SEA, CORAL, INK] },
		[CHALK, SEA]
	],
	[
		'parcel-post',
		'Parcel Post',
		'one-way',
		2,
		{ pattern: postage, palette: [MIST, CHALK, DEEP, CORAL, ROPE, SEA] },
		[DEEP, CORAL, ROPE]
	]
];

export const saltLedger: Row[] = DESIGNS.map(([key, design, direction, sheets, print, colours], nth) => ({
	supply: {
		key,
		kind: 'patterned-paper',
		name: design,
		collection: 'Salt Ledger',
		size: '12 x 12 1/4 in',
		sheets,
		faces: [{ design, direction }],
		weight: '200 gsm',
		colours,
		price: dollars(125),
		barcode: barcode(240 + nth),
		bin: 'Flat drawer 1',
		brandingStrip: { edge: 'bottom', depth: '1/4 in' }
	},
	print
}));
