import type { Face, SheetGoods } from '$lib/domain/stash';

/** What a drawing needs to know of a paper: never its price, its bin or its count. */
export interface Paper {
	readonly name: string;
	readonly kind: SheetGoods;
	readonly colours: readonly string[];
	readonly faces: readonly Face[];
	/** Where its own picture of face A is, or null. */
	readonly picture: string | null;
}

/** A sheet's colour where nobody gave one. */
const KIND_COLOURS: Readonly<Record<SheetGoods, string>> = {
	'patterned-paper': '#d9b891',
	cardstock: '#e8d7b8',
	chipboard: '#b79d80',
	vellum: '#eef0ea',
	'plain-paper': '#f5efe2',
	'kraft-paper': '#b98b5e',
	'watercolour-paper': '#f1e9da',
	'mulberry-paper': '#e7dcc6',
	'metallic-paper': '#c9b26b',
	'glitter-paper': '#cdb3c0',
	acetate: '#dbe7e6',
	'book-cloth': '#6f7f7c',
	felt: '#87957c',
	'magnet-sheet': '#55504c',
	'adhesive-sheet': '#efe5cd'
};

const HEX = /^#[0-9a-f]{6}$/i;

/** Ground and print of a generated picture: the paper's own colours, else its kind's and one darker. */
export function groundAndPrint(paper: Paper): readonly [string, string] {
	const [first, second] = paper.colours.filter((colour) => HEX.test(colour));
	const ground = first ?? KIND_COLOURS[paper.kind];
	return [ground, second ?? `color-mix(in oklab, ${ground}, ${isDark(ground) ? 'white' : 'black'} 18%)`];
}

export const hasUp = (paper: Paper) => paper.faces[0] !== undefined && paper.faces[0].direction !== 'none';

/** The design on its other side, where it has one: what is lost when face A is cut. */
export const otherFace = (paper: Paper): Face | null => paper.faces[1] ?? null;

function isDark(hex: string): boolean {
	const [r = 0, g = 0, b = 0] = [1, 3, 5].map((at) => Number.parseInt(hex.slice(at, at + 2), 16));
	return 0.299 * r + 0.587 * g + 0.114 * b < 110;
}
