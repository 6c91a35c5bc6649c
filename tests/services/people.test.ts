import { eq } from 'drizzle-orm';
import { beforeAll, beforeEach, describe, expect, it, vi } from 'vitest';
import type { Database } from '../../src/lib/server/db/client';
import { outbox } from '../../src/lib/server/db/schema/outbox';
import { attempts, sessions, tokens } from '../../src/lib/server/db/schema/people';
import { Conflict, NotFound, TooMany } from '../../src/lib/server/errors';
import { log } from '../../src/lib/server/log';
import { hashPassword } from '../../src/lib/server/passwords';
import { findSession, listSessions } from '../../src/lib/server/queries/people';
import { listRooms } from '../../src/lib/server/queries/rooms';
import { hashSecret } from '../../src/lib/server/secrets';
import { checkPassword } from '../../src/lib/server/services/check-password';
import {
	addUser,
	changePassword,
	disableAccount,
	openAccount,
	redeemSignInLink,
	resetPassword,
	startSignUp
} from '../../src/lib/server/services/people';
import { chooseRoom, openSession } from '../../src/lib/server/services/sessions';
import { issueToken } from '../../src/lib/server/services/tokens';
import { emptyDatabase, makeRoom } from '../factories/room';

log.level = 'silent';
const origin = 'https://paper.test';
const visitor = { network: '192.0.2.1', userAgent: 'a browser' };
const MINUTE = 60_000;

let db: Database;
let passwordHash: string;
let nth = 0;
beforeAll(async () => {
	passwordHash = await hashPassword('the right one');
});
beforeEach(async () => {
	db = await emptyDatabase();
	return () => vi.useRealTimers();
});

const address = () => `maker-${nth++}@paperlarder.test`;
const person = async (email = address()) => ({
	email,
	id: await db.write((tx) => addUser(tx, { name: 'Fern', email, passwordHash }))
});
const check = (email: string, password: string, network = '192.0.2.1') =>
	checkPassword(db, email, password, network);
const later = (ms: number) => vi.useFakeTimers({ toFake: ['Date'], now: Date.now() + ms });

describe('a sign-up', () => {
	const signUp = (email: string, next = '') =>
		db.write((tx) => startSignUp(tx, origin, { name: 'Fern', email, passwordHash, next }));
	const secretSent = async () => {
		const letters = await db.reader.select().from(outbox);
		return /sign-up\/(\S+)/.exec(letters.at(-1)?.body ?? '')?.[1] ?? '';
	};

	it('becomes an account with a room of its own', async () => {
		await signUp(address());
		const secret = await secretSent();
		const { userId } = await db.write((tx) => openAccount(tx, secret));
		expect(await listRooms(db.reader, userId)).toMatchObject([{ name: 'Fern’s room', role: 'owner' }]);
		await expect(db.write((tx) => openAccount(tx, secret))).rejects.toThrow(NotFound);
	});

	it('leaves the room to the invitation that comes next', async () => {
		await signUp(address(), '/join/abc');
		const secret = await secretSent();
		const { userId, next } = await db.write((tx) => openAccount(tx, secret));
		expect([await listRooms(db.reader, userId), next]).toEqual([[], '/join/abc']);
	});

	it('is refused where the address got an account meanwhile, and uses nothing up', async () => {
		const email = address();
		await signUp(email);
		await person(email);
		const secret = await secretSent();
		await expect(db.write((tx) => openAccount(tx, secret))).rejects.toThrow(Conflict);
		expect((await db.reader.select().from(tokens))[0]?.usedAt).toBeNull();
	});

	it('never makes a second account of one address, in whatever case', async () => {
		const { email } = await person();
		await expect(person(email)).rejects.toThrow();
		await expect(person(email.toUpperCase())).rejects.toThrow();
	});
});

describe('a link', () => {
	it('that signs in works for ten minutes and once', async () => {
		const { email, id } = await person();
		const issue = () => db.write((tx) => issueToken(tx, 'link', email));
		const redeem = (secret: string) => db.write((tx) => redeemSignInLink(tx, secret));
		const first = await issue();
		later(9 * MINUTE);
		expect(await redeem(first)).toBe(id);
		await expect(redeem(first)).rejects.toThrow(NotFound);
		const second = await issue();
		later(11 * MINUTE);
		await expect(redeem(second)).rejects.toThrow(NotFound);
	});

	it('of one purpose is no use for another', async () => {
		const { email } = await person();
		const secret = await db.write((tx) => issueToken(tx, 'reset', email));
		await expect(db.write((tx) => redeemSignInLink(tx, secret))).rejects.toThrow(NotFound);
	});

	it('of a disabled account is dead', async () => {
		const { email, id } = await person();
		const secret = await db.write((tx) => issueToken(tx, 'reset', email));
		await db.write((tx) => disableAccount(tx, id));
		await expect(db.write((tx) => resetPassword(tx, origin, secret, passwordHash))).rejects.toThrow(NotFound);
	});
});

