// What a steward keeps of the plans, and what a bulletin does: stamps, the desk, search, and word to those who go by it.
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { eq } from 'drizzle-orm'
import { listClosingItems, listHardwareItems, listPlanSteps } from '@/db/queries/plans'
import { closingItem, section } from '@/db/schema'
import { contextFor } from '@/lib/context'
import type { NoticeList } from '@/lib/schemas/notices'
import { newBulletinSchema, type NewBulletin } from '@/lib/schemas/plans'
import type { Answer, Entry } from '@/lib/schemas/post'
import type { SearchResult } from '@/lib/schemas/search'
import { getDesk } from '@/lib/services/desk/get-desk'
import { enterBulletin } from '@/lib/services/plans/enter-bulletin'
import { endClosingItem, keepClosingItems } from '@/lib/services/plans/keep-closing-items'
import { keepHardware } from '@/lib/services/plans/keep-hardware'
import { keepPlanSteps } from '@/lib/services/plans/keep-plan-steps'
import { readPlaces } from '@/lib/services/plans/read-places'
import { api } from '../support/api'
import { openTestRuntime, type TestRuntime } from '../support/database'
import { aKit, aMember, aMentor, anAnswer, anEntry, type Somebody } from '../support/factories'

let runtime: TestRuntime
let steward: Somebody
beforeAll(async () => {
  runtime = await openTestRuntime()
  steward = await aMember({ role: 'steward' })
})
afterAll(() => runtime.close())

let made = 0
const aPage = () => `Q${++made}-1`
const bulletin = (over: Partial<NewBulletin> = {}): NewBulletin => ({ number: `SB-${++made}`, issuedOn: '2026-11-16', serials: 'all', summary: 'The hole is one size larger.', steps: [{ page: aPage(), step: '3', revision: 'D' }], ...over })
const enter = async (input: NewBulletin, kit = 'whimbrel-2') => enterBulletin(await steward.context(), kit, input)
const press = (by: Somebody, postId: number, over: object = {}) => api('POST', `/api/posts/${postId}/stamps`, { token: by.token, body: { revision: 'A', basis: 'own-build', reference: 'Mine, 2020', ...over } })
const goBy = (by: Somebody, postId: number) => api('PUT', `/api/posts/${postId}/reliance`, { token: by.token, body: {} })
const waiting = async (by: Somebody) => (await api<NoticeList>('GET', '/api/notices', { token: by.token })).body.items
const answerOf = async (questionId: number): Promise<Answer> => (await api<Entry>('GET', `/api/entries/${questionId}`)).body.answers[0]!

/** A question about a step of its own with a stamped answer and somebody who goes by it. */
async function aStampedAnswer({ needsTwo = false } = {}) {
  const page = aPage()
  const question = await anEntry({ plans: [{ page, step: '3', revision: 'C' }], ...(needsTwo ? { sections: ['W-3'] } : {}) })
  const [answer, first, second, follower] = [await anAnswer({ question }), await aMentor(), await aMentor(), await aMember()]
  await press(first, answer.id, { basis: 'plans', reference: `${page} step 3`, plansRevision: 'C' })
  if (needsTwo) await press(second, answer.id)
  await goBy(follower, answer.id)
  expect((await answerOf(question.id)).stamp).toBe('stamped')
  return { page, question, answer, first, second, follower }
}

