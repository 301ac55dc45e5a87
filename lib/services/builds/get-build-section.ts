// One section of a member's own build: state, log, holds, what was left open for it, what they go by, closing list.
import 'server-only'
import { listBuildSections, listClosing, listHolds, listLog } from '@/db/queries/builds'
import type { AppContext } from '@/lib/context'
import type { BuildSection, ClosingLine, LogLine } from '@/lib/schemas/builds'
import { listGoneBy } from './list-gone-by'
import { isOpen, presentHold } from './present-hold'
import { requireBuildSection } from './require-build'

type Placed = Awaited<ReturnType<typeof requireBuildSection>>

/** 404 for everybody but its owner, and for a section that the kit does not have. */
export async function getBuildSection(context: AppContext, buildId: number, code: string): Promise<BuildSection> {
  return presentSection(context, await requireBuildSection(context.reader, context.actor, buildId, code))
}

/** The caller knows that the section may be shown: to its owner, or on a visit sheet. */
export async function presentSection({ reader }: Pick<AppContext, 'reader'>, { build, kit, section }: Placed): Promise<BuildSection> {
  const [states, log, holds, goingBy, closing] = await Promise.all([
    listBuildSections(reader, [build.id]), listLog(reader, build.id, section.id), listHolds(reader, [build.id]),
    listGoneBy({ reader }, build.memberId, { sectionId: section.id }), listClosing(reader, build.id, section.id),
  ])
  const shown = holds.map((row) => ({ row, hold: presentHold(row) }))
  return {
    build: { id: build.id, name: build.name, serial: build.serial, kit: { slug: kit.slug, name: kit.name, maker: kit.maker } }, code: section.code, title: section.title,
    state: states.find((s) => s.section.id === section.id)?.state ?? 'not-begun', minutes: log.reduce((all, l) => all + l.minutes, 0), log: log.map(presentLogLine),
    // What is still open comes first; what was released stays to be read.
    holds: shown.filter((h) => h.row.hold.sectionId === section.id).map((h) => h.hold).sort((a, b) => Number(isOpen(b)) - Number(isOpen(a)) || b.id - a.id),
    openUntilHere: shown.filter((h) => h.row.hold.untilSectionId === section.id && h.row.hold.sectionId !== section.id).map((h) => h.hold).filter(isOpen),
    goingBy, closing: closing.map(presentClosingLine),
  }
}

type LogRow = Awaited<ReturnType<typeof listLog>>[number]
export const presentLogLine = ({ id, key, day, minutes, page, steps, helpers, line }: LogRow): LogLine => ({ id, key, day, minutes, page, steps, helpers, line })

function presentClosingLine({ item, answer }: Awaited<ReturnType<typeof listClosing>>[number]): ClosingLine {
  return { id: item.id, text: item.text, origin: item.origin, reference: item.reference, answer: answer ? { isDone: answer.isDone, note: answer.note, at: new Date(answer.at).toISOString() } : null }
}
