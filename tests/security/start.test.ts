import { sql } from 'drizzle-orm';
import { mkdtempSync, readdirSync, readFileSync, rmSync, statSync, writeFileSync } from 'node:fs';
import { spawnSync } from 'node:child_process';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { openDatabase } from '../../src/lib/server/db/client';
import { freePort, settings, startServer, untilReady } from '../setup/server';

let folder: string;
let usable: Record<string, string>;
let origin: string;
beforeEach(async () => {
	folder = mkdtempSync(join(tmpdir(), 'paperlarder-start-'));
	origin = `http://127.0.0.1:${await freePort()}`;
	usable = settings(origin, folder);
});
afterEach(() => rmSync(folder, { recursive: true }));

const start = (env: Record<string, string>) =>
	spawnSync(process.execPath, ['build'], { env, encoding: 'utf8', timeout: 20_000 });
const without = (name: string) => Object.fromEntries(Object.entries(usable).filter(([key]) => key !== name));
const sample = /^AUTH_SECRET=(.*)$/m.exec(readFileSync('.env.example', 'utf8'))?.[1] ?? '';

describe('the server refuses to start (ASVS 13.3.1)', () => {
	it.each([
		['without a secret', () => without('AUTH_SECRET'), /AUTH_SECRET is missing/],
		['with an empty secret', () => ({ ...usable, AUTH_SECRET: '' }), /AUTH_SECRET is missing/],
		['with the sample secret', () => ({ ...usable, AUTH_SECRET: sample }), /still the sample/],
		['with a short secret', () => ({ ...usable, AUTH_SECRET: 'hunter2' }), /too short/],
		['without its address', () => without('ORIGIN'), /ORIGIN is missing/],
		['with a data folder that is a file', () => ({ ...usable, DATA_DIR: fileInTheWay() }), /DATA_DIR/],
		[
			'with a database that is none',
			() => ({ ...usable, DATABASE_URL: `file:${fileInTheWay()}` }),
			/database/
		]
	])('%s, with a sentence', (_, env, sentence) => {
		const { status, stderr, stdout } = start(env());
		expect(status).toBe(1);
		expect(stderr).toMatch(sentence);
		expect(stderr).not.toMatch(/\n\s+at /);
		expect(stdout).not.toContain('Listening');
	});

	function fileInTheWay(): string {
		const path = join(folder, 'in-the-way');
		writeFileSync(path, 'this is no database, nor a folder\n'.repeat(100));
		return path;
	}
});

describe('a fresh server', () => {
	it('comes up twice at once on one database, with nobody in it (ASVS 6.3.2)', async () => {
		const other = `http://127.0.0.1:${await freePort()}`;
		const second = { ...usable, ORIGIN: other, PORT: new URL(other).port };
		const servers = [
			startServer(usable, join(folder, 'one.log')),
			startServer(second, join(folder, 'two.log'))
		];
		await Promise.all([untilReady(origin, servers[0]!), untilReady(other, servers[1]!)]);
		const db = await openDatabase(`file:${join(folder, 'paperlarder.db')}`);
		expect(await db.reader.all(sql`select count(*) n from users`)).toEqual([{ n: 0 }]);
		expect(await db.reader.all(sql`select count(*) n from rooms`)).toEqual([{ n: 0 }]);
		db.close();
		for (const server of servers) {
			const ended = new Promise((resolve) => server.once('exit', resolve));
			server.kill('SIGTERM');
			expect(await ended).toBe(0);
		}
	});
});

describe('what browsers are sent', () => {
	it('holds no secret and nothing of the server (ASVS 13.3.1)', () => {
		const sent = filesUnder('build/client').filter((path) => /\.(js|css|html|json)$/.test(path));
		expect(sent.length).toBeGreaterThan(10);
		for (const path of sent) {
			const text = readFileSync(path, 'utf8');
			expect(text.includes(sample), path).toBe(false);
			expect(text, path).not.toMatch(/AUTH_SECRET|DATABASE_AUTH_TOKEN|SMTP_URL|passwordHash|secretHash/);
		}
	});

	function filesUnder(folder: string): string[] {
		return readdirSync(folder).flatMap((name) => {
			const path = join(folder, name);
			return statSync(path).isDirectory() ? filesUnder(path) : [path];
		});
	}
});
