import { createClient } from '@libsql/client';
import { eq, sql } from 'drizzle-orm';
import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { setTimeout as pause } from 'node:timers/promises';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { openDatabase, type Database } from '../../src/lib/server/db/client';
import { rooms } from '../../src/lib/server/db/schema/rooms';
import { databaseCode } from '../../src/lib/server/errors';
import { log, describeError } from '../../src/lib/server/log';
import { touchRoom } from '../../src/lib/server/services/revision';

log.level = 'silent';
let folder: string;
let url: string;
let db: Database;
beforeEach(async () => {
	folder = mkdtempSync(join(tmpdir(), 'paperlarder-db-'));
	url = `file:${join(folder, 'test.db')}`;
	db = await openDatabase(url);
	await db.migrate('drizzle');
	await db.write((tx) => tx.insert(rooms).values({ id: 'attic', name: 'Attic', createdAt: 0 }));
});
afterEach(() => {
	db.close();
	rmSync(folder, { recursive: true });
});

const revision = async () => (await db.reader.select().from(rooms).where(eq(rooms.id, 'attic')))[0]?.revision;

describe('the writer', () => {
	it('loses none of fifty transactions that overlap', async () => {
		await Promise.all(Array.from({ length: 50 }, () => db.write((tx) => touchRoom(tx, 'attic'))));
		expect(await revision()).toBe(50);
	});

	it('waits while another process holds the file, and works on as before', async () => {
		const other = createClient({ url });
		const held = await other.transaction('write');
		const waiting = db.write((tx) => touchRoom(tx, 'attic'));
		await pause(1_000);
		expect(await revision()).toBe(0);
		await held.rollback();
		await waiting;
		for (let time = 0; time < 20; time++) await db.write((tx) => touchRoom(tx, 'attic'));
		expect(await revision()).toBe(21);
		other.close();
	});

	it('undoes a transaction that fails, and the next one is none the worse', async () => {
		const failing = db.write(async (tx) => {
			await touchRoom(tx, 'attic');
			throw new Error('half way');
		});
		await expect(failing).rejects.toThrow('half way');
		await db.write((tx) => touchRoom(tx, 'attic'));
		expect(await revision()).toBe(1);
	});

	it('lets others read meanwhile', async () => {
		await db.write(async (tx) => {
			await touchRoom(tx, 'attic');
			expect(await revision()).toBe(0);
		});
	});

	it('waits for the disk at every commit, and keeps foreign keys', async () => {
		const pragmas = await db.write(async (tx) => [
			...(await tx.all(sql`pragma synchronous`)),
			...(await tx.all(sql`pragma foreign_keys`)),
			...(await tx.all(sql`pragma journal_mode`))
		]);
		expect(pragmas).toEqual([{ synchronous: 2 }, { foreign_keys: 1 }, { journal_mode: 'wal' }]);
	});
});

describe('migrating', () => {
	it('does no harm when several start at once, or when there is nothing to do', async () => {
		const fresh = `file:${join(folder, 'fresh.db')}`;
		const starters = await Promise.all([openDatabase(fresh), openDatabase(fresh), openDatabase(fresh)]);
		await Promise.all(starters.map((one) => one.migrate('drizzle')));
		await starters[0]?.migrate('drizzle');
		const done = await starters[0]?.reader.all(
			sql`select count(distinct hash) n, count(*) m from __drizzle_migrations`
		);
		expect(done).toMatchObject([{ n: (done as { m: number }[])[0]?.m }]);
		for (const one of starters) one.close();
	});

	it('leaves a sound database behind', async () => {
		expect(await db.reader.all(sql`pragma integrity_check`)).toEqual([{ integrity_check: 'ok' }]);
		expect(await db.reader.all(sql`pragma foreign_key_check`)).toEqual([]);
	});
});

describe('a database error', () => {
	it('is told by its code, never by what was bound', async () => {
		const secret = 'a-bound-value';
		const failing = db.write((tx) => tx.insert(rooms).values({ id: 'attic', name: secret, createdAt: 0 }));
		const error = await failing.then(
			() => undefined,
			(thrown: unknown) => thrown
		);
		expect(databaseCode(error)).toBe('SQLITE_CONSTRAINT_PRIMARYKEY');
		expect(String((error as Error).message)).toContain(secret);
		expect(JSON.stringify(describeError(error))).not.toContain(secret);
	});
});
