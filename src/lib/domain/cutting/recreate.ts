/**
 * Plans by putting pieces in one at a time, and better ones by taking some out and putting them in again.
 * The search is given a price that it must stay under; what it can't place stays outside, and the area outside
 * is what it lowers. As soon as nothing is outside the price falls, so whole sheets are emptied rather than
 * shuffled (the goal-driven ruin and recreate of Gardeyn & Wauters, EJOR 301, 2022, on the position-free trees
 * of `box.ts`, where its leftover bookkeeping is not needed). Worse states are taken by late acceptance (Burke &
 * Bykov, EJOR 258, 2017).
 */
import { PIECE, beside, eachPiece, findSpot, leaf, without, type Box, type Spot } from './box';
import type { Opened } from './layout';
import type { Meter } from './meter';
import type { Model } from './model';
import type { Random } from './random';

interface Sheet extends Opened {
	readonly used: number;
}

export interface State {
	readonly sheets: readonly Sheet[];
	readonly outside: readonly number[];
	readonly cost: number;
}

type Measure = (piece: Model['pieces'][number]) => number;
const MEASURES: readonly Measure[] = [
	({ area }) => area,
	({ w, h }) => Math.max(w, h),
	({ w, h }) => w + h,
	({ w, h }) => Math.min(w, h),
	({ w }) => w,
	({ h }) => h
];

const LATE = 60;

export class Recreate {
	private readonly opened: number[];
	private readonly smallest: number;
	private readonly totalArea: number;

	constructor(
		private readonly model: Model,
		private readonly random: Random,
		private readonly meter: Meter
	) {
		this.opened = model.sheets.map(() => 0);
		this.smallest = Math.min(...model.pieces.map(({ area }) => area));
		this.totalArea = model.area;
	}

	/** The cheapest of the plain constructions, or the first that is `enough`; some pieces may be outside. */
	first(enough: (state: State) => boolean): State {
		const pieces = this.model.pieces.flatMap(({ qty }, p) => Array.from({ length: qty }, () => p));
		let best: State | null = null;
		for (const preferred of this.favourites()) {
			for (const measure of MEASURES) {
				const empty = { sheets: [], outside: [], cost: 0 };
				const state = this.insert(empty, this.sorted(pieces, measure, 0), Infinity, 0, preferred);
				if (!best || this.less(state, best)) best = state;
				if (enough(best)) return best;
			}
		}
		return best as State;
	}

	/** No kind, then each of the largest kinds: which of them to open first is anybody's guess. */
	private favourites(): number[] {
		const kinds = this.model.sheets.map((_, s) => s).filter((s) => (this.model.sheets[s]?.count ?? 0) > 0);
		const area = (s: number) => this.model.sheets[s]?.area ?? 0;
		return [-1, ...(kinds.length > 1 ? kinds.sort((a, b) => area(b) - area(a) || a - b).slice(0, 6) : [])];
	}

	private less(a: State, b: State): boolean {
		const outside = this.value(a) - this.value(b);
		return outside < 0 || (outside === 0 && a.cost < b.cost);
	}

	private value({ outside }: State): number {
		let area = 0;
		for (const p of outside) area += this.model.pieces[p]?.area ?? 0;
		return area;
	}

	/** Gives complete plans, each cheaper than the last, and null after every turn that found none. Doesn't end by itself. */
	*improve(start: State): Generator<State | null, void> {
		let limit = start.outside.length === 0 ? start.cost - 1 : Infinity;
		let current = this.under(start, limit);
		let value = this.value(current) - this.bonus(current);
		const late = new Array<number>(LATE).fill(value);
		for (let turn = 0; limit >= 0; turn++) {
			const next = this.turn(current, limit);
			if (next.outside.length === 0) {
				yield next;
				limit = next.cost - 1;
				current = this.under(next, limit);
				value = this.value(current) - this.bonus(current);
				late.fill(value);
				continue;
			}
			const nextValue = this.value(next) - this.bonus(next);
			const at = turn % LATE;
			if (nextValue <= value || nextValue <= (late[at] as number)) {
				current = next;
				value = nextValue;
			}
			late[at] = value;
			yield null;
		}
	}

	/** Rewards sheets that are nearly full beside sheets that are nearly empty, below any piece's weight. */
	private bonus({ sheets }: State): number {
		let bonus = 0;
		for (const { sheet, used } of sheets) bonus += (used * used) / (this.model.sheets[sheet]?.area ?? 1);
		return (bonus / this.totalArea) * this.smallest * 0.9;
	}

	/** Shuts sheets until the price is under the limit. */
	private under(state: State, limit: number): State {
		let { sheets, cost } = state;
		const outside = [...state.outside];
		while (cost > limit && sheets.length > 0) {
			let worst = 0;
			let least = Infinity;
			sheets.forEach(({ sheet, used }, i) => {
				const price = this.model.sheets[sheet]?.cost ?? 0;
				const keep = price === 0 ? Infinity : (used / price) * (0.8 + 0.4 * this.random());
				if (keep < least) {
					least = keep;
					worst = i;
				}
			});
			const shut = sheets[worst] as Sheet;
			eachPiece(shut.box, ({ piece }) => outside.push(piece));
			cost -= this.model.sheets[shut.sheet]?.cost ?? 0;
			sheets = sheets.filter((_, i) => i !== worst);
		}
		return { sheets, cost, outside };
	}

