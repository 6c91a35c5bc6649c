import { z } from 'zod';
import { dateField, LIMITS, measuredField, nameField, priceField } from '../domain/exchange/fields';
import { supplySchema } from '../domain/exchange/supply-schema';
import { SHEET_KINDS } from '../domain/stash';

/** Made by the client, so that sending the same thing twice does it once. */
export const idField = z.uuid('An id is a UUID, made where the request begins.');
const whyField = z.string().trim().max(200).optional();
const binField = nameField.nullable();
const supplyIds = z
	.array(idField)
	.min(1, 'Choose at least one supply.')
	.max(1000, 'At most 1,000 at a time.');
const amountField = z.union([z.int().min(1).max(LIMITS.count), measuredField]);
const leftField = z.union([z.int().min(0).max(LIMITS.count), measuredField]);
const pictureField = z
	.string()
	.max(120)
	.regex(/^[a-z0-9][a-z0-9._-]*$/i, 'That isn’t the name of a picture.')
	.nullable()
	.optional();

/** A new row of the stash. A key that the room has already gets a number behind it. */
export const addSupplySchema = z.strictObject({ id: idField, supply: supplySchema, picture: pictureField });

/** The whole row as it should be; `version` is the one that was edited. An amount that differs is a recount. */
export const editSupplySchema = z.strictObject({
	id: idField,
	version: z.int().min(1),
	supply: supplySchema,
	picture: pictureField
});

/** A pad entered once: its sheets shared evenly among its designs, each design a row. */
export const addPadSchema = z
	.strictObject({
		id: idField,
		name: nameField,
		kind: z.enum(SHEET_KINDS).default('patterned-paper'),
		size: measuredField,
		sheets: z.int().min(1).max(1000),
		designs: z.int().min(1).max(200),
		doubleSided: z.boolean().default(false),
		/** What is known of the designs, in the pad's order: the rest are numbered, and a back left out stays unknown. */
		described: z
			.array(
				z.strictObject({
					front: nameField.optional(),
					frontDirection: z.enum(['none', 'one-way', 'two-way']).default('none'),
					back: nameField.optional(),
					backDirection: z.enum(['none', 'one-way', 'two-way']).default('none')
				})
			)
			.max(200)
			.default([]),
		weight: measuredField.optional(),
		/** Of the whole pad. */
		price: priceField.optional(),
		barcode: z.string().max(20).optional(),
		bin: nameField.optional()
	})
	.refine(({ sheets, designs }) => sheets % designs === 0, {
		path: ['designs'],
		message: 'The sheets don’t share out evenly among that many designs.'
	})
	.refine(({ described, designs }) => described.length <= designs, {
		path: ['described'],
		message: 'More designs are described than the pad has.'
	});

/** What was counted: a whole number, or a length or volume for what comes by it. */
export const recountSchema = z.strictObject({
	id: idField,
	counts: z
		.array(
			z.strictObject({
				supply: idField,
				left: leftField,
				count: z.enum(['counted', 'unsure']).default('counted')
			})
		)
		.min(1)
		.max(1000),
	why: whyField
});

export const moveSchema = z.strictObject({ id: idField, supplies: supplyIds, bin: binField });
export const trashSchema = z.strictObject({ id: idField, supplies: supplyIds });
export const undoSchema = z.strictObject({ id: idField, act: idField });

/** Some of it came or went. */
export const useSchema = z.strictObject({
	id: idField,
	supply: idField,
	kind: z.enum(['bought', 'used', 'spoiled', 'passed-on']),
	amount: amountField,
	why: whyField
});

/** A tool goes out until a date, or is back (`until` null). */
export const lendSchema = z.strictObject({
	id: idField,
	supply: idField,
	until: dateField.nullable(),
	why: whyField
});

/** One line for a supply's ledger, as the API takes it. */
export const movementSchema = z.discriminatedUnion('kind', [
	useSchema.omit({ supply: true }),
	z.strictObject({
		id: idField,
		kind: z.literal('counted'),
		left: leftField,
		count: z.enum(['counted', 'unsure']).default('counted'),
		why: whyField
	}),
	z.strictObject({ id: idField, kind: z.literal('lent'), until: dateField, why: whyField }),
	z.strictObject({ id: idField, kind: z.literal('returned'), why: whyField })
]);

export type AddSupply = z.output<typeof addSupplySchema>;
export type EditSupply = z.output<typeof editSupplySchema>;
export type AddPad = z.output<typeof addPadSchema>;
export type Recount = z.output<typeof recountSchema>;
export type MoveSupplies = z.output<typeof moveSchema>;
export type TrashSupplies = z.output<typeof trashSchema>;
export type Movement = z.output<typeof movementSchema>;
export type UseSupply = z.output<typeof useSchema>;
export type LendTool = z.output<typeof lendSchema>;
