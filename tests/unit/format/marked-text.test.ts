// Marking never loses, doubles or reorders a character, whatever ranges come.
import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { markedText } from '@/lib/format/marked-text'

describe('marked text', () => {
  it('sets the ranges apart', () => {
    expect(markedText('hole in sheet', [[8, 13], [0, 4]])).toEqual([
      { text: 'hole', marked: true }, { text: ' in ', marked: false }, { text: 'sheet', marked: true },
    ])
  })

  it('joined again, the parts are the text', () => {
    const range = fc.tuple(fc.integer({ min: -5, max: 60 }), fc.integer({ min: -5, max: 60 }))
    fc.assert(fc.property(fc.string({ maxLength: 50 }), fc.array(range, { maxLength: 8 }), (text, marks) => {
      expect(markedText(text, marks).map((part) => part.text).join('')).toBe(text)
    }))
  })
})
