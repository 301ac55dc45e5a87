// A member's own build through the handlers: private to its owner, kept once, refused in sentences, gone with the account.
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { eq } from 'drizzle-orm'
import { build, closingAnswer, closingItem, hold, member, section, visit, workSession } from '@/db/schema'
import { write } from '@/db/transaction'
import { hashPassword } from '@/lib/auth/password'
import { ownOrigin } from '@/lib/http/own-origin'
import type { Method } from '@/lib/http/route'
import { addFinding } from '@/lib/services/builds/add-finding'
import { getHoldTags } from '@/lib/services/builds/get-hold-tags'
import { getVisit } from '@/lib/services/builds/get-visit'
import { listVisits } from '@/lib/services/builds/list-visits'
import { makeVisit } from '@/lib/services/builds/make-visit'
import { openHold } from '@/lib/services/builds/open-hold'
import { revokeVisit } from '@/lib/services/builds/revoke-visit'
import { closeAccount } from '@/lib/services/people/close-account'
import { contextFor, type AppContext } from '@/lib/context'
import { getSectionPage } from '@/lib/services/kits/get-section-page'
import { api } from '../support/api'
import { openTestRuntime, type TestRuntime } from '../support/database'
import { aMember, anEntry, type Somebody } from '../support/factories'

let runtime: TestRuntime
let owner: Somebody
let id: number
beforeAll(async () => {
  runtime = await openTestRuntime()
  owner = await aMember({ name: 'Marit Osei' })
  id = await aBuild(owner)
})
afterAll(() => runtime.close())

const aBuild = async (by: Somebody): Promise<number> => (await api('POST', '/api/builds', { token: by.token, body: { kit: 'whimbrel-2', name: 'Sandpiper', serial: 'SN-0388' } })).body.id
let made = 0
const key = () => `key-0000-${++made}`
const as = (method: Method, path: string, body?: unknown, by: Somebody | null = owner) => api(method, path, { ...(by ? { token: by.token } : {}), ...(body === undefined ? {} : { body }) })
const logLine = (over: object = {}) => ({ key: key(), day: '2026-03-09', minutes: 150, ...over })
const aHold = (over: object = {}) => ({ key: key(), kind: 'hold', what: 'Rib 7, hole 3: do not rivet', page: 'W3-2', step: '6', until: 'the kit maker’s written reply', ...over })
const sectionOf = async (code: string) => (await as('GET', `/api/builds/${id}/sections/${code}`)).body

/** Whether each corner (top left, top right, bottom left, bottom right) has the finder pattern of ISO/IEC 18004, 5.3.3: a ring of 7, a gap, a block of 3. */
function finderCorners({ size, path }: { size: number; path: string }): boolean[] {
  const dark = new Set([...path.matchAll(/M(\d+) (\d+)h1v1h-1z/g)].map(([, x, y]) => `${x},${y}`))
  const isFinder = (left: number, top: number) => Array.from({ length: 49 }, (_, i) => [i % 7, Math.floor(i / 7)] as const)
    .every(([x, y]) => dark.has(`${left + x},${top + y}`) === (Math.max(Math.abs(x - 3), Math.abs(y - 3)) !== 2))
  return [[0, 0], [size - 7, 0], [0, size - 7], [size - 7, size - 7]].map(([x = 0, y = 0]) => isFinder(x, y))
}

describe('an address on paper', () => {
  it('begins where the request came to, and a host that is none does not count', () => {
    expect(ownOrigin(new Headers({ host: '192.168.1.20:3000' }))).toBe('http://192.168.1.20:3000')
    expect(ownOrigin(new Headers({ host: 'garage.example', 'x-forwarded-proto': 'https' }))).toBe('http://garage.example')
    expect(ownOrigin(new Headers({ host: 'not a host' }))).toBe('http://localhost:3000')
    expect(ownOrigin(new Headers())).toBe('http://localhost:3000')
  })
})

