// What a reading page makes a phone load. Bytes are counted as the server sends them with gzip; the polyfill for browsers without
// modules is left out, since a browser with modules never loads it.
import { gzipSync } from 'node:zlib'
import { describe, expect, test } from 'vitest'
import { openPage, visit } from '../support/browser'
import { demoEntry } from './arrange'

const mostBytes = 175_000

/** Loads the page and adds up its scripts; none of them may be left to a later click. */
async function scriptsOf(address: string): Promise<{ bytes: number; texts: string[] }> {
  const page = await openPage({ width: 390 })
  const texts: Promise<string>[] = []
  page.on('response', (response) => { if (response.request().resourceType() === 'script') texts.push(response.text()) })
  await visit(page, address)
  await page.waitForLoadState('networkidle')
  const all = await Promise.all(texts)
  return { bytes: all.reduce((sum, text) => sum + gzipSync(text).length, 0), texts: all }
}

const isQuery = (text: string) => text.includes('isFetchedAfterMount') || text.includes('keepPreviousData')

describe('JavaScript of reading pages', () => {
  test.each<[string, () => string | Promise<string>]>([
    ['/', () => '/'],
    ['/search', () => '/search?q=grommet+hole'],
    ['/entries/[id]', async () => (await demoEntry('demo-rib-7-edge')).url],
    ['/kits/[kit]/[section]', () => '/kits/whimbrel-2/W-3'],
    ['/kits', () => '/kits'],
    ['/kits/[kit]/limits', () => '/kits/whimbrel-2/limits'],
    ['/shop/[table]', () => '/shop/grommet?bore=3/8'],
  ])('%s loads at most 175 kB', async (name, address) => {
    const { bytes, texts } = await scriptsOf(await address())
    console.log(`JavaScript of ${name}: ${(bytes / 1000).toFixed(1)} kB (gzip) in ${texts.length} files`)
    expect(bytes).toBeGreaterThan(50_000)
    expect(bytes).toBeLessThanOrEqual(mostBytes)
    expect(texts.some(isQuery)).toBe(false)
  })

  test('TanStack Query comes with the first focus of the search line', async () => {
    const page = await openPage()
    const texts: string[] = []
    page.on('response', async (response) => { if (response.request().resourceType() === 'script') texts.push(await response.text()) })
    await visit(page, '/')
    await page.waitForLoadState('networkidle')
    expect(texts.some(isQuery)).toBe(false)
    await page.getByLabel('Search', { exact: true }).focus()
    await expect.poll(() => texts.some(isQuery)).toBe(true)
  })
})
