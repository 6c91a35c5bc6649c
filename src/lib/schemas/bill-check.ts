import type { Bill, Corner, Fold, Piece } from '../domain/bill/bill';
import { workOut } from '../domain/bill/formula';
import { proofread, type Finding } from '../domain/bill/proofreader';
import { readBill, Unreadable, type BillDocument } from '../domain/exchange';
import { measureName } from '../domain/exchange/fields';
import { parseLength, type Length } from '../domain/length';
import type { Edge } from '../domain/stash';
import { documentOf, type BillDraft, type PieceDraft } from './bill-draft';

/** What can be drawn of a piece while it is typed. */
export type Sketch = Pick<Piece, 'name' | 'w' | 'h' | 'up' | 'scores' | 'corners' | 'edges' | 'diagonals'>;
type Units = 'in' | 'mm' | 'cm';

export interface CheckedDraft {
	readonly document: Record<string, unknown>;
	/** By field name; those of the bill as a whole under the empty name. */
	readonly issues: Readonly<Record<string, string>>;
	readonly findings: readonly Finding[];
	/** One for each piece, null where its size can't be read. */
	readonly sketches: readonly (Sketch | null)[];
}

/** Reads a draft as the bill that it would be, and tells everything that can be told of it. */
export function checkDraft(draft: BillDraft, roomUnits: Units): CheckedDraft {
	const units = unitsOf(draft, roomUnits);
	const document = documentOf(draft);
	const read = lengthReader(draft, units);
	const issues = { ...measureIssues(draft), ...lengthIssues(draft, read) };
	const bill = readDraft(draft, document, units, issues);
	return {
		document,
		issues,
		findings: bill ? proofread(bill, units) : [],
		sketches: draft.pieces.map((piece) => sketch(piece, read))
	};
}

/** A draft that has no issues, as the document that it is. */
export const billOf = ({ document }: CheckedDraft) => document as BillDocument;

const unitsOf = (draft: BillDraft, roomUnits: Units): Units =>
	draft.units === 'in' || draft.units === 'mm' || draft.units === 'cm' ? draft.units : roomUnits;

/** Adds what the schema refuses to the issues; a bill only where there are none. */
function readDraft(
	draft: BillDraft,
	document: Record<string, unknown>,
	units: Units,
	issues: Record<string, string>
): Bill | null {
	try {
		const bill = readBill(document, units);
		return Object.keys(issues).length > 0 ? null : bill;
	} catch (trouble) {
		if (!(trouble instanceof Unreadable)) throw trouble;
		for (const { path, message } of trouble.issues) issues[fieldOf(path, draft)] ??= message;
		return null;
	}
}

/** The schema stops at a field that is missing; sizes beside it are read all the same. */
function lengthIssues(draft: BillDraft, read: ReadLength): Record<string, string> {
	const issues: Record<string, string> = {};
	const check = (field: string, typed: string) => {
		const length = read(typed);
		if (typed.trim() !== '' && !length.ok) issues[field] = length.reason;
	};
	draft.measures.forEach(({ value }, index) => check(`measures.${index}.value`, value));
	/** Beside a measure that can't be read its formulas can't either, and that is said once. */
	if (Object.keys(issues).length > 0) return issues;
	draft.pieces.forEach(({ w, h }, index) => {
		check(`pieces.${index}.w`, w);
		check(`pieces.${index}.h`, h);
	});
	return issues;
}

function measureIssues({ measures }: BillDraft): Record<string, string> {
	const issues: Record<string, string> = {};
	const seen = new Set<string>();
	measures.forEach(({ name: typed, value }, index) => {
		const name = typed.trim();
		const read = measureName.safeParse(name);
		if (name === '' ? value.trim() !== '' : !read.success)
			issues[`measures.${index}.name`] = read.error?.issues[0]?.message ?? '';
		else if (name !== '' && seen.has(name))
			issues[`measures.${index}.name`] = `There is a measure called “${name}” already.`;
		seen.add(name);
	});
	return issues;
}

/** The document keeps measures by name, the form by row. */
function fieldOf(path: string, { measures }: BillDraft): string {
	const [list, name] = path.split('.');
	if (list !== 'measures' || name === undefined) return path;
	return `measures.${measures.findLastIndex((row) => row.name.trim() === name)}.value`;
}

type ReadLength = (
	typed: string,
	zero?: boolean
) => { readonly ok: true; readonly value: Length } | { readonly ok: false; readonly reason: string };

/** Reads a length or a formula over those of the draft's measures that can be read, each over the ones above it. */
function lengthReader(draft: BillDraft, units: Units): ReadLength {
	const measures = new Map<string, Length>();
	const read: ReadLength = (typed, zero = false) => {
		const text = typed.trimStart();
		if (text.startsWith('=')) return workOut(text.slice(1), measures, units);
		return parseLength(text, { unit: units, zero });
	};
	for (const { name, value } of draft.measures) {
		const length = read(value);
		if (length.ok) measures.set(name.trim(), length.value);
	}
	return read;
}

function sketch(piece: PieceDraft, reader: ReadLength): Sketch | null {
	const read = (typed: string, zero = false) => {
		const length = reader(typed, zero);
		return length.ok ? length.value : null;
	};
	const [w, h] = [read(piece.w), read(piece.h)];
	if (w === null || h === null || Math.max(w, h) > 400 * Math.min(w, h)) return null;
	return {
		...{ name: piece.name.trim(), w, h, up: piece.up === 'h' || piece.up === 'w' ? piece.up : 'none' },
		scores: piece.scores.flatMap(({ from, at, fold }) => {
			const length = read(at);
			const side = from === 'left' || from === 'right' ? w : h;
			if (length === null || length >= side) return [];
			return [{ from: from as Edge, at: length, fold: (fold || 'none') as Fold }];
		}),
		corners: piece.corners.map(({ at, tool }) => ({ at: at as Corner[], tool })),
		edges: piece.edges.map(({ at, tool }) => ({ at: at as Edge[], tool })),
		diagonals: piece.diagonals.flatMap(({ from, to }) => {
			const ends = [from, to].map(({ x, y }) => ({ x: read(x, true), y: read(y, true) }));
			const [start, end] = ends.flatMap(({ x, y }) => (x === null || y === null ? [] : [{ x, y }]));
			return start && end ? [{ from: start, to: end }] : [];
		})
	};
}
