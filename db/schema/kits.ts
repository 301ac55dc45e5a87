// Kits with their sections in plan order; operations with their tasks (an operation on something).
import { index, integer, primaryKey, sqliteTable, text, uniqueIndex } from 'drizzle-orm/sqlite-core'
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

/** A step of the plans: where it stands and what is done there. Never the plans' own text. */
export const planStep = sqliteTable('plan_step', {
  id: id(),
  sectionId: integer().notNull().references(() => section.id),
  position: integer().notNull(),
  page: text().notNull(),
  step: text().notNull(),
  /** Revision of the page as the steward had it before them. */
  revision: text().notNull().default(''),
  taskId: integer().references(() => task.id),
}, (t) => [uniqueIndex('plan_step_place').on(t.sectionId, t.page, t.step)])

/** One line of a section's hardware list. */
export const hardwareItem = sqliteTable('hardware_item', {
  id: id(),
  sectionId: integer().notNull().references(() => section.id),
  position: integer().notNull(),
  designation: text().notNull(),
  /** As the list gives it, where the designation does not say it. */
  length: text().notNull().default(''),
  left: integer('left_count').notNull(),
  right: integer('right_count').notNull(),
  /** Where it goes. */
  place: text().notNull().default(''),
}, (t) => [index('hardware_item_section').on(t.sectionId, t.position)])

/** What can no longer be reached once the section is closed. Never deleted: an ended line stays with the answers given to it. */
export const closingItem = sqliteTable('closing_item', {
  id: id(),
  sectionId: integer().notNull().references(() => section.id),
  position: integer().notNull(),
  text: text().notNull(),
  origin: text({ enum: ['plans', 'builder', 'inspector'] }).notNull(),
  /** Page and step, or whose experience. */
  reference: text().notNull().default(''),
  enteredBy: integer().references(() => member.id),
  createdAt: moment().notNull(),
  endedAt: moment(),
}, (t) => [index('closing_item_section').on(t.sectionId, t.position)])

/** A kit maker's change, in one line of our own words. */
export const bulletin = sqliteTable('bulletin', {
  id: id(),
  kitId: integer().notNull().references(() => kit.id),
  number: text().notNull(),
  /** Its date as printed, YYYY-MM-DD. */
  issuedOn: text().notNull(),
  /** Serials as printed: "all", "12 to 48". */
  serials: text().notNull(),
  summary: text().notNull(),
  enteredBy: integer().references(() => member.id),
  createdAt: moment().notNull(),
}, (t) => [uniqueIndex('bulletin_number').on(t.kitId, t.number)])

/** A page or step that a bulletin changes; without a step it is the whole page. */
export const bulletinStep = sqliteTable('bulletin_step', {
  bulletinId: integer().notNull().references(() => bulletin.id),
  position: integer().notNull(),
  page: text().notNull(),
  step: text(),
  /** Revision of the page that carries the change. */
  revision: text().notNull().default(''),
}, (t) => [primaryKey({ columns: [t.bulletinId, t.position] }), index('bulletin_step_page').on(t.page)])
