// A member has read what waited for them.
import 'server-only'
import { eq } from 'drizzle-orm'
import { getNotice } from '@/db/queries/notices'
import { notice } from '@/db/schema'
import { write } from '@/db/transaction'
import type { AppContext } from '@/lib/context'
import { refuse } from '@/lib/errors'
import { can } from '@/lib/policy/can'
import type { Notice } from '@/lib/schemas/notices'
import { presentNotices } from './present-notices'

/** Returns the closed notice; closing it twice is once. 404 for somebody else's, since what waits for them is theirs alone. */
export async function closeNotice(context: AppContext, id: number): Promise<Notice> {
  const { actor, now } = context
  if (!actor) throw refuse.signIn()
  const row = await write(context.database, { actorId: actor.id, at: now }, async (tx, record) => {
    const found = await getNotice(tx, id)
    if (!found || !can(actor, 'notice.close', { memberId: found.notice.memberId })) throw refuse.notFound('This notice')
    if (found.notice.closedAt === null) await tx.update(notice).set({ closedAt: now }).where(eq(notice.id, id))
    record(found.notice.closedAt === null ? 'notice.close' : 'nothing', `notice:${id}`)
    return { ...found, notice: { ...found.notice, closedAt: found.notice.closedAt ?? now } }
  })
  const [shown] = await presentNotices(context, [row])
  if (!shown) throw refuse.notFound('This notice')
  return shown
}
