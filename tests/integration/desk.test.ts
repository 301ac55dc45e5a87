// The mentors' desk on a real database: what hangs before whom, what a sheet holds, and what takes a tag off the rail.
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { api } from '../support/api'
import { openTestRuntime, type TestRuntime } from '../support/database'
import { aMember, aMentor, anAnswer, anEntry, critical, suspend, type Somebody } from '../support/factories'
import { addRemark } from '@/lib/services/entries/add-remark'
import { askFor } from '@/lib/services/desk/ask-for'
import { getDesk, type DeskQuery } from '@/lib/services/desk/get-desk'
import { setPostState } from '@/lib/services/moderation/set-post-state'
import { listRequests } from '@/lib/services/desk/list-requests'

let runtime: TestRuntime
beforeAll(async () => {
  runtime = await openTestRuntime()
})
afterAll(() => runtime.close())

const deskOf = async (mentor: Somebody, query: DeskQuery = {}) => getDesk(await mentor.context(), query)
const reasonFor = async (mentor: Somebody, postId: number) => (await deskOf(mentor)).tags.find((t) => t.postId === postId)?.reason ?? null
const press = (by: Somebody, postId: number, revision = 'A') =>
  api('POST', `/api/posts/${postId}/stamps`, { token: by.token, body: { revision, basis: 'plans', reference: 'W3-2 step 6', plansRevision: 'C' } })
const criticalAnswer = async (by?: Somebody) => anAnswer({ question: await anEntry(critical), body: 'Turn the rib over.', ...(by ? { by } : {}) })

describe('what hangs on the rail', () => {
  it('a question without an answer hangs as open, and its answer as unstamped in its place', async () => {
    const [question, mentor] = [await anEntry(), await aMentor()]
    expect(await reasonFor(mentor, question.id)).toBe('open-question')
    const answer = await anAnswer({ question })
    expect(await reasonFor(mentor, question.id)).toBeNull()
    expect(await reasonFor(mentor, answer.id)).toBe('first')
  })

  it('one of two hangs before everybody but the mentor who pressed it', async () => {
    const [answer, first, second] = [await criticalAnswer(), await aMentor(), await aMentor()]
    await press(first, answer.id)
    expect(await reasonFor(first, answer.id)).toBeNull()
    expect(await reasonFor(second, answer.id)).toBe('second')
    await press(second, answer.id)
    expect(await reasonFor(await aMentor(), answer.id)).toBeNull()
  })

  it('what a mentor wrote never hangs before them', async () => {
    const mentor = await aMentor()
    const answer = await criticalAnswer(mentor)
    expect(await reasonFor(mentor, answer.id)).toBeNull()
    expect(await reasonFor(await aMentor(), answer.id)).toBe('first')
  })

  it('an edit hangs a stamped answer as lapsed, also before the mentor whose stamp lapsed', async () => {
    const [answer, mentor] = [await anAnswer(), await aMentor()]
    await press(mentor, answer.id)
    expect(await reasonFor(mentor, answer.id)).toBeNull()
    const edited = await api('PATCH', `/api/answers/${answer.id}`, { token: answer.by.token, body: { revision: 'A', body: 'Put them on the lid alone.', acknowledgedCautions: [] } })
    expect(edited.status).toBe(200)
    expect(await reasonFor(mentor, answer.id)).toBe('lapsed')
  })

  it('one "did not work" on a critical system hangs it before everything else, also before those who stamped it', async () => {
    const [answer, first, second, builder] = [await criticalAnswer(), await aMentor(), await aMentor(), await aMember()]
    await press(first, answer.id)
    await press(second, answer.id)
    await api('PUT', `/api/posts/${answer.id}/outcome`, { token: builder.token, body: { result: 'did-not-work', note: 'It would not go.' } })
    const desk = await deskOf(first)
    expect(desk.tags[0]).toMatchObject({ postId: answer.id, reason: 'in-question', caution: { signalWord: 'WARNING' } })
    expect(desk.open?.post.id).toBe(answer.id)
  })

  it('a stamp of a mentor who was suspended hangs before others', async () => {
    const [answer, gone] = [await anAnswer(), await aMentor()]
    await press(gone, answer.id)
    expect(await reasonFor(await aMentor(), answer.id)).toBeNull()
    await suspend(gone)
    expect(await reasonFor(await aMentor(), answer.id)).toBe('mentor-gone')
  })

  it('a reply for one serial and what was hidden never hang', async () => {
    const serial = await anAnswer({ makerReply: 'one-serial' })
    expect(await reasonFor(await aMentor(), serial.id)).toBeNull()
    const [answer, mentor, moderator] = [await anAnswer(), await aMentor(), await aMember({ role: 'moderator' })]
    expect(await reasonFor(mentor, answer.id)).toBe('first')
    await setPostState(await moderator.context(), answer.id, { state: 'hidden', reason: 'Names a neighbour.' })
    expect(await reasonFor(mentor, answer.id)).toBeNull()
    expect((await deskOf(mentor, { open: answer.id })).open).toBeNull()
  })

  it('what builders go by hangs before what nobody does', async () => {
    const [older, newer, builder, mentor] = [await anAnswer(), await anAnswer(), await aMember(), await aMentor()]
    const places = async () => (await deskOf(mentor)).tags.map((t) => t.postId).filter((id) => id === older.id || id === newer.id)
    expect(await places()).toEqual([older.id, newer.id])
    await api('PUT', `/api/posts/${newer.id}/reliance`, { token: builder.token, body: {} })
    expect(await places()).toEqual([newer.id, older.id])
  })

  it('narrows to a section and to an operation', async () => {
    const mentor = await aMentor()
    const ribs = await criticalAnswer()
    const marking = await anAnswer({ question: await anEntry({ tasks: ['mark-part'] }) })
    const inRibs = (await deskOf(mentor, { kit: 'whimbrel-2', section: 'W-3' })).tags
    expect([inRibs.some((t) => t.postId === ribs.id), inRibs.some((t) => t.postId === marking.id)]).toEqual([true, false])
    const withMarking = (await deskOf(mentor, { operation: 'mark' })).tags
    expect([withMarking.some((t) => t.postId === ribs.id), withMarking.some((t) => t.postId === marking.id)]).toEqual([false, true])
  })

  it('is closed to a member and to a visitor', async () => {
    const member = await aMember({ role: 'steward' })
    await expect(getDesk(await member.context(), {})).rejects.toMatchObject({ code: 'forbidden' })
    await expect(getDesk({ ...(await member.context()), actor: null }, {})).rejects.toMatchObject({ code: 'unauthenticated' })
  })
})

