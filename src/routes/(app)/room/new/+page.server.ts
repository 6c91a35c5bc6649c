import { newRoomSchema } from '$lib/schemas/rooms';
import { page } from '$lib/server/answer';
import { reader, write } from '$lib/server/db/client';
import { listRooms } from '$lib/server/queries/rooms';
import { createRoom } from '$lib/server/services/rooms';
import { chooseRoom } from '$lib/server/services/sessions';
import { requireUser } from '$lib/server/session';
import { fail, redirect } from '@sveltejs/kit';
import { superValidate } from 'sveltekit-superforms';
import { zod4 } from 'sveltekit-superforms/adapters';
import { v7 } from 'uuid';
import type { Actions, PageServerLoad } from './$types';

export const load: PageServerLoad = page(async (event) => {
	const user = requireUser(event);
	return {
		rooms: await listRooms(reader, user.id),
		form: await superValidate({ id: v7() }, zod4(newRoomSchema), { errors: false })
	};
});

export const actions: Actions = {
	default: page(async (event) => {
		const user = requireUser(event);
		const form = await superValidate(event.request, zod4(newRoomSchema));
		if (!form.valid) return fail(400, { form });
		await write(async (tx) => {
			await createRoom(tx, user.id, form.data);
			if (event.locals.session) await chooseRoom(tx, user.id, event.locals.session.id, form.data.id);
		});
		redirect(303, '/welcome');
	})
};
