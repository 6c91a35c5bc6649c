import type { RequestEvent } from '@sveltejs/kit';
import pino, { type Logger } from 'pino';
import { databaseCode } from './errors';
import { networkOf } from './network';

/** One JSON line to an event, in UTC. What is logged: ids, codes and route names; never a form, path or mail. */
export const log: Logger = pino({
	base: undefined,
	timestamp: pino.stdTimeFunctions.isoTime,
	messageKey: 'event'
});

/** What may be said of an error: its name, the database's code, and where it came from; never its bound values. */
export function describeError(error: unknown): Record<string, unknown> {
	if (!(error instanceof Error)) return { error: typeof error };
	const code = databaseCode(error);
	const frames = (error.stack ?? '').split('\n').filter((line) => /^\s+at /.test(line));
	return {
		error: error.name,
		...(code ? { code } : { reason: error.message.split('\n', 1)[0]?.slice(0, 200) }),
		at: frames.slice(0, 6).map((line) => line.trim())
	};
}

/** Notes who did what to whose access, from where. `detail` holds ids and roles only. */
export function audit(
	event: Pick<RequestEvent, 'locals' | 'getClientAddress'>,
	what: string,
	detail: Readonly<Record<string, string>> = {}
): void {
	const { requestId: request, user } = event.locals;
	log.info({ request, actor: user?.id ?? null, network: networkOf(event), ...detail }, what);
}
