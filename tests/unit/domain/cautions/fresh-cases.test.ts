import { describe, expect, it } from 'vitest'
import { cautionTable } from '@/lib/content/caution-table'
import { requiredCautions } from '@/lib/domain/cautions/required-cautions'
import { FRESH_BATCHES, KNOWN_TRAPS } from './fresh-cases'
import type { TradeCase } from './trade-cases'

const split = (list: string) => list.split(' ').filter(Boolean)
const topics = (text: string) =>
  new Set<string>(requiredCautions(cautionTable, { text, operations: [], tasks: [], hardware: [], jasc: [] }).map((caution) => caution.topic))
const missing = ([text, expected]: TradeCase) => split(expected).filter((topic) => !topics(text).has(topic))
const unwanted = ([text, expected, arguable]: TradeCase) =>
  [...topics(text)].filter((topic) => !split(expected).includes(topic) && !split(arguable).includes(topic))

describe('texts the table was mended by', () => {
  it.each(FRESH_BATCHES)('keeps every expected topic of the batch that first scored $firstScore', ({ cases }) => {
    expect(cases.filter((tradeCase) => missing(tradeCase).length > 0)).toEqual([])
  })

  it('shows a topic too many in at most 2 % of them', () => {
    const all = FRESH_BATCHES.flatMap(({ cases }) => cases)
    expect(all.filter((tradeCase) => unwanted(tradeCase).length > 0).length / all.length).toBeLessThanOrEqual(0.02)
  })

  it('shows nothing on their harmless talk', () => {
    const harmless = FRESH_BATCHES.flatMap(({ cases }) => cases).filter(([, expected]) => expected === '')
    expect(harmless.filter((tradeCase) => unwanted(tradeCase).length > 0)).toEqual([])
  })
})

describe('known traps', () => {
  it.each(KNOWN_TRAPS)('%s', (...tradeCase) => {
    expect(missing(tradeCase)).toEqual([])
    expect(unwanted(tradeCase)).toEqual([])
  })
})
