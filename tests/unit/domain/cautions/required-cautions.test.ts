import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { cautionTable } from '@/lib/content/caution-table'
import { CRITICAL_SYSTEMS } from '@/lib/domain/cautions/critical-systems'
import { requiredCautions } from '@/lib/domain/cautions/required-cautions'
import { CRITICAL_TOPICS, SIGNAL_WORDS, type CautionSubject } from '@/lib/domain/cautions/rule-table'
import { CORE_CASES, WIDE_CASES, type TradeCase } from './trade-cases'

const subject = (part: Partial<CautionSubject>): CautionSubject => ({ text: '', operations: [], tasks: [], hardware: [], jasc: [], ...part })
const required = (part: Partial<CautionSubject>) => requiredCautions(cautionTable, subject(part))
const topics = (part: Partial<CautionSubject>) => new Set<string>(required(part).map((caution) => caution.topic))
const codes = (part: Partial<CautionSubject>) => required(part).map((caution) => caution.code)
const split = (list: string) => list.split(' ').filter(Boolean)

const missing = ([text, expected]: TradeCase) => split(expected).filter((topic) => !topics({ text }).has(topic))
const unwanted = ([text, expected, arguable]: TradeCase) =>
  [...topics({ text })].filter((topic) => !split(expected).includes(topic) && !split(arguable).includes(topic))

describe('words of the trade', () => {
  it.each(CORE_CASES)('%s', (...tradeCase) => {
    expect(missing(tradeCase)).toEqual([])
    expect(unwanted(tradeCase)).toEqual([])
  })

  it('finds every expected topic in the wide collection', () => {
    expect(WIDE_CASES.filter((tradeCase) => missing(tradeCase).length > 0)).toEqual([])
  })

  it('shows a topic too many in at most 5 % of the wide collection', () => {
    expect(WIDE_CASES.filter((tradeCase) => unwanted(tradeCase).length > 0).length / WIDE_CASES.length).toBeLessThanOrEqual(0.05)
  })

  it('sees a word in every inflection and case', () => {
    for (const text of ['The spar is CRACKED.', 'Spars cracking', 'a crack in the spar', 'cracks; spar']) expect(topics({ text })).toContain('structure')
  })

  it('takes wet sanding for harmless and dry sanding for dust', () => {
    expect(codes({ text: 'Wet sanding the filler down with 400 paper.' })).not.toContain('breathing-dust')
    expect(codes({ text: 'Dry sanding the filler down with 400 paper.' })).toContain('breathing-dust')
  })

  it('knows a bending brake from a wheel brake', () => {
    expect(topics({ text: 'The bending brake leaves marks.' })).not.toContain('brakes')
    expect(topics({ text: 'The left brake leaves marks.' })).toContain('brakes')
  })

  it('reads the title as well as the text', () => {
    expect(topics({ title: 'Crack in the longeron', text: 'See photo.' })).toContain('structure')
  })

  it('tells the reason in the author’s own words', () => {
    const [caution] = required({ text: 'Kink in the longeron near the gear, I’d like to file it smooth.' })
    expect(caution?.because).toBe('the words “Kink” and “longeron”')
  })
})