describe('a build', () => {
  it('has the kit’s sections in plan order, none begun', async () => {
    const other = await aMember()
    const { body, status, headers } = await as('POST', '/api/builds', { kit: 'whimbrel-2', name: 'G-TEST' }, other)
    expect([status, headers.get('location')]).toEqual([201, `/api/builds/${body.id}`])
    expect(body.sections.map((s: { code: string; state: string }) => [s.code, s.state])).toEqual([['W-1', 'not-begun'], ['W-3', 'not-begun'], ['W-6', 'not-begun'], ['X-1', 'not-begun']])
    expect(body.states).toEqual({ 'not-begun': 4, 'in-work': 0, waiting: 0, done: 0 })
    expect((await as('GET', '/api/builds', undefined, other)).body.items.map((b: { id: number }) => b.id)).toEqual([body.id])
  })

  it('adds up hours and open holds, by section and in all', async () => {
    const by = await aMember()
    const own = await aBuild(by)
    await as('POST', `/api/builds/${own}/sections/W-1/log`, logLine({ minutes: 100 }), by)
    await as('POST', `/api/builds/${own}/sections/W-1/log`, logLine({ minutes: 50 }), by)
    await as('POST', `/api/builds/${own}/sections/W-3/log`, logLine({ minutes: 30 }), by)
    await as('POST', `/api/builds/${own}/sections/W-3/holds`, aHold(), by)
    await as('POST', `/api/builds/${own}/sections/W-3/holds`, aHold({ kind: 'left-open', until: '', untilSection: 'W-6' }), by)
    const { body } = await as('GET', `/api/builds/${own}`, undefined, by)
    expect([body.minutes, body.openHolds, body.leftOpen.length]).toEqual([180, 1, 1])
    expect(body.sections.map((s: { code: string; minutes: number; openHolds: number }) => [s.code, s.minutes, s.openHolds])).toEqual([['W-1', 150, 0], ['W-3', 30, 1], ['W-6', 0, 0], ['X-1', 0, 0]])
  })

  it('is set in work by its first log line, and stays where it was put', async () => {
    await as('POST', `/api/builds/${id}/sections/X-1/log`, logLine())
    expect((await sectionOf('X-1')).state).toBe('in-work')
    expect((await as('PATCH', `/api/builds/${id}/sections/X-1`, { state: 'done' })).body.state).toBe('done')
    await as('POST', `/api/builds/${id}/sections/X-1/log`, logLine())
    expect((await sectionOf('X-1')).state).toBe('done')
  })
})

describe('the page of a kit’s section', () => {
  it('leads to one’s own section, and nobody to another’s', async () => {
    const at = async (context: AppContext, kit = 'whimbrel-2', code = 'W-3') => (await getSectionPage(context, kit, code))?.buildId
    expect(await at(await owner.context())).toBe(id)
    expect(await at(await owner.context(), 'ouzel-3', '42')).toBeNull()
    expect(await at(await (await aMember()).context())).toBeNull()
    expect(await at(await contextFor(null))).toBeNull()
  })
})

