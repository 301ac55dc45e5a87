// Everything that matters works with JavaScript off: reading, search with filters, signing in, asking, saying what to do.
import { describe, expect, test } from 'vitest'
import { openPage, widths } from '../support/browser'
import { demoPassword, emailOf } from '../support/session'
import { acknowledgeAll, demoEntry, publish, unique } from './arrange'

describe.each(widths)('at %i px, without JavaScript', (width) => {
  test('a visitor searches, narrows and reads', async () => {
    const page = await openPage({ width, javaScript: false })
    await page.goto('/')
    await page.getByLabel('Search', { exact: true }).fill('grommet hole')
    await page.getByLabel('Search', { exact: true }).press('Enter')
    await page.waitForURL(/\/search\?q=grommet\+hole/)
    await page.getByLabel('Kind').selectOption('lesson')
    await page.getByLabel('Kit and section').selectOption('whimbrel-2/W-6')
    await page.getByRole('checkbox', { name: 'Stamped' }).check()
    await page.getByRole('button', { name: 'Filter' }).click()
    await page.waitForURL(/kind=lesson/)
    const hit = page.getByRole('link', { name: 'Three grommets, three holes: a gauge plate from scrap' })
    expect(await page.getByRole('checkbox', { name: 'Stamped' }).isChecked()).toBe(true)
    expect(await page.getByText(/WARNING|CAUTION/).count()).toBeGreaterThan(0)
    await hit.click()
    await page.waitForURL(/\/entries\/\d+/)
    expect(await page.getByText('Advice checked, work not inspected.').count()).toBeGreaterThan(0)
  })

  test('a question reads whole: parts, rows, cautions, remarks, print', async () => {
    const { url, title } = await demoEntry('demo-rib-7-edge')
    const page = await openPage({ width, javaScript: false })
    await page.goto(url)
    await page.getByRole('heading', { level: 1, name: title }).waitFor()
    expect(await page.locator('article').count()).toBe(3)
    expect(await page.getByText('Primary structure: stop, measure, ask the kit maker.').count()).toBeGreaterThan(0)
    await page.getByRole('link', { name: 'Print this sheet' }).click()
    await page.getByRole('heading', { name: /What to do, row 1/ }).waitFor()
    expect(await page.getByRole('button', { name: 'Print' }).isVisible()).toBe(false)
  })

  test('sign-in, a question with its acknowledgements, and a row under it', async () => {
    const word = unique()
    const page = await openPage({ width, javaScript: false })
    await page.goto('/sign-in?from=/ask')
    await page.getByLabel('E-mail').fill(emailOf('pell'))
    await page.getByLabel('Password').fill('not this one at all')
    await page.getByRole('button', { name: 'Sign in' }).click()
    await page.getByRole('alert').waitFor()
    expect(await page.getByLabel('E-mail').inputValue()).toBe(emailOf('pell'))
    await page.getByLabel('Password').fill(demoPassword)
    await page.getByRole('button', { name: 'Sign in' }).click()
    await page.waitForURL(/\/ask/)

    await page.getByLabel('What is the question?').fill(`Spar hole too near the edge ${word}`)
    await page.getByLabel('Kit and section').selectOption('whimbrel-2/W-1')
    await page.getByLabel('Doing').fill('Fitting the main spar splice.')
    await page.getByLabel('Page', { exact: true }).fill('W1-4')
    await page.getByRole('button', { name: 'Post the question' }).click()
    // The server asks for the acknowledgements, and keeps what was typed.
    const labels = await acknowledgeAll(page)
    expect(labels.join('\n')).toMatch(/WARNING.*Primary structure/)
    expect(await page.getByLabel('What is the question?').inputValue()).toContain(word)
    expect(await page.getByLabel('Doing').inputValue()).toBe('Fitting the main spar splice.')
    expect(await page.getByLabel('Page', { exact: true }).inputValue()).toBe('W1-4')
    expect(await page.getByLabel('Kit and section').inputValue()).toBe('whimbrel-2/W-1')
    await page.getByRole('button', { name: 'Post the question' }).click()
    await page.waitForURL(/\/entries\/\d+/)
    await page.getByRole('heading', { level: 1, name: new RegExp(word) }).waitFor()

    await page.goto(`/search?q=${word}`)
    await page.getByRole('link', { name: new RegExp(word) }).first().waitFor()
  })

  test('a row is said, acknowledged and read', async () => {
    const question = await publish('marit')
    const page = await openPage({ width, javaScript: false, as: 'bryn' })
    await page.goto(question.url)
    await page.getByLabel('What to do, step by step').fill('Stop. Measure it. Ask the kit maker.')
    await page.getByRole('button', { name: 'Post this row' }).click()
    await acknowledgeAll(page)
    expect(await page.getByLabel('What to do, step by step').inputValue()).toBe('Stop. Measure it. Ask the kit maker.')
    await page.getByRole('button', { name: 'Post this row' }).click()
    await page.getByRole('article', { name: /Row 1/ }).getByText('Stop. Measure it. Ask the kit maker.').waitFor()
    // A remark under the question, and going by the row as somebody else.
    const other = await openPage({ width, javaScript: false, as: 'odile' })
    await other.goto(question.url)
    await other.getByRole('button', { name: 'I’m going by this' }).click()
    await other.getByText('You go by Rev A').waitFor()
  })
})
