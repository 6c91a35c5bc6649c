import { checkPlan } from '../cutting';
import { LIES, type Cut, type CutProblem, type Rect } from '../cutting/problem';
import type { Length } from '../length';
import { plannedSheet } from './assembly';
import type { LaidSheet } from './layout';
import type { PricedLayout } from './project';
import { stockOf } from './shelf';
import type { SheetSupply } from '../stash';
import type { MatchOptions, PlannedSheet } from './verdict';

/** A sheet with all that any project cuts from it. */
export interface WholeSheet {
	readonly sheet: PlannedSheet;
	/** Of its row in the stash. */
	readonly order: number;
	readonly supply: SheetSupply;
}

/** Every opened sheet once, with what was cut from its remnants; `reach` as in `plannedSheet`. */
export function wholeSheets(
	layouts: readonly PricedLayout[],
	reach: Length | null,
	options: MatchOptions
): WholeSheet[] {
	const whole = new Map<string, WholeSheet>();
	for (const laid of layouts.flatMap(({ layout }) => layout.sheets)) {
		const key = sheetName(laid);
		const known = whole.get(key)?.sheet;
		const added = plannedSheet(laid, reach, options);
		const { order, supply } = laid.sheet;
		whole.set(key, {
			sheet: known ? cutFurther(known, added, laid) : added,
			order,
			supply
		});
	}
	return [...whole.values()];
}

/** Whether the checker passes every sheet that `touched` opens, as all the layouts together cut it. */
export function areSoundTogether(
	layouts: readonly PricedLayout[],
	touched: readonly PricedLayout[],
	options: MatchOptions
): boolean {
	const names = new Set(touched.flatMap(({ layout }) => layout.sheets.map(sheetName)));
	const concerned = layouts.map(({ layout, dearest }) => ({
		dearest,
		layout: { ...layout, sheets: layout.sheets.filter((laid) => names.has(sheetName(laid))) }
	}));
	return wholeSheets(concerned, null, options).every((whole) => isSoundSheet(whole, options));
}

/** A sheet by itself, its strip off, its pieces as they lie; a knife's cuts are in no order to be replayed. */
function isSoundSheet({ sheet, supply }: WholeSheet, { kerf, knife }: MatchOptions): boolean {
	const { w, h, x, y } = stockOf(supply, 0, kerf);
	const moved = <R extends Rect>(rect: R): R => ({ ...rect, x: rect.x - x, y: rect.y - y });
	const placements = sheet.placements.map(moved);
	const isStrip = ({ of }: Cut) => supply.strip !== null && of.w === supply.w && of.h === supply.h;
	const cuts = sheet.cuts
		.filter((cut) => !isStrip(cut))
		.map((cut) => ({ ...cut, at: cut.at - (cut.axis === 'down' ? x : y), of: moved(cut.of) }));
	const problem: CutProblem = {
		kerf,
		interlocked: knife,
		sheets: [{ w, h, count: 1, cost: [0, 0] }],
		pieces: placements.map((at) => ({ w: at.w, h: at.h, qty: 1, lies: [LIES.upright] }))
	};
	const laid = placements.map((at, piece) => ({ piece, x: at.x, y: at.y, w: at.w, h: at.h, turned: false }));
	const made = knife ? { cuts: [], offcuts: [] } : { cuts, offcuts: sheet.offcuts.map(moved) };
	const plan = { sheets: [{ sheet: 0, placements: laid, ...made }], cost: [0, 0] as const };
	return sheet.nth <= supply.sheets && checkPlan(problem, plan).length === 0;
}

function sheetName({ sheet, nth }: LaidSheet): string {
	return JSON.stringify([sheet.supply.key, nth]);
}

/** A sheet of which a remnant was cut from for another project. */
function cutFurther(sheet: PlannedSheet, added: PlannedSheet, { sheet: remnant }: LaidSheet): PlannedSheet {
	const isLeft = ({ x, y, w, h }: PlannedSheet['offcuts'][number]) =>
		x !== remnant.x || y !== remnant.y || w !== remnant.w || h !== remnant.h;
	return {
		...sheet,
		placements: [...sheet.placements, ...added.placements],
		cuts: [...sheet.cuts, ...added.cuts],
		offcuts: [...sheet.offcuts.filter(isLeft), ...added.offcuts]
	};
}