describe('the log', () => {
  it('keeps a line once, however often its key is sent', async () => {
    const line = logLine({ line: 'Ribs 1 to 6.' })
    const [first, second] = [await as('POST', `/api/builds/${id}/sections/W-1/log`, line), await as('POST', `/api/builds/${id}/sections/W-1/log`, line)]
    expect([first.status, second.status, second.body]).toEqual([201, 201, first.body])
    expect(await runtime.database.reader.select().from(workSession).where(eq(workSession.key, line.key))).toHaveLength(1)
  })

  it('counts a shift over midnight, and stands newest day first', async () => {
    const by = await aMember()
    const own = await aBuild(by)
    const { minutes: _minutes, ...line } = logLine({ day: '2026-03-07', start: '22:30', stop: '01:15' })
    expect((await as('POST', `/api/builds/${own}/sections/W-1/log`, line, by)).body.minutes).toBe(165)
    await as('POST', `/api/builds/${own}/sections/W-1/log`, logLine({ day: '2026-03-09' }), by)
    await as('POST', `/api/builds/${own}/sections/W-1/log`, logLine({ day: '2026-03-08' }), by)
    const { body } = await as('GET', `/api/builds/${own}/sections/W-1`, undefined, by)
    expect(body.log.map((l: { day: string }) => l.day)).toEqual(['2026-03-09', '2026-03-08', '2026-03-07'])
  })

  it('is corrected line by line', async () => {
    const { body } = await as('POST', `/api/builds/${id}/sections/W-1/log`, logLine({ line: 'Wrong.' }))
    const changed = await as('PATCH', `/api/builds/${id}/log/${body.id}`, { day: '2026-03-10', hours: '1:15', line: 'Right.' })
    expect([changed.status, changed.body.minutes, changed.body.line, changed.body.key]).toEqual([200, 75, 'Right.', body.key])
    expect((await as('GET', `/api/builds/${id}/log/${body.id}`)).body).toEqual(changed.body)
    expect((await as('PATCH', `/api/builds/${id}/log/999999`, { day: '2026-03-10', minutes: 5 })).status).toBe(404)
  })

  it.each<[string, object, string, RegExp]>([
    ['no hours', { minutes: undefined }, 'hours', /hours, or when you started/],
    ['two ways at once', { hours: '2' }, 'hours', /either/],
    ['hours that nobody can read', { minutes: undefined, hours: 'all evening' }, 'hours', /2\.5 or 2:30/],
    ['a start without a stop', { minutes: undefined, start: '19:30' }, 'stop', /when you stopped/],
    ['no time between', { minutes: undefined, start: '19:30', stop: '19:30' }, 'stop', /two different times/],
    ['more than a day', { minutes: 1441 }, 'minutes', /24 hours/],
    ['a day that is none', { day: '2026-02-30' }, 'day', /such as 2026-03-09/],
    ['a day to come', { day: '2999-01-01' }, 'day', /still to come/],
    ['a short key', { key: 'short' }, 'key', /8 to 64/],
    ['a long line', { line: 'x'.repeat(301) }, 'line', /300 characters/],
    ['control characters', { line: 'a\u0007b' }, 'line', /Control characters/],
  ])('refuses %s in a sentence', async (_what, over, path, sentence) => {
    const { status, body } = await as('POST', `/api/builds/${id}/sections/W-1/log`, logLine(over))
    expect(status).toBe(422)
    expect(body.errors.map((e: { path: string }) => e.path)).toEqual([path])
    expect(body.errors[0].message).toMatch(sentence)
  })
})

