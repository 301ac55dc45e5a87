// What can be done before the transaction: names into rows, hashes, and HTML of every text that is not there yet.
import 'server-only'
import { getImportedHashes } from '@/db/queries/imports'
import type { Reader } from '@/db/client'
import { textFields } from '@/lib/domain/entries/entry-text'
import type { Renderer } from '@/lib/render/renderer'
import { answerRevision } from '@/lib/services/entries/create-answer'
import { cleanParts } from '@/lib/services/entries/create-entry'
import { contentHash } from '@/lib/services/posts/content-hash'
import { placeEntry, type Placement } from '@/lib/services/posts/place-entry'
import { renderText, type Rendered } from '@/lib/services/posts/render-text'
import type { ImportAnswer } from '@/lib/schemas/import'
import type { ImportedEntry } from './parse-line'

/** A text with its hash; without HTML when the same text is kept already (a missing one is mended when it is read). */
interface PreparedText<J> { judged: J; hash: string; rendered: Rendered | null }
export interface PreparedAnswer extends PreparedText<ReturnType<typeof answerRevision>> { input: ImportAnswer }
export interface PreparedEntry extends PreparedText<ReturnType<typeof judgedOf>> {
  line: number
  input: ImportedEntry
  place: Placement
  answers: PreparedAnswer[]
}

/** Refuses a text that cannot be rendered safely, naming the part. */
export async function prepareEntry({ reader, renderer }: { reader: Reader; renderer: Renderer }, line: number, input: ImportedEntry): Promise<PreparedEntry> {
  const place = await placeEntry(reader, input.entry)
  const kept = new Set(input.ref === null ? [] : await getImportedHashes(reader, input.ref))
  const text = async <J>(judged: J, hash: string, fields: { name: string; text: string }[]): Promise<PreparedText<J>> =>
    ({ judged, hash, rendered: kept.has(hash) ? null : await renderText(renderer, fields) })
  const judged = judgedOf(input, place)
  const answers: PreparedAnswer[] = []
  for (const answer of input.answers) {
    const revision = answerRevision(answer.body, null)
    answers.push({ input: answer, ...(await text(revision, contentHash(revision), [{ name: 'body', text: answer.body }])) })
  }
  return { line, input, place, answers, ...(await text(judged, contentHash(judged), textFields(input.entry.kind, judged.parts, judged.body))) }
}

function judgedOf({ entry }: ImportedEntry, place: Placement) {
  return {
    title: entry.title, kitId: place.kitId, sections: place.sections.map((s) => s.code), tasks: [...new Set(entry.tasks)], operations: place.operations,
    hardware: [...new Set(entry.hardware)], plans: entry.plans, orderAdvice: entry.orderAdvice, parts: cleanParts(entry.parts), body: entry.body ?? '',
  }
}
