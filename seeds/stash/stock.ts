import { board, cloth, fibres, glitter, clear, kraft, sheen, solid } from '../patterns/surfaces';
import type { Pattern } from '../patterns/sheet';
import { barcode, daysAfter, dollars, type Row, type SheetDocument } from './row';

const KRAFT = ['#c19a6b', '#a87e50', '#e0c49a'];
const BOARD = ['#a79a88', '#8a7d6b', '#c4b9a6'];

function stock(pattern: Pattern, palette: readonly string[], supply: SheetDocument): Row {
	return {
		supply: { ...supply, colours: supply.colours ?? palette.slice(0, 1) },
		print: { pattern, palette }
	};
}

function card(
	nth: number,
	key: string,
	name: string,
	colour: string,
	size: string,
	sheets: number,
	more: Partial<SheetDocument> = {}
): Row {
	return stock(solid, [colour], {
		key,
		kind: 'cardstock',
		name,
		collection: 'Quiet Bench',
		size,
		sheets,
		weight: '80 lb cover',
		price: dollars(size.includes('12') ? 85 : 40),
		barcode: barcode(nth),
		bin: size.includes('mm') ? 'Flat drawer 2' : 'Card shelf',
		...more
	});
}

export const cardstock = (today: string): Row[] => [
	card(701, 'oat-card', 'Oat', '#e6d8bc', '12 x 12 in', 9),
	card(702, 'fern-card', 'Fern', '#5f7f5a', '12 x 12 in', 5),
	card(703, 'damson-card', 'Damson', '#6b3451', '12 x 12 in', 4),
	card(704, 'sea-card', 'Sea', '#5f97a1', '12 x 12 in', 5),
	card(705, 'night-card', 'Night', '#1e2a44', '12 x 12 in', 3),
	card(706, 'haw-card', 'Haw', '#c9574b', '12 x 12 in', 2),
	card(707, 'chalk-card', 'Chalk', '#f6f3ea', '8 1/2 x 11 in', 34, { weight: '110 lb cover' }),
	card(708, 'blush-card', 'Blush', '#f0cfc4', '8 1/2 x 11 in', 9),
	card(709, 'marigold-card', 'Marigold', '#e8a94a', '8 1/2 x 11 in', 7),
	card(710, 'rope-card', 'Rope', '#cdaf82', '8 1/2 x 11 in', 12, { count: 'unsure' }),
	card(711, 'bone-card', 'Bone', '#f3eadb', '210 x 297 mm', 18, { weight: '220 gsm' }),
	card(712, 'terracotta-card', 'Terracotta', '#b95f40', '210 x 297 mm', 6, { weight: '220 gsm' }),
	card(713, 'soot-card', 'Soot', '#2c2826', '12 x 12 in', 10, {
		arrives: daysAfter(today, 9),
		bin: undefined
	})
];

