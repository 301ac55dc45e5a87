// Walks the audit trail and computes its chain again. Finds a row that was changed, taken out or put in.
import 'server-only'
import { asc, gt } from 'drizzle-orm'
import type { ReaderOrTransaction } from './client'
import { audit } from './schema'
import { auditHash } from './transaction'

const rowsAtOnce = 5000

/** How many rows hold together, and the sequence of the first that does not (null when all do). */
export async function checkAudit(reader: ReaderOrTransaction): Promise<{ rows: number; brokenAt: number | null }> {
  let previousHash = ''
  let rows = 0
  for (let last = 0; ;) {
    const page = await reader.select().from(audit).where(gt(audit.sequence, last)).orderBy(asc(audit.sequence)).limit(rowsAtOnce)
    for (const row of page) {
      if (row.previousHash !== previousHash || row.hash !== auditHash(previousHash, row)) return { rows, brokenAt: row.sequence }
      previousHash = row.hash
      rows++
      last = row.sequence
    }
    if (page.length < rowsAtOnce) return { rows, brokenAt: null }
  }
}
