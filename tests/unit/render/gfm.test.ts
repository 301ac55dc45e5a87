// GitHub Flavored Markdown Spec, version 0.29-gfm (2019-04-06), https://github.github.com/gfm/: examples of its
// extensions, by number. Compared as in commonmark.test.ts. A checkbox is `disabled` and `checked` in any order.
import { describe, expect, it } from 'vitest'
import { markdownToBareHtml } from '@/lib/render/markdown-to-html'
import { sameHtml } from '@/tests/support/same-html'

const link = (href: string, text: string): string => `<a href="${href}">${text}</a>`
const head = (...cells: string[]): string => `<thead><tr>${cells.map((cell) => `<th>${cell}</th>`).join('')}</tr></thead>`
const row = (...cells: string[]): string => `<tr>${cells.map((cell) => `<td>${cell}</td>`).join('')}</tr>`

const examples: [string, string, string][] = [
  ['198, tables 4.10', '| foo | bar |\n| --- | --- |\n| baz | bim |', `<table>${head('foo', 'bar')}<tbody>${row('baz', 'bim')}</tbody></table>`],
  ['199, tables 4.10', '| abc | defghi |\n:-: | -----------:\nbar | baz',
    '<table><thead><tr><th align="center">abc</th><th align="right">defghi</th></tr></thead><tbody><tr><td align="center">bar</td><td align="right">baz</td></tr></tbody></table>'],
  ['200, tables 4.10', '| f\\|oo  |\n| ------ |\n| b `\\|` az |\n| b **\\|** im |',
    `<table>${head('f|oo')}<tbody>${row('b <code>|</code> az')}${row('b <strong>|</strong> im')}</tbody></table>`],
  ['201, tables 4.10', '| abc | def |\n| --- | --- |\n| bar | baz |\n> bar', `<table>${head('abc', 'def')}<tbody>${row('bar', 'baz')}</tbody></table><blockquote><p>bar</p></blockquote>`],
  ['202, tables 4.10', '| abc | def |\n| --- | --- |\n| bar | baz |\nbar\n\nbar', `<table>${head('abc', 'def')}<tbody>${row('bar', 'baz')}${row('bar', '')}</tbody></table><p>bar</p>`],
  ['203, tables 4.10', '| abc | def |\n| --- |\n| bar |', '<p>| abc | def |\n| --- |\n| bar |</p>'],
  ['204, tables 4.10', '| abc | def |\n| --- | --- |\n| bar |\n| bar | baz | boo |', `<table>${head('abc', 'def')}<tbody>${row('bar', '')}${row('bar', 'baz')}</tbody></table>`],
  ['205, tables 4.10', '| abc | def |\n| --- | --- |', `<table>${head('abc', 'def')}</table>`],
  ['491, strikethrough 6.5', '~~Hi~~ Hello, world!', '<p><del>Hi</del> Hello, world!</p>'],
  ['492, strikethrough 6.5', 'This ~~has a\n\nnew paragraph~~.', '<p>This ~~has a</p><p>new paragraph~~.</p>'],
  ['621, autolinks 6.9', 'www.commonmark.org', `<p>${link('http://www.commonmark.org', 'www.commonmark.org')}</p>`],
  ['622, autolinks 6.9', 'Visit www.commonmark.org/help for more information.', `<p>Visit ${link('http://www.commonmark.org/help', 'www.commonmark.org/help')} for more information.</p>`],
  ['625, autolinks 6.9', 'www.google.com/search?q=(business))+ok', `<p>${link('http://www.google.com/search?q=(business))+ok', 'www.google.com/search?q=(business))+ok')}</p>`],
  ['626, autolinks 6.9', 'www.google.com/search?q=commonmark&hl=en\n\nwww.google.com/search?q=commonmark&hl;',
    `<p>${link('http://www.google.com/search?q=commonmark&amp;hl=en', 'www.google.com/search?q=commonmark&amp;hl=en')}</p><p>${link('http://www.google.com/search?q=commonmark', 'www.google.com/search?q=commonmark')}&amp;hl;</p>`],
  ['627, autolinks 6.9', 'www.commonmark.org/he<lp', `<p>${link('http://www.commonmark.org/he', 'www.commonmark.org/he')}&lt;lp</p>`],
  ['629, autolinks 6.9', 'foo@bar.baz', `<p>${link('mailto:foo@bar.baz', 'foo@bar.baz')}</p>`],
  ['630, autolinks 6.9', "hello@mail+xyz.example isn't valid, but hello+xyz@mail.example is.",
    `<p>hello@mail+xyz.example isn't valid, but ${link('mailto:hello+xyz@mail.example', 'hello+xyz@mail.example')} is.</p>`],
]

const box = (checked: boolean, text: string): string => `<li class="task-list-item"><input ${checked ? 'checked ' : ''}disabled type="checkbox"> ${text}</li>`

describe('the examples of GFM', () => {
  it.each(examples)('%s', (_name, markdown, html) => {
    expect(sameHtml(markdownToBareHtml(markdown))).toBe(sameHtml(html))
  })

  // The specification prints no classes; the list ones are there to take the bullets away.
  it('279, task list items 5.3, with the classes that take the bullets away', () => {
    expect(sameHtml(markdownToBareHtml('- [ ] foo\n- [x] bar'))).toBe(sameHtml(`<ul class="contains-task-list">${box(false, 'foo')}${box(true, 'bar')}</ul>`))
  })

  it('280, task list items 5.3, nested', () => {
    const html = markdownToBareHtml('- [x] foo\n  - [ ] bar\n  - [x] baz\n- [ ] bim')
    expect([...html.matchAll(/<input ([^>]*)>/g)].map((match) => match[1]?.includes('checked'))).toEqual([true, false, true, false])
    expect(html.match(/<ul/g)).toHaveLength(2)
  })
})
