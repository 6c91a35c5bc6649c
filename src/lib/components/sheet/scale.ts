import { INCH, type Length } from '$lib/domain/length';

/** A drawing's own units, 100 to the inch: small enough for SVG, and the same in every drawing. */
export const drawn = (length: Length) => (length * 100) / INCH;

/** A share of a side, as CSS writes it. */
export const share = (part: Length, whole: Length) => `${((part / whole) * 100).toFixed(4)}%`;
