// What people and machines send that is broken, huge or hostile: a clear refusal in time, nothing lost, nothing runs.
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { count } from 'drizzle-orm'
import { post } from '@/db/schema'
import type { Entry } from '@/lib/schemas/post'
import type { Problem } from '@/lib/schemas/problem'
import { api } from '../support/api'
import { openTestRuntime, type TestRuntime } from '../support/database'
import { aMember, anAnswer, anEntry, entryInput, type Somebody } from '../support/factories'

let runtime: TestRuntime
let by: Somebody
beforeAll(async () => {
  runtime = await openTestRuntime()
  by = await aMember()
})
afterAll(() => runtime.close())

const posts = async () => (await runtime.database.reader.select({ n: count() }).from(post))[0]?.n
const json = { 'content-type': 'application/json' }
const withDoing = (doing: string) => entryInput({ parts: { doing } })
const publish = (doing: string) => api<Entry & Problem>('POST', '/api/entries', { token: by.token, body: withDoing(doing) })

describe('bodies that cannot be read', () => {
  it.each<[string, string | Uint8Array<ArrayBuffer>, Record<string, string>, number]>([
    ['nothing', '', json, 400],
    ['half an object', '{"kind":"question"', json, 400],
    ['broken UTF-8', Uint8Array.from([0x7b, 0x22, 0xc3, 0x28, 0x22, 0x3a, 0x31, 0x7d]), json, 400],
    ['UTF-16', Uint8Array.from(Buffer.from('{"a":1}', 'utf16le')), json, 400],
    ['a form', 'title=x', { 'content-type': 'application/x-www-form-urlencoded' }, 415],
    ['text that is JSON', '{}', { 'content-type': 'text/plain' }, 415],
    ['a list', '[]', json, 422],
    ['null', 'null', json, 422],
    ['a word', '"hello"', json, 422],
    ['a prototype', '{"__proto__":{"role":"steward"},"kind":"question"}', json, 422],
    ['100,000 brackets', '['.repeat(100_000), json, 400],
  ])('%s', async (_, raw, headers, status) => {
    const before = await posts()
    const startedAt = performance.now()
    expect((await api('POST', '/api/entries', { token: by.token, raw, headers })).status).toBe(status)
    expect(performance.now() - startedAt).toBeLessThan(500)
    expect(await posts()).toBe(before)
  })

  it('more than 1,000,000 bytes are 413, with or without their length in front', async () => {
    const body = JSON.stringify(withDoing('x'.repeat(1_000_000)))
    const startedAt = performance.now()
    expect((await api('POST', '/api/entries', { token: by.token, raw: body, headers: { ...json, 'content-length': String(body.length) } })).status).toBe(413)
    expect((await api('POST', '/api/entries', { token: by.token, raw: body, headers: json })).status).toBe(413)
    expect(performance.now() - startedAt).toBeLessThan(500)
  })

  it('just under that, each call says in time what is too long', async () => {
    const long = 'x'.repeat(990_000)
    const [answer, entry] = [await anAnswer(), await anEntry({}, by)]
    const calls: [Parameters<typeof api>[0], string, object][] = [
      ['POST', '/api/entries', withDoing(long)], ['PATCH', `/api/entries/${entry.id}`, { revision: 'A', title: long }],
      ['POST', `/api/entries/${answer.questionId}/answers`, { body: long }], ['POST', `/api/posts/${answer.id}/remarks`, { body: long }],
      ['PUT', `/api/posts/${answer.id}/outcome`, { result: 'with-change', note: long }], ['POST', '/api/preview', { body: long }],
      ['POST', '/api/similar', { title: long }], ['POST', '/api/cautions/required', { body: long }],
    ]
    for (const [method, path, body] of calls) {
      const startedAt = performance.now()
      expect((await api(method, path, { token: by.token, body })).status, path).toBe(422)
      expect(performance.now() - startedAt, path).toBeLessThan(500)
    }
  })
})

