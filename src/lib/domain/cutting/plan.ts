/**
 * The planner. Quick constructions give a first plan and inequalities a first bound; where they meet, that is
 * all. Otherwise every pattern is listed, if the problem is of an everyday size, and the combinations of sheets
 * are gone through from the cheapest: the first that holds the pieces is the minimum, and none at all is proof
 * of impossibility. What is too big for that is improved by ruin and recreate until it meets the bound or the
 * budget ends.
 */
import { areasOf, inequalitiesOf } from './bounds';
import { Combinations, type Combination } from './combinations';
import { Patterns } from './exact';
import { planByKnife } from './knife-plan';
import { carveSheet, planOf, type Opened } from './layout';
import { Meter } from './meter';
import { modelOf, refuseNonsense, splitCost, type Model } from './model';
import type { CutAnswer, CutBudget, CutFound, CutProblem } from './problem';
import { seeded } from './random';
import { construct } from './construct';
import { areaIn } from './box';
import { Inserter, type State } from './insert';
import { polish } from './polish';
import { improve } from './recreate';
import { largestUnit, measuredBack, measuredIn } from './unit';

/** Units of work for which one side goes on before the other has its turn. */
const TURN = 20_000;
/** Combinations that are listed before the patterns they may need. */
const BATCH = 200;
/** Units for choosing among plans of equal cost: so many for each piece, up to a limit. */
const POLISH = { each: 1_200, most: 40_000 } as const;
const NOTHING: readonly [number, number] = [0, 0];

/** The plan of least cost that the budget allows, with what is proved of it. */
export function planCuts(problem: CutProblem, budget: CutBudget): CutAnswer {
	return answerTo(problem, budget, false);
}

/** Any plan at all, the first one found: for asking only whether the sheets hold the pieces. */
export function planAny(problem: CutProblem, budget: CutBudget): CutAnswer {
	return answerTo(problem, budget, true);
}

function answerTo(asked: CutProblem, budget: CutBudget, any: boolean): CutAnswer {
	refuseNonsense(asked);
	const unit = largestUnit(asked);
	const problem = measuredIn(asked, unit);
	const model = modelOf(problem);
	if (model.total === 0)
		return { status: 'planned', plan: { sheets: [], cost: NOTHING }, minimum: true, bound: NOTHING, work: 0 };
	const search = new Search(problem, model, budget, any);
	search.run();
	const byTrimmer = search.answer();
	const knife = new Meter(budget);
	const answer = problem.interlocked ? planByKnife(problem, model, byTrimmer, knife) : byTrimmer;
	const work = search.spent + knife.spent;
	return answer.status === 'planned'
		? { ...answer, plan: measuredBack(answer.plan, unit), work }
		: { ...answer, work };
}

class Search {
	private readonly meter: Meter;
	private readonly inserter: Inserter;
	private best: { readonly opened: readonly Opened[]; readonly cost: number } | null = null;
	private bound = 0;
	private impossible = false;

	constructor(
		private readonly problem: CutProblem,
		private readonly model: Model,
		private readonly budget: CutBudget,
		private readonly any: boolean
	) {
		this.meter = new Meter(budget);
		this.inserter = new Inserter(model, seeded(budget.seed ?? 1), this.meter);
	}

	run(): void {
		this.raise(new Combinations(this.model, areasOf(this.model), this.meter).bound);
		if (this.done) return;
		const start = construct(this.inserter, (state) => {
			this.take(state);
			return this.done || !this.meter.open;
		});
		if (this.done) return;
		const combinations = new Combinations(this.model, inequalitiesOf(this.model, false), this.meter);
		this.raise(combinations.bound);
		this.alternate(this.climb(start), this.prove(combinations));
	}

	/** Search from above and proof from below take turns, since nobody can say which will finish first. */
	private alternate(above: Iterator<unknown>, below: Iterator<unknown>): void {
		let proving = true;
		for (let turn = 0; !this.done && this.meter.open; turn++) {
			const side = proving && turn % 2 === 1 ? below : above;
			const go = this.meter.allow(TURN);
			while (!this.done && go()) {
				if (!side.next().done) continue;
				if (side === below) proving = false;
				break;
			}
		}
	}

