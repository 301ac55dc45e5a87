// Entries by filter, newest first, keyset-paged: whole entries for the API, hits for pages and feeds.
import 'server-only'
import { listEntryIdsAfter } from '@/db/queries/entries'
import { listAnswerIds, listCautionedPosts } from '@/db/queries/cautioned-post'
import type { AppContext } from '@/lib/context'
import { AppError } from '@/lib/errors'
import type { Entry } from '@/lib/schemas/post'
import type { EntriesQuery } from '@/lib/schemas/search'
import { presentAnswer, presentEntry } from '@/lib/services/posts/present-post'
import { remarkRenderings, withRenderings } from '@/lib/services/posts/load-entry'

/** A page of entries. A cursor that is none of ours is 422. */
export async function listEntries(context: AppContext, query: EntriesQuery): Promise<{ items: Entry[]; nextCursor: string | null }> {
  const rows = await listEntryIdsAfter(context.reader, { ...query, stamped: query.stamped === '1' }, { limit: query.limit + 1, after: query.cursor === undefined ? null : readCursor(query.cursor) })
  const page = rows.slice(0, query.limit)
  const last = page.at(-1)
  return { items: await loadEntries(context, page.map((r) => r.id)), nextCursor: rows.length > page.length && last ? Buffer.from(`${last.createdAt}.${last.id}`).toString('base64url') : null }
}

/** Visible entries by id, with their visible answers, in the order of `ids`. */
export async function loadEntries(context: AppContext, ids: readonly number[]): Promise<Entry[]> {
  const answers = await listAnswerIds(context.reader, ids)
  const posts = await withRenderings(context, await listCautionedPosts(context.reader, [...ids, ...answers.map((a) => a.id)]))
  const remarks = await remarkRenderings(context, posts)
  return ids.flatMap((id) => {
    const entry = posts.find((p) => p.id === id && p.state === 'visible')
    if (!entry) return []
    return [presentEntry(entry, posts.filter((p) => p.parentId === id && p.state === 'visible').map((a) => presentAnswer(a, entry, remarks)), remarks)]
  })
}

function readCursor(cursor: string): { createdAt: number; id: number } {
  const match = /^([0-9]{1,15})\.([0-9]{1,15})$/.exec(Buffer.from(cursor, 'base64url').toString('latin1'))
  if (!match) throw new AppError('invalid', 'This cursor is not one of ours.', { errors: [{ path: 'cursor', message: 'Not a cursor.' }] })
  return { createdAt: Number(match[1]), id: Number(match[2]) }
}
