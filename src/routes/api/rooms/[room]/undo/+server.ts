import { operate } from '$lib/server/api/operate';
import { write } from '$lib/server/db/client';
import { undo } from '$lib/server/services/ledger';

export const POST = operate('POST /api/rooms/{room}/undo', async ({ actor, body }) => {
	await write((tx) => undo(tx, actor, body));
	return { act: body.id };
});
