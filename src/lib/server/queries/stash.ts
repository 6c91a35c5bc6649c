import { and, eq, getTableColumns, inArray, isNull, or, sql } from 'drizzle-orm';
import type { Supply } from '../../domain/stash';
import type { Reader, Transaction } from '../db/client';
import { rooms } from '../db/schema/rooms';
import { bins, supplies } from '../db/schema/supplies';
import { NotFound } from '../errors';
import type { Actor } from '../session';
import { supplyOf } from '../supply-row';

export type StoredSupply = Awaited<ReturnType<typeof storedSupplies>>[number];

/** Every supply of the room as the matcher takes them, in the order in which they were added. */
export async function stashForMatching(db: Reader | Transaction, actor: Actor): Promise<Supply[]> {
	const rows = await db
		.select({ ...getTableColumns(supplies), bin: bins.name })
		.from(supplies)
		.leftJoin(bins, eq(bins.id, supplies.binId))
		.where(and(eq(supplies.roomId, actor.roomId), isNull(supplies.deletedAt)))
		.orderBy(supplies.id);
	return rows.map(supplyOf);
}

/**
 * The room's own rows by id, in the order of the ids; those in the trash only where `trashed`.
 * @throws {NotFound} where one is another room's, or isn't there.
 */
export async function storedSupplies(
	db: Reader | Transaction,
	actor: Actor,
	ids: readonly string[],
	trashed = false
) {
	const wanted = [...new Set(ids)];
	const rows = await db
		.select({ ...getTableColumns(supplies), bin: bins.name })
		.from(supplies)
		.leftJoin(bins, eq(bins.id, supplies.binId))
		.where(
			and(
				eq(supplies.roomId, actor.roomId),
				trashed ? undefined : isNull(supplies.deletedAt),
				inArray(supplies.id, wanted)
			)
		);
	const byId = new Map(rows.map((row) => [row.id, row]));
	return wanted.map((id) => {
		const row = byId.get(id);
		if (!row) throw new NotFound();
		return row;
	});
}

/** The room's own row. @throws {NotFound} */
export async function storedSupply(
	db: Reader | Transaction,
	actor: Actor,
	id: string
): Promise<StoredSupply> {
	const [row] = await storedSupplies(db, actor, [id]);
	return row!;
}

/** `wanted` itself, or with a number behind it, where the room (trash included) has it already. */
export async function freeSupplyKeys(
	tx: Transaction,
	actor: Actor,
	wanted: readonly string[]
): Promise<string[]> {
	const stems = [...new Set(wanted)];
	const taken = new Set<string>();
	for (const stem of stems) {
		const prefix = `${stem.slice(0, 58)}-`;
		const rows = await tx
			.select({ key: supplies.key })
			.from(supplies)
			.where(
				and(
					eq(supplies.roomId, actor.roomId),
					or(eq(supplies.key, stem), sql`substr(${supplies.key}, 1, ${prefix.length}) = ${prefix}`)
				)
			);
		for (const { key } of rows) taken.add(key);
	}
	return wanted.map((stem) => freeKey(stem, taken));
}

/** Takes the first of `stem`, `stem-2`, `stem-3` … that isn't taken, and marks it so. */
export function freeKey(stem: string, taken: Set<string>): string {
	let key = stem;
	for (let number = 2; taken.has(key); number++) key = `${stem.slice(0, 58)}-${number}`;
	taken.add(key);
	return key;
}

/** What a bare number means in this room. */
export async function roomUnits(db: Reader | Transaction, actor: Actor): Promise<'in' | 'mm' | 'cm'> {
	const [room] = await db.select({ units: rooms.units }).from(rooms).where(eq(rooms.id, actor.roomId));
	return room?.units ?? 'in';
}
