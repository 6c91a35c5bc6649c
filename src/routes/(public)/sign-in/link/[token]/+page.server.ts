import { returnPath } from '$lib/return-path';
import { page } from '$lib/server/answer';
import { reader } from '$lib/server/db/client';
import { findToken } from '$lib/server/services/tokens';
import { redirect } from '@sveltejs/kit';
import { signIn } from '../../../../../auth';
import type { Actions, PageServerLoad } from './$types';

/** Opening the page uses nothing up: mail programs open links to look at them. */
export const load: PageServerLoad = page(async ({ params }) => {
	const { email } = await findToken(reader, 'link', params.token);
	return { email };
});

export const actions: Actions = {
	default: page(async (event) => {
		await signIn(event, 'link', { token: event.params.token });
		redirect(303, returnPath(event.url.searchParams.get('next')));
	})
};
