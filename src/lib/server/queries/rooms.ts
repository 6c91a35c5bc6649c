import { and, eq, getTableColumns, gt, isNull } from 'drizzle-orm';
import type { RoomRole, RoomSettings } from '../../schemas/rooms';
import type { Reader } from '../db/client';
import { users } from '../db/schema/people';
import { invitations, memberships, rooms } from '../db/schema/rooms';
import { NotFound } from '../errors';
import { hashSecret } from '../secrets';
import type { Actor } from '../session';

export async function findMembership(
	db: Reader,
	userId: string,
	roomId: string
): Promise<{ role: RoomRole; pricesShown: boolean } | undefined> {
	const [row] = await db
		.select({ role: memberships.role, pricesShown: rooms.pricesShown })
		.from(memberships)
		.innerJoin(rooms, eq(rooms.id, memberships.roomId))
		.where(and(eq(memberships.roomId, roomId), eq(memberships.userId, userId)));
	return row;
}

export interface ListedRoom {
	readonly id: string;
	readonly name: string;
	readonly role: RoomRole;
}

/** The rooms somebody is of, the oldest membership first. */
export function listRooms(db: Reader, userId: string): Promise<ListedRoom[]> {
	return db
		.select({ id: rooms.id, name: rooms.name, role: memberships.role })
		.from(memberships)
		.innerJoin(rooms, eq(rooms.id, memberships.roomId))
		.where(eq(memberships.userId, userId))
		.orderBy(memberships.joinedAt);
}

export type RoomDetail = RoomSettings & { id: string; revision: number; setUp: boolean };

/** @throws {NotFound} */
export async function getRoom(db: Reader, actor: Actor): Promise<RoomDetail> {
	const { createdAt: _, ...columns } = getTableColumns(rooms);
	const [room] = await db.select(columns).from(rooms).where(eq(rooms.id, actor.roomId));
	if (!room) throw new NotFound();
	return room;
}

export interface RoomPerson {
	readonly id: string;
	readonly name: string;
	readonly email: string;
	readonly role: RoomRole;
	readonly joinedAt: number;
}

/** The room's people; only owners see addresses, others get them blank. */
export async function listPeople(db: Reader, actor: Actor): Promise<RoomPerson[]> {
	const people = await db
		.select({
			id: users.id,
			name: users.name,
			email: users.email,
			role: memberships.role,
			joinedAt: memberships.joinedAt
		})
		.from(memberships)
		.innerJoin(users, eq(users.id, memberships.userId))
		.where(eq(memberships.roomId, actor.roomId))
		.orderBy(memberships.joinedAt);
	return actor.role === 'owner' ? people : people.map((person) => ({ ...person, email: '' }));
}

export interface OpenInvitation {
	readonly id: string;
	readonly role: RoomRole;
	readonly expiresAt: number;
}

/** The room's invitations that would still let somebody in. */
export function listInvitations(db: Reader, actor: Actor): Promise<OpenInvitation[]> {
	return db
		.select({ id: invitations.id, role: invitations.role, expiresAt: invitations.expiresAt })
		.from(invitations)
		.where(and(eq(invitations.roomId, actor.roomId), stillOpen()))
		.orderBy(invitations.createdAt);
}

/** What an invitation's link lets its holder know before she accepts. @throws {NotFound} */
export async function findInvitation(
	db: Reader,
	secret: string
): Promise<{ room: string; role: RoomRole; invitedBy: string }> {
	const [invitation] = await db
		.select({ room: rooms.name, role: invitations.role, invitedBy: users.name })
		.from(invitations)
		.innerJoin(rooms, eq(rooms.id, invitations.roomId))
		.innerJoin(users, eq(users.id, invitations.createdBy))
		.where(and(eq(invitations.hash, hashSecret(secret)), stillOpen()));
	if (!invitation) throw new NotFound(INVITATION_OVER);
	return invitation;
}

export const INVITATION_OVER = 'This invitation has been used, taken back, or has run out.';

export function stillOpen() {
	return and(
		isNull(invitations.usedAt),
		isNull(invitations.revokedAt),
		gt(invitations.expiresAt, Date.now())
	);
}
