// Import: what a line may say, what happens to a bad one, and what the same ref does again.
import { execFile } from 'node:child_process'
import { mkdtempSync, rmSync, writeFileSync } from 'node:fs'
import os from 'node:os'
import path from 'node:path'
import { promisify } from 'node:util'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { count, eq } from 'drizzle-orm'
import { checkAudit } from '@/db/check-audit'
import { openDatabase } from '@/db/client'
import { member, post, postCaution } from '@/db/schema'
import { write } from '@/db/transaction'
import type { Entry } from '@/lib/schemas/post'
import type { ImportResult } from '@/lib/schemas/import'
import type { SearchResult } from '@/lib/schemas/search'
import { api } from '../support/api'
import { copyDatabase, openTestRuntime, type TestRuntime } from '../support/database'
import { aMember, aMentor, anAnswer, type Somebody } from '../support/factories'

let runtime: TestRuntime
let steward: Somebody
beforeAll(async () => {
  runtime = await openTestRuntime()
  steward = await aMember({ role: 'steward' })
})
afterAll(() => runtime.close())

const ndjson = { 'content-type': 'application/x-ndjson' }
const send = (raw: string | Uint8Array<ArrayBuffer>, by: Somebody = steward) => api<ImportResult>('POST', '/api/import', { token: by.token, raw, headers: ndjson })
const lines = (...entries: object[]) => entries.map((e) => JSON.stringify(e)).join('\n')
let made = 0
const aLine = (extra: object = {}) => ({ ref: `line-${++made}`, kind: 'question', kit: 'whimbrel-2', sections: ['X-1'], tasks: [], hardware: [], title: `Imported case ${made}`, body: 'Where do the labels go?', ...extra })
const byRef = async (ref: string): Promise<Entry> => {
  const [row] = await runtime.database.reader.select({ id: post.id }).from(post).where(eq(post.ref, ref))
  return (await api<Entry>('GET', `/api/entries/${row?.id}`)).body
}
const posts = async () => (await runtime.database.reader.select({ n: count() }).from(post))[0]?.n

