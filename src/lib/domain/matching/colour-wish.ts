import type { SheetSupply } from '../stash';

/** How far a paper's nearest colour is from the wish, in OKLab; 0 without a wish, far where none is known. */
export function colourDistance(wish: string | null, { colours }: SheetSupply): number {
	const wanted = wish === null ? null : labOf(wish);
	if (!wanted) return 0;
	const known = colours.map(labOf).filter((lab) => lab !== null);
	return Math.min(
		FAR,
		...known.map((lab) => Math.hypot(lab[0] - wanted[0], lab[1] - wanted[1], lab[2] - wanted[2]))
	);
}

const FAR = 10;

type Lab = readonly [number, number, number];

/** Björn Ottosson, "A perceptual color space for image processing" (2020). */
function labOf(hex: string): Lab | null {
	const digits = /^#([0-9a-f]{2})([0-9a-f]{2})([0-9a-f]{2})$/i.exec(hex);
	if (!digits) return null;
	const [r, g, b] = [digits[1], digits[2], digits[3]].map((pair) =>
		linear(Number.parseInt(pair ?? '0', 16) / 255)
	) as [number, number, number];
	const l = Math.cbrt(0.4122214708 * r + 0.5363325363 * g + 0.0514459929 * b);
	const m = Math.cbrt(0.2119034982 * r + 0.6806995451 * g + 0.1073969566 * b);
	const s = Math.cbrt(0.0883024619 * r + 0.2817188376 * g + 0.6299787005 * b);
	return [
		0.2104542553 * l + 0.793617785 * m - 0.0040720468 * s,
		1.9779984951 * l - 2.428592205 * m + 0.4505937099 * s,
		0.0259040371 * l + 0.7827717662 * m - 0.808675766 * s
	];
}

function linear(value: number): number {
	return value <= 0.04045 ? value / 12.92 : ((value + 0.055) / 1.055) ** 2.4;
}
