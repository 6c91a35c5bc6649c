import sharp from 'sharp';
import { randomFrom, type Pattern, type Sheet } from './sheet';

export interface Print {
	readonly pattern: Pattern;
	readonly palette: readonly string[];
}

/** Draws a print on a sheet of w × h inches: a WebP of at most 1,000 pixels on its longer side. */
export async function paint(name: string, print: Print, w: number, h: number): Promise<Buffer> {
	const sheet: Sheet = { w: Math.round(w * 100), h: Math.round(h * 100), random: randomFrom(name) };
	const body = print.pattern(print.palette, sheet);
	const svg = `<svg xmlns="http://www.w3.org/2000/svg" width="${sheet.w}" height="${sheet.h}" viewBox="0 0 ${sheet.w} ${sheet.h}">${body}</svg>`;
	return sharp(Buffer.from(svg), { unlimited: true })
		.resize({ width: 1000, height: 1000, fit: 'inside', withoutEnlargement: true })
		.webp({ quality: 80 })
		.toBuffer();
}
