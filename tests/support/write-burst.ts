// A process of its own that writes remarks into a database as fast as it can, and prints what was acknowledged.
// Run with: node --conditions=react-server --import tsx tests/support/write-burst.ts FILE MEMBER POST WRITERS
import { openDatabase } from '@/db/client'
import { createRenderer } from '@/lib/render/renderer'
import { addRemark } from '@/lib/services/entries/add-remark'
import { workerFile } from '@/lib/worker-file'
import type { SearchDoor } from '@/lib/search/messages'
import { watchLoop } from './watch-loop'

const [file, member, post, writers] = process.argv.slice(2)
if (file === undefined) throw new Error('Which database?')
const database = await openDatabase(file)
const renderer = createRenderer({ workerFile: workerFile('render') })
// This process writes only; whoever reads follows the change log.
const search = { catchUp: () => Promise.resolve() } as unknown as SearchDoor
const actor = { id: Number(member), name: 'Writer', role: 'member', mark: null } as const
const context = { database, reader: database.reader, actor, now: Date.now(), search, renderer, publicReading: true }
await renderer.render({ body: 'warm' })
const loop = watchLoop()
const acknowledged = await Promise.all(Array.from({ length: Number(writers) }, (_, i) => addRemark(context, Number(post), { body: `Remark ${i} of ${process.pid}` }).then((r) => r.id)))
console.log(JSON.stringify({ acknowledged, longestStallMs: loop.stop() }))
await renderer.close()
database.close()
