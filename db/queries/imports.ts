// What an import compares itself with: entries by ref, and the answers that came without an account. No text.
import 'server-only'
import { and, asc, eq, isNull } from 'drizzle-orm'
import type { ReaderOrTransaction } from '../client'
import { post, revision } from '../schema'

const current = { id: post.id, kind: post.kind, ref: post.ref, authorId: post.authorId, number: revision.number, contentHash: revision.contentHash }
const isCurrent = and(eq(revision.postId, post.id), eq(revision.number, post.currentRevision))

/** The entry with this ref, or null. */
export async function getEntryByRef(reader: ReaderOrTransaction, ref: string) {
  const [row] = await reader.select(current).from(post).innerJoin(revision, isCurrent).where(and(eq(post.ref, ref), isNull(post.parentId)))
  return row ?? null
}

/** Answers of a question, oldest first. */
export async function listAnswersForImport(reader: ReaderOrTransaction, questionId: number) {
  return reader.select(current).from(post).innerJoin(revision, isCurrent).where(eq(post.parentId, questionId)).orderBy(asc(post.id))
}

/** Hashes of the current texts of an entry and its answers. */
export async function getImportedHashes(reader: ReaderOrTransaction, ref: string): Promise<string[]> {
  const entry = await getEntryByRef(reader, ref)
  // Two walks along an index each; in one statement with `or` SQLite reads every post.
  return entry ? [entry.contentHash, ...(await listAnswersForImport(reader, entry.id)).map((a) => a.contentHash)] : []
}
