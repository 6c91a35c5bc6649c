import { eq } from 'drizzle-orm';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { Database } from '../../src/lib/server/db/client';
import { outbox } from '../../src/lib/server/db/schema/outbox';
import { tokens, users } from '../../src/lib/server/db/schema/people';
import { hashSecret } from '../../src/lib/server/secrets';
import { makePerson, openServersDatabase, PASSWORD, signedIn } from '../factories/people';
import { Browser, lettersTo, linkIn } from './browser';

let db: Database;
beforeAll(async () => {
	db = await openServersDatabase();
});
afterAll(() => db.close());

let nth = 0;
const freshAddress = () => `new-${Date.now()}-${nth++}@paperlarder.test`;
const isIn = async (browser: Browser) => (await browser.ask('/account')).status === 200;
const tokenOf = (path: string) => path.split('?')[0]?.split('/').at(-1) ?? '';
const expire = (path: string) =>
	db.write((tx) =>
		tx
			.update(tokens)
			.set({ expiresAt: Date.now() - 1 })
			.where(eq(tokens.hash, hashSecret(tokenOf(path))))
	);

async function askForReset(email: string, letter = 0): Promise<string> {
	await new Browser().post('/reset', { email });
	return linkIn(email, /new password/, letter);
}

describe('signing up', () => {
	it('opens the account with the link and the password together', async () => {
		const browser = new Browser();
		const email = freshAddress();
		await browser.post('/sign-up', { name: 'Sorrel', email, password: PASSWORD });
		const link = await linkIn(email, /Confirm/);
		expect((await browser.post(link, { password: 'somebody else’s' })).status).toBe(400);
		expect(await isIn(browser)).toBe(false);
		const answer = await browser.post(link, { password: PASSWORD });
		expect([answer.status, answer.headers.location]).toEqual([303, '/welcome']);
		expect(await isIn(browser)).toBe(true);
		expect((await new Browser().post(link, { password: PASSWORD })).status).toBe(404);
	});

	it('answers the same for an address that has an account, and tells its owner by letter', async () => {
		const { email } = await makePerson(db);
		const fields = { name: 'Fern', password: 'seven more quires' };
		const known = await new Browser().post('/sign-up', { ...fields, email });
		const unknown = await new Browser().post('/sign-up', { ...fields, email: freshAddress() });
		const plain = (text: string) => text.replaceAll(/new-[\w-]+|[\w-]{36}|nonce="[^"]*"/g, '·');
		expect(known.status).toBe(unknown.status);
		expect(plain(known.text)).toBe(plain(unknown.text));
		await linkIn(email, /already have/);
		expect(await isIn(await signInWith(email, 'seven more quires'))).toBe(false);
	});
});

describe('an address (ASVS 1.3.11)', () => {
	it.each([
		['a line break', 'a@paperlarder.test\r\nBcc: b@paperlarder.test'],
		['a list', 'a@paperlarder.test,b@paperlarder.test'],
		['a second @ in quotes', '"a@b"@paperlarder.test'],
		['a full-width @', 'a＠paperlarder.test'],
		['a name around it', 'Fern <a@paperlarder.test>'],
		['nothing after the @', 'a@']
	])('with %s is refused everywhere and nothing is owed', async (_, email) => {
		const before = (await db.reader.select().from(outbox)).length;
		const browser = new Browser();
		const answers = [
			await browser.post('/sign-up', { name: 'Fern', email, password: PASSWORD }),
			await browser.post('/reset', { email }),
			await browser.post('/sign-in?/link', { email })
		];
		expect(answers.map(({ status }) => status)).toEqual([400, 400, 400]);
		const owed = await db.reader.select().from(outbox);
		expect(owed.slice(before).filter(({ recipient }) => recipient.startsWith('a'))).toEqual([]);
	});
});

