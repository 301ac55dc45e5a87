// Its author edits what they said to do: a new revision, and the stamps on the old one lapse.
import 'server-only'
import { insertRevision } from '@/db/mutations/posts'
import { getCautionedPost } from '@/db/queries/cautioned-post'
import { write } from '@/db/transaction'
import type { AppContext } from '@/lib/context'
import { revisionLetter } from '@/lib/domain/entries/revision-letter'
import { AppError, refuse } from '@/lib/errors'
import { can } from '@/lib/policy/can'
import { whyNot } from '@/lib/policy/why-not'
import type { AnswerEdit } from '@/lib/schemas/entry-input'
import { acknowledgeCautions, cautionsOfAnswer } from '@/lib/services/posts/attach-cautions'
import { answerRequests } from '@/lib/services/posts/answer-requests'
import { contentHash } from '@/lib/services/posts/content-hash'
import { judgePost } from '@/lib/services/posts/judge-post'
import { loadEntry, subjectOf } from '@/lib/services/posts/load-entry'
import { requirePost } from '@/lib/services/posts/require-post'
import { renderText } from '@/lib/services/posts/render-text'
import { saveText } from '@/lib/services/posts/save-text'
import { answerRevision } from './create-answer'
import { afterWrite } from '@/lib/services/posts/after-write'

/** Returns the question's id and the new letter. 409 with the present answer when it was changed meanwhile. */
export async function editAnswer(context: AppContext, id: number, input: AnswerEdit): Promise<{ questionId: number; revision: string }> {
  const { actor, now } = context
  if (!actor) throw refuse.signIn()
  const before = await getCautionedPost(context.reader, id)
  if (!before || before.parentId === null || !can(actor, 'post.read', subjectOf(before))) throw refuse.notFound('This answer')
  const questionId = before.parentId
  if (!can(actor, 'post.edit', subjectOf(before))) throw refuse.forbidden(whyNot['post.edit'])
  const rendered = await renderText(context.renderer, [{ name: 'body', text: input.body }])
  const letter = await write(context.database, { actorId: actor.id, at: now }, async (tx, record) => {
    const { found, question, subject } = await requirePost(tx, actor, id)
    if (!question || !can(actor, 'post.edit', subject)) throw refuse.forbidden(whyNot['post.edit'])
    const judged = answerRevision(input.body, input.makerReply === 'none' ? null : (input.makerReply ?? found.current.makerReplyScope))
    const hash = contentHash(judged)
    const isStale = revisionLetter(found.current.number) !== input.revision
    if (isStale || hash === found.current.contentHash) {
      record('nothing', `post:${id}`)
      return isStale ? null : input.revision
    }
    const number = found.current.number + 1
    await insertRevision(tx, { postId: id, number, authorId: actor.id, ...judged, contentHash: hash, createdAt: now }, null)
    await saveText(tx, id, number, rendered)
    await acknowledgeCautions(tx, id, cautionsOfAnswer(question, input.body), input.acknowledgedCautions, now)
    await judgePost(tx, id)
    await answerRequests(tx, id, actor.id, now)
    record('answer.revise', `post:${id}`, revisionLetter(number))
    return revisionLetter(number)
  })
  if (letter === null) {
    const question = await loadEntry(context, questionId)
    throw new AppError('conflict', 'This answer was changed meanwhile. Both versions are below; nothing is lost.', { current: question.answers.find((a) => a.id === id) })
  }
  await afterWrite(context)
  return { questionId, revision: letter }
}
