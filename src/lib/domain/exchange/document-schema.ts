import { z } from 'zod';
import { MOVEMENT_KINDS } from '../stash';
import { billSchema } from './bill-schema';
import {
	dateField,
	instantField,
	keyed,
	keyField,
	LIMITS,
	measuredField,
	nameField,
	unitsField
} from './fields';
import { supplySchema } from './supply-schema';

const bin = z.strictObject({ key: keyField, name: nameField });

/** One line of the stash's ledger. `change` is signed: a whole number, or a length or volume like `-93 in`. */
const movement = z.strictObject({
	key: keyField,
	supply: keyField,
	kind: z.enum(MOVEMENT_KINDS),
	change: z.union([z.int().min(-LIMITS.count).max(LIMITS.count), measuredField]),
	at: instantField,
	act: keyField.optional(),
	by: nameField.optional(),
	why: z.string().max(LIMITS.step).optional(),
	undoes: keyField.optional()
});

/** Projects in the order in which they are to be made, with how many copies of each. */
const turn = z.strictObject({ project: keyField, copies: z.int().min(1).max(LIMITS.copies).optional() });

/** An exchange document: supplies and bills, and what else a room's export carries. */
export const documentSchema = z.strictObject({
	format: z.literal('paperlarder', 'An exchange document says "format": "paperlarder".'),
	version: z.literal(1, 'This reads version 1 of the exchange document.'),
	supplies: keyed(supplySchema, LIMITS.supplies).optional(),
	projects: keyed(billSchema, LIMITS.projects).optional(),
	bins: keyed(bin, LIMITS.bins).optional(),
	ledger: keyed(movement, LIMITS.ledger).optional(),
	order: z.array(turn).max(LIMITS.projects).optional()
});

/** What `POST /api/match` takes. `on` left out is the day of the asking. */
export const matchRequestSchema = z.strictObject({
	projects: keyed(billSchema, LIMITS.projects),
	supplies: keyed(supplySchema, LIMITS.supplies),
	mode: z.enum(['each', 'queue']).default('each'),
	copies: z.record(keyField, z.int().min(1).max(LIMITS.copies)).default({}),
	on: dateField.optional(),
	budgetMs: z.int().min(1).max(30_000).default(2_000),
	options: z
		.strictObject({
			units: unitsField.default('in'),
			kerf: measuredField.default('0'),
			reach: measuredField.nullable().default(null),
			knife: z.boolean().default(false),
			keepOffcut: measuredField.nullable().default(null)
		})
		.prefault({})
});

export type ExchangeDocument = z.output<typeof documentSchema>;
export type MatchRequestDocument = z.input<typeof matchRequestSchema>;
export type MovementDocument = NonNullable<ExchangeDocument['ledger']>[number];
