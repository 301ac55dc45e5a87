// Text that tries to run something in the reader's browser, and text of other scripts.
import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { markdownToHtml } from '@/lib/render/markdown-to-html'
import { countStrayTags, readTags } from '@/tests/support/read-tags'

const allowedTags = ['a', 'blockquote', 'br', 'code', 'del', 'div', 'em', 'h4', 'h5', 'h6', 'hr', 'input', 'li', 'ol', 'p', 'pre', 'span', 'strong', 'table', 'tbody', 'td', 'th', 'thead', 'tr', 'ul']
const allowedAttributes = ['align', 'aria-label', 'checked', 'class', 'dir', 'disabled', 'hidden', 'href', 'rel', 'role', 'start', 'tabindex', 'title', 'type']

/** What nobody may find in rendered text, whatever was typed. */
function expectHarmless(html: string): void {
  expect(countStrayTags(html)).toBe(0)
  expect(html.toLowerCase()).not.toContain('<script')
  for (const tag of readTags(html)) {
    expect(allowedTags).toContain(tag.name)
    for (const [name, value] of Object.entries(tag.attributes)) {
      expect(allowedAttributes).toContain(name)
      if (name === 'href') expect(value).toMatch(/^(?:https?:|mailto:|[^:]*$|[^:]*[/?#])/i)
    }
    // Measurements are dressed in these and no others, whatever stands in the number.
    if (tag.name === 'span') expect(tag.attributes['class']).toMatch(/^measure(?:-lead|-more|-also)?(?: measure-(?:inch|metric|arrows|whole))*$/)
    if (tag.name === 'a') expect(tag.attributes['rel']).toBe('nofollow noopener ugc')
  }
}

const attacks: [string, string][] = [
  ['a script', '<script>alert(1)</script>'],
  ['a script inside a line', 'text <script src=//evil.example/x.js></script> text'],
  ['a picture with an error handler', '<img src=x onerror=alert(1)>'],
  ['an upper-case handler without quotes', '<IMG SRC=x OnErRoR=alert(1)//'],
  ['a vector picture that loads', '<svg/onload=alert(1)>'],
  ['a vector picture with a script', '<svg><script>alert(1)</script></svg>'],
  ['a style sheet', '<style>*{background:url(javascript:alert(1))}</style>'],
  ['a frame', '<iframe srcdoc="<script>alert(1)</script>"></iframe>'],
  ['a frame never closed', '<iframe src="javascript:alert(1)'],
  ['a form', '<form action="javascript:alert(1)"><button>go</button></form>'],
  ['a base address', '<base href="https://evil.example/">'],
  ['a refresh', '<meta http-equiv="refresh" content="0;url=javascript:alert(1)">'],
  ['mathematics around a script', '<math><mtext></p><script>alert(1)</script>'],
  ['a comment that hides a tag', '<!--><img src=x onerror=alert(1)>-->'],
  ['a declaration', '<![CDATA[<script>alert(1)</script>]]>'],
  ['a script address', '[go](javascript:alert(1))'],
  ['a script address in capitals', '[go](JaVaScRiPt:alert(1))'],
  ['a script address between angles', '[go](<javascript:alert(1)>)'],
  ['a script address with a tab as a reference', '[go](java&Tab;script:alert(1))'],
  ['a script address with a line feed as a reference', '[go](java&#10;script:alert(1))'],
  ['a script address with its colon as a reference', '[go](javascript&colon;alert(1))'],
  ['a script address in numbers', '[go](&#106;&#97;&#118;&#97;&#115;&#99;&#114;&#105;&#112;&#116;&#58;alert(1))'],
  ['a script address in hexadecimal numbers', '[go](&#x6A;avascript&#x3A;alert(1))'],
  ['a script address after a control character', '[go](\u0001javascript:alert(1))'],
  ['a script address with a backslash', '[go](javascript\\:alert(1))'],
  ['a script address by reference', '[go][x]\n\n[x]: javascript:alert(1)'],
  ['a script address in angles', '<javascript:alert(1)>'],
  ['a page in a data address', '[go](data:text/html;base64,PHNjcmlwdD5hbGVydCgxKTwvc2NyaXB0Pg==)'],
  ['a picture in a data address', '![go](data:image/svg+xml,<svg/onload=alert(1)>)'],
  ['a visual script', '[go](vbscript:msgbox(1))'],
  ['a file address', '[go](file:///etc/passwd)'],
  ['a title that breaks out of its quotes', '[go](https://a.example "x\\" onmouseover=alert(1) y=\\"")'],
  ['an address that breaks out of its quotes', '[go](https://a.example/"onmouseover="alert(1))'],
  ['a picture whose words break out', '![x" onerror="alert(1)](https://a.example/p.png)'],
  ['a bare address that breaks out', 'https://a.example/"onmouseover="alert(1)'],
  ['a code language that breaks out', '```"><script>alert(1)</script>\ncode\n```'],
  ['a tag inside a size', '3/16<img src=x onerror=alert(1)> in, #<b>30</b> and 4.8<script>alert(1)</script> mm'],
  ['the dressing of a size, typed', '<span class="measure-lead" hidden>1 mm · </span>3/16'],
  ['an id that shadows a global', '<a id="location" name="cookie">x</a>'],
  ['a footnote with the name of a global', 'x[^__proto__]\n\n[^__proto__]: y'],
]

describe('nothing runs from a text', () => {
  it.each(attacks)('%s', (_name, markdown) => {
    const { html, plain } = markdownToHtml(markdown)
    expectHarmless(html)
    expect(plain.length).toBeGreaterThan(0)
  })

  it('keeps HTML as the text that was typed', () => {
    expect(markdownToHtml('a <b>bold</b> word').html).toBe('<p>a &#x3C;b>bold&#x3C;/b> word</p>')
    expect(markdownToHtml('<script>alert(1)</script>').plain).toBe('<script>alert(1)</script>')
  })

  it('takes a refused address from its words', () => {
    expect(markdownToHtml('[go](javascript:alert(1))').html).toBe('<p>go</p>')
  })

  it('never loads a picture from elsewhere and shows its words', () => {
    expect(markdownToHtml('See ![cracked shop head](https://elsewhere.example/p.png).').html).toBe('<p>See cracked shop head.</p>')
  })

  it('holds for any text made of what attacks are made of', () => {
    const pieces = fc.constantFrom(
      '<', '>', '"', "'", '`', '=', '/', '\\', ' ', '\n', '\n\n', '&', ';', '#', ':', '(', ')', '[', ']', '!', '|', '-', '*', '_', '~', '<script', '</script>', '<img src=x',
      ' onerror=alert(1)', 'javascript:', 'data:', 'java&#x73;cript:', '&lt;', '<svg', '<!--', '-->', '<a href=', '](', '[x]: ', ' "<script>")', 'https://a.example/', 'a@b.example', '| - |', '```', '    ', '> ', '- [x] ',
      '3/16', '#30', ' in', '4.8 mm', '20-25 in-lb', '"3/8"', 'number thirty', '°C', '<span class="measure">', 'measure-lead',
    )
    fc.assert(fc.property(fc.array(fc.oneof({ weight: 5, arbitrary: pieces }, fc.string({ maxLength: 4 })), { maxLength: 40 }), (parts) => {
      expectHarmless(markdownToHtml(parts.join('')).html)
    }), { numRuns: 600 })
  })
})

describe('what a page needs of a text', () => {
  it('leaves the upper headings to the page', () => {
    expect(readTags(markdownToHtml('# a\n\n## b\n\n### c\n\n###### d').html).map((tag) => tag.name)).toEqual(['h4', 'h5', 'h6', 'h6'])
  })

  it('names a checkbox and keeps it from being changed', () => {
    const [box] = readTags(markdownToHtml('- [x] deburred').html).filter((tag) => tag.name === 'input')
    expect(box?.attributes).toEqual({ type: 'checkbox', checked: '', disabled: '', 'aria-label': 'done' })
  })

  it('lets the keyboard reach what scrolls sideways', () => {
    const scrolling = readTags(markdownToHtml('| a | b |\n| - | - |\n| c | d |\n\n    code').html).filter((tag) => tag.attributes['tabindex'] === '0')
    expect(scrolling.map((tag) => tag.name)).toEqual(['div', 'pre'])
  })

  it('keeps footnotes where they were written, without ids', () => {
    expect(markdownToHtml('Torque it.[^a]\n\n[^a]: After snugging.').html).toBe('<p>Torque it.[a]</p>\n<p>[a] After snugging.</p>')
  })

  it('marks right-to-left text so that each paragraph finds its direction', () => {
    expect(markdownToHtml('שלום 3/16\n\nplain').html).toMatch(/^<p dir="auto">שלום .*3\/16.*<\/p>\n<p>plain<\/p>$/)
  })

  it('keeps emoji with their joiners whole', () => {
    expect(markdownToHtml('done 👩🏽‍🔧').html).toBe('<p>done 👩🏽‍🔧</p>')
  })
})

describe('the plain text', () => {
  it('is what a reader sees, block by block', () => {
    expect(markdownToHtml('# Edge\n\nKeep **2 × D**, see [here](https://a.example).\n\n- one\n- two\n\n| hole | drill |\n| - | - |\n| final | #30 |').plain)
      .toBe('Edge\n\nKeep 2 × D, see here.\n\none\ntwo\nhole\tdrill\nfinal\t#30')
  })

  it('does not glue words of neighbouring blocks together', () => {
    expect(markdownToHtml('1. first\n2. second\n\n> third\n\nfourth  \nfifth').plain.split(/\s+/)).toEqual(['first', 'second', 'third', 'fourth', 'fifth'])
  })
})
