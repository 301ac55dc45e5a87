// The kit maker's own limits: a steward enters one after a second look, a builder finds it first in the shop table, and it is ended.
import { expect, test, describe } from 'vitest'
import { openPage, visit, widths } from '../support/browser'
import { unique } from './arrange'

// One table and result each, so that the journeys do not meet one another's limits.
const journeys = [
  { width: widths[0], javaScript: true, of: 'tube/bend-radius', address: '/shop/tube?size=-8' },
  { width: widths[1], javaScript: true, of: 'wire/clearance', address: '/shop/wire' },
  { width: widths[0], javaScript: false, of: 'grommet/clearance', address: '/shop/grommet' },
  { width: widths[1], javaScript: false, of: 'rivet/pitch-least', address: '/shop/rivet' },
] as const

describe.each(journeys)('at $width px, JavaScript $javaScript, $of', ({ width, javaScript, of, address }) => {
  test('a steward enters a limit, a builder sees it first in the shop table, and it is ended', async () => {
    const bulletin = `Bulletin ${unique()}`
    const page = await openPage({ width, javaScript, as: 'wren' })
    await page.goto('/kits')
    await page.getByRole('link', { name: /own limits for the Whimbrel 2/ }).click()
    await page.waitForURL('**/kits/whimbrel-2/limits')
    await page.getByLabel('What is limited').selectOption(of)
    await page.getByRole('button', { name: 'Go on' }).click()
    await page.waitForURL(/of=/)

    // Nothing filled in: each field says what it wants, and what was typed stays.
    await page.getByLabel('Page, step or paragraph').fill('page 3')
    await page.getByRole('button', { name: 'Enter the limit' }).click()
    await page.getByRole('alert').getByText(/Write the bulletin or the manual/).waitFor()
    expect(await page.getByLabel('Page, step or paragraph').inputValue()).toBe('page 3')

    // Less than any handbook: said plainly, and kept only on a second press.
    await page.getByRole('textbox', { name: 'At least', exact: true }).fill('1/32')
    await page.getByLabel('Bulletin or manual').fill(bulletin)
    await page.getByLabel('Date', { exact: true }).fill('14 Mar 2026')
    await page.getByRole('button', { name: 'Enter the limit' }).click()
    await page.getByText(/allows less than the handbook/).waitFor()
    expect(await page.getByRole('textbox', { name: 'At least', exact: true }).inputValue()).toBe('1/32')
    await page.getByRole('button', { name: 'The page is right: enter it' }).click()
    await page.waitForURL(/limits#limit-\d+/)
    const row = page.getByRole('listitem').filter({ hasText: bulletin })
    await row.getByText('at least 1/32 in').waitFor()

    const reader = await openPage({ width, javaScript })
    // Chosen at once, before the page may be awake: it counts all the same.
    await reader.goto(address)
    await reader.getByLabel('Kit', { exact: true }).selectOption('whimbrel-2')
    if (!javaScript) await reader.getByRole('button', { name: 'Work it out' }).click()
    await reader.waitForURL(/kit=whimbrel-2/)
    const result = reader.getByRole('row').filter({ hasText: bulletin })
    await result.getByText('at least 1/32 in').waitFor()
    expect(await result.innerText()).toContain(`Saltmarsh Aircraft: ${bulletin}, page 3`)
    await reader.getByRole('link', { name: 'Link to this answer' }).click()
    expect(new URL(reader.url()).searchParams.get('kit')).toBe('whimbrel-2')
    await reader.goto('/kits/whimbrel-2/limits')
    expect(await reader.getByRole('button', { name: 'Go on' }).count()).toBe(0)

    await row.getByText('End it').click()
    await row.getByLabel('Why it no longer holds').fill('Replaced.')
    await row.getByRole('button', { name: 'End this limit' }).click()
    await page.getByRole('region', { name: 'Ended' }).getByText(bulletin).waitFor()
    await reader.goto(`${address}${address.includes('?') ? '&' : '?'}kit=whimbrel-2`)
    expect(await reader.getByText(bulletin).count()).toBe(0)
  })
})

test('the numbers check and the search of a kit go by the bulletin of the demo', async () => {
  const page = await openPage()
  await visit(page, '/search?q=AN3+torque&kit=whimbrel-2')
  await page.getByText('Saltmarsh Aircraft: Bulletin SB-07').first().waitFor()
  await page.getByRole('link', { name: 'Open the shop table' }).click()
  await page.waitForURL(/kit=whimbrel-2/)
  await page.getByText('the kit maker’s own limit wins', { exact: false }).first().waitFor()
})
