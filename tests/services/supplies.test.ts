import { eq, sql } from 'drizzle-orm';
import { v7 } from 'uuid';
import { beforeAll, describe, expect, it } from 'vitest';
import { readSupplyFilter } from '../../src/lib/schemas/supply-filter';
import type { Database } from '../../src/lib/server/db/client';
import { movements } from '../../src/lib/server/db/schema/ledger';
import { supplies } from '../../src/lib/server/db/schema/supplies';
import { Conflict, Forbidden, NotFound } from '../../src/lib/server/errors';
import { listBins, listSupplies, supplyById } from '../../src/lib/server/queries/supplies';
import { undo } from '../../src/lib/server/services/ledger';
import { moveSupplies, recount, trashSupplies, useSupply } from '../../src/lib/server/services/stock';
import { addPad, addSupply, editSupply } from '../../src/lib/server/services/supplies';
import { addPadSchema } from '../../src/lib/schemas/supplies';
import { emptyDatabase, joinRoom, makeRoom } from '../factories/room';
import { cardstock, stock, tape, trimmer } from '../factories/supply';

let db: Database;
beforeAll(async () => {
	db = await emptyDatabase();
});

const list = (actor: Parameters<typeof listSupplies>[1], query = '') =>
	listSupplies(db.reader, actor, readSupplyFilter(new URLSearchParams(query), 'in'));

describe('adding', () => {
	it('keeps a row as it was entered, with its first movement', async () => {
		const actor = await makeRoom(db);
		const id = await stock(db, actor, cardstock({ bin: 'Tray 3', weight: '65 lb cover', sheets: 4 }));
		const row = await supplyById(db.reader, actor, id);
		expect(row).toMatchObject({ key: 'oat', amount: 4, w: 97536, bin: 'Tray 3', weightText: '65 lb cover' });
		expect(row.ledger).toMatchObject([{ kind: 'counted', delta: 4, balance: 4, undone: false }]);
		expect(await listBins(db.reader, actor)).toMatchObject([{ name: 'Tray 3', rows: 1 }]);
	});

	it('does it once however often it is sent', async () => {
		const actor = await makeRoom(db);
		const input = { id: v7(), supply: cardstock() };
		for (let time = 0; time < 3; time++) await db.write((tx) => addSupply(tx, actor, input));
		expect((await list(actor)).total).toBe(1);
	});

	it('gives a second row of the same key one of its own', async () => {
		const actor = await makeRoom(db);
		for (let time = 0; time < 3; time++) await stock(db, actor, cardstock());
		expect((await list(actor)).rows.map(({ key }) => key).sort()).toEqual(['oat', 'oat-2', 'oat-3']);
	});

	it('turns a pad of 24 sheets in 12 designs into twelve rows of two, numbering what is not described', async () => {
		const actor = await makeRoom(db);
		const pad = addPadSchema.parse({
			id: v7(),
			name: 'Hedge School',
			size: '12 x 12 in',
			sheets: 24,
			designs: 12,
			doubleSided: true,
			described: [{ front: 'Fern Lattice', frontDirection: 'one-way', back: 'Oat' }],
			price: { amount: 2400, currency: 'USD' }
		});
		await db.write((tx) => addPad(tx, actor, pad));
		const { rows, total } = await list(actor, 'sort=added');
		expect(total).toBe(12);
		expect(rows.every(({ amount }) => amount === 2)).toBe(true);
		expect(rows[0]).toMatchObject({
			name: 'Fern Lattice',
			collection: 'Hedge School',
			price: { amount: 100, currency: 'USD' },
			faces: [
				{ design: 'Fern Lattice', direction: 'one-way' },
				{ design: 'Oat', direction: 'none' }
			]
		});
		expect(rows[11]).toMatchObject({
			name: 'Design 12',
			faces: [{ design: 'Design 12', direction: 'none' }]
		});
		await db.write((tx) => undo(tx, actor, { id: v7(), act: pad.id }));
		expect((await list(actor)).total).toBe(0);
	});
});

