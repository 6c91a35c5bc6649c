/**
 * The independent checker. It knows the problem and the plan and nothing of how the plan was found: no code is
 * shared with the planner. It asks, in this order: is every piece where and as it may be, is the stock enough,
 * is the cost the sum of what was opened, and does the cut list, carried out from the whole sheet, free every
 * piece? Whether a sheet comes apart by edge-to-edge cuts at all is judged a second time from the placements
 * alone, because a cut list could be wrong in a way that its own replay does not show.
 */
import {
	LIES,
	type Cut,
	type CutPlan,
	type CutProblem,
	type CutSheet,
	type Placement,
	type Rect
} from './problem';

/** Every fault of the plan as a sentence; empty where the plan is sound. */
export function checkPlan(problem: CutProblem, plan: CutPlan): string[] {
	return [
		...plan.sheets.flatMap((sheet, nth) =>
			checkSheet(problem, sheet).map((fault) => `sheet ${nth}: ${fault}`)
		),
		...checkQuantities(problem, plan),
		...checkStock(problem, plan)
	];
}

function checkSheet(problem: CutProblem, sheet: CutSheet): string[] {
	const kind = problem.sheets[sheet.sheet];
	if (!kind) return [`there is no sheet kind ${sheet.sheet}`];
	const faults = sheet.placements.flatMap((placement) => checkPlacement(problem, sheet.sheet, placement));
	const { placements } = sheet;
	placements.forEach((a, i) =>
		placements.slice(i + 1).forEach((b, j) => {
			if (!apart(a, b, problem.kerf)) faults.push(`placements ${i} and ${i + 1 + j} overlap`);
		})
	);
	const whole = { x: 0, y: 0, w: kind.w, h: kind.h };
	const byKnife = problem.interlocked === true && sheet.cuts.length === 0 && !fills(placements, whole);
	if (byKnife) return [...faults, ...checkKnifeOffcuts(sheet, whole)];
	if (!comesApart(placements, problem.kerf)) faults.push('does not come apart by edge-to-edge cuts');
	return [...faults, ...replay(sheet, whole, problem.kerf)];
}

function checkPlacement(problem: CutProblem, sheet: number, placement: Placement): string[] {
	const piece = problem.pieces[placement.piece];
	const kind = problem.sheets[sheet];
	if (!piece || !kind) return [`there is no piece ${placement.piece}`];
	const faults: string[] = [];
	const { x, y, w, h, turned } = placement;
	if (![x, y, w, h].every(Number.isInteger)) faults.push(`piece ${placement.piece} lies off the unit`);
	if (x < 0 || y < 0 || x + w > kind.w || y + h > kind.h)
		faults.push(`piece ${placement.piece} leaves the sheet`);
	const [asW, asH] = turned ? [piece.h, piece.w] : [piece.w, piece.h];
	if (w !== asW || h !== asH) faults.push(`piece ${placement.piece} is ${w} x ${h}, not ${asW} x ${asH}`);
	const allowed = piece.lies[sheet] ?? LIES.never;
	if ((allowed & (turned ? LIES.turned : LIES.upright)) === 0) {
		faults.push(`piece ${placement.piece} may not lie ${turned ? 'turned' : 'upright'} here`);
	}
	return faults;
}

function apart(a: Rect, b: Rect, kerf: number): boolean {
	return (
		a.x + a.w + kerf <= b.x || b.x + b.w + kerf <= a.x || a.y + a.h + kerf <= b.y || b.y + b.h + kerf <= a.y
	);
}

function fills(placements: readonly Placement[], whole: Rect): boolean {
	return placements.length === 1 && placements.every((only) => only.w === whole.w && only.h === whole.h);
}

/** A layout cut by knife has no cut list; its offcuts must only be clear of the pieces and of each other. */
function checkKnifeOffcuts(sheet: CutSheet, whole: Rect): string[] {
	const faults: string[] = [];
	sheet.offcuts.forEach((offcut, i) => {
		const inside =
			offcut.x >= 0 && offcut.y >= 0 && offcut.x + offcut.w <= whole.w && offcut.y + offcut.h <= whole.h;
		if (!inside || offcut.w <= 0 || offcut.h <= 0) faults.push(`offcut ${i} leaves the sheet`);
		const others = [...sheet.placements, ...sheet.offcuts.slice(i + 1)];
		if (others.some((other) => !apart(offcut, other, 0))) faults.push(`offcut ${i} overlaps`);
	});
	return faults;
}

