import { paperSize } from '../paper-size';
import { writeExact, writeMark } from './display';
import { readRational, type Rational } from './rational';
import { plainTyping } from './typed';
import {
	DISPLAY_STEP,
	LONGEST_ROLL,
	LONGEST_SHEET,
	METRE,
	MILLIMETRE,
	UNIT_LENGTH,
	type Length,
	type LengthUnit
} from './units';

export interface LengthEntry {
	/** What a bare number is in. */
	readonly unit: 'in' | 'mm' | 'cm';
	/** For tape and runners: metres and yards too, and up to 10 km. */
	readonly long?: boolean;
	/** Nothing left is an answer. */
	readonly zero?: boolean;
}
export interface Refused {
	readonly ok: false;
	readonly reason: string;
}
export type LengthRead = { readonly ok: true; readonly value: Length; readonly unit: LengthUnit } | Refused;
export type SizeRead =
	{ readonly ok: true; readonly w: Length; readonly h: Length; readonly unit: LengthUnit } | Refused;

/** Reads one length exactly as typed, or says what to type instead. Nothing is rounded. */
export function parseLength(text: string, entry: LengthEntry): LengthRead {
	if (text.length > LONGEST_TYPING)
		return refuse(`That is too much for one length. Type it like ${EXAMPLE}.`);
	return readOne(plainTyping(text), entry.unit, entry);
}

/**
 * Reads width and height, `5 1/4 x 7 3/4 in`, or the name of a size, `A4`. A unit at the end serves both, and so
 * does one on the first side alone; the unit that comes back is the first side's. A named size comes back upright.
 */
export function parseSize(text: string, entry: LengthEntry): SizeRead {
	if (text.length > 2 * LONGEST_TYPING)
		return refuse('That is too much for one size. Type it like 5 1/4 x 7 3/4 in.');
	const sides = plainTyping(text).split(/ ?(?:x|\bby\b) ?/);
	const [first, second] = sides;
	const named = sides.length === 1 ? paperSize(text) : null;
	if (named) return { ok: true, w: named.w, h: named.h, unit: unitNamed(named) };
	if (sides.length !== 2 || !first || !second)
		return refuse('Type both sides, like 5 1/4 x 7 3/4 in, or a name, like A4 or Letter.');
	const [firstUnit, secondUnit] = [unitOf(first), unitOf(second)];
	const w = readOne(first, firstUnit ?? secondUnit ?? entry.unit, entry);
	if (!w.ok) return w;
	const h = readOne(second, secondUnit ?? firstUnit ?? entry.unit, entry);
	if (!h.ok) return h;
	return { ok: true, w: w.value, h: h.value, unit: w.unit };
}

function unitNamed({ w, h }: { w: Length; h: Length }): LengthUnit {
	return w % MILLIMETRE === 0 && h % MILLIMETRE === 0 ? 'mm' : 'in';
}

function readOne(typed: string, bare: LengthUnit, entry: LengthEntry): LengthRead {
	if (typed === '') return refuse(`Type a length, like ${EXAMPLE}.`);
	if (typed.startsWith('≈')) return refuse('≈ marks a rounded length. Type the exact one.');
	const { number, word } = split(typed);
	if (number.startsWith('-')) return refuse('A length can’t be below zero. Leave out the minus.');
	if (FEET.test(word)) return refuse('Feet aren’t used here. Type inches: 1 ft is 12 in.');
	if (number === '') return refuse(`“${typed}” has no number. Type it like ${EXAMPLE}.`);
	const unit = word === '' ? bare : UNIT_WORDS.get(word);
	if (unit === undefined)
		return refuse(`“${typed}” doesn’t end in a unit used here. Type ${allowed(entry)} after the number.`);
	if (!entry.long && (unit === 'm' || unit === 'yd'))
		return refuse('Metres and yards are for tape. Type in, mm or cm here.');
	if (readsTwoWays(number, unit, entry)) {
		return refuse(
			`“${number}” can be read two ways. Type ${number.replace(',', '')} or ${number.replace(',', '.')}.`
		);
	}
	const amount = readRational(number);
	if (amount === null) return refuse(`“${typed}” doesn’t read as one length. Type it like ${EXAMPLE}.`);
	return measure(amount, unit, typed, entry);
}

