import { greatestCommonDivisor, writeDecimal, writeMixed } from './rational';
import { DISPLAY_STEP, UNIT_LENGTH, type Length, type LengthUnit } from './units';

/** A length ready for setting: `numerator/denominator` for inches and yards, `decimal` for metric units. */
export interface LengthParts {
	readonly approx: boolean;
	readonly whole: number;
	/** 0 where there is no fraction. */
	readonly numerator: number;
	readonly denominator: number;
	/** Digits with a point, as `16.2`; null in inches and yards. */
	readonly decimal: string | null;
	readonly unit: LengthUnit;
}

/** `6 3⁄8 in`, `16.2 cm`, `≈ 4 9⁄64 in`: to the nearest 1/64 in or 0.1 mm (1 cm in metres, 1/8 in yards). */
export function formatLength(value: Length, unit: LengthUnit): string {
	const parts = lengthParts(value, unit);
	return `${parts.approx ? '≈ ' : ''}${figures(parts)} ${unit}`;
}

/** `5 1⁄4 × 7 3⁄4 in`, with one ≈ where either side isn't exact. */
export function formatSize(w: Length, h: Length, unit: LengthUnit): string {
	const sides = [lengthParts(w, unit), lengthParts(h, unit)];
	const approx = sides.some((side) => side.approx) ? '≈ ' : '';
	return `${approx}${sides.map(figures).join(' × ')} ${unit}`;
}

export function lengthParts(value: Length, unit: LengthUnit): LengthParts {
	const step = DISPLAY_STEP[unit];
	const steps = Math.round(value / step);
	const perUnit = UNIT_LENGTH[unit] / step;
	const whole = Math.floor(steps / perUnit);
	const rest = steps % perUnit;
	const shared = greatestCommonDivisor(rest, perUnit);
	const metric = unit !== 'in' && unit !== 'yd';
	return {
		approx: steps * step !== value,
		whole,
		numerator: metric ? 0 : rest / shared,
		denominator: metric ? 1 : perUnit / shared,
		decimal: metric ? writeDecimal(steps, perUnit) : null,
		unit
	};
}

/** For a screen reader: `6 and 3 eighths inches`, `half an inch`, `about 16.2 centimetres`. */
export function spokenLength(value: Length, unit: LengthUnit): string {
	const parts = lengthParts(value, unit);
	const [one, many] = SPOKEN_UNITS[unit];
	const about = parts.approx ? 'about ' : '';
	if (parts.decimal !== null) return `${about}${parts.decimal} ${parts.decimal === '1' ? one : many}`;
	if (parts.numerator === 0) return `${about}${parts.whole} ${parts.whole === 1 ? one : many}`;
	const article = unit === 'in' ? 'an' : 'a';
	if (parts.whole > 0) return `${about}${parts.whole} and ${spokenFraction(parts)} ${many}`;
	if (parts.denominator === 2) return `${about}half ${article} ${one}`;
	return `${about}${spokenFraction(parts)} of ${article} ${one}`;
}

/** Typeable and exact whatever the value, for documents and messages: `6 3/8 in`, `30/127 in`, `0.003125 mm`. */
export function writeExact(value: Length, unit: LengthUnit): string {
	const perUnit = UNIT_LENGTH[unit];
	const metric = unit !== 'in' && unit !== 'yd';
	return `${metric ? writeDecimal(value, perUnit) : writeMixed(value, perUnit)} ${unit}`;
}

/** As `writeExact`, in the user's ruler marks: only for a value that is a whole number of them. */
export function writeMark(value: Length, unit: LengthUnit): string {
	return formatLength(value, unit).replace('⁄', '/');
}

function figures({ whole, numerator, denominator, decimal: digits }: LengthParts): string {
	if (digits !== null) return digits;
	if (numerator === 0) return String(whole);
	const fraction = `${numerator}⁄${denominator}`;
	return whole === 0 ? fraction : `${whole} ${fraction}`;
}

function spokenFraction({ numerator, denominator }: LengthParts): string {
	const [one, many] = SPOKEN_FRACTIONS[denominator] ?? [`${denominator}th`, `${denominator}ths`];
	return `${numerator} ${numerator === 1 ? one : many}`;
}

const SPOKEN_FRACTIONS: Readonly<Record<number, readonly [string, string]>> = {
	2: ['half', 'halves'],
	4: ['quarter', 'quarters'],
	8: ['eighth', 'eighths'],
	16: ['sixteenth', 'sixteenths'],
	32: ['thirty-second', 'thirty-seconds'],
	64: ['sixty-fourth', 'sixty-fourths']
};

const SPOKEN_UNITS: Readonly<Record<LengthUnit, readonly [string, string]>> = {
	in: ['inch', 'inches'],
	mm: ['millimetre', 'millimetres'],
	cm: ['centimetre', 'centimetres'],
	m: ['metre', 'metres'],
	yd: ['yard', 'yards']
};
