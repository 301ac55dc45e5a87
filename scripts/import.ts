// npm run import -- FILE [--email steward]: the import of the API, from the command line. A server that runs beside it
// finds what was written by the change log.
import { readFileSync, statSync } from 'node:fs'
import { parseArgs } from 'node:util'
import { openDatabase } from '../db/client'
import { schemaMismatch } from '../db/migrate'
import { getMemberByEmail, listMembers } from '../db/queries/people'
import { systemClock } from '../lib/clock'
import { env } from '../lib/env'
import { createRenderer } from '../lib/render/renderer'
import { importMaxBytes } from '../lib/schemas/import'
import { importLines } from '../lib/services/import/import-file'
import { workerFile } from '../lib/worker-file'

const { values, positionals: [file] } = parseArgs({ options: { email: { type: 'string' } }, allowPositionals: true })
const stop = (message: string): never => {
  console.error(message)
  process.exit(1)
}
if (file === undefined) stop('Usage: npm run import -- FILE [--email STEWARD]')
else {
  if (statSync(file).size > importMaxBytes) stop(`${file} is larger than ${importMaxBytes.toLocaleString('en')} bytes: split it.`)
  const database = await openDatabase(env().databaseFile)
  const mismatch = await schemaMismatch(database)
  if (mismatch) stop(mismatch)
  const steward = values.email === undefined
    ? (await listMembers(database.reader)).find((m) => m.role === 'steward' && m.state === 'active')
    : await getMemberByEmail(database.reader, values.email)
  const actor = steward ? { id: steward.id, name: steward.name, role: steward.role, mark: null } : stop(values.email === undefined ? 'There is no steward yet.' : `Nobody has the e-mail ${values.email}.`)
  if (steward?.state !== 'active') stop('This account is not active.')
  const renderer = createRenderer({ workerFile: workerFile('render') })
  const result = await importLines({ database, reader: database.reader, actor, now: systemClock(), renderer }, readFileSync(file))
    .finally(() => Promise.all([renderer.close(), database.close()]))
  for (const { line, message } of result.failed) console.error(`line ${line}: ${message}`)
  console.log(`${result.imported} imported, ${result.updated} updated, ${result.unchanged} unchanged, ${result.failed.length} failed`)
  if (result.failed.length > 0) process.exitCode = 2
}
