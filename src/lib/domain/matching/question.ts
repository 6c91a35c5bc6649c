import {
	LIES,
	type CutPlan,
	type CutProblem,
	type CutSheet,
	type Lie,
	type SheetKind
} from '../cutting/problem';
import { colourDistance } from './colour-wish';
import type { CostOf, LaidSheet, Offer } from './layout';
import type { Sorts } from './least-cost';
import { lieOn, lieUnder } from './lies';
import type { Cuttable, Part } from './parts';
import type { Sheet } from './shelf';
import type { MatchOptions } from './verdict';

/** A row with what it offers to each part; null where it isn't offered. */
export interface Row {
	readonly sheet: Sheet;
	readonly offers: readonly (Offer | null)[];
}

/** Rows that are one sheet kind to the planner, in the order in which they are opened. */
export interface Kind extends SheetKind {
	readonly lies: readonly Lie[];
	readonly rows: readonly Row[];
}

export interface Question {
	readonly parts: readonly Part[];
	/** For each piece of the problem, what it is. */
	readonly cuts: readonly { readonly part: number; readonly cut: Cuttable }[];
	readonly kinds: readonly Kind[];
}

export function questionOf(parts: readonly Part[], sorts: readonly Sorts[], costOf: CostOf): Question {
	const cuts = parts.flatMap((part, p) => part.pieces.map((cut) => ({ part: p, cut })));
	const total = cuts.reduce((sum, { cut }) => sum + cut.qty, 0);
	const kinds = new Map<
		string,
		{ count: number; cost: readonly [number, number]; lies: Lie[]; rows: Row[] }
	>();
	for (const rows of alikeRows(parts.length, sorts)) {
		const [first] = rows;
		if (!first) continue;
		const { sheet, offers } = first;
		const lies = cuts.map(({ part, cut }) => {
			const [offer, terms] = [offers[part], parts[part]?.terms];
			return offer && terms ? lieOn(cut, sheet, offer.prints, terms) : LIES.never;
		});
		if (lies.every((lie) => lie === LIES.never)) continue;
		const cost = costOf(sheet);
		const key = `${sheet.w} ${sheet.h} ${cost[0]} ${cost[1]} ${lies.join('')}`;
		const known = kinds.get(key) ?? { count: 0, cost, lies, rows: [] };
		known.count = Math.min(total, known.count + rows.reduce((sum, row) => sum + row.sheet.count, 0));
		known.rows.push(...rows);
		kinds.set(key, known);
	}
	const rank = rankOf(parts);
	return {
		parts,
		cuts,
		kinds: [...kinds.values()].map((kind) => ({
			...kind,
			w: kind.rows[0]?.sheet.w ?? 0,
			h: kind.rows[0]?.sheet.h ?? 0,
			rows: kind.rows.sort((a, b) => rank(a) - rank(b) || a.sheet.order - b.sheet.order)
		}))
	};
}

export function problemOf({ cuts }: Question, kinds: readonly Kind[], options: MatchOptions): CutProblem {
	return {
		sheets: kinds.map(({ w, h, count, cost }) => ({ w, h, count, cost })),
		pieces: cuts.map(({ cut }, c) => ({
			w: cut.w,
			h: cut.h,
			qty: cut.qty,
			lies: kinds.map((kind) => kind.lies[c] ?? LIES.never)
		})),
		kerf: options.kerf,
		interlocked: options.knife
	};
}

/** Rows that are offered alike to every part. */
function alikeRows(parts: number, sorts: readonly Sorts[]): Iterable<readonly Row[]> {
	if (parts === 1)
		return (sorts[0] ?? []).map((offers) => offers.map((offer) => ({ sheet: offer.sheet, offers: [offer] })));
	const names = new Map<Sheet, { name: string; offers: (Offer | null)[] }>();
	sorts.forEach((own, p) =>
		own.forEach((offers, number) => {
			for (const offer of offers) {
				const known = names.get(offer.sheet) ?? {
					name: '',
					offers: Array.from({ length: parts }, () => null)
				};
				known.name += `${p}:${number} `;
				known.offers[p] = offer;
				names.set(offer.sheet, known);
			}
		})
	);
	const alike = new Map<string, Row[]>();
	for (const [sheet, { name, offers }] of names) {
		const known = alike.get(name);
		if (known) known.push({ sheet, offers });
		else alike.set(name, [{ sheet, offers }]);
	}
	return alike.values();
}

/** Remnants before untouched rows, then by the colours that slots of mixed designs wish for. */
function rankOf(parts: readonly Part[]): (row: Row) => number {
	const wishes = parts.flatMap((part, p) =>
		!part.single && part.slot.colour !== null ? [{ p, colour: part.slot.colour }] : []
	);
	return ({ sheet, offers }) =>
		(sheet.remnant ? -1000 : 0) +
		wishes.reduce((sum, { p, colour }) => sum + (offers[p] ? colourDistance(colour, sheet.supply) : 0), 0);
}

/** Gives every opened sheet of the plan its row and number, and every piece the face that it shows. */
export function namedSheets({ parts, cuts }: Question, kinds: readonly Kind[], plan: CutPlan): LaidSheet[] {
	const opened = kinds.map(() => 0);
	return plan.sheets.flatMap((planned) => {
		const nth = opened[planned.sheet] ?? 0;
		opened[planned.sheet] = nth + 1;
		const row = nthOf(kinds[planned.sheet]?.rows ?? [], nth);
		return row ? [laidSheet(row.row, row.nth, planned, cuts, parts)] : [];
	});
}

function nthOf(rows: readonly Row[], nth: number): { row: Row; nth: number } | null {
	let before = 0;
	for (const row of rows) {
		if (nth < before + row.sheet.count) return { row, nth: row.sheet.first + nth - before };
		before += row.sheet.count;
	}
	return null;
}

function laidSheet(
	{ sheet, offers }: Row,
	nth: number,
	planned: CutSheet,
	cuts: Question['cuts'],
	parts: readonly Part[]
): LaidSheet {
	const placements = planned.placements.flatMap(({ piece, x, y, w, h, turned }) => {
		const known = cuts[piece];
		const [part, offer] = known ? [parts[known.part], offers[known.part]] : [];
		const lie = turned ? LIES.turned : LIES.upright;
		const print = offer?.prints.find(({ bound }) => known && (lieUnder(known.cut, bound) & lie) !== 0);
		return known && part && offer && print
			? [{ part, cut: known.cut, x, y, w, h, turned, print, way: offer.way }]
			: [];
	});
	return { sheet, nth, placements, cuts: planned.cuts, offcuts: planned.offcuts };
}
