// Working time as it is read.
import { expect, it } from 'vitest'
import { holdNumber, placeWords } from '@/lib/format/build-words'
import { readHours } from '@/lib/domain/builds/minutes-worked'
import { formatHours } from '@/lib/format/hours'

it.each([[0, '0 h'], [1, '1 min'], [59, '59 min'], [60, '1 h'], [150, '2 h 30 min'], [6725, '112 h 5 min']])('%i minutes read %s', (minutes, text) => {
  expect(formatHours(minutes)).toBe(text)
})

it('hours that are shown can be written back', () => {
  for (let minutes = 1; minutes <= 1440; minutes++) expect(readHours(formatHours(minutes))).toBe(minutes)
})

it('a hold is numbered by what it is, and its place says only what was given', () => {
  expect([holdNumber('hold', 3), holdNumber('left-open', 12), holdNumber('hold', 1234)]).toEqual(['H-003', 'O-012', 'H-1234'])
  expect([placeWords({ page: 'W3-2', step: '6' }), placeWords({ page: '', step: '6' }), placeWords({ page: '', step: '' })]).toEqual(['page W3-2, step 6', 'step 6', ''])
})
