import { z } from 'zod';
import { documentSchema } from '../domain/exchange';
import { idField } from './supplies';

/** An exchange document to take in whole, or, as a dry run, only to say what it would do. */
export const importSchema = z.strictObject({
	id: idField,
	document: documentSchema,
	dryRun: z.boolean().default(false)
});

export type Import = z.output<typeof importSchema>;
