// Once a run of the browser tests: the demo in a folder of its own, served by the production build on a free port.
// Also starts a second server with other settings for the tests that need one.
import { spawn, type ChildProcess } from 'node:child_process'
import { closeSync, existsSync, mkdtempSync, openSync, readFileSync, rmSync } from 'node:fs'
import net from 'node:net'
import os from 'node:os'
import path from 'node:path'
import { fileURLToPath } from 'node:url'
import type { TestProject } from 'vitest/node'

export interface ServerPlace {
  baseUrl: string
  dataDir: string
  /** Signs the session cookies. */
  secret: string
  /** What the server wrote to standard error. */
  errorFile: string
}
declare module 'vitest' {
  interface ProvidedContext { server: ServerPlace }
}

const root = fileURLToPath(new URL('../..', import.meta.url)).replace(/\/$/, '')
const secret = 'bQ7mX2vRk9Tz4LwHs6NcYd8FjGp3KeUa'
const readyWithinMs = 60_000

/** Settings of a test's server: only what is named here, so that no setting of this shell leaks in. */
function settings(dataDir: string, extra: Record<string, string> = {}): NodeJS.ProcessEnv {
  return {
    PATH: process.env['PATH'], HOME: process.env['HOME'], NODE_ENV: 'production', NEXT_TELEMETRY_DISABLED: '1', DATA_DIR: dataDir, AUTH_SECRET: secret,
    READS_PER_MINUTE: '1000000', WRITES_PER_MINUTE: '1000000', SIGN_INS_PER_QUARTER_HOUR: '1000000', ...extra,
  }
}

/** Runs one of our scripts to its end; throws with what it said when it fails. */
async function runScript(file: string, dataDir: string, ...args: string[]): Promise<void> {
  const child = spawn(process.execPath, [path.join(root, 'node_modules/tsx/dist/cli.mjs'), '--conditions=react-server', file, ...args], { cwd: root, env: settings(dataDir), stdio: ['ignore', 'pipe', 'pipe'] })
  let said = ''
  child.stdout.on('data', (data: Buffer) => { said += data.toString() })
  child.stderr.on('data', (data: Buffer) => { said += data.toString() })
  const code = await new Promise((resolve) => child.on('close', resolve))
  if (code !== 0) throw new Error(`${file} failed:\n${said}`)
}

const freePort = (): Promise<number> => new Promise((resolve, reject) => {
  const probe = net.createServer()
  probe.once('error', reject)
  probe.listen(0, () => {
    const address = probe.address()
    probe.close(() => (address !== null && typeof address === 'object' ? resolve(address.port) : reject(new Error('No free port'))))
  })
})

/** Starts the production build on `dataDir`; resolves when health says that search is ready. `stop` ends it and whatever it started. */
export async function startServer(dataDir: string, extra: Record<string, string> = {}): Promise<ServerPlace & { stop(): Promise<void> }> {
  const port = await freePort()
  const errorFile = path.join(dataDir, `server-${port}.err`)
  const [out, err] = [openSync(path.join(dataDir, `server-${port}.out`), 'a'), openSync(errorFile, 'a')]
  const child = spawn(process.execPath, [path.join(root, 'node_modules/next/dist/bin/next'), 'start', '-p', String(port)], {
    cwd: root, env: settings(dataDir, { PORT: String(port), ...extra }), stdio: ['ignore', out, err], detached: true,
  })
  closeSync(out)
  closeSync(err)
  const kill = (signal: NodeJS.Signals) => { try { if (child.pid !== undefined) process.kill(-child.pid, signal) } catch { /* it is gone */ } }
  const onExit = () => kill('SIGKILL')
  process.on('exit', onExit)
  const stop = async () => {
    process.off('exit', onExit)
    await ended(child, kill)
  }
  const baseUrl = `http://localhost:${port}`
  try {
    await ready(baseUrl, child, errorFile)
  } catch (error) {
    await stop()
    throw error
  }
  return { baseUrl, dataDir, secret, errorFile, stop }
}

async function ended(child: ChildProcess, kill: (signal: NodeJS.Signals) => void): Promise<void> {
  if (child.exitCode !== null || child.signalCode !== null) return
  const gone = new Promise((resolve) => child.once('exit', resolve))
  const timer = setTimeout(() => kill('SIGKILL'), 5_000)
  kill('SIGTERM')
  await gone
  clearTimeout(timer)
}

async function ready(baseUrl: string, child: ChildProcess, errorFile: string): Promise<void> {
  const until = performance.now() + readyWithinMs
  for (;;) {
    if (child.exitCode !== null) throw new Error(`The server ended with ${child.exitCode}:\n${readFileSync(errorFile, 'utf8')}`)
    const health = await fetch(`${baseUrl}/api/health`, { signal: AbortSignal.timeout(2_000) }).then((r) => r.json() as Promise<{ search?: { state: string } }>, () => null)
    if (health?.search?.state === 'ready') return
    if (performance.now() > until) throw new Error(`The server was not ready within ${readyWithinMs / 1000} s:\n${readFileSync(errorFile, 'utf8')}`)
    await new Promise((resolve) => setTimeout(resolve, 100))
  }
}

export default async function setup(project: TestProject): Promise<() => Promise<void>> {
  for (const needed of ['.next/BUILD_ID', 'dist/workers/render.mjs', 'dist/workers/search.mjs']) {
    if (!existsSync(path.join(root, needed))) throw new Error(`${needed} is missing: the browser tests look at the production build. Run \`npm run build\` first.`)
  }
  const dataDir = mkdtempSync(path.join(os.tmpdir(), 'pilothole-e2e-'))
  const remove = () => rmSync(dataDir, { recursive: true, force: true })
  try {
    await runScript('scripts/migrate.ts', dataDir)
    await runScript('scripts/seed.ts', dataDir, '--demo')
    const { stop, ...place } = await startServer(dataDir)
    project.provide('server', place)
    return async () => {
      await stop()
      remove()
    }
  } catch (error) {
    remove()
    throw error
  }
}
