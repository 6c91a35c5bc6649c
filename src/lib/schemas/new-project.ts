import { z } from 'zod';
import { LIMITS } from '../domain/exchange/fields';
import { idField } from './supplies';

/** Where a project begins: on a blank bill, on one of ours, or in an exchange document. */
export const newProjectSchema = z
	.object({
		id: idField,
		from: z.enum(['blank', 'starter', 'document']),
		name: z
			.string()
			.max(LIMITS.name, `Up to ${LIMITS.name} letters, please.`)
			.regex(/^\P{Cc}*$/u, 'A name has one line.')
			.default(''),
		starter: z.string().max(LIMITS.key).default(''),
		document: z.string().default(''),
		file: z.instanceof(File).optional()
	})
	.superRefine(({ from, name, starter, document, file }, check) => {
		const ask = (field: string, message: string) =>
			check.addIssue({ code: 'custom', path: [field], message });
		if (from === 'blank' && name.trim() === '') ask('name', 'Give the project a name.');
		if (from === 'starter' && starter === '') ask('starter', 'Choose one of them.');
		if (from === 'document' && document.trim() === '' && !file?.size)
			ask('document', 'Paste the document, or choose its file.');
	});

export type NewProject = z.output<typeof newProjectSchema>;
