// A bulletin marks a stamped answer, its follower is told, and a mentor who looks again sets it right.
import { expect, describe, test } from 'vitest'
import { openPage, visit, widths } from '../support/browser'
import { must } from '../support/session'
import { enterBulletin, publish, say, unique } from './arrange'

describe.each(widths)('at %i px', (width) => {
  test('a bulletin marks a stamped answer, and who goes by it is told', async () => {
    const [number, pageOfPlans] = [`SB-${unique()}`, `ZB${unique()}`]
    const question = await publish('marit', { section: 'X-1', text: 'Which label goes here?', plans: [{ page: pageOfPlans, step: '2', revision: 'C' }] })
    const answer = await say('bryn', question, 'The one of the kit maker, on the lid.')
    await must('jory', 'POST', `/api/posts/${answer}/stamps`, { revision: 'A', basis: 'own-build', reference: 'Mine, 2020' })
    await must('ife', 'PUT', `/api/posts/${answer}/reliance`, {})

    const steward = await enterBulletin({ number, steps: `${pageOfPlans}, 2, D`, width })
    await steward.getByText(`Page ${pageOfPlans} step 2 · Rev D`).waitFor()

    const follower = await openPage({ width, as: 'ife' })
    await visit(follower, '/')
    await follower.getByRole('link', { name: /^Waiting \(\d+\)$/ }).locator('visible=true').first().click()
    const told = follower.getByRole('listitem').filter({ hasText: number })
    await told.getByRole('link', { name: question.title }).click()
    const row = follower.locator(`#post-${answer}`)
    await row.getByText(`bulletin ${number}, page ${pageOfPlans} step 2 Rev D`).waitFor()
    await row.getByText(`Plans changed: ${number}`).waitFor()
    await visit(follower, '/waiting')
    await told.getByRole('button', { name: /I have read it/ }).click()
    await told.waitFor({ state: 'detached' })
    expect((await must('ife', 'GET', '/api/notices')).items.filter((n: { post: { id: number } }) => n.post.id === answer)).toEqual([])

    const mentor = await openPage({ width, as: 'jory' })
    await visit(mentor, `/desk?open=${answer}`)
    await mentor.getByText(`bulletin ${number}, page`).first().waitFor()
    await must('jory', 'POST', `/api/posts/${answer}/stamps`, { revision: 'A', basis: 'plans', reference: `${pageOfPlans} step 2`, plansRevision: 'D' })
    await visit(follower, question.url)
    await row.getByText(`Plans changed: ${number}`).waitFor({ state: 'detached' })
  })

  test('a steward pastes plan steps: the good lines stand, the bad one comes back with its reason', async () => {
    const pageOfPlans = `ZP${unique()}`
    const steward = await openPage({ width, as: 'wren' })
    await visit(steward, '/kits/whimbrel-2/P-1/plans')
    await steward.getByText('Paste lines (CSV)').click()
    await steward.getByLabel('Lines', { exact: true }).fill(`${pageOfPlans},1,A,dry-fit\n${pageOfPlans},2,A,polish-it-all\n${pageOfPlans},3,A,torque`)
    await steward.getByRole('button', { name: 'Add these lines' }).click()
    await steward.getByRole('alert').getByText('Line 2: task: There is no task polish-it-all.').waitFor()
    expect(await steward.getByLabel('Lines', { exact: true }).inputValue()).toBe(`${pageOfPlans},2,A,polish-it-all`)
    const reader = await openPage({ width })
    await visit(reader, '/kits/whimbrel-2/P-1/plans')
    expect(await reader.getByRole('row').filter({ hasText: pageOfPlans }).getByRole('cell').allInnerTexts()).toEqual(['1', 'A', expect.stringMatching(/dry/i), '3', 'A', expect.stringMatching(/torque/i)])
  })
})
