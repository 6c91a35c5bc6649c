import { and, eq, isNull } from 'drizzle-orm';
import Fuse, { type Expression } from 'fuse.js';
import type { Reader } from '../db/client';
import { rooms } from '../db/schema/rooms';
import { bins, supplies } from '../db/schema/supplies';
import type { Actor } from '../session';

interface Entry {
	readonly id: string;
	readonly name: string;
	readonly text: string;
}

interface Index {
	readonly revision: number;
	readonly fuse: Fuse<Entry>;
}

/** Rooms whose words are kept ready, the last used at the end. */
const ready = new Map<string, Index>();
const MOST_READY = 16;
const MOST_WORDS = 6;

/** Ids of the room's supplies that hold every one of the words, give or take a typing slip, best first. */
export async function rankByWords(db: Reader, actor: Actor, typed: string): Promise<string[]> {
	const words = typed.trim().split(/\s+/).slice(0, MOST_WORDS);
	const { fuse } = await indexOf(db, actor);
	const either = (word: string): Expression => ({ $or: [{ name: word }, { text: word }] });
	const query: Expression = { $and: words.map(either) };
	return fuse.search(query).map(({ item }) => item.id);
}

async function indexOf(db: Reader, actor: Actor): Promise<Index> {
	const [room] = await db.select({ revision: rooms.revision }).from(rooms).where(eq(rooms.id, actor.roomId));
	const revision = room?.revision ?? 0;
	const kept = ready.get(actor.roomId);
	ready.delete(actor.roomId);
	const index = kept?.revision === revision ? kept : { revision, fuse: await build(db, actor) };
	ready.set(actor.roomId, index);
	for (const [oldest] of ready) {
		if (ready.size <= MOST_READY) break;
		ready.delete(oldest);
	}
	return index;
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
