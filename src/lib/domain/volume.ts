import { readRational, writeDecimal, writeMixed } from './length/rational';
import { plainTyping } from './length/typed';

/**
 * A volume is a whole number of 1/16 pl: 1 ml = 16·10⁹ and 1 US fl oz = 473,176,473,000, so that thousandths of
 * both, and eighths of a fl oz, are exact. 500 l still fits a safe integer.
 */
export type Volume = number;
export type VolumeUnit = 'ml' | 'l' | 'fl oz';
export type VolumeRead =
	| { readonly ok: true; readonly value: Volume; readonly unit: VolumeUnit }
	| { readonly ok: false; readonly reason: string };

export const MILLILITRE = 16_000_000_000;
export const LITRE = 1000 * MILLILITRE;
/** 231 cubic inches are a US gallon of 128 fl oz; 1 in = 25.4 mm. */
export const FLUID_OUNCE = 473_176_473_000;

/** Reads `250 ml`, `1,5 l` or `4 fl oz` exactly; a bare number is in `unit`. */
export function parseVolume(text: string, entry: { unit: VolumeUnit; zero?: boolean }): VolumeRead {
	const typed = text.length > LONGEST_TYPING ? '' : plainTyping(text);
	const { number, word } = AMOUNT.exec(typed)?.groups ?? {};
	const amount = readRational(number?.trim() ?? '');
	if (amount === null || amount.d === 0n) return refuse(`Type a volume like ${EXAMPLE}.`);
	if (word === 'oz' || word === 'oz.') return refuse('Ounces can be weight. Type fl oz, or ml.');
	const unit = word === '' ? entry.unit : UNIT_WORDS.get(word ?? '');
	if (unit === undefined) return refuse(`Type ml, l or fl oz after the number, like ${EXAMPLE}.`);
	if (amount.n === 0n && !entry.zero) return refuse('A volume has to be more than zero.');
	const scaled = amount.n * BigInt(UNIT_VOLUME[unit]);
	if (scaled > amount.d * BigInt(LARGEST))
		return refuse('That is more than 500 l. Check the number and its unit.');
	if (scaled % amount.d !== 0n)
		return refuse('That can’t be kept exactly. Type up to three decimals, like 8.45 fl oz.');
	return { ok: true, value: Number(scaled / amount.d), unit };
}

/** To the nearest tenth of a ml or fl oz, or hundredth of a litre, marked ≈ where that isn't exact. */
export function formatVolume(value: Volume, unit: VolumeUnit): string {
	const perUnit = unit === 'l' ? 100 : 10;
	const steps = Math.round(value / (UNIT_VOLUME[unit] / perUnit));
	const approx = steps * (UNIT_VOLUME[unit] / perUnit) === value ? '' : '≈ ';
	return `${approx}${writeDecimal(steps, perUnit)} ${unit}`;
}

/** Typeable and exact whatever the value, for documents. */
export function writeVolume(value: Volume, unit: VolumeUnit): string {
	const perUnit = UNIT_VOLUME[unit];
	return `${unit === 'fl oz' ? writeMixed(value, perUnit) : writeDecimal(value, perUnit)} ${unit}`;
}

function refuse(reason: string): VolumeRead {
	return { ok: false, reason };
}

const EXAMPLE = '250 ml or 4 fl oz';
const LONGEST_TYPING = 60;
const LARGEST = 500 * LITRE;
const AMOUNT = /^(?<number>[\d., /-]*\d) ?(?<word>.*)$/;
const UNIT_VOLUME: Readonly<Record<VolumeUnit, Volume>> = { ml: MILLILITRE, l: LITRE, 'fl oz': FLUID_OUNCE };
const UNIT_WORDS = new Map<string, VolumeUnit>([
	...['ml', 'millilitre', 'millilitres', 'milliliter', 'milliliters'].map((word) => [word, 'ml'] as const),
	...['l', 'litre', 'litres', 'liter', 'liters'].map((word) => [word, 'l'] as const),
	...['fl oz', 'fl. oz.', 'fl.oz.', 'fl oz.', 'floz', 'fluid ounce', 'fluid ounces'].map(
		(word) => [word, 'fl oz'] as const
	)
]);
