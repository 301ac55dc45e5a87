// Two rivets in a row near the edge of a sheet: edge distance from centre and rim, pitch, and the least of each.
import type { Figure } from './figure'
import { fit, Sketch, type LengthSystem } from './sketch'

export interface EdgeFigureInput {
  /** Inches. */
  hole: number
  headWidth: number
  edge: number
  pitch: number
  leastEdge: number
  leastPitch: number
}

/** `width`: pixels it will be shown at. */
export function edgeFigure({ hole, headWidth, edge, pitch, leastEdge, leastPitch }: EdgeFigureInput, width = 640, system: LengthSystem = 'inch'): Figure {
  const deep = Math.max(edge, leastEdge) + headWidth
  const scale = Math.min(fit(width * 0.5, Math.max(pitch, leastPitch) + headWidth), fit(220, deep))
  const [top, left] = [64, width * 0.1]
  const bottom = top + deep * scale
  const y = bottom - edge * scale
  const sketch = new Sketch({ title: 'Edge distance and pitch', system, width, height: bottom + Math.max(40, (headWidth / 2 - edge) * scale + 16), scale })
  const [first, second] = [left + (headWidth / 2) * scale + 12, left + (headWidth / 2 + pitch) * scale + 12]
  sketch.rect('sheet', 0, top, width, bottom)
  sketch.line('outline', [0, bottom], [width, bottom])
  sketch.line('limit', [0, bottom - leastEdge * scale], [width, bottom - leastEdge * scale])
  sketch.line('limit', [first + leastPitch * scale, y - 18], [first + leastPitch * scale, y + 18])
  for (const x of [first, second]) {
    sketch.circle('metal', [x, y], (headWidth / 2) * scale)
    sketch.circle('hidden', [x, y], (hole / 2) * scale)
  }
  sketch.line('centre', [0, y], [width, y])
  sketch.caption('sheet edge', [4, bottom + 14])
  sketch.across(sketch.size(pitch), [first, y], [second, y], { field: 'pitch', lane: 26, isEntry: true })
  const lane = second + (headWidth / 2) * scale + 16
  sketch.down(sketch.size(edge), [second, y], [second, bottom], { field: 'edge', lane, isEntry: true })
  sketch.balloon([second, Math.min(y + (hole / 2) * scale, bottom)], 'Rim', `${sketch.length(edge - hole / 2)} from the rim of the hole`)
  sketch.balloon([first - (headWidth / 2) * scale, bottom - leastEdge * scale], 'Least edge', `${sketch.length(leastEdge)} from the centre of the hole`)
  sketch.balloon([first + leastPitch * scale, y + 18], 'Least pitch', `${sketch.length(leastPitch)} from centre to centre`)
  return sketch.finish()
}
