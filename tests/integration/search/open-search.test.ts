import { writeFile } from 'node:fs/promises'
import path from 'node:path'
import { afterAll, afterEach, beforeAll, beforeEach, describe, expect, test } from 'vitest'
import { openDatabase, type Database } from '@/db/client'
import { SearchLoadingError, type SearchDoor } from '@/lib/search/messages'
import { openSearch } from '@/lib/search/open-search'
import { addLessonFromAnotherProcess, addPost, bundleThread, editPost, eventually, hidePost, keepRendering, openFilled, openFolder, stampPost, type Folder } from './search-fixture'

let bundle: Folder
let thread: string
beforeAll(async () => {
  bundle = await openFolder()
  thread = await bundleThread(bundle.path)
})
afterAll(() => bundle.remove())

let folder: Folder
let database: Database
let door: SearchDoor
let errors: unknown[]
beforeEach(async () => {
  folder = await openFolder()
  errors = []
  database = await openFilled(path.join(folder.path, 'test.db'))
})
afterEach(async () => {
  await door.close()
  database.close()
  await folder.remove()
})

function open(workerFile = thread, pollMs = 250): void {
  door = openSearch({ database, workerFile, pollMs, onError: (error) => errors.push(error) })
}
const search = (text: string) => door.search({ text, filters: {}, limit: 20, offset: 0 })
const idsFor = async (text: string) => (await search(text)).hits.map((hit) => hit.id)

describe('filling', () => {
  test('says that it is loading, refuses until it is ready, then holds all that was written before', async () => {
    const ids: number[] = []
    for (let i = 0; i < 450; i++) ids.push(await addPost(database, { title: `Fluting pliers ${i}`, body: 'the flange' }))
    open()
    expect(door.health().state).toBe('loading')
    await expect(search('fluting')).rejects.toBeInstanceOf(SearchLoadingError)
    await expect(door.suggest('flut', 5)).rejects.toBeInstanceOf(SearchLoadingError)
    await door.catchUp()
    expect(door.health()).toMatchObject({ state: 'ready', documents: 450 })
    expect((await search('fluting')).total).toBe(450)
  })

  test('what is written while the index is being filled is found as well', async () => {
    for (let i = 0; i < 150; i++) await addPost(database, { title: `Dimple dies ${i}`, body: '' })
    open()
    const written = addPost(database, { title: 'Reamer chatter', body: '' })
    await written
    await door.catchUp()
    expect(await idsFor('reamer')).toEqual([await written])
  })
})

