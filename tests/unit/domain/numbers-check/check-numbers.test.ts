// The numbers check on whole sentences: verdicts against the published tables, whose number it is, and what holds for any text.
import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { checkNumbers } from '@/lib/domain/numbers-check/check-numbers'
import type { CheckContext, NumbersCheck, Verdict } from '@/lib/domain/numbers-check/numbers-check'
import type { MakerLimit } from '@/lib/domain/shop/maker-limits'
import { benchCases } from './bench-cases'
import { gripeCases } from './gripe-cases'
import { harmlessSentences } from './harmless-sentences'
import { secondCases } from './second-cases'
import { tradeCases, type FactCase } from './trade-cases'

/** One verdict for a text: a conflict outweighs what agrees. */
function verdictOf(checks: readonly NumbersCheck[]): Verdict {
  const has = (verdict: Verdict): boolean => checks.some((check) => check.verdict === verdict)
  return has('conflicts') ? 'conflicts' : has('agrees') ? 'agrees' : 'cannot-tell'
}
const wrong = (cases: readonly FactCase[]): string[] => cases.flatMap(([text, verdict]) => {
  const got = verdictOf(checkNumbers(text))
  return got === verdict ? [] : [`${text} → ${got}, not ${verdict}`]
})
const first = (text: string, context?: CheckContext): NumbersCheck | undefined => checkNumbers(text, context)[0]

describe('the numbers check', () => {
  it('judges every invented trade sentence as the tables do', () => {
    expect(wrong(tradeCases)).toEqual([])
  })

  it.each([['first', benchCases], ['second', secondCases], ['third', gripeCases]])('judges at least 95 of 100 in the %s lot of sentences as written down beforehand', (_, cases) => {
    const failures = wrong(cases)
    expect(failures.length / cases.length, failures.join('\n')).toBeLessThanOrEqual(0.05)
  })

  it('never says that a number agrees which the tables contradict', () => {
    const all = [...tradeCases, ...benchCases, ...secondCases, ...gripeCases]
    expect(all.filter(([text, verdict]) => verdict === 'conflicts' && verdictOf(checkNumbers(text)) === 'agrees')).toEqual([])
  })

  it.each(harmlessSentences)('charges no number to its neighbour: %s', (text) => {
    expect(checkNumbers(text).filter(({ verdict }) => verdict === 'conflicts')).toEqual([])
  })

  it('gives the place in the text, what the table says and whose it is', () => {
    // MIL-HDBK-5 table 8.1.2(a) and FAA-H-8083-31 ch. 4: #30 (0.1285) for a 1/8 rivet.
    expect(checkNumbers('First deburr. Then #21 for the 1/8 rivets in the web.')).toEqual([expect.objectContaining({
      claim: '#21 for the 1/8', start: 19, end: 34, role: 'advised', verdict: 'conflicts', table: 'rivet', basis: 'memory', source: expect.objectContaining({ title: expect.stringContaining('FAA-H-8083-31') }),
    })])
    expect(first('#21 for the 1/8 rivets.')?.expected).toContain('#30 · 0.1285 in')
    // AC 43.13-1B table 7-1: 10-32, tension 20-25, shear 12-15 in-lb.
    expect(first('AN3 with a full nut: 40 ft-lb.')).toMatchObject({ verdict: 'conflicts', expected: '20-25 in-lb (10-32, tension nut)', table: 'torque', basis: 'seen' })
  })

  it('agrees with any of the sources where they differ', () => {
    // 3/32: handbook #40, MIL-HDBK-5 and the P-40 manual #41.
    expect(first('#40 for 3/32 rivets.')?.verdict).toBe('agrees')
    expect(first('#41 for 3/32 rivets.')?.verdict).toBe('agrees')
    // Table 7-1, 1/4-28: has 50-70 in tension, 30-40 in shear.
    expect(first('AN4, 35 in-lb.')?.verdict).toBe('agrees')
    expect(first('AN4, 45 in-lb.')?.verdict).toBe('conflicts')
  })

  it('cannot tell where the table gives no value', () => {
    // Suppliers' grip charts and the Army hole table were seen for AN3 to AN6 only.
    expect(first('AN8-12A has a grip of 5/8.')).toMatchObject({ verdict: 'cannot-tell' })
    expect(first('AN9 in a 0.570 hole.')).toMatchObject({ verdict: 'cannot-tell' })
    expect(checkNumbers('Antenna doubler is .040.')).toEqual([])
  })

  it('does not count what the product wrote itself', () => {
    expect(checkNumbers('#30 · 0.1285 in')).toEqual([])
  })
})