function measure(amount: Rational, unit: LengthUnit, typed: string, entry: LengthEntry): LengthRead {
	if (amount.d === 0n) return refuse('A fraction can’t have 0 below the line. Check it and type it again.');
	if (amount.n === 0n && !entry.zero) return refuse('A length has to be more than zero.');
	const scaled = amount.n * BigInt(UNIT_LENGTH[unit]);
	const longest = entry.long ? LONGEST_ROLL : LONGEST_SHEET;
	if (scaled > amount.d * BigInt(longest)) {
		return refuse(`That is longer than ${entry.long ? '10 km' : '100 m'}. Check the number and its unit.`);
	}
	if (scaled % amount.d !== 0n) return refuse(between(typed, { n: scaled, d: amount.d }, unit));
	return { ok: true, value: Number(scaled / amount.d), unit };
}

/** `1,500 mm` is fifteen hundred to one maker and one and a half to another; `6,375 in` can only be the smaller. */
function readsTwoWays(number: string, unit: LengthUnit, entry: LengthEntry): boolean {
	if (!/^[1-9]\d{0,2},\d{3}$/.test(number)) return false;
	return Number(number.replace(',', '')) * UNIT_LENGTH[unit] <= (entry.long ? LONGEST_ROLL : LONGEST_LIKELY);
}

/** Names the two lengths that can be kept on either side of what was typed, and the ruler's marks around it. */
function between(typed: string, units: Rational, unit: LengthUnit): string {
	const step = BigInt(DISPLAY_STEP[unit]);
	const below = Number(units.n / units.d);
	const markBelow = Number((units.n / (units.d * step)) * step);
	const exact = [below, below + 1].filter((value) => value > 0).map((value) => writeExact(value, unit));
	const marks = [markBelow, markBelow + DISPLAY_STEP[unit]].filter((value) => value > 0);
	const ruler = marks.map((value) => writeMark(value, unit)).join(' or ');
	return `“${typed}” can’t be measured out exactly. The nearest that can: ${exact.join(' or ')}; by the ruler, ${ruler}.`;
}

function split(typed: string): { number: string; word: string } {
	const at = typed.search(/[a-z"'#$%&()µ²³°]/);
	if (at < 0) return { number: typed, word: '' };
	return { number: typed.slice(0, at).trim(), word: typed.slice(at).trim() };
}

function unitOf(typed: string): LengthUnit | undefined {
	return UNIT_WORDS.get(split(typed).word);
}

function allowed(entry: LengthEntry): string {
	return entry.long ? 'in, mm, cm, m or yd' : 'in, mm or cm';
}

function refuse(reason: string): Refused {
	return { ok: false, reason };
}

const EXAMPLE = '6 3/8 in or 162 mm';
const LONGEST_TYPING = 60;
const FEET = /^(?:'|ft|foot|feet)/;
/** No sheet on a craft table is longer. */
const LONGEST_LIKELY = 10 * METRE;

const UNIT_WORDS = new Map<string, LengthUnit>(
	(
		[
			['in', ['in', 'in.', '"', 'inch', 'inches']],
			['mm', ['mm', 'millimetre', 'millimetres', 'millimeter', 'millimeters']],
			['cm', ['cm', 'centimetre', 'centimetres', 'centimeter', 'centimeters']],
			['m', ['m', 'metre', 'metres', 'meter', 'meters']],
			['yd', ['yd', 'yds', 'yard', 'yards']]
		] as const
	).flatMap(([unit, words]) => words.map((word) => [word, unit] as const))
);
