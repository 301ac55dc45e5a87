// What a journey finds when it begins: entries and rows published through the API by those who write them, everything defaulted.
import type { Page } from 'playwright-core'
import { openPage, visit } from '../support/browser'
import { must, type Who } from '../support/session'

export interface Published { id: number; url: string; title: string }
let made = 0
/** A word that stands in no other text, so that a search finds this test's entry alone. */
export const unique = (): string => `zq${Date.now().toString(36)}${(++made).toString(36)}`

interface EntryWords { title?: string; section?: string; kind?: 'question' | 'lesson'; text?: string; tasks?: string[]; plans?: { page: string; step?: string; revision?: string }[] }

/** Section W-3 is on a critical system (wing ribs, JASC 5712); X-1 is on none. */
export async function publish(who: Who, { title = `Rib 7 flange hole ${unique()}`, section = 'W-3', kind = 'question', text = 'Fitting rib 7 to the spar.', tasks = [], plans = [] }: EntryWords = {}): Promise<Published> {
  const place = { kit: 'whimbrel-2', sections: [section], tasks }
  const { cautions } = await must(who, 'POST', '/api/cautions/required', { title, body: text, ...place })
  const entry = await must(who, 'POST', '/api/entries', {
    kind, title, ...place, plans, parts: kind === 'question' ? { doing: text } : { happened: text }, acknowledgedCautions: cautions.map((c: { code: string }) => c.code),
  })
  return { id: entry.id, url: `/entries/${entry.id}`, title }
}

/** A row under a question; returns its id. */
export async function say(who: Who, question: Published, body = 'Stop, measure the edge distance, and ask the kit maker.'): Promise<number> {
  const entry = await must(null, 'GET', `/api/entries/${question.id}`)
  const { cautions } = await must(who, 'POST', '/api/cautions/required', { title: entry.title, body: `${entry.text}\n\n${body}`, kit: entry.kit, sections: entry.sections, tasks: entry.tasks })
  const codes = [...new Set([...cautions, ...entry.cautions].map((c: { code: string }) => c.code))]
  return (await must(who, 'POST', `/api/entries/${question.id}/answers`, { body, acknowledgedCautions: codes })).id
}

/** A mentor's stamp on revision A, on the plans. */
export async function stampIt(mentor: Who, postId: number, revision = 'A'): Promise<number> {
  return (await must(mentor, 'POST', `/api/posts/${postId}/stamps`, { revision, basis: 'plans', reference: 'W3-2 step 6', plansRevision: 'C' })).id
}

/** Ticks every caution that is shown and sends again, until the page goes on. The cautions come from the rules, so the test reads them off the page. */
export async function acknowledgeAll(page: Page): Promise<string[]> {
  const boxes = page.getByRole('group', { name: /These cautions will stand on it/ }).getByRole('checkbox')
  await boxes.first().waitFor()
  const labels: string[] = []
  for (const box of await boxes.all()) {
    await box.check()
    labels.push(await box.evaluate((e) => e.closest('label')?.textContent ?? ''))
  }
  return labels
}

/** The id of a demo entry by its reference, such as `demo-rib-7-edge`. */
export async function demoEntry(ref: string): Promise<Published & { entry: any }> { // eslint-disable-line @typescript-eslint/no-explicit-any -- the API's entry, read as it comes
  for (let cursor: string | null = ''; cursor !== null;) {
    const page: { items: { id: number; ref?: string; title: string }[]; nextCursor: string | null } = await must(null, 'GET', `/api/entries?limit=100${cursor ? `&cursor=${encodeURIComponent(cursor)}` : ''}`)
    const entry = page.items.find((e) => e.ref === ref)
    if (entry) return { id: entry.id, url: `/entries/${entry.id}`, title: entry.title, entry }
    cursor = page.nextCursor
  }
  throw new Error(`The demo has no ${ref}`)
}

/** The steward enters a bulletin of the Whimbrel 2 through the form. */
export async function enterBulletin({ number, steps, width }: { number: string; steps: string; width?: 1360 | 390 }): Promise<Page> {
  const page = await openPage({ as: 'wren', ...(width === undefined ? {} : { width }) })
  await visit(page, '/kits/whimbrel-2/bulletins')
  await page.getByLabel('Number', { exact: true }).fill(number)
  await page.getByLabel('Date printed on it').fill('2026-11-20')
  await page.getByLabel('Serials').fill('all')
  await page.getByLabel(/What it changes/).fill('The hole in this step is one size larger.')
  await page.getByLabel('Pages and steps, one a line').fill(steps)
  await page.getByRole('button', { name: 'Enter the bulletin' }).click()
  await page.getByRole('heading', { name: `Bulletin ${number}` }).waitFor()
  return page
}
