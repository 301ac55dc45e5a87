// One demo entry with all that happened to it, in the order of its days, in one transaction.
import 'server-only'
import { and, eq } from 'drizzle-orm'
import type { Database, Transaction } from '@/db/client'
import { insertPost, insertRevision, saveRendering } from '@/db/mutations/posts'
import { getCautionedPost, remarkRenderingKey } from '@/db/queries/cautioned-post'
import { outcome, postCaution, reliance, remark, stamp } from '@/db/schema'
import { write } from '@/db/transaction'
import type { DemoAnswer, DemoEntry, DemoText } from '@/lib/content/demo-content'
import { textFields } from '@/lib/domain/entries/entry-text'
import { revisionNumber } from '@/lib/domain/entries/revision-letter'
import type { Renderer } from '@/lib/render/renderer'
import { acknowledgeCautions, cautionsOfAnswer, cautionsOfEntry } from '@/lib/services/posts/attach-cautions'
import { contentHash } from '@/lib/services/posts/content-hash'
import { judgePost } from '@/lib/services/posts/judge-post'
import { placeEntry } from '@/lib/services/posts/place-entry'
import { rejudgeAnswers } from '@/lib/services/posts/rejudge-answers'
import { renderText, type Rendered } from '@/lib/services/posts/render-text'
import { saveText } from '@/lib/services/posts/save-text'

export type SeedPeople = Map<string, { id: number; mark: string | null }>
type At = (daysAgo: number) => number
interface Event { day: number; run: (tx: Transaction) => Promise<void> }

/** Writes the entry. Throws, naming it, when the scenario breaks a law of the data. */
export async function seedEntry(database: Database, renderer: Renderer, people: SeedPeople, entry: DemoEntry, at: At): Promise<void> {
  const rendered = await renderAll(renderer, entry)
  try {
    await write(database, { actorId: person(people, entry.author).id, at: at(entry.day) }, async (tx, record) => {
      const posts = new Map<string, number>()
      const events: Event[] = [...entryEvents(entry, people, at, rendered, posts), ...(entry.answers ?? []).flatMap((a) => answerEvents(entry, a, people, at, rendered, posts))]
      // Equal days keep the order of the file: a revision before the stamp on it.
      for (const event of events.map((e, i) => ({ ...e, i })).sort((a, b) => b.day - a.day || a.i - b.i)) await event.run(tx)
      for (const id of posts.values()) await judgePost(tx, id)
      record('demo.seed', `post:${posts.get(entry.ref) ?? 0}`)
    })
  } catch (error) {
    throw new Error(`Demo entry ${entry.ref}`, { cause: error })
  }
}

function entryEvents(entry: DemoEntry, people: SeedPeople, at: At, rendered: Map<string, Rendered>, posts: Map<string, number>): Event[] {
  const versions = entryVersions(entry)
  return [
    ...versions.map((version, i): Event => ({
      day: version.day,
      run: async (tx) => {
        const author = person(people, entry.author)
        const place = await placeEntry(tx, { kit: entry.kit, operations: [], ...version.text })
        const { title, tasks, hardware, parts } = version.text
        const judged = { title, tasks, hardware, parts, plans: version.text.plans ?? [], orderAdvice: version.text.orderAdvice ?? [], kitId: place.kitId, sections: place.sections.map((s) => s.code), operations: place.operations, body: '' }
        const postId = posts.get(entry.ref) ?? (await insertPost(tx, { kind: entry.kind, authorId: author.id, ref: entry.ref, createdAt: at(version.day) }))
        posts.set(entry.ref, postId)
        await insertRevision(tx, { postId, number: i + 1, authorId: author.id, ...judged, contentHash: contentHash(judged), createdAt: at(version.day) },
          { sectionIds: place.sections.map((s) => s.id), taskIds: place.taskIds, operationIds: place.operationIds, hardware })
        await saveText(tx, postId, i + 1, need(rendered, `${entry.ref}:${i}`))
        const required = cautionsOfEntry(entry.kind, judged, place.sections.flatMap((s) => s.jasc ?? []))
        await acknowledgeCautions(tx, postId, required, await allCodes(tx, postId, required), at(version.day))
        if (i > 0) await rejudgeAnswers(tx, postId, at(version.day))
      },
    })),
    ...markEvents(entry.ref, entry, people, at, rendered, posts),
  ]
}

