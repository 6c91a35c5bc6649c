import type { Seat } from './components';
import { chooseDesigns, type Choice } from './designs';
import { milderThan, rungsOf } from './ladder';
import type { Bench, CostOf, Layout } from './layout';
import { onTerms, type Terms } from './parts';
import { restoreSizes } from './restoring';

/** How a component's paper was found: the seats on the terms that each needed. */
export interface Papers {
	readonly seats: readonly Seat[];
	readonly layout: Layout | null;
	/** Without a layout: proved impossible, or the time ran out. */
	readonly timedOut: boolean;
	readonly costOf: CostOf;
}

/** Climbs the ladder from `first` until everything can be laid out, then lets each slot down as far as it goes. */
export function findPapers(seats: readonly Seat[], first: Terms, costOf: CostOf, bench: Bench): Papers {
	const climber = new Climber(costOf, bench);
	for (const terms of rungsOf(seats, first)) {
		const at = seats.map((seat) => seatOn(seat, terms));
		const choice = climber.choose(at);
		if (choice.status !== 'planned') continue;
		const settled = isSame(terms, first) ? { seats: at, choice } : climber.letDown(at, choice, first);
		return { ...restoreSizes(settled.seats, settled.choice, costOf, bench), timedOut: false, costOf };
	}
	return { seats, layout: null, timedOut: climber.timedOut, costOf };
}

export function seatOn(seat: Seat, terms: Terms): Seat {
	return seat.part.promised ? seat : { ...seat, part: onTerms(seat.part, terms) };
}

type Planned = Extract<Choice, { status: 'planned' }>;

class Climber {
	timedOut = false;
	private readonly known = new Map<string, Choice>();

	constructor(
		private readonly costOf: CostOf,
		private readonly bench: Bench
	) {}

	choose(seats: readonly Seat[]): Choice {
		const key = seats.map(effectOf).join('|');
		const known = this.known.get(key);
		const choice = known ?? chooseDesigns(seats, this.costOf, this.bench);
		if (choice.status === 'unknown') this.timedOut = true;
		this.known.set(key, choice);
		return choice;
	}

	/** In the bill's order, each slot on the mildest terms that still work beside the others' present ones. */
	letDown(
		seats: readonly Seat[],
		choice: Planned,
		first: Terms
	): { seats: readonly Seat[]; choice: Planned } {
		let settled = { seats, choice };
		seats.forEach((seat, i) => {
			if (seat.part.promised) return;
			for (const terms of milderThan(seat.part.terms, first)) {
				const tried = settled.seats.map((other, j) => (j === i ? seatOn(other, terms) : other));
				const milder = this.choose(tried);
				if (milder.status !== 'planned') continue;
				settled = { seats: tried, choice: milder };
				break;
			}
		});
		return settled;
	}
}

/** What terms come to for a seat: terms that allow the same rows and sizes need no second search. */
function effectOf({ part, uses }: Seat): string {
	const sizes = part.pieces.map(({ w, h, qty }) => `${w} ${h} ${qty}`).join();
	return `${sizes}:${uses.on(part.terms).number}`;
}

function isSame(a: Terms, b: Terms): boolean {
	return a.on === b.on && a.level === b.level && a.unsure === b.unsure;
}
