import type { RequestEvent } from '@sveltejs/kit';
import { setError, type FormPathLeavesWithErrors, type SuperValidated } from 'sveltekit-superforms';
import { TooMany } from './errors';
import { isCommonPassword } from './passwords';

/** Runs what a throttle may hold back; then the form says so beside `field`, and the answer is 429. */
export async function unlessThrottled<T extends Record<string, unknown>, Result>(
	event: RequestEvent,
	form: SuperValidated<T>,
	field: FormPathLeavesWithErrors<T>,
	work: () => Promise<Result>
) {
	try {
		return await work();
	} catch (refusal) {
		if (!(refusal instanceof TooMany)) throw refusal;
		event.setHeaders({ 'retry-after': String(refusal.retryAfter) });
		return setError(form, field, refusal.message, { status: 429 });
	}
}

/** Beside the schema's own rules: the list of common passwords is too long for the browser. */
export function refuseCommon<T extends { password: string }>(
	form: SuperValidated<T>,
	password: string
): void {
	if (!form.valid || !isCommonPassword(password)) return;
	setError(
		form,
		'password' as FormPathLeavesWithErrors<T>,
		'That one is on the lists that are tried first. Choose another.'
	);
}
