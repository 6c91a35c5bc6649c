import { cautionsFor } from '$lib/domain/caution';
import { readBill } from '$lib/domain/exchange';
import { useSheetsSchema } from '$lib/schemas/cutting';
import { ROOM_UNITS } from '$lib/schemas/rooms';
import { page } from '$lib/server/answer';
import { today } from '$lib/server/clock';
import { reader, write } from '$lib/server/db/client';
import { NotFound } from '$lib/server/errors';
import { orSay } from '$lib/server/or-say';
import { doneAct } from '$lib/server/queries/acts';
import { namesOfSupplies, papersOfPlan } from '$lib/server/queries/papers';
import { lossesFor, planFor } from '$lib/server/queries/plan';
import { listProjects, projectById, type ProjectDetail } from '$lib/server/queries/projects';
import { getRoom } from '$lib/server/queries/rooms';
import { listBins } from '$lib/server/queries/supplies';
import { useSheets } from '$lib/server/services/cutting';
import { requireActor, type Actor } from '$lib/server/session';
import { soon } from '$lib/server/soon';
import { fail, redirect, type RequestEvent } from '@sveltejs/kit';
import { v7 } from 'uuid';
import type { Actions, PageServerLoad } from './$types';

export const load: PageServerLoad = page(async (event) => {
	const actor = await requireActor(event, 'viewer');
	const project = await projectById(reader, actor, event.params.id);
	if (project.deletedAt !== null) throw new NotFound('This project is in the trash.');
	const room = await getRoom(reader, actor);
	const { searchParams } = event.url;
	const patient = searchParams.has('wait');
	return {
		id: project.id,
		name: project.name,
		copies: project.copies,
		document: project.bill,
		units: ROOM_UNITS.find((unit) => unit === searchParams.get('units')) ?? room.units,
		keep: room.keepOffcut,
		bins: (await listBins(reader, actor)).map(({ name }) => name),
		match: await soon(matchOf(actor, project, room.units), patient),
		costs: await soon(lossesFor(reader, actor, project, today()), patient),
		done: await doneAct(reader, actor, searchParams.get('did')),
		/** Names the cut, or its undoing: sent twice, it happens once. */
		request: v7(),
		mayChange: actor.role !== 'viewer'
	};
});

export const actions: Actions = {
	cut: page(async (event: RequestEvent<{ id: string }>) => {
		const actor = await requireActor(event, 'member');
		const fields = await event.request.formData();
		const typed = useSheetsSchema.safeParse({
			id: fields.get('id'),
			project: event.params.id,
			plan: fields.get('plan'),
			bin: String(fields.get('bin') ?? '').trim() || null,
			kept: fields.getAll('kept').flatMap((numbers) => String(numbers).split(' '))
		});
		if (!typed.success) return fail(422, { refused: typed.error.issues[0]?.message ?? 'That can’t be cut.' });
		return orSay(async () => {
			await write((tx) => useSheets(tx, actor, typed.data));
			redirect(303, `/projects/${event.params.id}/plan?did=${typed.data.id}`);
		});
	})
};

async function matchOf(actor: Actor, project: ProjectDetail, units: 'in' | 'mm' | 'cm') {
	const result = await planFor(reader, actor, project, today());
	const byKnife = result.plan?.sheets.some(({ cuts }) => cuts.some((cut) => cut.byKnife)) ?? false;
	return {
		result,
		papers: await papersOfPlan(reader, actor, result),
		names: await namesOfSupplies(reader, actor, result),
		cautions: cautionsFor(readBill(project.bill, units), { byKnife }),
		/** The bills that its sheets are shared with, by key. */
		projects: Object.fromEntries((await listProjects(reader, actor)).map(({ key, name }) => [key, name]))
	};
}
