import { drawn } from '$lib/components/sheet/scale';
import type { Units } from '$lib/components/ui/units';
import type { Corner, Piece, Score } from '$lib/domain/bill/bill';
import { spokenLength } from '$lib/domain/length';
import type { Edge } from '$lib/domain/stash';

type Shaped = Pick<Piece, 'w' | 'h' | 'corners' | 'edges'>;

/** How far a punched corner or edge is drawn in, in inches × 100; a punch's own size belongs to the tool. */
const CORNER = 25;
const SCALLOP = 20;

/** The piece's rim as an SVG path, 100 to the inch: punched corners round, punched edges scalloped. */
export function outline(piece: Shaped): string {
	const w = drawn(piece.w);
	const h = drawn(piece.h);
	const round = (corner: Corner) =>
		piece.corners.some(({ at }) => at.includes(corner)) ? Math.min(CORNER, w / 2, h / 2) : 0;
	const [tl, tr, br, bl] = [
		round('top-left'),
		round('top-right'),
		round('bottom-right'),
		round('bottom-left')
	];
	const punched = (edge: Edge) => piece.edges.some(({ at }) => at.includes(edge));
	return [
		`M${tl} 0`,
		side(w - tl - tr, 1, 0, punched('top')),
		corner(tr, 1, 1),
		side(h - tr - br, 0, 1, punched('right')),
		corner(br, -1, 1),
		side(w - br - bl, -1, 0, punched('bottom')),
		corner(bl, -1, -1),
		side(h - bl - tl, 0, -1, punched('left')),
		corner(tl, 1, -1),
		'z'
	].join('');
}

const corner = (r: number, x: number, y: number) => (r ? `a${r} ${r} 0 0 1 ${r * x} ${r * y}` : '');

/** A straight side, or one of whole scallops that bow into the paper. */
function side(length: number, x: number, y: number, punched: boolean): string {
	if (!punched) return `l${length * x} ${length * y}`;
	const count = Math.max(1, Math.round(length / SCALLOP));
	const step = length / count;
	return `a${step / 2} ${step / 2} 0 0 0 ${step * x} ${step * y}`.repeat(count);
}

/** Where a score runs on the drawing. */
export function scoreLine(piece: Pick<Piece, 'w' | 'h'>, { from, at }: Score) {
	const w = drawn(piece.w);
	const h = drawn(piece.h);
	const d = drawn(at);
	if (from === 'left' || from === 'right') {
		const x = from === 'left' ? d : w - d;
		return { x1: x, x2: x, y1: 0, y2: h };
	}
	const y = from === 'top' ? d : h - d;
	return { x1: 0, x2: w, y1: y, y2: y };
}

const FOLDS = { valley: 'valley score', mountain: 'mountain score', none: 'score' } as const;

/** The drawing in words. */
export function pieceWords(
	piece: Pick<Piece, 'w' | 'h' | 'up' | 'scores' | 'corners' | 'edges' | 'diagonals'> & {
		readonly name?: string;
	},
	units: Units
): string {
	const parts = [
		`${piece.name ? `${piece.name}, ` : ''}${spokenLength(piece.w, units)} wide, ${spokenLength(piece.h, units)} high`,
		piece.up === 'h' && 'up along its height',
		piece.up === 'w' && 'up along its width',
		...piece.scores.map(({ fold, at, from }) => `${FOLDS[fold]} ${spokenLength(at, units)} from the ${from}`),
		...piece.corners.map(({ at }) => `punched corners: ${at.join(', ').replaceAll('-', ' ')}`),
		...piece.edges.map(({ at }) => `punched edges: ${at.join(', ')}`),
		piece.diagonals.length > 0 && `${piece.diagonals.length} cut across`
	];
	return `${parts.filter(Boolean).join('; ')}.`;
}
