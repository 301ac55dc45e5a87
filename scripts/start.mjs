// `npm start`: production. Refuses to start, with the reason and a code other than 0, when a setting or the schema is
// not right (scripts/check-start.ts knows), or when nothing has been built.
import { buildId } from './build-when-changed.mjs'
import { requireNode } from './install.mjs'
import { runTypeScript } from './run-command.mjs'
import { readPort, requireFreePort, serve } from './serve.mjs'

requireNode()
const port = readPort()
const code = await runTypeScript('scripts/check-start.ts', [], { env: { NODE_ENV: 'production' } })
if (code !== 0) process.exit(code)
if (buildId() === null) {
  console.error('There is no production build: run `npm run build` first.')
  process.exit(1)
}
await requireFreePort(port)
await serve(port)
console.log(`Pilothole is running on port ${port}`)
