import type { Caliper } from '../caliper';
import type { Length } from '../length';
import type { ConsumableKind, Edge, PaperWeight, SheetGoods, ToolKind } from '../stash';

/** What a slot asks of its paper. A range's ends are included. */
export interface Material {
	readonly kind: SheetGoods;
	readonly weight: { readonly min: PaperWeight | null; readonly max: PaperWeight | null } | null;
	readonly caliper: { readonly min: Caliper | null; readonly max: Caliper | null } | null;
}

export interface Slot {
	readonly key: string;
	readonly name: string;
	readonly material: Material;
	readonly designs: 'one' | 'mixed';
	readonly sameAs: string | null;
	readonly differentFrom: readonly string[];
	/** The paper chosen for this slot, by its design (and collection where two share a name). */
	readonly design: string | null;
	readonly collection: string | null;
	/** Ranks papers; never decides a verdict. */
	readonly colour: string | null;
	readonly swaps: readonly Material[];
}

export type Up = 'h' | 'w' | 'none';
export type Fold = 'valley' | 'mountain' | 'none';
export type Corner = 'top-left' | 'top-right' | 'bottom-left' | 'bottom-right';

export interface Score {
	readonly from: Edge;
	readonly at: Length;
	readonly fold: Fold;
}

/** A cut from one point on the piece to another, measured from its top left. */
export interface DiagonalCut {
	readonly from: { readonly x: Length; readonly y: Length };
	readonly to: { readonly x: Length; readonly y: Length };
}

export interface Piece {
	readonly key: string;
	readonly slot: string;
	readonly name: string;
	readonly w: Length;
	readonly h: Length;
	readonly qty: number;
	readonly up: Up;
	/** How much smaller it may be cut, in each direction. */
	readonly allowance: Length;
	readonly scores: readonly Score[];
	readonly corners: readonly { readonly at: readonly Corner[]; readonly tool: string }[];
	readonly edges: readonly { readonly at: readonly Edge[]; readonly tool: string }[];
	readonly diagonals: readonly DiagonalCut[];
	/** What it is glued to, with the even border that shows where the author gives one. */
	readonly mount: { readonly on: string; readonly border: Length | null } | null;
	/** The wrap that it makes: boards and hinge gaps along each axis, turn-ins at both ends. */
	readonly wraps: {
		readonly boards: readonly string[];
		readonly gaps: readonly Length[];
		readonly turnIn: Length;
		readonly along: 'w' | 'h';
	} | null;
	/** Edges taped, from which the bill's tape adds up. */
	readonly tape: { readonly line: string; readonly edges: readonly Edge[] } | null;
}

export interface ConsumableNeed {
	readonly key: string;
	readonly name: string;
	readonly kind: ConsumableKind;
	readonly width: Length | null;
	readonly need: number;
	readonly swaps: readonly {
		readonly kind: ConsumableKind;
		readonly width: Length | null;
		readonly times: number;
	}[];
}

export interface ToolNeed {
	readonly key: string;
	readonly name: string;
	readonly kind: ToolKind;
	readonly reach: Length | null;
	readonly grooves: Length | null;
	readonly shape: string | null;
	readonly size: Length | null;
	readonly cuts: readonly ('paper' | 'board')[];
	readonly swaps: readonly {
		readonly kind: ToolKind;
		readonly shape: string | null;
		readonly size: Length | null;
		readonly reach: Length | null;
	}[];
}

export interface Step {
	readonly text: string;
	readonly tools: readonly string[];
	readonly pieces: readonly string[];
}

/** A project's bill with its formulas worked out. */
export interface Bill {
	readonly key: string;
	readonly name: string;
	readonly measures: Readonly<Record<string, Length>>;
	/** Measures that no formula of the bill uses. */
	readonly unusedMeasures?: readonly string[];
	readonly slots: readonly Slot[];
	readonly pieces: readonly Piece[];
	readonly adhesives: readonly ConsumableNeed[];
	readonly tools: readonly ToolNeed[];
	readonly extras: readonly ConsumableNeed[];
	readonly steps: readonly Step[];
}
