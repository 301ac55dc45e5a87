// What stands under each shop table: our own words, with source lines.
import { createElement } from 'react'
import { renderToStaticMarkup } from 'react-dom/server'
import { describe, expect, it } from 'vitest'
import { listPages, loadPage } from '@/lib/content/load-page'
import { SHOP_TABLES } from '@/lib/domain/shop/shop-tables'

describe('Notes of the shop tables', () => {
  it('are there for every table and for nothing else', async () => {
    expect((await listPages('shop-notes')).map(({ slug }) => slug).sort()).toEqual(SHOP_TABLES.map(({ slug }) => slug).sort())
  })

  it.each(SHOP_TABLES.map(({ slug }) => slug))('%s says where its facts come from, under headings below the page’s', async (slug) => {
    const note = await loadPage(slug, {}, 'shop-notes')
    if (!note) throw new Error('no note')
    const html = renderToStaticMarkup(createElement(note.Content))
    expect(html).toMatch(/<p>Sources?: .*<\/p>$/)
    expect(html).toContain('<h3>')
    expect(html).not.toMatch(/<h[12]/)
    expect(html).not.toMatch(/\b(?:comment|vot(?:e|ed|es|ing)|verif\w+|badge|points|flag(?:ged)?|thread(?:s)? about|forum)\b/i)
  })

  it('are not pages of the guide', async () => {
    expect(await loadPage('grommet', {})).toBeNull()
  })
})
