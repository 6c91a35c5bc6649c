import { v7 } from 'uuid';
import { readSupply } from '../../domain/exchange';
import { SUPPLY_MEASURES, type ConsumableKind, type Face, type Supply } from '../../domain/stash';
import { keyFrom } from '../../schemas/key';
import { designNumbered } from '../../schemas/pad-names';
import type { AddPad, AddSupply, EditSupply } from '../../schemas/supplies';
import type { Transaction } from '../db/client';
import type { Change } from '../db/schema/ledger';
import { supplies } from '../db/schema/supplies';
import { Conflict, Invalid } from '../errors';
import { freeSupplyKeys, roomUnits, storedSupply, type StoredSupply } from '../queries/stash';
import { supplyById } from '../queries/supplies';
import { inLots } from '../in-lots';
import { readable } from '../readable';
import type { Actor } from '../session';
import { amountOf, columnsOf } from '../supply-row';
import { binNamed, binsNamed } from './bins';
import { perform, type Effect, type Entry } from './ledger';

/** Adds a row; the act that undoing it names has the supply's own id. */
export async function addSupply(tx: Transaction, actor: Actor, input: AddSupply): Promise<{ id: string }> {
	await perform(tx, actor, { id: input.id, kind: 'add' }, async (at) => {
		const supply = await read(tx, actor, input.supply);
		const [key = supply.key] = await freeSupplyKeys(tx, actor, [supply.key]);
		const row = { id: input.id, key, supply, picture: input.picture ?? null };
		return createRows(tx, actor, at, [row]);
	});
	return { id: input.id };
}

/** Enters a pad: each of its designs becomes a row with its share of the sheets. */
export async function addPad(tx: Transaction, actor: Actor, input: AddPad): Promise<{ act: string }> {
	await perform(tx, actor, { id: input.id, kind: 'add' }, async (at) => {
		const designs = await Promise.all(padRows(input).map((row) => read(tx, actor, row)));
		const keys = await freeSupplyKeys(
			tx,
			actor,
			designs.map(({ key }) => key)
		);
		const rows = designs.map((supply, nth) => ({ id: v7(), key: keys[nth]!, supply, picture: null }));
		return createRows(tx, actor, at, rows);
	});
	return { act: input.id };
}

/**
 * Makes the row what the form says.
 * @throws {Conflict} with the row as it stands where somebody changed it since it was read.
 */
export async function editSupply(
	tx: Transaction,
	actor: Actor,
	supplyId: string,
	input: EditSupply
): Promise<void> {
	await perform(tx, actor, { id: input.id, kind: 'edit' }, async () => {
		const row = await storedSupply(tx, actor, supplyId);
		if (row.version !== input.version) {
			throw new Conflict(
				'Somebody changed this meanwhile. Here are both versions.',
				await supplyById(tx, actor, supplyId)
			);
		}
		const supply = await read(tx, actor, input.supply);
		refuseOtherMeasure(row, supply);
		const after = {
			...columnsOf(supply),
			binId: await binNamed(tx, actor, supply.bin),
			picture: input.picture === undefined ? row.picture : input.picture
		};
		const delta = amountOf(supply) - row.amount;
		const recount = { supplyId, kind: 'counted', delta } as const;
		return { changes: differing(row, after), entries: delta === 0 || row.group === 'tool' ? [] : [recount] };
	});
}

export interface NewRow {
	readonly id: string;
	readonly key: string;
	readonly supply: Supply;
	readonly picture: string | null;
}

/** Inserts rows with nothing on them and answers what the act must book; undoing it puts them in the trash. */
export async function createRows(
	tx: Transaction,
	actor: Actor,
	at: number,
	rows: readonly NewRow[],
	kind?: Entry['kind']
): Promise<Required<Effect>> {
	const binIds = await binsNamed(
		tx,
		actor,
		rows.map(({ supply }) => supply.bin)
	);
	await inLots(rows, 200, (some) =>
		tx.insert(supplies).values(
			some.map(({ id, key, supply, picture }) => ({
				...columnsOf(supply),
				...{ id, key, picture },
				roomId: actor.roomId,
				binId: binIds.get(supply.bin) ?? null,
				createdAt: at
			}))
		)
	);
	return {
		changes: rows.map(({ id }) => ({ id, before: { deletedAt: at }, after: { deletedAt: null } })),
		entries: rows.map(({ id, supply }) => ({
			supplyId: id,
			kind: kind ?? (supply.arrives ? 'bought' : 'counted'),
			delta: amountOf(supply)
		}))
	};
}

/** Whether an amount of the one means the same of the other, so that the row's ledger still adds up. */
export function isMeasuredAlike(row: { group: string; kind: string }, supply: Supply): boolean {
	const measure = (kind: string) => SUPPLY_MEASURES[kind as ConsumableKind] ?? null;
	return row.group === supply.group && measure(row.kind) === measure(supply.kind);
}

/** The columns that differ, before and after; no change where none do. */
export function differing(row: { readonly id: string }, wanted: Readonly<Record<string, unknown>>): Change[] {
	const stored: Readonly<Record<string, unknown>> = { ...row };
	const names = Object.keys(wanted).filter(
		(name) => JSON.stringify(stored[name]) !== JSON.stringify(wanted[name])
	);
	if (names.length === 0) return [];
	const of = (from: Readonly<Record<string, unknown>>) =>
		Object.fromEntries(names.map((name) => [name, from[name]]));
	return [{ id: row.id, before: of(stored), after: of(wanted) }];
}

async function read(tx: Transaction, actor: Actor, document: AddSupply['supply']): Promise<Supply> {
	const units = await roomUnits(tx, actor);
	return readable(() => readSupply(document, units), ['supply']);
}

function padRows(pad: AddPad): AddSupply['supply'][] {
	const { kind, name, size, weight, barcode, bin, designs, sheets, price } = pad;
	return Array.from({ length: designs }, (_, nth) => {
		const { front, frontDirection, back, backDirection } = pad.described[nth] ?? {};
		const design = front ?? designNumbered(nth, designs);
		const faces: Face[] = [{ design, direction: frontDirection ?? 'none' }];
		if (pad.doubleSided && back) faces.push({ design: back, direction: backDirection ?? 'none' });
		return {
			key: keyFrom(`${name} ${design}`, 'pad'),
			kind,
			name: design,
			collection: name,
			size,
			sheets: sheets / designs,
			faces,
			...(weight && { weight }),
			...(barcode && { barcode }),
			...(bin && { bin }),
			...(price && { price: { ...price, amount: Math.round(price.amount / sheets) } })
		};
	});
}

function refuseOtherMeasure(row: StoredSupply, supply: Supply): void {
	if (!isMeasuredAlike(row, supply)) {
		throw new Invalid([
			{
				path: ['supply', 'kind'],
				message: 'It was entered as something measured differently. Add a new row instead.'
			}
		]);
	}
}
