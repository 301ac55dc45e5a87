// The kit maker's own limits through the real handlers: who enters and ends them, what is refused, and that they win and are named in the
// shop answer, in search and in the numbers check, until they are ended.
import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest'
import type { KitLimit, KitLimitList } from '@/lib/schemas/kit-limits'
import type { NumbersCheckItem } from '@/lib/schemas/numbers-check'
import type { SearchResult } from '@/lib/schemas/search'
import type { ShopAnswer } from '@/lib/schemas/shop'
import { loadSheet } from '@/lib/services/desk/load-sheet'
import { getEntryPage } from '@/lib/services/entries/get-entry-page'
import { api } from '../support/api'
import { openTestRuntime, type TestRuntime } from '../support/database'
import { aKit, aMember, aMentor, anAnswer, anEntry, type Somebody } from '../support/factories'

let runtime: TestRuntime
let steward: Somebody
let kit: string
beforeAll(async () => {
  runtime = await openTestRuntime()
  steward = await aMember({ role: 'steward' })
})
afterAll(() => runtime.close())
// Each test has a kit of its own, so that no limit of another test holds.
beforeEach(async () => { kit = (await aKit()).slug })

const reference = { title: 'Bulletin SB-07', section: 'page 2, step 4', year: '14 Mar 2026' }
// AC 43.13-1B, Table 7-1: 20 to 25 in-lb for 10-32 with a tension nut, so that 28 to 32 is the maker's own.
const torque = { table: 'torque', result: 'torque', inputs: { thread: 'AN3', nut: 'tension' }, value: { min: '28', max: '32' }, reference }
const enter = (body: object, token = steward.token) => api('POST', `/api/kits/${kit}/limits`, { token, body })
/** Enters it, with the sentence sent back where it is less safe than the handbook's. */
async function entered(body: object): Promise<KitLimit> {
  const first = await enter(body)
  const warning = (first.body.errors as { path: string; message: string }[] | undefined)?.find(({ path }) => path === 'lessSafe')?.message
  const { status, body: made } = warning === undefined ? first : await enter({ ...body, lessSafe: warning })
  expect(status, JSON.stringify(made)).toBe(201)
  return made as KitLimit
}
const end = (id: number, token = steward.token, reason = 'Replaced by SB-12.') => api('POST', `/api/kits/${kit}/limits/${id}/end`, { token, body: { reason } })
const list = async () => (await api<KitLimitList>('GET', `/api/kits/${kit}/limits`)).body
const ask = async (table: string, query: Record<string, string>) => (await api<ShopAnswer>('GET', `/api/shop/${table}?${new URLSearchParams(query)}`)).body
const check = async (text: string, named: string | undefined = kit) => (await api<{ checks: NumbersCheckItem[] }>('POST', '/api/numbers-check', { body: { text, ...(named ? { kit: named } : {}) } })).body.checks[0]
const auditOf = async (id: number) => (await runtime.database.client.execute({ sql: 'select verb, actor_id from audit where subject = ? order by sequence', args: [`limit:${id}`] })).rows.map((row) => [row['verb'], row['actor_id']])

