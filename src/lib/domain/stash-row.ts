import type { Caliper } from './caliper';
import type { Length, LengthUnit } from './length';
import type {
	ConsumableKind,
	ConsumableSupply,
	Counted,
	Edge,
	Face,
	SheetGoods,
	SheetSupply,
	Supply,
	SupplyKind,
	ToolKind,
	ToolSupply
} from './stash';

/** A supply as one flat row, as a table keeps it: `amount` is sheets, 1/320 mm, 1/16 nl or a count. */
export interface StashRow {
	readonly key: string;
	readonly group: Supply['group'];
	readonly kind: SupplyKind;
	readonly name: string;
	readonly collection: string | null;
	readonly w: Length | null;
	readonly h: Length | null;
	readonly unit: string | null;
	readonly entered: Readonly<Record<string, string>> | null;
	readonly amount: number;
	readonly count: Counted;
	readonly faces: readonly Face[];
	readonly weightText: string | null;
	readonly gsm: number | null;
	readonly caliper: Caliper | null;
	readonly colours: readonly string[];
	readonly offcut: boolean;
	readonly stripEdge: Edge | null;
	readonly stripDepth: Length | null;
	readonly width: Length | null;
	readonly full: number | null;
	readonly reach: Length | null;
	readonly grooves: Length | null;
	readonly shape: string | null;
	readonly size: Length | null;
	readonly cuts: readonly ('paper' | 'board')[];
	readonly priceAmount: number | null;
	readonly priceCurrency: string | null;
	readonly barcode: string | null;
	readonly bin: string | null;
	readonly arrives: string | null;
	readonly lentUntil: string | null;
	readonly borrowedUntil: string | null;
}

/** Reads supplies from the JSON text of their rows, in which a weight's grams may stand as text. */
export function readStash(text: string): Supply[] {
	const rows = JSON.parse(text) as StashRow[];
	return rows.map((row) => supplyOf({ ...row, gsm: row.gsm === null ? null : Number(row.gsm) }));
}

/** The supply that a row keeps. */
export function supplyOf(row: StashRow): Supply {
	if (row.group === 'sheet') return sheetOf(row);
	return row.group === 'tool' ? toolOf(row) : consumableOf(row);
}

function sheetOf(row: StashRow): SheetSupply {
	return {
		...owned(row),
		group: 'sheet',
		kind: row.kind as SheetGoods,
		w: row.w as Length,
		h: row.h as Length,
		unit: row.unit as LengthUnit,
		sheets: row.amount,
		count: row.count,
		faces: row.faces,
		weight: row.weightText === null || row.gsm === null ? null : { text: row.weightText, gsm: row.gsm },
		caliper: row.caliper,
		colours: row.colours,
		offcut: row.offcut,
		strip: row.stripEdge && row.stripDepth ? { edge: row.stripEdge, depth: row.stripDepth } : null
	};
}

function consumableOf(row: StashRow): ConsumableSupply {
	return {
		...owned(row),
		group: 'consumable',
		kind: row.kind as ConsumableKind,
		width: row.width,
		left: row.amount,
		full: row.full,
		unit: row.unit ?? '',
		count: row.count
	};
}

function toolOf(row: StashRow): ToolSupply {
	const { reach, grooves, shape, size, cuts, lentUntil, borrowedUntil } = row;
	return {
		...owned(row),
		group: 'tool',
		kind: row.kind as ToolKind,
		...{ reach, grooves, shape, size, cuts, lentUntil, borrowedUntil }
	};
}

function owned({
	key,
	name,
	collection,
	bin,
	barcode,
	priceAmount,
	priceCurrency,
	arrives,
	entered
}: StashRow) {
	const price =
		priceAmount === null || priceCurrency === null ? null : { amount: priceAmount, currency: priceCurrency };
	return { key, name, collection, bin, barcode, price, arrives, ...(entered && { entered }) };
}
