import { dictionary } from '@zxcvbn-ts/language-common';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { Database } from '../../src/lib/server/db/client';
import { makePerson, openServersDatabase, PASSWORD } from '../factories/people';
import { anotherNetwork, Browser } from './browser';

let db: Database;
beforeAll(async () => {
	db = await openServersDatabase();
});
afterAll(() => db.close());

const signUp = (browser: Browser, password: string) =>
	browser.post('/sign-up', { name: 'Fern', email: `${Date.now()}@paperlarder.test`, password });
const trySignIn = (browser: Browser, email: string, password = 'not the password') =>
	browser.post('/sign-in?/password', { email, password });

describe('choosing a password (ASVS 6.2)', () => {
	it.each([
		['eight characters', 'mq7zkwpv'],
		['a hundred and twenty-eight', 'k'.repeat(64) + 'z'.repeat(64)],
		['a thousand', 'gluestick '.repeat(100)],
		['emoji alone', '📐✂️📐🧷📎✂️🧵📐'],
		['only lower-case letters', 'bonefolderbesidethelamp'],
		['spaces at both ends', '  a folio of four  ']
	])('takes %s', async (_, password) => {
		const answer = await signUp(new Browser(), password);
		expect(answer.status).toBe(200);
		expect(answer.text).toContain('Look in your mail');
	});

	it.each([
		['seven characters', 'mq7zkwp', 400],
		['more than a thousand', 'a'.repeat(1001), 400]
	])('refuses %s', async (_, password, status) => {
		expect((await signUp(new Browser(), password)).status).toBe(status);
	});

	it('keeps the spaces that it was typed with', async () => {
		const person = await makePerson(db);
		const browser = new Browser();
		expect((await trySignIn(browser, person.email, `${PASSWORD} `)).status).toBe(400);
		expect((await trySignIn(browser, person.email, PASSWORD)).status).toBe(303);
	});

	it('knows at least 3,000 common ones that are long enough, and refuses a sample in any case', async () => {
		const long = dictionary['passwords-common'].filter((word) => word.length >= 8);
		expect(long.length).toBeGreaterThan(3_000);
		const browser = new Browser();
		for (const word of [long[0], long[999], long[2_999], long[1]?.toUpperCase()]) {
			const answer = await signUp(browser, word ?? '');
			expect(answer.status, word).toBe(400);
			expect(answer.text).toContain('tried first');
		}
	});

	it('lets passwords be pasted and kept by a manager', async () => {
		const { text } = await new Browser().ask('/sign-up');
		expect(text).toMatch(/<input[^>]*autocomplete="new-password"/);
		expect(text).not.toContain('onpaste');
	});
});

describe('guessing (ASVS 6.3.1)', () => {
	it('holds back the eleventh guess at one account, from however many networks', async () => {
		const { email } = await makePerson(db);
		const statuses: number[] = [];
		for (let guess = 0; guess < 11; guess++) {
			statuses.push((await trySignIn(new Browser(), email)).status);
		}
		expect(statuses.slice(0, 10)).toEqual(Array(10).fill(400));
		expect(statuses[10]).toBe(429);
	});

	it('lets the owner in meanwhile, from elsewhere, with the right password', async () => {
		const { email } = await makePerson(db);
		for (let guess = 0; guess < 12; guess++) await trySignIn(new Browser(), email);
		expect((await trySignIn(new Browser(), email, PASSWORD)).status).toBe(303);
	});

	it('holds back the eleventh guess from one network, at however many accounts, right or wrong', async () => {
		const network = anotherNetwork();
		const statuses: number[] = [];
		for (let guess = 0; guess < 10; guess++) {
			const { email } = await makePerson(db);
			statuses.push((await trySignIn(new Browser(network), email)).status);
		}
		expect(statuses).toEqual(Array(10).fill(400));
		const { email } = await makePerson(db);
		const held = await trySignIn(new Browser(network), email, PASSWORD);
		expect(held.status).toBe(429);
		expect(Number(held.headers['retry-after'])).toBeGreaterThan(0);
		expect((await trySignIn(new Browser(), email, PASSWORD)).status).toBe(303);
	});

	it('counts guesses that are sent all at once', async () => {
		const { email } = await makePerson(db);
		const network = anotherNetwork();
		const answers = await Promise.all(
			Array.from({ length: 25 }, () => trySignIn(new Browser(network), email))
		);
		expect(answers.filter(({ status }) => status === 400)).toHaveLength(10);
	});

	it('isn’t fooled by forwarding headers (ASVS 4.1.3)', async () => {
		const { email } = await makePerson(db);
		const browser = new Browser();
		const statuses: number[] = [];
		for (let guess = 0; guess < 11; guess++) {
			const headers = { 'x-forwarded-for': `203.0.113.${guess}`, forwarded: `for=203.0.113.${guess}` };
			const fields = { email, password: 'not the password' };
			statuses.push((await browser.post('/sign-in?/password', fields, { headers })).status);
		}
		expect(statuses[10]).toBe(429);
	});

	it('says the same of an unknown address as of a wrong password, after the same hashing', async () => {
		const { email } = await makePerson(db);
		const known = await trySignIn(new Browser(), email);
		const unknown = await trySignIn(new Browser(), `x${email}`);
		expect(unknown.status).toBe(known.status);
		expect(said(unknown.text)).toEqual(said(known.text));
		expect(said(known.text)).toContain('don’t go together');
	});
});

const said = (html: string) => /id="[^"]*-password-error"[^>]*>(.*?)<\/p>/s.exec(html)?.[1] ?? '';
