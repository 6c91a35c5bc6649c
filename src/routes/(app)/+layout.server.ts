import { reader } from '$lib/server/db/client';
import { getRoom, listRooms } from '$lib/server/queries/rooms';
import { requireActor, requireUser } from '$lib/server/session';
import { page } from '$lib/server/answer';
import { readTheme } from '$lib/server/theme';
import type { LayoutServerLoad } from './$types';

/** What the shell shows around every page of a room; the pages guard themselves. */
export const load: LayoutServerLoad = page(async (event) => {
	const user = requireUser(event);
	const rooms = await listRooms(reader, user.id);
	const here = rooms.find(({ id }) => id === event.locals.session?.roomId) ?? null;
	const room = here && (await getRoom(reader, await requireActor(event, 'viewer', here.id)));
	return {
		user: { name: user.name },
		rooms: rooms.map(({ id, name }) => ({ id, name })),
		here: room && here && { id: room.id, name: room.name, units: room.units, role: here.role },
		theme: readTheme(event.cookies)
	};
});
