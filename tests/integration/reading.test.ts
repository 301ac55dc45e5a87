// The calls that only read: what they give, what they refuse, and what does not exist.
import { readdirSync } from 'node:fs'
import path from 'node:path'
import { Validator } from '@seriousme/openapi-schema-validator'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { allRoutes } from '@/app/api/all-routes'
import type { Hit, SearchResult } from '@/lib/schemas/search'
import type { Entry } from '@/lib/schemas/post'
import { eq } from 'drizzle-orm'
import { renderingKey } from '@/db/queries/cautioned-post'
import { rendering } from '@/db/schema'
import { writeQuietly } from '@/db/transaction'
import { contextFor } from '@/lib/context'
import { rendererVersion } from '@/lib/render/markdown-to-html'
import { atomFeed } from '@/lib/services/feeds/atom-feed'
import { api } from '../support/api'
import { openTestRuntime, type TestRuntime } from '../support/database'
import { aMember, anAnswer, anEntry, critical } from '../support/factories'
import { testKits, testOperations } from '../support/places'

let runtime: TestRuntime
let grommet: Entry
let spar: Entry
beforeAll(async () => {
  runtime = await openTestRuntime()
  grommet = await anEntry({ title: 'Grommet hole size in the panel', parts: { doing: 'Routing a hose through the panel with a grommet.' }, tasks: ['mark-part'] })
  await anAnswer({ question: grommet, body: 'Measure the groove of the grommet you have.' })
  spar = await anEntry({ ...critical, kind: 'lesson', title: 'Ribs mixed up', parts: { happened: 'Left and right ribs look alike until they are dimpled.' } })
})
afterAll(() => runtime.close())

describe('GET /api/search', () => {
  it('finds an entry by its words, with the words marked in the snippet', async () => {
    const { body } = await api<SearchResult>('GET', '/api/search?q=grommet%20hole')
    const [hit] = body.results
    expect(hit?.id).toBe(grommet.id)
    expect(hit?.marks.map(([from, to]) => hit.snippet.slice(from, to).toLowerCase())).toContain('grommet')
  })

  it('gives the cautions of what it found', async () => {
    const { body } = await api<SearchResult>('GET', '/api/search?q=ribs')
    expect(body.results.find((h) => h.id === spar.id)?.cautions.map((c) => c.topic)).toContain('structure')
  })

  it('keeps to kit, section, operation, kind and stamped', async () => {
    const ids = async (query: string) => (await api<SearchResult>('GET', `/api/search?${query}`)).body.results.map((h: Hit) => h.id)
    expect(await ids('q=ribs&kit=whimbrel-2&section=W-3')).toEqual([spar.id])
    expect(await ids('q=ribs&kit=ouzel-3')).toEqual([])
    expect(await ids('operation=mark')).toEqual([grommet.id])
    expect(await ids('kind=lesson')).toEqual([spar.id])
    expect(await ids('q=ribs&stamped=1')).toEqual([])
  })

  it('says when it has nothing', async () => {
    const { status, body } = await api<SearchResult>('GET', '/api/search?q=zyzzyva')
    expect([status, body.total, body.results]).toEqual([200, 0, []])
  })

  it.each([
    ['limit=101', 422], ['limit=0', 422], ['limit=ten', 422], ['offset=-1', 422], ['section=W-3', 422], ['stamped=yes', 422], ['colour=red', 422],
    [`q=${'x'.repeat(501)}`, 422], ['q=%FF', 400], ['q=a&q=b', 400],
  ])('refuses ?%s', async (query, status) => {
    expect((await api('GET', `/api/search?${query}`)).status).toBe(status)
  })
})

