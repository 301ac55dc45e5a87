// The pages of the repository themselves, compiled and rendered.
import { createElement, type ReactNode } from 'react'
import { renderToStaticMarkup } from 'react-dom/server'
import { describe, expect, it } from 'vitest'
import { listPages, loadPage } from '@/lib/content/load-page'

const slugs = ['cautions-and-limits', 'how-stamps-work', 'markdown-help', 'privacy', 'writing-a-good-question']

describe('pages of our own', () => {
  it('are listed by title', async () => {
    const pages = await listPages()
    expect(pages.map((page) => page.slug).sort()).toEqual(slugs)
    expect(pages.map((page) => page.title)).toEqual(['Cautions and limits', 'How stamps work', 'Markdown help', 'Privacy', 'Writing a good question'])
  })

  it.each(slugs)('%s has a title, a summary and text under headings of its own', async (slug) => {
    const page = await loadPage(slug, {})
    if (!page) throw new Error('no page')
    const html = renderToStaticMarkup(createElement(page.Content))
    expect(html).toContain('<h2>')
    // The route shows the title as the only first-level heading.
    expect(html).not.toContain('<h1')
    // Nothing of the frontmatter is left in the text.
    expect(html).not.toContain('summary:')
  })

  it('use the words of the product and no others', async () => {
    for (const slug of slugs) {
      const page = await loadPage(slug, {})
      if (!page) throw new Error('no page')
      const words = `${page.title} ${page.summary} ${renderToStaticMarkup(createElement(page.Content))}`
      expect(words).not.toMatch(/\b(?:comment|vot(?:e|ed|es|ing)|verif\w+|badge|points|flag(?:ged)?|thread|forum)\b/i)
    }
  })

  it('say on the stamp page what a stamp does not mean', async () => {
    const page = await loadPage('how-stamps-work', {})
    if (!page) throw new Error('no page')
    expect(renderToStaticMarkup(createElement(page.Content))).toContain('ADVICE CHECKED · WORK NOT INSPECTED')
  })

  it('take the elements that the page gives them', async () => {
    const page = await loadPage('privacy', { h2: ({ children }: { children?: ReactNode }) => createElement('h2', { className: 'ours' }, children) })
    if (!page) throw new Error('no page')
    expect(renderToStaticMarkup(createElement(page.Content))).toContain('<h2 class="ours">What is kept</h2>')
  })

  it.each(['absent', '', '../operations', '../../package', 'privacy.mdx', 'privacy/../privacy', '/etc/passwd', 'privacy\0', '__proto__', 'constructor'])('"%s" is no page', async (slug) => {
    expect(await loadPage(slug, {})).toBeNull()
  })
})
