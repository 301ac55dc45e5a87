// Writes one prepared entry with its answers. Inside a transaction.
import 'server-only'
import type { Transaction } from '@/db/client'
import { getEntryByRef, listAnswersForImport } from '@/db/queries/imports'
import type { Record } from '@/db/transaction'
import { revisionLetter } from '@/lib/domain/entries/revision-letter'
import { AppError } from '@/lib/errors'
import { cautionsOfAnswer, cautionsOfEntry } from '@/lib/services/posts/attach-cautions'
import { judgePost } from '@/lib/services/posts/judge-post'
import { rejudgeAnswers } from '@/lib/services/posts/rejudge-answers'
import type { PreparedAnswer, PreparedEntry } from './prepare-entry'
import { insertImported, updateImported, type ImportedText } from './write-post'

export type Done = 'imported' | 'updated' | 'unchanged'
type KnownAnswer = Awaited<ReturnType<typeof listAnswersForImport>>[number]

/** New by its ref (or without one), or brought up to what the line says. Answers the line doesn't name stay. */
export async function writeEntry(tx: Transaction, prepared: PreparedEntry, record: Record, now: number): Promise<Done> {
  const { input } = prepared
  const known = input.ref === null ? null : await getEntryByRef(tx, input.ref)
  if (known && known.kind !== input.entry.kind) throw new AppError('invalid', `kind: “${input.ref}” is a ${known.kind} here.`)
  const text = entryText(prepared)
  if (!known) {
    const { id } = await insertImported(tx, text, now)
    for (const answer of prepared.answers) await insertImported(tx, answerText(prepared, answer, id, 1), now)
    record(`${input.entry.kind}.import`, `post:${id}`, 'A')
    return 'imported'
  }
  const { number, changed } = await updateImported(tx, known, text, now)
  const answersChanged = await writeAnswers(tx, prepared, { id: known.id, number }, now)
  if (!changed && !answersChanged) {
    record('nothing', `post:${known.id}`)
    return 'unchanged'
  }
  await judgePost(tx, known.id)
  await rejudgeAnswers(tx, known.id, now)
  record(`${input.entry.kind}.import`, `post:${known.id}`, revisionLetter(number))
  return 'updated'
}

async function writeAnswers(tx: Transaction, prepared: PreparedEntry, question: { id: number; number: number }, now: number): Promise<boolean> {
  if (prepared.answers.length === 0) return false
  const known = await listAnswersForImport(tx, question.id)
  let anyChanged = false
  for (const [position, answer] of prepared.answers.entries()) {
    const match = matchAnswer(known, prepared.answers, answer, position)
    const text = answerText(prepared, answer, question.id, question.number)
    if (match) anyChanged = (await updateImported(tx, match, text, now)).changed || anyChanged
    else anyChanged = (await insertImported(tx, text, now)).id > 0
  }
  return anyChanged
}

/** By ref; else the answer at the same place among those that came without an account and whose ref no other line names. */
function matchAnswer(known: readonly KnownAnswer[], all: readonly PreparedAnswer[], answer: PreparedAnswer, position: number): KnownAnswer | undefined {
  const { ref } = answer.input
  if (ref !== undefined) return known.find((k) => k.ref === ref)
  const candidate = known.filter((k) => k.authorId === null)[position]
  return candidate && !all.some((a) => a.input.ref !== undefined && a.input.ref === candidate.ref) ? candidate : undefined
}

function entryText({ input, judged, hash, rendered, place }: PreparedEntry): ImportedText {
  return {
    kind: input.entry.kind, parentId: null, ref: input.ref, author: input.author, createdAt: input.createdAt, stamped: input.stamped, questionRevision: 0,
    judged, hash, rendered, required: cautionsOfEntry(input.entry.kind, judged, place.sections.flatMap((s) => s.jasc ?? [])),
    projections: { sectionIds: place.sections.map((s) => s.id), taskIds: place.taskIds, operationIds: place.operationIds, hardware: judged.hardware },
  }
}

function answerText(question: PreparedEntry, { input, judged, hash, rendered }: PreparedAnswer, parentId: number, questionRevision: number): ImportedText {
  const nowhere = { postId: parentId, number: questionRevision, authorId: null, authorName: null, makerReplyScope: null, redactedReason: null }
  const current = { ...question.judged, ...nowhere, contentHash: question.hash, createdAt: question.input.createdAt }
  // The rules read the system of a section, never its title.
  // What a moderator added to a known question reaches its answers through rejudgeAnswers.
  const asked = { cautions: [], current, sections: question.place.sections.map((s) => ({ ...s, title: '' })) }
  return {
    kind: 'answer', parentId, ref: input.ref ?? null, author: input.author ?? null, createdAt: input.createdAt ?? question.input.createdAt, stamped: input.stamped ?? false, questionRevision,
    judged, hash, rendered, projections: null, required: cautionsOfAnswer(asked, input.body),
  }
}
