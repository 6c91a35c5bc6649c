import { groupOf } from '$lib/components/supply/kinds';
import type { SupplyMessage } from '$lib/components/supply/fields';
import { filledForm, supplyDocument, supplyForm, type SupplyForm } from '$lib/schemas/supply-form';
import { SUPPLY_KINDS } from '$lib/schemas/supply-filter';
import { page } from '$lib/server/answer';
import { reader, write } from '$lib/server/db/client';
import { doneAct } from '$lib/server/queries/acts';
import { getRoom } from '$lib/server/queries/rooms';
import { storedSupply } from '$lib/server/queries/stash';
import { listBins, listCollections } from '$lib/server/queries/supplies';
import { addSupply } from '$lib/server/services/supplies';
import { requireActor, type Actor } from '$lib/server/session';
import { supplyOf } from '$lib/server/supply-row';
import { fail, redirect } from '@sveltejs/kit';
import { superValidate } from 'sveltekit-superforms';
import { zod4 } from 'sveltekit-superforms/adapters';
import { v7 } from 'uuid';
import { orRefuse } from '../refusals';
import type { Actions, PageServerLoad } from './$types';

export const load: PageServerLoad = page(async (event) => {
	const actor = await requireActor(event, 'member');
	const { searchParams: params } = event.url;
	const asked = params.get('kind');
	const kind = SUPPLY_KINDS.find((one) => one === asked);
	const [room, bins, collections, done] = await Promise.all([
		getRoom(reader, actor),
		listBins(reader, actor),
		listCollections(reader, actor),
		doneAct(reader, actor, params.get('did'))
	]);
	const { units, currency } = room;
	const begun = {
		...{ id: v7(), currency, bin: params.get('bin') ?? '' },
		...(kind && { kind }),
		...(params.has('like') ? await alike(actor, params.get('like') ?? '', currency) : {})
	};
	return {
		kind: kind ?? null,
		form: await superValidate<SupplyForm, SupplyMessage>(begun, zod4(supplyForm(units)), { errors: false }),
		words: { bins: bins.map(({ name }) => name), collections },
		request: v7(),
		done
	};
});

export const actions: Actions = {
	default: page(async (event) => {
		const actor = await requireActor(event, 'member');
		const { units } = await getRoom(reader, actor);
		const fields = await event.request.formData();
		const form = await superValidate<SupplyForm, SupplyMessage>(fields, zod4(supplyForm(units)));
		if (!form.valid) return fail(400, { form });
		const { id, kind } = form.data;
		return orRefuse(form, async () => {
			await write((tx) => addSupply(tx, actor, { id, supply: supplyDocument(form.data) }));
			if (fields.get('then') === 'another') redirect(303, `/supplies/new?kind=${kind}&like=${id}&did=${id}`);
			redirect(303, `/supplies/${id}?did=${id}`);
		});
	})
};

/** The next of a row keeps what a pile of them shares: where it lies, its collection, its size and its weight. */
async function alike(actor: Actor, id: string, currency: string): Promise<Partial<SupplyForm>> {
	const row = await storedSupply(reader, actor, id);
	const like = filledForm(id, 0, supplyOf(row), currency);
	const { bin, collection, kind } = like;
	if (groupOf(kind) !== 'sheet') return { bin, collection, kind };
	const { size, weight, caliper, stripEdge, stripDepth, directionA } = like;
	return { bin, collection, kind, size, weight, caliper, stripEdge, stripDepth, directionA };
}
