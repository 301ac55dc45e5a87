// Somebody new: sign-up, the first question, and it is found.
import { describe, expect, test } from 'vitest'
import { openPage, visit, widths } from '../support/browser'
import { acknowledgeAll, unique } from './arrange'

describe.each(widths)('at %i px', (width) => {
  test('from sign-up to the first question, which is found at once', async () => {
    const word = unique()
    const page = await openPage({ width, expects: [401] })
    await visit(page, '/ask')
    await page.getByRole('link', { name: 'Sign up' }).first().click()
    await page.getByLabel('Name').fill('Nia Okonkwo')
    await page.getByLabel('E-mail').fill(`nia.${word}@pilothole.example`)
    await page.getByLabel('Password').fill('short')
    await page.getByRole('button', { name: 'Sign up' }).click()
    await page.getByRole('alert').getByText(/At least 10 characters/).waitFor()
    expect(await page.getByLabel('Name').inputValue()).toBe('Nia Okonkwo')
    await page.getByLabel('Password').fill('four rivets in a row')
    await page.getByRole('button', { name: 'Sign up' }).click()
    await page.getByRole('heading', { level: 1, name: 'Know before you drill' }).waitFor()

    await page.getByRole('link', { name: 'Ask', exact: true }).locator('visible=true').first().click()
    await page.waitForURL(/\/ask/)
    await page.getByLabel('What is the question?').fill(`Fuel tank rib flange hole close to the edge ${word}`)
    await page.getByLabel('Kit and section').selectOption('whimbrel-2/W-5')
    await page.getByLabel('Doing').fill('Riveting the tank end rib.')
    await page.getByLabel('Measured').fill('7/32 from the edge, by caliper.')
    // Posts that may already answer it, each with its caution.
    const similar = page.getByRole('heading', { name: 'May already answer it' })
    await similar.waitFor()
    await acknowledgeAll(page)
    await page.getByRole('button', { name: 'Post the question' }).click()
    await page.waitForURL(/\/entries\/\d+/)
    await page.getByText('Nobody has said what to do yet').waitFor()
    await page.goto(`/search?q=${word}`)
    await page.getByRole('heading', { level: 2, name: 'Open questions' }).waitFor()
    await page.getByRole('link', { name: new RegExp(word) }).first().waitFor()
  })
})
