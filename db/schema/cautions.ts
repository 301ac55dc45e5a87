// Cautions attached to posts. Their words stand in content/cautions.json; a row says which, why, and who answered for it.
import { sql } from 'drizzle-orm'
import { check, integer, primaryKey, sqliteTable, text } from 'drizzle-orm/sqlite-core'
import { moment } from './columns'
import { member } from './people'
import { post } from './posts'

export const postCaution = sqliteTable('post_caution', {
  postId: integer().notNull().references(() => post.id),
  code: text().notNull(),
  origin: text({ enum: ['rule', 'moderator', 'added-later'] }).notNull(),
  because: text().notNull(),
  createdAt: moment().notNull(),
  /** When the author acknowledged it; null for what was attached later or by import. */
  acknowledgedAt: moment(),
  addedBy: integer().references(() => member.id),
  waivedAt: moment(),
  waivedBy: integer().references(() => member.id),
  waivedReason: text(),
}, (t) => [
  primaryKey({ columns: [t.postId, t.code] }),
  check('post_caution_waived', sql`(${t.waivedAt} is null) = (${t.waivedReason} is null)`),
])
