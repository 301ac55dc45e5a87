// The box that the shapes of a figure reach into, without labels and balloons: for a figure shown small.
import type { Box, Shape } from './figure'

/** How many numbers a path command takes; only the commands that figures use. */
const ARGUMENTS: Readonly<Record<string, number>> = { M: 2, L: 2, Q: 4, A: 7, Z: 0 }

function endpoints(d: string): [number, number][] {
  return [...d.matchAll(/([MLQAZ])([^MLQAZ]*)/g)].flatMap(([, command = '', rest = '']) => {
    const numbers = (rest.match(/-?[\d.]+/g) ?? []).map(Number)
    const count = ARGUMENTS[command] ?? 0
    const [x, y] = count === 0 ? [] : numbers.slice(count - 2, count)
    return x === undefined || y === undefined ? [] : [[x, y] as [number, number]]
  })
}

function pointsOf(shape: Shape): (readonly [number, number])[] {
  if (shape.kind === 'circle') return [[shape.cx - shape.r, shape.cy - shape.r], [shape.cx + shape.r, shape.cy + shape.r]]
  return shape.kind === 'line' ? [shape.from, shape.to] : endpoints(shape.d)
}

/** All zero for no shapes. Curves count by their ends, which is close enough for a margin of a few pixels. */
export function shapeBounds(shapes: readonly Shape[]): Box {
  const points = shapes.flatMap(pointsOf)
  if (points.length === 0) return { left: 0, top: 0, right: 0, bottom: 0 }
  const [xs, ys] = [points.map(([x]) => x), points.map(([, y]) => y)]
  return { left: Math.min(...xs), top: Math.min(...ys), right: Math.max(...xs), bottom: Math.max(...ys) }
}
