import { eq } from 'drizzle-orm';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { Database } from '../../src/lib/server/db/client';
import { sessions } from '../../src/lib/server/db/schema/people';
import { newSecret } from '../../src/lib/server/secrets';
import { changeSiteRole, disableAccount } from '../../src/lib/server/services/people';
import { openServersDatabase, PASSWORD, signedIn, type Person } from '../factories/people';
import { Browser } from './browser';

let db: Database;
beforeAll(async () => {
	db = await openServersDatabase();
});
afterAll(() => db.close());

const isIn = async (browser: Browser) => (await browser.ask('/account')).status === 200;
const signIn = async (email: string, password = PASSWORD) => {
	const browser = new Browser();
	await browser.post('/sign-in?/password', { email, password });
	return browser;
};
const withCookie = (cookie: string) => {
	const browser = new Browser();
	browser.cookies.set('__Host-paperlarder', cookie);
	return browser;
};
const sessionsOf = (person: Person) =>
	db.reader.select().from(sessions).where(eq(sessions.userId, person.id));

describe('the cookie (ASVS 3.3)', () => {
	it('is __Host-, Secure, HttpOnly and SameSite', async () => {
		const { email } = await signedIn(db);
		const answer = await new Browser().post('/sign-in?/password', { email, password: PASSWORD });
		const cookies = answer.headers['set-cookie'] ?? [];
		expect(cookies).toHaveLength(1);
		expect(cookies[0]).toMatch(/^__Host-paperlarder=/);
		for (const part of [/; Path=\//i, /; HttpOnly/i, /; Secure/i, /; SameSite=Lax/i]) {
			expect(cookies[0]).toMatch(part);
		}
		expect(cookies[0]).not.toMatch(/; Domain/i);
	});

	it('is refused where anything in it is changed', async () => {
		const { browser } = await signedIn(db);
		const cookie = browser.session ?? '';
		const at = cookie.length - 30;
		const other = cookie[at] === 'A' ? 'B' : 'A';
		expect(await isIn(withCookie(cookie.slice(0, at) + other + cookie.slice(at + 1)))).toBe(false);
	});
});

describe('secrets (ASVS 7.2.3, 11.5.1)', () => {
	it('are 256 random bits, no two alike', () => {
		const made = Array.from({ length: 1000 }, newSecret);
		expect(new Set(made).size).toBe(1000);
		for (const secret of made) expect(Buffer.from(secret, 'base64url')).toHaveLength(32);
		// Each bit is set about half the time: within six standard deviations.
		const bytes = made.map((secret) => Buffer.from(secret, 'base64url'));
		for (let bit = 0; bit < 256; bit++) {
			const set = bytes.filter((all) => ((all[bit >> 3] ?? 0) >> (bit & 7)) & 1).length;
			expect(Math.abs(set - 500)).toBeLessThan(95);
		}
	});

	it('of sessions are kept as a hash only', async () => {
		const person = await signedIn(db);
		const [row] = await sessionsOf(person);
		expect(row?.secretHash).toMatch(/^[\w-]{43}$/);
		expect(person.browser.session).not.toContain(row?.secretHash);
	});
});

describe('a session (ASVS 7)', () => {
	it('is a new one after signing in, and the old one is dead', async () => {
		const { browser, email } = await signedIn(db);
		const before = browser.session ?? '';
		await browser.post('/sign-in?/password', { email, password: PASSWORD });
		expect(browser.session).not.toBe(before);
		expect(await isIn(browser)).toBe(true);
		expect(await isIn(withCookie(before))).toBe(false);
	});

	it.each([
		['idle for 15 days', { seenAt: Date.now() - 15 * 86_400_000 }],
		['begun 91 days ago', { createdAt: Date.now() - 91 * 86_400_000 }]
	])('%s is over', async (_, when) => {
		const person = await signedIn(db);
		await db.write((tx) => tx.update(sessions).set(when).where(eq(sessions.userId, person.id)));
		expect(await isIn(person.browser)).toBe(false);
	});

	it('idle for 13 days is not', async () => {
		const person = await signedIn(db);
		const seenAt = Date.now() - 13 * 86_400_000;
		await db.write((tx) => tx.update(sessions).set({ seenAt }).where(eq(sessions.userId, person.id)));
		expect(await isIn(person.browser)).toBe(true);
		expect((await sessionsOf(person))[0]?.seenAt).toBeGreaterThan(seenAt);
	});

	it('is over after signing out, for pages and their data, and the browser is told to forget', async () => {
		const { browser } = await signedIn(db);
		const cookie = browser.session ?? '';
		const answer = await browser.post('/sign-out');
		expect(answer.status).toBe(303);
		expect(answer.headers['clear-site-data']).toContain('"cache"');
		expect(answer.headers['clear-site-data']).toContain('"storage"');
		expect(browser.session).toBeUndefined();
		const replay = withCookie(cookie);
		expect((await replay.ask('/account')).status).toBe(303);
		const data = await replay.ask('/account/__data.json');
		expect(JSON.parse(data.text)).toMatchObject({ type: 'redirect' });
		expect(data.text).not.toContain('@paperlarder.test');
	});

	it('keeps nothing of a signed-in page in any cache (ASVS 14.3)', async () => {
		const { browser } = await signedIn(db);
		for (const path of ['/account', '/account/__data.json', '/room']) {
			expect((await browser.ask(path)).headers['cache-control'], path).toContain('no-store');
		}
	});
});

describe('what ends the others', () => {
	it('changing the password does, and only keeps this one', async () => {
		const { browser, email } = await signedIn(db);
		const other = await signIn(email);
		const answer = await browser.post('/account?/changePassword', {
			current: PASSWORD,
			password: 'eight quires of kraft'
		});
		expect(answer.status).toBe(200);
		expect(await isIn(browser)).toBe(true);
		expect(await isIn(other)).toBe(false);
		expect(await isIn(await signIn(email))).toBe(false);
		expect(await isIn(await signIn(email, 'eight quires of kraft'))).toBe(true);
	});

	it('needs the password she has', async () => {
		const { browser, email } = await signedIn(db);
		const fields = { current: 'something else', password: 'eight quires of kraft' };
		expect((await browser.post('/account?/changePassword', fields)).status).toBe(400);
		expect(await isIn(await signIn(email))).toBe(true);
	});

	it('disabling the account does, and nobody signs in to it again', async () => {
		const person = await signedIn(db);
		await db.write((tx) => disableAccount(tx, person.id));
		expect(await isIn(person.browser)).toBe(false);
		expect(await isIn(await signIn(person.email))).toBe(false);
	});

	it('changing a site role does', async () => {
		const person = await signedIn(db);
		await db.write((tx) => changeSiteRole(tx, person.id, 'moderator'));
		expect(await isIn(person.browser)).toBe(false);
	});

	it('she does, one by one or all at once', async () => {
		const person = await signedIn(db);
		const [second, third] = [await signIn(person.email), await signIn(person.email)];
		const rows = await sessionsOf(person);
		const last = rows.sort((a, b) => b.createdAt - a.createdAt)[0]?.id ?? '';
		expect((await person.browser.post('/account?/endSession', { session: last })).status).toBe(303);
		expect([await isIn(person.browser), await isIn(second), await isIn(third)]).toEqual([true, true, false]);
		expect((await person.browser.post('/account?/endOthers')).status).toBe(303);
		expect([await isIn(person.browser), await isIn(second)]).toEqual([true, false]);
	});

	it('nobody else does', async () => {
		const [a, b] = [await signedIn(db), await signedIn(db)];
		const [row] = await sessionsOf(a);
		const answer = await b.browser.post('/account?/endSession', { session: row?.id ?? '' });
		expect(answer.status).toBe(404);
		expect(await isIn(a.browser)).toBe(true);
	});
});
