import { cautionsFor } from '$lib/domain/caution';
import { readBill } from '$lib/domain/exchange';
import { designsFor } from '$lib/domain/matching/choices';
import { chooseDesignSchema, setCopiesSchema } from '$lib/schemas/projects';
import { page } from '$lib/server/answer';
import { today } from '$lib/server/clock';
import { reader, write } from '$lib/server/db/client';
import { NotFound } from '$lib/server/errors';
import { doneAct } from '$lib/server/queries/acts';
import { namesOfSupplies } from '$lib/server/queries/papers';
import { planFor } from '$lib/server/queries/plan';
import { projectById, type ProjectDetail } from '$lib/server/queries/projects';
import { getRoom } from '$lib/server/queries/rooms';
import { stashForMatching } from '$lib/server/queries/stash';
import { chooseDesign, setCopies, trashProject } from '$lib/server/services/projects';
import { requireActor, type Actor } from '$lib/server/session';
import { orSay } from '$lib/server/or-say';
import { soon } from '$lib/server/soon';
import { fail, redirect, type RequestEvent } from '@sveltejs/kit';
import { v7 } from 'uuid';
import { z } from 'zod';
import type { Actions, PageServerLoad } from './$types';

export const load: PageServerLoad = page(async (event) => {
	const actor = await requireActor(event, 'viewer');
	const project = await projectById(reader, actor, event.params.id);
	if (project.deletedAt !== null) throw new NotFound('This project is in the trash.');
	const { units } = await getRoom(reader, actor);
	const { searchParams } = event.url;
	const bill = readBill(project.bill, units);
	return {
		id: project.id,
		name: project.name,
		copies: project.copies,
		cuts: project.cuts,
		document: project.bill,
		bill,
		cautions: cautionsFor(bill),
		choices: designsFor(bill, await stashForMatching(reader, actor)),
		match: await soon(matchOf(actor, project), searchParams.has('wait')),
		kept: searchParams.has('kept'),
		done: await doneAct(reader, actor, searchParams.get('did')),
		request: v7(),
		mayChange: actor.role !== 'viewer'
	};
});

type ProjectEvent = RequestEvent<{ id: string }>;

export const actions: Actions = {
	copies: page(async (event: ProjectEvent) => {
		const actor = await requireActor(event, 'member');
		const fields = await event.request.formData();
		const typed = setCopiesSchema.safeParse({ copies: Number(fields.get('copies')) });
		if (!typed.success) return fail(422, { copies: 'Between 1 and 999 copies.' });
		await write((tx) => setCopies(tx, actor, event.params.id, typed.data));
		redirect(303, `/projects/${event.params.id}`);
	}),

	choose: page(async (event: ProjectEvent) => {
		const actor = await requireActor(event, 'member');
		const fields = await event.request.formData();
		const typed = choiceSchema.safeParse({ slot: fields.get('slot'), paper: fields.get('paper') });
		if (!typed.success) return fail(422, { refused: 'That paper can’t be chosen here.' });
		return orSay(async () => {
			await write((tx) => chooseDesign(tx, actor, event.params.id, typed.data));
			redirect(303, `/projects/${event.params.id}`);
		});
	}),

	trash: page(async (event: ProjectEvent) => {
		const actor = await requireActor(event, 'member');
		await write((tx) => trashProject(tx, actor, event.params.id));
		redirect(303, `/projects?trashed=${event.params.id}`);
	})
};

/** A choice is posted as `[design, collection]`, or blank for whatever serves. */
const choiceSchema = z.preprocess((fields) => {
	const { slot, paper } = fields as { slot: unknown; paper: unknown };
	const [design, collection] = typeof paper === 'string' && paper !== '' ? parsed(paper) : [null, null];
	return { slot, design, collection };
}, chooseDesignSchema);

function parsed(text: string): unknown[] {
	try {
		const pair: unknown = JSON.parse(text);
		return Array.isArray(pair) ? pair : [];
	} catch {
		return [];
	}
}

async function matchOf(actor: Actor, project: ProjectDetail) {
	const result = await planFor(reader, actor, project, today());
	return { result, names: await namesOfSupplies(reader, actor, result) };
}
