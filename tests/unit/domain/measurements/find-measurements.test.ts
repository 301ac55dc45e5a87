import { describe, expect, it } from 'vitest'
import { findMeasurements } from '@/lib/domain/measurements/find-measurements'
import { complaint, type Case } from './expected-measures'
import { garageCases } from './garage-cases'
import { shopFloorCases } from './shop-floor-cases'
import { tradeCases } from './trade-cases'

const wrong = (cases: readonly Case[]): string[] =>
  cases.flatMap(([text, ...expected]) => {
    const reason = complaint(findMeasurements(text), expected)
    return reason === undefined ? [] : [`${text} → ${reason}`]
  })

describe('measurements in trade sentences', () => {
  it('are all found in the invented trade cases, and nothing else is', () => {
    expect(wrong(tradeCases)).toEqual([])
  })

  it.each([
    ['plain', shopFloorCases],
    ['unkind', garageCases],
  ])('are found as written down beforehand in at least 97 of 100 further, %s sentences', (_, cases) => {
    const failures = wrong(cases)
    expect(failures.length / cases.length, failures.join('\n')).toBeLessThanOrEqual(0.03)
  })
})

describe('a measurement', () => {
  it('has its value in its own unit, in SI and in inches, and its exact form', () => {
    expect(findMeasurements('cut it to 2 1/8" long')).toEqual([
      { raw: '2 1/8"', start: 10, end: 16, kind: 'length', value: 2.125, exact: '2 1/8', unit: 'in', si: { value: 0.053975, unit: 'm' }, inches: 2.125 },
    ])
    expect(findMeasurements('100 to 140 in-lb')[0]).toMatchObject({ value: 100, max: 140, unit: 'in-lb', si: { unit: 'N·m' } })
    expect(findMeasurements('use #30')[0]).toMatchObject({ value: 0.1285, exact: '#30', unit: 'in', inches: 0.1285 })
    expect(findMeasurements('AN470AD5-6')[0]).toMatchObject({ diameter: 0.15625, length: 0.375, exact: 'AN470AD5-6' })
  })

  // Hardware suppliers' public technical notes that agree with one another, printed to a thousandth (NASM3-20 itself was not seen).
  it.each([
    ['AN3-4A', 0.531, 0.125], ['AN3-5A', 0.656, 0.25], ['AN3-10A', 1.031, 0.625], ['AN3-27A', 2.906, 2.5], ['AN4-4A', 0.531, 0.063], ['AN4-11', 1.156, 0.688], ['AN4-20A', 2.031, 1.563],
    ['AN5-5A', 0.719, 0.188], ['AN5-12A', 1.344, 0.813], ['AN5-27A', 2.969, 2.438], ['AN6-5A', 0.703, 0.063], ['AN6-20A', 2.078, 1.438], ['AN6-27A', 2.953, 2.313],
  ])('of %s has the printed length and grip', (designation, length, grip) => {
    const [bolt] = findMeasurements(designation)
    expect(bolt?.length?.toFixed(3)).toBe(length.toFixed(3))
    expect(Math.abs((bolt?.grip ?? 0) - grip)).toBeLessThanOrEqual(0.0006)
  })

  it.each(['AN3-8A', 'AN3-3A', 'AN3-30A', 'AN8-12A'])('of %s has no grip: no source lists it', (designation) => {
    const [bolt] = findMeasurements(designation)
    expect(bolt).toMatchObject({ kind: 'bolt' })
    expect(bolt).not.toHaveProperty('grip')
  })

  // NAVEDTRA 14018 ch. 13: diameter in 32nds, length in 16ths of an inch.
  it.each([['AN470AD4-7', 1 / 8, 7 / 16], ['MS20470AD4-3.5', 1 / 8, 7 / 32], ['MS20426AD5-6', 5 / 32, 3 / 8]])('of %s has the decoded diameter and length', (designation, diameter, length) => {
    expect(findMeasurements(designation)[0]).toMatchObject({ kind: 'rivet', diameter, length })
  })
})
