import { Candidates, touches, type Candidate, type Group } from './candidates';
import type { Seat } from './components';
import { DEEPEST } from './design-classes';
import { layOut, type Bench, type Cost, type CostOf, type Layout, type Offer, type Outcome } from './layout';
import { isBelow, leastCost, type Sorts } from './least-cost';
import type { Part } from './parts';
import type { Offers } from './uses';

export type Choice =
	| { readonly status: 'planned'; readonly layout: Layout; readonly sorts: readonly Sorts[] }
	| { readonly status: 'impossible' | 'unknown' };

/**
 * Chooses a design for every slot that shows one and plans all seats together, at the least cost over all
 * choices; among equals the roomy before the tight, then by colour wish and the stash's order. `impossible` and
 * `minimum` hold over all choices too: the search leaves out only designs that are like one it has tried, and
 * branches that cannot win.
 */
export function chooseDesigns(seats: readonly Seat[], costOf: CostOf, bench: Bench): Choice {
	const purse = bench.purse.within(1 / 2);
	if (purse.isSpent) return { status: 'unknown' };
	const parts = seats.map(({ part }) => part);
	const offers = seats.map(({ part, uses }) => uses.on(part.terms));
	const groups = groupsOf(parts);
	if (groups.some(({ key, differs }) => differs.has(key))) return { status: 'impossible' };
	const chosen = new Set(parts.flatMap(({ slot }) => slot.design ?? []));
	const depth = Math.min(DEEPEST, Math.max(0, groups.length - 1));
	const candidates = groups.map((group) => new Candidates(group, parts, offers, costOf, depth, chosen));
	return new DesignSearch(parts, offers, groups, candidates, costOf, { ...bench, purse }).run();
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

/** One call of the planner may spend so much while all choices are looked through once, then that many times it. */
const FIRST_LOOK = 1_000;
const DEEPER = 8;
const NOTHING: Cost = [0, 0];

type Planned = Extract<Choice, { status: 'planned' }>;

class DesignSearch {
	private best: Planned | null = null;
	/** The least bound of a branch that was not settled. */
	private unsettled: Cost | null = null;
	private floor: Cost = [0, 0];
	private readonly size: number;
	private most = FIRST_LOOK;
	/** What groups come to by themselves, and how hard that was looked for. */
	private readonly alone = new Map<Candidate, Outcome & { readonly most: number }>();

	constructor(
		private readonly parts: readonly Part[],
		private readonly offers: readonly Offers[],
		private readonly groups: readonly Group[],
		private readonly candidates: readonly Candidates[],
		private readonly costOf: CostOf,
		private readonly bench: Bench
	) {
		this.size = parts.reduce((sum, { pieces }) => sum + pieces.length, 0);
	}

	run(): Choice {
		if (!this.setFloor()) return { status: 'impossible' };
		for (this.most = FIRST_LOOK; ; this.most *= DEEPER) {
			this.unsettled = null;
			this.visit([], NOTHING);
			if (this.isWon() || !this.unsettled || this.bench.purse.isSpent) break;
			if (4 * this.most >= this.bench.purse.left) break;
		}
		if (!this.best) return { status: this.unsettled ? 'unknown' : 'impossible' };
		const { layout } = this.best;
		const open = this.unsettled;
		const bound = open && isBelow(open, layout.cost) ? open : layout.cost;
		const proved = isBelow(bound, this.floor) ? this.floor : bound;
		return { ...this.best, layout: { ...layout, bound: proved, minimum: !isBelow(proved, layout.cost) } };
	}

	/** What any choice costs: each group at least its own cheapest, and all together what their area asks for. */
	private setFloor(): boolean {
		for (const candidates of this.candidates) {
			const [first] = candidates.firsts(() => true);
			if (!first) return false;
			if (isBelow(this.floor, first.least)) this.floor = first.least;
		}
		if (this.parts.length === 1 && this.groups.length === 1) return true;
		const joint = leastCost(
			this.parts,
			this.offers.map(({ sorts }) => sorts),
			this.costOf
		);
		if (joint && isBelow(this.floor, joint)) this.floor = joint;
		return joint !== null;
	}

	/** `spent`: what the chosen cost at least. */
	private visit(chosen: readonly Candidate[], spent: Cost): void {
		const group = this.groups[chosen.length];
		if (!group)
			return this.settle(
				chosen,
				this.parts.map(() => new Set<string>())
			);
		for (const { candidate, fresh } of this.options(group, chosen)) {
			if (this.isWon()) return;
			if (this.bench.purse.isSpent) return this.leave(this.floor);
			const least = fresh ? sumOf([spent, candidate.least]) : larger(spent, candidate.least);
			if (this.cannotWin(least)) continue;
			if (fresh && this.groups.length > 1 && this.layAlone(candidate, group).status !== 'planned') {
				if (this.alone.get(candidate)?.status === 'unknown') this.leave(larger(this.floor, least));
				continue;
			}
			this.visit([...chosen, candidate], least);
		}
	}

	/** Designs that share a row with one already chosen, then one of each class of those that don't. */
	private options(group: Group, chosen: readonly Candidate[]): { candidate: Candidate; fresh: boolean }[] {
		const candidates = this.candidates[chosen.length];
		if (!candidates) return [];
		const barred = new Set(
			this.groups.flatMap(({ key }, i) => (group.differs.has(key) ? (chosen[i]?.design ?? []) : []))
		);
		const near = chosen.flatMap(({ sheets }) =>
			[...sheets].flatMap(({ prints }) => prints.map(({ design }) => design))
		);
		const touching = [...new Set(near)].flatMap((design) => {
			const candidate = barred.has(design) ? null : candidates.of(design);
			return candidate && chosen.some((other) => touches(other, candidate)) ? [candidate] : [];
		});
		const known = new Set(touching.map(({ design }) => design));
		const fresh = candidates.firsts((design) => !known.has(design) && !barred.has(design));
		this.bench.purse.spend((touching.length + fresh.length) * this.size);
		return [
			...touching.map((candidate) => ({ candidate, fresh: false })),
			...fresh.map((candidate) => ({ candidate, fresh: true }))
		];
	}

	/** The group's own pieces on that design, as if nothing else were cut. */
	private layAlone(candidate: Candidate, group: Group): Outcome {
		const known = this.alone.get(candidate);
		if (known && (isSettled(known) || known.most >= this.most)) return known;
		const parts = group.seats.flatMap((seat) => this.parts[seat] ?? []);
		const sorts = candidate.offers.map((offers) => offers.map((offer) => [offer]));
		const outcome = layOut(parts, sorts, this.costOf, { ...this.bench, most: this.most });
		this.alone.set(candidate, { ...outcome, most: this.most });
		return outcome;
	}

	/** `barred`: by seat, designs that a mixed slot leaves to another that must differ from it. */
	private settle(chosen: readonly Candidate[], barred: readonly ReadonlySet<string>[]): void {
		if (this.isWon()) return;
		const sorts = this.parts.map((part, seat) => this.sortsAt(part, seat, chosen, barred));
		this.bench.purse.spend(this.size * sorts.reduce((sum, own) => sum + own.length, 0));
		const least = leastCost(this.parts, sorts, this.costOf);
		if (!least || this.cannotWin(least)) return;
		const apart = this.layApart(chosen, sorts);
		const mixed = this.parts.some(({ single }) => !single);
		if (apart && (apart.status !== 'planned' || !mixed))
			return this.take(apart, chosen, barred, sorts, least);
		if (apart) {
			this.take(
				{ ...apart, layout: { ...apart.layout, bound: least, minimum: false } },
				chosen,
				barred,
				sorts,
				least
			);
			if (this.isWon()) return;
		}
		const bench = { ...this.bench, most: this.most };
		this.take(layOut(this.parts, sorts, this.costOf, bench, least), chosen, barred, sorts, least);
	}

	private take(
		outcome: Outcome,
		chosen: readonly Candidate[],
		barred: readonly ReadonlySet<string>[],
		sorts: readonly Sorts[],
		least: Cost
	): void {
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
		if (!this.cannotWin(layout.cost)) this.best = { status: 'planned', layout, sorts };
	}

	/**
	 * Groups on designs that share no row are laid out one by one, then the mixed slots on the rows that are left;
	 * null where that settles nothing.
	 */
	private layApart(chosen: readonly Candidate[], sorts: readonly Sorts[]): Outcome | null {
		const mixed = this.parts.flatMap((part, seat) =>
			part.single ? [] : [{ part, sorts: sorts[seat] ?? [] }]
		);
		if (chosen.length + mixed.length < 2 || chosen.length === 0) return null;
		if (chosen.some((one, i) => chosen.slice(0, i).some((other) => touches(one, other)))) return null;
		const outcomes = chosen.flatMap((candidate, i) => {
			const group = this.groups[i];
			return group ? [this.layAlone(candidate, group)] : [];
		});
		if (mixed.length > 0 && outcomes.every(({ status }) => status === 'planned')) {
			const taken = new Set(chosen.flatMap(({ sheets }) => [...sheets]));
			const free = mixed.map(({ sorts: own }) =>
				own.flatMap((alike) => {
					const left = alike.filter(({ sheet }) => !taken.has(sheet));
					return left.length > 0 ? [left] : [];
				})
			);
			const beside = layOut(
				mixed.map(({ part }) => part),
				free,
				this.costOf,
				{ ...this.bench, most: this.most }
			);
			if (beside.status !== 'planned') return null;
			outcomes.push(beside);
		}
		const layouts = outcomes.flatMap((outcome) => (outcome.status === 'planned' ? [outcome.layout] : []));
		if (layouts.length < outcomes.length) return outcomes.find(({ status }) => status !== 'planned') ?? null;
		return {
			status: 'planned',
			layout: {
				sheets: layouts.flatMap(({ sheets }) => sheets),
				cost: sumOf(layouts.map(({ cost }) => cost)),
				bound: sumOf(layouts.map(({ bound }) => bound)),
				minimum: layouts.every(({ minimum }) => minimum)
			}
		};
	}

	private sortsAt(
		part: Part,
		seat: number,
		chosen: readonly Candidate[],
		barred: readonly ReadonlySet<string>[]
	): Sorts {
		const own = part.single ? this.groups.findIndex(({ key }) => key === part.group) : -1;
		const place = this.groups[own]?.seats.indexOf(seat) ?? -1;
		if (own >= 0) return (chosen[own]?.offers[place] ?? []).map((offer) => [offer]);
		const out = new Set(barred[seat]);
		this.groups.forEach(({ key }, i) => {
			if (part.differs.has(key) && chosen[i]) out.add(chosen[i].design);
		});
		const offers = this.offers[seat];
		if (out.size === 0) return offers?.sorts ?? [];
		return (offers?.sorts ?? []).flatMap((alike) => without(alike, out));
	}

	private isWon(): boolean {
		return this.best !== null && (this.bench.goal === 'any' || !isBelow(this.floor, this.best.layout.cost));
	}

	private cannotWin(least: Cost): boolean {
		return this.best !== null && !isBelow(least, this.best.layout.cost);
	}

	private leave(bound: Cost): void {
		if (!this.unsettled || isBelow(bound, this.unsettled)) this.unsettled = bound;
	}
}

function isSettled(outcome: Outcome): boolean {
	return outcome.status === 'impossible' || (outcome.status === 'planned' && outcome.layout.minimum);
}

function larger(a: Cost, b: Cost): Cost {
	return isBelow(a, b) ? b : a;
}

function sumOf(costs: readonly Cost[]): Cost {
	return costs.reduce((sum, cost) => [sum[0] + cost[0], sum[1] + cost[1]], [0, 0] as Cost);
}

/** Offers that lose a face to the barred designs are no longer like the others of their sort. */
function without(alike: readonly Offer[], designs: ReadonlySet<string>): Offer[][] {
	const touched = alike.filter(({ prints }) => prints.some(({ design }) => designs.has(design)));
	if (touched.length === 0) return [[...alike]];
	const left = touched.flatMap((offer) => {
		const prints = offer.prints.filter(({ design }) => !designs.has(design));
		return prints.length > 0 ? [[{ ...offer, prints }]] : [];
	});
	const others = alike.filter((offer) => !touched.includes(offer));
	return others.length > 0 ? [others, ...left] : left;
}

/** A design that two mixed slots both show although they must differ. */
function clashIn(parts: readonly Part[], layout: Layout): { seats: number[]; design: string } | null {
	const mixed = parts.flatMap((part, seat) => (part.single ? [] : [{ part, seat }]));
	if (mixed.length < 2) return null;
	const shown = mixed.map(({ part }) => {
		const placed = layout.sheets.flatMap(({ placements }) => placements.filter((laid) => laid.part === part));
		return new Set(placed.map(({ print }) => print.design));
	});
	for (const [a, one] of mixed.entries()) {
		for (const [b, other] of mixed.entries()) {
			if (a >= b || !one.part.differs.has(other.part.group)) continue;
			const design = [...(shown[a] ?? [])].find((name) => shown[b]?.has(name));
			if (design !== undefined) return { seats: [one.seat, other.seat], design };
		}
	}
	return null;
}
