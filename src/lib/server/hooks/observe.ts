import type { Handle } from '@sveltejs/kit';
import { log } from '../log';
import { networkOf } from '../network';
import { newSecret } from '../secrets';

/** Names the request, sees that nothing private is cached, and logs whatever changed or was refused. */
export const observe: Handle = async ({ event, resolve }) => {
	event.locals.requestId = newSecret().slice(0, 12);
	event.locals.user = null;
	event.locals.session = null;
	const response = await resolve(event);
	const { user, requestId } = event.locals as App.Locals;
	const changes = !['GET', 'HEAD', 'OPTIONS'].includes(event.request.method);
	response.headers.set('x-request-id', requestId);
	if ((user || changes || response.headers.has('set-cookie')) && !event.isSubRequest) {
		response.headers.set('cache-control', 'no-store');
	}
	if (changes || response.status >= 400) {
		log[response.status >= 500 ? 'error' : response.status >= 400 ? 'warn' : 'info'](
			{
				request: requestId,
				method: event.request.method,
				// The route's pattern, not the path: a path can hold a link's secret.
				route: event.route.id,
				status: response.status,
				actor: user?.id ?? null,
				network: networkOf(event)
			},
			'request'
		);
	}
	return response;
};
