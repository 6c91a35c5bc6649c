import { operate } from '$lib/server/api/operate';
import { reader, write } from '$lib/server/db/client';
import { supplyById } from '$lib/server/queries/supplies';
import { bookMovement } from '$lib/server/services/stock';

export const POST = operate('POST /api/rooms/{room}/supplies/{id}/movements', async ({ actor, id, body }) => {
	await write((tx) => bookMovement(tx, actor, id, body));
	return supplyById(reader, actor, id);
});
