// A bolt through a stack with washers and nut: grip, length, stack, threads showing. Head and nut are by eye unless the nut was measured.
import type { Figure } from './figure'
import { fit, Sketch, type LengthSystem } from './sketch'

export interface BoltFigureInput {
  /** Inches. */
  diameter: number
  grip: number
  length: number
  thickness: number
  washers: number
  washer: number
  nut?: number
}

const WASHERS_SHOWN = 8

/** `width`: pixels it will be shown at. The bolt lies, head at the left. */
export function boltFigure({ diameter, grip, length, thickness, washers, washer, nut }: BoltFigureInput, width = 640, system: LengthSystem = 'inch'): Figure {
  const nutHeight = nut ?? diameter
  const long = Math.max(length, thickness + washers * washer + nutHeight) + diameter * 0.5
  const scale = Math.min(fit(width * 0.8, long), fit(160, diameter * 4))
  const [half, y, left] = [(diameter / 2) * scale, 70 + diameter * 2 * scale, 12 + diameter * 0.5 * scale]
  const at = (inches: number): number => left + inches * scale
  const sketch = new Sketch({ title: 'Bolt, grip and length', system, width, height: y + diameter * 2 * scale + 90, scale, byEye: nut === undefined ? 'head and nut' : 'the head' })
  const stack = thickness + washers * washer
  sketch.rect('cut', at(0), y - half * 4, at(thickness), y - half)
  sketch.rect('cut', at(0), y + half, at(thickness), y + half * 4)
  for (let index = 0; index < Math.min(washers, WASHERS_SHOWN); index += 1) {
    for (const side of [-1, 1] as const) sketch.rect('outline', at(thickness + index * washer), Math.min(y + side * half, y + side * half * 2.4), at(thickness + (index + 1) * washer), Math.max(y + side * half, y + side * half * 2.4))
  }
  sketch.rect('metal', at(-diameter * 0.5), y - half * 1.8, at(0), y + half * 1.8)
  sketch.rect('metal', at(0), y - half, at(grip), y + half)
  sketch.rect('outline', at(grip), y - half * 0.94, at(length), y + half * 0.94)
  for (const side of [-1, 1] as const) sketch.rect('metal', at(stack), Math.min(y + side * half, y + side * half * 1.8), at(stack + nutHeight), Math.max(y + side * half, y + side * half * 1.8))
  sketch.line('centre', [at(-diameter * 0.7), y], [at(length) + 10, y])
  sketch.across(sketch.size(grip), [at(0), y - half], [at(grip), y - half], { field: 'grip', lane: y - half * 4 - 18 })
  sketch.across(sketch.size(length), [at(0), y - half], [at(length), y - half], { field: 'length', lane: y - half * 4 - 42 })
  sketch.across(sketch.size(thickness), [at(0), y + half * 4], [at(thickness), y + half * 4], { field: 'thickness', lane: y + half * 4 + 22, isEntry: true, isUnder: true })
  sketch.balloon([at(grip), y + half], 'End of the grip', grip < stack ? 'thread stands in the stack' : 'the shank covers the stack')
  sketch.balloon([at(stack + nutHeight), y - half * 1.8], 'Threads past the nut', 'at least one (AC 43.13-1B para 7-37), two for the Navy')
  if (washers > 0) sketch.balloon([at(thickness + washer / 2), y + half * 2.4], 'Washers', 'take up a grip that is a little long')
  return sketch.finish()
}
