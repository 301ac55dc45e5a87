// A builder keeps an aeroplane on a phone: a section in work, a line in the log, a hold with its tag; the tag's code opens the hold for
// them and nothing for anybody else; they release it. And a visit sheet by its link, until it is revoked.
import { expect, test } from 'vitest'
import { openPage, overflow, visit } from '../support/browser'
import { must, newPerson } from '../support/session'

test('a hold made, its tag’s code opened, released', async () => {
  const builder = await newPerson({ name: 'Hilde Garage' })
  const page = await openPage({ as: builder, width: 390 })
  await visit(page, '/')
  await page.getByRole('navigation', { name: 'Bottom bar' }).getByRole('link', { name: 'My build' }).click()
  await page.getByLabel('Kit', { exact: true }).selectOption('whimbrel-2')
  await page.getByRole('button', { name: 'Keep this build' }).click()
  await page.getByRole('alert').getByText('Write a name').waitFor()
  await page.getByLabel('Name', { exact: true }).fill('Curlew')
  await page.getByRole('button', { name: 'Keep this build' }).click()
  await page.getByRole('heading', { level: 1, name: 'Curlew' }).waitFor()
  const build = new URL(page.url()).pathname

  await page.getByRole('link', { name: 'W-3 Wing ribs to spar' }).click()
  await page.getByRole('heading', { level: 1, name: 'W-3 Wing ribs to spar' }).waitFor()
  await page.getByRole('button', { name: 'In work' }).click()
  await expect.poll(() => page.getByRole('button', { name: 'In work' }).getAttribute('aria-pressed')).toBe('true')

  await page.getByLabel('Started').fill('22:30')
  await page.getByLabel('Stopped').fill('01:15')
  await page.getByLabel('In one line').fill('Ribs 1 to 6 riveted.')
  await page.getByRole('button', { name: 'Write it', exact: true }).click()
  await page.getByRole('listitem').filter({ hasText: 'Ribs 1 to 6 riveted.' }).getByText('2 h 45 min').waitFor()

  await page.getByText('Make a hold', { exact: true }).click()
  await page.getByLabel('Do not go past').fill('Rib 7, hole 3: do not rivet')
  await page.getByRole('button', { name: 'Hang up the hold' }).click()
  await page.getByRole('alert').getByText('Write what releases it').waitFor()
  await page.getByLabel('Until', { exact: true }).fill('the kit maker’s written reply')
  await page.getByRole('button', { name: 'Hang up the hold' }).click()
  const card = page.getByRole('article').filter({ hasText: 'Rib 7, hole 3: do not rivet' })
  await card.waitFor()
  expect(await overflow(page)).toBe(0)

  await card.getByRole('link', { name: 'Print its tag' }).click()
  const tag = page.getByRole('article').filter({ hasText: 'Take off only when the hold is released.' })
  await tag.getByRole('img', { name: 'Code that opens H-001' }).waitFor()
  const address = (await tag.getByRole('link').getAttribute('href')) ?? ''
  expect(address).toMatch(/^http:\/\/localhost:\d+\/holds\/[\w-]{22}$/)

  for (const other of [undefined, 'kofi']) {
    const theirs = await openPage({ width: 390, ...(other === undefined ? {} : { as: other }) })
    await theirs.goto(address)
    await theirs.getByText('This is a hold of somebody’s build. Ask the builder.').waitFor()
    expect(await theirs.content()).not.toMatch(/Rib 7|Curlew|Hilde|written reply|W-3/)
  }

  await page.goto(address)
  await page.getByRole('heading', { level: 1, name: 'Do not go past this step' }).waitFor()
  await page.getByLabel('What released it').fill('Saltmarsh wrote on 9 March: go on.')
  await page.getByRole('button', { name: 'Release H-001' }).click()
  await page.getByRole('heading', { level: 1, name: 'Released' }).waitFor()
  await page.getByText('Saltmarsh wrote on 9 March: go on.').waitFor()
  expect((await must(builder, 'GET', `/api${build}`)).openHolds).toBe(0)
})

test('without JavaScript a log line is written, and a second sending of its page writes it once', async () => {
  const builder = await newPerson({ name: 'Plain Garage' })
  const { id } = await must(builder, 'POST', '/api/builds', { kit: 'whimbrel-2', name: 'Plover' })
  const page = await openPage({ as: builder, width: 390, javaScript: false })
  await page.goto(`/builds/${id}/W-3`)
  const key = await page.locator('form:has(#log-line-hours) input[name=key]').getAttribute('value')
  for (const _time of [1, 2]) {
    await page.goto(`/builds/${id}/W-3`)
    await page.locator('form:has(#log-line-hours) input[name=key]').evaluate((input, value) => { input.setAttribute('value', value ?? '') }, key)
    const more = page.getByText('Write in the log', { exact: true })
    if (!(await page.getByLabel('Hours').isVisible())) await more.click()
    await page.getByLabel('Hours').fill('1:30')
    await page.getByRole('button', { name: 'Write it', exact: true }).click()
    await page.getByText('In the log.').waitFor()
  }
  expect((await must(builder, 'GET', `/api/builds/${id}`)).minutes).toBe(90)
})

test('a visit sheet takes findings by its link, and opens nothing once it was revoked', async () => {
  const builder = await newPerson({ name: 'Visited Garage' })
  const { id } = await must(builder, 'POST', '/api/builds', { kit: 'whimbrel-2', name: 'Dunlin', serial: 'SN-7731' })
  const page = await openPage({ as: builder })
  await visit(page, `/builds/${id}/W-3`)
  await page.getByText('Share it by a link', { exact: true }).click()
  await page.getByLabel('Whom is it for?').fill('The inspector')
  await page.getByRole('button', { name: 'Make a link' }).click()
  const link = page.locator('a[href*="/visits/"]')
  await link.waitFor()
  const address = (await link.getAttribute('href')) ?? ''

  const visitor = await openPage({ width: 390, expects: [404] })
  await visit(visitor, address)
  expect(await visitor.content()).not.toContain('SN-7731')
  await visitor.getByLabel('What did you find, and where?').fill('Shop head cracked at rib 4, aft row')
  await visitor.getByRole('button', { name: 'Write line 1' }).click()
  await visitor.getByRole('button', { name: 'Write line 2' }).waitFor()
  expect((await must(builder, 'GET', `/api/builds/${id}`)).holds).toMatchObject([{ what: 'Shop head cracked at rib 4, aft row', until: 'finding 1 of a visit is put right' }])

  await page.getByRole('button', { name: 'Revoke the link of The inspector' }).click()
  await page.getByText('revoked', { exact: false }).first().waitFor()
  const answered = await visitor.goto(address)
  expect(answered?.status()).toBe(404)
})
