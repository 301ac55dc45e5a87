// Forms of the pages and calls of the API write at the same time, in one process: every write that was acknowledged is there.
// The framework bundles pages and routes apart, so what has to be one thing in a process is looked at from both sides here.
import { expect, inject, test } from 'vitest'
import { openPage } from '../support/browser'
import { call, must, sessionCookie, sessionValue, sql } from '../support/session'
import { publish, unique } from './arrange'

const writers = 20

test('remarks through the form and through the API at once are all there', async () => {
  const { baseUrl } = inject('server')
  const question = await publish('marit', { title: `Labels ${unique()}`, section: 'X-1', text: 'Which label?' })
  const page = await openPage({ as: 'bryn', javaScript: false })
  await page.goto(question.url)
  const form = page.locator('form').filter({ has: page.locator(`#remark-${question.id}`) })
  const fields = await form.evaluate((element) => [...new FormData(element as HTMLFormElement)].map(([name, value]) => [name, String(value)] as const))
  const cookie = `${sessionCookie}=${await sessionValue('bryn')}`
  const throughForm = async (i: number) => {
    const body = new FormData()
    for (const [name, value] of fields) body.append(name, name === 'body' ? `Form ${i}.` : name === 'submission' ? `submission-${question.id}-${i}` : value)
    return (await fetch(`${baseUrl}${question.url}`, { method: 'POST', body, redirect: 'manual', headers: { cookie, origin: baseUrl, 'sec-fetch-site': 'same-origin' } })).status
  }
  const throughApi = async (i: number) => (await call('odile', 'POST', `/api/posts/${question.id}/remarks`, { body: `Call ${i}.` })).status
  const statuses = await Promise.all(Array.from({ length: writers }, (_, i) => [throughForm(i), throughApi(i)]).flat())
  expect(statuses.filter((_, i) => i % 2 === 0)).toEqual(Array(writers).fill(303))
  expect(statuses.filter((_, i) => i % 2 === 1)).toEqual(Array(writers).fill(201))
  expect(await sql('select count(*) as n from remark where post_id = ?', [question.id])).toEqual([{ n: 2 * writers }])
  expect((await must(null, 'GET', `/api/entries/${question.id}`)).remarks).toHaveLength(2 * writers)
})

test('a text that cannot be laid out is refused in words, through the form and through the API', async () => {
  const question = await publish('marit', { title: `Labels ${unique()}`, section: 'X-1', text: 'Which label?' })
  const bomb = '*'.repeat(1_000)
  const refused = await call('bryn', 'POST', `/api/posts/${question.id}/remarks`, { body: bomb })
  expect([refused.status, refused.body.detail]).toEqual([422, expect.stringContaining('in a row')])
  const page = await openPage({ as: 'bryn', javaScript: false })
  await page.goto(question.url)
  await page.getByLabel('What to do, step by step').fill(bomb)
  await page.getByRole('button', { name: 'Post this row' }).click()
  await page.getByRole('alert').filter({ hasText: /in a row/ }).waitFor()
  expect(await page.getByLabel('What to do, step by step').inputValue()).toBe(bomb)
})
