// Where order advice contradicts itself: two tasks both ways round, or several in a ring. Named, never broken silently. Pure.
import { alg, Graph } from '@dagrejs/graphlib'
import { byTasks, type Advice } from './weigh-advice'

export interface Disagreement {
  kind: 'both-ways' | 'ring'
  /** Both ways: the two tasks by name. Ring: tasks each of which is to be done before the next, and the last before the first. */
  tasks: string[]
  /** All advice that takes part, with its builders and posts. */
  advice: Advice[]
  /** Both ways with more builders on one side: that side, which the order then follows. Null: the order follows neither. */
  followed: Advice | null
}

/** The disagreements, and the advice that an order can follow: what remains has no ring. Deterministic. */
export function findDisagreements(advice: readonly Advice[]): { disagreements: Disagreement[]; followed: Advice[] } {
  const sorted = [...advice].sort(byTasks)
  const contested = sorted.flatMap((one) => {
    const other = sorted.find((o) => o.before === one.after && o.after === one.before)
    return other && one.before < one.after ? [bothWays(one, other)] : []
  })
  const dropped = new Set(contested.flatMap(({ advice: both, followed }) => both.filter((a) => a !== followed)))
  const left = sorted.filter((a) => !dropped.has(a))
  const rings = findRings(left)
  const inRing = new Set(rings.flatMap((ring) => ring.advice))
  return { disagreements: [...contested, ...rings], followed: left.filter((a) => !inRing.has(a)) }
}

function bothWays(one: Advice, other: Advice): Disagreement {
  const followed = one.builders === other.builders ? null : one.builders > other.builders ? one : other
  return { kind: 'both-ways', tasks: [one.before, one.after], advice: [one, other], followed }
}

/** One disagreement a strongly connected part: its shortest ring by name, and everything said within the part. */
function findRings(advice: readonly Advice[]): Disagreement[] {
  const graph = new Graph({ directed: true })
  for (const { before, after } of advice) graph.setEdge(before, after)
  return alg.tarjan(graph).filter((part) => part.length > 1).map((part): Disagreement => {
    const within = advice.filter((a) => part.includes(a.before) && part.includes(a.after))
    return { kind: 'ring', tasks: shortestRing([...part].sort(), within), advice: within, followed: null }
  }).sort((a, b) => (a.tasks.join('\n') < b.tasks.join('\n') ? -1 : 1))
}

/** Breadth first from each task back to itself; of equals the one whose first task comes first by name. */
function shortestRing(tasks: readonly string[], within: readonly Advice[]): string[] {
  let best: string[] = []
  for (const start of tasks) {
    const ring = ringThrough(start, within)
    if (ring.length > 0 && (best.length === 0 || ring.length < best.length)) best = ring
  }
  return best
}

function ringThrough(start: string, within: readonly Advice[]): string[] {
  const cameFrom = new Map<string, string>()
  const waiting = [start]
  for (const task of waiting) {
    for (const { after } of within.filter((a) => a.before === task)) {
      if (after === start) return pathBack(task, start, cameFrom)
      if (cameFrom.has(after)) continue
      cameFrom.set(after, task)
      waiting.push(after)
    }
  }
  return []
}

function pathBack(end: string, start: string, cameFrom: ReadonlyMap<string, string>): string[] {
  const path = [end]
  for (let task = end; task !== start;) {
    task = cameFrom.get(task) ?? start
    path.unshift(task)
  }
  return path
}
