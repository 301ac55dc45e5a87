// The kit maker's own limits, entered by a steward: they come before the handbook's and are named. Storing them is elsewhere.
import type { ShopResult, ShopValue } from './shop-table'

export interface MakerLimit {
  /** The result it stands for: table slug and result name. */
  table: string
  result: string
  value: ShopValue
  unit: string
  display: { inch: string; metric: string }
  /** Bulletin or page, with its date. */
  reference: { title: string; section: string; year: string }
  note?: string
}

/** Puts the maker's limits in front of the handbook results of the same name, which stay listed and say that they don't win. */
export function withMakerLimits(table: string, results: readonly ShopResult[], limits: readonly MakerLimit[]): ShopResult[] {
  const mine = limits.filter((limit) => limit.table === table)
  const named = new Set(mine.map((limit) => limit.result))
  const before = (name: string): ShopResult[] => mine.filter((limit) => limit.result === name).map(makerResult)
  const seen = new Set<string>()
  const placed = results.flatMap((item) => {
    if (!named.has(item.name)) return [item]
    const first = seen.has(item.name) ? [] : before(item.name)
    seen.add(item.name)
    return [...first, { ...item, note: [item.note, 'the kit maker’s own limit wins'].filter(Boolean).join('; ') }]
  })
  return [...mine.filter((limit) => !seen.has(limit.result)).map(makerResult), ...placed]
}

function makerResult({ result: name, value, unit, display, reference, note }: MakerLimit): ShopResult {
  return { name, value, unit, display, source: reference, basis: 'maker', ...(note ? { note } : {}) }
}