function answerEvents(entry: DemoEntry, answer: DemoAnswer, people: SeedPeople, at: At, rendered: Map<string, Rendered>, posts: Map<string, number>): Event[] {
  return [
    ...answerVersions(answer).map((version, i): Event => ({
      day: version.day,
      run: async (tx) => {
        const author = person(people, answer.author)
        const parentId = need(posts, entry.ref)
        const judged = { title: '', kitId: null, sections: [], tasks: [], operations: [], hardware: [], plans: [], orderAdvice: [], parts: null, body: version.body, makerReplyScope: answer.makerReply ?? null }
        const postId = posts.get(answer.ref) ?? (await insertPost(tx, { kind: 'answer', parentId, authorId: author.id, ref: answer.ref, createdAt: at(version.day) }))
        posts.set(answer.ref, postId)
        await insertRevision(tx, { postId, number: i + 1, authorId: author.id, ...judged, contentHash: contentHash(judged), createdAt: at(version.day) }, null)
        await saveText(tx, postId, i + 1, need(rendered, `${answer.ref}:${i}`))
        const question = await getCautionedPost(tx, parentId)
        if (!question) throw new Error('The question is missing')
        const required = cautionsOfAnswer(question, version.body)
        await acknowledgeCautions(tx, postId, required, await allCodes(tx, postId, required), at(version.day))
      },
    })),
    ...markEvents(answer.ref, answer, people, at, rendered, posts),
  ]
}

function markEvents(ref: string, post: DemoEntry | DemoAnswer, people: SeedPeople, at: At, rendered: Map<string, Rendered>, posts: Map<string, number>): Event[] {
  const id = () => need(posts, ref)
  const number = (letter: string) => revisionNumber(letter) ?? 0
  return [
    ...(post.addedCautions ?? []).map((c): Event => ({ day: c.day, run: async (tx) => {
      await tx.insert(postCaution).values({ postId: id(), code: c.code, origin: 'moderator', because: c.because, createdAt: at(c.day), addedBy: person(people, c.by).id }).onConflictDoNothing()
      // Answers that stand already take their question's, as when a moderator adds one by hand.
      await rejudgeAnswers(tx, id(), at(c.day))
    } })),
    ...(post.waivedCautions ?? []).map((c): Event => ({ day: c.day, run: async (tx) => {
      const waived = await tx.update(postCaution).set({ waivedAt: at(c.day), waivedBy: person(people, c.by).id, waivedReason: c.reason }).where(and(eq(postCaution.postId, id()), eq(postCaution.code, c.code))).returning()
      if (waived.length === 0) throw new Error(`No caution ${c.code} to waive`)
    } })),
    ...(post.stamps ?? []).flatMap((s) => stampEvents(s, id, number, people, at)),
    ...(post.outcomes ?? []).map((o): Event => ({ day: o.day, run: async (tx) => {
      await tx.insert(outcome).values({ postId: id(), memberId: person(people, o.by).id, revision: number(o.revision), result: o.result, note: o.note, createdAt: at(o.day) })
    } })),
    ...(post.goingByThis ?? []).map((r): Event => ({ day: r.day, run: async (tx) => {
      await tx.insert(reliance).values({ postId: id(), memberId: person(people, r.by).id, revision: number(r.revision), createdAt: at(r.day) })
    } })),
    ...(post.remarks ?? []).map((r, i): Event => ({ day: r.day, run: async (tx) => {
      const [row] = await tx.insert(remark).values({ postId: id(), authorId: person(people, r.by).id, body: r.body, createdAt: at(r.day) }).returning({ id: remark.id })
      if (row) await saveRendering(tx, { key: remarkRenderingKey(row.id), ...need(rendered, `${ref}:remark:${i}`) })
    } })),
  ]
}

