// A flush head in a sheet, countersunk and dimpled side by side, in section.
import type { Figure, Point } from './figure'
import { fit, Sketch, type LengthSystem } from './sketch'

export interface CountersinkFigureInput {
  /** Inches. */
  sheet: number
  hole: number
  headDiameter: number
  headHeight: number
}

/** `width`: pixels it will be shown at; under 480 the two views stand below one another. */
export function countersinkFigure(input: CountersinkFigureInput, width = 640, system: LengthSystem = 'inch'): Figure {
  const narrow = width < 480
  const deep = Math.max(input.sheet, input.headHeight) + input.headHeight + input.sheet
  const scale = Math.min(fit(narrow ? width * 0.4 : width * 0.24, input.headDiameter * 1.8), fit(200, deep))
  const panel = deep * scale + 110
  const sketch = new Sketch({ title: 'Countersink or dimple', system, width, height: narrow ? panel * 2 : panel, scale })
  const second: Point = narrow ? [width * 0.34, panel + 62] : [width * 0.7, 62]
  drawCountersunk(sketch, [narrow ? width * 0.34 : width * 0.22, 62], input, scale)
  drawDimpled(sketch, second, input, scale)
  return sketch.finish()
}

function drawCountersunk(sketch: Sketch, [x, y]: Point, { sheet, hole, headDiameter, headHeight }: CountersinkFigureInput, scale: number): void {
  const [far, head, half] = [headDiameter * 0.9 * scale, (headDiameter / 2) * scale, (hole / 2) * scale]
  const through = sheet <= headHeight
  const depth = Math.min(headHeight, sheet) * scale
  const inner = through ? head - (head - half) * (sheet / headHeight) : half
  const bottom = y + sheet * scale
  sketch.caption('COUNTERSUNK', [x, 14], 'middle')
  for (const side of [-1, 1] as const) sketch.path('cut', [[x + side * far, y], [x + side * head, y], [x + side * inner, y + depth], [x + side * inner, bottom], [x + side * far, bottom]])
  sketch.path('metal', [[x - head, y], [x + head, y], [x + half, y + headHeight * scale], [x - half, y + headHeight * scale]])
  sketch.across(sketch.decimal(headDiameter), [x - head, y], [x + head, y], { field: 'head-diameter', lane: y - 18 })
  sketch.down(sketch.decimal(sheet), [x + far, y], [x + far, bottom], { field: 'sheet', lane: x + far + 14, isEntry: true })
  sketch.down(sketch.decimal(headHeight), [x - far, y], [x - far, y + headHeight * scale], { field: 'head-height', lane: x + far + 14 })
  sketch.balloon([x, Math.max(bottom, y + headHeight * scale)], 'Sheet under the head', through ? 'none: the countersink goes right through' : `${sketch.length(sheet - headHeight)} is left`)
}

function drawDimpled(sketch: Sketch, [x, y]: Point, { sheet, hole, headDiameter, headHeight }: CountersinkFigureInput, scale: number): void {
  const [far, head, half] = [headDiameter * 0.9 * scale, (headDiameter / 2) * scale, (hole / 2) * scale]
  const [deep, thick] = [headHeight * scale, sheet * scale]
  sketch.caption('DIMPLED', [x, y - 48], 'middle')
  for (const side of [-1, 1] as const) sketch.path('cut', [[x + side * far, y], [x + side * head, y], [x + side * half, y + deep], [x + side * half, y + deep + thick], [x + side * head, y + thick], [x + side * far, y + thick]])
  sketch.path('metal', [[x - head, y], [x + head, y], [x + half, y + deep], [x - half, y + deep]])
  sketch.balloon([x + half, y + deep + thick], 'Dimple', 'the sheet is formed and keeps its thickness')
}
