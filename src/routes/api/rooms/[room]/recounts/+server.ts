import { operate } from '$lib/server/api/operate';
import { write } from '$lib/server/db/client';
import { recount } from '$lib/server/services/stock';

export const POST = operate('POST /api/rooms/{room}/recounts', async ({ actor, body }) => {
	await write((tx) => recount(tx, actor, body));
	return { act: body.id };
});
