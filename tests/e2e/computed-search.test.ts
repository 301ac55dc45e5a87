// A number looked up: the drawing before everything else, posts keyed to its balloons, the other readings, the search line by keyboard
// alone and with the trade keys of a phone.
import { describe, expect, test } from 'vitest'
import { violations } from '../support/axe'
import { openPage, overflow, visit, widths } from '../support/browser'
import { must } from '../support/session'

const words = 'grommet hole 3/8'

test('the API gives the answer with its balloons, what it was read as, the other reading, and hits keyed to balloons', async () => {
  const result = await must(null, 'GET', `/api/search?q=${encodeURIComponent(words)}`)
  const [answer] = result.computed
  expect(answer).toMatchObject({ table: 'grommet', readAs: 'a grommet with a 3/8 bore', alternatives: [{ label: 'a 3/8 hole that takes a grommet', url: '/shop/grommet?hole=3%2F8' }] })
  expect(answer.balloons.map((b: { n: number; label: string }) => `${b.n} ${b.label}`)).toEqual(['1 Bore', '2 Groove', '3 Cut edge', '4 Wire'])
  const about = result.results.find((hit: { title: string }) => hit.title.startsWith('What hole for an AN931-6-10'))
  expect(about.balloons).toContain(2)
  for (const hit of result.results) for (const n of hit.balloons) expect(answer.balloons.map((b: { n: number }) => b.n)).toContain(n)
  // Without a computed answer there is nothing to be keyed to.
  for (const hit of (await must(null, 'GET', '/api/search?q=grommet')).results) expect(hit.balloons).toEqual([])
})

