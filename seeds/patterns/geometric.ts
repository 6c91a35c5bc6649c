import { at, ground, ink, round, scattered, staggered, type Pattern } from './sheet';

export const dots: Pattern = (p, sheet) =>
	ground(ink(p, 0), sheet) +
	staggered(sheet, 80, 40)
		.map(({ x, y, row, column }) => {
			const accent = (row + column * 3) % 11 === 0;
			return `<circle cx="${x}" cy="${y}" r="${accent ? 12 : 10}" fill="${accent ? ink(p, 2) : ink(p, 1)}"/>`;
		})
		.join('');

export const pinDots: Pattern = (p, sheet) =>
	ground(ink(p, 0), sheet) +
	staggered(sheet, 32, 16)
		.map(({ x, y }) => `<circle cx="${x}" cy="${y}" r="3.4" fill="${ink(p, 1)}"/>`)
		.join('');

export const confetti: Pattern = (p, sheet) =>
	ground(ink(p, 0), sheet) +
	scattered(sheet, 34)
		.map(({ x, y }) => {
			const colour = ink(p, 1 + Math.floor(sheet.random() * (p.length - 1)));
			const shape = sheet.random();
			if (shape < 0.5)
				return `<circle cx="${round(x)}" cy="${round(y)}" r="${round(5 + sheet.random() * 6)}" fill="${colour}"/>`;
			return at(
				x,
				y,
				`<rect x="-11" y="-3.5" width="22" height="7" rx="3.5" fill="${colour}"/>`,
				sheet.random() * 180
			);
		})
		.join('');

export const gingham: Pattern = (p, sheet) => {
	const step = 50;
	const bars = (length: number, draw: (from: number) => string) =>
		Array.from({ length: Math.ceil(length / (2 * step)) }, (_, i) => draw(i * 2 * step)).join('');
	return (
		ground(ink(p, 0), sheet) +
		bars(
			sheet.w,
			(x) => `<rect x="${x}" width="${step}" height="${sheet.h}" fill="${ink(p, 1)}" opacity=".48"/>`
		) +
		bars(
			sheet.h,
			(y) => `<rect y="${y}" width="${sheet.w}" height="${step}" fill="${ink(p, 1)}" opacity=".48"/>`
		)
	);
};

export const plaid: Pattern = (p, sheet) => {
	const bands = [
		{ from: 0, width: 90, colour: ink(p, 1), opacity: 0.42 },
		{ from: 104, width: 10, colour: ink(p, 2), opacity: 0.75 },
		{ from: 128, width: 34, colour: ink(p, 3), opacity: 0.4 },
		{ from: 176, width: 10, colour: ink(p, 2), opacity: 0.75 },
		{ from: 230, width: 6, colour: ink(p, 4), opacity: 0.9 }
	];
	const repeat = 290;
	let body = ground(ink(p, 0), sheet);
	for (let start = -100; start < Math.max(sheet.w, sheet.h); start += repeat) {
		for (const { from, width, colour, opacity } of bands) {
			body += `<rect x="${start + from}" width="${width}" height="${sheet.h}" fill="${colour}" opacity="${opacity}"/>`;
			body += `<rect y="${start + from}" width="${sheet.w}" height="${width}" fill="${colour}" opacity="${opacity}"/>`;
		}
	}
	return body;
};

/** Four-petalled tiles with a small square where four of them meet. */
export const tiles: Pattern = (p, sheet) => {
	const step = 150;
	const petal = `<path d="M0 0C34-16 44-46 0-70C-44-46-34-16 0 0Z" fill="${ink(p, 1)}"/><path d="M0-12C14-22 18-40 0-54C-18-40-14-22 0-12Z" fill="${ink(p, 0)}"/>`;
	const tile =
		[0, 90, 180, 270].map((turn) => at(0, 0, petal, turn)).join('') +
		`<circle r="11" fill="${ink(p, 2)}"/>` +
		[45, 135, 225, 315]
			.map((turn) => at(0, 0, `<path d="M0-58L16-74L0-90L-16-74Z" fill="${ink(p, 3)}"/>`, turn))
			.join('');
	let body = ground(ink(p, 0), sheet);
	for (let y = 0; y <= sheet.h + step; y += step) {
		for (let x = 0; x <= sheet.w + step; x += step) {
			body +=
				at(x, y, tile) +
				at(
					x + step / 2,
					y + step / 2,
					`<rect x="-15" y="-15" width="30" height="30" fill="${ink(p, 2)}"/>`,
					45
				);
		}
	}
	return body;
};

export const terrazzo: Pattern = (p, sheet) => {
	const chip = (size: number) => {
		const corners = 4 + Math.floor(sheet.random() * 3);
		return Array.from({ length: corners }, (_, i) => {
			const turn = ((i + sheet.random() * 0.55) / corners) * Math.PI * 2;
			const reach = size * (0.62 + sheet.random() * 0.5);
			return `${round(Math.cos(turn) * reach)} ${round(Math.sin(turn) * reach)}`;
		}).join('L');
	};
	const layer = (apart: number, size: number) =>
		scattered(sheet, apart)
			.map(({ x, y }) => {
				const colour = ink(p, 1 + Math.floor(sheet.random() * (p.length - 1)));
				return at(
					x,
					y,
					`<path d="M${chip(size * (0.5 + sheet.random() * 0.7))}Z" fill="${colour}" stroke="${colour}" stroke-width="3" stroke-linejoin="round"/>`
				);
			})
			.join('');
	return ground(ink(p, 0), sheet) + layer(26, 4) + layer(86, 27);
};
