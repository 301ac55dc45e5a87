// All write transactions of a process go through one queue; between processes BEGIN is retried without blocking.
// Every write that others can see leaves audit rows in its own transaction, hashed onto the chain.
import 'server-only'
import { createHash } from 'node:crypto'
import { desc } from 'drizzle-orm'
import type { Database, Transaction } from './client'
import { audit } from './schema'

export interface WriteMeta { actorId: number | null; at: number }
/** Notes one audit row: a verb such as `stamp.press`, a subject such as `post:12`, and detail made of ids only. */
export type Record = (verb: string, subject: string, detail?: string) => void

/** The database stayed busy past the deadline: nothing was written. */
export class DatabaseBusyError extends Error {
  constructor() {
    super('The database is busy')
    this.name = 'DatabaseBusyError'
  }
}

const deadlineMs = 10_000

/**
 * Runs `work` in one immediate transaction and appends what it recorded to the audit trail.
 * Refuses a write that recorded nothing, unless it calls `record('nothing', …)` to say that it changed nothing.
 * Throws DatabaseBusyError when BEGIN fails until the deadline; never retries half a transaction.
 */
export function write<T>(database: Database, meta: WriteMeta, work: (tx: Transaction, record: Record) => Promise<T>): Promise<T> {
  return enqueue(database, async (tx) => {
    const rows: { verb: string; subject: string; detail: string }[] = []
    let changedNothing = false
    const result = await work(tx, (verb, subject, detail = '') => {
      if (verb === 'nothing') changedNothing = true
      else rows.push({ verb, subject, detail })
    })
    if (rows.length === 0 && !changedNothing) throw new Error('A write left no audit row')
    await appendAudit(tx, meta, rows)
    return result
  })
}

/** For caches and counters nobody else sees (renderings, attempts, replayed answers): the same queue, no audit. */
export function writeQuietly<T>(database: Database, work: (tx: Transaction) => Promise<T>): Promise<T> {
  return enqueue(database, work)
}

/** Hash of an audit row over the one before, as `npm run check:audit` computes it again. */
export function auditHash(previousHash: string, row: { at: number; actorId: number | null; verb: string; subject: string; detail: string }): string {
  return createHash('sha256').update(JSON.stringify([previousHash, row.at, row.actorId, row.verb, row.subject, row.detail])).digest('hex')
}

async function appendAudit(tx: Transaction, meta: WriteMeta, rows: { verb: string; subject: string; detail: string }[]): Promise<void> {
  const [last] = await tx.select({ hash: audit.hash }).from(audit).orderBy(desc(audit.sequence)).limit(1)
  let previousHash = last?.hash ?? ''
  for (const row of rows) {
    const full = { ...row, at: meta.at, actorId: meta.actorId }
    const hash = auditHash(previousHash, full)
    await tx.insert(audit).values({ ...full, previousHash, hash })
    previousHash = hash
  }
}

function enqueue<T>(database: Database, work: (tx: Transaction) => Promise<T>): Promise<T> {
  const before = database.queue.last
  // The driver is synchronous, so its promises settle without ever leaving the microtask queue: a hundred queued writes
  // would hold the event loop as one (measured: 130 ms). One turn of the loop between two transactions lets others in.
  const mine = before.then(() => new Promise((resolve) => setImmediate(resolve))).then(() => begin(database, work))
  // The queue goes on after a failure; only the caller sees the error.
  database.queue.last = mine.catch(() => undefined)
  return mine
}

async function begin<T>(database: Database, work: (tx: Transaction) => Promise<T>): Promise<T> {
  const until = performance.now() + deadlineMs
  for (let tries = 0; ; tries++) {
    let begun = false
    try {
      return await database.writer.transaction(async (tx) => {
        begun = true
        return await work(tx)
      }, { behavior: 'immediate' })
    } catch (error) {
      if (begun || !isBusy(error)) throw error
      if (performance.now() > until) throw new DatabaseBusyError()
      await new Promise((resolve) => setTimeout(resolve, 2 + Math.random() * Math.min(40, 4 * (tries + 1))))
    }
  }
}

/** True for SQLITE_BUSY, also when drizzle has wrapped it. */
export function isBusy(error: unknown): boolean {
  for (let e: unknown = error; e instanceof Error; e = e.cause) {
    if ('code' in e && typeof e.code === 'string' && e.code.startsWith('SQLITE_BUSY')) return true
  }
  return false
}
