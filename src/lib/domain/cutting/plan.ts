/**
 * The planner. Quick constructions give a first plan and inequalities a first bound; where they meet, that is
 * all. Otherwise every pattern is listed, if the problem is of an everyday size, and the combinations of sheets
 * are gone through from the cheapest: the first that holds the pieces is the minimum, and none at all is proof
 * of impossibility. What is too big for that is improved by ruin and recreate until it meets the bound or the
 * budget ends.
 */
import { inequalitiesOf } from './bounds';
import { Combinations } from './combinations';
import { Patterns } from './exact';
import { planOf, type Opened } from './layout';
import { Meter } from './meter';
import { modelOf, splitCost, type Model } from './model';
import type { CutAnswer, CutBudget, CutProblem } from './problem';
import { seeded } from './random';
import { Recreate, type State } from './recreate';

const NOTHING: readonly [number, number] = [0, 0];

export function planCuts(problem: CutProblem, budget: CutBudget): CutAnswer {
	const model = modelOf(problem);
	if (model.total === 0)
		return { status: 'planned', plan: { sheets: [], cost: NOTHING }, minimum: true, bound: NOTHING };
	const search = new Search(problem, model, budget);
	search.run();
	return search.answer();
}

class Search {
	private readonly meter: Meter;
	private readonly recreate: Recreate;
	private best: { readonly opened: readonly Opened[]; readonly cost: number } | null = null;
	private bound = 0;
	private impossible = false;

	constructor(
		private readonly problem: CutProblem,
		private readonly model: Model,
		private readonly budget: CutBudget
	) {
		this.meter = new Meter(budget);
		this.recreate = new Recreate(model, seeded(budget.seed ?? 1), this.meter);
	}

	run(): void {
		const inequalities = inequalitiesOf(this.model, false);
		const combinations = new Combinations(this.model, inequalities, this.meter);
		this.raise(combinations.bound);
		if (this.done) return;
		const start = this.recreate.first(() => this.meter.open);
		this.take(start);
		if (this.done) return;
		const patterns = Patterns.of(this.model, this.meter, this.meter.allow(4_000_000));
		if (patterns) this.prove(patterns, combinations);
		if (this.done) return;
		this.recreate.improve(
			start,
			this.bound,
			() => this.meter.open,
			(state) => this.take(state)
		);
	}

	answer(): CutAnswer {
		const bound = splitCost(this.model, Math.min(this.bound, this.best?.cost ?? this.bound));
		if (this.best) {
			const plan = planOf(this.problem, this.model, this.best.opened);
			return { status: 'planned', plan, minimum: this.best.cost <= this.bound, bound };
		}
		return this.impossible ? { status: 'impossible', bound: NOTHING } : { status: 'unknown', bound };
	}

	private get done(): boolean {
		return this.impossible || (this.best !== null && this.best.cost <= this.bound);
	}

	private prove(patterns: Patterns, combinations: Combinations): void {
		const go = () => this.meter.open;
		for (;;) {
			const combination = combinations.next(go);
			if (combination === undefined) return;
			if (combination === null || (this.best && combination.cost >= this.best.cost)) {
				this.raise(this.best ? this.best.cost : Infinity);
				return;
			}
			this.raise(combination.cost);
			const opened = patterns.cover(combination, patterns.full, go);
			if (opened === undefined) return;
			if (opened) {
				this.best = { opened, cost: combination.cost };
				return;
			}
			this.raise(combinations.bound);
		}
	}

	private take(state: State): void {
		if (state.outside.length > 0 || (this.best && this.best.cost <= state.cost)) return;
		this.best = { opened: state.sheets, cost: state.cost };
		this.report();
	}

	private raise(bound: number): void {
		if (bound === Infinity) this.impossible = this.best === null;
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
