// CommonMark 0.31.2, https://spec.commonmark.org/0.31.2/spec.txt, read from the package commonmark-spec.
// Compared is the renderer with headings unmoved and without dressing. Left out are examples whose right
// output the product does not want: raw HTML, images, addresses of other schemes.
import { tests } from 'commonmark-spec'
import { describe, expect, it } from 'vitest'
import { markdownToBareHtml } from '@/lib/render/markdown-to-html'
import { sameHtml } from '@/tests/support/same-html'

const rawHtml = /<(?!\/?(?:p|h[1-6]|ul|ol|li|blockquote|pre|code|hr|br|em|strong|a)\b)[a-z!?/]/i
const otherScheme = /href="(?!https?:|mailto:|[/#?]|"|[^":]*")/i

// Raw HTML also stands in examples of other sections: ours keeps it as text.
const rawHtmlElsewhere = [21, 31, 344, 476, 477, 642, 643]
// GFM 0.29, section 6.9, makes links of bare addresses; CommonMark alone does not.
const bareAddresses = [602, 606, 608, 611, 612]
const readOtherwise: ReadonlySet<number> = new Set([...rawHtmlElsewhere, ...bareAddresses])

const wanted = tests.filter((example) =>
  !['HTML blocks', 'Raw HTML', 'Images'].includes(example.section) &&
  !rawHtml.test(example.html) && !otherScheme.test(example.html) && !readOtherwise.has(example.number))
const spell = (text: string): string => text.replaceAll('→', '\t')

describe('the CommonMark examples', () => {
  it('are compared, nearly all of those that sanitising leaves alone', () => {
    expect(tests.length).toBe(652)
    expect(wanted.length).toBe(538)
  })

  it.each(wanted.map((example) => [example.number, example.section, example] as const))('%i (%s) come out as the specification says', (_number, _section, example) => {
    expect(sameHtml(markdownToBareHtml(spell(example.markdown)))).toBe(sameHtml(spell(example.html)))
  })
})
