// Builds with their sections counted by state, hours and open holds: a fixed number of queries for any number of builds.
import 'server-only'
import type { ReaderOrTransaction } from '@/db/client'
import { listBuildSections, listHolds, listMinutes } from '@/db/queries/builds'
import { paths } from '@/lib/paths'
import type { Build, BuildSummary } from '@/lib/schemas/builds'
import { isOpen, presentHold } from './present-hold'
import type { OwnBuild } from './require-build'

type Summary = BuildSummary & Pick<Build, 'sections' | 'holds' | 'leftOpen'>

export async function summariseBuilds(reader: ReaderOrTransaction, builds: readonly OwnBuild[]): Promise<Summary[]> {
  const ids = builds.map((b) => b.build.id)
  const [sections, minutes, holds] = await Promise.all([listBuildSections(reader, ids), listMinutes(reader, ids), listHolds(reader, ids)])
  return builds.map(({ build, kit }) => {
    const open = holds.filter((h) => h.hold.buildId === build.id).map(presentHold).filter(isOpen)
    const rows = sections.filter((s) => s.buildId === build.id).map(({ section, state }) => ({
      code: section.code, title: section.title, state: state ?? ('not-begun' as const), url: paths.buildSection(build.id, section.code),
      minutes: minutes.find((m) => m.buildId === build.id && m.sectionId === section.id)?.minutes ?? 0,
      openHolds: open.filter((h) => h.kind === 'hold' && h.section.code === section.code).length,
    }))
    const states = { 'not-begun': 0, 'in-work': 0, waiting: 0, done: 0 }
    for (const row of rows) states[row.state]++
    return {
      id: build.id, name: build.name, serial: build.serial, kit: { slug: kit.slug, name: kit.name }, createdAt: new Date(build.createdAt).toISOString(), url: paths.build(build.id), states,
      minutes: rows.reduce((all, row) => all + row.minutes, 0), openHolds: open.filter((h) => h.kind === 'hold').length,
      sections: rows, holds: open.filter((h) => h.kind === 'hold'), leftOpen: open.filter((h) => h.kind === 'left-open'),
    }
  })
}
