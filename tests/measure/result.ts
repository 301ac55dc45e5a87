// One measured number against what is promised, and how results are shown and kept.
import { mkdirSync, readFileSync, writeFileSync } from 'node:fs'
import os from 'node:os'
import path from 'node:path'

/** `promised` is the largest value that keeps the promise; null for what is only reported. */
export interface Measured { what: string; value: number; unit: string; promised: number | null }
export interface Result { name: string; measured: Measured[]; detail: object }

/** What it was measured on; a load average before the start says whether somebody else was at work. */
export const machine = () => ({
  processor: os.cpus()[0]?.model.trim() ?? 'unknown', cores: os.cpus().length, memoryMB: Math.round(os.totalmem() / 1_048_576),
  node: process.version, system: `${os.type()} ${os.release()}`, loadAverage: os.loadavg().map((load) => Math.round(load * 100) / 100),
})

/** Processor time the whole machine has spent since it started, in milliseconds; 0 where the system does not say. */
export function machineBusyMs(): number {
  try {
    // proc(5), first line of /proc/stat: user nice system idle iowait irq softirq steal, in ticks of 10 ms.
    const [user = 0, nice = 0, system = 0, , , irq = 0, softirq = 0, steal = 0] = (/^cpu +(.*)$/m.exec(readFileSync('/proc/stat', 'utf8'))?.[1] ?? '').split(' ').map(Number)
    return (user + nice + system + irq + softirq + steal) * 10
  } catch {
    return 0
  }
}

/** Prints the table, writes dist/bench-<name>.json, and says whether every promise was kept. */
export function report({ name, measured, detail }: Result, before: ReturnType<typeof machine>): boolean {
  const isKept = (m: Measured) => m.promised === null || m.value <= m.promised
  console.table(measured.map((m) => ({ what: m.what, value: `${m.value} ${m.unit}`.trim(), 'at most': m.promised ?? '', kept: m.promised === null ? '' : isKept(m) ? 'yes' : 'NO' })))
  const file = path.join('dist', `bench-${name}.json`)
  mkdirSync('dist', { recursive: true })
  writeFileSync(file, `${JSON.stringify({ name, at: new Date().toISOString(), machine: before, measured, detail }, null, 2)}\n`)
  console.log(`${before.processor}, ${before.cores} cores, Node ${before.node}, load ${before.loadAverage.join(' ')} before the start. Kept in ${file}`)
  return measured.every(isKept)
}
