import { and, eq } from 'drizzle-orm';
import type { RoomRole } from '../../schemas/rooms';
import type { Reader } from '../db/client';
import { memberships, rooms } from '../db/schema/rooms';

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
