import { sql } from 'drizzle-orm';
import { v7 } from 'uuid';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { Database } from '../../src/lib/server/db/client';
import { openServersDatabase, signedIn, type Person } from '../factories/people';
import { cards } from '../factories/project';
import { cardstock, tape } from '../factories/supply';

let db: Database;
let person: Person;
let api: string;
beforeAll(async () => {
	db = await openServersDatabase();
	person = await signedIn(db);
	api = `/api/rooms/${person.roomId}`;
});
afterAll(() => db.close());

const rows = () =>
	Promise.all([
		db.reader.all(sql`select * from supplies where roomId = ${person.roomId}`),
		db.reader.all(sql`select * from movements where roomId = ${person.roomId}`),
		db.reader.all(sql`select * from projects where roomId = ${person.roomId}`),
		db.reader.all(sql`select * from rooms where id = ${person.roomId}`)
	]);

describe('markup in any text (ASVS 1.2.1)', () => {
	const HOSTILE = `</script><script>window.hit=1</script><img src=x onerror=window.hit=2>"'\`{{7*7}}\${7*7}`;

	it('is shown as text on every page and in the data that pages carry', async () => {
		const { browser, roomId } = await signedIn(db);
		const own = `/api/rooms/${roomId}`;
		const supply = v7();
		const bill = v7();
		const supplyDocument = cardstock({
			name: HOSTILE,
			collection: HOSTILE,
			bin: HOSTILE.slice(0, 60),
			faces: [{ design: HOSTILE, direction: 'none' }]
		});
		const added = await browser.send('POST', `${own}/supplies`, { id: supply, supply: supplyDocument });
		expect(added.status, added.text).toBe(201);
		const why = { id: v7(), kind: 'used', amount: 1, why: HOSTILE };
		const booked = await browser.send('POST', `${own}/supplies/${supply}/movements`, why);
		expect(booked.status, booked.text).toBe(201);
		const billDocument = cards({
			name: HOSTILE,
			slots: [{ key: 'card', name: HOSTILE, material: { kind: 'cardstock' } }],
			pieces: [{ key: 'front', name: HOSTILE, slot: 'card', w: '5 in', h: '4 in', qty: 2 }],
			tools: [{ key: 'trim', name: HOSTILE, kind: 'trimmer', reach: '99 in' }],
			steps: [{ text: HOSTILE, tools: ['trim'], pieces: ['front'] }]
		});
		const planned = await browser.send('POST', `${own}/projects`, { id: bill, bill: billDocument });
		expect(planned.status, planned.text).toBe(201);
		await browser.post('/account?/rename', { name: HOSTILE.slice(0, 80) });
		const settings = { name: HOSTILE.slice(0, 80), units: 'in', currency: 'USD' };
		expect((await browser.post('/room?/settings', settings)).status).toBe(200);

		const pages = [
			...['/supplies', `/supplies/${supply}`, `/supplies/${supply}/edit`, '/today', '/projects'],
			...[`/projects/${bill}`, `/projects/${bill}/bill`, `/projects/${bill}/plan`, '/room', '/account'],
			`/supplies?q=${encodeURIComponent(HOSTILE)}`
		];
		for (const path of pages) {
			const { status, text, headers } = await browser.ask(path);
			expect(status, path).toBe(200);
			expect(text, path).not.toMatch(/<script>window|<img src=x|<\/script><script>window/);
			expect(headers['content-security-policy'], path).toMatch(/script-src [^;]*'nonce-/);
		}
		expect((await browser.ask('/room')).text).toContain('&lt;script>window.hit');
	});
});

describe('addresses that would run (ASVS 1.2.2)', () => {
	it('are plain text wherever text is taken', async () => {
		const { browser, roomId } = await signedIn(db);
		for (const name of ['javascript:alert(1)', 'data:text/html,<script>1</script>', 'vbscript:x']) {
			const supply = cardstock({ name, collection: name });
			const answer = await browser.send('POST', `/api/rooms/${roomId}/supplies`, { id: v7(), supply });
			expect(answer.status, answer.text).toBe(201);
		}
		for (const path of ['/supplies', '/today']) {
			expect((await browser.ask(path)).text).not.toMatch(
				/(href|src|action)="?(javascript|data:text|vbscript):/i
			);
		}
	});
});

describe('searching, sorting and filtering (ASVS 1.2.4)', () => {
	it.each([
		`'; drop table supplies; --`,
		`" or "1"="1`,
		'%',
		'_',
		'oat*',
		'name:oat AND NEAR(',
		'((((',
		'\u0000',
		'\\',
		'a'.repeat(2000),
		'𝕆at 🧷'
	])('with %j never fails, and never finds another room’s', async (word) => {
		const other = await signedIn(db);
		const path = `/api/rooms/${other.roomId}/supplies`;
		await other.browser.send('POST', path, { id: v7(), supply: cardstock({ name: 'Foreign fern' }) });
		const value = encodeURIComponent(word);
		for (const name of ['q', 'kind', 'sort', 'bin', 'fits', 'collection', 'page', 'colour']) {
			for (const base of ['/supplies', `${api}/supplies`]) {
				const answer = await person.browser.ask(`${base}?${name}=${value}`);
				expect(answer.status, `${base} ${name}`).toBeLessThan(500);
				expect(answer.text).not.toContain('Foreign fern');
			}
		}
		expect((await person.browser.ask(`/today?mode=${value}&lift=${value}`)).status).toBeLessThan(500);
	});

	it('takes repeated and nested parameters for what they are (ASVS 15.3.5–7)', async () => {
		const queries = [
			'q=a&q=b',
			'kind[]=tape',
			'q[$ne]=1',
			'__proto__[x]=1',
			'constructor=1',
			'page=1&page=-1'
		];
		for (const query of queries) {
			for (const path of ['/supplies', '/today', `${api}/supplies`]) {
				expect((await person.browser.ask(`${path}?${query}`)).status, `${path}?${query}`).toBeLessThan(500);
			}
		}
	});
});

describe('what the pages would never send (ASVS 2.2.1–2)', () => {
	const supplies: [string, unknown][] = [
		['a negative count', cardstock({ sheets: -1 })],
		['half a sheet', cardstock({ sheets: 0.5 })],
		['a count as text', cardstock({ sheets: '10' as never })],
		['a count beyond counting', cardstock({ sheets: 2 ** 53 })],
		['a size below zero', cardstock({ size: '-12 x 12 in' })],
		['a size that is no number', cardstock({ size: 'NaN x 12 in' })],
		['an endless size', cardstock({ size: '1e309 x 12 in' })],
		['a kind there isn’t', cardstock({ kind: 'asbestos' as never })],
		['a name that isn’t text', cardstock({ name: { toString: 'x' } as never })],
		['no name', cardstock({ name: '' })],
		['a name of 100 KB', cardstock({ name: 'x'.repeat(100_000) })],
		['more tape than any roll', tape({ left: '99999999 m' })],
		['a list', [cardstock()]],
		['nothing', null]
	];
	it.each(supplies)('is refused: %s', async (_, supply) => {
		const before = await rows();
		const answer = await person.browser.send('POST', `${api}/supplies`, { id: v7(), supply });
		expect(answer.status, answer.text).toBe(422);
		const { issues } = JSON.parse(answer.text) as { issues: { path: unknown; message: string }[] };
		expect(issues.length).toBeGreaterThan(0);
		for (const { message } of issues) expect(message).toMatch(/\w/);
		expect(await rows()).toEqual(before);
	});

	it.each([
		[
			'1e309',
			`{"id":"${v7()}","supply":{"key":"oat","kind":"cardstock","name":"Oat","size":"12 x 12 in","sheets":1e309}}`,
			422
		],
		['what isn’t JSON', '{"id":', 400],
		['__proto__', `{"id":"${v7()}","__proto__":{"role":"owner"},"supply":null}`, 422],
		['two megabytes', `{"id":"${'x'.repeat(2_000_000)}"}`, 413]
	])('is refused as raw JSON: %s', async (_, body, status) => {
		const before = await rows();
		const headers = { origin: person.browser.origin, 'content-type': 'application/json' };
		const answer = await person.browser.ask(`${api}/supplies`, { method: 'POST', headers, body });
		expect(answer.status).toBe(status);
		expect(await rows()).toEqual(before);
		expect((await person.browser.ask('/healthz')).status).toBe(200);
	});

	it.each([
		['a role there isn’t', '/room?/invite', { role: 'king' }],
		['an id that is none', '/room?/withdraw', { invitation: "' or 1=1" }],
		['units there aren’t', '/room?/settings', { name: 'Attic', units: 'ell', currency: 'USD' }],
		['a reach below zero', '/room?/settings', { name: 'Attic', units: 'in', currency: 'USD', reach: '-1' }],
		['an endless reach', '/room?/settings', { name: 'Attic', units: 'in', currency: 'USD', reach: '1e309' }],
		['a name of 1 KB', '/account?/rename', { name: 'x'.repeat(1000) }],
		['a name of blanks', '/account?/rename', { name: '   ' }]
	])('is refused in a form: %s', async (_, path, fields) => {
		const before = await rows();
		expect((await person.browser.post(path, fields)).status).toBe(400);
		expect(await rows()).toEqual(before);
	});
});
