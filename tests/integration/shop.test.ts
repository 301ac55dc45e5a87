// Shop tables and measurements over HTTP, through the real handlers; each answer is checked against its schema by the caller.
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import type { MeasurementsResult } from '@/lib/schemas/measurement'
import type { ShopAnswer, ShopList } from '@/lib/schemas/shop'
import { api } from '../support/api'
import { openTestRuntime, type TestRuntime } from '../support/database'

let runtime: TestRuntime
beforeAll(async () => { runtime = await openTestRuntime() })
afterAll(() => runtime.close())

const ask = (table: string, query: Record<string, string> = {}) => api<ShopAnswer>('GET', `/api/shop/${table}?${new URLSearchParams(query)}`)
const refused = async (table: string, query: Record<string, string>) => {
  const { status, body } = await api('GET', `/api/shop/${table}?${new URLSearchParams(query)}`)
  return { status, errors: body.errors as { path: string; message: string }[] }
}
const named = (answer: ShopAnswer, name: string) => answer.results.filter((result) => result.name === name)

describe('GET /api/shop', () => {
  it('lists every table with inputs, units, limits and results', async () => {
    const { status, body } = await api<ShopList>('GET', '/api/shop')
    expect(status).toBe(200)
    expect(body.items.map(({ slug }) => slug)).toEqual(['drills', 'rivet', 'countersink-or-dimple', 'bolt', 'torque', 'grommet', 'bend', 'tube', 'wire', 'units'])
    const grommet = body.items.find(({ slug }) => slug === 'grommet')
    expect(grommet?.inputs[0]).toMatchObject({ name: 'bore', unit: 'in', kind: 'length', min: 0.05, max: 4 })
    expect(grommet?.results[0]).toMatchObject({ name: 'hole', unit: 'in' })
    expect(body.items.find(({ slug }) => slug === 'rivet')?.inputs.find(({ name }) => name === 'diameter')?.options).toContain('1/8')
  })

  it('names the inputs and results that the tables then take and give', async () => {
    const { body } = await api<ShopList>('GET', '/api/shop')
    for (const { slug, inputs, results } of body.items) {
      const query = Object.fromEntries(inputs.flatMap(({ name, default: standing }) => (standing === null ? [] : [[name, standing]])))
      const answer = await ask(slug, query)
      expect(answer.status, slug).toBe(200)
      for (const { name } of answer.body.results) expect(results.map((each) => each.name), slug).toContain(name)
    }
  })

  it('takes no query', async () => {
    expect((await api('GET', '/api/shop?kind=rivet')).status).toBe(422)
  })
})

