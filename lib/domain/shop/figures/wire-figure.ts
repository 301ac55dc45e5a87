// A bundle through a hole in structure: its clearance to the cut edge against the least that needs no grommet.
import type { Figure, Point } from './figure'
import { fit, Sketch, type LengthSystem } from './sketch'

export interface WireFigureInput {
  /** Inches. */
  bundle: number
  clearance: number
  leastClearance: number
}

/** `width`: pixels it will be shown at. The bundle hangs towards the right edge of the hole. */
export function wireFigure({ bundle, clearance, leastClearance }: WireFigureInput, width = 640, system: LengthSystem = 'inch'): Figure {
  const hole = bundle + 2 * Math.max(clearance, leastClearance)
  const scale = Math.min(fit(width * 0.6, hole), fit(280, hole))
  const [r, small] = [(hole / 2) * scale, (bundle / 2) * scale]
  const centre: Point = [24 + r, 68 + r]
  const sketch = new Sketch({ title: 'Wire through a hole', system, width, height: centre[1] + r + 110, scale })
  const wire: Point = [centre[0] + r - clearance * scale - small, centre[1]]
  sketch.rect('sheet', 0, 48, Math.min(width, centre[0] + r + 40), centre[1] + r + 24)
  sketch.circle('open', centre, r)
  sketch.circle('limit', centre, Math.max(r - leastClearance * scale, 0))
  sketch.circle('wire', wire, small)
  sketch.line('centre', [centre[0] - r - 8, centre[1]], [centre[0] + r + 8, centre[1]])
  sketch.across(sketch.size(clearance), [wire[0] + small, centre[1]], [centre[0] + r, centre[1]], { field: 'clearance', lane: centre[1] + r + 42, isEntry: true, isUnder: true })
  sketch.across(sketch.size(bundle), [wire[0] - small, centre[1]], [wire[0] + small, centre[1]], { field: 'bundle', lane: 24, isEntry: true })
  sketch.balloon([centre[0] + r, centre[1]], 'Cut edge', clearance < leastClearance ? 'too near: a grommet is needed' : 'enough clearance')
  sketch.balloon([centre[0], centre[1] - Math.max(r - leastClearance * scale, 0)], 'Least clearance', `${sketch.length(leastClearance)}, AC 43.13-1B para 11-115`)
  sketch.balloon(wire, 'Bundle', 'clamped so that it stays there')
  return sketch.finish()
}
