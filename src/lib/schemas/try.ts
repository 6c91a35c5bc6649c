import { z } from 'zod';
import { parseSize } from '../domain/length';
import { SHEET_KINDS, type Direction } from '../domain/stash';
import { STARTERS } from '../starter';
import { ROOM_UNITS, type RoomUnits } from './rooms';

/** How many papers a visitor may try a project with. */
export const TRY_ROWS = 3;

const DIRECTIONS = ['none', 'one-way', 'two-way'] as const satisfies readonly Direction[];

const row = z.object({
	kind: z.enum(SHEET_KINDS),
	/** As typed; blank leaves the paper out. */
	size: z.string().trim().max(80),
	sheets: z.coerce.number().pipe(z.int().min(1, 'One sheet at least.').max(1000, 'Up to 1,000 sheets here.')),
	direction: z.enum(DIRECTIONS)
});
export type TryRow = z.output<typeof row>;

/** A starter project tried with a few papers of one's own. */
export const trySchema = z
	.object({
		project: z.enum(STARTERS.map(({ key }) => key)),
		units: z.enum(ROOM_UNITS),
		papers: z.array(row).length(TRY_ROWS)
	})
	.superRefine(({ units, papers }, check) => {
		papers.forEach(({ size }, index) => {
			const read = size === '' ? null : parseSize(size, { unit: units });
			if (read && !read.ok)
				check.addIssue({ code: 'custom', path: ['papers', index, 'size'], message: read.reason });
		});
	});
export type Try = z.output<typeof trySchema>;

/** The flat form, with one field of each name per paper, as the schema takes it. */
export function tryFields(form: FormData): Record<string, unknown> {
	const [kinds, sizes, sheets, directions] = ['kind', 'size', 'sheets', 'direction'].map((name) =>
		form.getAll(name)
	);
	const papers = kinds?.map((kind, i) => ({
		kind,
		size: sizes?.[i],
		sheets: sheets?.[i],
		direction: directions?.[i]
	}));
	return { project: form.get('project'), units: form.get('units'), papers };
}

export const firstTry = (project: string, units: RoomUnits): Try => ({
	project: STARTERS.find(({ key }) => key === project)?.key ?? STARTERS[0]!.key,
	units,
	papers: [
		{ kind: 'cardstock', size: units === 'in' ? '8 1/2 x 11' : '21 x 29.7', sheets: 3, direction: 'none' },
		{
			kind: 'patterned-paper',
			size: units === 'in' ? '12 x 12' : '30.5 x 30.5',
			sheets: 1,
			direction: 'one-way'
		},
		{ kind: 'patterned-paper', size: '', sheets: 1, direction: 'none' }
	]
});
