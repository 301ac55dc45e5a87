// Figures at ordinary sizes and at the ends of what the tables take: to scale, inside their box, no label on another.
import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { balloonBox, labelBox, overlaps, type Figure, type Shape } from '@/lib/domain/shop/figures/figure'
import { bendFigure } from '@/lib/domain/shop/figures/bend-figure'
import { boltFigure } from '@/lib/domain/shop/figures/bolt-figure'
import { countersinkFigure } from '@/lib/domain/shop/figures/countersink-figure'
import { drillFigure } from '@/lib/domain/shop/figures/drill-figure'
import { edgeFigure } from '@/lib/domain/shop/figures/edge-figure'
import { grommetFigure } from '@/lib/domain/shop/figures/grommet-figure'
import { rivetFigure } from '@/lib/domain/shop/figures/rivet-figure'
import { torqueFigure } from '@/lib/domain/shop/figures/torque-figure'
import { tubeFigure } from '@/lib/domain/shop/figures/tube-figure'
import { wireFigure } from '@/lib/domain/shop/figures/wire-figure'

const number = (min: number, max: number) => fc.double({ min, max, noNaN: true })
const widths = fc.constantFrom(340, 390, 640, 960)
/** [name, a figure from random inputs within the limits of its table] */
const figures: [string, fc.Arbitrary<Figure>][] = [
  ['grommet', fc.tuple(number(0.05, 4), number(1.05, 3), number(0.01, 0.25), widths).map(([bore, ratio, sheet, width]) => grommetFigure({ bore, hole: bore * ratio, sheet }, width))],
  ['rivet', fc.tuple(fc.constantFrom(1 / 16, 1 / 8, 3 / 8), fc.array(number(0.01, 1), { minLength: 1, maxLength: 3 }), fc.boolean(), widths).map(([diameter, sheets, flush, width]) =>
    rivetFigure({ diameter, holeName: '#30', hole: diameter + 0.004, sheets, length: sheets.reduce((sum, sheet) => sum + sheet, 0) + 1.5 * diameter, headWidth: 1.5 * diameter, headHeight: 0.5 * diameter, flush }, width))],
  ['edge', fc.tuple(number(0.06, 0.4), number(0.01, 6), number(0.05, 12), widths).map(([hole, edge, pitch, width]) => edgeFigure({ hole, headWidth: hole * 2, edge, pitch, leastEdge: hole * 2, leastPitch: hole * 3 }, width))],
  ['countersink', fc.tuple(number(0.01, 1), fc.constantFrom([0.225, 0.042, 0.1285], [0.476, 0.095, 0.257]), widths).map(([sheet, [headDiameter = 0, headHeight = 0, hole = 0], width]) => countersinkFigure({ sheet, headDiameter, headHeight, hole }, width))],
  ['bolt', fc.tuple(fc.constantFrom(3 / 16, 3 / 8, 1.25), number(0.06, 2.5), number(0.01, 4), fc.integer({ min: 0, max: 8 }), widths).map(([diameter, grip, thickness, washers, width]) => boltFigure({ diameter, grip, length: grip + 0.4, thickness, washers, washer: 0.063 }, width))],
  ['bend', fc.tuple(number(0, 4), number(0.01, 0.5), number(1, 170), widths).map(([radius, thickness, angle, width]) => bendFigure({ radius, thickness, angle }, width))],
  ['drill', fc.tuple(number(0.0135, 1), fc.boolean(), widths).map(([inches, end, width]) => drillFigure({ size: { name: '#30', inches }, below: end ? null : { name: '#31', inches: inches * 0.95 }, above: { name: '#29', inches: inches * 1.05 } }, width))],
  ['torque', fc.tuple(number(1, 60), number(0.1, 60), fc.constantFrom('longer' as const, 'shorter' as const, 'square' as const), widths).map(([lever, extension, direction, width]) => torqueFigure({ lever, extension: direction === 'shorter' ? Math.min(extension, lever / 2) : extension, direction }, width))],
  ['tube', fc.tuple(number(0.125, 1.5), number(1, 4), widths).map(([outside, times, width]) => tubeFigure({ outside, radius: outside * times, flattened: outside * 0.75 }, width))],
  ['wire', fc.tuple(number(0.02, 4), number(0.001, 12), widths).map(([bundle, clearance, width]) => wireFigure({ bundle, clearance, leastClearance: 0.375 }, width))],
]

/** Points that a shape reaches: straight corners, ends, and the box of a circle. Curves keep to their corners closely enough. */
function cornersOf(shape: Shape): (readonly [number, number])[] {
  if (shape.kind === 'circle') return [[shape.cx - shape.r, shape.cy - shape.r], [shape.cx + shape.r, shape.cy + shape.r]]
  if (shape.kind === 'line') return [shape.from, shape.to]
  return [...shape.d.matchAll(/[ML](-?[\d.]+) (-?[\d.]+)/g)].map(([, x, y]) => [Number(x), Number(y)] as const)
}

