// The visit sheet of a section as its visitor sees it: what was done, what is gone by and what is still held; never the serial or who helped.
import 'server-only'
import { listFindings } from '@/db/queries/visits'
import type { AppContext } from '@/lib/context'
import { can } from '@/lib/policy/can'
import type { BuildSection } from '@/lib/schemas/builds'
import { presentSection } from './get-build-section'
import { requireVisit } from './require-visit'

export interface VisitSheet { section: BuildSection; visitor: string; expiresAt: number; findings: { number: number; text: string; createdAt: number }[] }

/** 404 once the link has expired or was revoked. */
export async function getVisit(context: AppContext, token: string): Promise<VisitSheet> {
  const found = await requireVisit(context.reader, token, context.now)
  const [section, findings] = await Promise.all([presentSection(context, found), listFindings(context.reader, [found.visit.id])])
  return {
    // Where the group's posts are read behind a sign-in, a link to a build does not open them.
    section: { ...section, goingBy: can(context.actor, 'read', { publicReading: context.publicReading }) ? section.goingBy : [], build: { ...section.build, serial: '' }, log: section.log.map((l) => ({ ...l, helpers: '' })) },
    visitor: found.visit.visitor, expiresAt: found.visit.expiresAt, findings: findings.map(({ number, text, createdAt }) => ({ number, text, createdAt })),
  }
}