describe('POST /api/import', () => {
  it('takes entries with answers, by title or slug in any case, and they can be found', async () => {
    const line = aLine({ kit: 'WHIMBREL 2', sections: ['wing ribs to SPAR'], tasks: ['Mark Left and Right'], operations: ['Deburr'], author: 'Old Sam', createdAt: '2019-05-01T10:00:00+02:00', title: 'Perdurable ribs', answers: [{ ref: 'a1', body: 'Turn it over.', author: 'Meg' }] })
    expect((await send(lines(line))).body).toEqual({ imported: 1, updated: 0, unchanged: 0, failed: [] })
    const entry = await byRef(line.ref)
    expect(entry).toMatchObject({ ref: line.ref, kit: 'whimbrel-2', sections: ['W-3'], tasks: ['mark-sides'], operations: ['mark', 'deburr'], author: { name: 'Old Sam' }, createdAt: '2019-05-01T08:00:00.000Z', revision: 'A' })
    expect(entry.answers).toMatchObject([{ ref: 'a1', author: { name: 'Meg' }, text: 'Turn it over.' }])
    expect((await api<SearchResult>('GET', '/api/search?q=perdurable')).body.results.map((h) => h.id)).toEqual([entry.id])
  })

  it('attaches the cautions that are required, acknowledged by nobody', async () => {
    const line = aLine({ sections: ['W-3'], answers: [{ body: 'Turn it over.' }] })
    await send(lines(line))
    const entry = await byRef(line.ref)
    for (const { id, needsTwo } of [entry, ...entry.answers]) {
      expect(needsTwo).toBe(true)
      const rows = await runtime.database.reader.select().from(postCaution).where(eq(postCaution.postId, id))
      expect(rows.map((r) => [r.code, r.origin, r.acknowledgedAt])).toEqual([['structure', 'rule', null]])
    }
  })

  it('an imported stamp stands below stamped and is never one of two', async () => {
    const line = aLine({ sections: ['W-3'], answers: [{ body: 'Turn it over.', stamped: true }] })
    await send(lines(line, aLine({ ref: 'stamped-lesson', kind: 'lesson', stamped: true })))
    const [answer] = (await byRef(line.ref)).answers
    expect(answer).toMatchObject({ stamp: 'imported', missing: 'first', stamps: [] })
    expect((await byRef('stamped-lesson')).stamp).toBe('imported')
    await api('POST', `/api/posts/${answer!.id}/stamps`, { token: (await aMentor()).token, body: { revision: 'A', basis: 'standard', reference: 'ch. 4' } })
    expect((await byRef(line.ref)).answers[0]).toMatchObject({ stamp: 'one-of-two', missing: 'second' })
  })

  it('names each bad line and goes on', async () => {
    const good = aLine()
    const broken = Buffer.concat([Buffer.from('{"title":"'), Buffer.from([0xff, 0xfe]), Buffer.from('"}')])
    const file = Buffer.concat([Buffer.from([
      '{"half":', '', JSON.stringify(aLine({ kit: 'Heron 9' })), JSON.stringify(aLine({ sections: ['Z-9'], tasks: ['juggle'] })), JSON.stringify(aLine({ title: 'x'.repeat(161) })), JSON.stringify(aLine({ colour: 'red' })),
      JSON.stringify({ type: 'member', name: 'x' }), '[]', JSON.stringify(aLine({ kind: 'lesson', answers: [{ body: 'x' }] })), JSON.stringify(aLine({ createdAt: 'yesterday' })), JSON.stringify(aLine({ createdAt: '2999-01-01' })), JSON.stringify(aLine({ body: '*'.repeat(5000) })), JSON.stringify(aLine({ body: undefined })), '',
    ].join('\n')), broken, Buffer.from(`\r\n${JSON.stringify(good)}`)])
    const { body } = await send(new Uint8Array(file))
    expect(body).toMatchObject({ imported: 1, updated: 0, unchanged: 0 })
    expect(body.failed.map((f) => f.line)).toEqual([1, 3, 4, 5, 6, 7, 8, 9, 10, 11, 12, 13, 14])
    const of = (line: number) => body.failed.find((f) => f.line === line)?.message
    expect(of(1)).toBe('Not JSON.')
    expect(of(3)).toContain('Heron 9')
    expect(of(4)).toMatch(/Z-9.*juggle/)
    expect(of(5)).toContain('title')
    expect(of(6)).toContain('colour')
    expect(of(7)).toContain('type')
    expect(of(12)).toContain('50')
    expect(of(14)).toBe('Not UTF-8.')
    expect((await byRef(good.ref)).title).toBe(good.title)
  })

  it('the same ref again changes nothing, or makes a new revision of what changed', async () => {
    const line = aLine({ answers: [{ ref: 'one', body: 'First.' }, { body: 'Second.' }] })
    await send(lines(line))
    expect((await send(lines(line))).body).toEqual({ imported: 0, updated: 0, unchanged: 1, failed: [] })
    expect((await send(lines({ ...line, answers: [{ body: 'Second, better.' }, { ref: 'one', body: 'First.' }] }))).body).toMatchObject({ unchanged: 0, updated: 1 })
    const changed = { ...line, body: 'Where do the labels really go?', answers: [{ ref: 'one', body: 'First, better.' }] }
    expect((await send(lines(changed))).body).toMatchObject({ imported: 0, updated: 1 })
    const entry = await byRef(line.ref)
    expect([entry.revision, entry.body, entry.revisions.length]).toEqual(['B', 'Where do the labels really go?', 2])
    expect(entry.answers.find((a) => a.ref === 'one')).toMatchObject({ revision: 'B', text: 'First, better.' })
  })

  it('answers without a ref match by their place, and an answer written here is never theirs', async () => {
    const line = aLine({ answers: [{ body: 'Zero.' }, { body: 'One.' }] })
    await send(lines(line))
    const own = await anAnswer({ question: await byRef(line.ref), body: 'Written here.' })
    expect((await send(lines({ ...line, answers: [{ body: 'Zero.' }, { body: 'One, better.' }, { body: 'Two.' }] }))).body).toMatchObject({ updated: 1 })
    const { answers } = await byRef(line.ref)
    expect(answers.map((a) => [a.text, a.revision]).sort()).toEqual([['One, better.', 'B'], ['Two.', 'A'], ['Written here.', 'A'], ['Zero.', 'A']])
    expect(answers.find((a) => a.id === own.id)?.text).toBe('Written here.')
  })

  it('a changed question lapses the stamps under it', async () => {
    const line = aLine({ answers: [{ body: 'Turn it over.' }] })
    await send(lines(line))
    const [answer] = (await byRef(line.ref)).answers
    await api('POST', `/api/posts/${answer!.id}/stamps`, { token: (await aMentor()).token, body: { revision: 'A', basis: 'standard', reference: 'ch. 4' } })
    await send(lines({ ...line, sections: ['W-3'] }))
    expect((await byRef(line.ref)).answers[0]).toMatchObject({ stamp: 'lapsed', cautions: [{ code: 'structure' }] })
  })

  it('a ref that is something else here fails its line', async () => {
    const line = aLine()
    await send(lines(line))
    const { body } = await send(lines({ ...line, kind: 'lesson' }, aLine()))
    expect(body).toMatchObject({ imported: 1, failed: [{ line: 1, message: expect.stringContaining('question') }] })
  })

  it('two lines with one ref are one entry', async () => {
    const line = aLine()
    expect((await send(lines(line, { ...line, title: 'Second title' }))).body).toMatchObject({ imported: 1, updated: 1 })
    expect((await byRef(line.ref)).title).toBe('Second title')
  })

  it('takes files made elsewhere: id for ref, section for sections, cautions unread', async () => {
    const { ref: id, sections: _, ...line } = aLine()
    expect((await send(lines({ id, ...line, section: 'workshop', cautions: ['fire'] }))).body).toMatchObject({ imported: 1 })
    expect(await byRef(id)).toMatchObject({ sections: ['X-1'], cautions: [] })
  })

  it('is for stewards alone, and takes NDJSON alone', async () => {
    const before = await posts()
    expect((await send(lines(aLine()), await aMember({ role: 'moderator' }))).status).toBe(403)
    expect((await api('POST', '/api/import', { raw: lines(aLine()), headers: ndjson })).status).toBe(401)
    expect((await api('POST', '/api/import', { token: steward.token, body: aLine() })).status).toBe(415)
    expect(await posts()).toBe(before)
  })

  it('more than 64,000,000 bytes are 413 and nothing of them is there', async () => {
    const before = await posts()
    const file = Buffer.concat([Buffer.from(`${lines(aLine())}\n`), Buffer.alloc(64_000_000, 0x20)])
    expect((await send(new Uint8Array(file))).status).toBe(413)
    expect(await posts()).toBe(before)
  })

  it('stops naming lines of a file that is none of ours', async () => {
    const { body } = await send('x\n'.repeat(5000))
    expect(body.failed.length).toBeLessThan(1200)
    expect(body.failed.at(-1)?.message).toContain('not read')
  })

  it('lets others write while it runs, and leaves a chain that holds', async () => {
    const many = lines(...Array.from({ length: 400 }, () => aLine({ answers: [{ body: 'Here.' }] })))
    const [{ token }, answer] = [await aMember(), await anAnswer()]
    let isOver = false
    const importing = send(many).finally(() => { isOver = true })
    expect((await api('POST', `/api/posts/${answer.id}/remarks`, { token, body: { body: 'Meanwhile.' } })).status).toBe(201)
    expect(isOver).toBe(false)
    expect((await importing).body.imported).toBe(400)
    expect((await checkAudit(runtime.database.reader)).brokenAt).toBeNull()
  })
})

