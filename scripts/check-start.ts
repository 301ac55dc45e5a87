// Run before the server starts: settings and schema, each fault named. The server checks again when it starts.
import { mkdirSync } from 'node:fs'
import { openDatabase } from '../db/client'
import { schemaMismatch } from '../db/migrate'
import { env, SettingsError } from '../lib/env'

try {
  mkdirSync(env().dataDirectory, { recursive: true })
  const database = await openDatabase(env().databaseFile)
  const mismatch = await schemaMismatch(database)
  database.close()
  if (mismatch) throw new SettingsError(mismatch)
} catch (error) {
  console.error(`Pilothole does not start:\n${error instanceof Error ? error.message : String(error)}`)
  process.exit(1)
}
