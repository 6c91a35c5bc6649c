import { eq, isNull, and } from 'drizzle-orm';
import fc from 'fast-check';
import { v7 } from 'uuid';
import { beforeAll, describe, expect, it } from 'vitest';
import { useSheetsSchema } from '../../src/lib/schemas/cutting';
import type { Database } from '../../src/lib/server/db/client';
import { supplies } from '../../src/lib/server/db/schema/supplies';
import { Conflict, Forbidden, Invalid, NotFound } from '../../src/lib/server/errors';
import { projectById } from '../../src/lib/server/queries/projects';
import { supplyById } from '../../src/lib/server/queries/supplies';
import { useSheets } from '../../src/lib/server/services/cutting';
import { undo } from '../../src/lib/server/services/ledger';
import { editBill } from '../../src/lib/server/services/projects';
import { recount, useSupply } from '../../src/lib/server/services/stock';
import type { Actor } from '../../src/lib/server/session';
import { cards, project } from '../factories/project';
import { emptyDatabase, joinRoom, makeRoom } from '../factories/room';
import { cardstock, stock } from '../factories/supply';

const INCH = 8128;
let db: Database;
beforeAll(async () => {
	db = await emptyDatabase();
});

/** Two 5½ × 4¼ cards side by side on a 12 × 12 sheet: a strip of 1 × 4¼ beside them and 12 × 7¾ below. */
function plan(change: (sheet: ReturnType<typeof drawn>) => void = () => {}) {
	const sheet = drawn();
	change(sheet);
	return { sheets: [sheet] };
}

function drawn() {
	const [w, h] = [5.5 * INCH, 4.25 * INCH];
	const whole = { x: 0, y: 0, w: 12 * INCH, h: 12 * INCH };
	const band = { x: 0, y: 0, w: 12 * INCH, h };
	const lies = { project: 'cards', piece: 'front', y: 0, w, h, turned: false, face: 'A', noSlack: false };
	return {
		...{ supply: 'oat', nth: 1, w: 12 * INCH, h: 12 * INCH },
		placements: [
			{ ...lies, x: 0 },
			{ ...lies, x: w }
		],
		cuts: [
			{ axis: 'across', at: h, of: whole },
			{ axis: 'down', at: w, of: band },
			{ axis: 'down', at: 2 * w, of: { x: w, y: 0, w: 12 * INCH - w, h } }
		],
		offcuts: [
			{ x: 2 * w, y: 0, w: INCH, h },
			{ x: 0, y: h, w: 12 * INCH, h: 7.75 * INCH }
		]
	};
}

async function bench(set: Parameters<typeof makeRoom>[1] = {}, bill = cards(), copies = 1) {
	const actor = await makeRoom(db, set);
	const oat = await stock(
		db,
		actor,
		cardstock({ sheets: 3, faces: [{ design: 'Oat', direction: 'one-way' }] })
	);
	return { actor, oat, cardsId: await project(db, actor, bill, copies) };
}

function cut(
	actor: Actor,
	projectId: string,
	sheets: unknown = plan(),
	id = v7(),
	bin: string | null = 'Offcuts'
) {
	const input = useSheetsSchema.parse({ id, project: projectId, plan: sheets, bin });
	return db.write((tx) => useSheets(tx, actor, input));
}

const stashOf = (actor: Actor) =>
	db.reader
		.select()
		.from(supplies)
		.where(and(eq(supplies.roomId, actor.roomId), isNull(supplies.deletedAt)))
		.orderBy(supplies.id);

