import type { SupplyMessage } from '$lib/components/supply/fields';
import { filledForm, supplyDocument, supplyForm, type SupplyForm } from '$lib/schemas/supply-form';
import { page } from '$lib/server/answer';
import { reader, write } from '$lib/server/db/client';
import { Conflict } from '$lib/server/errors';
import { getRoom } from '$lib/server/queries/rooms';
import { storedSupply } from '$lib/server/queries/stash';
import { listBins, listCollections } from '$lib/server/queries/supplies';
import { editSupply } from '$lib/server/services/supplies';
import { requireActor } from '$lib/server/session';
import { supplyOf } from '$lib/server/supply-row';
import { fail, redirect } from '@sveltejs/kit';
import { message, superValidate, type SuperValidated } from 'sveltekit-superforms';
import { zod4 } from 'sveltekit-superforms/adapters';
import { v7 } from 'uuid';
import { orRefuse } from '../../refusals';
import type { Actions, PageServerLoad } from './$types';

export const load: PageServerLoad = page(async (event) => {
	const actor = await requireActor(event, 'member');
	const [room, row, bins, collections] = await Promise.all([
		getRoom(reader, actor),
		storedSupply(reader, actor, event.params.id),
		listBins(reader, actor),
		listCollections(reader, actor)
	]);
	const filled = filledForm(v7(), row.version, supplyOf(row), room.currency);
	return {
		name: row.name,
		form: await superValidate<SupplyForm, SupplyMessage>(filled, zod4(supplyForm(room.units)), {
			errors: false
		}),
		words: { bins: bins.map(({ name }) => name), collections }
	};
});

export const actions: Actions = {
	default: page(async (event) => {
		const actor = await requireActor(event, 'member');
		const supplyId = event.params.id;
		const { units, currency } = await getRoom(reader, actor);
		const form = await superValidate<SupplyForm, SupplyMessage>(event.request, zod4(supplyForm(units)));
		if (!form.valid) return fail(400, { form });
		const { id, version } = form.data;
		return orRefuse(form, async () => {
			const supply = supplyDocument(form.data);
			try {
				await write((tx) => editSupply(tx, actor, supplyId, { id, version, supply }));
			} catch (refusal) {
				if (!(refusal instanceof Conflict && refusal.current)) throw refusal;
				const row = await storedSupply(reader, actor, supplyId);
				const current = filledForm(id, row.version, supplyOf(row), currency);
				return bothVersions(form, current, refusal.message);
			}
			redirect(303, `/supplies/${supplyId}?did=${id}`);
		});
	})
};

/** Says so beside what stands now; sending the form again then means hers goes over it. */
function bothVersions(form: SuperValidated<SupplyForm, SupplyMessage>, current: SupplyForm, text: string) {
	form.data.version = current.version;
	return message(form, { text, current }, { status: 409 });
}
