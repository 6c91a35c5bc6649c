import type { Length } from '../length';
import type { ConsumableSupply, SheetGoods, SheetSupply, Supply, ToolSupply } from '../stash';
import { printsOf, type Print } from './prints';

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
}

/** The stash, sorted by what is asked of it. */
export interface Shelf {
	readonly sheets: ReadonlyMap<SheetGoods, readonly Sheet[]>;
	readonly consumables: readonly ConsumableSupply[];
	readonly tools: readonly ToolSupply[];
}

export function shelve(supplies: readonly Supply[], kerf: Length): Shelf {
	const sheets: Sheet[] = [];
	const consumables: ConsumableSupply[] = [];
	const tools: ToolSupply[] = [];
	supplies.forEach((supply, order) => {
		if (supply.group === 'sheet') {
			const sheet = sheetOf(supply, order, kerf);
			if (sheet.count > 0 && sheet.w > 0 && sheet.h > 0) sheets.push(sheet);
		} else if (supply.group === 'consumable') consumables.push(supply);
		else tools.push(supply);
	});
	return { sheets: byKind(sheets), consumables, tools };
}

export function byKind(sheets: readonly Sheet[]): Map<SheetGoods, Sheet[]> {
	const kinds = new Map<SheetGoods, Sheet[]>();
	for (const sheet of sheets) {
		const row = kinds.get(sheet.supply.kind);
		if (row) row.push(sheet);
		else kinds.set(sheet.supply.kind, [sheet]);
	}
	return kinds;
}

/** A branding strip comes off with the first cut, which takes at least the blade's width. */
export function sheetOf(supply: SheetSupply, order: number, kerf: Length): Sheet {
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
		remnant: false,
		prints: printsOf(supply)
	};
}

/** The shelf without what arrives after that day. */
export function shelfUntil(shelf: Shelf, day: string): Shelf {
	const isHere = ({ arrives }: Supply) => arrives === null || arrives <= day;
	return {
		sheets: byKind([...shelf.sheets.values()].flat().filter(({ supply }) => isHere(supply))),
		consumables: shelf.consumables.filter(isHere),
		tools: shelf.tools.filter(isHere)
	};
}
