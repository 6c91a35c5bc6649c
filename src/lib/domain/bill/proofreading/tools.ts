import type { ToolKind } from '../../stash';
import type { Piece, ToolNeed } from '../bill';
import { addTool } from './add-tool';
import { lineOf, names, type Finding, type Proof } from './finding';

/** What cuts and scores the pieces, against what the bill lists. */
export function toolFindings(proof: Proof): Finding[] {
	return [...cutting(proof), ...scoring(proof), ...boardCutting(proof), ...betweenGrooves(proof)];
}

const CUTS: readonly ToolKind[] = [
	'trimmer',
	'guillotine-cutter',
	'rotary-cutter',
	'craft-knife',
	'scissors',
	'die-cutter'
];
const SCORES: readonly ToolKind[] = ['scoring-board', 'scoring-tool', 'bone-folder'];
const listed = (proof: Proof, kinds: readonly ToolKind[]) =>
	proof.bill.tools.filter(({ kind }) => kinds.includes(kind));

function cutting(proof: Proof): Finding[] {
	const [first] = proof.bill.pieces;
	if (!first || listed(proof, CUTS).length > 0) return [];
	return [
		{
			line: lineOf(first),
			rule: 'cutter-not-listed',
			severity: 'ask',
			message: 'Pieces are cut, and no trimmer, knife or scissors is listed.',
			mend: addTool(proof, 'trimmer', 'trimmer', {
				reach: proof.type(Math.max(...proof.bill.pieces.map(longest)))
			})
		}
	];
}

function scoring(proof: Proof): Finding[] {
	const scored = proof.bill.pieces.filter(({ scores }) => scores.length > 0);
	const [first] = scored;
	if (!first || listed(proof, SCORES).length > 0) return [];
	return [
		{
			line: lineOf(first),
			rule: 'scorer-not-listed',
			severity: 'mend',
			message: `${names(scored)} ${scored.length === 1 ? 'is' : 'are'} scored, and no scoring board or scoring tool is listed.`,
			mend: addTool(proof, 'scorer', 'scoring-board')
		}
	];
}

function boardCutting(proof: Proof): Finding[] {
	const boards = new Set(
		proof.bill.slots.filter(({ material }) => material.kind === 'chipboard').map(({ key }) => key)
	);
	const cut = proof.bill.pieces.filter(({ slot }) => boards.has(slot));
	const [first] = cut;
	if (!first || listed(proof, CUTS).some(({ cuts }) => cuts.includes('board'))) return [];
	return [
		{
			line: lineOf(first),
			rule: 'board-cutter-not-listed',
			severity: 'mend',
			message: `${names(cut)} ${cut.length === 1 ? 'is' : 'are'} chipboard, and no listed tool cuts board.`,
			mend: addTool(proof, 'knife', 'craft-knife', { cuts: ['board'] })
		}
	];
}

/** A scoring board takes a score only where it has a groove. */
function betweenGrooves(proof: Proof): Finding[] {
	const scorers = listed(proof, SCORES);
	const board = scorers.find((tool): tool is ToolNeed & { grooves: number } => tool.grooves !== null);
	if (!board || scorers.length > 1) return [];
	return proof.bill.pieces.flatMap((piece) =>
		piece.scores
			.filter(({ at }) => at % board.grooves !== 0)
			.map(({ from, at }) => ({
				line: lineOf(piece),
				rule: 'score-between-grooves',
				severity: 'ask' as const,
				message: `The score at ${proof.say(at)} from the ${from} of “${piece.name}” falls between the grooves of “${board.name}”, which are ${proof.say(board.grooves)} apart.`,
				mend: addTool(proof, 'scoring-tool', 'scoring-tool')
			}))
	);
}

const longest = ({ w, h }: Piece) => Math.max(w, h);