describe('cutting a plan', () => {
	it('takes its sheets and files its offcuts in the bin, once', async () => {
		const { actor, oat, cardsId } = await bench();
		const id = v7();
		await cut(actor, cardsId, plan(), id);
		await cut(actor, cardsId, JSON.stringify(plan()), id);
		expect(await supplyById(db.reader, actor, oat)).toMatchObject({
			amount: 2,
			ledger: [{ kind: 'cut', delta: -1, act: id }, { kind: 'counted' }]
		});
		const offcuts = (await stashOf(actor)).filter(({ offcut }) => offcut);
		expect(offcuts).toMatchObject([
			{ w: INCH, h: 4.25 * INCH, amount: 1, faces: [{ design: 'Oat', direction: 'one-way' }] },
			{ w: 12 * INCH, h: 7.75 * INCH, amount: 1, kind: 'cardstock' }
		]);
		expect(await supplyById(db.reader, actor, offcuts[0]!.id)).toMatchObject({
			bin: 'Offcuts',
			ledger: [{ kind: 'offcut-in', delta: 1 }]
		});
		expect((await projectById(db.reader, actor, cardsId)).cuts).toMatchObject([{ act: id, undone: false }]);
	});

	it('keeps no offcut below the room’s smallest', async () => {
		const { actor, cardsId } = await bench({ keepOffcut: 2 * INCH });
		await cut(actor, cardsId);
		const offcuts = (await stashOf(actor)).filter(({ offcut }) => offcut);
		expect(offcuts.map(({ h }) => h)).toEqual([7.75 * INCH]);
	});

	it('keeps just the offcuts that are named, whatever the room’s smallest', async () => {
		const { actor, cardsId } = await bench({ keepOffcut: 2 * INCH });
		const input = { id: v7(), project: cardsId, plan: plan(), kept: ['0.0'] };
		await db.write((tx) => useSheets(tx, actor, useSheetsSchema.parse(input)));
		const offcuts = (await stashOf(actor)).filter(({ offcut }) => offcut);
		expect(offcuts.map(({ w }) => w)).toEqual([INCH]);
	});

	it('files what the plan lists, which leaves out what is too small to keep', async () => {
		const { actor, cardsId } = await bench();
		await cut(
			actor,
			cardsId,
			plan((sheet) => sheet.offcuts.shift())
		);
		expect((await stashOf(actor)).filter(({ offcut }) => offcut)).toMatchObject([{ h: 7.75 * INCH }]);
	});

	it('takes an offcut out as one', async () => {
		const { actor, cardsId } = await bench();
		const key = 'left';
		const left = await stock(db, actor, cardstock({ key, offcut: true, sheets: 1 }));
		await cut(
			actor,
			cardsId,
			plan((sheet) => (sheet.supply = key))
		);
		expect(await supplyById(db.reader, actor, left)).toMatchObject({
			amount: 0,
			ledger: [{ kind: 'offcut-out' }, {}]
		});
	});

	it('is undone to the sheet: every row, amount and bin as before', async () => {
		const { actor, cardsId } = await bench();
		const rows = async () => (await stashOf(actor)).map(({ version: _version, ...row }) => row);
		const before = await rows();
		const act = v7();
		await cut(actor, cardsId, plan(), act);
		expect(await rows()).not.toEqual(before);
		await db.write((tx) => undo(tx, actor, { id: v7(), act }));
		expect(await rows()).toEqual(before);
		expect((await projectById(db.reader, actor, cardsId)).cuts).toMatchObject([{ undone: true }]);
	});

	it('can’t be undone once its offcut has been used', async () => {
		const { actor, cardsId } = await bench();
		const act = v7();
		await cut(actor, cardsId, plan(), act);
		const offcut = (await stashOf(actor)).find(({ offcut }) => offcut)!;
		await db.write((tx) => useSupply(tx, actor, { id: v7(), supply: offcut.id, kind: 'used', amount: 1 }));
		await expect(db.write((tx) => undo(tx, actor, { id: v7(), act }))).rejects.toBeInstanceOf(Conflict);
	});

	it('takes a sheet’s branding strip off with the first cut', async () => {
		const { actor, cardsId } = await bench();
		const strip = { edge: 'bottom', depth: '1/4 in' } as const;
		await stock(
			db,
			actor,
			cardstock({ key: 'kite', size: '12 x 12 1/4 in', sheets: 1, brandingStrip: strip })
		);
		const stripped = plan((sheet) => {
			sheet.supply = 'kite';
			sheet.h = 12.25 * INCH;
			sheet.cuts.unshift({
				axis: 'across',
				at: 12 * INCH,
				of: { x: 0, y: 0, w: 12 * INCH, h: 12.25 * INCH }
			});
		});
		await cut(actor, cardsId, stripped);
		const offcuts = (await stashOf(actor)).filter(({ offcut, key }) => offcut && key.startsWith('kite'));
		expect(offcuts.map(({ h }) => h! / INCH)).toEqual([4.25, 7.75]);
	});
});

