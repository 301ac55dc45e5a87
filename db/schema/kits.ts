// Kits with their sections in plan order; operations with their tasks (an operation on something).
import { index, integer, sqliteTable, text, uniqueIndex } from 'drizzle-orm/sqlite-core'
import { id, moment } from './columns'
import { member } from './people'

/** One value, a range, or words; and where it stands. As lib/domain/shop has them. */
export interface LimitValueJson { number?: number; min?: number; max?: number; label?: string }
export interface SourceJson { title: string; section: string; year: string }

export const kit = sqliteTable('kit', {
  id: id(),
  slug: text().notNull().unique(),
  name: text().notNull(),
  maker: text().notNull(),
})

export const section = sqliteTable('section', {
  id: id(),
  kitId: integer().notNull().references(() => kit.id),
  code: text().notNull(),
  title: text().notNull(),
  position: integer().notNull(),
  /** FAA JASC system code, four digits; null where the work is on no system (workshop, paint). */
  jasc: text(),
}, (t) => [uniqueIndex('section_code').on(t.kitId, t.code)])

export const operation = sqliteTable('operation', {
  id: id(),
  slug: text().notNull().unique(),
  title: text().notNull(),
  position: integer().notNull(),
})

export const task = sqliteTable('task', {
  id: id(),
  operationId: integer().notNull().references(() => operation.id),
  slug: text().notNull().unique(),
  title: text().notNull(),
  position: integer().notNull(),
})

/** The kit maker's own value for a shop table's result, entered by a steward; it comes before the handbook's. Never deleted: an ended one shows what once held. */
export const kitLimit = sqliteTable('kit_limit', {
  id: id(),
  kitId: integer().notNull().references(() => kit.id),
  /** Shop table and result that it stands for, by name. */
  table: text('shop_table').notNull(),
  result: text().notNull(),
  /** Inputs for which it holds, as the table takes them; {} = for all. */
  inputs: text({ mode: 'json' }).$type<Record<string, string>>().notNull(),
  value: text({ mode: 'json' }).$type<LimitValueJson>().notNull(),
  unit: text().notNull(),
  display: text({ mode: 'json' }).$type<{ inch: string; metric: string }>().notNull(),
  /** Bulletin or page with its date. */
  reference: text({ mode: 'json' }).$type<SourceJson>().notNull(),
  note: text().notNull().default(''),
  enteredBy: integer().references(() => member.id),
  createdAt: moment().notNull(),
  endedAt: moment(),
  endReason: text(),
}, (t) => [index('kit_limit_kit').on(t.kitId, t.table)])
