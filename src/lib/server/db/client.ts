import { createClient, type Client, type ResultSet } from '@libsql/client';
import { sql } from 'drizzle-orm';
import { drizzle, type LibSQLDatabase } from 'drizzle-orm/libsql';
import { migrate } from 'drizzle-orm/libsql/migrator';
import type { BaseSQLiteDatabase } from 'drizzle-orm/sqlite-core';
import { setTimeout as pause } from 'node:timers/promises';
import { databaseCode } from '../errors';

/** Anything that can be read from: the reader, or a transaction that is under way. */
export type Reader = BaseSQLiteDatabase<'async', ResultSet>;
export type Transaction = Parameters<Parameters<LibSQLDatabase['transaction']>[0]>[0];
type Write = <T>(work: (tx: Transaction) => Promise<T>) => Promise<T>;

export interface Database {
	readonly reader: Reader;
	readonly write: Write;
	/** Brings the schema up to date; safe when two processes start at once. */
	readonly migrate: (folder: string) => Promise<void>;
	readonly close: () => void;
}

/** The running application's database, there once `connect` has been called. */
export let reader: Reader;
export let write: Write;

export function connect(database: Database): void {
	({ reader, write } = database);
}

/** How long a write keeps trying while another process holds the file. */
const PATIENCE_MS = 10_000;

/**
 * Opens a database by address: `file:…` or `libsql://…`.
 * @throws the driver's error where it cannot be opened, or where it would not keep foreign keys.
 */
export async function openDatabase(url: string, authToken?: string): Promise<Database> {
	const writer = createClient({ url, authToken, concurrency: 1, timeout: 300 });
	const readers = createClient({ url, authToken, timeout: 300 });
	const writing: LibSQLDatabase = drizzle(writer);
	if (url.startsWith('file:')) await whileBusy(writer, () => writer.execute('PRAGMA journal_mode = WAL'));
	await assertForeignKeys(writer);

	let last: Promise<unknown> = Promise.resolve();
	const write: Write = (work) => {
		const turn = last.then(() => whileBusy(writer, () => writing.transaction(work)));
		last = turn.catch(() => undefined);
		return turn;
	};

	return {
		reader: drizzle(readers) as LibSQLDatabase,
		write,
		migrate: (migrationsFolder) => migrateOnce(writer, migrationsFolder),
		close: () => {
			writer.close();
			readers.close();
		}
	};
}

/**
 * Runs and runs again while the file is held elsewhere. After one SQLITE_BUSY a libSQL connection's later
 * commits fail, so each retry has a new one.
 */
async function whileBusy<T>(client: Client, work: () => Promise<T>): Promise<T> {
	const giveUp = Date.now() + PATIENCE_MS;
	for (let wait = 5; ; wait = Math.min(wait * 2, 200)) {
		try {
			return await work();
		} catch (error) {
			if (!/^SQLITE_(BUSY|LOCKED)/.test(databaseCode(error) ?? '') || Date.now() > giveUp) throw error;
			await client.reconnect();
			await pause(wait);
		}
	}
}

/** A second starter finds the first one's tables half way through its own list, so it looks again. */
async function migrateOnce(writer: Client, migrationsFolder: string): Promise<void> {
	for (let tries = 5; ; tries--) {
		try {
			return await whileBusy(writer, () => migrate(drizzle(writer) as LibSQLDatabase, { migrationsFolder }));
		} catch (error) {
			if (tries === 0) throw error;
			await pause(200);
		}
	}
}

async function assertForeignKeys(client: Client): Promise<void> {
	const { rows } = await client.execute('PRAGMA foreign_keys');
	if (rows[0]?.[0] !== 1) throw new Error('The database does not enforce foreign keys.');
}

/** The cheapest question that only a working, migrated database answers. */
export async function answersReads(db: Reader): Promise<boolean> {
	const rows = await db.all(sql`select 1 from sqlite_master where name = 'rooms'`);
	return rows.length === 1;
}
