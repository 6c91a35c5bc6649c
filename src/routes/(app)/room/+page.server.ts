import {
	chooseRoomSchema,
	inviteSchema,
	readRoomSettings,
	removeSchema,
	roleSchema,
	roomSettingsSchema,
	withdrawSchema
} from '$lib/schemas/rooms';
import { writeExact } from '$lib/domain/length';
import { page } from '$lib/server/answer';
import { reader, write } from '$lib/server/db/client';
import { env } from '$lib/server/env';
import { audit } from '$lib/server/log';
import { orSay } from '$lib/server/or-say';
import { getRoom, listInvitations, listPeople, listRooms } from '$lib/server/queries/rooms';
import {
	changeRole,
	changeRoomSettings,
	invite,
	removePerson,
	withdrawInvitation
} from '$lib/server/services/rooms';
import { chooseRoom } from '$lib/server/services/sessions';
import { requireActor, requireUser } from '$lib/server/session';
import { fail, redirect } from '@sveltejs/kit';
import { message, superValidate } from 'sveltekit-superforms';
import { zod4 } from 'sveltekit-superforms/adapters';
import type { Actions, PageServerLoad } from './$types';

export const load: PageServerLoad = page(async (event) => {
	const actor = await requireActor(event, 'viewer');
	const owner = actor.role === 'owner';
	const [room, people, rooms, invitations] = await Promise.all([
		getRoom(reader, actor),
		listPeople(reader, actor),
		listRooms(reader, actor.userId),
		owner ? listInvitations(reader, actor) : []
	]);
	const length = (value: number | null) => (value === null ? '' : writeExact(value, room.units));
	const typed = { ...room, reach: length(room.reach), keepOffcut: length(room.keepOffcut) };
	return {
		room,
		people,
		rooms,
		invitations,
		me: actor.userId,
		role: actor.role,
		settings: await superValidate(typed, zod4(roomSettingsSchema), { id: 'settings' })
	};
});

export const actions: Actions = {
	settings: page(async (event) => {
		const actor = await requireActor(event, 'owner');
		const form = await superValidate(event.request, zod4(roomSettingsSchema), { id: 'settings' });
		if (!form.valid) return fail(400, { form });
		await write((tx) => changeRoomSettings(tx, actor, readRoomSettings(form.data)));
		return message(form, 'Saved.');
	}),

	invite: page(async (event) => {
		const actor = await requireActor(event, 'owner');
		const form = await superValidate(event.request, zod4(inviteSchema));
		if (!form.valid) return fail(400);
		const secret = await write((tx) => invite(tx, actor, form.data.role));
		audit(event, 'room.invited', { room: actor.roomId, role: form.data.role });
		return { invitation: `${env.ORIGIN}/join/${secret}` };
	}),

	withdraw: page(async (event) => {
		const actor = await requireActor(event, 'owner');
		const form = await superValidate(event.request, zod4(withdrawSchema));
		if (!form.valid) return fail(400);
		await write((tx) => withdrawInvitation(tx, actor, form.data.invitation));
		redirect(303, '/room');
	}),

	changeRole: page(async (event) => {
		const actor = await requireActor(event, 'owner');
		const form = await superValidate(event.request, zod4(roleSchema));
		if (!form.valid) return fail(400);
		return orSay(async () => {
			await write((tx) => changeRole(tx, actor, form.data.person, form.data.role));
			audit(event, 'room.role-changed', { room: actor.roomId, ...form.data });
			redirect(303, '/room');
		});
	}),

	remove: page(async (event) => {
		const actor = await requireActor(event, 'owner');
		const form = await superValidate(event.request, zod4(removeSchema));
		if (!form.valid) return fail(400);
		return orSay(async () => {
			await write((tx) => removePerson(tx, actor, form.data.person));
			audit(event, 'room.person-removed', { room: actor.roomId, ...form.data });
			redirect(303, '/room');
		});
	}),

	leave: page(async (event) => {
		const actor = await requireActor(event, 'viewer');
		return orSay(async () => {
			await write((tx) => removePerson(tx, actor, actor.userId));
			audit(event, 'room.left', { room: actor.roomId });
			redirect(303, '/account');
		});
	}),

	choose: page(async (event) => {
		const user = requireUser(event);
		const form = await superValidate(event.request, zod4(chooseRoomSchema));
		if (!form.valid || !event.locals.session) return fail(400);
		const sessionId = event.locals.session.id;
		await write((tx) => chooseRoom(tx, user.id, sessionId, form.data.room));
		redirect(303, '/today');
	})
};
