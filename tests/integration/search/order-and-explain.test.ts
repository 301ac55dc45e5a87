// Through the API: order advice on the order that was asked for, a step of the plans, and why hits stand where they stand.
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { eq } from 'drizzle-orm'
import { post } from '@/db/schema'
import { write } from '@/db/transaction'
import type { Hit, SearchResult } from '@/lib/schemas/search'
import type { SearchExplanation } from '@/lib/schemas/search-explanation'
import { api } from '../../support/api'
import { openTestRuntime, type TestRuntime } from '../../support/database'
import { aMember, aMentor, anAnswer, anEntry, critical } from '../../support/factories'

let runtime: TestRuntime
beforeAll(async () => { runtime = await openTestRuntime() })
afterAll(() => runtime.close())

const look = async (q: string) => (await api<SearchResult>('GET', `/api/search?${new URLSearchParams({ q })}`)).body.results
const similarTo = async (title: string) => (await api<{ results: Hit[] }>('POST', '/api/similar', { body: { title } })).body.results.map((hit) => hit.id)
const inLesson = (happened: string) => ({ kind: 'lesson' as const, parts: { happened } })

/** As a moderator's act leaves it. */
async function setState(id: number, state: 'visible' | 'hidden' | 'merged' | 'withdrawn'): Promise<void> {
  await write(runtime.database, { actorId: null, at: Date.now() }, async (tx, record) => {
    await tx.update(post).set({ state, stateReason: 'test' }).where(eq(post.id, id))
    record('post.test', `post:${id}`)
  })
  await runtime.search.catchUp()
}

describe('a question of order', () => {
  it('is answered first by the order advice about that pair, both ways round, each with its own words and cautions', async () => {
    const told = 'We had to deburr every hole and to mark the sides of the tank baffle.'
    const plain = await anEntry({ ...inLesson(told), title: 'Marks on the baffle' })
    const one = await anEntry({ ...inLesson(told), ...critical, title: 'Sides of the baffle', orderAdvice: [{ before: 'deburr-holes', after: 'mark-sides' }] })
    const other = await anEntry({ ...inLesson(told), title: 'Holes of the baffle', orderAdvice: [{ before: 'mark-sides', after: 'deburr-holes' }] })
    const hits = await look('baffle: deburr or mark first?')
    expect(hits.slice(0, 2).map((hit) => hit.id).sort()).toEqual([one.id, other.id])
    expect(hits.find((hit) => hit.id === one.id)).toMatchObject({ orderAdvice: [{ postId: one.id, before: 'deburr holes', after: 'mark left and right' }] })
    expect(hits.find((hit) => hit.id === one.id)?.cautions.length).toBeGreaterThan(0)
    expect(hits.find((hit) => hit.id === other.id)).toMatchObject({ orderAdvice: [{ before: 'mark left and right', after: 'deburr holes' }] })
    expect(hits.find((hit) => hit.id === plain.id)).not.toHaveProperty('orderAdvice')
    expect((await look('baffle deburr mark')).every((hit) => hit.orderAdvice === undefined)).toBe(true)
  })

  it('advice that was taken out by an edit is gone', async () => {
    const lesson = await anEntry({ ...inLesson('Trunnion rivets and trunnion edges.'), title: 'Trunnion', orderAdvice: [{ before: 'deburr-edges', after: 'rivet' }] })
    expect((await look('trunnion: rivet or deburr first'))[0]).toMatchObject({ id: lesson.id, orderAdvice: [{ before: 'deburr edges' }] })
    expect((await api('PATCH', `/api/entries/${lesson.id}`, { token: lesson.by.token, body: { revision: 'A', orderAdvice: [], acknowledgedCautions: lesson.cautions.map((c) => c.code) } })).status).toBe(200)
    expect((await look('trunnion: rivet or deburr first'))[0]).not.toHaveProperty('orderAdvice')
  })
})

