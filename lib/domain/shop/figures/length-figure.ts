// A length drawn on two rules, inches over millimetres: what a conversion looks like.
import { fractionOfInch } from '../exact-fraction'
import { decimalInches, millimetres } from '../shop-result'
import type { Figure } from './figure'
import { fit, Sketch } from './sketch'

export interface LengthFigureInput {
  inches: number
}

const MM_PER_INCH = 25.4

/** `width`: pixels it will be shown at. Divisions are left out where they would run together. */
export function lengthFigure({ inches }: LengthFigureInput, width = 640): Figure {
  const scale = fit(width - 80, inches, 260)
  const [left, right] = [40, 40 + inches * scale]
  const sketch = new Sketch({ title: 'A length in inches and millimetres', system: 'inch', width, height: 150, scale })
  sketch.rect('metal', left, 60, right, 90)
  divide(sketch, left, inches, [1 / 16, 1 / 8, 1 / 4, 1 / 2, 1, 12], scale, 60, 1)
  divide(sketch, left, inches, [1, 5, 10, 100, 1000].map((mm) => mm / MM_PER_INCH), scale, 90, -1)
  sketch.across(`${fractionOfInch(inches) ?? decimalInches(inches)} in`, [left, 60], [right, 60], { field: 'inches', lane: 30 })
  sketch.across(`${millimetres(inches)} mm`, [left, 90], [right, 90], { field: 'millimetres', lane: 122 })
  return sketch.finish()
}

/** The finest divisions that still stand 5 px apart, along the upper (1) or the lower (-1) side. */
function divide(sketch: Sketch, left: number, inches: number, steps: readonly number[], scale: number, y: number, direction: 1 | -1): void {
  const step = steps.find((candidate) => candidate * scale >= 5)
  if (step === undefined) return
  for (let index = 1; index * step < inches - 1e-9; index += 1) sketch.line('outline', [left + index * step * scale, y], [left + index * step * scale, y + 9 * direction])
}
