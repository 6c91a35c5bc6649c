import { building, dev } from '$app/environment';
import { env } from '$env/dynamic/private';
import { floods } from '$lib/server/hooks/floods';
import { guard } from '$lib/server/hooks/guard';
import { identify } from '$lib/server/hooks/identify';
import { observe } from '$lib/server/hooks/observe';
import { sameOrigin } from '$lib/server/hooks/same-origin';
import { describeError, log } from '$lib/server/log';
import { start } from '$lib/server/start';
import { paintTheme, readTheme } from '$lib/server/theme';
import type { Handle, HandleServerError, ServerInit } from '@sveltejs/kit';
import { sequence } from '@sveltejs/kit/hooks';

export const init: ServerInit = async () => {
	if (building) return;
	try {
		await start(env);
	} catch (error) {
		console.error((error as Error).message);
		if (dev) throw error;
		process.exit(1);
	}
};

const wearTheme: Handle = ({ event, resolve }) =>
	resolve(event, { transformPageChunk: paintTheme(readTheme(event.cookies)) });

export const handle = sequence(observe, sameOrigin, identify, floods, guard, wearTheme);

export const handleError: HandleServerError = ({ error, event, status }) => {
	const id = event.locals.requestId;
	if (status === 404) return { message: 'There is nothing at this address.', id };
	log.error(
		{ request: id, route: event.route.id, actor: event.locals.user?.id ?? null, ...describeError(error) },
		'failed'
	);
	return { message: 'Something went wrong on our side. Nothing was changed.', id };
};
