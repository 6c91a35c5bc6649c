import sharp from 'sharp';
import { parseSize, INCH } from '../../src/lib/domain/length';
import { randomFrom, type Pattern, type Sheet } from './sheet';

export interface Print {
	readonly pattern: Pattern;
	readonly palette: readonly string[];
}

interface Drawn {
	readonly supply: { readonly key: string; readonly size?: string };
	readonly print?: Print;
}

/** Pictures of every paper with a print, by supply key, each with the file's name that it is kept under. */
export async function paintStash(
	rows: readonly Drawn[]
): Promise<Map<string, { file: string; image: Buffer }>> {
	const painted = rows.flatMap(({ supply: { key, size = '' }, print }) => {
		if (!print) return [];
		const read = parseSize(size, { unit: 'in' });
		if (!read.ok) throw new Error(`${key}: ${read.reason}`);
		return paint(key, print, read.w / INCH, read.h / INCH).then(
			(image) => [key, { file: `${key}.webp`, image }] as const
		);
	});
	return new Map(await Promise.all(painted));
}

/** Draws a print on a sheet of w × h inches, a hundred units to the inch: a WebP of at most 1,000 pixels a side. */
async function paint(name: string, print: Print, w: number, h: number): Promise<Buffer> {
	const sheet: Sheet = { w: Math.round(w * 100), h: Math.round(h * 100), random: randomFrom(name) };
	const body = print.pattern(print.palette, sheet);
	const svg = `<svg xmlns="http://www.w3.org/2000/svg" width="${sheet.w}" height="${sheet.h}" viewBox="0 0 ${sheet.w} ${sheet.h}">${body}</svg>`;
	return sharp(Buffer.from(svg), { unlimited: true })
		.resize({ width: 1000, height: 1000, fit: 'inside', withoutEnlargement: true })
		.webp({ quality: 80 })
		.toBuffer();
}
