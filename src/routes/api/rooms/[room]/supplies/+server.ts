import { operate } from '$lib/server/api/operate';
import { readSupplyFilter } from '$lib/schemas/supply-filter';
import { reader, write } from '$lib/server/db/client';
import { roomUnits } from '$lib/server/queries/stash';
import { listSupplies, supplyById } from '$lib/server/queries/supplies';
import { addSupply } from '$lib/server/services/supplies';

export const GET = operate('GET /api/rooms/{room}/supplies', async ({ actor, event }) =>
	listSupplies(reader, actor, readSupplyFilter(event.url.searchParams, await roomUnits(reader, actor)))
);

export const POST = operate('POST /api/rooms/{room}/supplies', async ({ actor, body }) => {
	const { id } = await write((tx) => addSupply(tx, actor, body));
	return supplyById(reader, actor, id);
});
