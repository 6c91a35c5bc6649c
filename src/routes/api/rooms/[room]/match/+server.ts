import { operate } from '$lib/server/api/operate';
import { today } from '$lib/server/clock';
import { reader } from '$lib/server/db/client';
import { todayFor } from '$lib/server/queries/today';

export const POST = operate('POST /api/rooms/{room}/match', async ({ actor, body }) => {
	const { rows } = await todayFor(reader, actor, { mode: body.mode, on: body.on ?? today() });
	return { unit: '1/320 mm', results: rows.map(({ result }) => result) };
});
