import { z } from 'zod';

/** Most of everything that a document may hold, so that a hostile one is bounded. */
export const LIMITS = {
	supplies: 20_000,
	projects: 2_000,
	bins: 2_000,
	ledger: 200_000,
	slots: 60,
	pieces: 200,
	measures: 60,
	lines: 60,
	steps: 200,
	swaps: 10,
	marks: 40,
	faces: 2,
	colours: 12,
	sheets: 100_000,
	count: 1_000_000,
	quantity: 1_000,
	copies: 999,
	money: 1_000_000_000,
	key: 64,
	name: 120,
	measured: 60,
	formula: 200,
	step: 2_000
} as const;

/** Names that every object answers to: a key that is one of them can't be looked up safely. */
const RESERVED = new Set(Object.getOwnPropertyNames(Object.prototype));

export const keyField = z
	.string()
	.max(LIMITS.key)
	.regex(
		/^[A-Za-z0-9][A-Za-z0-9_-]*$/,
		'A key has letters, digits, - and _, and begins with a letter or digit.'
	)
	.refine((key) => !RESERVED.has(key), 'This word can’t be used as a key.');

export const measureName = z
	.string()
	.max(40)
	.regex(/^[A-Za-z][A-Za-z0-9]*$/, 'A measure’s name has letters and digits, and begins with a letter.')
	.refine((name) => !RESERVED.has(name), 'This word can’t name a measure.');

export const nameField = z
	.string()
	.max(LIMITS.name)
	.regex(/\S/, 'Give it a name.')
	.regex(/^\P{Cc}*$/u, 'A name has one line and no control characters.');

/** A length, size, weight, thickness or volume as people type it. */
export const measuredField = z.string().max(LIMITS.measured).regex(/\S/, 'Type an amount, like 6 3/8 in.');

/** A length as people type it, or a formula over the project's measures: `=boardH + 2 * turnIn`. */
export const worked = z.string().max(LIMITS.formula).regex(/\S/, 'Type a length, like 6 3/8 in.');

export const dateField = z.iso.date('A date is written 2027-05-10.');
export const instantField = z.iso.datetime('A moment is written 2027-05-10T18:30:00Z.');
export const colourField = z.string().regex(/^#[0-9a-f]{6}$/i, 'A colour is written #6d8a5f.');
export const unitsField = z.enum(['in', 'mm', 'cm']);
export const edgeField = z.enum(['top', 'bottom', 'left', 'right']);
export const cornerField = z.enum(['top-left', 'top-right', 'bottom-left', 'bottom-right']);
export const cutsField = z.array(z.enum(['paper', 'board'])).max(2);
export const shapeField = nameField;

export const priceField = z.strictObject({
	amount: z.int().min(0).max(LIMITS.money),
	currency: z.string().regex(/^[A-Z]{3}$/, 'A currency is three capitals, like USD.')
});

/** A list whose entries can be told apart by key; a second entry with the same key is named by its own path. */
export function keyed<Entry extends z.ZodType<{ key: string }>>(entry: Entry, most: number) {
	return z
		.array(entry)
		.max(most)
		.superRefine((entries, context) => {
			const seen = new Set<string>();
			entries.forEach(({ key }, index) => {
				if (seen.has(key))
					context.addIssue({
						code: 'custom',
						path: [index, 'key'],
						message: `The key “${key}” is used twice in this list.`
					});
				seen.add(key);
			});
		});
}
