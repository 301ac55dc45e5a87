// What the code on a hold's tag opens.
import 'server-only'
import { getBuild, getHold } from '@/db/queries/builds'
import type { AppContext } from '@/lib/context'
import { refuse } from '@/lib/errors'
import { can } from '@/lib/policy/can'
import type { Hold } from '@/lib/schemas/builds'
import { presentHold } from './present-hold'

export type OpenedHold = { hold: Hold; build: { id: number; name: string; kit: string } } | 'somebody’s'

/** The hold for its owner; for everybody else only that it is somebody's. 404 for a code that is on no tag. */
export async function openHold({ reader, actor }: AppContext, code: string): Promise<OpenedHold> {
  const row = /^[\w-]{22}$/.test(code) ? await getHold(reader, { code }) : null
  if (!row) throw refuse.notFound('This hold')
  const found = await getBuild(reader, row.hold.buildId)
  if (!found || !can(actor, 'build.open', { ownerId: found.build.memberId })) return 'somebody’s'
  return { hold: presentHold(row), build: { id: found.build.id, name: found.build.name, kit: found.kit.name } }
}
