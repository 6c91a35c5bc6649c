import type { PlannedPlacement, PlannedSheet } from '$lib/domain/matching/verdict';

/** A piece of the plan as it first lies, and how often. */
export interface LabelLine extends PlannedPlacement {
	readonly count: number;
}

export function linesOf(sheets: readonly PlannedSheet[]): LabelLine[] {
	const byName = new Map<string, LabelLine>();
	for (const placed of sheets.flatMap(({ placements }) => placements)) {
		const name = `${placed.project} ${placed.piece}`;
		const known = byName.get(name);
		byName.set(name, { ...(known ?? placed), count: (known?.count ?? 0) + 1 });
	}
	return [...byName.values()];
}
