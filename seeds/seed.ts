// Fills an empty database with the demonstration room, through the services that people's own clicks use.
import { mkdir, writeFile } from 'node:fs/promises';
import { join } from 'node:path';
import { v7 } from 'uuid';
import { parseLength } from '../src/lib/domain/length';
import { openDatabase, type Transaction } from '../src/lib/server/db/client';
import { readEnv } from '../src/lib/server/env';
import { hashPassword } from '../src/lib/server/passwords';
import { importRoom } from '../src/lib/server/services/exchange';
import { addUser } from '../src/lib/server/services/people';
import { attachPicture } from '../src/lib/server/services/pictures';
import { changeRoomSettings, createRoom, invite, joinRoom } from '../src/lib/server/services/rooms';
import type { Actor } from '../src/lib/server/session';
import { bills } from './bills';
import cast from './cast.json';
import { paintStash } from './patterns/paint';
import { stash } from './stash';
import { ledger } from './stash/ledger';

const env = readEnv(process.env);
const today = new Date().toISOString().slice(0, 10);
const rows = stash(today);
const photos = join(env.DATA_DIR, 'photos');
await mkdir(photos, { recursive: true });

const pictures = await paintStash(rows);
for (const { file, image } of pictures.values()) await writeFile(join(photos, file), image);

const people = await Promise.all(
	cast.people.map(async ({ password, ...person }) => ({
		...person,
		passwordHash: await hashPassword(password)
	}))
);

const database = await openDatabase(env.DATABASE_URL);
await database.migrate('drizzle');
await database.write(async (tx) => {
	const actor = await openRoom(tx);
	const supplies = rows.map(({ supply }) => supply);
	const past = ledger(rows, today);
	const document = { format: 'paperlarder', version: 1, supplies, projects: bills, ledger: past } as const;
	await importRoom(tx, actor, { id: v7(), document });
	for (const [key, { file }] of pictures) await attachPicture(tx, actor, { key, picture: file });
});
database.close();
console.log(`Seeded ${rows.length} supplies, ${pictures.size} pictures and ${bills.length} projects.`);

/** The owner makes the room and sets it up; the others come by invitation. */
async function openRoom(tx: Transaction): Promise<Actor> {
	const [owner, ...others] = people;
	if (!owner) throw new Error('The cast has no owner.');
	const userId = await addUser(tx, owner);
	const roomId = v7();
	await createRoom(tx, userId, { id: roomId, name: cast.room });
	const actor: Actor = { userId, roomId, role: 'owner', seesPrices: true };
	await changeRoomSettings(tx, actor, {
		units: 'in',
		reach: inches('12 1/4'),
		keepOffcut: inches('1'),
		currency: 'USD',
		setUp: true
	});
	for (const { role, ...person } of others) {
		const guest = await addUser(tx, person);
		await joinRoom(tx, guest, await invite(tx, actor, role === 'member' ? 'member' : 'viewer'));
	}
	return actor;
}

function inches(text: string): number {
	const read = parseLength(text, { unit: 'in' });
	if (!read.ok) throw new Error(read.reason);
	return read.value;
}
