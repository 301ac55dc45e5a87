import { describe, expect, it } from 'vitest'
import { checkNumbers } from '@/lib/domain/numbers-check/check-numbers'
import { freshChecks } from './fresh-checks'

/** A conflict outweighs what agrees; nothing said is nothing told. */
function verdictOf(text: string): string {
  const verdicts = new Set(checkNumbers(text).map(({ verdict }) => verdict))
  return verdicts.has('conflicts') ? 'conflicts' : verdicts.has('agrees') ? 'agrees' : 'cannot-tell'
}

describe('the numbers check on sentences written before it met them', () => {
  it.each(freshChecks)('judges each of the lot $lot, which first scored $firstScore', ({ cases }) => {
    expect(cases.flatMap(([text, verdict]) => (verdictOf(text) === verdict ? [] : [`${text} → ${verdictOf(text)}, not ${verdict}`]))).toEqual([])
  })
})
