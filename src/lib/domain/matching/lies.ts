import { LIES, type Lie } from '../cutting/problem';
import type { Cuttable, Terms } from './parts';
import type { Print } from './prints';
import type { Sheet } from './shelf';

/** How a piece may lie on a sheet so that one of these prints shows the right way up. */
export function lieOn(cut: Cuttable, sheet: Sheet, prints: readonly Print[], terms: Terms): Lie {
	const room = roomFor(cut, sheet);
	if (room === LIES.never) return LIES.never;
	if (!terms.cutsBoard && sheet.supply.kind === 'chipboard' && !isCutAlready(cut, sheet)) return LIES.never;
	let lie: number = LIES.never;
	for (const print of prints) lie |= lieUnder(cut, print.bound);
	return (lie & room) as Lie;
}

/** As the print binds it, whether or not there is room. */
export function lieUnder({ piece }: Cuttable, bound: boolean): Lie {
	if (!bound || piece.up === 'none' || piece.w === piece.h) return LIES.either;
	return piece.up === 'h' ? LIES.upright : LIES.turned;
}

/** The ways in which a sheet of this size has room for the piece. */
export function roomFor({ w, h }: Cuttable, sheet: { readonly w: number; readonly h: number }): Lie {
	const upright = w <= sheet.w && h <= sheet.h ? LIES.upright : LIES.never;
	const turned = h <= sheet.w && w <= sheet.h ? LIES.turned : LIES.never;
	return (upright | turned) as Lie;
}

/** Owned at exactly the piece's size: nothing is left to cut. */
export function isCutAlready({ w, h }: Cuttable, { supply }: Sheet): boolean {
	if (supply.strip) return false;
	return (supply.w === w && supply.h === h) || (supply.w === h && supply.h === w);
}
