import { isHttpError, isRedirect, type Handle, type RequestEvent } from '@sveltejs/kit';
import { log } from '../log';
import { networkOf } from '../network';
import { newSecret } from '../secrets';

/** Names the request, sees that nothing private is cached, and logs whatever changed or was refused. */
export const observe: Handle = async ({ event, resolve }) => {
	event.locals.requestId = newSecret().slice(0, 12);
	event.locals.user = null;
	event.locals.session = null;
	try {
		const response = await resolve(event);
		response.headers.set('x-request-id', event.locals.requestId);
		if (isPrivate(event, response) && !response.headers.has('cache-control')) {
			response.headers.set('cache-control', 'no-store');
		}
		note(event, response.status);
		return response;
	} catch (thrown) {
		if (isHttpError(thrown) || isRedirect(thrown)) note(event, thrown.status);
		throw thrown;
	}
};

const changes = ({ request }: RequestEvent) => !['GET', 'HEAD', 'OPTIONS'].includes(request.method);

/** For a signed-in person, or about one: a page behind a mailed link says whose it is. */
function isPrivate(event: RequestEvent, response: Response): boolean {
	return (
		event.locals.user !== null ||
		changes(event) ||
		response.headers.has('set-cookie') ||
		(event.route.id ?? '').includes('[token]')
	);
}

function note(event: RequestEvent, status: number): void {
	if (!changes(event) && status < 400) return;
	const level = status >= 500 ? 'error' : status >= 400 ? 'warn' : 'info';
	log[level](
		{
			request: event.locals.requestId,
			method: event.request.method,
			// The route's pattern, not the path: a path can hold a link's secret.
			route: event.route.id,
			status,
			actor: event.locals.user?.id ?? null,
			network: networkOf(event)
		},
		'request'
	);
}
