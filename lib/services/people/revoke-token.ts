// A member takes back one of their personal tokens.
import 'server-only'
import { and, eq, isNull } from 'drizzle-orm'
import { token } from '@/db/schema'
import { write } from '@/db/transaction'
import type { AppContext } from '@/lib/context'
import { refuse } from '@/lib/errors'

/** From the next request on it opens nothing. Revoking twice is once; 404 for somebody else's. */
export async function revokeToken(context: AppContext, tokenId: number): Promise<void> {
  const { actor, now } = context
  if (!actor) throw refuse.signIn()
  await write(context.database, { actorId: actor.id, at: now }, async (tx, record) => {
    const [row] = await tx.select({ revokedAt: token.revokedAt }).from(token).where(and(eq(token.id, tokenId), eq(token.memberId, actor.id)))
    if (!row) throw refuse.notFound('This token')
    if (row.revokedAt !== null) return record('nothing', `token:${tokenId}`)
    await tx.update(token).set({ revokedAt: now }).where(and(eq(token.id, tokenId), isNull(token.revokedAt)))
    record('token.revoke', `token:${tokenId}`)
  })
}