describe('GET /api/shop/{table}', () => {
  it('answers a grommet for a 3/8 bore: AN931-6-10 counts in sixteenths, so the hole is 10/16', async () => {
    const { body } = await ask('grommet', { bore: '3/8' })
    const [hole] = named(body, 'hole')
    expect(hole).toMatchObject({ value: { number: 0.625, label: '5/8' }, unit: 'in', display: { inch: '5/8 in', metric: '15.88 mm' }, basis: 'memory', label: 'Hole in the sheet' })
    expect(hole?.note).toContain('from memory, not checked against the standard')
    expect(hole?.note).toContain('only where the plans show one; measure the part in hand')
    expect(body).toMatchObject({ table: 'grommet', inputs: { bore: 0.375 }, alternatives: [], url: '/shop/grommet?bore=3%2F8', readAs: 'Grommet holes: bore, the side of the wire 3/8 in' })
  })

  it('answers the torque of AN3: 20 to 25 in-lb, AC 43.13-1B Table 7-1', async () => {
    const { body } = await ask('torque', { thread: 'AN3' })
    expect(named(body, 'torque')[0]).toMatchObject({ value: { min: 20, max: 25 }, unit: 'lbf-in', basis: 'seen', source: { title: 'FAA AC 43.13-1B (with Change 1)' } })
  })

  it('lists sources that differ side by side', async () => {
    const { body } = await ask('tube', { size: '-6', joint: 'aluminium' })
    const torques = named(body, 'torque')
    expect(new Set(torques.map(({ source }) => source?.title)).size).toBe(2)
    expect(new Set(torques.map(({ display }) => display.inch)).size).toBe(2)
  })

  it('takes the same length in inches and millimetres', async () => {
    expect((await ask('grommet', { bore: '9.525 mm' })).body.results).toEqual((await ask('grommet', { bore: '3/8' })).body.results)
  })

  it('carries the cautions of its table, critical ones with both stamps', async () => {
    const { body } = await ask('rivet')
    expect(body.cautions.map(({ topic }) => topic)).toEqual(['structure', 'eyes', 'hearing', 'sharp-edges'])
    expect(body.cautions[0]).toMatchObject({ signalWord: 'WARNING', twoStamps: true, origin: 'rule', because: 'shop table: Rivet and hole' })
    expect((await ask('bend')).body.cautions.map(({ code }) => code)).not.toContain('pinch-load')
  })

  it('gives a link that answers the same', async () => {
    const { body } = await ask('rivet', { diameter: '5/32', stack: '0.1', edge: '0.3' })
    const again = await api<ShopAnswer>('GET', `/api${body.url}`)
    expect(again.body).toEqual(body)
  })

  it('has no value where the table ends, and says so', async () => {
    const [torque] = named((await ask('torque', { thread: '1-12' })).body, 'torque')
    expect(torque?.value).toEqual({})
    expect(torque?.note).toContain('ask the kit maker')
  })

  it.each([
    ['grommet', { bore: '0' }, 'bore'], ['grommet', { bore: '-3' }, 'bore'], ['grommet', { bore: '400' }, 'bore'], ['grommet', { bore: '3/8 kg' }, 'bore'], ['grommet', { bore: '' }, 'bore'],
    ['grommet', { bore: '3/0' }, 'bore'], ['grommet', { part: 'AN931-9-3' }, 'part'], ['grommet', { colour: 'red' }, 'colour'], ['rivet', { diameter: '1/7' }, 'diameter'],
    ['torque', { extension: '4' }, 'lever'], ['units', { from: 'in', to: 'psi' }, 'to'], ['wire', { current: '9'.repeat(500) }, 'current'],
  ])('refuses %s with %o at its field', async (table, query, path) => {
    const { status, errors } = await refused(table, query)
    expect(status).toBe(422)
    expect(errors.map((error) => error.path)).toEqual([path])
    expect(errors[0]?.message.length).toBeGreaterThan(20)
  })

  it('names every field that is wrong at once', async () => {
    expect((await refused('rivet', { stack: '-1', edge: 'wide' })).errors.map(({ path }) => path)).toEqual(['stack', 'edge'])
  })

  it.each(['nothing', '__proto__', 'constructor', 'Grommet'])('does not know the table %s', async (table) => {
    expect((await ask(table)).status).toBe(404)
  })

  it('does not take a key twice, nor a body', async () => {
    expect((await api('GET', '/api/shop/grommet?bore=1&bore=2')).status).toBe(400)
    expect((await api('POST', '/api/shop/grommet', { body: {} })).status).toBe(405)
  })
})

describe('POST /api/measurements', () => {
  const find = (text: unknown) => api<MeasurementsResult>('POST', '/api/measurements', { body: { text } })

  it('finds what a builder wrote, with its place in the text, for a visitor too', async () => {
    const text = 'I drilled #30 for the 1/8 rivet, 20-25 in-lb.'
    const { status, body } = await find(text)
    expect(status).toBe(200)
    expect(body.measurements.map(({ kind }) => kind)).toEqual(['drill', 'length', 'torque'])
    for (const { raw, start, end } of body.measurements) expect(text.slice(start, end)).toBe(raw)
    expect(body.measurements[0]).toMatchObject({ exact: '#30', inches: 0.1285 })
    expect(body.measurements[2]).toMatchObject({ value: 20, max: 25, unit: 'in-lb', si: { unit: 'N·m' } })
  })

  it('finds nothing in nothing', async () => {
    expect((await find('')).body).toEqual({ measurements: [] })
  })

  it.each([[7], [null], ['x'.repeat(80_001)]])('refuses what is no text, or too long (%#)', async (text) => {
    expect((await find(text)).status).toBe(422)
  })
})
