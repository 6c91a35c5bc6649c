/**
 * Exact answers for everyday sizes: with every pattern known (`frontier.ts`), a set of opened sheets either holds
 * the pieces or it doesn't, decided sheet by sheet from the smallest to the largest. Each sheet takes a maximal
 * pattern cut down to what is still wanted; the last one is looked up. What is left over for the remaining
 * sheets and could not be held is remembered for all later combinations.
 */
import { without, type Box } from './box';
import type { Combination } from './combinations';
import { boxOf, countsOf, fitsIn, frontierOf, statesOf, type Frontier, type States } from './frontier';
import type { Opened } from './layout';
import type { Meter } from './meter';
import type { Model } from './model';

const MOST_STATES = 400_000;

/** A listed pattern and the part of it that its sheet is to hold. */
interface Chosen {
	readonly pattern: number;
	readonly taken: number;
}

export class Patterns {
	private readonly full: number;
	private readonly maximal = new Map<number, readonly number[]>();
	private readonly failed = new Map<string, Set<number>>();

	private constructor(
		private readonly model: Model,
		readonly states: States,
		private readonly frontiers: readonly Frontier[],
		private readonly digits: Uint16Array,
		private readonly areas: Float64Array,
		private readonly meter: Meter
	) {
		this.full = states.size - 1;
	}

	/** Whether the patterns can be numbered at all within reason. */
	static few(model: Model): boolean {
		return statesOf(model).size <= MOST_STATES;
	}

	/** Lists the patterns that lose no more than `loss` within their boxes, pausing between states. */
	static *of(model: Model, loss: number, meter: Meter): Generator<undefined, Patterns> {
		const states = statesOf(model);
		const classes = new Map<string, number[]>();
		model.sheets.forEach(({ may, count }, s) => {
			const key = may.join('');
			if (count > 0) classes.set(key, [...(classes.get(key) ?? []), s]);
		});
		const frontiers: Frontier[] = new Array<Frontier>(model.sheets.length);
		for (const sheets of classes.values()) {
			const frontier = yield* frontierOf(model, states, sheets, loss, meter);
			for (const s of sheets) frontiers[s] = frontier;
		}
		const kinds = model.pieces.length;
		const digits = new Uint16Array(states.size * kinds);
		const areas = new Float64Array(states.size);
		for (let state = 0; state < states.size; state++) {
			for (let i = 0; i < kinds; i++) {
				const count =
					Math.floor(state / (states.strides[i] as number)) % ((states.quantities[i] as number) + 1);
				digits[state * kinds + i] = count;
				areas[state] = (areas[state] as number) + count * (model.pieces[i]?.area ?? 0);
			}
		}
		meter.spend(states.size);
		return new Patterns(model, states, frontiers, digits, areas, meter);
	}

	fits(sheet: number, state: number): boolean {
		const { w, h } = this.model.sheets[sheet] as { w: number; h: number };
		const frontier = this.frontiers[sheet];
		return frontier !== undefined && fitsIn(frontier, state, w, h);
	}

	/** The opened sheets that hold everything, null where `combination` can't, undefined where `go` ends first. */
	cover(combination: Combination, go: () => boolean): Opened[] | null | undefined {
		const sequence = combination.counts
			.flatMap((count, sheet) => Array.from({ length: count }, () => sheet))
			.sort((a, b) => (this.model.sheets[a]?.area ?? 0) - (this.model.sheets[b]?.area ?? 0) || a - b);
		const chosen: Chosen[] = [];
		const answer = this.descend(sequence, 0, this.full, chosen, go);
		if (!answer) return answer === false ? null : undefined;
		return chosen.flatMap((choice, i) => {
			const sheet = sequence[i] as number;
			return choice.taken === 0 ? [] : [{ sheet, box: this.box(sheet, choice) }];
		});
	}

	/** The pattern's layout, less what another sheet already holds. */
	private box(sheet: number, { pattern, taken }: Chosen): Box {
		const { w, h } = this.model.sheets[sheet] as { w: number; h: number };
		const frontier = this.frontiers[sheet] as Frontier;
		if (fitsIn(frontier, taken, w, h)) return boxOf(this.model, this.states, frontier, taken, w, h);
		const left = countsOf(this.states, taken);
		const box = boxOf(this.model, this.states, frontier, pattern, w, h);
		const kept = without(box, ({ piece }) => {
			left[piece] = (left[piece] as number) - 1;
			return (left[piece] as number) < 0;
		});
		if (!kept) throw new Error('a sheet was opened for nothing');
		return kept;
	}

	private descend(
		sequence: readonly number[],
		at: number,
		wanted: number,
		chosen: Chosen[],
		go: () => boolean
	): boolean | undefined {
		if (wanted === 0) {
			chosen.length = at;
			return true;
		}
		if (at >= sequence.length) return false;
		const sheet = sequence[at] as number;
		if (this.fits(sheet, wanted)) {
			chosen[at] = { pattern: wanted, taken: wanted };
			chosen.length = at + 1;
			return true;
		}
		if (at === sequence.length - 1) return false;
		let after = 0;
		for (let i = at + 1; i < sequence.length; i++)
			after += this.model.sheets[sequence[i] as number]?.area ?? 0;
		const least = (this.areas[wanted] as number) - after;
		const key = sequence.slice(at).join();
		const failed = this.failed.get(key) ?? new Set<number>();
		this.failed.set(key, failed);
		if (failed.has(wanted)) return false;
		for (const pattern of this.maximalFor(sheet)) {
			if ((this.areas[pattern] as number) < least) break;
			if (!this.meter.spend(4) || !go()) return undefined;
			const taken = this.common(pattern, wanted);
			if ((this.areas[taken] as number) < least) continue;
			chosen[at] = { pattern, taken };
			const answer = this.descend(sequence, at + 1, wanted - taken, chosen, go);
			if (answer !== false) return answer;
		}
		failed.add(wanted);
		return false;
	}

	private common(a: number, b: number): number {
		const { strides } = this.states;
		const kinds = strides.length;
		let state = 0;
		for (let i = 0; i < kinds; i++) {
			const one = this.digits[a * kinds + i] as number;
			const other = this.digits[b * kinds + i] as number;
			state += (one < other ? one : other) * (strides[i] as number);
		}
		return state;
	}

	/** Patterns of a sheet kind to which no piece can be added, fullest first. */
	private maximalFor(sheet: number): readonly number[] {
		const known = this.maximal.get(sheet);
		if (known) return known;
		const { size, strides, quantities } = this.states;
		const kinds = strides.length;
		const fits = new Uint8Array(size);
		for (let state = 0; state < size; state++) fits[state] = this.fits(sheet, state) ? 1 : 0;
		const found: number[] = [];
		for (let state = 0; state < size; state++) {
			if (!fits[state]) continue;
			let open = false;
			for (let i = 0; i < kinds && !open; i++) {
				open =
					(this.digits[state * kinds + i] as number) < (quantities[i] as number) &&
					fits[state + (strides[i] as number)] === 1;
			}
			if (!open) found.push(state);
		}
		found.sort((a, b) => (this.areas[b] as number) - (this.areas[a] as number) || a - b);
		this.meter.spend(size);
		this.maximal.set(sheet, found);
		return found;
	}
}
