// Members on a real database: signing up and leaving, roles and mentorships, and that a change holds from the next request on.
import { count, desc } from 'drizzle-orm'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { getActiveMember, getMember } from '@/db/queries/people'
import { audit } from '@/db/schema'
import { readerUnits } from '@/lib/auth/reader-units'
import { authenticate } from '@/lib/services/people/authenticate'
import { chooseUnits } from '@/lib/services/people/choose-units'
import { changePassword } from '@/lib/services/people/change-password'
import { closeAccount } from '@/lib/services/people/close-account'
import { endMentorship } from '@/lib/services/people/end-mentorship'
import { getPerson } from '@/lib/services/people/get-person'
import { grantMentorship } from '@/lib/services/people/grant-mentorship'
import { revokeToken } from '@/lib/services/people/revoke-token'
import { getAccount } from '@/lib/services/people/get-account'
import { setMemberState } from '@/lib/services/people/set-member-state'
import { setRole } from '@/lib/services/people/set-role'
import { signUp } from '@/lib/services/people/sign-up'
import { contextFor } from '@/lib/context'
import { api } from '../support/api'
import { inRequest, sessionCookie } from '../support/as-session'
import { openTestRuntime, type TestRuntime } from '../support/database'
import { aMember, aMentor, anAnswer, anEntry, critical, type Somebody } from '../support/factories'

let runtime: TestRuntime
let steward: Somebody
const password = 'correct horse battery'
const visitor = () => contextFor(null)
const reader = () => runtime.database.reader

beforeAll(async () => {
  runtime = await openTestRuntime()
})
afterAll(() => runtime.close())

const join = async (email: string, name = 'Newcomer') => signUp(await visitor(), { name, email, password }, true)
const signIn = async (email: string, tried: string) => authenticate(await visitor(), { email, password: tried, address: `address of ${email}` })
const actorOf = async (id: number) => {
  const found = await getActiveMember(reader(), id)
  return contextFor(found && { id, name: found.member.name, role: found.member.role, mark: found.mark })
}
const audits = async () => (await reader().select({ n: count() }).from(audit))[0]?.n

describe('signing up', () => {
  it('the first member of an installation becomes its steward, the next one a builder', async () => {
    const first = await join('first@pilothole.example')
    steward = { ...(await aMember()), id: first.id, role: 'steward', context: () => actorOf(first.id) }
    const second = await join('second@pilothole.example')
    expect([(await getMember(reader(), first.id))?.member.role, (await getMember(reader(), second.id))?.member.role]).toEqual(['steward', 'member'])
  })

  it('an e-mail has one account, and a refused sign-up leaves nothing behind', async () => {
    const before = await audits()
    await expect(join('first@pilothole.example')).rejects.toMatchObject({ code: 'invalid', errors: [{ path: 'email' }] })
    await expect(signUp(await visitor(), { name: 'N', email: 'third@pilothole.example', password }, false)).rejects.toMatchObject({ code: 'forbidden' })
    expect(await audits()).toBe(before)
  })
})

describe('a password', () => {
  it('changes with the old one, ends older sessions, and the old one no longer fits', async () => {
    const { id, sessionEpoch } = await join('changes@pilothole.example')
    await expect(changePassword(await actorOf(id), { currentPassword: 'something else', newPassword: 'another long one' })).rejects.toMatchObject({ errors: [{ path: 'currentPassword' }] })
    expect(await changePassword(await actorOf(id), { currentPassword: password, newPassword: 'another long one' })).toEqual({ id, sessionEpoch: sessionEpoch + 1 })
    expect((await getMember(reader(), id))?.member.sessionEpoch).toBe(sessionEpoch + 1)
    await expect(signIn('changes@pilothole.example', password)).rejects.toMatchObject({ code: 'unauthenticated' })
    expect((await signIn('changes@pilothole.example', 'another long one')).id).toBe(id)
  })
})

