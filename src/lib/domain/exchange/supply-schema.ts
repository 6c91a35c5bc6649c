import { z } from 'zod';
import { SHEET_KINDS, SUPPLY_MEASURES, TOOL_KINDS, type ConsumableKind } from '../stash';
import {
	colourField,
	cutsField,
	dateField,
	edgeField,
	keyField,
	LIMITS,
	measuredField,
	nameField,
	priceField,
	shapeField
} from './fields';

type KindsBy<Measure> = {
	[Kind in ConsumableKind]: (typeof SUPPLY_MEASURES)[Kind] extends Measure ? Kind : never;
}[ConsumableKind];

/** The consumables whose amount is told this way, for a schema to tell apart. */
export function kindsBy<Measure extends 'length' | 'volume' | 'count'>(measure: Measure) {
	const kinds = Object.entries(SUPPLY_MEASURES).filter(([, told]) => told === measure);
	return z.enum(kinds.map(([kind]) => kind) as [KindsBy<Measure>, ...KindsBy<Measure>[]]);
}

const owned = {
	key: keyField,
	name: nameField,
	collection: nameField.optional(),
	bin: nameField.optional(),
	barcode: z.string().max(20).optional(),
	price: priceField.optional(),
	arrives: dateField.optional()
};
const countField = z.enum(['counted', 'unsure']).optional();

const sheetGoods = z.strictObject({
	...owned,
	kind: z.enum(SHEET_KINDS),
	size: measuredField,
	sheets: z.int().min(0).max(LIMITS.sheets),
	count: countField,
	faces: z
		.array(z.strictObject({ design: nameField, direction: z.enum(['none', 'one-way', 'two-way']) }))
		.min(1)
		.max(LIMITS.faces)
		.optional(),
	weight: measuredField.optional(),
	caliper: measuredField.optional(),
	colours: z.array(colourField).max(LIMITS.colours).optional(),
	offcut: z.boolean().optional(),
	brandingStrip: z.strictObject({ edge: edgeField, depth: measuredField }).optional()
});

const byLength = z.strictObject({
	...owned,
	kind: kindsBy('length'),
	width: measuredField.optional(),
	left: measuredField,
	full: measuredField.optional(),
	count: countField
});

const byVolume = z.strictObject({
	...owned,
	kind: kindsBy('volume'),
	left: measuredField,
	full: measuredField.optional(),
	count: countField
});

const byCount = z.strictObject({
	...owned,
	kind: kindsBy('count'),
	left: z.int().min(0).max(LIMITS.count),
	full: z.int().min(1).max(LIMITS.count).optional(),
	count: countField
});

const tool = z.strictObject({
	...owned,
	kind: z.enum(TOOL_KINDS),
	reach: measuredField.optional(),
	grooves: measuredField.optional(),
	shape: shapeField.optional(),
	size: measuredField.optional(),
	cuts: cutsField.optional(),
	lentUntil: dateField.optional(),
	borrowedUntil: dateField.optional()
});

/** One supply of an exchange document. What each kind can say is its own; anything else is refused. */
export const supplySchema = z.discriminatedUnion('kind', [sheetGoods, byLength, byVolume, byCount, tool]);

export type SupplyDocument = z.output<typeof supplySchema>;
export type SheetDocument = z.output<typeof sheetGoods>;
export type ToolDocument = z.output<typeof tool>;
export type ConsumableDocument = Exclude<SupplyDocument, SheetDocument | ToolDocument>;
