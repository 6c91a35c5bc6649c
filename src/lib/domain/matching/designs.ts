import { candidatesFor, likeness, offersOf, type Candidate } from './candidates';
import type { Seat } from './components';
import { layOut, type Bench, type Cost, type CostOf, type Layout, type Offer } from './layout';
import { isBelow, leastCost } from './least-cost';
import type { Part } from './parts';
import type { Print } from './prints';
import { isSpent } from './purse';

export type Choice =
	| { readonly status: 'planned'; readonly layout: Layout; readonly offers: readonly (readonly Offer[])[] }
	| { readonly status: 'impossible' | 'unknown' };

/**
 * Chooses a design for every slot that shows one and plans all seats together, at the least cost over all
 * choices; among equals the first by colour wish and the stash's order. `impossible` and `minimum` hold over all
 * choices too: the search leaves out only designs that are like one it has tried, and branches that cannot win.
 */
export function chooseDesigns(seats: readonly Seat[], costOf: CostOf, bench: Bench): Choice {
	const parts = seats.map(({ part }) => part);
	const offers = offersOf(seats);
	const floor = leastCost(parts, offers, costOf);
	const groups = groupsOf(parts);
	if (!floor || groups.some(({ key, seats: own }) => own.some((seat) => parts[seat]?.differs.has(key)))) {
		return { status: 'impossible' };
	}
	const named = likeness(seats, offers, costOf, Math.min(2, groups.length - 1));
	const open = groups.map((group) => candidatesFor(group.seats, seats, offers, costOf, named));
	if (open.some((candidates) => candidates.length === 0)) return { status: 'impossible' };
	const search = new DesignSearch(parts, offers, groups, open, floor, costOf, bench);
	return search.run();
}

interface Group {
	readonly key: string;
	readonly seats: readonly number[];
	readonly differs: ReadonlySet<string>;
}

function groupsOf(parts: readonly Part[]): Group[] {
	const groups = new Map<string, { key: string; seats: number[]; differs: ReadonlySet<string> }>();
	parts.forEach((part, seat) => {
		if (!part.single) return;
		const known = groups.get(part.group);
		if (known) known.seats.push(seat);
		else groups.set(part.group, { key: part.group, seats: [seat], differs: part.differs });
	});
	return [...groups.values()];
}

type Planned = Extract<Choice, { status: 'planned' }>;

class DesignSearch {
	private best: Planned | null = null;
	/** The least bound of a branch that was not settled. */
	private unsettled: Cost | null = null;

	constructor(
		private readonly parts: readonly Part[],
		private readonly offers: readonly (readonly Offer[])[],
		private readonly groups: readonly Group[],
		private readonly open: readonly (readonly Candidate[])[],
		private readonly floor: Cost,
		private readonly costOf: CostOf,
		private readonly bench: Bench
	) {}

	run(): Choice {
		this.visit([]);
		if (!this.best) return { status: this.unsettled ? 'unknown' : 'impossible' };
		const { layout } = this.best;
		const open = this.unsettled;
		const bound = open && isBelow(open, layout.cost) ? open : layout.cost;
		const proved = isBelow(bound, this.floor) ? this.floor : bound;
		return { ...this.best, layout: { ...layout, bound: proved, minimum: !isBelow(proved, layout.cost) } };
	}

	private visit(chosen: readonly Candidate[]): void {
		if (this.isWon()) return;
		if (isSpent(this.bench.purse)) return this.leave(this.floor);
		const group = this.groups[chosen.length];
		if (!group)
			return this.settle(
				chosen,
				this.parts.map(() => new Set<string>())
			);
		for (const candidate of this.options(group, chosen)) {
			if (this.cannotWin(candidate.least)) continue;
			this.visit([...chosen, candidate]);
		}
	}

