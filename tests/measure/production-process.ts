// A production server as its own process, on a free port, that a measurement starts, watches and kills.
import { spawn, type ChildProcess } from 'node:child_process'
import { readFileSync } from 'node:fs'
import { createServer } from 'node:net'
import path from 'node:path'
import { healthSchema, type Health } from '@/lib/schemas/health'
import { settingsOf } from './temporary-installation'

export interface ProductionProcess {
  address: string
  /** Milliseconds from the start of the process until it answered at all, and until its index was ready. */
  answeredMs: number
  readyMs: number
  health(): Promise<Health>
  /** Resident memory now and at its highest, in megabytes; null where the system does not say. */
  memory(): { now: number; highest: number } | null
  /** Processor time it has used so far, all threads, in milliseconds; 0 where the system does not say. Hardly depends on who else is at work. */
  processorMs(): number
  /** Sends the signal and waits for the end. */
  end(signal: 'SIGTERM' | 'SIGKILL'): Promise<void>
}

const longestStartMs = 60_000

/** Starts `next start` on the build that is there and waits until its index is ready. Throws, with what the server said, when it is not. */
export async function startProduction(directory: string, nodeOptions: readonly string[] = []): Promise<ProductionProcess> {
  const port = await freePort()
  const begun = performance.now()
  const child = spawn(process.execPath, [...nodeOptions, path.join('node_modules', 'next', 'dist', 'bin', 'next'), 'start', '-p', String(port)], {
    env: { ...process.env, ...settingsOf(directory), NODE_ENV: 'production', NEXT_TELEMETRY_DISABLED: '1', PORT: String(port) }, stdio: ['ignore', 'pipe', 'pipe'],
  })
  let said = ''
  for (const stream of [child.stdout, child.stderr]) stream.on('data', (piece: Buffer) => { said = (said + piece.toString()).slice(-4000) })
  const address = `http://127.0.0.1:${port}`
  const health = async () => healthSchema.parse(await (await fetch(`${address}/api/health`, { signal: AbortSignal.timeout(2000) })).json())
  let answeredMs = 0
  for (;;) {
    const state = await health().then((found) => found.search.state, () => null)
    const elapsed = performance.now() - begun
    if (state !== null && answeredMs === 0) answeredMs = elapsed
    if (state === 'ready') return { address, answeredMs, readyMs: elapsed, health, memory: () => memoryOf(child), processorMs: () => processorMsOf(child), end: (signal) => endOf(child, signal) }
    if (child.exitCode !== null || elapsed > longestStartMs) {
      child.kill('SIGKILL')
      throw new Error(`The server did not start:\n${said}`)
    }
    await new Promise((resolve) => setTimeout(resolve, 20))
  }
}

function endOf(child: ChildProcess, signal: 'SIGTERM' | 'SIGKILL'): Promise<void> {
  return new Promise((resolve) => {
    if (child.exitCode !== null || child.signalCode !== null) return resolve()
    child.once('exit', () => resolve())
    child.kill(signal)
  })
}

function memoryOf(child: ChildProcess): { now: number; highest: number } | null {
  try {
    const status = readFileSync(`/proc/${child.pid}/status`, 'utf8')
    const megabytes = (name: string) => Math.round(Number(new RegExp(`${name}:\\s+(\\d+)`).exec(status)?.[1] ?? 0) / 1024)
    return { now: megabytes('VmRSS'), highest: megabytes('VmHWM') }
  } catch {
    return null
  }
}

function processorMsOf(child: ChildProcess): number {
  try {
    // proc(5): utime and stime, fields 14 and 15, in ticks of 10 ms; the name in parentheses before them may hold spaces.
    const fields = readFileSync(`/proc/${child.pid}/stat`, 'utf8').replace(/^.*\) /, '').split(' ')
    return (Number(fields[11]) + Number(fields[12])) * 10
  } catch {
    return 0
  }
}

function freePort(): Promise<number> {
  return new Promise((resolve, reject) => {
    const probe = createServer()
    probe.once('error', reject)
    probe.listen(0, '127.0.0.1', () => {
      const found = probe.address()
      probe.close(() => (typeof found === 'object' && found ? resolve(found.port) : reject(new Error('No free port'))))
    })
  })
}
