import { returnPath } from '$lib/return-path';
import { confirmSchema } from '$lib/schemas/people';
import { page } from '$lib/server/answer';
import { reader, write } from '$lib/server/db/client';
import { unlessThrottled } from '$lib/server/form-refusals';
import { networkOf } from '$lib/server/network';
import { passwordFits } from '$lib/server/passwords';
import { countPassword, forgivePassword } from '$lib/server/services/attempts';
import { openAccount } from '$lib/server/services/people';
import { findToken } from '$lib/server/services/tokens';
import { redirect } from '@sveltejs/kit';
import { setError, superValidate } from 'sveltekit-superforms';
import { zod4 } from 'sveltekit-superforms/adapters';
import { signIn } from '../../../../auth';
import type { Actions, PageServerLoad } from './$types';

export const load: PageServerLoad = page(async ({ params }) => {
	const { email } = await findToken(reader, 'sign-up', params.token);
	return { email, form: await superValidate(zod4(confirmSchema), { errors: false }) };
});

export const actions: Actions = {
	/**
	 * The address is proved by the link, the person by the password: a stranger who signed up with somebody
	 * else's address gets nothing by that somebody opening the link.
	 */
	default: page(async (event) => {
		const form = await superValidate(event.request, zod4(confirmSchema));
		const { password } = form.data;
		form.data.password = '';
		const { email, signUp } = await findToken(reader, 'sign-up', event.params.token);
		const network = networkOf(event);
		return unlessThrottled(event, form, 'password', async () => {
			await write((tx) => countPassword(tx, email, network));
			if (!form.valid || !(await passwordFits(signUp?.passwordHash ?? null, password))) {
				return setError(form, 'password', 'That isn’t the password you chose when you signed up.');
			}
			const { next } = await write(async (tx) => {
				await forgivePassword(tx, email, network);
				return openAccount(tx, event.params.token);
			});
			await signIn(event, 'password', { email, password });
			redirect(303, returnPath(next, '/welcome'));
		});
	})
};
