// `npm test`: everything CI does, one after the other. Ends with `N passed, N failed` on a line of its own, where a
// step without tests of its own (types, lint, build …) counts as one. Imports only Node.
import { existsSync, mkdirSync } from 'node:fs'
import path from 'node:path'
import { buildWhenChanged } from './build-when-changed.mjs'
import { generatedSqlIsCurrent } from './check-generated.mjs'
import { ensureInstalled, requireNode } from './install.mjs'
import { bin, root, run, runNode } from './run-command.mjs'
import { runVitest } from './run-vitest.mjs'

const chromium = '/usr/bin/chromium'
const total = { passed: 0, failed: 0, names: [] }

async function ensureChromium() {
  if (existsSync(chromium)) return
  if (process.getuid?.() === 0) {
    console.log('Installing chromium for the browser tests (apt-get) …')
    const env = { DEBIAN_FRONTEND: 'noninteractive' }
    if (await run('apt-get', ['update', '-q'], { env }) === 0 && await run('apt-get', ['install', '-y', '-q', '--no-install-recommends', 'chromium'], { env }) === 0 && existsSync(chromium)) return
  }
  console.error(`The browser tests need ${chromium}. Install it as root: apt-get install chromium`)
  process.exit(1)
}

/** Runs one step under its heading. `work` gives true or false, or counts of its own. */
async function step(title, work) {
  console.log(`\n== ${title}`)
  const start = performance.now()
  const result = await work()
  const counts = typeof result === 'boolean' ? { passed: result ? 1 : 0, failed: result ? 0 : 1, names: result ? [] : [title] } : result
  total.passed += counts.passed
  total.failed += counts.failed
  total.names.push(...counts.names)
  console.log(`== ${title}: ${counts.failed === 0 ? 'passed' : 'FAILED'} in ${((performance.now() - start) / 1000).toFixed(1)} s`)
  return counts.failed === 0
}

const node = async (...args) => (await runNode(args)) === 0
const next = bin('next', 'dist/bin/next')

requireNode()
await ensureInstalled()
await ensureChromium()
mkdirSync(path.join(root, 'dist'), { recursive: true })

await step('Generated SQL', generatedSqlIsCurrent)
await step('Types', async () => (await node(next, 'typegen')) && node(bin('typescript', 'bin/tsc'), '--noEmit'))
await step('Lint', () => node(bin('eslint', 'bin/eslint.js'), '.', '--max-warnings', '0'))
// Without workers neither renderer nor search runs, and every test after this would fail for that one reason.
const workers = await step('Workers', () => node('scripts/build-workers.mjs'))
if (workers) await step('Unit and integration tests', () => runVitest(['unit', 'integration']))
const built = workers && await step('Build', async () => (await buildWhenChanged()) !== 'failed')
if (built) await step('Browser tests', () => runVitest(['e2e']))
else console.log('\nBrowser tests left out: there is no build to look at.')

if (total.names.length > 0) console.log(`\nFailed:\n  ${total.names.join('\n  ')}`)
console.log(`\n${total.passed} passed, ${total.failed} failed`)
process.exit(total.failed === 0 ? 0 : 1)
