import { v7 } from 'uuid';
import { beforeAll, describe, expect, it } from 'vitest';
import { operations, type Operation } from '../../src/lib/server/api/operations';
import type { Database } from '../../src/lib/server/db/client';
import { cards, project } from '../factories/project';
import { joinRoom, makeRoom } from '../factories/room';
import { cardstock, stock, trimmer } from '../factories/supply';
import { ask, everyHandler, servedDatabase } from './ask';

let db: Database;
beforeAll(async () => {
	db = await servedDatabase();
});

const all = Object.entries(operations) as [string, Operation][];
const ofRooms = all.filter(([, { access }]) => access !== 'open');
const fetched = async (answer: Promise<Response>) => {
	const response = await answer;
	return { status: response.status, body: response.status === 204 ? null : await response.json() };
};

describe('the API', () => {
	it('has a handler for every operation it describes, and no other', async () => {
		const described = all.map(([name]) => name).filter((name) => name.includes(' /api/'));
		expect((await everyHandler()).sort()).toEqual(described.sort());
	});

	it.each(ofRooms)('%s asks who it is', async (name, { access }) => {
		const owner = await makeRoom(db);
		const viewer = await joinRoom(db, owner.roomId, 'viewer');
		const stranger = await makeRoom(db);
		expect((await ask(name, null, { room: owner.roomId })).status).toBe(401);
		expect((await ask(name, stranger, { room: owner.roomId, id: v7() })).status).toBe(404);
		if (access !== 'viewer') expect((await ask(name, viewer, { id: v7() })).status).toBe(403);
	});

	it.each(ofRooms.filter(([name]) => name.includes('{id}') && name.startsWith('GET')))(
		'%s finds nothing of another room’s',
		async (name) => {
			const theirs = await makeRoom(db);
			const id = name.includes('supplies') ? await stock(db, theirs, cardstock()) : await project(db, theirs);
			const mine = await makeRoom(db);
			expect((await ask(name, theirs, { id })).status).toBe(200);
			expect((await ask(name, mine, { id })).status).toBe(404);
		}
	);

	it.each(all.filter(([, { body }]) => body))('%s reads JSON by its schema only', async (name) => {
		const actor = await makeRoom(db);
		const sent = (body: string, type?: string) => ask(name, actor, { body, type, id: v7() });
		expect((await sent('a=b', 'application/x-www-form-urlencoded')).status).toBe(415);
		expect((await sent('a=b', 'text/plain')).status).toBe(415);
		expect((await sent('{"a":')).status).toBe(400);
		for (const body of [
			'null',
			'[]',
			'"x"',
			'{"role":"owner"}',
			'{"__proto__":{"a":1}}',
			'{"id":[[[[[[]]]]]]}'
		]) {
			const { status, body: answer } = await fetched(sent(body));
			expect([status, typeof answer.message, Array.isArray(answer.issues)]).toEqual([422, 'string', true]);
		}
	});
});

describe('supplies over the API', () => {
	it('are added, found, edited, used, counted, thrown away and had back', async () => {
		const actor = await makeRoom(db);
		const id = v7();
		const base = '/api/rooms/{room}/supplies';
		const added = await fetched(ask(`POST ${base}`, actor, { body: { id, supply: cardstock() } }));
		expect(added).toMatchObject({ status: 201, body: { id, amount: 10, version: expect.any(Number) } });
		expect(await fetched(ask(`GET ${base}`, actor, { search: '?q=oat&size=11+x+4' }))).toMatchObject({
			body: { total: 1, rows: [{ id }] }
		});
		const edited = { id: v7(), version: added.body.version, supply: cardstock({ name: 'Rye' }) };
		expect(await fetched(ask(`PATCH ${base}/{id}`, actor, { id, body: edited }))).toMatchObject({
			body: { name: 'Rye' }
		});
		const stale = await fetched(ask(`PATCH ${base}/{id}`, actor, { id, body: { ...edited, id: v7() } }));
		expect(stale).toMatchObject({ status: 409, body: { current: { name: 'Rye' } } });
		const move = (body: object) => fetched(ask(`POST ${base}/{id}/movements`, actor, { id, body }));
		const used = { id: v7(), kind: 'used', amount: 4 };
		expect(await move(used)).toMatchObject({ status: 201, body: { amount: 6 } });
		expect(await move(used)).toMatchObject({ body: { amount: 6 } });
		expect(await move({ id: v7(), kind: 'used', amount: 7 })).toMatchObject({ status: 409 });
		expect(await move({ id: v7(), kind: 'counted', left: 5 })).toMatchObject({ body: { amount: 5 } });
		const act = v7();
		const gone = ask(`DELETE ${base}/{id}`, actor, { id, search: `?act=${act}` });
		expect((await gone).status).toBe(204);
		expect(await fetched(ask('GET /api/rooms/{room}/trash', actor))).toMatchObject({
			body: { supplies: [{ id }], projects: [] }
		});
		await ask('POST /api/rooms/{room}/undo', actor, { body: { id: v7(), act } });
		expect(await fetched(ask(`GET ${base}`, actor))).toMatchObject({ body: { total: 1 } });
	});

	it.each([
		['a negative number', { sheets: -1 }],
		['a number too large to be one', { sheets: 1e309 }],
		['text for a number', { sheets: '3' }],
		['a name of a megabyte', { name: 'x'.repeat(200_000) }],
		['a kind there isn’t', { kind: 'slate' }],
		['somebody’s role', { role: 'owner' }],
		['another room', { roomId: 'x' }]
	])('are refused with %s, and nothing is kept', async (_, set) => {
		const actor = await makeRoom(db);
		const body = { id: v7(), supply: { ...cardstock(), ...set } };
		const { status, body: answer } = await fetched(ask('POST /api/rooms/{room}/supplies', actor, { body }));
		expect(status).toBe(422);
		expect(answer.issues.every(({ path }: { path: string }) => path.startsWith('supply.'))).toBe(true);
		expect(await fetched(ask('GET /api/rooms/{room}/supplies', actor))).toMatchObject({ body: { total: 0 } });
	});

	it('never take another room’s id for their own', async () => {
		const theirs = await makeRoom(db);
		const id = await stock(db, theirs, cardstock());
		const mine = await makeRoom(db);
		const tries = [
			ask('POST /api/rooms/{room}/supplies', mine, { body: { id, supply: cardstock({ name: 'Mine' }) } }),
			ask('POST /api/rooms/{room}/trash', mine, { body: { id: v7(), supplies: [id] } }),
			ask('POST /api/rooms/{room}/moves', mine, { body: { id: v7(), supplies: [id], bin: 'Mine' } }),
			ask('POST /api/rooms/{room}/undo', mine, { body: { id: v7(), act: id } }),
			ask('POST /api/rooms/{room}/supplies/{id}/movements', mine, {
				id,
				body: { id: v7(), kind: 'used', amount: 1 }
			})
		];
		expect((await Promise.all(tries)).map(({ status }) => status)).toEqual([409, 404, 404, 404, 404]);
		expect(await fetched(ask('GET /api/rooms/{room}/supplies/{id}', theirs, { id }))).toMatchObject({
			body: { name: 'Oat', amount: 10, bin: null }
		});
	});
});

