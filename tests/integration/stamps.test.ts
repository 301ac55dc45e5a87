// Stamps through the real handlers: who may press one, when two are needed, and what makes them lapse.
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { eq } from 'drizzle-orm'
import { mentorship } from '@/db/schema'
import { writeQuietly } from '@/db/transaction'
import type { Answer, Entry, Stamp } from '@/lib/schemas/post'
import type { SearchResult } from '@/lib/schemas/search'
import type { Problem } from '@/lib/schemas/problem'
import { api } from '../support/api'
import { openTestRuntime, type TestRuntime } from '../support/database'
import { aMember, aMentor, anAnswer, anEntry, critical, type Somebody } from '../support/factories'

let runtime: TestRuntime
beforeAll(async () => {
  runtime = await openTestRuntime()
})
afterAll(() => runtime.close())

const onPlans = { revision: 'A', basis: 'plans', reference: 'W3-2 step 6', plansRevision: 'C' }
const onOwnBuild = { revision: 'A', basis: 'own-build', reference: 'My own wing, 2023' }
const press = (by: Somebody, postId: number, body: object = onPlans) => api<Stamp & Problem>('POST', `/api/posts/${postId}/stamps`, { token: by.token, body })
const answerOf = async (questionId: number): Promise<Answer> => (await api<Entry>('GET', `/api/entries/${questionId}`)).body.answers[0]!
/** What lists and search show under the filter "stamped": read from the cache beside the post, so it is checked apart. */
async function foundStamped(): Promise<number[]> {
  const listed = (await api<{ items: Entry[] }>('GET', '/api/entries?stamped=1&limit=100')).body.items.map((e) => e.id)
  const found = (await api<SearchResult>('GET', '/api/search?q=labels&stamped=1&limit=100')).body.results.map((h) => h.id)
  expect([...found].sort()).toEqual([...listed].sort())
  return found
}
const criticalAnswer = async () => anAnswer({ question: await anEntry(critical), body: 'Turn the rib over.' })
const didNotWork = (by: Somebody, postId: number) => api('PUT', `/api/posts/${postId}/outcome`, { token: by.token, body: { result: 'did-not-work', note: 'It would not go.' } })

describe('pressing a stamp', () => {
  it('off critical systems one stamp makes it stamped', async () => {
    const [answer, mentor] = [await anAnswer(), await aMentor()]
    const made = await press(mentor, answer.id)
    expect([made.status, made.headers.get('location')]).toEqual([201, `/api/entries/${answer.questionId}#stamp-${made.body.id}`])
    expect(made.body).toMatchObject({ revision: 'A', mentor: { id: mentor.id, mark: mentor.mark }, basis: 'plans', plansRevision: 'C', live: true })
    expect(await answerOf(answer.questionId)).toMatchObject({ stamp: 'stamped', missing: null, needsTwo: false })
  })

  it('on a critical system it takes two people, one of them on a firm basis', async () => {
    const answer = await criticalAnswer()
    const [first, second, third] = [await aMentor(), await aMentor(), await aMentor()]
    await press(first, answer.id, onOwnBuild)
    expect(await answerOf(answer.questionId)).toMatchObject({ stamp: 'one-of-two', missing: 'second' })
    expect((await press(first, answer.id)).status).toBe(409)
    await press(second, answer.id, onOwnBuild)
    expect(await answerOf(answer.questionId)).toMatchObject({ stamp: 'one-of-two', missing: 'firm-basis' })
    await press(third, answer.id)
    expect(await answerOf(answer.questionId)).toMatchObject({ stamp: 'stamped', missing: null, needsTwo: true })
  })

  it('only by those to whom mentorship was granted, and never on their own words', async () => {
    const mentor = await aMentor()
    const answer = await anAnswer({ by: mentor })
    expect((await press(mentor, answer.id)).status).toBe(403)
    expect((await press(await aMember({ role: 'steward' }), answer.id)).status).toBe(403)
    expect((await press(answer.by, (await anAnswer()).id)).status).toBe(201)
    expect((await api('POST', `/api/posts/${answer.id}/stamps`, { body: onPlans })).status).toBe(401)
  })

  it('not once mentorship ended, on the very next request', async () => {
    const [mentor, answer] = [await aMentor(), await anAnswer()]
    await writeQuietly(runtime.database, (tx) => tx.update(mentorship).set({ endedAt: Date.now(), endReason: 'moved' }).where(eq(mentorship.memberId, mentor.id)))
    expect((await press(mentor, answer.id)).status).toBe(403)
  })

  it('not on a question, and not on what is not there', async () => {
    const mentor = await aMentor()
    expect((await press(mentor, (await anEntry()).id)).status).toBe(403)
    expect((await press(mentor, 999_999)).status).toBe(404)
  })

  it('only on the revision that stands', async () => {
    const [answer, mentor] = [await anAnswer(), await aMentor()]
    await api('PATCH', `/api/answers/${answer.id}`, { token: answer.by.token, body: { revision: 'A', body: 'On the lid only.' } })
    const refused = await press(mentor, answer.id)
    expect([refused.status, (refused.body as Problem).current]).toEqual([409, { id: answer.id, revision: 'B' }])
  })

  it.each([
    ['a plans step without the revision of the page', { basis: 'plans', reference: 'W3-2' }, 'plansRevision'],
    ['a maker’s reply without its scope', { basis: 'maker-reply', reference: 'letter of May' }, 'scope'],
    ['a maker’s reply for one serial', { basis: 'maker-reply', reference: 'letter of May', scope: 'one-serial' }, 'scope'],
    ['a scope without a maker’s reply', { basis: 'standard', reference: 'ch. 4', scope: 'bulletin' }, 'scope'],
    ['no reference', { basis: 'standard', reference: ' ' }, 'reference'],
    ['an imported basis', { basis: 'imported', reference: 'x' }, 'basis'],
    ['a forged mentor', { basis: 'standard', reference: 'x', mentorId: 1 }, 'mentorId'],
    ['an empty reason for a conflict', { basis: 'standard', reference: 'x', conflictReason: ' ' }, 'conflictReason'],
  ])('refuses %s', async (_, body, at) => {
    const refused = await press(await aMentor(), (await anAnswer()).id, { revision: 'A', ...body })
    expect([refused.status, refused.body.errors?.map((e) => e.path)]).toEqual([422, [at]])
  })

  it('an answer that passes on a reply for one serial can be neither stamped nor gone by', async () => {
    const [answer, mentor] = [await anAnswer({ makerReply: 'one-serial' }), await aMentor()]
    expect((await press(mentor, answer.id)).status).toBe(403)
    expect((await api('PUT', `/api/posts/${answer.id}/reliance`, { token: mentor.token, body: {} })).status).toBe(403)
  })
})

