import { TOOL_KINDS, type ToolKind } from '../../stash';
import type { Piece, ToolNeed } from '../bill';
import { freeKey, lineOf, names, type Finding, type Proof } from './finding';

/** What the pieces and steps use, against what the bill lists. */
export function toolFindings(proof: Proof): Finding[] {
	return [
		...cutting(proof),
		...scoring(proof),
		...boardCutting(proof),
		...punches(proof),
		...betweenGrooves(proof),
		...steps(proof)
	];
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
const SHAPES_CORNERS: readonly ToolKind[] = ['corner-punch', 'shape-punch', 'die-cutter', 'die', 'scissors'];
const SHAPES_EDGES: readonly ToolKind[] = [
	'edge-punch',
	'shape-punch',
	'hole-punch',
	'tab-punch',
	'die-cutter',
	'die',
	'scissors',
	'corner-punch'
];

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
			mend: add(proof, 'trimmer', 'trimmer', {
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
			mend: add(proof, 'scorer', 'scoring-board')
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
			mend: add(proof, 'knife', 'craft-knife', { cuts: ['board'] })
		}
	];
}

function punches(proof: Proof): Finding[] {
	return proof.bill.pieces.flatMap((piece) => [
		...piece.corners.flatMap(({ tool }) => punched(proof, piece, tool, 'corner', SHAPES_CORNERS)),
		...piece.edges.flatMap(({ tool }) => punched(proof, piece, tool, 'edge', SHAPES_EDGES))
	]);
}

function punched(
	proof: Proof,
	piece: Piece,
	key: string,
	part: 'corner' | 'edge',
	kinds: readonly ToolKind[]
): Finding[] {
	const tool = proof.bill.tools.find((one) => one.key === key);
	const kind: ToolKind = `${part}-punch`;
	if (tool && kinds.includes(tool.kind)) return [];
	if (tool) {
		return [
			{
				line: lineOf(piece),
				rule: 'punch-other-kind',
				severity: 'ask',
				message: `“${piece.name}” has its ${part}s punched with “${tool.name}”, which is listed as a ${words(tool.kind)}.`,
				mend: {
					text: `List “${tool.name}” as ${article(kind)}, or name another tool.`,
					change: { path: `tools.${proof.bill.tools.indexOf(tool)}.kind`, value: kind }
				}
			}
		];
	}
	return [
		{
			line: lineOf(piece),
			rule: 'punch-not-listed',
			severity: 'mend',
			message: `“${piece.name}” has its ${part}s punched with “${key}”, which isn’t listed.`,
			mend: add(proof, key, kind)
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
				mend: add(proof, 'scoring-tool', 'scoring-tool')
			}))
	);
}

function steps(proof: Proof): Finding[] {
	const { bill } = proof;
	return bill.steps.flatMap((step, index) => [
		...step.tools
			.filter((key) => !bill.tools.some((tool) => tool.key === key))
			.map((key) => ({
				line: `steps/${index + 1}`,
				rule: 'step-tool-not-listed',
				severity: 'mend' as const,
				message: `Step ${index + 1} uses “${key}”, which isn’t among the tools.`,
				mend: isToolKind(key)
					? add(proof, key, key)
					: { text: `List “${key}” among the tools, or take it out of the step.` }
			})),
		...step.pieces
			.filter((key) => !proof.piece(key))
			.map((key) => ({
				line: `steps/${index + 1}`,
				rule: 'step-piece-missing',
				severity: 'mend' as const,
				message: `Step ${index + 1} uses “${key}”, which isn’t among the pieces.`,
				mend: {
					text: `Add “${key}” to the pieces, or take it out of the step.`,
					change: { path: `steps.${index}.pieces`, value: step.pieces.filter((one) => one !== key) }
				}
			}))
	]);
}

function add(proof: Proof, wished: string, kind: ToolKind, more: object = {}): Finding['mend'] {
	const { tools } = proof.bill;
	return {
		text: `List ${article(kind)} among the tools.`,
		change: { path: `tools.${tools.length}`, value: { key: freeKey(wished, tools), kind, ...more } }
	};
}

const isToolKind = (key: string): key is ToolKind => (TOOL_KINDS as readonly string[]).includes(key);
const longest = ({ w, h }: Piece) => Math.max(w, h);
const words = (kind: string) => kind.replaceAll('-', ' ');
const article = (kind: ToolKind) => `${/^[aeiou]/.test(kind) ? 'an' : 'a'} ${words(kind)}`;
