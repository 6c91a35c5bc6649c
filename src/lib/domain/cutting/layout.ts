/**
 * From box trees to sheets with positions, cuts and offcuts. Each region is first trimmed to its box, the cut
 * that leaves the larger piece first; then the largest child is peeled off and the rest, now lower, is trimmed
 * as one. So equal heights are trimmed by one cut, and a leftover is never divided by a cut that only some
 * pieces need. Positions are those of the grown model; taking the kerf off again happens where a real length is
 * written.
 */
import { ACROSS, DOWN, PIECE, along, areaIn, type Box } from './box';
import { splitCost, type Model } from './model';
import { trimmerOrder, type CutTree } from './order';
import {
	LIES,
	type Cut,
	type CutPlan,
	type CutProblem,
	type CutSheet,
	type Placement,
	type Rect
} from './problem';

export interface Opened {
	readonly sheet: number;
	readonly box: Box;
}

export function planOf(problem: CutProblem, model: Model, opened: readonly Opened[]): CutPlan {
	const draw = drawer(problem, model);
	const sorted = [...opened].sort((a, b) => a.sheet - b.sheet || areaIn(b.box) - areaIn(a.box));
	return {
		sheets: sorted.map(({ sheet, box }) => laidOut(model, sheet, box, draw)),
		cost: splitCost(
			model,
			opened.reduce((sum, { sheet }) => sum + (model.sheets[sheet]?.cost ?? 0), 0)
		)
	};
}

type Draw = (leaf: Pick<Box, 'piece' | 'turned'>, sheet: number) => Pick<Placement, 'piece' | 'turned'>;

/** Hands out the caller's pieces, in the caller's order, for the model's. */
export function drawer(problem: CutProblem, model: Model): Draw {
	const left = model.pieces.map(({ members }) => members.map((member) => ({ ...member })));
	return (leaf, sheet) => {
		const member = left[leaf.piece]?.find(({ qty }) => qty > 0);
		if (!member) throw new Error('a layout holds more pieces than were asked for');
		member.qty -= 1;
		const piece = problem.pieces[member.piece];
		if (piece?.w === piece?.h)
			return { piece: member.piece, turned: ((piece?.lies[sheet] ?? 0) & LIES.upright) === 0 };
		return { piece: member.piece, turned: leaf.turned !== member.flipped };
	};
}

function laidOut(model: Model, sheet: number, box: Box, draw: Draw): CutSheet {
	const { trees, placements, offcuts } = carveSheet(model, { sheet, box }, (leaf) => draw(leaf, sheet));
	return { sheet, placements, cuts: trimmerOrder(trees), offcuts };
}

/** The cuts that free one sheet's pieces, each with those that need it first, and what is left. */
export function carveSheet(model: Model, { sheet, box }: Opened, draw: Carved['draw'] = asItIs) {
	const { w, h } = model.sheets[sheet] as Model['sheets'][number];
	const carved: Carved = { kerf: model.kerf, draw, placements: [], offcuts: [] };
	const trees = carve(carved, box, 0, 0, w, h);
	return { trees, placements: carved.placements, offcuts: carved.offcuts };
}

function asItIs({ piece, turned }: Box): Pick<Placement, 'piece' | 'turned'> {
	return { piece, turned };
}

interface Carved {
	readonly kerf: number;
	readonly draw: (leaf: Box) => Pick<Placement, 'piece' | 'turned'>;
	readonly placements: Placement[];
	readonly offcuts: Rect[];
}

function carve(to: Carved, box: Box, x: number, y: number, w: number, h: number): CutTree[] {
	const spareW = w - box.w;
	const spareH = h - box.h;
	if (spareW > 0 && (spareH === 0 || spareW * h >= spareH * w)) {
		spare(to, x + box.w, y, spareW, h);
		return [cut(to, 'down', box.w, x, y, w, h, carve(to, box, x, y, box.w, h))];
	}
	if (spareH > 0) {
		spare(to, x, y + box.h, w, spareH);
		return [cut(to, 'across', box.h, x, y, w, h, carve(to, box, x, y, w, box.h))];
	}
	if (box.axis === PIECE) {
		to.placements.push({ ...to.draw(box), x, y, w: w - to.kerf, h: h - to.kerf });
		return [];
	}
	return peel(to, box, x, y, w, h);
}

function peel(to: Carved, box: Box, x: number, y: number, w: number, h: number): CutTree[] {
	const axis = box.axis === DOWN ? DOWN : ACROSS;
	const [first, ...others] = [...box.kids].sort((a, b) =>
		axis === DOWN ? b.h - a.h || b.w - a.w : b.w - a.w || b.h - a.h
	);
	const rest = along(axis, others);
	if (!first) return [];
	if (axis === DOWN) {
		return [
			cut(to, 'down', first.w, x, y, w, h, [
				...carve(to, first, x, y, first.w, h),
				...carve(to, rest, x + first.w, y, w - first.w, h)
			])
		];
	}
	return [
		cut(to, 'across', first.h, x, y, w, h, [
			...carve(to, first, x, y, w, first.h),
			...carve(to, rest, x, y + first.h, w, h - first.h)
		])
	];
}

function spare(to: Carved, x: number, y: number, w: number, h: number): void {
	if (w > to.kerf && h > to.kerf) to.offcuts.push({ x, y, w: w - to.kerf, h: h - to.kerf });
}

function cut(
	to: Carved,
	axis: Cut['axis'],
	size: number,
	x: number,
	y: number,
	w: number,
	h: number,
	then: CutTree[]
): CutTree {
	const of = { x, y, w: w - to.kerf, h: h - to.kerf };
	return { cut: { axis, at: (axis === 'down' ? x : y) + size - to.kerf, of }, then };
}
