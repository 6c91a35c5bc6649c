import type { Loss } from '../../domain/matching';
import type { ProjectResult } from '../../domain/matching/verdict';
import { writeExact } from '../../domain/length';
import type { Reader } from '../db/client';
import { answered } from '../answered';
import { matcher, type Matcher } from '../matcher';
import { Reckonings } from '../reckonings';
import type { Actor } from '../session';
import type { MatchQuestion } from '../../workers/match';
import { listProjects, type ProjectDetail, type ProjectRow } from './projects';
import { getRoom, type RoomDetail } from './rooms';
import { stashText } from './stash';

type Planned = Pick<ProjectDetail, 'id' | 'key' | 'bill' | 'copies' | 'version'>;

/** One project may take longer than its share of a whole room's ranking. */
const BUDGET_MS = 8000;
const plans = new Reckonings<ProjectResult>(64);
const losses = new Reckonings<readonly Loss[]>(64);

/** What the matcher says of one project alone against the whole stash, on a date (YYYY-MM-DD). */
export async function planFor(
	db: Reader,
	actor: Actor,
	project: Planned,
	on: string,
	by: Matcher = matcher
): Promise<ProjectResult> {
	const room = await getRoom(db, actor);
	return plans.of(named(project, on), room.revision, async () => {
		const { response } = await ask(db, actor, room, [project], on, by);
		return response.results[0]!;
	});
}

/** What carrying out a project's plan costs the room's other projects. */
export async function lossesFor(
	db: Reader,
	actor: Actor,
	project: Planned,
	on: string,
	by: Matcher = matcher
): Promise<readonly Loss[]> {
	// The room first: a plan may be newer than the revision that its losses are kept under, never older.
	const room = await getRoom(db, actor);
	const { plan } = await planFor(db, actor, project, on, by);
	if (!plan) return [];
	return losses.of(named(project, on), room.revision, async () => {
		const projects = await listProjects(db, actor);
		const reply = await ask(db, actor, room, projects, on, by, { project: project.key, plan });
		return reply.losses ?? [];
	});
}

/** The project as it was read, which may be before the room's revision was: an older bill's plan is another. */
const named = ({ id, version, copies }: Planned, on: string) => `${id} ${version} ${copies} ${on}`;

async function ask(
	db: Reader,
	actor: Actor,
	{ units, reach }: RoomDetail,
	projects: readonly Pick<ProjectRow, 'key' | 'bill' | 'copies'>[],
	on: string,
	by: Matcher,
	cut?: MatchQuestion['cut']
) {
	const request = {
		projects: projects.map(({ bill }) => bill),
		supplies: [],
		...{ mode: 'each', on, budgetMs: BUDGET_MS },
		copies: Object.fromEntries(projects.map(({ key, copies }) => [key, copies])),
		/** Every offcut is listed, scrap too: the person at the trimmer decides which she keeps. */
		options: { units, reach: reach === null ? null : writeExact(reach, 'mm'), keepOffcut: null }
	};
	const stash = await stashText(db, actor);
	return answered(await by.ask({ request, today: on, stash, ...(cut && { cut }) }, BUDGET_MS, 'room'));
}
