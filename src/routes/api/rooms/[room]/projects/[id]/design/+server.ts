import { operate } from '$lib/server/api/operate';
import { reader, write } from '$lib/server/db/client';
import { projectById } from '$lib/server/queries/projects';
import { chooseDesign } from '$lib/server/services/projects';

export const PUT = operate('PUT /api/rooms/{room}/projects/{id}/design', async ({ actor, id, body }) => {
	await write((tx) => chooseDesign(tx, actor, id, body));
	return projectById(reader, actor, id);
});
