// A builder at the bench with a phone, a builder who prints the chart, a mentor before a number that differs from the table.
import { describe, expect, test } from 'vitest'
import { openPage, visit, widths } from '../support/browser'
import { must } from '../support/session'
import { publish, say } from './arrange'

test('a builder with a phone finds the hole for a grommet and switches units', async () => {
  const page = await openPage({ width: 390 })
  await visit(page, '/shop')
  await page.getByRole('link', { name: /grommet/i }).first().tap()
  await page.waitForURL(/\/shop\/grommet/)
  const bore = page.locator('#in-bore')
  await bore.fill('1/2')
  await bore.press('Enter')
  await page.waitForURL(/bore=1%2F2/)
  // AN931 rule, A/16 bore and B/16 hole: 1/2 is AN931-8-13, hole 13/16.
  const results = page.getByRole('table').filter({ has: page.getByRole('columnheader', { name: 'Source, basis' }) })
  await results.getByRole('row', { name: /AN931-8-13/ }).first().waitFor()
  await page.getByText(/from memory, not checked against the standard/).first().waitFor()
  const figure = page.locator('.shop-figures-phone svg').first()
  expect(await figure.locator('text').allTextContents()).toContain('13/16')
  expect(await figure.isVisible()).toBe(true)

  await page.getByRole('navigation', { name: 'Units' }).getByRole('link', { name: 'mm first' }).tap()
  await page.waitForURL(/units=metric/)
  // 13/16 × 25.4 = 20.6375.
  await expect.poll(() => figure.locator('text').allTextContents()).toContain('20.64')
  expect(page.url()).toContain('bore=1%2F2')
  // The choice stays with the next input.
  await bore.fill('1/4')
  await bore.press('Enter')
  await page.waitForURL(/bore=1%2F4/)
  expect(page.url()).toContain('units=metric')
  // 7/16 × 25.4 = 11.1125.
  await expect.poll(() => figure.locator('text').allTextContents()).toContain('11.11')
  expect(await page.evaluate(() => document.documentElement.scrollWidth)).toBeLessThanOrEqual(390)
})

test('the drill chart prints on one sheet of paper with every row whole', async () => {
  const page = await openPage({ width: 390 })
  await visit(page, '/shop/drills')
  await page.getByRole('link', { name: 'Wall chart to print' }).click()
  await page.waitForURL(/\/shop\/drills\/chart/)
  await page.emulateMedia({ media: 'print' })
  // A4 and Letter without their margins, in CSS pixels.
  for (const [format, width, height] of [['A4', 794, 1123], ['Letter', 816, 1056]] as const) {
    const pdf = (await page.pdf({ format, preferCSSPageSize: false })).toString('latin1')
    expect(pdf.match(/\/Type\s*\/Page\b/g), format).toHaveLength(1)
    const [, right = '0', top = '0'] = /\/MediaBox\s*\[\s*0 0 ([\d.]+) ([\d.]+)\s*\]/.exec(pdf) ?? []
    expect([Number(right) / 0.75, Number(top) / 0.75].map(Math.round)).toEqual([expect.closeTo(width, -1), expect.closeTo(height, -1)])
    await page.setViewportSize({ width, height })
    const rows = await page.locator('.drill-chart li').evaluateAll((items) => items.map((item) => {
      const parts = [...item.children].map((part) => part.getBoundingClientRect())
      const box = item.getBoundingClientRect()
      return { words: item.textContent ?? '', isClipped: item.scrollWidth > item.clientWidth + 1 || parts.some((part) => part.right > box.right + 1 || part.bottom > box.bottom + 1 || part.height > 30), left: box.left, right: box.right }
    }))
    // #80 to #1, A to Z, and the 64ths to an inch: ANSI/ASME B94.11M.
    expect(rows.length).toBeGreaterThanOrEqual(80 + 26 + 60)
    expect(rows.filter(({ isClipped, left, right }) => isClipped || left < 0 || right > width)).toEqual([])
  }
  for (const control of await page.getByRole('button').all()) expect(await control.isVisible()).toBe(false)
})

test('a table prints its figure, its number, its sources and its own address', async () => {
  const page = await openPage({ width: 390 })
  await visit(page, '/shop/rivet?diameter=5/32')
  await page.emulateMedia({ media: 'print' })
  expect(await page.locator('.shop-form').isVisible()).toBe(false)
  expect(await page.locator('.shop-figures-desk svg').first().isVisible()).toBe(true)
  expect(await page.locator('.shop-figures-phone svg').first().isVisible()).toBe(false)
  expect(await page.getByText(/\/shop\/rivet\?.*diameter=5/).first().isVisible()).toBe(true)
  for (const row of await page.locator('table.shop-results tbody tr').all()) expect(await row.isVisible()).toBe(true)
})

describe.each(widths)('at %i px', (width) => {
  test('a mentor meets a number that differs from the table and stamps with a reason, which stands with the stamp', async () => {
    const question = await publish('marit', { section: 'X-1', text: 'Hole for the 1/8 rivets of the tray.' })
    const answer = await say('bryn', question, 'Use #21 for the 1/8 rivets in the tray.')
    const page = await openPage({ width, as: 'jory' })
    await visit(page, question.url)
    const row = page.locator(`#post-${answer}`)
    await row.getByText('Stamp Rev A').click()
    // #30 for a 1/8 rivet: MIL-HDBK-5 table 8.1.2(a), FAA-H-8083-31 ch. 4.
    await row.getByText(/Differs from the shop table:.*#30/).waitFor()
    await row.getByLabel('Plans step').check()
    await row.getByLabel('Page', { exact: true }).fill('X-1')
    await row.getByLabel('Rev', { exact: true }).fill('B')
    await row.getByLabel('Step', { exact: true }).fill('4')
    await row.getByLabel('I have this page before me').check()
    const press = row.getByRole('button', { name: /Press stamp on Rev/ })
    await press.click()
    await row.getByRole('alert').getByText(/Write why it is right all the same/).waitFor()
    const because = 'The plans call for oops rivets here: 5/32 shanks with 1/8 heads.'
    await row.getByLabel('Why it is right all the same').fill(because)
    await press.click()
    await row.getByText(because).first().waitFor()
    const { answers } = await must(null, 'GET', `/api/entries/${question.id}`)
    expect(answers.find((one: { id: number }) => one.id === answer).stamps).toEqual([expect.objectContaining({ conflictReason: because })])
    // A visitor reads it too.
    const visitor = await openPage({ width, javaScript: false })
    await visitor.goto(question.url)
    await visitor.locator(`#post-${answer}`).getByText(because).first().waitFor()
  })
})
