import { eq, sql } from 'drizzle-orm';
import type { Transaction } from '../db/client';
import { rooms } from '../db/schema/rooms';

/** Marks the room as changed; every write to what a room owns calls it once, in its own transaction. */
export async function touchRoom(tx: Transaction, roomId: string): Promise<void> {
	await tx
		.update(rooms)
		.set({ revision: sql`${rooms.revision} + 1` })
		.where(eq(rooms.id, roomId));
}
