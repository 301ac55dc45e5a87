// Publishing and editing entries, answers and remarks through the real handlers.
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { eq } from 'drizzle-orm'
import { member, revision } from '@/db/schema'
import { writeQuietly } from '@/db/transaction'
import type { Answer, Entry, Remark } from '@/lib/schemas/post'
import type { SearchResult } from '@/lib/schemas/search'
import type { Problem } from '@/lib/schemas/problem'
import { api } from '../support/api'
import { openTestRuntime, type TestRuntime } from '../support/database'
import { aKit, aMember, anAnswer, anEntry, critical, entryInput, suspend } from '../support/factories'

let runtime: TestRuntime
beforeAll(async () => {
  runtime = await openTestRuntime()
})
afterAll(() => runtime.close())

const paths = (problem: Problem) => (problem.errors ?? []).map((e) => e.path)

describe('POST /api/entries', () => {
  it('publishes a question as Rev A, says where it is, and it is found at once', async () => {
    const { token, id, name } = await aMember()
    const made = await api<Entry>('POST', '/api/entries', { token, body: entryInput({ title: 'Quincunx pattern for the placards', parts: { doing: 'Placards.', measured: '3 in' } }) })
    expect([made.status, made.headers.get('location')]).toEqual([201, `/api/entries/${made.body.id}`])
    expect(made.body).toMatchObject({ kind: 'question', revision: 'A', author: { id, name }, parts: { doing: 'Placards.', measured: '3 in' }, stamp: 'none', answers: [] })
    expect((await api<Entry>('GET', `/api/entries/${made.body.id}`)).body).toEqual(made.body)
    expect((await api<SearchResult>('GET', '/api/search?q=quincunx')).body.results.map((h) => h.id)).toEqual([made.body.id])
  })

  it('publishes a lesson with order advice, in any kit', async () => {
    const [{ token }, kit] = [await aMember(), await aKit()]
    const sent = entryInput({ kind: 'lesson', kit: kit.slug, sections: [kit.section], tasks: ['mark-part'], orderAdvice: [{ before: 'mark-sides', after: 'mark-part' }], parts: { happened: 'Mixed up.', hours: 2.5 } })
    const { status, body } = await api<Entry>('POST', '/api/entries', { token, body: sent })
    expect([status, body.kit, body.orderAdvice, body.parts]).toEqual([201, kit.slug, sent.orderAdvice, { happened: 'Mixed up.', hours: 2.5 }])
    expect(body.operations).toEqual(['mark'])
  })

  it('asks a visitor to sign in, and a suspended member, before it reads what was sent', async () => {
    expect((await api('POST', '/api/entries', { body: entryInput() })).status).toBe(401)
    expect((await api('POST', '/api/entries', { raw: 'not json' })).status).toBe(401)
    const person = await aMember()
    await suspend(person)
    expect((await api('POST', '/api/entries', { token: person.token, body: entryInput() })).status).toBe(401)
  })

  it('names every unknown name', async () => {
    const { token } = await aMember()
    const { status, body } = await api<Problem>('POST', '/api/entries', { token, body: entryInput({ sections: ['Z-9'], tasks: ['juggle'], operations: ['fly'] }) })
    expect([status, paths(body)]).toEqual([422, ['sections.0', 'tasks.0', 'operations.0']])
    expect(paths((await api<Problem>('POST', '/api/entries', { token, body: entryInput({ kit: 'heron-9' }) })).body)).toEqual(['kit'])
  })

  it.each([
    ['an unknown field', { colour: 'red' }, 'colour'],
    ['a forged role', { role: 'steward' }, 'role'],
    ['a forged author', { author: { id: 1 } }, 'author'],
    ['a forged stamp', { stamp: 'stamped' }, 'stamp'],
    ['a number for a title', { title: 7 }, 'title'],
    ['an empty title', { title: '  ' }, 'title'],
    ['a title of 161 characters', { title: 'x'.repeat(161) }, 'title'],
    ['a list for a kit', { kit: ['whimbrel-2'] }, 'kit'],
    ['no section', { sections: [] }, 'sections'],
    ['a part of a lesson', { parts: { happened: 'x' } }, 'parts.happened'],
    ['parts that say nothing', { parts: { doing: ' ' } }, 'parts'],
    ['a part of 5,001 characters', { parts: { doing: 'x'.repeat(5001) } }, 'parts.doing'],
    ['parts and a body', { body: 'x', parts: { doing: 'x' } }, 'body'],
    ['control characters', { title: 'a\u0007b' }, 'title'],
    ['another kind', { kind: 'answer' }, 'kind'],
    ['a task before itself', { orderAdvice: [{ before: 'rivet', after: 'rivet' }] }, 'orderAdvice.0'],
  ])('refuses %s and names it', async (_, change, at) => {
    const { token } = await aMember()
    const { status, body } = await api<Problem>('POST', '/api/entries', { token, body: { ...entryInput(), ...change } })
    expect([status, paths(body)[0]]).toEqual([422, at])
  })

  it('is published only when its cautions were acknowledged, and then carries them everywhere', async () => {
    const { token } = await aMember()
    const sent = entryInput({ ...critical, title: 'Vermilion rib' })
    const refused = await api<Problem>('POST', '/api/entries', { token, body: sent })
    expect([refused.status, paths(refused.body), refused.body.cautions?.map((c) => c.topic)]).toEqual([422, ['acknowledgedCautions.structure'], ['structure']])
    const { status, body } = await api<Entry>('POST', '/api/entries', { token, body: { ...sent, acknowledgedCautions: ['structure'] } })
    expect([status, body.needsTwo, body.cautions.map((c) => [c.code, c.signalWord, c.origin])]).toEqual([201, true, [['structure', 'WARNING', 'rule']]])
    const topics = (list: { topic: string }[]) => list.map((c) => c.topic)
    const [hit] = (await api<SearchResult>('GET', '/api/search?q=vermilion')).body.results
    expect(topics(hit!.cautions)).toEqual(['structure'])
    const [listed] = (await api<{ items: Entry[] }>('GET', '/api/entries?limit=1')).body.items
    expect(topics(listed!.cautions)).toEqual(['structure'])
    const [suggested] = (await api<{ items: { cautions: { topic: string }[] }[] }>('GET', '/api/suggest?q=vermilion')).body.items
    expect(topics(suggested!.cautions)).toEqual(['structure'])
    const remark = await api<Remark>('POST', `/api/posts/${body.id}/remarks`, { token, body: { body: 'Nothing to add.' } })
    expect(topics(remark.body.cautions)).toEqual(['structure'])
  })
})

