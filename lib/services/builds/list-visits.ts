// The links that a section was shown by, for its owner.
import 'server-only'
import { listFindings, listVisits as listRows } from '@/db/queries/visits'
import type { AppContext } from '@/lib/context'
import { requireBuildSection } from './require-build'

export interface VisitLink { id: number; visitor: string; expiresAt: number; state: 'open' | 'expired' | 'revoked'; findings: number }

/** Newest first. 404 for everybody but the owner. */
export async function listVisits({ reader, actor, now }: AppContext, buildId: number, code: string): Promise<VisitLink[]> {
  const { section } = await requireBuildSection(reader, actor, buildId, code)
  const rows = await listRows(reader, buildId, section.id)
  const findings = await listFindings(reader, rows.map((r) => r.id))
  return rows.map((r) => ({
    id: r.id, visitor: r.visitor, expiresAt: r.expiresAt, findings: findings.filter((f) => f.visitId === r.id).length,
    state: r.revokedAt !== null ? 'revoked' : r.expiresAt <= now ? 'expired' : 'open',
  }))
}
