import { sql } from 'drizzle-orm';
import type { AnySQLiteColumn } from 'drizzle-orm/sqlite-core';
import {
	check,
	foreignKey,
	index,
	integer,
	primaryKey,
	sqliteTable,
	text,
	uniqueIndex
} from 'drizzle-orm/sqlite-core';
import { MOVEMENT_KINDS } from '../../../domain/stash';
import { users } from './people';
import { projects } from './projects';
import { rooms } from './rooms';
import { supplies } from './supplies';

export const ACT_KINDS = [
	'add',
	'edit',
	'recount',
	'move',
	'trash',
	'restore',
	'use',
	'cut',
	'import',
	'undo'
] as const;

/** A supply's columns before and after an act, so that undoing it restores them exactly. */
export interface Change {
	readonly id: string;
	readonly before: Readonly<Record<string, unknown>>;
	readonly after: Readonly<Record<string, unknown>>;
}

/**
 * What somebody did to the stash, under an id that her client made: a second try of the same id does nothing,
 * and `undo` reverses the act's movements and changes as a whole.
 */
export const acts = sqliteTable(
	'acts',
	{
		id: text().notNull(),
		roomId: text()
			.notNull()
			.references(() => rooms.id, { onDelete: 'cascade' }),
		kind: text({ enum: ACT_KINDS }).notNull(),
		who: text().references(() => users.id, { onDelete: 'set null' }),
		at: integer().notNull(),
		projectId: text().references(() => projects.id, { onDelete: 'set null' }),
		changes: text({ mode: 'json' }).$type<Change[]>().notNull().default([]),
		undoes: text()
	},
	(t) => [
		primaryKey({ columns: [t.roomId, t.id] }),
		uniqueIndex('acts_undoes').on(t.roomId, t.undoes),
		index('acts_project').on(t.projectId),
		check('acts_kind', sql`${t.kind} in (${sql.raw(ACT_KINDS.map((kind) => `'${kind}'`).join(', '))})`)
	]
);

/** The ledger: only ever appended to. A trigger refuses every update, and deletion other than with its supply. */
export const movements = sqliteTable(
	'movements',
	{
		id: text().primaryKey(),
		roomId: text().notNull(),
		supplyId: text()
			.notNull()
			.references(() => supplies.id, { onDelete: 'cascade' }),
		act: text().notNull(),
		kind: text({ enum: MOVEMENT_KINDS }).notNull(),
		delta: integer().notNull(),
		who: text().references(() => users.id, { onDelete: 'set null' }),
		at: integer().notNull(),
		why: text(),
		undoes: text().references((): AnySQLiteColumn => movements.id, { onDelete: 'cascade' })
	},
	(t) => [
		foreignKey({ columns: [t.roomId, t.act], foreignColumns: [acts.roomId, acts.id] }).onDelete('cascade'),
		index('movements_supply').on(t.supplyId, t.id),
		index('movements_act').on(t.roomId, t.act),
		uniqueIndex('movements_undoes').on(t.undoes),
		check(
			'movements_kind',
			sql`${t.kind} in (${sql.raw(MOVEMENT_KINDS.map((kind) => `'${kind}'`).join(', '))})`
		)
	]
);
