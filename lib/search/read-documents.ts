// Reads entries from the database as search documents, in pieces small enough that nobody on this thread has to wait.
import 'server-only'
import type { Database, Reader } from '@/db/client'
import { listAnswerIds, listCautionedPosts, type CautionedPost } from '@/db/queries/cautioned-post'
import { listOperations } from '@/db/queries/kits'
import { buildDocument, type SearchTitles } from './build-document'
import type { SearchDocument } from './messages'

export interface ReadPiece { put: SearchDocument[]; remove: number[]; last: boolean }

/** The driver is synchronous: one piece holds the event loop for about this long. */
const pieceMs = 6
const smallest = 4
const largest = 200

/** Titles of operations and tasks, for labels. */
export async function readTitles(reader: Reader): Promise<SearchTitles> {
  const operations = await listOperations(reader)
  return {
    operations: new Map(operations.map(({ slug, title }) => [slug, title])),
    tasks: new Map(operations.flatMap(({ tasks }) => tasks.map(({ slug, title }) => [slug, title] as const))),
    operationOfTask: new Map(operations.flatMap(({ title, tasks }) => tasks.map(({ slug }) => [slug, title] as const))),
  }
}

/** Reads documents in pieces whose size follows how long the last one took. One reader a walk. */
export class DocumentReader {
  private size = smallest

  constructor(private readonly database: Database, private readonly titles: SearchTitles) {}

  /** The documents of `ids` piece by piece, giving way to others between two; ids that must not be found come in `remove`. */
  async *read(ids: readonly number[]): AsyncGenerator<ReadPiece> {
    for (let start = 0; start < ids.length;) {
      await new Promise((resolve) => setImmediate(resolve))
      const piece = ids.slice(start, start + this.size)
      start += piece.length
      const begun = performance.now()
      const read = await this.readPiece(piece)
      this.adapt(piece.length, performance.now() - begun)
      yield { ...read, last: start >= ids.length }
    }
  }

  private async readPiece(ids: readonly number[]): Promise<Omit<ReadPiece, 'last'>> {
    const { reader } = this.database
    const answerIds = await listAnswerIds(reader, ids)
    const posts = new Map((await listCautionedPosts(reader, [...ids, ...answerIds.map(({ id }) => id)], 'plain')).map((post) => [post.id, post] as const))
    const answers = new Map<number, CautionedPost[]>(ids.map((id) => [id, []]))
    for (const { id, parentId } of answerIds) {
      const answer = posts.get(id)
      if (answer) answers.get(parentId ?? 0)?.push(answer)
    }
    const piece: Omit<ReadPiece, 'last'> = { put: [], remove: [] }
    for (const id of ids) {
      const entry = posts.get(id)
      const document = entry ? buildDocument(entry, answers.get(id) ?? [], this.titles) : null
      if (document) piece.put.push(document)
      else piece.remove.push(id)
    }
    return piece
  }

  private adapt(taken: number, ms: number): void {
    const fitting = Math.floor((taken * pieceMs) / Math.max(0.1, ms))
    // Grows at most by half at a time: one lucky piece says little.
    this.size = Math.max(smallest, Math.min(largest, fitting, Math.ceil(this.size * 1.5)))
  }
}
