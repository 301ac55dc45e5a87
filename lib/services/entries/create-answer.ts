// A member says what to do under a question.
import 'server-only'
import { insertPost, insertRevision } from '@/db/mutations/posts'
import { getCautionedPost } from '@/db/queries/cautioned-post'
import { write } from '@/db/transaction'
import type { AppContext } from '@/lib/context'
import { refuse } from '@/lib/errors'
import { can } from '@/lib/policy/can'
import type { NewAnswer } from '@/lib/schemas/entry-input'
import { acknowledgeCautions, cautionsOfAnswer } from '@/lib/services/posts/attach-cautions'
import { contentHash } from '@/lib/services/posts/content-hash'
import { judgePost } from '@/lib/services/posts/judge-post'
import { subjectOf } from '@/lib/services/posts/load-entry'
import { renderText } from '@/lib/services/posts/render-text'
import { saveText } from '@/lib/services/posts/save-text'
import { afterWrite } from '@/lib/services/posts/after-write'

const nowhere = { title: '', kitId: null, sections: [], tasks: [], operations: [], hardware: [], plans: [], orderAdvice: [], parts: null }

/** What an answer's revision holds: its own words; its place is its question's. */
export const answerRevision = (body: string, makerReplyScope: NewAnswer['makerReply'] | null) => ({ ...nowhere, body, makerReplyScope: makerReplyScope ?? null })

/** Publishes and returns the answer's id. 404 when the question is not to be seen; 422 for cautions not acknowledged. */
export async function createAnswer(context: AppContext, questionId: number, input: NewAnswer): Promise<number> {
  const { actor, now } = context
  if (!actor || !can(actor, 'post.write')) throw refuse.signIn()
  const rendered = await renderText(context.renderer, [{ name: 'body', text: input.body }])
  const id = await write(context.database, { actorId: actor.id, at: now }, async (tx, record) => {
    const question = await getCautionedPost(tx, questionId)
    if (!question || question.kind === 'answer' || !can(actor, 'post.read', subjectOf(question))) throw refuse.notFound('This question')
    if (question.kind !== 'question') throw refuse.invalid('id', 'A lesson takes remarks, not answers.')
    if (question.state !== 'visible') throw refuse.forbidden('This question is closed: it is hidden or withdrawn.')
    const judged = answerRevision(input.body, input.makerReply)
    const postId = await insertPost(tx, { kind: 'answer', parentId: questionId, authorId: actor.id, createdAt: now })
    await insertRevision(tx, { postId, number: 1, authorId: actor.id, ...judged, contentHash: contentHash(judged), createdAt: now }, null)
    await saveText(tx, postId, 1, rendered)
    await acknowledgeCautions(tx, postId, cautionsOfAnswer(question, input.body), input.acknowledgedCautions, now)
    await judgePost(tx, postId)
    record('answer.publish', `post:${postId}`, `post:${questionId}`)
    return postId
  })
  await afterWrite(context)
  return id
}
