import { z } from 'zod';
import { readSupply, Unreadable, writeSupply, type Issue, type SupplyDocument } from '../domain/exchange';
import { parseMoney, writeAmount } from '../domain/money';
import { SHEET_KINDS, SUPPLY_MEASURES, TOOL_KINDS, type ConsumableKind, type Supply } from '../domain/stash';
import { keyFrom } from './key';
import type { RoomUnits } from './rooms';
import { idField } from './supplies';
import { SUPPLY_KINDS } from './supply-filter';

const text = z.string().max(120).default('');
const direction = z.enum(['none', 'one-way', 'two-way']).default('none');

/** One flat field per control, so that the form works without JavaScript; each kind uses those that it has. */
const fields = z.object({
	id: idField,
	/** Of the row that is edited; 0 for a new one. */
	version: z.int().min(0).default(0),
	kind: z.enum(SUPPLY_KINDS).default('patterned-paper'),
	name: text,
	collection: text,
	bin: text,
	barcode: text,
	/** In whole units of the currency: `0.95`. */
	price: text,
	currency: z.string().length(3).default('USD'),
	arrives: text,
	unsure: z.boolean().default(false),
	size: text,
	sheets: z.int('Count the sheets: a whole number.').min(0).max(100_000).default(1),
	faceA: text,
	directionA: direction,
	faceB: text,
	directionB: direction,
	weight: text,
	caliper: text,
	/** Hex colours, separated by spaces. */
	colours: text,
	offcut: z.boolean().default(false),
	stripEdge: z.enum(['', 'top', 'bottom', 'left', 'right']).default(''),
	stripDepth: text,
	width: text,
	left: text,
	full: text,
	reach: text,
	grooves: text,
	shape: text,
	toolSize: text,
	cutsPaper: z.boolean().default(false),
	cutsBoard: z.boolean().default(false),
	lentUntil: text,
	borrowedUntil: text
});

export type SupplyForm = z.output<typeof fields>;

/** The form that adds or edits a supply; a bare number in it is in the room's unit. */
export function supplyForm(units: RoomUnits) {
	return fields.superRefine((form, context) => {
		const price = form.price.trim() === '' ? null : parseMoney(form.price, form.currency);
		if (price && !price.ok) context.addIssue({ code: 'custom', path: ['price'], message: price.reason });
		for (const { path, message } of unreadable(form, units)) {
			context.addIssue({ code: 'custom', path: [fieldOf(path, form)], message });
		}
	});
}

/** What the form says, as an exchange document says it. What isn't of its kind is left out. */
export function supplyDocument(form: SupplyForm): SupplyDocument {
	const said = { ...owned(form), ...ofKind(form) };
	return Object.fromEntries(
		Object.entries(said).filter(([, value]) => value !== undefined && value !== '')
	) as unknown as SupplyDocument;
}

/** The form as it stands for a supply that is there. */
export function filledForm(id: string, version: number, supply: Supply, currency: string): SupplyForm {
	const document: Readonly<Record<string, unknown>> = { ...writeSupply(supply) };
	const typed = (name: string) => String(document[name] ?? '');
	const [faceA, faceB] = supply.group === 'sheet' ? supply.faces : [];
	const strip = supply.group === 'sheet' ? supply.strip : null;
	const cuts = supply.group === 'tool' ? supply.cuts : [];
	return fields.parse({
		...{ id, version, kind: supply.kind, name: supply.name },
		...Object.fromEntries(PLAIN.map((name) => [name, typed(name)])),
		price: supply.price ? writeAmount(supply.price) : '',
		currency: supply.price?.currency ?? currency,
		unsure: supply.group !== 'tool' && supply.count === 'unsure',
		...(supply.group === 'tool' ? { toolSize: typed('size') } : { size: typed('size') }),
		sheets: supply.group === 'sheet' ? supply.sheets : 1,
		...{ faceA: faceA?.design, directionA: faceA?.direction },
		...{ faceB: faceB?.design, directionB: faceB?.direction },
		colours: supply.group === 'sheet' ? supply.colours.join(' ') : '',
		offcut: supply.group === 'sheet' && supply.offcut,
		stripEdge: strip?.edge ?? '',
		stripDepth: strip ? (document.brandingStrip as { depth: string }).depth : '',
		...{ cutsPaper: cuts.includes('paper'), cutsBoard: cuts.includes('board') }
	});
}

