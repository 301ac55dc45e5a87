import { describe, expect, it } from 'vitest'
import { compileTerms } from '@/lib/domain/cautions/term-matcher'
import { readTrade, tradeWords } from '@/lib/domain/cautions/trade-words'

const found = (terms: string[], text: string) => {
  const trade = readTrade(text)
  return compileTerms(terms)(trade).map(({ first, last }) => text.slice(trade.words[first]?.start, trade.words[last]?.end))
}

describe('terms', () => {
  it('match by stem, in any case, on whole words only', () => {
    expect(found(['drill'], 'Drilling, drilled and a DRILL, not a mandrill')).toEqual(['Drilling', 'drilled', 'DRILL'])
  })
  it('with = match one form, with * a beginning, with / either word', () => {
    expect(found(['=bled'], 'bled the line, bleeding')).toEqual(['bled'])
    expect(found(['chromat*'], 'chromate and chromated')).toEqual(['chromate', 'chromated'])
    expect(found(['fuel/gas line'], 'a gas line and a fuel line')).toEqual(['gas line', 'fuel line'])
  })
  it('of several words cross hyphens but no end of a sentence', () => {
    expect(found(['cut off wheel'], 'a cut-off wheel. Cut off. Wheel.')).toEqual(['cut-off wheel'])
  })
  it('with a gap take up to three words between', () => {
    expect(found(['hole .. oval'], 'the hole is oval')).toEqual(['hole is oval'])
    expect(found(['hole .. oval'], 'the hole that he had made is oval')).toEqual([])
  })
  it('take the longest and never overlap', () => {
    expect(found(['gear', 'landing gear', 'landing gear leg'], 'landing gear leg and gear')).toEqual(['landing gear leg', 'gear'])
  })
})

describe('words of a text', () => {
  it('keep their place, a decimal as one word', () => {
    expect(tradeWords('Hole 0.040 over.').map(({ form, start, end }) => [form, start, end])).toEqual([['hole', 0, 4], ['0.040', 5, 10], ['over', 11, 15]])
  })
  it('lie further apart across sentences and paragraphs', () => {
    expect(tradeWords('a. b').map(({ position }) => position)).toEqual([0, 4])
    expect(tradeWords('a\n\nb').map(({ position }) => position)).toEqual([0, 31])
  })
})
