import { planAny, planCuts } from '../cutting';
import type { Cut, CutAnswer, CutProblem, Rect } from '../cutting/problem';
import { isBelow, leastCost, type Sorts } from './least-cost';
import type { Cuttable, Part } from './parts';
import type { Print } from './prints';
import type { Purse } from './purse';
import { likelySorts } from './likely';
import { namedSheets, problemOf, questionOf, type Question } from './question';
import type { Way } from './serving';
import type { Sheet } from './shelf';
import { isSound } from './soundness';
import type { MatchOptions } from './verdict';

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
	/** `any`: only whether there is a plan; `least`: the cheapest; `shown`: the cheapest, with the fewest cuts too. */
	readonly goal: 'any' | 'least' | 'shown';
	/** The most that one call of the planner may spend. */
	readonly most?: number;
}

/** Plans every piece of `parts`, part p from `sorts[p]`; the checker has passed what it returns. */
export function layOut(
	parts: readonly Part[],
	sorts: readonly Sorts[],
	costOf: CostOf,
	bench: Bench,
	least: Cost | null = leastCost(parts, sorts, costOf)
): Outcome {
	if (!least) return { status: 'impossible' };
	const likely = parts.map((part, p) => likelySorts(part, sorts[p] ?? []));
	const all = likely.every((own, p) => own === sorts[p]);
	const question = questionOf(parts, likely, costOf);
	if (all) return answered(question, costOf, bench);
	const outcome = answered(question, costOf, { ...bench, most: Math.min(bench.most ?? LIKELY, LIKELY) });
	if (outcome.status === 'impossible') return answered(questionOf(parts, sorts, costOf), costOf, bench);
	if (outcome.status !== 'planned') return outcome;
	const { layout } = outcome;
	return { status: 'planned', layout: { ...layout, bound: least, minimum: !isBelow(least, layout.cost) } };
}

/** What the likely rows are worth: no proof among them proves anything of the rest. */
const LIKELY = 8_000;

function answered(question: Question, costOf: CostOf, bench: Bench): Outcome {
	const { kinds } = question;
	const answer = ask(problemOf(question, kinds, bench.options), bench);
	if (answer.status !== 'planned') return { status: answer.status };
	const sheets = namedSheets(question, kinds, answer.plan);
	const layout = { sheets, cost: answer.plan.cost, bound: answer.bound, minimum: answer.minimum };
	return isSound(question, layout, costOf, bench.options)
		? { status: 'planned', layout }
		: { status: 'unknown' };
}

/** What the planner does before it counts, for each piece kind on each sheet kind. */
const SETTING_UP = 10;

function ask(problem: CutProblem, { purse, goal, most }: Bench): CutAnswer {
	if (purse.isSpent) return { status: 'unknown', bound: [0, 0], work: 0 };
	const share = purse.share(goal === 'shown', most);
	const answer = (goal === 'any' ? planAny : planCuts)(problem, share);
	purse.spend(answer.work + SETTING_UP * problem.pieces.length * (1 + problem.sheets.length));
	return answer;
}
