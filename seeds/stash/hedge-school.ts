import { bouquet, climbing, ditsy, fallingLeaves, fernLattice, meadow } from '../patterns/botanical';
import { confetti, dots, plaid } from '../patterns/geometric';
import { herringbone, ledger, script } from '../patterns/lines';
import type { Print } from '../patterns/paint';
import { barcode, dollars, type Faces, type Row } from './row';

const CREAM = '#f4efdf';
const OAT = '#e3d5b8';
const SAGE = '#9db08a';
const FERN = '#5f7f5a';
const DEEP = '#33503f';
const BRAMBLE = '#7b3f55';
const HAW = '#c9574b';
const STRAW = '#e3c27a';

type Way = Faces[number]['direction'];
type Design = [
	key: string,
	design: string,
	way: Way,
	back: string,
	backWay: Way,
	left: number,
	print: Print,
	colours: string[]
];

/** A pad of twelve double-sided designs, two of each; some have been cut into. */
const DESIGNS: Design[] = [
	[
		'fern-lattice',
		'Fern Lattice',
		'one-way',
		'Oat Weave',
		'none',
		2,
		{ pattern: fernLattice, palette: [CREAM, OAT, FERN, SAGE] },
		[FERN, CREAM]
	],
	[
		'meadow-bell',
		'Meadow Bell',
		'one-way',
		'Sage Tick',
		'two-way',
		2,
		{ pattern: meadow, palette: [CREAM, FERN, SAGE, BRAMBLE, HAW, STRAW] },
		[CREAM, FERN, HAW]
	],
	[
		'nettle-script',
		'Nettle Script',
		'one-way',
		'Moss',
		'none',
		1,
		{ pattern: script, palette: ['#e9e6d2', DEEP] },
		[DEEP, OAT]
	],
	[
		'haw-ditsy',
		'Haw Ditsy',
		'none',
		'Gate Stripe',
		'two-way',
		2,
		{ pattern: ditsy, palette: [OAT, FERN, HAW, BRAMBLE, CREAM] },
		[HAW, OAT]
	],
	[
		'lesson-lines',
		'Lesson Lines',
		'one-way',
		'Chalk Dust',
		'none',
		1,
		{ pattern: ledger, palette: ['#f1ead2', SAGE, HAW, DEEP] },
		[OAT, SAGE]
	],
	[
		'leaf-fall',
		'Leaf Fall',
		'none',
		'Hedge Gingham',
		'none',
		2,
		{ pattern: fallingLeaves, palette: [CREAM, FERN, SAGE, HAW, STRAW, BRAMBLE] },
		[STRAW, HAW, FERN]
	],
	[
		'climbing-bine',
		'Climbing Bine',
		'one-way',
		'Cream Pin',
		'none',
		2,
		{ pattern: climbing, palette: [DEEP, STRAW, SAGE, FERN, '#c4cfae'] },
		[DEEP, SAGE]
	],
	[
		'posy-row',
		'Posy Row',
		'one-way',
		'Bramble',
		'none',
		1,
		{ pattern: bouquet, palette: ['#efe4d6', FERN, SAGE, HAW, STRAW, BRAMBLE] },
		[HAW, FERN]
	],
	[
		'satchel-plaid',
		'Satchel Plaid',
		'two-way',
		'Oat Dot',
		'none',
		2,
		{ pattern: plaid, palette: [OAT, FERN, BRAMBLE, SAGE, HAW] },
		[FERN, BRAMBLE]
	],
	[
		'acorn-spot',
		'Acorn Spot',
		'none',
		'Fern Rib',
		'two-way',
		2,
		{ pattern: dots, palette: [SAGE, CREAM, STRAW] },
		[SAGE, CREAM]
	],
	[
		'stile-bone',
		'Stile Bone',
		'two-way',
		'Thistle',
		'none',
		2,
		{ pattern: herringbone, palette: [CREAM, SAGE, STRAW] },
		[SAGE, CREAM]
	],
	[
		'seed-toss',
		'Seed Toss',
		'none',
		'Sage Plain',
		'none',
		2,
		{ pattern: confetti, palette: [BRAMBLE, OAT, HAW, SAGE, STRAW] },
		[BRAMBLE, STRAW]
	]
];

export const hedgeSchool: Row[] = DESIGNS.map(
	([key, design, direction, back, backWay, sheets, print, colours], nth) => ({
		supply: {
			key,
			kind: 'patterned-paper',
			name: design,
			collection: 'Hedge School',
			size: '12 x 12 in',
			sheets,
			faces: [
				{ design, direction },
				{ design: back, direction: backWay }
			],
			weight: '180 gsm',
			colours,
			price: dollars(95),
			barcode: barcode(110 + nth),
			bin: 'Pad box'
		},
		print
	})
);
