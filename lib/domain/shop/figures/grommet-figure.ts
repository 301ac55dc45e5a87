// The grommet in plan and in section: bore, groove in the sheet, cut edge, wire. Flange and thickness of the rubber are by eye.
import type { Figure } from './figure'
import { fit, Sketch, type LengthSystem } from './sketch'

export interface GrommetFigureInput {
  /** Inches. */
  bore: number
  hole: number
  sheet?: number
}

/** `width`: pixels it will be shown at; under 480 the section stands below the plan. */
export function grommetFigure({ bore, hole, sheet = 0.04 }: GrommetFigureInput, width = 640, system: LengthSystem = 'inch'): Figure {
  const narrow = width < 480
  const flange = hole + (hole - bore) * 0.6
  const room = narrow ? width * 0.62 : width * 0.36
  const section = (sheet / 2 + Math.max((flange - hole) / 2, 0.03)) * 3.6
  const scale = Math.min(fit(room, flange * 1.15), fit(width * 0.4, section))
  const radius = (flange / 2) * scale
  const height = narrow ? radius * 4 + 230 : radius * 2 + 150
  const sketch = new Sketch({ title: 'Grommet', system, width, height: height, scale, byEye: 'flange and thickness of the rubber' })
  const middle: readonly [number, number] = [narrow ? width / 2 : width * 0.25, radius + 46]
  drawPlan(sketch, middle, { bore, hole, flange }, scale)
  drawSection(sketch, narrow ? [width / 2, radius * 3 + 170] : [width * 0.68, middle[1]], { bore, hole, flange, sheet }, scale)
  return sketch.finish()
}

function drawPlan(sketch: Sketch, [x, y]: readonly [number, number], { bore, hole, flange }: { bore: number; hole: number; flange: number }, scale: number): void {
  const [outer, groove, inner] = [flange, hole, bore].map((value) => (value / 2) * scale) as [number, number, number]
  sketch.caption('PLAN', [4, 14])
  sketch.rect('sheet', x - outer * 1.12, y - outer * 1.12, x + outer * 1.12, y + outer * 1.12)
  sketch.circle('rubber', [x, y], outer)
  sketch.circle('hidden', [x, y], groove)
  sketch.circle('open', [x, y], inner)
  sketch.line('centre', [x - outer * 1.12, y], [x + outer * 1.12, y])
  sketch.line('centre', [x, y - outer * 1.12], [x, y + outer * 1.12])
  sketch.across(sketch.size(bore), [x - inner, y], [x + inner, y], { field: 'bore', lane: y + outer * 1.12 + 26, isEntry: true, isUnder: true })
  sketch.balloon([x + inner * 0.7, y - inner * 0.7], 'Bore', `the side of the wire, ${sketch.length(bore)}`)
}

function drawSection(sketch: Sketch, [x, y]: readonly [number, number], { bore, hole, flange, sheet }: { bore: number; hole: number; flange: number; sheet: number }, scale: number): void {
  const thick = Math.max(sheet * scale, 2)
  const wide = thick / 2 + Math.max((flange - hole) / 2, 0.03) * scale
  const [outer, groove, inner] = [flange, hole, bore].map((value) => (value / 2) * scale) as [number, number, number]
  sketch.caption('SECTION', [x - wide, y - outer - 28], 'middle')
  for (const side of [-1, 1] as const) {
    sketch.rect('rubber', x - wide, Math.min(y + side * inner, y + side * outer), x + wide, Math.max(y + side * inner, y + side * outer))
    sketch.rect('cut', x - thick / 2, Math.min(y + side * groove, y + side * outer * 1.12), x + thick / 2, Math.max(y + side * groove, y + side * outer * 1.12))
  }
  sketch.rect('wire', x - wide * 1.6, y - inner * 0.35, x + wide * 1.6, y + inner * 0.35)
  sketch.line('centre', [x - wide * 1.8, y], [x + wide * 1.8, y])
  sketch.down(sketch.size(hole), [x, y - groove], [x, y + groove], { field: 'hole', lane: x + wide * 1.6 + 18 })
  sketch.balloon([x, y + groove], 'Groove', `the side of the sheet, ${sketch.length(hole)}`)
  sketch.balloon([x, y - groove], 'Cut edge', 'deburr both sides: common practice, no source')
  sketch.balloon([x - wide * 1.4, y], 'Wire', `under ${sketch.length(3 / 8)} clear: use a grommet. AC 43.13-1B, para 11-115`)
}
