import { and, eq, isNull } from 'drizzle-orm';
import { keyFrom } from '../../schemas/key';
import { writeChange, writeSupply, type ExchangeDocument } from '../../domain/exchange';
import type { Supply } from '../../domain/stash';
import type { Reader } from '../db/client';
import { movements } from '../db/schema/ledger';
import { users } from '../db/schema/people';
import { supplies } from '../db/schema/supplies';
import type { Actor } from '../session';
import { freeKey, stashForMatching } from './stash';
import { listBins } from './supplies';
import { listProjects } from './projects';

/** The whole room as an exchange document: its supplies, projects and their order, bins and ledger. */
export async function exportRoom(db: Reader, actor: Actor): Promise<ExchangeDocument> {
	const stash = await stashForMatching(db, actor);
	const projects = await listProjects(db, actor);
	const taken = new Set<string>();
	return {
		format: 'paperlarder',
		version: 1,
		supplies: stash.map((supply) => writeSupply(actor.seesPrices ? supply : { ...supply, price: null })),
		projects: projects.map(({ bill }) => bill),
		bins: (await listBins(db, actor)).map(({ name }) => ({
			key: freeKey(keyFrom(name, 'bin'), taken),
			name
		})),
		ledger: await ledgerOf(db, actor, stash),
		order: projects.map(({ key, copies }) => ({ project: key, copies }))
	};
}

async function ledgerOf(
	db: Reader,
	actor: Actor,
	stash: readonly Supply[]
): Promise<NonNullable<ExchangeDocument['ledger']>> {
	const byKey = new Map(stash.map((supply) => [supply.key, supply]));
	const rows = await db
		.select({
			key: movements.id,
			supply: supplies.key,
			kind: movements.kind,
			delta: movements.delta,
			at: movements.at,
			act: movements.act,
			by: users.name,
			why: movements.why,
			undoes: movements.undoes
		})
		.from(movements)
		.innerJoin(supplies, eq(supplies.id, movements.supplyId))
		.leftJoin(users, eq(users.id, movements.who))
		.where(and(eq(movements.roomId, actor.roomId), isNull(supplies.deletedAt)))
		.orderBy(movements.id);
	return rows.flatMap(({ key, supply, kind, delta, at, by, why, undoes, act }) => {
		const exported = byKey.get(supply);
		// A tool that has gone for good is no supply any more, and takes its ledger with it.
		if (!exported) return [];
		const change = writeChange(delta, exported);
		return {
			...{ key, supply, kind, change, at: new Date(at).toISOString(), act },
			...(by !== null && { by }),
			...(why !== null && { why }),
			...(undoes !== null && { undoes })
		};
	});
}
