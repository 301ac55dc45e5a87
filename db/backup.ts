// A consistent copy of the open database, checked before it counts as one.
import 'server-only'
import { existsSync } from 'node:fs'
import type { Database } from './client'
import { openDatabase } from './client'

/**
 * Writes a copy to `file` (which must not exist) while others read and write, then opens it and runs integrity_check.
 * Copying the main file alone would lose what is still in the write-ahead log. Throws when the copy is not sound.
 */
export async function backUp(database: Database, file: string): Promise<void> {
  if (existsSync(file)) throw new Error(`${file} exists already`)
  await database.client.execute({ sql: 'VACUUM INTO ?', args: [file] })
  const copy = await openDatabase(file)
  const result = await copy.client.execute('PRAGMA integrity_check')
  copy.close()
  if (result.rows[0]?.['integrity_check'] !== 'ok') throw new Error(`The copy at ${file} is not sound`)
}
