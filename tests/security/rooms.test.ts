import { eq } from 'drizzle-orm';
import { v7 } from 'uuid';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { Database } from '../../src/lib/server/db/client';
import { users } from '../../src/lib/server/db/schema/people';
import { invitations, memberships, rooms } from '../../src/lib/server/db/schema/rooms';
import { supplies } from '../../src/lib/server/db/schema/supplies';
import type { Actor } from '../../src/lib/server/session';
import { openServersDatabase, signedIn, type Person } from '../factories/people';
import { cards, project } from '../factories/project';
import { cardstock, stock } from '../factories/supply';

let db: Database;
beforeAll(async () => {
	db = await openServersDatabase();
});
afterAll(() => db.close());

const actorOf = ({ id, roomId }: Person): Actor => ({
	userId: id,
	roomId,
	role: 'owner',
	seesPrices: true
});
const stashOf = (person: Person) =>
	db.reader.select().from(supplies).where(eq(supplies.roomId, person.roomId));
const roleIn = async (room: string, userId: string) =>
	(await db.reader.select().from(memberships).where(eq(memberships.roomId, room))).find(
		(membership) => membership.userId === userId
	)?.role;

describe('another room’s ids (ASVS 8.2.2)', () => {
	it('are nothing to her, in the path or in the body', async () => {
		const [a, b] = [await signedIn(db), await signedIn(db)];
		const supply = await stock(db, actorOf(a), cardstock());
		const bill = await project(db, actorOf(a));
		const before = await stashOf(a);
		const own = `/api/rooms/${b.roomId}`;
		const theirs = `/api/rooms/${a.roomId}`;
		const asked: [string, string, unknown][] = [
			['GET', `${theirs}/supplies`, undefined],
			['GET', `${theirs}/export`, undefined],
			['POST', `${theirs}/supplies`, { id: v7(), supply: cardstock() }],
			['GET', `${own}/supplies/${supply}`, undefined],
			['DELETE', `${own}/supplies/${supply}`, { id: v7() }],
			['POST', `${own}/trash`, { id: v7(), supplies: [supply] }],
			['POST', `${own}/moves`, { id: v7(), supplies: [supply], bin: 'Mine' }],
			['POST', `${own}/recounts`, { id: v7(), counts: [{ supply, left: '1' }] }],
			['GET', `${own}/projects/${bill}`, undefined],
			['PUT', `${own}/projects/${bill}/name`, { name: 'Mine' }],
			['PUT', `${own}/projects/${bill}/copies`, { copies: 9 }],
			['DELETE', `${own}/projects/${bill}`, { id: v7() }]
		];
		for (const [method, path, body] of asked) {
			const answer =
				body === undefined ? await b.browser.ask(path) : await b.browser.send(method, path, body);
			expect(answer.status, `${method} ${path} ${answer.text}`).toBe(404);
			expect(answer.text).not.toContain('oat');
		}
		for (const path of [`/supplies/${supply}`, `/projects/${bill}`, `/supplies/${supply}/edit`]) {
			expect((await b.browser.ask(path)).status, path).toBe(404);
		}
		expect(await stashOf(a)).toEqual(before);
		expect(await stashOf(b)).toEqual([]);
	});

	it('of people and invitations are nothing to her either', async () => {
		const [a, b] = [await signedIn(db), await signedIn(db)];
		await a.browser.post('/room?/invite', { role: 'member' });
		const [invitation] = await db.reader.select().from(invitations).where(eq(invitations.roomId, a.roomId));
		const posts: [string, Record<string, string>][] = [
			['/room?/withdraw', { invitation: invitation?.id ?? '' }],
			['/room?/changeRole', { person: a.id, role: 'viewer' }],
			['/room?/remove', { person: a.id }],
			['/room?/choose', { room: a.roomId }],
			['/room/new', { id: a.roomId, name: 'Mine now' }]
		];
		for (const [path, fields] of posts) {
			expect((await b.browser.post(path, fields)).status, path).toBe(404);
		}
		expect(await roleIn(a.roomId, a.id)).toBe('owner');
		expect(await roleIn(a.roomId, b.id)).toBeUndefined();
		const [room] = await db.reader.select().from(rooms).where(eq(rooms.id, a.roomId));
		expect(room?.name).toBe('Attic');
	});
});

describe('fields that were never asked for (ASVS 15.3.3)', () => {
	it('are ignored in forms', async () => {
		const person = await signedIn(db);
		const extra = { siteRole: 'admin', role: 'owner', id: v7(), userId: v7(), email: 'x@paperlarder.test' };
		expect((await person.browser.post('/account?/rename', { name: 'Bracken', ...extra })).status).toBe(200);
		const [user] = await db.reader.select().from(users).where(eq(users.id, person.id));
		expect(user).toMatchObject({ name: 'Bracken', siteRole: 'none', email: person.email });
	});

	it('are refused in JSON', async () => {
		const person = await signedIn(db);
		const path = `/api/rooms/${person.roomId}/supplies`;
		for (const extra of [{ roomId: v7() }, { role: 'owner' }, { ownerId: v7() }, { deletedAt: 0 }]) {
			const answer = await person.browser.send('POST', path, { id: v7(), supply: cardstock(), ...extra });
			expect(answer.status, JSON.stringify(extra)).toBe(422);
		}
		expect(await stashOf(person)).toEqual([]);
	});

	it('never come back: a person’s answers hold no hash, and a viewer’s no price and no address', async () => {
		const owner = await signedIn(db);
		await stock(db, actorOf(owner), cardstock({ price: { amount: 4207, currency: 'USD' } }));
		await project(db, actorOf(owner), cards());
		const viewer = await signedIn(db, { room: owner.roomId, role: 'viewer' });
		const api = `/api/rooms/${owner.roomId}`;
		for (const path of [`${api}/supplies`, `${api}/export`, `${api}/today`, '/supplies', '/today', '/room']) {
			const seen = (await viewer.browser.ask(path)).text;
			expect(seen, path).not.toMatch(/passwordHash|secretHash|"price"|42\.07|\b4207\b/);
			expect(seen, path).not.toContain(owner.email);
			expect((await owner.browser.ask(path)).text, path).not.toMatch(/passwordHash|secretHash|argon2/);
		}
		expect((await owner.browser.ask(`${api}/export`)).text).toMatch(/4207/);
	});
});
