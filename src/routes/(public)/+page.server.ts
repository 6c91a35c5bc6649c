import { startPicture } from '$lib/server/start-picture';
import type { PageServerLoad } from './$types';

export const load: PageServerLoad = async () => ({ results: await startPicture() });
