// One engine in a process of its own, started by bench-search.ts: comes up, answers what it is asked, and says how long each took.
import { monitorEventLoopDelay } from 'node:perf_hooks'
import { spreadOf, type Spread } from '../percentiles'
import type { Engine, EngineTask, IndexMB, Start } from './engine'
import { startFts5 } from './fts5-engine'
import { startMiniSearch } from './minisearch-engine'
import { startProduct } from './product-engine'
import type { QuestionKind } from './questions'

export interface Ready { buildSeconds: number; startSeconds: number | string; indexMB?: IndexMB; saveSeconds?: number; fileMB: number | null; /** Resident, of the whole process; `before` without an index. */ memoryMB: { before: number; after: number; heap: number }; stallMs: number }
export interface Asked { kind: string; ms: Spread; /** Questions that found something, of all. */ found: number }
/** Questions at a steady rate while others write; `delaysMs`: from the end of a write elsewhere until it was found. */
export interface WhileWriting { ms: Spread; stallMs: number; delaysMs: Spread; memoryMB: number }
export type EngineRequest = { ask: QuestionKind } | { whileWriting: QuestionKind; seconds: number } | { written: { word: string; at: number } } | { end: true }

const residentMB = () => Math.round(process.memoryUsage().rss / 1_048_576)
const questionsASecond = 20
/** An engine that takes long is not asked everything: some dozen answers say as much. */
const longestKindMs = 8_000
const tell = (message: unknown) => process.send?.(message)
const written: { word: string; at: number }[] = []

process.once('message', (task: EngineTask) => { void run(task) })

async function run(task: EngineTask): Promise<void> {
  const before = residentMB()
  const loop = monitorEventLoopDelay({ resolution: 1 })
  loop.enable()
  const { engine, ...started } = await start(task)
  loop.disable()
  // What building left behind is not the index.
  globalThis.gc?.()
  process.on('message', (request: EngineRequest) => { void answer(engine, request) })
  tell({ ...started, fileMB: engine.fileMB ?? null, memoryMB: { before, after: residentMB(), heap: Math.round(process.memoryUsage().heapUsed / 1_048_576) }, stallMs: Math.max(0, loop.max / 1e6 - 1) } satisfies Ready)
}

function start(task: EngineTask): Promise<Start> {
  switch (task.engine) {
    case 'product': return startProduct(task)
    case 'fts5-any': return startFts5(task, 'OR')
    case 'fts5-all': return startFts5(task, 'AND')
    case 'minisearch': return startMiniSearch(task)
    default: return task.engine satisfies never
  }
}

async function answer(engine: Engine, request: EngineRequest): Promise<void> {
  if ('ask' in request) tell(await askAll(engine, request.ask))
  else if ('whileWriting' in request) tell(await askWhileWriting(engine, request.whileWriting, request.seconds))
  else if ('written' in request) written.push(request.written)
  else {
    await engine.close()
    process.disconnect()
  }
}

async function askAll(engine: Engine, { kind, questions }: QuestionKind): Promise<Asked> {
  for (const question of questions.slice(0, 5)) await engine.ask(question)
  const taken: number[] = []
  let found = 0
  const until = performance.now() + longestKindMs
  for (const question of questions) {
    if (performance.now() > until) break
    const begun = performance.now()
    if ((await engine.ask(question)).length > 0) found++
    taken.push(performance.now() - begun)
  }
  return { kind, ms: spreadOf(taken), found }
}

async function askWhileWriting(engine: Engine, { questions }: QuestionKind, seconds: number): Promise<WhileWriting> {
  const [taken, delays]: [number[], number[]] = [[], []]
  const loop = monitorEventLoopDelay({ resolution: 1 })
  loop.enable()
  let highest = residentMB()
  const begun = performance.now()
  for (let i = 0; performance.now() - begun < seconds * 1000; i++) {
    const due = begun + (i * 1000) / questionsASecond
    while (performance.now() < due) {
      await lookForWritten(engine, delays)
      await new Promise((resolve) => setTimeout(resolve, 10))
    }
    const question = questions[i % questions.length]
    if (!question) break
    await engine.ask(question)
    taken.push(performance.now() - due)
    // Also when there is no pause to look in, or an engine that is late would seem to find nothing.
    await lookForWritten(engine, delays)
    highest = Math.max(highest, residentMB())
  }
  loop.disable()
  return { ms: spreadOf(taken), stallMs: loop.max / 1e6 - 1, delaysMs: spreadOf(delays), memoryMB: highest }
}

async function lookForWritten(engine: Engine, delays: number[]): Promise<void> {
  const next = written[0]
  if (!next || (await engine.ask({ text: next.word })).length === 0) return
  delays.push(Date.now() - next.at)
  written.shift()
}
