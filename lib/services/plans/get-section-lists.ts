// What a steward entered of one section: plan steps with the bulletins on them, hardware list, closing items.
import 'server-only'
import { listBulletins, listClosingItems, listHardwareItems, listPlanSteps } from '@/db/queries/plans'
import type { AppContext } from '@/lib/context'
import { isSamePlace } from '@/lib/domain/stamps/plans-change'
import { requirePlace, type Place } from './require-place'

export interface PlanStepLine {
  id: number; page: string; step: string; revision: string
  /** Slug and title of what is done there; null while the steward has named nothing. */
  task: { slug: string; title: string } | null
  /** Bulletins that change it, the newest first, with the revision of the page that carries the change. */
  changes: { bulletin: string; revision: string }[]
}

/** 404 when there is no such section. */
export async function getPlanSteps(context: AppContext, kit: string, code: string): Promise<Place & { steps: PlanStepLine[] }> {
  const { place, found } = await requirePlace(context, kit, code)
  const [steps, bulletins] = await Promise.all([listPlanSteps(context.reader, found.section.id), listBulletins(context.reader, found.kit.id)])
  return {
    ...place,
    steps: steps.map(({ task, taskTitle, ...step }) => ({
      ...step, task: task === null ? null : { slug: task, title: taskTitle ?? task },
      changes: bulletins.flatMap((b) => b.steps.filter((s) => isSamePlace(s, step)).slice(0, 1).map((s) => ({ bulletin: b.number, revision: s.revision }))),
    })),
  }
}

/** 404 when there is no such section. */
export async function getSectionLists(context: AppContext, kit: string, code: string) {
  const { place, found } = await requirePlace(context, kit, code)
  const [hardware, closing] = await Promise.all([listHardwareItems(context.reader, found.section.id), listClosingItems(context.reader, found.section.id)])
  return {
    ...place,
    hardware: hardware.map(({ id, designation, length, left, right, place: where }) => ({ id, designation, length, left, right, place: where })),
    closing: closing.map(({ id, text, origin, reference }) => ({ id, text, origin, reference })),
  }
}
