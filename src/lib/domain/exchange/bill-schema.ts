import { z } from 'zod';
import { SHEET_KINDS, SUPPLY_MEASURES, TOOL_KINDS, type ConsumableKind } from '../stash';
import {
	colourField,
	cornerField,
	cutsField,
	edgeField,
	keyed,
	keyField,
	LIMITS,
	measuredField,
	measureName,
	nameField,
	shapeField,
	unitsField,
	worked
} from './fields';

const rangeOf = <Field extends z.ZodType>(field: Field) =>
	z.strictObject({ min: field.optional(), max: field.optional() }).optional();

const material = z.strictObject({
	kind: z.enum(SHEET_KINDS),
	weight: rangeOf(measuredField),
	caliper: rangeOf(measuredField)
});

const slot = z.strictObject({
	key: keyField,
	name: nameField.optional(),
	material,
	designs: z.enum(['one', 'mixed']).optional(),
	sameAs: keyField.optional(),
	differentFrom: z.array(keyField).max(LIMITS.slots).optional(),
	design: nameField.optional(),
	collection: nameField.optional(),
	colour: colourField.optional(),
	swaps: z.array(material).max(LIMITS.swaps).optional()
});

const point = z.strictObject({ x: worked, y: worked });
const punched = <At extends z.ZodType>(at: At, most: number) =>
	z
		.array(z.strictObject({ at: z.array(at).min(1).max(most), tool: keyField }))
		.max(LIMITS.marks)
		.optional();

const piece = z.strictObject({
	key: keyField,
	slot: keyField,
	name: nameField.optional(),
	w: worked,
	h: worked,
	qty: z.int().min(1).max(LIMITS.quantity).optional(),
	up: z.enum(['h', 'w', 'none']).optional(),
	allowance: worked.optional(),
	scores: z
		.array(
			z.strictObject({ from: edgeField, at: worked, fold: z.enum(['valley', 'mountain', 'none']).optional() })
		)
		.max(LIMITS.marks)
		.optional(),
	corners: punched(cornerField, 4),
	edges: punched(edgeField, 4),
	diagonals: z
		.array(z.strictObject({ from: point, to: point }))
		.max(LIMITS.marks)
		.optional(),
	mount: z.strictObject({ on: keyField, border: worked.optional() }).optional(),
	wraps: z
		.strictObject({
			boards: z.array(keyField).min(1).max(LIMITS.marks),
			gaps: z.array(worked).max(LIMITS.marks).optional(),
			turnIn: worked,
			along: z.enum(['w', 'h']).optional()
		})
		.optional(),
	tape: z.strictObject({ line: keyField, edges: z.array(edgeField).min(1).max(4) }).optional()
});

/** An adhesive or extra line: `need` is a length, a volume or a whole number, as its kind is told. */
const consumable = z.strictObject({
	key: keyField,
	name: nameField.optional(),
	kind: z.enum(Object.keys(SUPPLY_MEASURES) as [ConsumableKind, ...ConsumableKind[]]),
	width: worked.optional(),
	need: z.union([worked, z.int().min(1).max(LIMITS.count)]),
	swaps: z
		.array(
			z.strictObject({
				kind: z.enum(Object.keys(SUPPLY_MEASURES) as [ConsumableKind, ...ConsumableKind[]]),
				width: worked.optional(),
				times: z.int().min(1).max(100).optional()
			})
		)
		.max(LIMITS.swaps)
		.optional()
});

const tool = z.strictObject({
	key: keyField,
	name: nameField.optional(),
	kind: z.enum(TOOL_KINDS),
	reach: worked.optional(),
	grooves: worked.optional(),
	shape: shapeField.optional(),
	size: worked.optional(),
	cuts: cutsField.optional(),
	swaps: z
		.array(
			z.strictObject({
				kind: z.enum(TOOL_KINDS),
				shape: shapeField.optional(),
				size: worked.optional(),
				reach: worked.optional()
			})
		)
		.max(LIMITS.swaps)
		.optional()
});

const step = z.strictObject({
	text: z.string().max(LIMITS.step).regex(/\S/, 'Say what is done in this step.'),
	tools: z.array(keyField).max(LIMITS.lines).optional(),
	pieces: z.array(keyField).max(LIMITS.pieces).optional()
});

/** One project of an exchange document: its bill, with lengths and formulas as they were typed. */
export const billSchema = z.strictObject({
	key: keyField,
	name: nameField,
	/** What a bare number in the bill means; left out, it is the reader's own unit. */
	units: unitsField.optional(),
	measures: z
		.record(measureName, worked)
		.refine(
			(measures) => Object.keys(measures).length <= LIMITS.measures,
			`At most ${LIMITS.measures} measures.`
		)
		.optional(),
	slots: keyed(slot, LIMITS.slots),
	pieces: keyed(piece, LIMITS.pieces),
	adhesives: keyed(consumable, LIMITS.lines).optional(),
	tools: keyed(tool, LIMITS.lines).optional(),
	extras: keyed(consumable, LIMITS.lines).optional(),
	steps: z.array(step).max(LIMITS.steps).optional()
});

export type BillDocument = z.output<typeof billSchema>;
export type SlotDocument = BillDocument['slots'][number];
export type PieceDocument = BillDocument['pieces'][number];
export type ConsumableNeedDocument = NonNullable<BillDocument['adhesives']>[number];
export type ToolNeedDocument = NonNullable<BillDocument['tools']>[number];
