// Search at several sizes, side by side with SQLite FTS5 and with MiniSearch as it comes: coming up, memory, questions of every kind,
// and what questions take while a second process writes. Reports; promises nothing.
import { fork, type ChildProcess } from 'node:child_process'
import { once } from 'node:events'
import path from 'node:path'
import { openInstallation, withDatabase, type Installation } from '../temporary-installation'
import type { EngineName, EngineTask } from './engine'
import type { Asked, EngineRequest, Ready, WhileWriting } from './engine-process'
import { fillDatabase } from './fill-database'
import { makeQuestions, type QuestionKind } from './questions'
import type { WritingEnded, WritingTask, Written } from './writing-process'

export interface BenchOptions { sizes: readonly number[]; seconds: number; each: number; seed: number; engines?: readonly EngineName[] }
export interface OfEngine { engine: EngineName; ready: Ready; asked: Asked[] }
export interface OfSize { size: number; fillSeconds: number; engines: OfEngine[]; whileWriting: WhileWriting & WritingEnded }

export const allEngines = ['product', 'fts5-any', 'fts5-all', 'minisearch'] as const satisfies readonly EngineName[]
const writesASecond = 50
const file = (name: string) => path.join(import.meta.dirname, name)

export async function benchSearch({ sizes, ...options }: BenchOptions): Promise<OfSize[]> {
  const results: OfSize[] = []
  for (const size of sizes) results.push(await benchSize(size, options))
  return results
}

async function benchSize(size: number, { seconds, each, seed, engines = allEngines }: Omit<BenchOptions, 'sizes'>): Promise<OfSize> {
  const installation = await openInstallation()
  try {
    const begun = performance.now()
    await withDatabase(installation.databaseFile, (database) => fillDatabase(database, size, seed))
    const fillSeconds = (performance.now() - begun) / 1000
    const questions = makeQuestions(size, seed, each)
    const measured: OfEngine[] = []
    let whileWriting: OfSize['whileWriting'] | undefined
    for (const engine of engines) {
      const { child, ready } = await startEngine({ engine, size, seed, directory: installation.directory, databaseFile: installation.databaseFile })
      const asked: Asked[] = []
      for (const kind of questions) asked.push(await request<Asked>(child, { ask: kind }))
      measured.push({ engine, ready, asked })
      if (engine === 'product') whileWriting = await measureWhileWriting(child, installation, mixOf(questions), { size, seconds, seed })
      child.send({ end: true } satisfies EngineRequest)
      await once(child, 'exit')
    }
    return { size, fillSeconds, engines: measured, whileWriting: whileWriting ?? nothingWritten }
  } finally {
    installation.remove()
  }
}

async function startEngine(task: EngineTask): Promise<{ child: ChildProcess; ready: Ready }> {
  // Room for MiniSearch; collecting before memory is read takes out what building left.
  const child = fork(file('engine-process.ts'), { execArgv: [...process.execArgv, '--max-old-space-size=4096', '--expose-gc'] })
  child.send(task)
  return { child, ready: await reply<Ready>(child) }
}

/** Questions at twenty a second while another process writes fifty entries a second into the same file. */
async function measureWhileWriting(child: ChildProcess, { databaseFile }: Installation, mix: QuestionKind, { size, seconds, seed }: { size: number; seconds: number; seed: number }): Promise<OfSize['whileWriting']> {
  const writing = fork(file('writing-process.ts'))
  let ended: WritingEnded = { written: 0, behind: 0 }
  writing.on('message', (message: Written | WritingEnded) => {
    if ('word' in message) child.send({ written: message } satisfies EngineRequest)
    else ended = message
  })
  writing.send({ databaseFile, seed, firstNumber: size, rate: writesASecond, seconds } satisfies WritingTask)
  const result = request<WhileWriting>(child, { whileWriting: mix, seconds: seconds + 1 })
  await once(writing, 'exit')
  return { ...(await result), ...ended }
}

/** One of each kind in turn. */
function mixOf(kinds: readonly QuestionKind[]): QuestionKind {
  const longest = Math.max(...kinds.map(({ questions }) => questions.length))
  return { kind: 'mix', questions: Array.from({ length: longest }, (_, i) => kinds.flatMap(({ questions }) => questions[i] ?? [])).flat() }
}

function request<T>(child: ChildProcess, message: EngineRequest): Promise<T> {
  child.send(message)
  return reply<T>(child)
}

function reply<T>(child: ChildProcess): Promise<T> {
  return new Promise((resolve, reject) => {
    const ended = (code: number | null) => reject(new Error(`A process of the measurement ended with ${code}`))
    child.once('exit', ended)
    child.once('message', (message) => {
      child.off('exit', ended)
      // The other side sends what its request asks for; both sides are ours.
      resolve(message as T)
    })
  })
}

const none = { count: 0, p50: 0, p95: 0, p99: 0, max: 0 }
const nothingWritten: OfSize['whileWriting'] = { ms: none, stallMs: 0, delaysMs: none, memoryMB: 0, written: 0, behind: 0 }
