// Measurements of posts: stored with the text, replaced with it, and filled in for posts that were there before.
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { asc, eq } from 'drizzle-orm'
import { openDatabase } from '@/db/client'
import { currentSequence } from '@/db/queries/search'
import { measurement, post, rendering } from '@/db/schema'
import { findMeasurements } from '@/lib/domain/measurements/find-measurements'
import { parserVersion } from '@/lib/domain/measurements/measurement'
import type { Entry } from '@/lib/schemas/post'
import type { SearchResult } from '@/lib/schemas/search'
import { fillMeasurements } from '@/lib/services/posts/fill-measurements'
import { api } from '../support/api'
import { openTestRuntime, type TestRuntime } from '../support/database'
import { aMember, anAnswer, anEntry } from '../support/factories'

let runtime: TestRuntime
beforeAll(async () => { runtime = await openTestRuntime() })
afterAll(() => runtime.close())

const stored = (postId: number) => runtime.database.reader.select().from(measurement).where(eq(measurement.postId, postId)).orderBy(asc(measurement.position))
const rowOf = async (postId: number) => (await runtime.database.reader.select().from(post).where(eq(post.id, postId)))[0]!
const read = async (id: number): Promise<Entry> => (await api<Entry>('GET', `/api/entries/${id}`)).body
const kinds = (found: { measurements: { kind: string; exact?: string | undefined }[] }) => found.measurements.map(({ kind, exact }) => exact ?? kind)

describe('measurements of a post', () => {
  it('are those of its plain text, with their places in it', async () => {
    const { id } = await anEntry({ parts: { doing: 'A **#30** hole in `0.032` sheet.', plansSay: 'Torque it 20-25 in-lb, says [the page](https://plans.example/3/8).' } })
    const entry = await read(id)
    expect(kinds(entry)).toEqual(['#30', 'length', 'torque'])
    for (const { raw, start, end } of entry.measurements) expect(entry.text.slice(start, end)).toBe(raw)
    expect(entry.measurements).toEqual(findMeasurements(entry.text))
    expect(entry.measurements[2]).toMatchObject({ value: 20, max: 25, unit: 'in-lb', si: { unit: 'N·m' } })
  })

  it('are stored with the version of the parser, apart by kind and value', async () => {
    const answer = await anAnswer({ body: 'Drill it #30, then torque to 2.5 N·m.' })
    expect(await stored(answer.id)).toMatchObject([
      { position: 0, parser: parserVersion, kind: 'drill', found: { exact: '#30' } },
      // One inch is 25.4 mm exactly (NIST SP 811); 2.5 N·m is an SI value already.
      { position: 1, parser: parserVersion, kind: 'torque', siValue: 2.5, found: { unit: 'N·m' } },
    ])
    expect((await stored(answer.id)).map(({ found }) => found)).toEqual(answer.measurements)
    expect((await rowOf(answer.id)).measuredBy).toBe(parserVersion)
  })

  it('are replaced with the text by an edit, of an answer and of an entry', async () => {
    const answer = await anAnswer({ body: 'Drill it #30 in 0.032 sheet.' })
    await api('PATCH', `/api/answers/${answer.id}`, { token: answer.by.token, body: { revision: 'A', body: 'Drill it #40.', acknowledgedCautions: answer.cautions.map((c) => c.code) } })
    expect((await stored(answer.id)).map(({ found }) => found.exact)).toEqual(['#40'])
    const edited = (await read(answer.questionId)).answers.find((a) => a.id === answer.id)
    expect(edited && kinds(edited)).toEqual(['#40'])
    const entry = await anEntry({ body: 'The hole is 3/8 in.' })
    const changed = await api<Entry>('PATCH', `/api/entries/${entry.id}`, { token: entry.by.token, body: { revision: 'A', body: 'The hole is there.', acknowledgedCautions: entry.cautions.map((c) => c.code) } })
    expect(changed.status).toBe(200)
    expect(changed.body.measurements).toEqual([])
    expect(await stored(entry.id)).toEqual([])
  })

  it('come with an import, and with the next one', async () => {
    const steward = await aMember({ role: 'steward' })
    const line = (body: string) => JSON.stringify({ ref: 'measured-line', kind: 'question', kit: 'whimbrel-2', sections: ['X-1'], tasks: [], hardware: [], title: 'Imported hole', body, answers: [{ body: 'Use a No. 40 bit.' }] })
    const send = (body: string) => api('POST', '/api/import', { token: steward.token, raw: line(body), headers: { 'content-type': 'application/x-ndjson' } })
    const imported = async () => { const [row] = await runtime.database.reader.select({ id: post.id }).from(post).where(eq(post.ref, 'measured-line')); return read(row!.id) }
    await send('The hole is 3/16.')
    expect([kinds(await imported()), kinds((await imported()).answers[0]!)]).toEqual([['3/16'], ['#40']])
    expect((await stored((await imported()).id)).length).toBe(1)
    await send('The hole is 4.8 mm and 1/4 in.')
    expect((await stored((await imported()).id)).map(({ found }) => found.unit)).toEqual(['mm', 'in'])
  })

  it('are those of a rendering that had to be made anew', async () => {
    const { id } = await anEntry({ body: 'The hole is #30.' })
    await runtime.database.writer.update(rendering).set({ renderer: 0, plain: 'old' }).where(eq(rendering.key, `post:${id}:1`))
    await runtime.database.writer.delete(measurement).where(eq(measurement.postId, id))
    expect(kinds(await read(id))).toEqual(['#30'])
    expect((await stored(id)).map(({ found }) => found.exact)).toEqual(['#30'])
  })

  it('are found in a preview, with their places in the Markdown that was sent', async () => {
    const body = 'Drill it **#40**, not 3/32.'
    const { body: shown } = await api<{ measurements: Entry['measurements'] }>('POST', '/api/preview', { body: { body } })
    expect(kinds(shown)).toEqual(['#40', '3/32'])
    for (const { raw, start, end } of shown.measurements) expect(body.slice(start, end)).toBe(raw)
  })

  it('have one name in the description of the interface', async () => {
    const { body: description } = await api('GET', '/api/openapi.json')
    const { schemas } = description.components
    expect(schemas.Measurement.required).toEqual(expect.arrayContaining(['raw', 'start', 'end', 'kind', 'value', 'unit', 'si']))
    for (const name of ['Entry', 'Answer', 'post_preview_response', 'post_measurements_response']) {
      expect(schemas[name].properties.measurements.items, name).toEqual({ $ref: '#/components/schemas/Measurement' })
    }
  })
})