/**
 * Any cut that crosses no piece may be taken first: a part of a layout that comes apart comes apart too. So one
 * search without going back decides.
 */
function comesApart(placements: readonly Placement[], kerf: number): boolean {
	if (placements.length <= 1) return true;
	for (const [at, size] of [['x', 'w'] as const, ['y', 'h'] as const]) {
		const sorted = [...placements].sort((a, b) => a[at] - b[at]);
		let end = -Infinity;
		for (const [i, placement] of sorted.entries()) {
			if (i > 0 && placement[at] >= end + kerf) {
				return comesApart(sorted.slice(0, i), kerf) && comesApart(sorted.slice(i), kerf);
			}
			end = Math.max(end, placement[at] + placement[size]);
		}
	}
	return false;
}

function replay(sheet: CutSheet, whole: Rect, kerf: number): string[] {
	const faults: string[] = [];
	const regions = new Map<string, Rect>([[name(whole), whole]]);
	sheet.cuts.forEach((cut, nth) => {
		const region = regions.get(name(cut.of));
		if (!region) {
			faults.push(`cut ${nth} is made in a region that is not there`);
			return;
		}
		if (crossed(sheet.placements, cut, region, kerf)) faults.push(`cut ${nth} goes through a piece`);
		const parts = divide(region, cut, kerf);
		if (!parts) {
			faults.push(`cut ${nth} is not within its region`);
			return;
		}
		regions.delete(name(region));
		for (const part of parts) regions.set(name(part), part);
	});
	for (const placement of sheet.placements) {
		if (!regions.delete(name(placement))) faults.push(`piece ${placement.piece} is not cut free`);
	}
	for (const offcut of sheet.offcuts) {
		if (!regions.delete(name(offcut))) faults.push(`offcut ${name(offcut)} is not what the cuts leave`);
	}
	for (const left of regions.keys()) faults.push(`${left} is left and not listed as an offcut`);
	return faults;
}

function crossed(placements: readonly Placement[], cut: Cut, region: Rect, kerf: number): boolean {
	return placements.some((placement) => {
		if (apart(placement, region, 0)) return false;
		const from = cut.axis === 'down' ? placement.x : placement.y;
		const to = from + (cut.axis === 'down' ? placement.w : placement.h);
		return from < cut.at + kerf && to > cut.at;
	});
}

function divide(region: Rect, cut: Cut, kerf: number): Rect[] | null {
	const { x, y, w, h } = region;
	const down = cut.axis === 'down';
	const first = cut.at - (down ? x : y);
	const rest = (down ? w : h) - first - kerf;
	if (first <= 0 || first >= (down ? w : h)) return null;
	const parts = down
		? [
				{ x, y, w: first, h },
				{ x: cut.at + kerf, y, w: rest, h }
			]
		: [
				{ x, y, w, h: first },
				{ x, y: cut.at + kerf, w, h: rest }
			];
	return rest > 0 ? parts : parts.slice(0, 1);
}

function name({ x, y, w, h }: Rect): string {
	return `${w} x ${h} at ${x}, ${y}`;
}

function checkQuantities(problem: CutProblem, plan: CutPlan): string[] {
	const cut = problem.pieces.map(() => 0);
	for (const { piece } of plan.sheets.flatMap((sheet) => sheet.placements))
		cut[piece] = (cut[piece] ?? 0) + 1;
	return problem.pieces.flatMap(({ qty }, piece) =>
		cut[piece] === qty ? [] : [`piece ${piece} is cut ${cut[piece]} times, not ${qty}`]
	);
}

function checkStock(problem: CutProblem, plan: CutPlan): string[] {
	const cost: [number, number] = [0, 0];
	const opened = problem.sheets.map(() => 0);
	for (const { sheet } of plan.sheets) {
		opened[sheet] = (opened[sheet] ?? 0) + 1;
		cost[0] += problem.sheets[sheet]?.cost[0] ?? 0;
		cost[1] += problem.sheets[sheet]?.cost[1] ?? 0;
	}
	const faults = problem.sheets.flatMap(({ count }, sheet) =>
		(opened[sheet] ?? 0) <= count
			? []
			: [`sheet kind ${sheet} is opened ${opened[sheet]} times; there are ${count}`]
	);
	if (cost[0] !== plan.cost[0] || cost[1] !== plan.cost[1]) faults.push('the cost is not what was opened');
	return faults;
}
