import { operate } from '$lib/server/api/operate';
import { reader, write } from '$lib/server/db/client';
import { importRoom, previewImport } from '$lib/server/services/exchange';

export const POST = operate('POST /api/rooms/{room}/import', ({ actor, body }) =>
	body.dryRun ? previewImport(reader, actor, body.document) : write((tx) => importRoom(tx, actor, body))
);
