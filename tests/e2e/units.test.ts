// Inch or metric first: chosen on a page for this device, in the account for every device; what was written always stands.
import { describe, expect, test } from 'vitest'
import type { Page } from 'playwright-core'
import { violations } from '../support/axe'
import { openPage, overflow, visit, widths } from '../support/browser'
import { newPerson } from '../support/session'
import { publish, unique } from './arrange'

const chosen = (page: Page) => page.evaluate(() => document.documentElement.dataset['units'] ?? 'written')
/** What a reader sees of the sentence, with single spaces. */
const sentence = async (page: Page) => (await page.locator('.prose p').filter({ hasText: 'from the edge' }).innerText()).replace(/\s+/g, ' ')
const text = 'Hole 3 is 7/32 from the edge, drilled #30, the gap 4.8 mm.'
/** 7/32 in is 5.55625 mm, 4.8 mm is 0.18898 in (NIST SP 811, appendix B.8); a #30 drill is 0.1285 in (ANSI/ASME B94.11M). */
const readings = {
  written: 'Hole 3 is 7/32 in also 0.2188 in · 5.56 mm from the edge, drilled #30 · 0.1285 also 3.26 mm, the gap 4.8 mm also 0.189 in.',
  inch: 'Hole 3 is 7/32 in also 0.2188 in · 5.56 mm from the edge, drilled #30 · 0.1285 also 3.26 mm, the gap 0.189 in · 4.8 mm.',
  metric: 'Hole 3 is 5.56 mm · 7/32 in from the edge, drilled 3.26 mm · #30 · 0.1285, the gap 4.8 mm also 0.189 in.',
}

describe.each(widths)('at %i px', (width) => {
  test.each([true, false])('a reader chooses on an entry and it holds on the next page (JavaScript: %s)', async (javaScript) => {
    const { url } = await publish('marit', { title: `Flange edge ${unique()}`, section: 'X-1', text })
    const page = await openPage({ width, javaScript })
    const go = (address: string) => (javaScript ? visit(page, address) : page.goto(address))
    const press = async (name: string, units: keyof typeof readings) => {
      const group = page.getByRole('group', { name: 'Units' })
      await group.getByRole('button', { name }).click()
      await group.getByRole('button', { name, pressed: true }).waitFor()
      expect(await chosen(page)).toBe(units)
    }
    await go(url)
    expect([await chosen(page), await sentence(page)]).toEqual(['written', readings.written])
    await press('mm first', 'metric')
    expect(new URL(page.url()).pathname).toBe(url)
    expect(await sentence(page)).toBe(readings.metric)
    expect(await overflow(page)).toBe(0)
    if (javaScript) expect(await violations(page)).toEqual([])

    // A computed answer and a shop table take it from the first byte on; the table's own switch is the only one there.
    await go('/search?q=drill+for+1/8+rivet')
    expect(await chosen(page)).toBe('metric')
    expect(await page.locator('.shop-also').first().innerText()).toMatch(/^3\.26 mm · 0\.1285 in/)
    await go('/shop/drills?size=%2330')
    expect(await page.getByRole('link', { name: 'mm first' }).getAttribute('aria-current')).toBe('true')
    expect(await page.getByRole('group', { name: 'Units' }).isVisible()).toBe(false)
    await page.getByRole('link', { name: 'Inch first' }).click()
    await page.waitForURL(/units=inch/)

    await go(url)
    await press('Inch first', 'inch')
    expect(await sentence(page)).toBe(readings.inch)
    await press('As written', 'written')
    expect(await sentence(page)).toBe(readings.written)
  })

  test('a member chooses in the account without JavaScript, and it holds on another device', async () => {
    const who = await newPerson({ name: 'Metric Member' })
    const { url } = await publish('marit', { title: `Flange edge ${unique()}`, section: 'X-1', text })
    const first = await openPage({ width, as: who, javaScript: false })
    await first.goto('/account')
    // This device had a choice of its own; saving the account puts it aside.
    await first.getByRole('group', { name: 'Units' }).getByRole('button', { name: 'Inch first' }).click()
    expect(await chosen(first)).toBe('inch')
    await first.getByRole('radio', { name: /mm first/ }).check()
    await first.getByRole('button', { name: 'Keep these units' }).click()
    await first.getByText('Saved. It holds wherever you sign in.').waitFor()
    expect([await chosen(first), await first.getByRole('radio', { name: /mm first/ }).isChecked()]).toEqual(['metric', true])
    const second = await openPage({ width, as: who })
    await visit(second, url)
    expect([await chosen(second), await sentence(second)]).toEqual(['metric', readings.metric])
    const visitor = await openPage({ width })
    await visit(visitor, url)
    expect(await chosen(visitor)).toBe('written')
  })
})
