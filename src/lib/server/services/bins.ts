import { and, eq } from 'drizzle-orm';
import { v7 } from 'uuid';
import type { Transaction } from '../db/client';
import { bins } from '../db/schema/supplies';
import type { Actor } from '../session';

/** The id of the room's bin of that name, made where there is none; null for no bin. */
export async function binNamed(
	tx: Transaction,
	actor: Actor,
	named: string | null | undefined
): Promise<string | null> {
	const name = named?.trim();
	if (!name) return null;
	await tx.insert(bins).values({ id: v7(), roomId: actor.roomId, name }).onConflictDoNothing();
	const [bin] = await tx
		.select({ id: bins.id })
		.from(bins)
		.where(and(eq(bins.roomId, actor.roomId), eq(bins.name, name)));
	return bin?.id ?? null;
}

/** The same for many rows: each name's id, null for none. */
export async function binsNamed(
	tx: Transaction,
	actor: Actor,
	names: readonly (string | null)[]
): Promise<Map<string | null, string | null>> {
	const ids = new Map<string | null, string | null>();
	for (const name of new Set(names)) ids.set(name, await binNamed(tx, actor, name));
	return ids;
}
