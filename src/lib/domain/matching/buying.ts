import { INCH, MILLIMETRE, type Length } from '../length';
import { LIES } from '../cutting/problem';
import type { SheetSupply } from '../stash';
import type { Seat } from './components';
import { DEEPEST } from './design-classes';
import { chooseDesigns } from './designs';
import type { Bench, CostOf } from './layout';
import { lieUnder, roomFor } from './lies';
import type { Part, Terms } from './parts';
import { seatOn } from './papers';
import type { Print } from './prints';
import type { Use } from './serving';
import type { Sheet } from './shelf';
import { Uses } from './uses';
import type { MatchOptions } from './verdict';

export interface MissingSheets {
	readonly w: Length;
	readonly h: Length;
	readonly count: number;
	readonly custom?: boolean;
}

/**
 * The fewest sheets that, bought for this seat, make it possible beside what is owned and what the other seats
 * cut: in the owned whole-sheet size that cuts most of its pieces, else a standard one, else made to measure.
 * A slot of one design buys for the design that lacks least. Null where the search did not find them.
 */
export function sheetsToBuy(
	seats: readonly Seat[],
	lacking: Part,
	terms: Terms,
	bench: Bench
): MissingSheets[] | null {
	const bought = new Map<Sheet, boolean>();
	const at = seats.map((seat) => {
		if (seat.part.slot !== lacking.slot || seat.part.project !== lacking.project) return seatOn(seat, terms);
		const designs = seat.part.single ? modelsOf(seat.uses.list, seats) : null;
		const owned = designs ? shownBy(seat.uses.list, designs) : seat.uses.list;
		const more = moreFor(seat.part, designs ?? [{ prints: null, uses: owned }], bench.options);
		for (const { use, custom } of more) bought.set(use.sheet, custom);
		return seatOn({ ...seat, uses: new Uses([...owned, ...more.map(({ use }) => use)]) }, terms);
	});
	const costOf: CostOf = (sheet) => (bought.has(sheet) ? [1, 0] : [0, 1]);
	const choice = chooseDesigns(at, costOf, bench);
	if (choice.status !== 'planned') return null;
	const sizes = new Map<string, MissingSheets>();
	for (const { sheet } of choice.layout.sheets) {
		const custom = bought.get(sheet);
		if (custom === undefined) continue;
		const { w, h } = sheet.supply;
		const key = `${w} ${h} ${custom}`;
		sizes.set(key, { w, h, count: (sizes.get(key)?.count ?? 0) + 1, ...(custom ? { custom } : {}) });
	}
	return [...sizes.values()];
}

interface More {
	readonly use: Use;
	readonly custom: boolean;
}

/** What could be bought for a part: for every design that it may show, or for one nobody owns yet. */
function moreFor(part: Part, designs: readonly Design[], options: MatchOptions): More[] {
	const total = part.pieces.reduce((sum, { qty }) => sum + qty, 0);
	const kinds = designs.length > 0 ? designs : [{ prints: null, uses: [] }];
	return kinds.flatMap(({ prints, uses: own }) => {
		const asked = own.filter(({ ways }) => ways.some(({ material }) => material < 0));
		const whole = asked.filter(({ sheet }) => !sheet.supply.offcut && !sheet.remnant);
		const size = bestSize(part, whole);
		const models = size ? distinct(whole.filter(({ sheet }) => isSize(sheet, size))) : [];
		const base = models.length > 0 ? models.map((use) => copyOf(use, total)) : [];
		const face = prints ?? [UNKNOWN];
		const left = part.pieces.filter((cut) => !base.some(({ sheet }) => fits(cut.piece, sheet, face)));
		const standard = options.units === 'in' ? SQUARE_12 : A4;
		const needsStandard = left.filter((cut) => fits(cut.piece, standard, face));
		const made = left.filter((cut) => !needsStandard.includes(cut));
		return [
			...base.map((use) => ({ use, custom: false })),
			...(needsStandard.length > 0 ? [{ use: blank(part, standard, face, total), custom: false }] : []),
			...made.map(({ piece }) => ({ use: blank(part, turnedFor(piece, face), face, total), custom: true }))
		];
	});
}

const SQUARE_12 = { w: 12 * INCH, h: 12 * INCH };
const A4 = { w: 210 * MILLIMETRE, h: 297 * MILLIMETRE };
const UNKNOWN: Print = { face: 'A', design: '\n', name: '', bound: false, classes: [-1, -1, -1] };

interface Size {
	readonly w: Length;
	readonly h: Length;
}

interface Design {
	readonly prints: readonly Print[] | null;
	readonly uses: readonly Use[];
}

/**
 * Designs with the rows that show them, in the stash's order: of a class that is alike in all that counts no more
 * than could be shown at once, and whatever some slot asks for by name.
 */
