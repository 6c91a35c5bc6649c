import { and, eq, inArray, isNull } from 'drizzle-orm';
import { v7 } from 'uuid';
import { readBill } from '../../domain/exchange';
import type { SheetSupply } from '../../domain/stash';
import { keyFrom } from '../../schemas/key';
import type { ShownSheet, UseSheets } from '../../schemas/cutting';
import { today } from '../clock';
import type { Transaction } from '../db/client';
import { rooms } from '../db/schema/rooms';
import { bins, supplies } from '../db/schema/supplies';
import { Conflict, Invalid, NotFound } from '../errors';
import { listProjects, type ProjectRow } from '../queries/projects';
import { freeSupplyKeys } from '../queries/stash';
import type { Actor } from '../session';
import { supplyOf } from '../supply-row';
import { checkStanding, type Cuttable, type OwnedSheet } from './cut-check';
import { checkGeometry } from './cut-geometry';
import { perform, type Entry } from './ledger';
import { createRows, type NewRow } from './supplies';

/**
 * Takes a shown plan's sheets from the stash and files the offcuts worth keeping, once. The plan is judged anew
 * against the stash and the bills as they are now.
 * @throws {Conflict} where they no longer bear it. @throws {Invalid} where it could never be cut.
 */
export async function useSheets(tx: Transaction, actor: Actor, input: UseSheets): Promise<void> {
	const { id, project, plan, bin, kept } = input;
	await perform(tx, actor, { id, kind: 'cut', projectId: project }, async (at) => {
		const owned = await sheetsNamed(tx, actor, plan.sheets);
		const bills = await billsNamed(tx, actor, project, plan.sheets);
		const standing = checkStanding(plan.sheets, owned, bills, today(at));
		if (standing) throw new Conflict(`${standing} Look at the new plan.`);
		const faults = checkGeometry(plan.sheets, owned);
		if (faults.length > 0)
			throw new Invalid([{ path: ['plan'], message: 'This plan can’t be cut as it is drawn.' }]);

		const keeps = kept ? keepsNamed(kept) : keepsFrom(await smallestKept(tx, actor));
		const offcuts = offcutsOf(plan.sheets, owned, keeps, bin);
		const keys = await freeSupplyKeys(
			tx,
			actor,
			offcuts.map(({ key }) => key)
		);
		const rows = offcuts.map((row, nth) => ({ ...row, key: keys[nth]! }));
		const filed = await createRows(tx, actor, at, rows, 'offcut-in');
		return { changes: filed.changes, entries: [...taken(plan.sheets, owned), ...filed.entries] };
	});
}

async function sheetsNamed(
	tx: Transaction,
	actor: Actor,
	sheets: readonly ShownSheet[]
): Promise<Map<string, OwnedSheet>> {
	const keys = [...new Set(sheets.map(({ supply }) => supply))];
	const rows = await tx
		.select()
		.from(supplies)
		.leftJoin(bins, eq(bins.id, supplies.binId))
		.where(and(eq(supplies.roomId, actor.roomId), isNull(supplies.deletedAt), inArray(supplies.key, keys)));
	const owned = new Map<string, OwnedSheet>();
	for (const { supplies: row, bins: bin } of rows) {
		const supply = supplyOf({ ...row, bin: bin?.name ?? null });
		if (supply.group === 'sheet') owned.set(row.key, { id: row.id, picture: row.picture, supply });
	}
	return owned;
}

/** The bills whose pieces the plan cuts: the project's own, and those of others that share its sheets. */
async function billsNamed(
	tx: Transaction,
	actor: Actor,
	projectId: string,
	sheets: readonly ShownSheet[]
): Promise<Map<string, Cuttable>> {
	const projects = await listProjects(tx, actor);
	if (!projects.some(({ id }) => id === projectId)) throw new NotFound();
	const named = new Set(sheets.flatMap(({ placements }) => placements.map(({ project }) => project)));
	return new Map(
		projects.filter(({ key }) => named.has(key)).map((project) => [project.key, cuttable(project)])
	);
}

function cuttable({ bill, copies }: ProjectRow): Cuttable {
	return { bill: readBill(bill, bill.units ?? 'in'), copies };
}

async function smallestKept(tx: Transaction, actor: Actor): Promise<number> {
	const [room] = await tx.select({ keep: rooms.keepOffcut }).from(rooms).where(eq(rooms.id, actor.roomId));
	return room?.keep ?? 0;
}

function taken(sheets: readonly ShownSheet[], owned: ReadonlyMap<string, OwnedSheet>): Entry[] {
	const opened = new Map<OwnedSheet, number>();
	for (const { supply } of sheets) {
		const row = owned.get(supply)!;
		opened.set(row, (opened.get(row) ?? 0) + 1);
	}
	return [...opened].map(([{ id, supply }, count]) => ({
		supplyId: id,
		kind: supply.offcut ? 'offcut-out' : 'cut',
		delta: -count
	}));
}

/** A row for each size that a supply leaves, its print standing as it stood on the sheet. */
function offcutsOf(
	sheets: readonly ShownSheet[],
	owned: ReadonlyMap<string, OwnedSheet>,
	keeps: Keeps,
	bin: string | null
): NewRow[] {
	const rows = new Map<string, NewRow & { supply: SheetSupply }>();
	sheets.forEach(({ supply: key, offcuts }, sheet) => {
		const { supply, picture } = owned.get(key)!;
		offcuts.forEach((offcut, nth) => {
			if (!keeps(offcut, `${sheet}.${nth}`)) return;
			const { w, h } = offcut;
			const same = `${key} ${w} ${h}`;
			const count = (rows.get(same)?.supply.sheets ?? 0) + 1;
			const left = offcutOf(supply, w, h, count, bin);
			rows.set(same, { id: rows.get(same)?.id ?? v7(), key: left.key, supply: left, picture });
		});
	});
	return [...rows.values()];
}

/** Whether an offcut is filed, by its size or by its number in the plan. */
type Keeps = (offcut: { readonly w: number; readonly h: number }, number: string) => boolean;

const keepsFrom =
	(smallest: number): Keeps =>
	({ w, h }) =>
		Math.min(w, h) >= smallest;

function keepsNamed(numbers: readonly string[]): Keeps {
	const named = new Set(numbers);
	return (_, number) => named.has(number);
}

function offcutOf(whole: SheetSupply, w: number, h: number, sheets: number, bin: string | null): SheetSupply {
	return {
		...whole,
		...{ w, h, sheets, bin },
		key: keyFrom(`${whole.key.slice(0, 40)} offcut`, 'offcut'),
		offcut: true,
		count: 'counted',
		strip: null,
		price: null,
		barcode: null,
		arrives: null
	};
}
