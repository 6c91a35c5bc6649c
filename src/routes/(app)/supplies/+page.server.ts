import { addressWith } from '$lib/components/supply/address';
import { groupOf } from '$lib/components/supply/kinds';
import { listed } from '$lib/components/supply/listed';
import { returnPath } from '$lib/return-path';
import { readSupplyFilter } from '$lib/schemas/supply-filter';
import { moveSchema, trashSchema, undoSchema } from '$lib/schemas/supplies';
import { page } from '$lib/server/answer';
import { today } from '$lib/server/clock';
import { reader, write } from '$lib/server/db/client';
import { orSay } from '$lib/server/or-say';
import { doneAct } from '$lib/server/queries/acts';
import { getRoom } from '$lib/server/queries/rooms';
import { listBins, listCollections, listSupplies, suppliesByKind } from '$lib/server/queries/supplies';
import { undo } from '$lib/server/services/ledger';
import { moveSupplies, trashSupplies } from '$lib/server/services/stock';
import { requireActor } from '$lib/server/session';
import { fail, redirect } from '@sveltejs/kit';
import { v7 } from 'uuid';
import type { ZodError } from 'zod';
import type { Actions, PageServerLoad } from './$types';

export const load: PageServerLoad = page(async (event) => {
	const actor = await requireActor(event, 'viewer');
	const { searchParams: params } = event.url;
	const { units } = await getRoom(reader, actor);
	const filter = readSupplyFilter(params, units);
	const [found, kinds, bins, collections, done] = await Promise.all([
		listSupplies(reader, actor, filter),
		suppliesByKind(reader, actor),
		listBins(reader, actor),
		listCollections(reader, actor),
		doneAct(reader, actor, params.get('did'))
	]);
	if (found.page > found.pages) {
		redirect(303, addressWith(event.url, { page: String(found.pages) }));
	}
	return {
		found: { ...found, rows: found.rows.map((row) => listed(row, today())) },
		filter,
		typed: { q: params.get('q') ?? '', size: params.get('size') ?? '' },
		view: params.get('view') === 'pictures' ? ('pictures' as const) : ('table' as const),
		kinds: kinds.map(({ kind, rows }) => ({ kind, rows, group: groupOf(kind) })),
		bins: bins.map(({ name }) => name),
		collections,
		writes: actor.role !== 'viewer',
		request: v7(),
		done
	};
});

export const actions: Actions = {
	move: page(async (event) => {
		const actor = await requireActor(event, 'member');
		const fields = await event.request.formData();
		const bin = fields.get('bin') === NEW_BIN ? fields.get('newBin') : fields.get('bin');
		const input = moveSchema.safeParse({ ...chosen(fields), bin: bin === '' ? null : bin });
		if (!input.success) return refused(input.error);
		return orSay(async () => {
			await write((tx) => moveSupplies(tx, actor, input.data));
			redirect(303, afterAct(event.url, input.data.id));
		});
	}),

	trash: page(async (event) => {
		const actor = await requireActor(event, 'member');
		const input = trashSchema.safeParse(chosen(await event.request.formData()));
		if (!input.success) return refused(input.error);
		return orSay(async () => {
			await write((tx) => trashSupplies(tx, actor, input.data));
			redirect(303, afterAct(event.url, input.data.id));
		});
	}),

	undo: page(async (event) => {
		const actor = await requireActor(event, 'member');
		const fields = await event.request.formData();
		const input = undoSchema.safeParse({ id: fields.get('id'), act: fields.get('act') });
		if (!input.success) return refused(input.error);
		return orSay(async () => {
			await write((tx) => undo(tx, actor, input.data));
			const back = new URL(returnPath(String(fields.get('back') ?? ''), '/supplies'), event.url);
			redirect(303, addressWith(back, { did: input.data.id, page: back.searchParams.get('page') }));
		});
	})
};

/** The choice that says a bin of another name follows. */
const NEW_BIN = '+';

const chosen = (fields: FormData) => ({ id: fields.get('id'), supplies: fields.getAll('supply') });

const refused = (error: ZodError) =>
	fail(400, { refused: error.issues[0]?.message ?? 'That can’t be read.' });

/** Back to the same rows, with the notice of what was done. */
const afterAct = (url: URL, act: string) =>
	addressWith(url, { page: url.searchParams.get('page'), did: act }, '/supplies');
