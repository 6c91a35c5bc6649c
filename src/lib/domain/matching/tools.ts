import type { Bill, Piece, Score, ToolNeed } from '../bill/bill';
import type { Length } from '../length';
import type { ToolSupply } from '../stash';

/** How a tool line is met on one day. `swap` is the swap's number; `unsaid` what the tool doesn't state. */
export interface ToolChoice {
	readonly tool: ToolSupply;
	readonly swap: number | null;
	readonly unsaid: string | null;
}

/** What a line asks of a tool, the bill's own scores included. */
export interface Demand {
	readonly line: string;
	readonly kind: ToolSupply['kind'] | null;
	readonly options: readonly Ability[];
}

interface Ability {
	readonly kind: ToolSupply['kind'] | null;
	readonly reach: Length | null;
	/** Distances that a board's grooves must all meet. */
	readonly grooves: readonly Length[];
	readonly shape: string | null;
	readonly size: Length | null;
	readonly cuts: ToolNeed['cuts'];
}

export function demandsOf(bill: Bill): Demand[] {
	const scores = scoresOf(bill);
	return bill.tools.map((need) => ({
		line: `tools/${need.key}`,
		kind: need.kind,
		options: [
			abilityOf(need, need, scores),
			...need.swaps.map((swap) => abilityOf(need, { ...swap, grooves: null }, scores))
		]
	}));
}

/** Cutting chipboard, which needs its tool whether the bill lists one or not. */
export const BOARD_CUT: Demand = {
	line: 'tools/board-cut',
	kind: null,
	options: [{ kind: null, reach: null, grooves: [], shape: null, size: null, cuts: ['board'] }]
};

/** The best tool that serves on that day: what the line asks for before its swaps, the stated before the unsaid. */
export function toolOn(demand: Demand, tools: readonly ToolSupply[], on: string): ToolChoice | null {
	const here = tools.filter((tool) => isHere(tool, on));
	let unsure: ToolChoice | null = null;
	for (const [option, ability] of demand.options.entries()) {
		for (const tool of here) {
			const unsaid = lacks(ability, tool);
			if (unsaid === false) continue;
			const choice = { tool, swap: option === 0 ? null : option - 1, unsaid };
			if (unsaid === null) return choice;
			unsure ??= choice;
		}
	}
	return unsure;
}

/** Days from which on a tool that isn't here now would be. */
export function toolDates(tools: readonly ToolSupply[], after: string): string[] {
	const dates = tools.flatMap(({ lentUntil, arrives }) => [lentUntil, arrives]);
	return [...new Set(dates.filter((date) => date !== null && date > after))].sort() as string[];
}

function isHere({ arrives, lentUntil, borrowedUntil }: ToolSupply, on: string): boolean {
	return (
		(arrives === null || arrives <= on) &&
		(lentUntil === null || lentUntil <= on) &&
		(borrowedUntil === null || on <= borrowedUntil)
	);
}

/** False where the tool can't do it, null where it can, else the property that it doesn't state. */
function lacks(ability: Ability, tool: ToolSupply): string | false | null {
	if (ability.kind !== null && tool.kind !== ability.kind) return false;
	if (ability.cuts.some((material) => !cutsOf(tool).includes(material))) return false;
	const { reach, grooves, shape, size } = tool;
	if (ability.reach !== null && reach !== null && reach < ability.reach) return false;
	if (grooves !== null && ability.grooves.some((distance) => distance % grooves !== 0)) return false;
	if (ability.shape !== null && shape !== null && shape !== ability.shape) return false;
	if (ability.size !== null && size !== null && size !== ability.size) return false;
	if (ability.reach !== null && reach === null) return 'reach';
	if (ability.grooves.length > 0 && grooves === null) return 'groove spacing';
	if (ability.shape !== null && shape === null) return 'shape';
	if (ability.size !== null && size === null) return 'size';
	return null;
}

/** A tool that doesn't say what it cuts cuts paper. */
export function cutsOf({ cuts }: ToolSupply): ToolSupply['cuts'] {
	return cuts.length > 0 ? cuts : ['paper'];
}

interface Scores {
	readonly longest: Length | null;
	readonly distances: readonly Length[];
}

function abilityOf(
	need: ToolNeed,
	asked: Pick<ToolNeed, 'kind' | 'reach' | 'shape' | 'size' | 'grooves'>,
	scores: Scores
): Ability {
	const scoring = asked.kind === 'scoring-board';
	const reach = Math.max(asked.reach ?? 0, scoring ? (scores.longest ?? 0) : 0);
	return {
		kind: asked.kind,
		reach: reach > 0 ? reach : null,
		grooves: [...(asked.grooves === null ? [] : [asked.grooves]), ...(scoring ? scores.distances : [])],
		shape: asked.shape,
		size: asked.size,
		cuts: need.cuts
	};
}

function scoresOf(bill: Bill): Scores {
	const all = bill.pieces.flatMap((piece) => piece.scores.map((score) => ({ piece, score })));
	const lengths = all.map(({ piece, score }) => scoreLength(piece, score));
	return {
		longest: lengths.length > 0 ? Math.max(...lengths) : null,
		distances: all.map(({ score }) => score.at)
	};
}

/** A score from the left or right edge runs along the height. */
function scoreLength({ w, h }: Piece, { from }: Score): Length {
	return from === 'left' || from === 'right' ? h : w;
}
