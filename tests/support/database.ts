// Databases for tests: copies of the template in the system's temporary folder, and nothing outside it.
import { mkdtempSync, realpathSync, rmSync } from 'node:fs'
import os from 'node:os'
import path from 'node:path'
import { inject } from 'vitest'
import { openDatabase, type Database } from '@/db/client'
import { createRenderer } from '@/lib/render/renderer'
import type { Runtime } from '@/lib/runtime'
import { openSearch } from '@/lib/search/open-search'
import { workerFile } from '@/lib/worker-file'

// Settings of a test process: read once, by the first env().
process.env['AUTH_SECRET'] = 'rL4vQ0mC7xTz2Wd9KpYb5HnUe8JsGa3f'
process.env['DATA_DIR'] = path.join(os.tmpdir(), 'pilothole-test-nowhere')
process.env['READS_PER_MINUTE'] = '1000000'
process.env['WRITES_PER_MINUTE'] = '1000000'

/** Throws unless `file` lies in the temporary folder: a test never touches an installation. */
export function requireTemporary(file: string): string {
  const temporary = realpathSync(os.tmpdir())
  const relative = path.relative(temporary, path.join(realpathSync(path.dirname(file)), path.basename(file)))
  if (relative === '' || relative.startsWith('..') || path.isAbsolute(relative)) throw new Error(`${file} lies outside the temporary folder`)
  return file
}

/** A fresh copy of the template; `remove` takes its folder away. */
export async function copyDatabase(): Promise<{ file: string; remove(): void }> {
  const folder = mkdtempSync(path.join(os.tmpdir(), 'pilothole-test-'))
  const file = requireTemporary(path.join(folder, 'pilothole.db'))
  const template = await openDatabase(requireTemporary(inject('templateDatabase')))
  await template.client.execute({ sql: 'VACUUM INTO ?', args: [file] })
  template.close()
  return { file, remove: () => rmSync(folder, { recursive: true, force: true }) }
}

export interface TestRuntime extends Runtime { close(): Promise<void> }
const holder = globalThis as unknown as { pilotholeRuntime?: Promise<Runtime> | undefined }

/**
 * Opens a runtime on a fresh database and makes it the one of this process; closing it puts back the one before.
 * `searchStarts: false` gives a search whose thread never comes up, as in the first moments of a start.
 */
export async function openTestRuntime({ searchStarts = true } = {}): Promise<TestRuntime> {
  const { file, remove } = await copyDatabase()
  const database: Database = await openDatabase(file)
  const search = openSearch({ database, workerFile: searchStarts ? workerFile('search') : `${file}.no-worker.mjs` })
  const renderer = createRenderer({ workerFile: workerFile('render'), timeoutMs: 5_000 })
  if (searchStarts) await search.catchUp()
  const before = holder.pilotholeRuntime
  holder.pilotholeRuntime = Promise.resolve({ database, search, renderer })
  return {
    database, search, renderer,
    close: async () => {
      holder.pilotholeRuntime = before
      await Promise.all([search.close(), renderer.close()])
      database.close()
      remove()
    },
  }
}
