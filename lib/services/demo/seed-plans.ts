// What the demo's steward has kept of the plans: steps, hardware and closing lists, and a bulletin with all its effects.
import 'server-only'
import type { Database, Transaction } from '@/db/client'
import { getSection, listTasksBySlug } from '@/db/queries/kits'
import { closingItem, hardwareItem, planStep } from '@/db/schema'
import { write } from '@/db/transaction'
import { demoContent } from '@/lib/content/demo-content'
import { applyBulletin, insertBulletin } from '@/lib/services/plans/enter-bulletin'
import type { SeedPeople } from './seed-entry'

/** After the entries, so that a bulletin finds the stamps from before it. */
export async function seedPlans(database: Database, people: SeedPeople, at: (daysAgo: number) => number, keptAt: number): Promise<void> {
  const { steps, hardware, closing, bulletins } = demoContent.plans
  await write(database, { actorId: null, at: keptAt }, async (tx, record) => {
    for (const list of steps) await seedSteps(tx, await sectionId(tx, list), list.steps)
    for (const list of hardware) {
      const id = await sectionId(tx, list)
      await tx.insert(hardwareItem).values(list.items.map(([designation, length, left, right, place], position) => ({ sectionId: id, position, designation, length, left, right, place })))
    }
    for (const list of closing) {
      const id = await sectionId(tx, list)
      await tx.insert(closingItem).values(list.items.map(([text, origin, reference], position) => ({ sectionId: id, position, text, origin, reference, createdAt: keptAt })))
    }
    record('plans.seed', 'demo')
  })
  for (const { kit, by, day, ...input } of bulletins) {
    const steward = people.get(by)
    if (!steward) throw new Error(`Nothing is known of ${by}`)
    await write(database, { actorId: steward.id, at: at(day) }, async (tx, record) => {
      const entered = await insertBulletin(tx, kit, input, { enteredBy: steward.id, createdAt: at(day) })
      const { posts } = await applyBulletin(tx, entered, at(day))
      if (posts === 0) throw new Error(`Bulletin ${input.number} touches nothing`)
      record('bulletin.enter', `bulletin:${entered.id}`)
    })
  }
}

async function sectionId(tx: Transaction, { kit, section }: { kit: string; section: string }): Promise<number> {
  const found = await getSection(tx, kit, section)
  if (!found) throw new Error(`The demo has no section ${section}`)
  return found.section.id
}

async function seedSteps(tx: Transaction, id: number, steps: readonly (readonly [string, string, string, string])[]): Promise<void> {
  const tasks = new Map((await listTasksBySlug(tx, steps.map(([, , , task]) => task))).map((t) => [t.slug, t.id]))
  await tx.insert(planStep).values(steps.map(([page, step, revision, slug], position) => {
    const taskId = tasks.get(slug)
    if (taskId === undefined) throw new Error(`There is no task ${slug}`)
    return { sectionId: id, position, page, step, revision, taskId }
  }))
}
