// What a page says before it shows anything. The only caller of the framework's 401 and 403.
import 'server-only'
import { forbidden, unauthorized } from 'next/navigation'
import { contextFor, type AppContext } from '@/lib/context'
import type { Member } from '@/lib/policy/actor'
import { can, type Act, type Acts } from '@/lib/policy/can'
import { currentActor } from './current-user'

/** Context of a page that visitors may open when public reading is on. */
export async function pageContext(): Promise<AppContext> {
  const context = await contextFor(await currentActor())
  if (!can(context.actor, 'read', { publicReading: context.publicReading })) unauthorized()
  return context
}

/** Context of a page that needs a sign-in. */
export async function memberContext(): Promise<AppContext & { actor: Member }> {
  const actor = await currentActor()
  if (!actor) unauthorized()
  return { ...(await contextFor(actor)), actor }
}

/** Context of a page that needs a right: 401 for a visitor, 403 for others. */
export async function requireCan<A extends Act>(act: A, ...subject: Acts[A] extends undefined ? [] : [Acts[A]]): Promise<AppContext & { actor: Member }> {
  const context = await memberContext()
  if (!can(context.actor, act, ...subject)) forbidden()
  return context
}
