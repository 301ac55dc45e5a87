// What a stamp judges, as one hash: kept with the revision also when its text is redacted.
import 'server-only'
import { createHash } from 'node:crypto'
import type { revision } from '@/db/schema'

type Judged = Pick<typeof revision.$inferInsert, 'title' | 'kitId' | 'sections' | 'tasks' | 'operations' | 'hardware' | 'plans' | 'orderAdvice' | 'parts' | 'body' | 'makerReplyScope'>

/** SHA-256 over all that was judged, in a fixed order. Equal content has an equal hash. */
export function contentHash(r: Judged): string {
  const judged = [r.title ?? '', r.kitId ?? null, r.sections, r.tasks, r.operations, r.hardware, r.plans, r.orderAdvice, r.parts ?? null, r.body, r.makerReplyScope ?? null]
  return createHash('sha256').update(JSON.stringify(judged)).digest('hex')
}
