import { v7 } from 'uuid';
import { beforeAll, describe, expect, it } from 'vitest';
import { readSupplyFilter } from '../../src/lib/schemas/supply-filter';
import type { Database } from '../../src/lib/server/db/client';
import { doneAct } from '../../src/lib/server/queries/acts';
import { listSupplies } from '../../src/lib/server/queries/supplies';
import { undo } from '../../src/lib/server/services/ledger';
import { moveSupplies } from '../../src/lib/server/services/stock';
import type { Actor } from '../../src/lib/server/session';
import { emptyDatabase, joinRoom, makeRoom } from '../factories/room';
import { cardstock, stock, trimmer } from '../factories/supply';

let db: Database;
beforeAll(async () => {
	db = await emptyDatabase();
});

describe('the notice of what was done', () => {
	it('says which act it was, of how many rows, and whether it was taken back', async () => {
		const actor = await makeRoom(db);
		const ids = [await stock(db, actor, cardstock()), await stock(db, actor, cardstock({ name: 'Rye' }))];
		const act = v7();
		await db.write((tx) => moveSupplies(tx, actor, { id: act, supplies: ids, bin: 'Tray 3' }));
		expect(await doneAct(db.reader, actor, act)).toEqual({
			...{ act, kind: 'move', rows: 2, name: 'Oat', undone: false }
		});
		await db.write((tx) => undo(tx, actor, { id: v7(), act }));
		expect(await doneAct(db.reader, actor, act)).toMatchObject({ undone: true });
		expect(await doneAct(db.reader, actor, ids[0] ?? '')).toMatchObject({ kind: 'add', rows: 1 });
	});

	it('claims nothing of an act that is somebody else’s, another room’s or none', async () => {
		const actor = await makeRoom(db);
		const act = await stock(db, actor, cardstock());
		expect(await doneAct(db.reader, await joinRoom(db, actor.roomId, 'member'), act)).toBeNull();
		expect(await doneAct(db.reader, await makeRoom(db), act)).toBeNull();
		expect(await doneAct(db.reader, actor, v7())).toBeNull();
		expect(await doneAct(db.reader, actor, null)).toBeNull();
	});
});

describe('what isn’t at hand', () => {
	it('is found by being on order, until its day, or lent', async () => {
		const actor = await makeRoom(db);
		await stock(db, actor, cardstock({ name: 'Coming', arrives: '2999-01-01' }));
		await stock(db, actor, cardstock({ name: 'Came', arrives: '2001-01-01' }));
		await stock(db, actor, trimmer({ lentUntil: '2999-01-01' }));
		expect(await names(actor, 'coming=1')).toEqual(['Coming']);
		expect(await names(actor, 'lent=1')).toEqual(['Desk trimmer']);
	});
});

async function names(actor: Actor, query: string): Promise<string[]> {
	const filter = readSupplyFilter(new URLSearchParams(query), 'in');
	return (await listSupplies(db.reader, actor, filter)).rows.map(({ name }) => name);
}
