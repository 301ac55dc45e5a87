// A builder has finished a section and writes down what the next one should know.
import { describe, expect, test } from 'vitest'
import { openPage, visit, widths } from '../support/browser'
import { must } from '../support/session'
import { acknowledgeAll, unique } from './arrange'

describe.each(widths)('at %i px', (width) => {
  test('a lesson with tasks, order advice and its cautions is published and found at once', async () => {
    const word = unique()
    const title = `Deburr before fluting the ribs ${word}`
    const page = await openPage({ width, as: 'dela' })
    await visit(page, '/lesson')
    await page.getByLabel('The lesson in one line').fill(title)
    await page.getByLabel('Kit and section').selectOption('whimbrel-2/W-3')
    await page.getByText('Pick the tasks').click()
    await page.getByLabel('deburr edges', { exact: true }).check()
    await page.getByLabel('flute flanges', { exact: true }).check()
    await page.getByLabel('What happened').fill('Burrs on the rib flanges kept the jaws off by 0.3 mm.')
    await page.getByLabel('What I would do differently').fill('Deburr all edges before the first flute.')
    await page.getByLabel('Do this').selectOption({ label: 'deburr edges' })
    await page.getByLabel('before that').selectOption({ label: 'flute flanges' })
    await page.getByLabel('Hours it took').fill('3.5')
    // Shown while writing, before anything is sent.
    await page.getByRole('group', { name: /These cautions will stand on it/ }).getByText('Primary structure', { exact: false }).first().waitFor()

    await page.getByRole('button', { name: 'Post the lesson' }).click()
    const alert = page.getByRole('alert').filter({ hasText: /caution/i })
    await alert.waitFor()
    expect(new URL(page.url()).pathname).toBe('/lesson')
    expect(await page.getByLabel('The lesson in one line').inputValue()).toBe(title)
    expect(await page.getByLabel('What happened').inputValue()).toContain('0.3 mm')
    expect(await page.getByLabel('deburr edges', { exact: true }).isChecked()).toBe(true)

    await acknowledgeAll(page)
    await page.getByRole('button', { name: 'Post the lesson' }).click()
    await page.waitForURL(/\/entries\/\d+/)
    await page.getByRole('heading', { level: 1, name: title }).waitFor()
    expect(await page.getByRole('article').innerText()).toMatch(/deburr edges\s*before\s*flute flanges/i)
    expect(await page.getByText('WARNING').count()).toBeGreaterThan(0)

    const found = await must(null, 'GET', `/api/search?q=${word}`)
    expect(found.results.map((hit: { title: string }) => hit.title)).toEqual([title])
    await page.goto(`/search?q=${word}`)
    await page.getByRole('link', { name: title }).waitFor()
  })

  test('a draft is there again after a reload, and gone once it is thrown away or posted', async () => {
    const page = await openPage({ width, as: 'odile' })
    await visit(page, '/lesson')
    await page.getByLabel('The lesson in one line').fill('A draft about labels')
    await page.getByLabel('Kit and section').selectOption('whimbrel-2/X-1')
    await page.getByLabel('What happened').fill('The labels fell off.')
    await expect.poll(() => page.evaluate(() => Object.values(localStorage).some((kept) => String(kept).includes('The labels fell off.')))).toBe(true)
    await page.reload()
    await page.getByText(/Your draft of .* is back/).waitFor()
    expect(await page.getByLabel('The lesson in one line').inputValue()).toBe('A draft about labels')
    expect(await page.getByLabel('What happened').inputValue()).toBe('The labels fell off.')
    expect(await page.getByLabel('Kit and section').inputValue()).toBe('whimbrel-2/X-1')

    await page.getByRole('button', { name: 'Throw it away' }).click()
    expect(await page.getByLabel('What happened').inputValue()).toBe('')

    await page.getByLabel('The lesson in one line').fill(`Labels on trays ${unique()}`)
    await page.getByLabel('Kit and section').selectOption('whimbrel-2/X-1')
    await page.getByLabel('What happened').fill('The labels stayed on.')
    await page.getByRole('button', { name: 'Post the lesson' }).click()
    await page.waitForURL(/\/entries\/\d+/)
    await expect.poll(() => page.evaluate(() => Object.values(localStorage).some((kept) => String(kept).includes('The labels stayed on.')))).toBe(false)
    await visit(page, '/lesson')
    expect(await page.getByLabel('What happened').inputValue()).toBe('')
  })

  test('the preview shows the text as it will stand, and nothing in it runs', async () => {
    const page = await openPage({ width, as: 'odile' })
    await visit(page, '/lesson')
    await page.getByLabel('What happened').fill('One **bold** word <script>alert(1)</script> [x](javascript:alert(1))')
    await page.getByRole('button', { name: 'Preview' }).click()
    const preview = page.locator('.aid-preview')
    await preview.getByText('bold').waitFor()
    expect(await preview.locator('strong').innerText()).toBe('bold')
    expect(await preview.locator('script, a[href^="javascript:"]').count()).toBe(0)
  })
})
