/**
 * Puts pieces in one at a time: each at the best place of all open sheets, or into a sheet opened for it while
 * the price allows, or outside. Everything that builds or mends a plan comes down to this.
 */
import { PIECE, beside, findSpot, leaf, type Judge, type Spot } from './box';
import type { Opened } from './layout';
import type { Meter } from './meter';
import type { Model, ModelPiece, ModelSheet } from './model';
import type { Random } from './random';

/** Units for looking through one sheet for a place. */
const LOOK = 40;

/** An opened sheet and the area of the pieces in it. */
export interface FilledSheet extends Opened {
	readonly used: number;
}

export interface State {
	readonly sheets: readonly FilledSheet[];
	/** Model pieces that lie nowhere yet. */
	readonly outside: readonly number[];
	readonly cost: number;
}

export const EMPTY: State = { sheets: [], outside: [], cost: 0 };

export interface Manner {
	/** What all open sheets may cost. */
	readonly limit: number;
	/** The chance that a place is overlooked, which makes each insertion a little different. */
	readonly blink: number;
	readonly judge: Judge;
	/** The sheet kind to open next: always this one first, the cheapest for its area, or any of the cheap. */
	readonly opens: number | 'cheapest' | 'any';
}

/** The gap along the cut and the one across it: the smaller decides, or one of them. */
export const JUDGES: readonly Judge[] = [
	(along, across) => Math.min(along, across) + Math.max(along, across) / 1024,
	(along, across) => across + along / 1024,
	(along, across) => along + across / 1024
];

export type Measure = (piece: ModelPiece) => number;

export const MEASURES: readonly Measure[] = [
	({ area }) => area,
	({ w, h }) => Math.max(w, h),
	({ w, h }) => w + h,
	({ w, h }) => Math.min(w, h),
	({ w }) => w,
	({ h }) => h
];

export class Inserter {
	private readonly opened: number[];

	constructor(
		readonly model: Model,
		readonly random: Random,
		readonly meter: Meter
	) {
		this.opened = model.sheets.map(() => 0);
	}

	/** Largest first by `measure`, each taken for up to `noise` smaller than it is. */
	sorted(pieces: readonly number[], measure: Measure, noise: number): number[] {
		return pieces
			.map((piece) => ({
				piece,
				key: measure(this.piece(piece)) * (noise > 0 ? 1 - noise * this.random() : 1)
			}))
			.sort((a, b) => b.key - a.key || a.piece - b.piece)
			.map(({ piece }) => piece);
	}

	insert(state: State, pieces: readonly number[], manner: Manner): State {
		const sheets = state.sheets.slice();
		const outside = state.outside.slice();
		let { cost } = state;
		this.opened.fill(0);
		for (const { sheet } of sheets) this.opened[sheet] = (this.opened[sheet] as number) + 1;
		const judge = this.blinking(manner);
		for (const p of pieces) {
			if (this.placeAmong(sheets, p, judge)) continue;
			const kind = this.kindToOpen(p, manner.limit - cost, manner);
			if (kind < 0) outside.push(p);
			else {
				sheets.push(this.openFor(p, kind));
				this.opened[kind] = (this.opened[kind] as number) + 1;
				cost += this.sheet(kind).cost;
			}
		}
		return { sheets, outside, cost };
	}

	private blinking({ blink, judge }: Manner): Judge {
		if (blink === 0) return judge;
		const { random } = this;
		return (along, across) => (random() < blink ? Infinity : judge(along, across));
	}

	private placeAmong(sheets: FilledSheet[], p: number, judge: Judge): boolean {
		const piece = this.piece(p);
		const spot: Spot = { score: Infinity, target: null, axis: 1, turned: false };
		let chosen = -1;
		let looked = LOOK;
		for (let i = 0; i < sheets.length; i++) {
			const { sheet, box, used } = sheets[i] as FilledSheet;
			const { w, h, area, lies } = this.sheet(sheet);
			if (area - used < piece.area) continue;
			const lie = lies[p] as number;
			const before = spot.score;
			looked += LOOK;
			if (lie & 1) findSpot(box, PIECE, w - box.w, h - box.h, piece.w, piece.h, false, judge, spot);
			if (lie & 2) findSpot(box, PIECE, w - box.w, h - box.h, piece.h, piece.w, true, judge, spot);
			if (spot.score < before) chosen = i;
		}
		this.meter.spend(looked);
		if (chosen < 0 || !spot.target) return false;
		const { sheet, box, used } = sheets[chosen] as FilledSheet;
		const grown = beside(box, spot.target, spot.axis, leaf(p, piece, spot.turned));
		sheets[chosen] = { sheet, box: grown, used: used + piece.area };
		return true;
	}

	private openFor(p: number, kind: number): FilledSheet {
		const { w, h, lies } = this.sheet(kind);
		const piece = this.piece(p);
		const lie = lies[p] as number;
		const gap = Math.min(w - piece.w, h - piece.h);
		const turned = lie === 2 || (lie === 3 && Math.min(w - piece.h, h - piece.w) < gap);
		return { sheet: kind, box: leaf(p, piece, turned), used: piece.area };
	}

	private kindToOpen(piece: number, budget: number, { opens }: Manner): number {
		let best = -1;
		let least = Infinity;
		for (let s = 0; s < this.model.sheets.length; s++) {
			const { cost, area, count, lies } = this.sheet(s);
			if (lies[piece] === 0 || (this.opened[s] as number) >= count || cost > budget) continue;
			const price = s === opens ? -1 : (cost / area) * (opens === 'any' ? 0.5 + this.random() : 1);
			if (price < least) {
				least = price;
				best = s;
			}
		}
		return best;
	}

	piece(p: number): ModelPiece {
		return this.model.pieces[p] as ModelPiece;
	}

	sheet(s: number): ModelSheet {
		return this.model.sheets[s] as ModelSheet;
	}
}
