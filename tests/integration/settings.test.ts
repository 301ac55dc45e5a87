// An installation that reads behind a sign-in and has a low limit on haste. Settings are read once, so it has a file of its own.
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { allRoutes } from '@/app/api/all-routes'
import { declarationOf, methodNames } from '@/lib/http/route'
import { api } from '../support/api'
import { openTestRuntime, type TestRuntime } from '../support/database'
import { aMember, entryInput } from '../support/factories'

let runtime: TestRuntime
beforeAll(async () => {
  process.env['PUBLIC_READING'] = 'off'
  process.env['WRITES_PER_MINUTE'] = '3'
  process.env['READS_PER_MINUTE'] = '200'
  runtime = await openTestRuntime()
})
afterAll(() => runtime.close())

describe('with public reading off', () => {
  it('all but health asks a visitor to sign in', async () => {
    for (const [template, handlers] of Object.entries({ ...allRoutes })) {
      for (const method of methodNames) {
        if (!declarationOf(handlers[method])) continue
        const address = template.replace('{id}', '1').replace('{kit}', 'whimbrel-2')
        const { status } = await api(method, address, method === 'GET' ? {} : { body: {} })
        // Writes are counted apart and asked to sign in too; some of them are over their limit by now.
        const wanted = template === '/api/health' ? [200] : method === 'GET' ? [401] : [401, 429]
        expect(wanted, `${method} ${address}`).toContain(status)
      }
    }
    expect((await api('GET', '/api/openapi.json')).status).toBe(401)
  })

  it('a member reads', async () => {
    expect((await api('GET', '/api/kits', { token: (await aMember()).token })).status).toBe(200)
  })
})

describe('a limit on haste', () => {
  it('answers 429 with when to come back, for each member apart', async () => {
    const [hasty, calm] = [await aMember(), await aMember()]
    const send = (token: string) => api('POST', '/api/entries', { token, body: entryInput() })
    const answered = [await send(hasty.token), await send(hasty.token), await send(hasty.token), await send(hasty.token)]
    expect(answered.map((r) => r.status)).toEqual([201, 201, 201, 429])
    expect(Number(answered[3]?.headers.get('retry-after'))).toBeGreaterThan(0)
    expect((await send(calm.token)).status).toBe(201)
    expect((await api('GET', '/api/kits', { token: hasty.token })).status).toBe(200)
  })

  it('a call that only asks is counted as a read', async () => {
    const { token } = await aMember()
    for (let i = 0; i < 5; i++) expect((await api('POST', '/api/cautions/required', { token, body: { body: 'x' } })).status).toBe(200)
  })
})

describe('while search loads', () => {
  it('search is 503 with when to come back; entries and health answer', async () => {
    const loading = await openTestRuntime({ searchStarts: false })
    const { token } = await aMember()
    const { status, headers } = await api('GET', '/api/search?q=labels', { token })
    expect([status, Number(headers.get('retry-after')) > 0]).toEqual([503, true])
    const health = await api('GET', '/api/health')
    expect([health.status, health.body.search.state]).toEqual([200, 'loading'])
    expect((await api('GET', '/api/entries', { token })).status).toBe(200)
    await loading.close()
  })
})
