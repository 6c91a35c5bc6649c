import type { MovementDocument } from '../../src/lib/domain/exchange';
import { daysAfter, type Row } from './row';

/** Sheets of each design that a pad, set or pack had when it was bought, and how long ago that was. */
const BOUGHT: Record<string, { readonly sheets: number; readonly daysAgo: number }> = {
	'Hedge School': { sheets: 2, daysAgo: 96 },
	'Salt Ledger': { sheets: 3, daysAgo: 71 },
	'Damson Hour': { sheets: 6, daysAgo: 58 },
	'Kiln Shelf': { sheets: 4, daysAgo: 40 },
	'Moth Atlas': { sheets: 3, daysAgo: 23 },
	'Quiet Bench': { sheets: 10, daysAgo: 120 }
};

/** Where the papers in the stash came from and what has been cut from them, one line after the other. */
export function ledger(rows: readonly Row[], today: string): MovementDocument[] {
	return rows.flatMap(({ supply }, nth): MovementDocument[] => {
		const bought = BOUGHT[supply.collection ?? ''];
		if (!('sheets' in supply) || supply.arrives || !bought) return [];
		const on = (daysAgo: number) => `${daysAfter(today, -daysAgo)}T${10 + (nth % 9)}:${10 + (nth % 45)}:00Z`;
		const line = { supply: supply.key, by: nth % 3 === 0 ? 'Idris Quillfeather' : 'Wren Tallow' };
		if (supply.offcut) {
			return [{ ...line, key: `${supply.key}-in`, kind: 'offcut-in', change: supply.sheets, at: on(15) }];
		}
		const sheets = Math.max(bought.sheets, supply.sheets);
		const gone = sheets - supply.sheets;
		const lines: MovementDocument[] = [
			{ ...line, key: `${supply.key}-bought`, kind: 'bought', change: sheets, at: on(bought.daysAgo) }
		];
		if (gone > 0) lines.push({ ...line, key: `${supply.key}-cut`, kind: 'cut', change: -gone, at: on(12) });
		return lines;
	});
}
