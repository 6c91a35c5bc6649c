import type { ToolKind } from '../../stash';
import type { Piece } from '../bill';
import { addTool, article } from './add-tool';
import { lineOf, type Finding, type Proof } from './finding';

/** Corners and edges punched with what isn't listed, or isn't listed as something that punches them. */
export function punchFindings(proof: Proof): Finding[] {
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
				message: `“${piece.name}” has its ${part}s punched with “${tool.name}”, which is listed as ${article(tool.kind)}.`,
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
			mend: addTool(proof, key, kind)
		}
	];
}

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
