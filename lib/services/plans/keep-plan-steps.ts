// A steward enters where a section's plan steps stand and which task is done there. The plans' own text has no place here.
import 'server-only'
import { and, eq } from 'drizzle-orm'
import { listTasksBySlug } from '@/db/queries/kits'
import { listPlanSteps } from '@/db/queries/plans'
import { planStep } from '@/db/schema'
import { write } from '@/db/transaction'
import type { Transaction } from '@/db/client'
import type { AppContext } from '@/lib/context'
import { planStepSchema, type LinesMode, type PlanStepInput } from '@/lib/schemas/plans'
import type { KeptLines } from './kept-lines'
import { readLines, type ReadLines } from './read-lines'
import { requireKeeper, requireSection } from './require-section'

export const planStepColumns = ['page', 'step', 'revision', 'task'] as const

/**
 * Lines of page, step, revision and task in the plans' order. A step that is there already gets the new revision and task and keeps its
 * place; with 'replace' the good lines are all that is left. 403 for anybody but a steward; nothing changes when no line is good.
 */
export async function keepPlanSteps(context: AppContext, place: { kit: string; section: string }, { mode, lines }: { mode: LinesMode; lines: string }): Promise<KeptLines> {
  const { now } = context
  const actor = requireKeeper(context.actor)
  const read = readLines(lines, { columns: planStepColumns, schema: planStepSchema })
  return write(context.database, { actorId: actor.id, at: now }, async (tx, record) => {
    const section = await requireSection(tx, place)
    const steps = await withTasks(tx, read)
    if (steps.length > 0) {
      if (mode === 'replace') await tx.delete(planStep).where(eq(planStep.sectionId, section.id))
      await keep(tx, section.id, steps)
    }
    record(steps.length > 0 ? `plan-steps.${mode}` : 'nothing', `section:${section.id}`, `${steps.length} steps`)
    return { kept: steps.length, bad: read.bad }
  })
}

type Step = PlanStepInput & { taskId: number | null }

/** Lines whose task is known; the others join the bad ones, as do repeats. */
async function withTasks(tx: Transaction, read: ReadLines<PlanStepInput>): Promise<Step[]> {
  const tasks = new Map((await listTasksBySlug(tx, [...new Set(read.good.flatMap((l) => l.value.task ?? []))])).map((t) => [t.slug, t.id]))
  const seen = new Set<string>()
  const steps = read.good.flatMap(({ value, line, raw }): Step[] => {
    const key = JSON.stringify([value.page, value.step])
    const taskId = value.task === undefined ? null : tasks.get(value.task)
    if (taskId === undefined) read.bad.push({ line, raw, message: `task: There is no task ${value.task ?? ''}.` })
    else if (seen.has(key)) read.bad.push({ line, raw, message: `step: ${value.page} step ${value.step} stands in an earlier line.` })
    else {
      seen.add(key)
      return [{ ...value, taskId }]
    }
    return []
  })
  read.bad.sort((a, b) => a.line - b.line)
  return steps
}

async function keep(tx: Transaction, sectionId: number, steps: readonly Step[]): Promise<void> {
  let position = (await listPlanSteps(tx, sectionId)).length
  for (const { page, step, revision = '', taskId } of steps) {
    const known = await tx.update(planStep).set({ revision, taskId }).where(and(eq(planStep.sectionId, sectionId), eq(planStep.page, page), eq(planStep.step, step))).returning({ id: planStep.id })
    if (known.length === 0) await tx.insert(planStep).values({ sectionId, position: position++, page, step, revision, taskId })
  }
}
