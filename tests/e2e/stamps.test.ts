// Stamps: pressed, completed, lapsed, in question, withdrawn, from the sheet and from the desk.
import type { Locator, Page } from 'playwright-core'
import { describe, expect, test } from 'vitest'
import { openPage, visit, widths } from '../support/browser'
import { call, markOf, must } from '../support/session'
import { acknowledgeAll, publish, say, stampIt, type Published } from './arrange'

const words = 'Advice checked, work not inspected.'
const row = (page: Page, answerId: number) => page.locator(`#post-${answerId}`)

async function asked(): Promise<{ question: Published; answer: number }> {
  const question = await publish('marit')
  return { question, answer: await say('bryn', question) }
}

/** Fills in the form for a plans step and presses the stamp. */
async function pressOnPlans(form: Locator): Promise<void> {
  await form.getByLabel('Plans step').check()
  await form.getByLabel('Page', { exact: true }).fill('W3-2')
  await form.getByLabel('Rev', { exact: true }).fill('C')
  await form.getByLabel('Step', { exact: true }).fill('6')
  await form.getByLabel('I have this page before me').check()
  await form.getByRole('button', { name: /Press stamp on Rev/ }).click()
}

const state = async (question: Published, answer: number): Promise<string> => (await must(null, 'GET', `/api/entries/${question.id}`)).answers.find((a: { id: number }) => a.id === answer).stamp

