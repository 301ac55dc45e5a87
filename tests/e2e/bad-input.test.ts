// Whatever somebody sends: a clear error within half a second, what was typed stays, nothing runs, nothing is lost.
import { beforeAll, describe, expect, inject, test } from 'vitest'
import { openPage, visit } from '../support/browser'
import { call, must, sessionCookie, sessionValue } from '../support/session'
import { publish, unique, type Published } from './arrange'

const mostMs = 500
let question: Published
let revision: string
beforeAll(async () => {
  question = await publish('marit', { title: `Labels ${unique()}`, section: 'X-1', text: 'Which label?' })
  revision = (await must(null, 'GET', `/api/entries/${question.id}`)).revision
})

/** The faster of two tries, so that a neighbour's work on the same machine does not fail the test. */
async function timed<T>(run: () => Promise<T>): Promise<{ result: T; ms: number }> {
  const tries = []
  for (let i = 0; i < 2; i++) {
    const start = performance.now()
    tries.push({ result: await run(), ms: performance.now() - start })
    if (tries[i]!.ms <= mostMs) break
  }
  return tries.sort((a, b) => a.ms - b.ms)[0]!
}

const entry = (parts: object = {}, rest: object = {}) => ({ kind: 'question', kit: 'whimbrel-2', sections: ['X-1'], title: 'Labels', parts: { doing: 'Labelling.', ...parts }, acknowledgedCautions: [], ...rest })

