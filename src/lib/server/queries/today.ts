import { eq } from 'drizzle-orm';
import { writeExact } from '../../domain/length';
import type { ProjectResult } from '../../domain/matching/verdict';
import type { Reader } from '../db/client';
import { rooms } from '../db/schema/rooms';
import { Invalid, NotFound } from '../errors';
import { matcher, type Matcher } from '../matcher';
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

/** What a room's whole ranking may take. */
const BUDGET_MS = 5000;
/** Rankings kept, by room, mode and date; each serves until its room changes. */
const kept = new Map<string, { revision: number; today: Promise<Today> }>();
const MOST_KEPT = 32;

/** What can be made from the room's stash on a date: every project in the queue's order with what the matcher says. */
export async function todayFor(
	db: Reader,
	actor: Actor,
	asking: Asking,
	by: Matcher = matcher
): Promise<Today> {
	const [room] = await db.select().from(rooms).where(eq(rooms.id, actor.roomId));
	if (!room) throw new NotFound();
	const name = `${actor.roomId} ${asking.mode} ${asking.on}`;
	const known = kept.get(name);
	kept.delete(name);
	const fresh =
		known?.revision === room.revision
			? known
			: { revision: room.revision, today: rank(db, actor, room, asking, by) };
	fresh.today.catch(() => kept.get(name) === fresh && kept.delete(name));
	kept.set(name, fresh);
	for (const [oldest] of kept) {
		if (kept.size <= MOST_KEPT) break;
		kept.delete(oldest);
	}
	return fresh.today;
}

/** What the matcher says of one project. @throws {NotFound} */
export async function todayForProject(
	db: Reader,
	actor: Actor,
	projectId: string,
	asking: Asking
): Promise<TodayRow> {
	const { rows } = await todayFor(db, actor, asking);
	const row = rows.find(({ project }) => project.id === projectId);
	if (!row) throw new NotFound();
	return row;
}

async function rank(
	db: Reader,
	actor: Actor,
	room: typeof rooms.$inferSelect,
	{ mode, on }: Asking,
	by: Matcher
): Promise<Today> {
	const projects = await listProjects(db, actor);
	const { units, reach, keepOffcut } = room;
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
	const reply = await by.ask({ request, today: on, stash }, BUDGET_MS, 'room');
	if (!reply.ok)
		throw new Invalid(reply.issues.map(({ path, message }) => ({ path: path.split('.'), message })));
	const results = new Map(reply.response.results.map((result) => [result.project, result]));
	const rows = projects.flatMap((project) => {
		const result = results.get(project.key);
		return result ? [{ project, result }] : [];
	});
	return { mode, on, revision: room.revision, rows };
}
