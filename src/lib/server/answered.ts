import type { MatchReply } from '../workers/match';
import { Invalid } from './errors';

/** What the matcher answered. @throws {Invalid} with every issue of what it was asked */
export function answered(reply: MatchReply): Extract<MatchReply, { ok: true }> {
	if (reply.ok) return reply;
	throw new Invalid(reply.issues.map(({ path, message }) => ({ path: path.split('.'), message })));
}
