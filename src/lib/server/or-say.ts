import { fail } from '@sveltejs/kit';
import { Conflict, Invalid } from './errors';

/** Runs a form action's work; what the person can mend herself is refused on the page she is on. */
export async function orSay<T>(work: () => Promise<T>) {
	try {
		return await work();
	} catch (refusal) {
		if (refusal instanceof Conflict || refusal instanceof Invalid)
			return fail(refusal.status, { refused: refusal.message });
		throw refusal;
	}
}
