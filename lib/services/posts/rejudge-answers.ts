// What an edit of a question does to its answers.
import 'server-only'
import type { Transaction } from '@/db/client'
import { getCautionedPost, listAnswerIds, listCautionedPosts } from '@/db/queries/cautioned-post'
import { attachCautions, cautionsOfAnswer } from './attach-cautions'
import { judgePost } from './judge-post'

/** How many cautions were added. After its question changed: what the new text requires is added, and stamps on the old text lapse. */
export async function rejudgeAnswers(tx: Transaction, questionId: number, now: number): Promise<number> {
  const question = await getCautionedPost(tx, questionId)
  if (!question) return 0
  let added = 0
  const answers = await listCautionedPosts(tx, (await listAnswerIds(tx, [questionId])).map((a) => a.id))
  for (const answer of answers) {
    added += await attachCautions(tx, answer.id, cautionsOfAnswer(question, answer.current.body), 'added-later', now)
    await judgePost(tx, answer.id)
  }
  return added
}

