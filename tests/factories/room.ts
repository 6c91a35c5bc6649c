import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { v7 } from 'uuid';
import { afterAll } from 'vitest';
import { openDatabase, type Database } from '../../src/lib/server/db/client';
import { users } from '../../src/lib/server/db/schema/people';
import { memberships, rooms } from '../../src/lib/server/db/schema/rooms';
import type { Actor } from '../../src/lib/server/session';

/** A database of the test file's own, migrated and empty, gone when the file has run. */
export async function emptyDatabase(): Promise<Database> {
	const folder = mkdtempSync(join(tmpdir(), 'paperlarder-'));
	const database = await openDatabase(`file:${join(folder, 'test.db')}`);
	await database.migrate('drizzle');
	afterAll(() => {
		database.close();
		rmSync(folder, { recursive: true });
	});
	return database;
}

/** A room in inches with one person of that role in it. */
export async function makeRoom(
	{ write }: Database,
	set: Partial<typeof rooms.$inferInsert> = {},
	role: Actor['role'] = 'owner'
): Promise<Actor> {
	const roomId = v7();
	const room = { id: roomId, name: 'Back bedroom', createdAt: Date.now(), ...set };
	await write((tx) => tx.insert(rooms).values(room));
	return joinRoom({ write }, roomId, role, set.pricesShown ?? false);
}

export async function joinRoom(
	{ write }: Pick<Database, 'write'>,
	roomId: string,
	role: Actor['role'],
	pricesShown = false
): Promise<Actor> {
	const userId = v7();
	await write(async (tx) => {
		const email = `${userId}@paperlarder.test`;
		await tx
			.insert(users)
			.values({ id: userId, email, name: `Maker ${userId.slice(-4)}`, createdAt: Date.now() });
		await tx.insert(memberships).values({ roomId, userId, role, joinedAt: Date.now() });
	});
	return { userId, roomId, role, seesPrices: role !== 'viewer' || pricesShown };
}
