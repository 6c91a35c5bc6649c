import { returnPath } from '$lib/return-path';
import { signUpSchema } from '$lib/schemas/people';
import { write } from '$lib/server/db/client';
import { env } from '$lib/server/env';
import { refuseCommon, unlessThrottled } from '$lib/server/form-refusals';
import { networkOf } from '$lib/server/network';
import { hashPassword } from '$lib/server/passwords';
import { countMail } from '$lib/server/services/attempts';
import { startSignUp } from '$lib/server/services/people';
import { redirect } from '@sveltejs/kit';
import { message, superValidate } from 'sveltekit-superforms';
import { zod4 } from 'sveltekit-superforms/adapters';
import type { Actions, PageServerLoad } from './$types';

export const load: PageServerLoad = async ({ locals, url }) => {
	const next = url.searchParams.get('next') ?? '';
	if (locals.user) redirect(303, returnPath(next));
	return { demo: env.DEMO, form: await superValidate({ next }, zod4(signUpSchema), { errors: false }) };
};

export const actions: Actions = {
	/** Says the same, after the same work, whether or not the address has an account. */
	default: async (event) => {
		const form = await superValidate(event.request, zod4(signUpSchema));
		const { name, email, password, next } = form.data;
		form.data.password = '';
		refuseCommon(form, password);
		if (!form.valid) return message(form, 'Something is missing below.', { status: 400 });
		const passwordHash = await hashPassword(password);
		return unlessThrottled(event, form, 'email', async () => {
			await write(async (tx) => {
				if (!(await countMail(tx, email, networkOf(event)))) return;
				await startSignUp(tx, env.ORIGIN, { name, email, passwordHash, next: returnPath(next, '') });
			});
			return message(form, 'sent');
		});
	}
};
