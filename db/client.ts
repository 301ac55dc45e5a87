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
  /** For db/transaction.ts alone: a connection of its own that begins at once or is refused. */
  readonly writer: Reader
  /** The end of the line of writes. Here, not in a module of db/transaction.ts: the framework loads modules once a bundle, and two lines would not wait for each other. */
  readonly queue: { last: Promise<unknown> }
  close(): void
}

/**
 * Opens (and creates) the database file at `file`.
 * The driver's busy wait blocks the event loop: a reader waits at most 20 ms, the writer not at all, because db/transaction.ts
 * does the patient waiting.
 */
export async function openDatabase(file: string): Promise<Database> {
  const url = pathToFileURL(file).href
  const client = createClient({ url, timeout: 20, concurrency: 20, intMode: 'number' })
  // Every time, because a copy made by VACUUM INTO comes out in delete mode.
  await client.execute('PRAGMA journal_mode=WAL')
  const writer = createClient({ url, timeout: 0, concurrency: 1, intMode: 'number' })
  beginOrRefuse(writer)
  const drizzled = (c: Client): Reader => drizzle(c, { schema, casing: 'snake_case' })
  return {
    file, client, reader: drizzled(client), writer: drizzled(writer), queue: { last: Promise.resolve() },
    close: () => {
      writer.close()
      client.close()
    },
  }
}

/**
 * A BEGIN IMMEDIATE that is refused leaves its statement open until it is collected, and until then no COMMIT succeeds on that
 * connection ("SQL statements in progress": measured with two processes). The driver finishes only what it runs as a script,
 * so a script takes the write lock, from inside a transaction that cannot be refused.
 */
function beginOrRefuse(writer: Client): void {
  const begin = writer.transaction.bind(writer)
  writer.transaction = async () => {
    const transaction = await begin('deferred')
    try {
      await transaction.executeMultiple('COMMIT; BEGIN IMMEDIATE')
      return transaction
    } catch (error) {
      transaction.close()
      throw error
    }
  }
}
