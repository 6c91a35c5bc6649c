import { sql } from 'drizzle-orm';
import {
	check,
	index,
	integer,
	primaryKey,
	sqliteTable,
	text,
	type AnySQLiteColumn
} from 'drizzle-orm/sqlite-core';
import { ROOM_ROLES, ROOM_UNITS } from '../../../schemas/rooms';
import { users } from './people';

/** A craft room: one stash, its projects and the people who share them. */
export const rooms = sqliteTable(
	'rooms',
	{
		id: text().primaryKey(),
		name: text().notNull(),
		units: text({ enum: ROOM_UNITS }).notNull().default('in'),
		/** Longest cut of the room's trimmer, in 1/320 mm; null where any length will do. */
		reach: integer(),
		/** Smallest side of an offcut worth keeping, in 1/320 mm; null keeps every one. */
		keepOffcut: integer(),
		/** ISO 4217 */
		currency: text().notNull().default('USD'),
		/** Whether viewers see what things cost. */
		pricesShown: integer({ mode: 'boolean' }).notNull().default(false),
		/** Goes up with every write to the room, so that what was reckoned from it can be kept. */
		revision: integer().notNull().default(0),
		/** The first hour's questions have been answered. */
		setUp: integer({ mode: 'boolean' }).notNull().default(false),
		createdAt: integer().notNull()
	},
	(table) => [
		check('rooms_units', sql`${table.units} in ('in', 'mm', 'cm')`),
		check('rooms_reach', sql`${table.reach} > 0`),
		check('rooms_keep_offcut', sql`${table.keepOffcut} > 0`),
		check('rooms_currency', sql`length(${table.currency}) = 3`)
	]
);

export const memberships = sqliteTable(
	'memberships',
	{
		roomId: text()
			.notNull()
			.references(() => rooms.id, { onDelete: 'cascade' }),
		userId: text()
			.notNull()
			.references((): AnySQLiteColumn => users.id, { onDelete: 'cascade' }),
		role: text({ enum: ROOM_ROLES }).notNull(),
		joinedAt: integer().notNull()
	},
	(table) => [
		primaryKey({ columns: [table.roomId, table.userId] }),
		index('memberships_user').on(table.userId),
		check('memberships_role', sql`${table.role} in ('owner', 'member', 'viewer')`)
	]
);

/** A link that lets one person join; only its hash is kept. */
export const invitations = sqliteTable(
	'invitations',
	{
		id: text().primaryKey(),
		hash: text().notNull().unique(),
		roomId: text()
			.notNull()
			.references(() => rooms.id, { onDelete: 'cascade' }),
		role: text({ enum: ROOM_ROLES }).notNull(),
		createdBy: text()
			.notNull()
			.references((): AnySQLiteColumn => users.id, { onDelete: 'cascade' }),
		createdAt: integer().notNull(),
		expiresAt: integer().notNull(),
		usedAt: integer(),
		revokedAt: integer()
	},
	(table) => [
		index('invitations_room').on(table.roomId),
		check('invitations_role', sql`${table.role} in ('owner', 'member', 'viewer')`)
	]
);
