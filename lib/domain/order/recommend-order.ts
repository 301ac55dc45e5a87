// The recommended order of a section's tasks: the plans' own steps as the base line, builders' advice as departures from it. Pure.
import { findDisagreements, type Disagreement } from './find-disagreements'
import type { Advice } from './weigh-advice'

/** Advice that the order follows although the plans' steps run the other way. */
export interface Departure { advice: Advice }

export interface RecommendedOrder {
  /** Each task once. */
  order: string[]
  departures: Departure[]
  disagreements: Disagreement[]
}

/**
 * Walks the base line; a task that builders want done first is taken forward to just before the one that needs it, and nothing else moves.
 * Valid for all advice whenever the advice has no ring; deterministic. A task that only advice names comes where it is needed, or at the end by name.
 * @param baseLine tasks in the order of the plans' steps; of a task that comes twice the first place counts
 */
export function recommendOrder(baseLine: readonly string[], advice: readonly Advice[]): RecommendedOrder {
  const { disagreements, followed } = findDisagreements(advice)
  const places = new Map([...new Set(baseLine)].map((task, place) => [task, place]))
  const others = [...new Set(advice.flatMap(({ before, after }) => [before, after]))].filter((task) => !places.has(task)).sort()
  const placeOf = (task: string) => places.get(task) ?? places.size + others.indexOf(task)
  const firsts = new Map<string, string[]>()
  for (const { before, after } of followed) firsts.set(after, [...(firsts.get(after) ?? []), before])
  for (const list of firsts.values()) list.sort((a, b) => placeOf(a) - placeOf(b))
  return {
    order: walk([...places.keys(), ...others], firsts),
    departures: followed.filter(({ before, after }) => {
      const [earlier, later] = [places.get(before), places.get(after)]
      return earlier !== undefined && later !== undefined && earlier > later
    }).map((one) => ({ advice: one })),
    disagreements,
  }
}

/** Depth first without recursion, because a chain may be as long as the list. */
function walk(tasks: readonly string[], firsts: ReadonlyMap<string, readonly string[]>): string[] {
  const done = new Set<string>()
  for (const task of tasks) {
    const open = [task]
    while (open.length > 0) {
      const current = open[open.length - 1] ?? task
      const waitsFor = done.has(current) ? undefined : firsts.get(current)?.find((first) => !done.has(first))
      if (waitsFor !== undefined) open.push(waitsFor)
      else {
        done.add(current)
        open.pop()
      }
    }
  }
  return [...done]
}
