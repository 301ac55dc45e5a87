// The numbers check through the interface, and what it asks of a stamp.
import { afterAll, beforeAll, expect, it } from 'vitest'
import type { NumbersCheckItem } from '@/lib/schemas/numbers-check'
import type { Stamp } from '@/lib/schemas/post'
import { api } from '../support/api'
import { openTestRuntime, type TestRuntime } from '../support/database'
import { aMentor, anAnswer } from '../support/factories'

let runtime: TestRuntime
beforeAll(async () => { runtime = await openTestRuntime() })
afterAll(() => runtime.close())

const basis = { revision: 'A', basis: 'standard', reference: 'AC 43.13-1B para 4-57' }

it('names the claim, where it stands, and what the table gives with its source', async () => {
  const text = 'Drill #10 for the 1/8 rivets.'
  const { status, body } = await api<{ checks: NumbersCheckItem[] }>('POST', '/api/numbers-check', { body: { text } })
  expect(status).toBe(200)
  // Hole for a 1/8 solid rivet: #30, 0.1285 (P-40 repair manual, para 16, as lib/domain/shop lists it).
  expect(body.checks).toMatchObject([{ role: 'advised', verdict: 'conflicts', table: 'rivet' }])
  expect(body.checks[0]?.expected).toContain('#30')
  expect(text.slice(body.checks[0]?.start, body.checks[0]?.end)).toBe(body.checks[0]?.claim)
})

it('a stamp on advice that conflicts with the table needs a written reason, which is shown with it', async () => {
  const answer = await anAnswer({ body: 'Drill #10 for the 1/8 rivets.' })
  const { token } = await aMentor()
  const refused = await api('POST', `/api/posts/${answer.id}/stamps`, { token, body: basis })
  expect(refused.status).toBe(422)
  expect(refused.body).toMatchObject({ errors: [{ path: 'conflictReason' }] })
  const made = await api<Stamp>('POST', `/api/posts/${answer.id}/stamps`, { token, body: { ...basis, conflictReason: 'The maker’s oversize rivet of this bag.' } })
  expect(made.status).toBe(201)
  expect(made.body.conflictReason).toBe('The maker’s oversize rivet of this bag.')
})

it('a measured number is compared and stops no stamp', async () => {
  const answer = await anAnswer({ body: 'I measured the hole for the 1/8 rivet: 0.1935.' })
  const { token } = await aMentor()
  expect((await api('POST', `/api/posts/${answer.id}/stamps`, { token, body: basis })).status).toBe(201)
})
