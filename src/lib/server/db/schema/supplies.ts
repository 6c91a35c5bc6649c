import { sql } from 'drizzle-orm';
import { check, index, integer, real, sqliteTable, text, uniqueIndex } from 'drizzle-orm/sqlite-core';
import { SHEET_KINDS, SUPPLY_MEASURES, TOOL_KINDS } from '../../../domain/stash';
import type { Edge, Face, SupplyKind } from '../../../domain/stash';
import { rooms } from './rooms';

const oneOf = (values: readonly string[]) => sql.raw(values.map((value) => `'${value}'`).join(', '));
const KINDS = {
	sheet: oneOf(SHEET_KINDS),
	consumable: oneOf(Object.keys(SUPPLY_MEASURES)),
	tool: oneOf(TOOL_KINDS)
};

/** A tray, box or drawer that supplies are kept in. */
export const bins = sqliteTable(
	'bins',
	{
		id: text().primaryKey(),
		roomId: text()
			.notNull()
			.references(() => rooms.id, { onDelete: 'cascade' }),
		name: text().notNull()
	},
	(t) => [
		uniqueIndex('bins_room_name').on(t.roomId, t.name),
		check('bins_name', sql`length(trim(${t.name})) > 0`)
	]
);

/**
 * One row per design of paper, roll, bottle or tool. `amount` is sheets, 1/320 mm, 1/16 nl or a count, as the
 * kind says (1 or 0 for a tool), and is always the sum of the row's movements: only `book` changes it.
 */
export const supplies = sqliteTable(
	'supplies',
	{
		id: text().primaryKey(),
		roomId: text()
			.notNull()
			.references(() => rooms.id, { onDelete: 'cascade' }),
		/** Names the row in exchange documents, plans and matches. */
		key: text().notNull(),
		group: text({ enum: ['sheet', 'consumable', 'tool'] }).notNull(),
		kind: text().$type<SupplyKind>().notNull(),
		name: text().notNull(),
		collection: text(),
		w: integer(),
		h: integer(),
		/** The unit that its size or amount was entered in; `entered` has those of its other measures. */
		unit: text(),
		entered: text({ mode: 'json' }).$type<Record<string, string>>(),
		amount: integer().notNull().default(0),
		count: text({ enum: ['counted', 'unsure'] })
			.notNull()
			.default('counted'),
		faces: text({ mode: 'json' }).$type<Face[]>().notNull().default([]),
		weightText: text(),
		gsm: real(),
		/** In 1/200,000 mm. */
		caliper: integer(),
		colours: text({ mode: 'json' }).$type<string[]>().notNull().default([]),
		offcut: integer({ mode: 'boolean' }).notNull().default(false),
		stripEdge: text().$type<Edge>(),
		stripDepth: integer(),
		width: integer(),
		full: integer(),
		reach: integer(),
		grooves: integer(),
		shape: text(),
		size: integer(),
		cuts: text({ mode: 'json' }).$type<('paper' | 'board')[]>().notNull().default([]),
		/** Of one sheet, or of a full roll, bottle, box or tool. */
		priceAmount: integer(),
		priceCurrency: text(),
		barcode: text(),
		binId: text().references(() => bins.id, { onDelete: 'set null' }),
		arrives: text(),
		lentUntil: text(),
		borrowedUntil: text(),
		/** A file under DATA_DIR/photos, or the name of a picture that ships with the application. */
		picture: text(),
		version: integer().notNull().default(1),
		createdAt: integer().notNull(),
		deletedAt: integer()
	},
	(t) => [
		uniqueIndex('supplies_room_key').on(t.roomId, t.key),
		index('supplies_room_name').on(t.roomId, t.deletedAt, t.name),
		index('supplies_room_kind').on(t.roomId, t.deletedAt, t.kind),
		index('supplies_bin').on(t.binId),
		index('supplies_room_barcode').on(t.roomId, t.barcode),
		check('supplies_amount', sql`${t.amount} >= 0`),
		check('supplies_name', sql`length(trim(${t.name})) > 0`),
		check(
			'supplies_kind',
			sql`(${t.group} = 'sheet' and ${t.kind} in (${KINDS.sheet})) or (${t.group} = 'consumable' and ${t.kind} in (${KINDS.consumable})) or (${t.group} = 'tool' and ${t.kind} in (${KINDS.tool}))`
		),
		check('supplies_count', sql`${t.count} in ('counted', 'unsure')`),
		check(
			'supplies_sheet_size',
			sql`(${t.group} = 'sheet') = (${t.w} is not null) and (${t.group} = 'sheet') = (${t.h} is not null) and ifnull(${t.w}, 1) > 0 and ifnull(${t.h}, 1) > 0`
		),
		check('supplies_one_tool', sql`${t.group} <> 'tool' or ${t.amount} <= 1`),
		check(
			'supplies_measures',
			sql`ifnull(${t.width}, 1) > 0 and ifnull(${t.full}, 1) > 0 and ifnull(${t.reach}, 1) > 0 and ifnull(${t.grooves}, 1) > 0 and ifnull(${t.size}, 1) > 0 and ifnull(${t.caliper}, 1) > 0 and ifnull(${t.gsm}, 1) > 0`
		),
		check(
			'supplies_strip',
			sql`(${t.stripEdge} is null) = (${t.stripDepth} is null) and ifnull(${t.stripEdge}, 'top') in ('top', 'bottom', 'left', 'right') and ifnull(${t.stripDepth}, 1) > 0`
		),
		check(
			'supplies_price',
			sql`(${t.priceAmount} is null) = (${t.priceCurrency} is null) and ifnull(${t.priceAmount}, 0) >= 0`
		),
		check('supplies_weight', sql`(${t.weightText} is null) = (${t.gsm} is null)`)
	]
);
