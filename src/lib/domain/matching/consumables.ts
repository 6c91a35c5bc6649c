import type { Bill, ConsumableNeed } from '../bill/bill';
import type { ConsumableKind, ConsumableSupply } from '../stash';
import type { Length } from '../length';
import { serveClaims } from './flow';
import type { LineResult, Shortage, Verdict } from './verdict';

/** What the lines come to, and what they draw from each row if the project goes ahead. */
export interface Draws {
	readonly lines: readonly LineResult[];
	readonly short: readonly Shortage[];
	readonly drawn: ReadonlyMap<string, number>;
}

interface Line {
	readonly name: string;
	readonly need: ConsumableNeed;
	/** Over all copies. */
	readonly amount: number;
}

/** The terms on which one line draws. `option`: -1 is what the line asks for, else the swap's number. */
interface Stand {
	readonly on: string;
	readonly option: number;
	readonly unsure: boolean;
}

/**
 * Adhesives and extras, drawing in the bill's order on what adds up to one kind and width. All lines are served
 * together on the mildest terms that serve them all, then each is let down as far as it goes.
 */
export function drawConsumables(
	bill: Bill,
	copies: number,
	stock: readonly ConsumableSupply[],
	on: string
): Draws {
	const named = (area: string) => (need: ConsumableNeed) => ({
		name: `${area}/${need.key}`,
		need,
		amount: need.need * copies
	});
	const lines = [...bill.adhesives.map(named('adhesives')), ...bill.extras.map(named('extras'))];
	const kinds = new Set(lines.flatMap(({ need }) => [need.kind, ...need.swaps.map((swap) => swap.kind)]));
	return new Drawing(
		lines,
		stock.filter((supply) => kinds.has(supply.kind) && supply.left > 0),
		on
	).run();
}

class Drawing {
	constructor(
		private readonly lines: readonly Line[],
		private readonly stock: readonly ConsumableSupply[],
		private readonly on: string
	) {}

	run(): Draws {
		const dates = [
			...new Set(
				this.stock.flatMap(({ arrives }) => (arrives !== null && arrives > this.on ? [arrives] : []))
			)
		].sort();
		const rungs = [
			{ on: this.on, swaps: false, unsure: false },
			{ on: this.on, swaps: true, unsure: false },
			...dates.map((on) => ({ on, swaps: true, unsure: false })),
			...[this.on, ...dates].map((on) => ({ on, swaps: true, unsure: true }))
		];
		for (const rung of rungs) {
			const stands = this.standOn(rung, []);
			if (stands) return this.served(this.letDown(stands));
		}
		return this.unserved(dates.at(-1) ?? this.on);
	}

	/** The first choice of options, in the authors' order, with which every line is served. */
	private standOn(
		rung: { on: string; swaps: boolean; unsure: boolean },
		chosen: readonly Stand[]
	): Stand[] | null {
		if (chosen.length > 0 && !this.serve(chosen)) return null;
		const line = this.lines[chosen.length];
		if (!line) return [...chosen];
		for (let option = -1; option < (rung.swaps ? line.need.swaps.length : 0); option++) {
			const found = this.standOn(rung, [...chosen, { on: rung.on, option, unsure: rung.unsure }]);
			if (found) return found;
		}
		return null;
	}

	private letDown(stands: readonly Stand[]): readonly Stand[] {
		let settled = stands;
		stands.forEach((stand, i) => {
			for (const milder of this.milderThan(stand, this.lines[i]?.need.swaps.length ?? 0)) {
				const tried = settled.map((other, j) => (j === i ? milder : other));
				if (!this.serve(tried)) continue;
				settled = tried;
				break;
			}
		});
		return settled;
	}

	private milderThan(stand: Stand, swaps: number): Stand[] {
		const options = (on: string, unsure: boolean) =>
			Array.from({ length: swaps + 1 }, (_, i) => ({ on, option: i - 1, unsure }));
		const later = stand.on === this.on ? [] : options(stand.on, false);
		const unsure = stand.unsure ? [...options(this.on, true), ...options(stand.on, true)] : [];
		return [...options(this.on, false), ...later, ...unsure];
	}

