import { expect, it } from 'vitest';
import { openMatcher } from '../../src/lib/server/matcher';
import { unlocksFor } from '../../src/lib/server/queries/today';
import { setCopies } from '../../src/lib/server/services/projects';
import { project } from '../factories/project';
import { emptyDatabase, joinRoom, makeRoom } from '../factories/room';
import { cardstock, stock } from '../factories/supply';

it('a purchase that would help is named to everybody, its price only to whom prices are shown', async () => {
	const db = await emptyDatabase();
	const owner = await makeRoom(db);
	const viewer = await joinRoom(db, owner.roomId, 'viewer');
	await stock(db, owner, cardstock({ sheets: 1, price: { amount: 95, currency: 'USD' } }));
	const id = await project(db, owner);
	await db.write((tx) => setCopies(tx, owner, id, { copies: 9 }));
	const told = (actor: typeof owner) => unlocksFor(db.reader, actor, '2027-05-10', openMatcher(null));

	expect(await told(owner)).toMatchObject([{ buy: { price: { amount: 95, currency: 'USD' } } }]);
	expect(await told(viewer)).toMatchObject([{ buy: { price: null } }]);
	expect(JSON.stringify(await told(viewer))).not.toContain('USD');
});
