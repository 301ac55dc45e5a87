// A tube in a 90-degree bend: outside diameter, bend radius to the centre line, and how far it may flatten.
import type { Figure, Point } from './figure'
import { fit, Sketch, type LengthSystem } from './sketch'

export interface TubeFigureInput {
  /** Inches. */
  outside: number
  radius: number
  wall?: number
  flattened: number
}

/** `width`: pixels it will be shown at. */
export function tubeFigure({ outside, radius, wall, flattened }: TubeFigureInput, width = 640, system: LengthSystem = 'inch'): Figure {
  const tail = outside * 0.5
  const scale = Math.min(fit(width * 0.5, radius + outside + tail), fit(280, radius + outside + tail))
  const [inner, outer] = [Math.max(radius - outside / 2, 0) * scale, (radius + outside / 2) * scale]
  const centre: Point = [20 + tail * scale, 40 + tail * scale]
  const [x, y] = centre
  const end = tail * scale
  const sketch = new Sketch({ title: 'Tube bend', system, width, height: y + outer + 80, scale })
  sketch.curve('metal', `M${x - end} ${y + outer} L${x} ${y + outer} A${outer} ${outer} 0 0 0 ${x + outer} ${y} L${x + outer} ${y - end} L${x + inner} ${y - end} L${x + inner} ${y} A${inner} ${inner} 0 0 1 ${x} ${y + inner} L${x - end} ${y + inner} Z`)
  sketch.line('centre', centre, [x + radius * scale * Math.SQRT1_2, y + radius * scale * Math.SQRT1_2])
  sketch.line('centre', [x - 6, y], [x + outer + 6, y])
  sketch.across(sketch.size(radius), centre, [x + radius * scale, y], { field: 'bend-radius', lane: 18 })
  sketch.across(sketch.size(outside), [x + inner, y - end], [x + outer, y - end], { field: 'outside', lane: y + outer + 26 })
  const middle: Point = [x + radius * scale * Math.SQRT1_2, y + radius * scale * Math.SQRT1_2]
  sketch.balloon(middle, 'Flattening', `not under ${sketch.length(flattened)} across: 75 % of the diameter`)
  sketch.balloon([x + outer, y], 'Tube', wall === undefined ? sketch.length(outside) : `${sketch.length(outside)}, wall ${sketch.length(wall)}`)
  sketch.balloon(centre, 'Centre of the bend', `radius ${sketch.length(radius)} to the centre line of the tube`)
  return sketch.finish()
}
