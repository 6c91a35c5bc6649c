import { METRE, type Length } from './length';
import type { Edge } from './stash';

export type RollRead =
	{ readonly ok: true; readonly left: Length } | { readonly ok: false; readonly reason: string };

/**
 * What is left on a roll, from diameters: full × (D² − c²) ÷ (D_full² − c²). Exact arithmetic, then down to the
 * unit: a roll is never credited with more than its diameter shows.
 */
export function rollLeft(roll: { full: Length; fullOuter: Length; core: Length; outer: Length }): RollRead {
	const { full, fullOuter, core, outer } = roll;
	if (core >= fullOuter)
		return { ok: false, reason: 'A full roll is wider than its core. Measure both again.' };
	if (outer < core) return { ok: false, reason: 'A roll can’t be narrower than its core. Measure it again.' };
	if (outer > fullOuter) return { ok: false, reason: 'That is wider than the full roll. Measure it again.' };
	const ring = (diameter: Length) => BigInt(diameter) ** 2n - BigInt(core) ** 2n;
	return { ok: true, left: Number((BigInt(full) * ring(outer)) / ring(fullOuter)) };
}

export interface PileCount {
	readonly likely: number;
	/** The ends of what the scale's step allows; equal where the scale settles it. */
	readonly least: number;
	readonly most: number;
}

/**
 * Sheets in a pile: mass ÷ (area × gsm). A scale that reads in steps may be off by half a step either way.
 * `grams` and `step` in grams, the sheet in lengths.
 */
export function sheetsInPile(pile: {
	grams: number;
	step: number;
	w: Length;
	h: Length;
	gsm: number;
}): PileCount {
	const sheet = sheetGrams(pile.w, pile.h, pile.gsm);
	const likely = Math.round(pile.grams / sheet);
	const lightest = (pile.grams - pile.step / 2) / sheet;
	const heaviest = (pile.grams + pile.step / 2) / sheet;
	return {
		likely,
		least: Math.max(0, Math.min(likely, Math.ceil(lightest - FLOAT_SLACK))),
		most: Math.max(likely, Math.floor(heaviest + FLOAT_SLACK))
	};
}

export function sheetGrams(w: Length, h: Length, gsm: number): number {
	return (w / METRE) * (h / METRE) * gsm;
}

/** Tape for `qty` of a piece taped along these edges; each edge is taped from corner to corner. */
export function tapeForPiece(piece: { w: Length; h: Length }, edges: readonly Edge[], qty: number): Length {
	const along = (edge: Edge) => (edge === 'top' || edge === 'bottom' ? piece.w : piece.h);
	return qty * edges.reduce((sum, edge) => sum + along(edge), 0);
}

/** A rim is the piece's perimeter. */
export function rim({ w, h }: { w: Length; h: Length }): Length {
	return 2 * (w + h);
}

/** A pile that sits exactly on the end of the interval is inside it, whatever the last bit says. */
const FLOAT_SLACK = 1e-9;
