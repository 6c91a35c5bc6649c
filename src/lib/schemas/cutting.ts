import { z } from 'zod';
import { nameField } from '../domain/exchange/fields';
import { idField } from './supplies';

const length = z.int().min(0).max(100_000_000);
const rect = z.object({ x: length, y: length, w: length, h: length });

const sheet = z.object({
	supply: z.string().max(64),
	nth: z.int().min(1).max(100_000),
	w: length,
	h: length,
	placements: z
		.array(
			rect.extend({
				project: z.string().max(64),
				piece: z.string().max(64),
				turned: z.boolean(),
				face: z.enum(['A', 'B'])
			})
		)
		.max(5000),
	cuts: z.array(z.object({ axis: z.enum(['across', 'down']), at: length, of: rect })).max(10_000),
	offcuts: z.array(rect).max(10_000)
});

/** The sheets of a plan as it was shown: as JSON, or as the text of it that a form's hidden field holds. */
export const shownPlanSchema = z.preprocess(
	parsed,
	z.object({ sheets: z.array(sheet).min(1, 'There is nothing to cut in this plan.').max(2000) })
);

/** "Cut this": takes the plan's sheets from the stash and files its offcuts in a bin. */
export const useSheetsSchema = z.object({
	id: idField,
	project: idField,
	plan: shownPlanSchema,
	bin: nameField.nullable().default(null),
	/** Which offcuts are filed, each as its sheet's and its own number in the plan: `0.2`. Null keeps by the room's rule. */
	kept: z
		.array(z.string().regex(/^\d{1,4}\.\d{1,4}$/))
		.max(10_000)
		.nullable()
		.default(null)
});

export type UseSheets = z.output<typeof useSheetsSchema>;
export type ShownSheet = UseSheets['plan']['sheets'][number];

function parsed(given: unknown): unknown {
	if (typeof given !== 'string') return given;
	try {
		return JSON.parse(given);
	} catch {
		return undefined;
	}
}