describe('texts that explode a Markdown parser', () => {
  it.each<[string, string]>([
    ['5,000 asterisks', '*'.repeat(5000)],
    ['5,000 asterisks between letters', '*a'.repeat(2500)],
    ['5,000 quote marks', '>'.repeat(5000)],
    ['5,000 brackets', '['.repeat(5000)],
    ['2,500 underscores and letters', 'a_'.repeat(2500)],
    ['a table of 100 columns', `|${'a|'.repeat(100)}\n|${'-|'.repeat(100)}\n`],
    ['a table of 1,000 rows and 2 columns', `|a|b|\n|-|-|\n${'|1|\n'.repeat(1000)}`],
    ['51 links', '<https://a.example> '.repeat(51)],
    ['nested lists', Array.from({ length: 60 }, (_, i) => `${' '.repeat(2 * i)}- a`).join('\n')],
    ['5,000 backticks', '`'.repeat(5000)],
  ])('%s: answered within 500 ms', { retry: 4 }, async (_, text) => {
    const startedAt = performance.now()
    const previewed = await api('POST', '/api/preview', { body: { body: text } })
    expect(performance.now() - startedAt).toBeLessThan(500)
    const published = await publish(text)
    expect(performance.now() - startedAt).toBeLessThan(1000)
    expect(published.status).toBe(previewed.status === 200 ? 201 : 422)
  })

  it('10 kB and 40 kB in a body of an answer are refused in words, naming the field', async () => {
    const { questionId } = await anAnswer()
    for (const body of ['*'.repeat(10_000), '>'.repeat(10_000), '*'.repeat(40_000)]) {
      const startedAt = performance.now()
      const refused = await api<Problem>('POST', `/api/entries/${questionId}/answers`, { token: by.token, body: { body } })
      expect([refused.status, refused.body.errors?.[0]?.path]).toEqual([422, 'body'])
      expect(performance.now() - startedAt).toBeLessThan(500)
    }
  })
})

describe('texts that would run', () => {
  it.each([
    '[go](javascript:alert(1))', '[go](JaVaScRiPt:alert(1))', '[go](data:text/html;base64,PHNjcmlwdD4=)', '[go](vbscript:x)', '![x](javascript:alert(1))',
    '<script>alert(1)</script>', '<img src=x onerror=alert(1)>', '<a href="javascript:alert(1)">x</a>', '<iframe src="https://a.example"></iframe>', '<svg onload=alert(1)>',
    '[go]( \tjava\nscript:alert(1))', '<javascript:alert(1)>', '"><script>alert(1)</script>',
  ])('%j is published without what runs, and stays readable as typed', async (text) => {
    const { status, body } = await publish(`See ${text}`)
    expect(status).toBe(201)
    expect(body.parts?.['doing']).toBe(`See ${text}`)
    const tags = body.html.match(/<[a-z][^>]*>/gi) ?? []
    expect(tags.filter((tag) => /^<(script|iframe|svg|img|object|style)\b/i.test(tag) || /\son\w+\s*=/i.test(tag) || /(href|src)\s*=\s*["']?\s*(javascript|data|vbscript):/i.test(tag))).toEqual([])
  })

  it('a title is text everywhere: no HTML is made of it', async () => {
    const title = '<b onclick=x>Title & more</b>'
    const { body } = await api<Entry>('POST', '/api/entries', { token: by.token, body: entryInput({ title }) })
    expect(body.title).toBe(title)
    expect(body.html).not.toContain('onclick')
  })
})

describe('texts from everywhere', () => {
  it.each([
    ['Arabic', 'ثقب بقطر ٣٫٢ مم في اللوح'], ['Hebrew with marks', 'קדח בלוח \u200f#30\u200f'], ['emoji with joiners and skin', '👩🏽‍🔧 🛩️ 🇳🇿'], ['Thai without spaces', 'เจาะรูนำก่อน'],
    ['combining marks as typed', 'e\u0301 and \u00e9'], ['mathematical letters', '𝐝 = ⅜″'], ['a tab and two spaces', 'a\tb  c'],
  ])('%s is kept as it was sent', async (_, text) => {
    const { body } = await publish(text)
    expect(body.parts?.['doing']).toBe(text)
    expect((await api<Entry>('GET', `/api/entries/${body.id}`)).body.parts?.['doing']).toBe(text)
  })

  it.each(['\u0000', '\u0007', '\u001b[31m', '\u007f'])('control characters (%j) are refused and named', async (control) => {
    const { status, body } = await publish(`a${control}b`)
    expect([status, body.errors?.[0]?.path]).toEqual([422, 'parts.doing'])
  })

  it('half a surrogate pair becomes the replacement character, also after a reading back', async () => {
    const { token } = by
    const raw = JSON.stringify(withDoing('HALF')).replace('HALF', 'a\\ud800b')
    const { body } = await api<Entry>('POST', '/api/entries', { token, raw, headers: json })
    expect(body.parts?.['doing']).toBe('a\ufffdb')
  })

  it('line ends of other systems become line feeds', async () => {
    expect((await publish('one\r\ntwo\rthree')).body.parts?.['doing']).toBe('one\ntwo\nthree')
  })
})
