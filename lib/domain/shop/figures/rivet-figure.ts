// A solid rivet in section: the hole through the stack, the rivet put in, the rivet driven.
import type { Figure, Point } from './figure'
import { fit, Sketch, type LengthSystem } from './sketch'

export interface RivetFigureInput {
  /** Inches. */
  diameter: number
  /** "#30", shown with the decimal. */
  holeName?: string
  hole: number
  /** Thicknesses from the head's side. */
  sheets: readonly number[]
  length: number
  headWidth: number
  headHeight: number
  flush?: boolean
}

const SHEETS_SHOWN = 6

/** `width`: pixels it will be shown at; under 480 the three views stand below one another. */
export function rivetFigure(input: RivetFigureInput, width = 640, system: LengthSystem = 'inch'): Figure {
  const narrow = width < 480
  const stack = input.sheets.reduce((sum, sheet) => sum + sheet, 0)
  const across = Math.max(input.diameter * 2.2, input.headWidth * 1.3)
  const deep = Math.max(input.length, stack + input.headHeight) + input.diameter * 0.9
  const scale = Math.min(fit(narrow ? width * 0.5 : width * 0.2, across), fit(300, deep))
  const panel = deep * scale + 96
  const sketch = new Sketch({ title: 'Solid rivet', system, width, height: narrow ? panel * 3 : panel + 24, scale, byEye: input.flush ? '' : 'the manufactured head' })
  const at = (index: number): Point => [narrow ? width * 0.36 : width * (0.14 + 0.31 * index), (narrow ? panel * index : 0) + 34 + input.diameter * 0.5 * scale]
  drawHole(sketch, at(0), input, scale, stack)
  drawRivet(sketch, at(1), input, scale, stack)
  drawDriven(sketch, at(2), input, scale, stack)
  return sketch.finish()
}

function drawSheets(sketch: Sketch, [x, y]: Point, { sheets, diameter, hole, headWidth }: RivetFigureInput, scale: number): void {
  const half = (Math.max(diameter * 2.2, headWidth * 1.3) / 2) * scale
  let top = y
  for (const sheet of sheets.slice(0, SHEETS_SHOWN)) {
    const bottom = top + sheet * scale
    sketch.rect('cut', x - half, top, x - (hole / 2) * scale, bottom)
    sketch.rect('cut', x + (hole / 2) * scale, top, x + half, bottom)
    top = bottom
  }
}

function drawHole(sketch: Sketch, at: Point, input: RivetFigureInput, scale: number, stack: number): void {
  const [x, y] = at
  const half = (input.hole / 2) * scale
  sketch.caption('HOLE', [x, y - input.diameter * 0.5 * scale - 22], 'middle')
  drawSheets(sketch, at, input, scale)
  sketch.line('centre', [x, y - 12], [x, y + stack * scale + 12])
  const text = input.holeName ? `${input.holeName} · ${sketch.decimal(input.hole, 4)}` : sketch.decimal(input.hole, 4)
  sketch.across(text, [x - half, y + stack * scale], [x + half, y + stack * scale], { field: 'hole', lane: y + stack * scale + 26 })
  sketch.balloon([x - half, y + (stack * scale) / 2], 'Hole', 'deburr both sides of every sheet')
}

function drawShank(sketch: Sketch, [x, y]: Point, { diameter, flush, headWidth }: RivetFigureInput, scale: number, width: number, bottom: number): void {
  const half = (width / 2) * scale
  const head = Math.max(diameter * 1.8, headWidth) * scale * 0.5
  if (flush) sketch.path('metal', [[x - head, y], [x + head, y], [x + half, y + (head - half) * 0.839], [x + half, bottom], [x - half, bottom], [x - half, y + (head - half) * 0.839]])
  else sketch.curve('metal', `M${x - head} ${y} Q${x} ${y - diameter * scale * 0.8} ${x + head} ${y} L${x + half} ${y} L${x + half} ${bottom} L${x - half} ${bottom} L${x - half} ${y} Z`)
}

function drawRivet(sketch: Sketch, at: Point, input: RivetFigureInput, scale: number, stack: number): void {
  const [x, y] = at
  const bottom = y + input.length * scale
  sketch.caption('RIVET IN', [x, y - input.diameter * 0.5 * scale - 22], 'middle')
  drawSheets(sketch, at, input, scale)
  drawShank(sketch, at, input, scale, input.diameter, bottom)
  const half = (input.diameter / 2) * scale
  sketch.down(sketch.size(input.length), [x + half, y], [x + half, bottom], { field: 'length', lane: x + Math.max(input.diameter * 1.1, input.headWidth * 0.65) * scale + 10 })
  sketch.across(sketch.size(input.diameter), [x - half, bottom], [x + half, bottom], { field: 'diameter', lane: bottom + 20 })
  sketch.balloon([x - half, y + stack * scale], 'Length', 'stack and 1.5 D')
}

function drawDriven(sketch: Sketch, at: Point, input: RivetFigureInput, scale: number, stack: number): void {
  const [x, y] = at
  const [under, half] = [y + stack * scale, (input.headWidth / 2) * scale]
  const bottom = under + input.headHeight * scale
  sketch.caption('DRIVEN', [x, y - input.diameter * 0.5 * scale - 22], 'middle')
  drawSheets(sketch, at, input, scale)
  drawShank(sketch, at, input, scale, input.hole, under)
  sketch.curve('metal', `M${x - half * 0.9} ${under} Q${x - half * 1.1} ${(under + bottom) / 2} ${x - half * 0.9} ${bottom} L${x + half * 0.9} ${bottom} Q${x + half * 1.1} ${(under + bottom) / 2} ${x + half * 0.9} ${under} Z`)
  sketch.down(sketch.decimal(input.headHeight), [x + half, under], [x + half, bottom], { field: 'head-height', lane: x + Math.max(input.diameter * 1.1, input.headWidth * 0.65) * scale + 8 })
  sketch.across(sketch.decimal(input.headWidth), [x - half, bottom], [x + half, bottom], { field: 'head-width', lane: bottom + 20 })
  sketch.balloon([x + half, (under + bottom) / 2], 'Shop head', '1.5 D wide, 0.5 D high; not under 1.3 D and 0.3 D')
}
