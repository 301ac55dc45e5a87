// Lines a steward pastes: a bad one names itself, the rest goes on.
import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { hardwareItemSchema, planStepSchema } from '@/lib/schemas/plans'
import { asLines } from '@/lib/services/plans/as-lines'
import { readLines } from '@/lib/services/plans/read-lines'

const steps = { columns: ['page', 'step', 'revision', 'task'], schema: planStepSchema }
const hardware = { columns: ['designation', 'length', 'left', 'right', 'place'], schema: hardwareItemSchema }
const good = (text: string) => readLines(text, steps).good.map((l) => l.value)
const bad = (text: string, layout: Parameters<typeof readLines>[1] = steps) => readLines(text, layout).bad.map((b) => [b.line, b.message])

describe('reading lines', () => {
  it('takes commas, semicolons and tabs, with and without a head line, in the head line’s order', () => {
    const wanted = [{ page: 'W3-1', step: '2', revision: 'C', task: 'flute' }]
    for (const text of ['W3-1,2,C,flute', 'W3-1;2;C;flute\n', 'W3-1\t2\tC\tflute\r\n', '\ufeffpage,step,revision,task\nW3-1,2,C,flute', 'Task, Step, Page, Revision\nFLUTE, 2, W3-1, C\n\n']) expect(good(text)).toEqual(wanted)
    expect(good('W3-1,2')).toEqual([{ page: 'W3-1', step: '2' }])
    expect(good('')).toEqual([])
  })

  it('a bad line names itself and its column, and comes back as it was; the rest goes on', () => {
    const read = readLines('AN3-5A,,4,4,"nose ribs, lower"\nAN3-6A,,four,4,\n,,1,1,\nAN960-10,,8,8,under the nuts', hardware)
    expect(read.good.map((l) => l.value)).toEqual([{ designation: 'AN3-5A', left: 4, right: 4, place: 'nose ribs, lower' }, { designation: 'AN960-10', left: 8, right: 8, place: 'under the nuts' }])
    expect(read.bad).toEqual([
      { line: 2, raw: 'AN3-6A,,four,4,', message: 'left: A whole number, such as 12.' },
      { line: 3, raw: ',,1,1,', message: 'designation: Write the designation.' },
    ])
  })

  it.each([
    ['too many columns', 'W3-1,2,C,flute,more', 1, /More than 4 columns/], ['no page', ',2,C,flute', 1, /^page: Write the page/], ['a page of 41 characters', `${'x'.repeat(41)},2`, 1, /At most 40/],
    ['a control character', 'W3-1,2\u0007', 1, /Control characters/], ['a task that is no name', 'W3-1,2,C,"flute it!"', 1, /^task: Not a known name/], ['a quotation mark inside', 'W3-1,1\nW3-1,"2"x,C\nW3-1,3', 2, /quotation mark/],
  ])('%s', (_what, text, line, message) => {
    const [first] = bad(text)
    expect(first).toEqual([line, expect.stringMatching(message)])
  })

  it('keeps at most 500 lines', () => {
    const read = readLines(Array.from({ length: 502 }, (_, i) => `W3-1,${i}`).join('\n'), steps)
    expect([read.good.length, read.bad.length]).toEqual([500, 2])
  })

  it('reads back every list it wrote', () => {
    const text = fc.string({ minLength: 1, maxLength: 20, unit: fc.constantFrom('a', ' ', ',', ';', '"', '\'', '1', 'é') }).map((s) => s.trim().replace(/\s+/g, ' ')).filter((s) => s !== '')
    fc.assert(fc.property(fc.array(fc.record({ designation: text, length: text, left: fc.nat(9999), right: fc.nat(9999), place: text }), { minLength: 1, maxLength: 6 }), (rows) => {
      expect(readLines(asLines(hardware.columns, rows), hardware)).toMatchObject({ good: rows.map((value) => ({ value })), bad: [] })
    }))
  })

  it('never throws, whatever is pasted', () => {
    fc.assert(fc.property(fc.string({ maxLength: 200, unit: fc.constantFrom('a', ',', '"', '\n', '\r', ';', '\t', '\u0000', '3') }), (text) => {
      const { good: kept, bad: refused } = readLines(text, steps)
      expect(kept.length + refused.length).toBeLessThanOrEqual(text.length + 1)
    }))
  })
})
