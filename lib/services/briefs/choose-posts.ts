// Which posts a brief shows: those behind its order first, then stamped know-how, open questions and lessons; at most one piece of 200, so that a brief costs the same whatever was written.
import 'server-only'
import type { listBriefPosts } from '@/db/queries/order'

type Row = Awaited<ReturnType<typeof listBriefPosts>>[number]

export interface ChosenPosts { knowHow: number[]; lessons: number[]; open: number[]; /** To be read: all of them, their questions, and posts behind the order. */ ids: number[]; leftOut: number }

const mostPosts = 200
/** Of posts behind advice more than these would crowd out the rest. */
const mostBehind = 60

/** @param rows newest first @param behind ids of posts behind departures and disagreements, which may stand in other sections */
export function choosePosts(rows: readonly Row[], behind: readonly number[]): ChosenPosts {
  const chosen: ChosenPosts = { knowHow: [], lessons: [], open: [], ids: [], leftOut: 0 }
  const ids = new Set(behind.slice(0, mostBehind))
  const take = (list: number[], of: readonly Row[]) => {
    for (const row of of) {
      const needed = [row.id, ...(row.parentId === null ? [] : [row.parentId])].filter((id) => !ids.has(id))
      if (ids.size + needed.length > mostPosts) chosen.leftOut += 1
      else {
        needed.forEach((id) => ids.add(id))
        list.push(row.id)
      }
    }
  }
  take(chosen.knowHow, rows.filter((row) => row.kind !== 'question' && isKnowHow(row)))
  take(chosen.open, rows.filter((row) => row.kind === 'question' && row.answers === 0))
  take(chosen.lessons, rows.filter((row) => row.kind === 'lesson' && !isKnowHow(row)))
  return { ...chosen, ids: [...ids] }
}

/** Two stamps or one of two: the page shows which. */
const isKnowHow = ({ stampState }: Row) => stampState === 'stamped' || stampState === 'one-of-two'
