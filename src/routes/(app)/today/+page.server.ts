import { moveProjectSchema } from '$lib/schemas/projects';
import { page } from '$lib/server/answer';
import { today as dayNow } from '$lib/server/clock';
import { reader, write } from '$lib/server/db/client';
import { namesOfSupplies, papersOfPlan } from '$lib/server/queries/papers';
import { getRoom } from '$lib/server/queries/rooms';
import { suppliesByKind } from '$lib/server/queries/supplies';
import { todayFor, unlocksFor } from '$lib/server/queries/today';
import { moveProject } from '$lib/server/services/projects';
import { requireActor } from '$lib/server/session';
import { fail, redirect } from '@sveltejs/kit';
import type { Actions, PageServerLoad } from './$types';
import { flapsOf } from './flaps';

export const load: PageServerLoad = page(async (event) => {
	const actor = await requireActor(event, 'viewer');
	event.depends('paperlarder:today');
	const { searchParams } = event.url;
	const mode = searchParams.get('mode') === 'queue' ? 'queue' : 'each';
	const on = dayNow();
	const [room, today, kinds] = await Promise.all([
		getRoom(reader, actor),
		todayFor(reader, actor, { mode, on }),
		suppliesByKind(reader, actor)
	]);
	const lifted = today.rows.find(({ project }) => project.key === searchParams.get('lift'));
	const lacking = today.rows.some(({ result }) => result.verdict === 'short');
	return {
		mode,
		on,
		revision: today.revision,
		flaps: flapsOf(today),
		lifted: lifted && {
			id: lifted.project.id,
			bill: lifted.project.bill,
			result: lifted.result,
			papers: await papersOfPlan(reader, actor, lifted.result),
			names: await namesOfSupplies(reader, actor, lifted.result)
		},
		/** Streamed: it takes longer than the ranking. */
		unlocks: lacking ? unlocksFor(reader, actor, on).catch(() => []) : null,
		keep: room.keepOffcut,
		setUp: room.setUp,
		stocked: kinds.length > 0,
		mayChange: actor.role !== 'viewer',
		mayRun: actor.role === 'owner'
	} as const;
});

export const actions: Actions = {
	move: page(async (event) => {
		const actor = await requireActor(event, 'member');
		const typed = moveProjectSchema.safeParse(Object.fromEntries(await event.request.formData()));
		if (!typed.success) return fail(400);
		await write((tx) => moveProject(tx, actor, typed.data));
		redirect(303, '/today?mode=queue');
	})
};
