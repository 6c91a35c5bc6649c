import { readRational, writeDecimal } from './length/rational';
import { plainTyping } from './length/typed';

/**
 * A thickness in whole 1/200,000 mm. A point (0.001 in) is 8.128 of the 1/320 mm that lengths are kept in, so a
 * 20 pt board could not be kept exactly as a length; here 0.1 pt = 508, 0.001 mm = 200 and 1/64 in = 79,375.
 */
export type Caliper = number;
export type CaliperRead =
	{ readonly ok: true; readonly value: Caliper } | { readonly ok: false; readonly reason: string };

export const POINT = 5080;
export const CALIPER_MILLIMETRE = 200_000;

/** Reads `20 pt`, `0.5 mm`, `500 µm`, `0.02 in` or `1/16 in`, exactly as typed. */
export function parseCaliper(text: string): CaliperRead {
	const typed = text.length > LONGEST_TYPING ? '' : plainTyping(text);
	const { number, word } = THICKNESS.exec(typed)?.groups ?? {};
	const amount = readRational(number?.trim() ?? '');
	if (amount === null || amount.d === 0n) return refuse('Type a thickness like 20 pt or 0.5 mm.');
	const unit = UNIT_WORDS.get(word ?? '');
	if (unit === undefined) return refuse('Say what the number is in: type pt or mm after it.');
	if (amount.n === 0n) return refuse('A thickness has to be more than zero.');
	const scaled = amount.n * BigInt(unit);
	if (scaled > amount.d * BigInt(THICKEST))
		return refuse('That is thicker than 25 mm. Check the number and its unit.');
	if (scaled % amount.d !== 0n)
		return refuse('That can’t be kept exactly. Type tenths of a point or thousandths of a mm.');
	return { ok: true, value: Number(scaled / amount.d) };
}

/** Exact and typeable: in points where it is a whole number of tenths, otherwise in mm. */
export function writeCaliper(value: Caliper): string {
	return value % (POINT / 10) === 0
		? `${writeDecimal(value / (POINT / 10), 10)} pt`
		: `${writeDecimal(value, CALIPER_MILLIMETRE)} mm`;
}

/** `20 pt (0.51 mm)`, or `≈ 19.7 pt (0.5 mm)` for one that was given in mm. */
export function formatCaliper(value: Caliper): string {
	const tenths = Math.round(value / (POINT / 10));
	const approx = (tenths * POINT) / 10 === value ? '' : '≈ ';
	return `${approx}${tenths / 10} pt (${Math.round(value / 2000) / 100} mm)`;
}

function refuse(reason: string): CaliperRead {
	return { ok: false, reason };
}

const LONGEST_TYPING = 60;
const THICKEST = 25 * CALIPER_MILLIMETRE;
const THICKNESS = /^(?<number>[\d., /-]*\d) ?(?<word>.*)$/;
const UNIT_WORDS = new Map<string, number>([
	...['pt', 'pts', 'point', 'points'].map((word) => [word, POINT] as const),
	...['mm', 'millimetre', 'millimetres', 'millimeter', 'millimeters'].map(
		(word) => [word, CALIPER_MILLIMETRE] as const
	),
	...['um', 'µm', 'μm', 'micron', 'microns'].map((word) => [word, CALIPER_MILLIMETRE / 1000] as const),
	...['in', '"', 'inch', 'inches'].map((word) => [word, 1000 * POINT] as const)
]);
