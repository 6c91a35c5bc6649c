import { createHash } from 'node:crypto';
import { sql } from 'drizzle-orm';
import { readdirSync } from 'node:fs';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { Database } from '../../src/lib/server/db/client';
import { openServersDatabase, PASSWORD, signedIn, type Person } from '../factories/people';
import { project } from '../factories/project';
import { cardstock, stock } from '../factories/supply';
import { builtRoutes, pathOf, type BuiltRoute } from '../setup/routes';
import { Browser, type Answer } from './browser';

let db: Database;
let owner: Person;
let routes: BuiltRoute[];
let supplyId: string;
let projectId: string;
beforeAll(async () => {
	db = await openServersDatabase();
	owner = await signedIn(db);
	routes = builtRoutes();
	const actor = { userId: owner.id, roomId: owner.roomId, role: 'owner', seesPrices: true } as const;
	supplyId = await stock(db, actor, cardstock());
	projectId = await project(db, actor);
});
afterAll(() => db.close());

/** An address of something that is really hers, so that what it might change is there to be changed. */
const here = (id: string) =>
	pathOf(id, { room: owner.roomId, id: id.includes('/projects/') ? projectId : supplyId, token: 'x' });
const assets = () => {
	const folder = 'build/client/_app/immutable';
	const some = (kind: string) => readdirSync(`${folder}/${kind}`).slice(0, 3);
	return ['chunks', 'assets'].flatMap((kind) => some(kind).map((name) => `/_app/immutable/${kind}/${name}`));
};

describe('every answer', () => {
	const answers: [string, Answer][] = [];
	beforeAll(async () => {
		const pages = routes.filter(({ page, methods }) => page || methods.includes('GET'));
		const paths = [
			...pages.map(({ id }) => here(id)),
			...['/nowhere', '/api/nowhere', '/%E0%A4%A', '/favicon.svg', '/manifest.webmanifest'],
			...assets()
		];
		for (const path of paths) {
			answers.push(
				[path, await new Browser().ask(path)],
				[`${path} signed in`, await owner.browser.ask(path)]
			);
		}
		answers.push(['TRACE', await new Browser().ask('/', { method: 'TRACE' })]);
		answers.push(['foreign post', await new Browser().ask('/sign-out', { method: 'POST' })]);
		expect(answers.length).toBeGreaterThan(60);
	});

	it('asks for https for two years, subdomains too (ASVS 3.4.1)', () => {
		for (const [path, { headers }] of answers) {
			const [, age] = /max-age=(\d+); includeSubDomains/.exec(headers['strict-transport-security'] ?? '') ?? [
				path,
				'0'
			];
			expect(Number(age), path).toBeGreaterThanOrEqual(31_536_000);
		}
	});

	it('is not sniffed, tells no other site where it was, and is framed by nobody (ASVS 3.4.3–6)', () => {
		for (const [path, { headers }] of answers) {
			expect(headers['x-content-type-options'], path).toBe('nosniff');
			expect(['same-origin', 'no-referrer'], path).toContain(headers['referrer-policy']);
			const policy = String(headers['content-security-policy']);
			for (const rule of ["object-src 'none'", "base-uri 'none'", "frame-ancestors 'none'"]) {
				expect(policy, path).toContain(rule);
			}
			expect(policy, path).not.toMatch(/script-src[^;]*unsafe/);
		}
	});

	it('of a page allows its own scripts by nonce, a new one each time', async () => {
		const nonce = async () =>
			/'nonce-([^']+)'/.exec(
				String((await new Browser().ask('/sign-in')).headers['content-security-policy'])
			)?.[1];
		const [first, second] = [await nonce(), await nonce()];
		expect(first).toMatch(/^[\w+/]{20,}={0,2}$/);
		expect(first).not.toBe(second);
	});

	it('opens itself to no other site (ASVS 3.4.2)', async () => {
		for (const path of ['/', '/sign-in', '/api/openapi.json', `/api/rooms/${owner.roomId}/export`]) {
			const { headers } = await owner.browser.ask(path, { headers: { origin: 'https://elsewhere.test' } });
			expect(headers['access-control-allow-origin'], path).toBeUndefined();
		}
	});

	it('names its type and charset (ASVS 4.1.1)', () => {
		for (const [path, { headers, text }] of answers) {
			if (text === '') continue;
			const type = String(headers['content-type']);
			expect(type, path).toMatch(/^[a-z]+\/[a-z+.-]+/);
			if (/^text\/|xml/.test(type)) expect(type, path).toMatch(/charset=utf-8/i);
			if (/^\s*<!doctype html/i.test(text)) expect(type, path).toMatch(/^text\/html/);
			if (type.startsWith('application/json')) expect(() => JSON.parse(text), path).not.toThrow();
		}
	});

	it('gives away neither the code’s history, nor settings, nor maps (ASVS 13.4)', async () => {
		for (const path of ['/.git/HEAD', '/.env', '/package.json', '/server/index.js', `${assets()[0]}.map`]) {
			expect((await new Browser().ask(path)).status, path).toBe(404);
		}
		const trace = answers.find(([path]) => path === 'TRACE')?.[1];
		expect(trace?.status).toBeGreaterThanOrEqual(400);
		expect(trace?.text).not.toMatch(/cookie/i);
	});
});

