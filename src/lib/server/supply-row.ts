import type { Length, LengthUnit } from '../domain/length';
import type {
	ConsumableKind,
	SheetGoods,
	SheetSupply,
	Supply,
	ToolKind,
	ToolSupply,
	ConsumableSupply
} from '../domain/stash';
import type { supplies } from './db/schema/supplies';

type Row = typeof supplies.$inferSelect;
export type StashRow = Omit<
	Row,
	'id' | 'roomId' | 'binId' | 'picture' | 'version' | 'createdAt' | 'deletedAt'
> & { readonly bin: string | null };
export type SupplyColumns = Omit<
	Row,
	'id' | 'roomId' | 'key' | 'amount' | 'binId' | 'picture' | 'version' | 'createdAt' | 'deletedAt'
>;

/** A stored row as the domain knows it. */
export function supplyOf(row: StashRow): Supply {
	if (row.group === 'sheet') return sheetOf(row);
	return row.group === 'tool' ? toolOf(row) : consumableOf(row);
}

/** How much of it there is: sheets, length, volume or count; one of a tool. */
export function amountOf(supply: Supply): number {
	if (supply.group === 'sheet') return supply.sheets;
	return supply.group === 'tool' ? 1 : supply.left;
}

/** What the table keeps of a supply, besides its amount, which is the ledger's, and its bin, which is a row. */
export function columnsOf(supply: Supply): SupplyColumns {
	const { group, kind, name, collection, barcode, price, arrives } = supply;
	return {
		...NOTHING,
		...{ group, kind, name, collection, barcode, arrives },
		entered: supply.entered ?? null,
		priceAmount: price?.amount ?? null,
		priceCurrency: price?.currency ?? null,
		...(supply.group === 'sheet' ? sheetColumns(supply) : {}),
		...(supply.group === 'consumable' ? consumableColumns(supply) : {}),
		...(supply.group === 'tool' ? toolColumns(supply) : {})
	};
}

const NOTHING = {
	w: null,
	h: null,
	unit: null,
	entered: null,
	count: 'counted' as const,
	faces: [],
	weightText: null,
	gsm: null,
	caliper: null,
	colours: [],
	offcut: false,
	stripEdge: null,
	stripDepth: null,
	width: null,
	full: null,
	reach: null,
	grooves: null,
	shape: null,
	size: null,
	cuts: [],
	lentUntil: null,
	borrowedUntil: null
};

function sheetColumns({ w, h, unit, count, faces, weight, caliper, colours, offcut, strip }: SheetSupply) {
	return {
		...{ w, h, unit, count, caliper, offcut },
		faces: [...faces],
		colours: [...colours],
		weightText: weight?.text ?? null,
		gsm: weight?.gsm ?? null,
		stripEdge: strip?.edge ?? null,
		stripDepth: strip?.depth ?? null
	};
}

function consumableColumns({ width, full, unit, count }: ConsumableSupply) {
	return { width, full, unit, count };
}

function toolColumns({ reach, grooves, shape, size, cuts, lentUntil, borrowedUntil }: ToolSupply) {
	return { reach, grooves, shape, size, cuts: [...cuts], lentUntil, borrowedUntil };
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