describe('a hold', () => {
  it('is made once by its key, released once with its note, and stays to be read', async () => {
    const wanted = aHold({ notWaiting: 'Ribs 9 to 14' })
    const [first, second] = [await as('POST', `/api/builds/${id}/sections/W-3/holds`, wanted), await as('POST', `/api/builds/${id}/sections/W-3/holds`, wanted)]
    expect([first.status, second.body]).toEqual([201, first.body])
    expect(first.body).toMatchObject({ number: 'H-001', until: 'the kit maker’s written reply', notWaiting: 'Ribs 9 to 14', released: null })
    const at = `/api/builds/${id}/holds/${first.body.id}`
    const released = await as('POST', `${at}/release`, { note: 'Saltmarsh wrote on 9 March.' })
    expect(released.body.released.note).toBe('Saltmarsh wrote on 9 March.')
    expect((await as('POST', `${at}/release`, { note: 'Again.' })).body).toEqual(released.body)
    expect((await as('GET', at)).body).toEqual(released.body)
    expect((await sectionOf('W-3')).holds.map((h: { id: number }) => h.id)).toContain(first.body.id)
  })

  it('left open on purpose shows on the section it waits for, until it is released', async () => {
    const { body } = await as('POST', `/api/builds/${id}/sections/W-3/holds`, aHold({ kind: 'left-open', what: 'Rib 12, last two holes', until: '', untilSection: 'W-6' }))
    expect(body).toMatchObject({ kind: 'left-open', until: 'section W-6', untilSection: 'W-6' })
    const shown = async () => (await sectionOf('W-6')).openUntilHere.map((h: { id: number }) => h.id)
    expect(await shown()).toEqual([body.id])
    await as('POST', `/api/builds/${id}/holds/${body.id}/release`, { note: 'Riveted.' })
    expect(await shown()).toEqual([])
  })

  it.each<[string, object, string]>([
    ['nothing held', { what: '  ' }, 'what'], ['nothing that releases it', { until: '' }, 'until'], ['an unknown kind', { kind: 'pause' }, 'kind'],
    ['left open until nowhere', { kind: 'left-open' }, 'untilSection'], ['left open until a section that is not there', { kind: 'left-open', untilSection: 'Z-9' }, 'untilSection'],
    ['left open until itself', { kind: 'left-open', untilSection: 'W-3' }, 'untilSection'], ['a hold that waits for a section', { untilSection: 'W-6' }, 'untilSection'],
  ])('refuses %s', async (_what, over, path) => {
    const { status, body } = await as('POST', `/api/builds/${id}/sections/W-3/holds`, aHold(over))
    expect([status, body.errors.map((e: { path: string }) => e.path)]).toEqual([422, [path]])
    expect(body.errors[0].message).toMatch(/[a-z]/)
  })

  it('is not released without saying what released it', async () => {
    const { body } = await as('POST', `/api/builds/${id}/sections/W-3/holds`, aHold())
    expect((await as('POST', `/api/builds/${id}/holds/${body.id}/release`, { note: ' ' })).status).toBe(422)
  })

  it('opens by the code on its tag for its owner, and tells nobody else anything', async () => {
    const { body } = await as('POST', `/api/builds/${id}/sections/W-3/holds`, aHold())
    const { tags } = await getHoldTags(await owner.context(), id, body.id, 'https://hangar.example')
    expect(tags).toHaveLength(1)
    expect(tags[0]!.address).toBe(`https://hangar.example${body.url}`)
    const code = body.url.split('/').at(-1)
    expect(finderCorners(tags[0]!.code)).toEqual([true, true, true, false])
    expect(await openHold(await owner.context(), code)).toMatchObject({ hold: { id: body.id }, build: { id } })
    const moderator = await aMember({ role: 'moderator' })
    for (const context of [await contextFor(null), await moderator.context()]) expect(await openHold(context, code)).toBe('somebody’s')
    for (const wrong of ['', 'x', code.slice(1), `${code.slice(0, -1)}${code.endsWith('A') ? 'B' : 'A'}`, '../builds']) await expect(openHold(await owner.context(), wrong)).rejects.toMatchObject({ code: 'not-found' })
  })
})

describe('the closing list', () => {
  it('takes a tick with a note, or a reason, and refuses neither', async () => {
    const item = await write(runtime.database, { actorId: null, at: 1 }, async (tx, record) => {
      const [place] = await tx.select().from(section).where(eq(section.code, 'W-3'))
      const [row] = await tx.insert(closingItem).values({ sectionId: place!.id, position: 0, text: 'Every shop head in the nose looked at', origin: 'plans', createdAt: 1 }).returning()
      record('closing.test', 'item:1')
      return row!.id
    })
    const answerOf = async () => (await sectionOf('W-3')).closing[0].answer
    expect(await answerOf()).toBeNull()
    expect((await as('PUT', `/api/builds/${id}/closing/${item}`, { isDone: false })).status).toBe(422)
    expect((await as('PUT', `/api/builds/${id}/closing/${item}`, { isDone: false, note: 'Mirror is lent out.' })).status).toBe(204)
    expect((await as('PUT', `/api/builds/${id}/closing/${item}`, { isDone: true, note: '' })).status).toBe(204)
    expect(await answerOf()).toMatchObject({ isDone: true, note: '' })
    expect(await runtime.database.reader.select().from(closingAnswer).where(eq(closingAnswer.closingItemId, item))).toHaveLength(1)
    expect((await as('PUT', `/api/builds/${id}/closing/999999`, { isDone: true })).status).toBe(404)
  })
})

describe('what I go by', () => {
  it('stands on its section with its cautions, and says when it was changed since', async () => {
    const lesson = await anEntry({ kind: 'lesson', sections: ['W-3'] })
    await as('PUT', `/api/posts/${lesson.id}/reliance`, {})
    const shown = async () => (await sectionOf('W-3')).goingBy.find((g: { postId: number }) => g.postId === lesson.id)
    expect(lesson.cautions.length).toBeGreaterThan(0)
    expect((await shown()).cautions.map((c: { code: string }) => c.code)).toEqual(lesson.cautions.map((c) => c.code))
    await api('PATCH', `/api/entries/${lesson.id}`, { token: lesson.by.token, body: { revision: 'A', title: 'Where the labels go now' } })
    expect(await shown()).toMatchObject({ revision: 'A', currentRevision: 'B', state: 'visible' })
    expect((await as('GET', `/api/builds/${id}`)).body.goingBy.map((g: { postId: number }) => g.postId)).toContain(lesson.id)
    expect((await sectionOf('X-1')).goingBy).toEqual([])
  })
})