describe('a plan that the stash no longer bears', () => {
	it('is refused when the sheets have gone, the bill has changed or the paper has', async () => {
		const gone = await bench();
		await db.write((tx) =>
			recount(tx, gone.actor, { id: v7(), counts: [{ supply: gone.oat, left: 0, count: 'counted' }] })
		);
		await expect(cut(gone.actor, gone.cardsId)).rejects.toBeInstanceOf(Conflict);

		const edited = await bench();
		const wider = cards({ pieces: [{ key: 'front', slot: 'card', w: '5 3/4 in', h: '4 1/4 in', qty: 2 }] });
		await db.write((tx) => editBill(tx, edited.actor, edited.cardsId, { version: 1, bill: wider }));
		await expect(cut(edited.actor, edited.cardsId)).rejects.toThrow('bill has changed');

		const vellum = await bench({}, cards({ slots: [{ key: 'card', material: { kind: 'vellum' } }] }));
		await expect(cut(vellum.actor, vellum.cardsId)).rejects.toBeInstanceOf(Conflict);
	});

	it.each<[string, (sheet: ReturnType<typeof drawn>) => void]>([
		[
			'a piece twice as often as the bill has it',
			(s) => s.placements.push({ ...s.placements[0]!, y: 5 * INCH })
		],
		['a piece smaller than the bill has it', (s) => (s.placements[0]!.w -= 8)],
		['a print on its side', (s) => (s.placements[0]!.turned = true)],
		['a face that nobody described', (s) => (s.placements[0]!.face = 'B')],
		['a sheet that is not there', (s) => (s.nth = 4)],
		['a larger sheet than is owned', (s) => (s.w += INCH)],
		['paper that is not there', (s) => (s.supply = 'nothing')]
	])('is refused with %s', async (_, change) => {
		const { actor, oat, cardsId } = await bench({}, cards({ pieces: [upright] }));
		await expect(cut(actor, cardsId, plan(change))).rejects.toBeInstanceOf(Conflict);
		expect((await supplyById(db.reader, actor, oat)).amount).toBe(3);
	});

	it.each<[string, (sheet: ReturnType<typeof drawn>) => void]>([
		['pieces that overlap', (s) => (s.placements[1]!.x -= INCH)],
		['a cut through a piece', (s) => (s.cuts[0]!.at -= INCH)],
		['an offcut that isn’t left', (s) => (s.offcuts[1]!.h += INCH)],
		['an offcut that is a piece', (s) => s.offcuts.push(s.placements[0]!)],
		['the same offcut twice', (s) => s.offcuts.push(s.offcuts[1]!)],
		['no cuts', (s) => (s.cuts = [])]
	])('is refused with %s', async (_, change) => {
		const { actor, oat, cardsId } = await bench({}, cards({ pieces: [upright] }));
		await expect(cut(actor, cardsId, plan(change))).rejects.toBeInstanceOf(Invalid);
		expect((await supplyById(db.reader, actor, oat)).amount).toBe(3);
	});

	it('is refused while the paper is still on order', async () => {
		const { actor, cardsId } = await bench();
		await stock(db, actor, cardstock({ key: 'coming', arrives: '2999-01-01' }));
		await stock(db, actor, cardstock({ key: 'came', arrives: '2001-01-01' }));
		await expect(
			cut(
				actor,
				cardsId,
				plan((s) => (s.supply = 'coming'))
			)
		).rejects.toThrow('on order');
		await cut(
			actor,
			cardsId,
			plan((s) => (s.supply = 'came'))
		);
	});

	it.each<[string, Partial<Slots[number]>[], Partial<SheetRow>, boolean]>([
		['the design of another collection than was chosen', [{ design: 'Oat', collection: 'Field' }], {}, false],
		['the chosen design', [{ design: 'Oat', collection: 'Lane' }], {}, true],
		['two designs for slots that are the same', [{ sameAs: 'other' }], { collection: 'Field' }, false],
		['one design for slots that are the same', [{ sameAs: 'other' }], { collection: 'Lane' }, true],
		['one design for slots that differ', [{ differentFrom: ['other'] }], { collection: 'Lane' }, false],
		['two designs for slots that differ', [{ differentFrom: ['other'] }], { collection: 'Field' }, true]
	])('with %s', async (_, [set], otherRow, passes) => {
		const actor = await makeRoom(db);
		const faces = [{ design: 'Oat', direction: 'none' as const }];
		await stock(db, actor, cardstock({ faces, collection: 'Lane' }));
		await stock(db, actor, cardstock({ key: 'second', faces, ...otherRow }));
		const kind = 'cardstock';
		const bill = cards({
			slots: [
				{ key: 'card', material: { kind }, ...set },
				{ key: 'other', material: { kind } }
			],
			pieces: [
				{ key: 'front', slot: 'card', w: '5 1/2 in', h: '4 1/4 in', qty: 2 },
				{ key: 'back', slot: 'other', w: '5 1/2 in', h: '4 1/4 in', qty: 2 }
			]
		});
		const cardsId = await project(db, actor, bill);
		const second = drawn();
		second.supply = 'second';
		for (const placed of second.placements) placed.piece = 'back';
		const result = cut(actor, cardsId, { sheets: [drawn(), second] });
		if (passes) await result;
		else await expect(result).rejects.toThrow('bill has changed');
	});

	it('is refused to viewers, and to people of other rooms', async () => {
		const { actor, cardsId } = await bench();
		const viewer = await joinRoom(db, actor.roomId, 'viewer');
		await expect(cut(viewer, cardsId)).rejects.toBeInstanceOf(Forbidden);
		const stranger = await bench();
		await expect(cut(stranger.actor, cardsId)).rejects.toBeInstanceOf(NotFound);
	});
});