describe('Entering a limit', () => {
  it('keeps it exactly, with who, when and the reference, on the audit trail', async () => {
    const made = await entered({ table: 'rivet', result: 'edge-centre', inputs: { diameter: '0.125' }, value: { min: '8' }, unit: 'mm', reference, note: 'All ribs.' })
    // 8 mm is 8 / 25.4 in (an inch is 25.4 mm exactly, NIST SP 811).
    expect(made).toMatchObject({ label: 'Edge, from the centre of the hole', holdsFor: 'rivet diameter 1/8 in', inputs: { diameter: '1/8' }, unit: 'in', display: { inch: 'at least 0.315 in', metric: 'at least 8.00 mm' }, reference, note: 'All ribs.', enteredBy: { id: steward.id, name: steward.name } })
    expect(made.value.min).toBeCloseTo(8 / 25.4, 12)
    expect((await list()).items).toEqual([made])
    expect(await auditOf(made.id)).toEqual([['limit.enter', steward.id]])
  })

  it('is a steward’s: others are refused, and nothing is kept', async () => {
    for (const person of [await aMember(), await aMentor(), await aMember({ role: 'moderator' })]) expect((await enter(torque, person.token)).status).toBe(403)
    expect((await api('POST', `/api/kits/${kit}/limits`, { body: torque })).status).toBe(401)
    expect(await list()).toEqual({ items: [], ended: [] })
  })

  it('says of every field what is wrong with it', async () => {
    const wrongIn = async (body: object) => {
      const { status, body: problem } = await enter({ ...torque, ...body })
      expect(status).toBe(422)
      return (problem.errors as { path: string; message: string }[]).map(({ path, message }) => { expect(message).toMatch(/[.:]/); return path })
    }
    expect(await wrongIn({ table: 'nothing' })).toEqual(['table'])
    expect(await wrongIn({ result: 'nothing' })).toEqual(['result'])
    expect(await wrongIn({ inputs: { thread: 'M5', bolt: '3' } })).toEqual(['inputs.bolt', 'inputs.thread'])
    expect(await wrongIn({ value: {} })).toEqual(['value.number'])
    expect(await wrongIn({ value: { min: '-3', max: 'many' } })).toEqual(['value.min', 'value.max'])
    expect(await wrongIn({ value: { min: '30', max: '20' } })).toEqual(['value.max'])
    expect(await wrongIn({ unit: 'mm' })).toEqual(['unit'])
    expect(await wrongIn({ reference: { title: ' ', section: '', year: 'spring' } })).toEqual(['reference.title', 'reference.section', 'reference.year'])
    expect(await wrongIn({ note: 'x'.repeat(501) })).toEqual(['note'])
    expect(await wrongIn({ colour: 'red' })).toHaveLength(1)
    expect((await api('POST', '/api/kits/nothing/limits', { token: steward.token, body: { ...torque, value: { min: '21', max: '24' } } })).status).toBe(404)
    expect((await api('GET', '/api/kits/nothing/limits')).status).toBe(404)
  })

  it('that is less safe than the handbook’s is told so, and kept only when that sentence comes back', async () => {
    const refused = await enter(torque)
    expect(refused.status).toBe(422)
    expect(refused.body.errors).toMatchObject([{ path: 'lessSafe', message: expect.stringContaining('28 to 32 in-lb allows more than the handbook’s 20 to 25 in-lb') }])
    expect((await enter({ ...torque, lessSafe: 'yes' })).status).toBe(422)
    // The sentence of another value is no consent to this one.
    expect((await enter({ ...torque, value: { min: '38', max: '42' }, lessSafe: refused.body.errors[0].message })).status).toBe(422)
    expect((await list()).items).toEqual([])
    expect((await enter({ ...torque, lessSafe: refused.body.errors[0].message })).status).toBe(201)
  })

  it('twice for the same result and inputs, however spelled, is a conflict until the first is ended', async () => {
    const { id } = await entered(torque)
    const again = { ...torque, inputs: { thread: '10-32', nut: 'AN310' } }
    const refused = await enter(again)
    expect([refused.status, refused.body.current]).toEqual([409, { id }])
    expect((await end(id)).status).toBe(200)
    await entered(again)
  })
})

describe('Ending a limit', () => {
  it('needs a reason and a steward, happens once, and stays on record', async () => {
    const { id } = await entered(torque)
    expect((await end(id, (await aMember({ role: 'moderator' })).token)).status).toBe(403)
    expect((await end(id, steward.token, ' ')).body.errors).toMatchObject([{ path: 'reason' }])
    expect((await api('POST', `/api/kits/whimbrel-2/limits/${id}/end`, { token: steward.token, body: { reason: 'Another kit.' } })).status).toBe(404)
    expect((await end(id)).status).toBe(200)
    expect((await end(id)).status).toBe(409)
    const { items, ended } = await list()
    expect(items).toEqual([])
    expect(ended).toMatchObject([{ id, ended: { reason: 'Replaced by SB-12.' } }])
    expect((await auditOf(id)).map(([verb]) => verb)).toEqual(['limit.enter', 'limit.end'])
  })
})