describe('lists and small reads', () => {
  it('GET /api/suggest completes titles, with cautions', async () => {
    const { body } = await api<{ items: { id?: number; cautions: { topic: string }[] }[] }>('GET', '/api/suggest?q=ribs%20mix')
    expect(body.items.find((s) => s.id === spar.id)?.cautions.map((c) => c.topic)).toContain('structure')
    expect(body.items.length).toBeLessThanOrEqual(8)
  })

  it('GET /api/suggest gives what a shop table works out before everything else, and tables by their names', async () => {
    const items = async (q: string) => (await api<{ items: { kind: string; url: string; text: string }[] }>('GET', `/api/suggest?q=${encodeURIComponent(q)}`)).body.items
    expect((await items('grommet hole 3/8')).slice(0, 2).map((s) => [s.kind, s.url])).toEqual([['shop', '/shop/grommet?bore=3%2F8'], ['shop', '/shop/grommet?hole=3%2F8']])
    // No grommet of the list goes in a 3/8 hole: no other number stands in its place.
    expect((await items('grommet hole 3/8'))[1]?.text).toBe('a 3/8 hole that takes a grommet')
    // The torque of an AN3 stands in a source that was seen; a grommet's hole is recalled and says so.
    expect((await items('AN3 torque'))[0]?.text).not.toContain('memory')
    expect((await items('grommet hole 3/8'))[0]?.text).toContain('from memory, not checked')
    expect((await items('torq')).map((s) => s.url)).toContain('/shop/torque')
    expect((await items('ribs mix')).map((s) => s.kind)).not.toContain('shop')
  })

  it('POST /api/similar finds what may already answer it, for a visitor', async () => {
    const { status, body } = await api<{ results: Hit[] }>('POST', '/api/similar', { body: { title: 'What hole for a grommet in a panel' } })
    expect(status).toBe(200)
    expect(body.results.map((h) => h.id)).toContain(grommet.id)
  })

  it('POST /api/cautions/required names what a text must carry, for a visitor', async () => {
    const { status, body } = await api<{ cautions: { topic: string; because: string }[] }>('POST', '/api/cautions/required', { body: { body: 'Fitting.', kit: 'whimbrel-2', sections: ['W-6'] } })
    expect(status).toBe(200)
    expect(body.cautions.map((c) => c.topic)).toContain('fuel')
  })

  it('GET /api/entries walks every entry once, newest first', async () => {
    const seen: number[] = []
    for (let cursor: string | null = ''; cursor !== null;) {
      const { body }: { body: { items: Entry[]; nextCursor: string | null } } = await api('GET', `/api/entries?limit=1${cursor ? `&cursor=${cursor}` : ''}`)
      seen.push(...body.items.map((e) => e.id))
      cursor = body.nextCursor
    }
    expect(seen).toEqual([spar.id, grommet.id])
  })

  it('GET /api/entries refuses a cursor that is none of ours', async () => {
    expect((await api('GET', '/api/entries?cursor=%27%3B--')).status).toBe(422)
  })

  it('GET /api/kits and /api/kits/{kit} give sections in plan order', async () => {
    expect((await api('GET', '/api/kits')).body).toEqual({ items: testKits.map(({ slug, name, maker }) => ({ slug, name, maker })) })
    const [whimbrel] = testKits
    expect((await api('GET', '/api/kits/whimbrel-2')).body).toEqual({ ...whimbrel, sections: whimbrel.sections.map((s, position) => ({ ...s, position })) })
    expect((await api('GET', '/api/kits/heron-9')).status).toBe(404)
  })

  it('GET /api/operations gives each with its tasks', async () => {
    expect((await api('GET', '/api/operations')).body).toEqual({ items: testOperations })
  })

  it('GET /api/entries/{id} is 404 for what is not there and for what is no id', async () => {
    for (const id of ['999999', '0', '-1', 'one', '1e3', '99999999999999999999', '1%00']) expect((await api('GET', `/api/entries/${id}`)).status, id).toBe(404)
  })

  it('an answer is no entry', async () => {
    const answer = await anAnswer()
    expect((await api('GET', `/api/entries/${answer.id}`)).status).toBe(404)
  })
})

describe('GET /api/health', () => {
  it('says what serves', async () => {
    const { status, body } = await api('GET', '/api/health')
    expect(status).toBe(200)
    expect(body).toMatchObject({ status: 'ok', db: 'ok', mail: 'none', storage: 'none', search: { state: 'ready' } })
  })

  it('is 503 when the database cannot be read, and 200 again on the next one', async () => {
    const other = await openTestRuntime()
    other.database.close()
    const { status, headers, body } = await api('GET', '/api/health')
    expect([status, body.status, body.db]).toEqual([503, 'failing', 'failing'])
    expect(Number(headers.get('retry-after'))).toBeGreaterThan(0)
    await other.close()
    expect((await api('GET', '/api/health')).status).toBe(200)
  })
})

