// A section shown to a mentor or an inspector by a link that expires and can be revoked. Only the hash of its token is kept.
import 'server-only'
import { randomBytes } from 'node:crypto'
import { insertVisit } from '@/db/mutations/visits'
import { write } from '@/db/transaction'
import { tokenHash } from '@/lib/auth/tokens'
import type { AppContext } from '@/lib/context'
import { requireBuildSection } from './require-build'

const dayMs = 24 * 3_600_000

/** Returns the token, 128 bits: the only time it can be read. It opens the sheet for `days` days. */
export async function makeVisit({ database, actor, now }: AppContext, buildId: number, code: string, { visitor, days }: { visitor: string; days: number }): Promise<string> {
  const token = randomBytes(16).toString('base64url')
  await write(database, { actorId: actor?.id ?? null, at: now }, async (tx, record) => {
    const { section } = await requireBuildSection(tx, actor, buildId, code)
    const id = await insertVisit(tx, { buildId, sectionId: section.id, visitor, tokenHash: tokenHash(token), expiresAt: now + days * dayMs, createdAt: now })
    record('visit.make', `build:${buildId}`, `visit:${id}`)
  })
  return token
}
