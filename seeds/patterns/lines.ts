import { ground, ink, round, type Pattern, type Sheet } from './sheet';

/** Upright bands repeated across the sheet; each is a width and the nth colour. */
function bands(sheet: Sheet, widths: readonly (readonly [width: number, colour: string])[]): string {
	let body = '';
	let x = 0;
	while (x < sheet.w) {
		for (const [width, colour] of widths) {
			body += `<rect x="${round(x)}" width="${width + 0.5}" height="${sheet.h}" fill="${colour}"/>`;
			x += width;
		}
	}
	return body;
}

export const awning: Pattern = (p, sheet) =>
	bands(sheet, [
		[60, ink(p, 0)],
		[60, ink(p, 1)]
	]);

export const ticking: Pattern = (p, sheet) =>
	bands(sheet, [
		[26, ink(p, 0)],
		[4, ink(p, 1)],
		[8, ink(p, 0)],
		[14, ink(p, 1)],
		[8, ink(p, 0)],
		[4, ink(p, 1)]
	]);

export const ribbonStripe: Pattern = (p, sheet) =>
	bands(sheet, [
		[70, ink(p, 0)],
		[8, ink(p, 1)],
		[24, ink(p, 2)],
		[8, ink(p, 1)],
		[30, ink(p, 0)],
		[40, ink(p, 3)],
		[30, ink(p, 0)],
		[5, ink(p, 4)]
	]);

function waveLine(sheet: Sheet, y: number, rise: number, length: number, phase: number): string {
	let path = `M${round(-length + phase)} ${round(y)}`;
	for (let x = -length + phase; x < sheet.w + length; x += length) {
		path += `c${round(length / 4)} ${-rise} ${round(length / 4)} ${-rise} ${round(length / 2)} 0s${round(length / 4)} ${rise} ${round(length / 2)} 0`;
	}
	return path;
}

export const swell: Pattern = (p, sheet) => {
	let body = ground(ink(p, 0), sheet);
	let row = 0;
	for (let y = -30; y < sheet.h + 40; y += 30, row++) {
		const wide = row % 4 === 0;
		body += `<path d="${waveLine(sheet, y, 26, 150, (row % 2) * 38)}" fill="none" stroke="${ink(p, wide ? 1 : 2 + (row % 3 === 0 ? 1 : 0))}" stroke-width="${wide ? 13 : 4}" stroke-linecap="round"/>`;
	}
	return body;
};

export const herringbone: Pattern = (p, sheet) => {
	let body = ground(ink(p, 0), sheet);
	const column = 60;
	for (let x = 0, nth = 0; x < sheet.w; x += column, nth++) {
		const lean = nth % 2 === 0 ? -50 : 50;
		for (let y = -60; y < sheet.h + 60; y += 26) {
			const from = y + (lean < 0 ? 50 : 0);
			body += `<path d="M${x + 3} ${from}L${x + column - 3} ${from + lean}" stroke="${ink(p, 1 + ((nth + Math.round(y / 26)) % 7 === 0 ? 1 : 0))}" stroke-width="9" stroke-linecap="butt"/>`;
		}
	}
	return body;
};

/** Figures in a clerk's hand, each from its top left. */
const DIGITS = [
	'm4 0l-2 14',
	'm0 3c1-5 9-4 7 1l-8 10h9',
	'm0 1h8l-5 13',
	'm7 0h-6l-1 6c5-3 9 0 8 4s-7 5-9 2',
	'm4 0c-6 3-6 13 0 14s7-12 0-14'
];

/** Ruled account paper: feint lines, money columns, a heavier head. */
export const ledger: Pattern = (p, sheet) => {
	let body = ground(ink(p, 0), sheet);
	for (let y = 120; y < sheet.h; y += 26)
		body += `<path d="M0 ${y}H${sheet.w}" stroke="${ink(p, 1)}" stroke-width="1.6" opacity=".8"/>`;
	for (const x of [86, 92, sheet.w * 0.62, sheet.w * 0.74, sheet.w * 0.745, sheet.w * 0.87]) {
		body += `<path d="M${round(x)} 0V${sheet.h}" stroke="${ink(p, 2)}" stroke-width="2.4"/>`;
	}
	body += `<path d="M0 86H${sheet.w}M0 93H${sheet.w}" stroke="${ink(p, 2)}" stroke-width="3"/>`;
	for (let y = 120, nth = 1; y < sheet.h - 26; y += 26, nth++) {
		if (sheet.random() < 0.3) continue;
		for (const right of [0.73, 0.86, 0.985]) {
			if (sheet.random() < 0.45) continue;
			const strokes = Array.from({ length: 2 + Math.floor(sheet.random() * 3) }, (_, i) => {
				const x = sheet.w * right - 12 - i * 13;
				return `M${round(x)} ${y + 7}${DIGITS[Math.floor(sheet.random() * DIGITS.length)]}`;
			});
			body += `<path d="${strokes.join('')}" fill="none" stroke="${ink(p, 3)}" stroke-width="2" stroke-linecap="round"/>`;
		}
	}
	return body;
};

/** Joined-up strokes, each starting and ending on the line, in x-heights. */
const STROKES = [
	'c.35-.1.7-.45.6-.8c-.08-.3-.5-.25-.55.25c-.04.45.3.65.75.55',
	'c.45-.3.8-1.6.6-2c-.15-.3-.45 0-.5.8c-.05.8.05 1.3.5 1.2',
	'c.2-.3.25-.7.35-.9c.05.3-.05.7-.1.9c.15-.6.4-1 .6-.9c.2.1-.1.8.15.9',
	'c.1-.3.2-.6.25-.9c-.1.5-.1.9.15.9c.25 0 .4-.5.45-.9c-.05.4-.05.9.2.9',
	'c.2-.7.6-1 .8-.8c-.1.9-.2 1.9-.6 2.3c-.4.3-.5-.3.1-.9c.3-.3.5-.5.7-.6',
	'c.2-.4.4-1.2.5-1.5c-.1.5-.25 1.5.2 1.5',
	'c.2-.6.5-1 .75-.85c.3.2.1.8-.25.85c-.35.05-.4-.6 0-.85c.15-.1.4 0 .55.1c.1.3.1.6.3.75'
].map((path) => path.replace(/-?\d*\.?\d+/g, (n) => ` ${round(Number(n) * 26)}`));

export const script: Pattern = (p, sheet) => {
	let body = ground(ink(p, 0), sheet);
	for (let y = 50; y < sheet.h + 60; y += 62) {
		let path = '';
		for (let x = -60 + sheet.random() * 50; x < sheet.w + 200;) {
			path += `M${round(x)} ${y}`;
			const letters = 3 + Math.floor(sheet.random() * 7);
			for (let i = 0; i < letters; i++) {
				path += STROKES[Math.floor(sheet.random() * STROKES.length)] ?? '';
				x += 22;
			}
			x += 26;
		}
		body += `<g transform="translate(0 ${y}) skewX(-20) translate(0 ${-y})"><path d="${path}" fill="none" stroke="${ink(p, 1)}" stroke-width="2.3" stroke-linecap="round" stroke-linejoin="round"/></g>`;
	}
	return body;
};
