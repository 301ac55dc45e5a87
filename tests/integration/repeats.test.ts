// Repeated submits with an Idempotency-Key: one row, one answer.
import { afterAll, beforeAll, expect, it } from 'vitest'
import { count, eq } from 'drizzle-orm'
import { post } from '@/db/schema'
import type { Entry } from '@/lib/schemas/post'
import { api } from '../support/api'
import { openTestRuntime, type TestRuntime } from '../support/database'
import { aMember, anAnswer, critical, entryInput, type Somebody } from '../support/factories'

let runtime: TestRuntime
beforeAll(async () => {
  runtime = await openTestRuntime()
})
afterAll(() => runtime.close())

const written = async (by: Somebody) => (await runtime.database.reader.select({ n: count() }).from(post).where(eq(post.authorId, by.id)))[0]?.n
const send = (by: Somebody, key: string, body: object) => api<Entry>('POST', '/api/entries', { token: by.token, body, headers: { 'idempotency-key': key } })

it('the same key and body give the same answer, its Location included, and one row', async () => {
  const [by, body] = [await aMember(), entryInput()]
  const [first, second] = [await send(by, 'k1', body), await send(by, 'k1', body)]
  expect([second.status, second.text, second.headers.get('location')]).toEqual([201, first.text, first.headers.get('location')])
  expect(first.headers.get('location')).toBe(`/api/entries/${first.body.id}`)
  expect(await written(by)).toBe(1)
})

it('the same key with another body is 422', async () => {
  const by = await aMember()
  await send(by, 'k1', entryInput())
  expect((await send(by, 'k1', entryInput())).status).toBe(422)
  expect(await written(by)).toBe(1)
})

it('two at once are one: the second waits or is told to', async () => {
  const [by, body] = [await aMember(), entryInput()]
  const both = await Promise.all([send(by, 'k1', body), send(by, 'k1', body)])
  expect(both.map((r) => r.status).sort()).toEqual([201, expect.toBeOneOf([201, 409])])
  expect(await written(by)).toBe(1)
  expect((await send(by, 'k1', body)).status).toBe(201)
  expect(await written(by)).toBe(1)
})

it('keys belong to a member and a route', async () => {
  const [one, two, answer] = [await aMember(), await aMember(), await anAnswer()]
  expect([(await send(one, 'k1', entryInput())).status, (await send(two, 'k1', entryInput())).status]).toEqual([201, 201])
  const remark = await api('POST', `/api/posts/${answer.id}/remarks`, { token: one.token, body: { body: 'x' }, headers: { 'idempotency-key': 'k1' } })
  expect(remark.status).toBe(201)
})

it('a refused request keeps nothing: mended, it goes through under the same key', async () => {
  const by = await aMember()
  const body = entryInput({ ...critical })
  expect((await send(by, 'k1', body)).status).toBe(422)
  expect((await send(by, 'k1', { ...body, acknowledgedCautions: ['structure'] })).status).toBe(201)
})

it('a reply without a body is repeated too', async () => {
  const [by, answer] = [await aMember(), await anAnswer()]
  const put = () => api('PUT', `/api/posts/${answer.id}/reliance`, { token: by.token, body: {}, headers: { 'idempotency-key': 'k1' } })
  expect([(await put()).status, (await put()).status, (await put()).text]).toEqual([204, 204, ''])
})

it('a key is 1 to 200 visible characters', async () => {
  const by = await aMember()
  expect((await send(by, 'x'.repeat(201), entryInput())).status).toBe(422)
  expect((await send(by, 'a b', entryInput())).status).toBe(422)
})
