import type { PlannedSheet } from '$lib/domain/matching/verdict';

/** Sheets of one paper that are cut alike, drawn once. */
export interface Layout {
	readonly sheet: PlannedSheet;
	/** Their places in the plan. */
	readonly places: readonly number[];
}

export function layoutsOf(sheets: readonly PlannedSheet[]): Layout[] {
	const layouts = new Map<string, { sheet: PlannedSheet; places: number[] }>();
	sheets.forEach((sheet, place) => {
		const { nth: _, ...alike } = sheet;
		const name = JSON.stringify(alike);
		const layout = layouts.get(name);
		if (layout) layout.places.push(place);
		else layouts.set(name, { sheet, places: [place] });
	});
	return [...layouts.values()];
}
