// How soon `npm run demo` serves again when nothing has changed since it last did.
import { spawn } from 'node:child_process'
import { mkdtempSync, rmSync } from 'node:fs'
import os from 'node:os'
import path from 'node:path'
import { round } from './percentiles'
import type { Result } from './result'

const firstLimitMs = 600_000
const port = 3977

/** Starts the demo twice in a temporary data folder: the first time builds and seeds, the second is measured until it says where it runs. */
export async function measureStart(): Promise<Result> {
  const directory = mkdtempSync(path.join(os.tmpdir(), 'pilothole-bench-'))
  try {
    const first = await demoStart(directory)
    const second = await demoStart(directory)
    return {
      name: 'start', detail: {},
      measured: [
        { what: 'first start (migrates, seeds, builds when something changed)', value: round(first / 1000), unit: 's', promised: null },
        { what: 'second start, nothing changed', value: round(second / 1000), unit: 's', promised: 10 },
      ],
    }
  } finally {
    rmSync(directory, { recursive: true, force: true })
  }
}

/** Milliseconds from the start of scripts/demo.mjs until it prints its address; it is ended then. */
async function demoStart(directory: string): Promise<number> {
  const begun = performance.now()
  // NODE_OPTIONS of this script would be taken into the demo.
  const { NODE_OPTIONS: _, ...environment } = process.env
  const child = spawn(process.execPath, ['scripts/demo.mjs'], { env: { ...environment, DATA_DIR: directory, PORT: String(port) }, stdio: ['ignore', 'pipe', 'inherit'] })
  const ended = new Promise<void>((resolve) => child.once('exit', () => resolve()))
  try {
    return await new Promise<number>((resolve, reject) => {
      let said = ''
      child.stdout.on('data', (piece: Buffer) => {
        said += piece.toString()
        if (said.includes('Pilothole is running on')) resolve(performance.now() - begun)
      })
      child.once('exit', () => reject(new Error(`The demo ended:\n${said}`)))
      setTimeout(() => reject(new Error(`The demo did not start:\n${said}`)), firstLimitMs).unref()
    })
  } finally {
    child.kill('SIGTERM')
    await ended
  }
}
