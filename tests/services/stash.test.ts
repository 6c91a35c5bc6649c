import { beforeAll, expect, it } from 'vitest';
import { readSupply, type SupplyDocument } from '../../src/lib/domain/exchange';
import type { Database } from '../../src/lib/server/db/client';
import { stashForMatching } from '../../src/lib/server/queries/stash';
import { emptyDatabase, makeRoom } from '../factories/room';
import { cardstock, stock, tape, trimmer } from '../factories/supply';

let db: Database;
beforeAll(async () => {
	db = await emptyDatabase();
});

it('hands the matcher every supply exactly as it was entered, to the last digit of its weight', async () => {
	const actor = await makeRoom(db);
	const documents = [
		...['65 lb cover', '70 lb text', '24 lb bond', '110 lb index', '80 gsm'].map((weight, nth) =>
			cardstock({ key: `w${nth}`, weight, caliper: '20 pt', colours: ['#6d8a5f'] })
		),
		cardstock({
			...{
				key: 'fern',
				kind: 'patterned-paper',
				size: '30,5 x 31.1 cm',
				count: 'unsure',
				offcut: true,
				bin: 'Tray'
			},
			faces: [{ design: 'Fern “Lattice”', direction: 'two-way' }],
			brandingStrip: { edge: 'left', depth: '6 mm' }
		}),
		tape({ full: '27 yd', arrives: '2027-05-20' }),
		{ key: 'glue', kind: 'glue', name: 'Glue', left: '3 7/8 fl oz' } as SupplyDocument,
		{
			key: 'brads',
			kind: 'brads',
			name: 'Brads',
			left: 0,
			price: { amount: 1, currency: 'JPY' }
		} as SupplyDocument,
		trimmer({ cuts: ['paper', 'board'], borrowedUntil: '2027-05-10' })
	];
	for (const document of documents) await stock(db, actor, document);
	expect(await stashForMatching(db.reader, actor)).toEqual(
		documents.map((document) => readSupply(document, 'in'))
	);
	expect(await stashForMatching(db.reader, await makeRoom(db))).toEqual([]);
});
