import { colourDistance } from './colour-wish';
import type { Seat } from './components';
import type { CostOf, Cost, Offer } from './layout';
import { isBelow, leastCost } from './least-cost';
import type { Print } from './prints';
import { wayOn } from './serving';
import type { Sheet } from './shelf';

/** A design that could serve a whole group of slots by itself. */
export interface Candidate {
	readonly design: string;
	/** By seat; empty for seats of other groups. */
	readonly offers: readonly (readonly Offer[])[];
	readonly sheets: ReadonlySet<Sheet>;
	/** What the group alone would cost at least. */
	readonly least: Cost;
	/** Candidates of one class are alike in every way that counts, up to their names. */
	readonly likeness: string;
}

/** What every seat may use on its own terms, in the stash's order. */
export function offersOf(seats: readonly Seat[]): Offer[][] {
	return seats.map(({ part, uses }) =>
		uses.flatMap(({ sheet, prints, ways }) => {
			const way = wayOn({ sheet, prints, ways }, part.terms);
			return way ? [{ sheet, prints, way }] : [];
		})
	);
}

/** The designs that can serve the group, those of least bound first, then by colour wish and the stash's order. */
export function candidatesFor(
	group: readonly number[],
	seats: readonly Seat[],
	offers: readonly (readonly Offer[])[],
	costOf: CostOf,
	likenessOf: (design: string) => string
): Candidate[] {
	const byDesign = group.map((seat) => offersByDesign(offers[seat] ?? []));
	const found: { candidate: Candidate; colour: number }[] = [];
	const parts = group.flatMap((seat) => seats[seat]?.part ?? []);
	for (const design of byDesign[0]?.keys() ?? []) {
		const own = byDesign.map((designs) => designs.get(design) ?? []);
		if (own.some((list) => list.length === 0)) continue;
		const least = leastCost(parts, own, costOf);
		if (!least) continue;
		const sheets = new Set(own.flat().map(({ sheet }) => sheet));
		const all = seats.map((_, seat) => own[group.indexOf(seat)] ?? []);
		const candidate = { design, offers: all, sheets, least, likeness: likenessOf(design) };
		found.push({
			candidate,
			colour: colourOf(
				parts.map((part) => part.slot.colour),
				sheets
			)
		});
	}
	return found
		.sort((a, b) => compare(a.candidate.least, b.candidate.least) || a.colour - b.colour)
		.map(({ candidate }) => candidate);
}

function compare(a: Cost, b: Cost): number {
	return isBelow(a, b) ? -1 : isBelow(b, a) ? 1 : 0;
}

function colourOf(wishes: readonly (string | null)[], sheets: ReadonlySet<Sheet>): number {
	return wishes.reduce(
		(sum, wish) =>
			sum + (wish === null ? 0 : Math.min(...[...sheets].map(({ supply }) => colourDistance(wish, supply)))),
		0
	);
}

function offersByDesign(offers: readonly Offer[]): Map<string, Offer[]> {
	const designs = new Map<string, Offer[]>();
	for (const offer of offers) {
		for (const design of new Set(offer.prints.map((print) => print.design))) {
			const prints = offer.prints.filter((print) => print.design === design);
			const narrowed = prints.length === offer.prints.length ? offer : { ...offer, prints };
			const known = designs.get(design);
			if (known) known.push(narrowed);
			else designs.set(design, [narrowed]);
		}
	}
	return designs;
}

/**
 * Names a design's class: what its rows offer to every seat, and `depth` steps further over the rows' other
 * faces, by which a chain of groups could come to share sheets.
 */
export function likeness(
	seats: readonly Seat[],
	offers: readonly (readonly Offer[])[],
	costOf: CostOf,
	depth: number
): (design: string) => string {
	const total = seats.reduce((sum, { part }) => sum + part.pieces.reduce((all, { qty }) => all + qty, 0), 0);
	const seatsOf = new Map<Sheet, { seat: number; prints: readonly Print[] }[]>();
	const holders = new Map<string, Set<Sheet>>();
	offers.forEach((list, seat) => {
		for (const { sheet, prints } of list) {
			const known = seatsOf.get(sheet);
			if (known) known.push({ seat, prints });
			else seatsOf.set(sheet, [{ seat, prints }]);
			for (const { design } of sheet.prints) {
				const sheets = holders.get(design);
				if (sheets) sheets.add(sheet);
				else holders.set(design, new Set([sheet]));
			}
		}
	});
	const sheetName = (sheet: Sheet, design: string): string => {
		const faces = sheet.prints.map((print) => {
			const open = (seatsOf.get(sheet) ?? [])
				.filter(({ prints }) => prints.includes(print))
				.map(({ seat }) => seat);
			return `${print.design === design ? 'own' : 'other'}${print.bound ? '^' : ''}${open.join('.')}`;
		});
		return `${sheet.supply.kind} ${sheet.w} ${sheet.h} ${Math.min(total, sheet.count)} ${costOf(sheet).join('/')} ${faces.sort().join()}`;
	};
	const nameAt = (design: string, sheets: ReadonlySet<Sheet>, steps: number): string =>
		[...sheets]
			.map((sheet) => {
				const name = sheetName(sheet, design);
				if (steps === 0) return name;
				const others = sheet.prints.filter((print) => print.design !== design);
				return `${name}(${others.map((print) => nameAt(print.design, holders.get(print.design) ?? new Set(), steps - 1)).join()})`;
			})
			.sort()
			.join(';');
	return (design) => nameAt(design, holders.get(design) ?? new Set(), depth);
}
