// Looking something up before drilling: the search line while typing, and the results page.
import { describe, expect, test } from 'vitest'
import { openPage, visit, widths } from '../support/browser'

const grommet = /What hole for an AN931-6-10/

describe.each(widths)('at %i px', (width) => {
  test('pressing / and typing shows results with their cautions, and the keys open one', async () => {
    const page = await openPage({ width })
    await visit(page, '/kits')
    await page.keyboard.press('/')
    const line = page.getByLabel('Search', { exact: true })
    expect(await line.evaluate((e) => e === document.activeElement)).toBe(true)
    await page.keyboard.type('grommet hole size')
    const list = page.getByRole('listbox', { name: 'Suggestions and results' })
    const hit = list.getByRole('option').filter({ hasText: grommet })
    await hit.waitFor()
    const options = list.getByRole('option')
    // Nothing safety-related stands there without its signal word.
    for (const text of await options.allInnerTexts()) if (/spar|fuel|brake|grommet/i.test(text)) expect(text).toMatch(/WARNING|CAUTION|NOTICE/)
    const names = await options.allInnerTexts()
    const position = names.findIndex((text) => grommet.test(text))
    for (let i = 0; i <= position; i++) await page.keyboard.press('ArrowDown')
    expect(await hit.getAttribute('aria-selected')).toBe('true')
    expect(await line.getAttribute('aria-activedescendant')).toBe(await hit.getAttribute('id'))
    await page.keyboard.press('Enter')
    await page.waitForURL(/\/entries\/\d+/)
    await page.getByRole('heading', { level: 1, name: grommet }).waitFor()
  })

  test('the results page has groups, marks, cautions, and filters that stand in the address', async () => {
    const page = await openPage({ width })
    await visit(page, '/')
    await page.getByLabel('Search', { exact: true }).fill('grommet hole size')
    await page.keyboard.press('Enter')
    await page.waitForURL(/\/search\?q=grommet\+hole\+size/)
    await page.getByRole('heading', { level: 2, name: 'Stamped', exact: true }).waitFor()
    expect(await page.locator('mark').count()).toBeGreaterThan(0)
    expect(await page.getByText('WARNING').count()).toBeGreaterThan(0)
    const kind = page.getByLabel('Kind')
    await kind.selectOption('lesson')
    await page.waitForURL(/kind=lesson/)
    await page.getByRole('link', { name: 'Three grommets, three holes: a gauge plate from scrap' }).waitFor()
    expect(await page.getByRole('link', { name: grommet }).count()).toBe(0)
    await page.getByRole('checkbox', { name: 'Stamped' }).check()
    await page.waitForURL(/stamped=1/)
    await expect.poll(() => page.getByRole('heading', { level: 2, name: 'Not stamped' }).count()).toBe(0)
    await page.getByLabel('Kit and section').selectOption('whimbrel-2/W-6')
    await page.waitForURL(/place=whimbrel-2%2FW-6/)
    expect(page.url()).toMatch(/kind=lesson.*stamped=1|stamped=1.*kind=lesson/)
    await page.reload()
    expect(await page.getByLabel('Kind').inputValue()).toBe('lesson')
    expect(await page.getByLabel('Kit and section').inputValue()).toBe('whimbrel-2/W-6')
  })

  test.each([
    ['a typing error', 'gromet hole'],
    ['a plural', 'grommets holes'],
    ['a trade synonym', 'rubber bushing hole'],
  ])('%s finds it all the same', async (_what, words) => {
    const page = await openPage({ width })
    await page.goto(`/search?q=${encodeURIComponent(words)}`)
    await page.getByRole('link', { name: /grommet|AN931/i }).first().waitFor()
  })

  test('nothing found leads to Ask with the words carried over', async () => {
    const page = await openPage({ width, as: 'dela' })
    await visit(page, '/')
    await page.getByLabel('Search', { exact: true }).fill('xylophone zeppelin mooring')
    await page.keyboard.press('Enter')
    await page.getByRole('heading', { name: /Nothing here about/ }).waitFor()
    await page.getByRole('link', { name: 'Ask this' }).first().click()
    await page.waitForURL(/\/ask/)
    expect(await page.getByLabel('What is the question?').inputValue()).toBe('xylophone zeppelin mooring')
  })
})
