// A hundred people write at once, in one process and in two: every acknowledged write is there, nobody gets an error, nobody waits for a standstill.
import { fork } from 'node:child_process'
import { fileURLToPath } from 'node:url'
import { inArray } from 'drizzle-orm'
import { checkAudit } from '@/db/check-audit'
import { listCautionedPosts } from '@/db/queries/cautioned-post'
import { remark } from '@/db/schema'
import { round } from './percentiles'
import type { Measured, Result } from './result'
import { openInstallation, withDatabase, type Installation } from './temporary-installation'
import type { WritersReport, WritersTask } from './writers-process'

const processFile = fileURLToPath(new URL('writers-process.ts', import.meta.url))
export const writerCases = [{ processes: 1, writers: 100 }, { processes: 2, writers: 50 }] as const

/** Measures both cases, each on an installation of its own; every writer writes `rounds` entries and as many remarks. */
export async function measureWriters({ rounds }: { rounds: number }): Promise<Result> {
  const measured: Measured[] = []
  const detail: Record<string, object> = {}
  for (const { processes, writers } of writerCases) {
    const name = `${processes} × ${writers}`
    const installation = await openInstallation()
    try {
      const reports = await runWriters(installation, processes, writers, rounds)
      const lost = await countLost(installation, reports)
      const audit = await withDatabase(installation.databaseFile, (database) => checkAudit(database.reader))
      const longest = (of: (report: WritersReport) => number) => round(Math.max(...reports.map(of)))
      measured.push(
        { what: `${name}: writes acknowledged`, value: reports.reduce((sum, r) => sum + r.entries.length + r.remarks.length, 0), unit: '', promised: null },
        { what: `${name}: acknowledged and not there`, value: lost, unit: '', promised: 0 },
        { what: `${name}: errors`, value: reports.reduce((sum, r) => sum + r.errors.length, 0), unit: '', promised: 0 },
        { what: `${name}: breaks of the audit chain`, value: audit.brokenAt === null ? 0 : 1, unit: '', promised: 0 },
        { what: `${name}: longest standstill, histogram`, value: longest((r) => r.stallMs.histogram), unit: 'ms', promised: 50 },
        { what: `${name}: longest standstill, ticker`, value: longest((r) => r.stallMs.ticker), unit: 'ms', promised: 50 },
        { what: `${name}: longest standstill of our own making`, value: longest((r) => r.stallMs.own), unit: 'ms', promised: 50 },
        { what: `${name}: a write p95`, value: longest((r) => r.writeMs.p95), unit: 'ms', promised: null },
        { what: `${name}: all writes`, value: longest((r) => r.secondsTaken), unit: 's', promised: null },
      )
      detail[name] = reports.map((r) => ({ ...r, entries: r.entries.length, remarks: r.remarks.length }))
    } finally {
      installation.remove()
    }
  }
  return { name: 'writers', measured, detail }
}

async function runWriters({ databaseFile, steward }: Installation, processes: number, writers: number, rounds: number): Promise<WritersReport[]> {
  const children = Array.from({ length: processes }, (_, i) => startWriters({ databaseFile, actor: steward, writers, rounds, label: `process ${i}` }))
  await Promise.all(children.map((child) => child.ready))
  return Promise.all(children.map((child) => child.write()))
}

function startWriters(task: WritersTask): { ready: Promise<unknown>; write(): Promise<WritersReport> } {
  const child = fork(processFile)
  const message = () => new Promise<unknown>((resolve, reject) => {
    child.once('message', resolve)
    child.once('error', reject)
    child.once('exit', (code) => reject(new Error(`A process of writers ended with ${code}`)))
  })
  child.send(task)
  return {
    ready: message(),
    write: async () => {
      const report = message()
      child.send('go')
      return (await report) as WritersReport
    },
  }
}

/** Acknowledged writes that a fresh connection does not find as they were written. */
function countLost({ databaseFile }: Installation, reports: readonly WritersReport[]): Promise<number> {
  return withDatabase(databaseFile, async ({ reader }) => {
    const entries = reports.flatMap((r) => r.entries)
    const titles = new Map((await listCautionedPosts(reader, entries.map((e) => e.id))).map((p) => [p.id, p.current.title]))
    const remarks = reports.flatMap((r) => r.remarks)
    const bodies = new Map((await reader.select().from(remark).where(inArray(remark.id, remarks.map((r) => r.id)))).map((r) => [r.id, r.body]))
    return entries.filter((e) => titles.get(e.id) !== e.title).length + remarks.filter((r) => bodies.get(r.id) !== r.body).length
  })
}
