// What a server process does before its first request. A fault is named on standard error and ends the process.
import 'server-only'
import { mkdirSync } from 'node:fs'
import { openDatabase } from '@/db/client'
import { schemaMismatch } from '@/db/migrate'
import { cautionTable } from './content/caution-table'
import { requiredCautions } from './domain/cautions/required-cautions'
import { env, SettingsError } from './env'
import { watchClientAddresses } from './http/client-address'
import { systemClock } from './clock'
import { logError, logInfo } from './log'
import { runtime } from './runtime'
import { noteRulesVersion, reapplyRules } from './services/cautions/reapply-rules'
import { fillMeasurements } from './services/posts/fill-measurements'

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
  // Compiles the rule table, once a process and not in the first builder's way.
  requiredCautions(cautionTable, { text: '', operations: [], tasks: [], hardware: [], jasc: [] })
  const { database, renderer } = await runtime()
  await noteRulesVersion(database)
  // Beside the first requests, not before them: what was judged by an older table warned already, by that table.
  reapplyRules(database, systemClock()).then((n) => { if (n > 0) logInfo('cautions.reapply', { entries: n }) }, (error: unknown) => logError('cautions.reapply', error))
  fillMeasurements({ database, renderer }).then((n) => { if (n > 0) logInfo('measurements.fill', { posts: n }) }, (error: unknown) => logError('measurements.fill', error))
}
