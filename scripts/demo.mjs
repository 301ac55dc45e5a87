// `npm run demo`: from a fresh clone to the running demo. Imports only Node; the work is in the scripts beside it.
import { randomBytes } from 'node:crypto'
import { existsSync, mkdirSync, readFileSync, writeFileSync } from 'node:fs'
import path from 'node:path'
import { buildWhenChanged } from './build-when-changed.mjs'
import { ensureInstalled, requireNode } from './install.mjs'
import { root, runTypeScript } from './run-command.mjs'
import { readPort, requireFreePort, serve } from './serve.mjs'

// The seed gives it to everybody of the demo: it protects nothing.
const demoPassword = 'whimbrel-demo'

/** Makes the secret that signs sessions unless there is one; lib/env.ts reads the file. */
function ensureSecret(directory) {
  if (process.env.AUTH_SECRET) return
  const file = path.join(directory, 'secret')
  if (existsSync(file)) return
  mkdirSync(directory, { recursive: true })
  writeFileSync(file, `${randomBytes(48).toString('base64url')}\n`, { mode: 0o600, flag: 'wx' })
}

async function must(what, code) {
  if ((await code) === 0) return
  console.error(`${what} failed.`)
  process.exit(1)
}

function printSignIns(port) {
  const members = JSON.parse(readFileSync(path.join(root, 'content', 'demo', 'members.json'), 'utf8'))
  const lines = members.map((member) => {
    const roles = [member.role, ...(member.mentor ? [`mentor ${member.mentor.number}`] : [])].join(', ')
    return `  ${member.email.padEnd(28)} ${member.name.padEnd(20)} ${roles}`
  })
  console.log(['', `Pilothole is running on http://localhost:${port}`, '', `Sign in with any of these; the password is ${demoPassword}`, '', ...lines, '', 'Ctrl-C stops it.'].join('\n'))
}

requireNode()
const port = readPort()
await requireFreePort(port)
await ensureInstalled()
ensureSecret(path.resolve(root, process.env.DATA_DIR || 'data'))
// Before the seed, which renders its texts in a worker that the build makes.
if (await buildWhenChanged() === 'failed') {
  console.error('The build failed.')
  process.exit(1)
}
await must('Migrating the database', runTypeScript('scripts/migrate.ts'))
await must('Seeding the demo', runTypeScript('scripts/seed.ts', ['--demo']))
await serve(port)
printSignIns(port)
