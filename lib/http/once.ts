// Runs something once for a member, route and key, within 24 hours: repeats get the first answer.
import 'server-only'
import { createHash } from 'node:crypto'
import { and, eq, lt } from 'drizzle-orm'
import { idempotency } from '@/db/schema'
import { writeQuietly } from '@/db/transaction'
import type { AppContext } from '@/lib/context'
import { AppError } from '@/lib/errors'

const keepMs = 24 * 3600 * 1000
/** A reservation without an answer this old belongs to a process that died. */
const abandonedMs = 30_000
const underWay = 0

export interface Answered { status: number; body: string }
interface Key {
  memberId: number
  route: string
  key: string
  bodyText: string
  /** What to say when the key was used with another body. */
  otherBody?: string
}

/**
 * The first answer under this key: run now, or replayed. 422 for the same key with another body; 409 while the first is under way.
 * An answer of 5xx or a thrown error is not kept, so that it can be tried again.
 */
export async function once(context: AppContext, { memberId, route, key, bodyText, otherBody = 'This Idempotency-Key was used with another body.' }: Key, run: () => Promise<Answered>): Promise<Answered> {
  const bodyHash = createHash('sha256').update(bodyText).digest('hex')
  const mine = and(eq(idempotency.memberId, memberId), eq(idempotency.route, route), eq(idempotency.key, key))
  const kept = await writeQuietly(context.database, async (tx) => {
    await tx.delete(idempotency).where(lt(idempotency.createdAt, context.now - keepMs))
    const [row] = await tx.select().from(idempotency).where(mine)
    if (row && !(row.status === underWay && row.createdAt < context.now - abandonedMs)) return row
    await tx.delete(idempotency).where(mine)
    await tx.insert(idempotency).values({ memberId, route, key, bodyHash, status: underWay, body: '', createdAt: context.now })
    return null
  })
  if (kept) {
    if (kept.bodyHash !== bodyHash) throw new AppError('invalid', otherBody)
    if (kept.status === underWay) throw new AppError('conflict', 'The same request is under way. Try again in a moment.', { retryAfterSeconds: 1 })
    return { status: kept.status, body: kept.body }
  }
  const forget = () => writeQuietly(context.database, (tx) => tx.delete(idempotency).where(mine))
  try {
    const answer = await run()
    if (answer.status >= 500 || answer.status === 429) await forget()
    else await writeQuietly(context.database, (tx) => tx.update(idempotency).set({ status: answer.status, body: answer.body }).where(mine))
    return answer
  } catch (error) {
    await forget()
    throw error
  }
}
