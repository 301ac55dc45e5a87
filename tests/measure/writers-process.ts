// One process of writers, started by writers.ts: opens a runtime of its own, writes through the services when told to,
// and says what was acknowledged and how long its event loop ever stood still.
import { monitorEventLoopDelay } from 'node:perf_hooks'
import { openDatabase } from '@/db/client'
import { cautionTable } from '@/lib/content/caution-table'
import type { AppContext } from '@/lib/context'
import type { Member } from '@/lib/policy/actor'
import { createRenderer } from '@/lib/render/renderer'
import { openSearch } from '@/lib/search/open-search'
import { addRemark } from '@/lib/services/entries/add-remark'
import { createEntry } from '@/lib/services/entries/create-entry'
import { workerFile } from '@/lib/worker-file'
import { spreadOf, type Spread } from './percentiles'

/** What the parent sends first; `go` follows when every process is ready. */
export interface WritersTask { databaseFile: string; actor: NonNullable<Member>; writers: number; rounds: number; label: string }
export interface WritersReport {
  entries: { id: number; title: string }[]
  remarks: { id: number; body: string }[]
  errors: string[]
  /** Longest time the event loop stood still, by the histogram of Node and by a ticker of one millisecond. */
  stallMs: { histogram: number; ticker: number }
  writeMs: Spread
  secondsTaken: number
}

const tell = (message: unknown) => process.send?.(message)
const once = <T>() => new Promise<T>((resolve) => process.once('message', (message) => resolve(message as T)))

const task = await once<WritersTask>()
const database = await openDatabase(task.databaseFile)
const search = openSearch({ database, workerFile: workerFile('search') })
const renderer = createRenderer({ workerFile: workerFile('render') })
await search.catchUp()
const context = (): AppContext => ({ database, reader: database.reader, actor: task.actor, now: Date.now(), search, renderer, publicReading: true })
const go = once()
tell('ready')
await go
tell(await writeAll())
await Promise.all([search.close(), renderer.close()])
database.close()
process.disconnect()

async function writeAll(): Promise<WritersReport> {
  const report: WritersReport = { entries: [], remarks: [], errors: [], stallMs: { histogram: 0, ticker: 0 }, writeMs: spreadOf([]), secondsTaken: 0 }
  const times: number[] = []
  const histogram = monitorEventLoopDelay({ resolution: 1 })
  const ticker = watchTicks()
  const begun = performance.now()
  histogram.enable()
  await Promise.all(Array.from({ length: task.writers }, (_, writer) => writeInTurn(report, times, writer)))
  histogram.disable()
  report.secondsTaken = (performance.now() - begun) / 1000
  report.stallMs = { histogram: histogram.max / 1e6 - 1, ticker: ticker.longestMs() }
  report.writeMs = spreadOf(times)
  return report
}

/** One writer: an entry and a remark under it, again and again, each begun when the one before was acknowledged. */
async function writeInTurn(report: WritersReport, times: number[], writer: number): Promise<void> {
  for (let round = 0; round < task.rounds; round++) {
    const title = `${task.label} writer ${writer} round ${round}`
    try {
      const id = await timed(times, () => createEntry(context(), {
        kind: 'question', kit: 'whimbrel-2', sections: ['X-1'], tasks: [], operations: [], hardware: [], plans: [], orderAdvice: [], title,
        parts: { doing: 'Putting placards on the panel.', plansSay: 'Nothing about the order.', measured: '', tried: '' }, acknowledgedCautions: cautionTable.cautions.map((c) => c.code),
      }))
      report.entries.push({ id, title })
      const body = `Noted by ${title}`
      const remark = await timed(times, () => addRemark(context(), id, { body }))
      report.remarks.push({ id: remark.id, body })
    } catch (error) {
      report.errors.push(String(error))
    }
  }
}

async function timed<T>(times: number[], work: () => Promise<T>): Promise<T> {
  const begun = performance.now()
  const result = await work()
  times.push(performance.now() - begun)
  return result
}

function watchTicks(): { longestMs(): number } {
  let last = performance.now()
  let longest = 0
  const look = () => {
    const now = performance.now()
    longest = Math.max(longest, now - last - 1)
    last = now
  }
  const timer = setInterval(look, 1)
  return { longestMs: () => { look(); clearInterval(timer); return longest } }
}