describe('an open sheet', () => {
  it('holds the whole question, the row that is judged and its cautions', async () => {
    const [answer, mentor] = [await criticalAnswer(), await aMentor()]
    const { open } = await deskOf(mentor, { open: answer.id })
    expect(open).toMatchObject({ row: 1, mayStamp: true, mayAsk: true, maker: 'Saltmarsh Aircraft', systems: ['5712 Wing ribs to spar'], post: { id: answer.id, missing: 'first', needsTwo: true } })
    expect(open?.post.cautions.map((c) => c.topic)).toContain('structure')
    expect(open?.entry.id).toBe(answer.questionId)
  })

  it('offers no stamp on own words', async () => {
    const mentor = await aMentor()
    const answer = await criticalAnswer(mentor)
    expect((await deskOf(mentor, { open: answer.id })).open).toMatchObject({ mayStamp: false, mayAsk: false })
  })

  it('is nothing when 0 or an unknown post is asked for', async () => {
    const mentor = await aMentor()
    expect((await deskOf(mentor, { open: 0 })).open).toBeNull()
    expect((await deskOf(mentor, { open: 999_999 })).open).toBeNull()
  })
})

describe('asking for what is missing', () => {
  it('takes the tag off the rail of every mentor until the author answers', async () => {
    const [answer, mentor, other] = [await anAnswer(), await aMentor(), await aMentor()]
    await askFor(await mentor.context(), answer.id, { what: 'edge-distance' })
    await askFor(await mentor.context(), answer.id, { what: 'edge-distance' })
    expect(await reasonFor(mentor, answer.id)).toBeNull()
    expect(await reasonFor(other, answer.id)).toBeNull()
    expect([(await deskOf(mentor)).waiting, (await deskOf(other)).waiting]).toEqual([1, 0])
    expect((await listRequests(await answer.by.context(), [answer.id])).map((r) => r.what)).toEqual(['edge-distance'])
    await addRemark(await other.context(), answer.id, { body: 'I wonder too.' })
    expect(await reasonFor(mentor, answer.id)).toBeNull()
    await addRemark(await answer.by.context(), answer.id, { body: 'It is 3/8 in.' })
    expect(await reasonFor(mentor, answer.id)).toBe('first')
    expect((await deskOf(mentor)).waiting).toBe(0)
  })

  it('is for mentors, and never of oneself', async () => {
    const mentor = await aMentor()
    const answer = await anAnswer({ by: mentor })
    await expect(askFor(await mentor.context(), answer.id, { what: 'which-side' })).rejects.toMatchObject({ code: 'forbidden' })
    await expect(askFor(await (await aMember()).context(), answer.id, { what: 'which-side' })).rejects.toMatchObject({ code: 'forbidden' })
    await expect(askFor(await mentor.context(), 999_999, { what: 'which-side' })).rejects.toMatchObject({ code: 'not-found' })
  })
})
