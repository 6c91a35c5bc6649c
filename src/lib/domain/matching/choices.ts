import type { Bill, Slot } from '../bill/bill';
import type { Supply } from '../stash';
import { usesFor } from './serving';
import { shelve } from './shelf';

/** A design of the stash that a slot may be cut from, on the terms of its bill. */
export interface Choice {
	readonly design: string;
	readonly collection: string | null;
	/** Whole sheets and offcuts that show it. */
	readonly sheets: number;
}

/** By slot, every design whose paper is of a kind that serves and large enough for each of the slot's pieces. */
export function designsFor(bill: Bill, supplies: readonly Supply[]): Record<string, Choice[]> {
	const shelf = shelve(supplies, 0);
	return Object.fromEntries(
		bill.slots.map((slot) => {
			const holds = roomFor(bill, slot);
			const choices = new Map<string, Choice>();
			for (const { sheet, prints } of usesFor({ ...slot, design: null, collection: null }, shelf)) {
				if (!holds(sheet)) continue;
				for (const { design, name } of new Map(prints.map((print) => [print.design, print])).values()) {
					const sheets = (choices.get(design)?.sheets ?? 0) + sheet.count;
					choices.set(design, { design: name, collection: sheet.supply.collection, sheets });
				}
			}
			return [slot.key, [...choices.values()]];
		})
	);
}

function roomFor({ pieces }: Bill, slot: Slot) {
	const own = pieces.filter((piece) => piece.slot === slot.key);
	return (sheet: { readonly w: number; readonly h: number }) =>
		own.every(({ w, h, allowance }) => {
			const [short, long] = [Math.min(w, h) - allowance, Math.max(w, h) - allowance];
			return short <= Math.min(sheet.w, sheet.h) && long <= Math.max(sheet.w, sheet.h);
		});
}
