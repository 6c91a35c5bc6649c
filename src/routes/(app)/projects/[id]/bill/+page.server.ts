import { checkDraft, billOf } from '$lib/schemas/bill-check';
import { draftFromForm, draftOf, type BillDraft } from '$lib/schemas/bill-draft';
import { editRows } from '$lib/schemas/bill-rows';
import { readFormTree } from '$lib/schemas/form-tree';
import type { RoomUnits } from '$lib/schemas/rooms';
import { page } from '$lib/server/answer';
import { reader, write } from '$lib/server/db/client';
import { Conflict, Invalid } from '$lib/server/errors';
import { projectById, type ProjectDetail } from '$lib/server/queries/projects';
import { getRoom } from '$lib/server/queries/rooms';
import { editBill } from '$lib/server/services/projects';
import { requireActor } from '$lib/server/session';
import { fail, redirect, type RequestEvent } from '@sveltejs/kit';
import { differences } from './differences';
import type { Actions, PageServerLoad } from './$types';

export const load: PageServerLoad = page(async (event) => {
	const actor = await requireActor(event, 'member');
	const { bill, version, name } = await projectById(reader, actor, event.params.id);
	const { units } = await getRoom(reader, actor);
	const draft = startedOn(draftOf(bill));
	return { id: event.params.id, name, version, draft, told: told(draft, units), units };
});

export const actions: Actions = {
	save: page(async (event: RequestEvent<{ id: string }>) => {
		const actor = await requireActor(event, 'member');
		const { draft, version } = await posted(event);
		const { units } = await getRoom(reader, actor);
		const checked = checkDraft(draft, units);
		const state = { draft, version, focus: null, told: told(draft, units) };
		if (Object.keys(checked.issues).length > 0) return fail(422, { ...state, strict: true });
		try {
			const { id } = event.params;
			await write((tx) => editBill(tx, actor, id, { version, bill: billOf(checked) }));
		} catch (refusal) {
			if (refusal instanceof Invalid) {
				const issues = Object.fromEntries(
					refusal.issues.map(({ path, message }) => [path.slice(1).join('.'), message])
				);
				return fail(422, { ...state, told: { ...state.told, issues }, strict: true });
			}
			if (!(refusal instanceof Conflict)) throw refusal;
			const theirs = refusal.current as ProjectDetail;
			return fail(409, {
				...state,
				strict: true,
				/** Kept again from here, her own replaces what stands now, and knowingly. */
				version: theirs.version,
				differences: differences(draft, draftOf(theirs.bill))
			});
		}
		redirect(303, `/projects/${event.params.id}?kept`);
	}),

	/** A row's button, where no script runs to do the same at once. */
	row: page(async (event: RequestEvent<{ id: string }>) => {
		const actor = await requireActor(event, 'member');
		const { draft, version, asked } = await posted(event);
		const done = editRows(draft, asked);
		const { units } = await getRoom(reader, actor);
		return {
			...{ draft, version, strict: false, told: told(draft, units), differences: undefined },
			focus: done ? `${done.path}.` : null
		};
	})
};

async function posted({ request }: RequestEvent) {
	const fields = await request.formData();
	return {
		draft: draftFromForm(readFormTree(fields)),
		version: Number(fields.get('version')) || 0,
		asked: String(fields.get('row') ?? '')
	};
}

function told(draft: BillDraft, units: RoomUnits) {
	const { document: _, ...rest } = checkDraft(draft, units);
	return rest;
}

/** A blank bill begins with the rows that every bill has. */
function startedOn(draft: BillDraft): BillDraft {
	if (draft.slots.length === 0) editRows(draft, 'add slots');
	if (draft.pieces.length === 0) editRows(draft, 'add pieces');
	return draft;
}
