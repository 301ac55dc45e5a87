// What hangs on what, for queries that read a post whole (db/queries/cautioned-post.ts). Adds nothing to the database:
// foreign keys and laws stand with the tables.
import { relations } from 'drizzle-orm'
import { postCaution } from './cautions'
import { kit, section } from './kits'
import { member } from './people'
import { measurement, outcome, post, postSection, reliance, remark, revision } from './posts'
import { stamp } from './stamps'

export const postRelations = relations(post, ({ one, many }) => ({
  author: one(member, { fields: [post.authorId], references: [member.id] }),
  current: one(revision, { relationName: 'current', fields: [post.id, post.currentRevision], references: [revision.postId, revision.number] }),
  revisions: many(revision, { relationName: 'history' }),
  placed: many(postSection),
  cautions: many(postCaution),
  stamps: many(stamp),
  outcomes: many(outcome),
  reliances: many(reliance),
  remarks: many(remark),
  measurements: many(measurement),
}))
export const revisionRelations = relations(revision, ({ one }) => ({
  post: one(post, { relationName: 'history', fields: [revision.postId], references: [post.id] }),
  author: one(member, { fields: [revision.authorId], references: [member.id] }),
  kit: one(kit, { fields: [revision.kitId], references: [kit.id] }),
}))
export const postSectionRelations = relations(postSection, ({ one }) => ({
  post: one(post, { fields: [postSection.postId], references: [post.id] }),
  section: one(section, { fields: [postSection.sectionId], references: [section.id] }),
}))
export const postCautionRelations = relations(postCaution, ({ one }) => ({
  post: one(post, { fields: [postCaution.postId], references: [post.id] }),
}))
export const stampRelations = relations(stamp, ({ one }) => ({
  post: one(post, { fields: [stamp.postId], references: [post.id] }),
}))
export const outcomeRelations = relations(outcome, ({ one }) => ({
  post: one(post, { fields: [outcome.postId], references: [post.id] }),
  member: one(member, { fields: [outcome.memberId], references: [member.id] }),
}))
export const relianceRelations = relations(reliance, ({ one }) => ({
  post: one(post, { fields: [reliance.postId], references: [post.id] }),
}))
export const remarkRelations = relations(remark, ({ one }) => ({
  post: one(post, { fields: [remark.postId], references: [post.id] }),
  author: one(member, { fields: [remark.authorId], references: [member.id] }),
}))
export const measurementRelations = relations(measurement, ({ one }) => ({
  post: one(post, { fields: [measurement.postId], references: [post.id] }),
}))