describe('PATCH /api/entries/{id}', () => {
  it('makes the next revision; the old one stays', async () => {
    const entry = await anEntry({ parts: { doing: 'First words.' } })
    const { status, body } = await api<Entry>('PATCH', `/api/entries/${entry.id}`, { token: entry.by.token, body: { revision: 'A', parts: { doing: 'Second words.' } } })
    expect([status, body.revision, body.parts, body.title]).toEqual([200, 'B', { doing: 'Second words.' }, entry.title])
    expect(body.revisions.map((r) => r.revision)).toEqual(['A', 'B'])
    const kept = await runtime.database.reader.select({ number: revision.number, parts: revision.parts }).from(revision).where(eq(revision.postId, entry.id))
    expect(kept).toEqual([{ number: 1, parts: { doing: 'First words.' } }, { number: 2, parts: { doing: 'Second words.' } }])
  })

  it('an edit that changes nothing makes no revision', async () => {
    const entry = await anEntry()
    expect((await api<Entry>('PATCH', `/api/entries/${entry.id}`, { token: entry.by.token, body: { revision: 'A', title: entry.title } })).body.revision).toBe('A')
  })

  it('a stale edit gets the present version and loses nothing', async () => {
    const entry = await anEntry({ parts: { doing: 'One.' } })
    const edit = (doing: string) => api<Entry & { current: Entry; status: number }>('PATCH', `/api/entries/${entry.id}`, { token: entry.by.token, body: { revision: 'A', parts: { doing } } })
    const both = await Promise.all([edit('Two.'), edit('Three.')])
    expect(both.map((r) => r.status).sort()).toEqual([200, 409])
    const [won, lost] = [both.find((r) => r.status === 200)!, both.find((r) => r.status === 409)!]
    expect(lost.body.current).toMatchObject({ id: entry.id, revision: 'B', parts: won.body.parts })
    expect((await api<Entry>('GET', `/api/entries/${entry.id}`)).body.revisions).toHaveLength(2)
  })

  it('only its author edits it', async () => {
    const entry = await anEntry()
    const body = { revision: 'A', title: 'Mine now' }
    expect((await api('PATCH', `/api/entries/${entry.id}`, { token: (await aMember({ role: 'steward' })).token, body })).status).toBe(403)
    expect((await api('PATCH', `/api/entries/${entry.id}`, { body })).status).toBe(401)
    expect((await api('PATCH', '/api/entries/999999', { token: entry.by.token, body })).status).toBe(404)
  })

  it('acknowledges only the cautions that are new', async () => {
    const entry = await anEntry(critical)
    const edit = (body: object) => api<Entry & Problem>('PATCH', `/api/entries/${entry.id}`, { token: entry.by.token, body })
    expect((await edit({ revision: 'A', title: 'Another title' })).status).toBe(200)
    const refused = await edit({ revision: 'B', sections: ['W-3', 'W-6'] })
    expect([refused.status, paths(refused.body).includes('acknowledgedCautions.structure')]).toEqual([422, false])
    expect(paths(refused.body).length).toBeGreaterThan(0)
    const codes = paths(refused.body).map((p) => p.replace('acknowledgedCautions.', ''))
    expect((await edit({ revision: 'B', sections: ['W-3', 'W-6'], acknowledgedCautions: codes })).body.revision).toBe('C')
  })

  it('a caution stays when the text that asked for it is gone', async () => {
    const entry = await anEntry(critical)
    const { body } = await api<Entry>('PATCH', `/api/entries/${entry.id}`, { token: entry.by.token, body: { revision: 'A', sections: ['X-1'] } })
    expect(body.cautions.map((c) => c.code)).toEqual(['structure'])
  })
})

