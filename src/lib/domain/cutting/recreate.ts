/**
 * Better plans by taking some pieces out and putting them in again. The search is given a price that it must
 * stay under; what it can't place stays outside, and the area outside is what it lowers. As soon as nothing is
 * outside the price falls, so whole sheets are emptied rather than shuffled (the goal-driven ruin and recreate of
 * Gardeyn & Wauters, EJOR 301, 2022, on the position-free trees of `box.ts`, where its leftover bookkeeping is
 * not needed). Worse states are taken by late acceptance (Burke & Bykov, EJOR 258, 2017).
 */
import { PIECE, areaIn, eachPiece, without, type Box } from './box';
import { areaOutside } from './construct';
import {
	JUDGES,
	MEASURES,
	type FilledSheet,
	type Inserter,
	type Manner,
	type Measure,
	type State
} from './insert';

const LATE = 60;

/** Gives complete plans, each cheaper than the last, and null after every turn that found none. */
export function* improve(inserter: Inserter, start: State): Generator<State | null, void> {
	const weigh = (state: State) => areaOutside(inserter, state) - bonus(inserter, state);
	let limit = start.outside.length === 0 ? start.cost - 1 : Infinity;
	let current = under(inserter, start, limit);
	let value = weigh(current);
	const late = new Array<number>(LATE).fill(value);
	for (let turn = 0; limit >= 0; turn++) {
		const next = disturb(inserter, current, limit);
		if (next.outside.length === 0) {
			yield next;
			limit = next.cost - 1;
			current = under(inserter, next, limit);
			value = weigh(current);
			late.fill(value);
			continue;
		}
		const nextValue = weigh(next);
		const at = turn % LATE;
		if (nextValue <= value || nextValue <= (late[at] as number)) {
			current = next;
			value = nextValue;
		}
		late[at] = value;
		yield null;
	}
}

/** Rewards sheets that are nearly full beside sheets that are nearly empty, below any piece's weight. */
function bonus({ model }: Inserter, { sheets }: State): number {
	let bonus = 0;
	for (const { sheet, used } of sheets) bonus += (used * used) / (model.sheets[sheet]?.area ?? 1);
	let smallest = Infinity;
	for (const { area } of model.pieces) if (area < smallest) smallest = area;
	return (bonus / model.area) * smallest * 0.9;
}

/** Shuts the sheets that hold least for their price until the plan is under the limit. */
function under(inserter: Inserter, state: State, limit: number): State {
	let { sheets, cost } = state;
	const outside = [...state.outside];
	while (cost > limit && sheets.length > 0) {
		let worst = 0;
		let least = Infinity;
		sheets.forEach(({ sheet, used }, i) => {
			const price = inserter.sheet(sheet).cost;
			const keep = price === 0 ? Infinity : (used / price) * (0.8 + 0.4 * inserter.random());
			if (keep < least) {
				least = keep;
				worst = i;
			}
		});
		const shut = sheets[worst] as FilledSheet;
		eachPiece(shut.box, ({ piece }) => outside.push(piece));
		cost -= inserter.sheet(shut.sheet).cost;
		sheets = sheets.filter((_, i) => i !== worst);
	}
	return { sheets, cost, outside };
}

/** Ruins one to three sheets, wholly or in part, and puts everything loose in again. */
export function disturb(inserter: Inserter, current: State, limit: number): State {
	const { random } = inserter;
	const sheets = current.sheets.slice();
	const loose = current.outside.slice();
	let { cost } = current;
	const ruined = Math.min(sheets.length, 1 + Math.floor(random() * 3));
	for (let n = 0; n < ruined; n++) {
		const i = Math.floor(random() * sheets.length);
		const sheet = sheets[i];
		if (!sheet) continue;
		const whole = random() < 0.15;
		const kept = whole ? null : ruin(inserter, sheet.box, loose);
		if (whole) eachPiece(sheet.box, ({ piece }) => loose.push(piece));
		if (kept) sheets[i] = { sheet: sheet.sheet, box: kept, used: areaIn(kept) };
		else {
			cost -= inserter.sheet(sheet.sheet).cost;
			sheets.splice(i, 1);
		}
	}
	const measure = MEASURES[random() < 0.6 ? 0 : Math.floor(random() * MEASURES.length)] as Measure;
	const judge = JUDGES[random() < 0.7 ? 0 : Math.floor(random() * JUDGES.length)] as Manner['judge'];
	const order = inserter.sorted(loose, measure, 0.3);
	return inserter.insert({ sheets, outside: [], cost }, order, { limit, blink: 0.02, judge, opens: 'any' });
}

/** Takes out one to three parts of the tree. */
function ruin({ random }: Inserter, box: Box, loose: number[]): Box | null {
	let left: Box | null = box;
	for (let n = 1 + Math.floor(random() * 3); n > 0 && left; n--) {
		const gone = new Set<Box>();
		eachPiece(pick(random, left), (piece) => {
			gone.add(piece);
			loose.push(piece.piece);
		});
		left = without(left, (piece) => gone.has(piece));
	}
	return left;
}

function pick(random: () => number, box: Box): Box {
	let at = box;
	while (at.axis !== PIECE) {
		at = at.kids[Math.floor(random() * at.kids.length)] as Box;
		if (random() < 0.3) break;
	}
	return at;
}
