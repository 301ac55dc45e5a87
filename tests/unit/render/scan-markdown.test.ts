// What is refused before parsing, and that ordinary long texts are not.
import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { normalizeText } from '@/lib/domain/markdown/normalize-text'
import { scanMarkdown } from '@/lib/domain/markdown/scan-markdown'

const message = (text: string): string => {
  const scan = scanMarkdown(text)
  return scan.ok ? 'accepted' : scan.message
}

describe('a text is refused with words that say what to change', () => {
  it.each([
    ['longer than 20,000 characters', 'a'.repeat(20_001), 'The text is 20,001 characters long. The limit is 20,000: shorten it, or split it in two.'],
    ['of 2,001 lines', 'a\n'.repeat(2_000), 'The text has 2,001 lines. The limit is 2,000: join some, or split the text in two.'],
    ['with 51 asterisks in a row', `fine\n${'*'.repeat(51)}`, 'Line 2 has more than 50 of the same mark (* _ ~ or `) in a row. Take some out.'],
    ['with 51 backticks in a row', '`'.repeat(51), 'Line 1 has more than 50 of the same mark (* _ ~ or `) in a row. Take some out.'],
    ['with 21 quotes in one another', `${'>'.repeat(21)} a`, 'Line 1 stands more than 20 quotes or lists deep. Bring it further out.'],
    ['with 21 lists in one another', Array.from({ length: 21 }, (_unused, depth) => `${'  '.repeat(depth)}- a`).join('\n'), 'Line 21 stands more than 20 quotes or lists deep. Bring it further out.'],
    ['with 21 lists on one line', `${'- '.repeat(21)}a`, 'Line 1 stands more than 20 quotes or lists deep. Bring it further out.'],
    ['with 21 brackets in one another', `${'['.repeat(21)}a${']'.repeat(21)}`, 'Line 1 has brackets or emphasis more than 20 deep. Take some of the marks out.'],
    ['with emphasis 22 deep', `${'*a **b '.repeat(11)}x${' d** c*'.repeat(11).trimStart()}`, 'Line 1 has brackets or emphasis more than 20 deep. Take some of the marks out.'],
    ['with a table of 51 columns', `|${'a|'.repeat(51)}\n|${'-|'.repeat(51)}`, 'Line 2: the table is wider than 50 columns.'],
    ['with short rows under a wide table', `|${'a|'.repeat(50)}\n|${'-|'.repeat(50)}\n${'|\n'.repeat(60)}`, 'Line 41: the tables hold more than 2,000 cells. Leave out rows that nobody needs.'],
    ['with 2,001 quote marks', '> a\n'.repeat(1_001).replaceAll('> a', '> > a'), 'The text has more than 2,000 quote and list marks. Split it in two.'],
    ['with 2,001 marks for emphasis', 'a* '.repeat(2_001), 'The text has more than 2,000 marks for emphasis (* _ ~). Take some out.'],
    ['with an address of 2,001 characters', `https://a.example/${'x'.repeat(1_983)}`, 'An address in the text is longer than 2,000 characters. Shorten it.'],
    ['with a control character', 'a\u0000b', 'The text holds control characters that cannot be shown. Paste it as plain text.'],
    ['with an override of direction', 'hole \u202E03#', 'The text holds control characters that cannot be shown. Paste it as plain text.'],
  ])('%s', (_name, text, expected) => {
    expect(message(text)).toBe(expected)
  })

  it.each([
    ['inline', '[a](https://a.example) '],
    ['inline whose text is the address', '[https://a.example](https://a.example) '],
    ['pictures', '![a](https://a.example/p.png) '],
    ['bare', 'https://a.example '],
    ['bare with www', 'www.a.example '],
    ['in angles', '<https://a.example> '],
    ['in angles with another scheme', '<tel:123> '],
    ['mailboxes', 'a@b.example '],
  ])('more than 50 links, %s, are refused and 50 are not', (_name, link) => {
    expect(message(link.repeat(50))).toBe('accepted')
    expect(message(link.repeat(51))).toBe('The text has more than 50 links. Keep the ones a builder needs.')
  })

  it('counts a reference link by its definition', () => {
    const definition = '\n\n[a]: https://a.example'
    expect(message(`${'[a] '.repeat(49)}${definition}`)).toBe('accepted')
    expect(message(`${'[A] '.repeat(50)}${definition}`)).toContain('more than 50 links')
    expect(message('[b] '.repeat(500))).toBe('accepted')
  })
})

describe('what builders write is accepted', () => {
  it.each([
    ['a task list of a hundred lines', '- [ ] deburr the edges\n'.repeat(100)],
    ['a hardware table', `| part | hole | drill |\n| --- | --- | --- |\n${'| AN470AD4-5 | 0.1285 | #30 |\n'.repeat(300)}`],
    ['quotes in lists in quotes', '> 1. first\n>    - second\n>      > third\n\nback out'],
    ['rules across the page', '* * *\n\n- - - - - - - - - - - - - - - - - - - - - - - -\n\n______________'],
    ['approximate sizes', 'about ~3/16, ~1/4 and ~5/16 of an inch, ~20 in all. '.repeat(30)],
    ['20 quotes in one another', `${'>'.repeat(20)} a`],
    ['many lines of the same list', Array.from({ length: 400 }, (_unused, line) => `${line + 1}. set rivet ${line + 1}`).join('\n')],
    ['a long text in paragraphs', 'Deburr *both* sides of `each` hole before you flute.\n\n'.repeat(370)],
    ['part numbers with underscores', 'W_3_2_left and W_3_2_right\n'.repeat(50)],
  ])('%s', (_name, text) => {
    expect(message(text)).toBe('accepted')
  })
})

describe('text is normalised', () => {
  it('to line feeds, without control characters or overrides of direction', () => {
    expect(normalizeText('\uFEFFa\r\nb\rc\u2028d\u0085e\u0000\u001B[31m\tf\u202Eg\u2066h')).toBe('a\nb\nc\nd\ne[31m\tfgh')
  })

  it('keeps emoji, joiners and the marks that right-to-left text needs', () => {
    const text = 'שלום \u200F3/16\u200E 👩🏽\u200D🔧 é e\u0301'
    expect(normalizeText(text)).toBe(text)
  })

  it('replaces half a surrogate pair', () => {
    expect(normalizeText('a\uD83Db 😀')).toBe('a\uFFFDb 😀')
  })

  it('once and for all, and never into more', () => {
    fc.assert(fc.property(fc.string({ unit: 'binary' }), (text) => {
      const once = normalizeText(text)
      expect(normalizeText(once)).toBe(once)
      expect(once.length).toBeLessThanOrEqual(text.length)
    }))
  })
})

it('the scan answers any 20,000 characters in under 100 ms', () => {
  const pieces = ['*', '**a ', '_', '~', '`', '[', ']', '](', '> ', '- ', '1. ', '|', '|-', ':', '\n', '\n\n', ' ', 'a', '@', '://', 'www.', '<a:', '[a]:', '\t', '\\', 'é']
  fc.assert(fc.property(fc.array(fc.constantFrom(...pieces), { minLength: 1, maxLength: 6 }), (parts) => {
    const unit = parts.join('')
    const text = unit.repeat(Math.floor(20_000 / unit.length))
    const start = performance.now()
    scanMarkdown(text)
    expect(performance.now() - start).toBeLessThan(100)
  }), { numRuns: 400 })
})
