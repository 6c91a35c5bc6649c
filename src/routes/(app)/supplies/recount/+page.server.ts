import { listed } from '$lib/components/supply/listed';
import { measureOf } from '$lib/components/supply/kinds';
import { addressWith } from '$lib/components/supply/address';
import { returnPath } from '$lib/return-path';
import { amountTyped } from '$lib/schemas/stock-form';
import { recountSchema } from '$lib/schemas/supplies';
import { page } from '$lib/server/answer';
import { reader, write } from '$lib/server/db/client';
import { Conflict, Invalid } from '$lib/server/errors';
import { storedSupplies } from '$lib/server/queries/stash';
import { recount } from '$lib/server/services/stock';
import { requireActor } from '$lib/server/session';
import { writeSupply } from '$lib/domain/exchange';
import { supplyOf } from '$lib/server/supply-row';
import { fail, redirect } from '@sveltejs/kit';
import { v7 } from 'uuid';
import type { Actions, PageServerLoad } from './$types';

export const load: PageServerLoad = page(async (event) => {
	const actor = await requireActor(event, 'member');
	const ids = event.url.searchParams.getAll('supply').slice(0, 1000);
	if (ids.length === 0) redirect(303, '/supplies');
	const rows = await storedSupplies(reader, actor, ids);
	return {
		rows: rows.map((row) => ({ ...listed(row, ''), left: leftTyped(row) })),
		back: returnPath(event.url.searchParams.get('back'), '/supplies'),
		request: v7()
	};
});

export const actions: Actions = {
	default: page(async (event) => {
		const actor = await requireActor(event, 'member');
		const fields = await event.request.formData();
		const ids = fields.getAll('supply').map(String);
		const rows = await storedSupplies(reader, actor, ids);
		const typed = (id: string) => String(fields.get(`left-${id}`) ?? '');
		const unsure = (id: string) => fields.has(`unsure-${id}`);
		const counts = rows.map(({ id, kind }) => ({
			supply: id,
			left: amountTyped(typed(id), measureOf(kind)),
			count: unsure(id) ? 'unsure' : 'counted'
		}));
		const input = recountSchema.safeParse({ id: fields.get('id'), counts });
		const kept = Object.fromEntries(ids.map((id) => [id, typed(id)]));
		const refuse = (issues: readonly { path: readonly PropertyKey[]; message: string }[]) => {
			const refused = issues.map(({ path, message }) => [ids[Number(path[1])] ?? '', message]);
			return fail(400, { kept, refused: Object.fromEntries(refused) as Record<string, string> });
		};
		if (!input.success) return refuse(input.error.issues);
		try {
			await write((tx) => recount(tx, actor, input.data));
		} catch (refusal) {
			if (refusal instanceof Invalid) return refuse(refusal.issues);
			if (refusal instanceof Conflict) return refuse([{ path: ['counts', 0], message: refusal.message }]);
			throw refusal;
		}
		const back = new URL(returnPath(String(fields.get('back') ?? ''), '/supplies'), event.url);
		redirect(303, addressWith(back, { did: input.data.id, page: back.searchParams.get('page') }));
	})
};

/** What is left, as it would be typed. */
function leftTyped(row: Awaited<ReturnType<typeof storedSupplies>>[number]): string {
	const document = writeSupply(supplyOf(row));
	if (row.group === 'consumable' && 'left' in document) return String(document.left);
	return String(row.amount);
}
