import { constants } from 'node:fs';
import { access, mkdir } from 'node:fs/promises';
import { resolve } from 'node:path';
import { connect, openDatabase, type Database } from './db/client';
import { readEnv, settle, type Env } from './env';
import { log } from './log';
import { startSender } from './mail/sender';
import { setHeadersOnEverything } from './transport-headers';

/**
 * Brings the server up: settings, data folder, database, mail.
 * @throws {Error} with a sentence for whoever starts it
 */
export async function start(source: Record<string, string | undefined>): Promise<void> {
	const env = readEnv(source);
	settle(env);
	log.level = env.LOG_LEVEL;
	await prepareFolder(env.DATA_DIR);
	const database = await prepareDatabase(env);
	connect(database);
	const stopSending = env.SMTP_URL
		? startSender(database, { smtpUrl: env.SMTP_URL, from: env.MAIL_FROM })
		: undefined;
	if (!stopSending) log.warn('mail.waits: SMTP_URL is not set, so letters wait in the outbox');
	setHeadersOnEverything();
	process.once('sveltekit:shutdown', async () => {
		await stopSending?.();
		database.close();
	});
}

async function prepareFolder(folder: string): Promise<void> {
	try {
		await mkdir(folder, { recursive: true });
		await access(folder, constants.R_OK | constants.W_OK);
	} catch {
		throw new Error(`DATA_DIR can’t be written to: ${folder}`);
	}
}

async function prepareDatabase(env: Env): Promise<Database> {
	try {
		const database = await openDatabase(env.DATABASE_URL, env.DATABASE_AUTH_TOKEN);
		await database.migrate(resolve('drizzle'));
		return database;
	} catch (error) {
		throw new Error(`The database can’t be opened or brought up to date: ${(error as Error).message}`, {
			cause: error
		});
	}
}
