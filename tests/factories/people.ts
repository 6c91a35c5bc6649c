import { join } from 'node:path';
import { v7 } from 'uuid';
import { inject } from 'vitest';
import { openDatabase, type Database } from '../../src/lib/server/db/client';
import { memberships } from '../../src/lib/server/db/schema/rooms';
import { hashPassword } from '../../src/lib/server/passwords';
import { addUser } from '../../src/lib/server/services/people';
import { createRoom } from '../../src/lib/server/services/rooms';
import type { RoomRole } from '../../src/lib/schemas/rooms';
import { Browser } from '../security/browser';

export const PASSWORD = 'seven quires of kraft';
const passwordHashed = hashPassword(PASSWORD);

export interface Person {
	readonly id: string;
	readonly email: string;
	readonly roomId: string;
	readonly browser: Browser;
}

/** The built server's own database, opened beside it. */
export function openServersDatabase(): Promise<Database> {
	return openDatabase(`file:${join(inject('server').folder, 'paperlarder.db')}`);
}

/** Somebody with an account, put straight into the database: in a room of her own, or in `room` with a role. */
export async function makePerson(
	db: Database,
	{ room, role = 'owner' }: { room?: string; role?: RoomRole } = {}
): Promise<Omit<Person, 'browser'>> {
	const email = `${v7()}@paperlarder.test`;
	const passwordHash = await passwordHashed;
	return db.write(async (tx) => {
		const id = await addUser(tx, { name: 'Fern', email, passwordHash });
		const roomId = room ?? v7();
		if (room) await tx.insert(memberships).values({ roomId, userId: id, role, joinedAt: Date.now() });
		else await createRoom(tx, id, { id: roomId, name: 'Attic' });
		return { id, email, roomId };
	});
}

/** The same, signed in, in a browser of her own. */
export async function signedIn(
	db: Database,
	where: { room?: string; role?: RoomRole } = {},
	from?: string
): Promise<Person> {
	const person = await makePerson(db, where);
	const browser = new Browser(from);
	const answer = await browser.post('/sign-in?/password', { email: person.email, password: PASSWORD });
	if (answer.status !== 303) throw new Error(`Signing in answered ${answer.status}`);
	return { ...person, browser };
}
