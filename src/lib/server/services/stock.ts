import { and, eq, lt } from 'drizzle-orm';
import { Reading } from '../../domain/exchange/reading';
import type { ConsumableKind } from '../../domain/stash';
import type {
	LendTool,
	Movement,
	MoveSupplies,
	Recount,
	TrashSupplies,
	UseSupply
} from '../../schemas/supplies';
import { today } from '../clock';
import type { Transaction } from '../db/client';
import { supplies } from '../db/schema/supplies';
import { Invalid } from '../errors';
import { roomUnits, storedSupplies, storedSupply, type StoredSupply } from '../queries/stash';
import { TRASH_DAYS } from '../queries/supplies';
import { readable } from '../readable';
import type { Actor } from '../session';
import { binNamed } from './bins';
import { perform, type Entry } from './ledger';
import { differing } from './supplies';

/** Books one line of a supply's ledger, as the API takes it. */
export function bookMovement(tx: Transaction, actor: Actor, supply: string, input: Movement): Promise<void> {
	const { id, kind, why } = input;
	if (kind === 'counted') {
		const { left, count } = input;
		return recount(tx, actor, { id, counts: [{ supply, left, count }], why });
	}
	if (kind === 'lent') return lendTool(tx, actor, { id, supply, until: input.until, why });
	if (kind === 'returned') return lendTool(tx, actor, { id, supply, until: null, why });
	return useSupply(tx, actor, { id, supply, kind, amount: input.amount, why });
}

/** Says what is there now, for one row or many. */
export async function recount(tx: Transaction, actor: Actor, input: Recount): Promise<void> {
	await perform(tx, actor, { id: input.id, kind: 'recount' }, async () => {
		const units = await roomUnits(tx, actor);
		const rows = await storedSupplies(
			tx,
			actor,
			input.counts.map(({ supply }) => supply)
		);
		const said = new Map(input.counts.map((one, nth) => [one.supply, { ...one, nth }]));
		const entries: Entry[] = [];
		for (const row of rows) {
			const { left, nth } = said.get(row.id)!;
			const amount = amountFor(row, left, units, ['counts', nth, 'left']);
			entries.push({ supplyId: row.id, kind: 'counted', delta: amount - row.amount, why: input.why });
		}
		return { changes: rows.flatMap((row) => differing(row, { count: said.get(row.id)!.count })), entries };
	});
}

/** Books what was used, spoiled, passed on or bought. @throws {Conflict} where there isn't that much. */
export async function useSupply(tx: Transaction, actor: Actor, input: UseSupply): Promise<void> {
	await perform(tx, actor, { id: input.id, kind: 'use' }, async (at) => {
		const row = await storedSupply(tx, actor, input.supply);
		const amount = amountFor(row, input.amount, await roomUnits(tx, actor), ['amount']);
		const delta = input.kind === 'bought' ? amount : -amount;
		if (row.group === 'tool' && row.amount + delta > 1) {
			throw new Invalid([{ path: ['amount'], message: 'Each tool has a row of its own. Add another row.' }]);
		}
		if (input.kind === 'bought' && row.amount > 0 && row.arrives !== null && row.arrives > today(at)) {
			throw new Invalid([{ path: ['amount'], message: STILL_ON_ORDER }]);
		}
		const arrived = input.kind === 'bought' ? differing(row, { arrives: null }) : [];
		return { changes: arrived, entries: [{ supplyId: row.id, kind: input.kind, delta, why: input.why }] };
	});
}

/** Booked on the same row, what was bought would bring what hasn't come yet with it. */
const STILL_ON_ORDER =
	'What is on this row is still on order. Clear its date once it has come, or add what you bought as a row of its own.';

/** Notes that a tool is out until a date, or back. */
export async function lendTool(tx: Transaction, actor: Actor, input: LendTool): Promise<void> {
	await perform(tx, actor, { id: input.id, kind: 'use' }, async () => {
		const row = await storedSupply(tx, actor, input.supply);
		if (row.group !== 'tool') {
			throw new Invalid([
				{ path: ['supply'], message: 'Only tools are lent. Paper that goes is passed on.' }
			]);
		}
		const kind = input.until === null ? 'returned' : 'lent';
		return {
			changes: differing(row, { lentUntil: input.until }),
			entries: [{ supplyId: row.id, kind, delta: 0, why: input.why }]
		};
	});
}

/** Puts them in a bin, made where there is none of that name; null takes them out of any. */
export async function moveSupplies(tx: Transaction, actor: Actor, input: MoveSupplies): Promise<void> {
	await perform(tx, actor, { id: input.id, kind: 'move' }, async () => {
		const rows = await storedSupplies(tx, actor, input.supplies);
		const binId = await binNamed(tx, actor, input.bin);
		return { changes: rows.flatMap((row) => differing(row, { binId })) };
	});
}

/** Puts them in the trash, and lets go for good what has lain there long enough. */
export async function trashSupplies(tx: Transaction, actor: Actor, input: TrashSupplies): Promise<void> {
	await perform(tx, actor, { id: input.id, kind: 'trash' }, async (at) => {
		const old = lt(supplies.deletedAt, at - TRASH_DAYS * 86_400_000);
		await tx.delete(supplies).where(and(eq(supplies.roomId, actor.roomId), old));
		const rows = await storedSupplies(tx, actor, input.supplies);
		return { changes: rows.flatMap((row) => differing(row, { deletedAt: at })) };
	});
}

export async function restoreSupplies(tx: Transaction, actor: Actor, input: TrashSupplies): Promise<void> {
	await perform(tx, actor, { id: input.id, kind: 'restore' }, async () => {
		const rows = await storedSupplies(tx, actor, input.supplies, true);
		return { changes: rows.flatMap((row) => differing(row, { deletedAt: null })) };
	});
}

function amountFor(
	row: StoredSupply,
	given: string | number,
	units: 'in' | 'mm' | 'cm',
	path: (string | number)[]
): number {
	if (row.group !== 'consumable') {
		if (typeof given === 'number' && (row.group === 'sheet' || given <= 1)) return given;
		const message =
			row.group === 'sheet' ? 'Sheets are counted: give a whole number.' : 'A tool is there or not: 1 or 0.';
		throw new Invalid([{ path, message }]);
	}
	return readable(() => {
		const reading = new Reading(units);
		const { value } = reading.amount('', row.kind as ConsumableKind, given, { zero: true });
		reading.finish();
		return value;
	}, path);
}
