// Two tabs edit the same text: both versions are shown and nothing is lost. And a form sent twice is carried out once.
import { expect, test } from 'vitest'
import { openPage, visit } from '../support/browser'
import { must, sql } from '../support/session'
import { acknowledgeAll, publish, say, unique } from './arrange'

test('the later of two edits of a question gets both versions, and posts its own as the next revision', async () => {
  const question = await publish('marit')
  const first = await openPage({ as: 'marit' })
  const second = await openPage({ as: 'marit', width: 390 })
  await visit(first, `${question.url}/edit`)
  await visit(second, `${question.url}/edit`)
  await first.getByLabel('Doing').fill('Fitting rib 7, left wing.')
  await acknowledgeAll(first)
  await first.getByRole('button', { name: 'Post the new revision' }).click()
  await first.waitForURL(/\/entries\/\d+$/)

  await second.getByLabel('Doing').fill('Fitting rib 7, right wing.')
  await acknowledgeAll(second)
  await second.getByRole('button', { name: 'Post the new revision' }).click()
  const present = second.getByRole('region', { name: 'Present version, Rev B' })
  await present.getByText('Fitting rib 7, left wing.').waitFor()
  expect(await second.getByLabel('Doing').inputValue()).toBe('Fitting rib 7, right wing.')
  expect((await must(null, 'GET', `/api/entries/${question.id}`)).revision).toBe('B')

  await acknowledgeAll(second)
  await second.getByRole('button', { name: 'Post the new revision' }).click()
  await second.waitForURL(/\/entries\/\d+$/)
  const entry = await must(null, 'GET', `/api/entries/${question.id}`)
  expect([entry.revision, entry.parts.doing]).toEqual(['C', 'Fitting rib 7, right wing.'])
  await second.goto(`/posts/${question.id}/revisions?from=B&to=C`)
  await second.getByText('Fitting rib 7, left wing.').first().waitFor()
})

test('a stale edit of a row shows both versions without JavaScript too', async () => {
  const question = await publish('marit')
  const answer = await say('bryn', question)
  const page = await openPage({ as: 'bryn', javaScript: false })
  await page.goto(`/answers/${answer}/edit`)
  const { cautions } = (await must(null, 'GET', `/api/entries/${question.id}`)).answers[0]
  await must('bryn', 'PATCH', `/api/answers/${answer}`, { revision: 'A', body: 'Measure from the centre of the hole.', acknowledgedCautions: cautions.map((c: { code: string }) => c.code) })
  await page.getByLabel('What to do, step by step').fill('Measure from the edge of the hole.')
  await page.getByRole('button', { name: 'Post the new revision' }).click()
  await page.getByRole('region', { name: 'Present version, Rev B' }).getByText('Measure from the centre of the hole.').waitFor()
  expect(await page.getByLabel('What to do, step by step').inputValue()).toBe('Measure from the edge of the hole.')
})

test('a question that is sent twice at once stands there once', async () => {
  const word = unique()
  const page = await openPage({ as: 'pell', javaScript: false })
  await page.goto('/ask')
  await page.getByLabel('What is the question?').fill(`Labels ${word}`)
  await page.getByLabel('Kit and section').selectOption('whimbrel-2/X-1')
  await page.getByLabel('Doing').fill('Labelling boxes.')
  // The browser's own form, sent twice without waiting, as an impatient thumb does.
  await page.getByRole('button', { name: 'Post the question' }).dblclick()
  await page.waitForURL(/\/entries\/\d+/)
  expect((await sql('select count(*) as n from revision where title like ?', [`%${word}%`]))[0]?.['n']).toBe(1)
})

test('a button pressed twice with JavaScript on makes one row', async () => {
  const question = await publish('marit')
  const page = await openPage({ as: 'bryn' })
  await visit(page, question.url)
  await page.getByLabel('What to do, step by step').fill('Stop and measure.')
  await acknowledgeAll(page)
  await page.getByRole('button', { name: 'Post this row' }).dblclick()
  await page.getByRole('article', { name: /Row 1/ }).getByText('Stop and measure.').waitFor()
  expect((await must(null, 'GET', `/api/entries/${question.id}`)).answers).toHaveLength(1)
})
