// Imports a file, one entry a line. A bad line is named and passed over; the others are written, a batch a transaction.
// What a line may say stands in parse-line.ts, what is done before and in a transaction in prepare-entry.ts and write-entry.ts.
import 'server-only'
import { write } from '@/db/transaction'
import type { AppContext } from '@/lib/context'
import { AppError, refuse } from '@/lib/errors'
import { logError } from '@/lib/log'
import { can } from '@/lib/policy/can'
import { whyNot } from '@/lib/policy/why-not'
import type { ImportResult } from '@/lib/schemas/import'
import { asLawBroken } from './as-law-broken'
import { readNameBook } from './name-book'
import { parseLine } from './parse-line'
import { entryPreparer, type PreparedEntry } from './prepare-entry'
import { readLines, type ReadLine } from './read-lines'
import { writeEntry, type Done } from './write-entry'
import { afterWrite } from '@/lib/services/posts/after-write'
import { noteRulesVersion } from '@/lib/services/cautions/reapply-rules'

export type ImportContext = Pick<AppContext, 'database' | 'reader' | 'actor' | 'now' | 'renderer'>

const linesABatch = 50
/** A file that is none of ours fails on every line: this many are named, then the rest is left unread. */
const mostFailures = 1000

/** The import of the API: what was written can be found when it answers. */
export async function importFile(context: AppContext, bytes: Uint8Array): Promise<ImportResult> {
  const result = await importLines(context, bytes)
  await afterWrite(context)
  return result
}

/** Imports NDJSON as a steward; 403 for others. Throws only when the database stays busy: batches before that are written. */
export async function importLines(context: ImportContext, bytes: Uint8Array): Promise<ImportResult> {
  if (!can(context.actor, 'import')) throw refuse.forbidden(whyNot.import)
  await noteRulesVersion(context.database)
  const names = await readNameBook(context.reader)
  const prepare = entryPreparer(context)
  const result: ImportResult = { imported: 0, updated: 0, unchanged: 0, failed: [] }
  for (const lines of batches(readLines(bytes))) {
    if (result.failed.length >= mostFailures) {
      result.failed.push({ line: lines[0]?.line ?? 0, message: 'Too many lines failed; this one and those after it were not read.' })
      break
    }
    const prepared = await Promise.all(lines.map(async (read) => {
      try {
        if ('fault' in read) throw new AppError('invalid', read.fault)
        return [await prepare(read.line, parseLine(names, read.value, context.now))]
      } catch (error) {
        result.failed.push({ line: read.line, message: wordsOf(error) })
        return []
      }
    }))
    await writeBatch(context, prepared.flat(), result)
  }
  result.failed.sort((a, b) => a.line - b.line)
  return result
}

function* batches(lines: Iterable<ReadLine>): Generator<ReadLine[]> {
  let batch: ReadLine[] = []
  for (const line of lines) {
    batch.push(line)
    if (batch.length < linesABatch) continue
    yield batch
    batch = []
  }
  if (batch.length > 0) yield batch
}

/** One transaction for all; when one line breaks it, each line has its own. */
async function writeBatch(context: ImportContext, batch: readonly PreparedEntry[], result: ImportResult): Promise<void> {
  if (batch.length === 0) return
  const done = await writeTogether(context, batch).catch(async (error: unknown) => {
    if (!isOfTheLine(error)) throw error
    const each: Done[] = []
    for (const prepared of batch) {
      await writeTogether(context, [prepared]).then((d) => each.push(...d), (own: unknown) => {
        if (!isOfTheLine(own)) throw own
        result.failed.push({ line: prepared.line, message: wordsOf(own) })
      })
    }
    return each
  })
  for (const kind of done) result[kind]++
}

function writeTogether(context: ImportContext, batch: readonly PreparedEntry[]): Promise<Done[]> {
  return write(context.database, { actorId: context.actor?.id ?? null, at: context.now }, async (tx, record) => {
    const done: Done[] = []
    for (const prepared of batch) {
      done.push(await writeEntry(tx, prepared, record, context.now))
      // The driver never leaves the microtask queue: without a turn of the loop a batch would hold up every reader.
      await new Promise((resolve) => setImmediate(resolve))
    }
    return done
  })
}

const isOfTheLine = (error: unknown) => error instanceof AppError || asLawBroken(error) !== null

function wordsOf(error: unknown): string {
  if (error instanceof AppError) return error.message
  const law = asLawBroken(error)
  if (law === null) logError('import', error)
  return law ?? 'This line could not be written.'
}