/** Fields that say the same under the same name in a document. */
const PLAIN = [
	...['collection', 'bin', 'barcode', 'arrives', 'weight', 'caliper', 'width', 'left', 'full'],
	...['reach', 'grooves', 'shape', 'lentUntil', 'borrowedUntil']
];

function owned({ kind, name, collection, bin, barcode, price, currency, arrives }: SupplyForm) {
	const read = price.trim() === '' ? null : parseMoney(price, currency);
	return {
		key: keyFrom(name, kind),
		...{ kind, name, collection, bin, barcode, arrives },
		price: read?.ok ? read.value : undefined
	};
}

function ofKind(form: SupplyForm): object {
	const count = form.unsure ? 'unsure' : undefined;
	const { kind } = form;
	if (isOneOf(SHEET_KINDS, kind)) return { ...sheet(form), count };
	if (isOneOf(TOOL_KINDS, kind)) return tool(form);
	const { left, full, width } = form;
	const measure = SUPPLY_MEASURES[kind as ConsumableKind];
	if (measure === 'count') return { left: whole(left), full: whole(full), count };
	return { left, full, count, ...(measure === 'length' ? { width } : {}) };
}

function sheet(form: SupplyForm) {
	const {
		size,
		sheets,
		faceA,
		directionA,
		faceB,
		directionB,
		weight,
		caliper,
		offcut,
		stripEdge,
		stripDepth
	} = form;
	const colours = form.colours.split(/[\s,]+/).filter(Boolean);
	const faces = [
		{ design: faceA || form.name, direction: directionA },
		...(faceB ? [{ design: faceB, direction: directionB }] : [])
	];
	const described = faceA !== '' || faceB !== '' || directionA !== 'none';
	return {
		...{ size, sheets, weight, caliper },
		faces: described ? faces : undefined,
		colours: colours.length > 0 ? colours : undefined,
		offcut: offcut || undefined,
		brandingStrip: stripEdge ? { edge: stripEdge, depth: stripDepth } : undefined
	};
}

function tool({
	reach,
	grooves,
	shape,
	toolSize,
	cutsPaper,
	cutsBoard,
	lentUntil,
	borrowedUntil
}: SupplyForm) {
	const cuts = [...(cutsPaper ? ['paper'] : []), ...(cutsBoard ? ['board'] : [])];
	return {
		...{ reach, grooves, shape, lentUntil, borrowedUntil },
		size: toolSize,
		cuts: cuts.length > 0 ? cuts : undefined
	};
}

function unreadable(form: SupplyForm, units: RoomUnits): readonly Issue[] {
	try {
		readSupply(supplyDocument(form), units);
		return [];
	} catch (error) {
		if (error instanceof Unreadable) return error.issues;
		throw error;
	}
}

/** The form's field for a path of the document. */
function fieldOf(path: string, { kind }: SupplyForm): string {
	const [head = '', second] = path.split('.');
	if (head === 'faces') return second === '1' ? 'faceB' : 'faceA';
	if (head === 'brandingStrip') return 'stripDepth';
	if (head === 'size' && isOneOf(TOOL_KINDS, kind)) return 'toolSize';
	return head === 'key' ? 'name' : head;
}

/** A count as a number; what isn't one stays text, and is refused with its field. */
function whole(typed: string): number | string {
	return /^\d+$/.test(typed.trim()) ? Number(typed) : typed;
}

function isOneOf(kinds: readonly string[], kind: string): boolean {
	return kinds.includes(kind);
}
