import { bouquet, ditsy } from '../patterns/botanical';
import { constellations, moths } from '../patterns/figures';
import { confetti, dots, gingham, pinDots, plaid, terrazzo, tiles } from '../patterns/geometric';
import { ribbonStripe, script, ticking } from '../patterns/lines';
import { combedMarble, stoneMarble } from '../patterns/marbled';
import type { Print } from '../patterns/paint';
import { wash } from '../patterns/surfaces';
import { barcode, dollars, type Faces, type Row } from './row';

const BLUSH = '#f7e6de';
const PETAL = '#ebbfb5';
const ROSE = '#cf8488';
const DAMSON = '#6b3451';
const MARIGOLD = '#e8a94a';
const LEAF = '#8c9c6b';

const BONE = '#f3eadb';
const CLAY = '#d9a07c';
const TERRACOTTA = '#b95f40';
const UMBER = '#5d3a2b';
const GLAZE = '#2f7775';
const ASH = '#a8a093';

const NIGHT = '#1e2a44';
const DUSK = '#3c4a70';
const GOLD = '#d6ae5a';
const WING = '#c9b79a';
const PALE = '#f0e8d6';
const PLUM = '#6b5075';

type Way = Faces[number]['direction'];
type Design = [
	key: string,
	design: string,
	way: Way,
	back: string | null,
	left: number,
	print: Print,
	colours: string[]
];
interface Pad {
	readonly collection: string;
	readonly size: string;
	readonly weight: string;
	readonly price: number;
	readonly bin: string;
	readonly barcodes: number;
	readonly designs: readonly Design[];
}

const damsonHour: Pad = {
	collection: 'Damson Hour',
	size: '8 x 8 in',
	weight: '160 gsm',
	price: 45,
	bin: 'Pad box',
	barcodes: 360,
	designs: [
		[
			'plum-posy',
			'Plum Posy',
			'one-way',
			'Blush Plain',
			6,
			{ pattern: bouquet, palette: [BLUSH, LEAF, '#b0bd92', ROSE, MARIGOLD, DAMSON] },
			[BLUSH, ROSE, DAMSON]
		],
		[
			'damson-ditsy',
			'Damson Ditsy',
			'none',
			'Petal Plain',
			5,
			{ pattern: ditsy, palette: [DAMSON, LEAF, PETAL, ROSE, MARIGOLD] },
			[DAMSON, PETAL]
		],
		[
			'rose-check',
			'Rose Check',
			'none',
			'Damson Plain',
			6,
			{ pattern: gingham, palette: ['#fdf6f1', ROSE] },
			[ROSE, BLUSH]
		],
		[
			'combed-hour',
			'Combed Hour',
			'two-way',
			null,
			3,
			{ pattern: combedMarble, palette: [BLUSH, DAMSON, ROSE, MARIGOLD, PETAL] },
			[DAMSON, MARIGOLD]
		],
		[
			'still-bath',
			'Still Bath',
			'none',
			null,
			4,
			{ pattern: stoneMarble, palette: [BLUSH, ROSE, PETAL, DAMSON, LEAF] },
			[ROSE, PETAL]
		],
		[
			'petal-ribbon',
			'Petal Ribbon',
			'two-way',
			'Marigold Plain',
			6,
			{ pattern: ribbonStripe, palette: [BLUSH, DAMSON, PETAL, ROSE, MARIGOLD] },
			[PETAL, ROSE]
		]
	]
};

const kilnShelf: Pad = {
	collection: 'Kiln Shelf',
	size: '210 x 297 mm',
	weight: '170 gsm',
	price: 60,
	bin: 'Flat drawer 2',
	barcodes: 480,
	designs: [
		[
			'bone-terrazzo',
			'Bone Terrazzo',
			'none',
			null,
			4,
			{ pattern: terrazzo, palette: [BONE, TERRACOTTA, GLAZE, CLAY, UMBER, ASH] },
			[BONE, TERRACOTTA, GLAZE]
		],
		[
			'glaze-tile',
			'Glaze Tile',
			'none',
			null,
			3,
			{ pattern: tiles, palette: [BONE, GLAZE, TERRACOTTA, CLAY] },
			[GLAZE, TERRACOTTA]
		],
		['clay-dot', 'Clay Dot', 'none', null, 4, { pattern: dots, palette: [CLAY, BONE, GLAZE] }, [CLAY, BONE]],
		[
			'ash-plaid',
			'Ash Plaid',
			'two-way',
			null,
			2,
			{ pattern: plaid, palette: [BONE, ASH, UMBER, CLAY, TERRACOTTA] },
			[ASH, UMBER]
		],
		[
			'slip-wash',
			'Slip Wash',
			'none',
			null,
			4,
			{ pattern: wash, palette: ['#f6f0e6', CLAY, '#e9cdb0', GLAZE] },
			['#e9cdb0', GLAZE]
		],
		[
			'wheel-tick',
			'Wheel Tick',
			'two-way',
			null,
			3,
			{ pattern: ticking, palette: [BONE, TERRACOTTA] },
			[BONE, TERRACOTTA]
		]
	]
};

const mothAtlas: Pad = {
	collection: 'Moth Atlas',
	size: '12 x 12 in',
	weight: '190 gsm',
	price: 110,
	bin: 'Flat drawer 1',
	barcodes: 590,
	designs: [
		[
			'night-moth',
			'Night Moth',
			'one-way',
			'Dusk Plain',
			1,
			{ pattern: moths, palette: [NIGHT, WING, '#8b90a2', PLUM, GOLD] },
			[NIGHT, GOLD]
		],
		[
			'star-drift',
			'Star Drift',
			'none',
			'Pale Plain',
			2,
			{ pattern: constellations, palette: [NIGHT, GOLD, WING, DUSK] },
			[NIGHT, GOLD]
		],
		[
			'lamp-hand',
			'Lamp Hand',
			'one-way',
			'Plum Plain',
			2,
			{ pattern: script, palette: [PALE, PLUM] },
			[PALE, PLUM]
		],
		[
			'wing-pool',
			'Wing Pool',
			'none',
			null,
			1,
			{ pattern: stoneMarble, palette: [PALE, PLUM, WING, NIGHT, GOLD] },
			[PLUM, WING, GOLD]
		],
		[
			'dusk-pin',
			'Dusk Pin',
			'none',
			'Wing Plain',
			3,
			{ pattern: pinDots, palette: [DUSK, GOLD] },
			[DUSK, GOLD]
		],
		[
			'lamp-sparks',
			'Lamp Sparks',
			'none',
			'Night Plain',
			2,
			{ pattern: confetti, palette: [NIGHT, GOLD, WING, PLUM] },
			[NIGHT, GOLD, PLUM]
		]
	]
};

const rowsOf = (pad: Pad): Row[] =>
	pad.designs.map(([key, design, direction, back, sheets, print, colours], nth) => ({
		supply: {
			key,
			kind: 'patterned-paper',
			name: design,
			collection: pad.collection,
			size: pad.size,
			sheets,
			faces: [
				{ design, direction },
				...(back === null ? [] : [{ design: back, direction: 'none' as const }])
			],
			weight: pad.weight,
			colours,
			price: dollars(pad.price),
			barcode: barcode(pad.barcodes + nth),
			bin: pad.bin
		},
		print
	}));

export const smallPads: Row[] = [damsonHour, kilnShelf, mothAtlas].flatMap(rowsOf);
