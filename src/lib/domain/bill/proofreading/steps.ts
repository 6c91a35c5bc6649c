import { TOOL_KINDS, type ToolKind } from '../../stash';
import { addTool } from './add-tool';
import type { Finding, Proof } from './finding';

/** Steps that name a tool or a piece that the bill doesn't have. */
export function stepFindings(proof: Proof): Finding[] {
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
					? addTool(proof, key, key)
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

const isToolKind = (key: string): key is ToolKind => (TOOL_KINDS as readonly string[]).includes(key);