describe('everybody but the owner', () => {
  it('finds nothing at any address, whatever their role, and changes nothing', async () => {
    const { body: line } = await as('POST', `/api/builds/${id}/sections/W-1/log`, logLine({ line: 'Mine.' }))
    const { body: held } = await as('POST', `/api/builds/${id}/sections/W-1/holds`, aHold())
    const calls: [Method, string, object?][] = [
      ['GET', `/api/builds/${id}`], ['GET', `/api/builds/${id}/sections/W-1`], ['PATCH', `/api/builds/${id}/sections/W-1`, { state: 'done' }],
      ['POST', `/api/builds/${id}/sections/W-1/log`, logLine()], ['GET', `/api/builds/${id}/log/${line.id}`], ['PATCH', `/api/builds/${id}/log/${line.id}`, { day: '2026-03-09', minutes: 1 }],
      ['POST', `/api/builds/${id}/sections/W-1/holds`, aHold()], ['GET', `/api/builds/${id}/holds/${held.id}`], ['POST', `/api/builds/${id}/holds/${held.id}/release`, { note: 'Not mine.' }],
      ['PUT', `/api/builds/${id}/closing/1`, { isDone: true, note: '' }],
    ]
    const before = (await as('GET', `/api/builds/${id}`)).body
    const others = [await aMember(), await aMember({ role: 'moderator' }), await aMember({ role: 'steward' })]
    // Somebody with a build of their own does not reach another's line or hold through it.
    const [neighbour] = others
    const own = await aBuild(neighbour!)
    for (const [method, path, body] of calls) {
      for (const other of others) expect([method, path, (await as(method, path, body, other)).status]).toEqual([method, path, 404])
      expect([method, path, (await as(method, path, body, null)).status]).toEqual([method, path, method === 'GET' ? 404 : 401])
    }
    for (const path of [`log/${line.id}`, `holds/${held.id}`]) expect((await as('GET', `/api/builds/${own}/${path}`, undefined, neighbour!)).status).toBe(404)
    expect((await as('POST', `/api/builds/${own}/holds/${held.id}/release`, { note: 'Through mine.' }, neighbour!)).status).toBe(404)
    expect((await as('GET', '/api/builds', undefined, others[2]!)).body.items).toEqual([])
    expect((await as('GET', '/api/builds', undefined, null)).status).toBe(401)
    expect((await as('GET', `/api/builds/${id}`)).body).toEqual(before)
    for (const other of others) await expect(getHoldTags(await other.context(), id, null, 'http://x')).rejects.toMatchObject({ code: 'not-found' })
    for (const other of others) await expect(listVisits(await other.context(), id, 'W-1')).rejects.toMatchObject({ code: 'not-found' })
    for (const other of others) await expect(makeVisit(await other.context(), id, 'W-1', { visitor: 'Me', days: 1 })).rejects.toMatchObject({ code: 'not-found' })
  })

  it('nor does anybody at an address that is no build', async () => {
    for (const path of ['/api/builds/0', '/api/builds/abc', '/api/builds/999999', `/api/builds/${id}/sections/Z-9`, `/api/builds/${id}/holds/0`]) expect([path, (await as('GET', path)).status]).toEqual([path, 404])
  })
})

