import { operate } from '$lib/server/api/operate';
import { reader, write } from '$lib/server/db/client';
import { projectById } from '$lib/server/queries/projects';
import { renameProject } from '$lib/server/services/projects';

export const PUT = operate('PUT /api/rooms/{room}/projects/{id}/name', async ({ actor, id, body }) => {
	await write((tx) => renameProject(tx, actor, id, body));
	return projectById(reader, actor, id);
});
