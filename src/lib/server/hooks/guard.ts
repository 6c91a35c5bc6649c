import { error, redirect, type Handle } from '@sveltejs/kit';
import { refuse, signInFor } from '../answer';
import { Unauthenticated } from '../errors';

/** Open to visitors though they are under `/api`. */
const OPEN_API = new Set(['/api/match', '/api/openapi.json']);

/**
 * The outer door: nothing in the app, the staff's pages or the API answers a visitor. What a signed-in person may
 * do is asked again in each load, action and endpoint.
 */
export const guard: Handle = ({ event, resolve }) => {
	const route = event.route.id ?? '';
	const { user } = event.locals;
	if (route.startsWith('/api/') && !OPEN_API.has(route) && !user) return refuse(new Unauthenticated());
	if (/^\/\((app|staff)\)/.test(route) && !user) redirect(303, signInFor(event.url));
	if (route.startsWith('/(staff)') && user?.siteRole !== 'admin') error(404, 'There is nothing here.');
	return resolve(event);
};
