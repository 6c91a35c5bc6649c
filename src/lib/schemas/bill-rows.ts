import { BILL_SHAPE, fit, LINE_LISTS, type BillDraft, type Shape } from './bill-draft';

/** What a button of the bill's form asks: `add pieces`, `remove pieces.2`, `up pieces.2`, `mend {"path":…}`. */
export const ROW_VERBS = ['add', 'remove', 'up', 'down', 'mend'] as const;
export type RowVerb = (typeof ROW_VERBS)[number];

/** Where to go on typing, and what to say was done. */
export interface RowEdit {
	readonly path: string;
	readonly says: string;
}

const NAMES: Readonly<Record<string, string>> = {
	measures: 'measure',
	slots: 'slot',
	pieces: 'piece',
	adhesives: 'adhesive',
	tools: 'tool',
	extras: 'extra',
	steps: 'step',
	scores: 'score',
	corners: 'punched corners',
	edges: 'punched edges',
	diagonals: 'diagonal cut',
	gaps: 'hinge gap',
	swaps: 'swap'
};

const MOST_ROWS = 500;

/** Carries out a row button on the draft itself; null where it asks for what isn't there. */
export function editRows(draft: BillDraft, asked: string): RowEdit | null {
	const [verb, ...words] = asked.split(' ');
	const path = words.join(' ');
	if (verb === 'mend') return mend(draft, path);
	if (verb === 'add') return addRow(draft, path);
	const [parent, index] = cut(path);
	const list = listAt(draft, parent);
	const name = nameOf(parent);
	if (!list || !(index in list)) return null;
	if (verb === 'remove') {
		list.splice(index, 1);
		const next = list.length > 0 ? `${parent}.${Math.min(index, list.length - 1)}` : parent;
		return { path: next, says: `The ${name} is taken out.` };
	}
	const to = verb === 'up' ? index - 1 : verb === 'down' ? index + 1 : -1;
	if (!(to in list)) return null;
	const [row] = list.splice(index, 1);
	list.splice(to, 0, row);
	return { path: `${parent}.${to}`, says: `The ${name} is now number ${to + 1}.` };
}

function addRow(draft: BillDraft, path: string): RowEdit | null {
	const list = listAt(draft, path);
	const shape = shapeAt(path);
	if (!list || !Array.isArray(shape) || list.length >= MOST_ROWS) return null;
	list.push(fit(shape[0], startOf(draft, path, list)));
	return { path: `${path}.${list.length - 1}`, says: `A ${nameOf(path)} is added.` };
}

/** What a new row says before anything is typed. */
function startOf(draft: BillDraft, path: string, list: readonly unknown[]): unknown {
	const key = LINE_LISTS.some((name) => name === path) ? freeKey(nameOf(path), list) : undefined;
	switch (path.split('.').at(-1)) {
		case 'slots':
			return { key, material: { kind: 'patterned-paper' } };
		case 'pieces':
			return { key, slot: draft.slots.at(-1)?.key, qty: '1' };
		case 'adhesives':
			return { key, kind: 'tape' };
		case 'tools':
			return { key, kind: 'trimmer' };
		case 'extras':
			return { key, kind: 'ribbon' };
		case 'scores':
			return { from: 'left', fold: 'valley' };
		case 'corners':
		case 'edges':
			return { tool: draft.tools.find(({ kind }) => kind.endsWith('-punch'))?.key };
		case 'gaps':
			return '';
	}
	return {};
}

function freeKey(stem: string, list: readonly unknown[]): string {
	const taken = new Set(list.map((row) => (row as { key?: string }).key));
	for (let number = list.length + 1; ; number++) {
		if (!taken.has(`${stem}-${number}`)) return `${stem}-${number}`;
	}
}

/** Puts a proofreader's value where it says; a place one past a list's end adds to it. */
function mend(draft: BillDraft, change: string): RowEdit | null {
	const { path, value } = readChange(change);
	const shape = shapeAt(path);
	const [parent, last] = [path.split('.').slice(0, -1).join('.'), path.split('.').at(-1) ?? ''];
	const holder = at(draft, parent);
	if (shape === undefined || typeof holder !== 'object' || holder === null) return null;
	if (Array.isArray(holder) ? Number(last) > holder.length : !Object.hasOwn(holder, last)) return null;
	(holder as Record<string, unknown>)[last] = fit(shape, value);
	return { path, says: 'Mended as proposed.' };
}

function readChange(text: string): { path: string; value: unknown } {
	try {
		const { path, value } = JSON.parse(text) as { path?: unknown; value?: unknown };
		return { path: typeof path === 'string' ? path : '', value };
	} catch {
		return { path: '', value: undefined };
	}
}

const nameOf = (path: string) => NAMES[path.split('.').at(-1) ?? ''] ?? 'row';

function cut(path: string): [string, number] {
	const split = path.lastIndexOf('.');
	return [path.slice(0, split), /^\d+$/.test(path.slice(split + 1)) ? Number(path.slice(split + 1)) : -1];
}

function listAt(draft: BillDraft, path: string): unknown[] | null {
	const found = at(draft, path);
	return Array.isArray(found) ? found : null;
}

function at(from: unknown, path: string): unknown {
	if (path === '') return from;
	return path
		.split('.')
		.reduce<unknown>(
			(node, name) =>
				typeof node === 'object' && node !== null && Object.hasOwn(node, name)
					? (node as Record<string, unknown>)[name]
					: undefined,
			from
		);
}

function shapeAt(path: string): Shape | undefined {
	return path.split('.').reduce<Shape | undefined>((shape, name) => {
		if (shape === undefined || typeof shape === 'string') return undefined;
		if (Array.isArray(shape)) return /^\d+$/.test(name) ? (shape as readonly Shape[])[0] : undefined;
		return Object.hasOwn(shape, name) ? (shape as Record<string, Shape>)[name] : undefined;
	}, BILL_SHAPE);
}
