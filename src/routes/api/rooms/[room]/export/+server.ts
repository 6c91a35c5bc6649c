import { operate } from '$lib/server/api/operate';
import { reader } from '$lib/server/db/client';
import { exportRoom } from '$lib/server/queries/exchange';

export const GET = operate('GET /api/rooms/{room}/export', ({ actor, event }) => {
	event.setHeaders({ 'content-disposition': 'attachment; filename="paperlarder-room.json"' });
	return exportRoom(reader, actor);
});
