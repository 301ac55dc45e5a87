// Runs the production server as a child and ends with it. Imports only Node.
import { spawn } from 'node:child_process'
import net from 'node:net'
import { bin, childEnv, root } from './run-command.mjs'

/** The port of the PORT setting; ends the process when it is no port. */
export function readPort() {
  const given = process.env.PORT || '3000'
  const port = Number(given)
  if (/^\d+$/.test(given) && port >= 1 && port <= 65_535) return port
  console.error(`PORT must be a whole number from 1 to 65535, not "${given}".`)
  process.exit(1)
}

/** Ends the process when something else listens on `port`: its answers would be taken for ours. */
export async function requireFreePort(port) {
  const error = await new Promise((resolve) => {
    const probe = net.createServer()
    probe.once('error', resolve)
    probe.listen(port, () => probe.close(() => resolve(null)))
  })
  if (!error) return
  console.error(error.code === 'EADDRINUSE' ? `Port ${port} is in use. Choose another: PORT=${port + 1}` : `Port ${port} cannot be opened: ${error.message}`)
  process.exit(1)
}

/**
 * Starts `next start` on `port`. Signals to this process are passed on, and this process ends as the server
 * does. Returns a promise that resolves when `GET /api/health` answers 200, or never.
 */
export function serve(port) {
  const child = spawn(process.execPath, [bin('next', 'dist/bin/next'), 'start', '-p', String(port)], {
    cwd: root, env: childEnv({ NODE_ENV: 'production', PORT: String(port) }), stdio: ['ignore', 'inherit', 'inherit'],
  })
  for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP']) process.on(signal, () => child.kill(signal))
  child.on('error', (error) => {
    console.error(`The server cannot be started: ${error.message}`)
    process.exit(1)
  })
  child.on('exit', (code, signal) => process.exit(code ?? (signal === 'SIGINT' || signal === 'SIGTERM' || signal === 'SIGHUP' ? 0 : 1)))
  return healthy(port)
}

async function healthy(port) {
  const start = performance.now()
  for (let told = false; ;) {
    if (!told && performance.now() - start > 30_000) {
      console.error(`Still waiting for http://localhost:${port}/api/health to answer 200 …`)
      told = true
    }
    const status = await fetch(`http://127.0.0.1:${port}/api/health`, { signal: AbortSignal.timeout(2_000) }).then((answer) => answer.status, () => 0)
    if (status === 200) return
    await new Promise((resolve) => setTimeout(resolve, 150))
  }
}
