import { operate } from '$lib/server/api/operate';
import { answerOf } from '$lib/server/api/match';

export const POST = operate('POST /api/match', ({ body }) => answerOf(body));
