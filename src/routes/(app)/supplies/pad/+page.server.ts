import type { PadMessage } from './message';
import { padForm, padInput, type PadForm } from '$lib/schemas/pad-form';
import { page } from '$lib/server/answer';
import { reader, write } from '$lib/server/db/client';
import { Conflict, Invalid } from '$lib/server/errors';
import { getRoom } from '$lib/server/queries/rooms';
import { listBins } from '$lib/server/queries/supplies';
import { addPad } from '$lib/server/services/supplies';
import { requireActor } from '$lib/server/session';
import { fail, redirect } from '@sveltejs/kit';
import { message, superValidate } from 'sveltekit-superforms';
import { zod4 } from 'sveltekit-superforms/adapters';
import { v7 } from 'uuid';
import type { Actions, PageServerLoad } from './$types';

export const load: PageServerLoad = page(async (event) => {
	const actor = await requireActor(event, 'member');
	const [{ units, currency }, bins] = await Promise.all([getRoom(reader, actor), listBins(reader, actor)]);
	const size = units === 'in' ? '12 x 12 in' : '';
	return {
		form: await superValidate<PadForm, PadMessage>({ id: v7(), currency, size }, zod4(padForm(units)), {
			errors: false
		}),
		bins: bins.map(({ name }) => name)
	};
});

export const actions: Actions = {
	default: page(async (event) => {
		const actor = await requireActor(event, 'member');
		const { units } = await getRoom(reader, actor);
		const fields = await event.request.formData();
		const form = await superValidate<PadForm, PadMessage>(fields, zod4(padForm(units)));
		if (!form.valid) return fail(400, { form });
		if (fields.get('then') === 'look') return { form };
		const { id, name } = form.data;
		try {
			await write((tx) => addPad(tx, actor, padInput(form.data)));
		} catch (refusal) {
			if (!(refusal instanceof Conflict || refusal instanceof Invalid)) throw refusal;
			return message(form, { text: refusal.message }, { status: refusal.status });
		}
		redirect(303, `/supplies?${new URLSearchParams({ collection: name, did: id })}`);
	})
};
