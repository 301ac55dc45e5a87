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
import type { NewEntry } from '@/lib/schemas/entry-input'
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

type Placements = Map<string, Placement>

/** Prepares the entries of one import: thousands of lines name the same few places, so each is looked up once. */
export function entryPreparer({ reader, renderer }: { reader: Reader; renderer: Renderer }) {
  const placements: Placements = new Map()
  /** Refuses a text that cannot be rendered safely, naming the part. */
  return async (line: number, input: ImportedEntry): Promise<PreparedEntry> => {
    const place = await placeOnce(placements, reader, input.entry)
    const kept = new Set(input.ref === null ? [] : await getImportedHashes(reader, input.ref))
    const text = async <J>(judged: J, hash: string, fields: { name: string; text: string }[]): Promise<PreparedText<J>> =>
      ({ judged, hash, rendered: kept.has(hash) ? null : await renderText(renderer, fields) })
    const judged = judgedOf(input, place)
    const [own, ...answers] = await Promise.all([
      text(judged, contentHash(judged), textFields(input.entry.kind, judged.parts, judged.body)),
      ...input.answers.map(async (answer): Promise<PreparedAnswer> => {
        const revision = answerRevision(answer.body, null)
        return { input: answer, ...(await text(revision, contentHash(revision), [{ name: 'body', text: answer.body }])) }
      }),
    ])
    return { line, input, place, answers, ...own }
  }
}

async function placeOnce(placements: Placements, reader: Reader, { kit, sections, tasks, operations, orderAdvice }: NewEntry): Promise<Placement> {
  const names = { kit, sections, tasks, operations, orderAdvice }
  const key = JSON.stringify(names)
  const place = placements.get(key) ?? (await placeEntry(reader, names))
  placements.set(key, place)
  return place
}

function judgedOf({ entry }: ImportedEntry, place: Placement) {
  return {
    title: entry.title, kitId: place.kitId, sections: place.sections.map((s) => s.code), tasks: [...new Set(entry.tasks)], operations: place.operations,
    hardware: [...new Set(entry.hardware)], plans: entry.plans, orderAdvice: entry.orderAdvice, parts: cleanParts(entry.parts), body: entry.body ?? '',
  }
}
