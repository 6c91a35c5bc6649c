import { and, eq, inArray } from 'drizzle-orm';
import { v7 } from 'uuid';
import { readDocument, type BillDocument, type Exchange, type ExchangeDocument } from '../../domain/exchange';
import type { Supply } from '../../domain/stash';
import type { Reader, Transaction } from '../db/client';
import type { Change } from '../db/schema/ledger';
import { projects } from '../db/schema/projects';
import { bins, supplies } from '../db/schema/supplies';
import { Invalid } from '../errors';
import { roomUnits } from '../queries/stash';
import { listBins } from '../queries/supplies';
import { inLots } from '../in-lots';
import { readable } from '../readable';
import type { Actor } from '../session';
import { amountOf, columnsOf } from '../supply-row';
import { binNamed, binsNamed } from './bins';
import { perform, requireWriter, type Entry } from './ledger';
import { billText } from './projects';
import { createRows, differing, isMeasuredAlike } from './supplies';

export interface ImportSummary {
	readonly supplies: { readonly added: number; readonly changed: number; readonly unchanged: number };
	readonly projects: { readonly added: number; readonly changed: number; readonly unchanged: number };
	readonly bins: { readonly added: number };
}

/** What importing would do. @throws {Invalid} with every issue of the document. */
export async function previewImport(
	db: Reader | Transaction,
	actor: Actor,
	document: ExchangeDocument
): Promise<ImportSummary> {
	return summary(await planImport(db, actor, document));
}

/**
 * Takes a document in, all of it or nothing. Rows and projects are known by key: those that are there become what
 * the document says, the others are added with their ledger. Importing twice is the same as once.
 */
export async function importRoom(
	tx: Transaction,
	actor: Actor,
	input: { id: string; document: ExchangeDocument }
): Promise<ImportSummary> {
	requireWriter(actor);
	const plan = await planImport(tx, actor, input.document);
	await perform(tx, actor, { id: input.id, kind: 'import' }, async (at) => {
		for (const name of plan.bins) await binNamed(tx, actor, name);
		const binIds = await binsNamed(
			tx,
			actor,
			plan.changed.map(({ supply }) => supply.bin)
		);
		const changes: Change[] = [];
		const entries: Entry[] = [];
		for (const { row, supply } of plan.changed) {
			const wanted = { ...columnsOf(supply), binId: binIds.get(supply.bin), deletedAt: null };
			changes.push(...differing(row, wanted));
			const delta = amountOf(supply) - row.amount;
			if (delta !== 0) entries.push({ supplyId: row.id, kind: 'counted', delta });
		}
		const added = plan.added.map((supply) => ({ id: v7(), key: supply.key, supply, picture: null }));
		const filed = await createRows(tx, actor, at, added);
		const ids = new Map(added.map(({ id, key }) => [key, id]));
		entries.push(...history(plan.ledger, ids), ...topUps(plan, ids));
		await keepProjects(tx, actor, at, plan);
		return { changes: [...changes, ...filed.changes], entries };
	});
	return summary(plan);
}

type SupplyRow = typeof supplies.$inferSelect & { bin: string | null };
type ProjectRow = typeof projects.$inferSelect;

interface ImportPlan {
	readonly added: readonly Supply[];
	readonly changed: readonly { readonly row: SupplyRow; readonly supply: Supply }[];
	readonly unchanged: number;
	readonly bins: readonly string[];
	readonly ledger: Exchange['ledger'];
	readonly order: Exchange['order'];
	readonly projects: {
		readonly added: readonly BillDocument[];
		readonly changed: readonly {
			readonly row: ProjectRow;
			readonly bill: BillDocument;
			readonly copies: number;
		}[];
		readonly unchanged: number;
	};
}

async function planImport(
	db: Reader | Transaction,
	actor: Actor,
	document: ExchangeDocument
): Promise<ImportPlan> {
	const units = await roomUnits(db, actor);
	const exchange = readable(() => readDocument(document, units), ['document']);
	const known = await knownSupplies(db, actor, exchange.supplies);
	const bills = (document.projects ?? []).map((bill) => ({ ...bill, units: bill.units ?? units }));
	const present = exchange.supplies.flatMap((supply) => {
		const row = known.get(supply.key);
		return row ? [{ row, supply }] : [];
	});
	present.forEach(refuseOtherMeasure);
	const changed = present.filter(({ row, supply }) => differs(row, supply));
	const there = new Set((await listBins(db, actor)).map(({ name }) => name));
	return {
		added: exchange.supplies.filter(({ key }) => !known.has(key)),
		changed,
		unchanged: present.length - changed.length,
		bins: exchange.bins.map(({ name }) => name.trim()).filter((name) => !there.has(name)),
		ledger: exchange.ledger,
		order: exchange.order,
		projects: await planProjects(db, actor, bills, exchange.order)
	};
}

async function planProjects(
	db: Reader | Transaction,
	actor: Actor,
	bills: readonly BillDocument[],
	order: Exchange['order']
): Promise<ImportPlan['projects']> {
	const rows = await db.select().from(projects).where(eq(projects.roomId, actor.roomId));
	const known = new Map(rows.map((row) => [row.key, row]));
	const copies = new Map(order.map((turn) => [turn.project, turn.copies]));
	const present = bills.flatMap((bill) => {
		const row = known.get(bill.key);
		return row ? [{ row, bill, copies: copies.get(bill.key) ?? row.copies }] : [];
	});
	const changed = present.filter(
		({ row, bill, copies }) => row.deletedAt !== null || row.copies !== copies || !sameBill(row.bill, bill)
	);
	return {
		added: bills.filter(({ key }) => !known.has(key)),
		changed,
		unchanged: present.length - changed.length
	};
}

