import { afterAll, beforeAll, expect, it } from 'vitest'
import { api } from '../support/api'
import { openTestRuntime, type TestRuntime } from '../support/database'
import { aMember, anAnswer, anEntry, entryInput, aMentor, critical } from '../support/factories'
let rt: TestRuntime
beforeAll(async () => { rt = await openTestRuntime() })
afterAll(() => rt.close())
it('works', async () => {
  const m = await aMember()
  const r = await api('POST', '/api/entries', { token: m.token, body: entryInput() })
  console.log(r.status, r.text)
  const e = await anEntry(critical)
  console.log(e.cautions.map(c => c.code), e.needsTwo)
  const a = await anAnswer({ question: e })
  const t = await aMentor()
  const s = await api('POST', `/api/posts/${a.id}/stamps`, { token: t.token, body: { revision: 'A', basis: 'plans', reference: 'W3-2 step 6', plansRevision: 'C' } })
  console.log(s.status, s.text)
  expect((await api('GET', '/api/search?q=labels')).status).toBe(200)
  console.log((await api('GET', '/api/health')).text)
  console.log((await api('GET', '/api/nope?x=1')).text)
})
