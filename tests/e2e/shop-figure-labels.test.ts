// The words of every figure as the browser sets them, at the least, the most and the ordinary inputs of its table: none on another, none cut off.
import { describe, expect, test } from 'vitest'
import type { Page } from 'playwright-core'
import { SHOP_TABLES, shopTable } from '@/lib/domain/shop/shop-tables'
import { openPage, widths } from '../support/browser'

/** Each input alone at each of its ends and options, and all together at their least and at their most, where the table takes it. */
function addressesOf(slug: string): string[] {
  const table = shopTable(slug)
  if (!table) return []
  const ends = (end: 'min' | 'max') => Object.fromEntries(table.inputs.flatMap((input) => (input[end] === undefined ? [] : [[input.name, String(input[end])]])))
  const alone = table.inputs.flatMap(({ name, min, max, options = [] }) => [min, max, options[0]?.value, options.at(-1)?.value].flatMap((value) => (value === undefined ? [] : [{ [name]: String(value) }])))
  const asked = [{}, ends('min'), ends('max'), ...alone].filter((raw) => table.compute(raw).ok)
  return [...new Set(asked.flatMap((raw) => ['inch', 'metric'].map((units) => `/shop/${slug}?${new URLSearchParams({ ...raw, units })}`)))]
}

async function collisions(page: Page): Promise<string[]> {
  return page.evaluate(() => {
    const found: string[] = []
    for (const svg of document.querySelectorAll('.shop-figure')) {
      const frame = svg.getBoundingClientRect()
      if (frame.width === 0) continue
      const boxes = [...svg.querySelectorAll('text, circle[class*="balloon"], foreignObject')].map((item) => ({ words: item.tagName === 'circle' ? `balloon ${item.parentElement?.textContent ?? ''}` : item.textContent || item.tagName, box: item.getBoundingClientRect(), inside: item.closest('g') }))
        .filter(({ box }) => box.width > 0 && box.height > 0)
      for (const [index, one] of boxes.entries()) {
        if (one.box.left < frame.left - 1 || one.box.right > frame.right + 1 || one.box.top < frame.top - 1 || one.box.bottom > frame.bottom + 1) found.push(`cut off: ${one.words}`)
        for (const other of boxes.slice(index + 1)) {
          // A balloon holds its own number.
          if (one.words.startsWith('balloon') && one.inside && one.inside === other.inside) continue
          // A line's box has air above and below its letters.
          const [across, down] = [Math.min(one.box.right, other.box.right) - Math.max(one.box.left, other.box.left), Math.min(one.box.bottom, other.box.bottom) - Math.max(one.box.top, other.box.top)]
          if (across > 1 && down > 3) found.push(`${one.words} on ${other.words}`)
        }
      }
    }
    return found
  })
}

describe.each(widths)('at %i px', (width) => {
  test.each(SHOP_TABLES.map(({ slug }) => slug))('%s keeps the words of its figures apart and whole', { timeout: 120_000 }, async (slug) => {
    const page = await openPage({ width, javaScript: false })
    const found: string[] = []
    let drawn = 0
    for (const address of addressesOf(slug)) {
      await page.goto(address)
      drawn += await page.locator('.shop-figure').count()
      found.push(...(await collisions(page)).map((words) => `${address}: ${words}`))
    }
    expect(drawn).toBeGreaterThan(0)
    expect(found).toEqual([])
  })
})