describe('through the API', () => {
  test.each<[string, string, string, unknown, number, Record<string, string>?]>([
    ['nothing', 'POST', '/api/entries', '', 400],
    ['an empty object', 'POST', '/api/entries', {}, 422],
    ['broken JSON', 'POST', '/api/entries', '{"kind":', 400],
    ['a field of 900 kB', 'POST', '/api/entries', entry({ doing: 'x'.repeat(900_000) }), 422],
    ['more than 1 MB', 'POST', '/api/entries', entry({ doing: 'x'.repeat(1_100_000) }), 413],
    ['control characters', 'POST', '/api/entries', entry({ doing: 'a\u0000b\u0007' }), 422],
    ['a wrong type', 'POST', '/api/entries', entry({}, { title: 7 }), 422],
    ['an unknown field', 'POST', '/api/entries', entry({}, { votes: 1 }), 422],
    ['an unknown kit', 'POST', '/api/entries', entry({}, { kit: 'albatross-9' }), 422],
    ['an unknown section', 'POST', '/api/entries', entry({}, { sections: ['Z-99'] }), 422],
    ['an unknown task', 'POST', '/api/entries', entry({}, { tasks: ['yodel'] }), 422],
    ['another content type', 'POST', '/api/entries', entry(), 415, { 'content-type': 'text/plain' }],
    ['an unknown post', 'POST', '/api/posts/999999/remarks', { body: 'x' }, 404],
    ['an id that is none', 'GET', '/api/entries/1e9', undefined, 404],
    ['a query twice', 'GET', '/api/search?q=a&q=b', undefined, 400],
    ['a query of 600 characters', 'GET', `/api/search?q=${'x'.repeat(600)}`, undefined, 422],
    ['a method that is none', 'DELETE', '/api/search', undefined, 405],
    ['an address that is none', 'GET', '/api/nothing/here', undefined, 404],
    ['ten thousand open quotes', 'POST', '/api/entries', entry({ doing: '>'.repeat(5_001) }), 422],
  ])('%s is refused in words', async (_what, method, address, body, status, headers = {}) => {
    const { result, ms } = await timed(() => call('dela', method, address, body, { headers }))
    expect(result.status).toBe(status)
    expect(result.headers.get('content-type')).toContain('application/problem+json')
    expect(result.body.detail.length).toBeGreaterThan(5)
    expect(result.text).not.toMatch(/\bat .*\.(js|ts):\d+/)
    expect(ms).toBeLessThan(mostMs)
  })

  test('bytes that are not UTF-8 are refused', async () => {
    const { baseUrl } = inject('server')
    const sent = await fetch(`${baseUrl}/api/entries`, { method: 'POST', body: Buffer.from([0x7b, 0x22, 0xff, 0xfe, 0x22, 0x7d]), headers: { 'content-type': 'application/json', origin: baseUrl, cookie: `${sessionCookie}=${await sessionValue('dela')}` } })
    expect(sent.status).toBe(400)
  })

  test('a stale revision gets the present one', async () => {
    await must('marit', 'PATCH', `/api/entries/${question.id}`, { revision, parts: { doing: 'Which label holds?' }, acknowledgedCautions: [] })
    const stale = await call('marit', 'PATCH', `/api/entries/${question.id}`, { revision, parts: { doing: 'Which label?' }, acknowledgedCautions: [] })
    expect(stale.status).toBe(409)
    expect(stale.body.current.text).toContain('Which label holds?')
  })

  // Bombs for Markdown parsers, each at the limit of a part (5,000) or a body (20,000).
  test.each([
    ['asterisks', '*'.repeat(10_000)], ['quotes', '>'.repeat(10_000)], ['brackets', '['.repeat(10_000)], ['nested lists', Array.from({ length: 200 }, (_, i) => `${' '.repeat(i)}- a`).join('\n')],
    ['links', '[a](https://example.org/) '.repeat(700)], ['a huge table', `|${'a|'.repeat(300)}\n|${'-|'.repeat(300)}\n${`|${'b|'.repeat(300)}\n`.repeat(25)}`.slice(0, 20_000)], ['emphasis and links', '*a _b **c __d [e '.repeat(1_100)],
  ])('a bomb of %s is answered at once', async (_what, bomb) => {
    const { result, ms } = await timed(() => call('dela', 'POST', '/api/preview', { body: bomb }))
    expect([200, 422]).toContain(result.status)
    expect(ms).toBeLessThan(mostMs)
    const said = await timed(() => call('dela', 'POST', `/api/entries/${question.id}/answers`, { body: bomb, acknowledgedCautions: [] }))
    expect([201, 422]).toContain(said.result.status)
    expect(said.ms).toBeLessThan(mostMs)
    const { ms: readMs, result: read } = await timed(() => call(null, 'GET', question.url))
    expect(read.status).toBe(200)
    expect(readMs).toBeLessThan(2 * mostMs)
  })

  test('scripts, data links and handlers are gone from what was written', async () => {
    const nasty = '<script>alert(1)</script> <img src=x onerror=alert(2)> [x](javascript:alert(3)) [y](data:text/html,<script>alert(4)</script>) <a href="vbscript:x">z</a> ![p](https://elsewhere.example/p.png) plain words'
    const made = await must('dela', 'POST', '/api/entries', entry({ doing: nasty }))
    expect(made.html).toContain('plain words')
    expect(made.html).not.toMatch(/<(script|img|iframe)|<a [^>]*href="(?!https?:|mailto:|#|\/)/i)
    const page = await openPage()
    page.on('dialog', (dialog) => { throw new Error(`It ran: ${dialog.message()}`) })
    await visit(page, `/entries/${made.id}`)
    await page.getByText('plain words').first().waitFor()
    expect(await page.locator('main script:not([nonce]), main [onerror], main a[href^="javascript:"], main a[href^="data:"]').count()).toBe(0)
  })
})

describe('in the page', () => {
  test.each([
    ['control characters', 'Rib \u0007 bell', /Control characters are not allowed/],
    ['more than fits', 'x'.repeat(6_000), /At most 5,000 characters/],
    ['1 MB', 'A line of text.\n'.repeat(65_536), /At most 5,000 characters/],
  ])('%s is refused in words, and the text stays', async (_what, text, message) => {
    // What is asked of the API while writing is refused too, for the same reason.
    const page = await openPage({ as: 'dela', expects: [413, 422] })
    await visit(page, '/ask')
    await page.getByLabel('What is the question?').fill('Labels on a tray')
    await page.getByLabel('Kit and section').selectOption('whimbrel-2/X-1')
    // Past maxlength, as a script or an older page would send it.
    await page.getByLabel('Doing').evaluate((area, value) => {
      area.removeAttribute('maxlength')
      Object.getOwnPropertyDescriptor(HTMLTextAreaElement.prototype, 'value')?.set?.call(area, value)
      area.dispatchEvent(new Event('input', { bubbles: true }))
    }, text)
    const start = performance.now()
    await page.getByRole('button', { name: 'Post the question' }).click()
    await page.getByRole('alert').filter({ hasText: message }).waitFor()
    expect(performance.now() - start).toBeLessThan(text.length > 100_000 ? 4 * mostMs : 2 * mostMs)
    expect(await page.getByLabel('Doing').inputValue()).toBe(text)
    expect(await page.getByLabel('What is the question?').inputValue()).toBe('Labels on a tray')
  })

  test('right-to-left, emoji and combining letters are written, found and read back', async () => {
    const word = unique()
    const text = `שלום ${word} مرحبا 👩🏽‍🔧✈️ é ‮abc‬ zero​width`
    const page = await openPage({ as: 'dela', width: 390 })
    await visit(page, '/ask')
    await page.getByLabel('What is the question?').fill(`Labels ${word} 👩🏽‍🔧 שלום`)
    await page.getByLabel('Kit and section').selectOption('whimbrel-2/X-1')
    await page.getByLabel('Doing').fill(text)
    await page.getByRole('button', { name: 'Post the question' }).click()
    await page.waitForURL(/\/entries\/\d+/)
    await page.getByRole('heading', { level: 1, name: new RegExp(word) }).waitFor()
    const found = await must(null, 'GET', `/api/search?q=${encodeURIComponent('שלום')}`)
    expect(found.results.some((hit: { title: string }) => hit.title.includes(word))).toBe(true)
    // Overriding the direction of what follows must not reach out of the text.
    const body = await must(null, 'GET', `/api/entries/${new URL(page.url()).pathname.split('/').at(-1)}`)
    expect(body.text).toContain('مرحبا')
    expect(body.text).not.toContain('‮')
  })

  test.each([
    ['an id that is none', '/entries/1e9'], ['a huge id', '/entries/99999999999999999999'], ['half a percent sign', '/kits/whimbrel-2/%25E0%25A4%25A'], ['broken UTF-8', '/kits/whimbrel-2/%E0%A4%A'],
    ['a section that is markup', '/kits/whimbrel-2/%3Cscript%3Ealert(1)%3C%2Fscript%3E'], ['a row that is none', '/answers/abc/edit'], ['revisions of nothing', '/posts/0/revisions'], ['a slug with dots', '/guide/..%2F..%2Fpackage.json'],
  ])('%s in an address is not found', async (_what, address) => {
    const { result, ms } = await timed(() => call('dela', 'GET', address))
    expect([400, 404]).toContain(result.status)
    expect(ms).toBeLessThan(mostMs)
    expect(result.text).not.toContain('<script>alert(1)')
  })

  test.each([
    ['an unknown kit', '/search?kit=nope'], ['a section without its kit', '/search?section=W-3'], ['an offset below zero', '/search?offset=-5'], ['an offset that is none', '/search?offset=abc'],
    ['an unknown kind', '/search?kind=poem'], ['words given twice', '/search?q=a&q=b'], ['too many words', `/search?q=${'x'.repeat(600)}`], ['a null character', '/search?q=%00'],
    ['open brackets', `/search?q=${'('.repeat(200)}`], ['broken UTF-8', '/search?q=%E0%A4%A'], ['a sheet that is none', '/desk?open=abc'], ['markup to carry over', '/ask?title=%3Cscript%3E'],
  ])('%s in a query shows a page', async (_what, address) => {
    const { result, ms } = await timed(() => call('jory', 'GET', address))
    expect(result.status).toBe(200)
    expect(ms).toBeLessThan(mostMs)
    expect(result.text).toContain('</html>')
  })

  test('another site as the way on after signing in is not followed', async () => {
    const page = await openPage({ javaScript: false })
    await page.goto('/sign-in?from=https://elsewhere.example/')
    expect(await page.locator('main form input[name=from]').count()).toBe(0)
    await page.goto('/sign-in?from=//elsewhere.example/')
    expect(await page.locator('main form input[name=from]').count()).toBe(0)
  })
})
