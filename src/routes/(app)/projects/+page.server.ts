import { page } from '$lib/server/answer';
import { today } from '$lib/server/clock';
import { reader, write } from '$lib/server/db/client';
import { listProjects, listTrashedProjects } from '$lib/server/queries/projects';
import { todayFor } from '$lib/server/queries/today';
import { restoreProject } from '$lib/server/services/projects';
import { requireActor, type Actor } from '$lib/server/session';
import { soon } from '$lib/server/soon';
import { fail, redirect } from '@sveltejs/kit';
import { z } from 'zod';
import type { Actions, PageServerLoad } from './$types';

export const load: PageServerLoad = page(async (event) => {
	const actor = await requireActor(event, 'viewer');
	const [projects, trash] = await Promise.all([
		listProjects(reader, actor),
		listTrashedProjects(reader, actor)
	]);
	const { searchParams } = event.url;
	return {
		projects: projects.map(({ id, key, name, bill, copies, updatedAt }) => ({
			...{ id, key, name, copies, updatedAt },
			pieces: bill.pieces.reduce((sum, piece) => sum + (piece.qty ?? 1), 0)
		})),
		verdicts: await soon(verdictsOf(actor), searchParams.has('wait')),
		trash: trash.map(({ id, name, deletedAt }) => ({ id, name, deletedAt })),
		trashed: searchParams.get('trashed'),
		mayChange: actor.role !== 'viewer'
	};
});

export const actions: Actions = {
	restore: page(async (event) => {
		const actor = await requireActor(event, 'member');
		const id = z.uuid().safeParse((await event.request.formData()).get('project'));
		if (!id.success) return fail(400);
		await write((tx) => restoreProject(tx, actor, id.data));
		redirect(303, '/projects');
	})
};

async function verdictsOf(actor: Actor) {
	const { rows } = await todayFor(reader, actor, { mode: 'each', on: today() });
	return Object.fromEntries(
		rows.map(({ project, result: { verdict, after } }) => [project.id, { verdict, after }])
	);
}
