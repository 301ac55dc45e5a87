// What the writing pages need: places to pick from, hardware names to complete, and the text when it is an edit.
import 'server-only'
import { listHardwareNames } from '@/db/queries/hardware'
import type { AppContext } from '@/lib/context'
import { refuse } from '@/lib/errors'
import { can } from '@/lib/policy/can'
import { whyNot } from '@/lib/policy/why-not'
import type { Answer, Entry } from '@/lib/schemas/post'
import { loadEntry, subjectOf } from '@/lib/services/posts/load-entry'
import { getCautionedPost } from '@/db/queries/cautioned-post'

export const listHardware = (context: AppContext): Promise<string[]> => listHardwareNames(context.reader, 400)

/** The entry its author wants to edit. 404 or 403 like the edit itself. */
export async function getEditableEntry(context: AppContext, id: number): Promise<Entry> {
  const entry = await loadEntry(context, id)
  const found = await getCautionedPost(context.reader, id)
  if (!found || !can(context.actor, 'post.edit', subjectOf(found))) throw refuse.forbidden(whyNot['post.edit'])
  return entry
}

/** The answer its author wants to edit, with its question and the Markdown as written. */
export async function getEditableAnswer(context: AppContext, id: number): Promise<{ question: Entry; answer: Answer; body: string }> {
  const found = await getCautionedPost(context.reader, id)
  if (!found || found.parentId === null) throw refuse.notFound('This answer')
  const question = await loadEntry(context, found.parentId)
  const answer = question.answers.find((a) => a.id === id)
  if (!answer) throw refuse.notFound('This answer')
  if (!can(context.actor, 'post.edit', subjectOf(found))) throw refuse.forbidden(whyNot['post.edit'])
  return { question, answer, body: found.current.body }
}
