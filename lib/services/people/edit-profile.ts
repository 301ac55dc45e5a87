// A member changes their name and what they say about themselves.
import 'server-only'
import { eq } from 'drizzle-orm'
import { member } from '@/db/schema'
import { write } from '@/db/transaction'
import type { AppContext } from '@/lib/context'
import { refuse } from '@/lib/errors'
import type { Profile } from '@/lib/schemas/people'

/** 401 for a visitor. */
export async function editProfile(context: AppContext, input: Profile): Promise<void> {
  const { actor, now } = context
  if (!actor) throw refuse.signIn()
  await write(context.database, { actorId: actor.id, at: now }, async (tx, record) => {
    await tx.update(member).set({ name: input.name, bio: input.bio }).where(eq(member.id, actor.id))
    record('member.edit', `member:${actor.id}`)
  })
}