type Slots = ReturnType<typeof cards>['slots'];
type SheetRow = Parameters<typeof cardstock>[0] & object;
const upright = { key: 'front', slot: 'card', w: '5 1/2 in', h: '4 1/4 in', qty: 2, up: 'h' } as const;

describe('whatever is done', () => {
	it('leaves every amount the sum of its movements, and none below nothing', async () => {
		const deed = fc.oneof(
			fc.record({ verb: fc.constant('use' as const), amount: fc.integer({ min: 1, max: 4 }) }),
			fc.record({ verb: fc.constant('buy' as const), amount: fc.integer({ min: 1, max: 3 }) }),
			fc.record({ verb: fc.constant('count' as const), amount: fc.integer({ min: 0, max: 6 }) }),
			fc.record({ verb: fc.constant('cut' as const), amount: fc.constant(1) }),
			fc.record({ verb: fc.constant('undo' as const), amount: fc.integer({ min: 0, max: 9 }) })
		);
		await fc.assert(
			fc.asyncProperty(fc.array(deed, { maxLength: 12 }), async (deeds) => {
				const { actor, oat, cardsId } = await bench({}, cards(), 100);
				const acts: string[] = [];
				for (const { verb, amount } of deeds) {
					const id = v7();
					await attempt(() => {
						if (verb === 'cut') return cut(actor, cardsId, plan(), id);
						if (verb === 'undo') {
							const act = acts[amount % Math.max(1, acts.length)] ?? id;
							return db.write((tx) => undo(tx, actor, { id, act }));
						}
						if (verb === 'count') {
							const counts = [{ supply: oat, left: amount, count: 'counted' as const }];
							return db.write((tx) => recount(tx, actor, { id, counts }));
						}
						const kind = verb === 'use' ? 'used' : 'bought';
						return db.write((tx) => useSupply(tx, actor, { id, supply: oat, kind, amount }));
					});
					acts.push(id);
				}
				for (const { id, amount } of await stashOf(actor)) {
					const { ledger } = await supplyById(db.reader, actor, id);
					expect(amount).toBe(ledger.reduce((sum, { delta }) => sum + delta, 0));
					expect(ledger.every(({ balance }) => balance >= 0)).toBe(true);
				}
			}),
			{ numRuns: 25 }
		);
	});
});

/** Refusals are answers here; anything else is a fault. */
async function attempt(work: () => Promise<unknown>): Promise<void> {
	try {
		await work();
	} catch (error) {
		if (!(error instanceof Conflict || error instanceof NotFound)) throw error;
	}
}
