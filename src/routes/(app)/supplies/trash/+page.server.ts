import { listed } from '$lib/components/supply/listed';
import { trashSchema } from '$lib/schemas/supplies';
import { page } from '$lib/server/answer';
import { reader, write } from '$lib/server/db/client';
import { orSay } from '$lib/server/or-say';
import { listTrash, TRASH_DAYS } from '$lib/server/queries/supplies';
import { restoreSupplies } from '$lib/server/services/stock';
import { requireActor } from '$lib/server/session';
import { fail, redirect } from '@sveltejs/kit';
import { v7 } from 'uuid';
import type { Actions, PageServerLoad } from './$types';

export const load: PageServerLoad = page(async (event) => {
	const actor = await requireActor(event, 'viewer');
	const rows = await listTrash(reader, actor);
	return {
		rows: rows.map((row) => ({ ...listed(row, ''), at: row.deletedAt ?? 0 })),
		days: TRASH_DAYS,
		writes: actor.role !== 'viewer',
		request: v7()
	};
});

export const actions: Actions = {
	restore: page(async (event) => {
		const actor = await requireActor(event, 'member');
		const fields = await event.request.formData();
		const input = trashSchema.safeParse({ id: fields.get('id'), supplies: fields.getAll('supply') });
		if (!input.success) return fail(400, { refused: input.error.issues[0]?.message ?? '' });
		return orSay(async () => {
			await write((tx) => restoreSupplies(tx, actor, input.data));
			redirect(303, `/supplies?did=${input.data.id}`);
		});
	})
};
