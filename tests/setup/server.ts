import { spawn, type ChildProcess } from 'node:child_process';
import { randomBytes } from 'node:crypto';
import { existsSync, mkdtempSync, rmSync } from 'node:fs';
import { createServer } from 'node:net';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { setTimeout as pause } from 'node:timers/promises';
import type { TestProject } from 'vitest/node';
import { startFakeMail } from '../fakes/mail-server';

declare module 'vitest' {
	interface ProvidedContext {
		/** The built server under test, and the folder that holds its database, mail and log. */
		server: { origin: string; folder: string; log: string };
	}
}

/** Starts the built server once, on a port and a folder of its own, with a mail server that keeps letters. */
export default async function setup(project: TestProject): Promise<() => Promise<void>> {
	if (!existsSync('build/index.js')) throw new Error('These tests need the built server: npm run build');
	const folder = mkdtempSync(join(tmpdir(), 'paperlarder-built-'));
	const mail = await startFakeMail(join(folder, 'mail'));
	const origin = `http://127.0.0.1:${await freePort()}`;
	const log = join(folder, 'server.log');
	const server = startServer({ ...settings(origin, folder), SMTP_URL: `smtp://127.0.0.1:${mail.port}` }, log);
	await untilReady(origin, server);
	project.provide('server', { origin, folder, log });
	return async () => {
		server.kill('SIGTERM');
		await new Promise((resolve) => server.once('exit', resolve));
		await mail.close();
		rmSync(folder, { recursive: true });
	};
}

/** What a server needs to start, and nothing from outside but the way to Node. */
export function settings(origin: string, folder: string): Record<string, string> {
	return {
		PATH: process.env.PATH ?? '',
		NODE_ENV: 'production',
		ORIGIN: origin,
		HOST: '127.0.0.1',
		PORT: new URL(origin).port,
		DATA_DIR: folder,
		AUTH_SECRET: randomBytes(33).toString('base64'),
		DEMO: '1',
		SHUTDOWN_TIMEOUT: '2'
	};
}

export function startServer(env: Record<string, string>, log: string): ChildProcess {
	return spawn('/bin/sh', ['-c', 'exec "$0" build >"$1" 2>&1', process.execPath, log], { env });
}

export async function untilReady(origin: string, server: ChildProcess): Promise<void> {
	for (let tries = 0; tries < 300; tries++) {
		if (server.exitCode !== null) throw new Error(`The built server stopped with ${server.exitCode}.`);
		const answer = await fetch(`${origin}/readyz`).catch(() => undefined);
		if (answer?.ok) return;
		await pause(100);
	}
	server.kill('SIGKILL');
	throw new Error('The built server did not come up.');
}

export async function freePort(): Promise<number> {
	return new Promise((resolve, reject) => {
		const probe = createServer().once('error', reject);
		probe.listen(0, '127.0.0.1', () => {
			const address = probe.address();
			probe.close(() => (address && typeof address === 'object' ? resolve(address.port) : reject()));
		});
	});
}