describe('a bulletin', () => {
  it('makes stamps from before it plans changed until a mentor looks again, and says which bulletin everywhere', async () => {
    const { page, question, answer, first } = await aStampedAnswer()
    const { number } = await enterAt(page)
    const changed = await answerOf(question.id)
    expect(changed).toMatchObject({ stamp: 'plans-changed', missing: 'first', planChanges: [{ bulletin: number, page, step: '3', revision: 'D' }], stamps: [{ live: false, bulletin: number }] })
    const found = (await api<SearchResult>('GET', `/api/search?q=${encodeURIComponent(question.title)}`)).body.results.find((h) => h.id === question.id)
    expect(found).toMatchObject({ stamp: 'plans-changed', planChanges: [{ bulletin: number }], stamps: [{ bulletin: number }] })
    expect((await api<{ items: Entry[] }>('GET', '/api/entries?stamped=1&limit=100')).body.items.map((e) => e.id)).not.toContain(question.id)
    // It hangs before the mentor who pressed the old stamp too, and that mentor may renew it.
    const hangs = async (mentor: Somebody) => (await getDesk(await mentor.context(), { open: answer.id })).tags.find((t) => t.postId === answer.id)?.reason
    expect([await hangs(first), await hangs(await aMentor())]).toEqual(['plans-changed', 'plans-changed'])
    expect((await getDesk(await first.context(), { open: answer.id })).open?.mayStamp).toBe(true)
    expect((await press(first, answer.id, { basis: 'plans', reference: `${page} step 3`, plansRevision: 'D' })).status).toBe(201)
    const again = await answerOf(question.id)
    expect(again).toMatchObject({ stamp: 'stamped', missing: null, planChanges: [] })
    expect(again.stamps.map((s) => [s.live, s.withdrawn?.reason])).toEqual([[false, `Looked at again after bulletin ${number}.`], [true, undefined]])
    expect(await hangs(first)).toBeUndefined()
  })

  it('on a critical system asks for two new stamps, and a second bulletin marks it once more', async () => {
    const { page, question, answer, first, second, follower } = await aStampedAnswer({ needsTwo: true })
    const before = await enterAt(page)
    await press(first, answer.id, { basis: 'plans', reference: `${page} step 3`, plansRevision: 'D' })
    expect(await answerOf(question.id)).toMatchObject({ stamp: 'one-of-two', missing: 'second' })
    await press(second, answer.id)
    expect((await answerOf(question.id)).stamp).toBe('stamped')
    const after = await enterAt(page, { steps: [{ page: ` ${page.toLowerCase()} `, revision: 'E' }] })
    expect(await answerOf(question.id)).toMatchObject({ stamp: 'plans-changed', planChanges: [{ bulletin: after.number, revision: 'E' }] })
    expect((await waiting(follower)).map((n) => n.bulletin?.number)).toEqual([after.number, before.number])
  })

  it('finds a post by its plans stamp alone, and leaves other steps, other pages, other kits and later stamps in peace', async () => {
    const page = aPage()
    const [byStamp, otherStep] = [await anAnswer(), await anAnswer({ question: await anEntry({ plans: [{ page, step: '4' }] }) })]
    const kit = await aKit()
    const otherKit = await anAnswer({ question: await anEntry({ kit: kit.slug, sections: [kit.section], plans: [{ page, step: '3' }] }) })
    const mentor = await aMentor()
    await press(mentor, byStamp.id, { basis: 'plans', reference: `${page} steps 2 to 5, read again`, plansRevision: 'C' })
    for (const a of [otherStep, otherKit]) await press(mentor, a.id)
    expect(await enter(bulletin({ steps: [{ page, step: '3' }] }))).toMatchObject({ posts: 1, told: 0 })
    expect(await Promise.all([byStamp, otherStep, otherKit].map(async (a) => (await answerOf(a.questionId)).stamp))).toEqual(['plans-changed', 'stamped', 'stamped'])
    // Written after the bulletin: nothing to say.
    const later = await anAnswer({ question: await anEntry({ plans: [{ page, step: '3' }] }) })
    await press(mentor, later.id)
    expect(await answerOf(later.questionId)).toMatchObject({ stamp: 'stamped', planChanges: [] })
  })

  it('is entered by stewards only, once a number, with every page readable', async () => {
    const input = bulletin()
    for (const role of ['member', 'moderator'] as const) await expect((async () => enterBulletin(await (await aMember({ role })).context(), 'whimbrel-2', input))()).rejects.toMatchObject({ code: 'forbidden' })
    await expect((async () => enterBulletin(await contextFor(null), 'whimbrel-2', input))()).rejects.toMatchObject({ code: 'unauthenticated' })
    await expect(enter(input, 'albatross-9')).rejects.toMatchObject({ code: 'not-found' })
    await enter(input)
    await expect(enter(input)).rejects.toMatchObject({ code: 'conflict', errors: [{ path: 'number' }] })
    expect(() => readPlaces('W3-2, 6, D\n, 7')).toThrow(/Line 2: page: Write the page/)
    expect(readPlaces('W3-2,,D\nW3-4; 1')).toEqual([{ page: 'W3-2', revision: 'D' }, { page: 'W3-4; 1' }])
    for (const bad of [{ issuedOn: '2026-02-30' }, { issuedOn: 'yesterday' }, { steps: [] }, { number: ' ' }, { summary: 'x'.repeat(301) }]) expect(newBulletinSchema.safeParse({ ...input, ...bad }).success).toBe(false)
  })

  const enterAt = async (page: string, over: Partial<NewBulletin> = {}) => {
    const input = bulletin({ steps: [{ page, step: '3', revision: 'D' }], ...over })
    await enter(input)
    return input
  }
})

