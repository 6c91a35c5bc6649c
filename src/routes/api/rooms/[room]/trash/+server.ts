import { operate } from '$lib/server/api/operate';
import { reader, write } from '$lib/server/db/client';
import { listTrashedProjects } from '$lib/server/queries/projects';
import { listTrash } from '$lib/server/queries/supplies';
import { trashSupplies } from '$lib/server/services/stock';

export const GET = operate('GET /api/rooms/{room}/trash', async ({ actor }) => ({
	supplies: await listTrash(reader, actor),
	projects: await listTrashedProjects(reader, actor)
}));

export const POST = operate('POST /api/rooms/{room}/trash', async ({ actor, body }) => {
	await write((tx) => trashSupplies(tx, actor, body));
	return { act: body.id };
});
