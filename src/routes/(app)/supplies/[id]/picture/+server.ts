import { api } from '$lib/server/answer';
import { reader } from '$lib/server/db/client';
import { env } from '$lib/server/env';
import { NotFound } from '$lib/server/errors';
import { pictureOf } from '$lib/server/queries/pictures';
import { requireActor } from '$lib/server/session';
import { readFile } from 'node:fs/promises';
import { join } from 'node:path';
import type { RequestHandler } from './$types';

const DAY_S = 86_400;

/** A supply's picture, for the people of its room only. */
export const GET: RequestHandler = api(async (event) => {
	const actor = await requireActor(event, 'viewer');
	const picture = await pictureOf(reader, actor, event.params.id);
	const image = await readFile(join(env.DATA_DIR, 'photos', picture)).catch(() => {
		throw new NotFound();
	});
	return new Response(new Uint8Array(image), {
		headers: {
			'content-type': 'image/webp',
			'cache-control': `private, max-age=${DAY_S}`,
			'x-content-type-options': 'nosniff',
			'content-disposition': 'inline'
		}
	});
});
