// Members, what they may sign in with, and mentorships. Roles are a ladder of care; mentorship stands beside it.
import { sql } from 'drizzle-orm'
import { check, index, integer, sqliteTable, text, uniqueIndex } from 'drizzle-orm/sqlite-core'
import { id, moment } from './columns'

export const member = sqliteTable('member', {
  id: id(),
  email: text().unique(),
  name: text().notNull(),
  bio: text().notNull().default(''),
  passwordHash: text(),
  role: text({ enum: ['member', 'moderator', 'steward'] }).notNull().default('member'),
  state: text({ enum: ['active', 'suspended', 'closed'] }).notNull().default('active'),
  /** Why, by whom and when the state was set last. Words about people stay out of the audit trail. */
  stateReason: text(),
  stateBy: integer(),
  stateAt: moment(),
  /** Raised by a password change: sessions made before it end. */
  sessionEpoch: integer().notNull().default(0),
  /** Which system stands first where a measurement is shown; null = as the page says. */
  units: text({ enum: ['inch', 'metric'] }),
  createdAt: moment().notNull(),
}, (t) => [
  check('member_role', sql`${t.role} in ('member','moderator','steward')`),
  check('member_state', sql`${t.state} in ('active','suspended','closed')`),
  check('member_email_lower', sql`${t.email} = lower(${t.email})`),
])

export const mentorship = sqliteTable('mentorship', {
  id: id(),
  memberId: integer().notNull().references(() => member.id),
  /** The mark on the stamp, such as IC 042. Never given twice. */
  number: text().notNull().unique(),
  fields: text().notNull(),
  reason: text().notNull(),
  grantedBy: integer().notNull().references(() => member.id),
  createdAt: moment().notNull(),
  endedAt: moment(),
  endedBy: integer().references(() => member.id),
  endReason: text(),
}, (t) => [
  uniqueIndex('mentorship_one_live').on(t.memberId).where(sql`ended_at is null`),
  check('mentorship_by_another', sql`${t.grantedBy} <> ${t.memberId}`),
])

export const token = sqliteTable('token', {
  id: id(),
  memberId: integer().notNull().references(() => member.id),
  name: text().notNull(),
  hash: text().notNull().unique(),
  createdAt: moment().notNull(),
  revokedAt: moment(),
}, (t) => [index('token_member').on(t.memberId)])

/** Sign-in attempts per key (address or e-mail) and window: kept here so that a restart does not forget them. */
export const attempt = sqliteTable('attempt', {
  id: id(),
  key: text().notNull(),
  at: moment().notNull(),
}, (t) => [index('attempt_key').on(t.key, t.at)])
