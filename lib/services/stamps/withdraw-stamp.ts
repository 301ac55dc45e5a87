// A mentor takes their own stamp back, with a reason that stays readable.
import 'server-only'
import { eq } from 'drizzle-orm'
import { stamp } from '@/db/schema'
import { write } from '@/db/transaction'
import type { AppContext } from '@/lib/context'
import { AppError, refuse } from '@/lib/errors'
import { can } from '@/lib/policy/can'
import { whyNot } from '@/lib/policy/why-not'
import { judgePost } from '@/lib/services/posts/judge-post'
import { requirePost } from '@/lib/services/posts/require-post'
import { afterWrite } from '@/lib/services/posts/after-write'

/** Returns the post and entry it stood on. 409 when it was withdrawn before. */
export async function withdrawStamp(context: AppContext, stampId: number, input: { reason: string }): Promise<{ postId: number; entryId: number }> {
  const { actor, now } = context
  if (!actor) throw refuse.signIn()
  const done = await write(context.database, { actorId: actor.id, at: now }, async (tx, record) => {
    const [row] = await tx.select().from(stamp).where(eq(stamp.id, stampId))
    if (!row) throw refuse.notFound('This stamp')
    // A mentor may take a stamp back wherever they can still see it, also under a hidden question of their own.
    const { entryId } = await requirePost(tx, actor, row.postId)
    if (!can(actor, 'stamp.withdraw', { mentorId: row.mentorId })) throw refuse.forbidden(whyNot['stamp.withdraw'])
    if (row.withdrawnAt !== null) throw new AppError('conflict', 'This stamp was withdrawn before.', { current: { id: stampId } })
    await tx.update(stamp).set({ withdrawnAt: now, withdrawnReason: input.reason }).where(eq(stamp.id, stampId))
    await judgePost(tx, row.postId)
    record('stamp.withdraw', `stamp:${stampId}`, `post:${row.postId}`)
    return { postId: row.postId, entryId }
  })
  await afterWrite(context)
  return done
}
