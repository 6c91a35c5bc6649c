import type { SheetSupply } from '../stash';

/** What stands on one face of a sheet. `bound`: it has an up, or an axis, that a piece may have to follow. */
export interface Print {
	readonly face: 'A' | 'B';
	/** Collection and name: see `designKey`. */
	readonly design: string;
	readonly name: string;
	readonly bound: boolean;
	/** Classes of designs that are alike up to their names; see `classifyDesigns`. */
	readonly classes: readonly number[];
}

/** The faces that can be used. A row without faces shows its own name on both; a B-side nobody described is none. */
export function printsOf(supply: SheetSupply, classesOf: (design: string) => readonly number[]): Print[] {
	const print = (face: Print['face'], name: string, bound: boolean): Print => {
		const design = designKey(supply.collection, name);
		return { face, design, name, bound, classes: classesOf(design) };
	};
	if (supply.faces.length === 0) return [print('A', supply.name, false), print('B', supply.name, false)];
	return supply.faces
		.slice(0, 2)
		.map(({ design, direction }, side) => print(side === 0 ? 'A' : 'B', design, direction !== 'none'));
}

function designKey(collection: string | null, name: string): string {
	return `${collection ?? ''}\n${name}`;
}
