// Three drills side by side as they look end on: the next below, the one asked for, the next above.
import type { Figure } from './figure'
import { fit, Sketch, type LengthSystem } from './sketch'

export interface DrillFigureInput {
  /** Inches. Null past the ends of the table. */
  size: { name: string; inches: number }
  below: { name: string; inches: number } | null
  above: { name: string; inches: number } | null
}

/** `width`: pixels it will be shown at. */
export function drillFigure({ size, below, above }: DrillFigureInput, width = 640, system: LengthSystem = 'inch'): Figure {
  const shown = [below, size, above].flatMap((drill, index) => (drill ? [{ ...drill, index, field: ['below', 'size', 'above'][index] ?? 'size' }] : []))
  const largest = Math.max(...shown.map(({ inches }) => inches))
  const scale = fit(width * 0.22, largest, 1200)
  const [y, deep] = [30 + (largest / 2) * scale, (largest / 2) * scale]
  const sketch = new Sketch({ title: 'Drill sizes', system, width, height: y + deep + 130, scale })
  for (const { name, inches, index, field } of shown) {
    const [x, r] = [width * (0.17 + 0.33 * index), (inches / 2) * scale]
    sketch.circle(index === 1 ? 'metal' : 'open', [x, y], r)
    sketch.line('centre', [x - r - 8, y], [x + r + 8, y])
    sketch.line('centre', [x, y - r - 8], [x, y + r + 8])
    sketch.across(sketch.decimal(inches, 4), [x - r, y], [x + r, y], { field, lane: y + deep + 24, isUnder: true, ...(field === 'size' ? { isEntry: true } : {}) })
    sketch.balloon([x, y - r], name, `${sketch.decimal(inches, 4)} ${system === 'metric' ? 'mm' : 'in'}`)
  }
  return sketch.finish()
}
