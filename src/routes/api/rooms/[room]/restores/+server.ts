import { operate } from '$lib/server/api/operate';
import { write } from '$lib/server/db/client';
import { restoreSupplies } from '$lib/server/services/stock';

export const POST = operate('POST /api/rooms/{room}/restores', async ({ actor, body }) => {
	await write((tx) => restoreSupplies(tx, actor, body));
	return { act: body.id };
});
