import type { BillDraft } from '$lib/schemas/bill-draft';
import type { Tree } from '$lib/schemas/form-tree';

export interface Difference {
	/** Where in the bill, in words. */
	readonly where: string;
	readonly yours: string;
	readonly theirs: string;
}

/** What two drafts of one bill say differently, field by field. */
export function differences(yours: BillDraft, theirs: BillDraft): Difference[] {
	const [mine, other] = [textsOf(yours), textsOf(theirs)];
	return [...new Set([...mine.keys(), ...other.keys()])]
		.filter((where) => (mine.get(where) ?? '') !== (other.get(where) ?? ''))
		.map((where) => ({ where, yours: mine.get(where) ?? '', theirs: other.get(where) ?? '' }));
}

function textsOf(draft: BillDraft): Map<string, string> {
	const texts = new Map<string, string>();
	const walk = (tree: Tree, path: readonly string[]): void => {
		if (typeof tree === 'string') {
			if (tree !== '') texts.set(path.join(' › '), tree);
			return;
		}
		if (Array.isArray(tree))
			return tree.forEach((inner, index) => walk(inner, [...path, lineName(inner, index)]));
		for (const [name, inner] of Object.entries(tree)) if (name !== 'key') walk(inner, [...path, name]);
	};
	walk(draft, []);
	return texts;
}

/** Lines are known by key, so that a row which only moved isn't a difference. */
function lineName(line: Tree, index: number): string {
	if (typeof line === 'string' || Array.isArray(line)) return String(index + 1);
	return (
		([line['name'], line['key']].find((said) => typeof said === 'string' && said !== '') as string) ??
		String(index + 1)
	);
}
