// Plan steps of two demo sections, so that the order of tasks has a base line. A section that has steps already keeps its own.
import 'server-only'
import { and, eq } from 'drizzle-orm'
import type { Database, Transaction } from '@/db/client'
import { kit, planStep, section, task } from '@/db/schema'
import { write } from '@/db/transaction'
import { demoContent, type DemoPlanSteps } from '@/lib/content/demo-content'

export async function seedPlanSteps(database: Database, at: number): Promise<void> {
  await write(database, { actorId: null, at }, async (tx, record) => {
    for (const steps of demoContent.planSteps) record('plan-steps.seed', `section:${await seedSection(tx, steps)}`)
  })
}

async function seedSection(tx: Transaction, demo: DemoPlanSteps): Promise<number> {
  const [place] = await tx.select({ id: section.id }).from(section).innerJoin(kit, eq(kit.id, section.kitId)).where(and(eq(kit.slug, demo.kit), eq(section.code, demo.section)))
  if (!place) throw new Error(`The demo has no section ${demo.section}`)
  const known = await tx.select({ id: planStep.id }).from(planStep).where(eq(planStep.sectionId, place.id)).limit(1)
  if (known.length > 0) return place.id
  const tasks = new Map((await tx.select().from(task)).map((t) => [t.slug, t.id]))
  await tx.insert(planStep).values(demo.steps.map(([page, step, slug], position) => {
    const taskId = tasks.get(slug)
    if (taskId === undefined) throw new Error(`The demo has no task ${slug}`)
    return { sectionId: place.id, position, page, step, revision: demo.revision, taskId }
  }))
  return place.id
}
