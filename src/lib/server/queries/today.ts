import { eq } from 'drizzle-orm';
import { writeExact } from '../../domain/length';
import type { Unlock } from '../../domain/matching';
import type { ProjectResult } from '../../domain/matching/verdict';
import type { Reader } from '../db/client';
import { rooms } from '../db/schema/rooms';
import { answered } from '../answered';
import { NotFound } from '../errors';
import { matcher, type Matcher } from '../matcher';
import { Reckonings } from '../reckonings';
import type { Actor } from '../session';
import { listProjects, type ProjectRow } from './projects';
import { stashText } from './stash';

export interface Asking {
	readonly mode: 'each' | 'queue';
	/** The making date, YYYY-MM-DD. */
	readonly on: string;
}

export interface Today extends Asking {
	/** The room's revision that this was worked out from. */
	readonly revision: number;
	readonly rows: readonly TodayRow[];
}

export interface TodayRow {
	readonly project: ProjectRow;
	readonly result: ProjectResult;
}

/** What a room's whole ranking may take, and the same again for its unlocks. */
const BUDGET_MS = 10_000;
const rankings = new Reckonings<Today>(32);
const purchases = new Reckonings<readonly Unlock[]>(32);

/** What can be made from the room's stash on a date: every project in the queue's order with what the matcher says. */
export async function todayFor(
	db: Reader,
	actor: Actor,
	asking: Asking,
	by: Matcher = matcher
): Promise<Today> {
	const room = await roomOf(db, actor);
	return rankings.of(`${room.id} ${asking.mode} ${asking.on}`, room.revision, () =>
		rank(db, actor, room, asking, by)
	);
}

/**
 * What can be bought, and the projects by key that each purchase alone turns to *now*; most first. It tries every
 * missing thing, so it takes longer than the ranking: a page shows that first and streams this after it.
 */
export async function unlocksFor(
	db: Reader,
	actor: Actor,
	on: string,
	by: Matcher = matcher
): Promise<readonly Unlock[]> {
	const room = await roomOf(db, actor);
	const found = await purchases.of(`${room.id} ${on}`, room.revision, async () => {
		const projects = await listProjects(db, actor);
		const { unlocks = [] } = await asked(db, actor, room, projects, { mode: 'each', on }, by, true);
		return unlocks;
	});
	// What is kept serves everybody in the room; what a thing costs isn't everybody's to know.
	if (actor.seesPrices) return found;
	return found.map(({ buy, ...unlock }) => ({ ...unlock, buy: { ...buy, price: null } }));
}

type Room = typeof rooms.$inferSelect;

async function roomOf(db: Reader, actor: Actor): Promise<Room> {
	const [room] = await db.select().from(rooms).where(eq(rooms.id, actor.roomId));
	if (!room) throw new NotFound();
	return room;
}

async function rank(db: Reader, actor: Actor, room: Room, asking: Asking, by: Matcher): Promise<Today> {
	const projects = await listProjects(db, actor);
	const { response } = await asked(db, actor, room, projects, asking, by, false);
	const results = new Map(response.results.map((result) => [result.project, result]));
	const rows = projects.flatMap((project) => {
		const result = results.get(project.key);
		return result ? [{ project, result }] : [];
	});
	return { ...asking, revision: room.revision, rows };
}

async function asked(
	db: Reader,
	actor: Actor,
	{ units, reach, keepOffcut }: Room,
	projects: readonly ProjectRow[],
	{ mode, on }: Asking,
	by: Matcher,
	unlocks: boolean
) {
	const request = {
		projects: projects.map(({ bill }) => bill),
		supplies: [],
		...{ mode, on, budgetMs: BUDGET_MS },
		copies: Object.fromEntries(projects.map(({ key, copies }) => [key, copies])),
		options: {
			units,
			reach: reach === null ? null : writeExact(reach, 'mm'),
			keepOffcut: keepOffcut === null ? null : writeExact(keepOffcut, 'mm')
		}
	};
	const stash = await stashText(db, actor);
	return answered(await by.ask({ request, today: on, stash, unlocks }, 2 * BUDGET_MS, 'room'));
}
