// The line and arrow heads of a dimension as SVG paths: inside the span, or from outside pointing in where it is too narrow.
import type { Dimension, Point } from '@/lib/domain/shop/figures/figure'

const LONG = 12
const HALF = 4
const TAIL = 16

/** `line` is stroked, `heads` are filled. Dimensions run straight across or straight down. */
export function arrowPaths({ from, to, arrows }: Pick<Dimension, 'from' | 'to' | 'arrows'>): { line: string; heads: string } {
  const length = Math.hypot(to[0] - from[0], to[1] - from[1])
  const along: Point = length === 0 ? [1, 0] : [(to[0] - from[0]) / length, (to[1] - from[1]) / length]
  const isInside = arrows === 'inside'
  const at = ([x, y]: Point, far: number): Point => [x + along[0] * far, y + along[1] * far]
  const line = isInside ? stroke(at(from, LONG - 1), at(to, 1 - LONG)) : `${stroke(at(from, -LONG - TAIL), at(from, 1 - LONG))} ${stroke(at(to, LONG - 1), at(to, LONG + TAIL))} ${stroke(from, to)}`
  const direction = isInside ? 1 : -1
  return { line, heads: `${head(from, along, direction)} ${head(to, along, isInside ? -1 : 1)}` }
}

const stroke = (from: Point, to: Point): string => `M${place(from)} L${place(to)}`
const place = ([x, y]: Point): string => `${round(x)} ${round(y)}`
const round = (value: number): number => Math.round(value * 100) / 100

/** A head with its tip at `tip`, its body `direction` times along the line. */
function head(tip: Point, [ax, ay]: Point, direction: 1 | -1): string {
  const base: Point = [tip[0] + ax * LONG * direction, tip[1] + ay * LONG * direction]
  return `M${place(tip)} L${place([base[0] - ay * HALF, base[1] + ax * HALF])} L${place([base[0] + ay * HALF, base[1] - ax * HALF])} Z`
}
