// The change log has no end while somebody goes on writing: search must neither stay shut nor keep a writer waiting for that end.
import { afterAll, beforeAll, expect, it } from 'vitest'
import { post } from '@/db/schema'
import { writeQuietly } from '@/db/transaction'
import { openSearch } from '@/lib/search/open-search'
import { workerFile } from '@/lib/worker-file'
import { openTestRuntime, type TestRuntime } from '../../support/database'
import { anEntry } from '../../support/factories'

let runtime: TestRuntime
beforeAll(async () => {
  runtime = await openTestRuntime()
})
afterAll(() => runtime.close())

it('opens, and finds what was written before, while every moment brings another change', async () => {
  await anEntry()
  let isWriting = true
  const write = async () => {
    while (isWriting) await writeQuietly(runtime.database, (tx) => tx.update(post).set({ updatedAt: Date.now() }))
  }
  const writing = Promise.all([write(), write(), write()])
  const search = openSearch({ database: runtime.database, workerFile: workerFile('search') })
  try {
    await expect.poll(() => search.health().state, { timeout: 5_000, interval: 20 }).toBe('ready')
    await expect(search.catchUp().then(() => 'caught up')).resolves.toBe('caught up')
  } finally {
    isWriting = false
    await writing
    await search.close()
  }
}, 20_000)
