// Puts a section's posts at its tasks: where the plans step that they name is, else at the first of their tasks that has a place.
import 'server-only'
import { groupAlike } from '@/lib/domain/briefs/group-alike'
import { unionCautions } from '@/lib/domain/cautions/group-cautions'
import type { MakerLimit } from '@/lib/domain/shop/maker-limits'
import type { BriefTask } from '@/lib/schemas/brief'
import { builderOf } from './gather-order'
import { cautionsOf, plainOf, presentItem, presentLink, presentSizes, type BriefPost } from './present-items'

export interface TaskStep { page: string; step: string; revision: string; task: string }
export interface PostsByUse { knowHow: BriefPost[]; lessons: BriefPost[]; open: BriefPost[] }

/** Where a post whose entry names no task stands. */
export const noTask = ''

/** The task at which a post stands; '' when its entry names none. */
export function taskOf({ found, question }: BriefPost, order: readonly string[], steps: readonly TaskStep[]): string {
  const { plans, tasks } = (question ?? found).current
  const atStep = plans.flatMap((ref) => steps.filter((s) => s.page === ref.page && s.step === ref.step))[0]
  return atStep?.task ?? tasks.find((task) => order.includes(task)) ?? tasks[0] ?? noTask
}

export function presentTask(task: { slug: string; title: string }, steps: readonly TaskStep[], { knowHow, lessons, open }: PostsByUse, limits: readonly MakerLimit[]): BriefTask {
  const advice = [...knowHow, ...lessons]
  const own = steps.filter((s) => s.task === task.slug)
  return {
    ...task, isInPlans: own.length > 0, steps: own.map(({ page, step, revision }) => ({ page, step, ...(revision === '' ? {} : { revision }) })),
    cautions: unionCautions([...advice, ...open].map(cautionsOf)), sizes: presentSizes(advice, limits), knowHow: knowHow.map(presentItem), lessons: groupLessons(lessons), open: open.map(presentItem),
  }
}

/** Lessons that say the same as one, most builders first; then as they came, newest first. */
function groupLessons(lessons: readonly BriefPost[]): BriefTask['lessons'] {
  const groups = groupAlike(lessons.map((post) => ({
    post, id: post.found.id, title: post.found.current.title, text: plainOf(post.found), advice: post.found.current.orderAdvice.map(({ before, after }) => `${before} ${after}`), builder: builderOf({ id: post.found.author.id, name: post.found.author.name, postId: post.found.id }),
  })))
  return groups.sort((a, b) => b.builders - a.builders).map(({ lead, others, builders }) => ({
    lead: presentItem(lead.post), builders, others: others.map((o) => presentLink(o.post)), cautions: unionCautions([lead, ...others].map((o) => cautionsOf(o.post))),
  }))
}
