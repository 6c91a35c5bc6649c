import { and, eq } from 'drizzle-orm';
import type { Reader } from '../db/client';
import { supplies } from '../db/schema/supplies';
import { NotFound } from '../errors';
import type { Actor } from '../session';

/** A picture's name is one file in one folder: no path can be made of it. */
const FILE = /^[a-z0-9][a-z0-9_-]*\.webp$/i;

/** The name of a supply's picture in the photos folder. @throws {NotFound} */
export async function pictureOf(db: Reader, actor: Actor, supplyId: string): Promise<string> {
	const [row] = await db
		.select({ picture: supplies.picture })
		.from(supplies)
		.where(and(eq(supplies.roomId, actor.roomId), eq(supplies.id, supplyId)));
	if (!row?.picture || !FILE.test(row.picture)) throw new NotFound();
	return row.picture;
}
