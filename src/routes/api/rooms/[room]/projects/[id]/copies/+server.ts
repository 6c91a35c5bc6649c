import { operate } from '$lib/server/api/operate';
import { reader, write } from '$lib/server/db/client';
import { projectById } from '$lib/server/queries/projects';
import { setCopies } from '$lib/server/services/projects';

export const PUT = operate('PUT /api/rooms/{room}/projects/{id}/copies', async ({ actor, id, body }) => {
	await write((tx) => setCopies(tx, actor, id, body));
	return projectById(reader, actor, id);
});
