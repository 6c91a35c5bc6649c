import { returnPath } from '$lib/return-path';
import { mailLinkSchema, signInSchema } from '$lib/schemas/people';
import { write } from '$lib/server/db/client';
import { env } from '$lib/server/env';
import { unlessThrottled } from '$lib/server/form-refusals';
import { networkOf } from '$lib/server/network';
import { countMail } from '$lib/server/services/attempts';
import { sendSignInLink } from '$lib/server/services/people';
import { redirect } from '@sveltejs/kit';
import { message, setError, superValidate } from 'sveltekit-superforms';
import { zod4 } from 'sveltekit-superforms/adapters';
import { signIn } from '../../../auth';
import type { Actions, PageServerLoad } from './$types';

export const load: PageServerLoad = async ({ locals, url }) => {
	const next = url.searchParams.get('next') ?? '';
	if (locals.user) redirect(303, returnPath(next));
	return {
		demo: env.DEMO,
		password: await superValidate({ next }, zod4(signInSchema), { errors: false, id: 'password' }),
		link: await superValidate({ next }, zod4(mailLinkSchema), { errors: false, id: 'link' })
	};
};

export const actions: Actions = {
	password: async (event) => {
		const form = await superValidate(event.request, zod4(signInSchema), { id: 'password' });
		const { email, password, next } = form.data;
		form.data.password = '';
		if (!form.valid) return message(form, 'Type your address and your password.', { status: 400 });
		return unlessThrottled(event, form, 'password', async () => {
			if (await signIn(event, 'password', { email, password })) redirect(303, returnPath(next));
			return setError(form, 'password', 'That address and that password don’t go together.');
		});
	},

	/** Says the same whether or not the address has an account. */
	link: async (event) => {
		const form = await superValidate(event.request, zod4(mailLinkSchema), { id: 'link' });
		if (!form.valid) return message(form, 'Type the address the link should go to.', { status: 400 });
		const { email, next } = form.data;
		return unlessThrottled(event, form, 'email', async () => {
			await write(async (tx) => {
				if (await countMail(tx, email, networkOf(event))) {
					await sendSignInLink(tx, env.ORIGIN, email, returnPath(next, ''));
				}
			});
			return message(form, 'sent');
		});
	}
};