	private turn(current: State, limit: number): State {
		const { random } = this;
		const sheets = current.sheets.slice();
		const loose = current.outside.slice();
		let { cost } = current;
		const ruined = Math.min(sheets.length, 1 + Math.floor(random() * 3));
		for (let n = 0; n < ruined; n++) {
			const i = Math.floor(random() * sheets.length);
			const sheet = sheets[i];
			if (!sheet) continue;
			const whole = random() < 0.15;
			const kept = whole ? null : this.ruin(sheet.box, loose);
			if (whole) eachPiece(sheet.box, ({ piece }) => loose.push(piece));
			if (kept) sheets[i] = { sheet: sheet.sheet, box: kept, used: this.areaOf(kept) };
			else {
				cost -= this.model.sheets[sheet.sheet]?.cost ?? 0;
				sheets.splice(i, 1);
			}
		}
		const measure = MEASURES[random() < 0.6 ? 0 : Math.floor(random() * MEASURES.length)] as Measure;
		return this.insert({ sheets, outside: [], cost }, this.sorted(loose, measure, 0.3), limit, 0.02, -2);
	}

	/** Takes out one to three parts of the tree. */
	private ruin(box: Box, loose: number[]): Box | null {
		let left: Box | null = box;
		for (let n = 1 + Math.floor(this.random() * 3); n > 0 && left; n--) {
			const picked = this.pick(left);
			const gone = new Set<Box>();
			eachPiece(picked, (piece) => {
				gone.add(piece);
				loose.push(piece.piece);
			});
			left = without(left, (piece) => gone.has(piece));
		}
		return left;
	}

	private pick(box: Box): Box {
		let at = box;
		while (at.axis !== PIECE) {
			at = at.kids[Math.floor(this.random() * at.kids.length)] as Box;
			if (this.random() < 0.3) break;
		}
		return at;
	}

	private areaOf(box: Box): number {
		let area = 0;
		eachPiece(box, ({ w, h }) => (area += w * h));
		return area;
	}

	private sorted(pieces: readonly number[], measure: Measure, noise: number): number[] {
		return pieces
			.map((piece) => ({
				piece,
				key: measure(this.model.pieces[piece] as Model['pieces'][number]) * (1 - noise * this.random())
			}))
			.sort((a, b) => b.key - a.key || a.piece - b.piece)
			.map(({ piece }) => piece);
	}

	private insert(
		state: State,
		pieces: readonly number[],
		limit: number,
		blink: number,
		preferred: number
	): State {
		const sheets = state.sheets.slice();
		const outside = state.outside.slice();
		let { cost } = state;
		this.opened.fill(0);
		for (const { sheet } of sheets) this.opened[sheet] = (this.opened[sheet] as number) + 1;
		const { random } = this;
		const judge = (along: number, across: number) =>
			blink > 0 && random() < blink ? Infinity : Math.min(along, across) + Math.max(along, across) * 1e-3;
		const spot: Spot = { score: Infinity, target: null, axis: 1, turned: false };
		for (const p of pieces) {
			const piece = this.model.pieces[p] as Model['pieces'][number];
			spot.score = Infinity;
			spot.target = null;
			let chosen = -1;
			let boxes = 0;
			for (let i = 0; i < sheets.length; i++) {
				const { sheet, box, used } = sheets[i] as Sheet;
				const kind = this.model.sheets[sheet] as Model['sheets'][number];
				if (kind.area - used < piece.area) continue;
				const lies = kind.lies[p] as number;
				const before = spot.score;
				boxes += 4;
				if (lies & 1)
					findSpot(box, PIECE, kind.w - box.w, kind.h - box.h, piece.w, piece.h, false, judge, spot);
				if (lies & 2)
					findSpot(box, PIECE, kind.w - box.w, kind.h - box.h, piece.h, piece.w, true, judge, spot);
				if (spot.score < before) chosen = i;
			}
			this.meter.spend(boxes + 4);
			if (chosen >= 0 && spot.target) {
				const { sheet, box, used } = sheets[chosen] as Sheet;
				const grown = beside(box, spot.target, spot.axis, leaf(p, piece, spot.turned));
				sheets[chosen] = { sheet, box: grown, used: used + piece.area };
				continue;
			}
			const kind = this.kindToOpen(p, limit - cost, preferred);
			if (kind < 0) outside.push(p);
			else {
				const { lies, w, h, cost: price } = this.model.sheets[kind] as Model['sheets'][number];
				const lie = lies[p] as number;
				const turned =
					lie === 2 || (lie === 3 && Math.min(w - piece.h, h - piece.w) < Math.min(w - piece.w, h - piece.h));
				sheets.push({ sheet: kind, box: leaf(p, piece, turned), used: piece.area });
				this.opened[kind] = (this.opened[kind] as number) + 1;
				cost += price;
			}
		}
		return { sheets, outside, cost };
	}

	/** The kind that costs least for its area, `preferred` first; by chance another where `preferred` is -2. */
	private kindToOpen(piece: number, budget: number, preferred: number): number {
		let best = -1;
		let least = Infinity;
		for (let s = 0; s < this.model.sheets.length; s++) {
			const kind = this.model.sheets[s] as Model['sheets'][number];
			if (kind.lies[piece] === 0 || (this.opened[s] as number) >= kind.count || kind.cost > budget) continue;
			const noise = preferred === -2 ? 0.5 + this.random() : 1;
			const price = s === preferred ? -1 : (kind.cost / kind.area) * noise;
			if (price < least) {
				least = price;
				best = s;
			}
		}
		return best;
	}
}
