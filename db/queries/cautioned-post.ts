// The only door through which a post's text leaves the database: always with its cautions, always with its evidence.
// A fixed number of queries, whatever the number of posts (pieces of 200).
import 'server-only'
import { asc, eq, sql } from 'drizzle-orm'
import type { ReaderOrTransaction } from '../client'
import { measurement, post, remark, revision, type MeasurementJson, type outcome, type postCaution, type rendering, type stamp } from '../schema'
import { oneOf } from './one-of'
import { listPlainTexts, listRenderings } from './renderings'

declare const cautioned: unique symbol
type Row<T extends { $inferSelect: object }> = T['$inferSelect']

export interface PersonName { id: number | null; name: string }
export interface SectionOfPost { code: string; title: string; jasc: string | null }

/** A post with its current text. The brand can only be given here, so no query can hand out text without cautions. */
export interface CautionedPost {
  readonly [cautioned]: true
  id: number
  kind: 'question' | 'lesson' | 'answer'
  parentId: number | null
  ref: string | null
  state: Row<typeof post>['state']
  stateReason: string | null
  stampState: Row<typeof post>['stampState']
  needsTwo: boolean
  createdAt: number
  updatedAt: number
  author: PersonName
  /** Everybody who wrote a revision. */
  authorIds: number[]
  /** The current revision, with its text. */
  current: Row<typeof revision>
  kit: { slug: string; name: string; maker: string } | null
  sections: SectionOfPost[]
  revisions: { number: number; author: PersonName; createdAt: number }[]
  cautions: Row<typeof postCaution>[]
  stamps: Row<typeof stamp>[]
  outcomes: { memberId: number; author: string; revision: number; result: Row<typeof outcome>['result']; note: string; createdAt: number }[]
  goingByThis: number
  remarks: { id: number; author: PersonName; body: string; createdAt: number }[]
  /** The rendered text without its marks; null while it is missing. */
  plain: string | null
  /** The HTML too; null while it is missing, and where it was not asked for. */
  rendering: Row<typeof rendering> | null
  /** Version of the parser that found `measurements`; 0 = none yet. */
  measuredBy: number
  /** Of the plain text, in its order; none where only the plain text was asked for. */
  measurements: MeasurementJson[]
}

/** The one predicate of what may stand as advice in a list. */
export const isVisible = eq(post.state, 'visible')

/** Key of a revision's row in `rendering`. */
export const renderingKey = (postId: number, number: number) => `post:${postId}:${number}`
export const remarkRenderingKey = (remarkId: number) => `remark:${remarkId}`

/** HTML is several times the text, and measurements half as much again: what only searches or lists posts asks for the plain text alone. */
type Wanted = 'html' | 'plain'

/** Posts by id with everything that hangs on them, in the order of `ids`; unknown ids are left out. */
export async function listCautionedPosts(reader: ReaderOrTransaction, ids: readonly number[], wanted: Wanted = 'html'): Promise<CautionedPost[]> {
  const found = new Map<number, CautionedPost>()
  // In pieces, because a statement holds the event loop until it is read.
  for (let start = 0; start < ids.length; start += 200) await loadInto(found, reader, ids.slice(start, start + 200), wanted)
  return ids.flatMap((id) => found.get(id) ?? [])
}

/** One post, or null. */
export async function getCautionedPost(reader: ReaderOrTransaction, id: number): Promise<CautionedPost | null> {
  return (await listCautionedPosts(reader, [id]))[0] ?? null
}

/** Ids of a question's answers, oldest first, whatever their state. */
export async function listAnswerIds(reader: ReaderOrTransaction, questionIds: readonly number[]): Promise<{ id: number; parentId: number | null }[]> {
  if (questionIds.length === 0) return []
  return reader.select({ id: post.id, parentId: post.parentId }).from(post).where(oneOf(post.parentId, questionIds)).orderBy(asc(post.id))
}

/** A name, the plain name kept from an import, or neither: then the account is gone. */
const person = (id: number | null, account: { name: string } | null, plainName: string | null): PersonName => ({ id, name: account?.name ?? plainName ?? 'former member' })

/** As SQLite has it. */
const noLimit = -1