describe('the ledger', () => {
	it('lets exactly ten of fifty parallel takes have one of ten', async () => {
		const actor = await makeRoom(db);
		const supply = await stock(db, actor, cardstock({ sheets: 10 }));
		const takes = Array.from({ length: 50 }, () =>
			db.write((tx) => useSupply(tx, actor, { id: v7(), supply, kind: 'used', amount: 1 }))
		);
		const outcomes = await Promise.allSettled(takes);
		expect(outcomes.filter(({ status }) => status === 'fulfilled')).toHaveLength(10);
		for (const outcome of outcomes) {
			if (outcome.status === 'rejected') expect(outcome.reason).toBeInstanceOf(Conflict);
		}
		expect((await supplyById(db.reader, actor, supply)).amount).toBe(0);
	});

	it('refuses to be changed or shortened, and goes only with its supply', async () => {
		const actor = await makeRoom(db);
		const supply = await stock(db, actor, cardstock());
		const own = eq(movements.supplyId, supply);
		await expect(db.write((tx) => tx.update(movements).set({ delta: 99 }).where(own))).rejects.toThrow();
		await expect(db.write((tx) => tx.update(movements).set({ who: null }).where(own))).rejects.toThrow();
		await expect(db.write((tx) => tx.delete(movements).where(own))).rejects.toThrow();
		expect((await supplyById(db.reader, actor, supply)).ledger).toHaveLength(1);
		await db.write((tx) => tx.delete(supplies).where(eq(supplies.id, supply)));
		expect(await db.reader.select().from(movements).where(own)).toEqual([]);
	});

	it('keeps an amount below nothing out of the table itself', async () => {
		const actor = await makeRoom(db);
		const supply = await stock(db, actor, cardstock());
		const below = db.write((tx) =>
			tx
				.update(supplies)
				.set({ amount: sql`-1` })
				.where(eq(supplies.id, supply))
		);
		await expect(below).rejects.toThrow();
	});

	it('takes lengths as they are typed, and a bare number in the room’s unit', async () => {
		const actor = await makeRoom(db);
		const supply = await stock(db, actor, tape());
		await db.write((tx) => useSupply(tx, actor, { id: v7(), supply, kind: 'used', amount: '93 in' }));
		await db.write((tx) => useSupply(tx, actor, { id: v7(), supply, kind: 'used', amount: '2' }));
		expect((await supplyById(db.reader, actor, supply)).amount).toBe(3 * 8128);
		const toolId = await stock(db, actor, trimmer());
		await expect(
			db.write((tx) => useSupply(tx, actor, { id: v7(), supply: toolId, kind: 'bought', amount: 1 }))
		).rejects.toThrow('row of its own');
	});

	it('never brings what is still on order with what was bought', async () => {
		const actor = await makeRoom(db);
		const supply = await stock(db, actor, cardstock({ arrives: '2999-01-01' }));
		const buy = (id: string) =>
			db.write((tx) => useSupply(tx, actor, { id: v7(), supply: id, kind: 'bought', amount: 1 }));
		await expect(buy(supply)).rejects.toThrow('still on order');
		expect(await supplyById(db.reader, actor, supply)).toMatchObject({ amount: 10, arrives: '2999-01-01' });
		const nothing = await stock(db, actor, cardstock({ sheets: 0, arrives: '2999-01-01' }));
		await buy(nothing);
		expect(await supplyById(db.reader, actor, nothing)).toMatchObject({ amount: 1, arrives: null });
	});
});

describe('editing, moving and undoing', () => {
	it('refuses an edit of a version that is no longer there, and shows what is', async () => {
		const actor = await makeRoom(db);
		const id = await stock(db, actor, cardstock());
		const { version } = await supplyById(db.reader, actor, id);
		await db.write((tx) =>
			editSupply(tx, actor, id, { id: v7(), version, supply: cardstock({ name: 'Rye', sheets: 7 }) })
		);
		const stale = db.write((tx) =>
			editSupply(tx, actor, id, { id: v7(), version, supply: cardstock({ name: 'Barley' }) })
		);
		await expect(stale).rejects.toMatchObject({ status: 409, current: { name: 'Rye', amount: 7 } });
	});

	it('moves a hundred rows and puts every one back with one undo', async () => {
		const actor = await makeRoom(db);
		const ids: string[] = [];
		for (let nth = 0; nth < 100; nth++)
			ids.push(await stock(db, actor, cardstock({ bin: nth % 2 ? 'A' : 'B' })));
		const before = (await list(actor, 'sort=added')).rows.map(({ bin }) => bin);
		const act = v7();
		await db.write((tx) => moveSupplies(tx, actor, { id: act, supplies: ids, bin: 'Crate' }));
		expect((await list(actor, 'bin=Crate')).total).toBe(100);
		await db.write((tx) => undo(tx, actor, { id: v7(), act }));
		expect((await list(actor, 'sort=added')).rows.map(({ bin }) => bin)).toEqual(before);
		await expect(db.write((tx) => undo(tx, actor, { id: v7(), act }))).rejects.toBeInstanceOf(Conflict);
	});

	it('undoes a recount to the sheet, and a second try of the same undo does nothing', async () => {
		const actor = await makeRoom(db);
		const supply = await stock(db, actor, cardstock({ sheets: 5 }));
		const act = v7();
		await db.write((tx) => recount(tx, actor, { id: act, counts: [{ supply, left: 3, count: 'unsure' }] }));
		expect(await supplyById(db.reader, actor, supply)).toMatchObject({ amount: 3, count: 'unsure' });
		const again = v7();
		for (let time = 0; time < 2; time++) await db.write((tx) => undo(tx, actor, { id: again, act }));
		expect(await supplyById(db.reader, actor, supply)).toMatchObject({ amount: 5, count: 'counted' });
	});

	it('has what was thrown away back', async () => {
		const actor = await makeRoom(db);
		const supply = await stock(db, actor, cardstock());
		const act = v7();
		await db.write((tx) => trashSupplies(tx, actor, { id: act, supplies: [supply] }));
		expect((await list(actor)).total).toBe(0);
		await db.write((tx) => undo(tx, actor, { id: v7(), act }));
		expect((await list(actor)).total).toBe(1);
	});
});

