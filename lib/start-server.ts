// What a server process does before its first request. A fault is named on standard error and ends the process.
import 'server-only'
import { mkdirSync } from 'node:fs'
import { openDatabase } from '@/db/client'
import { schemaMismatch } from '@/db/migrate'
import { env, SettingsError } from './env'
import { watchClientAddresses } from './http/client-address'
import { runtime } from './runtime'

/** Checks settings and schema, then opens database, search and renderer. Exits with 1 when something does not fit. */
export async function startServer(): Promise<void> {
  try {
    mkdirSync(env().dataDirectory, { recursive: true })
    const probe = await openDatabase(env().databaseFile)
    const mismatch = await schemaMismatch(probe)
    probe.close()
    if (mismatch) throw new SettingsError(mismatch)
  } catch (error) {
    process.stderr.write(`Pilothole does not start:\n${error instanceof Error ? error.message : String(error)}\n`)
    process.exit(1)
  }
  watchClientAddresses()
  await runtime()
}
