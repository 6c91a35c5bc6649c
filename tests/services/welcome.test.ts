import { v7 } from 'uuid';
import { beforeAll, describe, expect, it } from 'vitest';
import { INCH } from '../../src/lib/domain/length';
import { readSupplyFilter } from '../../src/lib/schemas/supply-filter';
import { BENCH_ITEMS, welcomeSchema } from '../../src/lib/schemas/welcome';
import type { Database } from '../../src/lib/server/db/client';
import { Forbidden } from '../../src/lib/server/errors';
import { getRoom } from '../../src/lib/server/queries/rooms';
import { listSupplies } from '../../src/lib/server/queries/supplies';
import { recount } from '../../src/lib/server/services/stock';
import { setUpRoom } from '../../src/lib/server/services/welcome';
import { emptyDatabase, joinRoom, makeRoom } from '../factories/room';

let db: Database;
beforeAll(async () => {
	db = await emptyDatabase();
});

const answers = (over: object = {}) => welcomeSchema.parse({ id: v7(), name: 'Back bedroom', ...over });
const list = async (actor: Parameters<typeof listSupplies>[1]) =>
	(await listSupplies(db.reader, actor, readSupplyFilter(new URLSearchParams(), 'in'))).rows;

describe('the first hour', () => {
	it('keeps units and reach, and files a row for each thing that is named', async () => {
		const actor = await makeRoom(db);
		const given = answers({ reach: '12 1/4', items: ['trimmer', 'tape'], cardstock: 10 });
		await db.write((tx) => setUpRoom(tx, actor, given));
		expect(await getRoom(db.reader, actor)).toMatchObject({
			name: 'Back bedroom',
			units: 'in',
			reach: 12.25 * INCH,
			setUp: true
		});
		expect((await list(actor)).map(({ kind, amount, count }) => [kind, amount, count]).sort()).toEqual([
			['cardstock', 10, 'unsure'],
			['tape', 20 * 36 * INCH, 'unsure'],
			['trimmer', 1, 'counted']
		]);
	});

	it('is the same sent twice as sent once', async () => {
		const actor = await makeRoom(db);
		const given = answers({ items: ['scissors'], kraft: 5 });
		for (let time = 0; time < 2; time++) await db.write((tx) => setUpRoom(tx, actor, given));
		expect(await list(actor)).toHaveLength(2);
	});

	it('answered once more, leaves what has been counted since as it stands', async () => {
		const actor = await makeRoom(db);
		await db.write((tx) => setUpRoom(tx, actor, answers({ kraft: 5 })));
		const [kraft] = await list(actor);
		const counts = [{ supply: kraft!.id, left: 2, count: 'counted' as const }];
		await db.write((tx) => recount(tx, actor, { id: v7(), counts }));
		await db.write((tx) => setUpRoom(tx, actor, answers({ kraft: 9, items: ['scissors'] })));
		expect((await list(actor)).map(({ kind, amount, count }) => [kind, amount, count])).toEqual([
			['kraft-paper', 2, 'counted'],
			['scissors', 1, 'counted']
		]);
	});

	it.each(['in', 'cm', 'mm'] as const)(
		'knows a good row for everything on its list, in %s',
		async (units) => {
			const actor = await makeRoom(db);
			const paper = {
				patterned: 1,
				cardstock: 1,
				smallPatterned: 1,
				smallCardstock: 1,
				chipboard: 1,
				kraft: 1
			};
			await db.write((tx) =>
				setUpRoom(tx, actor, answers({ units, reach: '30', items: BENCH_ITEMS, ...paper }))
			);
			expect(await list(actor)).toHaveLength(BENCH_ITEMS.length + 6);
		}
	);

	it('needs no answers but the name', async () => {
		const actor = await makeRoom(db);
		await db.write((tx) => setUpRoom(tx, actor, answers()));
		expect(await getRoom(db.reader, actor)).toMatchObject({ reach: null, setUp: true });
		expect(await list(actor)).toEqual([]);
	});

	it('is for owners', async () => {
		const owner = await makeRoom(db);
		const member = await joinRoom(db, owner.roomId, 'member');
		await expect(db.write((tx) => setUpRoom(tx, member, answers()))).rejects.toThrow(Forbidden);
	});
});
