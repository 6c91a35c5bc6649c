import { and, desc, eq, isNull, ne } from 'drizzle-orm';
import { v7 } from 'uuid';
import type { Transaction } from '../db/client';
import { sessions } from '../db/schema/people';
import { memberships } from '../db/schema/rooms';
import { NotFound } from '../errors';
import { hashSecret, newSecret } from '../secrets';

const SEEN_EVERY_MS = 5 * 60_000;

/** Where a browser is and what it calls itself. */
export interface Visitor {
	readonly network: string;
	readonly userAgent: string;
}

/**
 * Begins a session in the room this person was in last.
 * @returns the secret for the cookie; only its hash is kept
 */
export async function openSession(tx: Transaction, userId: string, visitor: Visitor): Promise<string> {
	const secret = newSecret();
	const now = Date.now();
	await tx.insert(sessions).values({
		id: v7(),
		secretHash: hashSecret(secret),
		userId,
		roomId: await lastRoom(tx, userId),
		userAgent: visitor.userAgent.slice(0, 300),
		address: visitor.network,
		createdAt: now,
		seenAt: now
	});
	return secret;
}

/** Ends the session a cookie names; does nothing where there is none. */
export async function endSessionOf(tx: Transaction, secret: string): Promise<void> {
	await end(tx, eq(sessions.secretHash, hashSecret(secret)));
}

/** @throws {NotFound} for anybody else's session */
export async function endSession(tx: Transaction, userId: string, sessionId: string): Promise<void> {
	const ended = await end(tx, and(eq(sessions.id, sessionId), eq(sessions.userId, userId)));
	if (ended === 0) throw new NotFound('That browser is signed out already.');
}

/** Ends every session of a person, but for the one kept. */
export async function endSessions(tx: Transaction, userId: string, keep?: string): Promise<void> {
	await end(tx, and(eq(sessions.userId, userId), keep ? ne(sessions.id, keep) : undefined));
}

/** Notes that a session is in use, now and then: not at every request. */
export async function noteSeen(tx: Transaction, sessionId: string): Promise<void> {
	await tx.update(sessions).set({ seenAt: Date.now() }).where(eq(sessions.id, sessionId));
}

export function isSeenStale(seenAt: number): boolean {
	return Date.now() - seenAt > SEEN_EVERY_MS;
}

/** Moves this browser into one of the person's rooms. @throws {NotFound} where she isn't of that room */
export async function chooseRoom(
	tx: Transaction,
	userId: string,
	sessionId: string,
	roomId: string
): Promise<void> {
	const [membership] = await tx
		.select({ roomId: memberships.roomId })
		.from(memberships)
		.where(and(eq(memberships.userId, userId), eq(memberships.roomId, roomId)));
	if (!membership) throw new NotFound();
	await tx
		.update(sessions)
		.set({ roomId })
		.where(and(eq(sessions.id, sessionId), eq(sessions.userId, userId)));
}

async function end(tx: Transaction, which: ReturnType<typeof and>): Promise<number> {
	const ended = await tx
		.update(sessions)
		.set({ endedAt: Date.now() })
		.where(and(which, isNull(sessions.endedAt)))
		.returning({ id: sessions.id });
	return ended.length;
}

async function lastRoom(tx: Transaction, userId: string): Promise<string | null> {
	const [last] = await tx
		.select({ roomId: sessions.roomId })
		.from(sessions)
		.innerJoin(
			memberships,
			and(eq(memberships.roomId, sessions.roomId), eq(memberships.userId, sessions.userId))
		)
		.where(eq(sessions.userId, userId))
		.orderBy(desc(sessions.seenAt))
		.limit(1);
	if (last) return last.roomId;
	const [first] = await tx
		.select({ roomId: memberships.roomId })
		.from(memberships)
		.where(eq(memberships.userId, userId))
		.orderBy(memberships.joinedAt)
		.limit(1);
	return first?.roomId ?? null;
}
