import { sql } from 'drizzle-orm';
import { mkdtempSync, readFileSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { openDatabase, type Database } from '../../src/lib/server/db/client';
import { makePerson, openServersDatabase, PASSWORD, signedIn } from '../factories/people';
import { freePort, settings, startServer, untilReady } from '../setup/server';
import { Browser, linkIn } from './browser';
import { inject } from 'vitest';

let db: Database;
beforeAll(async () => {
	db = await openServersDatabase();
});
afterAll(() => db.close());

const lines = (path: string) =>
	readFileSync(path, 'utf8')
		.split('\n')
		.filter((line) => line !== '' && !line.startsWith('Listening on'));
const events = (path: string) => lines(path).map((line) => JSON.parse(line) as Record<string, unknown>);

describe('the log (ASVS 16)', () => {
	it('notes failures, denials and changed roles: one line of JSON each, in UTC, with who and from where', async () => {
		const owner = await signedIn(db);
		const member = await makePerson(db, { room: owner.roomId, role: 'member' });
		const viewer = await signedIn(db, { room: owner.roomId, role: 'viewer' });
		const guesser = new Browser();
		await guesser.post('/sign-in?/password', { email: member.email, password: 'wrong on purpose' });
		await viewer.browser.post('/room?/invite', { role: 'owner' });
		await owner.browser.post('/room?/changeRole', { person: member.id, role: 'viewer' });
		await new Browser().ask('/account');
		await new Browser().ask(`/api/rooms/${owner.roomId}/export`);

		const all = events(inject('server').log);
		for (const { time, level } of all) {
			expect(time).toMatch(/^\d{4}-\d\d-\d\dT\d\d:\d\d:\d\d\.\d{3}Z$/);
			expect(typeof level).toBe('number');
		}
		expect(all).toContainEqual(
			expect.objectContaining({ event: 'sign-in.wrong', account: member.id, network: guesser.from })
		);
		expect(all).toContainEqual(
			expect.objectContaining({ event: 'sign-in.done', person: owner.id, network: owner.browser.from })
		);
		expect(all).toContainEqual(
			expect.objectContaining({ route: '/(app)/room', status: 403, actor: viewer.id })
		);
		expect(all).toContainEqual(
			expect.objectContaining({
				event: 'room.role-changed',
				actor: owner.id,
				person: member.id,
				role: 'viewer'
			})
		);
		expect(all).toContainEqual(expect.objectContaining({ status: 401, actor: null }));
	});

	it('holds no secret, no form and no forged line', async () => {
		const { browser, email } = await signedIn(db);
		const forged = 'Fern"}\n{"event":"forged"}';
		await browser.post('/account?/rename', { name: forged });
		await new Browser().post('/reset', { email });
		const link = await linkIn(email, /new password/);
		await new Browser().post(link, { password: 'qwertyuiop' });
		await new Browser().post(link, { password: 'twelve quires of kraft' });
		const log = lines(inject('server').log).join('\n');
		const secrets = [
			PASSWORD,
			'twelve quires',
			email,
			browser.session ?? 'x',
			link.split('/').at(-1) ?? 'x',
			'forged'
		];
		for (const secret of secrets) expect(log).not.toContain(secret);
	});
});

describe('a broken database (ASVS 16.5)', () => {
	it('is answered with a number to name it by, fails closed, and is logged without what was bound', async () => {
		const folder = mkdtempSync(join(tmpdir(), 'paperlarder-broken-'));
		const log = join(folder, 'server.log');
		const origin = `http://127.0.0.1:${await freePort()}`;
		const server = startServer(settings(origin, folder), log);
		await untilReady(origin, server);
		const broken = await openDatabase(`file:${join(folder, 'paperlarder.db')}`);
		const headers = { origin, accept: 'text/html', 'content-type': 'application/x-www-form-urlencoded' };
		const ask = (path: string, fields?: Record<string, string>) =>
			fetch(origin + path, {
				redirect: 'manual',
				headers,
				...(fields && { method: 'POST', body: new URLSearchParams(fields) })
			});
		try {
			await broken.write((tx) => tx.run(sql`alter table attempts rename to attempts_gone`));
			const fields = { email: 'fern@paperlarder.test', password: 'a very private phrase' };
			const answer = await ask('/sign-in?/password', fields);
			expect(answer.status).toBe(500);
			expect(answer.headers.get('set-cookie')).toBeNull();
			const text = await answer.text();
			const id = answer.headers.get('x-request-id') ?? '';
			expect(text).toContain(id);
			expect(text).not.toMatch(/SQLITE|attempts|select|insert|node_modules/i);
			expect((await ask('/healthz')).status).toBe(200);

			const failure = events(log).find(({ event }) => event === 'failed');
			expect(failure).toMatchObject({ request: id, code: expect.stringMatching(/^SQLITE_/) as string });
			expect(readFileSync(log, 'utf8')).not.toMatch(/very private|fern@paperlarder/);
		} finally {
			broken.close();
			server.kill('SIGTERM');
			await new Promise((resolve) => server.once('exit', resolve));
			rmSync(folder, { recursive: true });
		}
	});
});
