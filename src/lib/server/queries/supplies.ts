import { and, asc, count, desc, eq, getTableColumns, gt, inArray, isNotNull, isNull, sql } from 'drizzle-orm';
import type { SQL } from 'drizzle-orm';
import type { SupplyFilter } from '../../schemas/supply-filter';
import { today } from '../clock';
import type { Reader, Transaction } from '../db/client';
import { acts, movements } from '../db/schema/ledger';
import { users } from '../db/schema/people';
import { bins, supplies } from '../db/schema/supplies';
import { NotFound } from '../errors';
import type { Actor } from '../session';
import { rankByWords } from './search';

export type SupplyRow = Awaited<ReturnType<typeof listSupplies>>['rows'][number];
export type SupplyDetail = Awaited<ReturnType<typeof supplyById>>;
export type LedgerRow = SupplyDetail['ledger'][number];

export const PAGE_ROWS = 50;
/** What is thrown away can be had back this long. */
export const TRASH_DAYS = 30;

/** One page of the stash: the rows that the filter lets through, best first where it has words. */
export async function listSupplies(db: Reader, actor: Actor, filter: SupplyFilter) {
	const ranked = filter.q ? await rankByWords(db, actor, filter.q) : null;
	const where = and(live(actor), ...conditions(filter), ranked ? among(ranked) : undefined);
	const from = (filter.page - 1) * PAGE_ROWS;
	const ids = db.select({ id: supplies.id }).from(supplies).leftJoin(bins, inBin).where(where);
	const [total] = await db.select({ rows: count() }).from(supplies).leftJoin(bins, inBin).where(where);
	const found =
		ranked && !filter.sort
			? inOrder(ranked, await ids).slice(from, from + PAGE_ROWS)
			: await ids
					.orderBy(...order(filter.sort))
					.limit(PAGE_ROWS)
					.offset(from);
	const rows = await db
		.select(columns)
		.from(supplies)
		.leftJoin(bins, inBin)
		.where(among(found.map(({ id }) => id)));
	return {
		rows: inOrder(
			found.map(({ id }) => id),
			rows
		).map((row) => shown(actor, row)),
		total: total?.rows ?? 0,
		page: filter.page,
		pages: Math.max(1, Math.ceil((total?.rows ?? 0) / PAGE_ROWS))
	};
}

/**
 * One supply with its ledger, newest movement first. Those in the trash are found too.
 * @throws {NotFound} for another room's.
 */
export async function supplyById(db: Reader | Transaction, actor: Actor, id: string) {
	const [row] = await db
		.select(columns)
		.from(supplies)
		.leftJoin(bins, inBin)
		.where(and(eq(supplies.roomId, actor.roomId), eq(supplies.id, id)));
	if (!row) throw new NotFound();
	const ledger = await db
		.select({
			id: movements.id,
			act: movements.act,
			deed: acts.kind,
			kind: movements.kind,
			delta: movements.delta,
			/** What was left after it. */
			balance: sql<number>`sum(${movements.delta}) over (order by ${movements.id})`,
			at: movements.at,
			who: users.name,
			why: movements.why,
			undoes: movements.undoes,
			/** The whole act it belongs to was undone, or it is itself an undoing. */
			undone:
				sql<boolean>`exists (select 1 from ${acts} later where later.roomId = ${movements.roomId} and later.undoes = ${movements.act})`.mapWith(
					Boolean
				)
		})
		.from(movements)
		.leftJoin(users, eq(users.id, movements.who))
		.leftJoin(acts, and(eq(acts.roomId, movements.roomId), eq(acts.id, movements.act)))
		.where(and(eq(movements.roomId, actor.roomId), eq(movements.supplyId, id)))
		.orderBy(desc(movements.id))
		.limit(500);
	return { ...shown(actor, row), ledger };
}

/** How many rows there are of each kind, for the filter's choices. */
export function suppliesByKind(db: Reader, actor: Actor) {
	return db
		.select({ group: supplies.group, kind: supplies.kind, rows: count() })
		.from(supplies)
		.where(live(actor))
		.groupBy(supplies.group, supplies.kind)
		.orderBy(supplies.group, supplies.kind);
}

/** The room's bins, with how many supplies each holds. */
export function listBins(db: Reader | Transaction, actor: Actor) {
	return db
		.select({ id: bins.id, name: bins.name, rows: count(supplies.id) })
		.from(bins)
		.leftJoin(supplies, and(eq(supplies.binId, bins.id), isNull(supplies.deletedAt)))
		.where(eq(bins.roomId, actor.roomId))
		.groupBy(bins.id)
		.orderBy(sql`${bins.name} collate nocase`);
}

