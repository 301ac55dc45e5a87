// Steps of plans pages: however they are written, the step itself comes first, then other steps of its page, then the page.
import { describe, expect, test } from 'vitest'
import { analyseText } from '@/lib/domain/search/analyse-text'
import { findPlansReferences } from '@/lib/domain/search/plans-reference'
import { aDocument, ask, idsFor, indexOf } from './corpus'

const read = (text: string) => findPlansReferences(analyseText(text).tokens).map(({ page, step }) => `${page} step ${step}`)

describe('a plans reference', () => {
  test.each(['W3-2 step 6', 'W3-2, step 6', 'page W3-2 step 6', 'pg W3-2, step 6', 'W3-2/6', 'w3-2 STEP 6', 'W3-2 Rev C step 6', 'step 6 of W3-2', 'step 6 on page W3-2', 'see page W3-2: step 06 again'])('"%s" is read', (text) => {
    expect(read(text)).toEqual(['w3-2 step 6'])
  })

  test.each([['12-4 step 3b', '12-4 step 3b'], ['VS-12, step 10', 'vs12 step 10'], ['page 12 step 3', '12 step 3'], ['W3-2 step 6 and F4-1 step 2', 'w3-2 step 6,f4-1 step 2']])('"%s" is read as %s', (text, found) => {
    expect(read(text).join()).toBe(found)
  })

  test.each(['step 6', 'six steps', 'AN470AD4-6', '1-1/16', '3/8 hole in the web', 'W3-2 was torn, so I skipped to step 6', 'a step drill, size 6'])('"%s" is none', (text) => {
    expect(read(text)).toEqual([])
  })
})

describe('what a plans reference finds', () => {
  const about = (id: number, labels: string, text = 'The rib flange sat proud of the web.') => aDocument({ id, title: `Note ${id}`, labels }, text)
  const filler = Array.from({ length: 20 }, (_, i) => about(100 + i, i % 2 ? 'F4-1 step 6' : 'W5-1 step 2', 'Step 6 went well, and so did the rest of the page.'))
  const index = indexOf(
    about(1, 'W-3 Wing ribs to spar'),
    about(2, 'W3-2', 'W3-2 is a long page. W3-2 again, and W3-2.'),
    about(3, 'W3-2 step 5'),
    about(4, 'W3-2 step 6', 'The rib flange sat proud of the web. '.repeat(12)),
    ...filler,
  )

  test.each(['W3-2 step 6', 'W3-2, step 6', 'page W3-2 step 6', 'W3-2/6', 'step 6 of page W3-2'])('"%s": the step, then another step of the page, then the page, then its section', (text) => {
    expect(idsFor(index, text)).toEqual([4, 3, 2, 1])
  })

  test('a step nobody has written about brings the rest of its page; an unknown page brings nothing', () => {
    const found = idsFor(index, 'W3-2 step 9')
    expect(new Set(found.slice(0, 2))).toEqual(new Set([3, 4]))
    expect(found.slice(2)).toEqual([2, 1])
    expect(ask(index, 'W9-9 step 6')).toMatchObject({ hits: [], total: 0 })
  })

  test('the step weighs more than other words, and the other words still count', () => {
    const both = indexOf(about(1, 'W3-2 step 6', 'Deburr first.'), about(2, 'W3-2 step 6', 'A long rivet there.'), about(3, 'W3-2 step 4', 'A long rivet, rivet and rivet.'), ...filler)
    expect(idsFor(both, 'W3-2 step 6 rivet too long')).toEqual([2, 1, 3])
  })

  test.each([['sec W-3', 'W-3'], ['section W-3', 'W-3'], ['page W3-2', 'W3-2']])('"%s" is a search for %s', (text, place) => {
    expect(ask(index, text).hits.map(({ id, score }) => [id, score])).toEqual(ask(index, place).hits.map(({ id, score }) => [id, score]))
    expect(idsFor(index, text).length).toBeGreaterThan(0)
  })
})
