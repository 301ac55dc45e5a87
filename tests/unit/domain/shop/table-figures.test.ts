// The figures of whole answers: every table draws what it can, at both widths and in both systems, without labels on one another.
import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { balloonBox, labelBox, overlaps, type Figure } from '@/lib/domain/shop/figures/figure'
import { figureWords } from '@/lib/domain/shop/figures/figure-words'
import { shapeBounds } from '@/lib/domain/shop/figures/shape-bounds'
import { tableFigures } from '@/lib/domain/shop/figures/table-figures'
import { SHOP_TABLES, shopTable } from '@/lib/domain/shop/shop-tables'

function figuresOf(slug: string, raw: Record<string, string> = {}, width = 640, system: 'inch' | 'metric' = 'inch'): Figure[] {
  const outcome = shopTable(slug)?.compute(raw)
  if (!outcome?.ok) throw new Error(`refused: ${JSON.stringify(outcome)}`)
  return tableFigures(slug, outcome.inputs, outcome.results, width, system)
}
const labels = (figures: readonly Figure[]) => Object.fromEntries(figures.flatMap(({ dimensions }) => dimensions.map(({ field, label }) => [field, label.text])))

describe('Every table', () => {
  it.each(SHOP_TABLES.map(({ slug }) => slug))('%s is drawn as it opens', (slug) => {
    expect(figuresOf(slug).length).toBeGreaterThan(0)
  })

  it.each(SHOP_TABLES.map(({ slug, inputs }) => [slug, inputs] as const))('%s: a box to type into belongs to an input that takes text', (slug, inputs) => {
    for (const { field, label } of figuresOf(slug).flatMap(({ dimensions }) => dimensions)) {
      const input = inputs.find(({ name }) => name === field)
      if (label.isEntry) expect(input?.kind, field).toMatch(/^(?:length|drill|number)$/)
    }
  })

  it('keeps labels apart at its limits, on a phone and in millimetres', () => {
    const ends = SHOP_TABLES.flatMap(({ slug, inputs }) => [0, 1].flatMap((end) => [340, 640].flatMap((width) => (['inch', 'metric'] as const).map((system) => ({ slug, end, width, system, inputs })))))
    let drawn = 0
    for (const { slug, end, width, system, inputs } of ends) {
      for (const { name, min, max } of inputs) {
        const value = end === 0 ? min : max
        const outcome = value === undefined ? null : shopTable(slug)?.compute({ [name]: value })
        if (!outcome?.ok) continue
        for (const figure of tableFigures(slug, outcome.inputs, outcome.results, width, system)) {
          drawn += 1
          const boxes = [...figure.captions.map(labelBox), ...figure.dimensions.map(({ label }) => labelBox(label)), ...figure.balloons.map(balloonBox)]
          for (const [index, box] of boxes.entries()) for (const other of boxes.slice(index + 1)) expect(overlaps(box, other), `${slug} ${name} ${end} ${width} ${system}`).toBe(false)
          for (const box of boxes) expect(box.left >= -1 && box.right <= width + 1 && box.bottom <= figure.viewBox[3] + 1, `${slug} ${name} ${end} ${width} ${system}`).toBe(true)
        }
      }
    }
    expect(drawn).toBeGreaterThan(60)
  })

  it('holds whatever a builder types for a grommet', () => {
    fc.assert(fc.property(fc.constantFrom('3/16', '1/4', '3/8', '1-1/4'), fc.double({ min: 0.05, max: 6, noNaN: true }), (bore, groove) => {
      for (const figure of figuresOf('grommet', { bore, groove: String(groove.toFixed(4)) })) expect(figure.viewBox.every(Number.isFinite)).toBe(true)
    }), { numRuns: 50 })
  })
})

describe('A figure', () => {
  it('shows what was asked and what was worked out', () => {
    expect(labels(figuresOf('grommet', { bore: '3/8' }))).toEqual({ bore: '3/8', hole: '5/8' })
    // A hole that is there and takes another grommet: none is drawn rather than the wrong one.
    expect(figuresOf('grommet', { bore: '3/8', hole: '3/8' })).toEqual([])
    expect(labels(figuresOf('grommet', { bore: '3/8', hole: '5/8' }))).toEqual({ bore: '3/8', hole: '5/8' })
    expect(labels(figuresOf('rivet', { diameter: '1/8', stack: '0.065', edge: '7/32', pitch: '3/4' }))).toMatchObject({ hole: '#30 · 0.1285', length: '1/4', edge: '7/32', pitch: '3/4' })
  })

  it('speaks in millimetres when those stand first: 3/8 in is 9.525 mm (25.4 mm to the inch)', () => {
    expect(labels(figuresOf('grommet', { bore: '3/8' }, 640, 'metric'))).toEqual({ bore: '9.53', hole: '15.88' })
  })

  it('names what was not given instead of inventing a number', () => {
    const [torque] = figuresOf('torque')
    expect(labels(torque ? [torque] : [])).toEqual({ lever: 'lever', extension: 'extension' })
    expect(torque?.byEye).toContain('lengths not given')
  })

  it('is left out where the table has no value', () => {
    expect(figuresOf('bolt', { bolt: 'AN8' })).toEqual([])
    expect(figuresOf('units', { value: '20', from: 'psi' })).toEqual([])
  })

  it('counts its balloons on from one figure to the next', () => {
    const numbers = figuresOf('rivet').flatMap(({ balloons }) => balloons.map(({ n }) => n))
    expect(numbers).toEqual(numbers.map((_, index) => index + 1))
    expect(numbers.length).toBeGreaterThan(4)
  })

  it('says in words all that it shows', () => {
    const [grommet] = figuresOf('grommet')
    const words = grommet ? figureWords(grommet) : ''
    for (const part of ['to scale but for flange', 'bore 3/8', 'hole 5/8', '2: Groove']) expect(words).toContain(part)
  })

  it('knows what its shapes reach into, for a small picture', () => {
    expect(shapeBounds([{ kind: 'circle', cx: 10, cy: 20, r: 5, role: 'open' }, { kind: 'path', d: 'M0 0 Q5 5 30 2 A4 4 0 0 1 40 12 L8 8 Z', role: 'metal' }])).toEqual({ left: 0, top: 0, right: 40, bottom: 25 })
    expect(shapeBounds([])).toEqual({ left: 0, top: 0, right: 0, bottom: 0 })
  })
})
