import { firstTry, tryFields, trySchema } from '$lib/schemas/try';
import { page } from '$lib/server/answer';
import { TooMany } from '$lib/server/errors';
import { tryStarter } from '$lib/server/try-starter';
import { STARTERS } from '$lib/starter';
import { fail } from '@sveltejs/kit';
import type { Actions, PageServerLoad } from './$types';

export const load: PageServerLoad = ({ url }) => ({
	starters: STARTERS.map(({ key, says, bill, kit }) => ({
		key,
		says,
		name: bill.name,
		kit: kit.map(({ name }) => name)
	})),
	typed: firstTry(url.searchParams.get('project') ?? '', url.searchParams.get('units') === 'cm' ? 'cm' : 'in')
});

export const actions: Actions = {
	default: page(async ({ request }) => {
		const fields = tryFields(await request.formData());
		const typed = trySchema.safeParse(fields);
		if (!typed.success) {
			const errors = Object.fromEntries(
				typed.error.issues.map(({ path, message }) => [path.join('.'), message])
			);
			return fail(400, { typed: fields, errors, busy: null, tried: null });
		}
		try {
			return { typed: typed.data, errors: null, busy: null, tried: await tryStarter(typed.data) };
		} catch (refusal) {
			if (!(refusal instanceof TooMany)) throw refusal;
			return fail(429, { typed: typed.data, errors: null, busy: refusal.message, tried: null });
		}
	})
};
