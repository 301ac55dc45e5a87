// Where the work on a section stands: not begun, in work, waiting, done.
import 'server-only'
import { saveSectionState } from '@/db/mutations/builds'
import { listBuildSections } from '@/db/queries/builds'
import { write } from '@/db/transaction'
import type { AppContext } from '@/lib/context'
import type { SectionState } from '@/lib/schemas/builds'
import { requireBuildSection } from './require-build'

/** Setting it twice is once. A section can be done with holds open: they stay and go on saying so. */
export async function setSectionState({ database, actor, now }: AppContext, buildId: number, code: string, state: SectionState): Promise<void> {
  await write(database, { actorId: actor?.id ?? null, at: now }, async (tx, record) => {
    const { section } = await requireBuildSection(tx, actor, buildId, code)
    const before = (await listBuildSections(tx, [buildId])).find((s) => s.section.id === section.id)?.state ?? 'not-begun'
    if (before === state) return record('nothing', `build:${buildId}`)
    await saveSectionState(tx, { buildId, sectionId: section.id, state, updatedAt: now })
    record('build.section', `build:${buildId}`, `section:${section.id} ${state}`)
  })
}
