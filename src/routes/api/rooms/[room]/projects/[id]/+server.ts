import { operate } from '$lib/server/api/operate';
import { reader, write } from '$lib/server/db/client';
import { projectById } from '$lib/server/queries/projects';
import { editBill, trashProject } from '$lib/server/services/projects';

export const GET = operate('GET /api/rooms/{room}/projects/{id}', ({ actor, id }) =>
	projectById(reader, actor, id)
);

export const PATCH = operate('PATCH /api/rooms/{room}/projects/{id}', async ({ actor, id, body }) => {
	await write((tx) => editBill(tx, actor, id, body));
	return projectById(reader, actor, id);
});

export const DELETE = operate('DELETE /api/rooms/{room}/projects/{id}', ({ actor, id }) =>
	write((tx) => trashProject(tx, actor, id))
);
