import type { Sheet } from './shelf';

/** How far classes look over the other faces of a design's rows: as many steps as groups could form a chain. */
export const DEEPEST = 2;

/**
 * Numbers the classes of designs that are alike in everything that matching asks, up to their names: at depth 0
 * in the rows that show them, at depth d also in the classes of what stands on those rows' other faces. Fills
 * the lists that the rows' prints share.
 */
export function classifyDesigns(sheets: readonly Sheet[], lists: ReadonlyMap<string, number[]>): void {
	const rows = new Map<string, Sheet[]>();
	for (const sheet of sheets) {
		for (const design of new Set(sheet.prints.map((print) => print.design))) {
			const known = rows.get(design);
			if (known) known.push(sheet);
			else rows.set(design, [sheet]);
		}
	}
	for (let depth = 0; depth <= DEEPEST; depth++) {
		const numbers = new Map<string, number>();
		for (const [design, own] of rows) {
			const name = own
				.map((sheet) => nameOf(sheet, design, depth))
				.sort()
				.join(';');
			const number = numbers.get(name) ?? numbers.size;
			numbers.set(name, number);
			lists.get(design)?.push(number);
		}
	}
}

function nameOf(sheet: Sheet, design: string, depth: number): string {
	const faces = sheet.prints.map((print) => {
		const own = print.design === design;
		return `${own ? 'own' : 'other'}${print.bound ? '^' : ''}${own || depth === 0 ? '' : print.classes[depth - 1]}`;
	});
	return `${sheet.sort} ${sheet.count} ${faces.sort().join()}`;
}
