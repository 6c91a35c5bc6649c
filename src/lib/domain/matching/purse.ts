import type { CutBudget } from '../cutting/problem';
import type { MatchBudget } from './request';

const MOST_POLISH = 20_000;

/** Work that may still be spent. What is spent from a purse within another is spent from both. */
export class Purse {
	private spent = 0;

	constructor(
		private readonly work: number,
		private readonly shouldStop: (() => boolean) | undefined,
		private readonly outer: Purse | null = null
	) {}

	/** An even share of the budget for one of so many projects. */
	static of(budget: MatchBudget, projects: number): Purse {
		return new Purse(Math.floor(budget.work / Math.max(1, projects)), budget.shouldStop);
	}

	/** A purse within this one, with that fraction of what is left. */
	within(fraction: number): Purse {
		return new Purse(Math.ceil(this.left * fraction), this.shouldStop, this);
	}

	get left(): number {
		return Math.max(0, this.work - this.spent);
	}

	get isSpent(): boolean {
		return this.left === 0 || this.shouldStop?.() === true;
	}

	spend(work: number): void {
		this.spent += work;
		this.outer?.spend(work);
	}

	/** What one call of the planner may spend. A plan that will be shown is polished, one of many tried is not. */
	share(shown: boolean, most = Infinity): CutBudget {
		const work = Math.min(most, Math.ceil(this.left / 4));
		const polish = shown ? Math.min(MOST_POLISH, Math.ceil(this.work / 50)) : 0;
		return { work, polish, ...(this.shouldStop ? { shouldStop: this.shouldStop } : {}) };
	}
}
