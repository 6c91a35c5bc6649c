import { and, eq, inArray, sql } from 'drizzle-orm';
import { v7 } from 'uuid';
import type { MOVEMENT_KINDS } from '../../domain/stash';
import type { Transaction } from '../db/client';
import { acts, movements } from '../db/schema/ledger';
import type { ACT_KINDS, Change } from '../db/schema/ledger';
import { supplies } from '../db/schema/supplies';
import { Conflict, Forbidden, NotFound } from '../errors';
import { inLots } from '../in-lots';
import type { Actor } from '../session';
import { touchRoom } from './revision';

export interface Act {
	/** Client-made: a second try of the same id changes nothing. */
	readonly id: string;
	readonly kind: (typeof ACT_KINDS)[number];
	readonly projectId?: string;
	readonly undoes?: string;
}

export interface Entry {
	readonly supplyId: string;
	readonly kind: (typeof MOVEMENT_KINDS)[number];
	readonly delta: number;
	readonly why?: string | null;
	readonly undoes?: string;
	/** Where the movement comes from an imported ledger: its id, and when it was made by somebody unknown here. */
	readonly id?: string;
	readonly at?: number;
	readonly who?: null;
}

export interface Effect {
	readonly changes?: readonly Change[];
	readonly entries?: readonly Entry[];
}

/**
 * The one way that a stash changes: an act with the columns it changed and the movements it booked, in the
 * caller's transaction. Returns false, having done nothing, where the act was already done.
 * @throws {Conflict} where a supply would fall below nothing.
 */
export async function perform(
	tx: Transaction,
	actor: Actor,
	act: Act,
	work: (at: number) => Promise<Effect>
): Promise<boolean> {
	requireWriter(actor);
	const here = and(eq(acts.roomId, actor.roomId), eq(acts.id, act.id));
	if ((await tx.select({ id: acts.id }).from(acts).where(here)).length > 0) return false;

	const at = Date.now();
	const { changes = [], entries = [] } = await work(at);
	await tx
		.insert(acts)
		.values({ ...act, roomId: actor.roomId, who: actor.userId, at, changes: [...changes] });
	await apply(tx, actor, changes);
	await book(tx, actor, act.id, at, entries);
	await touchRoom(tx, actor.roomId);
	return true;
}

/**
 * Reverses an act's movements and changes as a whole.
 * @throws {NotFound} for another room's act. @throws {Conflict} if done before, or if the stash moved on since.
 */
export function undo(tx: Transaction, actor: Actor, input: { id: string; act: string }): Promise<boolean> {
	return perform(tx, actor, { id: input.id, kind: 'undo', undoes: input.act }, async () => {
		const [act] = await tx
			.select()
			.from(acts)
			.where(and(eq(acts.roomId, actor.roomId), eq(acts.id, input.act)));
		if (!act) throw new NotFound();
		const undone = and(eq(acts.roomId, actor.roomId), eq(acts.undoes, input.act));
		if ((await tx.select({ id: acts.id }).from(acts).where(undone)).length > 0) {
			throw new Conflict('That was already undone.');
		}
		const changes = act.changes.map(({ id, before, after }) => ({ id, before: after, after: before }));
		await refuseStale(tx, actor, changes);
		const booked = await tx
			.select()
			.from(movements)
			.where(and(eq(movements.roomId, actor.roomId), eq(movements.act, input.act)));
		// An imported ledger brings movements with their undoing: those are undone by name already.
		const undoneHere = new Set(booked.map(({ undoes }) => undoes));
		return {
			changes,
			entries: booked.map(({ id, supplyId, kind, delta }) => ({
				supplyId,
				kind,
				delta: 0 - delta,
				...(!undoneHere.has(id) && { undoes: id })
			}))
		};
	});
}

export function requireWriter(actor: Actor): void {
	if (actor.role === 'viewer') throw new Forbidden();
}

async function apply(tx: Transaction, actor: Actor, changes: readonly Change[]): Promise<void> {
	const alike = new Map<string, Change[]>();
	for (const change of changes) {
		const after = JSON.stringify(change.after);
		alike.set(after, [...(alike.get(after) ?? []), change]);
	}
	for (const group of alike.values()) {
		await inLots(group, LOT, (some) =>
			tx
				.update(supplies)
				.set({ ...some[0]?.after, version: sql`${supplies.version} + 1` })
				.where(
					ownRows(
						actor,
						some.map(({ id }) => id)
					)
				)
		);
	}
}

async function book(tx: Transaction, actor: Actor, act: string, at: number, entries: readonly Entry[]) {
	if (entries.length === 0) return;
	await refuseOverdraft(tx, actor, entries);
	await inLots(entries, LOT, (some) =>
		tx
			.insert(movements)
			.values(some.map((entry) => ({ id: v7(), at, who: actor.userId, ...entry, roomId: actor.roomId, act })))
	);
	const sum = sql`(select sum(${movements.delta}) from ${movements} where ${movements.supplyId} = ${supplies.id})`;
	await tx
		.update(supplies)
		.set({ amount: sum, version: sql`${supplies.version} + 1` })
		.where(
			and(
				eq(supplies.roomId, actor.roomId),
				sql`${supplies.id} in (select ${movements.supplyId} from ${movements} where ${movements.roomId} = ${actor.roomId} and ${movements.act} = ${act})`
			)
		);
}

async function refuseOverdraft(tx: Transaction, actor: Actor, entries: readonly Entry[]): Promise<void> {
	const taken = new Map<string, number>();
	for (const { supplyId, delta } of entries) taken.set(supplyId, (taken.get(supplyId) ?? 0) + delta);
	const drawn = [...taken].filter(([, delta]) => delta < 0).map(([id]) => id);
	await inLots(drawn, LOT, async (some) => {
		const rows = await tx
			.select({ id: supplies.id, name: supplies.name, amount: supplies.amount })
			.from(supplies)
			.where(ownRows(actor, some));
		for (const { id, name, amount } of rows) {
			if (amount + (taken.get(id) ?? 0) < 0) throw new Conflict(`There isn’t that much of ${name} left.`);
		}
	});
}

async function refuseStale(tx: Transaction, actor: Actor, changes: readonly Change[]): Promise<void> {
	await inLots(changes, LOT, async (some) => {
		const rows = await tx
			.select()
			.from(supplies)
			.where(
				ownRows(
					actor,
					some.map(({ id }) => id)
				)
			);
		const byId = new Map(rows.map((row) => [row.id, row as Record<string, unknown>]));
		for (const { id, before } of some) {
			const row = byId.get(id);
			const same = ([column, value]: [string, unknown]) =>
				JSON.stringify(row?.[column]) === JSON.stringify(value);
			if (!Object.entries(before).every(same)) {
				throw new Conflict('It has been changed since, so it can no longer be undone.');
			}
		}
	});
}

function ownRows(actor: Actor, ids: readonly string[]) {
	return and(eq(supplies.roomId, actor.roomId), inArray(supplies.id, [...ids]));
}

/** SQLite binds at most 32,766 values in a statement; a movement has ten. */
const LOT = 500;
