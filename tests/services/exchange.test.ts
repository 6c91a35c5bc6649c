import { v7 } from 'uuid';
import { beforeAll, describe, expect, it } from 'vitest';
import { documentSchema, type ExchangeDocument } from '../../src/lib/domain/exchange';
import type { Database } from '../../src/lib/server/db/client';
import { Forbidden, Invalid } from '../../src/lib/server/errors';
import { exportRoom } from '../../src/lib/server/queries/exchange';
import { listProjects } from '../../src/lib/server/queries/projects';
import { listSupplies, supplyById } from '../../src/lib/server/queries/supplies';
import { readSupplyFilter } from '../../src/lib/schemas/supply-filter';
import { importRoom, previewImport } from '../../src/lib/server/services/exchange';
import { undo } from '../../src/lib/server/services/ledger';
import { trashSupplies, useSupply } from '../../src/lib/server/services/stock';
import type { Actor } from '../../src/lib/server/session';
import { cards, project } from '../factories/project';
import { emptyDatabase, joinRoom, makeRoom } from '../factories/room';
import { cardstock, stock, tape, trimmer } from '../factories/supply';

let db: Database;
beforeAll(async () => {
	db = await emptyDatabase();
});

const take = (actor: Actor, document: ExchangeDocument, id = v7()) =>
	db.write((tx) => importRoom(tx, actor, { id, document }));
const byName = async (actor: Actor) =>
	(await listSupplies(db.reader, actor, readSupplyFilter(new URLSearchParams(), 'in'))).rows;

async function furnished() {
	const actor = await makeRoom(db);
	const price = { amount: 95, currency: 'USD' };
	const faces = [{ design: 'Oat', direction: 'one-way' as const }];
	const oat = await stock(db, actor, cardstock({ bin: 'Tray 3', faces, weight: '65 lb cover', price }));
	await stock(db, actor, tape({ full: '27 yd' }));
	await stock(db, actor, trimmer({ lentUntil: '2027-05-12' }));
	await db.write((tx) =>
		useSupply(tx, actor, { id: v7(), supply: oat, kind: 'used', amount: 3, why: 'A trial' })
	);
	await project(db, actor, cards({ name: 'First' }), 4);
	await project(db, actor, cards({ key: 'tags', name: 'Second' }));
	return { actor, oat };
}

/** Without what is new in every room: the ledger's ids. */
const lasting = ({ ledger, ...rest }: ExchangeDocument) => ({
	...rest,
	ledger: ledger?.map(({ supply, kind, change, at, why }) => ({ supply, kind, change, at, why }))
});