describe('whose number it is', () => {
  it('compares a reading and charges it to nobody', () => {
    expect(first('I measured 3/16 from the edge on the 5/32 rivets.')).toMatchObject({ role: 'measured', verdict: 'conflicts' })
    expect(first('The 1/8 tails came out 0.188 wide.')).toMatchObject({ role: 'measured', verdict: 'agrees' })
    expect(first('The 1/8 tails should measure 0.188 wide.')).toMatchObject({ role: 'advised', verdict: 'agrees' })
  })

  it.each([
    "Don't use #40 for 1/8 rivets.", 'Never drill 1/8 rivets with #40.', 'A #21 hole is too big for 1/8 rivets.', 'Is #40 right for 1/8 rivets?', 'He said to use #40 for 1/8 rivets.', 'The old chart says #40 for 1/8 rivets.',
    'I drilled #21 for the 1/8 rivets by mistake.', 'The sticker reads "#21 for 1/8 rivets".', '> #21 for 1/8 rivets', '`#21 for 1/8 rivets`', '```\n#21 for 1/8 rivets\n```', 'If you use #21 for 1/8 rivets they lean.',
    'According to a leaflet AN3 gets 50 in-lb.', 'I wonder whether #40 is right for 1/8 rivets.', 'Somebody had drilled #21 for the 1/8 rivets.',
  ])('leaves alone: %s', (text) => {
    expect(checkNumbers(text)).toEqual([])
  })

  it('takes what is advised in place of what is denied', () => {
    expect(verdictOf(checkNumbers('Use #30, not #40, for 1/8 rivets.'))).toBe('agrees')
    expect(verdictOf(checkNumbers("Don't drill 1/8 rivets #40, use #30."))).toBe('agrees')
    expect(verdictOf(checkNumbers('He said #40, but use #21 for 1/8 rivets.'))).toBe('conflicts')
    expect(verdictOf(checkNumbers('If the rivets are 1/8, use #21.'))).toBe('conflicts')
  })

  it('reads "no less than" as a limit and not as a denial', () => {
    // 2 D, Army TM 10-5410-229-13&P para 5-6(3)(b).
    expect(verdictOf(checkNumbers('Keep 5/32 rivets no less than 5/16 from the edge.'))).toBe('agrees')
    expect(verdictOf(checkNumbers('Never go below 1.5 D of edge distance.'))).toBe('conflicts')
  })
})

describe('what is spoken of', () => {
  it('is carried from the sentence before, but not into another paragraph', () => {
    expect(verdictOf(checkNumbers('These are 1/8 rivets. Drill #21.'))).toBe('conflicts')
    expect(checkNumbers('These are 1/8 rivets.\n\nDrill #21.')).toEqual([])
    expect(verdictOf(checkNumbers('The strap has AN3 bolts. Torque them to 90 in-lb.'))).toBe('conflicts')
  })

  it('is taken from the hardware of the entry where there is one of its kind', () => {
    expect(first('Drill #21.', { hardware: ['AN470AD4'] })?.verdict).toBe('conflicts')
    expect(checkNumbers('Drill #21.', { hardware: ['AN470AD4', 'AN470AD5'] })).toEqual([])
    expect(checkNumbers('Drill #21 for the drain.', { hardware: ['AN470AD4'] })).toEqual([])
  })
})

describe("the maker's limit", () => {
  const limit = (inputs: MakerLimit['inputs'] = {}): MakerLimit => ({
    inputs, table: 'torque', result: 'torque', value: { min: 28, max: 32 }, unit: 'lbf-in', display: { inch: '28 to 32 in-lb', metric: '3.2 to 3.6 N·m' }, reference: { title: 'Bulletin 7', section: 'page 12', year: '2025' },
  })

  const edge = (inputs: MakerLimit['inputs'], value: MakerLimit['value'] = { min: 7 / 32 }, unit = 'in'): MakerLimit =>
    ({ ...limit(inputs), table: 'rivet', result: 'edge-centre', value, unit, display: { inch: 'at least 7/32 in', metric: 'at least 5.56 mm' } })

  it('allows what no handbook lists, and is named', () => {
    expect(first('AN3 at 30 in-lb.')?.verdict).toBe('conflicts')
    expect(first('AN3 at 30 in-lb.', { limits: [limit({ thread: 'AN3' })] })).toMatchObject({ verdict: 'agrees', basis: 'maker', source: { title: 'Bulletin 7' } })
  })

  it('is named first where a number contradicts it too, and leaves what a handbook allows', () => {
    expect(first('AN3 at 60 in-lb.', { limits: [limit()] })).toMatchObject({ verdict: 'conflicts', basis: 'maker' })
    expect(first('AN3 at 22 in-lb.', { limits: [limit()] })).toMatchObject({ verdict: 'agrees', basis: 'seen' })
  })

  it('for one bolt says nothing about another', () => {
    expect(first('AN5 with a full nut at 30 in-lb.', { limits: [limit({ thread: 'AN3' })] })?.verdict).toBe('conflicts')
    expect(first('AN5 with a full nut at 30 in-lb.', { limits: [limit()] })?.verdict).toBe('agrees')
  })

  it('holds for a size however it is spelled', () => {
    for (const diameter of ['1/8', '0.125', '-4']) expect(first('Edge distance 7/32 for the 1/8 rivets.', { limits: [edge({ diameter })] }), diameter).toMatchObject({ verdict: 'agrees', basis: 'maker' })
    expect(first('Edge distance 7/32 for the 1/8 rivets.', { limits: [edge({ diameter: '5/32' })] })?.verdict).toBe('conflicts')
  })

  it('for a nut that the text leaves open excuses a number and confirms none', () => {
    const tension = [limit({ thread: '10-32', nut: 'tension' })]
    expect(first('AN3 at 30 in-lb.', { limits: tension })?.verdict).toBe('cannot-tell')
    expect(first('AN3 with a full tension nut at 30 in-lb.', { limits: tension })?.verdict).toBe('agrees')
    expect(first('AN3 with a thin shear nut at 30 in-lb.', { limits: tension })?.verdict).toBe('conflicts')
  })

  it('in diameters is worked out for the rivet, and met by what is said in diameters', () => {
    const twoAndAHalf = [edge({}, { min: 1.75 }, 'D')]
    expect(first('Edge distance 7/32 for the 1/8 rivets.', { limits: twoAndAHalf })).toMatchObject({ verdict: 'agrees', basis: 'maker' })
    expect(first('Edge distance 3/16 for the 1/8 rivets.', { limits: twoAndAHalf })?.verdict).toBe('conflicts')
    expect(first('The rivets need an edge distance of 1.75 D.', { limits: twoAndAHalf })).toMatchObject({ verdict: 'agrees', basis: 'maker' })
  })
})

