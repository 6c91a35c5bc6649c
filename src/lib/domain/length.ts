/**
 * A length is a whole number of 1/320 mm: 1 in = 8,128, 1/64 in = 127 and 0.1 mm = 32 are all exact, so an
 * inch size and its millimetre twin can be compared with `<=` and no tolerance.
 */
export type Length = number;
export type LengthUnit = 'in' | 'mm' | 'cm' | 'm' | 'yd';

export const MILLIMETRE = 320;
export const INCH = 8128;