describe('a step of the plans', () => {
  it('brings what was written about it, then about its page', async () => {
    const other = await anEntry({ title: 'A gusset was short', plans: [{ page: 'Q7-2', step: '5' }] })
    const exact = await anEntry({ title: 'Where the gusset goes', plans: [{ page: 'Q7-2', step: '6' }] })
    for (const text of ['Q7-2 step 6', 'page Q7-2, step 6', 'Q7-2/6']) expect((await look(text)).map((hit) => hit.id), text).toEqual([exact.id, other.id])
  })
})

describe('what must not be found', () => {
  it.each(['hidden', 'merged', 'withdrawn'] as const)('an entry or answer that is %s is neither found nor like anything, nor does its order advice count, and is found again once restored', async (state) => {
    const word = `zeugma${state}`
    const entry = await anEntry({ ...inLesson(`The ${word} bracket.`), title: `Bracket ${word}`, orderAdvice: [{ before: 'deburr-holes', after: 'rivet' }] })
    const answer = await anAnswer({ body: `Shim the ${word}x bracket.` })
    expect((await look(word)).map((hit) => hit.id)).toEqual([entry.id])
    expect((await look(`${word}x`)).map((hit) => hit.id)).toEqual([answer.questionId])
    expect(await similarTo(`Bracket ${word}`)).toContain(entry.id)
    await setState(entry.id, state)
    await setState(answer.id, state)
    expect((await look(word)).map((hit) => hit.id)).not.toContain(entry.id)
    expect((await look(`${word}: deburr or rivet first`)).map((hit) => hit.id)).not.toContain(entry.id)
    expect((await look(`${word}x`)).map((hit) => hit.id)).not.toContain(answer.questionId)
    expect(await similarTo(`Bracket ${word}`)).not.toContain(entry.id)
    await setState(entry.id, 'visible')
    expect((await look(word)).map((hit) => hit.id)).toEqual([entry.id])
  })
})

describe('GET /api/search/explain', () => {
  it('is for stewards', async () => {
    const address = '/api/search/explain?q=label'
    const status = async (token?: string) => (await api('GET', address, token ? { token } : {})).status
    expect(await status()).toBe(401)
    expect(await status((await aMember()).token)).toBe(403)
    expect(await status((await aMentor()).token)).toBe(403)
    expect(await status((await aMember({ role: 'moderator' })).token)).toBe(403)
    expect(await status((await aMember({ role: 'steward' })).token)).toBe(200)
    expect((await api('GET', `/api/search/explain?q=${'a'.repeat(501)}`, { token: (await aMember({ role: 'steward' })).token })).status).toBe(422)
  })

  it('gives the hits of the search in its order, with the evidence of the post that counts', async () => {
    const steward = await aMember({ role: 'steward' })
    const mentor = await aMentor()
    const answer = await anAnswer({ question: await anEntry({ title: 'Quadrant label' }), body: 'Put the quadrant label on the lid.' })
    await anEntry({ title: 'Quadrant' })
    await api('POST', `/api/posts/${answer.id}/stamps`, { token: mentor.token, body: { revision: 'A', basis: 'standard', reference: 'AC 43.13-1B para 4-57' } })
    await api('PUT', `/api/posts/${answer.id}/outcome`, { token: steward.token, body: { result: 'as-written', note: '' } })
    const { body } = await api<SearchExplanation>('GET', '/api/search/explain?q=quadrant+label', { token: steward.token })
    expect(body.hits.map(({ hit, score }) => [hit.id, score])).toEqual((await look('quadrant label')).map(({ id, score }) => [id, score]))
    expect(body.hits[0]).toMatchObject({ hit: { id: answer.questionId }, evidence: { postId: answer.id, kind: 'answer', stamp: 'stamped', critical: false, asWritten: 1, ofStamp: 1.15 } })
    const { evidence } = body.hits[0] ?? {}
    expect(evidence?.factor).toBeCloseTo((evidence?.ofStamp ?? 0) + (evidence?.ofOutcomes ?? 0), 9)
    expect(body.hits.every(({ hit }) => Array.isArray(hit.cautions))).toBe(true)
    expect(body.query.concepts.map(({ word }) => word)).toEqual(['quadrant', 'label'])
  })
})
