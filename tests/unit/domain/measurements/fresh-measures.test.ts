import { describe, expect, it } from 'vitest'
import { findMeasurements } from '@/lib/domain/measurements/find-measurements'
import { complaint } from './expected-measures'
import { freshMeasures } from './fresh-measures'

describe('measurements in sentences written before the parser met them', () => {
  it.each(freshMeasures)('are found in every sentence of the lot $lot, which first scored $firstScore', ({ cases }) => {
    expect(cases.flatMap(([text, ...expected]) => {
      const reason = complaint(findMeasurements(text), expected)
      return reason === undefined ? [] : [`${text} → ${reason}`]
    })).toEqual([])
  })
})
