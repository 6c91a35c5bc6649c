import type { Laid, Layout } from './layout';
import type { Part } from './parts';
import { VERDICTS, type LineResult, type Verdict } from './verdict';

export const OUT_OF_TIME = 'no plan found in the time given';

export function isOutOfTime({ lines }: { readonly lines: readonly LineResult[] }): boolean {
	return lines.some(({ why }) => why === OUT_OF_TIME);
}

/** A slot's line as its layout shows it: what was used, and what had to be granted for it. */
export function slotLine(part: Part, layout: Layout, today: string): LineResult {
	const laid = layout.sheets.flatMap((opened) =>
		opened.placements
			.filter((one) => isOf(part, one))
			.map((one) => ({ ...one, supply: opened.sheet.supply, order: opened.sheet.order }))
	);
	const rows = [...new Map(laid.map(({ supply, order }) => [supply.key, order]))].sort((a, b) => a[1] - b[1]);
	const swap = Math.max(-1, ...laid.map(({ way }) => way.material));
	const arrivals = laid.flatMap(({ supply }) =>
		supply.arrives !== null && supply.arrives > today ? [supply.arrives] : []
	);
	const after = arrivals.sort().at(-1) ?? null;
	const unsaid = laid.find(({ way }) => way.unsaid !== null)?.way.unsaid;
	const unsure = laid.some(({ supply }) => supply.count === 'unsure');
	const smaller = laid.some(({ cut }) => cut.w < cut.piece.w || cut.h < cut.piece.h);
	const why = unsaid
		? `the paper's ${unsaid} isn't stated`
		: unsure
			? 'only if a count that nobody has checked holds'
			: null;
	const verdict: Verdict = why ? 'look' : after ? 'after' : swap >= 0 || smaller ? 'swap' : 'now';
	return {
		line: lineOf(part),
		verdict,
		supplies: rows.map(([key]) => key),
		swap: swap >= 0 ? swap : null,
		...(after ? { after } : {}),
		...(why ? { why } : {})
	};
}

export function lineOf(part: Part): string {
	return `slots/${part.slot.key}`;
}

export function isOf(part: Part, { part: { project, slot } }: Pick<Laid, 'part'>): boolean {
	return part.project === project && part.slot.key === slot.key;
}

export function worst(verdicts: readonly Verdict[]): Verdict {
	return VERDICTS[Math.max(0, ...verdicts.map((verdict) => VERDICTS.indexOf(verdict)))] ?? 'now';
}

export function isWorse(a: Verdict, b: Verdict): boolean {
	return VERDICTS.indexOf(a) > VERDICTS.indexOf(b);
}