describe('what is not there', () => {
  it('answers 404 as a problem, for every method', async () => {
    for (const method of ['GET', 'POST', 'PUT', 'PATCH', 'DELETE'] as const) {
      const { status, headers } = await api(method, '/api/notices?limit=5')
      expect([status, headers.get('content-type')]).toEqual([404, 'application/problem+json'])
    }
    expect((await api('GET', '/api')).status).toBe(404)
  })

  it('answers 405 with what is allowed', async () => {
    const { status, headers } = await api('DELETE', '/api/entries')
    expect([status, headers.get('allow')]).toEqual([405, 'GET, POST'])
  })

  it('a token that is unknown is 401 also where visitors may read', async () => {
    expect((await api('GET', '/api/kits', { token: `pht_${'x'.repeat(43)}` })).status).toBe(401)
    expect((await api('GET', '/api/kits', { headers: { authorization: 'Basic d3Jlbjp3cmVu' } })).status).toBe(401)
  })

  it('says in headers how many requests are left', async () => {
    const { headers } = await api('GET', '/api/kits', { token: (await aMember()).token })
    expect(Number(headers.get('ratelimit-remaining'))).toBe(Number(headers.get('ratelimit-limit')) - 1)
  })
})

describe('GET /api/openapi.json', () => {
  it('is OpenAPI 3.1 by an outside validator', async () => {
    const { body } = await api('GET', '/api/openapi.json')
    const validator = new Validator()
    const result = await validator.validate(body)
    expect(result).toEqual({ valid: true })
    expect(validator.version).toBe('3.1')
  })

  it('names the shapes that answers share, so that a client has them once', async () => {
    const { body } = await api<{ components: { schemas: Record<string, { properties?: Record<string, unknown> }> } }>('GET', '/api/openapi.json')
    const { ShopAnswer, ShopResult, Hit } = body.components.schemas
    expect(Object.keys(body.components.schemas)).toEqual(expect.arrayContaining(['ShopAnswer', 'ShopResult', 'Measurement', 'Source', 'Hit', 'Entry', 'Caution']))
    expect(ShopAnswer?.properties?.results).toMatchObject({ items: { $ref: '#/components/schemas/ShopResult' } })
    expect(JSON.stringify(ShopResult?.properties?.source)).toContain('#/components/schemas/Source')
    expect(Hit?.properties?.balloons).toMatchObject({ type: 'array', items: { type: 'integer' } })
  })

  it('describes every route there is', async () => {
    const folder = path.join(process.cwd(), 'app', 'api')
    const files = readdirSync(folder, { recursive: true, encoding: 'utf8' }).filter((f) => path.basename(f) === 'route.ts' && !f.startsWith('auth') && !f.startsWith('[[...path]]'))
    const addresses = files.map((f) => `/api/${path.dirname(f)}`.replaceAll('[', '{').replaceAll(']', '}')).sort()
    const { body } = await api<{ paths: object }>('GET', '/api/openapi.json')
    expect(Object.keys(body.paths).sort()).toEqual(addresses)
    expect(Object.keys(allRoutes).length).toBe(addresses.length - 1)
  })
})

describe('a text that an older renderer laid out', () => {
  it('is laid out anew when it is read, with its sizes dressed, and kept', async () => {
    const lesson = await anEntry({ kind: 'lesson', title: 'Pilot holes', parts: { happened: 'Drilled 7/32 from the edge.' } })
    const kept = () => runtime.database.reader.select().from(rendering).where(eq(rendering.key, renderingKey(lesson.id, 1)))
    const [first] = await kept()
    await writeQuietly(runtime.database, (tx) => tx.update(rendering).set({ renderer: rendererVersion - 1, html: { happened: '<p>old</p>' } }).where(eq(rendering.key, first!.key)))
    const { body } = await api<Entry>('GET', `/api/entries/${lesson.id}`)
    expect(body.html).toMatch(/<span class="measure [^>]*>.*7\/32.*5\.56\u00a0mm/)
    expect(body.text).toContain('Drilled 7/32 from the edge.')
    expect((await kept())[0]).toMatchObject({ renderer: rendererVersion, html: { happened: first!.html['happened'] } })
  })

  it('goes into a feed without the form that only our pages show', async () => {
    await anEntry({ kind: 'lesson', title: 'Last hole', parts: { happened: 'Open it to 7/32.' } })
    const xml = await atomFeed(await contextFor(null), {}, { title: 't', page: 'http://a.example', self: 'http://a.example/feed.atom', baseUrl: 'http://a.example' })
    expect(xml).toContain('7/32')
    expect(xml).not.toContain('measure-lead')
  })
})