async function knownSupplies(
	db: Reader | Transaction,
	actor: Actor,
	wanted: readonly Supply[]
): Promise<Map<string, SupplyRow>> {
	const known = new Map<string, SupplyRow>();
	await inLots(wanted, 500, async (some) => {
		const keys = some.map(({ key }) => key);
		const rows = await db
			.select()
			.from(supplies)
			.leftJoin(bins, eq(bins.id, supplies.binId))
			.where(and(eq(supplies.roomId, actor.roomId), inArray(supplies.key, keys)));
		for (const { supplies: row, bins: bin } of rows) known.set(row.key, { ...row, bin: bin?.name ?? null });
	});
	return known;
}

function refuseOtherMeasure({ row, supply }: { row: SupplyRow; supply: Supply }): void {
	if (isMeasuredAlike(row, supply)) return;
	throw new Invalid([
		{
			path: ['document', 'supplies'],
			message: `The room has something else under the key “${row.key}”. Give this supply another key.`
		}
	]);
}

function differs(row: SupplyRow, supply: Supply): boolean {
	const wanted = {
		...columnsOf(supply),
		bin: supply.bin?.trim() ?? null,
		amount: amountOf(supply),
		deletedAt: null
	};
	return differing(row, wanted).length > 0;
}

/** A new row's past. Who made a movement is known by name only, so it is nobody of this room. */
function history(ledger: Exchange['ledger'], ids: ReadonlyMap<string, string>): Entry[] {
	const lines = ledger.filter(({ supply }) => ids.has(supply));
	const names = new Map(lines.map(({ key }) => [key, v7()]));
	return lines.map(({ key, supply, kind, change, at, why, undoes }) => ({
		id: names.get(key),
		supplyId: ids.get(supply)!,
		...{ kind, why, delta: change, at: Date.parse(at), who: null },
		undoes: undoes === null ? undefined : names.get(undoes)
	}));
}

/** Brings each new row from what its ledger adds up to to what the document says is there. */
function topUps({ added, ledger }: ImportPlan, ids: ReadonlyMap<string, string>): Entry[] {
	const sums = new Map<string, number>();
	for (const { supply, change } of ledger) sums.set(supply, (sums.get(supply) ?? 0) + change);
	return added.flatMap((supply): Entry[] => {
		const sum = sums.get(supply.key);
		const delta = amountOf(supply) - (sum ?? 0);
		return sum !== undefined && delta === 0
			? []
			: [{ supplyId: ids.get(supply.key)!, kind: 'counted', delta }];
	});
}

async function keepProjects(tx: Transaction, actor: Actor, at: number, plan: ImportPlan): Promise<void> {
	const copies = new Map(plan.order.map((turn) => [turn.project, turn.copies]));
	for (const { row, bill, copies } of plan.projects.changed) {
		await tx
			.update(projects)
			.set({
				...{ name: bill.name, bill: billText(bill), copies, deletedAt: null, updatedAt: at },
				version: row.version + (sameBill(row.bill, bill) ? 0 : 1)
			})
			.where(and(eq(projects.roomId, actor.roomId), eq(projects.id, row.id)));
	}
	const standing = await tx
		.select({ key: projects.key, position: projects.position })
		.from(projects)
		.where(eq(projects.roomId, actor.roomId));
	const next = Math.max(-1, ...standing.map(({ position }) => position)) + 1;
	for (const [nth, bill] of plan.projects.added.entries()) {
		await tx.insert(projects).values({
			...{ id: v7(), roomId: actor.roomId, key: bill.key, name: bill.name, bill: billText(bill) },
			...{ copies: copies.get(bill.key) ?? 1, position: next + nth, createdAt: at, updatedAt: at }
		});
	}
	await orderProjects(tx, actor, plan.order);
}

/** The document's projects in its order, in the places that they hold between them. */
async function orderProjects(tx: Transaction, actor: Actor, order: Exchange['order']): Promise<void> {
	const rows = await tx
		.select({ id: projects.id, key: projects.key, position: projects.position })
		.from(projects)
		.where(eq(projects.roomId, actor.roomId));
	const byKey = new Map(rows.map((row) => [row.key, row]));
	const named = order.flatMap(({ project }) => byKey.get(project) ?? []);
	const places = named.map(({ position }) => position).sort((a, b) => a - b);
	for (const [nth, { id, position }] of named.entries()) {
		if (position === places[nth]) continue;
		await tx
			.update(projects)
			.set({ position: places[nth] })
			.where(and(eq(projects.roomId, actor.roomId), eq(projects.id, id)));
	}
}

function sameBill(kept: string, bill: BillDocument): boolean {
	return kept === billText(bill);
}

function summary({ added, changed, unchanged, bins, projects }: ImportPlan): ImportSummary {
	return {
		supplies: { added: added.length, changed: changed.length, unchanged },
		projects: {
			added: projects.added.length,
			changed: projects.changed.length,
			unchanged: projects.unchanged
		},
		bins: { added: bins.length }
	};
}
