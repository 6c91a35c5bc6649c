import { v7 } from 'uuid';
import type { SupplyDocument } from '../../src/lib/domain/exchange';
import type { Database } from '../../src/lib/server/db/client';
import { addSupply } from '../../src/lib/server/services/supplies';
import type { Actor } from '../../src/lib/server/session';

/** A sheet of cardstock, or what the test says of it. */
export function cardstock(set: Partial<Extract<SupplyDocument, { size: string; sheets: number }>> = {}) {
	return {
		key: 'oat',
		kind: 'cardstock',
		name: 'Oat',
		size: '12 x 12 in',
		sheets: 10,
		...set
	} as SupplyDocument;
}

export function tape(set: Record<string, unknown> = {}) {
	return {
		key: 'tape',
		kind: 'tape',
		name: 'Narrow tape',
		width: '1/4 in',
		left: '98 in',
		...set
	} as SupplyDocument;
}

export function trimmer(set: Record<string, unknown> = {}) {
	return { key: 'trimmer', kind: 'trimmer', name: 'Desk trimmer', reach: '12 in', ...set } as SupplyDocument;
}

/** Adds it to the room and says its id. */
export async function stock({ write }: Database, actor: Actor, supply: SupplyDocument): Promise<string> {
	const id = v7();
	await write((tx) => addSupply(tx, actor, { id, supply }));
	return id;
}