describe('what a stamp stands on changes', () => {
  it('an edit of the answer makes it lapsed; its old revision keeps the stamp', async () => {
    const [answer, mentor] = [await anAnswer(), await aMentor()]
    await press(mentor, answer.id)
    await api('PATCH', `/api/answers/${answer.id}`, { token: answer.by.token, body: { revision: 'A', body: 'On the lid only.' } })
    const after = await answerOf(answer.questionId)
    expect(after).toMatchObject({ stamp: 'lapsed', revision: 'B', stamps: [{ revision: 'A', live: false }] })
    expect(await foundStamped()).not.toContain(answer.questionId)
    expect((await press(mentor, answer.id, { ...onPlans, revision: 'B' })).status).toBe(201)
    expect(await foundStamped()).toContain(answer.questionId)
    expect((await answerOf(answer.questionId)).stamp).toBe('stamped')
  })

  it('an edit of its question makes it lapsed', async () => {
    const [question, mentor] = [await anEntry(), await aMentor()]
    const answer = await anAnswer({ question })
    await press(mentor, answer.id)
    expect(await foundStamped()).toContain(question.id)
    await api('PATCH', `/api/entries/${question.id}`, { token: question.by.token, body: { revision: 'A', parts: { doing: 'Something else.' } } })
    expect(await answerOf(question.id)).toMatchObject({ stamp: 'lapsed', revision: 'A', stamps: [{ live: false }] })
    expect(await foundStamped()).not.toContain(question.id)
  })

  it('one “did not work” on a critical system puts it in question until a mentor looks again', async () => {
    const answer = await criticalAnswer()
    const [first, second] = [await aMentor(), await aMentor()]
    await press(first, answer.id)
    await press(second, answer.id)
    expect((await didNotWork(await aMember(), answer.id)).status).toBe(200)
    expect((await answerOf(answer.questionId)).stamp).toBe('in-question')
    expect(await foundStamped()).not.toContain(answer.questionId)
    expect((await press(first, answer.id)).status).toBe(201)
    expect(await answerOf(answer.questionId)).toMatchObject({ stamp: 'stamped', stamps: [{ withdrawn: {} }, { live: true }, { live: true }] })
  })

  it('off critical systems it stays stamped', async () => {
    const answer = await anAnswer()
    await press(await aMentor(), answer.id)
    await didNotWork(await aMember(), answer.id)
    expect((await answerOf(answer.questionId)).stamp).toBe('stamped')
  })

  it('is withdrawn by its mentor alone, once, with a reason', async () => {
    const [answer, mentor, other] = [await anAnswer(), await aMentor(), await aMentor()]
    const { body: { id } } = await press(mentor, answer.id)
    const withdraw = (by: Somebody, reason: string) => api<Stamp>('POST', `/api/stamps/${id}/withdraw`, { token: by.token, body: { reason } })
    expect((await withdraw(mentor, ' ')).status).toBe(422)
    expect((await withdraw(other, 'Not mine.')).status).toBe(403)
    const done = await withdraw(mentor, 'I read the wrong page.')
    expect([done.status, done.body.withdrawn?.reason, done.body.live]).toEqual([200, 'I read the wrong page.', false])
    expect((await withdraw(mentor, 'Again.')).status).toBe(409)
    expect((await api('POST', '/api/stamps/999999/withdraw', { token: mentor.token, body: { reason: 'x' } })).status).toBe(404)
    expect((await api('POST', `/api/stamps/${id}/withdraw`, { body: { reason: 'x' } })).status).toBe(401)
    expect((await answerOf(answer.questionId)).stamp).toBe('withdrawn')
    expect(await foundStamped()).not.toContain(answer.questionId)
  })
})
