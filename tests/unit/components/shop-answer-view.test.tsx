// What an answer's sheet says in its markup: for screen readers, for a page without JavaScript, for the content security policy.
import { renderToStaticMarkup } from 'react-dom/server'
import { describe, expect, it } from 'vitest'
import { ShopAnswerSheet } from '@/components/shop/shop-answer-sheet'
import { ShopResultList } from '@/components/shop/shop-result-list'
import { SHOP_TABLES } from '@/lib/domain/shop/shop-tables'
import { linkInputs } from '@/lib/domain/shop/input-words'
import { answerTable } from '@/lib/services/shop/answer-table'

function markup(slug: string, raw: Record<string, string> = {}): string {
  const table = SHOP_TABLES.find((each) => each.slug === slug)
  if (!table) throw new Error(slug)
  const answered = answerTable(table, raw)
  const [answer, errors] = answered.ok ? [answered.answer, []] : [null, answered.errors]
  return renderToStaticMarkup(<>
    <ShopAnswerSheet table={table} answer={answer} values={linkInputs(table, raw)} errors={errors} first="inch" />
    {answer ? <ShopResultList results={answer.results} first="inch" /> : null}
  </>)
}

describe.each(SHOP_TABLES.map(({ slug, inputs }) => [slug, inputs] as const))('The sheet of %s', (slug, inputs) => {
  it('has no style attribute, which the content security policy would refuse', () => {
    expect(markup(slug)).not.toMatch(/ style=/)
  })

  it('sends each input once and labels it', () => {
    const html = markup(slug)
    for (const { name } of inputs) {
      expect(html.match(new RegExp(`name="${name}"`, 'g'))?.length, name).toBe(1)
      expect(html).toContain(`for="in-${name}"`)
    }
  })

  it('says of every number whose it is', () => {
    const rows = markup(slug).match(/<tr role="row"[\s\S]*?<\/tr>/g) ?? []
    expect(rows.length).toBeGreaterThan(1)
    for (const row of rows.slice(1)) expect(row).toMatch(/class="shop-whose"><ul class="shop-sources"><li>(?:<b>|<span|[A-Z])/)
  })
})

describe('A figure on the sheet', () => {
  it('has a title, its words, and boxes named after their inputs', () => {
    const html = markup('grommet', { bore: '3/8' })
    expect(html).toContain('>Grommet</title>')
    expect(html).toMatch(/<desc[^>]*>Drawn to scale but for flange[^<]*bore 3\/8, hole 5\/8/)
    expect(html).toContain('aria-label="Bore, the side of the wire, on the figure"')
  })

  it('is absent, like every number, while an input is out of its limits, and the field says what is allowed', () => {
    const html = markup('grommet', { bore: '-3' })
    expect(html).not.toContain('<svg')
    expect(html).not.toContain('shop-number')
    expect(html).toContain('a length from 0.05 in (1.27 mm) to 4 in (101.6 mm)')
    expect(html).toContain('value="-3"')
  })
})

it('A computed hole says that the plans come first and the part is measured', () => {
  expect(markup('grommet')).toContain('<b>Only where the plans show one; measure the part in hand.</b>')
})

it('Sources that differ stand side by side, each with its own number', () => {
  const html = markup('tube', { size: '-6', joint: 'aluminium' })
  expect(html).toContain('the sources differ')
  expect(html).toContain('100–125')
  expect(html).toContain('75–125')
})

describe('What was measured and is not within the table', () => {
  it('stands beside the number: 7/32 is 1/32 short of two diameters of a 1/8 rivet', () => {
    const html = markup('rivet', { diameter: '1/8', edge: '7/32' })
    expect(html).toContain('short by 1/32 of 2 D: stop, measure, ask the kit maker')
    expect(html).toContain('class="shop-against-list"')
    expect(html.match(/class="shop-against"/g)?.length).toBe(1)
  })

  it.each([['rivet', { edge: '1/4' }], ['wire', { clearance: '3/8' }], ['bend', { radius: '1/4' }]])('is not claimed of what is enough (%s)', (slug, raw) => {
    expect(markup(slug, raw)).not.toContain('shop-against')
  })

  it.each([['wire', { clearance: '0.3' }], ['wire', { spacing: '30' }], ['bend', { radius: '0.01' }], ['rivet', { pitch: '1/4' }]])('is said of what is not (%s %o)', (slug, raw) => {
    expect(markup(slug, raw)).toContain('shop-against-list')
  })
})
