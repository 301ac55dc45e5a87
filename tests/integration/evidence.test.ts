// Time to the first answer, from real rows.
import { afterAll, beforeAll, expect, it } from 'vitest'
import { getTimeToAnswer } from '@/lib/services/evidence/get-time-to-answer'
import { setPostState } from '@/lib/services/moderation/set-post-state'
import { openTestRuntime, type TestRuntime } from '../support/database'
import { aMember, aMentor, anAnswer, anEntry } from '../support/factories'

let runtime: TestRuntime
beforeAll(async () => {
  runtime = await openTestRuntime()
})
afterAll(() => runtime.close())

it('counts open questions as waiting, the first visible answer alone, and nothing that is hidden', async () => {
  const mentor = await aMentor()
  const context = async () => mentor.context()
  const [open, question] = [await anEntry(), await anEntry()]
  expect(await getTimeToAnswer(await context())).toMatchObject({ asked: 2, open: 2, curve: { steps: [], median: null } })
  const first = await anAnswer({ question })
  await anAnswer({ question })
  expect(await getTimeToAnswer(await context())).toMatchObject({ asked: 2, open: 1, curve: { steps: [{ events: 1 }] } })
  const moderator = await (await aMember({ role: 'moderator' })).context()
  await setPostState(moderator, first.id, { state: 'hidden', reason: 'It names a person.' })
  expect(await getTimeToAnswer(await context())).toMatchObject({ asked: 2, open: 1 })
  await setPostState(moderator, open.id, { state: 'hidden', reason: 'It names a person.' })
  expect(await getTimeToAnswer(await context())).toMatchObject({ asked: 1, open: 0, curve: { steps: [{ atRisk: 1, events: 1, waiting: 0 }] } })
})

it('is shown to mentors and stewards alone', async () => {
  await expect(getTimeToAnswer(await (await aMember()).context())).rejects.toMatchObject({ code: 'forbidden' })
  expect(await getTimeToAnswer(await (await aMember({ role: 'steward' })).context())).toHaveProperty('open')
})
