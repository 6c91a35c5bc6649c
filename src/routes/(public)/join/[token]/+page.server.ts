import { HOME } from '$lib/return-path';
import { page } from '$lib/server/answer';
import { reader, write } from '$lib/server/db/client';
import { audit } from '$lib/server/log';
import { findInvitation } from '$lib/server/queries/rooms';
import { joinRoom } from '$lib/server/services/rooms';
import { chooseRoom } from '$lib/server/services/sessions';
import { requireUser } from '$lib/server/session';
import { redirect } from '@sveltejs/kit';
import type { Actions, PageServerLoad } from './$types';

export const load: PageServerLoad = page(async ({ params, locals, url }) => ({
	invitation: await findInvitation(reader, params.token),
	name: locals.user?.name ?? null,
	here: url.pathname
}));

export const actions: Actions = {
	default: page(async (event) => {
		const user = requireUser(event);
		const room = await write(async (tx) => {
			const roomId = await joinRoom(tx, user.id, event.params.token);
			if (event.locals.session) await chooseRoom(tx, user.id, event.locals.session.id, roomId);
			return roomId;
		});
		audit(event, 'room.joined', { room });
		redirect(303, HOME);
	})
};
