import { beforeAll, expect, it } from 'vitest';
import type { Database } from '../../src/lib/server/db/client';
import { openMatcher } from '../../src/lib/server/matcher';
import { planFor } from '../../src/lib/server/queries/plan';
import { projectById } from '../../src/lib/server/queries/projects';
import { editBill, setCopies } from '../../src/lib/server/services/projects';
import { cards, project } from '../factories/project';
import { emptyDatabase, makeRoom } from '../factories/room';
import { cardstock, stock } from '../factories/supply';

const ON = '2027-05-10';
let db: Database;
beforeAll(async () => {
	db = await emptyDatabase();
});

it('an old bill’s plan, asked for once the bill has changed, is never taken for the new one’s', async () => {
	const actor = await makeRoom(db);
	await stock(db, actor, cardstock({ sheets: 1 }));
	const id = await project(db, actor);
	const matcher = openMatcher(null);
	const read = () => projectById(db.reader, actor, id);
	const verdictOf = async (one: Awaited<ReturnType<typeof read>>) =>
		(await planFor(db.reader, actor, one, ON, matcher)).verdict;

	const old = await read();
	const larger = cards({ pieces: [{ key: 'front', slot: 'card', w: '13 in', h: '13 in', qty: 1 }] });
	await db.write((tx) => editBill(tx, actor, id, { version: old.version, bill: larger }));
	expect(await verdictOf(old)).toBe('now');
	expect(await verdictOf(await read())).toBe('short');

	const small = { version: old.version + 1, bill: cards() };
	await db.write((tx) => editBill(tx, actor, id, small));
	const once = await read();
	await db.write((tx) => setCopies(tx, actor, id, { copies: 9 }));
	expect(await verdictOf(once)).toBe('now');
	expect(await verdictOf(await read())).toBe('short');
});
