/**
 * Trimmer order. A cut can be made once the cut that makes its region has been made; within that, cuts at one
 * fence setting are taken together. The setting is the distance from the region's left or top edge, which lies
 * against the fence. Next comes a setting that can be finished for good if there is one, then the one that
 * frees most cuts: a greedy list schedule, exact where no setting is needed on both sides of another.
 */
import type { Cut, CutPlan } from './problem';

/** A cut and the cuts in the regions that it makes. */
export interface CutTree {
	readonly cut: Cut;
	readonly then: readonly CutTree[];
}

export function fenceSetting(cut: Cut): number {
	return cut.at - (cut.axis === 'down' ? cut.of.x : cut.of.y);
}

export function trimmerOrder(roots: readonly CutTree[]): Cut[] {
	const waiting = new Map<number, number>();
	const count = (tree: CutTree) => {
		const setting = fenceSetting(tree.cut);
		waiting.set(setting, (waiting.get(setting) ?? 0) + 1);
		tree.then.forEach(count);
	};
	roots.forEach(count);
	const ordered: Cut[] = [];
	let ready: readonly CutTree[] = roots;
	while (ready.length > 0) {
		const run = nextRun(ready, waiting);
		ordered.push(...run.cuts);
		waiting.set(run.setting, (waiting.get(run.setting) ?? 0) - run.cuts.length);
		ready = run.ready;
	}
	return ordered;
}

interface Run {
	readonly setting: number;
	readonly cuts: readonly Cut[];
	readonly ready: readonly CutTree[];
}

function nextRun(ready: readonly CutTree[], waiting: ReadonlyMap<number, number>): Run {
	const runs = [...new Set(ready.map(({ cut }) => fenceSetting(cut)))].map((setting) =>
		runOf(ready, setting)
	);
	const rank = ({ setting, cuts }: Run) => (cuts.length === waiting.get(setting) ? 1e9 : 0) + cuts.length;
	return runs.reduce((best, run) => (rank(run) > rank(best) ? run : best));
}

/** Every cut that can be made at `setting` without moving the fence. */
function runOf(ready: readonly CutTree[], setting: number): Run {
	const cuts: Cut[] = [];
	const later: CutTree[] = [];
	const visit = (tree: CutTree) => {
		if (fenceSetting(tree.cut) === setting) {
			cuts.push(tree.cut);
			tree.then.forEach(visit);
		} else later.push(tree);
	};
	ready.forEach(visit);
	return { setting, cuts, ready: later };
}

export function countCuts(plan: CutPlan): number {
	return plan.sheets.reduce((sum, { cuts }) => sum + cuts.length, 0);
}

/** How often the fence is set when the sheets are cut in the plan's order. */
export function fenceSettings(plan: CutPlan): number {
	const settings = plan.sheets.flatMap(({ cuts }) => cuts.map(fenceSetting));
	return settings.filter((setting, i) => setting !== settings[i - 1]).length;
}

/** The area of the largest single offcut that the plan leaves. */
export function largestLeftover(plan: CutPlan): number {
	return Math.max(0, ...plan.sheets.flatMap(({ offcuts }) => offcuts.map(({ w, h }) => w * h)));
}
