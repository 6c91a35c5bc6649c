import type { Cut, Rect } from '../cutting/problem';
import type { Length } from '../length';
import type { ToolSupply } from '../stash';
import type { LaidSheet } from './layout';
import type { MatchOptions, PlannedCut, PlannedSheet } from './verdict';

/** A laid sheet as the document shows it: on the whole sheet, its branding strip cut off first. */
export function plannedSheet(
	{ sheet, nth, placements, cuts, offcuts }: LaidSheet,
	reach: Length | null,
	options: MatchOptions
): PlannedSheet {
	const { w, h, key } = sheet.supply;
	const moved = <R extends Rect>(rect: R): R => ({ ...rect, x: rect.x + sheet.x, y: rect.y + sheet.y });
	const shifted = cuts.map(({ axis, at, of }) => ({
		axis,
		at: at + (axis === 'down' ? sheet.x : sheet.y),
		of: moved(of)
	}));
	return {
		supply: key,
		nth,
		w,
		h,
		placements: placements.map(({ part, cut, x, y, w: width, h: height, turned, print }) => ({
			project: part.project,
			piece: cut.piece.key,
			...moved({ x, y, w: width, h: height }),
			turned,
			face: print.face,
			noSlack: width === sheet.w || height === sheet.h
		})),
		cuts: [...(sheet.remnant ? [] : stripCut(sheet, options.kerf)), ...shifted].map((cut) =>
			byReach(cut, reach)
		),
		offcuts: offcuts.map(moved)
	};
}

/** What her trimmer reaches: as she says, else the longest of the trimmers that she owns. */
export function reachOf(tools: readonly ToolSupply[], options: MatchOptions): Length | null {
	if (options.reach !== null) return options.reach;
	const stated = tools.flatMap(({ kind, reach }) =>
		TRIMMERS.includes(kind) && reach !== null ? [reach] : []
	);
	return stated.length > 0 ? Math.max(...stated) : null;
}

const TRIMMERS: readonly ToolSupply['kind'][] = ['trimmer', 'guillotine-cutter'];

function stripCut({ supply, x, y, w, h }: LaidSheet['sheet'], kerf: Length): Cut[] {
	if (!supply.strip) return [];
	const of = { x: 0, y: 0, w: supply.w, h: supply.h };
	switch (supply.strip.edge) {
		case 'left':
			return [{ axis: 'down', at: x - kerf, of }];
		case 'right':
			return [{ axis: 'down', at: w, of }];
		case 'top':
			return [{ axis: 'across', at: y - kerf, of }];
		case 'bottom':
			return [{ axis: 'across', at: h, of }];
	}
}

function byReach(cut: Cut, reach: Length | null): PlannedCut {
	const length = cut.axis === 'across' ? cut.of.w : cut.of.h;
	return reach !== null && length > reach ? { ...cut, byKnife: true } : cut;
}
