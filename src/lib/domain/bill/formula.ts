import {
	DISPLAY_STEP,
	LONGEST_ROLL,
	UNIT_LENGTH,
	writeExact,
	writeMark,
	type Length,
	type LengthUnit
} from '../length';
import { add, divide, fraction, multiply, negate, type Fraction } from './fraction';

/** A formula's length as typed, and how deep its brackets and minus signs may nest. */
const FORMULA_LIMITS = { characters: 200, depth: 16 } as const;

export type Worked =
	{ readonly ok: true; readonly value: Length } | { readonly ok: false; readonly reason: string };

/**
 * Works out `boardH + 2 * turnIn` over the measures given: numbers with or without a unit, measures, + − × ÷,
 * brackets and a leading minus. The arithmetic is exact; an answer that is no whole number of 1/320 mm, or not
 * more than zero, is refused with a reason that quotes it.
 */
export function workOut(
	formula: string,
	measures: ReadonlyMap<string, Length>,
	unit: 'in' | 'mm' | 'cm'
): Worked {
	try {
		return { ok: true, value: whole(new FormulaReader(formula, measures).read(), unit) };
	} catch (trouble) {
		if (trouble instanceof Refused) return { ok: false, reason: trouble.message };
		throw trouble;
	}
}

/** Names of the measures that a formula mentions, as far as it can be read. */
export function measuresIn(formula: string): string[] {
	const withoutLiterals = formula.replace(new RegExp(LITERAL.source, 'giu'), ' ');
	return [...new Set(withoutLiterals.match(/[a-z][a-z0-9]*/gi) ?? [])];
}