	/** Designs that share a row with one already chosen, then one of each class of those that don't. */
	private options(group: Group, chosen: readonly Candidate[]): Candidate[] {
		const barred = new Set(
			this.groups.flatMap(({ key }, i) => (group.differs.has(key) ? (chosen[i]?.design ?? []) : []))
		);
		const touching: Candidate[] = [];
		const fresh = new Map<string, Candidate>();
		for (const candidate of this.open[chosen.length] ?? []) {
			if (barred.has(candidate.design)) continue;
			if (chosen.some((other) => touches(other, candidate))) touching.push(candidate);
			else if (!fresh.has(candidate.likeness)) fresh.set(candidate.likeness, candidate);
		}
		return [...touching, ...fresh.values()];
	}

	/** `barred`: by seat, designs that a mixed slot leaves to another that must differ from it. */
	private settle(chosen: readonly Candidate[], barred: readonly ReadonlySet<string>[]): void {
		if (this.isWon()) return;
		const offers = this.parts.map((part, seat) => this.offersAt(part, seat, chosen, barred));
		const least = leastCost(this.parts, offers, this.costOf);
		if (!least || this.cannotWin(least)) return;
		const outcome = layOut(this.parts, offers, this.costOf, this.bench);
		if (outcome.status === 'unknown') this.leave(least);
		if (outcome.status !== 'planned') return;
		const { layout } = outcome;
		if (this.cannotWin(layout.bound)) return;
		const clash = clashIn(this.parts, layout);
		if (clash) {
			for (const seat of clash.seats) {
				this.settle(
					chosen,
					barred.map((set, s) => (s === seat ? new Set([...set, clash.design]) : set))
				);
			}
			return;
		}
		if (!layout.minimum) this.leave(layout.bound);
		if (!this.best || isBelow(layout.cost, this.best.layout.cost))
			this.best = { status: 'planned', layout, offers };
	}

	private offersAt(
		part: Part,
		seat: number,
		chosen: readonly Candidate[],
		barred: readonly ReadonlySet<string>[]
	): readonly Offer[] {
		const own = this.groups.findIndex(({ key }) => part.single && key === part.group);
		if (own >= 0) return chosen[own]?.offers[seat] ?? [];
		const out = new Set(barred[seat]);
		this.groups.forEach(({ key }, i) => {
			if (part.differs.has(key) && chosen[i]) out.add(chosen[i].design);
		});
		return out.size === 0 ? (this.offers[seat] ?? []) : without(this.offers[seat] ?? [], out);
	}

	private isWon(): boolean {
		return this.best !== null && !isBelow(this.floor, this.best.layout.cost);
	}

	private cannotWin(least: Cost): boolean {
		return this.best !== null && !isBelow(least, this.best.layout.cost);
	}

	private leave(bound: Cost): void {
		if (!this.unsettled || isBelow(bound, this.unsettled)) this.unsettled = bound;
	}
}

function touches(a: Candidate, b: Candidate): boolean {
	if (a.design === b.design) return true;
	for (const sheet of b.sheets) {
		if (a.sheets.has(sheet)) return true;
	}
	return false;
}

function without(offers: readonly Offer[], designs: ReadonlySet<string>): Offer[] {
	const isLeft = (print: Print) => !designs.has(print.design);
	return offers.flatMap((offer) => {
		const prints = offer.prints.filter(isLeft);
		return prints.length > 0 ? [{ ...offer, prints }] : [];
	});
}

/** A design that two mixed slots both show although they must differ. */
function clashIn(parts: readonly Part[], layout: Layout): { seats: number[]; design: string } | null {
	const shown = parts.map((part) => {
		const placed = layout.sheets.flatMap(({ placements }) => placements.filter((laid) => laid.part === part));
		return new Set(placed.map(({ print }) => print.design));
	});
	for (const [a, part] of parts.entries()) {
		for (const [b, other] of parts.entries()) {
			if (a >= b || part.single || other.single || !part.differs.has(other.group)) continue;
			const design = [...(shown[a] ?? [])].find((name) => shown[b]?.has(name));
			if (design !== undefined) return { seats: [a, b], design };
		}
	}
	return null;
}
