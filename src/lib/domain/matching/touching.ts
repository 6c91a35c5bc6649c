import type { Bill } from '../bill/bill';
import { demandsOf } from './tools';
import type { SheetGoods, SheetSupply, Supply } from '../stash';
import type { Cost } from './layout';
import { isBelow } from './least-cost';
import { LIES } from '../cutting/problem';
import { roomFor } from './lies';
import type { Part } from './parts';
import { printsOf } from './prints';
import type { Matched } from './project';
import type { MatchOptions } from './verdict';

/** One row of the stash as it was and as it is; null where it is not there. */
export interface Change {
	readonly before: Supply | null;
	readonly after: Supply | null;
}

/** The rows that differ, or null where the rows that stayed stand in another order, which decides ties. */
export function changesBetween(before: readonly Supply[], after: readonly Supply[]): Change[] | null {
	const [was, is] = [before, after].map((rows) => new Map(rows.map((row) => [row.key, row])));
	if (!was || !is || was.size < before.length || is.size < after.length) return null;
	const stayed = after.filter(({ key }) => was.has(key));
	if (before.filter(({ key }) => is.has(key)).some(({ key }, i) => key !== stayed[i]?.key)) return null;
	return [
		...before.filter(({ key }) => !is.has(key)).map((row) => ({ before: row, after: null })),
		...after.flatMap((row) => {
			const known = was.get(row.key) ?? null;
			return known === row || JSON.stringify(known) === JSON.stringify(row)
				? []
				: [{ before: known, after: row }];
		})
	];
}

/** Whether changes of the stash could change what a project came to. Errs towards saying that they could. */
export class Touching {
	private readonly areas = new Map<string, number>();
	/** What whole sheets of a kind are priced in, before or after. */
	private readonly currencies = new Map<SheetGoods, Set<string | null>>();

	constructor(
		before: readonly Supply[],
		after: readonly Supply[],
		private readonly options: MatchOptions
	) {
		for (const supply of after) {
			if (supply.group !== 'sheet') continue;
			for (const design of designsOf(supply))
				this.areas.set(design, (this.areas.get(design) ?? 0) + supply.w * supply.h * supply.sheets);
		}
		for (const supply of [...before, ...after]) {
			if (supply.group !== 'sheet' || supply.offcut) continue;
			const known = this.currencies.get(supply.kind) ?? new Set();
			this.currencies.set(supply.kind, known.add(supply.price?.amount ? supply.price.currency : null));
		}
	}

	touches(matched: Matched, { before, after }: Change): boolean {
		const group = (before ?? after)?.group;
		if (group !== (after ?? before)?.group) return true;
		if (group === 'tool') return this.toolTouches(matched.bill, [before, after]);
		const kinds = kindsOf(matched.bill);
		if (![before, after].some((row) => row !== null && kinds.has(row.kind))) return false;
		if (group !== 'sheet' || !this.isSettled(matched, kinds)) return true;
		const [was, is] = [before, after] as (SheetSupply | null)[];
		const alike = was && is && JSON.stringify({ ...was, sheets: 0 }) === JSON.stringify({ ...is, sheets: 0 });
		if (!alike) return (was ? uses(matched, was) : false) || (is ? this.canGain(matched, is, 0) : false);
		return is.sheets < was.sheets ? uses(matched, was) : this.canGain(matched, is, was.sheets);
	}

	private toolTouches(bill: Bill, rows: readonly (Supply | null)[]): boolean {
		const trims = rows.some((row) => row?.kind === 'trimmer' || row?.kind === 'guillotine-cutter');
		return (
			demandsOf(bill).length > 0 || kindsOf(bill).has('chipboard') || (trims && this.options.reach === null)
		);
	}

	/** Every slot is met as the bill says, by no board, and what is paid for does not depend on which rows there are. */
	private isSettled({ bill, lines, parts }: Matched, kinds: ReadonlySet<string>): boolean {
		const now = lines.every(({ line, verdict }) => verdict === 'now' || !line.startsWith('slots/'));
		const wished = bill.slots.some(({ colour }) => colour !== null);
		const priced = new Set(
			[...kinds].flatMap((kind) => [...(this.currencies.get(kind as SheetGoods) ?? [])])
		);
		return now && parts.length > 0 && !wished && !kinds.has('chipboard') && priced.size <= 1;
	}

	/** A better plan must open more of the row than there was before, and show one of its designs where one is shown. */
	private canGain({ parts, layouts }: Matched, row: SheetSupply, before: number): boolean {
		const unit: Cost = row.offcut ? [0, 1] : [row.price?.amount || 1, 0];
		const least: Cost = [unit[0] * (before + 1), unit[1] * (before + 1)];
		return parts
			.filter((part) => part.slot.material.kind === row.kind && this.couldShow(part, row))
			.some((part) =>
				layouts.some(
					({ layout }) =>
						isBelow(least, layout.cost) &&
						layout.sheets.some(({ placements }) =>
							placements.some((laid) => laid.part.slot.key === part.slot.key)
						)
				)
			);
	}

	private couldShow({ pieces, single }: Part, row: SheetSupply): boolean {
		if (pieces.every((cut) => roomFor(cut, row) === LIES.never)) return false;
		const area = pieces.reduce((sum, { w, h, qty }) => sum + w * h * qty, 0);
		return !single || [...designsOf(row)].some((design) => (this.areas.get(design) ?? 0) >= area);
	}
}

function uses({ layouts }: Matched, { key }: SheetSupply): boolean {
	return layouts.some(({ layout }) => layout.sheets.some(({ sheet }) => sheet.supply.key === key));
}

function designsOf(supply: SheetSupply): Set<string> {
	return new Set(printsOf(supply, () => []).map(({ design }) => design));
}

/** Everything that a bill may ask the stash for, tools apart. */
function kindsOf({ slots, adhesives, extras }: Bill): Set<string> {
	return new Set([
		...slots.flatMap(({ material, swaps }) => [material.kind, ...swaps.map(({ kind }) => kind)]),
		...[...adhesives, ...extras].flatMap(({ kind, swaps }) => [kind, ...swaps.map((swap) => swap.kind)])
	]);
}
