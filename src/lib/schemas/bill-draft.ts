import type { BillDocument } from '../domain/exchange/bill-schema';
import { SUPPLY_MEASURES, type ConsumableKind } from '../domain/stash';
import type { Tree } from './form-tree';

const material = { kind: '', weight: { min: '', max: '' }, caliper: { min: '', max: '' } };
const point = { x: '', y: '' };
const need = {
	...{ key: '', name: '', kind: '', width: '', need: '' },
	swaps: [{ kind: '', width: '', times: '' }]
} satisfies Shape;

/** Everything a bill can say, as a form says it: text all through. A list stands for any number of its entry. */
export const BILL_SHAPE = {
	...{ key: '', name: '', units: '' },
	measures: [{ name: '', value: '' }],
	slots: [
		{
			...{ key: '', name: '', designs: '', sameAs: '', design: '', collection: '', colour: '' },
			material,
			differentFrom: [''],
			swaps: [material]
		}
	],
	pieces: [
		{
			...{ key: '', slot: '', name: '', w: '', h: '', qty: '', up: '', allowance: '' },
			scores: [{ from: '', at: '', fold: '' }],
			corners: [{ at: [''], tool: '' }],
			edges: [{ at: [''], tool: '' }],
			diagonals: [{ from: point, to: point }],
			mount: { on: '', border: '' },
			wraps: { boards: [''], gaps: [''], turnIn: '', along: '' },
			tape: { line: '', edges: [''] }
		}
	],
	adhesives: [need],
	tools: [
		{
			...{ key: '', name: '', kind: '', reach: '', grooves: '', shape: '', size: '' },
			cuts: [''],
			swaps: [{ kind: '', shape: '', size: '', reach: '' }]
		}
	],
	extras: [need],
	steps: [{ text: '', tools: [''], pieces: [''] }]
} satisfies Shape;

export type Shape = string | readonly Shape[] | { readonly [name: string]: Shape };
type Draft<S> = S extends string
	? string
	: S extends readonly (infer Entry)[]
		? Draft<Entry>[]
		: { -readonly [Name in keyof S]: Draft<S[Name]> };

/** A bill on its way: what was typed, whether or not it can be read. */
export type BillDraft = Draft<typeof BILL_SHAPE>;
export type SlotDraft = BillDraft['slots'][number];
export type PieceDraft = BillDraft['pieces'][number];
export type NeedDraft = BillDraft['adhesives'][number];
export type ToolDraft = BillDraft['tools'][number];
export type MaterialDraft = SlotDraft['material'];

/** Lists that stand for lines of the bill. */
export const LINE_LISTS = ['slots', 'pieces', 'adhesives', 'tools', 'extras'] as const;

export const draftFromForm = (tree: Tree): BillDraft => fit(BILL_SHAPE, tree) as BillDraft;

export function draftOf(bill: BillDocument): BillDraft {
	const measures = Object.entries(bill.measures ?? {}).map(([name, value]) => ({ name, value }));
	return fit(BILL_SHAPE, { ...bill, measures }) as BillDraft;
}

/** Lays what is given on a shape: what isn't of it is left out, and what it lacks is blank. */
export function fit(shape: Shape, given: unknown): Tree {
	if (typeof shape === 'string') {
		return typeof given === 'string' ? given : typeof given === 'number' ? String(given) : shape;
	}
	if (Array.isArray(shape)) {
		const [entry] = shape as readonly Shape[];
		return Array.isArray(given) && entry !== undefined ? given.map((one) => fit(entry, one)) : [];
	}
	const from = typeof given === 'object' && given !== null ? (given as Record<string, unknown>) : {};
	return Object.fromEntries(
		Object.entries(shape).map(([name, inner]) => [
			name,
			fit(inner, Object.hasOwn(from, name) ? from[name] : undefined)
		])
	);
}

/**
 * The exchange document that a draft comes to: blanks left out, counts as numbers, every row in its place so that
 * an issue's path is a field's name. Measures are an object there, and are made from rows that have a name.
 */
export function documentOf(draft: BillDraft): Record<string, unknown> {
	const said = (spoken(draft) ?? {}) as Record<string, unknown[]>;
	const named = draft.measures.filter(({ name }) => name.trim() !== '');
	return {
		slots: [],
		...said,
		measures:
			named.length > 0 ? Object.fromEntries(named.map(({ name, value }) => [name.trim(), value])) : undefined,
		pieces: (said['pieces'] ?? []).map((piece) => withNumbers(piece, 'qty')),
		...(said['adhesives'] && { adhesives: said['adhesives'].map(needWithNumbers) }),
		...(said['extras'] && { extras: said['extras'].map(needWithNumbers) })
	};
}

function spoken(part: Tree): unknown {
	if (typeof part === 'string') return part.trim() === '' ? undefined : part;
	if (Array.isArray(part)) {
		if (part.length === 0) return undefined;
		return part.map((entry) => spoken(entry) ?? (typeof entry === 'string' ? '' : {}));
	}
	const said = Object.entries(part).flatMap(([name, inner]) => {
		const value = spoken(inner);
		return value === undefined ? [] : [[name, value] as const];
	});
	return said.length > 0 ? Object.fromEntries(said) : undefined;
}

function needWithNumbers(line: unknown) {
	const { swaps, ...rest } = line as { kind?: ConsumableKind; swaps?: unknown[] };
	const counted = rest.kind !== undefined && SUPPLY_MEASURES[rest.kind] === 'count';
	return {
		...(counted ? withNumbers(rest, 'need') : rest),
		...(swaps && { swaps: swaps.map((swap) => withNumbers(swap, 'times')) })
	};
}

/** Leaves what isn't a whole number as it was typed, for the schema to refuse. */
function withNumbers(entry: unknown, field: string): object {
	const fields = entry as Record<string, unknown>;
	const typed = fields[field];
	if (typeof typed !== 'string' || !/^\s*\d+\s*$/.test(typed)) return fields;
	return { ...fields, [field]: Number(typed) };
}
