import { operate } from '$lib/server/api/operate';
import { write } from '$lib/server/db/client';
import { addPad } from '$lib/server/services/supplies';

export const POST = operate('POST /api/rooms/{room}/pads', async ({ actor, body }) => {
	await write((tx) => addPad(tx, actor, body));
	return { act: body.id };
});
