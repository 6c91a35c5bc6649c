import type { PlannedSheet } from '$lib/domain/matching/verdict';

/** An offcut that a plan leaves, as often as it does, by its numbers in the plan: `0.2`. */
export interface Leftover {
	readonly supply: string;
	readonly w: number;
	readonly h: number;
	readonly numbers: readonly string[];
}

export function leftoversOf(sheets: readonly PlannedSheet[]): Leftover[] {
	const leftovers = new Map<string, { supply: string; w: number; h: number; numbers: string[] }>();
	sheets.forEach(({ supply, offcuts }, sheet) =>
		offcuts.forEach(({ w, h }, nth) => {
			const name = `${supply} ${w} ${h}`;
			const known = leftovers.get(name) ?? { supply, w, h, numbers: [] };
			known.numbers.push(`${sheet}.${nth}`);
			leftovers.set(name, known);
		})
	);
	return [...leftovers.values()].sort((a, b) => b.w * b.h - a.w * a.h);
}
