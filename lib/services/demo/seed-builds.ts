// Aeroplanes of demo members with their sections, logs and holds.
import 'server-only'
import type { Database, Transaction } from '@/db/client'
import { insertBuild, insertHold, insertLogLine, saveSectionState } from '@/db/mutations/builds'
import { getKit } from '@/db/queries/kits'
import { write } from '@/db/transaction'
import { demoContent, type DemoBuild } from '@/lib/content/demo-content'
import { isoDate } from '@/lib/format/date'
import { newHoldCode } from '@/lib/services/builds/add-hold'
import type { SeedPeople } from './seed-entry'

type At = (daysAgo: number) => number

/** After people and places. Throws, naming the build, when the scenario names a member, kit or section that is not there. */
export async function seedBuilds(database: Database, people: SeedPeople, at: At): Promise<void> {
  for (const build of demoContent.builds) {
    const memberId = people.get(build.member)?.id
    if (memberId === undefined) throw new Error(`Demo build ${build.name}: nobody is called ${build.member}`)
    await write(database, { actorId: memberId, at: at(build.day) }, async (tx, record) => {
      record('demo.seed', `build:${await seedBuild(tx, memberId, build, at)}`)
    })
  }
}

async function seedBuild(tx: Transaction, memberId: number, build: DemoBuild, at: At): Promise<number> {
  const kit = await getKit(tx, build.kit)
  const sectionId = (code: string): number => {
    const found = kit?.sections.find((s) => s.code === code)
    if (!found) throw new Error(`Demo build ${build.name}: there is no section ${code}`)
    return found.id
  }
  if (!kit) throw new Error(`Demo build ${build.name}: there is no kit ${build.kit}`)
  const buildId = await insertBuild(tx, { memberId, kitId: kit.id, name: build.name, serial: build.serial, createdAt: at(build.day) })
  for (const s of build.sections) await saveSectionState(tx, { buildId, sectionId: sectionId(s.code), state: s.state, updatedAt: at(s.day) })
  for (const [i, { section, day, ...line }] of build.log.entries()) {
    await insertLogLine(tx, { buildId, sectionId: sectionId(section), key: `demo-line-${i}`, day: isoDate(at(day)), ...line, createdAt: at(day) })
  }
  for (const [i, { section, day, until, untilSection, released, ...words }] of build.holds.entries()) {
    await insertHold(tx, {
      buildId, sectionId: sectionId(section), key: `demo-hold-${i}`, ...words, until: until ?? `section ${untilSection}`, untilSectionId: untilSection === undefined ? null : sectionId(untilSection),
      code: newHoldCode(), createdAt: at(day), ...(released ? { releasedAt: at(released.day), releaseNote: released.note } : {}),
    })
  }
  return buildId
}