describe('roles', () => {
  it('the last steward can be neither demoted nor closed; with another one they can', async () => {
    await expect(setRole(await steward.context(), steward.id, { role: 'member' })).rejects.toMatchObject({ code: 'conflict', message: expect.stringContaining('last steward') })
    await expect(closeAccount(await steward.context(), { currentPassword: password })).rejects.toMatchObject({ code: 'conflict', message: expect.stringContaining('last steward') })
    expect(await getMember(reader(), steward.id)).toMatchObject({ member: { role: 'steward', state: 'active', email: 'first@pilothole.example' } })
    const second = await aMember()
    await setRole(await steward.context(), second.id, { role: 'steward' })
    await setRole(await steward.context(), second.id, { role: 'moderator' })
    expect((await getMember(reader(), second.id))?.member.role).toBe('moderator')
  })

  it('only a steward sets them', async () => {
    const [moderator, builder] = [await aMember({ role: 'moderator' }), await aMember()]
    await expect(setRole(await moderator.context(), builder.id, { role: 'moderator' })).rejects.toMatchObject({ code: 'forbidden' })
    await expect(setRole(await builder.context(), builder.id, { role: 'steward' })).rejects.toMatchObject({ code: 'forbidden' })
    await expect(setRole(await steward.context(), 999_999, { role: 'member' })).rejects.toMatchObject({ code: 'not-found' })
  })
})

describe('suspension', () => {
  it('holds from the next request on, and is lifted again', async () => {
    const [builder, moderator] = [await aMember(), await aMember({ role: 'moderator' })]
    expect((await api('GET', '/api/kits', { token: builder.token })).status).toBe(200)
    await setMemberState(await moderator.context(), builder.id, { state: 'suspended', reason: 'Sells things.' })
    expect((await api('GET', '/api/kits', { token: builder.token })).status).toBe(401)
    await setMemberState(await moderator.context(), builder.id, { state: 'active', reason: 'Said sorry.' })
    expect((await api('GET', '/api/kits', { token: builder.token })).status).toBe(200)
  })

  it('a moderator suspends builders alone, and nobody themselves', async () => {
    const [moderator, other] = [await aMember({ role: 'moderator' }), await aMember({ role: 'moderator' })]
    const suspended = { state: 'suspended' as const, reason: 'x' }
    await expect(setMemberState(await moderator.context(), other.id, suspended)).rejects.toMatchObject({ code: 'forbidden' })
    await expect(setMemberState(await steward.context(), steward.id, suspended)).rejects.toMatchObject({ code: 'forbidden' })
    await setMemberState(await steward.context(), other.id, suspended)
    expect(await getActiveMember(reader(), other.id)).toBeNull()
  })
})

describe('mentorship', () => {
  const granted = { number: 'QX 101', fields: 'sheet metal', reason: 'Built one.' }

  it('makes somebody stamp from the next request on, until it ends; stamps stay', async () => {
    const [builder, answer] = [await aMember(), await anAnswer()]
    const press = (postId: number) => api('POST', `/api/posts/${postId}/stamps`, { token: builder.token, body: { revision: 'A', basis: 'standard', reference: 'AC 43.13-1B para 4-57' } })
    expect((await press(answer.id)).status).toBe(403)
    await grantMentorship(await steward.context(), builder.id, granted)
    expect((await press(answer.id)).status).toBe(201)
    await endMentorship(await steward.context(), builder.id, { reason: 'Moved away.' })
    expect((await press((await anAnswer()).id)).status).toBe(403)
    const { body } = await api('GET', `/api/entries/${answer.questionId}`)
    expect(body.answers[0]).toMatchObject({ stamp: 'stamped', stamps: [{ mentor: { mark: 'QX 101' }, live: true }] })
  })

  it('a number is given once for ever, and to one who has none', async () => {
    const [builder, mentor] = [await aMember(), await aMentor()]
    await expect(grantMentorship(await steward.context(), builder.id, granted)).rejects.toMatchObject({ code: 'invalid', errors: [{ path: 'number' }] })
    await expect(grantMentorship(await steward.context(), mentor.id, { ...granted, number: 'QX 102' })).rejects.toMatchObject({ code: 'conflict' })
    await expect(endMentorship(await steward.context(), builder.id, { reason: 'x' })).rejects.toMatchObject({ code: 'conflict' })
  })

  it('is never granted to oneself, nor by a moderator', async () => {
    const [moderator, builder] = [await aMember({ role: 'moderator' }), await aMember()]
    await expect(grantMentorship(await steward.context(), steward.id, { ...granted, number: 'QX 103' })).rejects.toMatchObject({ code: 'forbidden' })
    await expect(grantMentorship(await moderator.context(), builder.id, { ...granted, number: 'QX 104' })).rejects.toMatchObject({ code: 'forbidden' })
  })
})

