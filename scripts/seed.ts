// npm run db:seed -- --places (kits and operations) or --demo (the whole scenario, with its published passwords), into an empty
// database. Says so and changes nothing when there is something.
import { openDatabase } from '../db/client'
import { systemClock } from '../lib/clock'
import { env } from '../lib/env'
import { createRenderer } from '../lib/render/renderer'
import { workerFile } from '../lib/worker-file'
import { seedDemo } from '../lib/services/demo/seed-demo'
import { seedPlaces } from '../lib/services/demo/seed-places'

const [what] = process.argv.slice(2)
if (what !== '--places' && what !== '--demo') {
  console.error('Say what: --places for kits and operations, or --demo for the demo with its published passwords.')
  process.exit(1)
}
const database = await openDatabase(env().databaseFile)
const renderer = createRenderer({ workerFile: workerFile('render') })
if (what === '--places') {
  console.log((await seedPlaces(database, systemClock())) ? 'Seeded kits, sections and operations.' : 'There are kits already: nothing seeded.')
} else {
  const entries = await seedDemo(database, renderer, systemClock())
  console.log(entries === 0 ? 'The database has members already: nothing seeded.' : `Seeded the demo: ${entries} entries.`)
}
await renderer.close()
database.close()
