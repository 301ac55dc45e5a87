// A section's brief: from the section to it, down its tasks, and onto two pages of paper.
import { describe, expect, test } from 'vitest'
import { openPage, visit, widths } from '../support/browser'
import { must } from '../support/session'
import { publish, unique } from './arrange'

describe.each(widths)('at %i px', (width) => {
  test('a section leads to its brief: cautions first, tasks in working order, a departure and a disagreement in words', async () => {
    const page = await openPage({ width })
    await visit(page, '/kits/whimbrel-2/W-3')
    await page.getByRole('link', { name: 'Brief', exact: true }).click()
    await page.waitForURL(/\/W-3\/brief$/)
    await page.locator('.strip').first().waitFor()
    await page.getByRole('heading', { level: 1, name: 'W-3 Wing ribs to spar' }).waitFor()
    await page.getByText('The plans win.').first().waitFor()
    const [plate, strip] = await Promise.all(['.caution-plate', '.strip'].map((selector) => page.locator(selector).first().boundingBox()))
    expect(plate!.y + plate!.height).toBeLessThan(strip!.y)
    const tasks = await page.locator('.strip h2').allTextContents()
    expect(tasks.indexOf('Deburr edges')).toBeLessThan(tasks.indexOf('Flute flanges'))
    expect(tasks.indexOf('Match-drill')).toBeLessThan(tasks.indexOf('Take apart'))
    await page.getByText(/[3-9] builders do this before “flute flanges”, where the plans have it after\./).waitFor()
    const dispute = page.getByRole('region', { name: /^Builders disagree: dimple ribs, prime parts/ })
    expect(await dispute.getByRole('heading').allTextContents()).toEqual(['2 dimple ribs, then prime parts', '3 prime parts, then dimple ribs'])
    for (const link of await dispute.getByRole('listitem').allTextContents()) expect(link).toMatch(/WARNING Primary structure/)
    const drill = page.getByRole('article', { name: 'Match-drill' })
    await drill.getByText('#30 · 0.1285 in').waitFor()
    await drill.getByText('Advice checked · work not inspected').first().waitFor()
    await page.getByRole('img', { name: /^Half took \d+.* hours, the middle one .* Told by \d+ builders\.$/ }).waitFor()
    expect(await page.evaluate(() => document.documentElement.scrollWidth)).toBeLessThanOrEqual(width)
  })
})

test('the spine runs through every row without a gap, and a departure ends at its last task', async () => {
  const page = await openPage()
  await visit(page, '/kits/whimbrel-2/W-3/brief')
  const lines = await page.locator('.strip-line').evaluateAll((all) => all.map((line) => { const { left, top, bottom } = line.getBoundingClientRect(); return { left, top, bottom } }))
  expect(lines.length).toBeGreaterThan(5)
  lines.slice(1).forEach((line, i) => {
    expect(line.left).toBeCloseTo(lines[i]!.left, 0)
    expect(Math.abs(line.top - lines[i]!.bottom)).toBeLessThan(1.5)
  })
  const end = await page.locator('.strip-lane-end').first().evaluate((lane) => lane.closest('li')?.querySelector('h2')?.textContent)
  expect(end).toBe('Flute flanges')
})

test('what somebody writes after a section stands in the next builder’s brief at its task', async () => {
  const word = unique()
  const lesson = await publish('dela', { kind: 'lesson', section: 'G-2', tasks: ['torque'], title: `Wheel bolts ${word}`, text: `Torque them twice ${word}.` })
  const page = await openPage({ as: 'pell', width: 390 })
  await visit(page, '/kits/whimbrel-2/G-2/brief')
  await page.getByRole('article', { name: 'Torque', exact: true }).getByRole('link', { name: lesson.title }).first().waitFor()
  const brief = await must(null, 'GET', '/api/kits/whimbrel-2/sections/G-2/brief')
  expect(JSON.stringify(brief)).toContain(word)
})

describe.each(['A4', 'Letter'] as const)('on %s', (format) => {
  test.each(['W-3', 'T-1', 'W-4', 'F-6', 'E-1'])('the brief of %s is two pages', async (section) => {
    const page = await openPage()
    await visit(page, `/kits/whimbrel-2/${section}/brief/print`)
    const pdf = (await page.pdf({ format })).toString('latin1')
    expect(pdf.match(/\/Type\s*\/Page\b/g)).toHaveLength(2)
  })
})

test('the cautions are on the first page of paper, above everything', async () => {
  const page = await openPage()
  await visit(page, '/kits/whimbrel-2/W-3/brief/print')
  const whole = await page.locator('.brief-paper-first .caution-plate').textContent()
  for (const topic of ['Primary structure', 'Chromate', 'Eyes', 'Hearing']) expect(whole).toContain(topic)
  // The second section begins a page, so what is in the first section is on the first page when there are two.
  await page.emulateMedia({ media: 'print' })
  expect(await page.locator('.brief-paper-second').evaluate((section) => getComputedStyle(section).breakBefore)).toBe('page')
  const [plate, order] = [await page.locator('.caution-plate').boundingBox(), await page.locator('.brief-paper-order').boundingBox()]
  expect(plate!.y + plate!.height).toBeLessThanOrEqual(order!.y)
})
