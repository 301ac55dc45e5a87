// Every shop table with JavaScript off: form, result, figure, refusal in a sentence; and the same refusal through the API.
import { describe, expect, test } from 'vitest'
import { SHOP_TABLES } from '@/lib/domain/shop/shop-tables'
import { openPage, widths } from '../support/browser'
import { call } from '../support/session'

describe.each(widths)('at %i px, without JavaScript', (width) => {
  test.each(SHOP_TABLES.map(({ slug, inputs }) => ({ slug, inputs })))('$slug works out, draws and refuses', async ({ slug, inputs }) => {
    const page = await openPage({ width, javaScript: false, expects: [422] })
    await page.goto(`/shop/${slug}`)
    const results = page.locator('table.shop-results tbody tr')
    expect(await results.count()).toBeGreaterThan(0)
    const drawing = page.locator(width === 390 ? '.shop-figures-phone svg' : '.shop-figures-desk svg').first()
    expect(await drawing.isVisible()).toBe(true)
    expect((await drawing.locator('desc').textContent())?.length).toBeGreaterThan(20)
    await page.getByRole('button', { name: 'Work it out' }).click()
    await page.waitForURL(new RegExp(`/shop/${slug}\\?`))
    expect(await results.count()).toBeGreaterThan(0)

    const typed = inputs.find(({ kind, default: standing }) => kind !== 'choice' && kind !== 'part' && standing !== null)
    if (!typed) return
    const field = page.locator(`#in-${typed.name}`)
    await field.fill('sideways')
    await page.getByRole('button', { name: 'Work it out' }).click()
    await page.waitForURL(/sideways/)
    const sentence = (await call(null, 'GET', `/api/shop/${slug}?${typed.name}=sideways`))
    expect(sentence.status).toBe(422)
    const said = JSON.stringify(sentence.body)
    const shown = await page.getByText(/such as|in figures/).allInnerTexts()
    expect(shown.some((text) => said.includes(JSON.stringify(text.trim()).slice(1, -1)))).toBe(true)
    expect(await field.getAttribute('aria-invalid')).toBe('true')
    expect(await field.inputValue()).toBe('sideways')
  })
})
