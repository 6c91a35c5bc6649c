import { answersReads, reader } from '$lib/server/db/client';
import { env } from '$lib/server/env';
import { text } from '@sveltejs/kit';
import { constants } from 'node:fs';
import { access } from 'node:fs/promises';
import type { RequestHandler } from './$types';

/** The database answers, its tables are there and the data folder can be written to. */
export const GET: RequestHandler = async () => {
	const [tables, folder] = await Promise.allSettled([
		answersReads(reader),
		access(env.DATA_DIR, constants.W_OK)
	]);
	const ready = tables.status === 'fulfilled' && tables.value && folder.status === 'fulfilled';
	return ready ? text('ready') : text('not ready', { status: 503 });
};
