import { describe, expect, it } from 'vitest'
import { cautionTable } from '@/lib/content/caution-table'
import { EMBEDDED_WORDS, embeddedLine, groupCautions, unionCautions, wordCount, worstSignalWord } from '@/lib/domain/cautions/group-cautions'
import type { CautionDefinition } from '@/lib/domain/cautions/rule-table'

const caution = (code: string): CautionDefinition => {
  const found = cautionTable.cautions.find((entry) => entry.code === code)
  if (!found) throw new Error(`no caution ${code}`)
  return found
}

describe('the grouped plate of a page', () => {
  it('says each topic once, worst first, and where it stands', () => {
    const plate = groupCautions([
      { where: 'Found', cautions: [caution('eyes'), caution('fuel')] },
      { where: 'row 1', cautions: [caution('fuel')] },
      { where: 'row 2', cautions: [caution('eyes')] },
    ])
    expect(plate?.signalWord).toBe('WARNING')
    expect(plate?.lines.map(({ topic, where }) => [topic, where])).toEqual([['fuel', ['Found', 'row 1']], ['eyes', ['Found', 'row 2']]])
  })

  it('puts two cautions of one topic in one line, the worse one speaking, neither text lost', () => {
    const plate = groupCautions([
      { where: 'Found', cautions: [caution('breathing-dust')] },
      { where: 'row 1', cautions: [caution('breathing-chromate')] },
    ])
    expect(plate?.lines).toHaveLength(1)
    expect(plate?.lines[0]).toMatchObject({ code: 'breathing-chromate', signalWord: 'WARNING', where: ['Found', 'row 1'] })
    expect(plate?.lines[0]?.text).toContain(caution('breathing-dust').text)
    expect(plate?.lines[0]?.text).toContain(caution('breathing-chromate').text)
  })

  it('is absent where nothing can hurt', () => {
    expect(groupCautions([{ where: 'Found', cautions: [] }])).toBeNull()
  })
})

describe('the embedded line of a post', () => {
  it('carries the short text of its one topic', () => {
    expect(embeddedLine([caution('fuel')])).toEqual({ signalWord: 'WARNING', text: caution('fuel').short })
  })

  it('names the topics, worst first, when there are several', () => {
    expect(embeddedLine([caution('eyes'), caution('fuel')])).toEqual({ signalWord: 'WARNING', text: 'Fuel system · Eyes' })
  })

  it('never has more than 12 words, whatever stands on the post', () => {
    const line = embeddedLine(cautionTable.cautions)
    expect(wordCount(line?.text ?? '')).toBeLessThanOrEqual(EMBEDDED_WORDS)
    expect(line?.text).toMatch(/and \d+ more$/)
  })

  it('is absent without cautions', () => {
    expect(embeddedLine([])).toBeNull()
  })
})

describe('several posts together', () => {
  it('a union holds each code once, worst first', () => {
    const union = unionCautions([[caution('eyes'), caution('fire')], [caution('eyes'), caution('structure')]])
    expect(union.map(({ code }) => code)).toEqual(['structure', 'fire', 'eyes'])
  })

  it('the worst signal word of nothing is none', () => {
    expect(worstSignalWord([])).toBeNull()
    expect(worstSignalWord([{ signalWord: 'NOTICE' }, { signalWord: 'CAUTION' }])).toBe('CAUTION')
  })
})
