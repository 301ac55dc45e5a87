// What the installation remembers of itself: the change log search follows, the audit trail, settings, replayed answers.
import { index, integer, primaryKey, sqliteTable, text } from 'drizzle-orm/sqlite-core'
import { id, moment } from './columns'

/** sequence -> post: what search has yet to see. Filled by triggers only. */
export const change = sqliteTable('change', {
  sequence: id(),
  postId: integer().notNull(),
})

/** Append-only and chained. Ids, verbs and hashes; never names, addresses or text, so that people can leave. */
export const audit = sqliteTable('audit', {
  sequence: id(),
  at: moment().notNull(),
  actorId: integer(),
  verb: text().notNull(),
  subject: text().notNull(),
  detail: text().notNull().default(''),
  previousHash: text().notNull(),
  hash: text().notNull(),
}, (t) => [index('audit_subject').on(t.subject)])

export const setting = sqliteTable('setting', {
  key: text().primaryKey(),
  value: text().notNull(),
})

/** Answers kept for 24 hours by member, route and Idempotency-Key. */
export const idempotency = sqliteTable('idempotency', {
  memberId: integer().notNull(),
  route: text().notNull(),
  key: text().notNull(),
  bodyHash: text().notNull(),
  status: integer().notNull(),
  body: text().notNull(),
  createdAt: moment().notNull(),
}, (t) => [primaryKey({ columns: [t.memberId, t.route, t.key] }), index('idempotency_created').on(t.createdAt)])
