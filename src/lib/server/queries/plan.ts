import { writeExact } from '../../domain/length';
import type { ProjectResult } from '../../domain/matching/verdict';
import type { Reader } from '../db/client';
import { Invalid } from '../errors';
import { matcher, type Matcher } from '../matcher';
import type { Actor } from '../session';
import type { ProjectDetail } from './projects';
import { getRoom } from './rooms';
import { stashText } from './stash';

/** One project may take longer than its share of a whole room's ranking. */
const BUDGET_MS = 8000;
/** Plans kept, by project and date; each serves until its room changes. */
const kept = new Map<string, { revision: number; plan: Promise<ProjectResult> }>();
const MOST_KEPT = 64;

/** What the matcher says of one project alone against the whole stash, on a date (YYYY-MM-DD). */
export async function planFor(
	db: Reader,
	actor: Actor,
	project: Pick<ProjectDetail, 'id' | 'key' | 'bill' | 'copies'>,
	on: string,
	by: Matcher = matcher
): Promise<ProjectResult> {
	const { revision, units, reach, keepOffcut } = await getRoom(db, actor);
	const name = `${project.id} ${on}`;
	const known = kept.get(name);
	if (known?.revision === revision) return known.plan;

	const request = {
		projects: [project.bill],
		supplies: [],
		...{ mode: 'each', on, budgetMs: BUDGET_MS },
		copies: { [project.key]: project.copies },
		options: {
			units,
			reach: reach === null ? null : writeExact(reach, 'mm'),
			keepOffcut: keepOffcut === null ? null : writeExact(keepOffcut, 'mm')
		}
	};
	const plan = stashText(db, actor)
		.then((stash) => by.ask({ request, today: on, stash }, BUDGET_MS, 'room'))
		.then((reply) => {
			if (reply.ok) return reply.response.results[0]!;
			throw new Invalid(reply.issues.map(({ path, message }) => ({ path: path.split('.'), message })));
		});
	const fresh = { revision, plan };
	kept.set(name, fresh);
	plan.catch(() => kept.get(name) === fresh && kept.delete(name));
	for (const [oldest] of kept) {
		if (kept.size <= MOST_KEPT) break;
		kept.delete(oldest);
	}
	return plan;
}
