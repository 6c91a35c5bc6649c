import { fenceSetting } from '$lib/domain/cutting/order';
import type { Length } from '$lib/domain/length';
import type { PlannedCut } from '$lib/domain/matching/verdict';

/** Cuts made one after another without moving the fence. */
export interface FenceRun {
	readonly setting: Length;
	readonly cuts: readonly { readonly number: number; readonly cut: PlannedCut }[];
}

/** Groups a sheet's cuts, which stand in trimmer order, by the setting of the fence. */
export function fenceRuns(cuts: readonly PlannedCut[]): FenceRun[] {
	const runs: { setting: Length; cuts: { number: number; cut: PlannedCut }[] }[] = [];
	cuts.forEach((cut, index) => {
		const setting = fenceSetting(cut);
		const last = runs.at(-1);
		const run = last?.setting === setting ? last : { setting, cuts: [] };
		if (run !== last) runs.push(run);
		run.cuts.push({ number: index + 1, cut });
	});
	return runs;
}

/** `cut 3`, `cuts 1, 2 and 4`. */
export function cutWords({ cuts }: FenceRun): string {
	const numbers = cuts.map(({ number }) => number);
	if (numbers.length === 1) return `cut ${numbers[0]}`;
	return `cuts ${numbers.slice(0, -1).join(', ')} and ${numbers.at(-1)}`;
}
