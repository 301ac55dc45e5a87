// Whoever has a visit's link: what it opens, while it does.
import 'server-only'
import type { ReaderOrTransaction } from '@/db/client'
import { getVisitByHash } from '@/db/queries/visits'
import { tokenHash } from '@/lib/auth/tokens'
import { refuse } from '@/lib/errors'

/** 404 for a token that is not known, has expired or was revoked: the three look the same. */
export async function requireVisit(reader: ReaderOrTransaction, token: string, now: number) {
  const found = /^[\w-]{22}$/.test(token) ? await getVisitByHash(reader, tokenHash(token)) : null
  if (!found || found.visit.revokedAt !== null || found.visit.expiresAt <= now || found.build.endedAt !== null) throw refuse.notFound('This sheet')
  return found
}
