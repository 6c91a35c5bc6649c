import { operate } from '$lib/server/api/operate';
import { reader, write } from '$lib/server/db/client';
import { listProjects, projectById } from '$lib/server/queries/projects';
import { addProject } from '$lib/server/services/projects';

export const GET = operate('GET /api/rooms/{room}/projects', ({ actor }) => listProjects(reader, actor));

export const POST = operate('POST /api/rooms/{room}/projects', async ({ actor, body }) => {
	const { id } = await write((tx) => addProject(tx, actor, body));
	return projectById(reader, actor, id);
});
