// The post an act is about, as the policy sees it inside the transaction that acts.
import 'server-only'
import type { ReaderOrTransaction } from '@/db/client'
import { getCautionedPost, type CautionedPost } from '@/db/queries/cautioned-post'
import { refuse } from '@/lib/errors'
import type { Actor } from '@/lib/policy/actor'
import { can, type PostSubject } from '@/lib/policy/can'
import { subjectOf } from './load-entry'

export interface RequiredPost {
  found: CautionedPost
  /** The question of an answer; null for an entry. */
  question: CautionedPost | null
  entryId: number
  /** An answer under a question that is hidden, merged or withdrawn is no more open than its question. */
  subject: PostSubject
}

/** The post and its question. 404 when either is not there or not to be seen by `actor`. */
export async function requirePost(reader: ReaderOrTransaction, actor: Actor, id: number): Promise<RequiredPost> {
  const found = await getCautionedPost(reader, id)
  if (!found || !can(actor, 'post.read', subjectOf(found))) throw refuse.notFound('This post')
  if (found.parentId === null) return { found, question: null, entryId: id, subject: subjectOf(found) }
  const question = await getCautionedPost(reader, found.parentId)
  if (!question || !can(actor, 'post.read', subjectOf(question))) throw refuse.notFound('This post')
  const state = question.state === 'visible' ? found.state : question.state
  return { found, question, entryId: question.id, subject: { ...subjectOf(found), state } }
}
