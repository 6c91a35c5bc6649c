import { and, eq, getTableColumns, gt, gte, inArray, isNull, lt, ne, or, sql } from 'drizzle-orm';
import type { Supply } from '../../domain/stash';
import { readStash } from '../../domain/stash-row';
import type { Reader, Transaction } from '../db/client';
import { rooms } from '../db/schema/rooms';
import { bins, supplies } from '../db/schema/supplies';
import { NotFound } from '../errors';
import type { Actor } from '../session';

export type StoredSupply = Awaited<ReturnType<typeof storedSupplies>>[number];

/** Every supply of the room, in the order in which they were added; a tool that has gone for good is none. */
export async function stashForMatching(db: Reader | Transaction, actor: Actor): Promise<Supply[]> {
	return readStash(await stashText(db, actor));
}

/**
 * The same as the JSON text that `readStash` reads. Thousands of rows come out of the database several times
 * faster as one text than as rows, and a text goes to the matcher's thread without being copied piece by piece.
 */
export async function stashText(db: Reader | Transaction, actor: Actor): Promise<string> {
	const stored = db
		.select({ ...getTableColumns(supplies), bin: sql`${bins.name}`.as('bin') })
		.from(supplies)
		.leftJoin(bins, eq(bins.id, supplies.binId))
		.where(
			and(
				eq(supplies.roomId, actor.roomId),
				isNull(supplies.deletedAt),
				or(ne(supplies.group, 'tool'), gt(supplies.amount, 0))
			)
		)
		.orderBy(supplies.id);
	const [row] = await db.values<[string]>(
		sql`select json_group_array(json_object(${sql.raw(ROW)})) from (${stored})`
	);
	return row?.[0] ?? '[]';
}

/** A real number is written with all of its digits; JSON of SQLite's own has 15. */
const WRITTEN: Readonly<Record<string, string>> = {
	gsm: `iif(gsm is null, null, printf('%!.17g', gsm))`,
	offcut: `json(iif(offcut, 'true', 'false'))`,
	...Object.fromEntries(['entered', 'faces', 'colours', 'cuts'].map((name) => [name, `json("${name}")`]))
};
const UNSENT = new Set(['id', 'roomId', 'binId', 'picture', 'version', 'createdAt', 'deletedAt']);
const ROW = [...Object.keys(getTableColumns(supplies)).filter((name) => !UNSENT.has(name)), 'bin']
	.map((name) => `'${name}', ${WRITTEN[name] ?? `"${name}"`}`)
	.join(', ');

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
		const numbered = `${stem.slice(0, 58)}-`;
		const rows = await tx
			.select({ key: supplies.key })
			.from(supplies)
			.where(
				and(
					eq(supplies.roomId, actor.roomId),
					// No character of a key comes after ~.
					or(eq(supplies.key, stem), and(gte(supplies.key, numbered), lt(supplies.key, `${numbered}~`)))
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