describe('any text', () => {
  const pieces = fc.constantFrom('#30', '#40', '1/8', '5/32', 'rivets', 'for', 'AN3', 'AN3-5A', 'AN470AD4-6', '20-25 in-lb', '2 D', 'edge', 'distance', '.032', '2024-T3', 'radius', 'grommet', 'hole', 'is', '=', '3.2 mm',
    "don't", 'not', 'if', '"', '“', '”', '.', ',', '\n', '\n\n', '?', ';', '> ', '`', '#8', 'screw', 'countersink', 'grip', 'tail', 'wide', 'apart', 'half a D', 'he said', 'I measured', '1/0', '0 D', '½', '\ud800', '🛩️', 'İİİ', 'AN bolt grip is the dash number times 1/16', 'rivet diameter is in 32nds')
  const texts = fc.oneof(fc.string({ unit: 'binary' }), fc.array(pieces, { maxLength: 40 }).map((parts) => parts.join(' ')), fc.array(fc.oneof(pieces, fc.string({ maxLength: 4 })), { maxLength: 40 }).map((parts) => parts.join('')))

  it('is read without an error, with spans inside it and in order, twice the same', () => {
    fc.assert(fc.property(texts, (text) => {
      const checks = checkNumbers(text, { hardware: [text.slice(0, 40)] })
      for (const { claim, start, end } of checks) {
        expect(start).toBeGreaterThanOrEqual(0)
        expect(end).toBeGreaterThan(start)
        expect(text.slice(start, end)).toBe(claim)
      }
      expect(checks.map(({ start }) => start)).toEqual(checks.map(({ start }) => start).toSorted((a, b) => a - b))
      expect(checkNumbers(text, { hardware: [text.slice(0, 40)] })).toEqual(checks)
    }), { numRuns: 800 })
  })

  it('with a rivet and a drill agrees only if a source lists that drill', () => {
    // The published holes, sources as in content/shop/rivets.json.
    const listed: Record<string, string[]> = { '3/32': ['#40', '#41'], '1/8': ['#30'], '5/32': ['#21', '#22'], '3/16': ['#11', '#12'] }
    fc.assert(fc.property(fc.constantFrom(...Object.keys(listed)), fc.integer({ min: 1, max: 60 }), (size, number) => {
      expect(verdictOf(checkNumbers(`Use #${number} for the ${size} rivets.`)) === 'agrees').toBe(listed[size]?.includes(`#${number}`))
    }))
  })

  it.each([
    ['plain advice', 'Drill the web #30 for the 1/8 rivets, keep them 1/4 from the edge and an inch apart. The skin lies over the rib and the holes run true along the flange, so there is little to correct when the clecos are in. '],
    ['one sentence without end', '#40 for 1/8 rivets '], ['open quotations', '"1/8 '], ['words half said', 'one and a half times the '], ['spaces', ' '], ['dashes', '- '], ['denials', "don't never not "],
  ])('takes time in step with its length: %s', (_, piece) => {
    const time = (length: number): number => {
      const text = piece.repeat(Math.ceil(length / piece.length)).slice(0, length)
      const runs = Array.from({ length: 7 }, () => {
        // The processor's time, not the clock's: other tests may be running.
        const from = process.cpuUsage()
        checkNumbers(text)
        return process.cpuUsage(from).user / 1000
      })
      return Math.min(...runs)
    }
    time(20_000)
    const [short, long] = [time(10_000), time(40_000)]
    // Four times the length: a quadratic one would take sixteen times. The constant is the clock's grain.
    expect(long).toBeLessThan(short * 10 + 5)
  })
})
