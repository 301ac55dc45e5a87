// One process of writers, started by writers.ts: opens a runtime of its own, writes through the services when told to,
// and says what was acknowledged and how long its event loop ever stood still.
import { readFileSync } from 'node:fs'
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
  /** Longest time the event loop stood still: by Node's histogram, by a ticker of one millisecond, and by that without the time other processes had the processor. */
  stallMs: { histogram: number; ticker: number; own: number }
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
// A server that people write to has written before: what only a first write costs (rules compiled, statements built) is no standstill of theirs.
await writeInTurn({ entries: [], remarks: [], errors: [] }, [], -1, 1)
const go = once()
tell('ready')
await go
tell(await writeAll())
await Promise.all([search.close(), renderer.close()])
database.close()
process.disconnect()

async function writeAll(): Promise<WritersReport> {
  const report: WritersReport = { entries: [], remarks: [], errors: [], stallMs: { histogram: 0, ticker: 0, own: 0 }, writeMs: spreadOf([]), secondsTaken: 0 }
  const times: number[] = []
  const histogram = monitorEventLoopDelay({ resolution: 1 })
  const ticker = watchTicks()
  const begun = performance.now()
  histogram.enable()
  await Promise.all(Array.from({ length: task.writers }, (_, writer) => writeInTurn(report, times, writer, task.rounds)))
  histogram.disable()
  report.secondsTaken = (performance.now() - begun) / 1000
  const { whole, own } = ticker.longestMs()
  report.stallMs = { histogram: histogram.max / 1e6 - 1, ticker: whole, own }
  report.writeMs = spreadOf(times)
  return report
}

/** One writer: an entry and a remark under it, again and again, each begun when the one before was acknowledged. */
async function writeInTurn(report: Pick<WritersReport, 'entries' | 'remarks' | 'errors'>, times: number[], writer: number, rounds: number): Promise<void> {
  for (let round = 0; round < rounds; round++) {
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

/** Longest gap between two ticks, and the longest without what the system itself spent on others meanwhile. */
function watchTicks(): { longestMs(): { whole: number; own: number } } {
  let [last, waited] = [performance.now(), waitedMs()]
  const longest = { whole: 0, own: 0 }
  const look = () => {
    const [now, waitedNow] = [performance.now(), waitedMs()]
    const gap = now - last - 1
    longest.whole = Math.max(longest.whole, gap)
    longest.own = Math.max(longest.own, gap - (waitedNow - waited))
    ;[last, waited] = [now, waitedNow]
  }
  const timer = setInterval(look, 1)
  return { longestMs: () => { look(); clearInterval(timer); return longest } }
}

/** How long this thread has stood in line for a processor, so far; 0 where the system does not say. */
function waitedMs(): number {
  try {
    // Linux, Documentation/scheduler/sched-stats: the second field is the time spent waiting to run, in nanoseconds.
    return Number(readFileSync(`/proc/self/task/${process.pid}/schedstat`, 'utf8').split(' ')[1]) / 1e6
  } catch {
    return 0
  }
}
