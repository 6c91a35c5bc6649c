import type { Handle } from '@sveltejs/kit';
import { sessionSecret } from '../../../auth';
import { reader, write } from '../db/client';
import { env } from '../env';
import { describeError, log } from '../log';
import { findSession } from '../queries/people';
import { isSeenStale, noteSeen } from '../services/sessions';

/** Looks the session up at every request, so that one which has been ended is over at once. */
export const identify: Handle = async ({ event, resolve }) => {
	const secret = await sessionSecret(event);
	const signedIn = secret ? await findSession(reader, secret) : undefined;
	if (signedIn) {
		const { user, session, seenAt } = signedIn;
		event.locals.user = user.email === env.ADMIN_EMAIL ? { ...user, siteRole: 'admin' } : user;
		event.locals.session = session;
		if (isSeenStale(seenAt)) await note(session.id);
	}
	return resolve(event);
};

/** What can be read is read even where nothing can be written. */
async function note(sessionId: string): Promise<void> {
	try {
		await write((tx) => noteSeen(tx, sessionId));
	} catch (error) {
		log.warn(describeError(error), 'session.not-noted');
	}
}