/** One statement for everything but the renderings: all of one moment, and built once a reader, because building it costs as much as running it. */
function prepareLoad(reader: ReaderOrTransaction) {
  const name = { columns: { name: true } } as const
  return reader.query.post.findMany({
    where: oneOf(post.id, sql.placeholder('ids')),
    with: {
      author: name, current: { with: { kit: { columns: { slug: true, name: true, maker: true } } } },
      placed: { columns: { position: true }, with: { section: { columns: { code: true, title: true, jasc: true } } } },
      revisions: { columns: { number: true, authorId: true, authorName: true, createdAt: true }, with: { author: name } },
      cautions: true, stamps: true, outcomes: { with: { member: name } }, reliances: { columns: { memberId: true } },
      remarks: { columns: { id: true, authorId: true, authorName: true, body: true, createdAt: true }, where: eq(remark.state, 'visible'), with: { author: name } },
      measurements: { columns: { found: true }, orderBy: asc(measurement.position), limit: sql.placeholder('mostMeasurements') },
    },
  }).prepare()
}

type Loaded = Awaited<ReturnType<ReturnType<typeof prepareLoad>['execute']>>[number]
const prepared = new WeakMap<ReaderOrTransaction, ReturnType<typeof prepareLoad>>()

function preparedLoad(reader: ReaderOrTransaction): ReturnType<typeof prepareLoad> {
  const known = prepared.get(reader) ?? prepareLoad(reader)
  prepared.set(reader, known)
  return known
}

async function loadInto(found: Map<number, CautionedPost>, reader: ReaderOrTransaction, ids: readonly number[], wanted: Wanted): Promise<void> {
  if (ids.length === 0) return
  const loaded = await preparedLoad(reader).execute({ ids: JSON.stringify(ids), mostMeasurements: wanted === 'html' ? noLimit : 0 })
  // A rendering belongs to one revision and never changes, so it may be read a moment later.
  const keys = loaded.map((row) => renderingKey(row.id, row.currentRevision))
  const renderings = wanted === 'html' ? await listRenderings(reader, keys) : []
  const whole = new Map(renderings.map((r) => [r.key, r]))
  const plain = new Map((wanted === 'html' ? renderings : await listPlainTexts(reader, keys)).map((r) => [r.key, r.plain]))
  for (const row of loaded) {
    const key = renderingKey(row.id, row.currentRevision)
    found.set(row.id, caution(row, plain.get(key) ?? null, whole.get(key) ?? null))
  }
}

/** Gives the brand: the one place that may. */
function caution(row: Loaded, plain: string | null, kept: Row<typeof rendering> | null): CautionedPost {
  const { author, authorName, current: { kit: ofKit, ...current }, placed, revisions, stamps, outcomes, reliances, remarks, cautions, measurements, ...own } = row
  const { id, kind, parentId, ref, state, stateReason, stampState, needsTwo, createdAt, updatedAt, measuredBy } = own
  const history = [...revisions].sort((a, b) => a.number - b.number)
  return {
    id, kind, parentId, ref, state, stateReason, stampState, needsTwo, createdAt, updatedAt, author: person(row.authorId, author, authorName),
    authorIds: [...new Set(history.flatMap((r) => r.authorId ?? []))],
    current, kit: ofKit, sections: [...placed].sort((a, b) => a.position - b.position).map((p) => p.section),
    revisions: history.map((r) => ({ number: r.number, author: person(r.authorId, r.author, r.authorName), createdAt: r.createdAt })),
    cautions, stamps: [...stamps].sort(byId),
    outcomes: [...outcomes].sort((a, b) => a.createdAt - b.createdAt).map(({ member: teller, memberId, revision: number, result, note, createdAt: at }) => ({ memberId, author: teller.name, revision: number, result, note, createdAt: at })),
    goingByThis: reliances.length,
    remarks: [...remarks].sort(byId).map((r) => ({ id: r.id, author: person(r.authorId, r.author, r.authorName), body: r.body, createdAt: r.createdAt })),
    plain, rendering: kept, measuredBy, measurements: measurements.map((m) => m.found),
  } as unknown as CautionedPost
}

const byId = (a: { id: number }, b: { id: number }) => a.id - b.id

/** A post with every revision's text: history leaves with its cautions like everything else. */
export async function getCautionedHistory(reader: ReaderOrTransaction, id: number): Promise<{ found: CautionedPost; history: Row<typeof revision>[] } | null> {
  const found = await getCautionedPost(reader, id)
  if (!found) return null
  return { found, history: await reader.select().from(revision).where(eq(revision.postId, id)).orderBy(asc(revision.number)) }
}
