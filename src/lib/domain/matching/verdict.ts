import type { Cut, Rect } from '../cutting/problem';
import type { Length } from '../length';

/** Best first; a project's verdict is its worst line's. */
export const VERDICTS = ['now', 'swap', 'after', 'look', 'short'] as const;
export type Verdict = (typeof VERDICTS)[number];

export interface MatchOptions {
	readonly units: 'in' | 'mm' | 'cm';
	readonly kerf: Length;
	/** Longest cut that the user's trimmer makes; null where she did not say. */
	readonly reach: Length | null;
	readonly knife: boolean;
	/** Smallest side of an offcut worth keeping; null keeps every one. */
	readonly keepOffcut: Length | null;
}

export interface LineResult {
	readonly line: string;
	readonly verdict: Verdict;
	readonly supplies?: readonly string[];
	readonly swap: number | null;
	readonly need?: number;
	readonly left?: number;
	readonly tight?: boolean;
	readonly after?: string | null;
	/** Why a line is `look`, in the product's words: an unsure count, an unsaid property, time. */
	readonly why?: string;
}

export type Shortage =
	| {
			readonly line: string;
			readonly pieces: Readonly<Record<string, number>>;
			readonly sheets: readonly {
				readonly w: Length;
				readonly h: Length;
				readonly count: number;
				readonly custom?: boolean;
			}[];
			readonly certificate?: string;
	  }
	| { readonly line: string; readonly amount: number }
	| { readonly line: string; readonly tool: string };

export interface NearMiss {
	readonly line: string;
	readonly supply: string;
	readonly side: 'w' | 'h';
	readonly by: Length;
}

export interface PlannedPlacement extends Rect {
	readonly project: string;
	readonly piece: string;
	readonly turned: boolean;
	readonly face: 'A' | 'B';
	readonly noSlack: boolean;
}

export interface PlannedCut extends Cut {
	/** Longer than the user's trimmer reaches: knife and ruler. */
	readonly byKnife?: boolean;
}

export interface PlannedSheet {
	readonly supply: string;
	readonly nth: number;
	readonly w: Length;
	readonly h: Length;
	readonly placements: readonly PlannedPlacement[];
	readonly cuts: readonly PlannedCut[];
	readonly offcuts: readonly Rect[];
}

export interface Plan {
	readonly proof: 'minimum' | { readonly atLeast: number };
	readonly sheets: readonly PlannedSheet[];
}

export interface ProjectResult {
	readonly project: string;
	readonly copies: number;
	readonly verdict: Verdict;
	readonly after: string | null;
	readonly nowIfFirst: boolean;
	readonly lines: readonly LineResult[];
	readonly short: readonly Shortage[];
	readonly near: readonly NearMiss[];
	readonly plan: Plan | null;
}

export interface MatchResponse {
	readonly unit: '1/320 mm';
	readonly results: readonly ProjectResult[];
}
