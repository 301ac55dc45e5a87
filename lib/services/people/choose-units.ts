// A member says which units stand first for them, on every device.
import 'server-only'
import { eq } from 'drizzle-orm'
import { member } from '@/db/schema'
import { write } from '@/db/transaction'
import type { AppContext } from '@/lib/context'
import { refuse } from '@/lib/errors'
import type { Units } from '@/lib/schemas/people'

/** 401 for a visitor. */
export async function chooseUnits({ database, actor, now }: AppContext, { units }: Units): Promise<void> {
  if (!actor) throw refuse.signIn()
  await write(database, { actorId: actor.id, at: now }, async (tx, record) => {
    await tx.update(member).set({ units: units === 'written' ? null : units }).where(eq(member.id, actor.id))
    record('member.choose-units', `member:${actor.id}`)
  })
}