describe('what would change something', () => {
	const bodies: [string, string | undefined, string][] = [
		['a form', 'application/x-www-form-urlencoded', 'name=Stolen'],
		['a multipart form', 'multipart/form-data; boundary=x', '--x--'],
		['plain text', 'text/plain', '{"name":"Stolen"}'],
		['no type', undefined, '{"name":"Stolen"}'],
		['JSON', 'application/json', '{"name":"Stolen"}']
	];
	const origins: [string, Record<string, string>][] = [
		['no origin', {}],
		['another origin', { origin: 'https://elsewhere.test' }],
		['a null origin', { origin: 'null' }],
		['our name in another', { origin: 'https://127.0.0.1.elsewhere.test' }]
	];
	const unsafe = () =>
		routes
			.filter(({ id }) => id !== '/api/match')
			.flatMap(({ id, methods, actions }) => [
				...methods
					.filter((method) => !['GET', 'HEAD', 'OPTIONS'].includes(method))
					.map((method) => [method, here(id)] as const),
				...actions.map((name) => ['POST', here(id) + (name === 'default' ? '' : `?/${name}`)] as const)
			]);

	it.each(origins)(
		'is refused from %s, whatever its type, and changes nothing (ASVS 3.5.1–2)',
		async (_, headers) => {
			const before = await state();
			expect(unsafe().length).toBeGreaterThan(20);
			for (const [method, path] of unsafe()) {
				for (const [type, contentType, body] of bodies) {
					const asked = contentType ? { ...headers, 'content-type': contentType } : headers;
					const answer = await owner.browser.ask(path, { method, headers: asked, body });
					expect(answer.status, `${method} ${path}, ${type}`).toBe(403);
				}
			}
			expect(await state()).toBe(before);
		}
	);

	it('is not done by opening its address (ASVS 3.5.3)', async () => {
		const before = await state();
		for (const [, path] of unsafe()) {
			for (const method of ['GET', 'HEAD']) await owner.browser.ask(path, { method });
		}
		await owner.browser.ask('/sign-out');
		expect(await state()).toBe(before);
		expect((await owner.browser.ask('/account')).status).toBe(200);
	});

	/** Everything that this person owns, as one hash. */
	async function state(): Promise<string> {
		const kept = await Promise.all([
			db.reader.all(sql`select * from users where id = ${owner.id}`),
			db.reader.all(sql`select id, endedAt, roomId from sessions where userId = ${owner.id}`),
			db.reader.all(sql`select * from rooms where id = ${owner.roomId}`),
			db.reader.all(sql`select * from memberships where roomId = ${owner.roomId}`),
			db.reader.all(sql`select * from invitations where roomId = ${owner.roomId}`),
			db.reader.all(sql`select * from supplies where roomId = ${owner.roomId}`),
			db.reader.all(sql`select * from projects where roomId = ${owner.roomId}`),
			db.reader.all(sql`select * from acts where roomId = ${owner.roomId}`),
			db.reader.all(sql`select * from movements where roomId = ${owner.roomId}`)
		]);
		return createHash('sha256').update(JSON.stringify(kept)).digest('hex');
	}
});

describe('a return address (ASVS 3.7.2)', () => {
	it.each([
		'//e.test',
		'/\\e.test',
		'https:e.test',
		'https://e.test/',
		'/%09/e.test',
		'/.//e.test',
		'%2F%2Fe.test'
	])('never leads away: %s', async (next) => {
		const { email } = owner;
		const browser = new Browser();
		const answer = await browser.post('/sign-in?/password', { email, password: PASSWORD, next });
		expect(answer.status).toBe(303);
		const location = new URL(String(answer.headers.location), `${browser.origin}/sign-in`);
		expect(location.origin).toBe(browser.origin);
		const asked = await browser.ask(`/sign-in?next=${encodeURIComponent(next)}`);
		expect(new URL(String(asked.headers.location), browser.origin).origin).toBe(browser.origin);
	});

	it('of our own is followed', async () => {
		const fields = { email: owner.email, password: PASSWORD, next: '/supplies?kind=tape' };
		const answer = await new Browser().post('/sign-in?/password', fields);
		expect(answer.headers.location).toBe('/supplies?kind=tape');
	});
});

describe('a flood (ASVS 2.4.1)', () => {
	it('is held back with a time to wait, and only for whoever floods', async () => {
		const flooder = await signedIn(db);
		const make = () => flooder.browser.post('/account?/rename', { name: 'Fern' });
		const answers = await Promise.all(Array.from({ length: 150 }, make));
		expect(answers.filter(({ status }) => status === 200).length).toBeGreaterThan(100);
		const held = answers.filter(({ status }) => status === 429);
		expect(held.length).toBeGreaterThan(0);
		for (const { headers } of held) expect(Number(headers['retry-after'])).toBeGreaterThan(0);
		const other = await signedIn(db, {}, flooder.browser.from);
		expect((await other.browser.post('/account?/rename', { name: 'Fern' })).status).toBe(200);
	});
});
