import { v7 } from 'uuid';
import { beforeAll, describe, expect, it } from 'vitest';
import type { Database } from '../../src/lib/server/db/client';
import { Conflict, Forbidden, Invalid, NotFound } from '../../src/lib/server/errors';
import { listProjects, listTrashedProjects, projectById } from '../../src/lib/server/queries/projects';
import {
	addProject,
	chooseDesign,
	editBill,
	moveProject,
	renameProject,
	reorderProjects,
	restoreProject,
	setCopies,
	trashProject
} from '../../src/lib/server/services/projects';
import type { Actor } from '../../src/lib/server/session';
import { cards, project } from '../factories/project';
import { emptyDatabase, joinRoom, makeRoom } from '../factories/room';

let db: Database;
beforeAll(async () => {
	db = await emptyDatabase();
});

const names = async (actor: Actor) => (await listProjects(db.reader, actor)).map(({ name }) => name);

describe('a project', () => {
	it('is kept as typed, with the room’s unit, once, and at the end of the queue', async () => {
		const actor = await makeRoom(db, { units: 'mm' });
		const bill = cards({ pieces: [{ key: 'front', slot: 'card', w: '105', h: '=2 * 74 mm', qty: 2 }] });
		const input = { id: v7(), bill, copies: 2 };
		for (let time = 0; time < 2; time++) await db.write((tx) => addProject(tx, actor, input));
		await project(db, actor, cards({ name: 'Tags' }));
		const [first, second, ...rest] = await listProjects(db.reader, actor);
		expect(first).toMatchObject({
			key: 'cards',
			copies: 2,
			position: 0,
			bill: { units: 'mm', pieces: bill.pieces }
		});
		expect(second).toMatchObject({ key: 'cards-2', name: 'Tags', position: 1, bill: { key: 'cards-2' } });
		expect(rest).toEqual([]);
	});

	it('is refused with the place of what can’t be read', async () => {
		const actor = await makeRoom(db);
		const bill = cards({ pieces: [{ key: 'front', slot: 'card', w: '0.33 in', h: '=nothing', qty: 2 }] });
		const refused = await db
			.write((tx) => addProject(tx, actor, { id: v7(), bill, copies: 1 }))
			.catch((e) => e);
		expect(refused).toBeInstanceOf(Invalid);
		const paths = (refused as Invalid).issues.map(({ path }) => path.join('.'));
		expect(paths).toEqual(['bill.pieces.0.w', 'bill.pieces.0.h']);
	});

	it('shows both versions to the second of two people who edit it', async () => {
		const actor = await makeRoom(db);
		const id = await project(db, actor);
		const edit = (name: string) =>
			db.write((tx) => editBill(tx, actor, id, { version: 1, bill: cards({ name }) }));
		await edit('Hers');
		await expect(edit('His')).rejects.toMatchObject({ status: 409, current: { name: 'Hers', version: 2 } });
		await expect(edit('His')).rejects.toBeInstanceOf(Conflict);
		expect(await names(actor)).toEqual(['Hers']);
	});

	it('is renamed, copied, and told its paper and to forget it again', async () => {
		const actor = await makeRoom(db);
		const id = await project(db, actor);
		await db.write((tx) => renameProject(tx, actor, id, { name: 'Thank-you cards' }));
		await db.write((tx) => setCopies(tx, actor, id, { copies: 12 }));
		const choose = (design: string | null, slot = 'card') =>
			db.write((tx) => chooseDesign(tx, actor, id, { slot, design, collection: design && 'Hedge School' }));
		await choose('Fern');
		const chosen = await projectById(db.reader, actor, id);
		expect(chosen).toMatchObject({ name: 'Thank-you cards', copies: 12, bill: { name: 'Thank-you cards' } });
		expect(chosen.bill.slots[0]).toMatchObject({ design: 'Fern', collection: 'Hedge School' });
		await choose(null);
		expect((await projectById(db.reader, actor, id)).bill.slots).toEqual(cards().slots);
		await expect(choose('Fern', 'lining')).rejects.toBeInstanceOf(Invalid);
	});

	it('goes to the trash and comes back', async () => {
		const actor = await makeRoom(db);
		const id = await project(db, actor);
		await db.write((tx) => trashProject(tx, actor, id));
		expect(await names(actor)).toEqual([]);
		expect((await listTrashedProjects(db.reader, actor)).map((row) => row.id)).toEqual([id]);
		await db.write((tx) => restoreProject(tx, actor, id));
		expect(await names(actor)).toEqual(['Note cards']);
	});
});

describe('the queue', () => {
	it('stands in the order given; what isn’t named follows', async () => {
		const actor = await makeRoom(db);
		const [a, b, c] = [
			await project(db, actor, cards({ name: 'A' })),
			await project(db, actor, cards({ name: 'B' })),
			await project(db, actor, cards({ name: 'C' }))
		];
		await db.write((tx) => reorderProjects(tx, actor, { projects: [c!, a!] }));
		expect(await names(actor)).toEqual(['C', 'A', 'B']);
		await db.write((tx) => reorderProjects(tx, actor, { projects: [b!, c!, a!] }));
		expect(await names(actor)).toEqual(['B', 'C', 'A']);
	});

	it('is moved one place at a time, and not past its ends', async () => {
		const actor = await makeRoom(db);
		const a = await project(db, actor, cards({ name: 'A' }));
		await project(db, actor, cards({ name: 'B' }));
		const move = (by: -1 | 1) => db.write((tx) => moveProject(tx, actor, { project: a, by }));
		await move(-1);
		expect(await names(actor)).toEqual(['A', 'B']);
		await move(1);
		await move(1);
		expect(await names(actor)).toEqual(['B', 'A']);
		await move(-1);
		expect(await names(actor)).toEqual(['A', 'B']);
	});
});

describe('whose it is', () => {
	it('is nothing to another room, and only to be looked at for a viewer', async () => {
		const mine = await makeRoom(db);
		const other = await makeRoom(db);
		const viewer = await joinRoom(db, mine.roomId, 'viewer');
		const id = await project(db, mine);
		const verbs = (actor: Actor) => [
			() => db.write((tx) => editBill(tx, actor, id, { version: 1, bill: cards({ name: 'Taken' }) })),
			() => db.write((tx) => renameProject(tx, actor, id, { name: 'Taken' })),
			() => db.write((tx) => setCopies(tx, actor, id, { copies: 3 })),
			() => db.write((tx) => reorderProjects(tx, actor, { projects: [id] })),
			() => db.write((tx) => moveProject(tx, actor, { project: id, by: 1 })),
			() => db.write((tx) => chooseDesign(tx, actor, id, { slot: 'card', design: 'Fern', collection: null })),
			() => db.write((tx) => trashProject(tx, actor, id)),
			() => db.write((tx) => restoreProject(tx, actor, id))
		];
		for (const verb of verbs(other)) await expect(verb()).rejects.toBeInstanceOf(NotFound);
		for (const verb of verbs(viewer)) await expect(verb()).rejects.toBeInstanceOf(Forbidden);
		expect(await projectById(db.reader, viewer, id)).toMatchObject({
			name: 'Note cards',
			version: 1,
			copies: 1
		});
	});
});
