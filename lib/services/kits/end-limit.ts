// A steward ends a kit maker's limit, with a reason. It stays on record as what once held.
import 'server-only'
import { eq } from 'drizzle-orm'
import { getLimit } from '@/db/queries/kit-limits'
import { kitLimit } from '@/db/schema'
import { write } from '@/db/transaction'
import type { AppContext } from '@/lib/context'
import { AppError, refuse } from '@/lib/errors'
import { can } from '@/lib/policy/can'
import { whyNot } from '@/lib/policy/why-not'

/** 403 for all but stewards, 404 when the kit has no such limit, 409 when it was ended before. */
export async function endLimit(context: AppContext, slug: string, id: number, input: { reason: string }): Promise<void> {
  const { actor, now } = context
  if (!actor) throw refuse.signIn()
  if (!can(actor, 'kit.set-limits')) throw refuse.forbidden(whyNot['kit.set-limits'])
  await write(context.database, { actorId: actor.id, at: now }, async (tx, record) => {
    const found = await getLimit(tx, id)
    if (!found || found.kit !== slug) throw refuse.notFound('This limit')
    if (found.limit.endedAt !== null) throw new AppError('conflict', 'This limit was ended before.', { current: { id } })
    await tx.update(kitLimit).set({ endedAt: now, endReason: input.reason }).where(eq(kitLimit.id, id))
    record('limit.end', `limit:${id}`, `kit:${found.limit.kitId}`)
  })
}
