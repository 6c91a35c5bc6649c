import { z } from 'zod';
import { parseLength } from '../domain/length';
import { ROOM_UNITS, roomName } from './rooms';

/** Tools and glue that a maker is likely to have: ticked, each becomes a row. */
export const BENCH_ITEMS = [
	'trimmer',
	'scoring-board',
	'bone-folder',
	'scissors',
	'paper-knife',
	'board-knife',
	'ruler',
	'cutting-mat',
	'corner-punch',
	'hole-punch',
	'glue-gun',
	'heat-tool',
	'tape',
	'foam-squares',
	'runner',
	'glue',
	'glue-stick',
	'glue-dots'
] as const;
export type BenchItem = (typeof BENCH_ITEMS)[number];

const sheets = z.number().int().min(0).max(10_000).nullable().default(null);

/** The first hour's questions. Counts of sheets are a guess, and are kept as one. */
export const welcomeSchema = z
	.object({
		/** Made with the form, so that sending it twice files everything once. */
		id: z.uuid(),
		name: roomName,
		units: z.enum(ROOM_UNITS).default('in'),
		reach: z.string().trim().max(40).default(''),
		items: z.array(z.enum(BENCH_ITEMS)).default([]),
		patterned: sheets,
		cardstock: sheets,
		smallPatterned: sheets,
		smallCardstock: sheets,
		chipboard: sheets,
		kraft: sheets
	})
	.superRefine(({ reach, units }, check) => {
		const read = reach === '' ? null : parseLength(reach, { unit: units });
		if (read && !read.ok) check.addIssue({ code: 'custom', path: ['reach'], message: read.reason });
	});

export type Welcome = z.output<typeof welcomeSchema>;
