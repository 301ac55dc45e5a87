// Puts a generated corpus into an installation's file, straight into the tables: an import of a hundred thousand would take an hour
// that says nothing about search. What search reads stands there as an import would leave it.
import type { Database } from '@/db/client'
import { post, postSection, revision } from '@/db/schema'
import { writeQuietly } from '@/db/transaction'
import { generateTexts, type GeneratedText } from './generate-texts'

/** Ids from here on belong to generated entries: number n is entry firstId + 2n, its answer one more. */
export const firstId = 1_000_000
export const idOf = (number: number): number => firstId + 2 * number

const rowsAWrite = 200
const createdAt = Date.UTC(2026, 0, 1)

/** Ids of kits by slug and of sections by `kit/code`. */
export interface Places { kits: ReadonlyMap<string, number>; sections: ReadonlyMap<string, number> }

export async function readPlaces({ reader }: Database): Promise<Places> {
  const rows = await reader.query.section.findMany({ columns: { id: true, code: true, kitId: true } })
  const kits = new Map((await reader.query.kit.findMany({ columns: { id: true, slug: true } })).map(({ id, slug }) => [slug, id] as const))
  const slugs = new Map([...kits].map(([slug, id]) => [id, slug] as const))
  return { kits, sections: new Map(rows.map(({ id, code, kitId }) => [`${slugs.get(kitId) ?? ''}/${code}`, id] as const)) }
}

/** Writes `count` entries. */
export async function fillDatabase(database: Database, count: number, seed: number): Promise<void> {
  const places = await readPlaces(database)
  let waiting: GeneratedText[] = []
  for (const text of generateTexts(count, seed)) {
    waiting.push(text)
    if (waiting.length < rowsAWrite && text.number < count - 1) continue
    await writeTexts(database, waiting, places)
    waiting = []
  }
}

/** Writes entries with their answers in one transaction. */
export async function writeTexts(database: Database, texts: readonly GeneratedText[], places: Places): Promise<void> {
  const answered = texts.flatMap((text) => (text.answer === null ? [] : [{ ...text, answer: text.answer }]))
  await writeQuietly(database, async (tx) => {
    const times = { createdAt, updatedAt: createdAt, currentRevision: 1 }
    await tx.insert(post).values(texts.map((t) => ({ id: idOf(t.number), kind: t.kind, stampState: t.stamped && t.kind === 'lesson' ? 'imported' as const : 'none' as const, ...times })))
    if (answered.length > 0) await tx.insert(post).values(answered.map((t) => ({ id: idOf(t.number) + 1, kind: 'answer' as const, parentId: idOf(t.number), stampState: t.stamped ? 'imported' as const : 'none' as const, ...times })))
    const none = { number: 1, sections: [], tasks: [], operations: [], hardware: [], plans: [], orderAdvice: [], contentHash: 'generated', createdAt }
    await tx.insert(revision).values([
      ...texts.map((t) => ({ ...none, postId: idOf(t.number), kitId: places.kits.get(t.kit) ?? null, sections: [t.section], operations: [t.operation], hardware: t.hardware, title: t.title, body: t.body })),
      ...answered.map((t) => ({ ...none, postId: idOf(t.number) + 1, kitId: null, title: '', body: t.answer })),
    ])
    await tx.insert(postSection).values(texts.flatMap((t) => {
      const sectionId = places.sections.get(`${t.kit}/${t.section}`)
      return sectionId === undefined ? [] : [{ postId: idOf(t.number), sectionId, position: 0 }]
    }))
  })
}