describe('checking a password', () => {
	it('tells whose it is, and nothing else apart', async () => {
		const { email, id } = await person();
		expect(await check(email, 'the right one')).toBe(id);
		expect(await check(email, 'another')).toBeNull();
		expect(await check('nobody@paperlarder.test', 'the right one')).toBeNull();
		await db.write((tx) => disableAccount(tx, id));
		expect(await check(email, 'the right one')).toBeNull();
	});

	it('forgets a person’s own slips once she gets it right', async () => {
		const { email, id } = await person();
		for (let round = 0; round < 3; round++) {
			for (let slip = 0; slip < 6; slip++) expect(await check(email, 'slip')).toBeNull();
			expect(await check(email, 'the right one')).toBe(id);
		}
		expect(await db.reader.select().from(attempts)).toEqual([]);
	});

	it('holds the account for a quarter of an hour after ten, but for its owner elsewhere', async () => {
		const { email, id } = await person();
		for (let guess = 0; guess < 10; guess++) await check(email, 'guess', `198.51.100.${guess}`);
		await expect(check(email, 'guess', '198.51.100.99')).rejects.toThrow(TooMany);
		await expect(check(email, 'the right one', '198.51.100.3')).rejects.toThrow(TooMany);
		expect(await check(email, 'the right one', '203.0.113.7')).toBe(id);
		later(16 * MINUTE);
		expect(await check(email, 'the right one', '198.51.100.3')).toBe(id);
	});

	it('stops at a hundred, whoever asks', async () => {
		const { email } = await person();
		const guess = (nth: number) => ({
			id: `guess-${nth}`,
			kind: 'password' as const,
			account: hashSecret(email),
			network: `198.51.100.${nth}`,
			at: Date.now()
		});
		await db.write((tx) => tx.insert(attempts).values(Array.from({ length: 100 }, (_, nth) => guess(nth))));
		await expect(check(email, 'guess', '203.0.113.1')).rejects.toThrow(TooMany);
		await expect(check(email, 'the right one', '203.0.113.2')).rejects.toThrow(TooMany);
	});
});

describe('a session', () => {
	const open = (userId: string) => db.write((tx) => openSession(tx, userId, visitor));

	it('is found by its secret until it is idle too long', async () => {
		const { id } = await person();
		const secret = await open(id);
		expect(await findSession(db.reader, secret)).toMatchObject({ user: { id }, session: { roomId: null } });
		later(15 * 24 * 60 * MINUTE);
		expect(await findSession(db.reader, secret)).toBeUndefined();
		expect(await listSessions(db.reader, id)).toEqual([]);
	});

	it('begins in the room this person was in last', async () => {
		const actor = await makeRoom(db);
		const secret = await open(actor.userId);
		expect((await findSession(db.reader, secret))?.session.roomId).toBe(actor.roomId);
	});

	it('can’t be moved into a room she isn’t of', async () => {
		const [a, b] = [await makeRoom(db), await makeRoom(db)];
		const found = await findSession(db.reader, await open(a.userId));
		const move = db.write((tx) => chooseRoom(tx, a.userId, found?.session.id ?? '', b.roomId));
		await expect(move).rejects.toThrow(NotFound);
	});

	it('outlives a changed password only where it was changed', async () => {
		const { id, email } = await person();
		const [here, there] = [await open(id), await open(id)];
		const sessionId = (await findSession(db.reader, here))?.session.id ?? '';
		await db.write((tx) => changePassword(tx, origin, { id, email, sessionId }, passwordHash));
		expect(await findSession(db.reader, here)).toBeDefined();
		expect(await findSession(db.reader, there)).toBeUndefined();
		const [letter] = await db.reader.select().from(outbox);
		expect(letter).toMatchObject({ recipient: email, subject: 'Your password was changed' });
		expect(
			(await db.reader.select().from(sessions).where(eq(sessions.id, sessionId)))[0]?.endedAt
		).toBeNull();
	});
});
