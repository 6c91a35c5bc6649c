import { HOME } from '$lib/return-path';
import { resetSchema } from '$lib/schemas/people';
import { page } from '$lib/server/answer';
import { reader, write } from '$lib/server/db/client';
import { env } from '$lib/server/env';
import { refuseCommon } from '$lib/server/form-refusals';
import { audit } from '$lib/server/log';
import { hashPassword } from '$lib/server/passwords';
import { resetPassword } from '$lib/server/services/people';
import { findToken } from '$lib/server/services/tokens';
import { fail, redirect } from '@sveltejs/kit';
import { superValidate } from 'sveltekit-superforms';
import { zod4 } from 'sveltekit-superforms/adapters';
import { signIn } from '../../../../auth';
import type { Actions, PageServerLoad } from './$types';

export const load: PageServerLoad = page(async ({ params }) => {
	const { email } = await findToken(reader, 'reset', params.token);
	return { email, form: await superValidate(zod4(resetSchema), { errors: false }) };
});

export const actions: Actions = {
	default: page(async (event) => {
		const form = await superValidate(event.request, zod4(resetSchema));
		const { password } = form.data;
		form.data.password = '';
		refuseCommon(form, password);
		if (!form.valid) return fail(400, { form });
		await findToken(reader, 'reset', event.params.token);
		const passwordHash = await hashPassword(password);
		const email = await write((tx) => resetPassword(tx, env.ORIGIN, event.params.token, passwordHash));
		audit(event, 'password.reset');
		await signIn(event, 'password', { email, password });
		redirect(303, HOME);
	})
};
