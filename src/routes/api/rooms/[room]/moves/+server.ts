import { operate } from '$lib/server/api/operate';
import { write } from '$lib/server/db/client';
import { moveSupplies } from '$lib/server/services/stock';

export const POST = operate('POST /api/rooms/{room}/moves', async ({ actor, body }) => {
	await write((tx) => moveSupplies(tx, actor, body));
	return { act: body.id };
});