function stampEvents(s: NonNullable<DemoEntry['stamps']>[number], postId: () => number, number: (letter: string) => number, people: SeedPeople, at: At): Event[] {
  const mentor = person(people, s.by)
  let stampId = 0
  const press: Event = { day: s.day, run: async (tx) => {
    const found = await getCautionedPost(tx, postId())
    const question = found?.parentId == null ? null : await getCautionedPost(tx, found.parentId)
    const [row] = await tx.insert(stamp).values({
      postId: postId(), revision: number(s.revision), questionRevision: question?.current.number ?? 0, mentorId: mentor.id, mark: mentor.mark ?? '', basis: s.basis,
      reference: s.reference, plansRevision: s.plansRevision ?? null, scope: s.scope ?? null, createdAt: at(s.day),
    }).returning({ id: stamp.id })
    stampId = row?.id ?? 0
  } }
  const { withdrawn } = s
  if (!withdrawn) return [press]
  return [press, { day: withdrawn.day, run: async (tx) => {
    await tx.update(stamp).set({ withdrawnAt: at(withdrawn.day), withdrawnReason: withdrawn.reason }).where(eq(stamp.id, stampId))
  } }]
}

/** What its author acknowledges: all that is required, and all that stands unacknowledged. */
async function allCodes(tx: Transaction, postId: number, required: readonly { code: string }[]): Promise<string[]> {
  const rows = await tx.select({ code: postCaution.code }).from(postCaution).where(eq(postCaution.postId, postId))
  return [...required.map((c) => c.code), ...rows.map((r) => r.code)]
}

/** Each version with its whole text: a revision names only what it changes, part by part. */
function entryVersions(entry: DemoEntry): { day: number; text: DemoText }[] {
  let text: DemoText = { title: entry.title, sections: entry.sections, tasks: entry.tasks, operations: entry.operations ?? [], hardware: entry.hardware, plans: entry.plans ?? [], parts: entry.parts, orderAdvice: entry.orderAdvice ?? [] }
  const versions = [{ day: entry.day, text }]
  for (const { day, changes } of entry.revisions ?? []) {
    text = { ...text, ...changes, parts: { ...text.parts, ...changes.parts } }
    versions.push({ day, text })
  }
  return versions.map((v) => ({ ...v, text: { ...v.text, parts: Object.fromEntries(Object.entries(v.text.parts).filter(([, value]) => value !== '')) } }))
}

const answerVersions = (answer: DemoAnswer) => [{ day: answer.day, body: answer.body }, ...(answer.revisions ?? [])]

async function renderAll(renderer: Renderer, entry: DemoEntry): Promise<Map<string, Rendered>> {
  const rendered = new Map<string, Rendered>()
  for (const [i, v] of entryVersions(entry).entries()) rendered.set(`${entry.ref}:${i}`, await renderText(renderer, textFields(entry.kind, v.text.parts, '')))
  for (const post of [entry, ...(entry.answers ?? [])]) {
    if ('body' in post) for (const [i, v] of answerVersions(post).entries()) rendered.set(`${post.ref}:${i}`, await renderText(renderer, [{ name: 'body', text: v.body }]))
    for (const [i, r] of (post.remarks ?? []).entries()) rendered.set(`${post.ref}:remark:${i}`, await renderText(renderer, [{ name: 'body', text: r.body }]))
  }
  return rendered
}

function person(people: SeedPeople, key: string) {
  return need(people, key)
}

function need<V>(map: ReadonlyMap<string, V>, key: string): V {
  const value = map.get(key)
  if (value === undefined) throw new Error(`Nothing is known of ${key}`)
  return value
}