describe('A limit in force', () => {
  it('comes first in the shop answer and is named; the handbook’s stays below, and the link keeps the kit', async () => {
    const { id } = await entered(torque)
    const first = async (query: Record<string, string>) => (await ask('torque', query)).results[0]
    expect(await first({ thread: '10-32', kit })).toMatchObject({ basis: 'maker', value: { min: 28, max: 32 }, source: { title: 'Saltmarsh Aircraft: Bulletin SB-07', section: 'page 2, step 4' } })
    const answer = await ask('torque', { thread: '10-32', kit })
    expect(answer.results[1]).toMatchObject({ name: 'torque', basis: 'seen', value: { min: 20, max: 25 }, note: expect.stringContaining('the kit maker’s own limit wins') })
    expect(new URL(answer.url, 'http://localhost').searchParams.get('kit')).toBe(kit)
    const elsewhere: Record<string, string>[] = [{ thread: '10-32' }, { thread: '1/4-28', kit }, { thread: '10-32', nut: 'shear', kit }]
    for (const query of elsewhere) expect(await first(query), JSON.stringify(query)).not.toMatchObject({ basis: 'maker' })
    await end(id)
    expect(await first({ thread: '10-32', kit })).toMatchObject({ basis: 'seen' })
  })

  it('of a kit that is not there is refused in words, by the table and by the check', async () => {
    expect((await api('GET', '/api/shop/torque?kit=nothing')).body.errors).toMatchObject([{ path: 'kit' }])
    expect((await api('POST', '/api/numbers-check', { body: { text: 'AN3 at 30 in-lb.', kit: 'nothing' } })).body.errors).toMatchObject([{ path: 'kit' }])
  })

  it('comes first in what search computes for that kit, and not without it', async () => {
    const { id } = await entered(torque)
    const computed = async (query: string) => (await api<SearchResult>('GET', `/api/search?q=AN3+torque${query}`)).body.computed[0]
    expect((await computed(`&kit=${kit}`))?.results[0]).toMatchObject({ basis: 'maker', source: { title: 'Saltmarsh Aircraft: Bulletin SB-07' } })
    expect((await computed(`&kit=${kit}`))?.url).toContain(`kit=${kit}`)
    expect((await computed(''))?.results.map(({ basis }) => basis)).not.toContain('maker')
    await end(id)
    expect((await computed(`&kit=${kit}`))?.results.map(({ basis }) => basis)).not.toContain('maker')
  })

  it('allows in the numbers check what no handbook does, for that kit and that size', async () => {
    const { id } = await entered({ ...torque, inputs: { thread: '10-32' } })
    expect(await check('AN3 at 30 in-lb.', '')).toMatchObject({ verdict: 'conflicts' })
    expect(await check('AN3 at 30 in-lb.')).toMatchObject({ verdict: 'agrees', basis: 'maker', source: { title: 'Saltmarsh Aircraft: Bulletin SB-07' } })
    expect(await check('AN5 with a full nut at 30 in-lb.')).toMatchObject({ verdict: 'conflicts' })
    await end(id)
    expect(await check('AN3 at 30 in-lb.')).toMatchObject({ verdict: 'conflicts' })
  })

  it('stands behind the sheet, the desk and the stamp of an entry of that kit', async () => {
    const { id } = await entered({ ...torque, inputs: { thread: '10-32' } })
    const question = await anEntry({ kit, sections: ['S-1'] })
    const answer = await anAnswer({ question, body: 'Turn the AN3 bolts to 30 in-lb.' })
    const mentor = await aMentor()
    const verdicts = async () => {
      const context = await mentor.context()
      if (!context.actor) throw new Error('nobody')
      const [page, sheet] = [await getEntryPage(context, question.id), await loadSheet({ ...context, actor: context.actor }, question.id, answer.id)]
      return [page.rights.get(answer.id)?.checks[0]?.verdict, sheet?.checks[0]?.verdict]
    }
    const stamp = (by: Somebody) => api('POST', `/api/posts/${answer.id}/stamps`, { token: by.token, body: { revision: 'A', basis: 'standard', reference: 'Bulletin SB-07' } })
    expect(await verdicts()).toEqual(['agrees', 'agrees'])
    expect((await stamp(mentor)).status).toBe(201)
    await end(id)
    expect(await verdicts()).toEqual(['conflicts', 'conflicts'])
    expect((await stamp(await aMentor())).body.errors).toMatchObject([{ path: 'conflictReason' }])
  })

  it('in diameters is worked out for the rivet asked for', async () => {
    await entered({ table: 'rivet', result: 'edge-centre', value: { min: '3' }, unit: 'D', reference })
    // 3 × 5/32.
    expect((await ask('rivet', { diameter: '5/32', kit })).results.find(({ name }) => name === 'edge-centre')).toMatchObject({ basis: 'maker', value: { min: 0.46875 }, display: { inch: 'at least 15/32 in' }, how: 'at least 3 D' })
  })
})
