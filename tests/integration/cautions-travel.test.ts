// Cautions where they could get lost: on later answers, past a waiver elsewhere, after an edit, under a hidden question, by a newer table.
import { eq } from 'drizzle-orm'
import { afterAll, beforeAll, expect, it } from 'vitest'
import { postCaution, setting } from '@/db/schema'
import { writeQuietly } from '@/db/transaction'
import type { Answer, Entry } from '@/lib/schemas/post'
import { addCaution } from '@/lib/services/cautions/add-caution'
import { reapplyRules } from '@/lib/services/cautions/reapply-rules'
import { waiveCaution } from '@/lib/services/cautions/waive-caution'
import { presentHits } from '@/lib/services/search/present-hits'
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

it('an answer written after a moderator cautioned its question must acknowledge that caution too, and needs two stamps', async () => {
  const question = await anEntry()
  await addCaution(await moderator.context(), question.id, { code: 'fuel', because: 'the line is a fuel line' })
  const { token } = await aMember()
  const refused = await api('POST', `/api/entries/${question.id}/answers`, { token, body: { body: 'Put them on the lid.', acknowledgedCautions: [] } })
  expect(refused.status).toBe(422)
  expect(refused.body).toMatchObject({ errors: [{ path: 'acknowledgedCautions.fuel' }] })
  const made = await api<Answer>('POST', `/api/entries/${question.id}/answers`, { token, body: { body: 'Put them on the lid.', acknowledgedCautions: ['fuel'] } })
  expect(made.status).toBe(201)
  expect(made.body).toMatchObject({ needsTwo: true, cautions: [{ code: 'fuel', because: 'the line is a fuel line' }] })
})

it('whoever writes an answer is shown what stands on its question, a moderator’s caution too, before it is sent', async () => {
  const question = await anEntry()
  const shown = async () => (await api<{ cautions: { code: string }[] }>('POST', '/api/cautions/required', { body: { question: question.id, body: 'Put them on the lid.' } })).body.cautions.map((c) => c.code)
  expect(await shown()).toEqual([])
  await addCaution(await moderator.context(), question.id, { code: 'fuel', because: 'the line is a fuel line' })
  expect(await shown()).toEqual(['fuel'])
})

it('a caution waived on the question still shows where it stands on the answer', async () => {
  const answer = await anAnswer({ question: await anEntry(critical) })
  await waiveCaution(await moderator.context(), answer.questionId, { code: 'structure', reason: 'The question is about labels.' })
  const [hit] = await presentHits(await moderator.context(), [{ id: answer.questionId, postId: answer.id, score: 1, terms: [] }])
  expect(hit?.cautions.find((c) => c.code === 'structure')).toMatchObject({ code: 'structure' })
  expect(hit?.cautions.find((c) => c.code === 'structure')?.waived).toBeUndefined()
})

it('a caution waived for one reason stands again when an edit requires it for another', async () => {
  const author = await aMember()
  const lesson = await anEntry({ kind: 'lesson' }, author)
  await writeQuietly(runtime.database, (tx) => tx.insert(postCaution).values({ postId: lesson.id, code: 'doors', origin: 'rule', because: 'the words “garage door”', createdAt: 1, acknowledgedAt: 1 }))
  await waiveCaution(await moderator.context(), lesson.id, { code: 'doors', reason: 'It is the door of the garage.' })
  const body = { revision: 'A', parts: { happened: 'The canopy latch slipped open and the canopy frame bent.', differently: '', tools: '' } }
  const refused = await api('PATCH', `/api/entries/${lesson.id}`, { token: author.token, body })
  expect(refused.body).toMatchObject({ status: 422, errors: expect.arrayContaining([expect.objectContaining({ path: 'acknowledgedCautions.doors' })]) })
  const all = (refused.body as unknown as { errors: { path: string }[] }).errors.map((e) => e.path.replace('acknowledgedCautions.', ''))
  const edited = await api<Entry>('PATCH', `/api/entries/${lesson.id}`, { token: author.token, body: { ...body, acknowledgedCautions: all } })
  expect(edited.body).toMatchObject({ needsTwo: true })
  expect(edited.body.cautions.find((c) => c.code === 'doors')?.waived).toBeUndefined()
})

it('an answer under a hidden question takes no act, not even from a moderator who still sees it', async () => {
  const answer = await anAnswer()
  const [member, mentor] = [await aMember(), await aMentor({ role: 'moderator' })]
  await setPostState(await moderator.context(), answer.questionId, { state: 'hidden', reason: 'It names a person.' })
  const acts = [
    ['POST', `/api/posts/${answer.id}/remarks`, { body: 'Still here?' }], ['PUT', `/api/posts/${answer.id}/outcome`, { result: 'as-written', note: '' }],
    ['PUT', `/api/posts/${answer.id}/reliance`, {}], ['POST', `/api/posts/${answer.id}/stamps`, { revision: 'A', basis: 'standard', reference: 'AC 43.13-1B para 4-57' }],
  ] as const
  for (const [method, path, body] of acts) {
    expect([404, 403], path).toContain((await api(method, path, { token: member.token, body })).status)
    expect((await api(method, path, { token: mentor.token, body })).status, path).toBe(403)
  }
})

it('mending the words of a report does not put a stamp in question again after a mentor looked', async () => {
  const answer = await anAnswer({ question: await anEntry(critical) })
  const [first, second, builder] = [await aMentor(), await aMentor(), await aMember()]
  const stamp = (token: string) => api('POST', `/api/posts/${answer.id}/stamps`, { token, body: { revision: 'A', basis: 'standard', reference: 'AC 43.13-1B para 4-57' } })
  const state = async () => (await read(answer.questionId)).answers[0]?.stamp
  await stamp(first.token)
  await stamp(second.token)
  await api('PUT', `/api/posts/${answer.id}/outcome`, { token: builder.token, body: { result: 'did-not-work', note: 'It craked.' } })
  expect(await state()).toBe('in-question')
  await stamp(first.token)
  expect(await state()).toBe('stamped')
  await api('PUT', `/api/posts/${answer.id}/outcome`, { token: builder.token, body: { result: 'did-not-work', note: 'It cracked.' } })
  expect(await state()).toBe('stamped')
})

it('a newer rule table is run over what was judged by an older one, once', async () => {
  const entry = await anEntry(critical)
  // As if the table that judged it had not known the caution, and were of an older version.
  await runtime.database.client.executeMultiple(`DROP TRIGGER caution_stays; DELETE FROM post_caution WHERE post_id = ${entry.id};`)
  await writeQuietly(runtime.database, (tx) => tx.insert(setting).values({ key: 'cautions-version', value: '0' }).onConflictDoUpdate({ target: setting.key, set: { value: '0' } }))
  expect(await reapplyRules(runtime.database, Date.now())).toBeGreaterThanOrEqual(1)
  const rows = await runtime.database.reader.select().from(postCaution).where(eq(postCaution.postId, entry.id))
  expect(rows).toMatchObject([{ code: 'structure', origin: 'added-later', acknowledgedAt: null }])
  expect((await read(entry.id)).needsTwo).toBe(true)
  expect(await reapplyRules(runtime.database, Date.now())).toBe(0)
})

it('an edit that does not speak of operations keeps those named beside the tasks', async () => {
  const author = await aMember()
  const made = await anEntry({ operations: ['plan'] }, author)
  const edited = await api<Entry>('PATCH', `/api/entries/${made.id}`, { token: author.token, body: { revision: 'A', title: 'Another title for the trays', tasks: [] } })
  expect(edited.body.operations).toEqual(['plan'])
})
