import { v7 } from 'uuid';
import type { BillDocument } from '../../src/lib/domain/exchange';
import type { Database } from '../../src/lib/server/db/client';
import { addProject } from '../../src/lib/server/services/projects';
import type { Actor } from '../../src/lib/server/session';

/** One slot of cardstock with one kind of piece, or what the test says of it. */
export function cards(set: Partial<BillDocument> = {}): BillDocument {
	return {
		key: 'cards',
		name: 'Note cards',
		slots: [{ key: 'card', material: { kind: 'cardstock' } }],
		pieces: [{ key: 'front', slot: 'card', w: '5 1/2 in', h: '4 1/4 in', qty: 2 }],
		...set
	};
}

export async function project(
	{ write }: Database,
	actor: Actor,
	bill: BillDocument = cards(),
	copies = 1
): Promise<string> {
	const id = v7();
	await write((tx) => addProject(tx, actor, { id, bill, copies }));
	return id;
}
