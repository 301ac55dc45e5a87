// A question of order on the results page, and the steward's page that says why results stand in their order, both without JavaScript.
import { describe, expect, test } from 'vitest'
import { openPage, widths } from '../support/browser'

describe.each(widths)('at %i px', (width) => {
  test('contrary order advice stands in the hits it comes from, and the page says that builders disagree', async () => {
    const page = await openPage({ width, javaScript: false })
    await page.goto('/search?q=flute+or+deburr+edges+first')
    const lines = page.locator('.hit-order')
    await lines.first().waitFor()
    const said = (await lines.allInnerTexts()).join('\n')
    expect(said).toMatch(/deburr edges before flute flanges/)
    expect(said).toMatch(/flute flanges before deburr edges/)
    expect(await page.getByText('Builders disagree here').count()).toBe(1)
    expect(await page.getByRole('link', { name: /Why these results/ }).count()).toBe(0)
  })

  test('a steward goes from the results to why they stand there, and asks for another search', async () => {
    const page = await openPage({ width, as: 'wren', javaScript: false })
    await page.goto('/search?q=flute+or+deburr+edges+first&kind=lesson')
    const titles = await page.locator('.hit h3').allInnerTexts()
    await page.getByRole('link', { name: /Why these results/ }).click()
    await page.getByRole('heading', { level: 1, name: 'Why this order' }).waitFor()
    const explained = await page.locator('.hit h3').allInnerTexts()
    expect(explained.length).toBeGreaterThan(0)
    expect(titles).toEqual(expect.arrayContaining(explained))
    expect(await page.locator('.explained-score').first().innerText()).toMatch(/^[\d.]+ = text [\d.]+ × [\d.]+ evidence × 1\.5 directness$/)
    expect(await page.locator('.hit').first().innerText()).toMatch(/WARNING|CAUTION|NOTICE/)
    expect(await page.locator('main').innerText()).toMatch(/A question of order: flute flanges on one side, deburr edges on the other/)
    const field = page.getByLabel('A search to explain')
    expect(await field.inputValue()).toBe('flute or deburr edges first')
    await field.fill('zyzzyva zeppelin')
    await page.getByRole('button', { name: 'Explain' }).click()
    await page.getByText(/Nothing is shown/).waitFor()
    expect(page.url()).toMatch(/kind=lesson/)
  })
})
