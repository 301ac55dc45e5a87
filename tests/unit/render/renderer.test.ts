// The render thread itself, bundled as in production: hostile texts are answered in time and hurt nobody else.
import { mkdtemp, rm, writeFile } from 'node:fs/promises'
import os from 'node:os'
import path from 'node:path'
import { afterAll, afterEach, beforeAll, describe, expect, it } from 'vitest'
import { createRenderer, TextRefusedError, type Renderer } from '@/lib/render/renderer'
import { buildWorkers } from '@/scripts/build-workers.mjs'

let directory: string
let workerFile: string
let renderer: Renderer

beforeAll(async () => {
  directory = await mkdtemp(path.join(os.tmpdir(), 'pilothole-render-'))
  await buildWorkers(directory)
  workerFile = path.join(directory, 'render.mjs')
  renderer = createRenderer({ workerFile, timeoutMs: 2_000 })
  await renderer.render({ body: 'first' })
})
afterAll(async () => {
  await renderer.close()
  await rm(directory, { recursive: true, force: true })
})

const opened: Renderer[] = []
const open = (options: { workerFile: string; timeoutMs?: number }): Renderer => {
  const extra = createRenderer(options)
  opened.push(extra)
  return extra
}
afterEach(async () => {
  await Promise.all(opened.splice(0).map((extra) => extra.close()))
})

const fill = (unit: string, length: number): string => unit.repeat(Math.ceil(length / unit.length)).slice(0, length)
const lists = (depth: number): string => Array.from({ length: depth }, (_unused, at) => `${'  '.repeat(at)}- a`).join('\n')

