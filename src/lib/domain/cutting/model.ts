/**
 * The problem as the search sees it. Sheets and pieces grow by the kerf, after which cuts have no width: a
 * region of width R holds pieces w1..wn with n-1 kerfs between them exactly if w1+k .. wn+k fit into R+k (the
 * last cut may run off the edge). Equal pieces are counted together, also where one is the other turned. The
 * two-part cost becomes one number, the first part times `scale` plus the second. Nothing here touches the input.
 */
import type { CutProblem } from './problem';

export interface ModelSheet {
	readonly w: number;
	readonly h: number;
	readonly area: number;
	/** Never more than there are pieces: an opened sheet holds at least one. */
	readonly count: number;
	readonly cost: number;
	/** For each piece kind the ways it may lie and fits: 1 as given, 2 turned, 3 both, 0 not at all. */
	readonly lies: Uint8Array;
	/** The same before asking whether it fits. */
	readonly may: Uint8Array;
}

export interface ModelPiece {
	readonly w: number;
	readonly h: number;
	readonly area: number;
	readonly qty: number;
	/** The caller's pieces that this one stands for. `flipped`: its width is the caller's height. */
	readonly members: readonly { readonly piece: number; readonly qty: number; readonly flipped: boolean }[];
}

export interface Model {
	readonly sheets: readonly ModelSheet[];
	readonly pieces: readonly ModelPiece[];
	readonly total: number;
	readonly area: number;
	readonly kerf: number;
	readonly scale: number;
}

export function modelOf(problem: CutProblem): Model {
	const pieces = mergedPieces(problem);
	const total = pieces.reduce((sum, piece) => sum + piece.qty, 0);
	const second = Math.max(0, ...problem.sheets.map((sheet) => sheet.cost[1]));
	const scale = second === 0 ? 1 : second * total + 1;
	return {
		pieces,
		total,
		area: pieces.reduce((sum, piece) => sum + piece.area * piece.qty, 0),
		kerf: problem.kerf,
		scale,
		sheets: problem.sheets.map((sheet, s) => {
			const w = sheet.w + problem.kerf;
			const h = sheet.h + problem.kerf;
			return {
				w,
				h,
				area: w * h,
				count: Math.min(sheet.count, total),
				cost: sheet.cost[0] * scale + sheet.cost[1],
				lies: Uint8Array.from(pieces, (piece) => mayLie(problem, s, piece) & fits(piece, w, h)),
				may: Uint8Array.from(pieces, (piece) => mayLie(problem, s, piece))
			};
		})
	};
}

export function splitCost(model: Model, cost: number): [number, number] {
	const first = Math.floor(cost / model.scale);
	return [first, cost - first * model.scale];
}

/** Throws RangeError where sizes are not positive, counts or costs are negative or a number isn't whole. */
export function refuseNonsense(problem: CutProblem): void {
	const whole = (value: number, least: number) => Number.isSafeInteger(value) && value >= least;
	const sound =
		whole(problem.kerf, 0) &&
		problem.pieces.every((piece) => whole(piece.w, 1) && whole(piece.h, 1) && whole(piece.qty, 0)) &&
		problem.sheets.every(
			({ w, h, count, cost }) =>
				whole(w, 1) &&
				whole(h, 1) &&
				(count === Infinity || whole(count, 0)) &&
				whole(cost[0], 0) &&
				whole(cost[1], 0)
		);
	if (!sound)
		throw new RangeError('sizes are whole and positive, counts, costs and the kerf whole and not negative');
}

function mergedPieces(problem: CutProblem): ModelPiece[] {
	const merged = new Map<
		string,
		{ w: number; h: number; qty: number; members: { piece: number; qty: number; flipped: boolean }[] }
	>();
	problem.pieces.forEach((piece, index) => {
		if (piece.qty === 0) return;
		const flipped = piece.w < piece.h;
		const [w, h] = flipped ? [piece.h, piece.w] : [piece.w, piece.h];
		const lies = problem.sheets.map((_, s) => canonicalLie(piece.lies[s] ?? 0, flipped, w === h));
		const key = `${w} ${h} ${lies.join('')}`;
		const known = merged.get(key) ?? { w: w + problem.kerf, h: h + problem.kerf, qty: 0, members: [] };
		known.qty += piece.qty;
		known.members.push({ piece: index, qty: piece.qty, flipped });
		merged.set(key, known);
	});
	return [...merged.values()].map((piece) => ({ ...piece, area: piece.w * piece.h }));
}

function canonicalLie(lie: number, flipped: boolean, square: boolean): number {
	if (square) return lie === 0 ? 0 : 1;
	return flipped ? ((lie & 1) << 1) | (lie >> 1) : lie;
}

function mayLie(problem: CutProblem, s: number, piece: ModelPiece): number {
	const member = piece.members[0];
	if (!member) return 0;
	return canonicalLie(problem.pieces[member.piece]?.lies[s] ?? 0, member.flipped, piece.w === piece.h);
}

function fits(piece: ModelPiece, w: number, h: number): number {
	return (piece.w <= w && piece.h <= h ? 1 : 0) | (piece.h <= w && piece.w <= h ? 2 : 0);
}
