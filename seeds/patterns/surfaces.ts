import { ground, ink, round, type Pattern, type Sheet } from './sheet';

function flecks(
	{ w, h, random }: Sheet,
	count: number,
	colour: string,
	length: number,
	opacity: number
): string {
	let path = '';
	for (let i = 0; i < (count * w * h) / 1_440_000; i++) {
		const turn = random() * Math.PI;
		const reach = length * (0.4 + random());
		path += `M${round(random() * w)} ${round(random() * h)}q${round(Math.cos(turn) * reach)} ${round(Math.sin(turn) * reach * 0.4)} ${round(Math.cos(turn + 0.5) * reach)} ${round(Math.sin(turn + 0.5) * reach)}`;
	}
	return `<path d="${path}" fill="none" stroke="${colour}" stroke-width="1.3" opacity="${opacity}" stroke-linecap="round"/>`;
}

/** Solid stock: an even colour with the faintest tooth. */
export const solid: Pattern = (p, sheet) =>
	ground(ink(p, 0), sheet) +
	flecks(sheet, 2600, '#ffffff', 7, 0.16) +
	flecks(sheet, 2600, '#2b1d14', 6, 0.07);

export const kraft: Pattern = (p, sheet) =>
	ground(ink(p, 0), sheet) +
	flecks(sheet, 2600, ink(p, 1), 12, 0.35) +
	flecks(sheet, 1500, ink(p, 2), 10, 0.4);

export const board: Pattern = (p, sheet) =>
	ground(ink(p, 0), sheet) + flecks(sheet, 3600, ink(p, 1), 7, 0.4) + flecks(sheet, 1600, ink(p, 2), 9, 0.45);

export const fibres: Pattern = (p, sheet) =>
	ground(ink(p, 0), sheet) +
	flecks(sheet, 420, ink(p, 1), 90, 0.5) +
	flecks(sheet, 240, ink(p, 2), 130, 0.55);

/** Woven cloth: threads over and under. */
export const cloth: Pattern = (p, sheet) => {
	let warp = '';
	let weft = '';
	for (let x = 0; x < sheet.w; x += 8) warp += `M${x} 0V${sheet.h}`;
	for (let y = 0; y < sheet.h; y += 8) weft += `M0 ${y}H${sheet.w}`;
	return `${ground(ink(p, 0), sheet)}<path d="${warp}" stroke="${ink(p, 1)}" stroke-width="3" opacity=".4"/><path d="${weft}" stroke="${ink(p, 2)}" stroke-width="3" opacity=".32"/>${flecks(sheet, 900, ink(p, 2), 30, 0.25)}`;
};

export const sheen: Pattern = (p, sheet) => {
	const stops = [0, 0.22, 0.4, 0.58, 0.8, 1]
		.map((at, i) => `<stop offset="${at}" stop-color="${ink(p, i)}"/>`)
		.join('');
	let brushed = '';
	for (let i = 0; i < 500; i++) {
		const y = sheet.random() * sheet.h;
		const x = sheet.random() * sheet.w;
		brushed += `M${round(x)} ${round(y)}h${round(60 + sheet.random() * 240)}`;
	}
	return `<defs><linearGradient id="sheen" x1="0" y1="0" x2="1" y2="1">${stops}</linearGradient></defs><rect width="${sheet.w}" height="${sheet.h}" fill="url(#sheen)"/><path d="${brushed}" stroke="#ffffff" stroke-width="1" opacity=".18"/>`;
};

export const glitter: Pattern = (p, sheet) => {
	let body = ground(ink(p, 0), sheet);
	for (let i = 0; i < (9000 * sheet.w * sheet.h) / 1_440_000; i++) {
		const size = 3 + sheet.random() * 6;
		body += `<rect x="${round(sheet.random() * sheet.w)}" y="${round(sheet.random() * sheet.h)}" width="${round(size)}" height="${round(size)}" fill="${ink(p, Math.floor(sheet.random() * p.length))}" opacity="${round(0.5 + sheet.random() * 0.5)}"/>`;
	}
	return body;
};

/** Sheets that let light through: a pale tint with two slanting reflections. */
export const clear: Pattern = (p, sheet) =>
	`${ground(ink(p, 0), sheet)}<path d="M${sheet.w * 0.16} 0H${sheet.w * 0.4}L${sheet.w * 0.12} ${sheet.h}H${-sheet.w * 0.12}Z" fill="${ink(p, 1)}" opacity=".55"/><path d="M${sheet.w * 0.5} 0H${sheet.w * 0.56}L${sheet.w * 0.28} ${sheet.h}H${sheet.w * 0.22}Z" fill="${ink(p, 1)}" opacity=".5"/>${flecks(sheet, 300, ink(p, 2), 20, 0.2)}`;

/** A wash laid with a wide brush, darker where it pooled. */
export const wash: Pattern = (p, sheet) => {
	let body = ground(ink(p, 0), sheet);
	for (let i = 0; i < 70; i++) {
		const x = sheet.random() * sheet.w;
		const y = sheet.random() * sheet.h;
		const r = 60 + sheet.random() * 190;
		const edge = Array.from({ length: 14 }, (_, k) => {
			const turn = (k / 14) * Math.PI * 2;
			const reach = r * (0.8 + sheet.random() * 0.4);
			return { x: x + Math.cos(turn) * reach, y: y + Math.sin(turn) * reach * 0.7 };
		});
		const path = edge
			.map((point, k) => {
				const next = edge[(k + 1) % edge.length] ?? point;
				const mid = `${round((point.x + next.x) / 2)} ${round((point.y + next.y) / 2)}`;
				return k === 0 ? `M${mid}` : `Q${round(point.x)} ${round(point.y)} ${mid}`;
			})
			.join('');
		const first = edge[0] ?? { x, y };
		const close = `Q${round(first.x)} ${round(first.y)} ${path.slice(1).split('Q')[0]}`;
		const colour = ink(p, 1 + (i % (p.length - 1)));
		body += `<path d="${path}${close}Z" fill="${colour}" opacity=".14" stroke="${colour}" stroke-width="2" stroke-opacity=".12"/>`;
	}
	return body;
};
