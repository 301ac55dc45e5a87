// Stamps and what a mentor asks for before stamping. A stamp belongs to a revision of its own post.
import { sql } from 'drizzle-orm'
import { check, foreignKey, index, integer, sqliteTable, text, uniqueIndex } from 'drizzle-orm/sqlite-core'
import { id, moment } from './columns'
import { member } from './people'
import { post, revision } from './posts'

export const stamp = sqliteTable('stamp', {
  id: id(),
  postId: integer().notNull(),
  revision: integer().notNull(),
  /** For an answer: the question's revision that was read; an edit of the question lapses the stamp. 0 on a lesson. */
  questionRevision: integer().notNull().default(0),
  /** Null for an imported stamp, which never counts as one of two. */
  mentorId: integer().references(() => member.id),
  /** The mentorship number at the time, as printed. */
  mark: text().notNull(),
  basis: text({ enum: ['plans', 'standard', 'own-build', 'maker-reply', 'imported'] }).notNull(),
  reference: text().notNull(),
  plansRevision: text(),
  scope: text({ enum: ['bulletin', 'all-kits', 'one-serial'] }),
  conflictReason: text(),
  createdAt: moment().notNull(),
  withdrawnAt: moment(),
  withdrawnReason: text(),
}, (t) => [
  foreignKey({ columns: [t.postId, t.revision], foreignColumns: [revision.postId, revision.number] }),
  uniqueIndex('stamp_one_live').on(t.postId, t.revision, t.questionRevision, t.mentorId).where(sql`withdrawn_at is null`),
  index('stamp_mentor').on(t.mentorId),
  check('stamp_basis', sql`${t.basis} in ('plans','standard','own-build','maker-reply','imported')`),
  check('stamp_scope', sql`(${t.scope} is not null) = (${t.basis} = 'maker-reply')`),
  check('stamp_imported', sql`(${t.mentorId} is null) = (${t.basis} = 'imported')`),
])

/** "Ask for": takes the post off the rail until its author answers with an edit or a remark. */
export const askedFor = sqliteTable('asked_for', {
  id: id(),
  postId: integer().notNull().references(() => post.id),
  mentorId: integer().notNull().references(() => member.id),
  what: text({ enum: ['photo-with-scale', 'page-and-revision', 'edge-distance', 'which-side'] }).notNull(),
  createdAt: moment().notNull(),
  answeredAt: moment(),
}, (t) => [
  index('asked_for_post').on(t.postId),
  uniqueIndex('asked_for_one_open').on(t.postId, t.what).where(sql`answered_at is null`),
])
