import type { Length } from '../length';
import type { ConsumableSupply, SheetGoods, SheetSupply, Supply, ToolSupply } from '../stash';
import { classifyDesigns } from './design-classes';
import { printsOf, type Print } from './prints';
import type { Uses } from './uses';

/** A row of sheets, or what is left of one sheet that an earlier project opened, as the planner may use it. */
export interface Sheet {
	readonly supply: SheetSupply;
	/** Place in the stash's order; a remnant stands where its row does. */
	readonly order: number;
	/** What it offers, without its branding strip, and where that lies on the whole sheet. */
	readonly w: Length;
	readonly h: Length;
	readonly x: Length;
	readonly y: Length;
	readonly count: number;
	/** The `nth` of the first of them. */
	readonly first: number;
	/** Left over from a sheet that is already opened. */
	readonly remnant: boolean;
	readonly prints: readonly Print[];
	/** Equal for rows that differ in their names, designs, colours and counts only. */
	readonly sort: number;
	/** An offcut of the stash's, or a remnant: not a whole sheet. */
	readonly left: boolean;
}

/** The stash, sorted by what is asked of it. */
export interface Shelf {
	readonly sheets: ReadonlyMap<SheetGoods, readonly Sheet[]>;
	readonly consumables: readonly ConsumableSupply[];
	readonly tools: readonly ToolSupply[];
	/** What slots that ask for the same have found here. */
	readonly found: Map<string, Uses>;
	/** The shelf without what arrives after a day, by day. */
	readonly until: Map<string, Shelf>;
}

/** A row as far as it may be used: some of its sheets, or a remnant of one. */
export type Stock = Pick<Sheet, 'w' | 'h' | 'x' | 'y' | 'count' | 'first' | 'remnant'> & {
	readonly supply: SheetSupply;
	readonly order: number;
};

export function shelve(supplies: readonly Supply[], kerf: Length): Shelf {
	const stock: Stock[] = [];
	const consumables: ConsumableSupply[] = [];
	const tools: ToolSupply[] = [];
	supplies.forEach((supply, order) => {
		if (supply.group === 'sheet') stock.push(stockOf(supply, order, kerf));
		else if (supply.group === 'consumable') consumables.push(supply);
		else tools.push(supply);
	});
	return shelfOf(stock, consumables, tools);
}

export function shelfOf(
	stock: readonly Stock[],
	consumables: readonly ConsumableSupply[],
	tools: readonly ToolSupply[]
): Shelf {
	const classes = new Map<string, number[]>();
	const classesOf = (design: string) => {
		const known = classes.get(design) ?? [];
		classes.set(design, known);
		return known;
	};
	const usable = stock.filter(({ count, w, h }) => count > 0 && w > 0 && h > 0);
	const sorts = new Map<string, number>();
	const sheets = usable.map((one) => {
		const name = sortOf(one);
		const sort = sorts.get(name) ?? sorts.size;
		sorts.set(name, sort);
		return { ...one, prints: printsOf(one.supply, classesOf), sort, left: one.remnant || one.supply.offcut };
	});
	classifyDesigns(sheets, classes);
	return { sheets: byKind(sheets), consumables, tools, found: new Map(), until: new Map() };
}

/** A branding strip comes off with the first cut, which takes at least the blade's width. */
export function stockOf(supply: SheetSupply, order: number, kerf: Length): Stock {
	const { strip } = supply;
	const off = strip ? Math.max(strip.depth, kerf) : 0;
	const across = strip?.edge === 'top' || strip?.edge === 'bottom';
	return {
		supply,
		order,
		w: supply.w - (strip && !across ? off : 0),
		h: supply.h - (strip && across ? off : 0),
		x: strip?.edge === 'left' ? off : 0,
		y: strip?.edge === 'top' ? off : 0,
		count: supply.sheets,
		first: 1,
		remnant: false
	};
}

/** The shelf without what arrives after that day. */
export function shelfUntil(shelf: Shelf, day: string): Shelf {
	const known = shelf.until.get(day);
	if (known) return known;
	const isHere = ({ arrives }: Supply) => arrives === null || arrives <= day;
	const stock = [...shelf.sheets.values()].flat().sort((a, b) => a.order - b.order);
	const made = shelfOf(
		stock.filter(({ supply }) => isHere(supply)),
		shelf.consumables.filter(isHere),
		shelf.tools.filter(isHere)
	);
	shelf.until.set(day, made);
	return made;
}

function sortOf({ supply, w, h, remnant }: Stock): string {
	const { kind, weight, caliper, offcut, price, count, arrives, strip } = supply;
	const cost = remnant || offcut ? 'left' : price ? `${price.amount} ${price.currency}` : '';
	const paper = `${weight?.gsm ?? ''} ${caliper ?? ''} ${count} ${arrives ?? ''}`;
	return `${kind} ${w} ${h} ${strip ? `${supply.w} ${supply.h}` : ''} ${cost}|${paper}`;
}

function byKind(sheets: readonly Sheet[]): Map<SheetGoods, Sheet[]> {
	const kinds = new Map<SheetGoods, Sheet[]>();
	for (const sheet of sheets) {
		const row = kinds.get(sheet.supply.kind);
		if (row) row.push(sheet);
		else kinds.set(sheet.supply.kind, [sheet]);
	}
	return kinds;
}
