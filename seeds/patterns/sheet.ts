/** A sheet to draw on, in hundredths of an inch; every pattern is drawn at the size it is printed. */
export interface Sheet {
	readonly w: number;
	readonly h: number;
	readonly random: () => number;
}

/** Draws a print on a sheet, from a palette whose first colour is the ground. Returns SVG elements. */
export type Pattern = (palette: readonly string[], sheet: Sheet) => string;

/** The same stream for the same name, so that a picture never changes between two seedings. */
export function randomFrom(name: string): () => number {
	let state = 2166136261;
	for (const letter of name) state = Math.imul(state ^ letter.charCodeAt(0), 16777619);
	return () => {
		state = (state + 0x6d2b79f5) | 0;
		let mixed = Math.imul(state ^ (state >>> 15), 1 | state);
		mixed = (mixed + Math.imul(mixed ^ (mixed >>> 7), 61 | mixed)) ^ mixed;
		return ((mixed ^ (mixed >>> 14)) >>> 0) / 4294967296;
	};
}

export const ground = (colour: string, { w, h }: Sheet) =>
	`<rect width="${w}" height="${h}" fill="${colour}"/>`;

/** The palette's nth colour, going round. */
export const ink = (palette: readonly string[], nth: number) => palette[nth % palette.length] ?? '#888888';

export const at = (x: number, y: number, body: string, turn = 0, size = 1) =>
	`<g transform="translate(${round(x)} ${round(y)}) rotate(${round(turn)}) scale(${round(size)})">${body}</g>`;

export const round = (n: number) => Math.round(n * 100) / 100;

/** Points over the sheet (and a little past its edges) in rows, each row moved by half a step. */
export function staggered(
	{ w, h }: Sheet,
	stepX: number,
	stepY: number
): { x: number; y: number; row: number; column: number }[] {
	const points = [];
	for (let row = -1; row * stepY <= h + stepY; row++) {
		for (let column = -1; column * stepX <= w + stepX; column++) {
			points.push({
				x: (column + (row % 2 === 0 ? 0 : 0.5)) * stepX,
				y: row * stepY,
				row: row + 1,
				column: column + 1
			});
		}
	}
	return points;
}

/** Points scattered with at least `apart` between them: Bridson's dart throwing, kept simple. */
export function scattered({ w, h, random }: Sheet, apart: number): { x: number; y: number }[] {
	const points: { x: number; y: number }[] = [];
	const throws = Math.ceil((w * h * 14) / (apart * apart));
	for (let i = 0; i < throws; i++) {
		const x = random() * (w + apart) - apart / 2;
		const y = random() * (h + apart) - apart / 2;
		if (points.every((other) => (other.x - x) ** 2 + (other.y - y) ** 2 >= apart * apart))
			points.push({ x, y });
	}
	return points;
}
