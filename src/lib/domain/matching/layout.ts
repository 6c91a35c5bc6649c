import { planCuts } from '../cutting';
import type { Cut, CutAnswer, CutProblem, Rect } from '../cutting/problem';
import type { MatchOptions } from './verdict';
import type { Cuttable, Part } from './parts';
import type { Print } from './prints';
import { isSpent, shareOf, type Purse } from './purse';
import { namedSheets, questionOf } from './question';
import type { Way } from './serving';
import type { Sheet } from './shelf';
import { isSound } from './soundness';

/** A row offered to a part, with the faces that it may show and what makes the row serve. */
export interface Offer {
	readonly sheet: Sheet;
	readonly prints: readonly Print[];
	readonly way: Way;
}

export interface Laid extends Rect {
	readonly part: Part;
	readonly cut: Cuttable;
	readonly turned: boolean;
	readonly print: Print;
	readonly way: Way;
}

/** One opened sheet; everything is measured from the corner of what it offers, its branding strip off. */
export interface LaidSheet {
	readonly sheet: Sheet;
	readonly nth: number;
	readonly placements: readonly Laid[];
	readonly cuts: readonly Cut[];
	readonly offcuts: readonly Rect[];
}

export type Cost = readonly [number, number];

export interface Layout {
	readonly sheets: readonly LaidSheet[];
	readonly cost: Cost;
	readonly bound: Cost;
	readonly minimum: boolean;
}

export type Outcome =
	| { readonly status: 'planned'; readonly layout: Layout }
	| { readonly status: 'impossible' }
	| { readonly status: 'unknown' };

/** How whole sheets are counted: each as one, or by its price where every candidate has one. */
export type CostOf = (sheet: Sheet) => Cost;

export interface Bench {
	readonly options: MatchOptions;
	readonly purse: Purse;
}

/** Plans every piece of `parts`, part i from `offers[i]`; the checker has passed what it returns. */
export function layOut(
	parts: readonly Part[],
	offers: readonly (readonly Offer[])[],
	costOf: CostOf,
	bench: Bench
): Outcome {
	const question = questionOf(parts, offers, costOf, bench.options);
	if (!question) return { status: 'impossible' };
	const answer = ask(question.problem, bench);
	if (answer.status !== 'planned') return { status: answer.status };
	const sheets = namedSheets(question, answer.plan);
	const layout = { sheets, cost: answer.plan.cost, bound: answer.bound, minimum: answer.minimum };
	return isSound(parts, offers, layout, costOf, bench.options)
		? { status: 'planned', layout }
		: { status: 'unknown' };
}

function ask(problem: CutProblem, { purse }: Bench): CutAnswer {
	if (isSpent(purse)) return { status: 'unknown', bound: [0, 0] };
	const share = shareOf(purse);
	const answer = planCuts(problem, share);
	const ended = answer.status === 'impossible' || (answer.status === 'planned' && answer.minimum);
	const size = problem.pieces.length * problem.sheets.length;
	purse.left -= ended ? Math.min(share.work, size) : share.work;
	return answer;
}
