import fc from 'fast-check';
import { expect, test } from 'vitest';
import { INCH } from '$lib/domain/length';
import { outline, pieceWords, scoreLine } from './outline';

const CORNERS = ['top-left', 'top-right', 'bottom-left', 'bottom-right'] as const;
const EDGES = ['top', 'bottom', 'left', 'right'] as const;
const side = fc.integer({ min: INCH / 4, max: 40 * INCH });

/** Where a path of relative lines and arcs ends. */
function endOf(path: string): [number, number] {
	const [, startX = 0, startY = 0] = /^M(\S+) (\S+?)(?=[la])/.exec(path)!.map(Number);
	let [x, y] = [startX, startY];
	for (const [, command, numbers = ''] of path.matchAll(/([la])([^lamzM]+)/g)) {
		const given = numbers.trim().split(/\s+/).map(Number);
		const [dx = 0, dy = 0] = command === 'l' ? given : given.slice(-2);
		[x, y] = [x + dx, y + dy];
	}
	return [x - startX, y - startY];
}

test('whatever is punched, the rim closes where it began', () => {
	fc.assert(
		fc.property(side, side, fc.subarray([...CORNERS]), fc.subarray([...EDGES]), (w, h, corners, edges) => {
			const piece = {
				w,
				h,
				corners: corners.length ? [{ at: corners, tool: 'p' }] : [],
				edges: edges.length ? [{ at: edges, tool: 'e' }] : []
			};
			const [x, y] = endOf(outline(piece));
			expect(Math.abs(x)).toBeLessThan(1e-6);
			expect(Math.abs(y)).toBeLessThan(1e-6);
		})
	);
});

test('a score runs from edge to edge at its distance from the edge that it is given from', () => {
	const piece = { w: 8 * INCH, h: 5 * INCH };
	expect(scoreLine(piece, { from: 'left', at: 2 * INCH, fold: 'valley' })).toEqual({
		x1: 200,
		x2: 200,
		y1: 0,
		y2: 500
	});
	expect(scoreLine(piece, { from: 'right', at: 2 * INCH, fold: 'valley' })).toEqual({
		x1: 600,
		x2: 600,
		y1: 0,
		y2: 500
	});
	expect(scoreLine(piece, { from: 'bottom', at: INCH, fold: 'none' })).toEqual({
		x1: 0,
		x2: 800,
		y1: 400,
		y2: 400
	});
});

test('the drawing is told in words', () => {
	const piece = {
		name: 'Cover',
		w: 8 * INCH,
		h: 5.5 * INCH,
		up: 'h' as const,
		scores: [{ from: 'left' as const, at: 4 * INCH, fold: 'mountain' as const }],
		corners: [{ at: ['top-left' as const], tool: 'p' }],
		edges: [],
		diagonals: []
	};
	expect(pieceWords(piece, 'in')).toBe(
		'Cover, 8 inches wide, 5 and 1 half inches high; up along its height; mountain score 4 inches from the left; punched corners: top left.'
	);
});
