import { at, ground, ink, scattered, staggered, type Pattern } from './sheet';

export const kites: Pattern = (p, sheet) =>
	ground(ink(p, 0), sheet) +
	staggered(sheet, 190, 135)
		.map(({ x, y, row, column }) => {
			const a = ink(p, 2 + ((row + column) % 3));
			const b = ink(p, 2 + ((row + column + 1) % 3));
			const tail = `<path d="M0 52C24 74-20 92 4 116" fill="none" stroke="${ink(p, 1)}" stroke-width="3"/>${at(6, 76, `<path d="M0 0l-13-8v16zM0 0l13-8v16z" fill="${b}"/>`, 20)}${at(-3, 99, `<path d="M0 0l-11-7v14zM0 0l11-7v14z" fill="${a}"/>`, -14)}`;
			return at(
				x,
				y,
				`${tail}<path d="M0-56L36-10L0 52Z" fill="${a}"/><path d="M0-56L-36-10L0 52Z" fill="${b}"/><path d="M0-56V52M-36-10H36" stroke="${ink(p, 0)}" stroke-width="2.4"/>`,
				column % 2 === 0 ? 16 : 22
			);
		})
		.join('');

export const boats: Pattern = (p, sheet) =>
	ground(ink(p, 0), sheet) +
	staggered(sheet, 180, 120)
		.map(({ x, y, row, column }) => {
			const sail = ink(p, 2 + ((row * 2 + column) % 3));
			return at(
				x,
				y,
				`<path d="M2-62V8" stroke="${ink(p, 1)}" stroke-width="3.4"/><path d="M8-58C34-36 40-14 42 0H8Z" fill="${sail}"/><path d="M-4-46C-20-26-26-10-28 0H-4Z" fill="${sail}" opacity=".62"/><path d="M-46 9H50C44 28 32 33 20 33H-22C-34 33-42 24-46 9Z" fill="${ink(p, 1)}"/><path d="M-66 42c11-9 22-9 33 0s22 9 33 0 22-9 33 0 22 9 33 0" fill="none" stroke="${ink(p, 2)}" stroke-width="3.2" stroke-linecap="round"/>`
			);
		})
		.join('');

export const moths: Pattern = (p, sheet) =>
	ground(ink(p, 0), sheet) +
	staggered(sheet, 200, 125)
		.map(({ x, y, row, column }) => {
			const wing = ink(p, 1 + ((row + column) % 3));
			const spot = ink(p, 4);
			const half = `<path d="M3-16C30-56 74-52 78-34C80-16 52 0 4 0Z" fill="${wing}"/><path d="M4 2C36 2 54 16 46 34C38 48 12 36 3 12Z" fill="${wing}" opacity=".78"/><circle cx="54" cy="-30" r="8" fill="${spot}"/><circle cx="54" cy="-30" r="3.6" fill="${ink(p, 0)}"/><path d="M14-18C30-32 44-38 66-40M14-8C30-12 46-14 64-20" stroke="${ink(p, 0)}" stroke-width="1.6" fill="none" opacity=".6"/><circle cx="30" cy="22" r="5" fill="${spot}"/>`;
			return at(
				x,
				y,
				`${half}<g transform="scale(-1 1)">${half}</g><path d="M0-24C7-12 7 18 0 36C-7 18-7-12 0-24Z" fill="${spot}"/><path d="M-1-24C-6-38-14-44-20-44M1-24C6-38 14-44 20-44" stroke="${spot}" stroke-width="2.2" fill="none" stroke-linecap="round"/>`,
				0,
				0.86
			);
		})
		.join('');

export const constellations: Pattern = (p, sheet) => {
	const stars = scattered(sheet, 72);
	let lines = '';
	for (let i = 0; i < stars.length; i++) {
		const from = stars[i];
		const to = stars
			.slice(i + 1)
			.find((other) => from && Math.hypot(other.x - from.x, other.y - from.y) < 120);
		if (from && to && sheet.random() < 0.45) lines += `M${from.x} ${from.y}L${to.x} ${to.y}`;
	}
	const dust = scattered(sheet, 22)
		.map(
			({ x, y }) =>
				`<circle cx="${x}" cy="${y}" r="${0.9 + sheet.random() * 1.2}" fill="${ink(p, 2)}" opacity=".7"/>`
		)
		.join('');
	const star = `<path d="M0-15C2-4 4-2 15 0C4 2 2 4 0 15C-2 4-4 2-15 0C-4-2-2-4 0-15Z" fill="${ink(p, 1)}"/>`;
	return (
		ground(ink(p, 0), sheet) +
		dust +
		`<path d="${lines}" stroke="${ink(p, 3)}" stroke-width="1.8" fill="none" stroke-dasharray="5 5"/>` +
		stars.map(({ x, y }) => at(x, y, star, 0, 0.45 + sheet.random() * 0.75)).join('')
	);
};

/** Overlapping scales, each a fan of rings: reads as water, and has a top. */
export const scales: Pattern = (p, sheet) => {
	const r = 60;
	let body = ground(ink(p, 0), sheet);
	for (let row = -1; row * 30 < sheet.h + r * 2; row++) {
		for (let x = (row % 2 === 0 ? 0 : r) - r * 2; x < sheet.w + r * 2; x += r * 2) {
			const y = row * 30 + 30;
			body += [1, 0.78, 0.56, 0.34]
				.map(
					(k, i) =>
						`<circle cx="${x}" cy="${y}" r="${r * k}" fill="${ink(p, i % 2 === 0 ? 0 : 1 + (Math.abs(row + Math.round(x / r)) % 5 === 0 ? 1 : 0))}" stroke="${ink(p, 3)}" stroke-width="2"/>`
				)
				.join('');
		}
	}
	return body;
};

/** Rows of postage: perforated frames round a plain emblem. */
export const postage: Pattern = (p, sheet) => {
	let body = ground(ink(p, 0), sheet);
	let nth = 0;
	for (let y = 12; y < sheet.h; y += 150) {
		for (let x = 12; x < sheet.w; x += 120, nth++) {
			const colour = ink(p, 2 + (nth % (p.length - 2)));
			let holes = '';
			for (let i = 0; i <= 8; i++)
				holes += `<circle cx="${i * 13}" cy="0" r="3.6"/><circle cx="${i * 13}" cy="132" r="3.6"/>`;
			for (let i = 0; i <= 10; i++)
				holes += `<circle cx="0" cy="${i * 13.2}" r="3.6"/><circle cx="104" cy="${i * 13.2}" r="3.6"/>`;
			const emblem = [
				`<circle cx="52" cy="60" r="25" fill="${ink(p, 0)}"/><circle cx="52" cy="60" r="16" fill="${colour}"/>`,
				`<path d="M52 34L78 84H26Z" fill="${ink(p, 0)}"/><path d="M52 56L66 84H38Z" fill="${colour}"/>`,
				at(
					52,
					88,
					[-40, 0, 40]
						.map((t) =>
							at(0, 0, `<path d="M0 0C14-14 14-38 0-54C-14-38-14-14 0 0Z" fill="${ink(p, 0)}"/>`, t)
						)
						.join('')
				)
			][nth % 3];
			body += at(
				x,
				y,
				`<rect width="104" height="132" fill="${ink(p, 1)}"/><g fill="${ink(p, 0)}">${holes}</g><rect x="11" y="11" width="82" height="110" fill="${colour}"/>${emblem}<path d="M20 108H84" stroke="${ink(p, 0)}" stroke-width="4" stroke-linecap="round" stroke-dasharray="16 7"/>`
			);
		}
	}
	return body;
};