describe.each(widths)('at %i px', (width) => {
  test('one mentor stamps a row on a critical section, a second one completes it', async () => {
    const { question, answer } = await asked()
    const first = await openPage({ width, as: 'jory' })
    await visit(first, question.url)
    await row(first, answer).getByText('Stamp Rev A').click()
    // Nothing chosen: refused in words, beside the field.
    await row(first, answer).getByRole('button', { name: /Press stamp/ }).click()
    await row(first, answer).getByRole('alert').getByText('What makes you sure? Choose a basis.').waitFor()
    await pressOnPlans(row(first, answer))
    await row(first, answer).getByText('Stamps · 1 of 2').waitFor()
    expect(await state(question, answer)).toBe('one-of-two')

    const second = await openPage({ width, as: 'hanne' })
    await visit(second, question.url)
    await row(second, answer).getByText('Stamp Rev A').click()
    const form = row(second, answer)
    await form.getByLabel('Done on own build').check()
    await form.getByLabel('Which build').fill('Ouzel 3')
    await form.getByLabel('When', { exact: true }).fill('March 2018')
    await form.getByRole('button', { name: /Press stamp/ }).click()
    await row(second, answer).getByText('Stamps · 2 of 2').waitFor()
    expect(await state(question, answer)).toBe('stamped')
    // What a screen reader gets in place of the drawing.
    const sentences = await row(second, answer).getByText(words).allInnerTexts()
    expect(sentences).toHaveLength(2)
    expect(sentences.join('\n')).toContain(`Stamp ${markOf('jory')}, plans step W3-2 step 6 Rev C`)
    expect(sentences.join('\n')).toContain(`Stamp ${markOf('hanne')}, done on own build Ouzel 3, March 2018`)
    await row(second, answer).getByText('Stamp Rev A').waitFor({ state: 'detached' })
  })

  test('an edit of the text lapses its stamps, and the old revision stays readable with them', async () => {
    const { question, answer } = await asked()
    await stampIt('jory', answer)
    await stampIt('tobias', answer)
    const page = await openPage({ width, as: 'bryn' })
    await visit(page, `/answers/${answer}/edit`)
    await page.getByText('Stamps on it lapse with an edit').waitFor()
    await page.getByLabel('What to do, step by step').fill('Stop, measure twice, and ask the kit maker in writing.')
    await acknowledgeAll(page)
    await page.getByRole('button', { name: 'Post the new revision' }).click()
    await page.waitForURL(/\/entries\/\d+/)
    await row(page, answer).getByText('Lapsed: the text changed since.').first().waitFor()
    expect(await state(question, answer)).toBe('lapsed')
    await page.goto(`/posts/${answer}/revisions?from=A&to=B`)
    await page.getByText('Stop, measure the edge distance').first().waitFor()
    expect(await page.getByText(words).count()).toBeGreaterThanOrEqual(2)
    expect(await page.locator('ins').allInnerTexts()).not.toEqual([])
  })

  test('an edit of the question lapses the stamps on its rows', async () => {
    const { question, answer } = await asked()
    await stampIt('jory', answer)
    await stampIt('tobias', answer)
    const page = await openPage({ width, as: 'marit' })
    await visit(page, `${question.url}/edit`)
    await page.getByText('Stamps on its rows lapse with an edit').waitFor()
    await page.getByLabel('Doing').fill('Fitting rib 7 to the rear spar instead.')
    await acknowledgeAll(page)
    await page.getByRole('button', { name: 'Post the new revision' }).click()
    await page.waitForURL(/\/entries\/\d+$/)
    await row(page, answer).getByText('Lapsed: the text changed since.').first().waitFor()
    expect(await state(question, answer)).toBe('lapsed')
  })

  test('one "did not work" on a critical system puts the stamps in question', async () => {
    const { question, answer } = await asked()
    await stampIt('jory', answer)
    await stampIt('tobias', answer)
    const page = await openPage({ width, as: 'odile' })
    await visit(page, question.url)
    await row(page, answer).getByRole('button', { name: 'I’m going by this' }).click()
    await row(page, answer).getByText('You go by Rev A').waitFor()
    await row(page, answer).locator('summary').filter({ hasText: 'Tell how it went' }).click()
    await row(page, answer).getByLabel('Did not work').check()
    await row(page, answer).getByRole('button', { name: 'Tell how it went' }).click()
    await row(page, answer).getByRole('alert').getByText(/what you changed, or why it did not work/i).waitFor()
    await row(page, answer).getByLabel('In a line or two').fill('The rib sat 1 mm proud.')
    await row(page, answer).getByRole('button', { name: 'Tell how it went' }).click()
    await row(page, answer).getByText(/In question: it did not work for a builder/).first().waitFor()
    expect(await state(question, answer)).toBe('in-question')
  })

  test('a mentor takes a stamp back with a reason, which stays readable', async () => {
    const { question, answer } = await asked()
    await stampIt('jory', answer)
    const page = await openPage({ width, as: 'jory' })
    await visit(page, question.url)
    await row(page, answer).locator('summary').filter({ hasText: 'Withdraw my stamp' }).click()
    await row(page, answer).getByRole('button', { name: 'Withdraw my stamp' }).click()
    await row(page, answer).getByRole('alert').waitFor()
    await row(page, answer).getByLabel('Why it no longer stands').fill('The page was superseded.')
    await row(page, answer).getByRole('button', { name: 'Withdraw my stamp' }).click()
    await row(page, answer).getByText(/Withdrawn on .*: The page was superseded\./).first().waitFor()
    expect(await state(question, answer)).not.toBe('one-of-two')
  })

  test('nobody has a form for stamping their own words, and the API refuses it too', async () => {
    const question = await publish('marit')
    const answer = await say('tobias', question)
    const page = await openPage({ width, as: 'tobias' })
    await visit(page, question.url)
    expect(await row(page, answer).getByText('Stamp Rev A').count()).toBe(0)
    const refused = await call('tobias', 'POST', `/api/posts/${answer}/stamps`, { revision: 'A', basis: 'plans', reference: 'W3-2 step 6', plansRevision: 'C' })
    expect(refused.status).toBe(403)
    await visit(page, `/desk?open=${answer}`)
    expect(await page.getByRole('button', { name: /Press stamp/ }).count()).toBe(0)
  })

  test('the desk: a tag opens a sheet, the stamp is pressed there, and asking takes a tag off the rail', async () => {
    const { question, answer } = await asked()
    await stampIt('jory', answer)
    const page = await openPage({ width, as: 'tobias' })
    await visit(page, `/desk?open=${answer}`)
    const sheet = page.getByRole('article')
    await sheet.getByRole('heading', { name: question.title }).waitFor()
    expect(await sheet.innerText()).toContain('Stop, measure the edge distance')
    expect(await sheet.innerText()).toContain('Fitting rib 7 to the spar.')
    await pressOnPlans(sheet)
    await expect.poll(() => state(question, answer)).toBe('stamped')
    await page.waitForURL((url) => url.pathname === '/desk' && !url.search.includes(`open=${answer}`))

    const other = await asked()
    await visit(page, `/desk?open=${other.answer}`)
    await page.getByRole('article').getByRole('heading', { name: other.question.title }).waitFor()
    await page.getByRole('button', { name: 'Photo with a scale' }).click()
    await page.waitForURL((url) => !url.search.includes(`open=${other.answer}`))
    await page.getByText(/off the rail, waiting for what you asked/).waitFor()
    expect(await page.getByRole('link', { name: new RegExp(other.question.title.split(' ').at(-1)!) }).count()).toBe(0)
  })
})
