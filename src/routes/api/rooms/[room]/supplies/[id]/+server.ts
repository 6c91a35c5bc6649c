import { operate } from '$lib/server/api/operate';
import { reader, write } from '$lib/server/db/client';
import { supplyById } from '$lib/server/queries/supplies';
import { trashSupplies } from '$lib/server/services/stock';
import { editSupply } from '$lib/server/services/supplies';
import { v7 } from 'uuid';

export const GET = operate('GET /api/rooms/{room}/supplies/{id}', ({ actor, id }) =>
	supplyById(reader, actor, id)
);

export const PATCH = operate('PATCH /api/rooms/{room}/supplies/{id}', async ({ actor, id, body }) => {
	await write((tx) => editSupply(tx, actor, id, body));
	return supplyById(reader, actor, id);
});

export const DELETE = operate('DELETE /api/rooms/{room}/supplies/{id}', ({ actor, id, query }) =>
	write((tx) => trashSupplies(tx, actor, { id: query.act ?? v7(), supplies: [id] }))
);
