// Every write leaves its trace in its own transaction: the row and its audit row come and go together.
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { asc, count, gt } from 'drizzle-orm'
import { checkAudit } from '@/db/check-audit'
import { audit, post } from '@/db/schema'
import { write } from '@/db/transaction'
import { insertPost } from '@/db/mutations/posts'
import { api } from '../support/api'
import { openTestRuntime, requireTemporary, type TestRuntime } from '../support/database'
import { aMember, aMentor, anAnswer, anEntry, entryInput } from '../support/factories'

let runtime: TestRuntime
beforeAll(async () => {
  runtime = await openTestRuntime()
})
afterAll(() => runtime.close())

const trail = async (after: number) => runtime.database.reader.select().from(audit).where(gt(audit.sequence, after)).orderBy(asc(audit.sequence))
const last = async () => (await trail(0)).at(-1)?.sequence ?? 0

describe('the audit trail', () => {
  it('has a row for every write of the interface, with ids and verbs and no words', async () => {
    const [by, mentor] = [await aMember({ name: 'Perpetua Nightingale' }), await aMentor()]
    const entry = await anEntry({ title: 'Vermilion sentence' }, by)
    const answer = await anAnswer({ question: entry })
    let before = await last()
    const wrote = async (actorId: number, verb: string, call: Promise<{ status: number }>) => {
      expect((await call).status).toBeLessThan(300)
      const rows = await trail(before)
      expect(rows.map((r) => [r.actorId, r.verb])).toEqual([[actorId, verb]])
      before = rows.at(-1)!.sequence
    }
    const stamp = await api('POST', `/api/posts/${answer.id}/stamps`, { token: mentor.token, body: { revision: 'A', basis: 'standard', reference: 'Vermilion chapter' } })
    await wrote(mentor.id, 'stamp.press', Promise.resolve(stamp))
    await wrote(by.id, 'question.publish', api('POST', '/api/entries', { token: by.token, body: entryInput() }))
    await wrote(by.id, 'lesson.publish', api('POST', '/api/entries', { token: by.token, body: entryInput({ kind: 'lesson' }) }))
    await wrote(by.id, 'question.revise', api('PATCH', `/api/entries/${entry.id}`, { token: by.token, body: { revision: 'A', title: 'Vermilion again' } }))
    await wrote(mentor.id, 'answer.publish', api('POST', `/api/entries/${entry.id}/answers`, { token: mentor.token, body: { body: 'x' } }))
    await wrote(answer.by.id, 'answer.revise', api('PATCH', `/api/answers/${answer.id}`, { token: answer.by.token, body: { revision: 'A', body: 'y' } }))
    await wrote(by.id, 'remark.publish', api('POST', `/api/posts/${answer.id}/remarks`, { token: by.token, body: { body: 'x' } }))
    await wrote(by.id, 'outcome.tell', api('PUT', `/api/posts/${answer.id}/outcome`, { token: by.token, body: { result: 'as-written' } }))
    await wrote(by.id, 'reliance.begin', api('PUT', `/api/posts/${answer.id}/reliance`, { token: by.token, body: {} }))
    await wrote(by.id, 'reliance.end', api('DELETE', `/api/posts/${answer.id}/reliance`, { token: by.token }))
    await wrote(mentor.id, 'stamp.withdraw', api('POST', `/api/stamps/${stamp.body.id}/withdraw`, { token: mentor.token, body: { reason: 'Vermilion reason' } }))
    expect(JSON.stringify(await trail(0))).not.toMatch(/vermilion|perpetua|@/i)
    expect(await checkAudit(runtime.database.reader)).toEqual({ rows: (await trail(0)).length, brokenAt: null })
  })

  it('a write that fails leaves neither the row nor its audit row', async () => {
    const posts = async () => (await runtime.database.reader.select({ n: count() }).from(post))[0]?.n
    const [before, rows] = [await posts(), (await trail(0)).length]
    await expect(write(runtime.database, { actorId: null, at: 1 }, async (tx, record) => {
      await insertPost(tx, { kind: 'question', createdAt: 1 })
      record('question.publish', 'post:0')
      throw new Error('half way')
    })).rejects.toThrow('half way')
    expect([await posts(), (await trail(0)).length]).toEqual([before, rows])
  })

  it('a write that records nothing is refused and leaves nothing', async () => {
    const posts = async () => (await runtime.database.reader.select({ n: count() }).from(post))[0]?.n
    const before = await posts()
    await expect(write(runtime.database, { actorId: null, at: 1 }, (tx) => insertPost(tx, { kind: 'question', createdAt: 1 }))).rejects.toThrow('audit')
    expect(await posts()).toBe(before)
  })

  it.each([
    ['changed', 'update audit set detail = detail || \'x\' where sequence = 3', 3],
    ['taken out', 'delete from audit where sequence = 3', 4],
    ['put in behind', "insert into audit (at, verb, subject, previous_hash, hash) select 1, 'x', 'y', hash, 'made up' from audit order by sequence desc limit 1", -1],
  ])('a row that was %s with the laws switched off is found', async (_, statement, at) => {
    const copy = await openTestRuntime()
    await anEntry()
    await anAnswer()
    const { client, reader } = copy.database
    for (const trigger of ['audit_never_changes', 'audit_never_deleted', 'audit_is_chained']) await client.execute(`drop trigger ${trigger}`)
    expect((await checkAudit(reader)).brokenAt).toBeNull()
    await client.execute(statement)
    const expected = at === -1 ? (await reader.select({ n: count() }).from(audit))[0]!.n : at
    expect((await checkAudit(reader)).brokenAt).toBe(expected)
    await copy.close()
  })
})

describe('the test databases', () => {
  it.each(['/etc/pilothole.db', '/usr/pilothole.db', '/pilothole.db'])('refuse %s: it lies outside the temporary folder', (file) => {
    expect(() => requireTemporary(file)).toThrow('outside the temporary folder')
  })
})
