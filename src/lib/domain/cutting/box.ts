/**
 * A sheet's layout without positions: a tree of boxes, each only as large as what it holds. `DOWN` boxes stand
 * side by side (parted by cuts that run down), `ACROSS` boxes one under the other; no box has a child of its own
 * axis. What a sheet has to spare is nowhere in particular: a box may grow by its parent's slack, and across its
 * parent's axis also up to its tallest sibling. So a gap is never frozen by an early cut, and removing a piece
 * closes up by itself. Boxes are immutable; an edit builds the path to the root anew, and undoing is keeping the
 * old root. (The slicing tree of Wong & Liu, "A new algorithm for floorplan design", DAC 1986.)
 */
import type { ModelPiece } from './model';

export const PIECE = 0;
export const DOWN = 1;
export const ACROSS = 2;

export interface Box {
	readonly axis: 0 | 1 | 2;
	readonly w: number;
	readonly h: number;
	/** Model piece, or -1. */
	readonly piece: number;
	readonly turned: boolean;
	readonly kids: readonly Box[];
}

const NONE: readonly Box[] = [];

export function leaf(piece: number, of: ModelPiece, turned: boolean): Box {
	return { axis: PIECE, w: turned ? of.h : of.w, h: turned ? of.w : of.h, piece, turned, kids: NONE };
}

/** The boxes along one axis; children of the same axis are taken in, a single box stands for itself. */
export function along(axis: 1 | 2, boxes: readonly Box[]): Box {
	const [only] = boxes;
	if (boxes.length === 1 && only) return only;
	const kids: Box[] = [];
	let w = 0;
	let h = 0;
	for (const box of boxes) {
		if (box.axis === axis) kids.push(...box.kids);
		else kids.push(box);
		if (axis === DOWN) {
			w += box.w;
			if (box.h > h) h = box.h;
		} else {
			h += box.h;
			if (box.w > w) w = box.w;
		}
	}
	return { axis, w, h, piece: -1, turned: false, kids };
}

export function eachPiece(box: Box | null, visit: (leaf: Box) => void): void {
	if (!box) return;
	if (box.axis === PIECE) visit(box);
	else for (const kid of box.kids) eachPiece(kid, visit);
}

export function areaIn(box: Box): number {
	let area = 0;
	eachPiece(box, ({ w, h }) => (area += w * h));
	return area;
}

/** The tree without the leaves that `gone` picks; null where nothing stays. */
export function without(box: Box, gone: (leaf: Box) => boolean): Box | null {
	if (box.axis === PIECE) return gone(box) ? null : box;
	const kids: Box[] = [];
	let same = true;
	for (const kid of box.kids) {
		const kept = without(kid, gone);
		if (kept !== kid) same = false;
		if (kept) kids.push(kept);
	}
	if (same) return box;
	return kids.length === 0 ? null : along(box.axis as 1 | 2, kids);
}

/** Where a piece would go: beside `target` along `axis`; `rest` is what the fit leaves, for the score. */
export interface Spot {
	score: number;
	target: Box | null;
	axis: 1 | 2;
	turned: boolean;
}

/** How a fit is judged by the gap along the axis and the gap across it; less is better. */
export type Judge = (along: number, across: number) => number;

/**
 * Improves `spot` with the best place for a `w` x `h` piece in `box`, which may grow by `sw` and `sh`. A box
 * whose parent runs along an axis takes no neighbour on that axis: that place is the parent's own.
 */
export function findSpot(
	box: Box,
	parent: 0 | 1 | 2,
	sw: number,
	sh: number,
	w: number,
	h: number,
	turned: boolean,
	judge: Judge,
	spot: Spot
): void {
	if (parent !== DOWN && w <= sw && h <= box.h + sh) {
		const score = judge(sw - w, box.h + sh - h);
		if (score < spot.score) put(spot, score, box, DOWN, turned);
	}
	if (parent !== ACROSS && h <= sh && w <= box.w + sw) {
		const score = judge(sh - h, box.w + sw - w);
		if (score < spot.score) put(spot, score, box, ACROSS, turned);
	}
	if (box.axis === DOWN) {
		for (const kid of box.kids) {
			const slack = sh + box.h - kid.h;
			if (slack >= h || kid.axis !== PIECE) findSpot(kid, DOWN, sw, slack, w, h, turned, judge, spot);
		}
	} else if (box.axis === ACROSS) {
		for (const kid of box.kids) {
			const slack = sw + box.w - kid.w;
			if (slack >= w || kid.axis !== PIECE) findSpot(kid, ACROSS, slack, sh, w, h, turned, judge, spot);
		}
	}
}

function put(spot: Spot, score: number, target: Box, axis: 1 | 2, turned: boolean): void {
	spot.score = score;
	spot.target = target;
	spot.axis = axis;
	spot.turned = turned;
}

/** The tree with `added` beside `target` along `axis`. */
export function beside(box: Box, target: Box, axis: 1 | 2, added: Box): Box {
	return graft(box, target, axis, added) ?? box;
}

function graft(box: Box, target: Box, axis: 1 | 2, added: Box): Box | null {
	if (box === target) return along(axis, [box, added]);
	for (let i = 0; i < box.kids.length; i++) {
		const kid = box.kids[i] as Box;
		const grown = graft(kid, target, axis, added);
		if (grown) {
			const kids = box.kids.slice();
			kids[i] = grown;
			return along(box.axis as 1 | 2, kids);
		}
	}
	return null;
}