describe('the commands', () => {
  const run = promisify(execFile)
  const folder = mkdtempSync(path.join(os.tmpdir(), 'pilothole-test-'))
  let environment: NodeJS.ProcessEnv
  let remove: () => void
  beforeAll(async () => {
    const copy = await copyDatabase()
    remove = copy.remove
    environment = { ...process.env, DATA_DIR: path.dirname(copy.file), NODE_ENV: 'production' }
    const database = await openDatabase(copy.file)
    await write(database, { actorId: null, at: Date.now() }, async (tx, record) => {
      await tx.insert(member).values({ email: 'steward@pilothole.example', name: 'Steward', role: 'steward', createdAt: Date.now() })
      record('member.test', 'member:1')
    })
    database.close()
  })
  afterAll(() => {
    remove()
    rmSync(folder, { recursive: true, force: true })
  })
  const command = (script: string, ...args: string[]) => run(process.execPath, ['--conditions=react-server', '--import', 'tsx', `scripts/${script}.ts`, ...args], { env: environment }).then((r) => ({ code: 0, ...r }), (e: { code: number; stdout: string; stderr: string }) => e)

  it('import does what the API does and names bad lines with their numbers', async () => {
    const file = path.join(folder, 'lines.jsonl')
    writeFileSync(file, `${lines(aLine())}\nnot json\n`)
    const done = await command('import', file)
    expect(done.stdout).toContain('1 imported, 0 updated, 0 unchanged, 1 failed')
    expect([done.code, done.stderr.trim()]).toEqual([2, 'line 2: Not JSON.'])
  })

  it('token prints a token once, and says when nobody has the address', async () => {
    const done = await command('token', '--email', 'Steward@pilothole.example', '--name', 'laptop')
    expect([done.code, done.stdout]).toEqual([0, expect.stringMatching(/^pht_[\w-]{43}\n$/)])
    const refused = await command('token', '--email', 'nobody@pilothole.example', '--name', 'laptop')
    expect([refused.code, refused.stdout]).toEqual([1, ''])
  })

  it('check-audit says that the trail holds', async () => {
    const done = await command('check-audit')
    expect([done.code, done.stdout]).toEqual([0, expect.stringMatching(/holds: \d+ rows/)])
  })
})