export const otherSheets = (today: string): Row[] => [
	stock(board, BOARD, {
		key: 'board-12',
		kind: 'chipboard',
		name: 'Chipboard, 2 mm',
		size: '12 x 12 in',
		sheets: 3,
		caliper: '2 mm',
		weight: '1250 gsm',
		price: dollars(180),
		barcode: barcode(801),
		bin: 'Board stand'
	}),
	stock(board, BOARD, {
		key: 'board-a4',
		kind: 'chipboard',
		name: 'Chipboard, 1.5 mm',
		size: '210 x 297 mm',
		sheets: 2,
		caliper: '1.5 mm',
		weight: '950 gsm',
		price: dollars(110),
		barcode: barcode(802),
		bin: 'Board stand'
	}),
	stock(kraft, KRAFT, {
		key: 'kraft-wrap',
		kind: 'kraft-paper',
		name: 'Kraft wrap',
		size: '18 x 24 in',
		sheets: 6,
		weight: '90 gsm',
		price: dollars(60),
		barcode: barcode(803),
		bin: 'Flat drawer 2'
	}),
	stock(kraft, KRAFT, {
		key: 'kraft-letter',
		kind: 'kraft-paper',
		name: 'Kraft, letter size',
		size: '8 1/2 x 11 in',
		sheets: 25,
		weight: '120 gsm',
		price: dollars(18),
		barcode: barcode(804),
		arrives: daysAfter(today, 6)
	}),
	stock(solid, ['#fbfaf5'], {
		key: 'text-a4',
		kind: 'plain-paper',
		name: 'Text paper',
		size: '210 x 297 mm',
		sheets: 180,
		count: 'unsure',
		weight: '100 gsm',
		price: dollars(4),
		barcode: barcode(805),
		bin: 'Flat drawer 2'
	}),
	stock(clear, ['#eef0ec', '#ffffff', '#d4d8d0'], {
		key: 'vellum',
		kind: 'vellum',
		name: 'Frost vellum',
		size: '8 1/2 x 11 in',
		sheets: 6,
		weight: '112 gsm',
		price: dollars(55),
		barcode: barcode(806),
		bin: 'Flat drawer 2'
	}),
	stock(solid, ['#f7f4ec'], {
		key: 'wash-block',
		kind: 'watercolour-paper',
		name: 'Cold-pressed block',
		size: '9 x 12 in',
		sheets: 11,
		weight: '300 gsm',
		price: dollars(130),
		barcode: barcode(807),
		bin: 'Flat drawer 2'
	}),
	stock(fibres, ['#f1e6d2', '#d9c49d', '#fffaf0'], {
		key: 'mulberry',
		kind: 'mulberry-paper',
		name: 'Fibre mulberry',
		size: '25 x 37 in',
		sheets: 1,
		weight: '45 gsm',
		price: dollars(480),
		barcode: barcode(808),
		bin: 'Roll rack'
	}),
	stock(sheen, ['#c8a25a', '#f2dda4', '#b98b3f', '#ebcf8b', '#a97c33', '#ddb96e'], {
		key: 'gold-card',
		kind: 'metallic-paper',
		name: 'Brushed gold',
		size: '12 x 12 in',
		sheets: 2,
		weight: '250 gsm',
		price: dollars(160),
		barcode: barcode(809),
		bin: 'Card shelf'
	}),
	stock(glitter, ['#7b3f55', '#9b5f75', '#c98aa0', '#5b2f45', '#e7bccb'], {
		key: 'bramble-glitter',
		kind: 'glitter-paper',
		name: 'Bramble glitter',
		size: '12 x 12 in',
		sheets: 2,
		weight: '280 gsm',
		price: dollars(190),
		barcode: barcode(810),
		bin: 'Card shelf'
	}),
	stock(clear, ['#e4eef1', '#ffffff', '#b5c9cc'], {
		key: 'acetate',
		kind: 'acetate',
		name: 'Window acetate',
		size: '8 1/2 x 11 in',
		sheets: 5,
		caliper: '0.2 mm',
		price: dollars(90),
		barcode: barcode(811),
		bin: 'Flat drawer 2'
	}),
	stock(cloth, ['#4d6a6d', '#7b999b', '#33494c'], {
		key: 'tidal-cloth',
		kind: 'book-cloth',
		name: 'Tidal book cloth',
		size: '17 x 19 in',
		sheets: 1,
		price: dollars(620),
		barcode: barcode(812),
		bin: 'Roll rack'
	}),
	stock(fibres, ['#c9574b', '#b04439', '#dd7a6f'], {
		key: 'haw-felt',
		kind: 'felt',
		name: 'Haw felt',
		size: '9 x 12 in',
		sheets: 3,
		price: dollars(99),
		barcode: barcode(813),
		bin: 'Soft box'
	}),
	stock(solid, ['#3a3634'], {
		key: 'magnet-sheet',
		kind: 'magnet-sheet',
		name: 'Magnet sheet',
		size: '8 1/2 x 11 in',
		sheets: 1,
		caliper: '0.5 mm',
		price: dollars(420),
		barcode: barcode(814),
		bin: 'Soft box'
	}),
	stock(clear, ['#f4ecd6', '#ffffff', '#dcd2b8'], {
		key: 'stick-sheet',
		kind: 'adhesive-sheet',
		name: 'Double-sided film',
		size: '210 x 297 mm',
		sheets: 4,
		price: dollars(140),
		barcode: barcode(815),
		bin: 'Tape tin'
	})
];
