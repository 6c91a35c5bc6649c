import { and, desc, eq, gt, isNull } from 'drizzle-orm';
import type { Reader } from '../db/client';
import { sessions, users, type SiteRole } from '../db/schema/people';
import { LIFETIME_MS } from '../lifetimes';
import { hashSecret } from '../secrets';

export interface SignedIn {
	readonly user: { id: string; email: string; name: string; siteRole: SiteRole };
	readonly session: { id: string; roomId: string | null };
	readonly seenAt: number;
}

/** Whose browser this is, as long as the session is alive and the account isn't disabled. */
export async function findSession(db: Reader, secret: string): Promise<SignedIn | undefined> {
	const [row] = await db
		.select({
			user: { id: users.id, email: users.email, name: users.name, siteRole: users.siteRole },
			session: { id: sessions.id, roomId: sessions.roomId },
			seenAt: sessions.seenAt
		})
		.from(sessions)
		.innerJoin(users, eq(users.id, sessions.userId))
		.where(and(eq(sessions.secretHash, hashSecret(secret)), alive(), isNull(users.disabledAt)));
	return row;
}

export interface ListedSession {
	readonly id: string;
	readonly userAgent: string;
	readonly createdAt: number;
	readonly seenAt: number;
}

/** The person's live sessions, the one seen last first. */
export function listSessions(db: Reader, userId: string): Promise<ListedSession[]> {
	return db
		.select({
			id: sessions.id,
			userAgent: sessions.userAgent,
			createdAt: sessions.createdAt,
			seenAt: sessions.seenAt
		})
		.from(sessions)
		.where(and(eq(sessions.userId, userId), alive()))
		.orderBy(desc(sessions.seenAt));
}

export async function findAccount(db: Reader, email: string) {
	const [row] = await db
		.select({ id: users.id, passwordHash: users.passwordHash, disabledAt: users.disabledAt })
		.from(users)
		.where(eq(users.email, email));
	return row;
}

export async function hasPassword(db: Reader, userId: string): Promise<boolean> {
	const [row] = await db.select({ passwordHash: users.passwordHash }).from(users).where(eq(users.id, userId));
	return typeof row?.passwordHash === 'string';
}

function alive() {
	const now = Date.now();
	return and(
		isNull(sessions.endedAt),
		gt(sessions.createdAt, now - LIFETIME_MS.session),
		gt(sessions.seenAt, now - LIFETIME_MS.idle)
	);
}
