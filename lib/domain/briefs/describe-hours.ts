// Hours that builders told, as the brief shows them: the middle half, and single points only while they are few but not so few that one is known by them. Pure.
import { quartiles, type Quartiles } from '../evidence/quartiles'

export interface HoursTold { builder: string; hours: number; at: number }
export interface HoursDescription extends Quartiles { builders: number; least: number; most: number; points: number[] | null }

/** Fewer would show who took how long. */
export const leastBuilders = 3
/** From here on a box says more than dots. */
export const mostPoints = 12

/** One value a builder, the most they told at once: lessons of one builder are parts of the same work. Null for fewer than three builders. */
export function describeHours(told: readonly HoursTold[]): HoursDescription | null {
  const byBuilder = new Map<string, number>()
  for (const { builder, hours } of told) if (Number.isFinite(hours) && hours > 0) byBuilder.set(builder, Math.max(hours, byBuilder.get(builder) ?? 0))
  const points = [...byBuilder.values()].sort((a, b) => a - b)
  const [middle, least, most] = [quartiles(points), points[0], points[points.length - 1]]
  if (points.length < leastBuilders || !middle || least === undefined || most === undefined) return null
  return { builders: points.length, ...middle, least, most, points: points.length < mostPoints ? points : null }
}
