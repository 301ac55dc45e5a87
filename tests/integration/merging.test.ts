// Merging duplicates through the real service: what stays, what leads where, and what may not be lost.
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import type { SearchResult } from '@/lib/schemas/search'
import { getMergedInto } from '@/lib/services/entries/get-merged-into'
import { mergeEntry } from '@/lib/services/moderation/merge-entry'
import { setPostState } from '@/lib/services/moderation/set-post-state'
import { api } from '../support/api'
import { openTestRuntime, type TestRuntime } from '../support/database'
import { aMember, anAnswer, anEntry, type Somebody } from '../support/factories'

let runtime: TestRuntime
let moderator: Somebody
beforeAll(async () => {
  runtime = await openTestRuntime()
  moderator = await aMember({ role: 'moderator' })
})
afterAll(() => runtime.close())

const merge = async (id: number, into: number, by = moderator) => mergeEntry(await by.context(), id, { into, reason: 'Asked twice.' })
const found = async () => (await api<SearchResult>('GET', '/api/search?q=labels&limit=100')).body.results.map((h) => h.id)
const leadsTo = async (id: number) => getMergedInto(await moderator.context(), id)

describe('a duplicate', () => {
  it('is no longer found, and its address leads to the one that stays', async () => {
    const [one, other] = [await anEntry(), await anEntry()]
    expect(await found()).toEqual(expect.arrayContaining([one.id, other.id]))
    await merge(one.id, other.id)
    expect(await found()).not.toContain(one.id)
    expect((await api('GET', `/api/entries/${one.id}`)).status).toBe(404)
    expect(await leadsTo(one.id)).toBe(`/entries/${other.id}`)
    expect(await leadsTo(other.id)).toBeNull()
  })

  it('leads on when the one that stayed is merged too', async () => {
    const [one, other, last] = [await anEntry(), await anEntry(), await anEntry()]
    await merge(one.id, other.id)
    await merge(other.id, last.id)
    expect([await leadsTo(one.id), await leadsTo(other.id)]).toEqual([`/entries/${last.id}`, `/entries/${last.id}`])
  })

  it('is restored with a reason, and stands for itself again', async () => {
    const [one, other] = [await anEntry(), await anEntry()]
    await merge(one.id, other.id)
    await expect(setPostState(await moderator.context(), one.id, { state: 'hidden', reason: 'x' })).rejects.toMatchObject({ code: 'conflict' })
    await setPostState(await moderator.context(), one.id, { state: 'visible', reason: 'Not the same part.' })
    expect(await leadsTo(one.id)).toBeNull()
    expect(await found()).toContain(one.id)
  })
})

describe('what is refused', () => {
  it('a question whose answers would be lost', async () => {
    const answer = await anAnswer()
    await expect(merge(answer.questionId, (await anEntry()).id)).rejects.toMatchObject({ code: 'invalid' })
  })

  it('into itself, into another kind, into what does not stand, or into nothing', async () => {
    const [one, hidden] = [await anEntry(), await anEntry()]
    await setPostState(await moderator.context(), hidden.id, { state: 'hidden', reason: 'It names a person.' })
    for (const into of [one.id, hidden.id, (await anAnswer()).id, 999_999]) await expect(merge(one.id, into)).rejects.toMatchObject({ code: 'invalid' })
  })

  it('an answer, an entry twice, and anybody but a moderator', async () => {
    const [one, other, answer] = [await anEntry(), await anEntry(), await anAnswer()]
    await expect(merge(answer.id, other.id)).rejects.toMatchObject({ code: 'not-found' })
    await expect(merge(one.id, other.id, await aMember())).rejects.toMatchObject({ code: 'forbidden' })
    await merge(one.id, other.id)
    await expect(merge(one.id, other.id)).rejects.toMatchObject({ code: 'conflict' })
  })
})