test('suggestions begin with what a shop table works out, with its cautions and where it is from', async () => {
  const { items } = await must(null, 'GET', `/api/suggest?q=${encodeURIComponent(words)}`)
  expect(items[0]).toMatchObject({ kind: 'shop', url: '/shop/grommet?bore=3%2F8' })
  expect(items[0].text).toMatch(/^5\/8 in: a grommet with a 3\/8 bore \(from memory/)
  expect(items[0].cautions.length).toBeGreaterThan(0)
  expect((await must(null, 'GET', '/api/suggest?q=torq')).items.find((item: { kind: string }) => item.kind === 'shop')).toMatchObject({ url: '/shop/torque' })
})

describe.each(widths)('at %i px', (width) => {
  test.each(['day', 'night'] as const)('the drawing comes first, and its balloons stand beside the posts about them (%s)', async (shift) => {
    const page = await openPage({ width, shift })
    await visit(page, `/search?q=${encodeURIComponent(words)}`)
    const figure = page.getByRole('img', { name: 'Grommet', exact: true })
    const hit = page.getByRole('article').filter({ hasText: /What hole for an AN931-6-10/ })
    await hit.getByRole('img', { name: 'About 2, the groove' }).waitFor()
    const [drawn, row] = [await figure.boundingBox(), await hit.boundingBox()]
    expect((drawn?.y ?? Infinity) + (drawn?.height ?? 0)).toBeLessThan(row?.y ?? 0)
    const note = page.locator('.balloon-notes li').filter({ hasText: 'Groove' })
    await note.getByRole('link', { name: /posts? below ?: .*AN931-6-10/ }).click()
    await page.waitForURL(/#hit-\d+$/)
    expect(await violations(page)).toEqual([])
    expect(await overflow(page)).toBeLessThanOrEqual(0)
    await page.getByRole('link', { name: 'I meant a 3/8 hole that takes a grommet' }).click()
    await page.waitForURL(/\/shop\/grommet\?hole=3%2F8/)
  })

  test('the search line is used by keyboard alone', async () => {
    const page = await openPage({ width })
    await visit(page, '/kits')
    await page.keyboard.press('/')
    await page.keyboard.type(words)
    const line = page.getByRole('combobox', { name: 'Search' })
    const list = page.getByRole('listbox', { name: 'Suggestions and results' })
    await list.getByRole('group', { name: 'Results' }).waitFor()
    const options = list.getByRole('option')
    const suggestion = list.getByRole('group', { name: 'Suggestions' }).getByRole('option', { name: /5\/8 in: a grommet with a 3\/8 bore/ })
    await suggestion.waitFor()
    await page.getByRole('status').filter({ hasText: /\d suggestions? and \d results?/ }).waitFor({ state: 'attached' })
    expect(await line.getAttribute('aria-expanded')).toBe('true')
    expect(await line.getAttribute('aria-controls')).toBe(await list.getAttribute('id'))
    expect(await violations(page)).toEqual([])
    const active = () => line.getAttribute('aria-activedescendant')
    const selected = () => list.locator('[aria-selected=true]').count()
    expect([await active(), await selected()]).toEqual([null, 0])
    await page.keyboard.press('ArrowUp')
    await expect.poll(active).toBe(await options.last().getAttribute('id'))
    await page.keyboard.press('ArrowDown')
    await expect.poll(active).toBe(await options.first().getAttribute('id'))
    expect(await selected()).toBe(1)
    await page.keyboard.press('Home')
    await expect.poll(active).toBe(null)
    expect(await line.evaluate((e: HTMLInputElement) => e.selectionStart)).toBe(0)
    await page.keyboard.press('ArrowDown')
    await expect.poll(active).toBe(await options.first().getAttribute('id'))
    await page.keyboard.press('End')
    await expect.poll(active).toBe(null)
    expect(await line.evaluate((e: HTMLInputElement) => e.selectionStart)).toBe(words.length)
    // Escape closes the list and leaves the words.
    await page.keyboard.press('Escape')
    await list.waitFor({ state: 'detached' })
    expect([await line.inputValue(), await line.getAttribute('aria-expanded'), await line.getAttribute('aria-controls')]).toEqual([words, 'false', null])
    await page.keyboard.press('ArrowDown')
    await expect.poll(active).toBe(await options.first().getAttribute('id'))
    await page.keyboard.press('Enter')
    await page.waitForURL(/\/shop\/grommet\?bore=3%2F8/)
  })
})

describe('on a phone', () => {
  test.each(['day', 'night'] as const)('the trade keys write a size with the focus staying in the line (%s)', async (shift) => {
    const page = await openPage({ width: 390, shift })
    await visit(page, '/')
    const keys = page.getByRole('group', { name: 'Trade keys' })
    expect(await keys.count()).toBe(0)
    const line = page.getByLabel('Search', { exact: true })
    await line.tap()
    await keys.waitFor()
    for (const key of await keys.getByRole('button').all()) {
      const box = await key.boundingBox()
      expect(Math.min(box?.width ?? 0, box?.height ?? 0), await key.innerText()).toBeGreaterThanOrEqual(44)
    }
    await page.keyboard.type('grommet')
    await keys.getByRole('button', { name: '3/8', exact: true }).tap()
    expect(await line.inputValue()).toBe('grommet 3/8')
    expect(await line.evaluate((e) => e === document.activeElement)).toBe(true)
    const list = page.getByRole('listbox', { name: 'Suggestions and results' })
    await list.getByRole('option', { name: /5\/8 in: a grommet with a 3\/8 bore/ }).waitFor()
    const [above, below] = [await page.locator('.live-results').boundingBox(), await keys.boundingBox()]
    expect((above?.y ?? Infinity) + (above?.height ?? 0)).toBeLessThanOrEqual(below?.y ?? 0)
    expect(await violations(page)).toEqual([])
    expect(await overflow(page)).toBeLessThanOrEqual(0)
    await page.keyboard.press('Enter')
    await page.waitForURL(/\/search\?q=grommet\+3%2F8/)
  })

  test('they are not there for a mouse', async () => {
    const page = await openPage({ width: 1360 })
    await visit(page, '/')
    await page.getByLabel('Search', { exact: true }).click()
    await page.keyboard.type('rivet')
    await page.getByRole('listbox').waitFor()
    expect(await page.getByRole('group', { name: 'Trade keys' }).isVisible()).toBe(false)
  })
})
