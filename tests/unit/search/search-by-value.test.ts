// Numbers in questions match by value and kind. Drill diameters: ASME B94.11M (#40 = 0.0980 in, #30 = 0.1285 in); factors: NIST SP 811.
import { describe, expect, test } from 'vitest'
import { findValues, measureSentences } from '@/lib/domain/search/number-terms'
import { aDocument, ask, idsFor, indexOf } from './corpus'

const filler = Array.from({ length: 12 }, (_, i) => aDocument({ id: 900 + i, title: `Paint booth diary ${'abcdefghijkl'[i]}` }, 'Overspray settled on the bench again, so the fan was moved.'))
/** An index of texts, numbered from 1. */
const texts = (...list: string[]) => indexOf(...list.map((text, i) => aDocument({ id: i + 1, title: `Note ${'abcdefgh'[i]}` }, text)), ...filler)

describe('a number finds equal ones, however they are written', () => {
  test.each([
    ['#40', 'The pilot hole measured 0.098 with the pin gauge.'],
    ['#40', 'A bit of 2.49 mm went through.'],
    ['0.098', 'Open it up with a #40 bit.'],
    ['number forty drill', 'The pilot hole measured 0.098 with the pin gauge.'],
    ['3/16', 'The pin gauge said 0.1875 all round.'],
    ['3/16', 'The collar is 4.76 mm wide inside.'],
    ['4.76 mm', 'The hole is 3/16 now.'],
    ['1 1/4 in', 'Cut the tube at 31.75 mm and deburr it.'],
    // 1 in-lb = 0.112984829 N·m: 20 in-lb is 2.26 and 25 in-lb 2.82 N·m.
    ['20-25 in-lb', 'The wrench was set at 2.5 N·m for the nut.'],
    ['2.5 N·m', 'The page says 20-25 in-lb dry.'],
    ['40.7 N·m', 'The plugs go in with 30 ft-lb.'],
    ['14 psi', 'It held 96.5 kPa overnight.'],
    ['AN470AD4-6', 'The kit gave MS20470AD4-6 rivets for it.'],
  ])('"%s" finds "%s"', (question, text) => {
    expect(idsFor(texts('The bench was painted grey.', text), question)).toEqual([2])
  })

  test.each([
    ['2.5 N·m', 'The spacer is 2.5 mm thick.', 'a torque no length'],
    ['0.098 in', 'Torque it to 0.098 N·m.', 'a length no torque'],
    ['20-25 in-lb', 'It took 3.4 N·m to move.', 'a range nothing outside it'],
    ['#40', 'The hole measured 0.101 in.', 'a drill not the next size'],
    ['1/4 in', 'A bolt AN4-7A fits.', 'a length no bolt of that diameter'],
    ['2.5 N·m', 'Set it between 5 and 50 N·m.', 'a value no range that says nothing about it'],
  ])('"%s" does not find "%s" (%s)', (question, text) => {
    expect(idsFor(texts('The bench was painted grey.', text), question)).toEqual([])
  })
})

describe('the order', () => {
  test('the number as written comes first, then an equal one, and a near size only by its words', () => {
    const index = texts('The hole was 2.49 mm when new.', 'The hole was #40 when new.', 'The hole was 2.6 mm when new.')
    expect(idsFor(index, '#40 hole')).toEqual([2, 1, 3])
    expect(idsFor(index, '#40')).toEqual([2, 1])
  })

  test('the words still decide: an equal number about something else comes after', () => {
    const index = texts('The grommet for the firewall wants a 14.29 mm hole.', 'The propeller spacer is 9/16 thick.')
    expect(idsFor(index, 'firewall grommet hole 9/16')[0]).toBe(1)
  })

  test('a value in the title weighs like a word of the title', () => {
    const index = indexOf(aDocument({ id: 1, title: 'A note' }, 'It was 4.76 mm.'), aDocument({ id: 2, title: 'Opening to 0.1875' }, 'It went well.'), ...filler)
    expect(idsFor(index, '3/16')).toEqual([2, 1])
  })
})

describe('what is found by its value', () => {
  test('is marked as it stands in the text, its unit with it', () => {
    expect(ask(texts('The bench was grey.', 'A bit of 2.49 mm went through.'), '#40').hits[0]?.terms).toEqual(['2.49 mm'])
  })

  test('is found no more when the entry changed or is gone', () => {
    const index = texts('The collar is 4.76 mm wide.')
    index.put(aDocument({ id: 1, title: 'Note a' }, 'The collar is 5.5 mm wide.'))
    expect(idsFor(index, '3/16')).toEqual([])
    expect(idsFor(index, '0.2165 in')).toEqual([1])
    index.remove(1)
    expect(idsFor(index, '0.2165 in')).toEqual([])
  })

  test('is not a spelling anybody is asked about', () => {
    expect(ask(texts('The collar is 4.76 mm wide.'), '3/16').didYouMean).toBeNull()
  })
})

describe('values of a text', () => {
  test('have their places in the whole text, sentence after sentence', () => {
    const text = 'No number here. Use No. 30 first.\nThen 3/16 in. It holds 2.5 N·m. A quarter inch is too much!'
    const places = measureSentences(text).map(({ start, end }) => text.slice(start, end))
    expect(places).toEqual(['No. 30', '3/16 in', '2.5 N·m', 'quarter inch'])
  })

  test('hold nothing a text could hold as a word', () => {
    for (const { terms } of findValues('#40, 3/16 in, 20-25 in-lb, 10-32, AN3-5A, 22 AWG, 90°, 70 °F')) for (const term of terms) expect(term).toMatch(/^≡/)
  })
})
