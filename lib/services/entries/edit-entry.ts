// Its author edits an entry: a new revision. An edit of a question lapses the stamps on its answers and re-runs their cautions.
import 'server-only'
import { insertRevision } from '@/db/mutations/posts'
import { getCautionedPost, type CautionedPost } from '@/db/queries/cautioned-post'
import { listTasksBySlug } from '@/db/queries/kits'
import { write } from '@/db/transaction'
import type { AppContext } from '@/lib/context'
import { textFields } from '@/lib/domain/entries/entry-text'
import { revisionLetter } from '@/lib/domain/entries/revision-letter'
import { AppError, refuse } from '@/lib/errors'
import { can } from '@/lib/policy/can'
import { whyNot } from '@/lib/policy/why-not'
import { lessonPartsSchema, questionPartsSchema, type EntryEdit } from '@/lib/schemas/entry-input'
import { acknowledgeCautions, cautionsOfEntry } from '@/lib/services/posts/attach-cautions'
import { contentHash } from '@/lib/services/posts/content-hash'
import { judgePost } from '@/lib/services/posts/judge-post'
import { loadEntry, subjectOf } from '@/lib/services/posts/load-entry'
import { placeEntry, type Placement } from '@/lib/services/posts/place-entry'
import { rejudgeAnswers } from '@/lib/services/posts/rejudge-answers'
import { renderText } from '@/lib/services/posts/render-text'
import { saveText } from '@/lib/services/posts/save-text'
import { answerRequests } from '@/lib/services/posts/answer-requests'
import { cleanParts } from './create-entry'
import { afterWrite } from '@/lib/services/posts/after-write'

/**
 * Publishes the next revision; returns its letter. 409 with the present version when somebody else was faster;
 * 422 as for a new entry. An edit that changes nothing makes no revision.
 */
export async function editEntry(context: AppContext, id: number, input: EntryEdit): Promise<string> {
  const { actor, now } = context
  if (!actor) throw refuse.signIn()
  const before = await getCautionedPost(context.reader, id)
  if (!before || before.kind === 'answer' || !can(actor, 'post.read', subjectOf(before))) throw refuse.notFound('This entry')
  if (!can(actor, 'post.edit', subjectOf(before))) throw refuse.forbidden(whyNot['post.edit'])
  if (input.kind !== undefined && input.kind !== before.kind) throw refuse.invalid('kind', 'The kind of an entry never changes.')
  const impliedByTasks = (await listTasksBySlug(context.reader, before.current.tasks)).map((t) => t.operation)
  const next = merged(before, input, before.current.operations.filter((slug) => !impliedByTasks.includes(slug)))
  const rendered = await renderText(context.renderer, textFields(before.kind, next.parts, next.body))
  const stale = async () => new AppError('conflict', 'This entry was changed meanwhile. Both versions are below; nothing is lost.', { current: await loadEntry(context, id) })
  const letter = await write(context.database, { actorId: actor.id, at: now }, async (tx, record) => {
    const found = await getCautionedPost(tx, id)
    if (!found || found.kind === 'answer' || !can(actor, 'post.edit', subjectOf(found))) throw refuse.forbidden(whyNot['post.edit'])
    if (revisionLetter(found.current.number) !== input.revision) {
      record('nothing', `post:${id}`)
      return null
    }
    const place = await placeEntry(tx, next)
    const judged = { ...next, kitId: place.kitId, sections: place.sections.map((s) => s.code), operations: place.operations }
    const hash = contentHash(judged)
    if (hash === found.current.contentHash) {
      record('nothing', `post:${id}`)
      return input.revision
    }
    const number = found.current.number + 1
    await insertRevision(tx, { postId: id, number, authorId: actor.id, ...revisionColumns(judged), contentHash: hash, createdAt: now }, projectionsOf(place, judged.hardware))
    await saveText(tx, id, number, rendered)
    const required = cautionsOfEntry(found.kind, judged, place.sections.flatMap((s) => s.jasc ?? []))
    await acknowledgeCautions(tx, id, required, input.acknowledgedCautions, now)
    await judgePost(tx, id)
    if (found.kind === 'question') await rejudgeAnswers(tx, id, now)
    await answerRequests(tx, id, actor.id, now)
    record(`${found.kind}.revise`, `post:${id}`, revisionLetter(number))
    return revisionLetter(number)
  })
  if (letter === null) throw await stale()
  await afterWrite(context)
  return letter
}

/** `beyondTasks`: operations named beside the tasks, which an edit that does not speak of operations keeps. */
function merged(before: CautionedPost, input: EntryEdit, beyondTasks: string[]) {
  const { current } = before
  const parts = input.parts !== undefined ? partsOfKind(before.kind, input.parts) : input.body !== undefined ? null : current.parts
  const body = input.body ?? (input.parts !== undefined ? '' : current.body)
  return {
    title: input.title ?? current.title, kit: input.kit ?? before.kit?.slug ?? '', sections: input.sections ?? current.sections, tasks: input.tasks ?? current.tasks,
    operations: input.operations ?? beyondTasks, hardware: input.hardware ?? current.hardware, plans: input.plans ?? current.plans,
    orderAdvice: input.orderAdvice ?? current.orderAdvice, parts, body,
  }
}

function partsOfKind(kind: CautionedPost['kind'], parts: Record<string, unknown>) {
  const result = (kind === 'question' ? questionPartsSchema : lessonPartsSchema).safeParse(parts)
  if (!result.success) throw refuse.invalid('parts', `These are not the parts of a ${kind}.`)
  const cleaned = cleanParts(result.data)
  if (!cleaned || !Object.values(cleaned).some((v) => typeof v === 'string')) throw refuse.invalid('parts', 'At least one part needs text.')
  return cleaned
}

type Judged = Omit<ReturnType<typeof merged>, 'kit'> & { kitId: number }
const revisionColumns = ({ title, kitId, sections, tasks, operations, hardware, plans, orderAdvice, parts, body }: Judged) =>
  ({ title, kitId, sections, tasks, operations, hardware, plans, orderAdvice, parts, body })
const projectionsOf = (place: Placement, hardware: string[]) =>
  ({ sectionIds: place.sections.map((s) => s.id), taskIds: place.taskIds, operationIds: place.operationIds, hardware })
