// A whole installation in the system's temporary folder: migrated, with the demo's kits and people, and a token to write with.
import { existsSync, mkdirSync, mkdtempSync, rmSync } from 'node:fs'
import os from 'node:os'
import path from 'node:path'
import { openDatabase, type Database } from '@/db/client'
import { migrateDatabase } from '@/db/migrate'
import { getMemberByEmail } from '@/db/queries/people'
import { createRenderer } from '@/lib/render/renderer'
import { demoContent } from '@/lib/content/demo-content'
import type { Member } from '@/lib/policy/actor'
import { seedDemo } from '@/lib/services/demo/seed-demo'
import { importLines } from '@/lib/services/import/import-file'
import { createToken } from '@/lib/services/people/create-token'
import { workerFile } from '@/lib/worker-file'
import type { GeneratedLine } from './generate-entries'

export interface Installation { directory: string; databaseFile: string; steward: NonNullable<Member>; remove(): void }

/** The settings of a server on `directory`; its limits never stand in the way of a measurement. */
export const settingsOf = (directory: string) => ({
  DATA_DIR: directory, AUTH_SECRET: 'rL4vQ0mC7xTz2Wd9KpYb5HnUe8JsGa3f', READS_PER_MINUTE: '1000000', WRITES_PER_MINUTE: '1000000', PUBLIC_URL: '', PORT: '',
})

/** Makes an installation, or opens the one that an earlier call left in `kept`. Without `kept`, `remove` takes it away. */
export async function openInstallation(kept?: string): Promise<Installation & { isNew: boolean }> {
  const directory = kept ?? mkdtempSync(path.join(os.tmpdir(), 'pilothole-bench-'))
  mkdirSync(directory, { recursive: true })
  const databaseFile = path.join(directory, 'pilothole.db')
  const isNew = !existsSync(databaseFile)
  const steward = await withDatabase(databaseFile, async (database) => {
    await migrateDatabase(database)
    const renderer = createRenderer({ workerFile: workerFile('render') })
    await seedDemo(database, renderer, Date.now()).finally(() => renderer.close())
    const email = demoContent.members.find((person) => person.role === 'steward')?.email ?? ''
    const found = await getMemberByEmail(database.reader, email)
    if (!found) throw new Error('The demo has no steward')
    return { id: found.id, name: found.name, role: found.role, mark: null }
  })
  return { directory, databaseFile, steward, isNew, remove: () => { if (kept === undefined) rmSync(directory, { recursive: true, force: true }) } }
}

/** Opens the file for one piece of work. */
export async function withDatabase<T>(file: string, work: (database: Database) => Promise<T>): Promise<T> {
  const database = await openDatabase(file)
  return work(database).finally(() => database.close())
}

/** Imports `lines` through the import service; throws when a line fails. Returns how long it took, in seconds. */
export async function importInto({ databaseFile, steward }: Installation, lines: readonly GeneratedLine[]): Promise<number> {
  const begun = performance.now()
  const renderer = createRenderer({ workerFile: workerFile('render') })
  const bytes = Buffer.from(lines.map((line) => JSON.stringify(line)).join('\n'))
  const result = await withDatabase(databaseFile, (database) => importLines({ database, reader: database.reader, actor: steward, now: Date.now(), renderer }, bytes))
    .finally(() => renderer.close())
  if (result.failed.length > 0) throw new Error(`The import failed: line ${result.failed[0]?.line}: ${result.failed[0]?.message}`)
  return (performance.now() - begun) / 1000
}

/** A bearer token of the steward. */
export const tokenOf = ({ databaseFile, steward }: Installation): Promise<string> =>
  withDatabase(databaseFile, (database) => createToken({ database, now: Date.now() }, { memberId: steward.id, name: 'bench' }))
