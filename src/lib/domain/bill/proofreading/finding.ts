import { formatLength, lengthParts, writeExact, type Length } from '../../length';
import type { Bill, Piece } from '../bill';

/**
 * What mends a finding: words, and where it is one value, the bill's path (`pieces.0.w`) and what to put there.
 * An index one past a list's end adds to it.
 */
export interface Mend {
	readonly text: string;
	readonly change?: { readonly path: string; readonly value: unknown };
}

/** `mend`: the bill can't be made as it stands. `ask`: it may be meant. */
export interface Finding {
	/** The bill's line, like `pieces/c`. */
	readonly line: string;
	readonly rule: string;
	readonly severity: 'mend' | 'ask';
	readonly message: string;
	readonly mend: Mend;
}

export type Units = 'in' | 'mm' | 'cm';

/** A bill being read for what doesn't add up, with its figures said in the reader's units. */
export class Proof {
	private readonly byKey: ReadonlyMap<string, Piece>;

	constructor(
		readonly bill: Bill,
		readonly units: Units
	) {
		this.byKey = new Map(bill.pieces.map((piece) => [piece.key, piece]));
	}

	piece(key: string): Piece | undefined {
		return this.byKey.get(key);
	}

	path(piece: Piece, field: string): string {
		return `pieces.${this.bill.pieces.indexOf(piece)}.${field}`;
	}

	/** As the ruler shows it; where that isn't exact, exact in mm beside it. */
	say(length: Length): string {
		const shown = formatLength(length, this.units);
		return lengthParts(length, this.units).approx ? `${shown} (${writeExact(length, 'mm')})` : shown;
	}

	/** Half of a length, which may fall between two units. */
	sayHalf(length: Length): string {
		return length % 2 === 0 ? this.say(length / 2) : formatLength(length / 2, this.units);
	}

	saySize(w: Length, h: Length): string {
		return `${this.say(w)} × ${this.say(h)}`;
	}

	/** As it goes into the bill. */
	type(length: Length): string {
		return writeExact(length, this.units);
	}
}

export const lineOf = (piece: Piece) => `pieces/${piece.key}`;
export const names = (pieces: readonly Piece[]) => pieces.map(({ name }) => `“${name}”`).join(', ');

/** A key that the list doesn't have yet. */
export function freeKey(wished: string, taken: readonly { readonly key: string }[]): string {
	const keys = new Set(taken.map(({ key }) => key));
	let key = wished;
	for (let n = 2; keys.has(key); n++) key = `${wished}-${n}`;
	return key;
}