describe('what waits', () => {
  it('is told once to each who goes by it, is theirs alone, and is closed once', async () => {
    const { page, question, answer, follower } = await aStampedAnswer()
    const other = await anAnswer({ question: await anEntry({ plans: [{ page, step: '3' }] }) })
    await goBy(follower, other.id)
    const input = bulletin({ steps: [{ page, step: '3', revision: 'D' }, { page }] })
    expect(await enter(input)).toMatchObject({ posts: 4, told: 1 })
    const items = await waiting(follower)
    expect(items.map((n) => n.post.id).sort()).toEqual([answer.id, other.id].sort())
    const mine = items.find((n) => n.post.id === answer.id)!
    expect(mine).toMatchObject({ kind: 'bulletin', post: { title: question.title, url: `/entries/${question.id}#post-${answer.id}` }, bulletin: { number: input.number, summary: input.summary, kit: 'whimbrel-2' } })
    expect(await waiting(await aMember())).toEqual([])
    expect((await api('GET', '/api/notices')).status).toBe(401)
    const close = (by: Somebody | null, id: number | string = mine.id, body: unknown = {}) => api('POST', `/api/notices/${id}/close`, { ...(by ? { token: by.token } : {}), body })
    expect([(await close(steward)).status, (await close(null)).status, (await close(follower, 'x')).status, (await close(follower, 999_999)).status, (await close(follower, mine.id, { all: true })).status]).toEqual([404, 401, 404, 404, 422])
    expect((await close(follower)).body).toMatchObject({ id: mine.id, closedAt: expect.any(String) })
    expect((await close(follower)).status).toBe(200)
    expect((await waiting(follower)).map((n) => n.post.id)).toEqual([other.id])
  })

  it('comes in pages, and refuses a cursor that is none', async () => {
    const follower = await aMember()
    const page = aPage()
    for (let i = 0; i < 3; i++) await goBy(follower, (await anAnswer({ question: await anEntry({ plans: [{ page }] }) })).id)
    await enter(bulletin({ steps: [{ page }] }))
    const list = async (query: string) => (await api<NoticeList>('GET', `/api/notices?${query}`, { token: follower.token })).body
    const first = await list('limit=2')
    const rest = await list(`limit=2&cursor=${first.nextCursor}`)
    expect([first.items.length, rest.items.length, rest.nextCursor, new Set([...first.items, ...rest.items].map((n) => n.id)).size]).toEqual([2, 1, null, 3])
    for (const query of ['limit=0', 'limit=101', 'cursor=-1', 'cursor=abc', 'all=1']) expect((await api('GET', `/api/notices?${query}`, { token: follower.token })).status, query).toBe(422)
  })
})

