/**
 * Layouts for the knife, where pieces may lock each other in and no edge-to-edge cut enters (the pinwheel is the
 * least of them). Pieces pushed left and up stand at sums of sides (Christofides & Whitlock, Operations Research
 * 25, 1977), so trying the pieces from the largest at every such place, equal ones in order, misses nothing: an
 * exhausted search is a proof. It is meant for the few pieces of a sheet that just fails by trimmer.
 */
import type { Combination } from './combinations';
import type { Model } from './model';

export interface KnifePlacement {
	readonly sheet: number;
	readonly piece: number;
	readonly x: number;
	readonly y: number;
	readonly w: number;
	readonly h: number;
	readonly turned: boolean;
}

export interface KnifeSheet {
	readonly kind: number;
	readonly placements: readonly KnifePlacement[];
}

/** Sheets that hold everything, null where the combination can't, undefined where `spend` says stop. */
export function interlock(
	model: Model,
	combination: Combination,
	spend: (units: number) => boolean
): KnifeSheet[] | null | undefined {
	const kinds = combination.counts.flatMap((count, kind) => Array.from({ length: count }, () => kind));
	const search = new KnifeSearch(model, kinds, spend);
	const found = search.place(0);
	if (!found) return found === false ? null : undefined;
	return kinds.map((kind, sheet) => ({
		kind,
		placements: search.placed.filter((placement) => placement.sheet === sheet)
	}));
}

class KnifeSearch {
	readonly placed: KnifePlacement[] = [];
	private readonly queue: readonly number[];
	private readonly xs: readonly (readonly number[])[];
	private readonly ys: readonly (readonly number[])[];
	private readonly free: number[];

	constructor(
		private readonly model: Model,
		private readonly kinds: readonly number[],
		private readonly spend: (units: number) => boolean
	) {
		const areaOf = (piece: number) => model.pieces[piece]?.area ?? 0;
		this.queue = model.pieces
			.flatMap(({ qty }, piece) => Array.from({ length: qty }, () => piece))
			.sort((a, b) => areaOf(b) - areaOf(a) || a - b);
		this.xs = kinds.map((kind) => this.sums(kind, 'w'));
		this.ys = kinds.map((kind) => this.sums(kind, 'h'));
		this.free = kinds.map((kind) => model.sheets[kind]?.area ?? 0);
	}

	place(nth: number): boolean | undefined {
		const piece = this.queue[nth];
		if (piece === undefined) return true;
		for (let sheet = 0; sheet < this.kinds.length; sheet++) {
			if (this.sameAsEmptyBefore(sheet)) continue;
			const answer = this.placeOn(sheet, nth, piece);
			if (answer !== false) return answer;
		}
		return false;
	}

	private placeOn(sheet: number, nth: number, piece: number): boolean | undefined {
		const { w, h, area } = this.model.pieces[piece] as Model['pieces'][number];
		const lie = this.model.sheets[this.kinds[sheet] as number]?.lies[piece] ?? 0;
		if ((this.free[sheet] as number) < area) return false;
		for (const turned of [false, true]) {
			if ((lie & (turned ? 2 : 1)) === 0) continue;
			const answer = this.placeSo(nth, {
				sheet,
				piece,
				x: 0,
				y: 0,
				w: turned ? h : w,
				h: turned ? w : h,
				turned
			});
			if (answer !== false) return answer;
		}
		return false;
	}

	private placeSo(nth: number, placement: KnifePlacement): boolean | undefined {
		const { sheet, piece, w, h } = placement;
		const size = this.model.sheets[this.kinds[sheet] as number] as Model['sheets'][number];
		const twin = this.queue[nth - 1] === piece ? this.placed[nth - 1] : undefined;
		for (const y of this.ys[sheet] as number[]) {
			if (y + h > size.h) break;
			for (const x of this.xs[sheet] as number[]) {
				if (x + w > size.w) break;
				if (!this.spend(this.placed.length + 1)) return undefined;
				const here = { ...placement, x, y };
				if ((twin && before(here, twin)) || this.placed.some((other) => overlap(other, here))) continue;
				this.placed.push(here);
				this.free[sheet] = (this.free[sheet] as number) - w * h;
				const answer = this.place(nth + 1);
				if (answer !== false) return answer;
				this.placed.pop();
				this.free[sheet] = (this.free[sheet] as number) + w * h;
			}
		}
		return false;
	}

	/** An empty sheet after an empty sheet of its kind offers nothing new. */
	private sameAsEmptyBefore(sheet: number): boolean {
		if (sheet === 0 || this.kinds[sheet - 1] !== this.kinds[sheet]) return false;
		return !this.placed.some((placement) => placement.sheet === sheet - 1 || placement.sheet === sheet);
	}

	private sums(kind: number, along: 'w' | 'h'): number[] {
		const size = this.model.sheets[kind] as Model['sheets'][number];
		const found = new Set([0]);
		this.model.pieces.forEach((piece, p) => {
			const lie = size.lies[p] ?? 0;
			const sides = [lie & 1 ? piece[along] : 0, lie & 2 ? piece[along === 'w' ? 'h' : 'w'] : 0];
			for (let n = 0; n < piece.qty; n++) {
				for (const sum of [...found])
					for (const side of sides) if (sum + side < size[along]) found.add(sum + side);
			}
		});
		return [...found].sort((a, b) => a - b);
	}
}

function before(a: KnifePlacement, b: KnifePlacement): boolean {
	return a.sheet !== b.sheet
		? a.sheet < b.sheet
		: a.turned !== b.turned
			? b.turned
			: a.y !== b.y
				? a.y < b.y
				: a.x < b.x;
}

function overlap(a: KnifePlacement, b: KnifePlacement): boolean {
	return a.sheet === b.sheet && a.x < b.x + b.w && b.x < a.x + a.w && a.y < b.y + b.h && b.y < a.y + a.h;
}
