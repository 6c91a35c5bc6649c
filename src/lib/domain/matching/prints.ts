import type { SheetSupply } from '../stash';

/** What stands on one face of a sheet. `bound`: it has an up, or an axis, that a piece may have to follow. */
export interface Print {
	readonly face: 'A' | 'B';
	/** Collection and name: see `designKey`. */
	readonly design: string;
	readonly name: string;
	readonly bound: boolean;
}

/** The faces that can be used. A row without faces shows its own name on both; a B-side nobody described is none. */
export function printsOf(supply: SheetSupply): Print[] {
	if (supply.faces.length === 0) {
		const design = designKey(supply.collection, supply.name);
		return (['A', 'B'] as const).map((face) => ({ face, design, name: supply.name, bound: false }));
	}
	return supply.faces.slice(0, 2).map((face, side) => ({
		face: side === 0 ? 'A' : 'B',
		design: designKey(supply.collection, face.design),
		name: face.design,
		bound: face.direction !== 'none'
	}));
}

function designKey(collection: string | null, name: string): string {
	return `${collection ?? ''}\n${name}`;
}
