// npm run db:seed: the demo scenario into an empty database. Says so and changes nothing when there is something.
import { openDatabase } from '../db/client'
import { systemClock } from '../lib/clock'
import { env } from '../lib/env'
import { createRenderer } from '../lib/render/renderer'
import { workerFile } from '../lib/worker-file'
import { seedDemo } from '../lib/services/demo/seed-demo'

const database = await openDatabase(env().databaseFile)
const renderer = createRenderer({ workerFile: workerFile('render') })
const entries = await seedDemo(database, renderer, systemClock())
console.log(entries === 0 ? 'The database has members already: nothing seeded.' : `Seeded the demo: ${entries} entries.`)
await renderer.close()
database.close()
