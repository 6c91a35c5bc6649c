import { z } from 'zod';
import { billSchema } from '../domain/exchange/bill-schema';
import { LIMITS, nameField } from '../domain/exchange/fields';
import { idField } from './supplies';

const copiesField = z.int().min(1).max(LIMITS.copies);
const versionField = z.int().min(1);

/** A new project, last in the queue. A key that the room has already gets a number behind it. */
export const addProjectSchema = z.strictObject({
	id: idField,
	bill: billSchema,
	copies: copiesField.default(1)
});

/** The whole bill as it should be; `version` is the one that was edited. */
export const editBillSchema = z.strictObject({ version: versionField, bill: billSchema });

export const renameProjectSchema = z.strictObject({ name: nameField });
export const setCopiesSchema = z.strictObject({ copies: copiesField });

/** The whole queue, first to be made first. */
export const reorderProjectsSchema = z.strictObject({
	projects: z.array(idField).min(1).max(LIMITS.projects)
});

/** One place up (-1) or down (1) in the queue. */
export const moveProjectSchema = z.strictObject({
	project: idField,
	by: z.coerce.number().pipe(z.literal([-1, 1]))
});

/** The paper that a slot is to be cut from; null leaves it to the stash. */
export const chooseDesignSchema = z.strictObject({
	slot: z.string().max(LIMITS.key),
	design: nameField.nullable(),
	collection: nameField.nullable().default(null)
});

export type AddProject = z.output<typeof addProjectSchema>;
export type EditBill = z.output<typeof editBillSchema>;
export type RenameProject = z.output<typeof renameProjectSchema>;
export type SetCopies = z.output<typeof setCopiesSchema>;
export type ReorderProjects = z.output<typeof reorderProjectsSchema>;
export type MoveProject = z.output<typeof moveProjectSchema>;
export type ChooseDesign = z.output<typeof chooseDesignSchema>;