function modelsOf(uses: readonly Use[], seats: readonly Seat[]): Design[] {
	const groups = new Set(seats.flatMap(({ part }) => (part.single ? [part.group] : []))).size;
	const depth = Math.min(DEEPEST, Math.max(0, groups - 1));
	const chosen = new Set(seats.map(({ part }) => part.slot.design));
	const seen = new Map<number, number>();
	const designs = new Map<string, { prints: Print[]; uses: Use[] } | null>();
	for (const use of uses) {
		for (const print of use.prints) {
			let known = designs.get(print.design);
			if (known === undefined) {
				const number = print.classes[depth] ?? -1;
				const alike = seen.get(number) ?? 0;
				seen.set(number, alike + 1);
				known = alike < groups || chosen.has(print.name) ? { prints: [], uses: [] } : null;
				designs.set(print.design, known);
			}
			if (!known) continue;
			if (!known.prints.some(({ bound }) => bound === print.bound)) known.prints.push(print);
			if (known.uses.at(-1) !== use) known.uses.push(use);
		}
	}
	return [...designs.values()].filter((design) => design !== null);
}

/** The rows that show one of the designs, with no other face. */
function shownBy(uses: readonly Use[], designs: readonly Design[]): Use[] {
	const shown = new Set(designs.flatMap(({ prints }) => (prints ?? []).map(({ design }) => design)));
	return uses.flatMap((use) => {
		const prints = use.prints.filter(({ design }) => shown.has(design));
		if (prints.length === 0) return [];
		return [prints.length === use.prints.length ? use : { ...use, prints }];
	});
}

/** The size on which most of the pieces can be cut at all; the first in the stash's order among equals. */
function bestSize(part: Part, whole: readonly Use[]): Size | null {
	let best: { size: Size; pieces: number } | null = null;
	for (const { sheet, prints } of whole) {
		const pieces = part.pieces.reduce(
			(sum, { piece, qty }) => sum + (fits(piece, sheet, prints) ? qty : 0),
			0
		);
		if (pieces > (best?.pieces ?? 0)) best = { size: { w: sheet.supply.w, h: sheet.supply.h }, pieces };
	}
	return best?.size ?? null;
}

function fits(piece: Part['pieces'][number]['piece'], size: Size, prints: readonly Print[]): boolean {
	const cut = { piece, qty: 1, w: piece.w, h: piece.h };
	return prints.some(({ bound }) => (lieUnder(cut, bound) & roomFor(cut, size)) !== 0);
}

function isSize({ supply }: Sheet, { w, h }: Size): boolean {
	return supply.w === w && supply.h === h;
}

/** Rows that differ in their faces' designs or directions or in the size that they offer. */
function distinct(uses: readonly Use[]): Use[] {
	const known = new Map<string, Use>();
	for (const use of uses) {
		const faces = use.prints.map(({ design, bound }) => `${design}${bound}`).join('\n');
		const key = `${use.sheet.w} ${use.sheet.h} ${faces}`;
		if (!known.has(key)) known.set(key, use);
	}
	return [...known.values()];
}

function copyOf({ sheet, prints }: Use, count: number): Use {
	const supply: SheetSupply = { ...sheet.supply, key: '', count: 'counted', arrives: null };
	return {
		sheet: {
			...sheet,
			supply,
			count,
			order: Number.MAX_SAFE_INTEGER,
			first: 1,
			sort: -2 - sheet.sort,
			left: false
		},
		prints,
		ways: BOUGHT
	};
}

function blank(part: Part, { w, h }: Size, prints: readonly Print[], count: number): Use {
	const supply: SheetSupply = {
		group: 'sheet',
		key: '',
		name: part.slot.design ?? '',
		collection: part.slot.collection,
		kind: part.slot.material.kind,
		bin: null,
		barcode: null,
		price: null,
		arrives: null,
		w,
		h,
		unit: 'in',
		sheets: count,
		count: 'counted',
		faces: [],
		weight: null,
		caliper: null,
		colours: [],
		offcut: false,
		strip: null
	};
	return {
		sheet: {
			supply,
			order: Number.MAX_SAFE_INTEGER,
			w,
			h,
			x: 0,
			y: 0,
			count,
			first: 1,
			remnant: false,
			prints,
			sort: -1,
			left: false
		},
		prints,
		ways: BOUGHT
	};
}

const BOUGHT = [{ material: -1, unsaid: null }] as const;

/** The size of a sheet on which the piece lies as the print binds it. */
function turnedFor(piece: Part['pieces'][number]['piece'], prints: readonly Print[]): Size {
	const cut = { piece, qty: 1, w: piece.w, h: piece.h };
	const upright = prints.some(({ bound }) => (lieUnder(cut, bound) & LIES.upright) !== 0);
	return upright ? { w: piece.w, h: piece.h } : { w: piece.h, h: piece.w };
}
