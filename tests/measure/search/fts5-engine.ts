// SQLite FTS5 as a peer: bm25, Porter stems, a file of its own, through the client the product uses.
import { existsSync, statSync } from 'node:fs'
import path from 'node:path'
import { pathToFileURL } from 'node:url'
import { createClient, type Client } from '@libsql/client'
import { hitsWanted, type EngineTask, type Start } from './engine'
import { idOf } from './fill-database'
import { generateTexts } from './generate-texts'
import type { AskedQuestion } from './questions'

const rowsABatch = 500

/** Builds the file unless an earlier process has, and opens it. `join` is between the words of a question. */
export async function startFts5({ size, seed, directory }: EngineTask, join: 'OR' | 'AND'): Promise<Start> {
  const file = path.join(directory, 'fts5.db')
  const begun = performance.now()
  const isNew = !existsSync(file)
  const built = isNew ? await build(file, size, seed) : null
  built?.close()
  const opened = performance.now()
  const client = createClient({ url: pathToFileURL(file).href, intMode: 'number' })
  await find(client, { text: 'rivet' }, join)
  const startSeconds = (performance.now() - opened) / 1000
  return {
    buildSeconds: isNew ? (opened - begun) / 1000 : 0, startSeconds,
    engine: { ask: (question) => find(client, question, join), fileMB: statSync(file).size / 1_048_576, close: async () => client.close() },
  }
}

async function build(file: string, size: number, seed: number): Promise<Client> {
  const client = createClient({ url: pathToFileURL(file).href })
  await client.execute('PRAGMA journal_mode=WAL')
  await client.execute("CREATE VIRTUAL TABLE entry USING fts5(title, labels, body, kit UNINDEXED, tokenize = 'porter unicode61')")
  let batch: { sql: string; args: (string | number)[] }[] = []
  for (const t of generateTexts(size, seed)) {
    batch.push({ sql: 'INSERT INTO entry (rowid, title, labels, body, kit) VALUES (?, ?, ?, ?, ?)', args: [idOf(t.number), t.title, [t.kit, t.section, t.operation, ...t.hardware].join(' '), `${t.body}\n${t.answer ?? ''}`, t.kit] })
    if (batch.length < rowsABatch && t.number < size - 1) continue
    await client.batch(batch, 'write')
    batch = []
  }
  return client
}

async function find(client: Client, { text, kit, isPrefix }: AskedQuestion, join: string): Promise<number[]> {
  const words = text.split(' ').map((word) => `"${word.replaceAll('"', '')}"`)
  const match = `${words.join(` ${join} `)}${isPrefix ? '*' : ''}`
  const { rows } = await client.execute({
    sql: `SELECT rowid FROM entry WHERE entry MATCH ?${kit === undefined ? '' : ' AND kit = ?'} ORDER BY rank LIMIT ${hitsWanted}`, args: kit === undefined ? [match] : [match, kit],
  })
  return rows.map((row) => Number(row['rowid']))
}
