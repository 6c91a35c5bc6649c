import { and, asc, desc, eq, gt, isNull, sql } from 'drizzle-orm';
import type { BillDocument } from '../../domain/exchange';
import type { Reader, Transaction } from '../db/client';
import { acts } from '../db/schema/ledger';
import { users } from '../db/schema/people';
import { projects } from '../db/schema/projects';
import { NotFound } from '../errors';
import type { Actor } from '../session';
import { TRASH_DAYS } from './supplies';

export type ProjectRow = Awaited<ReturnType<typeof listProjects>>[number];
export type ProjectDetail = Awaited<ReturnType<typeof projectById>>;

/** The room's projects in the order of its queue, each with its bill as it was typed. */
export async function listProjects(db: Reader | Transaction, actor: Actor) {
	const rows = await db
		.select(columns)
		.from(projects)
		.where(and(eq(projects.roomId, actor.roomId), isNull(projects.deletedAt)))
		.orderBy(asc(projects.position), asc(projects.id));
	return rows.map(withBill);
}

/** One project with the times it was cut. Those in the trash are found too. @throws {NotFound} */
export async function projectById(db: Reader | Transaction, actor: Actor, id: string) {
	const [row] = await db
		.select(columns)
		.from(projects)
		.where(and(eq(projects.roomId, actor.roomId), eq(projects.id, id)));
	if (!row) throw new NotFound();
	const cuts = await db
		.select({
			act: acts.id,
			at: acts.at,
			who: users.name,
			undone:
				sql<boolean>`exists (select 1 from ${acts} later where later.roomId = ${acts.roomId} and later.undoes = ${acts.id})`.mapWith(
					Boolean
				)
		})
		.from(acts)
		.leftJoin(users, eq(users.id, acts.who))
		.where(and(eq(acts.roomId, actor.roomId), eq(acts.projectId, id), eq(acts.kind, 'cut')))
		.orderBy(desc(acts.at), desc(acts.id));
	return { ...withBill(row), cuts };
}

/** Projects in the trash, the latest first. */
export async function listTrashedProjects(db: Reader, actor: Actor) {
	const rows = await db
		.select(columns)
		.from(projects)
		.where(
			and(eq(projects.roomId, actor.roomId), gt(projects.deletedAt, Date.now() - TRASH_DAYS * 86_400_000))
		)
		.orderBy(desc(projects.deletedAt));
	return rows.map(withBill);
}

const { id, key, name, bill, copies, position, version, createdAt, updatedAt, deletedAt } = projects;
const columns = { id, key, name, bill, copies, position, version, createdAt, updatedAt, deletedAt };

function withBill<Row extends { bill: string }>({ bill, ...row }: Row) {
	return { ...row, bill: JSON.parse(bill) as BillDocument };
}
