import { describe, expect, it } from 'vitest'
import { cautionTable, parseCautionTable } from '@/lib/content/caution-table'
import { wordCount } from '@/lib/domain/cautions/group-cautions'
import { CAUTION_TOPICS, CRITICAL_TOPICS, SIGNAL_WORDS, type CautionTopic } from '@/lib/domain/cautions/rule-table'

const ofTopic = (topic: CautionTopic) => cautionTable.cautions.filter((caution) => caution.topic === topic)
const changed = (change: (table: typeof cautionTable) => void) => {
  const table = structuredClone(cautionTable)
  change(table)
  return () => parseCautionTable(table)
}

describe('the caution table', () => {
  // ANSI Z535.6 (2011), signal words: WARNING = could result in death or serious injury; CAUTION = could result in minor or moderate
  // injury; NOTICE = practices not related to injury. DANGER is kept for hazards that will, and belongs on the machine, not in advice.
  it('uses the signal words of ANSI Z535.6, worst first', () => {
    expect(SIGNAL_WORDS).toEqual(['WARNING', 'CAUTION', 'NOTICE'])
  })

  it('NOTICE is never used where somebody can be hurt', () => {
    expect(cautionTable.cautions.filter((caution) => caution.signalWord === 'NOTICE')).toEqual([])
  })

  it.each(CRITICAL_TOPICS)('%s can kill: WARNING, two stamps', (topic) => {
    expect(ofTopic(topic).length).toBeGreaterThan(0)
    for (const caution of ofTopic(topic)) expect(caution).toMatchObject({ signalWord: 'WARNING', twoStamps: true })
  })

  // Chromium(VI): 29 CFR 1910.1026; diisocyanates: NIOSH Pocket Guide, hexamethylene diisocyanate.
  it.each(['breathing-chromate', 'breathing-isocyanate', 'breathing-monoxide', 'fire'])('%s is a WARNING', (code) => {
    expect(cautionTable.cautions.find((caution) => caution.code === code)?.signalWord).toBe('WARNING')
  })

  it('covers every topic', () => {
    for (const topic of CAUTION_TOPICS) expect(ofTopic(topic)).not.toEqual([])
  })

  it('keeps the embedded text to 12 words', () => {
    for (const caution of cautionTable.cautions) expect(wordCount(caution.short)).toBeLessThanOrEqual(12)
  })

  it('defers to the kit maker on every critical system', () => {
    for (const topic of CRITICAL_TOPICS) for (const caution of ofTopic(topic)) expect(caution.text).toMatch(/kit maker's current plans and bulletins come first/)
  })
})

describe('a table that could not do its work is refused', () => {
  it.each<[string, (table: typeof cautionTable) => void, RegExp]>([
    ['a rule for an unknown caution', (table) => { table.rules.push({ code: 'nothing', operations: ['drill'] }) }, /unknown caution/],
    ['a caution twice', (table) => { table.cautions.push(...table.cautions.slice(0, 1)) }, /stands twice/],
    ['a topic without a caution', (table) => { table.cautions = table.cautions.filter((caution) => caution.topic !== 'hearing') }, /no caution for topic hearing/],
    ['an embedded text of 13 words', (table) => { for (const caution of table.cautions) caution.short = 'word '.repeat(13) }, /at most 12 words/],
    ['a critical system that is a mere CAUTION', (table) => { for (const caution of table.cautions) caution.signalWord = 'CAUTION' }, /a critical system is a WARNING/],
    ['a critical system with one stamp', (table) => { for (const caution of table.cautions) caution.twoStamps = false }, /two stamps belong to critical systems/],
    ['a rule without a condition', (table) => { table.rules.push({ code: 'eyes' }) }, /something to look at/],
    ['an unknown word list', (table) => { table.rules.push({ code: 'eyes', words: { all: [['@nothing']] } }) }, /unknown vocabulary/],
  ])('%s', (_name, change, message) => {
    expect(changed(change)).toThrow(message)
  })
})
