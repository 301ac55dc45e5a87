// Applies drizzle/ and puts the laws back. The only thing that migrates; a server start merely checks.
import 'server-only'
import { createHash } from 'node:crypto'
import { readFileSync } from 'node:fs'
import path from 'node:path'
import { migrate } from 'drizzle-orm/libsql/migrator'
import type { Database } from './client'

const root = process.cwd()
const lawsFile = path.join(root, 'db', 'laws.sql')

interface Journal { entries: { when: number; tag: string }[] }

/** What this source tree expects: the last migration and the hash of the laws. */
export function expectedSchema(): { migration: number; tag: string; laws: string } {
  const journal = JSON.parse(readFileSync(path.join(root, 'drizzle', 'meta', '_journal.json'), 'utf8')) as Journal
  const last = journal.entries.at(-1)
  if (!last) throw new Error('drizzle/meta/_journal.json lists no migration')
  return { migration: last.when, tag: last.tag, laws: createHash('sha256').update(readFileSync(lawsFile)).digest('hex').slice(0, 16) }
}

/** Says in words why the file does not fit this version, or null when it does. */
export async function schemaMismatch(database: Database): Promise<string | null> {
  const expected = expectedSchema()
  const tables = await database.client.execute("select name from sqlite_master where name in ('__drizzle_migrations', 'setting')")
  if (tables.rows.length < 2) return 'the database has no schema yet: run `npm run db:migrate`'
  const applied = await database.client.execute('select max(created_at) as at from __drizzle_migrations')
  const at = Number(applied.rows[0]?.['at'] ?? 0)
  if (at < expected.migration) return `the database schema is older than this version (${expected.tag}): back up, then run \`npm run db:migrate\``
  if (at > expected.migration) return 'the database schema is newer than this version: start the version that made it'
  const laws = await database.client.execute("select value from setting where key = 'laws'")
  if (laws.rows[0]?.['value'] !== expected.laws) return 'the laws of the database differ from this version: run `npm run db:migrate`'
  return null
}

/** Brings the file to this version's schema and laws. Safe to run again. */
export async function migrateDatabase(database: Database): Promise<void> {
  await migrate(database.reader, { migrationsFolder: path.join(root, 'drizzle') })
  const old = await database.client.execute("select name from sqlite_master where type = 'trigger'")
  const drops = old.rows.map((row) => `DROP TRIGGER "${String(row['name'])}";`).join('\n')
  const { laws } = expectedSchema()
  await database.client.executeMultiple(
    `BEGIN IMMEDIATE;\n${drops}\n${readFileSync(lawsFile, 'utf8')}\n` +
    `INSERT INTO setting (key, value) VALUES ('laws', '${laws}') ON CONFLICT (key) DO UPDATE SET value = excluded.value;\n` +
    // Which database this is: what was derived from another one must not be taken for its own.
    `INSERT INTO setting (key, value) VALUES ('database', lower(hex(randomblob(16)))) ON CONFLICT (key) DO NOTHING;\nCOMMIT;`,
  )
}
