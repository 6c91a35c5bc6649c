import { operate } from '$lib/server/api/operate';
import { reader, write } from '$lib/server/db/client';
import { listProjects } from '$lib/server/queries/projects';
import { reorderProjects } from '$lib/server/services/projects';

export const PUT = operate('PUT /api/rooms/{room}/projects/order', async ({ actor, body }) => {
	await write((tx) => reorderProjects(tx, actor, body));
	return listProjects(reader, actor);
});
