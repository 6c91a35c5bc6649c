/** What a form's fields come to: text at the ends, lists and objects above. */
export type Tree = string | Tree[] | { [name: string]: Tree };
type Branch = { [name: string]: Tree };

const DEEPEST = 8;
const NAME = /^(?:[A-Za-z][A-Za-z-]*|\d{1,3})$/;

/**
 * Reads fields named by path: `pieces.0.w` is the `w` of a list's first entry, and `edges[]` takes the value of
 * every box ticked under that name. Entries keep the order of their numbers, which may leave gaps. Files and
 * names that aren't paths are passed over.
 */
export function readFormTree(fields: FormData): Branch {
	const root: Branch = {};
	for (const name of new Set(fields.keys())) {
		const ticked = name.endsWith('[]');
		const path = (ticked ? name.slice(0, -2) : name).split('.');
		if (path.length > DEEPEST || !path.every((part) => NAME.test(part))) continue;
		const texts = fields.getAll(name).filter((value) => typeof value === 'string');
		const value = ticked ? texts : texts[0];
		if (value !== undefined) plant(root, path, value);
	}
	return Object.fromEntries(Object.entries(root).map(([name, tree]) => [name, listed(tree)]));
}

function plant(branch: Branch, [name, ...deeper]: string[], value: Tree): void {
	if (name === undefined) return;
	const there = Object.hasOwn(branch, name) ? branch[name] : undefined;
	if (deeper.length === 0) {
		if (there === undefined) branch[name] = value;
		return;
	}
	if (there !== undefined && (typeof there === 'string' || Array.isArray(there))) return;
	const next: Branch = there ?? {};
	branch[name] = next;
	plant(next, deeper, value);
}

/** Objects whose names are all numbers are lists. */
function listed(tree: Tree): Tree {
	if (typeof tree === 'string' || Array.isArray(tree)) return tree;
	const entries = Object.entries(tree).map(([name, inner]) => [name, listed(inner)] as const);
	if (!entries.every(([name]) => /^\d+$/.test(name))) return Object.fromEntries(entries);
	return entries.sort(([a], [b]) => Number(a) - Number(b)).map(([, inner]) => inner);
}