describe('a number in a question', () => {
  it('finds an equal one in an answer, and marks it with its unit', async () => {
    // #19 is 0.166 in (ASME B94.11M), which is 4.216 mm.
    const answer = await anAnswer({ body: 'The pin gauge said 4.216 mm, all the way round.' })
    const { body } = await api<SearchResult>('GET', `/api/search?q=${encodeURIComponent('#19')}`)
    expect(body.results.map(({ id, passage }) => [id, passage.postId])).toEqual([[answer.questionId, answer.id]])
    const [hit] = body.results
    expect(hit?.marks.map(([start, end]) => hit.snippet.slice(start, end))).toEqual(['4.216 mm'])
  })
})

describe('posts that were there before', () => {
  /** As an upgrade finds them. */
  const forget = async () => {
    await runtime.database.client.execute('delete from measurement')
    await runtime.database.client.execute('update post set measured_by = 0')
  }
  const everything = async () => (await runtime.database.client.execute('select post_id, position, parser, kind, si_value, found from measurement order by post_id, position')).rows.map((r) => ({ ...r }))
  const unmeasured = async () => Number((await runtime.database.client.execute(`select count(*) as n from post where measured_by <> ${parserVersion}`)).rows[0]!['n'])

  it('show their measurements at once, and are filled in once', async () => {
    const entry = await anEntry({ body: 'Torque to 20 in-lb in the 3/8 hole.' })
    const [before, rowBefore] = [await everything(), await rowOf(entry.id)]
    await forget()
    expect(kinds(await read(entry.id))).toEqual(['torque', '3/8'])
    const sequence = await currentSequence(runtime.database.reader)
    expect(await fillMeasurements(runtime)).toBeGreaterThan(1)
    expect(await everything()).toEqual(before)
    expect(await rowOf(entry.id)).toEqual(rowBefore)
    // Nothing that search would have to read again.
    expect(await currentSequence(runtime.database.reader)).toBe(sequence)
    expect(await fillMeasurements(runtime)).toBe(0)
    expect(await everything()).toEqual(before)
  })

  it('are measured though their rendering is missing, and though one of them cannot be rendered', async () => {
    const [missing, broken] = [await anEntry({ body: 'The hole is #30.' }), await anEntry({ body: 'The hole is #40.' })]
    const later = await anEntry({ body: 'The hole is 1/8.' })
    await forget()
    await runtime.database.client.execute(`delete from rendering where key in ('post:${missing.id}:1', 'post:${broken.id}:1')`)
    // Only an older version could have let this in.
    await runtime.database.client.execute('drop trigger revision_never_changes')
    await runtime.database.client.execute({ sql: `update revision set body = ? where post_id = ${broken.id}`, args: ['>'.repeat(3000)] })
    await fillMeasurements(runtime)
    expect((await stored(missing.id)).length).toBe(1)
    expect((await stored(later.id)).length).toBe(1)
    expect((await rowOf(broken.id)).measuredBy).toBe(0)
    expect(await unmeasured()).toBe(1)
  })

  it('are filled in by two processes at once, while their authors edit', async () => {
    const answer = await anAnswer({ body: 'Drill it #30.' })
    const before = (await everything()).filter((row) => row['post_id'] !== answer.id)
    await forget()
    const edit = api('PATCH', `/api/answers/${answer.id}`, { token: answer.by.token, body: { revision: 'A', body: 'Drill it 1/4 in.', acknowledgedCautions: answer.cautions.map((c) => c.code) } })
    // A second connection with a write queue of its own, as another process has it.
    const other = await openDatabase(String((await runtime.database.client.execute('pragma database_list')).rows[0]!['file']))
    await Promise.all([fillMeasurements(runtime), edit, fillMeasurements({ database: other, renderer: runtime.renderer }), fillMeasurements(runtime)])
    other.close()
    expect((await everything()).filter((row) => row['post_id'] !== answer.id)).toEqual(before)
    expect((await stored(answer.id)).map(({ found }) => found.exact)).toEqual(['1/4'])
  })
})
