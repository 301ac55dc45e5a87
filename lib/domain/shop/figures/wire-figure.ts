// A bundle through a hole in structure: its clearance to the cut edge against the least that needs no grommet.
import { decimalInches } from '../shop-result'
import { fractionOfInch } from '../exact-fraction'
import type { Figure, Point } from './figure'
import { fit, Sketch } from './sketch'

export interface WireFigureInput {
  /** Inches. */
  bundle: number
  clearance: number
  leastClearance: number
}

const words = (inches: number): string => fractionOfInch(inches) ?? decimalInches(inches)

/** `width`: pixels it will be shown at. The bundle hangs towards the right edge of the hole. */
export function wireFigure({ bundle, clearance, leastClearance }: WireFigureInput, width = 640): Figure {
  const hole = bundle + 2 * Math.max(clearance, leastClearance)
  const scale = Math.min(fit(width * 0.6, hole), fit(280, hole))
  const [r, small] = [(hole / 2) * scale, (bundle / 2) * scale]
  const centre: Point = [24 + r, 56 + r]
  const sketch = new Sketch('Wire through a hole', width, centre[1] + r + 70, scale)
  const wire: Point = [centre[0] + r - clearance * scale - small, centre[1]]
  sketch.rect('sheet', 0, 32, Math.min(width, centre[0] + r + 40), centre[1] + r + 24)
  sketch.circle('open', centre, r)
  sketch.circle('limit', centre, Math.max(r - leastClearance * scale, 0))
  sketch.circle('wire', wire, small)
  sketch.line('centre', [centre[0] - r - 8, centre[1]], [centre[0] + r + 8, centre[1]])
  sketch.across(words(clearance), [wire[0] + small, centre[1]], [centre[0] + r, centre[1]], { field: 'clearance', lane: centre[1] + r + 40 })
  sketch.across(words(bundle), [wire[0] - small, centre[1]], [wire[0] + small, centre[1]], { field: 'bundle', lane: 18 })
  sketch.balloon([centre[0] + r, centre[1]], 'Cut edge', clearance < leastClearance ? 'too near: a grommet is needed' : 'enough clearance')
  sketch.balloon([centre[0], centre[1] - Math.max(r - leastClearance * scale, 0)], 'Least clearance', `${words(leastClearance)} in, AC 43.13-1B para 11-115`)
  sketch.balloon(wire, 'Bundle', 'clamped so that it stays there')
  return sketch.finish()
}