describe('a text is answered within 500 ms, rendered or refused', () => {
  // The first three stopped remark with GFM for 2.8 s, 65 s and 1.8 s before the scan was there (measured on this stack).
  const refused: [string, string][] = [
    ['10 kB of asterisks', '*'.repeat(10_000)],
    ['40 kB of asterisks', '*'.repeat(40_000)],
    ['5 kB of quote marks', '>'.repeat(5_000)],
    ['10 kB of quote marks', '>'.repeat(10_000)],
    ['a megabyte', 'a'.repeat(1_000_000)],
    ['a table of 3,000 columns', `|${'a|'.repeat(3_000)}\n|${'-|'.repeat(3_000)}\n|${'a|'.repeat(3_000)}`],
    ['a table of 9,000 short rows', `|${'a|'.repeat(50)}\n|${'-|'.repeat(50)}\n${'|\n'.repeat(9_000)}`],
    ['2,500 links', fill('[a](b) ', 17_500)],
    ['1,400 definitions', Array.from({ length: 1_400 }, (_unused, at) => `[a${at}]: b`).join('\n')],
    ['lists 60 deep', lists(60)],
    ['5,000 underlined headings', fill('a\n=\n', 20_000)],
    ['an address full of references', `http://a.example/${fill('&a;', 19_000)}`],
    ['emphasis around every word', fill('a**b' + 'c* ', 20_000)],
  ]
  const rendered: [string, string][] = [
    ['20,000 characters of plain paragraphs', fill('Deburr the *edges* first. It is `fine`.\n\n', 20_000)],
    ['open brackets only', '['.repeat(20_000)],
    ['brackets everywhere', fill('[a] ', 20_000)],
    ['lists 20 deep', lists(20)],
    ['quotes 20 deep, then lazy lines', `${'> '.repeat(20)}a\n${'a\n'.repeat(1_900)}`],
    ['2,000 cells', `|${'a|'.repeat(20)}\n|${'-|'.repeat(20)}\n${'|\n'.repeat(95)}`],
    ['2,000 marks of emphasis', fill('a**bc* ', 6_990)],
    ['990 underlined headings', fill('a\n=\n', 3_960)],
    ['1,900 list items', fill('- a\n', 7_600)],
    ['HTML everywhere', fill('<b>x</b> ', 20_000)],
    ['backticks that never match', Array.from({ length: 190 }, (_unused, at) => `${'`'.repeat((at % 50) + 1)}a`).join(' ')],
    ['numbers everywhere', fill('#30 3/16 in, 20-25 in-lb or .032; ', 20_000)],
    ['a number in every item', fill('- 3/16 in\n', 5_000)],
    ['half a size on each side of a mark', fill('*3*/16 #*30* ', 5_980)],
    ['spaces', ' '.repeat(20_000)],
    ['emoji', '😀'.repeat(10_000)],
    ['nothing', ''],
  ]

  it.each(refused)('%s: refused', { retry: 4 }, async (_name, text) => {
    const start = performance.now()
    await expect(renderer.render({ body: text })).rejects.toThrow(TextRefusedError)
    expect(performance.now() - start).toBeLessThan(500)
  })

  it.each(rendered)('%s: rendered', { retry: 4 }, async (_name, text) => {
    const start = performance.now()
    const { html, plain } = await renderer.render({ body: text })
    expect(performance.now() - start).toBeLessThan(500)
    expect(typeof html['body']).toBe('string')
    expect(html['body'] === '').toBe(text.trim() === '')
    expect(plain['body']?.length).toBeLessThanOrEqual(text.length + 10)
  })
})

describe('the renderer', () => {
  it('renders several fields of one post under their names', async () => {
    const { html, plain } = await renderer.render({ doing: '**Drill** it', tried: '' })
    expect(html).toEqual({ doing: '<p><strong>Drill</strong> it</p>', tried: '' })
    expect(plain).toEqual({ doing: 'Drill it', tried: '' })
  })

  it('normalises before it renders', async () => {
    expect((await renderer.render({ body: 'a\r\n\r\nb\u202Ec\u0000' })).html['body']).toBe('<p>a</p>\n<p>bc</p>')
  })

  it('names the field that is refused', async () => {
    const error = await renderer.render({ doing: 'fine', tried: '*'.repeat(51) }).catch((reason: unknown) => reason)
    expect(error).toBeInstanceOf(TextRefusedError)
    expect(error).toMatchObject({ field: 'tried', message: expect.stringContaining('Line 1') })
  })

  it('stops a text that takes too long and renders those behind it on a new thread', async () => {
    const tight = open({ workerFile, timeoutMs: 40 })
    await tight.render({ body: 'warm' })
    const heavy = fill('[a] ', 20_000)
    const [slow, ...others] = await Promise.allSettled([tight.render({ title: 'fine', body: heavy }), tight.render({ body: 'second' }), tight.render({ body: 'third' })])
    expect(slow).toMatchObject({ status: 'rejected', reason: { name: 'TextRefusedError', field: 'body' } })
    expect(others.map((other) => other.status === 'fulfilled' && other.value.plain['body'])).toEqual(['second', 'third'])
  })

  it('lays a thread that dies to the text it was at, and goes on with the next', async () => {
    const fragile = path.join(directory, 'fragile.mjs')
    await writeFile(fragile, `import { parentPort } from 'node:worker_threads'
      parentPort.on('message', ({ id, fields }) => {
        parentPort.postMessage({ type: 'started', id, field: 'body' })
        if (fields.body === 'die') process.exit(3)
        parentPort.postMessage({ type: 'done', id, html: fields, plain: fields })
      })
      parentPort.postMessage({ type: 'ready' })`)
    const shaky = open({ workerFile: fragile })
    const [dead, alive] = await Promise.allSettled([shaky.render({ body: 'die' }), shaky.render({ body: 'live' })])
    expect(dead).toMatchObject({ status: 'rejected', reason: { name: 'TextRefusedError', field: 'body' } })
    expect(alive).toMatchObject({ status: 'fulfilled', value: { html: { body: 'live' } } })
  })

  it('says that the bundle is missing, and does not blame the text', async () => {
    const lost = open({ workerFile: path.join(directory, 'absent.mjs') })
    const error = await lost.render({ body: 'a' }).catch((reason: unknown) => reason)
    expect(error).not.toBeInstanceOf(TextRefusedError)
    expect(error).toMatchObject({ message: expect.stringContaining('npm run build:workers') })
  })

  it('rejects what still waits when it is closed, and what comes after', async () => {
    const closing = createRenderer({ workerFile })
    const waiting = closing.render({ body: 'a' })
    const settled = expect(waiting).rejects.toThrow('closed')
    await Promise.resolve()
    await closing.close()
    await settled
    await expect(closing.render({ body: 'b' })).rejects.toThrow('closed')
  })
})
