// What the trade keys of a phone put into the search line.
import { describe, expect, it } from 'vitest'
import { typeTradeKey } from '@/lib/format/trade-key'

const press = (value: string, ...keys: string[]) => keys.reduce((typed, key) => typeTradeKey(typed.value, typed.caret, typed.caret, key), { value, caret: value.length })

describe('A trade key', () => {
  it.each([
    ['a size stands apart from the word before it', 'grommet', ['3/8'], 'grommet 3/8'],
    ['a whole number and a fraction make a mixed number', '1', ['1/4'], '1 1/4'],
    ['a word has its space behind it', '', ['drill', '1/8', 'rivet'], 'drill 1/8 rivet '],
    ['a dash joins', 'AN931', ['-'], 'AN931-'],
    ['what follows # or a dash joins too', 'drill #', ['3/8'], 'drill #3/8'],
    ['millimetres stand apart from their number', '4.8', ['mm'], '4.8 mm'],
    ['AN waits for its number', 'torque', ['AN'], 'torque AN'],
  ])('%s', (_what, value, keys, expected) => {
    const typed = press(value, ...keys)
    expect(typed).toEqual({ value: expected, caret: expected.length })
  })

  it('goes in where the caret is, and takes the place of what is selected', () => {
    expect(typeTradeKey('hole for rivet', 8, 8, '1/8')).toEqual({ value: 'hole for 1/8 rivet', caret: 12 })
    expect(typeTradeKey('rivet 1/8', 6, 9, '5/32')).toEqual({ value: 'rivet 5/32', caret: 10 })
  })
})
