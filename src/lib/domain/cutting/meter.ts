/** Counts the search's work. One unit is one pair of boxes joined, some tens of nanoseconds; the rest is priced to match. */
import type { CutBudget } from './problem';

const POLL = 2_000;

export class Meter {
	spent = 0;
	private stopped = false;
	private nextPoll = POLL;

	constructor(private readonly budget: CutBudget) {}

	/** Adds `units`; false once the work is used up or the host says stop. */
	spend(units: number): boolean {
		this.spent += units;
		if (!this.stopped && this.spent >= this.nextPoll) {
			this.nextPoll = this.spent + POLL;
			if (this.budget.shouldStop?.()) this.stopped = true;
		}
		return this.open;
	}

	get open(): boolean {
		return !this.stopped && this.spent < this.budget.work;
	}

	/** A smaller allowance within this one: true until `units` more are spent, or this one ends. */
	allow(units: number): () => boolean {
		const end = this.spent + units;
		return () => this.open && this.spent < end;
	}
}
