// Shows a measurement of search as one table a size, engines side by side, and keeps it as JSON.
import { mkdirSync, writeFileSync } from 'node:fs'
import path from 'node:path'
import { round, type Spread } from '../percentiles'
import type { machine } from '../result'
import type { OfEngine, OfSize } from './bench-search'

export function reportBench(results: readonly OfSize[], before: ReturnType<typeof machine>): void {
  console.table(results.flatMap(rowsOf))
  const file = path.join('dist', 'bench-search.json')
  mkdirSync('dist', { recursive: true })
  writeFileSync(file, `${JSON.stringify({ at: new Date().toISOString(), machine: before, results }, null, 2)}\n`)
  console.log(`Times are p50 / p95 / p99 in ms. ${before.processor}, ${before.cores} cores, Node ${before.node}, load ${before.loadAverage.join(' ')} before the start. Kept in ${file}`)
}

type Row = Record<string, string>

function rowsOf({ size, engines, whileWriting }: OfSize): Row[] {
  const row = (what: string, of: (engine: OfEngine) => string): Row => ({ entries: size.toLocaleString('en'), what, ...Object.fromEntries(engines.map((engine) => [engine.engine, of(engine)])) })
  const product = (what: string, value: string): Row => ({ entries: size.toLocaleString('en'), what, product: value })
  const start = (seconds: number | string) => (typeof seconds === 'number' ? `${round(seconds)} s` : seconds)
  return [
    row('built', ({ ready }) => `${round(ready.buildSeconds)} s`),
    row('started from what was saved', ({ ready }) => start(ready.startSeconds)),
    row('memory, resident (more than without)', ({ ready: { memoryMB: { before, after } } }) => `${after} MB (${after - before})`),
    ...indexRows(engines.find(({ engine }) => engine === 'product')).map(([what, value]) => product(what, value)),
    product('longest stall of the main thread while coming up', `${round(engines.find(({ engine }) => engine === 'product')?.ready.stallMs ?? 0)} ms`),
    ...(engines[0]?.asked ?? []).map(({ kind }, i) => row(kind, ({ asked }) => spread(asked[i]?.ms))),
    product('questions while 50 entries a second are written elsewhere', `${spread(whileWriting.ms)}, slowest ${whileWriting.ms.max}`),
    product('longest stall of the main thread meanwhile', `${round(whileWriting.stallMs)} ms`),
    product('written elsewhere to found', `${spread(whileWriting.delaysMs)} (${whileWriting.delaysMs.count})`),
    product('memory meanwhile, highest', `${whileWriting.memoryMB} MB`),
  ]
}

const spread = (ms: Spread | undefined): string => (ms ? `${ms.p50} / ${ms.p95} / ${ms.p99}` : '')

function indexRows(engine: OfEngine | undefined): [string, string][] {
  const { indexMB, saveSeconds, fileMB } = engine?.ready ?? {}
  if (!indexMB) return []
  return [
    ['index by its own count: built / from the snapshot / at most while saving', `${Math.round(indexMB.built)} / ${Math.round(indexMB.restored)} / ${Math.round(indexMB.saving)} MB`],
    ['snapshot: size, time to save', `${round(fileMB ?? 0)} MB, ${round(saveSeconds ?? 0)} s`],
  ]
}
