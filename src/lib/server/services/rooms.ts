import { and, count, eq, isNull } from 'drizzle-orm';
import { v7 } from 'uuid';
import type { RoomRole, RoomSettings } from '../../schemas/rooms';
import type { Transaction } from '../db/client';
import { invitations, memberships, rooms } from '../db/schema/rooms';
import { Conflict, Forbidden, NotFound } from '../errors';
import { LIFETIME_MS } from '../lifetimes';
import { INVITATION_OVER, stillOpen } from '../queries/rooms';
import { hashSecret, newSecret } from '../secrets';
import type { Actor } from '../session';
import { touchRoom } from './revision';

/** Makes a room with its maker as owner; the same id a second time changes nothing. */
export async function createRoom(
	tx: Transaction,
	userId: string,
	room: { id: string; name: string }
): Promise<void> {
	const now = Date.now();
	const made = await tx
		.insert(rooms)
		.values({ ...room, createdAt: now })
		.onConflictDoNothing()
		.returning({ id: rooms.id });
	if (made.length === 0) return;
	await tx.insert(memberships).values({ roomId: room.id, userId, role: 'owner', joinedAt: now });
}

export async function changeRoomSettings(
	tx: Transaction,
	actor: Actor,
	settings: Partial<RoomSettings & { setUp: boolean }>
): Promise<void> {
	requireOwner(actor);
	await tx.update(rooms).set(settings).where(eq(rooms.id, actor.roomId));
	await touchRoom(tx, actor.roomId);
}

/** @returns the secret of the invitation's link, which is shown once and not kept */
export async function invite(tx: Transaction, actor: Actor, role: RoomRole): Promise<string> {
	requireOwner(actor);
	const secret = newSecret();
	const now = Date.now();
	await tx.insert(invitations).values({
		id: v7(),
		hash: hashSecret(secret),
		roomId: actor.roomId,
		role,
		createdBy: actor.userId,
		createdAt: now,
		expiresAt: now + LIFETIME_MS.invitation
	});
	return secret;
}

/** @throws {NotFound} */
export async function withdrawInvitation(tx: Transaction, actor: Actor, id: string): Promise<void> {
	requireOwner(actor);
	const withdrawn = await tx
		.update(invitations)
		.set({ revokedAt: Date.now() })
		.where(and(eq(invitations.id, id), eq(invitations.roomId, actor.roomId), isNull(invitations.revokedAt)))
		.returning({ id: invitations.id });
	if (withdrawn.length === 0) throw new NotFound();
}

/** Uses an invitation up; somebody who is of the room already keeps her role. @throws {NotFound} */
export async function joinRoom(tx: Transaction, userId: string, secret: string): Promise<string> {
	const [invitation] = await tx
		.update(invitations)
		.set({ usedAt: Date.now() })
		.where(and(eq(invitations.hash, hashSecret(secret)), stillOpen()))
		.returning({ roomId: invitations.roomId, role: invitations.role });
	if (!invitation) throw new NotFound(INVITATION_OVER);
	await tx
		.insert(memberships)
		.values({ ...invitation, userId, joinedAt: Date.now() })
		.onConflictDoNothing();
	return invitation.roomId;
}

/** @throws {NotFound | Conflict} Conflict where the room would be left without an owner */
export async function changeRole(
	tx: Transaction,
	actor: Actor,
	userId: string,
	role: RoomRole
): Promise<void> {
	requireOwner(actor);
	const changed = await tx
		.update(memberships)
		.set({ role })
		.where(and(eq(memberships.roomId, actor.roomId), eq(memberships.userId, userId)))
		.returning({ userId: memberships.userId });
	if (changed.length === 0) throw new NotFound();
	await assertOwned(tx, actor.roomId);
}

/** Takes somebody out of the room; one's own id leaves it. @throws {NotFound | Conflict} */
export async function removePerson(tx: Transaction, actor: Actor, userId: string): Promise<void> {
	if (userId !== actor.userId) requireOwner(actor);
	const removed = await tx
		.delete(memberships)
		.where(and(eq(memberships.roomId, actor.roomId), eq(memberships.userId, userId)))
		.returning({ userId: memberships.userId });
	if (removed.length === 0) throw new NotFound();
	await assertOwned(tx, actor.roomId);
}

async function assertOwned(tx: Transaction, roomId: string): Promise<void> {
	const [row] = await tx
		.select({ owners: count() })
		.from(memberships)
		.where(and(eq(memberships.roomId, roomId), eq(memberships.role, 'owner')));
	if (!row?.owners) throw new Conflict('A room needs an owner: make somebody else one first.');
}

function requireOwner(actor: Actor): void {
	if (actor.role !== 'owner') throw new Forbidden();
}
