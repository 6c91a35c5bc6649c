import { beforeEach, describe, expect, it, vi } from 'vitest';
import { v7 } from 'uuid';
import { readRoomSettings, roomSettingsSchema } from '../../src/lib/schemas/rooms';
import type { Database } from '../../src/lib/server/db/client';
import { Conflict, Forbidden, NotFound } from '../../src/lib/server/errors';
import {
	findInvitation,
	findMembership,
	getRoom,
	listInvitations,
	listPeople
} from '../../src/lib/server/queries/rooms';
import {
	changeRole,
	changeRoomSettings,
	createRoom,
	invite,
	joinRoom as join,
	removePerson,
	withdrawInvitation
} from '../../src/lib/server/services/rooms';
import { emptyDatabase, joinRoom, makeRoom } from '../factories/room';

let db: Database;
beforeEach(async () => {
	db = await emptyDatabase();
	return () => vi.useRealTimers();
});

const roleOf = async (userId: string, roomId: string) =>
	(await findMembership(db.reader, userId, roomId))?.role;

describe('what only an owner may do', () => {
	it('is refused to a member by the service itself; leaving is hers', async () => {
		const owner = await makeRoom(db);
		const member = await joinRoom(db, owner.roomId, 'member');
		for (const verb of [
			() => db.write((tx) => invite(tx, member, 'owner')),
			() => db.write((tx) => changeRole(tx, member, member.userId, 'owner')),
			() => db.write((tx) => removePerson(tx, member, owner.userId)),
			() => db.write((tx) => changeRoomSettings(tx, member, { pricesShown: true }))
		])
			await expect(verb()).rejects.toThrow(Forbidden);
		await db.write((tx) => removePerson(tx, member, member.userId));
		expect(await roleOf(member.userId, owner.roomId)).toBeUndefined();
	});
});

describe('an invitation', () => {
	it('lets one person in, with its role', async () => {
		const [owner, guest, third] = [await makeRoom(db), await makeRoom(db), await makeRoom(db)];
		const secret = await db.write((tx) => invite(tx, owner, 'viewer'));
		expect(await findInvitation(db.reader, secret)).toMatchObject({ room: 'Back bedroom', role: 'viewer' });
		expect(await db.write((tx) => join(tx, guest.userId, secret))).toBe(owner.roomId);
		expect(await roleOf(guest.userId, owner.roomId)).toBe('viewer');
		await expect(db.write((tx) => join(tx, third.userId, secret))).rejects.toThrow(NotFound);
		expect(await roleOf(third.userId, owner.roomId)).toBeUndefined();
		expect(await listInvitations(db.reader, owner)).toEqual([]);
	});

	it('leaves the role of somebody who is in already as it is', async () => {
		const owner = await makeRoom(db);
		const secret = await db.write((tx) => invite(tx, owner, 'viewer'));
		await db.write((tx) => join(tx, owner.userId, secret));
		expect(await roleOf(owner.userId, owner.roomId)).toBe('owner');
	});

	it('lets nobody in once taken back, or after a week', async () => {
		const [owner, guest] = [await makeRoom(db), await makeRoom(db)];
		const taken = await db.write((tx) => invite(tx, owner, 'member'));
		const late = await db.write((tx) => invite(tx, owner, 'member'));
		const [first] = await listInvitations(db.reader, owner);
		await db.write((tx) => withdrawInvitation(tx, owner, first?.id ?? ''));
		await expect(db.write((tx) => join(tx, guest.userId, taken))).rejects.toThrow(NotFound);
		vi.useFakeTimers({ toFake: ['Date'], now: Date.now() + 8 * 86_400_000 });
		await expect(db.write((tx) => join(tx, guest.userId, late))).rejects.toThrow(NotFound);
	});

	it('is only its own room’s to take back', async () => {
		const [owner, other] = [await makeRoom(db), await makeRoom(db)];
		await db.write((tx) => invite(tx, owner, 'member'));
		const [invitation] = await listInvitations(db.reader, owner);
		const withdrawal = db.write((tx) => withdrawInvitation(tx, other, invitation?.id ?? ''));
		await expect(withdrawal).rejects.toThrow(NotFound);
		expect(await listInvitations(db.reader, owner)).toHaveLength(1);
	});
});

describe('a room', () => {
	it('is never left without an owner', async () => {
		const owner = await makeRoom(db);
		const member = await joinRoom(db, owner.roomId, 'member');
		await expect(db.write((tx) => changeRole(tx, owner, owner.userId, 'viewer'))).rejects.toThrow(Conflict);
		await expect(db.write((tx) => removePerson(tx, owner, owner.userId))).rejects.toThrow(Conflict);
		expect(await roleOf(owner.userId, owner.roomId)).toBe('owner');
		await db.write((tx) => changeRole(tx, owner, member.userId, 'owner'));
		await db.write((tx) => removePerson(tx, owner, owner.userId));
		expect(await roleOf(member.userId, owner.roomId)).toBe('owner');
	});

	it('changes nobody who isn’t in it', async () => {
		const [owner, stranger] = [await makeRoom(db), await makeRoom(db)];
		const change = db.write((tx) => changeRole(tx, owner, stranger.userId, 'viewer'));
		await expect(change).rejects.toThrow(NotFound);
		expect(await roleOf(stranger.userId, stranger.roomId)).toBe('owner');
	});

	it('shows addresses to owners only', async () => {
		const owner = await makeRoom(db);
		const viewer = await joinRoom(db, owner.roomId, 'viewer');
		expect((await listPeople(db.reader, owner)).every(({ email }) => email.includes('@'))).toBe(true);
		expect((await listPeople(db.reader, viewer)).map(({ email }) => email)).toEqual(['', '']);
	});

	it('is made once however often it is sent, and never over somebody else’s', async () => {
		const [maker, other] = [await makeRoom(db), await makeRoom(db)];
		const room = { id: v7(), name: 'Attic' };
		for (let time = 0; time < 2; time++) await db.write((tx) => createRoom(tx, maker.userId, room));
		await db.write((tx) => createRoom(tx, other.userId, room));
		expect(await roleOf(maker.userId, room.id)).toBe('owner');
		expect(await roleOf(other.userId, room.id)).toBeUndefined();
	});
});

describe('the settings', () => {
	const typed = {
		name: 'Attic',
		units: 'in',
		reach: '12 1/4',
		keepOffcut: '40 mm',
		currency: 'eur',
		pricesShown: true
	};

	it('are kept as exact lengths, and every change raises the revision', async () => {
		const owner = await makeRoom(db);
		const before = await getRoom(db.reader, owner);
		const settings = readRoomSettings(roomSettingsSchema.parse(typed));
		await db.write((tx) => changeRoomSettings(tx, owner, settings));
		expect(await getRoom(db.reader, owner)).toMatchObject({
			name: 'Attic',
			reach: 12.25 * 8128,
			keepOffcut: 40 * 320,
			currency: 'EUR',
			pricesShown: true,
			revision: before.revision + 1
		});
	});

	it('may leave lengths blank, and say why one can’t be read', () => {
		const blank = roomSettingsSchema.parse({ ...typed, reach: ' ', keepOffcut: '' });
		expect(readRoomSettings(blank)).toMatchObject({ reach: null, keepOffcut: null });
		const wrong = roomSettingsSchema.safeParse({ ...typed, reach: '-3', units: 'furlongs' });
		expect(wrong.error?.issues.map(({ path }) => path[0])).toContain('units');
		const below = roomSettingsSchema.safeParse({ ...typed, reach: '-3' });
		expect(below.error?.issues).toMatchObject([{ path: ['reach'] }]);
	});
});
