import type { Material, Slot } from '../bill/bill';
import type { SheetSupply } from '../stash';
import type { Terms } from './parts';
import type { Print } from './prints';
import type { Sheet, Shelf } from './shelf';

/** One way in which a row meets a slot: `material` -1 is the slot's own, else the swap's number. */
export interface Way {
	readonly material: number;
	/** The property that the slot demands and the row doesn't state. */
	readonly unsaid: 'weight' | 'caliper' | null;
}

/** A row that can serve a slot on some terms, and the faces that show what the slot asks for. */
export interface Use {
	readonly sheet: Sheet;
	readonly prints: readonly Print[];
	readonly ways: readonly Way[];
}

/** Every row that could serve the slot on the most generous terms, in the stash's order. */
export function usesFor(slot: Slot, shelf: Shelf): Use[] {
	const kinds = new Set([slot.material.kind, ...slot.swaps.map((swap) => swap.kind)]);
	const uses: Use[] = [];
	for (const kind of kinds) {
		for (const sheet of shelf.sheets.get(kind) ?? []) {
			const ways = waysOf(slot, sheet.supply);
			if (ways.length === 0) continue;
			const prints =
				slot.design === null ? sheet.prints : sheet.prints.filter((print) => isChosen(slot, sheet, print));
			if (prints.length > 0) uses.push({ sheet, prints, ways });
		}
	}
	return kinds.size > 1 ? uses.sort((a, b) => a.sheet.order - b.sheet.order) : uses;
}

/** The first way that the terms allow, null where they allow none. */
export function wayOn(use: Use, terms: Pick<Terms, 'on' | 'level' | 'unsure'>): Way | null {
	const { supply } = use.sheet;
	if (supply.arrives !== null && supply.arrives > terms.on) return null;
	if (supply.count === 'unsure' && !terms.unsure) return null;
	const swaps = Math.max(0, terms.level - 1);
	return use.ways.find((way) => way.material < swaps && (way.unsaid === null || terms.unsure)) ?? null;
}

/** Sure ways first, then the slot's own material before its swaps in their order. */
function waysOf(slot: Slot, supply: SheetSupply): Way[] {
	const ways: Way[] = [];
	const add = (material: Material, number: number) => {
		const unsaid = fits(material, supply);
		if (unsaid !== 'no') ways.push({ material: number, unsaid });
	};
	add(slot.material, -1);
	slot.swaps.forEach(add);
	return ways.length > 1 ? ways.sort((a, b) => Number(a.unsaid !== null) - Number(b.unsaid !== null)) : ways;
}

function fits(material: Material, supply: SheetSupply): Way['unsaid'] | 'no' {
	if (material.kind !== supply.kind) return 'no';
	const weight = within(material.weight && gsmRange(material.weight), supply.weight?.gsm ?? null);
	const caliper = within(material.caliper, supply.caliper);
	if (weight === 'no' || caliper === 'no') return 'no';
	return weight === 'unsaid' ? 'weight' : caliper === 'unsaid' ? 'caliper' : null;
}

function within(
	range: { min: number | null; max: number | null } | null,
	value: number | null
): 'yes' | 'unsaid' | 'no' {
	if (!range || (range.min === null && range.max === null)) return 'yes';
	if (value === null) return 'unsaid';
	return value >= (range.min ?? -Infinity) && value <= (range.max ?? Infinity) ? 'yes' : 'no';
}

function gsmRange(weight: NonNullable<Material['weight']>): { min: number | null; max: number | null } {
	return { min: weight.min?.gsm ?? null, max: weight.max?.gsm ?? null };
}

function isChosen(slot: Slot, sheet: Sheet, print: Print): boolean {
	return (
		print.name === slot.design && (slot.collection === null || slot.collection === sheet.supply.collection)
	);
}
