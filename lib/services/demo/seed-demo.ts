// Fills an empty database with the demo scenario, through the same laws as everybody: posts, revisions, stamps, reports.
import 'server-only'
import { count, eq } from 'drizzle-orm'
import type { Database, Transaction } from '@/db/client'
import { member, mentorship, setting } from '@/db/schema'
import { write, writeQuietly } from '@/db/transaction'
import { hashPassword } from '@/lib/auth/password'
import { demoContent, demoPassword } from '@/lib/content/demo-content'
import type { Renderer } from '@/lib/render/renderer'
import { noteRulesVersion } from '@/lib/services/cautions/reapply-rules'
import { seedBuilds } from './seed-builds'
import { seedEntry, type SeedPeople } from './seed-entry'
import { seedLimits } from './seed-limits'
import { seedPlanSteps } from './seed-plan-steps'
import { seedPlans } from './seed-plans'
import { seedPlaces } from './seed-places'

const dayMs = 24 * 3600 * 1000
/** Everybody joined, and mentorship was granted, before the oldest post. */
const joinedDaysAgo = 900

/** Seeds when there is no member yet; returns the number of entries, 0 when there was something. */
export async function seedDemo(database: Database, renderer: Renderer, now: number): Promise<number> {
  const [members] = await database.reader.select({ n: count() }).from(member)
  if (!members || members.n > 0) {
    await refuseHalfSeeded(database)
    return 0
  }
  // A renderer that does not start must be known before anything is written.
  await renderer.render({ probe: 'probe' })
  await keepState(database, 'begun')
  await noteRulesVersion(database)
  // The seed day ends at the moment of seeding, so that nothing lies in the future.
  const at = (daysAgo: number) => Math.round(now - daysAgo * dayMs)
  const people = await seedPeople(database, at)
  await seedPlaces(database, at(joinedDaysAgo))
  await seedLimits(database, people, at)
  await seedPlanSteps(database, at(joinedDaysAgo))
  for (const entry of [...demoContent.entries].sort((a, b) => b.day - a.day)) await seedEntry(database, renderer, people, entry, at)
  await seedPlans(database, people, at, at(joinedDaysAgo))
  await seedBuilds(database, people, at)
  await keepState(database, 'complete')
  return demoContent.entries.length
}

const stateKey = 'demo'

const keepState = (database: Database, value: 'begun' | 'complete') => writeQuietly(database, (tx) =>
  tx.insert(setting).values({ key: stateKey, value }).onConflictDoUpdate({ target: setting.key, set: { value } }))

/** A seed that was interrupted leaves members without their posts: nobody should take that for the demo. */
async function refuseHalfSeeded(database: Database): Promise<void> {
  const [kept] = await database.reader.select().from(setting).where(eq(setting.key, stateKey))
  if (kept?.value === 'begun') throw new Error('The demo was seeded only in part. Remove the data folder and start again.')
}

async function seedPeople(database: Database, at: (daysAgo: number) => number): Promise<SeedPeople> {
  const passwordHash = await hashPassword(demoPassword)
  return write(database, { actorId: null, at: at(joinedDaysAgo) }, async (tx, record) => {
    const people: SeedPeople = new Map()
    for (const m of demoContent.members) {
      const [row] = await tx.insert(member).values({ email: m.email, name: m.name, bio: m.bio, role: m.role, passwordHash, createdAt: at(joinedDaysAgo) }).returning({ id: member.id })
      if (!row) throw new Error('The member was not inserted')
      people.set(m.key, { id: row.id, mark: m.mentor?.number ?? null })
      record('member.seed', `member:${row.id}`)
    }
    const steward = [...demoContent.members].find((m) => m.role === 'steward')
    const grantedBy = steward ? people.get(steward.key)?.id : undefined
    if (grantedBy === undefined) throw new Error('The demo has no steward')
    for (const m of demoContent.members) if (m.mentor) await grant(tx, people.get(m.key)?.id, m.mentor, grantedBy, at(joinedDaysAgo))
    return people
  })
}

async function grant(tx: Transaction, memberId: number | undefined, mentor: { number: string; fields: string; reason: string }, grantedBy: number, createdAt: number): Promise<void> {
  if (memberId !== undefined) await tx.insert(mentorship).values({ memberId, ...mentor, grantedBy, createdAt })
}
