import { sql } from 'drizzle-orm';
import { check, index, integer, sqliteTable, text, uniqueIndex } from 'drizzle-orm/sqlite-core';
import { rooms } from './rooms';

/** A project in the room's queue. Its bill is kept as the exchange document's JSON, lengths as they were typed and with its unit. */
export const projects = sqliteTable(
	'projects',
	{
		id: text().primaryKey(),
		roomId: text()
			.notNull()
			.references(() => rooms.id, { onDelete: 'cascade' }),
		key: text().notNull(),
		name: text().notNull(),
		bill: text().notNull(),
		copies: integer().notNull().default(1),
		/** Place in the queue, first at 0. */
		position: integer().notNull(),
		/** Counts edits: an edit of another version is refused. */
		version: integer().notNull().default(1),
		createdAt: integer().notNull(),
		updatedAt: integer().notNull(),
		deletedAt: integer()
	},
	(t) => [
		uniqueIndex('projects_room_key').on(t.roomId, t.key),
		index('projects_room_position').on(t.roomId, t.deletedAt, t.position),
		check('projects_name', sql`length(trim(${t.name})) > 0`),
		check('projects_copies', sql`${t.copies} between 1 and 1000`)
	]
);