/** Collections in the stash, for the filter and for the forms' suggestions. */
export async function listCollections(db: Reader, actor: Actor): Promise<string[]> {
	const rows = await db
		.selectDistinct({ name: supplies.collection })
		.from(supplies)
		.where(and(live(actor), isNotNull(supplies.collection)))
		.orderBy(sql`${supplies.collection} collate nocase`);
	return rows.flatMap(({ name }) => name ?? []);
}

/** Supplies in the trash, the latest first; an offcut whose cut was undone never was. */
export async function listTrash(db: Reader, actor: Actor) {
	const rows = await db
		.select(columns)
		.from(supplies)
		.leftJoin(bins, inBin)
		.where(
			and(
				eq(supplies.roomId, actor.roomId),
				gt(supplies.deletedAt, Date.now() - TRASH_DAYS * 86_400_000),
				sql`not (${supplies.offcut} and ${supplies.amount} = 0)`
			)
		)
		.orderBy(desc(supplies.deletedAt))
		.limit(500);
	return rows.map((row) => shown(actor, row));
}

const { roomId: _room, ...own } = getTableColumns(supplies);
const columns = { ...own, bin: bins.name };
const inBin = eq(bins.id, supplies.binId);
type Stored = Omit<typeof supplies.$inferSelect, 'roomId'> & { bin: string | null };

/** Leaves out what it cost where the actor may not know. */
function shown(actor: Actor, { priceAmount, priceCurrency, ...row }: Stored) {
	if (!actor.seesPrices) return row;
	const price =
		priceAmount === null || priceCurrency === null ? null : { amount: priceAmount, currency: priceCurrency };
	return { ...row, price };
}

function live(actor: Actor): SQL | undefined {
	return and(eq(supplies.roomId, actor.roomId), isNull(supplies.deletedAt));
}

function conditions(filter: SupplyFilter) {
	const { group, kind, bin, collection, size, offcut, unsure, coming, lent, barcode } = filter;
	return [
		group && eq(supplies.group, group),
		kind && eq(supplies.kind, kind),
		bin && eq(bins.name, bin),
		collection && eq(supplies.collection, collection),
		barcode && eq(supplies.barcode, barcode),
		offcut ? eq(supplies.offcut, true) : undefined,
		unsure ? eq(supplies.count, 'unsure') : undefined,
		coming ? gt(supplies.arrives, today()) : undefined,
		lent ? isNotNull(supplies.lentUntil) : undefined,
		size && holds(size)
	].filter((condition) => condition !== undefined && condition !== null) as SQL[];
}

/** A sheet without its branding strip is at least this size, one way or the other. */
function holds({ w, h }: { w: number; h: number }): SQL | undefined {
	const across = sql`(${supplies.w} - iif(${supplies.stripEdge} in ('left', 'right'), ${supplies.stripDepth}, 0))`;
	const down = sql`(${supplies.h} - iif(${supplies.stripEdge} in ('top', 'bottom'), ${supplies.stripDepth}, 0))`;
	return and(
		eq(supplies.group, 'sheet'),
		gt(supplies.amount, 0),
		sql`((${across} >= ${w} and ${down} >= ${h}) or (${across} >= ${h} and ${down} >= ${w}))`
	);
}

function among(ids: readonly string[]): SQL {
	return inArray(supplies.id, sql`(select value from json_each(${JSON.stringify(ids)}))`);
}

function inOrder<Row extends { id: string }>(ids: readonly string[], rows: readonly Row[]): Row[] {
	const byId = new Map(rows.map((row) => [row.id, row]));
	return ids.flatMap((id) => byId.get(id) ?? []);
}

function order(sort: SupplyFilter['sort'] = 'name'): SQL[] {
	const way = sort.startsWith('-') ? desc : asc;
	return [...BY[sort.replace('-', '') as keyof typeof BY].map((by) => way(by)), asc(supplies.id)];
}

const byName = sql`${supplies.name} collate nocase`;
const BY = {
	name: [byName],
	kind: [sql`${supplies.kind}`, byName],
	amount: [sql`${supplies.amount}`],
	added: [sql`${supplies.createdAt}`],
	size: [sql`${supplies.w} * ${supplies.h}`],
	bin: [sql`${bins.name} collate nocase`, byName],
	collection: [sql`${supplies.collection} collate nocase`, byName]
};
