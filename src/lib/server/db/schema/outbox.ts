import { index, integer, sqliteTable, text } from 'drizzle-orm/sqlite-core';

/** Mail that is owed: written in the transaction that owes it, sent afterwards. */
export const outbox = sqliteTable(
	'outbox',
	{
		id: text().primaryKey(),
		/** The same on every try, so that a receiver can tell a second copy. */
		messageId: text().notNull().unique(),
		recipient: text().notNull(),
		subject: text().notNull(),
		body: text().notNull(),
		createdAt: integer().notNull(),
		tries: integer().notNull().default(0),
		/** When to try next; null once it is sent or given up. */
		nextTryAt: integer(),
		sentAt: integer(),
		/** Given up: a dead letter, for an admin to see. */
		deadAt: integer(),
		/** The SMTP answer or the driver's code of the last failure. */
		lastError: text()
	},
	(table) => [index('outbox_due').on(table.nextTryAt)]
);
