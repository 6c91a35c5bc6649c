import { operate } from '$lib/server/api/operate';
import { write } from '$lib/server/db/client';
import { useSheets } from '$lib/server/services/cutting';

export const POST = operate('POST /api/rooms/{room}/cuts', async ({ actor, body }) => {
	await write((tx) => useSheets(tx, actor, body));
	return { act: body.id };
});