function numbersOf(value: unknown): number[] {
  if (typeof value === 'number') return [value]
  if (typeof value === 'string') return /^[MLAQZ\d .-]+$/.test(value) && value.startsWith('M') ? (value.match(/-?[\d.]+/g) ?? []).map(Number) : []
  return value && typeof value === 'object' ? Object.values(value).flatMap(numbersOf) : []
}

describe.each(figures)('The %s figure', (_, arbitrary) => {
  it('keeps labels and balloons apart, at every size and width', () => {
    fc.assert(fc.property(arbitrary, (figure) => {
      const boxes = [...figure.captions.map(labelBox), ...figure.dimensions.map(({ label }) => labelBox(label)), ...figure.balloons.map(balloonBox)]
      for (const [index, box] of boxes.entries()) {
        for (const other of boxes.slice(index + 1)) expect(overlaps(box, other), JSON.stringify([box, other])).toBe(false)
      }
    }), { numRuns: 200 })
  })

  it('stays inside its box with finite numbers', () => {
    fc.assert(fc.property(arbitrary, (figure) => {
      const [, , width, height] = figure.viewBox
      for (const value of numbersOf(figure)) expect(Number.isFinite(value)).toBe(true)
      for (const box of [...figure.dimensions.map(({ label }) => labelBox(label)), ...figure.balloons.map(balloonBox)]) {
        expect(box.left).toBeGreaterThanOrEqual(-1)
        expect(box.right).toBeLessThanOrEqual(width + 1)
        expect(box.top).toBeGreaterThanOrEqual(-1)
        expect(box.bottom).toBeLessThanOrEqual(height + 1)
      }
      for (const [x, y] of figure.shapes.flatMap(cornersOf)) {
        expect(x, 'x of a shape').toBeGreaterThanOrEqual(-12)
        expect(x, 'x of a shape').toBeLessThanOrEqual(width + 12)
        expect(y, 'y of a shape').toBeGreaterThanOrEqual(-12)
        expect(y, 'y of a shape').toBeLessThanOrEqual(height + 12)
      }
      for (const { from, to } of figure.dimensions) for (const [x, y] of [from, to]) {
        expect(x).toBeGreaterThanOrEqual(-1)
        expect(x).toBeLessThanOrEqual(width + 1)
        expect(y).toBeLessThanOrEqual(height + 1)
      }
    }), { numRuns: 200 })
  })

  it('numbers its balloons from one and names a field on each dimension', () => {
    fc.assert(fc.property(arbitrary, ({ balloons, dimensions, title }) => {
      expect(balloons.map(({ n }) => n)).toEqual(balloons.map((_, index) => index + 1))
      expect(balloons.length).toBeGreaterThan(0)
      for (const { field, label } of dimensions) expect(field && label.text).toBeTruthy()
      expect(title).toBeTruthy()
    }), { numRuns: 30 })
  })
})

describe('Scale', () => {
  const long = (figure: Figure, field: string): number => {
    const dimension = figure.dimensions.find((item) => item.field === field)
    return dimension ? Math.hypot(dimension.to[0] - dimension.from[0], dimension.to[1] - dimension.from[1]) / figure.scale : NaN
  }

  it('is one for everything on a figure: lengths measured on it are the inputs', () => {
    const grommet = grommetFigure({ bore: 0.375, hole: 0.625 })
    expect([long(grommet, 'bore'), long(grommet, 'hole')].map((value) => Number(value.toFixed(3)))).toEqual([0.375, 0.625])
    const rivet = rivetFigure({ diameter: 0.125, hole: 0.1285, sheets: [0.04, 0.025], length: 0.25, headWidth: 0.1875, headHeight: 0.0625 })
    for (const [field, inches] of [['diameter', 0.125], ['hole', 0.1285], ['length', 0.25], ['head-width', 0.1875], ['head-height', 0.0625]] as const) expect(long(rivet, field), field).toBeCloseTo(inches, 3)
    const bolt = boltFigure({ diameter: 0.1875, grip: 0.25, length: 0.65625, thickness: 0.25, washers: 1, washer: 0.063 })
    for (const [field, inches] of [['grip', 0.25], ['length', 0.65625], ['thickness', 0.25]] as const) expect(long(bolt, field), field).toBeCloseTo(inches, 3)
    expect(long(bendFigure({ radius: 0.125, thickness: 0.04, angle: 90 }), 'setback')).toBeCloseTo(0.165, 3)
    const edge = edgeFigure({ hole: 0.1285, headWidth: 0.25, edge: 0.21875, pitch: 0.75, leastEdge: 0.25, leastPitch: 0.375 })
    expect([long(edge, 'edge'), long(edge, 'pitch')].map((value) => Number(value.toFixed(3)))).toEqual([0.219, 0.75])
  })

  it('puts the arrows outside a span too narrow for them', () => {
    const arrows = (sheet: number) => countersinkFigure({ sheet, hole: 0.1285, headDiameter: 0.225, headHeight: 0.042 }).dimensions.find(({ field }) => field === 'sheet')?.arrows
    expect([arrows(0.016), arrows(0.125)]).toEqual(['outside', 'inside'])
  })
})
