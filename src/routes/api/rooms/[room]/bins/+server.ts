import { operate } from '$lib/server/api/operate';
import { reader } from '$lib/server/db/client';
import { listBins } from '$lib/server/queries/supplies';

export const GET = operate('GET /api/rooms/{room}/bins', ({ actor }) => listBins(reader, actor));
