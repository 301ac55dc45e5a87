// Search started from what an earlier process saved: caught up with what happened since, or made anew when it cannot be trusted.
import { fork } from 'node:child_process'
import { copyFileSync, readdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs'
import path from 'node:path'
import { sql } from 'drizzle-orm'
import { afterAll, afterEach, beforeAll, beforeEach, expect, test } from 'vitest'
import { openDatabase, type Database } from '@/db/client'
import { section } from '@/db/schema'
import { write, writeQuietly } from '@/db/transaction'
import type { SearchDoor } from '@/lib/search/messages'
import { openSearch } from '@/lib/search/open-search'
import { addPost, bundleThread, editPost, eventually, hidePost, openFilled, openFolder, type Folder } from './search-fixture'

let bundle: Folder
let thread: string
beforeAll(async () => {
  bundle = await openFolder()
  thread = await bundleThread(bundle.path)
})
afterAll(() => bundle.remove())

let folder: Folder
let database: Database
let opened: SearchDoor[]
beforeEach(async () => {
  folder = await openFolder()
  database = await openFilled(path.join(folder.path, 'test.db'))
  opened = []
})
afterEach(async () => {
  await Promise.all(opened.map((door) => door.close()))
  database.close()
  await folder.remove()
})

const snapshots = () => path.join(folder.path, 'search')
const files = () => readdirSync(snapshots())
const only = () => path.join(snapshots(), files()[0] ?? '')

async function start(of = database, workerFile = thread): Promise<SearchDoor> {
  const door = openSearch({ database: of, workerFile, pollMs: 20, snapshots: { folder: snapshots(), changes: 1, restMs: 0 } })
  opened.push(door)
  await door.catchUp()
  return door
}
const saved = (door: SearchDoor) => eventually(() => Promise.resolve(door.health().snapshot?.sequence === door.health().sequence), 5_000)
/** A process that filled its index, saved it and ended. */
async function saveAndStop(): Promise<void> {
  const door = await start()
  await saved(door)
  await door.close()
}
const idsFor = async (door: SearchDoor, text: string) => (await door.search({ text, filters: {}, limit: 20, offset: 0 })).hits.map((hit) => hit.id)

test('what was written, edited and hidden while nothing ran is as the tables say', async () => {
  const [kept, edited, hidden] = [await addPost(database, { title: 'Swaging a cable', body: '' }), await addPost(database, { title: 'Flaring a tube', body: '' }), await addPost(database, { title: 'Pulley guard', body: '' })]
  await saveAndStop()
  await editPost(database, edited, 2, { title: 'Bending a longeron', body: '' })
  await hidePost(database, hidden)
  const added = await addPost(database, { title: 'Torque stripe', body: '' })
  const door = await start()
  expect(door.health()).toMatchObject({ state: 'ready', startedFrom: 'snapshot', documents: 3 })
  expect(await Promise.all(['cable', 'flaring', 'longeron', 'pulley', 'torque'].map((text) => idsFor(door, text)))).toEqual([[kept], [], [edited], [], [added]])
})

test('it is saved again when changes came, and the older one is gone', async () => {
  await addPost(database, { title: 'Swaging a cable', body: '' })
  const door = await start()
  await saved(door)
  const first = files()
  await addPost(database, { title: 'Pulley guard', body: '' })
  await door.catchUp()
  await saved(door)
  expect(files()).toHaveLength(1)
  expect(files()).not.toEqual(first)
  expect(door.health()).toMatchObject({ startedFrom: 'tables', because: 'there is no snapshot', snapshot: { MB: expect.any(Number) } })
  expect(door.health().memoryMB).toBeGreaterThan(0)
})

async function expectAnew(because: string, of = database, workerFile = thread): Promise<void> {
  const door = await start(of, workerFile)
  expect(door.health()).toMatchObject({ state: 'ready', startedFrom: 'tables', because })
  await saved(door)
  expect(files()).toHaveLength(1)
}

test('a damaged one is told, removed and made anew', async () => {
  const id = await addPost(database, { title: 'Swaging a cable', body: '' })
  await saveAndStop()
  const bytes = readFileSync(only())
  bytes[bytes.length - 3] = (bytes[bytes.length - 3] ?? 0) ^ 16
  writeFileSync(only(), bytes)
  await expectAnew('the snapshot is damaged')
  expect(await idsFor(opened.at(-1) as SearchDoor, 'cable')).toEqual([id])
})

test('one of another thread, whose words and synonyms may be others, is not used', async () => {
  await saveAndStop()
  const other = path.join(folder.path, 'other.mjs')
  writeFileSync(other, `${readFileSync(thread, 'utf8')}\n// changed`)
  await expectAnew('the snapshot is of another version', database, other)
})

test('one of another database is not used', async () => {
  await addPost(database, { title: 'Swaging a cable', body: '' })
  await saveAndStop()
  const other = await openFilled(path.join(folder.path, 'other.db'))
  await expectAnew('the snapshot is of another database', other)
  expect(await idsFor(opened.at(-1) as SearchDoor, 'cable')).toEqual([])
  await opened.at(-1)?.close()
  other.close()
})

test('one made with other section titles is not used', async () => {
  await saveAndStop()
  await writeQuietly(database, (tx) => tx.update(section).set({ title: 'Wing tips' }))
  await expectAnew('the snapshot is made with other titles')
})

test('one that ends the thread that reads it is not tried twice', async () => {
  const id = await addPost(database, { title: 'Swaging a cable', body: '' })
  const fragile = path.join(folder.path, 'fragile.mjs')
  writeFileSync(fragile, `import { parentPort as fromDoor } from 'node:worker_threads'\nfromDoor.on('message', ({ call }) => { if (call === 'loadSnapshot') process.exit(9) })\n${readFileSync(thread, 'utf8')}`)
  const first = await start(database, fragile)
  await saved(first)
  await first.close()
  await expectAnew('the snapshot is one that ended the search thread', database, fragile)
  expect(await idsFor(opened.at(-1) as SearchDoor, 'cable')).toEqual([id])
})

test('one that is far behind is not caught up with: reading the tables is sooner done', async () => {
  await addPost(database, { title: 'Swaging a cable', body: '' })
  await saveAndStop()
  await database.reader.run(sql`with recursive n(i) as (select 1 union all select i + 1 from n where i < 6000) insert into change (post_id) select 1 from n`)
  await expectAnew('the snapshot is far behind the database')
})

/** Gives back the copy taken before `lose` ran. */
async function restoreFromBefore(lose: () => Promise<void>): Promise<Database> {
  const copy = path.join(folder.path, 'copy.db')
  await database.reader.run(sql`VACUUM INTO ${copy}`)
  await lose()
  return openDatabase(copy)
}
const audited = (of: Database, subject: string, title: string) => write(of, { actorId: null, at: 1 }, async (tx, record) => {
  record('test.write', subject)
  await tx.update(section).set({ title: 'Wing ribs to spar' })
  await tx.run(sql`insert into post (kind, current_revision, created_at, updated_at) values ('lesson', 1, 0, 0)`)
  await tx.run(sql`insert into revision (post_id, number, title, kit_id, sections, tasks, operations, hardware, plans, order_advice, body, content_hash, created_at)
    values ((select max(id) from post), 1, ${title}, 1, '[]', '[]', '[]', '[]', '[]', '[]', '', 'x', 0)`)
})

test('when the database was put back to an older copy, what was lost is not found', async () => {
  const copy = await restoreFromBefore(async () => {
    await audited(database, 'post:1', 'Swaging a cable')
    await saveAndStop()
  })
  await expectAnew('the snapshot is ahead of the database', copy)
  await opened.at(-1)?.close()
  copy.close()
})

test('nor when others have written as much since into that copy', async () => {
  const copy = await restoreFromBefore(async () => {
    await audited(database, 'post:1', 'Swaging a cable')
    await saveAndStop()
  })
  await audited(copy, 'post:2', 'Pulley guard')
  await audited(copy, 'post:3', 'Torque stripe')
  await expectAnew('the snapshot is of another history', copy)
  expect(await idsFor(opened.at(-1) as SearchDoor, 'cable')).toEqual([])
  await opened.at(-1)?.close()
  copy.close()
})

test('two processes on one database and one folder each stay current, and leave one snapshot that is whole', async () => {
  const second = await openDatabase(database.file)
  const doors = [await start(), await start(second)]
  const ids: number[] = []
  for (let i = 0; i < 30; i++) ids.push(await addPost(i % 2 ? database : second, { title: `Turnbuckle ${i}`, body: '' }))
  for (const door of doors) {
    await door.catchUp()
    expect((await door.search({ text: 'turnbuckle', filters: {}, limit: 50, offset: 0 })).hits.map((hit) => hit.id).sort((a, b) => a - b)).toEqual(ids)
    await saved(door)
  }
  await Promise.all(doors.map((door) => door.close()))
  expect(files().filter((file) => file.endsWith('.tmp'))).toEqual([])
  const third = await start()
  expect(third.health()).toMatchObject({ startedFrom: 'snapshot', documents: 30 })
  second.close()
})

/** A process that saves again and again until it is killed; it tells when it has begun the first. */
const saver = `
  import { Worker } from 'node:worker_threads'
  import { mkdirSync } from 'node:fs'
  const [file, folder] = process.argv.slice(2)
  const worker = new Worker(file, { env: {}, execArgv: [] })
  let number = 0
  const call = (call, asked) => new Promise((resolve) => { const mine = ++number; worker.on('message', (reply) => { if (reply.number === mine) resolve(reply) }); worker.postMessage({ call, number: mine, asked }) })
  mkdirSync(folder, { recursive: true })
  const put = Array.from({ length: 3000 }, (_, i) => ({ id: i + 1, kind: 'lesson', kit: 'k', sections: [], operations: [], tasks: [], stamped: false, open: false, createdAt: i, title: 'Rib ' + i, labels: '', passages: [{ postId: i + 1, text: ('rivet spar ' + i + ' ').repeat(60), weight: 1 }] }))
  await call('apply', { put, remove: [], sequence: 1 })
  void call('writeSnapshot', { temporary: folder + '/building-00112233445' + '5.tmp' })
  process.send('saving')
  setInterval(() => {}, 1000)`

test('a process killed while it saves leaves nothing that is used', async () => {
  const id = await addPost(database, { title: 'Swaging a cable', body: '' })
  const script = path.join(folder.path, 'saver.mjs')
  writeFileSync(script, saver)
  const child = fork(script, [thread, snapshots()])
  await new Promise((resolve) => child.once('message', resolve))
  await eventually(() => Promise.resolve(files().length > 0), 10_000)
  const ended = new Promise((resolve) => child.once('exit', resolve))
  child.kill('SIGKILL')
  await ended
  expect(files()).toEqual(['building-001122334455.tmp'])
  // However far it had come when the machine stopped: under the name of a snapshot it would be refused as well.
  copyFileSync(path.join(snapshots(), 'building-001122334455.tmp'), path.join(snapshots(), 'index-000000000000001-001122334455.snapshot'))
  rmSync(path.join(snapshots(), 'building-001122334455.tmp'))
  const door = await start()
  expect(door.health()).toMatchObject({ startedFrom: 'tables', because: 'the snapshot is damaged', documents: 1 })
  expect(await idsFor(door, 'cable')).toEqual([id])
})
