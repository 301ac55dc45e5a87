// What moderators do to a post: cautions added and waived, posts hidden and restored, always judged anew and always on record.
import { desc } from 'drizzle-orm'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { audit } from '@/db/schema'
import type { Answer, Entry } from '@/lib/schemas/post'
import { addCaution } from '@/lib/services/cautions/add-caution'
import { waiveCaution } from '@/lib/services/cautions/waive-caution'
import { setPostState } from '@/lib/services/moderation/set-post-state'
import { api } from '../support/api'
import { openTestRuntime, type TestRuntime } from '../support/database'
import { aMember, aMentor, anAnswer, anEntry, critical, type Somebody } from '../support/factories'

let runtime: TestRuntime
let moderator: Somebody
beforeAll(async () => {
  runtime = await openTestRuntime()
  moderator = await aMember({ role: 'moderator' })
})
afterAll(() => runtime.close())

const read = async (id: number): Promise<Entry> => (await api<Entry>('GET', `/api/entries/${id}`)).body
const answerOf = async (questionId: number): Promise<Answer> => (await read(questionId)).answers[0]!
const lastAudit = async () => (await runtime.database.reader.select().from(audit).orderBy(desc(audit.sequence)).limit(1))[0]
const codes = (post: { cautions: { code: string; origin: string; waived?: unknown }[] }) => post.cautions.map((c) => `${c.code} ${c.origin}${c.waived ? ' waived' : ''}`)

describe('adding a caution', () => {
  it('puts it on the post, says why, and asks for two stamps where the system is critical', async () => {
    const entry = await anEntry({ kind: 'lesson' })
    expect((await read(entry.id)).needsTwo).toBe(false)
    await addCaution(await moderator.context(), entry.id, { code: 'brakes', because: 'it is about a caliper' })
    const after = await read(entry.id)
    expect(codes(after)).toEqual(['brakes moderator'])
    expect(after).toMatchObject({ needsTwo: true, cautions: [{ because: 'it is about a caliper' }] })
    expect(await lastAudit()).toMatchObject({ verb: 'caution.add', subject: `post:${entry.id}`, detail: 'brakes', actorId: moderator.id })
  })

  it('on a question it goes onto the answers, whose one stamp is then one of two', async () => {
    const [answer, mentor] = [await anAnswer(), await aMentor()]
    await api('POST', `/api/posts/${answer.id}/stamps`, { token: mentor.token, body: { revision: 'A', basis: 'standard', reference: 'AC 43.13-1B para 4-57' } })
    expect((await answerOf(answer.questionId)).stamp).toBe('stamped')
    await addCaution(await moderator.context(), answer.questionId, { code: 'fuel', because: 'it is a fuel line' })
    expect(codes(await answerOf(answer.questionId))).toEqual(['fuel added-later'])
    expect((await answerOf(answer.questionId)).stamp).toBe('one-of-two')
  })

  it('twice is refused, and so is a caution that does not exist', async () => {
    const entry = await anEntry()
    const context = await moderator.context()
    await addCaution(context, entry.id, { code: 'eyes', because: 'chips fly' })
    await expect(addCaution(context, entry.id, { code: 'eyes', because: 'chips fly' })).rejects.toMatchObject({ code: 'conflict' })
    await expect(addCaution(context, entry.id, { code: 'dragons', because: 'here' })).rejects.toMatchObject({ code: 'invalid', errors: [{ path: 'code' }] })
  })
})

describe('waiving a caution', () => {
  it('keeps it readable with its reason, and judges the stamps without it', async () => {
    const [answer, mentor] = [await anAnswer({ question: await anEntry(critical) }), await aMentor()]
    await api('POST', `/api/posts/${answer.id}/stamps`, { token: mentor.token, body: { revision: 'A', basis: 'standard', reference: 'AC 43.13-1B para 4-57' } })
    expect((await answerOf(answer.questionId)).stamp).toBe('one-of-two')
    await waiveCaution(await moderator.context(), answer.id, { code: 'structure', reason: 'It is about labels.' })
    const after = await answerOf(answer.questionId)
    expect(after).toMatchObject({ stamp: 'stamped', needsTwo: false })
    expect(after.cautions.find((c) => c.code === 'structure')?.waived?.reason).toBe('It is about labels.')
    // Decided post by post: the question keeps its own.
    expect((await read(answer.questionId)).cautions.find((c) => c.code === 'structure')?.waived).toBeUndefined()
  })

  it('can be taken back by requiring it again', async () => {
    const entry = await anEntry({ ...critical, kind: 'lesson' })
    const context = await moderator.context()
    await waiveCaution(context, entry.id, { code: 'structure', reason: 'A slip.' })
    await expect(waiveCaution(context, entry.id, { code: 'structure', reason: 'Again.' })).rejects.toMatchObject({ code: 'conflict' })
    await addCaution(context, entry.id, { code: 'structure', because: 'it is a spar after all' })
    expect(await read(entry.id)).toMatchObject({ needsTwo: true })
    await expect(waiveCaution(context, entry.id, { code: 'brakes', reason: 'x' })).rejects.toMatchObject({ code: 'not-found' })
  })
})

describe('hiding a post', () => {
  it('takes it from readers and leaves it to its author, until it is restored', async () => {
    const entry = await anEntry({ kind: 'lesson' })
    await setPostState(await moderator.context(), entry.id, { state: 'hidden', reason: 'Names a neighbour.' })
    expect((await api('GET', `/api/entries/${entry.id}`)).status).toBe(404)
    expect((await api('GET', `/api/entries/${entry.id}`, { token: entry.by.token })).status).toBe(200)
    expect(await lastAudit()).toMatchObject({ verb: 'post.hide', subject: `post:${entry.id}`, detail: '' })
    await expect(setPostState(await moderator.context(), entry.id, { state: 'hidden', reason: 'Again.' })).rejects.toMatchObject({ code: 'conflict' })
    await setPostState(await moderator.context(), entry.id, { state: 'visible', reason: 'Mended.' })
    expect((await api('GET', `/api/entries/${entry.id}`)).status).toBe(200)
  })
})

it.each(['member', 'mentor'] as const)('a %s who is no moderator changes none of it', async (who) => {
  const [entry, other] = [await anEntry(critical), who === 'mentor' ? await aMentor() : await aMember()]
  const context = await other.context()
  await expect(addCaution(context, entry.id, { code: 'eyes', because: 'x' })).rejects.toMatchObject({ code: 'forbidden' })
  await expect(waiveCaution(context, entry.id, { code: 'structure', reason: 'x' })).rejects.toMatchObject({ code: 'forbidden' })
  await expect(setPostState(context, entry.id, { state: 'hidden', reason: 'x' })).rejects.toMatchObject({ code: 'forbidden' })
  expect((await read(entry.id)).cautions.every((c) => c.waived === undefined)).toBe(true)
})