describe('the lists of a section', () => {
  const place = async () => {
    const kit = await aKit()
    const [row] = await runtime.database.reader.select({ id: section.id }).from(section).where(eq(section.code, kit.section)).orderBy(section.id).then((rows) => rows.slice(-1))
    return { at: { kit: kit.slug, section: kit.section }, id: row!.id }
  }

  it('plan steps: added in order, known ones kept in place with the new revision, replaced as a whole', async () => {
    const { at, id } = await place()
    const keep = async (mode: 'add' | 'replace', lines: string) => keepPlanSteps(await steward.context(), at, { mode, lines })
    const now = async () => (await listPlanSteps(runtime.database.reader, id)).map((s) => [s.page, s.step, s.revision, s.task])
    expect(await keep('add', 'S1,1,A,rivet\nS1,2,A,no-such-task\nS1,3,A,\nS1,1,B,rivet')).toMatchObject({ kept: 2, bad: [{ line: 2, message: 'task: There is no task no-such-task.' }, { line: 4 }] })
    await keep('add', 'S1,1,C,deburr-edges\nS1,4,C,')
    expect(await now()).toEqual([['S1', '1', 'C', 'deburr-edges'], ['S1', '3', 'A', null], ['S1', '4', 'C', null]])
    expect(await keep('replace', ',nothing')).toMatchObject({ kept: 0 })
    expect(await now()).toHaveLength(3)
    await keep('replace', 'step,page\n4,S1\n1,S1')
    expect(await now()).toEqual([['S1', '4', '', null], ['S1', '1', '', null]])
  })

  it('hardware: counts per side, in the order of the lines', async () => {
    const { at, id } = await place()
    const keep = async (mode: 'add' | 'replace', lines: string) => keepHardware(await steward.context(), at, { mode, lines })
    await keep('add', 'AN3-5A,,6,6,bracket\nAN960-10,,12,12,\nAN3-6A,,-1,2,')
    await keep('add', 'AN470AD4-4,,62,60,"spar, ribs"')
    expect((await listHardwareItems(runtime.database.reader, id)).map((h) => [h.designation, h.left, h.right, h.place])).toEqual([['AN3-5A', 6, 6, 'bracket'], ['AN960-10', 12, 12, ''], ['AN470AD4-4', 62, 60, 'spar, ribs']])
    await keep('replace', 'AN3-5A,,1,1,')
    expect(await listHardwareItems(runtime.database.reader, id)).toHaveLength(1)
  })

  it('closing items are ended, never deleted, and one that stays keeps its id', async () => {
    const { at, id } = await place()
    const keep = async (mode: 'add' | 'replace', lines: string) => keepClosingItems(await steward.context(), at, { mode, lines })
    await keep('add', 'Chips blown out,builder,\nCotter pins bent,Plans,S1 step 4\nPaint across nuts,nobody,')
    const [chips, pins] = await listClosingItems(runtime.database.reader, id)
    await keep('replace', 'Paint across nuts,inspector,\nCotter pins bent,plans,S1 step 5')
    const standing = await listClosingItems(runtime.database.reader, id)
    expect(standing.map((c) => [c.text, c.origin, c.reference])).toEqual([['Paint across nuts', 'inspector', ''], ['Cotter pins bent', 'plans', 'S1 step 5']])
    expect(standing[1]?.id).toBe(pins?.id)
    const [ended] = await runtime.database.reader.select().from(closingItem).where(eq(closingItem.id, chips!.id))
    expect(ended?.endedAt).not.toBeNull()
    await endClosingItem(await steward.context(), pins!.id)
    await expect((async () => endClosingItem(await steward.context(), pins!.id))()).rejects.toMatchObject({ code: 'conflict' })
    await expect((async () => endClosingItem(await steward.context(), 999_999))()).rejects.toMatchObject({ code: 'not-found' })
    expect((await listClosingItems(runtime.database.reader, id)).map((c) => c.text)).toEqual(['Paint across nuts'])
  })

  it('are kept by stewards only, in a section that is there', async () => {
    const { at } = await place()
    const moderator = await aMember({ role: 'moderator' })
    for (const keep of [keepPlanSteps, keepHardware, keepClosingItems]) {
      await expect((async () => keep(await moderator.context(), at, { mode: 'add', lines: 'a,1' }))()).rejects.toMatchObject({ code: 'forbidden' })
      await expect((async () => keep(await contextFor(null), at, { mode: 'add', lines: 'a,1' }))()).rejects.toMatchObject({ code: 'unauthenticated' })
      await expect((async () => keep(await steward.context(), { ...at, section: 'Z-9' }, { mode: 'add', lines: 'a,1' }))()).rejects.toMatchObject({ code: 'not-found' })
    }
  })
})
