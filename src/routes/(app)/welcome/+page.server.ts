import { welcomeSchema } from '$lib/schemas/welcome';
import { page } from '$lib/server/answer';
import { reader, write } from '$lib/server/db/client';
import { getRoom } from '$lib/server/queries/rooms';
import { setUpRoom } from '$lib/server/services/welcome';
import { requireActor } from '$lib/server/session';
import { fail, redirect } from '@sveltejs/kit';
import { superValidate } from 'sveltekit-superforms';
import { zod4 } from 'sveltekit-superforms/adapters';
import { v7 } from 'uuid';
import type { Actions, PageServerLoad } from './$types';

export const load: PageServerLoad = page(async (event) => {
	const room = await getRoom(reader, await requireActor(event, 'owner'));
	const known = { id: v7(), name: room.name, units: room.units };
	return { form: await superValidate(known, zod4(welcomeSchema), { errors: false }) };
});

export const actions: Actions = {
	default: page(async (event) => {
		const actor = await requireActor(event, 'owner');
		const form = await superValidate(event.request, zod4(welcomeSchema));
		if (!form.valid) return fail(400, { form });
		await write((tx) => setUpRoom(tx, actor, form.data));
		redirect(303, '/supplies');
	})
};
