// Pages of a real browser for the journeys: Debian's chromium, one for each test file. A page fails its test on errors of scripts,
// of the console, of the content security policy, of requests to our host and of the server; a failed test leaves a picture.
import { mkdirSync } from 'node:fs'
import path from 'node:path'
import { chromium, type Browser, type BrowserContext, type Page } from 'playwright-core'
import { afterAll, afterEach, beforeEach, expect, inject } from 'vitest'
import { serverErrors, sessionCookie, sessionValue, type Who } from './session'

export type Width = 1360 | 390
export const widths: readonly Width[] = [1360, 390]
export interface OpenOptions {
  width?: Width
  as?: Who
  javaScript?: boolean
  shift?: 'day' | 'night'
  /** Statuses of 400 and more that this test wants to see. */
  expects?: readonly number[]
  baseUrl?: string
}

const artifacts = path.join(process.cwd(), 'tests', '.artifacts')
let browser: Promise<Browser> | undefined
let open: { context: BrowserContext; page: Page }[] = []
let faults: string[] = []
let errorsFrom = 0

const launch = () => chromium.launch({ executablePath: '/usr/bin/chromium', args: ['--no-sandbox', '--disable-gpu', '--no-first-run', '--disable-background-networking'] })

beforeEach(() => {
  faults = []
  errorsFrom = serverErrors(0).size
})

afterEach(async ({ task }) => {
  const server = serverErrors(errorsFrom).lines.map((line) => `server: ${line.slice(0, 1000)}`)
  const isFailed = task.result?.state === 'fail' || faults.length + server.length > 0
  const opened = open
  open = []
  for (const [i, { context, page }] of opened.entries()) {
    if (isFailed) {
      mkdirSync(artifacts, { recursive: true })
      const name = `${path.basename(task.file.name, '.test.ts')}-${task.name.replace(/[^a-z0-9]+/gi, '-').slice(0, 80)}-${i}`
      await page.screenshot({ path: path.join(artifacts, `${name}.png`), fullPage: true }).catch(() => undefined)
      console.log(`${name}: ${page.url()}`)
    }
    await context.close()
  }
  expect([...faults, ...server]).toEqual([])
})

afterAll(async () => {
  await (await browser)?.close()
  browser = undefined
})

/** A page in a context of its own. `page.goto('/search')` and the like are relative to the server. */
export async function openPage({ width = 1360, as, javaScript = true, shift, expects = [], baseUrl = inject('server').baseUrl }: OpenOptions = {}): Promise<Page> {
  browser ??= launch()
  const context = await (await browser).newContext({
    baseURL: baseUrl, javaScriptEnabled: javaScript, viewport: { width, height: width === 390 ? 844 : 900 }, hasTouch: width === 390, reducedMotion: 'reduce',
  })
  context.setDefaultTimeout(10_000)
  const cookies = [...(as === undefined ? [] : [{ name: sessionCookie, value: await sessionValue(as), url: baseUrl, httpOnly: true, sameSite: 'Lax' as const }]), ...(shift ? [{ name: 'shift', value: shift, url: baseUrl }] : [])]
  if (cookies.length > 0) await context.addCookies(cookies)
  context.on('page', (page) => watch(page, { baseUrl, expects, javaScript }))
  const page = await context.newPage()
  open.push({ context, page })
  return page
}

function watch(page: Page, { baseUrl, expects, javaScript }: Required<Pick<OpenOptions, 'baseUrl' | 'expects' | 'javaScript'>>): void {
  page.on('pageerror', (error) => faults.push(`page error: ${error.stack ?? error.message}`))
  page.on('console', (message) => {
    // A refused request is judged by its status below; the console only repeats it.
    if (message.type() === 'error' && !message.text().startsWith('Failed to load resource')) faults.push(`console: ${message.text()} (${page.url()})`)
  })
  page.on('response', (response) => {
    if (response.url().startsWith(baseUrl) && response.status() >= 400 && !expects.includes(response.status())) faults.push(`${response.status()} ${response.request().method()} ${response.url()}`)
  })
  page.on('requestfailed', (request) => {
    const why = request.failure()?.errorText ?? ''
    // Aborted: the page went elsewhere, or a newer search took the place of this one. Disconnected:
    // a test pulled the plug. 'csp' is how the browser calls scripts that are off.
    const isMeant = why === 'net::ERR_ABORTED' || why === 'net::ERR_INTERNET_DISCONNECTED' || (!javaScript && why === 'csp' && request.resourceType() === 'script')
    if (request.url().startsWith(baseUrl) && !isMeant) faults.push(`${why} ${request.url()}`)
  })
}

/** Waits until the page's scripts have taken over and what they listen for is heard, so that what follows tests the page with them. */
export async function awake(page: Page): Promise<void> {
  await page.waitForFunction(() => Object.keys(document.querySelector('input[name=q]') ?? {}).some((key) => key.startsWith('__reactProps')))
  // Listeners are put up by effects, which run after the fields are taken over and before the browser is idle.
  await page.evaluate(() => new Promise<void>((resolve) => { requestIdleCallback(() => resolve()) }))
}

/** Goes there and waits for the scripts. */
export async function visit(page: Page, address: string): Promise<void> {
  await page.goto(address)
  await awake(page)
}

/** Widths of pages must fit: nothing scrolls sideways. */
export async function overflow(page: Page): Promise<number> {
  return page.evaluate(() => document.documentElement.scrollWidth - document.documentElement.clientWidth)
}
