// Kits with their sections in plan order; operations with their tasks (an operation on something).
import { integer, sqliteTable, text, uniqueIndex } from 'drizzle-orm/sqlite-core'
import { id } from './columns'

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
