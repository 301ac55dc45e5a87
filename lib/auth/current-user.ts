// Who is signed in on this request. The cookie only names a member: role, mentorship and suspension are read from the database.
import 'server-only'
import { cache } from 'react'
import { cookies } from 'next/headers'
import { getServerSession } from 'next-auth'
import { getActiveMember } from '@/db/queries/people'
import type { Actor } from '@/lib/policy/actor'
import { runtime } from '@/lib/runtime'
import { authOptions } from './options'
import { sessionCookieName } from './session-cookie'

/** The signed-in member's row and mark, or null for a visitor, a suspended member, or a session older than the last password change. */
export const currentMember = cache(async (): Promise<Awaited<ReturnType<typeof getActiveMember>>> => {
  // next-auth sets up a whole sign-in handler before it looks; most readers have no session at all.
  if (!(await cookies()).has(sessionCookieName())) return null
  const session = await getServerSession(authOptions())
  if (!session || !Number.isSafeInteger(session.user.id)) return null
  const { database } = await runtime()
  const found = await getActiveMember(database.reader, session.user.id)
  return found && found.member.sessionEpoch === session.user.epoch ? found : null
})

/** The actor of this request, or null for those who have no row above. */
export const currentActor = cache(async (): Promise<Actor> => {
  const found = await currentMember()
  return found && { id: found.member.id, name: found.member.name, role: found.member.role, mark: found.mark }
})
