import { mkdtempSync, readFileSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { startFakeMail } from '../fakes/mail-server';
import { freePort, settings, startServer, untilReady } from './server';

/** The built server for the journeys, empty, beside a mail server whose letters the tests read. */
export default async function setup(): Promise<() => Promise<void>> {
	const folder = mkdtempSync(join(tmpdir(), 'paperlarder-journeys-'));
	const log = join(folder, 'server.log');
	const mail = await startFakeMail(join(folder, 'mail'));
	const origin = `http://localhost:${await freePort()}`;
	const server = startServer(
		{ ...settings(origin, folder), SMTP_URL: `smtp://127.0.0.1:${mail.port}`, RATE_LIMITS: 'off' },
		log
	);
	await untilReady(origin, server).catch((error: unknown) => {
		throw new Error(`${(error as Error).message}\n${readFileSync(log, 'utf8')}`);
	});
	process.env.E2E_ORIGIN = origin;
	process.env.E2E_FOLDER = folder;
	return async () => {
		const gone = new Promise((resolve) => server.once('exit', resolve));
		server.kill('SIGTERM');
		await gone;
		await mail.close();
		rmSync(folder, { recursive: true });
	};
}
