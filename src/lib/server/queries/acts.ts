import { and, eq } from 'drizzle-orm';
import type { Reader } from '../db/client';
import { acts, movements } from '../db/schema/ledger';
import { supplies } from '../db/schema/supplies';
import type { Actor } from '../session';

/** What somebody has just done, for the notice that offers to undo it. */
export interface Done {
	readonly act: string;
	readonly kind: (typeof acts.$inferSelect)['kind'];
	/** How many supplies it touched, and what one of them is called. */
	readonly rows: number;
	readonly name: string | null;
	readonly undone: boolean;
}

/** The actor's own act of that id; null for anybody else's, so that a passed-on address claims nothing. */
export async function doneAct(db: Reader, actor: Actor, id: string | null): Promise<Done | null> {
	if (!id) return null;
	const [act] = await db
		.select()
		.from(acts)
		.where(and(eq(acts.roomId, actor.roomId), eq(acts.id, id), eq(acts.who, actor.userId)));
	if (!act) return null;
	const booked = await db
		.selectDistinct({ id: movements.supplyId })
		.from(movements)
		.where(and(eq(movements.roomId, actor.roomId), eq(movements.act, id)));
	const touched = [...new Set([...act.changes, ...booked].map((row) => row.id))];
	const [first] = await db
		.select({ name: supplies.name })
		.from(supplies)
		.where(and(eq(supplies.roomId, actor.roomId), eq(supplies.id, touched[0] ?? '')));
	const [undoing] = await db
		.select({ id: acts.id })
		.from(acts)
		.where(and(eq(acts.roomId, actor.roomId), eq(acts.undoes, id)));
	return { act: id, kind: act.kind, rows: touched.length, name: first?.name ?? null, undone: !!undoing };
}