describe('finding', () => {
	it('finds by words with a slip in them, by size left either way, and by what is unsure', async () => {
		const actor = await makeRoom(db);
		await stock(db, actor, cardstock({ key: 'f', name: 'Fern Lattice', collection: 'Hedge School' }));
		await stock(db, actor, cardstock({ key: 'k', name: 'Kite Row', size: '4 1/4 x 11 in', count: 'unsure' }));
		await stock(db, actor, tape());
		const names = async (query: string) => (await list(actor, query)).rows.map(({ name }) => name);
		expect(await names('q=fern+latice')).toEqual(['Fern Lattice']);
		expect(await names('q=hedge+fern')).toEqual(['Fern Lattice']);
		expect(await names('size=11+x+4')).toEqual(['Fern Lattice', 'Kite Row']);
		expect(await names('size=5+x+6')).toEqual(['Fern Lattice']);
		expect(await names('unsure=1')).toEqual(['Kite Row']);
		expect(await names('group=consumable')).toEqual(['Narrow tape']);
		expect(await names('sort=-name')).toEqual(['Narrow tape', 'Kite Row', 'Fern Lattice']);
	});

	it('does not mind quotation marks, percent signs and operators', async () => {
		const actor = await makeRoom(db);
		await stock(db, actor, cardstock());
		for (const q of [`'`, '"', '%', '_', '*', '= or 1=1', '!oat', '^a', '; drop table supplies', '\\']) {
			expect((await list(actor, String(new URLSearchParams({ q, bin: q, sort: q, page: q })))).total).toBe(0);
		}
		expect((await list(actor)).total).toBe(1);
	});
});

describe('whose it is', () => {
	it('says of another room’s rows that they are not there, and leaves them alone', async () => {
		const mine = await makeRoom(db);
		const other = await makeRoom(db);
		const id = await stock(db, mine, cardstock());
		const tries = [
			() => supplyById(db.reader, other, id),
			() => db.write((tx) => useSupply(tx, other, { id: v7(), supply: id, kind: 'used', amount: 1 })),
			() => db.write((tx) => moveSupplies(tx, other, { id: v7(), supplies: [id], bin: 'Mine' })),
			() => db.write((tx) => trashSupplies(tx, other, { id: v7(), supplies: [id] })),
			() => db.write((tx) => undo(tx, other, { id: v7(), act: id }))
		];
		for (const attempt of tries) await expect(attempt()).rejects.toBeInstanceOf(NotFound);
		expect(await supplyById(db.reader, mine, id)).toMatchObject({ amount: 10, deletedAt: null, bin: null });
	});

	it('lets a viewer look without prices, and write nothing', async () => {
		const owner = await makeRoom(db);
		const viewer = await joinRoom(db, owner.roomId, 'viewer');
		const id = await stock(db, owner, cardstock({ price: { amount: 95, currency: 'USD' } }));
		expect(JSON.stringify(await supplyById(db.reader, viewer, id))).not.toMatch(/price|USD/i);
		expect(JSON.stringify(await list(viewer))).not.toMatch(/price|USD/i);
		expect(await supplyById(db.reader, owner, id)).toMatchObject({ price: { amount: 95 } });
		await expect(
			db.write((tx) => useSupply(tx, viewer, { id: v7(), supply: id, kind: 'used', amount: 1 }))
		).rejects.toBeInstanceOf(Forbidden);
	});
});
