// Runs other programs for the entry scripts. Imports only Node: it works before anything is installed.
import { spawn } from 'node:child_process'
import path from 'node:path'
import { fileURLToPath } from 'node:url'

/** The project's root, with which every path here begins. */
export const root = fileURLToPath(new URL('..', import.meta.url)).replace(/\/$/, '')

/** A command line of an installed package, run with this same Node: `bin('next', 'dist/bin/next')`. */
export const bin = (name, file) => path.join(root, 'node_modules', name, file)

const baseEnv = { NEXT_TELEMETRY_DISABLED: '1', DO_NOT_TRACK: '1' }

/** The environment of every child: ours, with what the framework would send home turned off. */
export const childEnv = (extra = {}) => ({ ...process.env, ...baseEnv, ...extra })

/**
 * Runs `command` to its end in the root, its output shown. Resolves with the exit code (1 when a signal ended
 * it or it cannot be started). `input` stays closed, so nothing can wait for an answer.
 */
export function run(command, args, { env = {} } = {}) {
  return new Promise((resolve) => {
    const child = spawn(command, args, { cwd: root, env: childEnv(env), stdio: ['ignore', 'inherit', 'inherit'] })
    child.on('error', (error) => {
      console.error(`${command} cannot be started: ${error.message}`)
      resolve(1)
    })
    child.on('close', (code) => resolve(code ?? 1))
  })
}

/** Runs a script of this Node. */
export const runNode = (args, options) => run(process.execPath, args, options)

/** Runs one of our TypeScript entries (`scripts/migrate.ts`); the condition makes `server-only` a mere mark. */
export const runTypeScript = (file, args = [], options) =>
  runNode([bin('tsx', 'dist/cli.mjs'), '--conditions=react-server', file, ...args], options)
