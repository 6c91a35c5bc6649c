import { resetRequestSchema } from '$lib/schemas/people';
import { write } from '$lib/server/db/client';
import { env } from '$lib/server/env';
import { unlessThrottled } from '$lib/server/form-refusals';
import { networkOf } from '$lib/server/network';
import { countMail } from '$lib/server/services/attempts';
import { sendResetLink } from '$lib/server/services/people';
import { message, superValidate } from 'sveltekit-superforms';
import { zod4 } from 'sveltekit-superforms/adapters';
import type { Actions, PageServerLoad } from './$types';

export const load: PageServerLoad = async () => ({
	demo: env.DEMO,
	form: await superValidate(zod4(resetRequestSchema), { errors: false })
});

export const actions: Actions = {
	/** Says the same whether or not the address has an account. */
	default: async (event) => {
		const form = await superValidate(event.request, zod4(resetRequestSchema));
		if (!form.valid) return message(form, 'Type your address.', { status: 400 });
		const { email } = form.data;
		return unlessThrottled(event, form, 'email', async () => {
			await write(async (tx) => {
				if (await countMail(tx, email, networkOf(event))) await sendResetLink(tx, env.ORIGIN, email);
			});
			return message(form, 'sent');
		});
	}
};
