import { endSessionSchema, nameSchema, passwordChangeSchema } from '$lib/schemas/people';
import { page } from '$lib/server/answer';
import { reader, write } from '$lib/server/db/client';
import { env } from '$lib/server/env';
import { refuseCommon, unlessThrottled } from '$lib/server/form-refusals';
import { audit } from '$lib/server/log';
import { networkOf } from '$lib/server/network';
import { hashPassword } from '$lib/server/passwords';
import { hasPassword, listSessions } from '$lib/server/queries/people';
import { listRooms } from '$lib/server/queries/rooms';
import { checkPassword } from '$lib/server/services/check-password';
import { changeName, changePassword } from '$lib/server/services/people';
import { endSession, endSessions } from '$lib/server/services/sessions';
import { requireUser } from '$lib/server/session';
import { fail, redirect } from '@sveltejs/kit';
import { message, setError, superValidate } from 'sveltekit-superforms';
import { zod4 } from 'sveltekit-superforms/adapters';
import type { Actions, PageServerLoad } from './$types';

export const load: PageServerLoad = page(async (event) => {
	const user = requireUser(event);
	const [sessions, rooms, withPassword] = await Promise.all([
		listSessions(reader, user.id),
		listRooms(reader, user.id),
		hasPassword(reader, user.id)
	]);
	return {
		email: user.email,
		sessions: sessions.map((session) => ({ ...session, here: session.id === event.locals.session?.id })),
		rooms,
		withPassword,
		name: await superValidate({ name: user.name }, zod4(nameSchema), { id: 'name' }),
		password: await superValidate(zod4(passwordChangeSchema), { errors: false, id: 'password' })
	};
});

export const actions: Actions = {
	rename: page(async (event) => {
		const user = requireUser(event);
		const form = await superValidate(event.request, zod4(nameSchema), { id: 'name' });
		if (!form.valid) return fail(400, { form });
		await write((tx) => changeName(tx, user.id, form.data.name));
		return message(form, 'Saved.');
	}),

	changePassword: page(async (event) => {
		const user = requireUser(event);
		const form = await superValidate(event.request, zod4(passwordChangeSchema), { id: 'password' });
		const { current, password } = form.data;
		form.data.current = form.data.password = '';
		refuseCommon(form, password);
		if (!form.valid) return fail(400, { form });
		return unlessThrottled(event, form, 'current', async () => {
			const whose = await checkPassword({ reader, write }, user.email, current, networkOf(event));
			if (whose !== user.id) return setError(form, 'current', 'That isn’t your password.');
			const passwordHash = await hashPassword(password);
			const sessionId = event.locals.session?.id ?? '';
			await write((tx) => changePassword(tx, env.ORIGIN, { ...user, sessionId }, passwordHash));
			audit(event, 'password.changed');
			return message(form, 'Changed. Your other browsers are signed out.');
		});
	}),

	endSession: page(async (event) => {
		const user = requireUser(event);
		const form = await superValidate(event.request, zod4(endSessionSchema));
		if (!form.valid) return fail(400);
		await write((tx) => endSession(tx, user.id, form.data.session));
		redirect(303, '/account');
	}),

	endOthers: page(async (event) => {
		const user = requireUser(event);
		await write((tx) => endSessions(tx, user.id, event.locals.session?.id));
		redirect(303, '/account');
	})
};