describe('a room’s export', () => {
	it('is a document that another room takes in whole, and exports the same again', async () => {
		const { actor } = await furnished();
		const document = documentSchema.parse(await exportRoom(db.reader, actor));
		const other = await makeRoom(db, { units: 'mm' });
		expect(await take(other, document)).toEqual({
			supplies: { added: 3, changed: 0, unchanged: 0 },
			projects: { added: 2, changed: 0, unchanged: 0 },
			bins: { added: 1 }
		});
		expect(lasting(await exportRoom(db.reader, other))).toEqual(lasting(document));
		expect(await listProjects(db.reader, other)).toMatchObject([
			{ name: 'First', copies: 4 },
			{ name: 'Second' }
		]);
	});

	it('leaves out a tool that has gone for good, and its ledger with it', async () => {
		const { actor } = await furnished();
		const knife = await stock(db, actor, trimmer({ key: 'knife', kind: 'craft-knife', name: 'Knife' }));
		await db.write((tx) =>
			useSupply(tx, actor, { id: v7(), supply: knife, kind: 'spoiled', amount: 1, why: 'It broke' })
		);
		const document = documentSchema.parse(await exportRoom(db.reader, actor));
		expect(document.supplies?.map(({ key }) => key)).not.toContain('knife');
		expect(document.ledger?.map(({ supply }) => supply)).not.toContain('knife');
		await take(await makeRoom(db), document);
	});

	it('says nothing of prices to whom they are not shown', async () => {
		const { actor } = await furnished();
		const viewer = await joinRoom(db, actor.roomId, 'viewer');
		expect(JSON.stringify(await exportRoom(db.reader, viewer))).not.toMatch(/price|USD/);
		expect(JSON.stringify(await exportRoom(db.reader, actor))).toMatch(/"price":\{"amount":95/);
	});
});

describe('importing', () => {
	it('twice is the same as once', async () => {
		const { actor } = await furnished();
		const document = await exportRoom(db.reader, actor);
		const other = await makeRoom(db);
		await take(other, document);
		const once = await exportRoom(db.reader, other);
		expect(await take(other, document)).toEqual({
			supplies: { added: 0, changed: 0, unchanged: 3 },
			projects: { added: 0, changed: 0, unchanged: 2 },
			bins: { added: 0 }
		});
		expect(await exportRoom(db.reader, other)).toEqual(once);
		expect((await listProjects(db.reader, other)).map(({ version }) => version)).toEqual([1, 1]);
	});

	it('books a count where the amount differs, keeps the rest, and says so beforehand', async () => {
		const { actor, oat } = await furnished();
		const document = {
			format: 'paperlarder',
			version: 1,
			supplies: [cardstock({ sheets: 9, name: 'Rye' })]
		} as const;
		const expected = { supplies: { added: 0, changed: 1, unchanged: 0 } };
		expect(await previewImport(db.reader, actor, document as never)).toMatchObject(expected);
		expect((await supplyById(db.reader, actor, oat)).amount).toBe(7);
		await take(actor, document as never);
		expect(await supplyById(db.reader, actor, oat)).toMatchObject({
			...{ amount: 9, name: 'Rye', key: 'oat' },
			ledger: [{ kind: 'counted', delta: 2 }, { kind: 'used' }, { kind: 'counted' }]
		});
		expect(await byName(actor)).toHaveLength(3);
	});

	it('is all or nothing', async () => {
		const actor = await makeRoom(db);
		const document = {
			format: 'paperlarder',
			version: 1,
			supplies: [cardstock(), cardstock({ key: 'odd', size: '0.33 x 12 in' })]
		} as ExchangeDocument;
		const refused = await take(actor, document).catch((error) => error);
		expect(refused).toBeInstanceOf(Invalid);
		expect(refused.issues[0].path.join('.')).toBe('document.supplies.1.size');
		expect(await byName(actor)).toEqual([]);
	});

	it('brings back what lies in the trash under its key, and is undone as one', async () => {
		const { actor, oat } = await furnished();
		const document = await exportRoom(db.reader, actor);
		await db.write((tx) => trashSupplies(tx, actor, { id: v7(), supplies: [oat] }));
		const id = v7();
		await take(actor, document, id);
		expect((await supplyById(db.reader, actor, oat)).deletedAt).toBeNull();
		await db.write((tx) => undo(tx, actor, { id: v7(), act: id }));
		expect((await supplyById(db.reader, actor, oat)).deletedAt).not.toBeNull();
	});

	it('is undone as one also where its ledger has something undone in it', async () => {
		const { actor, oat } = await furnished();
		const act = v7();
		await db.write((tx) => useSupply(tx, actor, { id: act, supply: oat, kind: 'used', amount: 2 }));
		await db.write((tx) => undo(tx, actor, { id: v7(), act }));
		const other = await makeRoom(db);
		const id = v7();
		await take(other, await exportRoom(db.reader, actor), id);
		expect((await byName(other)).find(({ key }) => key === 'oat')?.amount).toBe(7);
		await db.write((tx) => undo(tx, other, { id: v7(), act: id }));
		expect(await byName(other)).toEqual([]);
	});

	it('is refused where a key is something measured differently here', async () => {
		const { actor } = await furnished();
		const glue = { key: 'tape', kind: 'glue', name: 'Glue', left: '100 ml' } as const;
		const document = { format: 'paperlarder', version: 1, supplies: [glue] } as ExchangeDocument;
		await expect(take(actor, document)).rejects.toBeInstanceOf(Invalid);
		const roll = { ...glue, kind: 'washi-tape', left: '98 in' } as const;
		await take(actor, { ...document, supplies: [roll] });
		expect((await byName(actor)).find(({ key }) => key === 'tape')).toMatchObject({ kind: 'washi-tape' });
	});

	it('is not a viewer’s to do', async () => {
		const { actor } = await furnished();
		const viewer = await joinRoom(db, actor.roomId, 'viewer');
		await expect(take(viewer, { format: 'paperlarder', version: 1 })).rejects.toBeInstanceOf(Forbidden);
	});
});
