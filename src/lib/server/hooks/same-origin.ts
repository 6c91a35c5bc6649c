import { json, type Handle } from '@sveltejs/kit';
import { env } from '../env';

const SAFE = new Set(['GET', 'HEAD', 'OPTIONS']);
/** Open to scripts as well: they read no cookie and change nothing. */
const STATELESS = new Set(['/api/match']);

/**
 * Refuses whatever would change something and doesn't come from our own pages. Kit's own check covers form
 * types only; this one covers JSON and bodies without a type as well.
 */
export const sameOrigin: Handle = ({ event, resolve }) => {
	if (SAFE.has(event.request.method)) return resolve(event);
	const origin = event.request.headers.get('origin');
	const allowed = origin === null ? STATELESS.has(event.route.id ?? '') : origin === env.ORIGIN;
	if (allowed) return resolve(event);
	return json({ message: 'This request didn’t come from one of our own pages.' }, { status: 403 });
};
