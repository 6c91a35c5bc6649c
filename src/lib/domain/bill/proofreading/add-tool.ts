import type { ToolKind } from '../../stash';
import { freeKey, type Mend, type Proof } from './finding';

/** The mend that lists a tool which a bill uses and doesn't name. */
export function addTool(proof: Proof, wished: string, kind: ToolKind, more: object = {}): Mend {
	const { tools } = proof.bill;
	return {
		text: `List ${article(kind)} among the tools.`,
		change: { path: `tools.${tools.length}`, value: { key: freeKey(wished, tools), kind, ...more } }
	};
}

const words = (kind: string) => kind.replaceAll('-', ' ');
export const article = (kind: ToolKind) =>
	kind === 'scissors' ? 'scissors' : `${/^[aeiou]/.test(kind) ? 'an' : 'a'} ${words(kind)}`;
