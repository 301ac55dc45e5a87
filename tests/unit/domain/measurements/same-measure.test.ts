import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { findMeasurements } from '@/lib/domain/measurements/find-measurements'
import { formatMeasurement } from '@/lib/domain/measurements/format-measurement'
import { measureTokens } from '@/lib/domain/measurements/measure-tokens'
import type { Measurement } from '@/lib/domain/measurements/measurement'
import { sameMeasure } from '@/lib/domain/measurements/same-measure'

function only(text: string): Measurement {
  const [first, ...rest] = findMeasurements(text)
  if (!first || rest.length > 0) throw new Error(`not one measurement: ${text}`)
  return first
}
const shareToken = (a: Measurement, b: Measurement): boolean => measureTokens(a).some((token) => measureTokens(b).includes(token))

describe('the same measure in other words', () => {
  it.each([
    ['#30', '0.1285'], ['#30', '3.26 mm'], ['0.1285', '3.26 mm'], ['#40', '0.098'], ['#40', '2.5 mm'], ['letter F drill', '.257'], ['3/16', '4.76 mm'], ['3/16', '0.1875'],
    ['2 inch', '50.8 mm'], ['1 in', '25.4 mm'], ['12 in', '1 ft'], ['.032', '0.81 mm'], ['10 thou', '0.010'], ['140 in-lb', '15.8 N·m'], ['30 ft-lb', '40.7 N·m'], ['100-140 in-lb', '15.8 N·m'],
    ['60 psi', '4.14 bar'], ['72 F', '22 °C'], ['45°', '45 deg'], ['AN470AD4-6', 'MS20470AD4-6'], ['AN470AD4', 'MS20470AD4-6'], ['AN3-5A', 'AN3-5'], ['10-32', '#10-32'], ['22 AWG', '22 gauge wire'],
  ])('%s finds %s', (a, b) => {
    expect(sameMeasure(only(a), only(b))).toBe(true)
    expect(sameMeasure(only(b), only(a))).toBe(true)
    expect(shareToken(only(a), only(b))).toBe(true)
  })

  it.each([
    ['#30', '1/8'], ['#40', '3/32'], ['#30', '#31'], ['#30', '3.3 mm'], ['20 in-lb', '20 ft-lb'], ['90 psi', '90°'], ['1/4 in', '1/4-28'], ['AN3-5A', 'AN4-5A'], ['8 AWG', '#30'],
  ])('%s does not find %s', (a, b) => {
    expect(sameMeasure(only(a), only(b))).toBe(false)
    expect(shareToken(only(a), only(b))).toBe(false)
  })

  it('shares a token whenever two lengths, torques or temperatures are the same', () => {
    const pair = fc.tuple(fc.double({ min: 0.01, max: 400, noNaN: true }), fc.double({ min: -0.006, max: 0.006, noNaN: true }), fc.constantFrom('in', 'mm', 'in-lb', 'psi', '°F', '°'))
    let same = 0
    fc.assert(fc.property(pair, ([value, off, unit]) => {
      const [a, b] = [value, value * (1 + off)].map((number) => only(`${number.toFixed(4)} ${unit}`.replace(/ °$/, '°')))
      if (!a || !b || !sameMeasure(a, b)) return
      same += 1
      expect(shareToken(a, b), `${a.raw} and ${b.raw}`).toBe(true)
    }), { numRuns: 2000 })
    expect(same).toBeGreaterThan(100)
  })

  it('is told apart by its length, though a rivet of any length is found by its diameter', () => {
    expect(sameMeasure(only('AN470AD4-6'), only('AN470AD4-7'))).toBe(false)
    expect(measureTokens(only('AN470AD4-6'))).not.toEqual(measureTokens(only('AN470AD4-7')))
  })

  it('finds a rivet or bolt by its diameter', () => {
    expect(shareToken(only('AN470AD5-6'), only('5/32'))).toBe(true)
    expect(shareToken(only('AN3-5A'), only('3/16'))).toBe(true)
  })
})

describe('a measurement on a page', () => {
  it.each([
    ['3/16 in', 'inch', '3/16 in', '0.1875 in · 4.76 mm'], ['3/16 in', 'metric', '4.76 mm', '3/16 in · 0.1875 in'], ['use #30', 'inch', '#30 · 0.1285', '3.26 mm'], ['use #40', 'inch', '#40 · 0.098', '2.49 mm'],
    ['use #30', 'metric', '3.26 mm', '#30 · 0.1285'], ['letter F drill', 'inch', 'letter F · 0.257', '6.53 mm'], ['.050', 'inch', '0.050 in', '1.27 mm'], ['1/8', 'metric', '3.18 mm', '1/8 in · 0.125 in'],
    ['100 to 140 in-lb', 'inch', '100–140 in-lb', '11.3–15.8 N·m'], ['72 F', 'metric', '22.2 °C', '72 °F'], ['45 deg', 'inch', '45°', ''], ['AN470AD4-6', 'inch', 'AN470AD4-6', '1/8 × 3/8 in · 3.18 × 9.53 mm'],
    ['AN3-5A', 'inch', 'AN3-5A', '3/16 in, grip 1/4 in · 4.76 mm, grip 6.35 mm'], ['4/0 AWG', 'inch', '4/0 AWG', '0.460 in · 11.68 mm'],
  ] as const)('%s reads, %s first: %s, also %s', (written, first, text, also) => {
    expect(formatMeasurement(only(written), first)).toEqual({ text, also })
  })
})
