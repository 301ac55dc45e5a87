// How it went, "I'm going by this", and the order of answers that follows.
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import type { Entry, Outcomes } from '@/lib/schemas/post'
import { api } from '../support/api'
import { openTestRuntime, type TestRuntime } from '../support/database'
import { aMember, aMentor, anAnswer, anEntry, critical } from '../support/factories'

let runtime: TestRuntime
beforeAll(async () => {
  runtime = await openTestRuntime()
})
afterAll(() => runtime.close())

const tell = async (postId: number, result: string, note = 'so') => api<Outcomes>('PUT', `/api/posts/${postId}/outcome`, { token: (await aMember()).token, body: { result, note } })
const entry = async (id: number) => (await api<Entry>('GET', `/api/entries/${id}`)).body

describe('how it went', () => {
  it('is one report a member and post; a later one replaces it', async () => {
    const [answer, { token, id }] = [await anAnswer(), await aMember()]
    const put = (result: string, note: string) => api<Outcomes>('PUT', `/api/posts/${answer.id}/outcome`, { token, body: { result, note } })
    expect((await put('as-written', '')).body).toMatchObject({ asWritten: 1, withChange: 0, didNotWork: 0 })
    const { body } = await put('with-change', 'Used wider labels.')
    expect(body).toMatchObject({ asWritten: 0, withChange: 1, items: [{ author: { id }, revision: 'A', note: 'Used wider labels.' }] })
    expect(body.items).toHaveLength(1)
  })

  it('counts for the revision it was told of', async () => {
    const answer = await anAnswer()
    await tell(answer.id, 'as-written')
    await api('PATCH', `/api/answers/${answer.id}`, { token: answer.by.token, body: { revision: 'A', body: 'Elsewhere.' } })
    expect((await entry(answer.questionId)).answers[0]?.outcomes).toMatchObject({ asWritten: 0, items: [{ revision: 'A' }] })
  })

  it('is not told of one’s own words, of a question, by a visitor, or without saying why', async () => {
    const answer = await anAnswer()
    const put = (token: string | undefined, id: number, body: object) => api('PUT', `/api/posts/${id}/outcome`, { ...(token ? { token } : {}), body })
    const { token } = await aMember()
    expect((await put(answer.by.token, answer.id, { result: 'as-written' })).status).toBe(403)
    expect((await put(token, answer.questionId, { result: 'as-written' })).status).toBe(403)
    expect((await put(undefined, answer.id, { result: 'as-written' })).status).toBe(401)
    expect((await put(token, answer.id, { result: 'did-not-work' })).status).toBe(422)
    expect((await put(token, answer.id, { result: 'brilliant' })).status).toBe(422)
    expect((await put(token, 999_999, { result: 'as-written' })).status).toBe(404)
  })
})

describe('I’m going by this', () => {
  it('is set once and taken off, however often it is sent', async () => {
    const [answer, { token }] = [await anAnswer(), await aMember()]
    const put = () => api('PUT', `/api/posts/${answer.id}/reliance`, { token, body: {} })
    const takeOff = () => api('DELETE', `/api/posts/${answer.id}/reliance`, { token })
    const going = async () => (await entry(answer.questionId)).answers[0]?.goingByThis
    expect([(await put()).status, (await put()).status, await going()]).toEqual([204, 204, 1])
    expect([(await takeOff()).status, (await takeOff()).status, await going()]).toEqual([204, 204, 0])
  })

  it('is not set on one’s own words or on a question', async () => {
    const answer = await anAnswer()
    const put = (token: string, id: number) => api('PUT', `/api/posts/${id}/reliance`, { token, body: {} })
    expect((await put(answer.by.token, answer.id)).status).toBe(403)
    expect((await put((await aMember()).token, answer.questionId)).status).toBe(403)
    expect((await api('PUT', `/api/posts/${answer.id}/reliance`, { token: answer.by.token, body: { memberId: 1 } })).status).toBe(422)
  })
})

describe('the order of answers', () => {
  it('off critical systems: stamped first, then by how it went, untried before what never worked', async () => {
    const question = await anEntry()
    const [failed, untried, worked, stamped] = [
      await anAnswer({ question, body: 'One.' }), await anAnswer({ question, body: 'Two.' }), await anAnswer({ question, body: 'Three.' }), await anAnswer({ question, body: 'Four.' }),
    ]
    await tell(failed.id, 'did-not-work')
    await tell(worked.id, 'as-written')
    await api('POST', `/api/posts/${stamped.id}/stamps`, { token: (await aMentor()).token, body: { revision: 'A', basis: 'standard', reference: 'ch. 4' } })
    expect((await entry(question.id)).answers.map((a) => a.id)).toEqual([stamped.id, worked.id, untried.id, failed.id])
  })

  it('on critical systems how it went never ranks', async () => {
    const question = await anEntry(critical)
    const [older, newer] = [await anAnswer({ question, body: 'One.' }), await anAnswer({ question, body: 'Two.' })]
    await tell(newer.id, 'as-written')
    await tell(newer.id, 'as-written')
    expect((await entry(question.id)).answers.map((a) => a.id)).toEqual([older.id, newer.id])
  })
})
