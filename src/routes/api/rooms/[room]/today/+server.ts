import { operate } from '$lib/server/api/operate';
import { today } from '$lib/server/clock';
import { reader } from '$lib/server/db/client';
import { todayFor } from '$lib/server/queries/today';

export const GET = operate('GET /api/rooms/{room}/today', ({ actor, query }) =>
	todayFor(reader, actor, { mode: query.mode, on: query.on ?? today() })
);
