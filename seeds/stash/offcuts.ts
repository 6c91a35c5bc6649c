import type { Row, SheetDocument } from './row';

type Offcut = [key: string, of: string, size: string, sheets: number, bin: string];

/** What earlier projects left, each a piece of a paper that is in the stash: same print, same faces. */
const OFFCUTS: Offcut[] = [
	['oat-strip', 'oat-card', '4 1/4 x 11 in', 1, 'Offcut folder A'],
	['oat-end', 'oat-card', '3 x 12 in', 2, 'Offcut folder A'],
	['fern-end', 'fern-card', '5 x 6 1/2 in', 1, 'Offcut folder A'],
	['chalk-half', 'chalk-card', '4 1/4 x 8 1/2 in', 3, 'Offcut folder A'],
	['lattice-strip', 'fern-lattice', '12 x 3 1/4 in', 1, 'Offcut folder B'],
	['ditsy-square', 'haw-ditsy', '6 x 6 in', 1, 'Offcut folder B'],
	['leaf-strip', 'leaf-fall', '2 1/2 x 12 in', 2, 'Offcut folder B'],
	['plaid-end', 'satchel-plaid', '4 x 7 3/8 in', 1, 'Offcut folder B'],
	['swell-strip', 'long-swell', '12 x 2 3/4 in', 1, 'Offcut folder B'],
	['star-corner', 'star-drift', '5 1/2 x 8 in', 1, 'Offcut folder B'],
	['rose-strip', 'rose-check', '2 1/4 x 8 in', 2, 'Offcut folder B'],
	['gold-strip', 'gold-card', '1 1/2 x 12 in', 1, 'Offcut folder A'],
	['board-end', 'board-12', '3 x 8 1/2 in', 2, 'Board stand'],
	['cloth-end', 'tidal-cloth', '5 x 17 in', 1, 'Roll rack']
];

export function offcutsOf(papers: readonly Row[]): Row[] {
	return OFFCUTS.map(([key, of, size, sheets, bin]) => {
		const paper = papers.find(({ supply }) => supply.key === of);
		if (!paper) throw new Error(`No paper ${of} for the offcut ${key}.`);
		const {
			brandingStrip: _strip,
			barcode: _barcode,
			price: _price,
			count: _count,
			...whole
		} = paper.supply as SheetDocument;
		return {
			supply: {
				...whole,
				key,
				name: `${whole.name} offcut`,
				faces: whole.faces ?? [{ design: whole.name, direction: 'none' }],
				size,
				sheets,
				bin,
				offcut: true
			},
			print: paper.print
		};
	});
}
