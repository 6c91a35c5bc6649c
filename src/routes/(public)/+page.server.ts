import { page } from '$lib/server/answer';
import { startPicture } from '$lib/server/start-picture';
import type { PageServerLoad } from './$types';

export const load: PageServerLoad = page(async () => ({ results: await startPicture() }));
