// Opens the one SQLite file. No queries here, and no configuration: the caller names the file.
import 'server-only'
import { pathToFileURL } from 'node:url'
import { createClient, type Client } from '@libsql/client'
import type { ExtractTablesWithRelations } from 'drizzle-orm'
import { drizzle, type LibSQLDatabase } from 'drizzle-orm/libsql'
import type { SQLiteTransaction } from 'drizzle-orm/sqlite-core'
import type { ResultSet } from '@libsql/client'
import * as schema from './schema'

type Schema = typeof schema
export type Reader = LibSQLDatabase<Schema>
export type Transaction = SQLiteTransaction<'async', ResultSet, Schema, ExtractTablesWithRelations<Schema>>
/** What a query takes: it runs the same inside and outside a transaction. */
export type ReaderOrTransaction = Reader | Transaction

export interface Database {
  readonly file: string
  readonly client: Client
  readonly reader: Reader
  close(): void
}

/**
 * Opens (and creates) the database file at `file`.
 * The driver's busy wait blocks the event loop, so it is kept at 20 ms; db/transaction.ts does the patient waiting.
 */
export async function openDatabase(file: string): Promise<Database> {
  const client = createClient({ url: pathToFileURL(file).href, timeout: 20, concurrency: 20, intMode: 'number' })
  // Every time, because a copy made by VACUUM INTO comes out in delete mode.
  await client.execute('PRAGMA journal_mode=WAL')
  return { file, client, reader: drizzle(client, { schema, casing: 'snake_case' }), close: () => client.close() }
}
