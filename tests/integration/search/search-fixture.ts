// A migrated database file, the bundled search thread and rows written straight into tables, for the tests of this folder.
import { execFile } from 'node:child_process'
import { mkdtemp, rm } from 'node:fs/promises'
import { tmpdir } from 'node:os'
import path from 'node:path'
import { pathToFileURL } from 'node:url'
import { promisify } from 'node:util'
import { eq } from 'drizzle-orm'
import { openDatabase, type Database, type Transaction } from '@/db/client'
import { migrateDatabase } from '@/db/migrate'
import { kit, post, postSection, rendering, revision, section } from '@/db/schema'
import { writeQuietly } from '@/db/transaction'

export interface Folder { path: string; remove(): Promise<void> }

export async function openFolder(): Promise<Folder> {
  const folder = await mkdtemp(path.join(tmpdir(), 'pilothole-search-'))
  return { path: folder, remove: () => rm(folder, { recursive: true, force: true }) }
}

/** Bundles the search thread as a build does; gives its file. */
export async function bundleThread(folder: string): Promise<string> {
  const script = pathToFileURL(path.resolve('scripts/build-workers.mjs')).href
  const { buildWorkers } = await import(/* @vite-ignore */ script) as { buildWorkers(outDirectory: string): Promise<string[]> }
  const file = (await buildWorkers(folder)).find((each) => each.endsWith('search.mjs'))
  if (!file) throw new Error('scripts/build-workers.mjs made no search.mjs')
  return file
}

/** A fresh database with one kit and one section. */
export async function openFilled(file: string): Promise<Database> {
  const database = await openDatabase(file)
  await migrateDatabase(database)
  await writeQuietly(database, async (tx) => {
    await tx.insert(kit).values({ id: 1, slug: 'whimbrel-2', name: 'Whimbrel 2', maker: 'Saltmarsh Aircraft' })
    await tx.insert(section).values({ id: 1, kitId: 1, code: 'W-3', title: 'Wing ribs to spar', position: 1, jasc: '5712' })
  })
  return database
}

const now = Date.UTC(2026, 0, 1)

function revisionOf(postId: number, number: number, text: { title?: string; body: string }) {
  return { postId, number, kitId: 1, sections: ['W-3'], tasks: [], operations: [], hardware: [], plans: [], orderAdvice: [], contentHash: 'x', createdAt: now, title: '', ...text }
}

/** Writes a lesson, or an answer under `parentId`; gives its id. */
export function addPost(database: Database, text: { title?: string; body: string }, parentId?: number, kind: 'question' | 'lesson' = 'lesson'): Promise<number> {
  return writeQuietly(database, (tx) => insertPost(tx, text, parentId, kind))
}

async function insertPost(tx: Transaction, text: { title?: string; body: string }, parentId: number | undefined, kind: 'question' | 'lesson'): Promise<number> {
  const [row] = await tx.insert(post).values({ kind: parentId === undefined ? kind : 'answer', parentId: parentId ?? null, currentRevision: 1, createdAt: now, updatedAt: now }).returning({ id: post.id })
  if (!row) throw new Error('no post was written')
  await tx.insert(revision).values(revisionOf(row.id, 1, text))
  if (parentId === undefined) await tx.insert(postSection).values({ postId: row.id, sectionId: 1, position: 0 })
  return row.id
}

/** Writes revision `number` of a post and makes it the current one. */
export const editPost = (database: Database, id: number, number: number, text: { title?: string; body: string }) =>
  writeQuietly(database, async (tx) => {
    await tx.insert(revision).values(revisionOf(id, number, text))
    await tx.update(post).set({ currentRevision: number }).where(isPost(id))
  })

export const hidePost = (database: Database, id: number) =>
  writeQuietly(database, (tx) => tx.update(post).set({ state: 'hidden' }).where(isPost(id)))

/** Sets only what search reads of a stamp: the state kept with the post. */
export const stampPost = (database: Database, id: number) =>
  writeQuietly(database, (tx) => tx.update(post).set({ stampState: 'stamped' }).where(isPost(id)))

export const keepRendering = (database: Database, id: number, plain: string) =>
  writeQuietly(database, (tx) => tx.insert(rendering).values({ key: `post:${id}:1`, renderer: 1, html: {}, plain }))

/** Writes a lesson from a process of its own, as a second server on the same file would. */
export async function addLessonFromAnotherProcess(file: string, title: string): Promise<void> {
  const script = `
    import { createClient } from '@libsql/client'
    const client = createClient({ url: ${JSON.stringify(pathToFileURL(file).href)}, timeout: 2000 })
    await client.batch([
      { sql: "insert into post (kind, current_revision, created_at, updated_at) values ('lesson', 1, 0, 0)", args: [] },
      { sql: "insert into revision (post_id, number, title, kit_id, sections, tasks, operations, hardware, plans, order_advice, body, content_hash, created_at) values ((select max(id) from post), 1, ?, 1, '[]', '[]', '[]', '[]', '[]', '[]', '', 'x', 0)", args: [${JSON.stringify(title)}] },
    ], 'write')
    client.close()`
  await promisify(execFile)(process.execPath, ['--input-type=module', '--eval', script], { cwd: process.cwd() })
}

/** Waits until `holds` is true, looking again and again; fails after `withinMs`. */
export async function eventually(holds: () => Promise<boolean>, withinMs: number): Promise<void> {
  const until = performance.now() + withinMs
  while (!(await holds())) {
    if (performance.now() > until) throw new Error(`did not come true within ${withinMs} ms`)
    await new Promise((resolve) => setTimeout(resolve, 10))
  }
}

const isPost = (id: number) => eq(post.id, id)
