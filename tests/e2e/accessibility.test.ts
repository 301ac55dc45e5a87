// Every page in both shifts and at both widths: no violation that axe-core finds, nothing wider than the screen; and the way through
// with the keyboard alone.
import { beforeAll, describe, expect, test } from 'vitest'
import { violations } from '../support/axe'
import { openPage, overflow, visit, widths } from '../support/browser'
import { must, type Who } from '../support/session'
import { demoEntry, publish, say, stampIt, unique, type Published } from './arrange'

let rib: Published
let lesson: Published
let own: Published
let answer: number
let build: string
let held: string
beforeAll(async () => {
  rib = await demoEntry('demo-rib-7-edge')
  lesson = await demoEntry('demo-trailing-edge-wave')
  own = await publish('dela')
  answer = await say('bryn', own)
  await stampIt('jory', answer)
  build = (await must('dela', 'GET', '/api/builds')).items[0].url
  held = (await must('dela', 'GET', `/api${build}`)).holds[0].url
})

interface Look { name: string; as?: Who; address: () => string; status?: number }
const looks: readonly Look[] = [
  { name: 'the first page', address: () => '/' },
  { name: 'results', address: () => '/search?q=grommet+hole' },
  { name: 'no results', address: () => '/search?q=xylophone+zeppelin' },
  { name: 'a question', address: () => rib.url },
  { name: 'a lesson', address: () => lesson.url },
  { name: 'a print sheet', address: () => `${rib.url}/print` },
  { name: 'revisions', address: () => `/posts/${lesson.id}/revisions?from=A&to=B` },
  { name: 'kits', address: () => '/kits' },
  { name: 'the maker’s limits', address: () => '/kits/whimbrel-2/limits' },
  { name: 'a limit being entered', as: 'wren', address: () => '/kits/whimbrel-2/limits?of=rivet/edge-centre' },
  { name: 'the rivet table with the maker’s limits', address: () => '/shop/rivet?kit=whimbrel-2' },
  { name: 'shop tables', address: () => '/shop' },
  { name: 'the grommet table', address: () => '/shop/grommet?bore=3/8' },
  { name: 'the rivet table', address: () => '/shop/rivet' },
  { name: 'the drill chart', address: () => '/shop/drills/chart' },
  { name: 'a section', address: () => '/kits/whimbrel-2/W-3' },
  { name: 'a brief', address: () => '/kits/whimbrel-2/W-3/brief' },
  { name: 'a brief from other kits too', address: () => '/kits/whimbrel-2/W-4/brief' },
  { name: 'a brief for paper', address: () => '/kits/whimbrel-2/W-3/brief/print' },
  { name: 'plan steps', address: () => '/kits/whimbrel-2/W-4/plans' },
  { name: 'plan steps for their steward', as: 'wren', address: () => '/kits/whimbrel-2/W-4/plans' },
  { name: 'lists of a section', address: () => '/kits/whimbrel-2/W-7/lists' },
  { name: 'lists for their steward', as: 'wren', address: () => '/kits/whimbrel-2/W-7/lists' },
  { name: 'bulletins', address: () => '/kits/whimbrel-2/bulletins' },
  { name: 'entering a bulletin', as: 'wren', address: () => '/kits/whimbrel-2/bulletins' },
  { name: 'what waits', as: 'bryn', address: () => '/waiting' },
  { name: 'a member’s sheet', address: () => '/people/2' },
  { name: 'a page of the guide', address: () => '/guide/markdown-help' },
  { name: 'sign-in', address: () => '/sign-in' },
  { name: 'sign-up', address: () => '/sign-up' },
  { name: 'sign in first', address: () => '/account', status: 401 },
  { name: 'nothing here', address: () => '/nothing/here', status: 404 },
  { name: 'not allowed', as: 'dela', address: () => '/people', status: 403 },
  { name: 'ask', as: 'dela', address: () => '/ask' },
  { name: 'a lesson being written', as: 'dela', address: () => '/lesson' },
  { name: 'account', as: 'dela', address: () => '/account' },
  { name: 'one’s own question', as: 'dela', address: () => own.url },
  { name: 'editing it', as: 'dela', address: () => `${own.url}/edit` },
  { name: 'editing a row', as: 'bryn', address: () => `/answers/${answer}/edit` },
  { name: 'my build', as: 'dela', address: () => '/builds' },
  { name: 'one aeroplane', as: 'dela', address: () => build },
  { name: 'a section of it', as: 'dela', address: () => `${build}/W-3` },
  { name: 'hold tags', as: 'dela', address: () => `${build}/tags` },
  { name: 'a visit sheet', as: 'dela', address: () => `${build}/W-3/visit` },
  { name: 'a hold by its code', as: 'dela', address: () => held },
  { name: 'somebody’s hold', address: () => held },
  { name: 'a question for a mentor', as: 'tobias', address: () => own.url },
  { name: 'the desk', as: 'jory', address: () => '/desk' },
  { name: 'time to an answer', as: 'jory', address: () => '/desk/evidence' },
  { name: 'an open sheet', as: 'tobias', address: () => `/desk?open=${answer}` },
  { name: 'a question for a moderator', as: 'kofi', address: () => rib.url },
  { name: 'why this order', as: 'wren', address: () => '/search/explain?q=flute+or+deburr+first' },
  { name: 'people', as: 'wren', address: () => '/people?open=2' },
]