describe('answers and remarks', () => {
  it('an answer takes its question’s cautions and needs them acknowledged', async () => {
    const question = await anEntry(critical)
    const { token } = await aMember()
    const send = (acknowledgedCautions: string[]) => api<Answer & Problem>('POST', `/api/entries/${question.id}/answers`, { token, body: { body: 'Turn it over.', acknowledgedCautions } })
    expect(paths((await send([])).body)).toEqual(['acknowledgedCautions.structure'])
    const made = await send(['structure'])
    expect([made.status, made.headers.get('location')]).toEqual([201, `/api/entries/${question.id}#post-${made.body.id}`])
    expect(made.body).toMatchObject({ kind: 'answer', parentId: question.id, revision: 'A', needsTwo: true, cautions: [{ code: 'structure' }] })
  })

  it('an edit of the question adds what it now requires to its answers', async () => {
    const answer = await anAnswer()
    const question = (await api<Entry>('GET', `/api/entries/${answer.questionId}`)).body
    const author = (await runtime.database.reader.select().from(member).where(eq(member.id, question.author.id!)))[0]!
    expect(answer.cautions).toEqual([])
    const context = { token: await tokenOf(author.id) }
    await api('PATCH', `/api/entries/${question.id}`, { ...context, body: { revision: 'A', ...critical, acknowledgedCautions: ['structure'] } })
    const after = (await api<Entry>('GET', `/api/entries/${question.id}`)).body.answers[0]
    expect(after?.cautions.map((c) => [c.code, c.origin])).toEqual([['structure', 'added-later']])
  })

  it('is edited by its author alone, from the revision they saw', async () => {
    const answer = await anAnswer()
    const edit = (token: string, revisionSeen: string, body: string) => api<Answer & { current: Answer }>('PATCH', `/api/answers/${answer.id}`, { token, body: { revision: revisionSeen, body } })
    expect((await edit(answer.by.token, 'A', 'On the front.')).body).toMatchObject({ revision: 'B', text: 'On the front.' })
    const stale = await edit(answer.by.token, 'A', 'On the back.')
    expect([stale.status, stale.body.current.revision, stale.body.current.text]).toEqual([409, 'B', 'On the front.'])
    expect((await edit((await aMember()).token, 'B', 'Nowhere.')).status).toBe(403)
  })

  it('a lesson and an answer take no answers; an unknown question is 404', async () => {
    const { token } = await aMember()
    const [lesson, answer] = [await anEntry({ kind: 'lesson' }), await anAnswer()]
    const send = (id: number) => api('POST', `/api/entries/${id}/answers`, { token, body: { body: 'x' } })
    expect([(await send(lesson.id)).status, (await send(answer.id)).status, (await send(999_999)).status]).toEqual([422, 404, 404])
  })

  it('a remark stands under an entry or an answer', async () => {
    const answer = await anAnswer()
    const { token, name } = await aMember()
    const made = await api<Remark>('POST', `/api/posts/${answer.id}/remarks`, { token, body: { body: 'Works for *short* labels.' } })
    expect([made.status, made.body.author.name, made.body.text]).toEqual([201, name, 'Works for short labels.'])
    const { body } = await api<Entry>('GET', `/api/entries/${answer.questionId}`)
    expect(body.answers[0]?.remarks).toEqual([made.body])
    expect((await api('POST', `/api/posts/${answer.id}/remarks`, { body: { body: 'x' } })).status).toBe(401)
    expect((await api('POST', '/api/posts/999999/remarks', { token, body: { body: 'x' } })).status).toBe(404)
    expect((await api('POST', `/api/posts/${answer.id}/remarks`, { token, body: { body: '' } })).status).toBe(422)
  })

  it('what is hidden is 404 for others and takes nothing more', async () => {
    const entry = await anEntry()
    const { post } = await import('@/db/schema')
    await writeQuietly(runtime.database, (tx) => tx.update(post).set({ state: 'hidden', stateReason: 'twice' }).where(eq(post.id, entry.id)))
    await runtime.search.catchUp()
    const { token } = await aMember()
    expect((await api('GET', `/api/entries/${entry.id}`, { token })).status).toBe(404)
    expect((await api('POST', `/api/posts/${entry.id}/remarks`, { token, body: { body: 'x' } })).status).toBe(404)
    expect((await api<{ items: Entry[] }>('GET', '/api/entries?limit=100')).body.items.map((e) => e.id)).not.toContain(entry.id)
    expect((await api<SearchResult>('GET', `/api/search?q=${encodeURIComponent(entry.title)}`)).body.results.map((h) => h.id)).not.toContain(entry.id)
    expect((await api('GET', `/api/entries/${entry.id}`, { token: (await aMember({ role: 'moderator' })).token })).status).toBe(200)
  })
})

async function tokenOf(memberId: number): Promise<string> {
  const { createToken } = await import('@/lib/services/people/create-token')
  return createToken({ database: runtime.database, now: Date.now() }, { memberId, name: 'second' })
}
