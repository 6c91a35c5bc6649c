import type { SupplyMessage } from '$lib/components/supply/fields';
import { Conflict, Invalid } from '$lib/server/errors';
import type { SupplyForm } from '$lib/schemas/supply-form';
import { message, type SuperValidated } from 'sveltekit-superforms';

/** Runs what a form asked for; a refusal is said above the form, with everything typed kept. */
export async function orRefuse<T>(form: SuperValidated<SupplyForm, SupplyMessage>, work: () => Promise<T>) {
	try {
		return await work();
	} catch (refusal) {
		if (!(refusal instanceof Conflict || refusal instanceof Invalid)) throw refusal;
		return message(form, { text: refusal.message }, { status: refusal.status });
	}
}
