/**
 * What the planner is asked and what it answers. Every length is an integer in one unit of the caller's
 * choosing (the product: 1/320 mm; a benchmark file: its own). Origin top left, y downward.
 */

/** Ways a piece may lie on a sheet: as given, turned by a quarter, either, or not on it at all. */
export const LIES = { never: 0, upright: 1, turned: 2, either: 3 } as const;
export type Lie = (typeof LIES)[keyof typeof LIES];

/** A kind of sheet. `count` identical ones may be opened; `Infinity` where there is no limit. */
export interface SheetKind {
	readonly w: number;
	readonly h: number;
	readonly count: number;
	/** What opening one costs: compared first, then second. The product: [1 or its price, 0], an offcut [0, 1]. */
	readonly cost: readonly [number, number];
}

/** `qty` equal rectangles. `lies[s]` says how they may lie on sheet kind `s`. */
export interface PieceKind {
	readonly w: number;
	readonly h: number;
	readonly qty: number;
	readonly lies: readonly Lie[];
}

export interface CutProblem {
	readonly sheets: readonly SheetKind[];
	readonly pieces: readonly PieceKind[];
	/** Width that a cut takes away; zero for a trimmer. */
	readonly kerf: number;
	/** By knife: the layout need not come apart by edge-to-edge cuts. */
	readonly interlocked?: boolean;
}

/** The search counts units of work; hosts turn time into `shouldStop`. Equal work gives equal answers. */
export interface CutBudget {
	readonly work: number;
	readonly shouldStop?: () => boolean;
	readonly seed?: number;
	/** Units spent on choosing among plans of equal cost; 1,200 for each piece, at most 40,000, where left out. */
	readonly polish?: number;
	readonly onProgress?: (progress: {
		best: readonly [number, number] | null;
		bound: readonly [number, number];
	}) => void;
}

/** Where one piece lies: `w` and `h` as it lies (swapped where `turned`). */
export interface Placement {
	readonly piece: number;
	readonly x: number;
	readonly y: number;
	readonly w: number;
	readonly h: number;
	readonly turned: boolean;
}

export interface Rect {
	readonly x: number;
	readonly y: number;
	readonly w: number;
	readonly h: number;
}

/**
 * One edge-to-edge cut through the region `of`: `across` is a horizontal line at y = `at`, `down` a vertical
 * one at x = `at`, both measured from the sheet's origin. With a kerf the cut takes `at` to `at + kerf`.
 */
export interface Cut {
	readonly axis: 'across' | 'down';
	readonly at: number;
	readonly of: Rect;
}

/** One opened sheet. Cuts stand in trimmer order; offcuts are the maximal leftover regions of that order. */
export interface CutSheet {
	readonly sheet: number;
	readonly placements: readonly Placement[];
	readonly cuts: readonly Cut[];
	readonly offcuts: readonly Rect[];
}

export interface CutPlan {
	readonly sheets: readonly CutSheet[];
	readonly cost: readonly [number, number];
}

/**
 * - `planned`: every piece lies somewhere; `minimum` says whether the cost is proved least in both parts.
 * - `impossible`: proved that the sheets cannot hold the pieces.
 * - `unknown`: the budget ran out before either.
 * `bound` is a proved lower bound on the first cost (and on the second among plans of least first cost).
 */
export type CutFound =
	| {
			readonly status: 'planned';
			readonly plan: CutPlan;
			readonly minimum: boolean;
			readonly bound: readonly [number, number];
	  }
	| { readonly status: 'impossible'; readonly bound: readonly [number, number] }
	| { readonly status: 'unknown'; readonly bound: readonly [number, number] };

/** `work`: the units that were spent on it. */
export type CutAnswer = CutFound & { readonly work: number };
