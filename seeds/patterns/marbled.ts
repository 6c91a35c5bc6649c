import { ground, ink, round, type Pattern, type Sheet } from './sheet';

interface Point {
	x: number;
	y: number;
}
interface Drop {
	readonly colour: string;
	points: Point[];
}

/** A new drop of radius r at c pushes all earlier ink outward without changing its area. */
function push(points: Point[], c: Point, r: number): Point[] {
	return points.map((point) => {
		const dx = point.x - c.x;
		const dy = point.y - c.y;
		const grow = Math.sqrt(1 + (r * r) / Math.max(dx * dx + dy * dy, 1));
		return { x: c.x + dx * grow, y: c.y + dy * grow };
	});
}

/** A tine drawn along the y axis at x = line drags ink with it, less the farther away. */
function comb(points: Point[], line: number, pull: number, soft: number): Point[] {
	return points.map(({ x, y }) => ({ x, y: y + pull * Math.pow(soft, Math.abs(x - line)) }));
}

function bath(p: readonly string[], sheet: Sheet, drops: number): Drop[] {
	const ink_: Drop[] = [];
	for (let i = 0; i < drops; i++) {
		const c = { x: sheet.random() * sheet.w, y: sheet.random() * sheet.h };
		const r = 45 + sheet.random() * 75;
		for (const drop of ink_) drop.points = push(drop.points, c, r);
		const points = Array.from({ length: 150 }, (_, k) => {
			const turn = (k / 150) * Math.PI * 2;
			return { x: c.x + Math.cos(turn) * r, y: c.y + Math.sin(turn) * r };
		});
		ink_.push({ colour: ink(p, i % p.length), points });
	}
	return ink_;
}

const paint = (drops: readonly Drop[]) =>
	drops
		.map(
			({ colour, points }) =>
				`<path d="M${points.map(({ x, y }) => `${round(x)} ${round(y)}`).join('L')}Z" fill="${colour}"/>`
		)
		.join('');

/** Stones: drops left as they fell. */
export const stoneMarble: Pattern = (p, sheet) => ground(ink(p, 0), sheet) + paint(bath(p, sheet, 150));

/** Combed up and down by turns, so that the feathers run with the sheet's height. */
export const combedMarble: Pattern = (p, sheet) => {
	const drops = bath(p, sheet, 130);
	for (const drop of drops) {
		for (let x = 0, nth = 0; x <= sheet.w; x += 75, nth++)
			drop.points = comb(drop.points, x, nth % 2 === 0 ? 110 : -110, 0.965);
	}
	return ground(ink(p, 0), sheet) + paint(drops);
};
