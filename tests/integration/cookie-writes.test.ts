// A write that rides on the session cookie must come from our own pages.
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { count } from 'drizzle-orm'
import { post } from '@/db/schema'
import { api } from '../support/api'
import { inRequest, sessionCookie } from '../support/as-session'
import { openTestRuntime, type TestRuntime } from '../support/database'
import { aMember, entryInput, suspend } from '../support/factories'

let runtime: TestRuntime
beforeAll(async () => {
  runtime = await openTestRuntime()
})
afterAll(() => runtime.close())

const posts = async () => (await runtime.database.reader.select({ n: count() }).from(post))[0]?.n
async function publish(cookie: string, headers: Record<string, string>) {
  return inRequest(cookie, () => api('POST', '/api/entries', { body: entryInput(), headers: { cookie, ...headers } }))
}

describe('a write with a session cookie', () => {
  it('is taken from our own pages', async () => {
    const person = await aMember()
    const cookie = await sessionCookie(person)
    const answered = await publish(cookie, { origin: 'http://localhost:3000', 'sec-fetch-site': 'same-origin' })
    expect(answered.status).toBe(201)
    expect(answered.body.author).toEqual({ id: person.id, name: person.name })
  })

  it.each([
    ['with no word of where it comes from', {}],
    ['from another origin', { origin: 'https://elsewhere.example' }],
    ['from another port of this host', { origin: 'http://localhost:4000' }],
    ['from a sandboxed frame', { origin: 'null' }],
    ['that the browser calls cross-site', { 'sec-fetch-site': 'cross-site' }],
    ['that the browser calls same-site', { 'sec-fetch-site': 'same-site' }],
    ['whose origin and Sec-Fetch-Site disagree', { origin: 'http://localhost:3000', 'sec-fetch-site': 'cross-site' }],
  ])('is refused %s, and nothing is written', async (_, headers) => {
    const cookie = await sessionCookie(await aMember())
    const before = await posts()
    expect((await publish(cookie, headers)).status).toBe(403)
    expect(await posts()).toBe(before)
  })

  it('is refused once its member is suspended, although the cookie still stands', async () => {
    const person = await aMember()
    const cookie = await sessionCookie(person)
    await suspend(person)
    expect((await publish(cookie, { origin: 'http://localhost:3000' })).status).toBe(401)
  })

  it('is refused with a cookie from before the last password change', async () => {
    const cookie = await sessionCookie(await aMember(), 7)
    expect((await publish(cookie, { origin: 'http://localhost:3000' })).status).toBe(401)
  })

  it('is refused with a cookie that somebody else signed', async () => {
    const { encode } = await import('next-auth/jwt')
    const person = await aMember()
    const forged = await encode({ token: { sub: String(person.id), epoch: 0, role: 'steward' }, secret: 'not the secret of this installation' })
    expect((await publish(`next-auth.session-token=${forged}`, { origin: 'http://localhost:3000' })).status).toBe(401)
  })

  it('a read with a cookie needs no origin', async () => {
    const cookie = await sessionCookie(await aMember())
    const answered = await inRequest(cookie, () => api('POST', '/api/similar', { body: { title: 'Labels on boxes' }, headers: { cookie } }))
    expect(answered.status).toBe(200)
  })
})