describe('a sign-in link (ASVS 6.5)', () => {
	it('signs in once, by pressing the button and not by being opened', async () => {
		const { email } = await makePerson(db);
		await new Browser().post('/sign-in?/link', { email });
		const link = await linkIn(email, /sign-in link/);
		for (let look = 0; look < 3; look++) expect((await new Browser().ask(link)).status).toBe(200);
		const browser = new Browser();
		expect((await browser.post(link)).status).toBe(303);
		expect(await isIn(browser)).toBe(true);
		const again = new Browser();
		expect((await again.post(link)).status).toBe(404);
		expect(await isIn(again)).toBe(false);
	});

	it('is good for ten minutes at most, and not after', async () => {
		const { email } = await makePerson(db);
		await new Browser().post('/sign-in?/link', { email });
		const link = await linkIn(email, /sign-in link/);
		const [row] = await db.reader
			.select()
			.from(tokens)
			.where(eq(tokens.hash, hashSecret(tokenOf(link))));
		expect((row?.expiresAt ?? 0) - (row?.createdAt ?? 0)).toBeLessThanOrEqual(600_000);
		await expire(link);
		expect((await new Browser().post(link)).status).toBe(404);
	});

	it('is asked for in the same words whether or not there is an account, which gets no letter', async () => {
		const { email } = await makePerson(db);
		const nobody = freshAddress();
		const known = await new Browser().post('/sign-in?/link', { email });
		const unknown = await new Browser().post('/sign-in?/link', { email: nobody });
		expect(unknown.text.includes('a link is on its way')).toBe(true);
		expect(known.text.includes('a link is on its way')).toBe(true);
		await linkIn(email, /sign-in link/);
		expect(lettersTo(nobody)).toEqual([]);
	});
});

describe('a reset link (ASVS 6.4.1)', () => {
	const password = 'nine quires of kraft';

	it('works once, ends every session and signs in where it was used', async () => {
		const person = await signedIn(db);
		const link = await askForReset(person.email);
		const browser = new Browser();
		expect((await browser.ask(link)).status).toBe(200);
		expect((await browser.post(link, { password })).status).toBe(303);
		expect(await isIn(browser)).toBe(true);
		expect(await isIn(person.browser)).toBe(false);
		expect((await new Browser().post(link, { password: 'another one again' })).status).toBe(404);
		expect(await isIn(await signInWith(person.email, password))).toBe(true);
	});

	it('is dead when late', async () => {
		const { email } = await makePerson(db);
		const link = await askForReset(email);
		const [row] = await db.reader
			.select()
			.from(tokens)
			.where(eq(tokens.hash, hashSecret(tokenOf(link))));
		expect((row?.expiresAt ?? 0) - (row?.createdAt ?? 0)).toBeLessThanOrEqual(3_600_000);
		await expire(link);
		expect((await new Browser().post(link, { password })).status).toBe(404);
	});

	it('is dead when a newer one was asked for', async () => {
		const { email } = await makePerson(db);
		const [older, newer] = [await askForReset(email), await askForReset(email, 1)];
		expect((await new Browser().post(older, { password })).status).toBe(404);
		expect((await new Browser().post(newer, { password })).status).toBe(303);
	});

	it('is hashed at rest, and gone from the outbox once sent', async () => {
		const { email } = await makePerson(db);
		const token = tokenOf(await askForReset(email));
		const kept = JSON.stringify([
			await db.reader.select().from(tokens),
			await db.reader.select().from(users),
			await db.reader.select().from(outbox).where(eq(outbox.recipient, email))
		]);
		expect(kept).toContain(hashSecret(token));
		expect(kept).not.toContain(token);
	});

	it('points at our own address whatever the request says (ASVS 4.1.3)', async () => {
		const { email } = await makePerson(db);
		const headers = { 'x-forwarded-host': 'elsewhere.example', 'x-forwarded-proto': 'https' };
		const browser = new Browser();
		await browser.post('/reset', { email }, { headers: { ...headers, host: 'elsewhere.example' } });
		await linkIn(email, /new password/);
		expect(lettersTo(email)[0]?.text).toContain(`${browser.origin}/reset/`);
		expect(lettersTo(email)[0]?.text).not.toContain('elsewhere');
	});

	it('is mailed to one address five times an hour at most', async () => {
		const { email } = await makePerson(db);
		for (let ask = 0; ask < 8; ask++) await new Browser().post('/reset', { email });
		const owed = await db.reader.select().from(outbox).where(eq(outbox.recipient, email));
		expect(owed).toHaveLength(5);
	});
});

async function signInWith(email: string, password: string): Promise<Browser> {
	const browser = new Browser();
	await browser.post('/sign-in?/password', { email, password });
	return browser;
}
