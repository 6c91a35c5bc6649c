import { readRational } from './length/rational';
import { plainTyping } from './length/typed';
import type { PaperWeight } from './stash';

/** The grades whose pounds mean something, each with its own basic sheet. */
export const GRADES = ['cover', 'text', 'bond', 'index', 'tag', 'bristol'] as const;
export type Grade = (typeof GRADES)[number];
export type WeightRead =
	{ readonly ok: true; readonly value: PaperWeight } | { readonly ok: false; readonly reason: string };

/** Reads `180 gsm`, `120 g/m²`, `65 lb cover` or `110# index`. Pounds without a grade are refused. */
export function parseWeight(text: string): WeightRead {
	const typed = text.length > LONGEST_TYPING ? '' : plainTyping(text);
	const { number, words } = WEIGHT.exec(typed)?.groups ?? {};
	const amount = readRational(number?.trim() ?? '');
	if (amount === null || amount.d === 0n || words === undefined)
		return refuse(`Type a weight like ${EXAMPLE}.`);
	const quantity = Number(amount.n) / Number(amount.d);
	if (GRAMS.test(words)) return weigh(quantity, `${quantity} gsm`, quantity);
	const pounds = POUNDS.exec(words);
	if (!pounds) return refuse(`Type gsm after the number, or pounds with their grade, like ${EXAMPLE}.`);
	const grade = GRADE_WORDS.get(pounds.groups?.['grade'] ?? '');
	if (grade === undefined) {
		return refuse(`Pounds need their grade: type ${quantity} lb cover, text, bond, index, tag or bristol.`);
	}
	return weigh(quantity, `${quantity} lb ${grade}`, gsmOfPounds(quantity, grade));
}

/**
 * Grams per square metre of a paper whose 500 basic sheets weigh this many pounds: lb × 1406.139… ÷ (a × b), from
 * 1 lb = 453.59237 g and 1 in = 25.4 mm, in one division.
 */
export function gsmOfPounds(pounds: number, grade: Grade): number {
	return (pounds * GRAMS_TIMES) / (BASIC_SHEET[grade] * SQUARE_INCH);
}

export function poundsOfGsm(gsm: number, grade: Grade): number {
	return (gsm * BASIC_SHEET[grade] * SQUARE_INCH) / GRAMS_TIMES;
}

/** As the label says it, with the grams where it says pounds: `65 lb cover (≈ 176 gsm)`. */
export function formatWeight(weight: PaperWeight): string {
	return weight.text.endsWith('gsm') ? weight.text : `${weight.text} (≈ ${Math.round(weight.gsm)} gsm)`;
}

function weigh(quantity: number, text: string, gsm: number): WeightRead {
	if (quantity === 0) return refuse('A weight has to be more than zero.');
	if (gsm > HEAVIEST) return refuse(`That is heavier than ${HEAVIEST} gsm. Check the number and its unit.`);
	return { ok: true, value: { text, gsm } };
}

function refuse(reason: string): WeightRead {
	return { ok: false, reason };
}

const EXAMPLE = '180 gsm or 65 lb cover';
const LONGEST_TYPING = 60;
/** Greyboard of 6 mm is near 4,000; nothing cut by hand is heavier. */
const HEAVIEST = 5000;

const WEIGHT = /^(?<number>[\d., /]*\d)(?<words>.*)$/;
const GRAMS = /^ ?(?:gsm|g ?\/ ?(?:m2|m²|m\^2|sqm|sq m)|g|grams?)$/;
const POUNDS = /^ ?(?:lbs?\.?|#|pounds?)(?: ?(?<grade>[a-z]+))?(?: (?:stock|paper|weight))?$/;

/** In quarters of a square inch, so that index and bristol are whole. */
const BASIC_SHEET: Readonly<Record<Grade, number>> = {
	cover: 4 * 20 * 26,
	text: 4 * 25 * 38,
	bond: 4 * 17 * 22,
	index: 51 * 61,
	tag: 4 * 24 * 36,
	bristol: 45 * 57
};
/** 4 × 453.59237 g ÷ 500 over 0.0254² m², both scaled by 10⁸. */
const GRAMS_TIMES = 4 * 90_718_474;
const SQUARE_INCH = 64_516;

/** Book and offset share the sheet of text; writing and ledger that of bond. */
const GRADE_WORDS = new Map<string, Grade>([
	...GRADES.map((grade) => [grade, grade] as const),
	['book', 'text'],
	['offset', 'text'],
	['writing', 'bond'],
	['ledger', 'bond']
]);
