import { and, eq, inArray, lt, max, sql } from 'drizzle-orm';
import { billSchema, readBill, type BillDocument } from '../../domain/exchange';
import type {
	AddProject,
	ChooseDesign,
	EditBill,
	MoveProject,
	RenameProject,
	ReorderProjects,
	SetCopies
} from '../../schemas/projects';
import type { Transaction } from '../db/client';
import { projects } from '../db/schema/projects';
import { Conflict, Invalid, NotFound } from '../errors';
import { listProjects, projectById, type ProjectDetail } from '../queries/projects';
import { roomUnits, freeKey } from '../queries/stash';
import { TRASH_DAYS } from '../queries/supplies';
import { readable } from '../readable';
import type { Actor } from '../session';
import { requireWriter } from './ledger';
import { touchRoom } from './revision';

/** Adds a project, last in the queue; a second try with the same id adds nothing. */
export async function addProject(tx: Transaction, actor: Actor, input: AddProject): Promise<{ id: string }> {
	requireWriter(actor);
	const owned = eq(projects.roomId, actor.roomId);
	const [already] = await tx
		.select({ id: projects.id })
		.from(projects)
		.where(and(owned, eq(projects.id, input.id)));
	if (already) return already;
	const bill = await checked(tx, actor, input.bill);
	const keys = await tx.select({ key: projects.key }).from(projects).where(owned);
	const key = freeKey(bill.key, new Set(keys.map((row) => row.key)));
	const [last] = await tx
		.select({ position: max(projects.position) })
		.from(projects)
		.where(owned);
	const now = Date.now();
	await tx.insert(projects).values({
		...{ id: input.id, roomId: actor.roomId, key, name: bill.name, copies: input.copies },
		bill: billText({ ...bill, key }),
		position: (last?.position ?? -1) + 1,
		createdAt: now,
		updatedAt: now
	});
	await touchRoom(tx, actor.roomId);
	return { id: input.id };
}

/** @throws {Conflict} with the project as it stands where somebody edited it since it was read. */
export async function editBill(tx: Transaction, actor: Actor, id: string, input: EditBill): Promise<void> {
	const project = await liveProject(tx, actor, id);
	if (project.version !== input.version) {
		throw new Conflict('Somebody edited this bill meanwhile. Here are both versions.', project);
	}
	await keepBill(tx, actor, project, await checked(tx, actor, input.bill));
}

export async function renameProject(
	tx: Transaction,
	actor: Actor,
	id: string,
	input: RenameProject
): Promise<void> {
	const project = await liveProject(tx, actor, id);
	await keepBill(tx, actor, project, { ...project.bill, name: input.name });
}

/** Chooses the paper that a slot is cut from. @throws {Invalid} where the bill has no such slot. */
export async function chooseDesign(
	tx: Transaction,
	actor: Actor,
	id: string,
	input: ChooseDesign
): Promise<void> {
	const project = await liveProject(tx, actor, id);
	if (!project.bill.slots.some(({ key }) => key === input.slot)) {
		throw new Invalid([{ path: ['slot'], message: 'The bill has no such slot.' }]);
	}
	const slots = project.bill.slots.map(({ design: _design, collection: _collection, ...slot }) => {
		const was = { ...(_design && { design: _design }), ...(_collection && { collection: _collection }) };
		if (slot.key !== input.slot) return { ...slot, ...was };
		const { design, collection } = input;
		return { ...slot, ...(design && { design }), ...(design && collection && { collection }) };
	});
	await keepBill(tx, actor, project, { ...project.bill, slots });
}

export async function setCopies(tx: Transaction, actor: Actor, id: string, input: SetCopies): Promise<void> {
	const project = await liveProject(tx, actor, id);
	await change(tx, actor, project.id, { copies: input.copies });
}

/** Puts the queue in this order; projects that it doesn't name follow, as they stood. */
export async function reorderProjects(tx: Transaction, actor: Actor, input: ReorderProjects): Promise<void> {
	requireWriter(actor);
	const standing = (await listProjects(tx, actor)).map(({ id }) => id);
	const named = new Set(input.projects);
	for (const id of named) if (!standing.includes(id)) throw new NotFound();
	const order = [...named, ...standing.filter((id) => !named.has(id))];
	const place = sql`(select key from json_each(${JSON.stringify(order)}) where value = ${projects.id})`;
	await tx
		.update(projects)
		.set({ position: place })
		.where(and(eq(projects.roomId, actor.roomId), inArray(projects.id, order)));
	await touchRoom(tx, actor.roomId);
}

/** Moves a project one place in the queue as it stands now; at its end it stays where it is. @throws {NotFound} */
export async function moveProject(tx: Transaction, actor: Actor, input: MoveProject): Promise<void> {
	const order = (await listProjects(tx, actor)).map(({ id }) => id);
	const at = order.indexOf(input.project);
	if (at < 0) throw new NotFound();
	order.splice(at, 1);
	order.splice(Math.max(0, at + input.by), 0, input.project);
	await reorderProjects(tx, actor, { projects: order });
}

/** Puts a project in the trash, and lets go for good what has lain there long enough. */
export async function trashProject(tx: Transaction, actor: Actor, id: string): Promise<void> {
	const project = await liveProject(tx, actor, id);
	const now = Date.now();
	const old = lt(projects.deletedAt, now - TRASH_DAYS * 86_400_000);
	await tx.delete(projects).where(and(eq(projects.roomId, actor.roomId), old));
	await change(tx, actor, project.id, { deletedAt: now });
}

export async function restoreProject(tx: Transaction, actor: Actor, id: string): Promise<void> {
	requireWriter(actor);
	const project = await projectById(tx, actor, id);
	await change(tx, actor, project.id, { deletedAt: null });
}

/** How a bill is kept: always in the schema's order, so that equal bills are equal texts. */
export function billText(bill: BillDocument): string {
	return JSON.stringify(billSchema.parse(bill));
}

/** A bill that can be read, with the unit of its bare numbers written in. @throws {Invalid} with every issue. */
async function checked(tx: Transaction, actor: Actor, document: BillDocument): Promise<BillDocument> {
	const bill = { ...document, units: document.units ?? (await roomUnits(tx, actor)) };
	readable(() => readBill(bill, bill.units), ['bill']);
	return bill;
}

async function liveProject(tx: Transaction, actor: Actor, id: string): Promise<ProjectDetail> {
	requireWriter(actor);
	const project = await projectById(tx, actor, id);
	if (project.deletedAt !== null) throw new NotFound();
	return project;
}

function keepBill(tx: Transaction, actor: Actor, project: ProjectDetail, bill: BillDocument): Promise<void> {
	const kept = billText({ ...bill, key: project.key });
	return change(tx, actor, project.id, { bill: kept, name: bill.name, version: project.version + 1 });
}

async function change(
	tx: Transaction,
	actor: Actor,
	id: string,
	set: Partial<typeof projects.$inferInsert>
): Promise<void> {
	await tx
		.update(projects)
		.set({ ...set, updatedAt: Date.now() })
		.where(and(eq(projects.roomId, actor.roomId), eq(projects.id, id)));
	await touchRoom(tx, actor.roomId);
}
