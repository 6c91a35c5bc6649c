import {
	LIES,
	type CutPlan,
	type CutProblem,
	type CutSheet,
	type Lie,
	type SheetKind
} from '../cutting/problem';
import type { MatchOptions } from './verdict';
import type { CostOf, LaidSheet, Offer } from './layout';
import { lieOn, lieUnder } from './lies';
import type { Cuttable, Part } from './parts';
import type { Sheet } from './shelf';

interface Member {
	readonly sheet: Sheet;
	/** By part, null where the row isn't offered to it. */
	readonly offers: readonly (Offer | null)[];
}

export interface Question {
	readonly problem: CutProblem;
	/** For each piece of the problem, what it is. */
	readonly cuts: readonly { readonly part: number; readonly cut: Cuttable }[];
	/** For each sheet kind of the problem, the rows that are alike, in the order in which they are opened. */
	readonly rows: readonly (readonly Member[])[];
	readonly parts: readonly Part[];
}

/** Null where some piece has no sheet to lie on, or there is less paper than pieces: no search is needed. */
export function questionOf(
	parts: readonly Part[],
	offers: readonly (readonly Offer[])[],
	costOf: CostOf,
	options: MatchOptions
): Question | null {
	const cuts = parts.flatMap((part, p) => part.pieces.map((cut) => ({ part: p, cut })));
	const total = cuts.reduce((sum, { cut }) => sum + cut.qty, 0);
	const kinds = new Map<string, { sheet: SheetKind; lies: Lie[]; rows: Member[] }>();
	for (const member of membersOf(parts, offers)) {
		const { sheet } = member;
		const lies = cuts.map(({ part, cut }) => {
			const offer = member.offers[part];
			const terms = parts[part]?.terms;
			return offer && terms ? lieOn(cut, sheet, offer.prints, terms) : LIES.never;
		});
		if (lies.every((lie) => lie === LIES.never)) continue;
		const cost = costOf(sheet);
		const key = `${sheet.w} ${sheet.h} ${cost.join(' ')} ${lies.join('')}`;
		const known = kinds.get(key);
		const count = Math.min(total, (known?.sheet.count ?? 0) + sheet.count);
		kinds.set(key, {
			sheet: { w: sheet.w, h: sheet.h, count, cost },
			lies,
			rows: known ? [...known.rows, member] : [member]
		});
	}
	const alike = [...kinds.values()];
	const pieces = cuts.map(({ cut }, c) => ({
		w: cut.w,
		h: cut.h,
		qty: cut.qty,
		lies: alike.map((kind) => kind.lies[c] ?? LIES.never)
	}));
	if (pieces.some((piece) => piece.qty > 0 && piece.lies.every((lie) => lie === LIES.never))) return null;
	const wanted = pieces.reduce((sum, { w, h, qty }) => sum + w * h * qty, 0);
	if (wanted > alike.reduce((sum, { sheet }) => sum + sheet.w * sheet.h * sheet.count, 0)) return null;
	const problem = {
		sheets: alike.map((kind) => kind.sheet),
		pieces,
		kerf: options.kerf,
		interlocked: options.knife
	};
	return { problem, cuts, rows: alike.map((kind) => kind.rows), parts };
}

function membersOf(parts: readonly Part[], offers: readonly (readonly Offer[])[]): Member[] {
	const members = new Map<Sheet, (Offer | null)[]>();
	offers.forEach((list, p) => {
		for (const offer of list) {
			const known = members.get(offer.sheet) ?? parts.map(() => null);
			known[p] = offer;
			members.set(offer.sheet, known);
		}
	});
	return [...members]
		.map(([sheet, by]) => ({ sheet, offers: by }))
		.sort((a, b) => Number(b.sheet.remnant) - Number(a.sheet.remnant) || a.sheet.order - b.sheet.order);
}

/** Gives every opened sheet of the plan its row and number, and every piece the face that it shows. */
export function namedSheets({ rows, cuts, parts }: Question, plan: CutPlan): LaidSheet[] {
	const opened = rows.map(() => 0);
	return plan.sheets.flatMap((planned) => {
		const nth = opened[planned.sheet] ?? 0;
		opened[planned.sheet] = nth + 1;
		const row = nthOf(rows[planned.sheet] ?? [], nth);
		return row ? [laidSheet(row.member, row.nth, planned, cuts, parts)] : [];
	});
}

function nthOf(rows: readonly Member[], nth: number): { member: Member; nth: number } | null {
	let before = 0;
	for (const member of rows) {
		if (nth < before + member.sheet.count) return { member, nth: member.sheet.first + nth - before };
		before += member.sheet.count;
	}
	return null;
}

function laidSheet(
	{ sheet, offers }: Member,
	nth: number,
	planned: CutSheet,
	cuts: Question['cuts'],
	parts: readonly Part[]
): LaidSheet {
	const placements = planned.placements.flatMap(({ piece, x, y, w, h, turned }) => {
		const known = cuts[piece];
		const part = known && parts[known.part];
		const offer = known && offers[known.part];
		const lie = turned ? LIES.turned : LIES.upright;
		const print = offer?.prints.find((face) => (lieUnder(known!.cut, face.bound) & lie) !== 0);
		return known && part && offer && print
			? [{ part, cut: known.cut, x, y, w, h, turned, print, way: offer.way }]
			: [];
	});
	return { sheet, nth, placements, cuts: planned.cuts, offcuts: planned.offcuts };
}
