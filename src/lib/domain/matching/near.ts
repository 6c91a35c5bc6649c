import { INCH, MILLIMETRE, type Length } from '../length';
import { LIES } from '../cutting/problem';
import type { Seat } from './components';
import { lieUnder, roomFor } from './lies';
import type { MatchOptions, NearMiss } from './verdict';

const SMALL_MISS = { in: INCH / 16, mm: 1.5 * MILLIMETRE, cm: 1.5 * MILLIMETRE } as const;

/** For every row that could serve the seat but for a sliver: the smallest miss, where the other side fits. */
export function nearMisses({ part, uses }: Seat, options: MatchOptions): NearMiss[] {
	const most = SMALL_MISS[options.units];
	return uses.list.flatMap(({ sheet, prints }) => {
		const misses = part.pieces.flatMap(({ piece }) => {
			const cut = { piece, qty: 1, w: piece.w, h: piece.h };
			const lies = prints.reduce((all, { bound }) => all | lieUnder(cut, bound), 0);
			if ((lies & roomFor(cut, sheet)) !== 0) return [];
			return [
				...((lies & LIES.upright) !== 0 ? missOf(piece.w - sheet.w, piece.h - sheet.h) : []),
				...((lies & LIES.turned) !== 0 ? missOf(piece.w - sheet.h, piece.h - sheet.w) : [])
			].filter(({ by }) => by <= most);
		});
		const [least] = misses.sort((a, b) => a.by - b.by);
		return least ? [{ line: `slots/${part.slot.key}`, supply: sheet.supply.key, ...least }] : [];
	});
}

function missOf(w: Length, h: Length): { side: 'w' | 'h'; by: Length }[] {
	if (w > 0 && h <= 0) return [{ side: 'w', by: w }];
	return h > 0 && w <= 0 ? [{ side: 'h', by: h }] : [];
}