describe('following', () => {
  // A poll that comes in an hour: only catchUp can have found what these tests write.
  beforeEach(async () => {
    open(thread, 3_600_000)
    await door.catchUp()
  })

  test('an entry is found once catchUp has resolved, under its text, its section and its answers', async () => {
    const id = await addPost(database, { title: 'Which hole for a grommet?', body: 'The web is .032.' }, undefined, 'question')
    const answer = await addPost(database, { body: 'A step drill to 0.562.' }, id)
    await door.catchUp()
    expect(await idsFor('grommet hole')).toEqual([id])
    expect(await idsFor('wing ribs')).toEqual([id])
    expect((await search('step drill')).hits).toMatchObject([{ id, postId: answer }])
  })

  test('after an edit the old words are gone', async () => {
    const id = await addPost(database, { title: 'Flaring a tube', body: 'single flare' })
    await door.catchUp()
    await editPost(database, id, 2, { title: 'Bending a longeron', body: 'by hand' })
    await door.catchUp()
    expect(await idsFor('flaring')).toEqual([])
    expect(await idsFor('longeron')).toEqual([id])
  })

  test('a hidden entry is gone, and so is the text of a hidden answer', async () => {
    const hidden = await addPost(database, { title: 'Swaging a cable', body: '' })
    const question = await addPost(database, { title: 'Pulley guard', body: '' }, undefined, 'question')
    const answer = await addPost(database, { body: 'Use a cotter.' }, question)
    await door.catchUp()
    await hidePost(database, hidden)
    await hidePost(database, answer)
    await door.catchUp()
    expect(await idsFor('swaging')).toEqual([])
    expect(await idsFor('cotter')).toEqual([])
    expect(await idsFor('pulley')).toEqual([question])
    expect(door.health().documents).toBe(1)
  })

  test('a stamp is seen, on a question by its answer, and so is a rendered text', async () => {
    const lesson = await addPost(database, { title: 'Safety wire', body: '' })
    const question = await addPost(database, { title: 'Safety wire twist?', body: '' }, undefined, 'question')
    const answer = await addPost(database, { body: '**Six** twists' }, question)
    const stamped = () => door.search({ text: 'safety wire', filters: { stamped: true }, limit: 20, offset: 0 })
    await door.catchUp()
    expect((await stamped()).total).toBe(0)
    await stampPost(database, answer)
    await keepRendering(database, lesson, 'beside a turnbuckle')
    await stampPost(database, lesson)
    await door.catchUp()
    expect((await stamped()).hits.map((hit) => hit.id).sort()).toEqual([lesson, question])
    expect(await idsFor('turnbuckles')).toEqual([lesson])
  })

  test('writers at the same time each find their own entry after their own catchUp', async () => {
    const words = ['grommet', 'longeron', 'cotter', 'turnbuckle', 'gascolator', 'magneto', 'bellcrank', 'firewall', 'spinner', 'cowling']
    await Promise.all(words.map(async (word) => {
      const id = await addPost(database, { title: word, body: '' })
      await door.catchUp()
      expect(await idsFor(word)).toContain(id)
    }))
  })

  test('the sequence of an answer is that of the log it includes', async () => {
    await addPost(database, { title: 'Torque stripe', body: '' })
    await door.catchUp()
    expect((await search('torque')).sequence).toBe(door.health().sequence)
    expect(door.health().sequence).toBeGreaterThan(0)
  })
})

describe('several writers of one file', () => {
  test('what another process wrote is found within a second of its end, by polling alone', async () => {
    open()
    await door.catchUp()
    await addLessonFromAnotherProcess(database.file, 'Turnbuckle barrels')
    await eventually(async () => (await search('turnbuckle')).total === 1, 1_000)
  })

  test('what a second handle wrote is found within a second, by polling alone', async () => {
    open()
    await door.catchUp()
    const second = await openDatabase(database.file)
    const id = await addPost(second, { title: 'Gascolator drain', body: '' })
    await eventually(async () => (await idsFor('gascolator')).includes(id), 1_000)
    second.close()
  })
})

describe('a thread that is lost', () => {
  /** Fills like the real thread and ends at the first question. */
  const fragile = `import { parentPort } from 'node:worker_threads'
    parentPort.on('message', ({ call, number }) => call === 'apply' ? parentPort.postMessage({ number, given: { documents: 0 } }) : process.exit(7))`

  test('refuses the question that waited, starts anew and is ready again', async () => {
    const file = path.join(folder.path, 'fragile.mjs')
    await writeFile(file, fragile)
    await addPost(database, { title: 'Grommet', body: '' })
    open(file)
    await door.catchUp()
    await expect(search('grommet')).rejects.toBeInstanceOf(SearchLoadingError)
    await eventually(() => Promise.resolve(door.health().state === 'loading'), 2_000)
    await door.catchUp()
    expect(door.health().state).toBe('ready')
    expect(String(errors[0])).toContain('ended with code 7')
  })

  test('a thread that cannot start leaves search loading, and says why', async () => {
    open(path.join(folder.path, 'absent.mjs'))
    await eventually(() => Promise.resolve(errors.length > 0), 5_000)
    expect(door.health().state).toBe('loading')
    await expect(search('grommet')).rejects.toBeInstanceOf(SearchLoadingError)
  })

  test('after close everything is refused and nothing waits for ever', async () => {
    open()
    const waiting = expect(door.catchUp()).rejects.toBeInstanceOf(SearchLoadingError)
    await door.close()
    await waiting
    await expect(search('grommet')).rejects.toBeInstanceOf(SearchLoadingError)
  })
})
