// A member's own aeroplane and what is kept with it: sections, log, holds, closing list, debriefs, visit sheets. Private to its owner.
import { sql } from 'drizzle-orm'
import { index, integer, primaryKey, sqliteTable, text, uniqueIndex } from 'drizzle-orm/sqlite-core'
import { id, moment } from './columns'
import { bulletin, closingItem, kit, section } from './kits'
import { member } from './people'
import { post } from './posts'

export const build = sqliteTable('build', {
  id: id(),
  memberId: integer().notNull().references(() => member.id),
  kitId: integer().notNull().references(() => kit.id),
  name: text().notNull(),
  /** Shown to nobody but its owner. */
  serial: text().notNull().default(''),
  createdAt: moment().notNull(),
  endedAt: moment(),
}, (t) => [index('build_member').on(t.memberId)])

/** Sections that are not begun have no row. */
export const buildSection = sqliteTable('build_section', {
  buildId: integer().notNull().references(() => build.id),
  sectionId: integer().notNull().references(() => section.id),
  state: text({ enum: ['not-begun', 'in-work', 'waiting', 'done'] }).notNull(),
  updatedAt: moment().notNull(),
}, (t) => [primaryKey({ columns: [t.buildId, t.sectionId] })])

/** One line of the log. `key` is made where it was written, so that a line sent twice is kept once. */
export const workSession = sqliteTable('work_session', {
  id: id(),
  buildId: integer().notNull().references(() => build.id),
  sectionId: integer().notNull().references(() => section.id),
  key: text().notNull(),
  /** The day at the builder's place, YYYY-MM-DD. */
  day: text().notNull(),
  minutes: integer().notNull(),
  page: text().notNull().default(''),
  steps: text().notNull().default(''),
  helpers: text().notNull().default(''),
  line: text().notNull().default(''),
  createdAt: moment().notNull(),
}, (t) => [uniqueIndex('work_session_key').on(t.buildId, t.key), index('work_session_section').on(t.sectionId)])

/** `hold`: do not go past a step until something; `left-open`: left open on purpose until a later section. */
export const hold = sqliteTable('hold', {
  id: id(),
  buildId: integer().notNull().references(() => build.id),
  sectionId: integer().notNull().references(() => section.id),
  key: text().notNull(),
  kind: text({ enum: ['hold', 'left-open'] }).notNull(),
  /** The step not to go past, or what is left open. */
  what: text().notNull(),
  page: text().notNull().default(''),
  step: text().notNull().default(''),
  /** What releases it. */
  until: text('until_what').notNull(),
  /** Steps that need not wait. */
  notWaiting: text().notNull().default(''),
  /** The later section on whose brief it shows. */
  untilSectionId: integer().references(() => section.id),
  /** Stands in the printed code, so that nobody can count through holds. */
  code: text().notNull().unique(),
  findingId: integer(),
  createdAt: moment().notNull(),
  releasedAt: moment(),
  releaseNote: text().notNull().default(''),
}, (t) => [uniqueIndex('hold_key').on(t.buildId, t.key), index('hold_section').on(t.buildId, t.sectionId)])

/** A line of the closing list on one build: ticked with a note, or not done with a reason. */
export const closingAnswer = sqliteTable('closing_answer', {
  buildId: integer().notNull().references(() => build.id),
  closingItemId: integer().notNull().references(() => closingItem.id),
  isDone: integer({ mode: 'boolean' }).notNull(),
  note: text().notNull(),
  at: moment().notNull(),
}, (t) => [primaryKey({ columns: [t.buildId, t.closingItemId] })])

/** What was told after a section. Its lessons are entries; hours, tools, order and what was left open are here. */
export const debrief = sqliteTable('debrief', {
  id: id(),
  buildId: integer().notNull().references(() => build.id),
  sectionId: integer().notNull().references(() => section.id),
  key: text().notNull(),
  /** Task slugs in the order done. */
  taskOrder: text({ mode: 'json' }).$type<string[]>().notNull(),
  minutes: integer(),
  tools: text().notNull().default(''),
  createdAt: moment().notNull(),
  /** Taken back within its ten seconds. */
  undoneAt: moment(),
}, (t) => [uniqueIndex('debrief_key').on(t.buildId, t.key), index('debrief_section').on(t.sectionId)])

/** Lessons of a debrief, so that taking it back hides them too. */
export const debriefLesson = sqliteTable('debrief_lesson', {
  debriefId: integer().notNull().references(() => debrief.id),
  postId: integer().notNull().references(() => post.id),
}, (t) => [primaryKey({ columns: [t.debriefId, t.postId] })])

/** Who wrote a post that shows no name. Read by the own-words check only. */
export const namelessAuthor = sqliteTable('nameless_author', {
  postId: integer().primaryKey().references(() => post.id),
  memberId: integer().notNull().references(() => member.id),
})

/** "My page is Rev …": a builder has the changed page before them. */
export const bulletinSeen = sqliteTable('bulletin_seen', {
  buildId: integer().notNull().references(() => build.id),
  bulletinId: integer().notNull().references(() => bulletin.id),
  revision: text().notNull(),
  at: moment().notNull(),
}, (t) => [primaryKey({ columns: [t.buildId, t.bulletinId] })])

/** A section shown to a mentor or inspector by a link that expires and can be revoked; only the token's hash is kept. */
export const visit = sqliteTable('visit', {
  id: id(),
  buildId: integer().notNull().references(() => build.id),
  sectionId: integer().notNull().references(() => section.id),
  /** Whom it is for, in the owner's words. */
  visitor: text().notNull(),
  tokenHash: text().notNull().unique(),
  expiresAt: moment().notNull(),
  revokedAt: moment(),
  createdAt: moment().notNull(),
})

/** A numbered line of a visit sheet: what was found. Each becomes a hold. */
export const finding = sqliteTable('finding', {
  id: id(),
  visitId: integer().notNull().references(() => visit.id),
  number: integer().notNull(),
  text: text().notNull(),
  createdAt: moment().notNull(),
}, (t) => [uniqueIndex('finding_number').on(t.visitId, t.number)])

/** What waits for a member: a bulletin on advice they go by, a withdrawal. */
export const notice = sqliteTable('notice', {
  id: id(),
  memberId: integer().notNull().references(() => member.id),
  kind: text({ enum: ['bulletin', 'withdrawal'] }).notNull(),
  postId: integer().references(() => post.id),
  bulletinId: integer().references(() => bulletin.id),
  createdAt: moment().notNull(),
  closedAt: moment(),
}, (t) => [index('notice_member').on(t.memberId).where(sql`closed_at is null`)])