describe.each(widths)('at %i px', (width) => {
  test.each(looks)('$name reads well in both shifts', async ({ as, address, status }) => {
    const page = await openPage({ width, ...(as === undefined ? {} : { as }), ...(status === undefined ? {} : { expects: [status] }) })
    await visit(page, address())
    // Closed forms are part of the page too.
    await page.evaluate(() => { for (const details of document.querySelectorAll('details')) details.open = true })
    for (const shift of ['day', 'night'] as const) {
      await page.evaluate((s) => { document.documentElement.dataset['shift'] = s }, shift)
      // Only colours differ between the shifts.
      expect([shift, await violations(page, shift === 'day' ? undefined : ['color-contrast'])]).toEqual([shift, []])
    }
    expect(await overflow(page)).toBe(0)
  })

  test('live results, a form with its errors, and the writing aid read well too', async () => {
    const page = await openPage({ width, as: 'dela' })
    await visit(page, '/lesson')
    await page.getByLabel('Search', { exact: true }).fill('grommet hole')
    await page.getByRole('option').first().waitFor()
    expect(await violations(page)).toEqual([])
    expect(await overflow(page)).toBe(0)
    await page.keyboard.press('Escape')
    await page.getByLabel('The lesson in one line').fill('Fuel tank rib')
    await page.getByLabel('Kit and section').selectOption('whimbrel-2/W-5')
    await page.getByLabel('What happened').fill('The spar hole was close.')
    await page.getByRole('checkbox', { name: /WARNING/ }).first().waitFor()
    await page.getByRole('button', { name: 'Post the lesson' }).click()
    await page.getByRole('alert').filter({ hasText: /caution/i }).waitFor()
    expect(await violations(page)).toEqual([])
    expect(await overflow(page)).toBe(0)
  })
})

test('the shift switch changes the shift and keeps it', async () => {
  const page = await openPage()
  await visit(page, '/')
  await page.getByRole('button', { name: 'Night' }).click()
  const background = () => page.evaluate(() => getComputedStyle(document.documentElement).backgroundColor)
  const night = await background()
  await page.reload()
  expect(await page.evaluate(() => document.documentElement.dataset['shift'])).toBe('night')
  expect(await background()).toBe(night)
  await page.getByRole('button', { name: 'Day', exact: true }).click()
  expect(await background()).not.toBe(night)
})

test('a banner says when the connection is gone', async () => {
  const page = await openPage({ width: 390 })
  await visit(page, '/kits')
  await page.context().setOffline(true)
  await page.getByText('The connection is gone.').waitFor()
  await page.context().setOffline(false)
  await page.getByText('The connection is gone.').waitFor({ state: 'detached' })
})

test('the keyboard alone: skip link, search, an entry, a remark', async () => {
  const page = await openPage({ as: 'dela' })
  const question = await publish('marit', { title: `Label on a tray ${unique()}`, section: 'X-1', text: 'Which label holds?' })
  await visit(page, '/')
  await page.keyboard.press('Tab')
  const focused = () => page.evaluate(() => document.activeElement?.textContent?.trim() ?? '')
  expect(await focused()).toBe('Skip to the content')
  expect(await page.evaluate(() => document.activeElement!.getBoundingClientRect().top >= 0)).toBe(true)
  await page.keyboard.press('Enter')
  await expect.poll(() => page.evaluate(() => document.activeElement?.id)).toBe('content')

  await page.keyboard.press('/')
  await page.keyboard.type(question.title.split(' ').at(-1)!)
  await page.getByRole('option').first().waitFor()
  await page.keyboard.press('ArrowDown')
  await page.keyboard.press('Enter')
  await page.waitForURL(/\/entries\/\d+/)
  await page.getByRole('heading', { level: 1, name: question.title }).waitFor()

  const tabTo = async (wanted: string) => {
    for (let i = 0; i < 80; i++) {
      await page.keyboard.press('Tab')
      if (await page.evaluate((text) => { const e = document.activeElement; return e !== null && (e.textContent?.trim() === text || (e instanceof HTMLElement && e.getAttribute('name') === text)) }, wanted)) return
    }
    throw new Error(`Tab never came to ${wanted}`)
  }
  await tabTo('Remark')
  await page.keyboard.press('Enter')
  await tabTo('body')
  await page.keyboard.type('Tape holds for a winter.')
  await tabTo('Post the remark')
  await page.keyboard.press('Enter')
  await page.getByText('Tape holds for a winter.').first().waitFor()
  await expect.poll(async () => (await must(null, 'GET', `/api/entries/${question.id}`)).remarks.length).toBe(1)
})
