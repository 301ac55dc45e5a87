// Ten thousand entries: how soon the index is ready, how long a search and an entry page take at twenty requests a second.
import os from 'node:os'
import { listVisibleEntryIds } from '@/db/queries/search'
import { generateEntries, type GeneratedLine } from './generate-entries'
import { generateQueries } from './generate-queries'
import { openLoop, type LoopResult } from './open-loop'
import { round } from './percentiles'
import { startProduction, type ProductionProcess } from './production-process'
import { machineBusyMs, type Measured, type Result } from './result'
import { seededRandom } from './seeded-random'
import { importInto, openInstallation, withDatabase, type Installation } from './temporary-installation'

export interface LoadOptions {
  entries: number
  seconds: number
  rate: number
  /** Folder of an installation that is kept between runs; a temporary one when absent. */
  kept?: string | undefined
  /** Options of the server's Node, such as --cpu-prof. */
  nodeOptions?: string[]
}

const seed = 20
/** Requests before the measured ones: a server that has just started still compiles itself. */
const warmUp = 100

/** Measures and reports; the installation is removed unless it is to be kept. */
export async function measureLoad({ entries, seconds, rate, kept, nodeOptions = [] }: LoadOptions): Promise<Result> {
  const lines = generateEntries(entries, seed, Date.now())
  const installation = await openInstallation(kept)
  try {
    const importSeconds = installation.isNew ? await importInto(installation, lines) : null
    const ids = await visibleIds(installation)
    const server = await startProduction(installation.directory, nodeOptions)
    try {
      const startMs = server.processorMs()
      const search = await loop(server, searchPaths(warmUp + rate * seconds, lines), rate)
      const pages = await loop(server, pagePaths(warmUp + rate * seconds, ids), rate)
      const { search: index } = await server.health()
      const memory = server.memory()
      const measured: Measured[] = [
        ...(importSeconds === null ? [] : [{ what: `import of ${entries} entries`, value: round(importSeconds), unit: 's', promised: null }]),
        { what: 'index ready after the process started', value: round(server.readyMs / 1000), unit: 's', promised: 8 },
        { what: 'processor time until then', value: round(startMs / 1000), unit: 's', promised: null },
        { what: 'entries that the index lacks', value: ids.length - index.documents, unit: '', promised: 0 },
        ...spreadRows('search API', search, 30), ...spreadRows('entry page', pages, 80),
        ...(memory ? [{ what: 'memory of the server, resident at the end', value: memory.now, unit: 'MB', promised: null }, { what: 'memory of the server, highest', value: memory.highest, unit: 'MB', promised: null }] : []),
      ]
      return { name: 'load', measured, detail: { entries: ids.length, seconds, rate, answeredMs: round(server.answeredMs), search, pages } }
    } finally {
      await server.end('SIGTERM')
    }
  } finally {
    installation.remove()
  }
}

/** `othersPercent`: how much of the machine somebody else used meanwhile. With more than a little of it the times are not ours. */
interface Measure extends LoopResult { processorMs: number; othersPercent: number }

async function loop(server: ProductionProcess, paths: readonly string[], rate: number): Promise<Measure> {
  await openLoop(server.address, paths.slice(0, warmUp), rate)
  const ours = () => server.processorMs() + process.cpuUsage().user / 1000 + process.cpuUsage().system / 1000
  const [servedMs, oursMs, busyMs] = [server.processorMs(), ours(), machineBusyMs()]
  const result = await openLoop(server.address, paths.slice(warmUp), rate)
  const others = machineBusyMs() - busyMs - (ours() - oursMs)
  return {
    ...result, processorMs: round((server.processorMs() - servedMs) / (paths.length - warmUp)),
    othersPercent: Math.max(0, Math.round(others / (result.secondsTaken * 10 * os.cpus().length))),
  }
}

function spreadRows(what: string, loop: Measure, promisedMs: number): Measured[] {
  return [
    { what: `${what} p50`, value: loop.p50, unit: 'ms', promised: null },
    { what: `${what} p95`, value: loop.p95, unit: 'ms', promised: promisedMs },
    { what: `${what} p99`, value: loop.p99, unit: 'ms', promised: null },
    { what: `${what} slowest`, value: loop.max, unit: 'ms', promised: null },
    { what: `${what}: processor time each`, value: loop.processorMs, unit: 'ms', promised: null },
    { what: `${what}: share of the machine that others used meanwhile`, value: loop.othersPercent, unit: '%', promised: null },
    { what: `${what} errors`, value: loop.errors.length, unit: '', promised: 0 },
  ]
}

const searchPaths = (count: number, lines: readonly GeneratedLine[]) => generateQueries(count, lines, seed).map((query) => `/api/search?q=${encodeURIComponent(query)}`)

function pagePaths(count: number, ids: readonly number[]): string[] {
  const chance = seededRandom(seed)
  return Array.from({ length: count }, () => `/entries/${chance.pick(ids)}`)
}

const visibleIds = ({ databaseFile }: Installation): Promise<number[]> => withDatabase(databaseFile, (database) => listVisibleEntryIds(database.reader, 0, 1_000_000))
