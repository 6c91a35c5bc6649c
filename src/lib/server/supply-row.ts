import type { ConsumableSupply, SheetSupply, Supply, ToolSupply } from '../domain/stash';
import type { supplies } from './db/schema/supplies';

export { supplyOf } from '../domain/stash-row';

type Row = typeof supplies.$inferSelect;
export type SupplyColumns = Omit<
	Row,
	'id' | 'roomId' | 'key' | 'amount' | 'binId' | 'picture' | 'version' | 'createdAt' | 'deletedAt'
>;

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
