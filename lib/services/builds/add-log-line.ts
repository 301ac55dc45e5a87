// A line of the log, written once however often it is sent; and its correction.
import 'server-only'
import { insertLogLine, saveSectionState, updateLogLine } from '@/db/mutations/builds'
import { getLogLine, listBuildSections } from '@/db/queries/builds'
import { write } from '@/db/transaction'
import type { AppContext } from '@/lib/context'
import { refuse } from '@/lib/errors'
import { isoDate } from '@/lib/format/date'
import type { ChangeLogLine, LogLine, NewLogLine } from '@/lib/schemas/builds'
import { presentLogLine } from './get-build-section'
import { requireBuild, requireBuildSection } from './require-build'

/** The furthest ahead that a builder's day is of the UTC day: UTC+14 (Line Islands). */
const furthestAheadMs = 14 * 3_600_000

function requirePastDay(day: string, now: number): void {
  if (day > isoDate(now + furthestAheadMs)) throw refuse.invalid('day', 'This day is still to come.')
}

/** The same key again gives the line that is there. Work on a section that was not begun sets it in work. */
export async function addLogLine({ database, actor, now }: AppContext, buildId: number, code: string, input: NewLogLine): Promise<LogLine> {
  requirePastDay(input.day, now)
  return write(database, { actorId: actor?.id ?? null, at: now }, async (tx, record) => {
    const { section } = await requireBuildSection(tx, actor, buildId, code)
    const before = await getLogLine(tx, buildId, { key: input.key })
    if (before) {
      record('nothing', `build:${buildId}`)
      return presentLogLine(before)
    }
    const id = await insertLogLine(tx, { buildId, sectionId: section.id, ...input, createdAt: now })
    const state = (await listBuildSections(tx, [buildId])).find((s) => s.section.id === section.id)?.state ?? 'not-begun'
    if (state === 'not-begun') await saveSectionState(tx, { buildId, sectionId: section.id, state: 'in-work', updatedAt: now })
    record('log.add', `build:${buildId}`, `line:${id}`)
    return { id, ...input }
  })
}

/** Writes a line anew; its section and key stay. 404 when the build has no such line. */
export async function changeLogLine({ database, actor, now }: AppContext, buildId: number, lineId: number, input: ChangeLogLine): Promise<LogLine> {
  requirePastDay(input.day, now)
  return write(database, { actorId: actor?.id ?? null, at: now }, async (tx, record) => {
    await requireBuild(tx, actor, buildId)
    const before = await getLogLine(tx, buildId, { id: lineId })
    if (!before) throw refuse.notFound('This line')
    await updateLogLine(tx, lineId, input)
    record('log.change', `build:${buildId}`, `line:${lineId}`)
    return { id: lineId, key: before.key, ...input }
  })
}

/** 404 for everybody but the owner, and for a line that the build does not have. */
export async function readLogLine({ reader, actor }: AppContext, buildId: number, lineId: number): Promise<LogLine> {
  await requireBuild(reader, actor, buildId)
  const found = await getLogLine(reader, buildId, { id: lineId })
  if (!found) throw refuse.notFound('This line')
  return presentLogLine(found)
}