	private *climb(start: State): Generator<undefined> {
		for (const state of improve(this.inserter, start)) {
			if (state) this.take(state);
			yield;
		}
	}

	get spent(): number {
		return this.meter.spent;
	}

	answer(): CutFound {
		const bound = splitCost(this.model, Math.min(this.bound, this.best?.cost ?? this.bound));
		if (this.best) {
			const plan = planOf(
				this.problem,
				this.model,
				this.any ? this.best.opened : this.polished(this.best.opened)
			);
			return { status: 'planned', plan, minimum: this.best.cost <= this.bound, bound };
		}
		return this.impossible ? { status: 'impossible', bound: NOTHING } : { status: 'unknown', bound };
	}

	/** Even a plan found at the end of the budget gets this much, so that it can be carried out with ease. */
	private polished(opened: readonly Opened[]): readonly Opened[] {
		const sheets = opened.map((sheet) => ({ ...sheet, used: areaIn(sheet.box) }));
		const start = { sheets, outside: [], cost: this.best?.cost ?? 0 };
		const allowance = Math.min(POLISH.most, POLISH.each * (this.model.total - 1));
		const end = this.meter.spent + (this.budget.polish ?? allowance);
		return polish(
			this.inserter,
			start,
			(sheet) => carveSheet(this.model, sheet),
			() => this.meter.spent < end
		).sheets;
	}

	private get done(): boolean {
		return this.impossible || (this.best !== null && (this.any || this.best.cost <= this.bound));
	}

	/** Goes through the combinations under the best cost, cheapest first, some at a time. */
	private *prove(combinations: Combinations): Generator<undefined> {
		let patterns: Patterns | null = null;
		let known = -1;
		while (!this.done) {
			const batch = yield* this.nextBatch(combinations);
			if (batch.length === 0) return this.raise(combinations.bound);
			if (!Patterns.few(this.model)) return;
			const loss = this.best ? Math.max(...batch.map((combination) => this.spare(combination))) : Infinity;
			if (!patterns || loss > known) patterns = yield* Patterns.of(this.model, (known = loss), this.meter);
			for (const combination of batch) {
				this.raise(combination.cost);
				if (this.done) return;
				yield* this.tryOut(combination, patterns);
			}
			this.raise(combinations.bound);
		}
	}

	private *nextBatch(combinations: Combinations): Generator<undefined, Combination[]> {
		const batch: Combination[] = [];
		while (batch.length < BATCH && combinations.bound < (this.best?.cost ?? Infinity)) {
			const combination = combinations.next(this.meter.allow(TURN));
			if (combination === null) break;
			if (combination && combination.cost < (this.best?.cost ?? Infinity)) batch.push(combination);
			this.raise(Math.min(batch[0]?.cost ?? Infinity, combinations.bound));
			yield;
		}
		return batch;
	}

	private spare({ counts }: Combination): number {
		return counts.reduce(
			(sum, count, s) => sum + count * (this.model.sheets[s]?.area ?? 0),
			-this.model.area
		);
	}

	private *tryOut(combination: Combination, patterns: Patterns): Generator<undefined> {
		for (let allowance = TURN; !this.done; allowance *= 2) {
			const opened = patterns.cover(combination, this.meter.allow(allowance));
			if (opened && (!this.best || combination.cost < this.best.cost))
				this.best = { opened, cost: combination.cost };
			if (opened !== undefined) return;
			yield;
		}
	}

	private take(state: State): void {
		if (state.outside.length > 0 || (this.best && this.best.cost <= state.cost)) return;
		this.best = { opened: state.sheets, cost: state.cost };
		this.report();
	}

	private raise(bound: number): void {
		if (bound === Infinity && !this.best) this.impossible = true;
		else if (bound > this.bound) this.bound = bound;
		this.report();
	}

	private report(): void {
		this.budget.onProgress?.({
			best: this.best && splitCost(this.model, this.best.cost),
			bound: splitCost(this.model, this.bound)
		});
	}
}
