import { and, eq } from 'drizzle-orm';
import type { Transaction } from '../db/client';
import { supplies } from '../db/schema/supplies';
import { NotFound } from '../errors';
import type { Actor } from '../session';
import { requireWriter } from './ledger';
import { touchRoom } from './revision';

/** Gives a supply the picture kept under this name in the photos folder. @throws {NotFound | Forbidden} */
export async function attachPicture(
	tx: Transaction,
	actor: Actor,
	{ key, picture }: { key: string; picture: string }
): Promise<void> {
	requireWriter(actor);
	const attached = await tx
		.update(supplies)
		.set({ picture })
		.where(and(eq(supplies.roomId, actor.roomId), eq(supplies.key, key)))
		.returning({ id: supplies.id });
	if (attached.length === 0) throw new NotFound();
	await touchRoom(tx, actor.roomId);
}
