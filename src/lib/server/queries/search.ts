import { and, eq, isNull } from 'drizzle-orm';
import Fuse, { type Expression } from 'fuse.js';
import type { Reader } from '../db/client';
import { rooms } from '../db/schema/rooms';
import { bins, supplies } from '../db/schema/supplies';
import { Reckonings } from '../reckonings';
import type { Actor } from '../session';

interface Entry {
	readonly id: string;
	readonly name: string;
	readonly text: string;
}

/** Each room's words, kept ready. */
const indexes = new Reckonings<Fuse<Entry>>(16);
const MOST_WORDS = 6;

/** Ids of the room's supplies that hold every one of the words, give or take a typing slip, best first. */
export async function rankByWords(db: Reader, actor: Actor, typed: string): Promise<string[]> {
	const words = typed.trim().split(/\s+/).slice(0, MOST_WORDS);
	const fuse = await indexOf(db, actor);
	const either = (word: string): Expression => ({ $or: [{ name: word }, { text: word }] });
	const query: Expression = { $and: words.map(either) };
	return fuse.search(query).map(({ item }) => item.id);
}

async function indexOf(db: Reader, actor: Actor): Promise<Fuse<Entry>> {
	const [room] = await db.select({ revision: rooms.revision }).from(rooms).where(eq(rooms.id, actor.roomId));
	return indexes.of(actor.roomId, room?.revision ?? 0, () => build(db, actor));
}

async function build(db: Reader, actor: Actor): Promise<Fuse<Entry>> {
	const rows = await db
		.select({
			id: supplies.id,
			name: supplies.name,
			kind: supplies.kind,
			collection: supplies.collection,
			faces: supplies.faces,
			bin: bins.name,
			barcode: supplies.barcode,
			shape: supplies.shape
		})
		.from(supplies)
		.leftJoin(bins, eq(bins.id, supplies.binId))
		.where(and(eq(supplies.roomId, actor.roomId), isNull(supplies.deletedAt)));
	const entries = rows.map(({ id, name, kind, collection, faces, bin, barcode, shape }) => ({
		id,
		name,
		text: [kind.replaceAll('-', ' '), collection, ...faces.map(({ design }) => design), bin, barcode, shape]
			.filter(Boolean)
			.join(' ')
	}));
	return new Fuse(entries, {
		keys: [
			{ name: 'name', weight: 2 },
			{ name: 'text', weight: 1 }
		],
		ignoreLocation: true,
		threshold: 0.34
	});
}