describe('operations, tasks, systems and hardware', () => {
  it.each([
    ['drill', 'eyes'], ['cut', 'eyes'], ['rivet', 'hearing'], ['rivet', 'eyes'], ['prime', 'breathing'], ['paint', 'breathing'],
    ['clean', 'breathing'], ['sand', 'breathing'], ['seal', 'skin'], ['deburr', 'sharp-edges'], ['route-wire', 'electrical'],
  ])('the operation %s asks for %s', (operation, topic) => {
    expect(topics({ operations: [operation] })).toContain(topic)
  })

  it('an unremarkable operation alone asks for nothing', () => {
    for (const operation of ['plan', 'measure', 'mark', 'label', 'store']) expect(codes({ operations: [operation] })).toEqual([])
  })

  it('sealing a tank is a fuel matter, running the engine one of powerplant and exhaust gas', () => {
    expect(topics({ tasks: ['seal-tank'] })).toContain('fuel')
    expect(codes({ tasks: ['run-engine'] })).toEqual(expect.arrayContaining(['powerplant', 'breathing-monoxide', 'hearing']))
  })

  it('chromate in the hardware list is enough', () => {
    expect(codes({ hardware: ['zinc-chromate-primer'] })).toContain('breathing-chromate')
  })

  it.each(CRITICAL_TOPICS.flatMap((topic) => CRITICAL_SYSTEMS[topic].map((prefix) => [prefix, topic] as const)))(
    'a section of system %s carries the WARNING %s and needs two stamps', (prefix, topic) => {
      const caution = required({ jasc: [prefix.padEnd(4, '0')] }).find((found) => found.topic === topic)
      expect(caution).toMatchObject({ signalWord: 'WARNING', twoStamps: true, because: `section system ${prefix.padEnd(4, '0')}` })
    },
  )

  it('sorts WARNING before CAUTION before NOTICE', () => {
    const words = required({ operations: ['route-wire', 'rivet', 'prime'], jasc: ['5711', '2810'] }).map((caution) => SIGNAL_WORDS.indexOf(caution.signalWord))
    expect(words).toEqual([...words].sort())
    expect(new Set(words).size).toBeGreaterThan(1)
  })
})

describe('laws', () => {
  const slugs = fc.subarray(['plan', 'drill', 'rivet', 'prime', 'paint', 'sand', 'seal', 'cut', 'deburr', 'route-wire', 'torque', 'test'])
  const systems = fc.subarray(['5711', '2810', '3240', '1100', '2460', '6110', '3411'])
  const words = fc.array(fc.constantFrom('spar', 'crack', 'fuel', 'line', 'leak', 'spray', 'mask', 'drill', 'eye', 'page', 'the', '. ', '\n\n'), { maxLength: 40 }).map((list) => list.join(' '))

  it('never throws, whatever is typed, up to 20 kB', () => {
    const text = fc.oneof(fc.string({ unit: 'binary', maxLength: 20_000 }), fc.string({ unit: 'grapheme', maxLength: 5_000 }))
    fc.assert(fc.property(text, (typed) => { required({ text: typed, title: typed.slice(0, 160), hardware: [typed.slice(0, 80)] }) }), { numRuns: 60 })
  })

  it('does not depend on the order of operations and systems', () => {
    fc.assert(fc.property(slugs, systems, words, (operations, jasc, text) => {
      expect(required({ text, operations: [...operations].reverse(), jasc: [...jasc].reverse() })).toEqual(required({ text, operations, jasc }))
    }))
  })

  it('an operation, task or system more never takes a caution away', () => {
    fc.assert(fc.property(slugs, slugs, systems, systems, words, (operations, more, jasc, beside, text) => {
      const before = codes({ text, operations, jasc })
      const after = codes({ text, operations: [...operations, ...more], tasks: more, jasc: [...jasc, ...beside] })
      expect(after).toEqual(expect.arrayContaining(before))
    }))
  })

  it('asks for each caution once', () => {
    fc.assert(fc.property(slugs, systems, words, (operations, jasc, text) => {
      const found = codes({ text, operations, jasc })
      expect(new Set(found).size).toBe(found.length)
    }))
  })

  it.each([
    ['trade text', WIDE_CASES.map(([text]) => text).join(' ').slice(0, 20_000)],
    ['one word over and over', 'spar '.repeat(4_000)],
    ['two words far apart', 'crack '.repeat(1_700) + '. \n\n'.repeat(20) + 'spar '.repeat(1_900)],
    ['one endless word', 'a'.repeat(20_000)],
    ['nothing but signs', '*'.repeat(20_000)],
  ])('reads 20 kB of %s without a stall', (_name, text) => {
    required({ text })
    const times = Array.from({ length: 9 }, () => {
      const start = performance.now()
      required({ text })
      return performance.now() - start
    }).sort((a, b) => a - b)
    // The aim is 5 ms on a quiet machine; ten times that still tells linear from quadratic on a busy one.
    expect(times[4]).toBeLessThan(50)
  })
})