describe('projects and what can be made, over the API', () => {
	it('go from short to now as the stash is filled, and are cut once', async () => {
		const actor = await makeRoom(db);
		const of = (name: string, more = {}) => fetched(ask(name, actor, more));
		const id = v7();
		await of('POST /api/rooms/{room}/projects', { body: { id, bill: cards(), copies: 2 } });
		await stock(db, actor, trimmer());
		const before = await of('GET /api/rooms/{room}/today', { search: '?on=2027-05-10' });
		expect(before.body.rows).toMatchObject([{ project: { id, copies: 2 }, result: { verdict: 'short' } }]);

		await stock(db, actor, cardstock({ sheets: 3 }));
		const after = await of('POST /api/rooms/{room}/match', { body: { mode: 'queue', on: '2027-05-10' } });
		expect(after.body).toMatchObject({ unit: '1/320 mm', results: [{ project: 'cards', verdict: 'now' }] });

		const { plan } = after.body.results[0];
		const deed = { id: v7(), project: id, plan, bin: 'Offcuts' };
		for (let time = 0; time < 2; time++) {
			expect((await of('POST /api/rooms/{room}/cuts', { body: deed })).status).toBe(201);
		}
		expect(
			(await of('GET /api/rooms/{room}/supplies', { search: '?q=oat&sort=added' })).body.rows[0]
		).toMatchObject({
			amount: 3 - plan.sheets.length
		});
		expect((await of('GET /api/rooms/{room}/bins')).body).toMatchObject([{ name: 'Offcuts' }]);
		expect((await of('GET /api/rooms/{room}/projects/{id}', { id })).body.cuts).toMatchObject([
			{ act: deed.id }
		]);
	});

	it('are renamed, copied, ordered, edited and thrown away', async () => {
		const actor = await makeRoom(db);
		const [a, b] = [await project(db, actor), await project(db, actor, cards({ name: 'Tags' }))];
		const one = '/api/rooms/{room}/projects/{id}';
		const of = (name: string, body?: object) => fetched(ask(name, actor, { id: a, body }));
		expect(await of(`PUT ${one}/name`, { name: 'Cards' })).toMatchObject({
			body: { name: 'Cards', version: 2 }
		});
		expect(await of(`PUT ${one}/copies`, { copies: 6 })).toMatchObject({ body: { copies: 6, version: 2 } });
		expect(await of(`PUT ${one}/design`, { slot: 'card', design: 'Fern' })).toMatchObject({
			body: { bill: { slots: [{ design: 'Fern' }] } }
		});
		expect((await of('PUT /api/rooms/{room}/projects/order', { projects: [b, a] })).body).toMatchObject([
			{ id: b },
			{ id: a }
		]);
		expect((await of(`PATCH ${one}`, { version: 1, bill: cards() })).status).toBe(409);
		expect((await of(`PATCH ${one}`, { version: 3, bill: cards() })).status).toBe(200);
		expect((await of(`DELETE ${one}`)).status).toBe(204);
		expect((await of('GET /api/rooms/{room}/projects')).body).toMatchObject([{ id: b }]);
	});
});

describe('a room’s document', () => {
	it('comes out, and goes into another room once; a dry run changes nothing', async () => {
		const from = await makeRoom(db);
		await stock(db, from, cardstock({ bin: 'Tray 3' }));
		await project(db, from);
		const { body: document } = await fetched(ask('GET /api/rooms/{room}/export', from));
		const to = await makeRoom(db);
		const take = async (dryRun: boolean) =>
			(await fetched(ask('POST /api/rooms/{room}/import', to, { body: { id: v7(), document, dryRun } })))
				.body;
		const added = { supplies: { added: 1 }, projects: { added: 1 }, bins: { added: 1 } };
		expect(await take(true)).toMatchObject(added);
		expect(await take(false)).toMatchObject(added);
		expect(await take(false)).toMatchObject({ supplies: { unchanged: 1 }, projects: { unchanged: 1 } });
	});
});
