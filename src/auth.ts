import { getToken } from '@auth/core/jwt';
import { AuthError, CredentialsSignin, SvelteKitAuth } from '@auth/sveltekit';
import Credentials from '@auth/sveltekit/providers/credentials';
import { isRedirect, type Action, type RequestEvent } from '@sveltejs/kit';
import { reader, write } from '$lib/server/db/client';
import { env } from '$lib/server/env';
import { NotFound, TooMany } from '$lib/server/errors';
import { LIFETIME_MS } from '$lib/server/lifetimes';
import { audit } from '$lib/server/log';
import { networkOf } from '$lib/server/network';
import { checkPassword } from '$lib/server/services/check-password';
import { redeemSignInLink } from '$lib/server/services/people';
import { endSessionOf, openSession, type Visitor } from '$lib/server/services/sessions';

const COOKIE = '__Host-paperlarder';
const cookie = { httpOnly: true, sameSite: 'lax', path: '/', secure: true } as const;

/** Why somebody wasn't let in, kept whole on its way through Auth.js. */
class NotLetIn extends CredentialsSignin {
	constructor(readonly why: TooMany | NotFound) {
		super();
	}
}

const auth = SvelteKitAuth(async (event) => ({
	trustHost: true,
	secret: env.AUTH_SECRET,
	session: { strategy: 'jwt', maxAge: LIFETIME_MS.session / 1000 },
	cookies: { sessionToken: { name: COOKIE, options: cookie } },
	providers: [
		Credentials({
			id: 'password',
			credentials: { email: {}, password: {} },
			authorize: ({ email, password }) =>
				letIn(event, () =>
					checkPassword({ reader, write }, String(email), String(password), networkOf(event))
				)
		}),
		Credentials({
			id: 'link',
			credentials: { token: {} },
			authorize: ({ token }) => letIn(event, () => write((tx) => redeemSignInLink(tx, String(token))))
		})
	],
	callbacks: {
		// The token carries the session's secret and nothing else: whose it is, is looked up at each request.
		jwt: ({ token, user }) => (user ? { sid: (user as { sid?: string }).sid } : token)
	},
	events: {
		signOut: async (message) => {
			const sid = 'token' in message ? message.token?.sid : undefined;
			if (typeof sid === 'string') await write((tx) => endSessionOf(tx, sid));
		}
	},
	logger: { error: () => {}, warn: () => {}, debug: () => {} }
}));

/**
 * Signs this browser in; the session it had before ends.
 * @returns false for a wrong address or password
 * @throws {TooMany | NotFound} throttled, or a link that no longer works
 */
export async function signIn(
	event: RequestEvent,
	provider: 'password' | 'link',
	credentials: Record<string, string>
): Promise<boolean> {
	try {
		await runAction(event, auth.signIn, { ...credentials, providerId: provider });
	} catch (error) {
		if (error instanceof NotLetIn) throw error.why;
		if (error instanceof CredentialsSignin) return false;
		throw error instanceof AuthError ? (error.cause?.err ?? error) : error;
	}
	return true;
}

/** Ends this browser's session and clears what it kept. */
export async function signOut(event: RequestEvent): Promise<void> {
	await runAction(event, auth.signOut, {});
	audit(event, 'sign-out.done');
	event.setHeaders({ 'clear-site-data': '"cache", "storage"' });
}

/** The session secret in this browser's cookie, or null. */
export async function sessionSecret(event: Pick<RequestEvent, 'request'>): Promise<string | null> {
	const token = await getToken({
		req: { headers: { cookie: event.request.headers.get('cookie') ?? '' } },
		cookieName: COOKIE,
		secureCookie: true,
		secret: env.AUTH_SECRET
	});
	return typeof token?.sid === 'string' ? token.sid : null;
}

async function letIn(event: RequestEvent, whoIsIt: () => Promise<string | null>) {
	try {
		const userId = await whoIsIt();
		if (!userId) return null;
		const before = await sessionSecret(event);
		const visitor: Visitor = {
			network: networkOf(event),
			userAgent: event.request.headers.get('user-agent') ?? ''
		};
		const sid = await write(async (tx) => {
			if (before) await endSessionOf(tx, before);
			return openSession(tx, userId, visitor);
		});
		audit(event, 'sign-in.done', { person: userId });
		return { id: userId, sid };
	} catch (error) {
		if (error instanceof TooMany || error instanceof NotFound) throw new NotLetIn(error);
		throw error;
	}
}

/**
 * Runs one of Auth.js's form actions with a form and headers of our own making, so that nothing the client
 * sends reaches it but its cookie and its name, and only the session cookie comes back.
 */
async function runAction(event: RequestEvent, action: Action, form: Record<string, string>): Promise<void> {
	const request = new Request(env.ORIGIN, {
		method: 'POST',
		headers: {
			host: new URL(env.ORIGIN).host,
			cookie: event.request.headers.get('cookie') ?? '',
			'user-agent': event.request.headers.get('user-agent') ?? ''
		},
		body: new URLSearchParams(form)
	});
	const cookies = {
		...event.cookies,
		set: (name: string, value: string, options: Parameters<typeof event.cookies.set>[2]) => {
			if (name.startsWith(COOKIE)) event.cookies.set(name, value, { ...options, ...cookie });
		}
	};
	try {
		await action({ ...event, request, url: new URL(env.ORIGIN), cookies });
	} catch (done) {
		if (!isRedirect(done)) throw done;
	}
}
