// What a page adds to the sizes in a member's text: which are dressed, what is said beside them, and that nothing written is lost.
import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { markdownToHtml } from '@/lib/render/markdown-to-html'

/** The HTML as marks a person can read: ⟨ ⟩ around what has arrows, ‹ › around what has none, {hidden lead}, +unsaid+, (also). */
const read = (markdown: string): string => {
  const closing: string[] = []
  return markdownToHtml(markdown).html.replaceAll('\u00a0', ' ').replace(/<(\/?)(\w+)([^>]*)>/g, (_tag, slash: string, name: string, rest: string) => {
    if (name !== 'span') return ''
    if (slash) return closing.pop() ?? '?'
    const [open, close] = rest.includes('measure-lead') ? '{}' : rest.includes('measure-more') ? '++' : rest.includes('measure-also') ? '()' : rest.includes('measure-arrows') ? '⟨⟩' : '‹›'
    closing.push(close ?? '?')
    return open ?? '?'
  }).trim()
}

/** The text of the page without what was added. */
const undressed = (html: string): string => {
  const rest = html.replace(/<span class="measure-(?:lead|more|also)[^>]*>[^<]*<\/span>/g, '').replace(/<[^>]*>/g, '')
  return rest.replaceAll('&#x3C;', '<').replaceAll('&#x26;', '&')
}

describe('a size in a sentence', () => {
  it.each([
    // Drill decimals: ANSI/ASME B94.11M (1993), #30 is 0.1285, #40 is 0.098, F is 0.257. An inch is 25.4 mm exactly (NIST SP 811, B.8).
    ['up to #30.', 'up to ⟨{3.26 mm · }#30+ · 0.1285+⟩( also 3.26 mm).'],
    ['Drill number forty now', 'Drill ⟨{2.49 mm · }number forty+ · 0.098+⟩( also 2.49 mm) now'],
    ['reamed with a letter F drill', 'reamed with a ⟨{6.53 mm · }letter F drill+ · 0.257+⟩( also 6.53 mm)'],
    ['Hole 3 is 7/32 from the edge', 'Hole 3 is ⟨{5.56 mm · }7/32+ in+⟩( also 0.2188 in · 5.56 mm) from the edge'],
    ['a 3/16" hole', 'a ⟨{4.76 mm · }3/16"⟩( also 0.1875 in · 4.76 mm) hole'],
    ['.032 sheet', '⟨{0.813 mm · }.032+ in+⟩( also 0.813 mm) sheet'],
    ['open 4.8 mm', 'open ⟨{0.189 in · }4.8 mm⟩( also 0.189 in)'],
    ['5 thou of filler', '⟨{0.127 mm · }5 thou⟩( also 0.005 in · 0.127 mm) of filler'],
    // 1 in-lb is 0.112985 N·m, 1 psi is 0.0689476 bar (NIST SP 811, B.8); °F = 1.8 °C + 32 (B.9).
    ['torque 20-25 in-lb dry', 'torque ⟨{2.26–2.82 N·m · }20-25 in-lb⟩( also 2.26–2.82 N·m) dry'],
    ['heated to 15 °C first', 'heated to ⟨{59 °F · }15 °C⟩( also 59 °F) first'],
    ['gun at 35 psi', 'gun at ⟨{2.41 bar · }35 psi⟩( also 2.41 bar)'],
  ])('%s', (markdown, shown) => {
    expect(read(markdown)).toBe(shown)
  })

  it('is said in the other system once a text, and has arrows once a block', () => {
    expect(read('From 3/16 to the 3/16 mark.\n\nAgain 3/16.')).toBe('From ⟨{4.76 mm · }3/16+ in+⟩( also 0.1875 in · 4.76 mm) to the ‹{4.76 mm · }3/16+ in+› mark.\nAgain ⟨{4.76 mm · }3/16+ in+⟩.')
  })

  it('is not said again beside the author’s own saying, unless that is another size', () => {
    expect(read('#30 (0.1285) and on')).toBe('⟨{3.26 mm · }#30⟩ (‹0.1285›( also 3.26 mm)) and on')
    expect(read('3/16 in (4.76 mm) and on')).toBe('⟨3/16 in⟩ (‹4.76 mm›) and on')
    expect(read('3/16 in (5 mm) and on')).toContain('⟨{4.76 mm · }3/16 in⟩( also 0.1875 in · 4.76 mm) (⟨{0.1969 in · }5 mm⟩')
  })

  it('keeps a drill’s decimal where the word runs on, and adds nothing else there', () => {
    expect(read('a #30-drilled hole, 3/16-deep')).toBe('a ⟨{3.26 mm · }#30+ · 0.1285+⟩-drilled hole, ⟨{4.76 mm · }3/16⟩-deep')
  })

  it('is dressed inside emphasis, but not where a mark cuts through it', () => {
    expect(read('**#40** pilots')).toBe('⟨{2.49 mm · }#40+ · 0.098+⟩( also 2.49 mm) pilots')
    expect(read('a **3**/16 hole, then 3/16 in')).toBe('a 3/16 hole, then ⟨{4.76 mm · }3/16 in⟩( also 0.1875 in · 4.76 mm)')
  })

  it('has no arrows in a table', () => {
    expect(read('| drill | for |\n| - | - |\n| #30 | 1/8 |').split(/\s*\n\s*/).slice(-2)).toEqual(['‹{3.26 mm · }#30+ · 0.1285+›', '‹{3.18 mm · }1/8+ in+›'])
  })
})

describe('what stays as it was written', () => {
  it.each([
    'AN470AD4-4 rivets and an AN3-5A bolt', 'tap 10-32, wire 22 AWG, set to 82°', 'step 6 on page 12, mixed 10:1 at 14:30',
    '`3/16` and [drill 3/16](https://a.example) and ~~3/16~~', '    drill #30\n', '# A 3/16 hole\n\n## #30',
  ])('%s', (markdown) => {
    expect(markdownToHtml(markdown).html).not.toContain('<span')
  })

  it('is the plain text, for search and the numbers check', () => {
    expect(markdownToHtml('#30 and **3/16**, 20-25 in-lb').plain).toBe('#30 and 3/16, 20-25 in-lb')
  })

  it('is every word of any text: without what was added the page reads as typed', () => {
    const words = fc.constantFrom('3/16', '#30', '(0.1285)', '= 4.76 mm', '20-25 in-lb', '15 °C', 'drill', 'hole', 'number thirty', '.032', '1 1/4"', 'AN3-5A', '5 thou', '-deep', 'and', '1/8/', '"', '½', 'שלום', '<b>', '&', '×', 'to')
    fc.assert(fc.property(fc.array(words, { minLength: 1, maxLength: 30 }), fc.constantFrom(' ', ''), (parts, gap) => {
      const typed = parts.join(gap)
      expect(undressed(markdownToHtml(typed).html)).toBe(typed)
    }), { numRuns: 500 })
  })
})

describe('a text full of numbers', () => {
  it('is dressed so far that its HTML stays small', () => {
    const text = Array.from({ length: 2_000 }, (_unused, at) => `${at + 1} mm`).join(', ')
    const { html } = markdownToHtml(text)
    expect(html.length).toBeLessThan(text.length + 60_000)
    expect(html.match(/measure-arrows/g)).toHaveLength(200)
    expect(undressed(html)).toBe(text)
  })
})
