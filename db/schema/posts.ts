// A post is anything that can be stamped, cautioned, gone by and hidden; a revision carries all that is judged.
// post_section, post_task and post_hardware are projections of the current revision and can be rebuilt from it.
import { sql } from 'drizzle-orm'
import { check, foreignKey, index, integer, primaryKey, real, sqliteTable, text, uniqueIndex, type AnySQLiteColumn } from 'drizzle-orm/sqlite-core'
import { id, moment } from './columns'
import { kit, operation, section, task } from './kits'
import { member } from './people'

export interface PlansReferenceJson { page: string; step?: string | undefined; revision?: string | undefined }
export interface OrderAdviceJson { before: string; after: string }

/** A measurement as lib/domain/measurements found it; places are UTF-16 units of the plain text, end exclusive. */
export interface MeasurementJson {
  raw: string; start: number; end: number
  kind: 'length' | 'drill' | 'torque' | 'pressure' | 'angle' | 'temperature' | 'rivet' | 'bolt' | 'thread' | 'gauge'
  value: number; max?: number; exact?: string; unit: string
  si: { value: number; unit: 'm' | 'N·m' | 'Pa' | 'rad' | 'K'; max?: number }
  inches?: number; diameter?: number; length?: number; grip?: number
}

export const post = sqliteTable('post', {
  id: id(),
  kind: text({ enum: ['question', 'lesson', 'answer'] }).notNull(),
  parentId: integer().references((): AnySQLiteColumn => post.id),
  authorId: integer().references(() => member.id),
  /** Plain name of an imported author without an account. */
  authorName: text(),
  ref: text(),
  state: text({ enum: ['visible', 'hidden', 'merged', 'withdrawn'] }).notNull().default('visible'),
  stateReason: text(),
  /** The entry that a merged one leads to. */
  mergedIntoId: integer().references((): AnySQLiteColumn => post.id),
  stateBy: integer().references(() => member.id),
  stateAt: moment(),
  currentRevision: integer().notNull(),
  /** Cache of the pure functions in lib/domain/stamps and lib/domain/cautions, rebuilt with every write that touches them. */
  stampState: text({ enum: ['none', 'imported', 'one-of-two', 'stamped', 'lapsed', 'plans-changed', 'in-question', 'withdrawn'] }).notNull().default('none'),
  needsTwo: integer({ mode: 'boolean' }).notNull().default(false),
  createdAt: moment().notNull(),
  updatedAt: moment().notNull(),
  /** Version of the parser that last read this post's measurements; 0 = none yet. */
  measuredBy: integer().notNull().default(0),
}, (t) => [
  check('post_kind', sql`(${t.kind} = 'answer') = (${t.parentId} is not null)`),
  index('post_parent').on(t.parentId),
  index('post_author').on(t.authorId),
  index('post_recent').on(t.state, t.createdAt),
  uniqueIndex('post_entry_ref').on(t.ref).where(sql`parent_id is null`),
  uniqueIndex('post_answer_ref').on(t.parentId, t.ref),
])

export const revision = sqliteTable('revision', {
  postId: integer().notNull().references(() => post.id),
  /** 1, 2, 3 … shown as A, B, C …; without gaps (trigger). */
  number: integer().notNull(),
  authorId: integer().references(() => member.id),
  authorName: text(),
  title: text().notNull().default(''),
  kitId: integer().references(() => kit.id),
  /** Section codes within the kit; the first is primary. */
  sections: text({ mode: 'json' }).$type<string[]>().notNull(),
  tasks: text({ mode: 'json' }).$type<string[]>().notNull(),
  operations: text({ mode: 'json' }).$type<string[]>().notNull(),
  hardware: text({ mode: 'json' }).$type<string[]>().notNull(),
  plans: text({ mode: 'json' }).$type<PlansReferenceJson[]>().notNull(),
  orderAdvice: text({ mode: 'json' }).$type<OrderAdviceJson[]>().notNull(),
  parts: text({ mode: 'json' }).$type<Record<string, string | number> | null>(),
  body: text().notNull(),
  /** An answer that passes on a kit maker's written reply says for whom it holds; one serial can be neither stamped nor gone by. */
  makerReplyScope: text({ enum: ['bulletin', 'all-kits', 'one-serial'] }),
  /** SHA-256 of what was judged; kept when a steward redacts the text. */
  contentHash: text().notNull(),
  redactedReason: text(),
  createdAt: moment().notNull(),
}, (t) => [primaryKey({ columns: [t.postId, t.number] })])

