import { and, eq, inArray } from 'drizzle-orm';
import type { ProjectResult } from '../../domain/matching/verdict';
import type { SheetGoods } from '../../domain/stash';
import type { Reader } from '../db/client';
import { supplies } from '../db/schema/supplies';
import type { Actor } from '../session';

export type PlanPaper = Awaited<ReturnType<typeof papersOfPlan>>[string];

/** The papers that a result's plan opens, by the supply's key, as its drawing needs them. */
export async function papersOfPlan(db: Reader, actor: Actor, { plan }: Pick<ProjectResult, 'plan'>) {
	const keys = [...new Set(plan?.sheets.map(({ supply }) => supply))];
	const rows =
		keys.length === 0
			? []
			: await db
					.select({
						id: supplies.id,
						key: supplies.key,
						name: supplies.name,
						kind: supplies.kind,
						colours: supplies.colours,
						faces: supplies.faces,
						picture: supplies.picture
					})
					.from(supplies)
					.where(and(eq(supplies.roomId, actor.roomId), inArray(supplies.key, keys)));
	return Object.fromEntries(
		rows.map(({ key, kind, picture, ...row }) => [
			key,
			{ ...row, kind: kind as SheetGoods, picture: picture ? `/supplies/${row.id}/picture` : null }
		])
	);
}

/** What the supplies that a result names are called, by key. */
export async function namesOfSupplies(
	db: Reader,
	actor: Actor,
	{ lines, near }: Pick<ProjectResult, 'lines' | 'near'>
) {
	const keys = [
		...new Set([...lines.flatMap((line) => line.supplies ?? []), ...near.map(({ supply }) => supply)])
	];
	if (keys.length === 0) return {};
	const rows = await db
		.select({ key: supplies.key, name: supplies.name })
		.from(supplies)
		.where(and(eq(supplies.roomId, actor.roomId), inArray(supplies.key, keys)));
	return Object.fromEntries(rows.map(({ key, name }) => [key, name]));
}
