import { at, ground, ink, round, scattered, staggered, type Pattern } from './sheet';

const leaf = (length: number, width: number, colour: string) =>
	`<path d="M0 0C${width} ${-length * 0.25} ${width} ${-length * 0.7} 0 ${-length}C${-width} ${-length * 0.7} ${-width} ${-length * 0.25} 0 0Z" fill="${colour}"/>`;

/** A stem that grows upward from the origin, leaves in pairs that shorten towards its tip. */
function sprig(height: number, pairs: number, stem: string, leaves: readonly string[]): string {
	let body = `<path d="M0 0C${height * 0.06} ${-height * 0.35} ${-height * 0.06} ${-height * 0.7} 0 ${-height}" fill="none" stroke="${stem}" stroke-width="${round(height / 45)}" stroke-linecap="round"/>`;
	for (let i = 0; i < pairs; i++) {
		const up = height * (0.18 + (0.72 * i) / pairs);
		const size = height * 0.3 * (1 - (0.55 * i) / pairs);
		const colour = leaves[i % leaves.length] ?? stem;
		body += at(0, -up, leaf(size, size * 0.3, colour), 52) + at(0, -up, leaf(size, size * 0.3, colour), -52);
	}
	return body + at(0, -height + 2, leaf(height * 0.18, height * 0.05, leaves[0] ?? stem));
}

function flower(reach: number, petals: number, petal: string, heart: string, eye: string): string {
	const one = `<path d="M0 0C${reach * 0.5} ${-reach * 0.3} ${reach * 0.42} ${-reach} 0 ${-reach}C${-reach * 0.42} ${-reach} ${-reach * 0.5} ${-reach * 0.3} 0 0Z" fill="${petal}"/><path d="M0 ${-reach * 0.22}V${-reach * 0.62}" stroke="${eye}" stroke-width="${round(reach / 22)}" opacity=".5" stroke-linecap="round"/>`;
	const round_ = Array.from({ length: petals }, (_, i) => at(0, 0, one, (i * 360) / petals)).join('');
	return `${round_}<circle r="${round(reach * 0.24)}" fill="${heart}"/><circle r="${round(reach * 0.1)}" fill="${eye}"/>`;
}

/** A trellis of crossing laths with a fern standing in every diamond. */
export const fernLattice: Pattern = (p, sheet) => {
	let laths = '';
	const step = 150;
	for (let c = -sheet.h; c < sheet.w + sheet.h; c += step) {
		laths += `M${c} 0L${c + sheet.h / 1.25} ${sheet.h}M${c} 0L${c - sheet.h / 1.25} ${sheet.h}`;
	}
	const fern = sprig(108, 7, ink(p, 2), [ink(p, 2), ink(p, 3)]);
	let body =
		ground(ink(p, 0), sheet) + `<path d="${laths}" stroke="${ink(p, 1)}" stroke-width="7" fill="none"/>`;
	const rise = step * 1.25;
	for (let row = -1; row * (rise / 2) < sheet.h + rise; row++) {
		for (let x = (row % 2 === 0 ? 0 : step / 2) - step; x < sheet.w + step; x += step) {
			body += at(x, row * (rise / 2) + 54, fern);
		}
	}
	return body;
};

export const meadow: Pattern = (p, sheet) =>
	ground(ink(p, 0), sheet) +
	scattered(sheet, 92)
		.sort((a, b) => a.y - b.y)
		.map(({ x, y }) => {
			const kind = sheet.random();
			const lean = (sheet.random() - 0.5) * 22;
			const petal = ink(p, 3 + Math.floor(sheet.random() * (p.length - 3)));
			const height = 70 + sheet.random() * 45;
			if (kind < 0.34) return at(x, y + 40, sprig(height, 5, ink(p, 1), [ink(p, 1), ink(p, 2)]), lean);
			const stem = `<path d="M0 0C8 ${-height * 0.4} -6 ${-height * 0.7} 0 ${-height}" fill="none" stroke="${ink(p, 1)}" stroke-width="3"/>`;
			const blades = at(0, -10, leaf(44, 9, ink(p, 2)), 34) + at(0, -18, leaf(38, 8, ink(p, 2)), -38);
			const head =
				kind < 0.75
					? flower(25, 6, petal, ink(p, 4), ink(p, 0))
					: `<circle r="10" fill="${petal}"/><circle cx="-12" cy="12" r="8" fill="${petal}"/><circle cx="12" cy="13" r="8" fill="${petal}"/>`;
			return at(x, y + 40, stem + blades + at(0, -height, head), lean);
		})
		.join('');