const INCH_WORDS = /^(?:inch|inches|["″”])$/;
const UNIT = String.raw`(?:\s*(inches|inch|in|mm|cm|m|yd)(?![a-z0-9])|\s*(["″”]))`;
/** `2 3/8`, `2 3/8 in`, `3/8 in` (a bare `3/8` is a division), `2.5`, `2,5 cm`, `2 in`. */
const LITERAL = new RegExp(
	String.raw`(?<![a-z0-9])(?:(?:(\d+)\s+)?(\d+)\s*[/⁄]\s*(\d+)${UNIT}|(\d+)\s+(\d+)\s*[/⁄]\s*(\d+)|(\d*[.,]\d+|\d+)${UNIT}?)`,
	'iuy'
);

class Refused extends Error {}

/** A number with its power of length: 0 a plain number, 1 a length in 1/320 mm. */
interface Quantity {
	readonly amount: Fraction;
	readonly power: 0 | 1;
}

class FormulaReader {
	private readonly text: string;
	private at = 0;
	private depth = 0;

	constructor(
		formula: string,
		private readonly measures: ReadonlyMap<string, Length>
	) {
		if (formula.length > FORMULA_LIMITS.characters)
			throw new Refused(`A formula has at most ${FORMULA_LIMITS.characters} characters.`);
		this.text = formula.replace(/[¼-¾⅐-⅞]/g, (sign) => ` ${sign.normalize('NFKC')}`).trim();
	}

	read(): Quantity {
		if (this.text === '') throw new Refused('The formula is empty.');
		const value = this.sum();
		this.skipSpace();
		if (this.at < this.text.length) throw new Refused(`The formula stops making sense at “${this.rest()}”.`);
		return value;
	}

	private sum(): Quantity {
		let left = this.product();
		for (let sign = this.take(/[+\-−–]/y); sign; sign = this.take(/[+\-−–]/y)) {
			const right = this.product();
			if (left.power !== right.power)
				throw new Refused(
					sign === '+'
						? 'A plain number can’t be added to a length: give it a unit.'
						: 'A plain number and a length can’t be taken from each other: give the number a unit.'
				);
			left = {
				amount: add(left.amount, sign === '+' ? right.amount : negate(right.amount)),
				power: left.power
			};
		}
		return left;
	}

	private product(): Quantity {
		let left = this.factor();
		for (let sign = this.take(/[*×·/÷]/y); sign; sign = this.take(/[*×·/÷]/y)) {
			const right = this.factor();
			left = /[*×·]/.test(sign) ? times(left, right) : over(left, right);
		}
		return left;
	}

	private factor(): Quantity {
		if (this.take(/[-−–]/y)) {
			const value = this.deeper(() => this.factor());
			return { amount: negate(value.amount), power: value.power };
		}
		if (this.take(/\(/y)) {
			const value = this.deeper(() => this.sum());
			if (!this.take(/\)/y)) throw new Refused('A bracket is opened and not closed.');
			return value;
		}
		return this.literal() ?? this.measure();
	}

	private deeper(read: () => Quantity): Quantity {
		if (++this.depth > FORMULA_LIMITS.depth) throw new Refused('The formula nests too deep.');
		const value = read();
		this.depth--;
		return value;
	}

	private literal(): Quantity | null {
		this.skipSpace();
		LITERAL.lastIndex = this.at;
		const found = LITERAL.exec(this.text);
		if (!found) return null;
		this.at = LITERAL.lastIndex;
		const [, whole, top, bottom, unitA, signA, plainWhole, plainTop, plainBottom, decimal, unitB, signB] =
			found;
		const amount =
			decimal !== undefined
				? decimalFraction(decimal)
				: mixed(whole ?? plainWhole, top ?? plainTop, bottom ?? plainBottom);
		const unit = unitA ?? signA ?? unitB ?? signB;
		if (unit === undefined) return { amount, power: 0 };
		return { amount: multiply(amount, fraction(unitLength(unit.toLowerCase()))), power: 1 };
	}

	private measure(): Quantity {
		const name = this.take(/[a-z][a-z0-9]*/iy);
		if (!name)
			throw new Refused(
				this.at < this.text.length
					? `A number or a measure is expected at “${this.rest()}”.`
					: 'The formula ends where a number or a measure is expected.'
			);
		const value = this.measures.get(name);
		if (value === undefined) throw new Refused(`There is no measure called “${name}” above this one.`);
		return { amount: fraction(BigInt(value)), power: 1 };
	}

	private take(pattern: RegExp): string | null {
		this.skipSpace();
		pattern.lastIndex = this.at;
		const found = pattern.exec(this.text);
		if (!found) return null;
		this.at = pattern.lastIndex;
		return found[0];
	}

	private skipSpace() {
		while (/\s/.test(this.text[this.at] ?? '')) this.at++;
	}

	private rest(): string {
		return this.text.slice(this.at, this.at + 12);
	}
}

function times(left: Quantity, right: Quantity): Quantity {
	if (left.power === 1 && right.power === 1)
		throw new Refused('A length times a length is an area: one of the two must be a plain number.');
	return { amount: multiply(left.amount, right.amount), power: left.power === 1 ? 1 : right.power };
}

function over(left: Quantity, right: Quantity): Quantity {
	if (right.amount.over === 0n) throw new Refused('The formula divides by zero.');
	if (right.power === 1 && left.power === 0)
		throw new Refused('A plain number can’t be divided by a length.');
	return { amount: divide(left.amount, right.amount), power: right.power === 1 ? 0 : left.power };
}

function mixed(whole: string | undefined, top: string | undefined, bottom: string | undefined): Fraction {
	if (BigInt(bottom ?? 1) === 0n) throw new Refused('The formula divides by zero.');
	return add(fraction(BigInt(whole ?? 0)), fraction(BigInt(top ?? 0), BigInt(bottom ?? 1)));
}

function decimalFraction(text: string): Fraction {
	const [whole = '', decimals = ''] = text.split(/[.,]/);
	return fraction(BigInt(`${whole}${decimals}` || '0'), 10n ** BigInt(decimals.length));
}

function unitLength(word: string): bigint {
	return BigInt(UNIT_LENGTH[INCH_WORDS.test(word) ? 'in' : (word as LengthUnit)]);
}

function whole({ amount, power }: Quantity, unit: 'in' | 'mm' | 'cm'): Length {
	if (power === 0) throw new Refused('The formula comes to a plain number. Give the lengths in it a unit.');
	if (amount.over <= 0n)
		throw new Refused('The formula comes to nothing, or less. A length is more than zero.');
	if (amount.over > BigInt(LONGEST_ROLL) * amount.under)
		throw new Refused('The formula comes to more than 10 km.');
	if (amount.under !== 1n) throw new Refused(between(Number(amount.over / amount.under), unit));
	return Number(amount.over);
}

function between(below: Length, unit: 'in' | 'mm' | 'cm'): string {
	const step = DISPLAY_STEP[unit];
	const mark = below - (below % step);
	const exact = [below, below + 1].filter((value) => value > 0).map((value) => writeExact(value, 'mm'));
	const marks = [mark, mark + step].filter((value) => value > 0).map((value) => writeMark(value, unit));
	return `The formula comes to a length that can’t be measured out exactly. The nearest that can: ${exact.join(' or ')}; by the ruler, ${marks.join(' or ')}.`;
}
