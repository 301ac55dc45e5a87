// Published values to check the shop tables against, copied with their sources, and the two ways to ask a table.
import { describe, expect, it } from 'vitest'
import type { RawInputs } from '@/lib/domain/shop/shop-input'
import type { ShopResult } from '@/lib/domain/shop/shop-table'
import { shopTable } from '@/lib/domain/shop/shop-tables'

export type Published = Record<string, unknown>
export interface PublishedRow {
  id: string
  inputs: Published
  expected: unknown
  unit: string
  tolerance: number | null
}
export interface PublishedGroup {
  source: { title: string; section: string; year: string }
  confirmed: string
  rows: PublishedRow[]
}
/** Throws when the product says something else than the row. */
export type Check = (row: PublishedRow, expected: Published, near: (actual: number | undefined, wanted: unknown) => void) => void

/** All results of a table; fails with the table's own words when the inputs were refused. */
export function ask(slug: string, raw: RawInputs): ShopResult[] {
  const outcome = shopTable(slug)!.compute(raw)
  if (!outcome.ok) throw new Error(JSON.stringify(outcome.errors))
  return outcome.results
}

/** The results of one name; `source` narrows to a title and section that contain it. */
export function named(results: readonly ShopResult[], name: string, source = ''): ShopResult[] {
  return results.filter((item) => item.name === name && `${item.source?.title ?? ''} ${item.source?.section ?? ''}`.includes(source))
}

export function one(results: readonly ShopResult[], name: string, source = ''): ShopResult {
  const [found] = named(results, name, source)
  if (!found) throw new Error(`no result ${name} from ${source || 'any source'}`)
  return found
}

/** One test a row, named by its source. A row that no check knows fails, and so does a check that no row uses. */
export function reproduces(topic: string, groups: readonly PublishedGroup[], checks: readonly (readonly [RegExp, Check])[], without: Readonly<Record<string, string>> = {}): void {
  describe(`Published values: ${topic}`, () => {
    const rows = groups.flatMap((group) => group.rows.map((row) => ({ ...row, group })))
    for (const { group, ...row } of rows) {
      const reason = without[row.id]
      if (reason) continue
      it(`gives ${row.id} as ${group.source.title}, ${group.source.section} (${group.source.year})`, () => {
        const check = checks.find(([pattern]) => pattern.test(row.id))?.[1]
        if (!check) throw new Error(`no check for ${row.id}`)
        check(row, row.expected as Published, (actual, wanted) => {
          expect(typeof actual).toBe('number')
          expect(Math.abs((actual as number) - (wanted as number)), `${String(actual)} against ${String(wanted)}`).toBeLessThanOrEqual((row.tolerance ?? 0) + 1e-9)
        })
      })
    }
    it('uses every check, and excuses only rows that exist', () => {
      for (const [pattern] of checks) expect(rows.some(({ id }) => pattern.test(id)), String(pattern)).toBe(true)
      for (const id of Object.keys(without)) expect(rows.some((row) => row.id === id), id).toBe(true)
    })
  })
}
