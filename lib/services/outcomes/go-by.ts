// "I'm going by this": a mark before the act, so that a change of the advice can reach its builders.
import 'server-only'
import { and, eq } from 'drizzle-orm'
import { reliance } from '@/db/schema'
import { write } from '@/db/transaction'
import type { AppContext } from '@/lib/context'
import { revisionLetter } from '@/lib/domain/entries/revision-letter'
import { refuse } from '@/lib/errors'
import { can } from '@/lib/policy/can'
import { whyNot } from '@/lib/policy/why-not'
import { requirePost } from '@/lib/services/posts/require-post'

/** Sets (`on`) or takes off the mark; doing it twice is once. Returns the entry it belongs to. */
export async function goBy(context: AppContext, postId: number, on: boolean): Promise<{ entryId: number }> {
  const { actor, now } = context
  if (!actor) throw refuse.signIn()
  return write(context.database, { actorId: actor.id, at: now }, async (tx, record) => {
    const { found, entryId, subject } = await requirePost(tx, actor, postId)
    const mine = and(eq(reliance.postId, postId), eq(reliance.memberId, actor.id))
    const [before] = await tx.select().from(reliance).where(mine)
    if (!on) {
      if (before) await tx.delete(reliance).where(mine)
      record(before ? 'reliance.end' : 'nothing', `post:${postId}`)
      return { entryId }
    }
    if (!can(actor, 'post.go-by', subject)) throw refuse.forbidden(whyNot['post.go-by'])
    const mark = { revision: found.current.number, createdAt: now }
    if (before?.revision === mark.revision) {
      record('nothing', `post:${postId}`)
      return { entryId }
    }
    await tx.insert(reliance).values({ postId, memberId: actor.id, ...mark }).onConflictDoUpdate({ target: [reliance.postId, reliance.memberId], set: mark })
    record('reliance.begin', `post:${postId}`, revisionLetter(mark.revision))
    return { entryId }
  })
}
