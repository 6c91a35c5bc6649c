import { error, json, redirect, type RequestEvent } from '@sveltejs/kit';
import { Conflict, databaseCode, Full, Invalid, NoRoom, Refusal, TooMany, Unauthenticated } from './errors';

/** Wraps a `load` or a form action: a refusal becomes Kit's error page, or the way to the sign-in page. */
export function page<Event extends RequestEvent | { url: URL }, Result>(
	work: (event: Event) => Promise<Result>
): (event: Event) => Promise<Result> {
	return async (event) => {
		try {
			return await work(event);
		} catch (thrown) {
			const refusal = refusalIn(thrown);
			if (refusal instanceof Unauthenticated) redirect(303, signInFor(event.url));
			if (refusal instanceof NoRoom) redirect(303, '/room/new');
			if (refusal) error(refusal.status, refusal.message);
			throw thrown;
		}
	};
}

/** Wraps an `/api` handler: a refusal becomes `{ message, issues?, current? }` with its status. */
export function api<Event extends RequestEvent>(
	work: (event: Event) => Promise<Response>
): (event: Event) => Promise<Response> {
	return async (event) => {
		try {
			return await work(event);
		} catch (thrown) {
			const refusal = refusalIn(thrown);
			if (refusal) return refuse(refusal);
			throw thrown;
		}
	};
}

export function refuse(refusal: Refusal): Response {
	const issues =
		refusal instanceof Invalid
			? { issues: refusal.issues.map(({ path, message }) => ({ path: path.join('.'), message })) }
			: {};
	const current = refusal instanceof Conflict ? { current: refusal.current } : {};
	const headers: HeadersInit =
		refusal instanceof TooMany ? { 'retry-after': String(refusal.retryAfter) } : {};
	return json({ message: refusal.message, ...issues, ...current }, { status: refusal.status, headers });
}

/** What was refused, by us or by the database's own constraints; undefined for a fault. */
function refusalIn(thrown: unknown): Refusal | undefined {
	if (thrown instanceof Refusal) return thrown;
	const code = databaseCode(thrown);
	if (code?.startsWith('SQLITE_CONSTRAINT'))
		return new Conflict('That doesn’t go with what is there already.');
	return code === 'SQLITE_FULL' ? new Full() : undefined;
}

/** The sign-in page, told where to return to. */
export function signInFor(url: URL): string {
	return `/sign-in?next=${encodeURIComponent(url.pathname + url.search)}`;
}
