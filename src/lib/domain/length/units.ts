/**
 * A length is a whole number of 1/320 mm: 1 in = 8,128, 1/64 in = 127 and 0.1 mm = 32 are all exact, so an
 * inch size and its millimetre twin can be compared with `<=` and no tolerance.
 */
export type Length = number;
export type LengthUnit = 'in' | 'mm' | 'cm' | 'm' | 'yd';

export const MILLIMETRE = 320;
export const CENTIMETRE = 3200;
export const METRE = 320_000;
export const INCH = 8128;
export const YARD = 36 * INCH;

export const UNIT_LENGTH: Readonly<Record<LengthUnit, Length>> = {
	in: INCH,
	mm: MILLIMETRE,
	cm: CENTIMETRE,
	m: METRE,
	yd: YARD
};

/** What a display is rounded to: a ruler's finest mark in each unit. */
export const DISPLAY_STEP: Readonly<Record<LengthUnit, Length>> = {
	in: INCH / 64,
	mm: MILLIMETRE / 10,
	cm: MILLIMETRE / 10,
	m: CENTIMETRE,
	yd: YARD / 8
};

/** Longest length taken: 100 m for a sheet, 10 km for what comes on a roll. */
export const LONGEST_SHEET = 100 * METRE;
export const LONGEST_ROLL = 10_000 * METRE;