/** Small tossed flowers: no way up. */
export const ditsy: Pattern = (p, sheet) =>
	ground(ink(p, 0), sheet) +
	scattered(sheet, 58)
		.map(({ x, y }, nth) => {
			const turn = sheet.random() * 360;
			if (nth % 3 === 0)
				return at(x, y, at(0, 0, leaf(30, 8, ink(p, 1)), 40) + at(0, 0, leaf(30, 8, ink(p, 1)), -40), turn);
			return at(
				x,
				y,
				flower(14 + sheet.random() * 9, 5, ink(p, 2 + (nth % (p.length - 2))), ink(p, 1), ink(p, 0)),
				turn
			);
		})
		.join('');

export const bouquet: Pattern = (p, sheet) =>
	ground(ink(p, 0), sheet) +
	staggered(sheet, 230, 170)
		.map(({ x, y, row, column }) => {
			const petal = ink(p, 3 + ((row + column) % (p.length - 3)));
			const greens = [ink(p, 1), ink(p, 2)];
			return at(
				x,
				y + 60,
				at(0, 0, sprig(118, 5, ink(p, 1), greens), -34) +
					at(0, 0, sprig(118, 5, ink(p, 1), greens), 34) +
					at(0, 0, sprig(90, 4, ink(p, 2), [ink(p, 2)]), 0) +
					at(-26, -64, flower(25, 6, ink(p, 4), ink(p, 3), ink(p, 0))) +
					at(28, -66, flower(23, 6, ink(p, 4), ink(p, 3), ink(p, 0))) +
					at(0, -88, flower(38, 8, petal, ink(p, 4), ink(p, 0))),
				column % 2 === 0 ? 5 : -5
			);
		})
		.join('');

export const fallingLeaves: Pattern = (p, sheet) =>
	ground(ink(p, 0), sheet) +
	scattered(sheet, 74)
		.map(({ x, y }) => {
			const length = 50 + sheet.random() * 32;
			const colour = ink(p, 1 + Math.floor(sheet.random() * (p.length - 1)));
			const veins = `<path d="M0 8V${-length * 0.88}M0 ${-length * 0.3}L9 ${-length * 0.44}M0 ${-length * 0.3}L-9 ${-length * 0.44}M0 ${-length * 0.5}L8 ${-length * 0.63}M0 ${-length * 0.5}L-8 ${-length * 0.63}" stroke="${ink(p, 0)}" stroke-width="2" fill="none" opacity=".75" stroke-linecap="round"/>`;
			return at(x, y, leaf(length, length * 0.36, colour) + veins, sheet.random() * 360);
		})
		.join('');

/** Columns of eucalyptus-like round leaves, all growing upward. */
export const climbing: Pattern = (p, sheet) => {
	let body = ground(ink(p, 0), sheet);
	for (let x = 50, column = 0; x < sheet.w + 50; x += 100, column++) {
		let vine = `M${x} ${sheet.h + 40}`;
		for (let y = sheet.h + 40; y > -80; y -= 120) vine += `c18-30 18-30 0-60s-18-30 0-60`;
		body += `<path d="${vine}" fill="none" stroke="${ink(p, 1)}" stroke-width="3.5"/>`;
		for (let y = sheet.h + 40 - (column % 2) * 30, nth = 0; y > -40; y -= 30, nth++) {
			const side = nth % 2 === 0 ? 1 : -1;
			const round_ = `<path d="M0 0C22-4 26-34 2-42C-20-32-18-8 0 0Z" fill="${ink(p, 2 + (nth % 3))}"/><path d="M0 0L1-30" stroke="${ink(p, 0)}" stroke-width="1.6" opacity=".7"/>`;
			body += at(x + side * 5, y, round_, side * 48);
		}
	}
	return body;
};