describe('a visit', () => {
  const found = (text: string) => ({ key: key(), text })

  it('shows the section without serial and helpers, and each finding becomes a hold once', async () => {
    await as('POST', `/api/builds/${id}/sections/W-6/log`, logLine({ helpers: 'Bjarte', line: 'Ran the loom.' }))
    const token = await makeVisit(await owner.context(), id, 'W-6', { visitor: 'J. Pasternak', days: 3 })
    const visitor = await contextFor(null)
    const finding = found('Clamp missing at rib 4')
    await addFinding(visitor, token, finding)
    await addFinding(visitor, token, finding)
    await addFinding(visitor, token, found('No label at the root plug'))
    const sheet = await getVisit(visitor, token)
    expect(sheet.findings.map((f) => [f.number, f.text])).toEqual([[1, 'Clamp missing at rib 4'], [2, 'No label at the root plug']])
    expect(JSON.stringify(sheet)).toContain('Ran the loom.')
    expect(JSON.stringify(sheet)).not.toMatch(/SN-0388|Bjarte/)
    expect((await sectionOf('W-6')).holds.map((h: { what: string; until: string }) => [h.what, h.until])).toEqual([['No label at the root plug', 'finding 2 of a visit is put right'], ['Clamp missing at rib 4', 'finding 1 of a visit is put right']])
    expect(await listVisits(await owner.context(), id, 'W-6')).toMatchObject([{ visitor: 'J. Pasternak', state: 'open', findings: 2 }])
  })

  it('keeps only the hash of its token', async () => {
    const token = await makeVisit(await owner.context(), id, 'W-1', { visitor: 'Somebody', days: 1 })
    expect(JSON.stringify(await runtime.database.reader.select().from(visit))).not.toContain(token)
  })

  it('ends when it is revoked, when it expires, and for a token that never was', async () => {
    const context = await owner.context()
    const [revoked, expired] = [await makeVisit(context, id, 'W-1', { visitor: 'R', days: 2 }), await makeVisit(context, id, 'W-1', { visitor: 'E', days: 1 })]
    const [, latest] = (await listVisits(context, id, 'W-1')).map((v) => v.id)
    await revokeVisit(context, id, latest!)
    await revokeVisit(context, id, latest!)
    const later = { ...(await contextFor(null)), now: Date.now() + 25 * 3_600_000 }
    for (const [on, token] of [[await contextFor(null), revoked], [later, expired], [later, 'A'.repeat(22)], [later, '']] as const) {
      await expect(getVisit(on, token)).rejects.toMatchObject({ code: 'not-found' })
      await expect(addFinding(on, token, found('Too late'))).rejects.toMatchObject({ code: 'not-found' })
    }
    expect(await getVisit(await contextFor(null), expired)).toMatchObject({ visitor: 'E' })
    await expect(revokeVisit(await (await aMember()).context(), id, latest!)).rejects.toMatchObject({ code: 'not-found' })
  })
})

describe('a closed account', () => {
  it('takes along serial, names and words; its links open nothing', async () => {
    const leaver = await aMember({ name: 'Leaving Lu' })
    await write(runtime.database, { actorId: null, at: 1 }, async (tx, record) => {
      await tx.update(member).set({ passwordHash: await hashPassword('four rivets in a row') }).where(eq(member.id, leaver.id))
      record('member.test', `member:${leaver.id}`)
    })
    const own = await aBuild(leaver)
    await as('POST', `/api/builds/${own}/sections/W-1/log`, logLine({ helpers: 'Mina', line: 'Spar bolts.' }), leaver)
    const { body: held } = await as('POST', `/api/builds/${own}/sections/W-1/holds`, aHold(), leaver)
    const token = await makeVisit(await leaver.context(), own, 'W-1', { visitor: 'An inspector', days: 9 })
    await closeAccount(await leaver.context(), { currentPassword: 'four rivets in a row' })
    await expect(getVisit(await contextFor(null), token)).rejects.toMatchObject({ code: 'not-found' })
    expect(await openHold(await contextFor(null), held.url.split('/').at(-1))).toBe('somebody’s')
    const { reader } = runtime.database
    const kept = JSON.stringify([await reader.select().from(build).where(eq(build.id, own)), await reader.select().from(workSession).where(eq(workSession.buildId, own)), await reader.select().from(hold).where(eq(hold.buildId, own)), await reader.select().from(visit).where(eq(visit.buildId, own))])
    expect(kept).not.toMatch(/SN-0388|Sandpiper|Mina|Spar bolts|Rib 7|inspector/)
    expect(kept).toContain('"minutes":150')
  })
})
