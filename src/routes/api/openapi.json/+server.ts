import { operate } from '$lib/server/api/operate';
import { describeApi } from '$lib/server/api/openapi';
import { env } from '$lib/server/env';

export const GET = operate('GET /api/openapi.json', async () => describeApi(env.ORIGIN));
