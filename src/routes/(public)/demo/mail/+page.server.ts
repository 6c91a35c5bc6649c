import { env } from '$lib/server/env';
import { readFakeMail } from '$lib/server/mail/fake-mail';
import { error } from '@sveltejs/kit';
import type { PageServerLoad } from './$types';

export const load: PageServerLoad = async () => {
	if (!env.DEMO) error(404, 'There is nothing at this address.');
	return { letters: await readFakeMail(env.DATA_DIR) };
};
