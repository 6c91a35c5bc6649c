import { operate } from '$lib/server/api/operate';
import { today } from '$lib/server/clock';
import { reader } from '$lib/server/db/client';
import { unlocksFor } from '$lib/server/queries/today';

export const GET = operate('GET /api/rooms/{room}/unlocks', ({ actor, query }) =>
	unlocksFor(reader, actor, query.on ?? today())
);
