import {
	documentSchema,
	readDocument,
	Unreadable,
	type BillDocument,
	type Issue
} from '$lib/domain/exchange';
import { addProjectSchema } from '$lib/schemas/projects';
import { keyFrom } from '$lib/schemas/key';
import { newProjectSchema, type NewProject } from '$lib/schemas/new-project';
import type { RoomUnits } from '$lib/schemas/rooms';
import { page } from '$lib/server/answer';
import { reader, write } from '$lib/server/db/client';
import { getRoom } from '$lib/server/queries/rooms';
import { addProject } from '$lib/server/services/projects';
import { requireActor } from '$lib/server/session';
import { STARTERS } from '$lib/starter';
import { fail, redirect } from '@sveltejs/kit';
import { v7 } from 'uuid';
import { z } from 'zod';
import type { Actions, PageServerLoad } from './$types';

export const load: PageServerLoad = page(async (event) => {
	await requireActor(event, 'member');
	const asked = newProjectSchema.shape.from.safeParse(event.url.searchParams.get('from'));
	return {
		id: v7(),
		from: asked.data ?? 'blank',
		starters: STARTERS.map(({ key, says, bill }) => ({ value: key, label: bill.name, note: says }))
	};
});

export const actions: Actions = {
	default: page(async (event) => {
		const actor = await requireActor(event, 'member');
		const typed = Object.fromEntries(await event.request.formData());
		const { file: _, ...kept } = typed;
		const refuse = (errors: Record<string, string[] | undefined>, issues: readonly Issue[] = []) =>
			fail(422, { kept: kept as Record<string, string>, errors, issues });

		const read = newProjectSchema.safeParse(typed);
		if (!read.success) return refuse(z.flattenError(read.error).fieldErrors);
		const { units } = await getRoom(reader, actor);
		const begun = await beginnings(read.data, units);
		if ('issues' in begun) return refuse({ document: [begun.message] }, begun.issues);

		const inputs = begun.bills.map((bill, nth) =>
			addProjectSchema.parse({ id: nth === 0 ? read.data.id : v7(), bill })
		);
		await write(async (tx) => {
			for (const input of inputs) await addProject(tx, actor, input);
		});
		if (inputs.length > 1) redirect(303, '/projects');
		redirect(303, `/projects/${read.data.id}${read.data.from === 'blank' ? '/bill' : ''}`);
	})
};

type Begun =
	| { readonly bills: readonly BillDocument[] }
	| { readonly message: string; readonly issues: readonly Issue[] };

async function beginnings(asked: NewProject, units: RoomUnits): Promise<Begun> {
	const name = asked.name.trim();
	if (asked.from === 'blank')
		return { bills: [{ key: keyFrom(name, 'project'), name, slots: [], pieces: [] }] };
	if (asked.from === 'starter') {
		const starter = STARTERS.find(({ key }) => key === asked.starter);
		if (!starter) return { message: 'That one isn’t ours any more.', issues: [] };
		return { bills: [named(starter.bill, name)] };
	}
	const text = asked.file && asked.file.size > 0 ? await asked.file.text() : asked.document;
	try {
		readDocument(text, units);
	} catch (trouble) {
		if (!(trouble instanceof Unreadable)) throw trouble;
		return { message: 'This can’t be taken in yet. What is wrong stands below.', issues: trouble.issues };
	}
	const bills = documentSchema.parse(JSON.parse(text)).projects ?? [];
	if (bills.length === 0) return { message: 'There is no project in this document.', issues: [] };
	return { bills: bills.length === 1 ? [named(bills[0]!, name)] : bills };
}

const named = (bill: BillDocument, name: string): BillDocument => (name === '' ? bill : { ...bill, name });
