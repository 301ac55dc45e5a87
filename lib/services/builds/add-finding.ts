// A numbered line on a visit sheet, written by its visitor without signing in. Each becomes a hold of the build.
import 'server-only'
import { insertHold } from '@/db/mutations/builds'
import { insertFinding } from '@/db/mutations/visits'
import { getHold } from '@/db/queries/builds'
import { nextFindingNumber } from '@/db/queries/visits'
import { write } from '@/db/transaction'
import type { AppContext } from '@/lib/context'
import { refuse } from '@/lib/errors'
import { newHoldCode } from './add-hold'
import { requireVisit } from './require-visit'

/** More lines than an inspection has; against somebody who passes the link on. */
const mostFindings = 100

/** The same key again changes nothing. 404 once the link has expired or was revoked. */
export async function addFinding({ database, actor, now }: AppContext, token: string, { key, text }: { key: string; text: string }): Promise<void> {
  await write(database, { actorId: actor?.id ?? null, at: now }, async (tx, record) => {
    const { visit } = await requireVisit(tx, token, now)
    // The visit's id keeps visitors' keys apart from each other's and from the owner's.
    const holdKey = `finding-${visit.id}-${key}`
    if (await getHold(tx, { buildId: visit.buildId, key: holdKey })) return record('nothing', `build:${visit.buildId}`)
    const number = await nextFindingNumber(tx, visit.id)
    if (number > mostFindings) throw refuse.invalid('text', `At most ${mostFindings} lines on one sheet.`)
    const findingId = await insertFinding(tx, { visitId: visit.id, number, text, createdAt: now })
    const until = `finding ${number} of a visit is put right`
    const id = await insertHold(tx, { buildId: visit.buildId, sectionId: visit.sectionId, key: holdKey, kind: 'hold', what: text, until, code: newHoldCode(), findingId, createdAt: now })
    record('finding.add', `build:${visit.buildId}`, `hold:${id}`)
  })
}
