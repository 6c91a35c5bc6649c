import { sql } from 'drizzle-orm';
import { check, index, integer, sqliteTable, text } from 'drizzle-orm/sqlite-core';
import { rooms } from './rooms';

export const SITE_ROLES = ['none', 'moderator', 'admin'] as const;
export type SiteRole = (typeof SITE_ROLES)[number];

export const users = sqliteTable(
	'users',
	{
		id: text().primaryKey(),
		/** Lower case, as it is compared. */
		email: text().notNull().unique(),
		name: text().notNull(),
		/** argon2id in PHC form; null for somebody who only ever signs in by e-mailed link. */
		passwordHash: text(),
		siteRole: text({ enum: SITE_ROLES }).notNull().default('none'),
		createdAt: integer().notNull(),
		disabledAt: integer()
	},
	(table) => [
		check('users_email', sql`${table.email} = lower(${table.email})`),
		check('users_site_role', sql`${table.siteRole} in ('none', 'moderator', 'admin')`)
	]
);

/** A browser that is signed in. The cookie holds the secret, the row only its hash. */
export const sessions = sqliteTable(
	'sessions',
	{
		id: text().primaryKey(),
		secretHash: text().notNull().unique(),
		userId: text()
			.notNull()
			.references(() => users.id, { onDelete: 'cascade' }),
		/** The room this browser is working in. */
		roomId: text().references(() => rooms.id, { onDelete: 'set null' }),
		userAgent: text().notNull(),
		address: text().notNull(),
		createdAt: integer().notNull(),
		seenAt: integer().notNull(),
		endedAt: integer()
	},
	(table) => [index('sessions_user').on(table.userId)]
);

export const TOKEN_PURPOSES = ['sign-up', 'link', 'reset'] as const;
export type TokenPurpose = (typeof TOKEN_PURPOSES)[number];

/** A mailed link, good once; only its hash is kept. */
export const tokens = sqliteTable(
	'tokens',
	{
		hash: text().primaryKey(),
		purpose: text({ enum: TOKEN_PURPOSES }).notNull(),
		email: text().notNull(),
		/** What a sign-up will become once its address is confirmed: name, password hash, where to go next. */
		signUp: text({ mode: 'json' }).$type<{ name: string; passwordHash: string; next: string }>(),
		createdAt: integer().notNull(),
		expiresAt: integer().notNull(),
		usedAt: integer()
	},
	(table) => [
		index('tokens_email').on(table.email, table.purpose),
		check('tokens_purpose', sql`${table.purpose} in ('sign-up', 'link', 'reset')`)
	]
);

export const ATTEMPT_KINDS = ['password', 'mail'] as const;

/** What the throttle counts: wrong passwords, and mails asked for, by account and by network address. */
export const attempts = sqliteTable(
	'attempts',
	{
		id: text().primaryKey(),
		kind: text({ enum: ATTEMPT_KINDS }).notNull(),
		/** Hash of the address typed, whether or not an account has it. */
		account: text().notNull(),
		network: text().notNull(),
		at: integer().notNull()
	},
	(table) => [
		index('attempts_account').on(table.kind, table.account, table.at),
		index('attempts_network').on(table.kind, table.network, table.at)
	]
);