describe('the units that stand first', () => {
  it('are kept in the account with an audit row, hold from the next request on, and go back to as written', async () => {
    const member = await aMember()
    const seen = async (extra = '') => inRequest(`${await sessionCookie(member)}${extra}`, readerUnits)
    expect([(await getAccount(await member.context())).units, await seen()]).toEqual(['written', 'written'])
    await chooseUnits(await member.context(), { units: 'metric' })
    expect([(await getAccount(await member.context())).units, await seen()]).toEqual(['metric', 'metric'])
    const [last] = await reader().select().from(audit).orderBy(desc(audit.sequence)).limit(1)
    expect(last).toMatchObject({ actorId: member.id, verb: 'member.choose-units', subject: `member:${member.id}` })
    await chooseUnits(await member.context(), { units: 'written' })
    expect(await seen()).toBe('written')
  })

  it('are this device’s where it has a choice of its own, also to take a text as written', async () => {
    const member = await aMember()
    await chooseUnits(await member.context(), { units: 'metric' })
    const seen = async (cookie: string) => inRequest(`${await sessionCookie(member)}; units=${cookie}`, readerUnits)
    expect([await seen('inch'), await seen('written'), await seen('furlong'), await seen('')]).toEqual(['inch', 'written', 'metric', 'metric'])
    expect(await inRequest('units=metric', readerUnits)).toBe('metric')
  })

  it('are nobody’s for a visitor', async () => {
    await expect(visitor().then((context) => chooseUnits(context, { units: 'inch' }))).rejects.toMatchObject({ code: 'unauthenticated' })
    expect(await inRequest('', readerUnits)).toBe('written')
  })
})

describe('an account', () => {
  it('revokes its own tokens alone', async () => {
    const [owner, other] = [await aMember(), await aMember()]
    const [token] = (await getAccount(await owner.context())).tokens
    await expect(revokeToken(await other.context(), token!.id)).rejects.toMatchObject({ code: 'not-found' })
    await revokeToken(await owner.context(), token!.id)
    await revokeToken(await owner.context(), token!.id)
    expect((await getAccount(await owner.context())).tokens).toEqual([])
    expect((await api('GET', '/api/kits', { token: owner.token })).status).toBe(401)
  })

  it('that is closed leaves what was written under "former member" and nothing of the person', async () => {
    const { id } = await join('leaves@pilothole.example', 'Odd Name')
    const leaver = { ...(await aMember()), id, name: 'Odd Name', context: () => actorOf(id) }
    const entry = await anEntry({ kind: 'lesson' }, leaver)
    await closeAccount(await leaver.context(), { currentPassword: password })
    const { body } = await api('GET', `/api/entries/${entry.id}`)
    expect(body.author.name).toBe('former member')
    expect(body.text).toBe(entry.text)
    expect((await getMember(reader(), id))?.member).toMatchObject({ name: 'former member', email: null, passwordHash: null, bio: '', state: 'closed', role: 'member' })
    await expect(signIn('leaves@pilothole.example', password)).rejects.toMatchObject({ code: 'unauthenticated' })
    // The address is free again: whoever comes with it is somebody new.
    expect((await join('leaves@pilothole.example')).id).not.toBe(id)
  })
})

describe('a member’s sheet', () => {
  it('lists what they wrote, each title with its cautions, and nothing that is hidden', async () => {
    const author = await aMentor()
    const lesson = await anEntry({ ...critical, kind: 'lesson' }, author)
    const answer = await anAnswer({ question: await anEntry(critical), by: author })
    const sheet = await getPerson(await visitor(), author.id)
    expect(sheet.mentor).toMatchObject({ mark: author.mark, fields: 'sheet metal' })
    expect(sheet.written.map((w) => [w.postId, w.entryId, w.cautions.some((c) => c.topic === 'structure')])).toEqual([[answer.id, answer.questionId, true], [lesson.id, lesson.id, true]])
    await expect(getPerson(await visitor(), 999_999)).rejects.toMatchObject({ code: 'not-found' })
  })
})