/** Sanitised HTML by field and plain text of a revision or remark, a cache keyed by owner; `renderer` is the renderer's version. */
export const rendering = sqliteTable('rendering', {
  key: text().primaryKey(),
  renderer: integer().notNull(),
  html: text({ mode: 'json' }).$type<Record<string, string>>().notNull(),
  plain: text().notNull(),
})

export const postSection = sqliteTable('post_section', {
  postId: integer().notNull().references(() => post.id),
  sectionId: integer().notNull().references(() => section.id),
  position: integer().notNull(),
}, (t) => [primaryKey({ columns: [t.postId, t.sectionId] }), index('post_section_section').on(t.sectionId)])

export const postTask = sqliteTable('post_task', {
  postId: integer().notNull().references(() => post.id),
  taskId: integer().notNull().references(() => task.id),
}, (t) => [primaryKey({ columns: [t.postId, t.taskId] }), index('post_task_task').on(t.taskId)])

export const postOperation = sqliteTable('post_operation', {
  postId: integer().notNull().references(() => post.id),
  operationId: integer().notNull().references(() => operation.id),
}, (t) => [primaryKey({ columns: [t.postId, t.operationId] }), index('post_operation_operation').on(t.operationId)])

export const postHardware = sqliteTable('post_hardware', {
  postId: integer().notNull().references(() => post.id),
  name: text().notNull(),
}, (t) => [primaryKey({ columns: [t.postId, t.name] }), index('post_hardware_name').on(t.name)])

/** What the parser found in the plain text of the current revision; `parser` is its version. Kind and SI value stand apart for looking up. */
export const measurement = sqliteTable('measurement', {
  postId: integer().notNull().references(() => post.id),
  position: integer().notNull(),
  parser: integer().notNull(),
  kind: text({ enum: ['length', 'drill', 'torque', 'pressure', 'angle', 'temperature', 'rivet', 'bolt', 'thread', 'gauge'] }).notNull(),
  siValue: real().notNull(),
  found: text({ mode: 'json' }).$type<MeasurementJson>().notNull(),
}, (t) => [primaryKey({ columns: [t.postId, t.position] }), index('measurement_value').on(t.kind, t.siValue)])

export const remark = sqliteTable('remark', {
  id: id(),
  postId: integer().notNull().references(() => post.id),
  authorId: integer().references(() => member.id),
  authorName: text(),
  body: text().notNull(),
  state: text({ enum: ['visible', 'hidden'] }).notNull().default('visible'),
  createdAt: moment().notNull(),
}, (t) => [index('remark_post').on(t.postId)])

/** One row a member and post, for both marks: which revision of the post they speak of. */
const ofRevision = (t: { postId: AnySQLiteColumn; revision: AnySQLiteColumn }) =>
  foreignKey({ columns: [t.postId, t.revision], foreignColumns: [revision.postId, revision.number] })

export const outcome = sqliteTable('outcome', {
  postId: integer().notNull(),
  memberId: integer().notNull().references(() => member.id),
  revision: integer().notNull(),
  result: text({ enum: ['as-written', 'with-change', 'did-not-work'] }).notNull(),
  note: text().notNull(),
  createdAt: moment().notNull(),
}, (t) => [primaryKey({ columns: [t.postId, t.memberId] }), ofRevision(t),
  check('outcome_result', sql`${t.result} in ('as-written','with-change','did-not-work')`)])

export const reliance = sqliteTable('reliance', {
  postId: integer().notNull(),
  memberId: integer().notNull().references(() => member.id),
  revision: integer().notNull(),
  createdAt: moment().notNull(),
}, (t) => [primaryKey({ columns: [t.postId, t.memberId] }), ofRevision(t)])