	private serve(stands: readonly Stand[]): number[][] | null {
		const claims = stands.map((stand, i) => {
			const line = this.lines[i];
			return line
				? { amount: wanted(line, stand).amount, pools: this.poolsFor(line, stand) }
				: { amount: 0, pools: [] };
		});
		return serveClaims(
			claims,
			this.stock.map(({ left }) => left)
		);
	}

	private poolsFor(line: Line, stand: Stand): number[] {
		const { kind, width } = wanted(line, stand);
		return this.stock.flatMap((supply, i) => {
			const here = supply.kind === kind && (supply.arrives === null || supply.arrives <= stand.on);
			const said = width === null || supply.width === width || (supply.width === null && stand.unsure);
			return here && said && (supply.count === 'counted' || stand.unsure) ? [i] : [];
		});
	}

	private served(stands: readonly Stand[]): Draws {
		const taken = this.serve(stands) ?? [];
		const drawn = new Map<string, number>();
		taken.flat().forEach((amount, i) => {
			const supply = this.stock[i % this.stock.length];
			if (supply && amount > 0) drawn.set(supply.key, (drawn.get(supply.key) ?? 0) + amount);
		});
		const lines = this.lines.map((line, i) => {
			const stand = stands[i] ?? { on: this.on, option: -1, unsure: false };
			const earlier = (pool: number) => taken.slice(0, i).reduce((sum, row) => sum + (row[pool] ?? 0), 0);
			const pools = this.poolsFor(line, stand);
			const left = pools.reduce((sum, pool) => sum + (this.stock[pool]?.left ?? 0) - earlier(pool), 0);
			const supplies = this.stock.filter((_, pool) => (taken[i]?.[pool] ?? 0) > 0).map(({ key }) => key);
			return {
				...reported(line, stand, this.on),
				supplies,
				left,
				tight: (left - wanted(line, stand).amount) * 10 < wanted(line, stand).amount
			};
		});
		return { lines, short: [], drawn };
	}

	/** Line by line on the most generous terms; a line that falls short takes what there is. */
	private unserved(last: string): Draws {
		const left = this.stock.map((supply) => supply.left);
		const results = this.lines.map((line) => {
			const rungs = [this.on, last].flatMap((on) => [false, true].map((unsure) => ({ on, unsure })));
			const stands = rungs
				.sort((a, b) => Number(a.unsure) - Number(b.unsure))
				.flatMap((rung) =>
					Array.from({ length: line.need.swaps.length + 1 }, (_, i) => ({ ...rung, option: i - 1 }))
				);
			const sumOf = (stand: Stand) =>
				this.poolsFor(line, stand).reduce((sum, pool) => sum + (left[pool] ?? 0), 0);
			const stand = stands.find((one) => sumOf(one) >= wanted(line, one).amount);
			const using = stand ?? { on: last, option: -1, unsure: true };
			const have = sumOf(using);
			const { amount } = wanted(line, using);
			let open = amount;
			for (const pool of this.poolsFor(line, using)) {
				const part = Math.min(open, left[pool] ?? 0);
				left[pool] = (left[pool] ?? 0) - part;
				open -= part;
			}
			const result = reported(line, using, this.on);
			return stand
				? { line: { ...result, left: have, tight: (have - amount) * 10 < amount }, missing: 0 }
				: {
						line: { ...result, verdict: 'short' as const, after: null, left: have, tight: false },
						missing: amount - have
					};
		});
		return {
			lines: results.map(({ line }) => line),
			short: results.flatMap(({ line, missing }) =>
				missing > 0 ? [{ line: line.line, amount: missing }] : []
			),
			drawn: new Map()
		};
	}
}

function wanted(
	{ need, amount }: Line,
	{ option }: Stand
): { kind: ConsumableKind; width: Length | null; amount: number } {
	const swap = need.swaps[option];
	return swap
		? { kind: swap.kind, width: swap.width, amount: amount * swap.times }
		: { kind: need.kind, width: need.width, amount };
}

function reported(line: Line, stand: Stand, today: string): LineResult {
	const later = stand.on > today;
	const verdict: Verdict = stand.unsure ? 'look' : later ? 'after' : stand.option >= 0 ? 'swap' : 'now';
	return {
		line: line.name,
		verdict,
		swap: stand.option >= 0 ? stand.option : null,
		need: wanted(line, stand).amount,
		...(later ? { after: stand.on } : {}),
		...(stand.unsure ? { why: 'only if an amount that nobody has checked holds' } : {})
	};
}
